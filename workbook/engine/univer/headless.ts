/** Calculates a workbook without a page: every formula once, in the order they feed each other. */
import { LocaleType, LogLevel, Univer, UniverInstanceType, type IWorkbookData } from '@univerjs/core';
import { IDefinedNamesService, UniverFormulaEnginePlugin } from '@univerjs/engine-formula';
import type { BookModel, CalculatedBook } from '../engine';
import { withPlainReferences } from '../tables';
import { Calculation } from './calculation';
import { readOutcome } from './outcome';
import { formulaPluginConfig, forgetMessages } from './register';
import { withUniqueNames } from './scopedNames';
import { definedNameEntries, unitId, workbookData } from './snapshot';
import { trimWholeColumns } from './wholeColumns';

let last: Promise<unknown> = Promise.resolve();

/**
 * One engine a calculation: nothing of one workbook can reach the next, and nothing keeps the process
 * alive. The engine's caches belong to all of them, so calculations wait for each other.
 */
export function calculate(book: BookModel): Promise<CalculatedBook> {
  const calculation = last.then(() => calculateAlone(book));
  last = calculation.catch(() => undefined);
  return calculation;
}

async function calculateAlone(book: BookModel): Promise<CalculatedBook> {
  const univer = new Univer({
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: {} },
    logLevel: LogLevel.SILENT,
  });
  try {
    trimWholeColumns();
    univer.registerPlugin(UniverFormulaEnginePlugin, { function: formulaPluginConfig().function });
    const named = withUniqueNames(withPlainReferences(book));
    univer.createUnit<IWorkbookData, never>(UniverInstanceType.UNIVER_SHEET, workbookData(named));
    const injector = univer.__getInjector();
    const names = injector.get(IDefinedNamesService);
    for (const entry of definedNameEntries(named)) names.registerDefinedName(unitId, entry);
    return readOutcome(book, await new Calculation(injector).settle());
  } finally {
    univer.dispose();
    forgetMessages(unitId);
  }
}
