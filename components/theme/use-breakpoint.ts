import { breakpoints, type Breakpoint } from './tokens';
import { useMedia } from './use-media';

/**
 * The layout that fits the window. "phone" in the static page and while it hydrates; what is seen before that and differs by width
 * (type sizes, page header, landing) is laid out by the style sheet in web-styles.ts instead, so that nothing shifts.
 */
export function useBreakpoint(): Breakpoint {
  const tablet = useMedia(`(min-width: ${breakpoints.tablet}px)`);
  const wide = useMedia(`(min-width: ${breakpoints.wide}px)`);
  return wide ? 'wide' : tablet ? 'tablet' : 'phone';
}

/** True when the window is too low for a full dock (keyboard up, landscape phone). */
export const useLowWindow = (): boolean => useMedia('(max-height: 699px)');
