import { lazy, Suspense, type ComponentType } from 'react';
import { Skeleton } from '../ui/skeleton';
import { useHydrated } from '../wizard/use-hydrated';

/**
 * The desk's pages, loaded together when the first of them is opened. What several pages share is otherwise put into the file
 * that every page loads, the public's too, and the desk's code is none of the public's business.
 */
const page = (name: 'DeskLayout' | 'LeadScreen' | 'LeadsScreen' | 'SignInScreen'): ComponentType => {
  const Page = lazy(async () => ({ default: (await import('./desk-pages'))[name] }));
  return function DeskPage() {
    const waiting = <Skeleton label="Loading the desk" />;
    // The static page cannot wait for the file: React reports that as error 419.
    return useHydrated() ? <Suspense fallback={waiting}><Page /></Suspense> : waiting;
  };
};

export const DeskLayout = page('DeskLayout');
export const LeadScreen = page('LeadScreen');
export const LeadsScreen = page('LeadsScreen');
export const SignInScreen = page('SignInScreen');
