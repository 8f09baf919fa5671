import { describe, expect, it } from 'vitest';
import { type Parts, readCells, readParts, workbookParts } from './parts-for-tests.ts';

const strings = (items: string): Parts => ({ 'xl/sharedStrings.xml': `<sst>${items}</sst>` });
const OFFICE = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';

describe('cells', () => {
  it('takes every type for what it is', async () => {
    const cells = await readCells(
      `<row r="1"><c r="A1" t="s"><v>0</v></c><c r="B1"><v>6.5</v></c><c r="C1" t="b"><v>1</v></c>
       <c r="D1" t="e"><v>#N/A</v></c><c r="E1" t="str"><f>A1</f><v>x</v></c>
       <c r="F1" t="inlineStr"><is><t>y</t></is></c><c r="G1" t="d"><v>2026-04-14T10:24:00</v></c>
       <c r="H1" t="n"><v>1E-3</v></c><c r="I1" t="inlineStr"><v>z</v></c></row>`,
      strings('<si><t>soil</t></si>'),
    );
    expect(cells).toEqual([
      ['A1', 'text', 'soil'],
      ['B1', 'number', '6.5'],
      ['C1', 'boolean', 'TRUE'],
      ['D1', 'error', '#N/A'],
      ['E1', 'text', 'x'],
      ['F1', 'text', 'y'],
      ['G1', 'date', '2026-04-14T10:24:00'],
      ['H1', 'number', '1E-3'],
      ['I1', 'text', 'z'],
    ]);
  });

  it('joins rich text, skips phonetic runs, keeps CDATA and entities', async () => {
    const cells = await readCells(
      `<row><c t="s"><v>0</v></c><c t="s"><v>1</v></c>
       <c t="inlineStr"><is><r><t>a</t></r><r><t xml:space="preserve"> b</t></r><rPh><t>no</t></rPh></is></c></row>`,
      strings(
        `<si><r><t>so</t></r><r><rPr><b/></rPr><t>il</t></r><rPh sb="0" eb="1"><t>NO</t></rPh></si>
         <si><t><![CDATA[<6 & 7>]]> &amp; 8 &#65;</t></si>`,
      ),
    );
    expect(cells.map(([, , text]) => text)).toEqual(['soil', '<6 & 7> & 8 A', 'a b']);
  });

  it('decodes _xHHHH_ once', async () => {
    const cells = await readCells(
      '<row><c t="s"><v>0</v></c><c t="s"><v>1</v></c><c t="str"><v>a_x0041_</v></c></row>',
      strings('<si><t>a_x000A_b</t></si><si><t>_x005F_x0041_</t></si>'),
    );
    expect(cells.map(([, , text]) => text)).toEqual(['a\nb', '_x0041_', 'aA']);
  });

  it('marks what no store takes instead of failing later', async () => {
    const cells = await readCells('<row><c t="str"><v>a_x0000_b_xD800_</v></c></row>');
    expect(cells[0]?.[2]).toBe('a\ufffdb\ufffd');
  });

  it('counts rows and cells that carry no address, and orders those that do', async () => {
    expect(
      await readCells(
        '<row><c><v>1</v></c><c/><c><v>2</v></c></row><row/><row><c r="D3"><v>3</v></c><c><v>4</v></c></row>',
      ),
    ).toEqual([
      ['A1', 'number', '1'],
      ['C1', 'number', '2'],
      ['D3', 'number', '3'],
      ['E3', 'number', '4'],
    ]);
    const mixed =
      '<row r="5"><c r="C5"><v>3</v></c><c r="A5"><v>1</v></c></row><row r="2"><c r="B2"><v>2</v></c></row>';
    expect((await readCells(mixed)).map(([address]) => address)).toEqual(['B2', 'A5', 'C5']);
  });

  it('keeps a formula’s stored result and says when there is none', async () => {
    const { sheets } = await readParts(
      workbookParts(
        '<row><c><f>1+1</f><v>2</v></c><c><f>NOW()</f></c><c t="str"><f>""</f><v></v></c><c t="e"><f>1/0</f><v>#DIV/0!</v></c></row>',
      ),
    );
    expect(sheets[0]?.rows[0]?.cells).toEqual([
      { address: 'A1', column: 1, kind: 'number', raw: '2', number: 2, formula: true },
      { address: 'B1', column: 2, kind: 'error', raw: '', formula: true },
      { address: 'C1', column: 3, kind: 'text', raw: '', formula: true },
      { address: 'D1', column: 4, kind: 'error', raw: '#DIV/0!', formula: true },
    ]);
  });

  it('never makes a number of what is none', async () => {
    for (const text of ['abc', '0x10', '1e999', 'NaN', '1,5', '--1']) {
      expect(await readCells(`<row><c><v>${text}</v></c></row>`)).toEqual([['A1', 'error', text]]);
    }
  });

  it('refuses a text index out of range, an impossible address and a cell given twice', async () => {
    const refusal = (data: string) => readCells(data, strings('<si><t>a</t></si>'));
    await expect(refusal('<row><c t="s"><v>1</v></c></row>')).rejects.toMatchObject({ code: 'string-index' });
    await expect(refusal('<row><c t="s"><v>-1</v></c></row>')).rejects.toMatchObject({
      code: 'string-index',
    });
    await expect(refusal('<row><c r="A0"><v>1</v></c></row>')).rejects.toMatchObject({
      code: 'cell-address',
    });
    await expect(refusal('<row><c r="XFE1"><v>1</v></c></row>')).rejects.toMatchObject({
      code: 'cell-address',
    });
    await expect(refusal('<row r="1048577"><c><v>1</v></c></row>')).rejects.toMatchObject({
      code: 'cell-address',
    });
    const twice = '<row r="1"><c r="A1"><v>1</v></c></row><row r="1"><c r="A1"><v>2</v></c></row>';
    await expect(refusal(twice)).rejects.toMatchObject({ code: 'cell-twice', params: { address: 'A1' } });
  });
});

describe('styles', () => {
  const styles: Parts = {
    'xl/styles.xml': `<styleSheet><numFmts><numFmt numFmtId="164" formatCode="yyyy\\-mm\\-dd hh:mm"/><numFmt numFmtId="165" formatCode="0.0&quot; days&quot;"/></numFmts>
      <cellStyleXfs><xf numFmtId="14"/></cellStyleXfs>
      <cellXfs><xf numFmtId="0"/><xf numFmtId="164"/><xf numFmtId="165"/><xf numFmtId="14"/></cellXfs></styleSheet>`,
  };
  it('tell dates from numbers; an index out of range is no date', async () => {
    const { sheets } = await readParts(
      workbookParts(
        '<row><c s="0"><v>1</v></c><c s="1"><v>2</v></c><c s="2"><v>3</v></c><c s="3"><v>4</v></c><c s="99"><v>5</v></c></row>',
        styles,
      ),
    );
    const shown = sheets[0]?.rows[0]?.cells.map((cell) => [
      cell.dateFormat ?? false,
      cell.timeFormat ?? false,
    ]);
    expect(shown).toEqual([
      [false, false],
      [true, true],
      [false, false],
      [true, false],
      [false, false],
    ]);
  });
});

describe('the package', () => {
  it('reads strict, prefixed files with absolute and dotted targets in any case', async () => {
    const strict = 'http://purl.oclc.org/ooxml/officeDocument/relationships';
    const workbook = await readParts({
      '[Content_Types].xml':
        '<Types><Override PartName="/XL/Workbook.xml" ContentType="application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml"/></Types>',
      '_rels/.rels': `<Relationships><Relationship Id="r1" Type="${strict}/officeDocument" Target="/xl/Workbook.XML"/></Relationships>`,
      'xl/workbook.xml':
        '<x:workbook xmlns:x="m" xmlns:q="r"><x:workbookPr date1904="true"/><x:sheets><x:sheet name="A &amp; B" q:id="a"/><x:sheet name="Hidden" state="veryHidden" q:id="b"/><x:sheet name="Chart" q:id="c"/></x:sheets></x:workbook>',
      'xl/_rels/workbook.xml.rels': `<r:Relationships xmlns:r="p"><r:Relationship Id="a" Type="${strict}/worksheet" Target="/xl/Sheets/One.xml"/><r:Relationship Id="b" Type="${strict}/worksheet" Target="../xl/sheets/two.xml"/><r:Relationship Id="c" Type="${strict}/chartsheet" Target="none.xml"/></r:Relationships>`,
      'xl/sheets/one.xml':
        '<x:worksheet xmlns:x="m"><x:sheetData><x:row><x:c><x:v>1</x:v></x:c></x:row></x:sheetData><x:mergeCells><x:mergeCell ref="A1:B2"/></x:mergeCells></x:worksheet>',
      'xl/sheets/two.xml': '<worksheet><sheetData/></worksheet>',
    });
    expect(workbook.date1904).toBe(true);
    expect(workbook.sheets).toEqual([
      {
        name: 'A & B',
        hidden: false,
        kind: 'worksheet',
        merged: ['A1:B2'],
        rows: [{ row: 1, cells: [{ address: 'A1', column: 1, kind: 'number', raw: '1', number: 1 }] }],
      },
      { name: 'Hidden', hidden: true, kind: 'worksheet', merged: [], rows: [] },
      { name: 'Chart', hidden: false, kind: 'chart', merged: [], rows: [] },
    ]);
  });

  it('reads UTF-16 and refuses bytes that are no text', async () => {
    const xml =
      '<worksheet><sheetData><row><c t="inlineStr"><is><t>Ø½</t></is></c></row></sheetData></worksheet>';
    const utf16 = Uint8Array.from([
      0xff,
      0xfe,
      ...Array.from(xml).flatMap((sign) => [sign.charCodeAt(0) & 255, sign.charCodeAt(0) >> 8]),
    ]);
    expect(await readCells('', { 'xl/worksheets/sheet1.xml': utf16 })).toEqual([['A1', 'text', 'Ø½']]);
    const broken = Uint8Array.from([...new TextEncoder().encode('<worksheet>'), 0xff, 0xfe]);
    await expect(readCells('', { 'xl/worksheets/sheet1.xml': broken })).rejects.toMatchObject({
      code: 'xml-damaged',
    });
  });

  it('reads the keywords of the core properties', async () => {
    const { keywords } = await readParts(
      workbookParts('', {
        '_rels/.rels': `<Relationships><Relationship Id="r1" Type="${OFFICE}/officeDocument" Target="xl/workbook.xml"/><Relationship Id="r2" Type="http://schemas.openxmlformats.org/package/2006/relationships/metadata/core-properties" Target="docProps/core.xml"/></Relationships>`,
        'docProps/core.xml':
          '<cp:coreProperties xmlns:cp="c"><cp:keywords>template=2; workOrder=W&amp;7</cp:keywords></cp:coreProperties>',
      }),
    );
    expect(keywords).toBe('template=2; workOrder=W&7');
  });

  it('ignores cells in extensions', async () => {
    const sheet =
      '<worksheet><sheetData><row><c><v>1</v></c></row></sheetData><extLst><ext><sheetData><row><c><v>9</v></c></row></sheetData></ext></extLst></worksheet>';
    expect(await readCells('', { 'xl/worksheets/sheet1.xml': sheet })).toEqual([['A1', 'number', '1']]);
  });

  it('refuses DOCTYPE, broken XML, endless nesting and endless text', async () => {
    const sheet = (xml: string) => readParts(workbookParts('', { 'xl/worksheets/sheet1.xml': xml }), 65_536);
    await expect(sheet('<!DOCTYPE x [<!ENTITY a "b">]><worksheet/>')).rejects.toMatchObject({
      code: 'xml-doctype',
    });
    await expect(sheet('<worksheet><sheetData></worksheet>')).rejects.toMatchObject({ code: 'xml-damaged' });
    await expect(sheet('<worksheet><sheetData>')).rejects.toMatchObject({ code: 'xml-damaged' });
    await expect(sheet('<worksheet>&lol;</worksheet>')).rejects.toMatchObject({ code: 'xml-damaged' });
    await expect(sheet(`<worksheet>${'<a>'.repeat(200)}`)).rejects.toMatchObject({ code: 'xml-too-deep' });
    await expect(sheet(`<worksheet>${'x'.repeat(1_200_000)}</worksheet>`)).rejects.toMatchObject({
      code: 'xml-too-long',
    });
  });

  it.each([
    ['application/vnd.openxmlformats-officedocument.wordprocessingml.document.main+xml', 'other-document'],
    ['application/vnd.ms-excel.sheet.binary.macroEnabled.main', 'binary-workbook'],
    ['application/vnd.ms-excel.sheet.macroEnabled.main+xml', 'macro-enabled'],
  ])('tells %s apart by its main part', async (type, code) => {
    const types = `<Types><Override PartName="/xl/workbook.xml" ContentType="${type}"/></Types>`;
    await expect(readCells('', { '[Content_Types].xml': types })).rejects.toMatchObject({ code });
  });

  it('refuses a workbook whose sheet is missing', async () => {
    const { 'xl/worksheets/sheet1.xml': _, ...rest } = workbookParts('');
    await expect(readParts(rest)).rejects.toMatchObject({ code: 'part-missing', params: { sheet: 'Set' } });
  });
});
