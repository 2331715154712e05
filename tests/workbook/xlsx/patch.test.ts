import { randomBytes } from 'node:crypto';
import { recalculate } from '../../../workbook/commands/recalculate';
import { packageOf, partsOf, sharedStrings, rowsOf, textOf, worksheet } from './package';
import { dynamic, recalculated, rows, times } from './patched';

describe('what did not change', () => {
  const chart =
    '<c:chartSpace xmlns:c="http://schemas.openxmlformats.org/drawingml/2006/chart">\r\n <c:chart/></c:chartSpace>';
  const others = {
    'xl/charts/chart1.xml': chart,
    'xl/comments1.xml': '<comments><!-- kept --></comments>',
    'xl/vbaProject.bin': new Uint8Array(randomBytes(3000)),
    'customXml/item1.xml': '<anything   at="all" />',
    'docProps/app.xml': '<Properties/>',
  };
  const sheet = worksheet(
    `\n  <row r="1" spans="1:2" ht="20" x14ac:dyDescent="0.3" xmlns:x14ac="urn:x"><!-- note --><c  r='A1' s="0"><v>40.0</v></c><c r="B1"><f>A1/4</f><v>9</v></c></row>\n`.replace(
      'STALE',
      '9',
    ),
    {
      before: '<sheetPr><tabColor rgb="FF00FF00"/></sheetPr>',
      after: '<drawing r:id="rId1"/><extLst><ext uri="{x}"/></extLst>',
    },
  );
  const before = packageOf({
    sheets: {
      Run: sheet,
      Notes: worksheet('<row r="1"><c r="A1" t="inlineStr"><is><t>kept</t></is></c></row>'),
    },
    parts: others,
  });

  test('every other part is byte for byte as it was, in its place', async () => {
    const after = await recalculated(before);
    const was = partsOf(before);
    const is = partsOf(after);
    expect(Object.keys(is)).toEqual(Object.keys(was));
    const changed = Object.keys(was).filter((path) => !Buffer.from(was[path]).equals(is[path]));
    expect(changed).toEqual(['xl/worksheets/sheet1.xml']);
  });

  test('inside the changed sheet, all but the touched cell', async () => {
    const xml = textOf(await recalculated(before), 'xl/worksheets/sheet1.xml');
    expect(xml).toBe(sheet.replace('<v>9</v>', '<v>10</v>'));
  });

  test('a file whose values are right already comes back as the same bytes, times and packing too', async () => {
    const once = await recalculated(before);
    expect(Buffer.from(await recalculated(once)).equals(once)).toBe(true);
    const still = packageOf({
      sheets: { Run: worksheet('<row r="1"><c r="A1"><f>1+1</f><v>2</v></c></row>') },
      parts: others,
    });
    expect(Buffer.from(await recalculated(still)).equals(still)).toBe(true);
  });
});

describe('values of formulas', () => {
  test('missing and stale ones are written, each as its kind', async () => {
    const before = [
      '<c r="A1"><f>1/4</f></c>',
      '<c r="B1" s="3"><f>"a&lt;b"</f><v>1</v></c>',
      '<c r="C1" t="str"><f>2&gt;1</f><v>old</v></c>',
      '<c r="D1" t="b"><f>1/0</f><v>1</v></c>',
      '<c r="E1" t="e"><f>1+1</f><v>#N/A</v></c>',
      '<c r="F1" t="s"><f>3</f><v>0</v></c>',
    ];
    const after = [
      '<c r="A1"><f>1/4</f><v>0.25</v></c>',
      '<c r="B1" s="3" t="str"><f>"a&lt;b"</f><v>a&lt;b</v></c>',
      '<c r="C1" t="b"><f>2&gt;1</f><v>1</v></c>',
      '<c r="D1" t="e"><f>1/0</f><v>#DIV/0!</v></c>',
      '<c r="E1"><f>1+1</f><v>2</v></c>',
      '<c r="F1"><f>3</f><v>3</v></c>',
    ];
    const bytes = packageOf({
      sheets: { Run: worksheet(`<row r="1">${before.join('')}</row>`) },
      ...sharedStrings('<si><t>three</t></si>'),
    });
    expect(rowsOf(await recalculated(bytes))).toBe(`<row r="1">${after.join('')}</row>`);
  });

  test('all digits are kept', async () => {
    expect(
      await rows('<row r="1"><c r="A1"><v>7</v></c><c r="B1"><f>_xldudf_PACE_EVENT(A1)</f></c></row>'),
    ).toContain(`<v>${1 / 7}</v>`);
  });

  test('blank cells stay gaps and zeros readings', async () => {
    const after = await rows(
      `<row r="1">${times}<c r="B1" cm="1">${dynamic('B1:B3', '_xldudf_PACE_EVENT(A1:A3)')}</c></row><row r="2"/><row r="3"><c r="A3"><v>25</v></c></row>`,
    );
    expect(after).toContain('<c r="B2" t="str"><v></v></c>');
    expect(after).toContain('<c r="B3"><v>0.04</v></c>');
  });

  test('a shared formula gives each cell its own value and stays shared', async () => {
    const after = await rows(
      '<row r="1"><c r="A1"><v>2</v></c><c r="B1"><f t="shared" ref="B1:B2" si="0">A1*3</f><v>0</v></c></row><row r="2"><c r="A2"><v>5</v></c><c r="B2"><f t="shared" si="0"/><v>0</v></c></row>',
    );
    expect(after).toContain('<c r="B1"><f t="shared" ref="B1:B2" si="0">A1*3</f><v>6</v></c>');
    expect(after).toContain('<c r="B2"><f t="shared" si="0"/><v>15</v></c>');
  });

  test('a plain formula takes the cell of a range in its own row, and stays plain', async () => {
    const after = await rows(
      '<row r="1"><c r="A1"><v>2</v></c><c r="B1"><f>A1:A2*10</f><v>0</v></c></row><row r="2"><c r="A2"><v>3</v></c><c r="B2"><f>A1:A2*10</f><v>0</v></c></row>',
    );
    expect(after).toContain('<c r="B1"><f>A1:A2*10</f><v>20</v></c>');
    expect(after).toContain('<c r="B2"><f>A1:A2*10</f><v>30</v></c>');
  });

  test('the link before a name that another program left there stays in the file', async () => {
    const after = await rows(`<row r="1">${times}<c r="B1"><f>[2]!_xldudf_PACE_EVENT(A1)</f></c></row>`);
    expect(after).toContain('<f>[2]!_xldudf_PACE_EVENT(A1)</f><v>0.025</v>');
  });

  test('an array of fixed size keeps its size: #N/A beyond the result, one value everywhere', async () => {
    const after = await rows(
      `<row r="1"><c r="A1"><f t="array" ref="A1:A3">SEQUENCE(2)</f><v>0</v></c><c r="B1"><f t="array" ref="B1:B2">1+1</f><v>0</v></c></row><row r="2"><c r="A2"><v>0</v></c><c r="B2"><v>0</v></c></row><row r="3"><c r="A3"><v>0</v></c></row>`,
    );
    expect(after).toContain('<f t="array" ref="A1:A3">SEQUENCE(2)</f><v>1</v>');
    expect(after).toContain('<c r="A2"><v>2</v></c><c r="B2"><v>2</v></c>');
    expect(after).toContain('<c r="A3" t="e"><v>#N/A</v></c>');
  });

  test('prefixed elements and cells that do not say where they are', async () => {
    const xml =
      '<x:worksheet xmlns:x="http://schemas.openxmlformats.org/spreadsheetml/2006/main"><x:sheetData><x:row><x:c><x:v>40</x:v></x:c><x:c><x:f>A1*2</x:f></x:c></x:row></x:sheetData></x:worksheet>';
    const after = await recalculated(packageOf({ sheets: { Run: xml } }));
    expect(rowsOf(after)).toBe(
      '<x:row><x:c><x:v>40</x:v></x:c><x:c r="B1"><x:f>A1*2</x:f><x:v>80</x:v></x:c></x:row>',
    );
  });
});

describe('spills', () => {
  test('grow: ref, new cells in rows that were there, closed or missing, and the used area', async () => {
    const bytes = packageOf({
      sheets: {
        Run: worksheet(
          `<row r="1"><c r="A1"><v>4</v></c><c r="B1" cm="1">${dynamic('B1:B2', 'SEQUENCE(A1)')}<v>1</v></c><c r="D1"><v>1</v></c></row><row r="2" ht="30"><c r="B2"><v>2</v></c></row><row r="3" ht="40"/>`,
          { before: '<dimension ref="A1:D3"/>' },
        ),
      },
    });
    const after = await recalculated(bytes);
    expect(rowsOf(after)).toBe(
      `<row r="1"><c r="A1"><v>4</v></c><c r="B1" cm="1">${dynamic('B1:B4', 'SEQUENCE(A1)')}<v>1</v></c><c r="D1"><v>1</v></c></row><row r="2" ht="30"><c r="B2"><v>2</v></c></row><row r="3" ht="40"><c r="B3"><v>3</v></c></row><row r="4"><c r="B4"><v>4</v></c></row>`,
    );
    expect(textOf(after, 'xl/worksheets/sheet1.xml')).toContain('<dimension ref="A1:D4"/>');
  });

  test('grow between cells that were there', async () => {
    const after = await rows(
      `<row r="1"><c r="A1" cm="1">${dynamic('A1', 'SEQUENCE(2,2)')}<v>1</v></c><c r="D1"><v>7</v></c></row><row r="2"><c r="D2"><v>8</v></c></row>`,
    );
    expect(after).toContain('<c r="B1"><v>2</v></c><c r="D1">');
    expect(after).toContain('<row r="2"><c r="A2"><v>3</v></c><c r="B2"><v>4</v></c><c r="D2">');
  });

  test('shrink: cells are taken away, but what has a look keeps it', async () => {
    const after = await rows(
      `<row r="1"><c r="A1"><v>1</v></c><c r="B1" cm="1">${dynamic('B1:B3', 'SEQUENCE(A1)')}<v>1</v></c></row><row r="2"><c r="B2"><v>2</v></c></row><row r="3"><c r="B3" s="4"><v>3</v></c></row>`,
    );
    expect(after).toBe(
      `<row r="1"><c r="A1"><v>1</v></c><c r="B1" cm="1">${dynamic('B1', 'SEQUENCE(A1)')}<v>1</v></c></row><row r="2"></row><row r="3"><c r="B3" s="4"/></row>`,
    );
  });

  test('shrink to an error: nothing stays behind', async () => {
    const after = await rows(
      `<row r="1"><c r="A1"><v>0</v></c><c r="B1" cm="1">${dynamic('B1:B2', '_xldudf_PACE_EVENT(A1:A2)')}<v>1</v></c></row><row r="2"><c r="B2"><v>2</v></c></row>`,
    );
    expect(after).toContain(
      `<c r="B1" cm="1" t="e">${dynamic('B1', '_xldudf_PACE_EVENT(A1:A2)')}<v>#VALUE!</v></c>`,
    );
    expect(after).toContain('<row r="2"></row>');
  });

  test('without room: the error that the format has for it, and what is in the way stays', async () => {
    const result = await recalculate(
      packageOf({
        sheets: {
          Run: worksheet(
            `<row r="1"><c r="A1" cm="1">${dynamic('A1', 'SEQUENCE(3)')}</c></row><row r="2"><c r="A2"><v>5</v></c></row>`,
          ),
        },
      }),
    );
    expect(rowsOf(result.bytes)).toContain(
      `<c r="A1" cm="1" t="e">${dynamic('A1', 'SEQUENCE(3)')}<v>#VALUE!</v></c>`,
    );
    expect(rowsOf(result.bytes)).toContain('<c r="A2"><v>5</v></c>');
    expect(result.errors).toEqual([
      { sheet: 'Run', row: 0, column: 0, error: expect.objectContaining({ code: '#SPILL!' }) },
    ]);
  });

  test('make room for one another: one leaves a cell, another takes it', async () => {
    const after = await rows(
      `<row r="1"><c r="A1" cm="1">${dynamic('A1:A3', 'SEQUENCE(2)')}<v>1</v></c></row><row r="2"><c r="A2"><v>2</v></c></row><row r="3"><c r="A3"><v>9</v></c></row>`,
    );
    expect(after).toContain('<row r="3"></row>');
  });
});
