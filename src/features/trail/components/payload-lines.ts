export type PayloadLine = { readonly name: string; readonly text: string };

/** `contentDigest` -> `content digest`; units and version words stay as they are. */
function words(name: string): string {
  return name
    .replaceAll(/([a-z0-9])([A-Z])/g, '$1 $2')
    .replaceAll('-', ' ')
    .toLowerCase();
}

/** What a step wrote down, name by name; what lies inside an object stands as `before: role`. Blanks are left out. */
export function payloadLines(
  payload: Readonly<Record<string, unknown>>,
  within = '',
): readonly PayloadLine[] {
  return Object.entries(payload).flatMap(([key, value]) => {
    const name = within ? `${within}: ${words(key)}` : words(key);
    if (value === null || value === undefined || value === '') return [];
    if (Array.isArray(value)) return [{ name, text: value.map(textOf).join(', ') }];
    if (typeof value === 'object') return payloadLines(value as Record<string, unknown>, name);
    return [{ name, text: textOf(value) }];
  });
}

function textOf(value: unknown): string {
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  return typeof value === 'string' ? value : JSON.stringify(value);
}

const MACHINE = /^(?:[0-9a-f]{64}|[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12})$/u;

/** The lines of a step that a person reads at a glance: names of things within the program and digests are left to the entry itself. */
export function plainLines(payload: Readonly<Record<string, unknown>>): readonly PayloadLine[] {
  return payloadLines(payload).filter(({ text }) => !text.split(', ').every((word) => MACHINE.test(word)));
}
