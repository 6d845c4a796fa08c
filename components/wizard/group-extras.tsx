import { lazy, Suspense } from 'react';
import type { Group } from '../../shared/wizard/index';
import { Skeleton } from '../ui/skeleton';
import { DangerStop } from './danger-stop';
import { LoadsRoom } from './loads-room';
import { useHydrated } from './use-hydrated';
import { ZipResult } from './zip-result';

const PhotosBoard = lazy(() => import('../photos/photos-board'));

/** What a group shows under its questions, or in their place, because of what it is about. */
export function GroupExtras({ group }: { group: Group }) {
  const asks = (id: string) => group.fields.some((field) => field.id === id);
  if (asks('zip')) return <ZipResult />;
  if (asks('panelCondition')) return <DangerStop />;
  if (asks('loads')) return <LoadsRoom />;
  if (group.id === 'photos') return <LazyPhotos />;
  return null;
}

/** Loaded when it is needed, and by the browser alone: the static page cannot wait for it. */
function LazyPhotos() {
  const waiting = <Skeleton label="Opening the photos" />;
  return useHydrated() ? <Suspense fallback={waiting}><PhotosBoard /></Suspense> : waiting;
}
