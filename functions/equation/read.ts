/** Reads an equation as it is typed in a line of text. */
import type { Part, QuantitySign } from './equation';

const below = new Map([...'₀0₁1₂2₃3₄4₅5₆6₇7₈8₉9₊+₋−ᵢiⱼjₐaₚpₜt'].reduce(pairs, []));
const above = new Map([...'⁰0¹1²2³3⁴4⁵5⁶6⁷7⁸8⁹9⁺+⁻−ⁿnᵝβᵀ⊤'].reduce(pairs, []));
const functions = ['ln', 'lg', 'exp'];
const uprightNames = ['AICc', 'pH', 'pK'];
const closing: Readonly<Record<string, string>> = { '(': ')', '[': ']', '{': '}', '|': '|' };
const operators = '=≈+−·,→≥≤<>±⊤';
const marks = '*‡';

function pairs(found: [string, string][], sign: string, place: number): [string, string][] {
  if (place % 2 === 0) found.push([sign, '']);
  else found[found.length - 1][1] = sign;
  return found;
}

/** @throws Error where the text is not an equation of this notation, since that is a slip of ours */
export function readEquation(text: string): Part {
  const reader = new Reader([...text], text);
  return reader.whole();
}

class Reader {
  private at = 0;

  constructor(
    private readonly signs: readonly string[],
    private readonly text: string,
  ) {}

  whole(): Part {
    const row = this.row('');
    if (this.at < this.signs.length) this.fail();
    return row;
  }

  private get next(): string {
    return this.signs[this.at] ?? '';
  }

  private fail(): never {
    throw new Error(`the equation cannot be read from sign ${this.at + 1} on: ${this.text}`);
  }

  private take(sign: string): boolean {
    if (this.next !== sign) return false;
    this.at++;
    return true;
  }

  /** Runs and operators up to the closing sign. */
  private row(end: string): Part {
    const parts: Part[] = [];
    while (this.at < this.signs.length && this.next !== end) {
      if (this.take(' ')) continue;
      if (operators.includes(this.next)) parts.push({ kind: 'operator', text: this.signs[this.at++] });
      else parts.push(...this.run(end));
    }
    return parts.length === 1 ? parts[0] : { kind: 'row', parts };
  }

  /** What touches, with at most one stroke. */
  private run(end: string): Part[] {
    const halves: Part[][] = [[]];
    while (this.next !== '' && this.next !== ' ' && this.next !== end && !operators.includes(this.next)) {
      if (this.take('/')) halves.push([]);
      else halves[halves.length - 1].push(this.factor());
    }
    if (halves.length === 1) return halves[0];
    const [over, under] = halves.map((half) => shownInFraction(half));
    if (halves.length > 2 || halves.some((half) => half.length === 0)) this.fail();
    return [{ kind: 'fraction', over, under }];
  }

  private factor(): Part {
    const base = this.unraised();
    const exponent = this.script(above, '^');
    return exponent ? { kind: 'power', base, exponent } : base;
  }

  private unraised(): Part {
    const sign = this.next;
    if (/\d/.test(sign)) return { kind: 'number', text: this.number() };
    if (sign === '"') return { kind: 'word', text: this.quoted() };
    if (sign === '√') {
      this.at++;
      const of = this.factor();
      return { kind: 'root', of: of.kind === 'brackets' ? of.inside : of };
    }
    if ('∑∏∫'.includes(sign)) {
      this.at++;
      return { kind: 'sum', text: sign, index: this.script(below, '_') };
    }
    if (sign in closing) return this.brackets();
    const name = functions.find((one) => this.startsWith(one));
    if (name) {
      this.at += name.length;
      return { kind: 'function', text: name };
    }
    if (sign === 'd') {
      this.at++;
      return { kind: 'word', text: 'd' };
    }
    if (/\p{L}/u.test(sign)) return this.quantity();
    return this.fail();
  }

  private startsWith(word: string): boolean {
    return this.signs.slice(this.at, this.at + word.length).join('') === word;
  }

  private number(): string {
    const start = this.at;
    while (/[\d.]/.test(this.next)) this.at++;
    return this.signs.slice(start, this.at).join('');
  }

  private quoted(): string {
    const start = ++this.at;
    while (this.next !== '"' && this.next !== '') this.at++;
    const word = this.signs.slice(start, this.at).join('');
    if (!this.take('"')) this.fail();
    return word;
  }

  private brackets(): Part {
    const open = this.signs[this.at++];
    const inside = this.row(closing[open]);
    if (!this.take(closing[open])) this.fail();
    return { kind: 'brackets', open, close: closing[open], inside };
  }

  private quantity(): QuantitySign {
    const start = this.at;
    const isChange = this.next === 'Δ' && /\p{L}/u.test(this.signs[this.at + 1] ?? '');
    if (isChange) this.at++;
    const upright = uprightNames.find((one) => this.startsWith(one));
    const letter = upright ?? this.next;
    this.at += [...letter].length;
    const index = this.take('∞')
      ? { kind: 'operator' as const, text: '∞' }
      : this.take('½')
        ? { kind: 'number' as const, text: '½' }
        : this.script(below, '_');
    const mark = marks.includes(this.next) && this.next !== '' ? this.signs[this.at++] : undefined;
    let of: string | undefined;
    if (this.startsWith('("')) {
      this.at++;
      of = this.quoted();
      if (!this.take(')')) this.fail();
    }
    const name = this.signs
      .slice(start, this.at)
      .filter((sign) => sign !== '"')
      .join('');
    return { kind: 'sign', name, letter, isChange, below: index, mark, of };
  }

  /** Small signs, or what follows the caret or the underscore: one factor, or brackets that are not shown. */
  private script(small: ReadonlyMap<string, string>, introduced: string): Part | undefined {
    let written = '';
    while (small.has(this.next)) written += small.get(this.signs[this.at++]);
    if (written !== '') return readEquation(written);
    if (!this.take(introduced)) return undefined;
    if (this.next === '(') return shownInFraction([this.brackets()]);
    return /\d/.test(this.next) ? { kind: 'number', text: this.number() } : this.index();
  }

  /** One letter, or several that make a word: `V_room`. */
  private index(): Part {
    const start = this.at;
    while (/\p{L}/u.test(this.next)) this.at++;
    const text = this.signs.slice(start, this.at).join('');
    if (text === '') this.fail();
    const letters = [...text];
    const isCounting = letters.every((letter) => 'ijk'.includes(letter));
    if (letters.length > 1 && !isCounting) return { kind: 'word', text };
    const parts = letters.map((letter) => ({ kind: 'sign' as const, name: letter, letter, isChange: false }));
    return parts.length === 1 ? parts[0] : { kind: 'row', parts };
  }
}

/** A fraction's bar and a raised place need no brackets. */
function shownInFraction(factors: readonly Part[]): Part {
  if (factors.length !== 1) return { kind: 'row', parts: factors };
  const [only] = factors;
  return only.kind === 'brackets' && only.open !== '|' ? only.inside : only;
}
