/** The looks of a new file's cells, each written once and referred to by number. */
import type { CellModel } from '../engine/engine';
import { xmlAttribute } from './xml';

type Look = Pick<CellModel, 'numberFormat' | 'bold' | 'wrap'>;

/** Formats of one's own are numbered from here (ISO/IEC 29500-1, 18.8.30). */
const firstOwnFormat = 164;

export class LookTable {
  private readonly formats: string[] = [];
  /** The first is the plain cell. */
  private readonly looks: Look[] = [{}];
  private readonly numbers = new Map<string, number>([[keyOf({}), 0]]);

  /** `s` for a cell's tag; nothing for a plain cell. */
  attributes(look: Look): Record<string, string> {
    const number = this.numberOf(look);
    return number === 0 ? {} : { s: String(number) };
  }

  private numberOf({ numberFormat, bold, wrap }: Look): number {
    const look = { numberFormat, bold, wrap };
    const key = keyOf(look);
    const known = this.numbers.get(key);
    if (known !== undefined) return known;
    if (numberFormat !== undefined && !this.formats.includes(numberFormat)) this.formats.push(numberFormat);
    this.numbers.set(key, this.looks.length);
    return this.looks.push(look) - 1;
  }

  /** @param main the namespace of the workbook that it is for */
  xml(main: string): string {
    const formats = this.formats.map(
      (code, n) => `<numFmt numFmtId="${firstOwnFormat + n}" formatCode="${xmlAttribute(code)}"/>`,
    );
    const numFmts =
      formats.length > 0 ? `<numFmts count="${formats.length}">${formats.join('')}</numFmts>` : '';
    const font = '<sz val="11"/><name val="Calibri"/><family val="2"/>';
    return `<styleSheet xmlns="${main}">${numFmts}<fonts count="2"><font>${font}</font><font><b/>${font}</font></fonts><fills count="2"><fill><patternFill patternType="none"/></fill><fill><patternFill patternType="gray125"/></fill></fills><borders count="1"><border><left/><right/><top/><bottom/><diagonal/></border></borders><cellStyleXfs count="1"><xf numFmtId="0" fontId="0" fillId="0" borderId="0"/></cellStyleXfs><cellXfs count="${this.looks.length}">${this.looks.map((look) => this.xf(look)).join('')}</cellXfs><cellStyles count="1"><cellStyle name="Normal" xfId="0" builtinId="0"/></cellStyles></styleSheet>`;
  }

  private xf({ numberFormat, bold, wrap }: Look): string {
    const format = numberFormat === undefined ? 0 : firstOwnFormat + this.formats.indexOf(numberFormat);
    const tag = `<xf numFmtId="${format}" fontId="${bold ? 1 : 0}" fillId="0" borderId="0" xfId="0" applyNumberFormat="1" applyFont="1"`;
    return wrap ? `${tag} applyAlignment="1"><alignment vertical="top" wrapText="1"/></xf>` : `${tag}/>`;
  }
}

const keyOf = ({ numberFormat, bold, wrap }: Look): string =>
  JSON.stringify([numberFormat ?? '', bold ?? false, wrap ?? false]);
