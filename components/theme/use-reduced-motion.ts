import { useMedia } from './use-media';

/** True when the person asked their device for less motion. */
export const useReducedMotion = (): boolean => useMedia('(prefers-reduced-motion: reduce)');
