/** Workbooks made up at random, the same for the same seed: whatever can stand on a sheet beside whatever. */
import { areaName, cellName, type Area } from '../../../functions/address';
import { uniform } from '../../support/random';
import { packageOf, worksheet } from './package';

const [rows, columns] = [9, 6];
const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const office = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';

const formulas = [
  'PACE.EVENT({40;25})',
  'PACE.EVENT({40,25,20})',
  'SEQUENCE(2,2)',
  '1+1',
  'SUM(A1:A9)',
  'IF(1&gt;2,1,"no")',
];

export interface MadeUp {
  /** One sheet, `Run`. */
  readonly bytes: Uint8Array;
  /** The names of the cells that are merged with others. */
  readonly merged: readonly string[];
  readonly rows: number;
  readonly columns: number;
}

/** Some shared and array formulas, merged cells, a table, a note; then a third of the cells that are left. */
export function madeUp(seed: number): MadeUp {
  const next = uniform(seed);
  const chance = (share: number): boolean => next() < share;
  const one = <T>(list: readonly T[]): T => list[Math.floor(next() * list.length)];
  const cells = new Map<string, string>();
  const taken = new Set<string>();
  const merged: Area[] = [];

  /** An area that nothing else has; none where it was not found soon. */
  function place(height: number, width: number): Area | undefined {
    for (let attempt = 0; attempt < 9; attempt++) {
      const row = Math.floor(next() * (rows - height + 1));
      const column = Math.floor(next() * (columns - width + 1));
      const area = { row, column, rows: height, columns: width };
      if (placesIn(area).some((cell) => taken.has(cell))) continue;
      placesIn(area).forEach((cell) => taken.add(cell));
      return area;
    }
    return undefined;
  }
  const put = (name: string, inside: string, attributes = ''): void =>
    void cells.set(name, `<c r="${name}"${attributes}>${inside}</c>`);
  const stale = (): string => (chance(0.5) ? '<v>7</v>' : '');
  const number = (): string => `<v>${Math.round(100 * next())}</v>`;

  function shared(index: number): void {
    const area = place(2 + Math.floor(next() * 3), 1);
    if (!area) return;
    const [first, ...others] = placesIn(area);
    const before = cellName(area.row, Math.max(area.column - 1, 0));
    const text = one([`${before}*2`, `_xldudf_PACE_EVENT(10+ROW(${before}))`, 'PACE.EVENT({3;2})']);
    put(first, `<f t="shared" ref="${areaName(area)}" si="${index}">${text}</f>${stale()}`);
    for (const other of others) put(other, `<f t="shared" si="${index}"/>${stale()}`);
  }

  /** In the corner, where nothing can spill into it: the engine would let it, and Excel would not. */
  function array(): void {
    const area = { row: 0, column: 0, rows: 2, columns: 2 };
    const [first, ...others] = placesIn(area);
    [first, ...others].forEach((cell) => taken.add(cell));
    const text = one(['TRANSPOSE({1,2;3,4})', '_xldudf_PACE_EVENT({1,2;4,5})', '{1,2;3,4}*10']);
    put(first, `<f t="array" ref="${areaName(area)}">${text}</f>${stale()}`);
    for (const other of others) put(other, number());
  }

  /** It has become shorter since the file was saved. */
  function spilled(): void {
    const area = place(3, 1);
    if (!area) return;
    const [first, ...others] = placesIn(area);
    const text = one(['_xldudf_PACE_EVENT({5;4})', '{5;4}*2']);
    put(first, `<f t="array" ref="${areaName(area)}">${text}</f>${stale()}`, ' cm="1"');
    for (const other of others) put(other, number(), chance(0.5) ? ' s="0"' : '');
  }

  function merge(): void {
    const area = place(1 + Math.floor(next() * 2), 2);
    if (!area) return;
    merged.push(area);
    const [first, ...others] = placesIn(area);
    // said in built-in functions, the last would be an array formula, which cannot stand here
    const text = chance(0.5) ? one(formulas) : '_xldudf_PACE_BETWEEN({0;1;2},{0;2;4},0.5,1.5)';
    put(first, chance(0.3) ? number() : `<f>${text}</f>${stale()}`);
    if (chance(0.5)) others.forEach((other) => put(other, '', ' s="0"'));
  }

  function table(): string | undefined {
    const area = place(3, 2);
    if (!area) return undefined;
    const text = one(['Made[[#This Row],[t]]*2', '_xldudf_PACE_EVENT(Made[[#This Row],[t]])']);
    placesIn(area).forEach((name, n) => {
      if (n < 2) put(name, `<is><t>${n === 0 ? 't' : 'r'}</t></is>`, ' t="inlineStr"');
      else put(name, n % 2 === 0 ? number() : `<f>${text}</f>${stale()}`);
    });
    return `<table xmlns="${main}" id="1" name="Made" displayName="Made" ref="${areaName(area)}"><tableColumns count="2"><tableColumn id="1" name="t"/><tableColumn id="2" name="r"><calculatedColumnFormula>${text}</calculatedColumnFormula></tableColumn></tableColumns></table>`;
  }

  if (chance(0.5)) array();
  [0, 1].filter(() => chance(0.6)).forEach(shared);
  if (chance(0.5)) spilled();
  if (chance(0.6)) merge();
  const made = chance(0.5) ? table() : undefined;
  const noted = chance(0.5) ? cellName(Math.floor(next() * rows), Math.floor(next() * columns)) : undefined;
  for (const name of placesIn({ row: 0, column: 0, rows, columns })) {
    if (taken.has(name) || !chance(0.33)) continue;
    put(name, chance(0.5) ? number() : `<f>${one(formulas)}</f>${stale()}`);
  }
  const bytes = written(cells, merged, made, noted);
  return { bytes, merged: merged.flatMap(placesIn), rows, columns };
}

const placesIn = (area: Area): string[] =>
  Array.from({ length: area.rows * area.columns }, (_, n) =>
    cellName(area.row + Math.floor(n / area.columns), area.column + (n % area.columns)),
  );

function written(
  cells: ReadonlyMap<string, string>,
  merged: readonly Area[],
  table: string | undefined,
  noted: string | undefined,
): Uint8Array {
  const lines = Array.from({ length: rows }, (_, row) => {
    const line = placesIn({ row, column: 0, rows: 1, columns }).flatMap((name) => cells.get(name) ?? []);
    return line.length === 0 && row % 2 === 0 ? '' : `<row r="${row + 1}">${line.join('')}</row>`;
  });
  const merges = merged.map((area) => `<mergeCell ref="${areaName(area)}"/>`);
  const after = [
    merges.length > 0 ? `<mergeCells count="${merges.length}">${merges.join('')}</mergeCells>` : '',
    noted ? '<legacyDrawing r:id="rId2"/>' : '',
    table ? '<tableParts count="1"><tablePart r:id="rId3"/></tableParts>' : '',
  ].join('');
  const relation = (id: number, kind: string, target: string): string =>
    `<Relationship Id="rId${id}" Type="${office}/${kind}" Target="../${target}"/>`;
  const relations = [
    ...(noted
      ? [relation(1, 'comments', 'comments1.xml'), relation(2, 'vmlDrawing', 'drawings/vmlDrawing1.vml')]
      : []),
    ...(table ? [relation(3, 'table', 'tables/table1.xml')] : []),
  ];
  const type = 'application/vnd.openxmlformats-officedocument.spreadsheetml';
  return packageOf({
    sheets: { Run: worksheet(lines.join(''), { after }) },
    parts: {
      'xl/worksheets/_rels/sheet1.xml.rels': `<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">${relations.join('')}</Relationships>`,
      ...(noted
        ? {
            'xl/comments1.xml': `<comments xmlns="${main}"><authors><author>Ada</author></authors><commentList><comment ref="${noted}" authorId="0"><text><t>mine</t></text></comment></commentList></comments>`,
            'xl/drawings/vmlDrawing1.vml':
              '<xml xmlns:v="urn:schemas-microsoft-com:vml"><v:shape id="_x0000_s1025"></v:shape></xml>',
          }
        : {}),
      ...(table ? { 'xl/tables/table1.xml': table } : {}),
    },
    described: [
      ...(noted ? [{ path: 'xl/comments1.xml', type: `${type}.comments+xml` }] : []),
      ...(table ? [{ path: 'xl/tables/table1.xml', type: `${type}.table+xml` }] : []),
    ],
  });
}
