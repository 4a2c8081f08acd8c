/** What a printed figure stands for: `0.666667…` is any figure that is cut to it. */
export interface Interval {
  low: number;
  high: number;
}

const between = (...ends: number[]): Interval => ({ low: Math.min(...ends), high: Math.max(...ends) });
const pairwise = (a: Interval, b: Interval, of: (x: number, y: number) => number): Interval =>
  between(of(a.low, b.low), of(a.low, b.high), of(a.high, b.low), of(a.high, b.high));

const functions: Record<string, (parts: Interval[]) => Interval> = {
  max: (parts) => ({ low: Math.max(...parts.map(({ low }) => low)), high: Math.max(...parts.map(({ high }) => high)) }),
  min: (parts) => ({ low: Math.min(...parts.map(({ low }) => low)), high: Math.min(...parts.map(({ high }) => high)) }),
  cos: ([angle]) => between(Math.cos((angle!.low * Math.PI) / 180)),
  sin: ([angle]) => between(Math.sin((angle!.low * Math.PI) / 180)),
  Φ: ([x]) => ({ low: normal(x!.low), high: normal(x!.high) }),
};

/** Normal distribution by its series; enough for eight figures. */
function normal(x: number): number {
  if (x < -7) return 0;
  if (x > 7) return 1;
  let term = x;
  let sum = x;
  for (let k = 1; k < 200; k++) {
    term *= (-x * x) / 2 / k;
    sum += term / (2 * k + 1);
  }
  return 0.5 + sum / Math.sqrt(2 * Math.PI);
}

const words = Object.keys(functions).join('|');
const plain = new RegExp(`^(?:${words}|[\\d.…+−·/()|√²³⁴;°\\s])+$`);

/** Whether a line is nothing but arithmetic. */
export const isArithmetic = (text: string): boolean => /\d/.test(text) && plain.test(text);

/**
 * Reads `(14 + (−2)) / 2`, `√(4² + 3²)`, `|−3|`, `max(1; 2)`, as a person would. A reader of its own, so that an explanation is not
 * checked by what wrote it.
 */
export function readArithmetic(text: string): Interval {
  const tokens = text.match(new RegExp(`\\d+(?:\\.\\d+)?…?|${words}|[+−·/()|√²³⁴;°]`, 'g')) ?? [];
  let at = 0;
  const peek = () => tokens[at];
  const take = (wanted?: string) => {
    const token = tokens[at++];
    if (token === undefined || (wanted !== undefined && token !== wanted))
      throw new Error(`“${wanted ?? 'more'}” expected at ${at} of ${text}`);
    return token;
  };
  const sum = (): Interval => {
    let left = product();
    while (peek() === '+' || peek() === '−') {
      const right = take() === '+' ? { sign: 1, part: product() } : { sign: -1, part: product() };
      left = pairwise(left, right.part, (a, b) => a + right.sign * b);
    }
    return left;
  };
  const product = (): Interval => {
    let left = signed();
    while (peek() === '·' || peek() === '/') {
      const times = take() === '·';
      const right = signed();
      left = pairwise(left, right, (a, b) => (times ? a * b : a / b));
    }
    return left;
  };
  const signed = (): Interval => {
    if (peek() !== '−') return power();
    take('−');
    const { low, high } = signed();
    return { low: -high, high: -low };
  };
  const power = (): Interval => {
    let base = atom();
    while (['²', '³', '⁴'].includes(peek() ?? '')) {
      const n = { '²': 2, '³': 3, '⁴': 4 }[take() as '²' | '³' | '⁴'];
      const ends = between(base.low ** n, base.high ** n);
      base = n % 2 === 0 && base.low < 0 && base.high > 0 ? { low: 0, high: ends.high } : ends;
    }
    if (peek() === '°') take();
    return base;
  };
  const inside = (close: string): Interval[] => {
    const parts = [sum()];
    while (peek() === ';') {
      take(';');
      parts.push(sum());
    }
    take(close);
    return parts;
  };
  const atom = (): Interval => {
    const token = take();
    if (token === '(') return inside(')')[0]!;
    if (token === '|') {
      const [{ low, high }] = inside('|') as [Interval];
      return low <= 0 && high >= 0 ? { low: 0, high: Math.max(-low, high) } : between(Math.abs(low), Math.abs(high));
    }
    if (token === '√') {
      const { low, high } = power();
      return { low: Math.sqrt(Math.max(low, 0)), high: Math.sqrt(Math.max(high, 0)) };
    }
    const called = functions[token];
    if (called) {
      take('(');
      return called(inside(')'));
    }
    const figure = Number(token.replace('…', ''));
    if (Number.isNaN(figure)) throw new Error(`“${token}” in ${text}`);
    return token.endsWith('…') ? { low: figure - 6e-7, high: figure + 6e-7 } : between(figure);
  };
  const result = sum();
  if (at < tokens.length) throw new Error(`“${peek()}” is left over in ${text}`);
  return result;
}

/** The figure that a value begins with: `−0.666667… µm`. null: it begins with a word. */
export function leadingFigure(value: string): Interval | null {
  const token = /^−?\d+(?:\.\d+)?…?/.exec(value)?.[0];
  return token === undefined ? null : readArithmetic(token);
}

/** Whether both can stand for the same figure. */
export function agree(a: Interval, b: Interval): boolean {
  const slack = 1e-8 * Math.max(1, Math.abs(a.low), Math.abs(b.high));
  return a.low <= b.high + slack && b.low <= a.high + slack;
}
