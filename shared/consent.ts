/** What a homeowner agrees to beside the tick; kept word for word with the lead, so a change here never changes what was agreed to before. */
export const consentWords = 'You may use my details and photos to price, plan and do this job, and write or call me about it in the ways I picked.';
