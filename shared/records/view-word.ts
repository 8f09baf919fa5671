const VIEW_WORDS: Readonly<Record<string, string>> = {
  'bore-depth': 'Bore depth',
  water: 'Water',
  kits: 'Kits',
  finish: 'Finish',
  plumb: 'Plumb',
  brand: 'Brand',
  before: 'Before',
  gap: 'Gap',
  after: 'After',
  'level-after': 'Level after',
  rework: 'Rework',
  other: 'Other',
};

/** What a photograph shows, as a person says it. */
export function viewWord(view: string | null): string {
  return view === null ? 'Not placed' : (VIEW_WORDS[view] ?? view);
}
