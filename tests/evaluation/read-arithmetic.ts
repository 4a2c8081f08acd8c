import { Dec } from '@/lib/units/decimal';

type Value = InstanceType<typeof Dec>;

/**
 * A reader of plain arithmetic as it stands in an explanation: digits, + − · /, brackets, √, |…|, max(a, b). Written apart from the
 * product's own arithmetic.
 * @returns null where the text is more than that
 */
export function calculate(text: string): Value | null {
  const source = text.replace(/…/g, '').replace(/\s+/g, '').replace(/−/g, '-');
  if (!/^[-+·/()√|\d.,max]+$/.test(source) || !/\d/.test(source) || !/[-+·/√|]|max/.test(source.slice(1))) return null;
  let at = 0;
  const peek = () => source[at];
  const take = (sign: string) => {
    if (source.startsWith(sign, at)) {
      at += sign.length;
      return true;
    }
    return false;
  };
  const factor = (): Value => {
    if (take('-')) return factor().neg();
    if (take('√')) return factor().sqrt();
    if (take('max(')) {
      const values = [sum()];
      while (take(',')) values.push(sum());
      close(')');
      return Dec.max(...values);
    }
    if (take('(')) {
      const inner = sum();
      close(')');
      return inner;
    }
    if (take('|')) {
      const inner = sum();
      close('|');
      return inner.abs();
    }
    const digits = /^\d+(\.\d+)?/.exec(source.slice(at))?.[0];
    if (digits === undefined) throw new Error('no number');
    at += digits.length;
    return new Dec(digits);
  };
  const close = (sign: string) => {
    if (!take(sign)) throw new Error(`no ${sign}`);
  };
  const product = (): Value => {
    let value = factor();
    while (peek() === '·' || peek() === '/') {
      if (take('·')) value = value.times(factor());
      else if (take('/')) value = value.div(factor());
    }
    return value;
  };
  const sum = (): Value => {
    let value = product();
    while (peek() === '+' || peek() === '-') {
      if (take('+')) value = value.plus(product());
      else if (take('-')) value = value.minus(product());
    }
    return value;
  };
  try {
    const value = sum();
    return at === source.length ? value : null;
  } catch {
    return null;
  }
}
