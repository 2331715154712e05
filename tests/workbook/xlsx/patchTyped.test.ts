import { packageOf, partsOf, rowsOf, textOf, worksheet } from './package';
import { dynamic, metadata, metadataPart, recalculated, row2, rows, times } from './patched';

describe('formulas typed into the file as in a cell', () => {
  const typed = worksheet(`<row r="1">${times}<c r="B1"><f>PACE.EVENT(A1:A2)</f></c></row>${row2}`);

  test('get the form Excel stores, spilling, with the part that this needs', async () => {
    const after = await recalculated(packageOf({ sheets: { Run: typed } }));
    expect(rowsOf(after)).toBe(
      `<row r="1">${times}<c r="B1" cm="1">${dynamic('B1:B2', '_xldudf_PACE_EVENT(A1:A2)')}<v>0.025</v></c></row><row r="2"><c r="A2"><v>25</v></c><c r="B2"><v>0.04</v></c></row>`,
    );
    expect(textOf(after, 'xl/metadata.xml')).toContain('fDynamic="1"');
    expect(textOf(after, '[Content_Types].xml')).toContain(
      `<Override PartName="/xl/metadata.xml" ContentType="${metadataPart.type}"/></Types>`,
    );
    expect(textOf(after, 'xl/_rels/workbook.xml.rels')).toMatch(
      /<Relationship Id="rId2" Type="[^"]*\/sheetMetadata" Target="metadata.xml"\/><\/Relationships>/,
    );
    expect(Buffer.from(await recalculated(after)).equals(after)).toBe(true);
  });

  test('use the entry that the workbook has for it', async () => {
    const part = metadata(
      '<metadataTypes count="2"><metadataType name="OTHER"/><metadataType name="XLDAPR"/></metadataTypes><futureMetadata name="XLDAPR" count="1"><bk/></futureMetadata><cellMetadata count="2"><bk><rc t="1" v="0"/></bk><bk><rc t="2" v="0"/></bk></cellMetadata>',
    );
    const after = await recalculated(
      packageOf({ sheets: { Run: typed }, parts: { [metadataPart.path]: part }, described: [metadataPart] }),
    );
    expect(rowsOf(after)).toContain('<c r="B1" cm="2">');
    expect(textOf(after, metadataPart.path)).toBe(part);
  });

  test('add an entry beside those for other things', async () => {
    const part = metadata(
      '<metadataTypes count="1"><metadataType name="XLRICHVALUE"/></metadataTypes><futureMetadata name="XLRICHVALUE" count="1"><bk/></futureMetadata><valueMetadata count="1"><bk><rc t="1" v="0"/></bk></valueMetadata>',
    );
    const after = await recalculated(
      packageOf({ sheets: { Run: typed }, parts: { [metadataPart.path]: part }, described: [metadataPart] }),
    );
    expect(rowsOf(after)).toContain('<c r="B1" cm="1">');
    const extended = textOf(after, metadataPart.path);
    expect(extended).toMatch(
      /<metadataTypes count="2">.*XLRICHVALUE.*XLDAPR.*<\/metadataTypes><futureMetadata name="XLRICHVALUE".*<futureMetadata name="XLDAPR".*<cellMetadata count="1"><bk><rc t="2" v="0"\/><\/bk><\/cellMetadata><valueMetadata/,
    );
  });

  test('a calculation chain that would be false is taken out, with what points to it', async () => {
    const chain = {
      path: 'xl/calcChain.xml',
      type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.calcChain+xml',
      kind: 'calcChain',
    };
    const withChain = (sheet: string): Uint8Array =>
      packageOf({
        sheets: { Run: sheet },
        parts: { [chain.path]: '<calcChain><c r="B1" i="1"/></calcChain>' },
        described: [chain],
      });
    const after = await recalculated(withChain(typed));
    expect(Object.keys(partsOf(after))).not.toContain(chain.path);
    expect(textOf(after, '[Content_Types].xml')).not.toContain('calcChain');
    expect(textOf(after, 'xl/_rels/workbook.xml.rels')).not.toContain('calcChain');
    const untouched = await recalculated(withChain(worksheet('<row r="1"><c r="B1"><f>1+1</f></c></row>')));
    expect(Object.keys(partsOf(untouched))).toContain(chain.path);
  });

  test('words in quotes are left alone', async () => {
    const after = await rows('<row r="1"><c r="A1"><f>"PACE.EVENT("&amp;1</f></c></row>');
    expect(after).toBe(
      '<row r="1"><c r="A1" t="str"><f>"PACE.EVENT("&amp;1</f><v>PACE.EVENT(1</v></c></row>',
    );
  });

  test('shared among cells: each value is its own, and one that spills gets a formula of its own', async () => {
    const shared = (first: string): string =>
      `<row r="1">${times}<c r="C1"><f t="shared" ref="C1:C3" si="0">${first}</f></c></row><row r="2"><c r="A2"><v>25</v></c></row><row r="3"><c r="A3"><v>20</v></c><c r="C3"><f t="shared" si="0"/></c></row>`;
    const one = await rows(shared('PACE.EVENT(A1)'));
    expect(one).toContain(
      '<c r="C1"><f t="shared" ref="C1:C3" si="0">_xldudf_PACE_EVENT(A1)</f><v>0.025</v></c>',
    );
    expect(one).toContain('<c r="C3"><f t="shared" si="0"/><v>0.05</v></c>');
    const many = await rows(shared('PACE.EVENT(A1:A2)'));
    expect(many).toContain(
      `<c r="C1" cm="1">${dynamic('C1:C2', '_xldudf_PACE_EVENT(A1:A2)')}<v>0.025</v></c>`,
    );
    expect(many).toContain(
      `<c r="C3" cm="1">${dynamic('C3:C4', '_xldudf_PACE_EVENT(A3:A4)')}<v>0.05</v></c>`,
    );
    expect(many).toContain('<row r="4"><c r="C4" t="str"><v></v></c></row>');
  });
});

test('a column of a table feeds a function, and the table stays as it was', async () => {
  const part =
    '<table xmlns="http://schemas.openxmlformats.org/spreadsheetml/2006/main" id="1" name="Run1" displayName="Run1" ref="A1:A3"><autoFilter ref="A1:A3"/><tableColumns count="1"><tableColumn id="1" name="t / s"/></tableColumns></table>';
  const relations =
    '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="rId1" Type="http://schemas.openxmlformats.org/officeDocument/2006/relationships/table" Target="../tables/table1.xml"/></Relationships>';
  const bytes = packageOf({
    sheets: {
      Run: worksheet(
        '<row r="1"><c r="A1" t="str"><v>t / s</v></c></row><row r="2"><c r="A2"><v>40</v></c><c r="C2"><f>_xldudf_PACE_EVENT(Run1[[#This Row],[t / s]])</f></c><c r="D2"><f>SUM(Run1[t / s])</f></c></row><row r="3"><c r="A3"><v>25</v></c></row>',
        { after: '<tableParts count="1"><tablePart r:id="rId1"/></tableParts>' },
      ),
    },
    parts: { 'xl/worksheets/_rels/sheet1.xml.rels': relations, 'xl/tables/table1.xml': part },
    described: [
      {
        path: 'xl/tables/table1.xml',
        type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.table+xml',
      },
    ],
  });
  const after = await recalculated(bytes);
  expect(rowsOf(after)).toContain('<f>_xldudf_PACE_EVENT(Run1[[#This Row],[t / s]])</f><v>0.025</v>');
  expect(rowsOf(after)).toContain('<f>SUM(Run1[t / s])</f><v>65</v>');
  expect(textOf(after, 'xl/tables/table1.xml')).toBe(part);
});
