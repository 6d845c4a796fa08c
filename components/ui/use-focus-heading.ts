/** Off the web, screen readers follow the screen by themselves. */
export const useFocusHeading = (_key: string): void => undefined;
