import { useSyncExternalStore } from 'react';

const never = () => () => undefined;

/** False in the static page and while it hydrates, then true: what only the address of this visit knows may be shown from then on. */
export const useHydrated = (): boolean => useSyncExternalStore(never, () => true, () => false);
