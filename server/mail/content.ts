import type { Company } from '../../shared/api/company';

/** What a mail says, before it becomes text or a page. */
export type Block =
  | { readonly kind: 'text'; readonly words: string }
  | { readonly kind: 'heading'; readonly words: string }
  | { readonly kind: 'rows'; readonly rows: readonly (readonly [label: string, value: string])[] }
  | { readonly kind: 'list'; readonly items: readonly string[] }
  | { readonly kind: 'caution'; readonly words: string }
  | { readonly kind: 'button'; readonly label: string; readonly url: string };

export interface MailContent { readonly subject: string; readonly title: string; readonly blocks: readonly Block[] }

/** The sender as it stands in every foot. */
export type Sender = Pick<Company, 'name' | 'phone' | 'postalAddress' | 'demo'>;

export const text = (words: string): Block => ({ kind: 'text', words });
export const heading = (words: string): Block => ({ kind: 'heading', words });
export const rows = (...entries: readonly (readonly [string, string])[]): Block => ({ kind: 'rows', rows: entries });
export const list = (items: readonly string[]): Block => ({ kind: 'list', items });
export const caution = (words: string): Block => ({ kind: 'caution', words });
export const button = (label: string, url: string): Block => ({ kind: 'button', label, url });

/** Lines that close every mail. */
export const footOf = (sender: Sender): readonly string[] => [
  `${sender.name}, ${sender.phone}`,
  sender.postalAddress,
  ...(sender.demo ? ['This is a demo. The company, the places and the people are invented.'] : []),
];
