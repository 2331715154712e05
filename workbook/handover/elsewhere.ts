/** Calls of ours that stand in no cell: in formats, validations, charts, controls …, which a copy leaves as they are. */
import { quotedSheet } from '../../functions/address';
import { typedName } from '../../functions/define';
import { formulasIn, formulasOf } from '../xlsx/formulaPlaces';
import { callsOurs, typedFormula } from '../xlsx/formulaText';
import { elementsIn, readXml, type SheetPart, type WorkbookParts } from '../xlsx/parts';
import { isReservedName } from '../xlsx/read';
import { elementsOf, type XmlElement } from '../xlsx/xml';
import type { Package } from '../xlsx/zip';
import { callsIn } from './calls';
import { partPlaces, type PartPlace } from './partPlaces';

export interface CallElsewhere extends Omit<PartPlace, 'path'> {
  /** As it was typed, without `=`. */
  readonly formula: string;
}

/** What stands behind the cells of a sheet and names the cells that it is for. */
const forCells: Readonly<Record<string, Pick<CallElsewhere, 'kind' | 'loss'>>> = {
  conditionalFormatting: { kind: 'a conditional format', loss: 'it shows no more' },
  dataValidation: { kind: 'a validation', loss: 'it holds nothing back any more' },
  sparkline: { kind: 'a sparkline', loss: 'it is drawn no more' },
};

export const callsElsewhere = (pack: Package, parts: WorkbookParts): CallElsewhere[] => [
  ...parts.sheets.flatMap((sheet) => inSheet(readXml(pack, sheet.path), sheet)),
  ...partPlaces(pack, parts).flatMap((place) => inPart(pack, place)),
  ...inReservedNames(pack, parts.workbook),
];

const mayCall = (text: string): boolean => /PACE[._]/i.test(text);

function inSheet(xml: string, { name, path }: SheetPart): CallElsewhere[] {
  const around = withoutCells(xml);
  if (!mayCall(around)) return [];
  const elements = elementsOf(around, path);
  const holders = elements.filter((element) => element.name in forCells);
  const inHolders = new Set<XmlElement>();
  const found = holders.flatMap((holder) => {
    const own = within(holder, elements);
    own.forEach((element) => inHolders.add(element));
    // newer ones tell their cells in an element of their own
    const cells = holder.attributes.sqref ?? own.find((element) => element.name === 'sqref')?.text;
    return calling(own.flatMap(formulasOf)).map((formula) => ({
      ...forCells[holder.name],
      where: `${quotedSheet(name)}!${cells}`,
      formula,
    }));
  });
  const others = elements.filter((element) => !inHolders.has(element));
  const place = { kind: 'a control', loss: 'it follows no cells any more', where: `sheet ${name}` };
  return [...found, ...calling(others.flatMap(formulasOf)).map((formula) => ({ ...place, formula }))];
}

/** The cells have their own way into the copy. */
const withoutCells = (xml: string): string =>
  xml.replace(/(<(?:[\w.-]+:)?sheetData>).*(?=<\/(?:[\w.-]+:)?sheetData>)/s, '$1');

/** The element and those that stand in it; elements come in the order of their opening tags. */
function within(holder: XmlElement, elements: readonly XmlElement[]): XmlElement[] {
  const first = elements.indexOf(holder);
  const end = elements.findIndex(({ inside }, n) => n > first && inside.length <= holder.inside.length);
  return elements.slice(first, end < 0 ? undefined : end);
}

function inPart(pack: Package, { path, ...place }: PartPlace): CallElsewhere[] {
  if (!mayCall(new TextDecoder().decode(pack.read(path)))) return [];
  return calling(formulasIn(readXml(pack, path), path)).map((formula) => ({ ...place, formula }));
}

/** Print areas and the like, which Excel names for itself. */
const inReservedNames = (pack: Package, workbook: string): CallElsewhere[] =>
  elementsIn(pack, workbook)
    .filter(({ name, attributes }) => name === 'definedName' && isReservedName(attributes.name))
    .flatMap((element) => calling(formulasOf(element)).map((formula) => ({ ...reserved, formula })));

const reserved = { kind: 'a print area, title or filter', loss: 'it comes to nothing' };

const calling = (filed: readonly string[]): string[] => [
  ...new Set(filed.map(typedFormula).filter(callsOurs)),
];

/** `a conditional format on Run!B2:B9`. */
export const elsewherePlace = ({ kind, where }: CallElsewhere): string =>
  where === undefined ? kind : `${kind} on ${where}`;

/** `a conditional format on Run!B2:B9 calls PACE.EVENT: without the add-in it shows no more`. */
export function elsewhereLine(call: CallElsewhere): string {
  const called = new Set(callsIn(call.formula).map(({ f }) => typedName(f)));
  return `${elsewherePlace(call)} calls ${[...called].join(' and ')}: without the add-in ${call.loss}`;
}
