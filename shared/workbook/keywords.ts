const FIELDS = ['template', 'workOrder'] as const;
type Keywords = { readonly template: string | null; readonly workOrder: string | null };

/** What the template writes into the core properties, to be compared with the Batch sheet: `template=2; workOrder=WO-7`. */
export function formatKeywords(template: string, workOrder: string): string {
  const safe = (text: string): string => text.replace(/[%;=]/g, (sign) => encodeURIComponent(sign));
  return `template=${safe(template)}; workOrder=${safe(workOrder)}`;
}

/** Reads the keywords of a workbook; other words that someone put there are passed over. */
export function parseKeywords(keywords: string | null): Keywords {
  const found = new Map<string, string>();
  for (const part of (keywords ?? '').split(';')) {
    const [name = '', ...rest] = part.split('=');
    const plain = rest.join('=').replace(/%(?:25|3B|3D)/gi, (code) => decodeURIComponent(code));
    if (plain.trim() !== '') found.set(name.trim(), plain.trim());
  }
  const [template, workOrder] = FIELDS.map((name) => found.get(name) ?? null);
  return { template: template ?? null, workOrder: workOrder ?? null };
}
