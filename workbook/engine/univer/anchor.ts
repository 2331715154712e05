/** `F2#`, the whole spill that starts in F2: the engine (0.25.1) knows neither the sign nor its function ANCHORARRAY. */
import {
  BaseFunction,
  ErrorType,
  ErrorValueObject,
  RangeReferenceObject,
  type BaseReferenceObject,
  type BaseValueObject,
} from '@univerjs/engine-formula';

interface SpillRange {
  readonly startRow: number;
  readonly endRow: number;
  readonly startColumn: number;
  readonly endColumn: number;
}
type SpillRanges = Record<
  string,
  Record<string, Record<number, Record<number, SpillRange>> | undefined> | undefined
>;

/** The engine's ranges where something spills; #REF! where nothing does. */
export class AnchorArray extends BaseFunction {
  override needsReferenceObject = true;
  override minParams = 1;
  override maxParams = 1;

  override calculate(anchor: BaseValueObject): BaseValueObject {
    if (anchor.isError()) return anchor;
    if (!anchor.isReferenceObject()) return ErrorValueObject.create(ErrorType.REF);
    const reference = anchor as unknown as BaseReferenceObject;
    const range = spillFrom(reference);
    return range ? valuesOf(range, reference) : ErrorValueObject.create(ErrorType.REF);
  }
}

function spillFrom(reference: BaseReferenceObject): SpillRange | undefined {
  const { startRow, startColumn } = reference.getRangePosition();
  const at = (ranges: unknown): SpillRange | undefined =>
    (ranges as SpillRanges)[reference.getUnitId()]?.[reference.getSheetId()]?.[startRow]?.[startColumn];
  return at(reference.getRuntimeArrayFormulaRange()) ?? at(reference.getArrayFormulaRange());
}

function valuesOf(range: SpillRange, anchor: BaseReferenceObject): BaseValueObject {
  const spill = new RangeReferenceObject(range, anchor.getSheetId(), anchor.getUnitId());
  spill.setDefaultSheetId(anchor.getSheetId());
  spill.setDefaultUnitId(anchor.getUnitId());
  spill.setUnitData(anchor.getUnitData());
  spill.setUnitStylesData(anchor.getUnitStylesData());
  spill.setArrayFormulaCellData(anchor.getArrayFormulaCellData());
  spill.setArrayFormulaRange(anchor.getArrayFormulaRange());
  spill.setRuntimeData(anchor.getRuntimeData());
  spill.setRuntimeArrayFormulaCellData(anchor.getRuntimeArrayFormulaCellData());
  spill.setRuntimeArrayFormulaRange(anchor.getRuntimeArrayFormulaRange());
  spill.setRuntimeFeatureCellData(anchor.getRuntimeFeatureCellData());
  return spill.toArrayValueObject(false);
}
