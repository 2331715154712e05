/**
 * Notes beside cells: a comments part, and a drawing that says where each note stands (ISO/IEC 29500-1, 18.7,
 * and -4, 8.1). Where a sheet has both already, ours are added to them.
 */
import { cellName } from '../../functions/address';
import { addDefaultType, addPart, freePath, relate } from '../xlsx/addPart';
import { columnWidths } from '../xlsx/columnWidths';
import { applyEdits, insertion, type Edit } from '../xlsx/edits';
import { namespacesOf } from '../xlsx/namespaces';
import { elementsIn, readXml, relationshipsOf, type SheetPart } from '../xlsx/parts';
import { encodeXml, localName, scanXml, tagStart, xmlText } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';
import { wrapped } from './wrapped';

export interface Note {
  readonly row: number;
  readonly column: number;
  readonly text: string;
}

/** Of a column, in characters. */
type WidthOf = (column: number) => number;

const author = 'Flaskpace';
const head = '<?xml version="1.0" encoding="UTF-8" standalone="yes"?>\n';
const commentsType = 'application/vnd.openxmlformats-officedocument.spreadsheetml.comments+xml';
const drawingType = 'application/vnd.openxmlformats-officedocument.vmlDrawing';

/** A cell that has a note already keeps that one alone. */
export function addNotes(pack: Package, sheet: SheetPart, notes: readonly Note[]): void {
  const widthOf = columnWidths(readXml(pack, sheet.path), sheet.path);
  const relations = relationshipsOf(pack, sheet.path);
  const comments = relations.find(({ kind }) => kind === 'comments')?.path;
  const drawing = relations.find(({ kind }) => kind === 'vmlDrawing')?.path;
  // comments without a place to show them, or the other way round: not a file to guess about
  if ((comments === undefined) !== (drawing === undefined)) return;
  if (comments === undefined || drawing === undefined) return addParts(pack, sheet, notes, widthOf);
  const taken = new Set(
    elementsIn(pack, comments)
      .filter(({ name }) => name === 'comment')
      .map(({ attributes }) => attributes.ref),
  );
  const free = notes.filter(({ row, column }) => !taken.has(cellName(row, column)));
  if (free.length === 0) return;
  extendComments(pack, comments, free);
  extendDrawing(pack, drawing, free, widthOf);
}

function addParts(pack: Package, sheet: SheetPart, notes: readonly Note[], widthOf: WidthOf): void {
  const comments = freePath(pack, 'xl/comments', '.xml');
  const drawing = freePath(pack, 'xl/drawings/vmlDrawing', '.vml');
  const { main, office } = namespacesOf(readXml(pack, sheet.path));
  const list = notes.map((note) => commentXml(note, 0, '')).join('');
  addPart(
    pack,
    comments,
    `${head}<comments xmlns="${main}"><authors><author>${author}</author></authors><commentList>${list}</commentList></comments>`,
    commentsType,
  );
  addDefaultType(pack, 'vml', drawingType);
  pack.write(drawing, encodeXml(drawingXml(notes, widthOf)));
  relate(pack, sheet.path, comments, `${office}/comments`);
  const id = relate(pack, sheet.path, drawing, `${office}/vmlDrawing`);
  pack.write(sheet.path, encodeXml(withDrawing(readXml(pack, sheet.path), sheet.path, id, office)));
}

/** What may follow the reference to the drawing; before the first of these it has its place. */
const after = new Set([
  'legacyDrawingHF',
  'drawingHF',
  'picture',
  'oleObjects',
  'controls',
  'webPublishItems',
  'tableParts',
  'extLst',
]);

function withDrawing(xml: string, path: string, id: string, office: string): string {
  let place = -1;
  let prefix = '';
  let depth = 0;
  scanXml(xml, path, {
    open({ name }, end) {
      depth += 1;
      if (depth === 1) prefix = name.slice(0, name.length - localName(name).length);
      if (depth === 2 && place < 0 && after.has(localName(name))) place = tagStart(xml, end);
    },
    close(_tag, end) {
      depth -= 1;
      if (depth === 0 && place < 0) place = tagStart(xml, end);
    },
  });
  const element = `<${prefix}legacyDrawing xmlns:r="${office}" r:id="${id}"/>`;
  return applyEdits(xml, [insertion(place, element)]);
}

const commentXml = ({ row, column, text }: Note, authorId: number, prefix: string): string => {
  const p = prefix;
  return `<${p}comment ref="${cellName(row, column)}" authorId="${authorId}"><${p}text><${p}r><${p}t xml:space="preserve">${xmlText(text)}</${p}t></${p}r></${p}text></${p}comment>`;
};

function extendComments(pack: Package, path: string, notes: readonly Note[]): void {
  const xml = readXml(pack, path);
  const authors = elementsIn(pack, path).filter(({ name }) => name === 'author');
  const edits: Edit[] = [];
  scanXml(xml, path, {
    open: () => undefined,
    close({ name }, end) {
      const prefix = name.slice(0, name.length - localName(name).length);
      const start = tagStart(xml, end);
      if (localName(name) === 'authors')
        edits.push(insertion(start, `<${prefix}author>${author}</${prefix}author>`));
      if (localName(name) === 'commentList')
        edits.push(insertion(start, notes.map((note) => commentXml(note, authors.length, prefix)).join('')));
    },
  });
  pack.write(path, encodeXml(applyEdits(xml, edits)));
}

/** The drawing is older than the format, and seldom well-formed enough to read: ours goes before its end. */
function extendDrawing(pack: Package, path: string, notes: readonly Note[], widthOf: WidthOf): void {
  const xml = readXml(pack, path);
  const end = xml.lastIndexOf('</xml>');
  if (end < 0) return;
  const ids = [...xml.matchAll(/_s(\d+)"/g)].map(([, id]) => Number(id));
  const first = ids.reduce((most, id) => Math.max(most, id), 1024) + 1;
  const type = xml.includes('id="_x0000_t202"') ? '' : shapeType;
  const shapes = notes.map((note, n) => shapeXml(note, first + n, widthOf)).join('');
  pack.write(path, encodeXml(applyEdits(xml, [insertion(end, type + shapes)])));
}

const shapeType =
  '<v:shapetype id="_x0000_t202" coordsize="21600,21600" o:spt="202" path="m,l,21600r21600,l21600,xe"><v:stroke joinstyle="miter"/><v:path gradientshapeok="t" o:connecttype="rect"/></v:shapetype>';

const drawingXml = (notes: readonly Note[], widthOf: WidthOf): string =>
  `<xml xmlns:v="urn:schemas-microsoft-com:vml" xmlns:o="urn:schemas-microsoft-com:office:office" xmlns:x="urn:schemas-microsoft-com:office:excel"><o:shapelayout v:ext="edit"><o:idmap v:ext="edit" data="1"/></o:shapelayout>${shapeType}${notes.map((note, n) => shapeXml(note, 1025 + n, widthOf)).join('')}</xml>`;

/** Characters in a line of a note, and how high that is, in points. */
const line = { length: 60, height: 15 };

/** A note covers as many cells as its text needs, from the column beside its own on. */
function shapeXml({ row, column, text }: Note, id: number, widthOf: WidthOf): string {
  const lines = text.split('\n').flatMap((paragraph) => wrapped(paragraph, line.length));
  const rows = lines.length + 1;
  let [end, width] = [column + 1, 0];
  for (; width < line.length && end < column + 20; end++) width += widthOf(end);
  return `<v:shape id="_x0000_s${id}" type="#_x0000_t202" style="position:absolute;margin-left:60pt;margin-top:2pt;width:330pt;height:${rows * line.height}pt;z-index:${id};visibility:hidden" fillcolor="#ffffe1" o:insetmode="auto"><v:fill color2="#ffffe1"/><v:shadow on="t" color="black" obscured="t"/><v:path o:connecttype="none"/><v:textbox style="mso-direction-alt:auto"><div style="text-align:left"></div></v:textbox><x:ClientData ObjectType="Note"><x:MoveWithCells/><x:SizeWithCells/><x:Anchor>${column + 1}, 15, ${row}, 2, ${end}, 15, ${row + rows}, 2</x:Anchor><x:AutoFill>False</x:AutoFill><x:Row>${row}</x:Row><x:Column>${column}</x:Column></x:ClientData></v:shape>`;
}
