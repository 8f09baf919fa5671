import type { ErrorObject } from 'ajv/dist/2020.js';

const FORMATS: Readonly<Record<string, string>> = {
  email: 'Write an e-mail address, as name@company.example.',
  date: 'Write a day of the calendar, as 2026-04-14.',
  'date-time': 'Write a day and time, as 2026-04-14T10:24:00Z.',
  uuid: 'This is not an identifier of anything here. Choose it from the list.',
};

const TYPES: Readonly<Record<string, string>> = {
  string: 'Write a text.',
  number: 'Write a number.',
  integer: 'Write a whole number.',
  boolean: 'Say yes or no (true or false).',
  array: 'Give a list.',
  object: 'Give named values.',
};

/** A fault of a request as a sentence that says what to write. `pattern` is used here only for "not blank". */
export function faultSentence({ keyword, params, message }: ErrorObject): string {
  switch (keyword) {
    case 'required':
      return 'This is missing.';
    case 'additionalProperties':
      return 'This name is not known here.';
    case 'enum':
      return `Must be one of: ${(params.allowedValues as unknown[]).map(String).join(', ')}.`;
    case 'format':
      return FORMATS[String(params.format)] ?? `This is no ${String(params.format)}.`;
    case 'type':
      return TYPES[String(params.type)] ?? `Give one of these: ${String(params.type)}.`;
    case 'minLength':
    case 'pattern':
      return 'This is blank. Write something.';
    case 'maxLength':
      return `This is too long: at most ${String(params.limit)} characters.`;
    case 'minimum':
      return `This must be at least ${String(params.limit)}.`;
    case 'maximum':
      return `This must be at most ${String(params.limit)}.`;
    case 'exclusiveMinimum':
      return `This must be more than ${String(params.limit)}.`;
    case 'minItems':
      return `Give at least ${String(params.limit)}.`;
    case 'maxItems':
      return `Give at most ${String(params.limit)}.`;
    default:
      return `This does not fit: ${message ?? keyword}.`;
  }
}
