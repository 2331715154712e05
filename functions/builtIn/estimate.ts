/** The standard row in built-in functions: value, standard uncertainty, 95 % limits, degrees of freedom. */

export interface EstimateText {
  readonly value: string;
  readonly uncertainty: string;
  readonly degreesOfFreedom: string;
}

/** Its five cells; without degrees of freedom there is no uncertainty. */
export function standardRowTexts({ value, uncertainty, degreesOfFreedom }: EstimateText): string[] {
  const known = (text: string): string => `IF(${degreesOfFreedom}>0,${text},NA())`;
  const reach = `TINV(0.05,${degreesOfFreedom})*${uncertainty}`;
  return [
    value,
    known(uncertainty),
    known(`${value}-${reach}`),
    known(`${value}+${reach}`),
    degreesOfFreedom,
  ];
}
