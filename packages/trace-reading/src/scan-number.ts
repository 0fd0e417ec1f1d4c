const zero = 48;
const nine = 57;
const plus = 43;
const minus = 45;
const trueMinus = 0x2212;
const exactPower = [1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22] as const;
const mostExactDigits = 15;

const isDigit = (code: number): boolean => code >= zero && code <= nine;
const isExponentMark = (code: number): boolean => code === 101 || code === 69 || code === 100 || code === 68;

/** Where the last scanned number ended: a scanner has no object to give back for each of a million numbers. */
export const scanEnd = { at: 0 };

/**
 * Scans a number of the strict grammar: optional sign (hyphen, plus or minus sign), ASCII digits with one decimal mark, optional exponent
 * (e, E, d, D). Correctly rounded: exactly representable digits and powers are combined directly, all others go through the platform's
 * own conversion of the validated text.
 * @param text any text.
 * @param from first place of the number; `to` one past the last that may belong to it.
 * @param mark code of the decimal mark.
 * @returns the number, ±Infinity where it is out of range, NaN where there is none. `scanEnd.at` is one past its last sign.
 */
export function scanNumber(text: string, from: number, to: number, mark: number): number {
  let at = from;
  const sign = text.charCodeAt(at);
  const isNegative = sign === minus || sign === trueMinus;
  if (isNegative || sign === plus) at += 1;
  let digits = 0;
  let mantissa = 0;
  let decimals = 0;
  let isPastMark = false;
  for (; at < to; at += 1) {
    const code = text.charCodeAt(at);
    if (isDigit(code)) {
      digits += 1;
      if (mantissa !== 0 || code !== zero) mantissa = mantissa * 10 + (code - zero);
      if (isPastMark) decimals += 1;
    } else if (code === mark && !isPastMark) isPastMark = true;
    else break;
  }
  if (digits === 0) return NaN;
  const mantissaEnd = at;
  const exponent = scanExponent(text, at, to);
  scanEnd.at = exponent.end;
  const power = exponent.value - decimals;
  if (digits <= mostExactDigits && power >= -22 && power <= 22) {
    const value = power < 0 ? mantissa / (exactPower[-power] ?? 1) : mantissa * (exactPower[power] ?? 1);
    return isNegative ? -value : value;
  }
  const unsigned = text.slice(isNegative || sign === plus ? from + 1 : from, mantissaEnd).replace(String.fromCharCode(mark), '.');
  const value = Number(`${unsigned}e${exponent.value}`);
  return isNegative ? -value : value;
}

function scanExponent(text: string, from: number, to: number): { value: number; end: number } {
  if (from >= to || !isExponentMark(text.charCodeAt(from))) return { value: 0, end: from };
  let at = from + 1;
  const sign = text.charCodeAt(at);
  const isNegative = sign === minus || sign === trueMinus;
  if (isNegative || sign === plus) at += 1;
  const first = at;
  let value = 0;
  for (; at < to && isDigit(text.charCodeAt(at)); at += 1) value = Math.min(value * 10 + text.charCodeAt(at) - zero, 9999);
  return at === first ? { value: 0, end: from } : { value: isNegative ? -value : value, end: at };
}
