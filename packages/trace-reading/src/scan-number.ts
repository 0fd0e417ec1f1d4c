const zero = 48;
const nine = 57;
const plus = 43;
const minus = 45;
const trueMinus = 0x2212;
const exactPower = [1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22] as const;
const mostExactDigits = 15;
const mostExactPower = 22;
const largestExponent = 9999;

const isDigit = (code: number): boolean => code >= zero && code <= nine;
const isExponentMark = (code: number): boolean => code === 101 || code === 69 || code === 100 || code === 68;

/** Where the last scanned number ended: a scanner has no object to give back for each of a million numbers. */
export const scanEnd = { at: 0 };

/** Digits of the mantissa that is being scanned; one for all, for the same reason. */
const mantissa = { value: 0, digits: 0, decimals: 0, end: 0 };

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
  const sign = signAt(text, from);
  const first = sign === 0 ? from : from + 1;
  scanMantissa(text, first, to, mark);
  if (mantissa.digits === 0) return NaN;
  const mantissaEnd = mantissa.end;
  const exponent = scanExponent(text, mantissaEnd, to);
  const power = exponent - mantissa.decimals;
  const isExact = mantissa.digits <= mostExactDigits && power >= -mostExactPower && power <= mostExactPower;
  const value = isExact ? scaled(mantissa.value, power) : Number(`${text.slice(first, mantissaEnd).replace(String.fromCharCode(mark), '.')}e${exponent}`);
  return sign < 0 ? -value : value;
}

/** -1 for a minus, 1 for a plus, 0 for neither. */
function signAt(text: string, at: number): -1 | 0 | 1 {
  const code = text.charCodeAt(at);
  if (code === minus || code === trueMinus) return -1;
  return code === plus ? 1 : 0;
}

function scanMantissa(text: string, from: number, to: number, mark: number): void {
  let at = from;
  let [value, digits, decimals, isPastMark] = [0, 0, 0, false];
  for (; at < to; at += 1) {
    const code = text.charCodeAt(at);
    if (isDigit(code)) {
      digits += 1;
      value = value * 10 + (code - zero);
      if (isPastMark) decimals += 1;
    } else if (code === mark && !isPastMark) isPastMark = true;
    else break;
  }
  mantissa.value = value;
  mantissa.digits = digits;
  mantissa.decimals = decimals;
  mantissa.end = at;
}

function scaled(value: number, power: number): number {
  return power < 0 ? value / (exactPower[-power] ?? 1) : value * (exactPower[power] ?? 1);
}

/** The exponent from here, 0 where there is none; moves the end past it. */
function scanExponent(text: string, from: number, to: number): number {
  scanEnd.at = from;
  if (from >= to || !isExponentMark(text.charCodeAt(from))) return 0;
  const sign = signAt(text, from + 1);
  const first = sign === 0 ? from + 1 : from + 2;
  let at = first;
  let value = 0;
  for (; at < to && isDigit(text.charCodeAt(at)); at += 1) value = Math.min(value * 10 + text.charCodeAt(at) - zero, largestExponent);
  if (at === first) return 0;
  scanEnd.at = at;
  return sign < 0 ? -value : value;
}
