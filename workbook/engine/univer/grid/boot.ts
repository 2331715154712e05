/** The grid's engine with its toolbar, formula bar and sheet tabs, put into an element of the page. */
import '@univerjs/preset-sheets-core/lib/index.css';
import './grid.css';
import {
  LocaleType,
  LogLevel,
  merge,
  Univer,
  type Injector,
  type Plugin,
  type PluginCtor,
} from '@univerjs/core';
import { FUniver } from '@univerjs/core/facade';
import { CalculationMode, UniverSheetsCorePreset } from '@univerjs/preset-sheets-core';
import enUS from '@univerjs/preset-sheets-core/locales/en-US';
import type { LongWork } from '../../../../functions/longWork';
import { formulaPluginConfig } from '../register';
import { gridTheme } from './theme';

/** Beside the formula while it calculates the grid (0.25.1) would show the names of these words. */
const missingWords = {
  'sheets-formula': {
    progress: {
      analyzing: 'preparing',
      calculating: 'calculating',
      'array-analysis': 'preparing',
      'array-calculation': 'calculating',
      done: 'done',
    },
  },
};

export interface BootedGrid {
  readonly univer: Univer;
  readonly injector: Injector;
  readonly api: FUniver;
}

export function bootGrid(container: HTMLElement, isDark: boolean, longWork?: LongWork): BootedGrid {
  const univer = new Univer({
    theme: gridTheme,
    darkMode: isDark,
    locale: LocaleType.EN_US,
    locales: { [LocaleType.EN_US]: merge(enUS, missingWords) },
    logLevel: LogLevel.ERROR,
  });
  const { plugins } = UniverSheetsCorePreset({
    container,
    header: true,
    toolbar: true,
    ribbonType: 'simple',
    formulaBar: true,
    disableAutoFocus: true,
    formula: { ...formulaPluginConfig(longWork), initialFormulaComputing: CalculationMode.FORCED },
  });
  for (const plugin of plugins) {
    const [constructor, config] = Array.isArray(plugin) ? plugin : [plugin as PluginCtor<Plugin>, undefined];
    univer.registerPlugin(constructor, config);
  }
  return { univer, injector: univer.__getInjector(), api: FUniver.newAPI(univer) };
}
