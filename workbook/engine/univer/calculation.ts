/** One calculation after another over the same workbook, until nothing that spilled moves any more. */
import { IConfigService, type Injector } from '@univerjs/core';
import {
  AstTreeBuilder,
  CalculateFormulaService,
  FormulaDataModel,
  IFormulaCurrentConfigService,
  IFormulaDependencyGenerator,
  IFormulaRuntimeService,
  Interpreter,
  Lexer,
  type IAllRuntimeData,
} from '@univerjs/engine-formula';
import { circles } from './cycles';
import { unitId } from './snapshot';

/**
 * A spill may feed a formula that spills in its turn, and two spills may meet: the engine follows one
 * such step a round. More than this many in a row have no end (=RAND() in a spill, say).
 */
const mostRounds = 10;

type Dataset = Parameters<CalculateFormulaService['execute']>[0];
type Spills = Pick<Dataset, 'arrayFormulaRange' | 'arrayFormulaCellData'>;

export interface Settled {
  readonly result: IAllRuntimeData;
  /** What is wrong with formulas in a circle, by `circleKey`. */
  readonly circular: ReadonlyMap<string, string>;
}

/** The engine's own service answers through an event and loses what is thrown; this one answers its caller. */
export class Calculation extends CalculateFormulaService {
  private readonly model: FormulaDataModel;

  constructor(injector: Injector) {
    super(
      injector.get(IConfigService),
      injector.get(Lexer),
      injector.get(IFormulaCurrentConfigService),
      injector.get(IFormulaRuntimeService),
      injector.get(IFormulaDependencyGenerator),
      injector.get(Interpreter),
      injector.get(AstTreeBuilder),
    );
    this.model = injector.get(FormulaDataModel);
  }

  async settle(): Promise<Settled> {
    let result = await this.round({ arrayFormulaRange: {}, arrayFormulaCellData: {} });
    for (let rounds = 1, before = ''; rounds < mostRounds; rounds++) {
      const spills = spillsOf(result);
      const now = JSON.stringify(spills);
      if (now === before || !hasSpills(spills)) break;
      before = now;
      result = await this.round(spills);
    }
    return { result, circular: await this.circular() };
  }

  private async circular(): Promise<ReadonlyMap<string, string>> {
    return this._runtimeService.isCycleDependency()
      ? circles(await this.getAllDependencyJson())
      : new Map<string, string>();
  }

  private async round(spills: Spills): Promise<IAllRuntimeData> {
    this._currentConfigService.load({
      ...spills,
      formulaData: this.model.getFormulaData(),
      forceCalculate: true,
      dirtyRanges: [],
      dirtyNameMap: {},
      dirtyDefinedNameMap: {},
      dirtyUnitFeatureMap: {},
      dirtyUnitOtherFormulaMap: {},
    });
    this._runtimeService.reset();
    await this._executeStep();
    return this._runtimeService.getAllRuntimeData();
  }
}

const hasSpills = ({ arrayFormulaRange }: Spills): boolean =>
  Object.values(arrayFormulaRange[unitId] ?? {}).some((ranges) => Object.keys(ranges ?? {}).length > 0);

function spillsOf({ arrayFormulaRange, arrayFormulaCellData }: IAllRuntimeData): Spills {
  const cells = Object.entries(arrayFormulaCellData[unitId] ?? {});
  return {
    arrayFormulaRange,
    arrayFormulaCellData: {
      [unitId]: Object.fromEntries(cells.map(([sheet, matrix]) => [sheet, matrix.getData()])),
    },
  };
}
