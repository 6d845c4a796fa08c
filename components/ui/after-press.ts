/** Runs an action at once: only pointers on the web press and release apart. */
export const afterPress = (action: () => void): void => action();
