/** Calls of ours that stand in tables, conditional formats and validations rather than in cells. */
import { recalculate } from '../../../workbook/commands/recalculate';
import { reportOf } from '../../../workbook/copying/report';
import { elsewhereLine } from '../../../workbook/handover/elsewhere';
import { handOver, type HandedOver } from '../../../workbook/handover/handOver';
import { packageOf, rowsOf, textOf, worksheet, type PackageOptions } from '../xlsx/package';

const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const handed = (options: PackageOptions): Promise<HandedOver> =>
  handOver(packageOf(options), { version: '1.2.3', date: '2026-12-01' });

describe('tables', () => {
  /** Times in A2:A3 under the head `t / s`, 1/t beside them. */
  const withTable = (formula: string): PackageOptions => ({
    sheets: {
      Run: worksheet(
        '<row r="1"><c r="A1" t="inlineStr"><is><t>t / s</t></is></c><c r="B1" t="inlineStr"><is><t>rate</t></is></c></row>' +
          [40, 25]
            .map(
              (t, n) =>
                `<row r="${n + 2}"><c r="A${n + 2}"><v>${t}</v></c><c r="B${n + 2}"><f>${formula}</f></c></row>`,
            )
            .join('') +
          '<row r="5"><c r="D5"><f>_xldudf_PACE_BETWEEN(Timings[t / s],Timings[[#Data],[t / s]],25,40)</f></c></row>',
        { after: '<tableParts count="1"><tablePart r:id="rId1"/></tableParts>' },
      ),
    },
    parts: {
      'xl/worksheets/_rels/sheet1.xml.rels': `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="rId1" Type="${office}/table" Target="../tables/table1.xml"/></Relationships>`,
      'xl/tables/table1.xml': `<table xmlns="${main}" id="1" name="Timings" displayName="Timings" ref="A1:B3"><autoFilter ref="A1:B3"/><tableColumns count="2"><tableColumn id="1" name="t / s"/><tableColumn id="2" name="rate"><calculatedColumnFormula>${formula}</calculatedColumnFormula></tableColumn></tableColumns></table>`,
    },
    described: [
      {
        path: 'xl/tables/table1.xml',
        type: 'application/vnd.openxmlformats-officedocument.spreadsheetml.table+xml',
      },
    ],
  });
  const ours = '_xldudf_PACE_EVENT(Timings[[#This Row],[t / s]])';

  test.each([ours, '_xldudf_PACE_EVENT(Timings[@[t / s]])', '_xldudf_PACE_EVENT(A2*1)'])(
    '%s is worked out in its row',
    async (formula) => {
      const { bytes, errors } = await recalculate(packageOf(withTable(formula)));
      expect(errors).toEqual([]);
      expect(rowsOf(bytes)).toContain('<v>0.025</v>');
      // the slope of t against itself, of a rising column
      expect(rowsOf(bytes)).toMatch(/<c r="D5".*<v>1<\/v>/);
    },
  );

  test('in a copy the cells name their own row, and no new row would call us', async () => {
    const { bytes, formulas } = await handed(withTable(ours));
    expect(formulas.map(({ why }) => why)).toEqual([undefined, undefined, undefined]);
    expect(rowsOf(bytes)).toMatch(/<c r="B3"><f>[^<]*1\/Run!A3[^<]*<\/f><v>0\.04<\/v>/);
    expect(textOf(bytes, 'xl/tables/table1.xml')).toContain('<tableColumn id="2" name="rate"></tableColumn>');
  });

  test('a column of the workbook’s own keeps its formula', async () => {
    const own = 'Timings[[#This Row],[t / s]]*2';
    const { bytes } = await handed(withTable(own));
    expect(textOf(bytes, 'xl/tables/table1.xml')).toContain(
      `<calculatedColumnFormula>${own}</calculatedColumnFormula>`,
    );
  });
});

describe('conditional formats and validations', () => {
  const after = `<conditionalFormatting sqref="A1:A9 C1"><cfRule type="expression" priority="1"><formula>_xldudf_PACE_EVENT(A1)&gt;0.03</formula></cfRule><cfRule type="expression" priority="2"><formula>A1&gt;3</formula></cfRule></conditionalFormatting><dataValidations count="1"><dataValidation type="custom" sqref="A1"><formula1>PACE.EVENT(A1)&lt;1</formula1></dataValidation></dataValidations><extLst><ext xmlns:x14="http://schemas.microsoft.com/office/spreadsheetml/2009/9/main" uri="{78C0D931-6437-407d-A8EE-F0AAD7539E65}"><x14:conditionalFormattings><x14:conditionalFormatting xmlns:xm="http://schemas.microsoft.com/office/excel/2006/main"><x14:cfRule type="expression" priority="3"><xm:f>_xldudf_PACE_CONVERSION(A1,Other!A1,0)=1</xm:f></x14:cfRule><xm:sqref>B2:B3</xm:sqref></x14:conditionalFormatting></x14:conditionalFormattings></ext></extLst>`;
  const options: PackageOptions = {
    sheets: {
      'My run': worksheet('<row r="1"><c r="A1"><v>40</v></c></row>', { after }),
      Other: worksheet('<row r="1"><c r="A1"><v>1</v></c></row>'),
    },
  };

  test('are told of, each with what is lost, and stay to the letter', async () => {
    const copy = await handed(options);
    const { bytes, elsewhere } = copy;
    expect(elsewhere.map(elsewhereLine)).toEqual([
      "a conditional format on 'My run'!A1:A9 C1 calls PACE.EVENT: without the add-in it shows no more",
      "a validation on 'My run'!A1 calls PACE.EVENT: without the add-in it holds nothing back any more",
      "a conditional format on 'My run'!B2:B3 calls PACE.CONVERSION: without the add-in it shows no more",
    ]);
    expect(reportOf(copy).left).toEqual([
      {
        why: 'a conditional format: without the add-in it shows no more',
        cells: ["'My run'!A1:A9 C1", "'My run'!B2:B3"],
      },
      { why: 'a validation: without the add-in it holds nothing back any more', cells: ["'My run'!A1"] },
    ]);
    expect(textOf(bytes, 'xl/worksheets/sheet1.xml')).toContain(after);
    expect(textOf(bytes, 'xl/worksheets/sheet3.xml')).toContain('=PACE.EVENT(A1)&gt;0.03');
  });
});
