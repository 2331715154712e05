/** The words of a written mechanism, one after the other, and errors that point at a character. */
import { InvalidInput } from '../errors';

export type Arrow = 'one way' | 'both ways';

/** @example isOneWay('both ways') // false */
export const isOneWay = (arrow: Arrow): boolean => arrow === 'one way';

const bothWays = /<-+>|<=+>|[⇌⇄⇋↔⟷]/y;
const oneWay = /->|=>|[→⟶]/y;
/** Only after a space: in `Cl-->X` the first dash is a charge. */
const longOneWay = /(?<=^|\s)(?:--+>|==+>)/y;

const number = /(\d+(?:\.\d+)?|\.\d+)(?:[ \t]*\/[ \t]*(\d+))?/y;
const firstLetter = /[\p{L}([{•·]/u;
const blank = /[^\S\n\r]/;
const separator = /[;\n\r]/;

/** How much of a long text a message shows. */
const longestExcerpt = 60;

export class SchemeReader {
  /** Where reading goes on, counted from 0. */
  at = 0;

  constructor(private readonly text: string) {}

  /** To the first character of the next step; false at the end. */
  skipToStep(): boolean {
    while (this.at < this.text.length && /[\s;]/.test(this.text[this.at])) this.at++;
    return this.at < this.text.length;
  }

  /** Whether nothing more stands on this side of the arrow. */
  isAtSideEnd(): boolean {
    this.skipBlanks();
    return this.isBoundary(this.at) || this.arrowLength(this.at) > 0;
  }

  /** The arrow here, if one is; it is passed over. */
  arrow(): Arrow | undefined {
    this.skipBlanks();
    const length = this.arrowLength(this.at);
    if (length === 0) return undefined;
    const arrow = this.matches(bothWays, this.at) > 0 ? 'both ways' : 'one way';
    this.at += length;
    return arrow;
  }

  /** The coefficient before a species; 1 where none is written. */
  coefficient(): number {
    this.skipBlanks();
    const start = this.at;
    number.lastIndex = start;
    const match = number.exec(this.text);
    if (!match) return 1;
    this.at += match[0].length;
    const value = Number(match[1]) / Number(match[2] ?? 1);
    if (!(value > 0 && Number.isFinite(value))) {
      throw this.error('have coefficients above 0', `"${match[0]}"`, start);
    }
    this.skipBlanks();
    return value;
  }

  /** The species here, with its charge. */
  species(): string {
    const start = this.at;
    if (this.isBoundary(start) || this.arrowLength(start) > 0) {
      throw this.error('name a species here', 'none', start);
    }
    if (!firstLetter.test(this.text[start])) {
      throw this.error('have species that start with a letter or a bracket', `"${this.text[start]}"`, start);
    }
    let depth = 0;
    while (!this.endsSpecies(this.at)) {
      const letter = this.text[this.at];
      if ('([{'.includes(letter)) depth++;
      else if (')]}'.includes(letter)) depth--;
      else if (letter === '+' && depth === 0) this.requireCharge(start);
      if (depth < 0) throw this.error('close only brackets that were opened', `"${letter}"`, this.at);
      this.at++;
    }
    const name = this.text.slice(start, this.at);
    if (depth > 0) throw this.error('close every bracket of a species', `"${name}"`, start);
    return name;
  }

  /** Whether a plus follows and joins another species; it is passed over. */
  plus(): boolean {
    const end = this.at;
    this.skipBlanks();
    if (this.isBoundary(this.at) || this.arrowLength(this.at) > 0) return false;
    const isPlus = this.text[this.at] === '+';
    if (!isPlus || this.at === end || !this.isSpace(this.at + 1)) {
      const seen = isPlus ? 'a plus' : `"${this.text.slice(this.at).split(/\s/, 1)[0]}"`;
      throw this.error('join species by a plus with a space on each side', seen, this.at);
    }
    this.at++;
    return true;
  }

  /** `scheme must have an arrow in every step: none in the step at character 9 of "A -> B; C"` */
  error(rule: string, seen: string, at: number): InvalidInput {
    return new InvalidInput(`scheme must ${rule}: ${seen} at character ${at + 1} of "${this.excerpt(at)}"`);
  }

  private excerpt(at: number): string {
    const line = this.text.replace(/\s/g, ' ');
    if (line.length <= longestExcerpt) return line;
    const start = Math.max(0, Math.min(at - longestExcerpt / 2, line.length - longestExcerpt));
    const end = start + longestExcerpt;
    return `${start > 0 ? '…' : ''}${line.slice(start, end)}${end < line.length ? '…' : ''}`;
  }

  /** A plus inside a species is a charge, which ends it. */
  private requireCharge(start: number): void {
    let end = this.at;
    while (this.text[end] === '+') end++;
    if (this.endsSpecies(end)) return;
    while (!this.endsSpecies(end)) end++;
    const seen = `"${this.text.slice(start, end)}"`;
    throw this.error('join species by a plus with a space on each side', seen, start);
  }

  private endsSpecies(at: number): boolean {
    return this.isBoundary(at) || this.isSpace(at) || this.arrowLength(at) > 0;
  }

  private isBoundary(at: number): boolean {
    return at >= this.text.length || separator.test(this.text[at]);
  }

  private isSpace(at: number): boolean {
    return at >= this.text.length || /\s/.test(this.text[at]);
  }

  private skipBlanks(): void {
    while (this.at < this.text.length && blank.test(this.text[this.at])) this.at++;
  }

  private arrowLength(at: number): number {
    return this.matches(bothWays, at) || this.matches(longOneWay, at) || this.matches(oneWay, at);
  }

  private matches(pattern: RegExp, at: number): number {
    pattern.lastIndex = at;
    return pattern.exec(this.text)?.[0].length ?? 0;
  }
}
