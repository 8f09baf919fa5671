import type { SheetWriter } from './workbook-writer.ts';
import { CAUTION, HEADLINE, LABEL, SUBHEAD, TEXT } from './template-style.ts';
import type { TemplateInput } from './template-types.ts';

type Part = {
  readonly head: string;
  readonly caution?: boolean;
  readonly rows: readonly (readonly [string, string])[];
};

const CAUTIONS: Part = {
  head: 'Before anything else',
  caution: true,
  rows: [
    [
      'Foam',
      'Component A contains isocyanates. Avoid breathing vapour and touching liquid; wear what the safety data sheets call for. Anyone sensitised to isocyanates keeps away.',
    ],
    ['Containers', 'Never close a container in which the foam is reacting: it gets hot and can burst.'],
    [
      'Lines',
      'Treat every line as energised until it has been proved otherwise. Keep the approach distances.',
    ],
    ['Underground', 'Dig only where utilities have been located and the ticket is valid.'],
    ['Open bores', 'Never leave an open bore uncovered or unguarded.'],
    [
      'Who decides',
      'Local codes, the manufacturer’s instructions and a licensed engineer decide. This workbook records what was done; it gives no permission to do it.',
    ],
  ],
};

const HOW_TO: Part = {
  head: 'How to fill it in',
  rows: [
    ['Batch', 'Name the foreman. Leave the template version as it is.'],
    [
      'Set',
      'One row for each pole set in foam. The office has filled in the tinted cells; correct them if the pole differs.',
    ],
    ['Straighten', 'One row for each pole pulled plumb.'],
    [
      'Re-level',
      'One row for each pad. Seen from above, facing the doors: gap 1 front left, 2 back left, 3 back right, 4 front right, at the final level.',
    ],
    [
      'Pours',
      'One row for each kit size and lot of a pour. Rows of one pour share its number and time. The time is the end of the pour.',
    ],
    ['Events', 'Rework or repair after the first building: one row for each structure and event, from 2 on.'],
    ['Photos', 'Say what each photograph shows. Upload the photographs beside this workbook, not inside it.'],
    [
      'Rows',
      'A structure that was not worked on: leave its row as it is. Blank rows do no harm. Do not merge cells.',
    ],
    ['Required', 'Columns marked * must be filled in. Leave another blank rather than guess.'],
    [
      'Words',
      'Where a value may honestly be missing, write: not yet, not by us (times of later work), not measured (water, leans, component temperatures).',
    ],
  ],
};

const FORMS: Part = {
  head: 'Units, lengths and times',
  rows: [
    ['Feet', 'A number, as 6.5, or 6\' 6", or 6 ft 6 in, or 5 ft 9 1/2 in.'],
    [
      'Inches',
      'A number, as 18.5, or 18 1/2, or 18". Write a fraction alone as 0 1/2: a spreadsheet makes a date of 1/2.',
    ],
    [
      'Lean',
      'Inches per 10 ft, and the direction in degrees from north towards which the top leans. Take the mean of two opposite faces.',
    ],
    ['Temperatures', 'Degrees Fahrenheit, of the components themselves.'],
    ['Positions', 'Decimal degrees (WGS 84); west is negative, as -92.4137.'],
    ['Times', 'Date and time as 2026-04-14 10:24, 2026-04-14 9:05 or 4/14/2026 10:24 AM.'],
    ['Decimals', 'A point, never a comma: 6.5.'],
  ],
};

const EXAMPLE: Part = {
  head: 'An example',
  rows: [
    [
      'Set',
      'Structure 4471/12: pole length 45, class 3, southern-pine; bore at top 20, bore depth 6\' 9"; ground soil; embedment 6.5; foam top below grade 0; water 1 1/2; lean 0.2; bored 2026-04-14 9:05; set 2026-04-14 10:10; latitude 38.94512, longitude -92.41370.',
    ],
    [
      'Pours',
      'Structure 4471/12: pour 1, poured 2026-04-14 10:24, product and lot as on the label, kit size 4, quantity 2, component A 72, component B 70.',
    ],
  ],
};

/** The first sheet: what to beware of, how to fill the others in, units, forms of times, an example. */
export function writeGuide(sheet: SheetWriter, input: TemplateInput): void {
  const { workOrder, contractor, owner, standardNumber } = input;
  const add = (cells: readonly string[], looks: readonly object[], height?: number): void => {
    const row = sheet.addRow(['', ...cells]);
    looks.forEach((look, index) => Object.assign(row.getCell(index + 2), look));
    if (height !== undefined) row.height = height;
    row.commit();
  };
  const about: Part = {
    head: 'This workbook',
    rows: [
      ['Work order', `${workOrder.number}, ${workOrder.title}`],
      ['Owner', owner],
      ['Contractor', contractor],
      ['Times', `Wall clock of ${workOrder.zone.replaceAll('_', ' ')}`],
      [
        'Standard',
        `The owner’s construction standard, version ${standardNumber} when this was made. A line is checked on the version in force on its work day.`,
      ],
    ],
  };
  add(['Proof of foam setting'], [HEADLINE], 30);
  for (const part of [about, CAUTIONS, HOW_TO, FORMS, EXAMPLE]) {
    add(['', ''], []);
    add([part.head, ''], [SUBHEAD, SUBHEAD]);
    const look = part.caution === true ? CAUTION : TEXT;
    for (const [label, text] of part.rows) {
      add([label, text], [LABEL, look], 15 * Math.max(1, Math.ceil(text.length / 95)));
    }
  }
}
