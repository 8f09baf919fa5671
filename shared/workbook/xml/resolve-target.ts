/** Part names compare without case, with forward slashes and without a leading one. */
export function partName(name: string): string {
  return name.replaceAll('\\', '/').replace(/^\/+/, '').toLowerCase();
}

/** Target of a relationship, from the part that holds it: absolute, relative or with `..`. */
export function resolveTarget(fromPart: string, target: string): string {
  const clean = target.replaceAll('\\', '/');
  const base = clean.startsWith('/') ? [] : fromPart.split('/').slice(0, -1);
  const steps = [...base, ...clean.split('/')];
  const path: string[] = [];
  for (const step of steps) {
    if (step === '..') path.pop();
    else if (step !== '' && step !== '.') path.push(step);
  }
  return partName(path.join('/'));
}

/** The part that holds the relationships of `part`. */
export function relationshipsPart(part: string): string {
  const slash = part.lastIndexOf('/');
  return `${part.slice(0, slash + 1)}_rels/${part.slice(slash + 1)}.rels`;
}
