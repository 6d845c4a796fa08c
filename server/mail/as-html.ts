import { footOf, type Block, type MailContent, type Sender } from './content';
import { escapeHtml } from './escape-html';

// The colors of the design's tokens; a mail cannot read the app's, and many readers drop everything but inline styles.
const color = { paper: '#F5EFE2', card: '#FFFCF5', rule: '#DACFB9', ink: '#12302A', ink2: '#3F5A53', spruce: '#1C473E', copper: '#A2481A', warnWash: '#FBEBBF' };
const font = "font-family:Nunito,'Segoe UI',system-ui,sans-serif";

function blockHtml(block: Block): string {
  switch (block.kind) {
    case 'text': return `<p style="margin:0 0 16px">${escapeHtml(block.words)}</p>`;
    case 'heading': return `<h2 style="margin:24px 0 8px;font-size:18px;line-height:24px">${escapeHtml(block.words)}</h2>`;
    case 'rows': return `<dl style="margin:0 0 16px">${block.rows.map(([label, value]) =>
      `<dt style="color:${color.ink2};border-top:1px solid ${color.rule};padding-top:8px">${escapeHtml(label)}</dt><dd style="margin:0 0 8px;font-weight:700">${escapeHtml(value)}</dd>`).join('')}</dl>`;
    case 'list': return `<ul style="margin:0 0 16px;padding-left:20px">${block.items.map((item) => `<li style="margin-bottom:6px">${escapeHtml(item)}</li>`).join('')}</ul>`;
    case 'caution': return `<p style="margin:0 0 16px;padding:12px 16px;background:${color.warnWash};border-left:6px solid ${color.ink}"><strong>Caution.</strong> ${escapeHtml(block.words)}</p>`;
    case 'button': return `<p style="margin:0 0 16px"><a href="${escapeHtml(block.url)}" style="display:inline-block;padding:14px 20px;border-radius:10px;background:${color.copper};color:#FFFFFF;font-weight:800;text-decoration:none">${escapeHtml(block.label)}</a></p>`;
  }
}

/** The mail as a page: no pictures, no scripts, nothing that is fetched, so that opening it tells nobody anything. */
export const mailHtml = ({ subject, title, blocks }: MailContent, sender: Sender): string => `<!doctype html>
<html lang="en-US"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1"><title>${escapeHtml(subject)}</title></head>
<body style="margin:0;background:${color.paper};color:${color.ink};${font};font-size:16px;line-height:24px">
<header style="background:${color.spruce};color:${color.paper};padding:16px 24px;font-weight:800">${escapeHtml(sender.name)}</header>
<main style="max-width:560px;margin:0 auto;padding:24px;background:${color.card}">
<h1 style="margin:0 0 16px;font-size:24px;line-height:30px">${escapeHtml(title)}</h1>
${blocks.map(blockHtml).join('\n')}
</main>
<footer style="max-width:560px;margin:0 auto;padding:16px 24px;color:${color.ink2};font-size:14px;line-height:20px">${footOf(sender).map(escapeHtml).join('<br>')}</footer>
</body></html>
`;
