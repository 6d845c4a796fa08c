const entities: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Makes a text safe inside an HTML element or a quoted attribute. */
export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (letter) => entities[letter] ?? letter);
