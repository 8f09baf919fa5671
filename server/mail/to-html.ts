import type { MailBlock, MailContent } from '#server/mail/content.ts';

/** Readers of mail know little CSS: everything stands on the element. The colours are those of the light theme: paper, sheet, ink, hairline, accent. */
const FONT = "font-family:'Noto Sans','Segoe UI',Helvetica,Arial,sans-serif";
const CELL =
  'padding:8px 10px;border-bottom:1px solid #cfc8b6;text-align:left;vertical-align:top;font-size:14px';

export function escapeHtml(text: string): string {
  return text
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;')
    .replaceAll("'", '&#39;');
}

function lines(text: string): string {
  return escapeHtml(text).replaceAll('\n', '<br>');
}

export function toHtml(content: MailContent, publicUrl: string): string {
  const body = content.blocks.map((block) => blockHtml(block, publicUrl)).join('\n');
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<meta name="color-scheme" content="light"><title>${escapeHtml(content.subject)}</title></head>
<body style="margin:0;padding:24px 12px;background:#f5f2e9;color:#15233c;${FONT};font-size:15px;line-height:1.5">
<div style="max-width:680px;margin:0 auto;background:#fcfaf4;border:1px solid #cfc8b6;padding:24px 28px">
<h1 style="margin:0 0 16px;font-size:20px;line-height:1.3">${escapeHtml(content.heading)}</h1>
${body}
<p style="margin:28px 0 0;padding-top:12px;border-top:1px solid #cfc8b6;font-size:12px;color:#59647a">Upstand sent this message by itself; nobody reads an answer to it.</p>
</div></body></html>
`;
}

function blockHtml(block: MailBlock, publicUrl: string): string {
  switch (block.type) {
    case 'text':
      return `<p style="margin:0 0 14px">${lines(block.text)}</p>`;
    case 'facts':
      return table(
        block.facts.map(
          ([term, value]) =>
            `<tr><th scope="row" style="${CELL};font-weight:600;white-space:nowrap">${escapeHtml(term)}</th><td style="${CELL}">${lines(value)}</td></tr>`,
        ),
      );
    case 'table':
      return table([
        `<tr>${block.columns.map((name) => `<th scope="col" style="${CELL};border-bottom:2px solid #15233c">${escapeHtml(name)}</th>`).join('')}</tr>`,
        ...block.rows.map(
          (cells) => `<tr>${cells.map((cell) => `<td style="${CELL}">${lines(cell)}</td>`).join('')}</tr>`,
        ),
      ]);
    case 'quote':
      return `<p style="margin:0 0 4px">${escapeHtml(block.by)} wrote:</p>
<blockquote style="margin:0 0 14px;padding:6px 12px;border-left:3px solid #8f8a7b">${lines(block.text)}</blockquote>`;
    default: {
      const address = escapeHtml(new URL(block.path, publicUrl).href);
      return `<p style="margin:18px 0 14px"><a href="${address}" style="display:inline-block;padding:10px 16px;background:#b83d08;color:#ffffff;text-decoration:none;font-weight:600">${escapeHtml(block.label)}</a><br>
<span style="font-size:12px;color:#59647a">${address}</span></p>`;
    }
  }
}

function table(body: readonly string[]): string {
  return `<table cellspacing="0" cellpadding="0" style="width:100%;border-collapse:collapse;margin:0 0 16px">${body.join('')}</table>`;
}
