/** Moves focus to a field by its id. There is nothing to do off the web. */
export const focusField = (_id: string): void => undefined;
