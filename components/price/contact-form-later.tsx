import { lazy, Suspense } from 'react';
import { Skeleton } from '../ui/skeleton';
import type { ContactFormProps } from './contact-form';

// The form brings a library that no page before it needs; two pages show it, so that library would otherwise come with every page.
const Form = lazy(async () => ({ default: (await import('./contact-form')).ContactForm }));

/** The contact form, loaded when a page first shows it. */
export function ContactForm(props: ContactFormProps) {
  return (
    <Suspense fallback={<Skeleton label="Loading the form" />}>
      <Form {...props} />
    </Suspense>
  );
}
