import { footOf, type Block, type MailContent, type Sender } from './content';

function blockText(block: Block): string {
  switch (block.kind) {
    case 'text': return block.words;
    case 'heading': return `${block.words}\n${'-'.repeat(Math.min(block.words.length, 60))}`;
    case 'rows': return block.rows.map(([label, value]) => `${label}: ${value}`).join('\n');
    case 'list': return block.items.map((item) => `- ${item}`).join('\n');
    case 'caution': return `CAUTION. ${block.words}`;
    case 'button': return `${block.label}:\n${block.url}`;
  }
}

/** The mail for readers of plain text. */
export const mailText = ({ title, blocks }: MailContent, sender: Sender): string =>
  [title, ...blocks.map(blockText), footOf(sender).join('\n')].join('\n\n').concat('\n');
