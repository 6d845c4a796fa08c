/** Nothing to skip where there is no keyboard. */
export const SkipLink = (): null => null;
