/** Calls of ours that stand in no cell: in conditional formats and validations, which a copy leaves as they are. */
import { quotedSheet } from '../../functions/address';
import { typedName } from '../../functions/define';
import { callsOurs, typedFormula } from '../xlsx/formulaText';
import { readXml, type SheetPart } from '../xlsx/parts';
import { localName, plainText, scanXml } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';
import { callsIn } from './calls';

export interface CallElsewhere {
  /** `a conditional format`. */
  readonly kind: string;
  /** `'Gas run'!B2:B9`. */
  readonly cells: string;
  /** As it was typed, without `=`. */
  readonly formula: string;
  /** What a reader without the add-in misses. */
  readonly loss: string;
}

const kinds: Readonly<Record<string, Pick<CallElsewhere, 'kind' | 'loss'>>> = {
  conditionalFormatting: { kind: 'a conditional format', loss: 'it shows no more' },
  dataValidation: { kind: 'a validation', loss: 'it holds nothing back any more' },
};

export const callsElsewhere = (pack: Package, sheets: readonly SheetPart[]): CallElsewhere[] =>
  sheets.flatMap((sheet) => inSheet(readXml(pack, sheet.path), sheet));

/** Both stand behind the cells; newer ones tell their cells in an element of their own. */
function inSheet(xml: string, { name: sheet, path }: SheetPart): CallElsewhere[] {
  if (!/PACE[._]/i.test(xml.slice(xml.lastIndexOf('sheetData>')))) return [];
  const found: CallElsewhere[] = [];
  let holder: string | undefined;
  let cells = '';
  let text = '';
  let formulas: string[] = [];
  scanXml(xml, path, {
    open({ name, attributes }) {
      text = '';
      if (!(localName(name) in kinds)) return;
      holder = localName(name);
      cells = attributes.sqref ?? '';
      formulas = [];
    },
    text: (more) => void (holder && (text += more)),
    close({ name }) {
      if (holder === undefined) return;
      const element = localName(name);
      if (/^(?:formula[12]?|f)$/.test(element)) formulas.push(typedFormula(plainText(text)));
      if (element === 'sqref') cells = text;
      if (element !== holder) return;
      for (const formula of new Set(formulas.filter(callsOurs)))
        found.push({ ...kinds[holder], cells: `${quotedSheet(sheet)}!${cells}`, formula });
      holder = undefined;
    },
  });
  return found;
}

/** `a conditional format on Run!B2:B9 calls PACE.EVENT: without the add-in it shows no more`. */
export const elsewhereLine = ({ kind, cells, formula, loss }: CallElsewhere): string =>
  `${kind} on ${cells} calls ${[...new Set(callsIn(formula).map(({ f }) => typedName(f)))].join(' and ')}: without the add-in ${loss}`;
