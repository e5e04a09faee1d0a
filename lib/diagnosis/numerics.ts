/**
 * Exponential and logarithms from the four operations and the square root alone. Those are exactly rounded everywhere
 * (IEEE 754), while Math.exp, Math.log and ** differ in the last bit from one JavaScript engine to the next: with these,
 * phone and server compute the same to the last bit. Within 1.5 units in the last place of the true value.
 */
const LOG2_E = 1.4426950408889634;
/** Natural logarithm of 2 in two parts; the first has zeros at its end, so that whole multiples of it are exact. */
const LN_2_HIGH = 0.6931471803691238, LN_2_LOW = 1.9082149292705877e-10;
const MANTISSA = 0xfffff, BIAS = 1023, ROOT_2 = 1.4142135623730951;

const double = new Float64Array(1);
const words = new Uint32Array(double.buffer);
// Which half holds the exponent depends on the machine's byte order.
double[0] = 1;
const HIGH = words[1] === 0 ? 0 : 1;

/** 2 to a whole power from -1022 to 1023. */
function powerOfTwo(k: number): number {
  words[1 - HIGH] = 0;
  words[HIGH] = (k + BIAS) << 20;
  return double[0]!;
}

/** Natural exponential. */
export function exp(x: number): number {
  if (!(x < 709.782712893384)) return x === Infinity || x > 0 ? Infinity : NaN;
  if (x < -745.1332191019412) return 0;
  const k = Math.round(x * LOG2_E);
  const r = x - k * LN_2_HIGH - k * LN_2_LOW;
  // Taylor's series; |r| <= ln(2) / 2, so that the next term is below the last bit.
  const tail = 1 / 2 + r * (1 / 6 + r * (1 / 24 + r * (1 / 120 + r * (1 / 720 + r * (1 / 5040 + r * (1 / 40320 + r * (1 / 362880
    + r * (1 / 3628800 + r * (1 / 39916800 + r * (1 / 479001600 + r / 6227020800))))))))));
  const value = 1 + (r + r * r * tail);
  if (k >= -1022 && k <= 1023) return value * powerOfTwo(k);
  const half = k > 0 ? 1023 : -1000;
  return value * powerOfTwo(half) * powerOfTwo(k - half);
}

/** Exponent of the last `mantissaLog`. */
let exponent = 0;

/** Natural logarithm of x without its power of two, from -ln(2) / 2 to ln(2) / 2; leaves that power in `exponent`. x > 0 and finite. */
function mantissaLog(x: number): number {
  const normal = x >= 2.2250738585072014e-308;
  double[0] = normal ? x : x * 18014398509481984;
  exponent = (words[HIGH]! >>> 20) - BIAS - (normal ? 0 : 54);
  words[HIGH] = (words[HIGH]! & MANTISSA) | (BIAS << 20);
  let m = double[0];
  if (m > ROOT_2) { m *= 0.5; exponent += 1; }
  // ln m = 2 artanh s; s * s <= 0.03, so that the series ends quickly.
  const f = m - 1, s = f / (2 + f), z = s * s;
  const series = z * (1 / 3 + z * (1 / 5 + z * (1 / 7 + z * (1 / 9 + z * (1 / 11 + z * (1 / 13 + z * (1 / 15 + z * (1 / 17 + z * (1 / 19 + z / 21)))))))));
  // 2 s = f - s f, which keeps the digits of f.
  return f - s * (f - 2 * series);
}

/** Not a positive finite number: what its logarithm is. */
const edge = (x: number): number => (x === 0 ? -Infinity : x === Infinity ? Infinity : NaN);

/** Natural logarithm. */
export function ln(x: number): number {
  if (!(x > 0 && x < Infinity)) return edge(x);
  const m = mantissaLog(x);
  return exponent * LN_2_HIGH + (m + exponent * LN_2_LOW);
}

/** Logarithm to the base 2; exact for powers of two. */
export function log2(x: number): number {
  if (!(x > 0 && x < Infinity)) return edge(x);
  const m = mantissaLog(x);
  return exponent + m * LOG2_E;
}

/** The number times itself. */
export function square(x: number): number {
  return x * x;
}

/** Root of the sum of squares, for values whose squares neither overflow nor vanish. */
export function norm(a: number, b: number, c = 0): number {
  return Math.sqrt(a * a + b * b + c * c);
}
