/** A mail before it is laid out. The text part is made from the same blocks, so both always say the same. */
export interface MailContent {
  subject: string;
  /** Shown by many inboxes beside the subject. */
  preview: string;
  heading: string;
  blocks: readonly Block[];
}

export type Block =
  | { kind: 'text'; text: string }
  | { kind: 'button'; label: string; url: string }
  | { kind: 'facts'; rows: readonly (readonly [label: string, value: string])[] }
  | { kind: 'list'; title: string; items: readonly string[] }
  /** Set apart by a line at its side. */
  | { kind: 'note'; text: string };

export interface RenderedMail {
  subject: string;
  text: string;
  html: string;
}

const colour = {
  chalk: '#F7F5EF',
  paper: '#FFFFFF',
  ink: '#1B2A33',
  slate: '#4A5D68',
  rule: '#D9D6CC',
  bracken: '#A4461B',
  tarn: '#1C6470',
};
const font = `font-family:Nunito,'Segoe UI',Verdana,sans-serif;`;

const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text for use in HTML, attributes included. */
export const escapeHtml = (text: string): string =>
  text.replace(/[&<>"']/g, (sign) => entities[sign] ?? sign);

/** Only web addresses become links. @throws Error for anything else */
function link(url: string): string {
  if (!/^https?:\/\//.test(url)) throw new Error('a mail may only link to http or https');
  return escapeHtml(url);
}

const paragraph = (text: string, style = ''): string =>
  `<p style="margin:0 0 16px;${style}">${escapeHtml(text).replace(/\n/g, '<br>')}</p>`;

function toHtml(block: Block): string {
  switch (block.kind) {
    case 'text':
      return paragraph(block.text);
    case 'note':
      return paragraph(
        block.text,
        `padding:2px 0 2px 12px;border-left:3px solid ${colour.tarn};color:${colour.slate};`,
      );
    case 'button': {
      const url = link(block.url);
      return (
        `<p style="margin:24px 0;"><a href="${url}" style="display:inline-block;padding:12px 20px;border-radius:6px;` +
        `background:${colour.bracken};color:#FFFFFF;font-weight:700;text-decoration:none;">${escapeHtml(block.label)}</a></p>` +
        `<p style="margin:0 0 16px;font-size:14px;color:${colour.slate};">Or open this address: ` +
        `<a href="${url}" style="color:${colour.tarn};word-break:break-all;">${url}</a></p>`
      );
    }
    case 'facts':
      return (
        `<table style="border-collapse:collapse;width:100%;margin:0 0 16px;font-variant-numeric:tabular-nums;">` +
        block.rows
          .map(
            ([label, value]) =>
              `<tr><th scope="row" style="padding:8px 12px 8px 0;border-bottom:1px solid ${colour.rule};text-align:left;` +
              `vertical-align:top;font-weight:400;color:${colour.slate};">${escapeHtml(label)}</th>` +
              `<td style="padding:8px 0;border-bottom:1px solid ${colour.rule};vertical-align:top;">` +
              `${escapeHtml(value).replace(/\n/g, '<br>')}</td></tr>`,
          )
          .join('') +
        `</table>`
      );
    case 'list':
      return (
        `<h2 style="margin:24px 0 8px;font-size:18px;line-height:1.2;">${escapeHtml(block.title)}</h2>` +
        `<ul style="margin:0 0 16px;padding-left:20px;">${block.items.map((item) => `<li>${escapeHtml(item)}</li>`).join('')}</ul>`
      );
  }
}

function toText(block: Block): string {
  switch (block.kind) {
    case 'text':
    case 'note':
      return block.text;
    case 'button':
      return `${block.label}:\n${block.url}`;
    case 'facts':
      return block.rows.map(([label, value]) => `${label}: ${value.replace(/\n/g, ', ')}`).join('\n');
    case 'list':
      return [block.title, ...block.items.map((item) => `- ${item}`)].join('\n');
  }
}

const foot = 'Linkfell. Figures from us are starting points; the makers’ manuals come before anything here.';

/** Lays a mail out: readable without images, in a narrow window and read aloud. */
export function layOut({ subject, preview, heading, blocks }: MailContent): RenderedMail {
  const html = `<!doctype html>
<html lang="en-GB">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><title>${escapeHtml(subject)}</title></head>
<body style="margin:0;padding:0;background:${colour.chalk};color:${colour.ink};${font}font-size:16px;line-height:1.5;">
<div style="display:none;max-height:0;overflow:hidden;">${escapeHtml(preview)}</div>
<div style="max-width:600px;margin:0 auto;padding:24px 16px;">
<p style="margin:0 0 16px;font-weight:800;font-size:18px;color:${colour.bracken};">Linkfell</p>
<main style="background:${colour.paper};border-radius:10px;padding:24px;">
<h1 style="margin:0 0 16px;font-size:22px;line-height:1.2;">${escapeHtml(heading)}</h1>
${blocks.map(toHtml).join('\n')}
</main>
<p style="margin:16px 0 0;font-size:14px;color:${colour.slate};">${escapeHtml(foot)}</p>
</div>
</body>
</html>
`;
  const text = [heading, ...blocks.map(toText), `--\n${foot}`].join('\n\n') + '\n';
  return { subject, text, html };
}
