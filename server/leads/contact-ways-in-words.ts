const words: Record<string, string> = { email: 'by e-mail', text: 'by text message', phone: 'by phone' };

/** "by e-mail or by phone"; e-mail when nothing was picked, because that address is always there. */
export const contactWaysInWords = (ways: readonly string[]): string =>
  (ways.length === 0 ? ['email'] : ways).flatMap((way) => words[way] ?? []).join(' or ');
