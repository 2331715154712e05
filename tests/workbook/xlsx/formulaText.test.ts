import { callsOurs, filedFormula, typedFormula, withFiledNames } from '../../../workbook/xlsx/formulaText';

describe('as typed ↔ as filed', () => {
  test.each([
    ['PACE.EVENT(A1:A9)', '_xldudf_PACE_EVENT(A1:A9)'],
    ['SUM(PACE.EVENT (A1))', 'SUM(_xldudf_PACE_EVENT (A1))'],
    ['STDEV.S(A1:A9)+T.INV.2T(0.05,3)', '_xlfn.STDEV.S(A1:A9)+_xlfn.T.INV.2T(0.05,3)'],
    ['FILTER(SORT(A1:A9),A1:A9>0)', '_xlfn._xlws.FILTER(_xlfn._xlws.SORT(A1:A9),A1:A9>0)'],
    ['SUM(F2#)', 'SUM(_xlfn.ANCHORARRAY(F2))'],
    ["SUM('Run #2'!F2#,Run1!$F$2#)", "SUM(_xlfn.ANCHORARRAY('Run #2'!F2),_xlfn.ANCHORARRAY(Run1!$F$2))"],
    ['\'PACE.EVENT(\'!A1&"SORT("', '\'PACE.EVENT(\'!A1&"SORT("'],
    ['SUM(A1,B2)/Run1[V]', 'SUM(A1,B2)/Run1[V]'],
    ['LET(x,A1,y,x*2,x+y)+xx', '_xlfn.LET(_xlpm.x,A1,_xlpm.y,_xlpm.x*2,_xlpm.x+_xlpm.y)+xx'],
    ['MAP(A1:A3,LAMBDA(v,v*2))', '_xlfn.MAP(A1:A3,_xlfn.LAMBDA(_xlpm.v,_xlpm.v*2))'],
  ])('%s', (typed, filed) => {
    expect(filedFormula(typed)).toBe(filed);
    expect(typedFormula(filed)).toBe(typed);
  });

  test.each([
    ['[2]!_xldudf_PACE_EVENT(A1)', 'PACE.EVENT(A1)'],
    ['_XLDUDF_pace_event(A1)', 'PACE.EVENT(A1)'],
    ['_xlfn.SINGLE(A2:A9)*2', '@A2:A9*2'],
    ['_xldudf_OTHER_THING(A1)', '_xldudf_OTHER_THING(A1)'],
  ])('%s is typed %s', (filed, typed) => expect(typedFormula(filed)).toBe(typed));
});

test('@ goes without saying in a plain formula, and is a function in an array', () => {
  expect(filedFormula('@A2:A9*2+SUM(@Run!B:B)')).toBe('A2:A9*2+SUM(Run!B:B)');
  expect(filedFormula('@A2:A9*2&"@A1:A2"', 'array')).toBe('_xlfn.SINGLE(A2:A9)*2&"@A1:A2"');
});

test('only our own calls are renamed where a file is patched', () => {
  expect(withFiledNames('pace.event(A1)+STDEV.S(A1:A2)+F2#')).toBe(
    '_xldudf_PACE_EVENT(A1)+STDEV.S(A1:A2)+F2#',
  );
  expect(withFiledNames('PACE.NOSUCH(A1)')).toBe('PACE.NOSUCH(A1)');
});

test('a call of ours is known under both names, and not in words', () => {
  expect(callsOurs('1+PACE.EVENT(A1)')).toBe(true);
  expect(callsOurs('1+_xldudf_PACE_EVENT(A1)')).toBe(true);
  expect(callsOurs('"PACE.EVENT(A1)"&XPACE.EVENT(A1)')).toBe(false);
});
