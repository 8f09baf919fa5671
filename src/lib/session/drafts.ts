/** What was typed into a form and not sent yet, kept for this tab until it is sent or the person signs out. */
const PREFIX = 'upstand.draft.';

export function readDraft(key: string): unknown {
  try {
    const text = sessionStorage.getItem(PREFIX + key);
    return text === null ? null : (JSON.parse(text) as unknown);
  } catch {
    return null;
  }
}

export function writeDraft(key: string, values: unknown): void {
  try {
    sessionStorage.setItem(PREFIX + key, JSON.stringify(values));
  } catch {
    // Storage is full or closed: the form itself still holds what was typed.
  }
}

export function dropDraft(key: string): void {
  try {
    sessionStorage.removeItem(PREFIX + key);
  } catch {
    // Nothing was kept.
  }
}

export function clearDrafts(): void {
  try {
    for (const key of Object.keys(sessionStorage)) {
      if (key.startsWith(PREFIX)) sessionStorage.removeItem(key);
    }
  } catch {
    // Nothing was kept.
  }
}
