export interface PageEvents {
  /** The page is hidden or left; it may not come back. */
  readonly onLeave: () => void;
  /** The connection is back. */
  readonly onOnline: () => void;
}

/** Watches the page. Off the web there is none: nothing to watch. Gives what ends it. */
export const watchPage = (_events: PageEvents): (() => void) => () => undefined;
