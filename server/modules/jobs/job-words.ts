/** What each job does and what it means that it stands still, for the administrator. */
const WORDS: Readonly<Record<string, { readonly title: string; readonly meaning: string }>> = {
  'send-mail': {
    title: 'Send a message',
    meaning: 'Its recipient has not been told. The message is kept and goes out when this runs.',
  },
  'check-revision': {
    title: 'Check a batch',
    meaning: 'The contractor sees that the check failed and cannot submit. The files handed in are kept.',
  },
  'prepare-photos': {
    title: 'Prepare photographs',
    meaning:
      'Their times and positions are not read yet, and no small pictures are made. The files are kept.',
  },
  'issue-transmittal': {
    title: 'Issue a transmittal',
    meaning: 'Nothing was issued. What it is to hold stands fixed and is written when this runs.',
  },
  'make-sheets': {
    title: 'Make the record sheets of a batch',
    meaning: 'Whoever asked for the PDF is told that it failed. The records are not touched.',
  },
  'free-idle-reviews': {
    title: 'Free reviews that nobody works on',
    meaning: 'A batch that its inspector left alone stays with them until somebody gives it back.',
  },
  tidy: {
    title: 'Clear away what has done its work',
    meaning: 'Old sessions, tokens and counters stay a little longer. Nobody’s work waits for it.',
  },
  'sweep-blobs': {
    title: 'Delete files that nothing refers to',
    meaning: 'Storage is not freed. Nobody’s work waits for it.',
  },
};

export function jobWords(name: string): { readonly title: string; readonly meaning: string } {
  return WORDS[name] ?? { title: name, meaning: 'What it was to do has not been done.' };
}
