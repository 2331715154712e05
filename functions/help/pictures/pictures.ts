/** All pictures, in the order of the work. */
import { arrheniusLine } from './arrheniusLine';
import { endpoint } from './endpoint';
import { faultsPicture } from './faults';
import { halfLives } from './halfLives';
import { meanTemperature } from './meanTemperature';
import { orderVerdict } from './orderVerdict';
import { overlayPicture } from './overlay';
import type { Picture } from './picture';
import { profileLimits } from './profileLimits';
import { samplingPlan } from './samplingPlan';
import { tangentWindow } from './tangentWindow';
import { twoStepCourse } from './twoStepCourse';
import { wetGas } from './wetGas';

export const pictures = (): readonly Picture[] => [
  faultsPicture(),
  wetGas(),
  tangentWindow(),
  orderVerdict(),
  endpoint(),
  halfLives(),
  profileLimits(),
  overlayPicture(),
  arrheniusLine(),
  meanTemperature(),
  twoStepCourse(),
  samplingPlan(),
];
