/** All sheets to hand over. Invented readings throughout. */
import type { Cases } from './case';
import { course } from './course';
import { fits } from './fits';
import { formulas } from './formulas';
import { gas } from './gas';
import { linear } from './linear';
import { mechanisms } from './mechanisms';
import { rate } from './rate';
import { readings } from './readings';
import { temperature } from './temperature';

export const cases: Cases = {
  ...linear,
  ...gas,
  ...formulas,
  ...readings,
  ...rate,
  ...course,
  ...fits,
  ...mechanisms,
  ...temperature,
};
