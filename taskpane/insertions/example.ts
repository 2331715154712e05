import { functionNamed } from '../../functions/catalogue';
import { typedName } from '../../functions/define';
import { exampleSize } from '../examples';
import { oneFormula, type Insertion } from './insertion';

/** The example of the function that is looked up; it stands for itself and reads no cells. */
export function exampleInsertion(name: string): Insertion | null {
  const f = functionNamed(name);
  if (!f) return null;
  return {
    name: `example of ${typedName(f)}`,
    ...oneFormula(f.example.formula, exampleSize(f)),
    headings: [],
    reads: [],
    hasDetail: false,
    isAtActiveCell: true,
  };
}
