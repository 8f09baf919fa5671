import { classNames } from '#src/lib/class-names.ts';

type Props = {
  readonly word: string;
  readonly tone: 'conform' | 'nonconform' | 'concession' | 'muted';
  /** Who and when, in small letters below. */
  readonly detail?: string;
};

const TONES = {
  conform: 'border-conform text-conform',
  nonconform: 'border-nonconform text-nonconform',
  concession: 'border-concession text-concession',
  muted: 'border-muted text-muted',
} as const;

/** Outlined capitals, as on a checked drawing. */
export function Stamp({ word, tone, detail }: Props) {
  return (
    <span className={classNames('inline-block self-start border-2 p-0.5', TONES[tone])}>
      <span className="block border border-current px-2.5 py-1 text-center">
        <span className="block text-table font-semibold tracking-stamp uppercase">{word}</span>
        {detail ? <span className="block text-micro">{detail}</span> : null}
      </span>
    </span>
  );
}
