/** How near two numbers are. */

/** |got/wanted − 1|; the plain difference where 0 is wanted. */
export const relative = (got: number, wanted: number): number =>
  wanted === 0 ? Math.abs(got) : Math.abs(got / wanted - 1);

/** Agreeing significant digits: −log₁₀ of the relative difference, 16 where there is none. */
export const agreeingDigits = (got: number, wanted: number): number =>
  got === wanted ? 16 : -Math.log10(relative(got, wanted));

export const mean = (numbers: readonly number[]): number =>
  numbers.reduce((sum, x) => sum + x, 0) / numbers.length;

export const standardDeviation = (numbers: readonly number[]): number => {
  const centre = mean(numbers);
  return Math.sqrt(numbers.reduce((sum, x) => sum + (x - centre) ** 2, 0) / (numbers.length - 1));
};
