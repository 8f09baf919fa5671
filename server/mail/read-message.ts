export type MessageParts = {
  readonly subject: string;
  readonly text: string | null;
  readonly html: string | null;
  /** By lower-case name; the last of a name counts. */
  readonly headers: ReadonlyMap<string, string>;
};

/** Reads back what our own sender writes: one text, or text and HTML as alternatives. Not a reader for any mail there is. */
export function readMessage(source: string): MessageParts {
  const { headers, body } = split(source);
  const type = headers.get('content-type') ?? 'text/plain';
  const boundary = /boundary="?([^";]+)"?/i.exec(type)?.[1];
  const parts = boundary === undefined ? [{ headers, body }] : partsOf(body, boundary);
  const find = (kind: string): string | null => {
    const part = parts.find((each) => (each.headers.get('content-type') ?? 'text/plain').startsWith(kind));
    return part === undefined ? null : decodeBody(part.body, part.headers.get('content-transfer-encoding'));
  };
  return {
    subject: decodeWords(headers.get('subject') ?? ''),
    text: find('text/plain'),
    html: find('text/html'),
    headers,
  };
}

type Part = { readonly headers: ReadonlyMap<string, string>; readonly body: string };

function split(source: string): Part {
  const end = /\r?\n\r?\n/.exec(source);
  const head = end === null ? source : source.slice(0, end.index);
  const headers = new Map<string, string>();
  // A line that begins with a space goes on with the header before it.
  for (const line of head.replaceAll(/\r?\n[ \t]+/g, ' ').split(/\r?\n/)) {
    const colon = line.indexOf(':');
    if (colon > 0) headers.set(line.slice(0, colon).toLowerCase(), line.slice(colon + 1).trim());
  }
  return { headers, body: end === null ? '' : source.slice(end.index + end[0].length) };
}

function partsOf(body: string, boundary: string): Part[] {
  return body
    .split(`--${boundary}`)
    .slice(1)
    .filter((part) => !part.startsWith('--'))
    .map((part) => split(part.replace(/^\r?\n/, '').replace(/\r?\n$/, '')));
}

function decodeBody(body: string, encoding = '7bit'): string {
  switch (encoding.toLowerCase()) {
    case 'base64':
      return Buffer.from(body, 'base64').toString('utf8');
    case 'quoted-printable':
      return unquote(body.replaceAll(/=\r?\n/g, ''));
    default:
      return body;
  }
}

/** `=C3=A9` is bytes of UTF-8, not characters. */
function unquote(text: string): string {
  return text.replaceAll(/(?:=[0-9A-Fa-f]{2})+/g, (run) =>
    Buffer.from(run.replaceAll('=', ''), 'hex').toString('utf8'),
  );
}

function decodeWords(text: string): string {
  return text
    .replaceAll(/\?=\s+=\?/g, '?==?')
    .replaceAll(/=\?utf-8\?([bq])\?([^?]*)\?=/gi, (_all, how: string, word: string) =>
      how.toLowerCase() === 'b'
        ? Buffer.from(word, 'base64').toString('utf8')
        : unquote(word.replaceAll('_', ' ')),
    );
}
