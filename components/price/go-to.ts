/** Leaves the app for another site in the same window: the payment provider's page. */
export const goTo = (url: string): void => globalThis.location.assign(url);
