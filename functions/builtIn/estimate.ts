/** The standard row in built-in functions: value, standard uncertainty, 95 % limits, degrees of freedom. */

export interface EstimateText {
  readonly value: string;
  readonly uncertainty: string;
  readonly degreesOfFreedom: string;
  /** Of the limits; left out where degrees of freedom are whole. */
  readonly studentFactor?: string;
}

/** Its five cells; without degrees of freedom there is no uncertainty. */
export function standardRowTexts(estimate: EstimateText): string[] {
  const { value, uncertainty, degreesOfFreedom } = estimate;
  const { studentFactor = `TINV(0.05,${degreesOfFreedom})` } = estimate;
  const known = (text: string): string => `IF(${degreesOfFreedom}>0,${text},NA())`;
  const reach = `${studentFactor}*${uncertainty}`;
  return [
    value,
    known(uncertainty),
    known(`${value}-${reach}`),
    known(`${value}+${reach}`),
    degreesOfFreedom,
  ];
}

/** Student's factor for 95 % limits: TINV, for which degrees of freedom must be whole, by the beta distribution. */
export function studentFactorText(degreesOfFreedom: string): string {
  const share = `BETAINV(0.95,0.5,${degreesOfFreedom}/2)`;
  return `SQRT(${degreesOfFreedom}*${share}/(1-${share}))`;
}
