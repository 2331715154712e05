/** A polynomial through some readings, by powers of their distance from one time, in formulas. */

/** Places in the statistics that LINEST gives, counted from 1. */
const [values, uncertainties, sums] = [1, 2, 5];
const residualSum = 2;

export class PolynomialAt {
  private readonly distances: string;

  /** @param times and `readings`: ranges of one length */
  constructor(
    private readonly times: string,
    private readonly readings: string,
    at: string,
    private readonly degree: number,
  ) {
    this.distances = `(${times}-${at})`;
  }

  /** At that time, as all that follow. */
  get height(): string {
    return `INDEX(${this.fit()},${values},${this.degree + 1})`;
  }

  get slope(): string {
    return `INDEX(${this.fit()},${values},${this.degree})`;
  }

  get slopeUncertainty(): string {
    return `INDEX(${this.fit('TRUE,TRUE')},${uncertainties},${this.degree})`;
  }

  /** In units of the readings' own variance. */
  get heightVariance(): string {
    return `1/${leftOver(`ISNUMBER(${this.times})*1`, this.powers(1), 'FALSE')}`;
  }

  /** In units of the readings' own variance; of degree 2 or more. */
  get slopeVariance(): string {
    return `1/${leftOver(this.distances, this.powers(2), 'TRUE')}`;
  }

  /** Coefficients, the highest power first; with `statistics`, the rows below them too. */
  private fit(statistics?: string): string {
    return `LINEST(${this.readings},${this.powers(1)}${statistics === undefined ? '' : `,${statistics}`})`;
  }

  private powers(from: number): string {
    const list = Array.from({ length: this.degree + 1 - from }, (_, n) => n + from);
    return `${this.distances}^{${list.join()}}`;
  }
}

/**
 * What others leave of a term: its sum of squares is what the readings tell of the term's coefficient
 * (R. Frisch and F. V. Waugh, Econometrica 1 (1933) 387).
 */
const leftOver = (term: string, others: string, constant: 'TRUE' | 'FALSE'): string =>
  `INDEX(LINEST(${term},${others},${constant},TRUE),${sums},${residualSum})`;
