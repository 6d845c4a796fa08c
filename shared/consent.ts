/** What a homeowner ticks before anything is sent: the words beside the box and the line below it. */
export const consent = { label: 'You may use my details and photos for this job.', note: 'For this job only. We sell nothing to anyone.' } as const;

/** Kept word for word with the lead, so that a change of the words above never changes what was agreed to before. */
export const consentWords = `${consent.label} ${consent.note}`;
