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
