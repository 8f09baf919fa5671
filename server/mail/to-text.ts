import type { MailBlock, MailContent } from '#server/mail/content.ts';

const CLOSING = 'Upstand sent this message by itself; nobody reads an answer to it.';

/** Plain text; a row of a table becomes a paragraph, since columns do not line up in every reader. */
export function toText(content: MailContent, publicUrl: string): string {
  const blocks = content.blocks.map((block) => blockText(block, publicUrl)).filter((text) => text !== '');
  return [content.heading, ...blocks, `-- \n${CLOSING}\n`].join('\n\n');
}

function blockText(block: MailBlock, publicUrl: string): string {
  switch (block.type) {
    case 'text':
      return block.text;
    case 'facts':
      return block.facts.map(([term, value]) => `${term}: ${value}`).join('\n');
    case 'table':
      return block.rows.map((cells) => rowText(block.columns, cells)).join('\n\n');
    case 'quote':
      return `${block.by} wrote:\n${block.text
        .split('\n')
        .map((line) => `> ${line}`)
        .join('\n')}`;
    default:
      return `${block.label}:\n${new URL(block.path, publicUrl).href}`;
  }
}

function rowText(columns: readonly string[], cells: readonly string[]): string {
  const [first, ...rest] = cells;
  const others = rest.map((cell, at) => (cell === '' ? null : `  ${columns[at + 1]}: ${cell}`));
  return [`* ${columns[0]} ${first}`, ...others.filter((line) => line !== null)].join('\n');
}
