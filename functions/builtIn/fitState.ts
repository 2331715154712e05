/** Whether what was fitted on the day of a copy still fits the readings as they are now, in words. */

export const asFitted = 'fits as it did';
export const fitsOtherwise = 'fits otherwise: its readings have changed';
export const startsOtherwise = 'cannot be told: times or start have changed';

/**
 * @param then the cell that holds the sum of squares of the day
 * @param now the cell that works it out anew
 * @param scale the sum of the squared readings: a fit that meets them leaves nothing but their rounding
 */
export const stateOfFit = (then: string, now: string, scale: string): string =>
  `IF(ISERROR(${now}),"${fitsOtherwise}",IF(ABS(${now}-${then})<=0.000000001*${then}+1E-24*${scale},"${asFitted}","${fitsOtherwise}"))`;
