/** A sheet's XML with the place of every cell in it, so that one can be changed and the rest left alone. */
import { columnIndex } from '../../functions/address';
import { localName, scanXml, tagStart } from './xml';

/** Places in the text: `end` is the first character after. */
export interface Span {
  readonly start: number;
  readonly end: number;
}

/** An element with room for content: `<row …>` `</row>`, or `<row …/>` where `closed`. */
export interface Holder extends Span {
  readonly openEnd: number;
  /** Where the closing tag starts; that of the element itself where it is closed at once. */
  contentEnd: number;
  end: number;
  readonly closed: boolean;
}

export interface ScannedChild extends Span {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  text: string;
  end: number;
}

export interface ScannedCell extends Holder {
  readonly row: number;
  readonly column: number;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: ScannedChild[];
}

export interface ScannedRow extends Holder {
  readonly row: number;
  /** Those that were kept. */
  readonly cells: ScannedCell[];
  /** Some cell tells its column only by following another. */
  countsCells: boolean;
}

/** One width for a stretch of columns, counted from 0; in characters. */
export interface ScannedWidth {
  readonly first: number;
  readonly last: number;
  readonly width: number;
}

export interface ScannedSheet {
  /** `x:` where the part writes `<x:row>`. */
  readonly prefix: string;
  readonly rows: readonly ScannedRow[];
  readonly data?: Holder;
  readonly dimension?: Span & { readonly ref: string };
  readonly widths: readonly ScannedWidth[];
}

export const childOf = (cell: ScannedCell, name: string): ScannedChild | undefined =>
  cell.children.find((child) => child.name === name);

/**
 * @param keeps asked once a cell is read to its end; what nobody will look at again need not be kept
 * @throws NotAWorkbook where the XML is not well formed
 */
export function scanSheet(
  xml: string,
  part: string,
  keeps: (cell: ScannedCell) => boolean = () => true,
): ScannedSheet {
  const rows: ScannedRow[] = [];
  const widths: ScannedWidth[] = [];
  let prefix = '';
  let data: Held | undefined;
  let dimension: ScannedSheet['dimension'];
  let row: HeldRow | undefined;
  let cell: HeldCell | undefined;
  let child: ScannedChild | undefined;
  let lastColumn = -1;
  let depth = 0;
  /** Whether what comes next is text of a cell: not the space between elements, nor a phonetic hint. */
  let isText = false;
  let isHint = false;

  scanXml(xml, part, {
    open({ name: full, attributes, isSelfClosing }, end) {
      depth += 1;
      const name = localName(full);
      if (name === 'dimension' && depth === 2) {
        dimension = { start: tagStart(xml, end), end, ref: attributes.ref };
      } else if (name === 'col' && depth === 3 && attributes.width !== undefined) {
        const { min, max, width } = attributes;
        widths.push({ first: Number(min) - 1, last: Number(max) - 1, width: Number(width) });
      } else if (name === 'sheetData' && depth === 2) {
        prefix = full.slice(0, full.length - name.length);
        data = new Held(xml, end, isSelfClosing);
      } else if (!data || data.end >= 0) {
        return;
      } else if (name === 'row' && depth === 3) {
        const number = attributes.r === undefined ? (rows.at(-1)?.row ?? -1) + 1 : Number(attributes.r) - 1;
        row = new HeldRow(xml, end, isSelfClosing, number);
        rows.push(row);
        lastColumn = -1;
      } else if (name === 'c' && depth === 4 && row) {
        const named = attributes.r === undefined ? undefined : columnIndex(attributes.r);
        row.countsCells ||= named === undefined;
        lastColumn = named ?? lastColumn + 1;
        cell = new HeldCell(xml, end, isSelfClosing, row.row, lastColumn, attributes);
      } else if (depth === 5 && cell) {
        child = { start: tagStart(xml, end), end: -1, name, attributes, text: '' };
        cell.children.push(child);
        isText = name !== 'is';
      } else if (cell) {
        isHint ||= name === 'rPh';
        isText = name === 't' && !isHint;
      }
    },
    close({ name }, end) {
      isText = false;
      if (localName(name) === 'rPh') isHint = false;
      if (depth === 5 && child) {
        child.end = end;
        child = undefined;
      }
      if (depth === 4 && cell) {
        cell.shut(xml, end);
        if (keeps(cell)) row?.cells.push(cell);
        cell = undefined;
      }
      if (depth === 3 && row) {
        row.shut(xml, end);
        row = undefined;
      }
      if (depth === 2 && data && data.end < 0) data.shut(xml, end);
      depth -= 1;
    },
    text(text) {
      if (child && isText) child.text += text;
    },
  });
  return { prefix, rows, data, dimension, widths };
}

/** Classes, since a sheet has millions of cells: put together from parts, they would take most of the time of reading it. */
class Held implements Holder {
  readonly start: number;
  contentEnd: number;
  end: number;

  constructor(
    xml: string,
    readonly openEnd: number,
    readonly closed: boolean,
  ) {
    this.start = tagStart(xml, openEnd);
    this.contentEnd = closed ? this.start : -1;
    this.end = closed ? openEnd : -1;
  }

  shut(xml: string, end: number): void {
    if (this.closed) return;
    this.contentEnd = tagStart(xml, end);
    this.end = end;
  }
}

class HeldRow extends Held implements ScannedRow {
  readonly cells: ScannedCell[] = [];
  countsCells = false;

  constructor(
    xml: string,
    openEnd: number,
    closed: boolean,
    readonly row: number,
  ) {
    super(xml, openEnd, closed);
  }
}

class HeldCell extends Held implements ScannedCell {
  readonly children: ScannedChild[] = [];

  constructor(
    xml: string,
    openEnd: number,
    closed: boolean,
    readonly row: number,
    readonly column: number,
    readonly attributes: ScannedCell['attributes'],
  ) {
    super(xml, openEnd, closed);
  }
}
