// shared/numerics/rational.ts
function wholePower(base, exponent2) {
  let product = 1n;
  for (let n = 0; n < exponent2; n++) product *= base;
  return product;
}
var tens = [1n];
function tenTo(exponent2) {
  for (let n = tens.length; n <= exponent2; n++) tens.push((tens[n - 1] ?? 1n) * 10n);
  return tens[exponent2] ?? 1n;
}
function divisor(a, b) {
  let [x, y] = [a < 0n ? -a : a, b];
  while (y !== 0n) [x, y] = [y, x % y];
  return x;
}
function rational(numerator, denominator = 1n) {
  if (denominator === 0n) throw new Error("a fraction needs a denominator");
  const sign = denominator < 0n ? -1n : 1n;
  const common = divisor(numerator, denominator * sign);
  return { numerator: sign * numerator / common, denominator: sign * denominator / common };
}
var zero = rational(0n);
var one = rational(1n);
var plus = (a, b) => rational(a.numerator * b.denominator + b.numerator * a.denominator, a.denominator * b.denominator);
var minus = (a, b) => rational(a.numerator * b.denominator - b.numerator * a.denominator, a.denominator * b.denominator);
var times = (a, b) => rational(a.numerator * b.numerator, a.denominator * b.denominator);
var over = (a, b) => rational(a.numerator * b.denominator, a.denominator * b.numerator);
var absolute = (a) => a.numerator < 0n ? { numerator: -a.numerator, denominator: a.denominator } : a;
function compare(a, b) {
  const difference3 = a.numerator * b.denominator - b.numerator * a.denominator;
  return difference3 < 0n ? -1 : difference3 > 0n ? 1 : 0;
}
function power(base, exponent2) {
  const size2 = Math.abs(exponent2);
  return exponent2 >= 0 ? rational(wholePower(base.numerator, size2), wholePower(base.denominator, size2)) : rational(wholePower(base.denominator, size2), wholePower(base.numerator, size2));
}
function fromDecimal(text) {
  const match = /^([+-]?)(\d{0,200})(?:\.(\d{0,200}))?(?:[eE]([+-]?\d{1,6}))?$/.exec(text);
  if (!match) return null;
  const [, sign = "", whole = "", decimals = "", exponent2 = "0"] = match;
  if (whole + decimals === "") return null;
  const shift2 = Number(exponent2) - decimals.length;
  if (Math.abs(shift2) > 800) return null;
  const digits = BigInt(`${sign === "-" ? "-" : ""}${whole}${decimals}`);
  return shift2 >= 0 ? rational(digits * tenTo(shift2)) : rational(digits, tenTo(-shift2));
}
var view = new DataView(new ArrayBuffer(8));
function fromDouble(value23) {
  if (!Number.isFinite(value23)) throw new Error(`${String(value23)} is no fraction`);
  view.setFloat64(0, value23);
  const bits2 = view.getBigUint64(0);
  const exponent2 = Number(bits2 >> 52n & 0x7FFn);
  const fraction = bits2 & 0xFFFFFFFFFFFFFn;
  const mantissa = exponent2 === 0 ? fraction : fraction | 0x10000000000000n;
  const shift2 = Math.max(exponent2, 1) - 1075;
  const signed = value23 < 0 ? -mantissa : mantissa;
  return shift2 >= 0 ? rational(signed << BigInt(shift2)) : rational(signed, 1n << BigInt(-shift2));
}
function toDouble(value23) {
  if (value23.numerator === 0n) return 0;
  return Number(toDecimal(value23, 40));
}
function leadingExponent(value23) {
  const size2 = value23.numerator < 0n ? -value23.numerator : value23.numerator;
  if (size2 === 0n) return 0;
  let guess = size2.toString().length - value23.denominator.toString().length;
  const atLeast = guess >= 0 ? compare({ numerator: size2, denominator: value23.denominator }, rational(tenTo(guess))) >= 0 : compare({ numerator: size2, denominator: value23.denominator }, rational(1n, tenTo(-guess))) >= 0;
  if (!atLeast) guess -= 1;
  return guess;
}
function toPlace(value23, place, rounding = "half") {
  const scaled2 = place <= 0 ? rational(value23.numerator * tenTo(-place), value23.denominator) : rational(value23.numerator, value23.denominator * tenTo(place));
  let whole = scaled2.numerator / scaled2.denominator;
  const rest = scaled2.numerator - whole * scaled2.denominator;
  if (rest !== 0n) {
    if (rounding === "down" && rest < 0n) whole -= 1n;
    if (rounding === "up" && rest > 0n) whole += 1n;
    if (rounding === "half" && 2n * (rest < 0n ? -rest : rest) >= scaled2.denominator) whole += rest < 0n ? -1n : 1n;
  }
  const sign = whole < 0n ? "-" : "";
  let digits = (whole < 0n ? -whole : whole).toString();
  if (place >= 0) return `${sign}${digits}${whole === 0n ? "" : "0".repeat(place)}`;
  digits = digits.padStart(1 - place, "0");
  return `${sign}${digits.slice(0, place)}.${digits.slice(place)}`;
}
function toDecimal(value23, digits) {
  const text = toPlace(value23, leadingExponent(value23) - digits + 1);
  return text.includes(".") ? text.replace(/0+$/, "").replace(/\.$/, "") : text;
}

// shared/thermo/errors.ts
var OutOfRangeError = class extends Error {
  constructor(input2, value23, validRange) {
    super(`${input2} = ${String(value23)} lies outside ${validRange}`);
    this.input = input2;
    this.value = value23;
    this.validRange = validRange;
  }
  input;
  value;
  validRange;
  name = "OutOfRangeError";
};
var MissingInputError = class extends Error {
  constructor(input2) {
    super(`${input2} is missing`);
    this.input = input2;
  }
  input;
  name = "MissingInputError";
};
var SeriesError = class extends Error {
  constructor(input2, reason) {
    super(`${input2}: ${reason}`);
    this.input = input2;
    this.reason = reason;
  }
  input;
  reason;
  name = "SeriesError";
};
var UnknownInputError = class extends Error {
  constructor(input2, known) {
    super(`${input2} is not an input here; there ${known.length === 1 ? "is" : "are"} ${known.join(", ") || "none"}`);
    this.input = input2;
    this.known = known;
  }
  input;
  known;
  name = "UnknownInputError";
};

// shared/thermo/inputs.ts
function numberOf(inputs2, name) {
  const value23 = inputs2[name];
  if (typeof value23 !== "number") throw new MissingInputError(name);
  return value23;
}
function seriesOf(inputs2, name) {
  const value23 = inputs2[name];
  if (!Array.isArray(value23)) throw new MissingInputError(name);
  return value23;
}
function checkInputs(definitions, inputs2) {
  let length2 = null;
  for (const definition of definitions) {
    const value23 = inputs2[definition.name];
    if (value23 === void 0 || value23 === null) {
      if (definition.isOptional) continue;
      throw new MissingInputError(definition.name);
    }
    if (definition.shape === "number") {
      if (typeof value23 !== "number") throw new SeriesError(definition.name, "one number is needed, not a series");
      checkRange(definition, value23);
      continue;
    }
    if (!Array.isArray(value23)) throw new SeriesError(definition.name, "a series is needed, not one number");
    checkSeries(definition, value23);
    if (length2 !== null && value23.length !== length2) throw new SeriesError(definition.name, `${value23.length} values where the series before it has ${length2}`);
    length2 = value23.length;
  }
  for (const name of Object.keys(inputs2)) {
    if (!definitions.some((definition) => definition.name === name)) throw new UnknownInputError(name, definitions.map((definition) => definition.name));
  }
}
function checkRange({ name, range, unit }, value23) {
  if (typeof value23 !== "number" || !(value23 >= range[0] && value23 <= range[1])) {
    throw new OutOfRangeError(name, typeof value23 === "number" ? value23 : NaN, `${range[0]} to ${range[1]} ${unit}`);
  }
}
function checkSeries(definition, values) {
  const { least: least2 = 1, order = "none" } = definition.needs ?? {};
  if (values.length < least2) throw new SeriesError(definition.name, `${values.length} values; at least ${least2} are needed`);
  let before = null;
  for (const value23 of values) {
    checkRange(definition, value23);
    if (typeof value23 !== "number") continue;
    if (before !== null && order === "ascending" && !(value23 > before)) throw new SeriesError(definition.name, `the values have to rise; ${value23} follows ${before}`);
    if (before !== null && order === "descending" && !(value23 < before)) throw new SeriesError(definition.name, `the values have to fall; ${value23} follows ${before}`);
    before = value23;
  }
}

// shared/thermo/evaluate.ts
var plainFormulae = { variants: {}, beyond: "compute" };
function variantOf(definition, key) {
  const variant = key === void 0 ? definition.variants[0] : definition.variants.find((one2) => one2.key === key);
  if (!variant) throw new OutOfRangeError("variant", NaN, definition.variants.map((one2) => one2.key).join(", "));
  return variant;
}
function chooseVariant(definition, inputs2, formulae, key) {
  const named2 = variantOf(definition, key ?? formulae.variants[definition.key]);
  const beyond = firstBeyond(named2, inputs2);
  if (beyond === null) return { variant: named2, note: null };
  const [input2, value23, range] = beyond;
  const unit = definition.inputs.find((one2) => one2.name === input2)?.unit ?? "";
  if (formulae.beyond === "refuse") throw new OutOfRangeError(input2, value23, `${range[0]} to ${range[1]} ${unit}, where “${named2.label}” holds`);
  if (formulae.beyond === "next") {
    const next = definition.variants.slice(definition.variants.indexOf(named2) + 1).find((one2) => firstBeyond(one2, inputs2) === null);
    if (next) return { variant: next, note: `Computed by “${next.label}”: “${named2.label}” holds for ${named2.validity}.` };
  }
  return { variant: named2, note: `Beyond the stated range of “${named2.label}” (${named2.validity}); known error: ${named2.knownError}.` };
}
function firstBeyond(variant, inputs2) {
  for (const [name, range] of Object.entries(variant.holds ?? {})) {
    const given8 = inputs2[name];
    for (const value23 of typeof given8 === "number" ? [given8] : given8 ?? []) {
      if (value23 < range[0] || value23 > range[1]) return [name, value23, range];
    }
  }
  return null;
}
function evaluateQuantity(definition, inputs2, constants, variant, formulae = plainFormulae) {
  checkInputs(definition.inputs, inputs2);
  const { variant: chosen, note } = chooseVariant(definition, inputs2, formulae, variant);
  const outcome3 = chosen.evaluate(inputs2, constants, formulae);
  if (outcome3.is === "value" && !Number.isFinite(outcome3.value)) throw new OutOfRangeError(definition.key, outcome3.value, "the numbers");
  if (outcome3.is !== "value" && outcome3.is !== "class") return outcome3;
  const notes = [...outcome3.notes ?? [], ...note === null ? [] : [note], ...definition.notes?.(inputs2, constants, formulae) ?? []];
  const noted = notes.length === 0 ? outcome3 : { ...outcome3, notes };
  return noted.is === "value" && noted.value === 0 ? { ...noted, value: 0 } : noted;
}

// shared/numerics/doubleDouble.ts
var splitter = 134217729;
function sumError(a, b, sum) {
  const back = sum - a;
  return a - (sum - back) + (b - back);
}
function productError(a, b, product) {
  let scaled2 = splitter * a;
  const aHi = scaled2 - (scaled2 - a), aLo = a - aHi;
  scaled2 = splitter * b;
  const bHi = scaled2 - (scaled2 - b), bLo = b - bHi;
  return aHi * bHi - product + aHi * bLo + aLo * bHi + aLo * bLo;
}
var pair = (hi, lo = 0) => ({ hi, lo });
function settle(hi, lo) {
  const sum = hi + lo;
  return { hi: sum, lo: lo - (sum - hi) };
}
function add(a, b) {
  const sum = a.hi + b.hi;
  const low = a.lo + b.lo;
  const first3 = settle(sum, sumError(a.hi, b.hi, sum) + low);
  return settle(first3.hi, first3.lo + sumError(a.lo, b.lo, low));
}
function multiply(a, b) {
  const product = a.hi * b.hi;
  return settle(product, productError(a.hi, b.hi, product) + (a.hi * b.lo + a.lo * b.hi));
}
function divide(a, b) {
  const first3 = a.hi / b.hi;
  const rest = add(a, multiply(pair(-first3), b));
  const second3 = rest.hi / b.hi;
  const left = add(rest, multiply(pair(-second3), b));
  return add(settle(first3, second3), pair(left.hi / b.hi));
}
function squareRoot(a) {
  const root = Math.sqrt(a.hi);
  const rest = add(a, multiply(pair(-root), pair(root)));
  const better = add(pair(root), pair(rest.hi / (2 * root)));
  const left = add(a, multiply(pair(-better.hi, -better.lo), better));
  return add(better, pair(left.hi / (2 * root)));
}

// shared/numerics/elementary.ts
var steps = 128;
function pairedLog(numerator, denominator) {
  const t = divide(pair(numerator - denominator), pair(numerator + denominator));
  const square = multiply(t, t);
  let power2 = t;
  let sum = t;
  for (let n = 3; n < 200; n += 2) {
    power2 = multiply(power2, square);
    if (Math.abs(power2.hi) < 1e-36) break;
    sum = add(sum, divide(power2, pair(n)));
  }
  return multiply(pair(2), sum);
}
var ln2 = pairedLog(2, 1);
var ln10 = add(multiply(pair(3), ln2), pairedLog(10, 8));
var perLn10 = divide(pair(1), ln10);
function leading(value23, bits2) {
  let scale = 1;
  for (let n = bits2; n < 53; n++) scale *= 2;
  const big = value23 * (scale + 1);
  return big - (big - value23);
}
var powers = new Float64Array(2098);
for (let n = 0, up = 1; n <= 1023; n++, up *= 2) powers[n + 1074] = up;
for (let n = 0, down = 1; n <= 1074; n++, down /= 2) powers[1074 - n] = down;
var twoTo = (n) => powers[n + 1074] ?? 0;
function scaled(value23, n) {
  if (n > 1023) return value23 * twoTo(1023) * twoTo(n - 1023);
  if (n < -1022) return value23 * twoTo(n + 54) * twoTo(-54);
  return value23 * twoTo(n);
}
var rootHi = new Float64Array(steps);
var rootLo = new Float64Array(steps);
{
  let root = pair(2);
  for (let n = 1; n < steps; n *= 2) root = squareRoot(root);
  let power2 = pair(1);
  for (let j = 0; j < steps; j++) {
    rootHi[j] = power2.hi;
    rootLo[j] = power2.lo;
    power2 = multiply(power2, root);
  }
}
var stepOf = { hi: ln2.hi / steps, lo: ln2.lo / steps };
var stepHi = leading(stepOf.hi, 32);
var stepLo = stepOf.hi - stepHi + stepOf.lo;
var perStep = 1 / stepOf.hi;
var toWhole = 6755399441055744;
function raised(r, whole) {
  const series3 = r + r * r * (1 / 2 + r * (1 / 6 + r * (1 / 24 + r * (1 / 120 + r * (1 / 720)))));
  const k = whole | 0;
  const j = k & steps - 1, n = k >> 7;
  const root = rootHi[j] ?? 1, rest = rootLo[j] ?? 0;
  if (n < -900 || n > 1e3) return scaled(root + (rest + root * series3), n);
  const power2 = powers[n + 1074] ?? 0, scaledRoot = root * power2;
  return scaledRoot + (rest * power2 + scaledRoot * series3);
}
function expOf(hi, lo) {
  const whole = hi * perStep + toWhole - toWhole;
  return raised(hi - whole * stepHi - whole * stepLo + lo, whole);
}
function exp(x) {
  if (!(x < 709.782712893385)) return x !== x ? x : Infinity;
  if (x < -745.14) return 0;
  const whole = x * perStep + toWhole - toWhole;
  return raised(x - whole * stepHi - whole * stepLo, whole);
}
var least = 91;
var most = 181;
var logHi = new Float64Array(most + 1);
var logLo = new Float64Array(most + 1);
for (let k = least; k <= most; k++) {
  const value23 = k === steps ? pair(0) : pairedLog(k, steps);
  logHi[k] = value23.hi;
  logLo[k] = value23.lo;
}
var ln2Hi = leading(ln2.hi, 40);
var ln2Lo = ln2.hi - ln2Hi + ln2.lo;
var words = new Float64Array(1);
var halves = new Uint32Array(words.buffer);
words[0] = 1;
var high = halves[1] === 1072693248 ? 1 : 0;
var result = new Float64Array(2);
function logIntoResult() {
  let e = 0;
  let positive = words[0] ?? 0;
  if (positive < 22250738585072014e-324) {
    positive *= 18014398509481984;
    words[0] = positive;
    e = -54;
  }
  const power2 = ((halves[high] ?? 0) >>> 20) - 1023;
  e = e + power2 | 0;
  let m = positive * (powers[1074 - power2] ?? 0);
  if (m > 1.4142135623730951) {
    m *= 0.5;
    e = e + 1 | 0;
  }
  const k = m * steps + 0.5 | 0;
  const c2 = k * (1 / steps);
  const d = m - c2;
  const r = d / c2;
  const rTop = leading27(r);
  const rLo = (d - rTop * c2 - (r - rTop) * c2) / c2;
  const square = r * r;
  const squareLo = productError(r, r, square) + 2 * r * rLo;
  const series3 = square * r * (1 / 3 - r * (1 / 4 - r * (1 / 5 - r * (1 / 6 - r * (1 / 7 - r * (1 / 8 - r * (1 / 9 - r * (1 / 10))))))));
  const tableHi = logHi[k] ?? 0;
  const a = e * ln2Hi + tableHi;
  const aLo = sumError(e * ln2Hi, tableHi, a);
  const b = a + r;
  const bLo = sumError(a, r, b);
  const half = -0.5 * square;
  const sum = b + half;
  const sumLo = sumError(b, half, sum);
  const rest = aLo + bLo + sumLo + (e * ln2Lo + (logLo[k] ?? 0)) + (rLo - 0.5 * squareLo + series3);
  const leadingPart = sum + rest;
  result[0] = leadingPart;
  result[1] = rest - (leadingPart - sum);
}
function leading27(value23) {
  const big = value23 * 134217729;
  return big - (big - value23);
}
function log(x) {
  if (!(x > 0)) return x === 0 ? -Infinity : NaN;
  if (x === Infinity) return x;
  words[0] = x;
  logIntoResult();
  return result[0] ?? 0;
}
function log10(x) {
  if (!(x > 0)) return x === 0 ? -Infinity : NaN;
  if (x === Infinity) return x;
  words[0] = x;
  logIntoResult();
  const hi = result[0] ?? 0, lo = result[1] ?? 0;
  const product = hi * perLn10.hi;
  return product + (productError(hi, perLn10.hi, product) + (hi * perLn10.lo + lo * perLn10.hi));
}
function pow(x, y) {
  if (!(x > 0 && x < Infinity && y > -Infinity && y < Infinity) || y === 0 || y === 1 || x === 1) return specialPower(x, y);
  return powerOf(x, y);
}
function powerOf(x, y) {
  words[0] = x;
  logIntoResult();
  const hi = result[0] ?? 0;
  const exponent2 = y * hi;
  if (exponent2 > 709.79) return Infinity;
  if (exponent2 < -745.2) return 0;
  return expOf(exponent2, productError(y, hi, exponent2) + y * (result[1] ?? 0));
}
function specialPower(x, y) {
  if (y === 0) return 1;
  if (x !== x || y !== y) return NaN;
  if (y === Infinity || y === -Infinity) {
    const size3 = Math.abs(x);
    if (size3 === 1) return NaN;
    return size3 > 1 === y > 0 ? Infinity : 0;
  }
  const isWhole = Math.abs(y) >= 9007199254740992 || Math.floor(y) === y;
  const isOdd = isWhole && Math.abs(y) < 9007199254740992 && Math.abs(y % 2) === 1;
  const isNegative = x < 0 || Object.is(x, -0);
  const size2 = Math.abs(x);
  const sign = isNegative && isOdd ? -1 : 1;
  if (size2 === 0) return y > 0 ? sign * 0 : sign * Infinity;
  if (size2 === Infinity) return y > 0 ? sign * Infinity : sign * 0;
  if (isNegative && !isWhole) return NaN;
  if (size2 === 1) return sign;
  if (y === 1) return x;
  return sign * powerOf(size2, y);
}

// shared/units/brands.ts
function mint(label) {
  const isFinite = (value23) => Number.isFinite(value23);
  return (value23) => {
    if (!isFinite(value23)) throw new RangeError(`${String(value23)} ${label} is no value`);
    return value23;
  };
}
var kelvin = mint("K");
var pascal = mint("Pa");
var meter = mint("m");
var kelvinPerMeter = mint("K/m");
var joulePerKilogram = mint("J/kg");
var kilogramPerCubicMeter = mint("kg/m3");

// shared/thermo/constants.ts
var enhancementOf = (constants) => constants.enhancementFactor ?? 1;
function constant(constants, name) {
  const value23 = constants[name];
  if (value23 === void 0 || !Number.isFinite(value23)) throw new Error(`the convention sets no ${name}`);
  return value23;
}
var kappaOf = (constants) => constants.kappa ?? constant(constants, "R") / constant(constants, "cp");
var dryRateOf = (constants) => constant(constants, "g") / constant(constants, "cp");
var epsilonOf = (constants) => constant(constants, "R") / constant(constants, "Rv");

// shared/thermo/poisson.ts
function poissonTemperature(temperature6, from2, to2, constants) {
  return kelvin(temperature6 * pow(to2 / from2, kappaOf(constants)));
}

// shared/thermo/slips.ts
var slip = (key, label, sentence, apply) => ({ key, weight: "gross", label, sentence, apply });
var fineSlip = (key, label, sentence, apply) => ({ key, weight: "fine", label, sentence, apply });
var constantSlip = (key, label, sentence, apply) => ({ key, weight: "constant", label, sentence, apply });
var times2 = (factor) => (_inputs, _constants, right) => right * factor;
var signSlip = (sentence) => slip("sign", "sign turned round", sentence, times2(-1));
var perMeterSlip = slip("per-meter", "K m⁻¹ given as K km⁻¹", "Your value is the rate per meter: multiply it by 1000 for the rate per kilometer.", times2(1 / 1e3));
var per100MetersSlip = slip("per-100-m", "K per 100 m given as K km⁻¹", "Your value is the rate per 100 m: multiply it by 10 for the rate per kilometer.", times2(1 / 10));
var joulesSlip = slip("joules-for-kilojoules", "J given as kJ", "Your number is in joules; the unit beside it says kilojoules.", times2(1e3));
var kilojoulesSlip = slip("kilojoules-for-joules", "kJ given as J", "Your number is in kilojoules; the unit beside it says joules.", times2(1 / 1e3));
var zeroCelsius = 273.15;
var vaporGasConstant = 461.5;
var universalGasConstant = 8.314462618;

// shared/thermo/tex.ts
function texNumber(value23, digits = 5) {
  if (value23 === 0) return "0";
  const text = value23.toPrecision(digits);
  const [mantissa = "0", exponent2] = text.split("e");
  const short = mantissa.includes(".") ? mantissa.replace(/0+$/, "").replace(/\.$/, "") : mantissa;
  if (exponent2 !== void 0) return `${short} \\times 10^{${Number(exponent2)}}`;
  const size2 = Math.abs(value23);
  if (size2 < 1e-3) {
    const [small = "0", power2 = "0"] = value23.toExponential(digits - 1).split("e");
    return `${small.includes(".") ? small.replace(/0+$/, "").replace(/\.$/, "") : small} \\times 10^{${Number(power2)}}`;
  }
  return short;
}
var texFactor = (value23, digits = 5) => value23 < 0 ? `(${texNumber(value23, digits)})` : texNumber(value23, digits);
var units = {
  "K": "K",
  "Pa": "Pa",
  "hPa": "hPa",
  "m": "m",
  "km": "km",
  "kg": "kg",
  "1": "",
  "Cel": "{}^{\\circ}C",
  "J": "J",
  "kJ": "kJ",
  "J/kg": "J\\,kg^{-1}",
  "kJ/kg": "kJ\\,kg^{-1}",
  "K/m": "K\\,m^{-1}",
  "K/km": "K\\,km^{-1}",
  "s": "s",
  "h": "h",
  "m/s": "m\\,s^{-1}",
  "s-1": "s^{-1}",
  "s-2": "s^{-2}",
  "K/s": "K\\,s^{-1}",
  "K/h": "K\\,h^{-1}",
  "deg": "{}^{\\circ}",
  "rad": "rad",
  "mm": "mm",
  "g/kg": "g\\,kg^{-1}",
  "kg/kg": "kg\\,kg^{-1}",
  "kg/m3": "kg\\,m^{-3}",
  "m3/kg": "m^{3}\\,kg^{-1}",
  "J/(kg.K)": "J\\,kg^{-1}\\,K^{-1}",
  "m/s2": "m\\,s^{-2}",
  "W/kg": "W\\,kg^{-1}",
  "Pa/s": "Pa\\,s^{-1}",
  "hPa/h": "hPa\\,h^{-1}",
  "g/m3": "g\\,m^{-3}",
  "%": "\\%",
  "1/K": "K^{-1}"
};
function texUnit(code) {
  const known = units[code];
  if (known === void 0) throw new Error(`no TeX for the unit ${code}`);
  return known === "" ? "" : `\\,\\mathrm{${known}}`;
}
var texQuantity = (value23, unit, digits = 5) => `${texNumber(value23, digits)}${texUnit(unit)}`;
function worked(text, formula, filled, value23, unit, shown3, digits = 6) {
  return { text, formula, filled: `${filled} = ${texQuantity(shown3?.value ?? value23, shown3?.unit ?? unit, digits)}`, value: value23, unit };
}

// shared/thermo/firstLaw.ts
var texOf = { cp: "c_p", cv: "c_v", R: "R" };
var printed = { cp: "cp", cv: "cv", R: "R" };
var temperature = (name, label, symbol) => ({ name, label, symbol, unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 1e3] });
var pressure = (name, label, symbol) => ({ name, label, symbol, unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [1e3, 1e6] });
var byTemperatures = [temperature("temperatureStart", "temperature at the start", "T₁"), temperature("temperatureEnd", "temperature at the end", "T₂")];
var pressures = [pressure("pressureStart", "pressure at the start", "p₁"), pressure("pressureEnd", "pressure at the end", "p₂")];
var processInputs = {
  isobaric: byTemperatures,
  isochoric: byTemperatures,
  isothermal: [temperature("temperature", "temperature, which stays", "T"), ...pressures],
  adiabatic: [temperature("temperatureStart", "temperature at the start", "T₁"), ...pressures],
  polytropic: [temperature("temperatureStart", "temperature at the start", "T₁"), ...pressures, { name: "polytropicExponent", label: "exponent n of p αⁿ = constant", symbol: "n", unit: "1", shownUnit: "1", kind: "ratio", shape: "number", range: [0.2, 20] }]
};
var start = (inputs2) => numberOf(inputs2, "temperatureStart");
function endOf(process, inputs2, constants) {
  if (process === "isobaric" || process === "isochoric") return numberOf(inputs2, "temperatureEnd");
  if (process === "polytropic") return start(inputs2) * pow(numberOf(inputs2, "pressureEnd") / numberOf(inputs2, "pressureStart"), polytropicPower(inputs2));
  return poissonTemperature(kelvin(start(inputs2)), pascal(numberOf(inputs2, "pressureStart")), pascal(numberOf(inputs2, "pressureEnd")), constants);
}
var polytropicPower = (inputs2) => (numberOf(inputs2, "polytropicExponent") - 1) / numberOf(inputs2, "polytropicExponent");
var changeOf = (process, inputs2, constants) => endOf(process, inputs2, constants) - start(inputs2);
function perKilogram(of) {
  const value23 = (inputs2, constants) => of.sign * constant(constants, of.coefficient) * changeOf(of.process, inputs2, constants);
  return {
    key: of.key,
    name: of.name,
    symbol: of.symbol,
    unit: "J/kg",
    shownUnit: "kJ/kg",
    kind: "difference",
    nearZero: 1e3,
    inputs: processInputs[of.process],
    variants: [{
      key: "first-law",
      label: `${of.sign < 0 ? "−" : ""}${printed[of.coefficient]} ΔT`,
      source: { text: 'AMS Glossary of Meteorology, "first law of thermodynamics"', status: "common practice" },
      validity: "200–350 K, where the specific heats of dry air are constant",
      knownError: "cp 1004 to 1005.7: 0.17 %",
      evaluate: (inputs2, constants) => ({ is: "value", value: value23(inputs2, constants) })
    }],
    constants: of.process === "adiabatic" ? ["cp", "cv", "R", "kappa"] : [of.coefficient],
    ask: of.ask,
    trace: (inputs2, constants) => processTrace(of, inputs2, constants, value23(inputs2, constants)),
    slips: processSlips(of),
    example: of.example
  };
}
function forGivenMass(base, name, example) {
  const withoutMass = (inputs2) => Object.fromEntries(Object.entries(inputs2).filter(([key]) => key !== "mass"));
  const mass3 = (inputs2) => numberOf(inputs2, "mass");
  return {
    ...base,
    key: `${base.key}-of-mass`,
    name,
    symbol: base.symbol.replace("q", "Q").replace("w", "W").replace("u", "U").replace("h", "H"),
    unit: "J",
    shownUnit: "kJ",
    inputs: [{ name: "mass", label: "mass of air", symbol: "m", unit: "kg", shownUnit: "kg", kind: "ratio", shape: "number", range: [1e-6, 1e9] }, ...base.inputs],
    variants: base.variants.map((variant) => ({
      ...variant,
      label: `mass times ${variant.label}`,
      evaluate: (inputs2, constants, formulae) => {
        const outcome3 = variant.evaluate(withoutMass(inputs2), constants, formulae);
        return outcome3.is === "value" ? { ...outcome3, value: mass3(inputs2) * outcome3.value } : outcome3;
      }
    })),
    ask: base.ask.replace(" per kilogram of dry air", " for the whole mass of dry air, not per kilogram"),
    trace(inputs2, constants, variant, formulae) {
      const steps2 = base.trace(withoutMass(inputs2), constants, variant, formulae);
      const last = steps2[steps2.length - 1];
      const perKg = last?.value ?? 0;
      const total = mass3(inputs2) * perKg;
      return [...steps2, { text: "For the whole mass", formula: "m \\cdot (\\text{value per kilogram})", filled: `${texNumber(mass3(inputs2))} \\cdot ${texFactor(perKg / 1e3)}\\,\\mathrm{kJ} = ${texQuantity(total / 1e3, "kJ")}`, value: total, unit: "J" }];
    },
    slips: [
      ...base.slips.map((one2) => ({
        ...one2,
        apply: (inputs2, constants, right, formulae) => {
          const perKg = one2.apply(withoutMass(inputs2), constants, right / mass3(inputs2), formulae);
          return perKg === null ? null : perKg * mass3(inputs2);
        }
      })),
      slip("mass-left-out", "mass left out", "This is the value for one kilogram: multiply it by the mass.", (inputs2, _c, right) => mass3(inputs2) === 1 || right === 0 ? null : right / mass3(inputs2)),
      slip("mass-divided", "divided by the mass", "This is divided by the mass where it has to be multiplied.", (inputs2, _c, right) => mass3(inputs2) === 1 || right === 0 ? null : right / mass3(inputs2) / mass3(inputs2))
    ],
    example
  };
}
function processTrace(of, inputs2, constants, value23) {
  const steps2 = changeSteps(of.process, inputs2, constants);
  const change2 = changeOf(of.process, inputs2, constants);
  const minus2 = of.sign < 0 ? "-" : "";
  steps2.push({
    text: "First law",
    formula: `${of.tex} = ${minus2}${texOf[of.coefficient]}\\,\\Delta T`,
    filled: `${of.tex} = ${minus2}${texNumber(constant(constants, of.coefficient), 6)} \\cdot ${texFactor(change2)} = ${texQuantity(value23 / 1e3, "kJ/kg")}`,
    value: value23,
    unit: "J/kg"
  });
  return steps2;
}
function changeSteps(process, inputs2, constants) {
  const steps2 = [];
  const end = endOf(process, inputs2, constants);
  if (process === "adiabatic" || process === "polytropic") {
    const [text, tex, exponent2] = process === "adiabatic" ? ["by Poisson’s relation", "\\kappa", kappaOf(constants)] : ["along p αⁿ = constant", "(n-1)/n", polytropicPower(inputs2)];
    steps2.push({
      text: `Temperature at the end, ${text}`,
      formula: `T_2 = T_1 \\left(\\frac{p_2}{p_1}\\right)^{${tex}}`,
      filled: `T_2 = ${texNumber(start(inputs2))} \\left(\\frac{${texNumber(numberOf(inputs2, "pressureEnd") / 100)}}{${texNumber(numberOf(inputs2, "pressureStart") / 100)}}\\right)^{${texNumber(exponent2)}} = ${texQuantity(end, "K", 6)}`,
      value: end,
      unit: "K"
    });
  }
  const change2 = end - start(inputs2);
  steps2.push({ text: "Change of temperature", formula: "\\Delta T = T_2 - T_1", filled: `\\Delta T = ${texNumber(end, 6)} - ${texNumber(start(inputs2), 6)} = ${texQuantity(change2, "K")}`, value: change2, unit: "K" });
  return steps2;
}
function processSlips(of) {
  const other2 = (coefficient) => slip(
    `${coefficient.toLowerCase()}-for-${of.coefficient.toLowerCase()}`,
    `${printed[coefficient]} for ${printed[of.coefficient]}`,
    `This comes from ${printed[coefficient]} ΔT in place of ${printed[of.coefficient]} ΔT.`,
    (inputs2, constants) => of.sign * constant(constants, coefficient) * changeOf(of.process, inputs2, constants)
  );
  const slips = [signSlip(of.signSentence), ...["cp", "cv", "R"].filter((one2) => one2 !== of.coefficient).map(other2), joulesSlip, kilojoulesSlip];
  if (of.process === "isobaric" || of.process === "isochoric") {
    slips.push(slip("difference-as-temperature", "273.15 added to a difference", "A difference of temperatures is the same in °C and in K: 273.15 is not added to it.", (inputs2, constants, right) => right + of.sign * constant(constants, of.coefficient) * zeroCelsius));
    return slips;
  }
  const along = (end) => (inputs2, constants) => {
    const value23 = end(inputs2, constants);
    return value23 === null || !Number.isFinite(value23) ? null : of.sign * constant(constants, of.coefficient) * (value23 - start(inputs2));
  };
  const ratio2 = (inputs2) => numberOf(inputs2, "pressureEnd") / numberOf(inputs2, "pressureStart");
  if (of.process === "polytropic") {
    const ratioTo = (inputs2, exponent2) => start(inputs2) * pow(ratio2(inputs2), exponent2);
    slips.push(
      slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the formula takes kelvin.", along((inputs2) => zeroCelsius + (start(inputs2) - zeroCelsius) * pow(ratio2(inputs2), polytropicPower(inputs2)))),
      slip("inverted-ratio", "ratio of pressures turned round", "This comes from p₁/p₂ in place of p₂/p₁.", along((inputs2) => ratioTo(inputs2, -polytropicPower(inputs2)))),
      slip("exponent-of-volume", "n − 1 for (n − 1)/n", "This takes the exponent n − 1, which belongs to the ratio of volumes; that of pressures has (n − 1)/n.", along((inputs2) => ratioTo(inputs2, numberOf(inputs2, "polytropicExponent") - 1))),
      slip("adiabatic-exponent", "adiabatic for polytropic", "This takes the exponent R/cp of a dry adiabat: the process has its own n.", along((inputs2, constants) => ratioTo(inputs2, kappaOf(constants))))
    );
    return slips;
  }
  slips.push(
    slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C in Poisson’s relation, which takes kelvin.", along((inputs2, constants) => zeroCelsius + (start(inputs2) - zeroCelsius) * pow(ratio2(inputs2), kappaOf(constants)))),
    slip("inverted-ratio", "ratio of pressures turned round", "This comes from p₁/p₂ in place of p₂/p₁.", along((inputs2, constants) => start(inputs2) * pow(ratio2(inputs2), -kappaOf(constants)))),
    slip("inverted-exponent", "exponent turned round", "This comes from the exponent cp/R in place of R/cp.", along((inputs2, constants) => start(inputs2) * pow(ratio2(inputs2), 1 / kappaOf(constants))))
  );
  return slips;
}

// shared/thermo/quantities/adiabaticEnthalpyChange.ts
var adiabaticEnthalpyChangeDefinition = perKilogram({
  key: "adiabatic-enthalpy-change",
  name: "change of enthalpy, adiabatic",
  symbol: "Δh",
  tex: "\\Delta h",
  process: "adiabatic",
  coefficient: "cp",
  sign: 1,
  ask: "The change Δh of enthalpy in a dry-adiabatic change of pressure, end less start, per kilogram of dry air.",
  signSentence: "The change is counted end less start: air that expands adiabatically loses enthalpy.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: -28525, within: 5 }
});

// shared/thermo/quantities/adiabaticEnthalpyChangeOfMass.ts
var adiabaticEnthalpyChangeOfMassDefinition = forGivenMass(adiabaticEnthalpyChangeDefinition, "change of enthalpy of a given mass, adiabatic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: -57050, within: 10 });

// shared/thermo/quantities/adiabaticHeat.ts
var adiabaticHeatDefinition = {
  key: "adiabatic-heat",
  name: "heat taken up, adiabatic",
  symbol: "q",
  unit: "J/kg",
  shownUnit: "kJ/kg",
  kind: "difference",
  nearZero: 1e3,
  inputs: processInputs.adiabatic,
  variants: [{
    key: "definition",
    label: "by definition",
    source: { text: 'AMS Glossary of Meteorology, "adiabatic process"', status: "verified" },
    validity: "every adiabatic process",
    knownError: "none",
    evaluate: () => ({ is: "value", value: 0 })
  }],
  constants: [],
  ask: "The heat q that the air takes up in a dry-adiabatic change of pressure, per kilogram of dry air.",
  trace: () => [{ text: "An adiabatic process exchanges no heat", formula: "q = \\Delta u + w", filled: "q = 0\\,\\mathrm{kJ\\,kg^{-1}}", value: 0, unit: "J/kg" }],
  slips: [
    slip("enthalpy-for-heat", "cp ΔT taken for heat", "This is cp ΔT, the change of enthalpy: it is heat only at constant pressure.", (inputs2, constants) => constant(constants, "cp") * changeOf("adiabatic", inputs2, constants)),
    slip("internal-energy-for-heat", "cv ΔT taken for heat", "This is cv ΔT, the change of internal energy: it is heat only at constant volume.", (inputs2, constants) => constant(constants, "cv") * changeOf("adiabatic", inputs2, constants)),
    slip("work-for-heat", "work taken for heat", "This is the work done by the air, which its internal energy pays for.", (inputs2, constants) => -constant(constants, "cv") * changeOf("adiabatic", inputs2, constants))
  ],
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 0, within: 0 }
};

// shared/thermo/quantities/adiabaticHeatOfMass.ts
var adiabaticHeatOfMassDefinition = forGivenMass(adiabaticHeatDefinition, "heat taken up by a given mass, adiabatic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 0, within: 0 });

// shared/thermo/quantities/adiabaticInternalEnergyChange.ts
var adiabaticInternalEnergyChangeDefinition = perKilogram({
  key: "adiabatic-internal-energy-change",
  name: "change of internal energy, adiabatic",
  symbol: "Δu",
  tex: "\\Delta u",
  process: "adiabatic",
  coefficient: "cv",
  sign: 1,
  ask: "The change Δu of internal energy in a dry-adiabatic change of pressure, end less start, per kilogram of dry air.",
  signSentence: "The change is counted end less start: air that expands adiabatically loses internal energy.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: -20371, within: 5 }
});

// shared/thermo/quantities/adiabaticInternalEnergyChangeOfMass.ts
var adiabaticInternalEnergyChangeOfMassDefinition = forGivenMass(adiabaticInternalEnergyChangeDefinition, "change of internal energy of a given mass, adiabatic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: -40742, within: 10 });

// shared/thermo/composedSlips.ts
var finite = (value23) => Number.isFinite(value23) ? value23 : null;
var celsiusSlip = (formula, name, comesOutAs = "SI") => slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the formula takes kelvin.", (inputs2, constants, _right, formulae) => finite(formula({ ...inputs2, [name]: numberOf(inputs2, name) - zeroCelsius }, constants, formulae) + (comesOutAs === "Cel" ? zeroCelsius : 0)));
var hectopascalSlip = (formula, name) => slip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the pressure in hPa: with constants in SI it goes in in pascal.", (inputs2, constants, _right, formulae) => finite(formula({ ...inputs2, [name]: numberOf(inputs2, name) / 100 }, constants, formulae)));
var swappedSlip = (formula, first3, second3, key, label, sentence) => slip(key, label, sentence, (inputs2, constants, _right, formulae) => finite(formula({ ...inputs2, [first3]: numberOf(inputs2, second3), [second3]: numberOf(inputs2, first3) }, constants, formulae)));
var feetSlip = (formula, name) => slip("feet-for-meters", "feet taken for meters", "This comes from the height in feet where meters go in.", (inputs2, constants, _right, formulae) => finite(formula({ ...inputs2, [name]: numberOf(inputs2, name) / 0.3048 }, constants, formulae)));
var printed2 = { cp: "cp", cv: "cv", R: "R" };
var otherConstantSlip = (formula, right, taken) => slip(`${taken.toLowerCase()}-for-${right.toLowerCase()}`, `${printed2[taken]} for ${printed2[right]}`, `This comes from ${printed2[taken]} in place of ${printed2[right]}.`, (inputs2, constants, _right, formulae) => {
  const value23 = constants[taken];
  return value23 === void 0 ? null : finite(formula(inputs2, { ...constants, [right]: value23 }, formulae));
});
var vaporConstantSlip = (formula) => slip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor in place of that of dry air.", (inputs2, constants, _right, formulae) => finite(formula(inputs2, { ...constants, R: vaporGasConstant }, formulae)));
var zero273Slip = (formula, name) => constantSlip("zero-273", "273 for 273.15", "This comes from 273 in place of 273.15 between °C and kelvin.", (inputs2, constants, _right, formulae) => finite(formula({ ...inputs2, [name]: numberOf(inputs2, name) - 0.15 }, constants, formulae)));
var endUnitSlip = (shown3) => shown3 === "K" ? slip("end-unit", "°C given as kelvin", "Your number is the temperature in °C; the unit beside it says kelvin.", (_i, _c, right) => right > zeroCelsius ? right - zeroCelsius : null) : slip("end-unit", "kelvin and °C mixed up", "Your number is in kelvin; the unit beside it says °C.", (_i, _c, right) => right + zeroCelsius);
var differenceAsTemperatureSlip = (formula, name) => slip("difference-as-temperature", "273.15 added to a difference", "A difference of temperatures is the same in °C and in K: 273.15 is not added to it.", (inputs2, constants, _right, formulae) => finite(formula({ ...inputs2, [name]: numberOf(inputs2, name) + zeroCelsius }, constants, formulae)));

// shared/thermo/inputKinds.ts
var temperatureInput = (name = "temperature", label = "air temperature", symbol = "T", range = [150, 400]) => ({ name, label, symbol, unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range });
var pressureInput = (name = "pressure", label = "pressure", symbol = "p", range = [1e3, 12e4]) => ({ name, label, symbol, unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range });
var lengthInput = (name, label, symbol, range) => ({ name, label, symbol, unit: "m", shownUnit: "m", kind: "difference", shape: "number", range });
var specificVolumeInput = (name = "specificVolume", label = "specific volume", symbol = "α") => ({ name, label, symbol, unit: "m3/kg", shownUnit: "m3/kg", kind: "ratio", shape: "number", range: [0.05, 1e3] });
var specificEnergyInput = (name, label, symbol) => ({ name, label, symbol, unit: "J/kg", shownUnit: "kJ/kg", kind: "difference", shape: "number", range: [-1e6, 1e6] });
var temperatureChangeInput = (name = "temperatureChange", label = "change of temperature", symbol = "ΔT") => ({ name, label, symbol, unit: "K", shownUnit: "K", kind: "difference", shape: "number", range: [-200, 200] });
var timeInput = (name, label, symbol, range) => ({ name, label, symbol, unit: "s", shownUnit: "h", kind: "difference", shape: "number", range });

// shared/thermo/oneFormula.ts
function oneFormula({ formula, value: value23, working, ...rest }) {
  return {
    ...rest,
    variants: [{ ...formula, evaluate: (inputs2, constants, formulae) => ({ is: "value", value: value23(inputs2, constants, formulae) }) }],
    trace: (inputs2, constants, _variant, formulae) => working(inputs2, constants, value23(inputs2, constants, formulae), formulae)
  };
}

// shared/thermo/adiabats.ts
var shown = {
  temperature: { symbol: "T₂", tex: "T", unit: "K", shownUnit: "Cel", factor: 1, kind: "temperature", name: "temperature" },
  pressure: { symbol: "p₂", tex: "p", unit: "Pa", shownUnit: "hPa", factor: 100, kind: "ratio", name: "pressure" },
  specificVolume: { symbol: "α₂", tex: "\\alpha", unit: "m3/kg", shownUnit: "m3/kg", factor: 1, kind: "ratio", name: "specific volume" }
};
function adiabaticExponent(of, from2, constants) {
  const kappa = kappaOf(constants);
  const ofTemperature = { temperature: 1, pressure: kappa, specificVolume: -kappa / (1 - kappa) };
  return ofTemperature[from2] / ofTemperature[of];
}
function adiabaticState(of, start5, from2, fromStart, fromEnd, constants) {
  return start5 * pow(fromEnd / fromStart, adiabaticExponent(of, from2, constants));
}
var exponentTex = {
  "temperature pressure": "R/c_p",
  "pressure temperature": "c_p/R",
  "temperature specificVolume": "-R/c_v",
  "specificVolume temperature": "-c_v/R",
  "pressure specificVolume": "-c_p/c_v",
  "specificVolume pressure": "-c_v/c_p"
};
function input(variable, at) {
  const when = at === "Start" ? "at the start" : "at the end", index = at === "Start" ? "₁" : "₂";
  if (variable === "temperature") return temperatureInput(`temperature${at}`, `temperature ${when}`, `T${index}`);
  if (variable === "pressure") return pressureInput(`pressure${at}`, `pressure ${when}`, `p${index}`);
  return specificVolumeInput(`specificVolume${at}`, `specific volume ${when}`, `α${index}`);
}
function adiabaticRelation({ key, name, of, from: from2, ask, moreSlips = [], example }) {
  const names = { start: `${of}Start`, fromStart: `${from2}Start`, fromEnd: `${from2}End` };
  const value23 = (inputs2, constants) => adiabaticState(of, numberOf(inputs2, names.start), from2, numberOf(inputs2, names.fromStart), numberOf(inputs2, names.fromEnd), constants);
  const x = shown[of], y = shown[from2];
  return oneFormula({
    key,
    name,
    symbol: x.symbol,
    unit: x.unit,
    shownUnit: x.shownUnit,
    kind: x.kind,
    inputs: [input(of, "Start"), input(from2, "Start"), input(from2, "End")],
    constants: ["R", "cp", "kappa"],
    formula: {
      key: "poisson",
      label: "Poisson’s relation",
      source: { text: 'AMS Glossary of Meteorology, "Poisson equation"', status: "verified" },
      validity: "150–400 K, no water vapor",
      knownError: "κ 0.2854 to 0.286: 0.02 % of the temperature for each 30 % of the pressure"
    },
    ask,
    value: value23,
    working(inputs2, constants, result2) {
      const exponent2 = adiabaticExponent(of, from2, constants);
      const start5 = numberOf(inputs2, names.start) / x.factor, before = numberOf(inputs2, names.fromStart) / y.factor, after = numberOf(inputs2, names.fromEnd) / y.factor;
      const power2 = exponentTex[`${of} ${from2}`] ?? "";
      return [
        { text: "Exponent", formula: power2, filled: `${power2} = ${texNumber(exponent2)}`, value: exponent2, unit: "1" },
        worked("Poisson’s relation, with temperatures in kelvin", `${x.tex}_2 = ${x.tex}_1 \\left(\\frac{${y.tex}_2}{${y.tex}_1}\\right)^{${power2}}`, `${x.tex}_2 = ${texNumber(start5, 6)} \\left(\\frac{${texNumber(after, 6)}}{${texNumber(before, 6)}}\\right)^{${texNumber(exponent2)}}`, result2, x.unit, { value: result2 / x.factor, unit: of === "pressure" ? "hPa" : x.unit })
      ];
    },
    slips: [...relationSlips(of, from2, names, value23), ...moreSlips],
    example
  });
}
function relationSlips(of, from2, names, value23) {
  const raised3 = (power2) => (inputs2, constants) => {
    const result2 = numberOf(inputs2, names.start) * pow(numberOf(inputs2, names.fromEnd) / numberOf(inputs2, names.fromStart), power2(adiabaticExponent(of, from2, constants), constants));
    return Number.isFinite(result2) ? result2 : null;
  };
  const slips = [
    swappedSlip(value23, names.fromStart, names.fromEnd, "inverted-ratio", "ratio turned round", "This has the ratio of start and end turned round."),
    slip("inverted-exponent", "exponent turned round", "This comes from the exponent turned round, its inverse.", raised3((exponent2) => 1 / exponent2)),
    slip("exponent-left-out", "exponent left out", "This takes the two in plain proportion: along a dry adiabat the ratio has an exponent.", raised3((exponent2) => exponent2 < 0 ? -1 : 1))
  ];
  if (of === "pressure" || of === "temperature") {
    slips.push(slip("other-pair", "exponent of another pair", "This takes the exponent that belongs to another pair of p, T and α.", raised3((exponent2, constants) => (exponent2 < 0 ? -1 : 1) * Math.abs(adiabaticExponent(of, from2 === "specificVolume" ? of === "pressure" ? "temperature" : "pressure" : "specificVolume", constants)))));
  }
  if (of === "temperature") slips.push(celsiusSlip(value23, names.start, "Cel"), endUnitSlip("Cel"));
  if (from2 === "temperature") {
    slips.push(slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperatures in °C: the formula takes kelvin.", (inputs2, constants) => {
      const before = numberOf(inputs2, names.fromStart) - zeroCelsius, after = numberOf(inputs2, names.fromEnd) - zeroCelsius;
      if (!(before !== 0 && after / before > 0)) return null;
      const result2 = numberOf(inputs2, names.start) * pow(after / before, adiabaticExponent(of, from2, constants));
      return Number.isFinite(result2) ? result2 : null;
    }));
  }
  return slips;
}

// shared/thermo/quantities/adiabaticPressureFromSpecificVolume.ts
var adiabaticPressureFromSpecificVolumeDefinition = adiabaticRelation({
  key: "adiabatic-pressure-from-specific-volume",
  name: "pressure after a dry-adiabatic change, from the specific volumes",
  of: "pressure",
  from: "specificVolume",
  ask: "The pressure p₂ of dry air after a dry-adiabatic change of its specific volume, by Poisson’s relation.",
  example: { inputs: { pressureStart: 1e5, specificVolumeStart: 0.84, specificVolumeEnd: 1.08 }, gives: 70334.32, within: 0.01 }
});

// shared/thermo/quantities/adiabaticPressureFromTemperature.ts
var adiabaticPressureFromTemperatureDefinition = adiabaticRelation({
  key: "adiabatic-pressure-from-temperature",
  name: "pressure after a dry-adiabatic change, from the temperatures",
  of: "pressure",
  from: "temperature",
  ask: "The pressure p₂ at which dry air has the temperature at the end of a dry-adiabatic change, by Poisson’s relation, with temperatures in kelvin.",
  example: { inputs: { pressureStart: 1e5, temperatureStart: 293.15, temperatureEnd: 273.15 }, gives: 78098.56, within: 0.01 }
});

// shared/thermo/quantities/adiabaticSpecificVolumeFromPressure.ts
var adiabaticSpecificVolumeFromPressureDefinition = adiabaticRelation({
  key: "adiabatic-specific-volume-from-pressure",
  name: "specific volume after a dry-adiabatic change, from the pressures",
  of: "specificVolume",
  from: "pressure",
  ask: "The specific volume α₂ of dry air after a dry-adiabatic change of pressure, by Poisson’s relation.",
  example: { inputs: { specificVolumeStart: 0.84, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 1.083681, within: 1e-6 }
});

// shared/thermo/quantities/adiabaticSpecificVolumeFromTemperature.ts
var adiabaticSpecificVolumeFromTemperatureDefinition = adiabaticRelation({
  key: "adiabatic-specific-volume-from-temperature",
  name: "specific volume after a dry-adiabatic change, from the temperatures",
  of: "specificVolume",
  from: "temperature",
  ask: "The specific volume α₂ of dry air after a dry-adiabatic change of its temperature, by Poisson’s relation, with temperatures in kelvin.",
  example: { inputs: { specificVolumeStart: 0.84, temperatureStart: 293.15, temperatureEnd: 273.15 }, gives: 1.002184, within: 1e-6 }
});

// shared/thermo/quantities/adiabaticTemperatureFromSpecificVolume.ts
var adiabaticTemperatureFromSpecificVolumeDefinition = adiabaticRelation({
  key: "adiabatic-temperature-from-specific-volume",
  name: "temperature after a dry-adiabatic change, from the specific volumes",
  of: "temperature",
  from: "specificVolume",
  ask: "The temperature T₂ of dry air after a dry-adiabatic change of its specific volume, by Poisson’s relation.",
  example: { inputs: { temperatureStart: 293.15, specificVolumeStart: 0.84, specificVolumeEnd: 1.08 }, gives: 265.0951, within: 1e-4 }
});

// shared/thermo/quantities/adiabaticWork.ts
var adiabaticWorkDefinition = perKilogram({
  key: "adiabatic-work",
  name: "work done by the air, adiabatic",
  symbol: "w",
  tex: "w",
  process: "adiabatic",
  coefficient: "cv",
  sign: -1,
  ask: "The work w done by the air in a dry-adiabatic change of pressure, positive when the air expands, per kilogram of dry air.",
  signSentence: "The work is counted positive when the air does it, by expanding.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 20371, within: 5 }
});

// shared/thermo/quantities/adiabaticWorkOfMass.ts
var adiabaticWorkOfMassDefinition = forGivenMass(adiabaticWorkDefinition, "work done by a given mass, adiabatic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 40742, within: 10 });

// shared/thermo/quantities/density.ts
function density(pressure4, temperature6, constants) {
  return kilogramPerCubicMeter(pressure4 / (constant(constants, "R") * temperature6));
}
var densityDefinition = {
  key: "density",
  name: "density of dry air",
  symbol: "ρ",
  unit: "kg/m3",
  shownUnit: "kg/m3",
  kind: "ratio",
  inputs: [
    { name: "pressure", label: "pressure", symbol: "p", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [100, 12e4] },
    { name: "temperature", label: "air temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] }
  ],
  variants: [{
    key: "ideal-gas",
    label: "equation of state of dry air",
    source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: "common practice" },
    validity: "100–400 K, 1–1200 hPa",
    knownError: "below 0.1 % for dry air",
    evaluate: (inputs2, constants) => ({ is: "value", value: density(pascal(numberOf(inputs2, "pressure")), kelvin(numberOf(inputs2, "temperature")), constants) })
  }],
  constants: ["R"],
  ask: "The density ρ of dry air by the equation of state, with the temperature in kelvin.",
  trace(inputs2, constants) {
    const p10 = numberOf(inputs2, "pressure"), T11 = numberOf(inputs2, "temperature"), R = constant(constants, "R");
    const value23 = density(pascal(p10), kelvin(T11), constants);
    return [
      { text: "Equation of state, with p in pascal and T in kelvin", formula: "\\rho = \\frac{p}{R\\,T}", filled: `\\rho = \\frac{${texNumber(p10, 7)}}{${texNumber(R)} \\cdot ${texNumber(T11)}} = ${texQuantity(value23, "kg/m3")}`, value: value23, unit: "kg/m3" }
    ];
  },
  slips: [
    slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the equation of state takes kelvin.", (inputs2, _c, right) => {
      const t = numberOf(inputs2, "temperature") - zeroCelsius;
      return t === 0 ? null : right * numberOf(inputs2, "temperature") / t;
    }),
    slip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the pressure in hPa: with R in J kg⁻¹ K⁻¹ it goes in in pascal.", (_i, _c, right) => right / 100),
    slip("vapor-gas-constant", "gas constant of vapor", "This is what comes out with the gas constant of water vapor in place of that of dry air.", (_i, constants, right) => right * constant(constants, "R") / vaporGasConstant),
    slip("universal-gas-constant", "universal gas constant", "This is what comes out with the universal gas constant, which belongs to moles and not to kilograms.", (_i, constants, right) => right * constant(constants, "R") / universalGasConstant),
    slip("inverse", "specific volume for density", "This is the specific volume 1/ρ.", (_i, _c, right) => 1 / right)
  ],
  example: { inputs: { pressure: 101325, temperature: 298.15 }, gives: 1.18413, within: 1e-5 }
};

// shared/thermo/quantities/dryAdiabaticLapseRate.ts
var printedDryRate = 98e-4;
var dryAdiabaticLapseRate = (constants) => kelvinPerMeter(dryRateOf(constants));
var dryAdiabaticLapseRateDefinition = {
  key: "dry-adiabatic-lapse-rate",
  name: "dry adiabatic lapse rate",
  symbol: "Γd",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [],
  variants: [
    {
      key: "g-over-cp",
      label: "g/cp",
      source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate"', status: "verified" },
      validity: "unsaturated air",
      knownError: "9.751 to 9.80 K km⁻¹ by the constants taught",
      evaluate: (_inputs, constants) => ({ is: "value", value: dryAdiabaticLapseRate(constants) })
    },
    {
      key: "as-printed",
      label: "9.8 K km⁻¹ as usually printed",
      source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate" (approximately 9.8 °C/km)', status: "common practice" },
      validity: "unsaturated air",
      knownError: "0.3 to 0.5 % above g/cp",
      evaluate: () => ({ is: "value", value: printedDryRate })
    }
  ],
  constants: ["g", "cp"],
  ask: "The dry adiabatic lapse rate Γd = −dT/dz of a parcel, positive since it cools as it rises.",
  trace(_inputs, constants, variant) {
    if (variant === "as-printed") return [{ text: "As usually printed", formula: "\\Gamma_d", filled: `\\Gamma_d = ${texQuantity(printedDryRate * 1e3, "K/km")}`, value: printedDryRate, unit: "K/m" }];
    const value23 = dryAdiabaticLapseRate(constants);
    return [{ text: "Rising dry air pays for its height with enthalpy: cp dT = −g dz", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(constant(constants, "cp"), 6)}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height."),
    perMeterSlip,
    per100MetersSlip,
    slip("cv-for-cp", "cv for cp", "This is g/cv in place of g/cp.", (_i, constants) => constant(constants, "g") / constant(constants, "cv")),
    slip("autoconvective", "g/R for g/cp", "This is g/R, the autoconvective lapse rate.", (_i, constants) => constant(constants, "g") / constant(constants, "R")),
    slip("standard-atmosphere", "6.5 K km⁻¹", "This is the mean lapse rate of the standard atmosphere, not that of a dry parcel.", () => 65e-4)
  ],
  example: { inputs: {}, gives: 97709e-7, within: 1e-7 }
};

// shared/thermo/quantities/dryStaticEnergy.ts
function dryStaticEnergy(temperature6, height2, constants) {
  return joulePerKilogram(constant(constants, "cp") * temperature6 + constant(constants, "g") * height2);
}
var T = (inputs2) => numberOf(inputs2, "temperature");
var z = (inputs2) => numberOf(inputs2, "heightAboveDatum");
var value = (inputs2, constants) => dryStaticEnergy(kelvin(T(inputs2)), meter(z(inputs2)), constants);
var dryStaticEnergyDefinition = oneFormula({
  key: "dry-static-energy",
  name: "dry static energy",
  symbol: "s",
  unit: "J/kg",
  shownUnit: "kJ/kg",
  kind: "ratio",
  inputs: [temperatureInput(), lengthInput("heightAboveDatum", "height above the stated datum", "z", [-500, 5e4])],
  constants: ["cp", "g"],
  formula: {
    key: "definition",
    label: "cp T + g z",
    source: { text: 'AMS Glossary of Meteorology, "dry static energy"', status: "common practice" },
    validity: "dry air",
    knownError: "cp 1004 to 1005.7: 0.5 kJ kg⁻¹"
  },
  ask: "The dry static energy s = cp T + g z of the air, with the temperature in kelvin and the height above the stated datum.",
  value,
  working: (inputs2, constants, result2) => [
    worked("Enthalpy, with T in kelvin", "c_p\\,T", `${texNumber(constant(constants, "cp"), 6)} \\cdot ${texNumber(T(inputs2), 6)}`, constant(constants, "cp") * T(inputs2), "J/kg", { value: constant(constants, "cp") * T(inputs2) / 1e3, unit: "kJ/kg" }),
    worked("Geopotential", "g\\,z", `${texNumber(constant(constants, "g"), 6)} \\cdot ${texFactor(z(inputs2), 6)}`, constant(constants, "g") * z(inputs2), "J/kg", { value: constant(constants, "g") * z(inputs2) / 1e3, unit: "kJ/kg" }),
    worked("Dry static energy", "s = c_p\\,T + g\\,z", `s = ${texNumber(constant(constants, "cp") * T(inputs2) / 1e3, 6)} + ${texFactor(constant(constants, "g") * z(inputs2) / 1e3, 6)}`, result2, "J/kg", { value: result2 / 1e3, unit: "kJ/kg" })
  ],
  slips: [
    celsiusSlip(value, "temperature"),
    otherConstantSlip(value, "cp", "cv"),
    slip("height-left-out", "g z left out", "This is cp T alone: the geopotential g z belongs to it.", (inputs2, constants) => z(inputs2) === 0 ? null : constant(constants, "cp") * T(inputs2)),
    slip("height-sign", "g z taken off", "This takes g z off in place of adding it.", (inputs2, constants) => z(inputs2) === 0 ? null : constant(constants, "cp") * T(inputs2) - constant(constants, "g") * z(inputs2)),
    feetSlip(value, "heightAboveDatum"),
    joulesSlip
  ],
  example: { inputs: { temperature: 288.15, heightAboveDatum: 1e3 }, gives: 299112.6, within: 0.1 }
});

// shared/thermo/quantities/exnerFunction.ts
function exnerFunction(pressure4, constants) {
  return pow(pressure4 / constant(constants, "p0"), kappaOf(constants));
}
var p = (inputs2) => numberOf(inputs2, "pressure");
var value2 = (inputs2, constants) => exnerFunction(pascal(p(inputs2)), constants);
var exnerFunctionDefinition = oneFormula({
  key: "exner-function",
  name: "Exner function",
  symbol: "Π",
  unit: "1",
  shownUnit: "1",
  kind: "ratio",
  inputs: [pressureInput()],
  constants: ["R", "cp", "p0", "kappa"],
  formula: {
    key: "power",
    label: "(p/p₀)^κ, p₀ = 1000 hPa",
    source: { text: 'AMS Glossary of Meteorology, "Exner function"', status: "common practice" },
    validity: "10–1200 hPa",
    knownError: "κ 0.2854 to 0.286: 0.02 % at 700 hPa, 0.14 % at 100 hPa"
  },
  ask: "The dimensionless Exner function Π = (p/p₀)^κ with p₀ = 1000 hPa and κ = R/cp, not multiplied by cp.",
  value: value2,
  working: (inputs2, constants, result2) => [
    { text: "Exponent", formula: "\\kappa = \\frac{R}{c_p}", filled: `\\kappa = ${texNumber(kappaOf(constants))}`, value: kappaOf(constants), unit: "1" },
    worked("Exner function", "\\Pi = \\left(\\frac{p}{p_0}\\right)^{\\kappa}", `\\Pi = \\left(\\frac{${texNumber(p(inputs2) / 100, 6)}}{${texNumber(constant(constants, "p0") / 100)}}\\right)^{${texNumber(kappaOf(constants))}}`, result2, "1")
  ],
  slips: [
    slip("inverted-ratio", "ratio of pressures turned round", "This comes from p₀/p in place of p/p₀.", (_i, _c, right) => 1 / right),
    slip("inverted-exponent", "exponent turned round", "This comes from the exponent cp/R in place of R/cp.", (inputs2, constants) => pow(p(inputs2) / constant(constants, "p0"), 1 / kappaOf(constants))),
    slip("cv-for-cp", "cv for cp", "This comes from the exponent R/cv in place of R/cp.", (inputs2, constants) => pow(p(inputs2) / constant(constants, "p0"), constant(constants, "R") / constant(constants, "cv"))),
    slip("standard-pressure", "1013.25 hPa for 1000 hPa", "This refers to 1013.25 hPa: the Exner function refers to 1000 hPa.", (_i, constants, right) => right * pow(constant(constants, "p0") / 101325, kappaOf(constants))),
    slip("times-cp", "multiplied by cp", "This is cp (p/p₀)^κ, in J kg⁻¹ K⁻¹: here the dimensionless function is asked.", (_i, constants, right) => right * constant(constants, "cp")),
    slip("exponent-left-out", "exponent left out", "This is the ratio of pressures alone.", (inputs2, constants) => p(inputs2) / constant(constants, "p0")),
    hectopascalSlip(value2, "pressure")
  ],
  example: { inputs: { pressure: 85e3 }, gives: 0.9546055, within: 1e-7 }
});

// shared/thermo/energyBalance.ts
var forms = {
  "internal-energy": { coefficient: "cv", formula: "q = c_v\\,\\Delta T + w", other: { name: "work", tex: "w" }, inputs: [specificEnergyInput("work", "work done by the air, per kilogram", "w")] },
  "enthalpy": {
    coefficient: "cp",
    formula: "q = c_p\\,\\Delta T - \\alpha\\,\\Delta p",
    other: { name: "pressureChange", tex: "\\Delta p" },
    inputs: [specificVolumeInput("specificVolume", "mean specific volume", "α"), { name: "pressureChange", label: "change of pressure", symbol: "Δp", unit: "Pa", shownUnit: "hPa", kind: "difference", shape: "number", range: [-5e4, 5e4] }]
  },
  "geopotential": { coefficient: "cp", formula: "q = c_p\\,\\Delta T + g\\,\\Delta z", other: { name: "heightDifference", tex: "\\Delta z" }, inputs: [lengthInput("heightDifference", "change of height", "Δz", [-2e4, 2e4])] }
};
function weightOf(form, inputs2, constants) {
  if (form === "internal-energy") return 1;
  return form === "enthalpy" ? -numberOf(inputs2, "specificVolume") : constant(constants, "g");
}
function firstLawTerm(form, unknown, inputs2, constants) {
  const c2 = constant(constants, forms[form].coefficient), weight = weightOf(form, inputs2, constants);
  if (unknown === "heat") return c2 * numberOf(inputs2, "temperatureChange") + weight * numberOf(inputs2, forms[form].other.name);
  if (unknown === "temperatureChange") return (numberOf(inputs2, "heat") - weight * numberOf(inputs2, forms[form].other.name)) / c2;
  return (numberOf(inputs2, "heat") - c2 * numberOf(inputs2, "temperatureChange")) / weight;
}
var unitsOf = (form, unknown) => {
  if (unknown === "temperatureChange") return { unit: "K", shownUnit: "K", nearZero: 1, factor: 1 };
  if (unknown === "heat" || form === "internal-energy") return { unit: "J/kg", shownUnit: "kJ/kg", nearZero: 1e3, factor: 1e3 };
  return form === "enthalpy" ? { unit: "Pa", shownUnit: "hPa", nearZero: 100, factor: 100 } : { unit: "m", shownUnit: "m", nearZero: 10, factor: 1 };
};
function firstLawQuantity(of) {
  const { form, unknown } = of;
  const shape = forms[form], { factor, ...units3 } = unitsOf(form, unknown);
  const value23 = (inputs2, constants) => firstLawTerm(form, unknown, inputs2, constants);
  const tex = unknown === "heat" ? "q" : unknown === "temperatureChange" ? "\\Delta T" : shape.other.tex;
  return oneFormula({
    key: of.key,
    name: of.name,
    symbol: of.symbol,
    ...units3,
    kind: "difference",
    inputs: [
      ...unknown === "heat" ? [] : [specificEnergyInput("heat", "heat taken up by the air, per kilogram", "q")],
      ...unknown === "temperatureChange" ? [] : [temperatureChangeInput()],
      ...shape.inputs.filter((input2) => unknown !== "other" || input2.name !== shape.other.name)
    ],
    constants: form === "geopotential" ? [shape.coefficient, "g"] : [shape.coefficient],
    formula: {
      key: "first-law",
      label: `first law, ${form === "internal-energy" ? "internal energy" : form === "enthalpy" ? "enthalpy" : "enthalpy with geopotential"}`,
      source: { text: 'AMS Glossary of Meteorology, "first law of thermodynamics"', status: "common practice" },
      validity: form === "enthalpy" ? "200–350 K, Δp small beside p" : "200–350 K",
      knownError: "cp 1004 to 1005.7: 0.17 % of the term with ΔT"
    },
    ask: of.ask,
    value: value23,
    working(inputs2, constants, result2) {
      const c2 = constant(constants, shape.coefficient);
      const put = (name) => texFactor(numberOf(inputs2, name), 6);
      const other2 = form === "internal-energy" ? "" : form === "enthalpy" ? `${texNumber(numberOf(inputs2, "specificVolume"))} \\cdot ` : `${texNumber(constant(constants, "g"), 6)} \\cdot `;
      const minus2 = form === "enthalpy";
      const solved2 = {
        heat: { formula: shape.formula, filled: () => `q = ${texNumber(c2, 6)} \\cdot ${put("temperatureChange")} ${minus2 ? "-" : "+"} ${other2}${put(shape.other.name)}` },
        temperatureChange: { formula: `\\Delta T = \\frac{q ${minus2 ? "+ \\alpha\\,\\Delta p" : form === "geopotential" ? "- g\\,\\Delta z" : "- w"}}{${shape.coefficient === "cp" ? "c_p" : "c_v"}}`, filled: () => `\\Delta T = \\frac{${put("heat")} ${minus2 ? "+" : "-"} ${other2}${put(shape.other.name)}}{${texNumber(c2, 6)}}` },
        other: {
          formula: form === "internal-energy" ? "w = q - c_v\\,\\Delta T" : minus2 ? "\\Delta p = \\frac{c_p\\,\\Delta T - q}{\\alpha}" : "\\Delta z = \\frac{q - c_p\\,\\Delta T}{g}",
          filled: () => {
            const difference3 = `${put("heat")} - ${texNumber(c2, 6)} \\cdot ${put("temperatureChange")}`;
            if (form === "internal-energy") return `w = ${difference3}`;
            return minus2 ? `\\Delta p = \\frac{${texNumber(c2, 6)} \\cdot ${put("temperatureChange")} - ${put("heat")}}{${texNumber(numberOf(inputs2, "specificVolume"))}}` : `\\Delta z = \\frac{${difference3}}{${texNumber(constant(constants, "g"), 6)}}`;
          }
        }
      }[unknown];
      return [worked(`First law, solved for ${unknown === "heat" ? "the heat" : unknown === "temperatureChange" ? "the change of temperature" : of.name}`, solved2.formula, solved2.filled(), result2, units3.unit, { value: result2 / factor, unit: tex === "\\Delta T" ? "K" : units3.shownUnit })];
    },
    slips: firstLawSlips(of, value23),
    example: of.example
  });
}
var leftOut = {
  "internal-energy": "This leaves out the term with the work.",
  "enthalpy": "This leaves out the term α Δp, or takes Δp in hPa, which makes it a hundred times too small.",
  "geopotential": "This leaves out the term g Δz, or takes Δz in km, which makes it a thousand times too small."
};
function firstLawSlips({ form, unknown, signSentence }, value23) {
  const shape = forms[form];
  const changed = (name, change2) => (inputs2, constants) => numberOf(inputs2, name) === 0 ? null : value23({ ...inputs2, [name]: change2(numberOf(inputs2, name)) }, constants);
  const first3 = unknown === "heat" ? "temperatureChange" : "heat";
  const otherTurned = (inputs2, constants) => numberOf(inputs2, first3) === 0 ? null : changed(shape.other.name, (x) => -x)(inputs2, constants);
  const otherCoefficient = shape.coefficient === "cp" ? "cv" : "cp";
  const slips = [
    signSlip(signSentence),
    slip(`${otherCoefficient}-for-${shape.coefficient}`, `${otherCoefficient} for ${shape.coefficient}`, `This comes from ${otherCoefficient} where this form of the first law has ${shape.coefficient}.`, (inputs2, constants) => value23(inputs2, { ...constants, [shape.coefficient]: constant(constants, otherCoefficient) }))
  ];
  if (unknown !== "other") {
    slips.push(
      slip("other-term-sign", "sign of one term turned round", `This has the sign of the term with ${shape.other.name === "work" ? "the work" : shape.other.name === "pressureChange" ? "the change of pressure" : "the change of height"} turned round.`, otherTurned),
      slip("other-term-left-out", "one term left out", leftOut[form], changed(shape.other.name, () => 0))
    );
  } else {
    slips.push(
      slip("heat-sign", "sign of the heat turned round", "This counts the heat taken up as given off.", (inputs2, constants) => numberOf(inputs2, "temperatureChange") === 0 ? null : changed("heat", (q2) => -q2)(inputs2, constants)),
      slip("heat-left-out", "heat left out", "This leaves the heat out, as if the change were adiabatic.", changed("heat", () => 0))
    );
  }
  if (unknown !== "temperatureChange") slips.push(differenceAsTemperatureSlip(value23, "temperatureChange"));
  if (unknown === "temperatureChange") slips.push(slip("kilojoules-put-in", "kJ put in for J", "This comes from the heat in kJ beside constants in J.", changed("heat", (q2) => q2 / 1e3)));
  if (unitsOf(form, unknown).unit === "J/kg") slips.push(joulesSlip, kilojoulesSlip);
  return slips;
}

// shared/thermo/quantities/heatFromEnthalpyAndGeopotential.ts
var heatFromEnthalpyAndGeopotentialDefinition = firstLawQuantity({
  key: "heat-from-enthalpy-and-geopotential",
  name: "heat taken up, from the changes of temperature and height",
  symbol: "q",
  form: "geopotential",
  unknown: "heat",
  ask: "The heat q = cp ΔT + g Δz that the air takes up, positive when taken up, in hydrostatic balance, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperatureChange: -5, heightDifference: 1e3 }, gives: 4790, within: 0.1 }
});

// shared/thermo/quantities/heatFromEnthalpyAndPressureChange.ts
var heatFromEnthalpyAndPressureChangeDefinition = firstLawQuantity({
  key: "heat-from-enthalpy-and-pressure-change",
  name: "heat taken up, from the changes of temperature and pressure",
  symbol: "q",
  form: "enthalpy",
  unknown: "heat",
  ask: "The heat q = cp ΔT − α Δp that the air takes up, positive when taken up, for a small change of pressure Δp at the mean specific volume α, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperatureChange: 5, specificVolume: 0.85, pressureChange: -2e3 }, gives: 6720, within: 0.1 }
});

// shared/thermo/quantities/heatFromInternalEnergyAndWork.ts
var heatFromInternalEnergyAndWorkDefinition = firstLawQuantity({
  key: "heat-from-internal-energy-and-work",
  name: "heat taken up, from the change of temperature and the work",
  symbol: "q",
  form: "internal-energy",
  unknown: "heat",
  ask: "The heat q = cv ΔT + w that the air takes up, positive when taken up, with w the work done by the air, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperatureChange: 10, work: 2870 }, gives: 10040, within: 0.1 }
});

// shared/thermo/heating.ts
var heatingInputs = [
  temperatureInput("temperatureStart", "temperature at the start", "T₁"),
  temperatureInput("temperatureEnd", "temperature at the end", "T₂"),
  timeInput("timeBetween", "elapsed time, as between two instants in UTC", "Δt", [1, 31536e3])
];
var heatingAssumption = "assuming that neither advection nor vertical motion changes the temperature there, and that the pressure stays";
function temperatureTendency(inputs2) {
  return (numberOf(inputs2, "temperatureEnd") - numberOf(inputs2, "temperatureStart")) / numberOf(inputs2, "timeBetween");
}
var heatingFormula = {
  key: "first-law",
  source: { text: 'AMS Glossary of Meteorology, "diabatic process"; first law at constant pressure', status: "common practice" },
  validity: "no advection, no vertical motion, constant pressure",
  knownError: "what the assumption leaves out"
};

// shared/thermo/quantities/heatingRate.ts
var heatingRateDefinition = oneFormula({
  key: "heating-rate",
  name: "heating rate from an observed change of temperature",
  symbol: "q̇/cp",
  unit: "K/s",
  shownUnit: "K/h",
  kind: "difference",
  nearZero: 0.1 / 3600,
  inputs: heatingInputs,
  constants: [],
  formula: { ...heatingFormula, label: "ΔT/Δt" },
  ask: `The rate q̇/cp at which heating warms the air, positive where it warms, ${heatingAssumption}.`,
  value: temperatureTendency,
  working(inputs2, _constants, result2) {
    const change2 = numberOf(inputs2, "temperatureEnd") - numberOf(inputs2, "temperatureStart"), hours = numberOf(inputs2, "timeBetween") / 3600;
    return [
      worked("Change of temperature", "\\Delta T = T_2 - T_1", `\\Delta T = ${texNumber(numberOf(inputs2, "temperatureEnd"), 6)} - ${texNumber(numberOf(inputs2, "temperatureStart"), 6)}`, change2, "K"),
      worked("Without advection and vertical motion heating alone changes the temperature", "\\frac{\\dot q}{c_p} = \\frac{\\Delta T}{\\Delta t}", `\\frac{\\dot q}{c_p} = \\frac{${texFactor(change2)}}{${texNumber(hours)}}`, result2, "K/s", { value: result2 * 3600, unit: "K/h" }, 5)
    ];
  },
  slips: [
    signSlip("The rate is positive where the air warms: the end less the start."),
    slip("per-day", "K per day given as K h⁻¹", "Your value is the rate per day: divide it by 24 for the rate per hour.", (_i, _c, right) => right * 24),
    slip("per-minute", "K per minute given as K h⁻¹", "Your value is the rate per minute: multiply it by 60 for the rate per hour.", (_i, _c, right) => right / 60),
    slip("per-second", "K per second given as K h⁻¹", "Your value is the rate per second: multiply it by 3600 for the rate per hour.", (_i, _c, right) => right / 3600),
    slip("time-left-out", "not divided by the time", "This is the change of temperature: divide it by the time that it took.", (inputs2, _c, right) => right * numberOf(inputs2, "timeBetween") / 3600),
    slip("inverted", "time over temperature", "This is Δt/ΔT, turned round.", (_i, _c, right) => right === 0 ? null : 1 / (right * 3600) / 3600),
    slip("clock-hour", "an hour too few", "This takes an hour less than has passed, as where the clock was set back in between: time is counted in UTC.", (inputs2, _c, right) => numberOf(inputs2, "timeBetween") > 3600 ? right * numberOf(inputs2, "timeBetween") / (numberOf(inputs2, "timeBetween") - 3600) : null),
    differenceAsTemperatureSlip(temperatureTendency, "temperatureEnd")
  ],
  example: { inputs: { temperatureStart: 285.15, temperatureEnd: 288.15, timeBetween: 7200 }, gives: 416667e-9, within: 1e-9 }
});

// shared/thermo/quantities/heightChangeFromHeatAndEnthalpy.ts
var heightChangeFromHeatAndEnthalpyDefinition = firstLawQuantity({
  key: "height-change-from-heat-and-enthalpy",
  name: "change of height, from the heat and the change of temperature",
  symbol: "Δz",
  form: "geopotential",
  unknown: "other",
  ask: "The change of height Δz = (q − cp ΔT)/g of the air, end less start, in hydrostatic balance; q is 0 where the change is adiabatic.",
  signSentence: "A change of height is the end less the start.",
  example: { inputs: { heat: 0, temperatureChange: -9.8 }, gives: 1002.9766, within: 1e-4 }
});

// shared/thermo/quantities/isobaricEnthalpyChange.ts
var isobaricEnthalpyChangeDefinition = perKilogram({
  key: "isobaric-enthalpy-change",
  name: "change of enthalpy, isobaric",
  symbol: "Δh",
  tex: "\\Delta h",
  process: "isobaric",
  coefficient: "cp",
  sign: 1,
  ask: "The change Δh of enthalpy at constant pressure, end less start, per kilogram of dry air.",
  signSentence: "The change is counted end less start.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 25100, within: 1 }
});

// shared/thermo/quantities/isobaricEnthalpyChangeOfMass.ts
var isobaricEnthalpyChangeOfMassDefinition = forGivenMass(isobaricEnthalpyChangeDefinition, "change of enthalpy of a given mass, isobaric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 50200, within: 2 });

// shared/thermo/quantities/isobaricHeat.ts
var isobaricHeatDefinition = perKilogram({
  key: "isobaric-heat",
  name: "heat taken up, isobaric",
  symbol: "q",
  tex: "q",
  process: "isobaric",
  coefficient: "cp",
  sign: 1,
  ask: "The heat q that the air takes up at constant pressure, positive when taken up, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 25100, within: 1 }
});

// shared/thermo/quantities/isobaricHeatOfMass.ts
var isobaricHeatOfMassDefinition = forGivenMass(isobaricHeatDefinition, "heat taken up by a given mass, isobaric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 50200, within: 2 });

// shared/thermo/quantities/isobaricInternalEnergyChange.ts
var isobaricInternalEnergyChangeDefinition = perKilogram({
  key: "isobaric-internal-energy-change",
  name: "change of internal energy, isobaric",
  symbol: "Δu",
  tex: "\\Delta u",
  process: "isobaric",
  coefficient: "cv",
  sign: 1,
  ask: "The change Δu of internal energy at constant pressure, end less start, per kilogram of dry air.",
  signSentence: "The change is counted end less start.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 17925, within: 1 }
});

// shared/thermo/quantities/isobaricInternalEnergyChangeOfMass.ts
var isobaricInternalEnergyChangeOfMassDefinition = forGivenMass(isobaricInternalEnergyChangeDefinition, "change of internal energy of a given mass, isobaric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 35850, within: 2 });

// shared/thermo/quantities/isobaricWork.ts
var isobaricWorkDefinition = perKilogram({
  key: "isobaric-work",
  name: "work done by the air, isobaric",
  symbol: "w",
  tex: "w",
  process: "isobaric",
  coefficient: "R",
  sign: 1,
  ask: "The work w done by the air at constant pressure, positive when the air expands, per kilogram of dry air.",
  signSentence: "The work is counted positive when the air does it, by expanding.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 7175, within: 1 }
});

// shared/thermo/quantities/isobaricWorkOfMass.ts
var isobaricWorkOfMassDefinition = forGivenMass(isobaricWorkDefinition, "work done by a given mass, isobaric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 308.15 }, gives: 14350, within: 2 });

// shared/thermo/quantities/isochoricEnthalpyChange.ts
var isochoricEnthalpyChangeDefinition = perKilogram({
  key: "isochoric-enthalpy-change",
  name: "change of enthalpy, isochoric",
  symbol: "Δh",
  tex: "\\Delta h",
  process: "isochoric",
  coefficient: "cp",
  sign: 1,
  ask: "The change of enthalpy Δh at constant volume, end less start, per kilogram of dry air.",
  signSentence: "A change is the end less the start.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 20080, within: 0.1 }
});

// shared/thermo/quantities/isochoricEnthalpyChangeOfMass.ts
var isochoricEnthalpyChangeOfMassDefinition = forGivenMass(isochoricEnthalpyChangeDefinition, "change of enthalpy of a given mass, isochoric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 40160, within: 0.2 });

// shared/thermo/quantities/isochoricHeat.ts
var isochoricHeatDefinition = perKilogram({
  key: "isochoric-heat",
  name: "heat taken up, isochoric",
  symbol: "q",
  tex: "q",
  process: "isochoric",
  coefficient: "cv",
  sign: 1,
  ask: "The heat q that the air takes up at constant volume, positive when taken up, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 14340, within: 0.1 }
});

// shared/thermo/quantities/isochoricHeatOfMass.ts
var isochoricHeatOfMassDefinition = forGivenMass(isochoricHeatDefinition, "heat taken up by a given mass, isochoric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 28680, within: 0.2 });

// shared/thermo/quantities/isochoricInternalEnergyChange.ts
var isochoricInternalEnergyChangeDefinition = perKilogram({
  key: "isochoric-internal-energy-change",
  name: "change of internal energy, isochoric",
  symbol: "Δu",
  tex: "\\Delta u",
  process: "isochoric",
  coefficient: "cv",
  sign: 1,
  ask: "The change of internal energy Δu at constant volume, end less start, per kilogram of dry air.",
  signSentence: "A change is the end less the start.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 14340, within: 0.1 }
});

// shared/thermo/quantities/isochoricInternalEnergyChangeOfMass.ts
var isochoricInternalEnergyChangeOfMassDefinition = forGivenMass(isochoricInternalEnergyChangeDefinition, "change of internal energy of a given mass, isochoric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 28680, within: 0.2 });

// shared/thermo/isothermal.ts
function isothermalWork(temperature6, from2, to2, constants) {
  return constant(constants, "R") * temperature6 * log(from2 / to2);
}
function isothermalQuantity(of) {
  const value23 = (inputs2, constants) => isothermalWork(kelvin(numberOf(inputs2, "temperature")), pascal(numberOf(inputs2, "pressureStart")), pascal(numberOf(inputs2, "pressureEnd")), constants);
  const ratio2 = (inputs2) => numberOf(inputs2, "pressureStart") / numberOf(inputs2, "pressureEnd");
  return oneFormula({
    ...of,
    unit: "J/kg",
    shownUnit: "kJ/kg",
    kind: "difference",
    nearZero: 1e3,
    inputs: processInputs.isothermal,
    constants: ["R"],
    formula: {
      key: "logarithm",
      label: "R T ln(p₁/p₂)",
      source: { text: 'AMS Glossary of Meteorology, "isothermal process"; the integral of p dα', status: "common practice" },
      validity: "an ideal gas at constant temperature",
      knownError: "R 287 to 287.05: 0.02 %"
    },
    value: value23,
    working(inputs2, constants, result2) {
      const logarithm = log(ratio2(inputs2));
      return [
        worked("Natural logarithm of the ratio of pressures, start to end", "\\ln\\frac{p_1}{p_2}", `\\ln\\frac{${texNumber(numberOf(inputs2, "pressureStart") / 100, 6)}}{${texNumber(numberOf(inputs2, "pressureEnd") / 100, 6)}}`, logarithm, "1"),
        worked("At constant temperature the internal energy stays, and the heat is the work", `${of.symbol} = R\\,T\\,\\ln\\frac{p_1}{p_2}`, `${of.symbol} = ${texNumber(constant(constants, "R"))} \\cdot ${texNumber(numberOf(inputs2, "temperature"), 6)} \\cdot ${texNumber(logarithm, 6)}`, result2, "J/kg", { value: result2 / 1e3, unit: "kJ/kg" }, 5)
      ];
    },
    slips: [
      signSlip(of.signSentence),
      celsiusSlip(value23, "temperature"),
      slip("log10-for-ln", "logarithm to base 10", "This comes from the logarithm to base 10: the formula has the natural one.", (inputs2, _c, right) => right * log10(ratio2(inputs2)) / log(ratio2(inputs2))),
      slip("logarithm-left-out", "difference for the logarithm", "This takes (p₁ − p₂)/p₁ for ln(p₁/p₂): the pressure falls along the way.", (inputs2, _c, right) => right * (1 - 1 / ratio2(inputs2)) / log(ratio2(inputs2))),
      slip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor in place of that of dry air.", (_i, constants, right) => right * vaporGasConstant / constant(constants, "R")),
      slip("universal-gas-constant", "universal gas constant", "This comes from the universal gas constant, which belongs to moles and not to kilograms.", (_i, constants, right) => right * universalGasConstant / constant(constants, "R")),
      slip("cp-for-r", "cp for R", "This comes from cp in place of R.", (_i, constants, right) => right * constant(constants, "cp") / constant(constants, "R")),
      joulesSlip,
      kilojoulesSlip
    ]
  });
}

// shared/thermo/noChange.ts
function noChange(of) {
  return oneFormula({
    key: of.key,
    name: of.name,
    symbol: of.symbol,
    unit: "J/kg",
    shownUnit: "kJ/kg",
    kind: "difference",
    nearZero: 1e3,
    inputs: processInputs[of.process],
    constants: [],
    formula: { key: "definition", label: "by definition", source: { text: of.source, status: "common practice" }, validity: `every ${of.process} process of an ideal gas`, knownError: "none" },
    ask: of.ask,
    value: () => 0,
    working: () => [{ text: of.because, formula: of.tex, filled: `${of.symbol.replace("Δ", "\\Delta ")} = 0\\,\\mathrm{kJ\\,kg^{-1}}`, value: 0, unit: "J/kg" }],
    slips: of.process === "isothermal" ? isothermalSlips : isochoricSlips,
    example: of.example
  });
}
var isothermalSlips = [
  slip("work-for-it", "work taken for it", "This is the work done by the air, R T ln(p₁/p₂): at constant temperature the heat pays for it.", (inputs2, constants) => isothermalWork(kelvin(numberOf(inputs2, "temperature")), pascal(numberOf(inputs2, "pressureStart")), pascal(numberOf(inputs2, "pressureEnd")), constants)),
  slip("heat-given-off", "work with its sign turned", "This is the work done on the air: at constant temperature it leaves as heat.", (inputs2, constants) => -isothermalWork(kelvin(numberOf(inputs2, "temperature")), pascal(numberOf(inputs2, "pressureStart")), pascal(numberOf(inputs2, "pressureEnd")), constants))
];
var isochoricSlips = [
  slip("isobaric-work", "work at constant pressure", "This is R ΔT, the work at constant pressure: at constant volume nothing is pushed away.", (inputs2, constants) => constant(constants, "R") * changeOf("isochoric", inputs2, constants)),
  slip("heat-for-work", "heat taken for work", "This is cv ΔT, the heat taken up.", (inputs2, constants) => constant(constants, "cv") * changeOf("isochoric", inputs2, constants))
];

// shared/thermo/quantities/isochoricWork.ts
var isochoricWorkDefinition = noChange({
  key: "isochoric-work",
  name: "work done by the air, isochoric",
  symbol: "w",
  tex: "w = \\int p\\,d\\alpha",
  process: "isochoric",
  because: "At constant volume nothing is pushed away",
  source: 'AMS Glossary of Meteorology, "isochoric"; w is the integral of p dα',
  ask: "The work w done by the air in a change at constant volume, per kilogram of dry air.",
  example: { inputs: { temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 0, within: 0 }
});

// shared/thermo/quantities/isochoricWorkOfMass.ts
var isochoricWorkOfMassDefinition = forGivenMass(isochoricWorkDefinition, "work done by a given mass, isochoric", { inputs: { mass: 2, temperatureStart: 283.15, temperatureEnd: 303.15 }, gives: 0, within: 0 });

// shared/thermo/quantities/isothermalEnthalpyChange.ts
var isothermalEnthalpyChangeDefinition = noChange({
  key: "isothermal-enthalpy-change",
  name: "change of enthalpy, isothermal",
  symbol: "Δh",
  tex: "\\Delta h = c_p\\,\\Delta T",
  process: "isothermal",
  because: "The enthalpy of an ideal gas depends on its temperature alone",
  source: 'AMS Glossary of Meteorology, "isothermal process"',
  ask: "The change of enthalpy Δh in an isothermal change of pressure, end less start, per kilogram of dry air.",
  example: { inputs: { temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 0, within: 0 }
});

// shared/thermo/quantities/isothermalEnthalpyChangeOfMass.ts
var isothermalEnthalpyChangeOfMassDefinition = forGivenMass(isothermalEnthalpyChangeDefinition, "change of enthalpy of a given mass, isothermal", { inputs: { mass: 2, temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 0, within: 0 });

// shared/thermo/quantities/isothermalHeat.ts
var isothermalHeatDefinition = isothermalQuantity({
  key: "isothermal-heat",
  name: "heat taken up, isothermal",
  symbol: "q",
  ask: "The heat q that the air takes up in an isothermal change of pressure, positive when taken up, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 30008.5, within: 0.1 }
});

// shared/thermo/quantities/isothermalHeatOfMass.ts
var isothermalHeatOfMassDefinition = forGivenMass(isothermalHeatDefinition, "heat taken up by a given mass, isothermal", { inputs: { mass: 2, temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 60017, within: 0.2 });

// shared/thermo/quantities/isothermalInternalEnergyChange.ts
var isothermalInternalEnergyChangeDefinition = noChange({
  key: "isothermal-internal-energy-change",
  name: "change of internal energy, isothermal",
  symbol: "Δu",
  tex: "\\Delta u = c_v\\,\\Delta T",
  process: "isothermal",
  because: "The internal energy of an ideal gas depends on its temperature alone",
  source: 'AMS Glossary of Meteorology, "isothermal process"',
  ask: "The change of internal energy Δu in an isothermal change of pressure, end less start, per kilogram of dry air.",
  example: { inputs: { temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 0, within: 0 }
});

// shared/thermo/quantities/isothermalInternalEnergyChangeOfMass.ts
var isothermalInternalEnergyChangeOfMassDefinition = forGivenMass(isothermalInternalEnergyChangeDefinition, "change of internal energy of a given mass, isothermal", { inputs: { mass: 2, temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 0, within: 0 });

// shared/thermo/quantities/isothermalWork.ts
var isothermalWorkDefinition = isothermalQuantity({
  key: "isothermal-work",
  name: "work done by the air, isothermal",
  symbol: "w",
  ask: "The work w done by the air in an isothermal change of pressure, positive when the air expands, per kilogram of dry air.",
  signSentence: "The work is counted positive when the air does it, by expanding.",
  example: { inputs: { temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 30008.5, within: 0.1 }
});

// shared/thermo/quantities/isothermalWorkOfMass.ts
var isothermalWorkOfMassDefinition = forGivenMass(isothermalWorkDefinition, "work done by a given mass, isothermal", { inputs: { mass: 2, temperature: 293.15, pressureStart: 1e5, pressureEnd: 7e4 }, gives: 60017, within: 0.2 });

// shared/thermo/quantities/moistUnsaturatedLapseRate.ts
function moistUnsaturatedLapseRate(mixingRatio, constants) {
  return constant(constants, "g") * (1 + mixingRatio) / (constant(constants, "cp") + mixingRatio * constant(constants, "cpv"));
}
var w = (inputs2) => numberOf(inputs2, "mixingRatio");
var moistUnsaturatedLapseRateDefinition = oneFormula({
  key: "moist-unsaturated-lapse-rate",
  name: "adiabatic lapse rate of moist, unsaturated air",
  symbol: "Γ",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [{ name: "mixingRatio", label: "mixing ratio", symbol: "w", unit: "1", shownUnit: "g/kg", kind: "ratio", shape: "number", range: [0, 0.1] }],
  constants: ["g", "cp", "cpv"],
  formula: {
    key: "moist-heat-capacity",
    label: "g (1 + w)/(cp + w cpv)",
    source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate", without the terms of condensation', status: "common practice" },
    validity: "unsaturated air",
    knownError: "cp 1004 to 1005.7, g 9.80665 to 9.81: 0.2 %"
  },
  ask: "The adiabatic lapse rate Γ = −dT/dz of the moist, unsaturated parcel with the heat capacity of its vapor, positive since it cools as it rises.",
  value: (inputs2, constants) => moistUnsaturatedLapseRate(w(inputs2), constants),
  working(inputs2, constants, result2) {
    const capacity = constant(constants, "cp") + w(inputs2) * constant(constants, "cpv");
    return [
      worked("Heat capacity with the vapor, per kilogram of dry air", "c = c_p + w\\,c_{pv}", `c = ${texNumber(constant(constants, "cp"), 6)} + ${texNumber(w(inputs2))} \\cdot ${texNumber(constant(constants, "cpv"))}`, capacity, "J/(kg.K)"),
      worked("Weight of 1 + w kilograms over their heat capacity", "\\Gamma = \\frac{g\\,(1 + w)}{c}", `\\Gamma = \\frac{${texNumber(constant(constants, "g"), 6)} \\cdot (1 + ${texNumber(w(inputs2))})}{${texNumber(capacity, 6)}}`, result2, "K/m", { value: result2 * 1e3, unit: "K/km" })
    ];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height."),
    fineSlip("dry", "the rate of dry air", "This is g/cp, the rate of dry air.", (_i, constants) => dryRateOf(constants)),
    fineSlip("weight-left-out", "1 + w left out", "This leaves out the weight of the vapor, the factor 1 + w.", (inputs2, _c, right) => right / (1 + w(inputs2))),
    fineSlip("liquid-water", "heat capacity of liquid water", "This takes the specific heat of liquid water for that of vapor.", (inputs2, constants) => moistUnsaturatedLapseRate(w(inputs2), { ...constants, cpv: constant(constants, "cw") })),
    slip("grams-per-kilogram", "g/kg put in for kg/kg", "This comes from the mixing ratio in g kg⁻¹: it goes in in kg kg⁻¹.", (inputs2, constants) => moistUnsaturatedLapseRate(w(inputs2) * 1e3, constants)),
    perMeterSlip,
    per100MetersSlip
  ],
  example: { inputs: { mixingRatio: 0.015 }, gives: 96479e-7, within: 1e-7 }
});

// shared/thermo/quantities/parcelLapseRateInEnvironment.ts
function parcelLapseRateInEnvironment(parcelTemperature, environmentTemperature, constants) {
  return dryRateOf(constants) * parcelTemperature / environmentTemperature;
}
var Tp = (inputs2) => numberOf(inputs2, "parcelTemperature");
var Te = (inputs2) => numberOf(inputs2, "environmentTemperature");
var value3 = (inputs2, constants) => parcelLapseRateInEnvironment(Tp(inputs2), Te(inputs2), constants);
var parcelLapseRateInEnvironmentDefinition = oneFormula({
  key: "parcel-lapse-rate-in-environment",
  name: "lapse rate of a dry parcel in surroundings of another temperature",
  symbol: "Γp",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [temperatureInput("parcelTemperature", "temperature of the parcel", "Tp"), temperatureInput("environmentTemperature", "temperature of its surroundings", "Te")],
  constants: ["g", "cp"],
  formula: {
    key: "with-ratio",
    label: "(g/cp)(Tp/Te)",
    source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate"; with the density of the surroundings', status: "common practice" },
    validity: "dry air, surroundings in hydrostatic balance",
    knownError: "9.751 to 9.80 K km⁻¹ times Tp/Te by the constants taught"
  },
  ask: "The lapse rate −dT/dz of the dry parcel itself where its surroundings have another temperature, so with the factor Tp/Te, positive since it cools as it rises.",
  value: value3,
  working: (inputs2, constants, result2) => [
    worked("Dry adiabatic lapse rate", "\\Gamma_d = \\frac{g}{c_p}", `\\Gamma_d = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(constant(constants, "cp"), 6)}}`, dryRateOf(constants), "K/m", { value: dryRateOf(constants) * 1e3, unit: "K/km" }),
    worked("The pressure falls by the density of the surroundings", "\\Gamma_p = \\Gamma_d\\,\\frac{T_p}{T_e}", `\\Gamma_p = ${texNumber(dryRateOf(constants) * 1e3, 6)} \\cdot \\frac{${texNumber(Tp(inputs2), 6)}}{${texNumber(Te(inputs2), 6)}}`, result2, "K/m", { value: result2 * 1e3, unit: "K/km" })
  ],
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height."),
    fineSlip("factor-left-out", "Tp/Te left out", "This is g/cp, the rate where the surroundings are as warm as the parcel.", (_i, constants) => dryRateOf(constants)),
    fineSlip("factor-inverted", "Te/Tp for Tp/Te", "This comes from Te/Tp in place of Tp/Te.", (inputs2, constants) => dryRateOf(constants) * Te(inputs2) / Tp(inputs2)),
    celsiusSlip((inputs2, constants) => parcelLapseRateInEnvironment(Tp(inputs2), Te(inputs2) - zeroCelsius, constants), "parcelTemperature"),
    otherConstantSlip(value3, "cp", "cv"),
    perMeterSlip,
    per100MetersSlip
  ],
  example: { inputs: { parcelTemperature: 290, environmentTemperature: 280 }, gives: 0.0101199, within: 1e-7 }
});

// shared/thermo/quantities/parcelTemperatureByHeight.ts
function parcelTemperatureByHeight(temperature6, height2, rate7) {
  return kelvin(temperature6 - rate7 * height2);
}
var start2 = (inputs2) => numberOf(inputs2, "temperature");
var height = (inputs2) => numberOf(inputs2, "heightDifference");
function rateOf(inputs2, constants, variant) {
  const given8 = inputs2.lapseRate;
  if (typeof given8 === "number") return given8;
  return variant === "printed-rate" ? printedDryRate : dryRateOf(constants);
}
function variantWith(key, label, status, knownError) {
  return {
    key,
    label,
    source: { text: 'AMS Glossary of Meteorology, "adiabatic lapse rate"', status },
    validity: "unsaturated air",
    knownError,
    evaluate: (inputs2, constants) => ({ is: "value", value: parcelTemperatureByHeight(kelvin(start2(inputs2)), meter(height(inputs2)), kelvinPerMeter(rateOf(inputs2, constants, key))) })
  };
}
var parcelTemperatureByHeightDefinition = {
  key: "parcel-temperature-by-height",
  name: "temperature of a parcel lifted dry-adiabatically by height",
  symbol: "T(z)",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [
    { name: "temperature", label: "temperature at the start", symbol: "T₀", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [150, 350] },
    { name: "heightDifference", label: "height above the start, negative where the parcel is lowered", symbol: "Δz", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [-12e3, 12e3] },
    { name: "lapseRate", label: "dry adiabatic lapse rate from an earlier step", symbol: "Γd", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-0.1, 0.1], isOptional: true, trivialWithin: 1e-4 }
  ],
  variants: [
    variantWith("g-over-cp", "Γd = g/cp", "verified", "0.05 K per km of height by the constants taught"),
    variantWith("printed-rate", "Γd = 9.8 K km⁻¹ as usually printed", "common practice", "0.03 K per km of height")
  ],
  constants: ["g", "cp"],
  ask: "The temperature of the parcel after it is lifted dry-adiabatically by the height, at Γd.",
  trace(inputs2, constants, variant) {
    const rate7 = rateOf(inputs2, constants, variant);
    const value23 = parcelTemperatureByHeight(kelvin(start2(inputs2)), meter(height(inputs2)), kelvinPerMeter(rate7));
    return [
      typeof inputs2.lapseRate === "number" || variant === "printed-rate" ? { text: "Dry adiabatic lapse rate, as given", formula: "\\Gamma_d", filled: `\\Gamma_d = ${texQuantity(rate7 * 1e3, "K/km")}`, value: rate7, unit: "K/m" } : { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(constant(constants, "cp"), 6)}} = ${texQuantity(rate7 * 1e3, "K/km")}`, value: rate7, unit: "K/m" },
      { text: "Along the height", formula: "T(z) = T_0 - \\Gamma_d\\,\\Delta z", filled: `T(z) = ${texNumber(start2(inputs2), 6)} - ${texNumber(rate7 * 1e3)} \\cdot ${texFactor(height(inputs2) / 1e3)} = ${texQuantity(value23, "K", 6)} = ${texQuantity(value23 - zeroCelsius, "Cel")}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    slip("sign", "warmed where it cools", "A parcel cools as it rises and warms as it sinks: your value goes the other way.", (inputs2, _c, right) => 2 * start2(inputs2) - right),
    slip("standard-atmosphere", "6.5 K km⁻¹ for Γd", "This comes from 6.5 K km⁻¹, the mean rate of the standard atmosphere, not that of a dry parcel.", (inputs2) => start2(inputs2) - 65e-4 * height(inputs2)),
    slip("autoconvective", "g/R for g/cp", "This comes from g/R in place of g/cp.", (inputs2, constants) => start2(inputs2) - constant(constants, "g") / constant(constants, "R") * height(inputs2)),
    slip("feet-for-meters", "feet taken for meters", "This comes from the height in feet at a rate per kilometer.", (inputs2, _c, right) => start2(inputs2) - (start2(inputs2) - right) / 0.3048),
    slip("change-only", "change for temperature", "This is the change of temperature: add it to the temperature at the start.", (inputs2, _c, right) => zeroCelsius + right - start2(inputs2)),
    slip("end-unit", "kelvin and °C mixed up", "Your number is in kelvin; the unit beside it says °C.", (_i, _c, right) => right + zeroCelsius)
  ],
  example: { inputs: { temperature: 288.15, heightDifference: 1500 }, gives: 273.494, within: 1e-3 }
};

// shared/thermo/quantities/parcelTemperatureByPressure.ts
var parcelTemperatureByPressureDefinition = adiabaticRelation({
  key: "parcel-temperature-by-pressure",
  name: "temperature of a parcel lifted or lowered dry-adiabatically, by pressure",
  of: "temperature",
  from: "pressure",
  ask: "The temperature T₂ of the parcel after it is lifted or lowered dry-adiabatically to the pressure at the end, by Poisson’s relation.",
  moreSlips: [
    slip("standard-pressure", "1013.25 hPa at the start", "This starts from 1013.25 hPa: the parcel starts from its own pressure.", (inputs2, constants) => numberOf(inputs2, "pressureStart") === 101325 ? null : adiabaticState("temperature", numberOf(inputs2, "temperatureStart"), "pressure", 101325, numberOf(inputs2, "pressureEnd"), constants)),
    slip("reference-pressure", "1000 hPa at the start", "This starts from 1000 hPa, as if the temperature were a potential temperature: the parcel starts from its own pressure.", (inputs2, constants) => numberOf(inputs2, "pressureStart") === 1e5 ? null : adiabaticState("temperature", numberOf(inputs2, "temperatureStart"), "pressure", 1e5, numberOf(inputs2, "pressureEnd"), constants))
  ],
  example: { inputs: { temperatureStart: 288.15, pressureStart: 1e5, pressureEnd: 9e4 }, gives: 279.6009, within: 1e-4 }
});

// shared/thermo/quantities/polytropicEnthalpyChange.ts
var polytropicEnthalpyChangeDefinition = perKilogram({
  key: "polytropic-enthalpy-change",
  name: "change of enthalpy, polytropic",
  symbol: "Δh",
  tex: "\\Delta h",
  process: "polytropic",
  coefficient: "cp",
  sign: 1,
  ask: "The change of enthalpy Δh in a polytropic change of pressure (p αⁿ constant), end less start, per kilogram of dry air.",
  signSentence: "A change is the end less the start.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: -16986.4, within: 0.1 }
});

// shared/thermo/quantities/polytropicEnthalpyChangeOfMass.ts
var polytropicEnthalpyChangeOfMassDefinition = forGivenMass(polytropicEnthalpyChangeDefinition, "change of enthalpy of a given mass, polytropic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: -33972.7, within: 0.2 });

// shared/thermo/polytropic.ts
var exponent = (inputs2) => numberOf(inputs2, "polytropicExponent");
function polytropicWork(inputs2, constants) {
  if (exponent(inputs2) === 1) return isothermalWork(kelvin(numberOf(inputs2, "temperatureStart")), pascal(numberOf(inputs2, "pressureStart")), pascal(numberOf(inputs2, "pressureEnd")), constants);
  return -constant(constants, "R") * changeOf("polytropic", inputs2, constants) / (exponent(inputs2) - 1);
}
var polytropicHeat = (inputs2, constants) => constant(constants, "cv") * changeOf("polytropic", inputs2, constants) + polytropicWork(inputs2, constants);
function polytropicQuantity(of) {
  const isHeat = of.of === "heat";
  const value23 = isHeat ? polytropicHeat : polytropicWork;
  const { of: _which, signSentence, ...rest } = of;
  return oneFormula({
    ...rest,
    unit: "J/kg",
    shownUnit: "kJ/kg",
    kind: "difference",
    nearZero: 1e3,
    inputs: processInputs.polytropic,
    constants: isHeat ? ["R", "cv"] : ["R"],
    formula: {
      key: "polytrope",
      label: isHeat ? "cv ΔT + R (T₁ − T₂)/(n − 1)" : "R (T₁ − T₂)/(n − 1)",
      source: { text: 'AMS Glossary of Meteorology, "polytropic process"; the integral of p dα', status: "common practice" },
      validity: "an ideal gas with constant specific heats",
      knownError: "R 287 to 287.05, cv 717 to 718.7: 0.2 %"
    },
    value: value23,
    working(inputs2, constants, result2) {
      const change2 = changeOf("polytropic", inputs2, constants), work = polytropicWork(inputs2, constants);
      const steps2 = [
        ...changeSteps("polytropic", inputs2, constants),
        exponent(inputs2) === 1 ? worked("Work done by the air: with n = 1 the process is isothermal", "w = R\\,T\\,\\ln\\frac{p_1}{p_2}", "w", work, "J/kg", { value: work / 1e3, unit: "kJ/kg" }, 5) : worked("Work done by the air", "w = \\frac{-R\\,\\Delta T}{n - 1}", `w = \\frac{-${texNumber(constant(constants, "R"))} \\cdot ${texFactor(change2)}}{${texNumber(exponent(inputs2))} - 1}`, work, "J/kg", { value: work / 1e3, unit: "kJ/kg" }, 5)
      ];
      if (isHeat) steps2.push(worked("First law", "q = c_v\\,\\Delta T + w", `q = ${texNumber(constant(constants, "cv"), 6)} \\cdot ${texFactor(change2)} + ${texFactor(work)}`, result2, "J/kg", { value: result2 / 1e3, unit: "kJ/kg" }, 5));
      return steps2;
    },
    slips: [
      signSlip(signSentence),
      swappedSlip(value23, "pressureStart", "pressureEnd", "inverted-ratio", "ratio of pressures turned round", "This comes from p₁/p₂ in place of p₂/p₁."),
      slip("n-for-n-minus-1", "n for n − 1", "This divides by n in place of n − 1.", (inputs2, constants) => {
        const work = polytropicWork(inputs2, constants) * (exponent(inputs2) - 1) / exponent(inputs2);
        return isHeat ? work + constant(constants, "cv") * changeOf("polytropic", inputs2, constants) : work;
      }),
      ...isHeat ? [
        slip("enthalpy-for-heat", "cp ΔT taken for heat", "This is cp ΔT, the change of enthalpy: it is heat only at constant pressure.", (inputs2, constants) => constant(constants, "cp") * changeOf("polytropic", inputs2, constants)),
        slip("work-for-heat", "work taken for heat", "This is the work done by the air: the heat is the work and the change of internal energy together.", polytropicWork),
        slip("work-sign", "sign of the work turned round", "This takes the work done by the air as done on it.", (inputs2, constants) => constant(constants, "cv") * changeOf("polytropic", inputs2, constants) - polytropicWork(inputs2, constants))
      ] : [
        slip("adiabatic-work", "adiabatic work", "This is −cv ΔT, the work of an adiabatic process.", (inputs2, constants) => -constant(constants, "cv") * changeOf("polytropic", inputs2, constants)),
        otherConstantSlip(value23, "R", "cp")
      ],
      joulesSlip,
      kilojoulesSlip
    ],
    example: of.example
  });
}

// shared/thermo/quantities/polytropicHeat.ts
var polytropicHeatDefinition = polytropicQuantity({
  key: "polytropic-heat",
  name: "heat taken up, polytropic",
  symbol: "q",
  of: "heat",
  ask: "The heat q that the air takes up in a polytropic change of pressure (p αⁿ constant), positive when taken up, per kilogram of dry air.",
  signSentence: "The heat is counted positive when the air takes it up.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: 12147.6, within: 0.1 }
});

// shared/thermo/quantities/polytropicHeatOfMass.ts
var polytropicHeatOfMassDefinition = forGivenMass(polytropicHeatDefinition, "heat taken up by a given mass, polytropic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: 24295.2, within: 0.2 });

// shared/thermo/quantities/polytropicInternalEnergyChange.ts
var polytropicInternalEnergyChangeDefinition = perKilogram({
  key: "polytropic-internal-energy-change",
  name: "change of internal energy, polytropic",
  symbol: "Δu",
  tex: "\\Delta u",
  process: "polytropic",
  coefficient: "cv",
  sign: 1,
  ask: "The change of internal energy Δu in a polytropic change of pressure (p αⁿ constant), end less start, per kilogram of dry air.",
  signSentence: "A change is the end less the start.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: -12130.7, within: 0.1 }
});

// shared/thermo/quantities/polytropicInternalEnergyChangeOfMass.ts
var polytropicInternalEnergyChangeOfMassDefinition = forGivenMass(polytropicInternalEnergyChangeDefinition, "change of internal energy of a given mass, polytropic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: -24261.4, within: 0.2 });

// shared/thermo/quantities/polytropicWork.ts
var polytropicWorkDefinition = polytropicQuantity({
  key: "polytropic-work",
  name: "work done by the air, polytropic",
  symbol: "w",
  of: "work",
  ask: "The work w done by the air in a polytropic change of pressure (p αⁿ constant), positive when the air expands, per kilogram of dry air.",
  signSentence: "The work is counted positive when the air does it, by expanding.",
  example: { inputs: { temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: 24278.3, within: 0.1 }
});

// shared/thermo/quantities/polytropicWorkOfMass.ts
var polytropicWorkOfMassDefinition = forGivenMass(polytropicWorkDefinition, "work done by a given mass, polytropic", { inputs: { mass: 2, temperatureStart: 293.15, pressureStart: 1e5, pressureEnd: 7e4, polytropicExponent: 1.2 }, gives: 48556.6, within: 0.2 });

// shared/thermo/quantities/potentialTemperature.ts
function potentialTemperature(temperature6, pressure4, constants) {
  return poissonTemperature(temperature6, pressure4, pascal(constant(constants, "p0")), constants);
}
var T2 = (inputs2) => numberOf(inputs2, "temperature");
var ratio = (inputs2, constants) => constant(constants, "p0") / numberOf(inputs2, "pressure");
var potentialTemperatureDefinition = {
  key: "potential-temperature",
  name: "potential temperature",
  symbol: "θ",
  unit: "K",
  shownUnit: "K",
  kind: "temperature",
  inputs: [
    { name: "pressure", label: "pressure", symbol: "p", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [1e3, 12e4] },
    { name: "temperature", label: "air temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [150, 400] },
    { name: "stationPressure", label: "station pressure, to know the slip of taking it for 1000 hPa", symbol: "p_s", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [4e4, 12e4], isOptional: true, isForSlips: true }
  ],
  variants: [{
    key: "poisson",
    label: "Poisson’s relation, p₀ = 1000 hPa",
    source: { text: 'AMS Glossary of Meteorology, "potential temperature"', status: "verified" },
    validity: "150–400 K, 10–1200 hPa",
    knownError: "κ 0.2854 to 0.286: 0.06 K at 700 hPa, 0.57 K at 100 hPa",
    evaluate: (inputs2, constants) => ({ is: "value", value: potentialTemperature(kelvin(T2(inputs2)), pascal(numberOf(inputs2, "pressure")), constants) })
  }],
  constants: ["R", "cp", "p0", "kappa"],
  ask: "The potential temperature θ, referred to 1000 hPa, with κ = R/cp.",
  trace(inputs2, constants) {
    const kappa = kappaOf(constants);
    const value23 = potentialTemperature(kelvin(T2(inputs2)), pascal(numberOf(inputs2, "pressure")), constants);
    return [
      constants.kappa === void 0 ? { text: "Exponent", formula: "\\kappa = \\frac{R}{c_p}", filled: `\\kappa = \\frac{${texNumber(constant(constants, "R"))}}{${texNumber(constant(constants, "cp"), 6)}} = ${texNumber(kappa)}`, value: kappa, unit: "1" } : { text: "Exponent, as the convention names it", formula: "\\kappa", filled: `\\kappa = ${texNumber(kappa)}`, value: kappa, unit: "1" },
      { text: "Poisson’s relation, with T in kelvin", formula: "\\theta = T \\left(\\frac{p_0}{p}\\right)^{\\kappa}", filled: `\\theta = ${texNumber(T2(inputs2))} \\left(\\frac{${texNumber(constant(constants, "p0") / 100)}}{${texNumber(numberOf(inputs2, "pressure") / 100)}}\\right)^{${texNumber(kappa)}} = ${texQuantity(value23, "K")}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    slip("standard-pressure", "1013.25 hPa for 1000 hPa", "This refers to 1013.25 hPa: θ refers to 1000 hPa.", (_i, constants, right) => right * pow(101325 / constant(constants, "p0"), kappaOf(constants))),
    slip("station-pressure", "station pressure for 1000 hPa", "This refers to the pressure of the station: θ refers to 1000 hPa.", (inputs2, constants, right) => {
      const station = inputs2.stationPressure;
      return typeof station === "number" && station !== constant(constants, "p0") ? right * pow(station / constant(constants, "p0"), kappaOf(constants)) : null;
    }),
    slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: Poisson’s relation takes kelvin.", (inputs2, constants) => {
      return zeroCelsius + (T2(inputs2) - zeroCelsius) * pow(ratio(inputs2, constants), kappaOf(constants));
    }),
    slip("celsius-for-kelvin-as-kelvin", "Celsius put in, given as kelvin", "This is what comes out with the temperature in °C, and the result called kelvin.", (inputs2, constants) => {
      const t = (T2(inputs2) - zeroCelsius) * pow(ratio(inputs2, constants), kappaOf(constants));
      return t > 0 ? t : null;
    }),
    slip("inverted-ratio", "ratio of pressures turned round", "This comes from p/p₀ in place of p₀/p.", (inputs2, constants) => T2(inputs2) * pow(ratio(inputs2, constants), -kappaOf(constants))),
    slip("inverted-exponent", "exponent turned round", "This comes from the exponent cp/R in place of R/cp.", (inputs2, constants) => {
      const value23 = T2(inputs2) * pow(ratio(inputs2, constants), 1 / kappaOf(constants));
      return Number.isFinite(value23) ? value23 : null;
    }),
    slip("cv-for-cp", "cv for cp", "This comes from the exponent R/cv in place of R/cp.", (inputs2, constants) => T2(inputs2) * pow(ratio(inputs2, constants), constant(constants, "R") / constant(constants, "cv"))),
    slip("end-unit", "°C given as kelvin", "Your number is the temperature in °C; the unit beside it says kelvin.", (_i, _c, right) => right > zeroCelsius ? right - zeroCelsius : null),
    constantSlip("zero-273", "273 for 273.15", "This comes from 273 in place of 273.15 between °C and kelvin.", (inputs2, constants) => (T2(inputs2) - 0.15) * pow(ratio(inputs2, constants), kappaOf(constants)))
  ],
  example: { inputs: { pressure: 85e3, temperature: 293.15 }, gives: 307.0902, within: 1e-4 }
};

// shared/thermo/quantities/pressureAfterIsochoricHeating.ts
function pressureAfterIsochoricHeating(pressure4, from2, to2) {
  return pascal(pressure4 * to2 / from2);
}
var start3 = (inputs2) => numberOf(inputs2, "pressureStart");
var T1 = (inputs2) => numberOf(inputs2, "temperatureStart");
var T22 = (inputs2) => numberOf(inputs2, "temperatureEnd");
var value4 = (inputs2) => pressureAfterIsochoricHeating(pascal(start3(inputs2)), kelvin(T1(inputs2)), kelvin(T22(inputs2)));
var pressureAfterIsochoricHeatingDefinition = oneFormula({
  key: "pressure-after-isochoric-heating",
  name: "pressure after heating at constant volume",
  symbol: "p₂",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  inputs: [pressureInput("pressureStart", "pressure at the start", "p₁", [1e3, 1e6]), temperatureInput("temperatureStart", "temperature at the start", "T₁", [100, 1e3]), temperatureInput("temperatureEnd", "temperature at the end", "T₂", [100, 1e3])],
  constants: [],
  formula: {
    key: "ideal-gas",
    label: "p/T stays",
    source: { text: 'AMS Glossary of Meteorology, "equation of state", at constant specific volume', status: "common practice" },
    validity: "an ideal gas in a rigid vessel",
    knownError: "273 for 273.15: 0.02 hPa for 30 K"
  },
  ask: "The pressure p₂ of the air after it is heated or cooled at constant volume, with the temperatures in kelvin.",
  value: value4,
  working: (inputs2, _constants, result2) => [
    worked("At constant volume p/T stays, with T in kelvin", "p_2 = p_1 \\frac{T_2}{T_1}", `p_2 = ${texNumber(start3(inputs2) / 100, 6)} \\cdot \\frac{${texNumber(T22(inputs2), 6)}}{${texNumber(T1(inputs2), 6)}}`, result2, "Pa", { value: result2 / 100, unit: "hPa" })
  ],
  slips: [
    swappedSlip(value4, "temperatureStart", "temperatureEnd", "inverted-ratio", "ratio of temperatures turned round", "This comes from T₁/T₂ in place of T₂/T₁."),
    slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperatures in °C: their ratio takes kelvin.", (inputs2, _c) => {
      const before = T1(inputs2) - zeroCelsius;
      return before === 0 ? null : start3(inputs2) * (T22(inputs2) - zeroCelsius) / before;
    }),
    slip("change-only", "change for pressure", "This is the change of pressure: add it to the pressure at the start.", (inputs2, _c, right) => right - start3(inputs2)),
    slip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", (_i, _c, right) => right * 100)
  ],
  example: { inputs: { pressureStart: 9e4, temperatureStart: 273.15, temperatureEnd: 303.15 }, gives: 99884.68, within: 0.01 }
});

// shared/thermo/quantities/pressureByEquationOfState.ts
function pressureByEquationOfState(density2, temperature6, constants) {
  return pascal(density2 * constant(constants, "R") * temperature6);
}
var rho = (inputs2) => numberOf(inputs2, "density");
var T3 = (inputs2) => numberOf(inputs2, "temperature");
var value5 = (inputs2, constants) => pressureByEquationOfState(kilogramPerCubicMeter(rho(inputs2)), kelvin(T3(inputs2)), constants);
var pressureByEquationOfStateDefinition = oneFormula({
  key: "pressure-by-equation-of-state",
  name: "pressure of dry air by the equation of state",
  symbol: "p",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  inputs: [{ name: "density", label: "density of the air", symbol: "ρ", unit: "kg/m3", shownUnit: "kg/m3", kind: "ratio", shape: "number", range: [1e-3, 10] }, temperatureInput("temperature", "air temperature", "T", [100, 400])],
  constants: ["R"],
  formula: {
    key: "ideal-gas",
    label: "equation of state of dry air",
    source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: "common practice" },
    validity: "100–400 K",
    knownError: "below 0.1 % for dry air"
  },
  ask: "The pressure p of dry air by the equation of state, with the temperature in kelvin.",
  value: value5,
  working: (inputs2, constants, result2) => [
    worked("Equation of state, with T in kelvin", "p = \\rho\\,R\\,T", `p = ${texNumber(rho(inputs2))} \\cdot ${texNumber(constant(constants, "R"))} \\cdot ${texNumber(T3(inputs2), 6)}`, result2, "Pa", { value: result2 / 100, unit: "hPa" })
  ],
  slips: [
    celsiusSlip(value5, "temperature"),
    slip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", (_i, _c, right) => right * 100),
    vaporConstantSlip(value5),
    slip("universal-gas-constant", "universal gas constant", "This comes from the universal gas constant, which belongs to moles and not to kilograms.", (_i, constants, right) => right * universalGasConstant / constant(constants, "R")),
    slip("specific-volume-for-density", "specific volume for density", "This puts in the specific volume 1/ρ in place of the density.", (inputs2, _c, right) => right / rho(inputs2) / rho(inputs2))
  ],
  example: { inputs: { density: 1.2, temperature: 288.15 }, gives: 99238.86, within: 0.01 }
});

// shared/thermo/quantities/pressureChangeFromHeatAndEnthalpy.ts
var pressureChangeFromHeatAndEnthalpyDefinition = firstLawQuantity({
  key: "pressure-change-from-heat-and-enthalpy",
  name: "change of pressure, from the heat and the change of temperature",
  symbol: "Δp",
  form: "enthalpy",
  unknown: "other",
  ask: "The change of pressure Δp = (cp ΔT − q)/α of the air, end less start, for a small change at the mean specific volume α.",
  signSentence: "A change of pressure is the end less the start.",
  example: { inputs: { heat: 0, temperatureChange: -2, specificVolume: 0.85 }, gives: -2362.3529, within: 1e-4 }
});

// shared/thermo/quantities/specificHeatingRate.ts
var value6 = (inputs2, constants) => constant(constants, "cp") * temperatureTendency(inputs2);
var specificHeatingRateDefinition = oneFormula({
  key: "specific-heating-rate",
  name: "heating per kilogram from an observed change of temperature",
  symbol: "q̇",
  unit: "W/kg",
  shownUnit: "W/kg",
  kind: "difference",
  nearZero: 0.01,
  inputs: heatingInputs,
  constants: ["cp"],
  formula: { ...heatingFormula, label: "cp ΔT/Δt" },
  ask: `The heating q̇ of the air per kilogram, positive where it is heated, ${heatingAssumption}.`,
  value: value6,
  working(inputs2, constants, result2) {
    const rate7 = temperatureTendency(inputs2);
    return [
      worked("Rate of temperature, in seconds", "\\frac{\\Delta T}{\\Delta t} = \\frac{T_2 - T_1}{\\Delta t}", `\\frac{\\Delta T}{\\Delta t} = \\frac{${texNumber(numberOf(inputs2, "temperatureEnd"), 6)} - ${texNumber(numberOf(inputs2, "temperatureStart"), 6)}}{${texNumber(numberOf(inputs2, "timeBetween"), 6)}}`, rate7, "K/s", void 0, 5),
      worked("Without advection and vertical motion heating alone changes the temperature", "\\dot q = c_p \\frac{\\Delta T}{\\Delta t}", `\\dot q = ${texNumber(constant(constants, "cp"), 6)} \\cdot ${texFactor(rate7)}`, result2, "W/kg", void 0, 5)
    ];
  },
  slips: [
    signSlip("The heating is positive where the air warms: the end less the start."),
    slip("hours-for-seconds", "hours put in for seconds", "This is per hour: a watt is a joule a second.", (_i, _c, right) => right * 3600),
    slip("minutes-for-seconds", "minutes put in for seconds", "This is per minute: a watt is a joule a second.", (_i, _c, right) => right * 60),
    slip("time-left-out", "not divided by the time", "This is the heat cp ΔT: divide it by the time that it took.", (inputs2, _c, right) => right * numberOf(inputs2, "timeBetween")),
    otherConstantSlip(value6, "cp", "cv"),
    slip("cp-left-out", "cp left out", "This is the rate of temperature in K s⁻¹: multiply it by cp.", (_i, constants, right) => right / constant(constants, "cp")),
    differenceAsTemperatureSlip(value6, "temperatureEnd")
  ],
  example: { inputs: { temperatureStart: 285.15, temperatureEnd: 288.15, timeBetween: 7200 }, gives: 0.418333, within: 1e-6 }
});

// shared/thermo/quantities/specificVolume.ts
function specificVolume(pressure4, temperature6, constants) {
  return constant(constants, "R") * temperature6 / pressure4;
}
var p2 = (inputs2) => numberOf(inputs2, "pressure");
var T4 = (inputs2) => numberOf(inputs2, "temperature");
var value7 = (inputs2, constants) => specificVolume(pascal(p2(inputs2)), kelvin(T4(inputs2)), constants);
var specificVolumeDefinition = oneFormula({
  key: "specific-volume",
  name: "specific volume of dry air",
  symbol: "α",
  unit: "m3/kg",
  shownUnit: "m3/kg",
  kind: "ratio",
  inputs: [pressureInput("pressure", "pressure", "p", [100, 12e4]), temperatureInput("temperature", "air temperature", "T", [100, 400])],
  constants: ["R"],
  formula: {
    key: "ideal-gas",
    label: "equation of state of dry air",
    source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: "common practice" },
    validity: "100–400 K, 1–1200 hPa",
    knownError: "below 0.1 % for dry air"
  },
  ask: "The specific volume α of dry air by the equation of state, with the temperature in kelvin.",
  value: value7,
  working: (inputs2, constants, result2) => [
    worked("Equation of state, with p in pascal and T in kelvin", "\\alpha = \\frac{R\\,T}{p}", `\\alpha = \\frac{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(T4(inputs2), 6)}}{${texNumber(p2(inputs2), 7)}}`, result2, "m3/kg")
  ],
  slips: [
    celsiusSlip(value7, "temperature"),
    hectopascalSlip(value7, "pressure"),
    vaporConstantSlip(value7),
    slip("universal-gas-constant", "universal gas constant", "This comes from the universal gas constant, which belongs to moles and not to kilograms.", (_i, constants, right) => right * universalGasConstant / constant(constants, "R")),
    slip("inverse", "density for specific volume", "This is the density 1/α.", (_i, _c, right) => 1 / right)
  ],
  example: { inputs: { pressure: 101325, temperature: 298.15 }, gives: 0.844501, within: 1e-6 }
});

// shared/thermo/quantities/temperatureByEquationOfState.ts
function temperatureByEquationOfState(pressure4, density2, constants) {
  const temperature6 = pressure4 / (density2 * constant(constants, "R"));
  if (!(temperature6 >= 50 && temperature6 <= 1e3)) throw new OutOfRangeError("density", density2, `the densities that give 50 to 1000 K at ${pressure4} Pa`);
  return kelvin(temperature6);
}
var rho2 = (inputs2) => numberOf(inputs2, "density");
var p3 = (inputs2) => numberOf(inputs2, "pressure");
var value8 = (inputs2, constants) => temperatureByEquationOfState(pascal(p3(inputs2)), kilogramPerCubicMeter(rho2(inputs2)), constants);
var temperatureByEquationOfStateDefinition = oneFormula({
  key: "temperature-by-equation-of-state",
  name: "temperature of dry air by the equation of state",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput("pressure", "pressure", "p", [100, 12e4]), { name: "density", label: "density of the air", symbol: "ρ", unit: "kg/m3", shownUnit: "kg/m3", kind: "ratio", shape: "number", range: [1e-3, 10] }],
  constants: ["R"],
  formula: {
    key: "ideal-gas",
    label: "equation of state of dry air",
    source: { text: 'AMS Glossary of Meteorology, "equation of state"', status: "common practice" },
    validity: "100–400 K",
    knownError: "R 287 to 287.05: 0.05 K"
  },
  ask: "The temperature T of dry air by the equation of state.",
  value: value8,
  working: (inputs2, constants, result2) => [
    worked("Equation of state, with p in pascal", "T = \\frac{p}{\\rho\\,R}", `T = \\frac{${texNumber(p3(inputs2), 7)}}{${texNumber(rho2(inputs2))} \\cdot ${texNumber(constant(constants, "R"))}} = ${texQuantity(result2 - zeroCelsius, "Cel")}`, result2, "K")
  ],
  slips: [
    endUnitSlip("Cel"),
    slip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the pressure in hPa: with R in J kg⁻¹ K⁻¹ it goes in in pascal.", (_i, _c, right) => right / 100),
    vaporConstantSlip(value8),
    slip("cp-for-r", "cp for R", "This comes from cp in place of R.", (_i, constants, right) => right * constant(constants, "R") / constant(constants, "cp")),
    slip("specific-volume-for-density", "specific volume for density", "This puts in the specific volume 1/ρ in place of the density.", (inputs2, _c, right) => right * rho2(inputs2) * rho2(inputs2))
  ],
  example: { inputs: { pressure: 95e3, density: 1.15 }, gives: 287.8352, within: 1e-4 }
});

// shared/thermo/quantities/temperatureChangeFromHeatAndHeightChange.ts
var temperatureChangeFromHeatAndHeightChangeDefinition = firstLawQuantity({
  key: "temperature-change-from-heat-and-height-change",
  name: "change of temperature, from the heat and the change of height",
  symbol: "ΔT",
  form: "geopotential",
  unknown: "temperatureChange",
  ask: "The change of temperature ΔT = (q − g Δz)/cp of the air, end less start, in hydrostatic balance; q is 0 where the change is adiabatic.",
  signSentence: "A change of temperature is the end less the start.",
  example: { inputs: { heat: 0, heightDifference: 1e3 }, gives: -9.770916, within: 1e-6 }
});

// shared/thermo/quantities/temperatureChangeFromHeatAndPressureChange.ts
var temperatureChangeFromHeatAndPressureChangeDefinition = firstLawQuantity({
  key: "temperature-change-from-heat-and-pressure-change",
  name: "change of temperature, from the heat and the change of pressure",
  symbol: "ΔT",
  form: "enthalpy",
  unknown: "temperatureChange",
  ask: "The change of temperature ΔT = (q + α Δp)/cp of the air, end less start, for a small change of pressure Δp at the mean specific volume α.",
  signSentence: "A change of temperature is the end less the start.",
  example: { inputs: { heat: 0, specificVolume: 0.85, pressureChange: -2e3 }, gives: -1.693227, within: 1e-6 }
});

// shared/thermo/quantities/temperatureChangeFromHeatAndWork.ts
var temperatureChangeFromHeatAndWorkDefinition = firstLawQuantity({
  key: "temperature-change-from-heat-and-work",
  name: "change of temperature, from the heat and the work",
  symbol: "ΔT",
  form: "internal-energy",
  unknown: "temperatureChange",
  ask: "The change of temperature ΔT = (q − w)/cv of the air, end less start, with q the heat taken up and w the work done by the air.",
  signSentence: "A change of temperature is the end less the start.",
  example: { inputs: { heat: 10040, work: 2870 }, gives: 10, within: 1e-4 }
});

// shared/thermo/quantities/temperatureFromPotentialTemperature.ts
function temperatureFromPotentialTemperature(potentialTemperature2, pressure4, constants) {
  return poissonTemperature(potentialTemperature2, pascal(constant(constants, "p0")), pressure4, constants);
}
var theta = (inputs2) => numberOf(inputs2, "potentialTemperature");
var p4 = (inputs2) => numberOf(inputs2, "pressure");
var value9 = (inputs2, constants) => theta(inputs2) * pow(p4(inputs2) / constant(constants, "p0"), kappaOf(constants));
var temperatureFromPotentialTemperatureDefinition = oneFormula({
  key: "temperature-from-potential-temperature",
  name: "temperature from the potential temperature",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [{ ...temperatureInput("potentialTemperature", "potential temperature", "θ", [150, 1e3]), shownUnit: "K" }, pressureInput()],
  constants: ["R", "cp", "p0", "kappa"],
  formula: {
    key: "poisson",
    label: "Poisson’s relation, p₀ = 1000 hPa",
    source: { text: 'AMS Glossary of Meteorology, "potential temperature"', status: "verified" },
    validity: "150–400 K, 10–1200 hPa",
    knownError: "κ 0.2854 to 0.286: 0.06 K at 700 hPa, 0.3 K at 100 hPa"
  },
  ask: "The temperature T of dry air of the potential temperature θ, which refers to 1000 hPa, at the pressure p.",
  value: (inputs2, constants) => temperatureFromPotentialTemperature(kelvin(theta(inputs2)), pascal(p4(inputs2)), constants),
  working: (inputs2, constants, result2) => [
    { text: "Exponent", formula: "\\kappa = \\frac{R}{c_p}", filled: `\\kappa = ${texNumber(kappaOf(constants))}`, value: kappaOf(constants), unit: "1" },
    worked("Poisson’s relation, with θ in kelvin", "T = \\theta \\left(\\frac{p}{p_0}\\right)^{\\kappa}", `T = ${texNumber(theta(inputs2), 6)} \\left(\\frac{${texNumber(p4(inputs2) / 100, 6)}}{${texNumber(constant(constants, "p0") / 100)}}\\right)^{${texNumber(kappaOf(constants))}} = ${texQuantity(result2 - zeroCelsius, "Cel")}`, result2, "K")
  ],
  slips: [
    slip("inverted-ratio", "ratio of pressures turned round", "This comes from p₀/p in place of p/p₀.", (inputs2, constants) => theta(inputs2) * pow(p4(inputs2) / constant(constants, "p0"), -kappaOf(constants))),
    slip("inverted-exponent", "exponent turned round", "This comes from the exponent cp/R in place of R/cp.", (inputs2, constants) => theta(inputs2) * pow(p4(inputs2) / constant(constants, "p0"), 1 / kappaOf(constants))),
    slip("cv-for-cp", "cv for cp", "This comes from the exponent R/cv in place of R/cp.", (inputs2, constants) => theta(inputs2) * pow(p4(inputs2) / constant(constants, "p0"), constant(constants, "R") / constant(constants, "cv"))),
    slip("standard-pressure", "1013.25 hPa for 1000 hPa", "This refers to 1013.25 hPa: θ refers to 1000 hPa.", (_i, constants, right) => right * pow(constant(constants, "p0") / 101325, kappaOf(constants))),
    celsiusSlip(value9, "potentialTemperature", "Cel"),
    endUnitSlip("Cel"),
    zero273Slip(value9, "potentialTemperature")
  ],
  example: { inputs: { potentialTemperature: 300, pressure: 85e3 }, gives: 286.3816, within: 1e-4 }
});

// shared/thermo/quantities/workFromHeatAndInternalEnergy.ts
var workFromHeatAndInternalEnergyDefinition = firstLawQuantity({
  key: "work-from-heat-and-internal-energy",
  name: "work done by the air, from the heat and the change of temperature",
  symbol: "w",
  form: "internal-energy",
  unknown: "other",
  ask: "The work w = q − cv ΔT done by the air, positive when the air expands, with q the heat taken up, per kilogram of dry air.",
  signSentence: "The work is counted positive when the air does it, by expanding.",
  example: { inputs: { heat: 10040, temperatureChange: 10 }, gives: 2870, within: 0.1 }
});

// shared/thermo/quantities/specificVolumeFromHeatAndEnthalpy.ts
var q = (inputs2) => numberOf(inputs2, "heat");
var change = (inputs2) => numberOf(inputs2, "temperatureChange");
var pressureChange = (inputs2) => numberOf(inputs2, "pressureChange");
function value10(inputs2, constants) {
  if (pressureChange(inputs2) === 0) throw new OutOfRangeError("pressureChange", 0, "a change that is not 0");
  return (constant(constants, "cp") * change(inputs2) - q(inputs2)) / pressureChange(inputs2);
}
var specificVolumeFromHeatAndEnthalpyDefinition = oneFormula({
  key: "specific-volume-from-heat-and-enthalpy",
  name: "mean specific volume, from the heat and the changes of temperature and pressure",
  symbol: "α",
  unit: "m3/kg",
  shownUnit: "m3/kg",
  kind: "ratio",
  inputs: [
    specificEnergyInput("heat", "heat taken up by the air, per kilogram", "q"),
    temperatureChangeInput(),
    { name: "pressureChange", label: "change of pressure, not 0", symbol: "Δp", unit: "Pa", shownUnit: "hPa", kind: "difference", shape: "number", range: [-5e4, 5e4], trivialWithin: 1 }
  ],
  constants: ["cp"],
  formula: {
    key: "first-law",
    label: "first law, enthalpy",
    source: { text: 'AMS Glossary of Meteorology, "first law of thermodynamics"', status: "common practice" },
    validity: "200–350 K, Δp small beside p",
    knownError: "cp 1004 to 1005.7: 0.17 % of the term with ΔT"
  },
  ask: "The mean specific volume α = (cp ΔT − q)/Δp of the air during a small change in which its pressure does not stay.",
  value: value10,
  working(inputs2, constants, result2) {
    const c2 = constant(constants, "cp");
    return [worked("First law, solved for the specific volume", "\\alpha = \\frac{c_p\\,\\Delta T - q}{\\Delta p}", `\\alpha = \\frac{${texNumber(c2, 6)} \\cdot ${texFactor(change(inputs2), 6)} - ${texFactor(q(inputs2), 6)}}{${texNumber(pressureChange(inputs2), 6)}}`, result2, "m3/kg")];
  },
  slips: [
    signSlip("A specific volume is positive: q = cp ΔT − α Δp."),
    slip("heat-added", "q with the wrong sign", "The heat went in with its sign turned: α = (cp ΔT − q)/Δp.", (inputs2, constants) => q(inputs2) === 0 ? null : (constant(constants, "cp") * change(inputs2) + q(inputs2)) / pressureChange(inputs2)),
    slip("cv-for-cp", "cv for cp", "This comes from cv in place of cp: the form with the pressure has the enthalpy.", (inputs2, constants) => (constant(constants, "cv") * change(inputs2) - q(inputs2)) / pressureChange(inputs2)),
    slip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the pressure in hPa: with constants in SI it goes in in pascal.", (_i, _c, right) => 100 * right),
    slip("inverse", "density for specific volume", "This is the density: the specific volume is one over it.", (_i, _c, right) => 1 / right)
  ],
  example: { inputs: { heat: 0, temperatureChange: -2, pressureChange: -2360 }, gives: 0.850847, within: 1e-6 }
});

// shared/thermo/groups/dryAir.ts
var dryAir = {
  key: "dry-air",
  title: "Dry air and the first law",
  quantities: [
    densityDefinition,
    specificVolumeDefinition,
    pressureByEquationOfStateDefinition,
    temperatureByEquationOfStateDefinition,
    potentialTemperatureDefinition,
    temperatureFromPotentialTemperatureDefinition,
    exnerFunctionDefinition,
    parcelTemperatureByPressureDefinition,
    adiabaticPressureFromTemperatureDefinition,
    adiabaticTemperatureFromSpecificVolumeDefinition,
    adiabaticSpecificVolumeFromTemperatureDefinition,
    adiabaticPressureFromSpecificVolumeDefinition,
    adiabaticSpecificVolumeFromPressureDefinition,
    isobaricHeatDefinition,
    isobaricHeatOfMassDefinition,
    isobaricWorkDefinition,
    isobaricWorkOfMassDefinition,
    isobaricInternalEnergyChangeDefinition,
    isobaricInternalEnergyChangeOfMassDefinition,
    isobaricEnthalpyChangeDefinition,
    isobaricEnthalpyChangeOfMassDefinition,
    isochoricHeatDefinition,
    isochoricHeatOfMassDefinition,
    isochoricWorkDefinition,
    isochoricWorkOfMassDefinition,
    isochoricInternalEnergyChangeDefinition,
    isochoricInternalEnergyChangeOfMassDefinition,
    isochoricEnthalpyChangeDefinition,
    isochoricEnthalpyChangeOfMassDefinition,
    isothermalHeatDefinition,
    isothermalHeatOfMassDefinition,
    isothermalWorkDefinition,
    isothermalWorkOfMassDefinition,
    isothermalInternalEnergyChangeDefinition,
    isothermalInternalEnergyChangeOfMassDefinition,
    isothermalEnthalpyChangeDefinition,
    isothermalEnthalpyChangeOfMassDefinition,
    adiabaticHeatDefinition,
    adiabaticHeatOfMassDefinition,
    adiabaticWorkDefinition,
    adiabaticWorkOfMassDefinition,
    adiabaticInternalEnergyChangeDefinition,
    adiabaticInternalEnergyChangeOfMassDefinition,
    adiabaticEnthalpyChangeDefinition,
    adiabaticEnthalpyChangeOfMassDefinition,
    polytropicHeatDefinition,
    polytropicHeatOfMassDefinition,
    polytropicWorkDefinition,
    polytropicWorkOfMassDefinition,
    polytropicInternalEnergyChangeDefinition,
    polytropicInternalEnergyChangeOfMassDefinition,
    polytropicEnthalpyChangeDefinition,
    polytropicEnthalpyChangeOfMassDefinition,
    heatFromInternalEnergyAndWorkDefinition,
    workFromHeatAndInternalEnergyDefinition,
    temperatureChangeFromHeatAndWorkDefinition,
    heatFromEnthalpyAndPressureChangeDefinition,
    temperatureChangeFromHeatAndPressureChangeDefinition,
    pressureChangeFromHeatAndEnthalpyDefinition,
    specificVolumeFromHeatAndEnthalpyDefinition,
    heatFromEnthalpyAndGeopotentialDefinition,
    temperatureChangeFromHeatAndHeightChangeDefinition,
    heightChangeFromHeatAndEnthalpyDefinition,
    pressureAfterIsochoricHeatingDefinition,
    heatingRateDefinition,
    specificHeatingRateDefinition,
    dryAdiabaticLapseRateDefinition,
    moistUnsaturatedLapseRateDefinition,
    parcelLapseRateInEnvironmentDefinition,
    parcelTemperatureByHeightDefinition,
    dryStaticEnergyDefinition
  ]
};

// shared/thermo/quantities/autoconvectiveLapseRate.ts
var autoconvectiveLapseRate = (constants) => kelvinPerMeter(constant(constants, "g") / constant(constants, "R"));
var autoconvectiveLapseRateDefinition = oneFormula({
  key: "autoconvective-lapse-rate",
  name: "autoconvective lapse rate",
  symbol: "Γa",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [],
  constants: ["g", "R"],
  formula: {
    key: "g-over-r",
    label: "g/R",
    source: { text: 'AMS Glossary of Meteorology, "autoconvective lapse rate"', status: "common practice" },
    validity: "dry air",
    knownError: "34.16 to 34.18 K km⁻¹ by the constants taught"
  },
  ask: "The autoconvective lapse rate Γa = −dT/dz, at which the density of the air is the same at all heights.",
  value: (_inputs, constants) => autoconvectiveLapseRate(constants),
  working: (_inputs, constants, result2) => [
    worked("Uniform density: hydrostatic balance and the equation of state", "\\Gamma_a = \\frac{g}{R}", `\\Gamma_a = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(constant(constants, "R"))}}`, result2, "K/m", { value: result2 * 1e3, unit: "K/km" })
  ],
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height."),
    perMeterSlip,
    per100MetersSlip,
    slip("dry-adiabatic", "g/cp for g/R", "This is g/cp, the dry adiabatic lapse rate.", (_i, constants) => dryRateOf(constants)),
    slip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor in place of that of dry air.", (_i, constants) => constant(constants, "g") / vaporGasConstant)
  ],
  example: { inputs: {}, gives: 0.0341812, within: 1e-7 }
});

// shared/thermo/standardAtmosphere.ts
var standardConstants = {
  gravity: 9.80665,
  gasConstant: 287.05287,
  temperature: 288.15,
  pressure: 101325,
  layers: [{ baseHeight: 0, lapse: -65e-4 }, { baseHeight: 11e3, lapse: 0 }, { baseHeight: 2e4, lapse: 1e-3 }],
  top: 32e3,
  earthRadius: 6356766
};
var lowestStandardHeight = -2e3;
var pressureWithin = (base, height2, of) => {
  const { lapse } = base.layer;
  if (lapse === 0) return base.pressure * exp(-of.gravity * (height2 - base.height) / (of.gasConstant * base.temperature));
  return base.pressure * pow(base.temperature / (base.temperature + lapse * (height2 - base.height)), of.gravity / (of.gasConstant * lapse));
};
function basesOf(of) {
  const bases = [];
  let temperature6 = of.temperature, pressure4 = of.pressure;
  of.layers.forEach((layer4, at) => {
    const base = { layer: layer4, height: layer4.baseHeight, temperature: temperature6, pressure: pressure4, topHeight: of.layers[at + 1]?.baseHeight ?? of.top };
    bases.push(base);
    pressure4 = pressureWithin(base, base.topHeight, of);
    temperature6 += layer4.lapse * (base.topHeight - base.height);
  });
  return bases;
}
var standardBases = basesOf(standardConstants);
var basesFor = (of) => of === standardConstants ? standardBases : basesOf(of);
function standardAtmosphere(geopotentialHeight, of = standardConstants) {
  if (!(geopotentialHeight >= lowestStandardHeight && geopotentialHeight <= of.top)) throw new OutOfRangeError("geopotentialHeight", geopotentialHeight, `${lowestStandardHeight} to ${of.top} m`);
  const bases = basesFor(of);
  const base = bases.findLast((one2) => geopotentialHeight >= one2.height) ?? bases[0];
  if (!base) throw new Error("a standard atmosphere has a layer");
  const temperature6 = base.temperature + base.layer.lapse * (geopotentialHeight - base.height);
  const pressure4 = pressureWithin(base, geopotentialHeight, of);
  return { temperature: kelvin(temperature6), pressure: pascal(pressure4), density: kilogramPerCubicMeter(pressure4 / (of.gasConstant * temperature6)) };
}
function standardHeight(pressure4, of = standardConstants) {
  const bases = basesFor(of);
  const base = bases.findLast((one2) => pressure4 <= one2.pressure) ?? bases[0];
  if (!base) throw new Error("a standard atmosphere has a layer");
  const { lapse } = base.layer;
  const height2 = lapse === 0 ? base.height + of.gasConstant * base.temperature / of.gravity * log(base.pressure / pressure4) : base.height + base.temperature / lapse * (pow(pressure4 / base.pressure, -of.gasConstant * lapse / of.gravity) - 1);
  if (!(height2 >= lowestStandardHeight - 1e-3 && height2 <= of.top + 1e-3)) throw new OutOfRangeError("pressure", pressure4, `the pressures of the standard atmosphere between ${lowestStandardHeight} and ${of.top} m`);
  return meter(height2);
}
var geopotentialOfGeometric = (geometricHeight, earthRadius2) => meter(earthRadius2 * geometricHeight / (earthRadius2 + geometricHeight));
var geometricOfGeopotential = (geopotentialHeight, earthRadius2) => meter(earthRadius2 * geopotentialHeight / (earthRadius2 - geopotentialHeight));

// shared/thermo/quantities/geometricHeight.ts
var H = (inputs2) => numberOf(inputs2, "geopotentialHeight");
var value11 = (inputs2, constants) => geometricOfGeopotential(meter(H(inputs2)), constant(constants, "earthRadius"));
var geometricHeightDefinition = oneFormula({
  key: "geometric-height",
  name: "geometric height of a geopotential height",
  symbol: "z",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: [lengthInput("geopotentialHeight", "geopotential height above mean sea level", "H", [-500, 95e3])],
  constants: ["earthRadius"],
  formula: {
    key: "inverse-square",
    label: "a H/(a − H)",
    source: { text: "U.S. Standard Atmosphere 1976, Eq. 19", status: "verified" },
    validity: "gravity of 9.80665 m s⁻² at sea level, falling by the square of the distance from the center",
    knownError: "radius 6356.766 or 6371 km: 0.04 m at 10 km"
  },
  ask: "The geometric height z of the geopotential height H, both above mean sea level.",
  value: value11,
  working: (inputs2, constants, result2) => [
    worked("Gravity falls by the square of the distance from the earth’s center", "z = \\frac{a\\,H}{a - H}", `z = \\frac{${texNumber(constant(constants, "earthRadius"), 7)} \\cdot ${texFactor(H(inputs2), 7)}}{${texNumber(constant(constants, "earthRadius"), 7)} - ${texFactor(H(inputs2), 7)}}`, result2, "m", void 0, 7)
  ],
  slips: [
    fineSlip("other-way", "geopotential for geometric", "This goes the other way: a geometric height is larger than its geopotential one.", (inputs2, constants) => geopotentialOfGeometric(meter(H(inputs2)), constant(constants, "earthRadius"))),
    fineSlip("unchanged", "left as it was", "This is the geopotential height itself.", (inputs2) => H(inputs2)),
    slip("kilometers", "km given as m", "Your number is in kilometers; the unit beside it says meters.", (_i, _c, right) => right / 1e3),
    feetSlip(value11, "geopotentialHeight")
  ],
  example: { inputs: { geopotentialHeight: 1e4 }, gives: 10015.756, within: 1e-3 }
});

// shared/thermo/quantities/geopotentialHeight.ts
var z2 = (inputs2) => numberOf(inputs2, "geometricHeight");
var value12 = (inputs2, constants) => geopotentialOfGeometric(meter(z2(inputs2)), constant(constants, "earthRadius"));
var geopotentialHeightDefinition = oneFormula({
  key: "geopotential-height",
  name: "geopotential height of a geometric height",
  symbol: "H",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: [lengthInput("geometricHeight", "geometric height above mean sea level", "z", [-500, 1e5])],
  constants: ["earthRadius"],
  formula: {
    key: "inverse-square",
    label: "a z/(a + z)",
    source: { text: "U.S. Standard Atmosphere 1976, Eq. 18", status: "verified" },
    validity: "gravity of 9.80665 m s⁻² at sea level, falling by the square of the distance from the center",
    knownError: "radius 6356.766 or 6371 km: 0.04 m at 10 km"
  },
  ask: "The geopotential height H of the geometric height z, both above mean sea level.",
  value: value12,
  working: (inputs2, constants, result2) => [
    worked("Gravity falls by the square of the distance from the earth’s center", "H = \\frac{a\\,z}{a + z}", `H = \\frac{${texNumber(constant(constants, "earthRadius"), 7)} \\cdot ${texFactor(z2(inputs2), 7)}}{${texNumber(constant(constants, "earthRadius"), 7)} + ${texFactor(z2(inputs2), 7)}}`, result2, "m", void 0, 7)
  ],
  slips: [
    fineSlip("other-way", "geometric for geopotential", "This goes the other way: a geopotential height is smaller than its geometric one.", (inputs2, constants) => geometricOfGeopotential(meter(z2(inputs2)), constant(constants, "earthRadius"))),
    fineSlip("unchanged", "left as it was", "This is the geometric height itself.", (inputs2) => z2(inputs2)),
    slip("geopotential", "multiplied by g", "This is the geopotential in J kg⁻¹: divide it by 9.80665.", (_i, _c, right) => right * 9.80665),
    slip("kilometers", "km given as m", "Your number is in kilometers; the unit beside it says meters.", (_i, _c, right) => right / 1e3),
    feetSlip(value12, "geometricHeight")
  ],
  example: { inputs: { geometricHeight: 1e4 }, gives: 9984.293, within: 1e-3 }
});

// shared/thermo/quantities/hypsometricThickness.ts
function hypsometricThickness(bottom3, top4, meanVirtualTemperature, constants) {
  if (!(top4 < bottom3)) throw new OutOfRangeError("pressureTop", top4, `the pressures below that of the bottom, ${bottom3} Pa`);
  return meter(constant(constants, "R") * meanVirtualTemperature / constant(constants, "g") * log(bottom3 / top4));
}
var bottom = (inputs2) => numberOf(inputs2, "pressureBottom");
var top = (inputs2) => numberOf(inputs2, "pressureTop");
var Tv = (inputs2) => numberOf(inputs2, "meanVirtualTemperature");
var hypsometricThicknessDefinition = {
  key: "hypsometric-thickness",
  name: "hypsometric thickness of a layer",
  symbol: "Δz",
  unit: "m",
  shownUnit: "m",
  kind: "ratio",
  inputs: [
    { name: "pressureBottom", label: "pressure at the bottom", symbol: "p₁", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [100, 12e4] },
    { name: "pressureTop", label: "pressure at the top", symbol: "p₂", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [100, 12e4] },
    { name: "meanVirtualTemperature", label: "mean virtual temperature of the layer", symbol: "T̄v", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [150, 350] }
  ],
  variants: [{
    key: "hypsometric",
    label: "hypsometric equation",
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"', status: "common practice" },
    validity: "hydrostatic balance, 1–1200 hPa",
    knownError: "g 9.81 or 9.80665: 2 m in 1000–500 hPa",
    evaluate: (inputs2, constants) => ({ is: "value", value: hypsometricThickness(pascal(bottom(inputs2)), pascal(top(inputs2)), kelvin(Tv(inputs2)), constants) })
  }],
  constants: ["R", "g"],
  ask: "The thickness Δz of the layer between the two pressures by the hypsometric equation, with the mean virtual temperature in kelvin.",
  trace(inputs2, constants) {
    const scale = constant(constants, "R") * Tv(inputs2) / constant(constants, "g");
    const value23 = hypsometricThickness(pascal(bottom(inputs2)), pascal(top(inputs2)), kelvin(Tv(inputs2)), constants);
    const ratio2 = log(bottom(inputs2) / top(inputs2));
    return [
      { text: "Scale height, with T̄v in kelvin", formula: "H = \\frac{R\\,\\overline{T_v}}{g}", filled: `H = \\frac{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(Tv(inputs2))}}{${texNumber(constant(constants, "g"), 6)}} = ${texQuantity(scale, "m", 6)}`, value: scale, unit: "m" },
      { text: "Natural logarithm of the ratio of pressures", formula: "\\ln\\frac{p_1}{p_2}", filled: `\\ln\\frac{${texNumber(bottom(inputs2) / 100, 6)}}{${texNumber(top(inputs2) / 100, 6)}} = ${texNumber(ratio2, 6)}`, value: ratio2, unit: "1" },
      { text: "Thickness", formula: "\\Delta z = H \\ln\\frac{p_1}{p_2}", filled: `\\Delta z = ${texNumber(scale, 6)} \\cdot ${texNumber(ratio2, 6)} = ${texQuantity(value23, "m", 6)}`, value: value23, unit: "m" }
    ];
  },
  slips: [
    signSlip("This has the ratio of pressures turned round: the bottom’s pressure is the larger one."),
    slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the hypsometric equation takes kelvin.", (inputs2, _c, right) => right * (Tv(inputs2) - zeroCelsius) / Tv(inputs2)),
    slip("base-10", "base-10 for natural logarithm", "This comes from the logarithm to base 10: the hypsometric equation takes the natural one.", (inputs2, constants) => constant(constants, "R") * Tv(inputs2) / constant(constants, "g") * log10(bottom(inputs2) / top(inputs2))),
    slip("standard-pressure", "1013.25 hPa for the bottom", "This starts from 1013.25 hPa in place of the pressure at the bottom.", (inputs2, constants) => bottom(inputs2) === 101325 ? null : constant(constants, "R") * Tv(inputs2) / constant(constants, "g") * log(101325 / top(inputs2))),
    slip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor in place of that of dry air.", (_i, constants, right) => right * vaporGasConstant / constant(constants, "R")),
    slip("cp-for-r", "cp for R", "This comes from cp in place of R.", (_i, constants, right) => right * constant(constants, "cp") / constant(constants, "R")),
    slip("geopotential", "not divided by g", "This is the difference of geopotential: divide it by g.", (_i, constants, right) => right * constant(constants, "g")),
    slip("kilometers", "km given as m", "Your number is in kilometers; the unit beside it says meters.", (_i, _c, right) => right / 1e3)
  ],
  example: { inputs: { pressureBottom: 1e5, pressureTop: 5e4, meanVirtualTemperature: 273.15 }, gives: 5539.1, within: 0.1 }
};

// shared/thermo/quantities/hypsometricHeightAboveLaunch.ts
var optional = (inputs2, name) => inputs2[name] === void 0 ? 0 : numberOf(inputs2, name);
var p5 = (inputs2) => numberOf(inputs2, "pressure");
var Tv2 = (inputs2) => numberOf(inputs2, "meanVirtualTemperature");
var datum = (inputs2) => optional(inputs2, "barometerHeight");
var anchor = (inputs2) => numberOf(inputs2, "stationPressure") + optional(inputs2, "pressureTendency") * optional(inputs2, "timeSinceLaunch");
var corrected = (inputs2) => p5(inputs2) - optional(inputs2, "pressureOffset");
function hypsometricHeightAboveLaunch(inputs2, constants) {
  const from2 = anchor(inputs2), to2 = corrected(inputs2);
  if (!(from2 > 0)) throw new OutOfRangeError("pressureTendency", optional(inputs2, "pressureTendency"), "the tendencies that leave a station pressure");
  if (!(to2 > 0)) throw new OutOfRangeError("pressureOffset", optional(inputs2, "pressureOffset"), "the offsets below the sonde’s pressure");
  if (to2 === from2) return datum(inputs2);
  const thickness = to2 < from2 ? hypsometricThickness(pascal(from2), pascal(to2), kelvin(Tv2(inputs2)), constants) : -hypsometricThickness(pascal(to2), pascal(from2), kelvin(Tv2(inputs2)), constants);
  return datum(inputs2) + thickness;
}
var value13 = hypsometricHeightAboveLaunch;
var without = (name) => (inputs2, constants) => optional(inputs2, name) === 0 ? null : value13({ ...inputs2, [name]: 0 }, constants);
var turned = (name) => (inputs2, constants) => optional(inputs2, name) === 0 ? null : value13({ ...inputs2, [name]: -optional(inputs2, name) }, constants);
var hypsometricHeightAboveLaunchDefinition = oneFormula({
  key: "hypsometric-height-above-launch",
  name: "height above the launch point from pressure",
  symbol: "z",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: [
    pressureInput("stationPressure", "station pressure at the barometer, at the launch", "p_s", [4e4, 12e4]),
    pressureInput("pressure", "pressure of the sonde", "p", [1e3, 12e4]),
    temperatureInput("meanVirtualTemperature", "mean virtual temperature between barometer and sonde", "T̄v", [150, 350]),
    { ...lengthInput("barometerHeight", "height of the barometer above the launch point", "z_b", [-500, 500]), isOptional: true },
    { name: "pressureTendency", label: "tendency of the station pressure", symbol: "ṗ", unit: "Pa/s", shownUnit: "hPa/h", kind: "difference", shape: "number", range: [-1, 1], isOptional: true },
    { ...timeInput("timeSinceLaunch", "time since the launch", "Δt", [0, 172800]), isOptional: true },
    { name: "pressureOffset", label: "offset of the sonde’s pressure on the ground, sonde less barometer", symbol: "δ", unit: "Pa", shownUnit: "hPa", kind: "difference", shape: "number", range: [-2e3, 2e3], isOptional: true }
  ],
  constants: ["R", "g"],
  formula: {
    key: "hypsometric",
    label: "hypsometric equation from the station’s barometer",
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"; corrections by common practice', status: "common practice" },
    validity: "hydrostatic balance",
    knownError: "g 9.81 or 9.80665, R 287 to 287.05: 0.05 %"
  },
  ask: "The height z of the sonde above the launch point by the hypsometric equation from the station pressure at the barometer, with the corrections that are given: the barometer’s height above the launch point, the tendency of the station pressure since the launch, the sonde’s offset on the ground.",
  value: value13,
  working(inputs2, constants, result2) {
    const rise = result2 - datum(inputs2);
    return [
      ...optional(inputs2, "pressureTendency") * optional(inputs2, "timeSinceLaunch") === 0 ? [] : [worked("Station pressure at the time of the sample", "p_s(t) = p_s + \\dot p\\,\\Delta t", `p_s(t) = ${texNumber(numberOf(inputs2, "stationPressure") / 100, 6)} + ${texFactor(optional(inputs2, "pressureTendency") * 36)} \\cdot ${texNumber(optional(inputs2, "timeSinceLaunch") / 3600)}`, anchor(inputs2), "Pa", { value: anchor(inputs2) / 100, unit: "hPa" })],
      ...optional(inputs2, "pressureOffset") === 0 ? [] : [worked("Pressure of the sonde without its offset", "p - \\delta", `${texNumber(p5(inputs2) / 100, 6)} - ${texFactor(optional(inputs2, "pressureOffset") / 100)}`, corrected(inputs2), "Pa", { value: corrected(inputs2) / 100, unit: "hPa" })],
      worked("Height above the barometer", "\\frac{R\\,\\overline{T_v}}{g} \\ln\\frac{p_s(t)}{p - \\delta}", `\\frac{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(Tv2(inputs2), 6)}}{${texNumber(constant(constants, "g"), 6)}} \\ln\\frac{${texNumber(anchor(inputs2) / 100, 6)}}{${texNumber(corrected(inputs2) / 100, 6)}}`, rise, "m"),
      worked("Above the launch point", "z = z_b + \\frac{R\\,\\overline{T_v}}{g} \\ln\\frac{p_s(t)}{p - \\delta}", `z = ${texNumber(datum(inputs2))} + ${texFactor(rise, 6)}`, result2, "m")
    ];
  },
  slips: [
    slip("standard-pressure", "1013.25 hPa for the station pressure", "This starts from 1013.25 hPa: the anchor is the station pressure at the barometer.", (inputs2, constants) => value13({ ...inputs2, stationPressure: 101325, pressureTendency: 0 }, constants)),
    slip("pressure-altitude", "pressure altitude for height", "This is the pressure altitude, the height in the standard atmosphere: asked is the height above the launch point.", (inputs2) => standardHeight(pascal(p5(inputs2)))),
    celsiusSlip(value13, "meanVirtualTemperature"),
    fineSlip("fixed-anchor", "pressure of the launch throughout", "This keeps the station pressure of the launch: it has changed since.", without("pressureTendency")),
    fineSlip("offset-left-in", "offset left in", "This leaves in the offset that the sonde showed on the ground.", without("pressureOffset")),
    fineSlip("offset-sign", "offset added", "This adds the sonde’s offset where it has to be taken off.", turned("pressureOffset")),
    fineSlip("barometer-height-left-out", "height of the barometer left out", "This is the height above the barometer: the launch point is another datum.", without("barometerHeight")),
    fineSlip("barometer-height-sign", "height of the barometer taken off", "This takes the barometer’s height off where it has to be added.", turned("barometerHeight"))
  ],
  example: { inputs: { stationPressure: 97500, pressure: 94e3, meanVirtualTemperature: 283.15 }, gives: 302.836, within: 1e-3 }
});

// shared/numerics/regression.ts
function straightLine(x, y) {
  const count = x.length;
  if (count < 2 || y.length !== count) return null;
  const meanX = mean(x);
  const meanY = mean(y);
  let sumXX = 0, sumXY = 0, sumYY = 0;
  for (let at = 0; at < count; at++) {
    const dx = (x[at] ?? 0) - meanX;
    const dy = (y[at] ?? 0) - meanY;
    sumXX += dx * dx;
    sumXY += dx * dy;
    sumYY += dy * dy;
  }
  if (!(sumXX > 0) || !Number.isFinite(sumXX + sumYY)) return null;
  const slope = sumXY / sumXX;
  let squares = 0;
  for (let at = 0; at < count; at++) {
    const residual = (y[at] ?? 0) - meanY - slope * ((x[at] ?? 0) - meanX);
    squares += residual * residual;
  }
  const residualDeviation = count > 2 ? Math.sqrt(squares / (count - 2)) : null;
  return {
    slope,
    intercept: meanY - slope * meanX,
    residualDeviation,
    slopeError: residualDeviation === null ? null : residualDeviation / Math.sqrt(sumXX),
    interceptError: residualDeviation === null ? null : residualDeviation * Math.sqrt(1 / count + meanX * meanX / sumXX),
    rSquared: sumYY > 0 ? Math.max(0, 1 - squares / sumYY) : null,
    meanX,
    meanY,
    sumXX,
    sumXY,
    sumYY,
    count
  };
}
function mean(values) {
  let sum = 0;
  for (const value23 of values) sum += value23;
  const first3 = sum / values.length;
  let rest = 0;
  for (const value23 of values) rest += value23 - first3;
  return first3 + rest / values.length;
}

// shared/thermo/hypsometry.ts
function pressureAtHeight(pressure4, heightDifference, meanVirtualTemperature, constants) {
  return pascal(pressure4 * exp(-constant(constants, "g") * heightDifference / (constant(constants, "R") * meanVirtualTemperature)));
}
function logPressureMean(pressures2, temperatures) {
  let sum = 0, weights = 0;
  for (let at = 1; at < pressures2.length; at++) {
    const below = pressures2[at - 1] ?? NaN, above = pressures2[at] ?? NaN;
    const weight = log(below / above);
    sum += weight * ((temperatures[at - 1] ?? NaN) + (temperatures[at] ?? NaN)) / 2;
    weights += weight;
  }
  if (!(weights > 0)) throw new SeriesError("pressure", "at least two levels are needed, from the bottom upwards");
  return kelvin(sum / weights);
}
var reductionLapseRate = -(standardConstants.layers[0]?.lapse ?? NaN);
var fictitiousMeanTemperature = (stationTemperature, stationHeight, lapseRate) => kelvin(stationTemperature + lapseRate * stationHeight / 2);

// shared/thermo/levels.ts
var levelInputs = [
  { name: "pressure", label: "pressures of the levels, from the bottom upwards", symbol: "p", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "series", range: [100, 12e4], needs: { least: 2, order: "descending" } },
  { name: "temperature", label: "temperatures of the levels", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "series", range: [150, 350], needs: { least: 2 } }
];

// shared/thermo/quantities/hypsometricThicknessOfLevels.ts
var p6 = (inputs2) => seriesOf(inputs2, "pressure");
var T5 = (inputs2) => seriesOf(inputs2, "temperature");
var bottom2 = (inputs2) => pascal(p6(inputs2)[0] ?? NaN);
var top2 = (inputs2) => pascal(p6(inputs2)[p6(inputs2).length - 1] ?? NaN);
var value14 = (inputs2, constants) => hypsometricThickness(bottom2(inputs2), top2(inputs2), logPressureMean(p6(inputs2), T5(inputs2)), constants);
var hypsometricThicknessOfLevelsDefinition = oneFormula({
  key: "hypsometric-thickness-of-levels",
  name: "hypsometric thickness of a layer from its levels",
  symbol: "Δz",
  unit: "m",
  shownUnit: "m",
  kind: "ratio",
  inputs: levelInputs.map((input2) => input2.name === "temperature" ? { ...input2, label: "virtual temperatures of the levels", symbol: "Tv" } : input2),
  constants: ["R", "g"],
  formula: {
    key: "hypsometric",
    label: "hypsometric equation, layer by layer",
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"; trapezoids in ln p', status: "common practice" },
    validity: "hydrostatic balance, levels from the bottom upwards",
    knownError: "g 9.81 or 9.80665: 2 m in 1000–500 hPa"
  },
  ask: "The thickness Δz between the lowest and the highest level by the hypsometric equation, each layer between two levels with the mean of their virtual temperatures in kelvin.",
  value: value14,
  working(inputs2, constants, result2) {
    const average = logPressureMean(p6(inputs2), T5(inputs2)), ratio2 = log(bottom2(inputs2) / top2(inputs2));
    return [
      worked("Mean virtual temperature, weighted by the logarithm of pressure", "\\overline{T_v} = \\frac{\\sum \\tfrac12 (T_i + T_{i+1}) \\ln(p_i/p_{i+1})}{\\ln(p_1/p_n)}", "\\overline{T_v}", average, "K"),
      worked("Natural logarithm of the ratio of pressures", "\\ln\\frac{p_1}{p_n}", `\\ln\\frac{${texNumber(bottom2(inputs2) / 100, 6)}}{${texNumber(top2(inputs2) / 100, 6)}}`, ratio2, "1"),
      worked("Thickness", "\\Delta z = \\frac{R\\,\\overline{T_v}}{g} \\ln\\frac{p_1}{p_n}", `\\Delta z = \\frac{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(average, 6)}}{${texNumber(constant(constants, "g"), 6)}} \\cdot ${texNumber(ratio2, 6)}`, result2, "m")
    ];
  },
  slips: [
    signSlip("This has the ratio of pressures turned round: the bottom’s pressure is the larger one."),
    slip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperatures in °C: the hypsometric equation takes kelvin.", (inputs2, _c, right) => {
      const average = logPressureMean(p6(inputs2), T5(inputs2));
      return right * (average - zeroCelsius) / average;
    }),
    slip("log10-for-ln", "logarithm to base 10", "This comes from the logarithm to base 10: the formula has the natural one.", (inputs2, _c, right) => right * log10(bottom2(inputs2) / top2(inputs2)) / log(bottom2(inputs2) / top2(inputs2))),
    fineSlip("plain-mean", "plain mean of the levels", "This takes the plain mean of the levels: thick layers count for more.", (inputs2, _c, right) => right * mean(T5(inputs2)) / logPressureMean(p6(inputs2), T5(inputs2))),
    fineSlip("bottom-temperature", "temperature of the bottom", "This takes the temperature of the lowest level for the whole layer.", (inputs2, _c, right) => right * (T5(inputs2)[0] ?? NaN) / logPressureMean(p6(inputs2), T5(inputs2))),
    slip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor in place of that of dry air.", (_i, constants, right) => right * vaporGasConstant / constant(constants, "R")),
    slip("geopotential", "not divided by g", "This is the difference of geopotential: divide it by g.", (_i, constants, right) => right * constant(constants, "g"))
  ],
  example: { inputs: { pressure: [1e5, 85e3, 7e4], temperature: [293.15, 285.15, 277.15] }, gives: 2971.8, within: 0.1 }
});

// shared/thermo/quantities/layerMeanTemperature.ts
var p7 = (inputs2) => seriesOf(inputs2, "pressure");
var T6 = (inputs2) => seriesOf(inputs2, "temperature");
var value15 = (inputs2) => logPressureMean(p7(inputs2), T6(inputs2));
function pressureMean(pressures2, temperatures) {
  let sum = 0;
  for (let at = 1; at < pressures2.length; at++) sum += ((pressures2[at - 1] ?? NaN) - (pressures2[at] ?? NaN)) * ((temperatures[at - 1] ?? NaN) + (temperatures[at] ?? NaN)) / 2;
  return sum / ((pressures2[0] ?? NaN) - (pressures2[pressures2.length - 1] ?? NaN));
}
var layerMeanTemperatureDefinition = oneFormula({
  key: "layer-mean-temperature",
  name: "mean temperature of a layer, weighted by the logarithm of pressure",
  symbol: "T̄",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: levelInputs,
  constants: [],
  formula: {
    key: "log-pressure",
    label: "trapezoids in ln p",
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"; trapezoids in ln p', status: "common practice" },
    validity: "levels from the bottom upwards",
    knownError: "what the temperature does between the levels"
  },
  ask: "The mean temperature T̄ of the layer, weighted by the logarithm of pressure: between two levels the mean of both, over all levels that are given.",
  value: value15,
  working(inputs2, _constants, result2) {
    const pressures2 = p7(inputs2), first3 = pressures2[0] ?? NaN, last = pressures2[pressures2.length - 1] ?? NaN, depth = log(first3 / last);
    return [
      worked("Depth in the logarithm of pressure", "\\ln\\frac{p_1}{p_n}", `\\ln\\frac{${texNumber(first3 / 100, 6)}}{${texNumber(last / 100, 6)}}`, depth, "1"),
      worked("Mean of both ends of each layer, weighted by its depth", "\\overline{T} = \\frac{\\sum \\tfrac12 (T_i + T_{i+1}) \\ln(p_i/p_{i+1})}{\\ln(p_1/p_n)}", `\\overline{T} = \\frac{${texNumber(result2 * depth, 6)}}{${texNumber(depth, 6)}} = ${texQuantity(result2 - zeroCelsius, "Cel")}`, result2, "K")
    ];
  },
  slips: [
    fineSlip("plain-mean", "plain mean of the levels", "This is the plain mean of the levels: thick layers count for more.", (inputs2) => mean(T6(inputs2))),
    fineSlip("ends-only", "mean of both ends", "This is the mean of the lowest and the highest level alone.", (inputs2) => ((T6(inputs2)[0] ?? NaN) + (T6(inputs2)[T6(inputs2).length - 1] ?? NaN)) / 2),
    fineSlip("pressure-weighted", "weighted by pressure", "This is weighted by pressure: thickness goes by its logarithm.", (inputs2) => pressureMean(p7(inputs2), T6(inputs2))),
    endUnitSlip("Cel")
  ],
  example: { inputs: { pressure: [1e5, 85e3, 7e4], temperature: [293.15, 285.15, 277.15] }, gives: 284.795, within: 1e-3 }
});

// shared/thermo/quantities/layerMeanVirtualTemperature.ts
function layerMeanVirtualTemperature(bottom3, top4, thickness, constants) {
  if (!(top4 < bottom3)) throw new OutOfRangeError("pressureTop", top4, `the pressures below that of the bottom, ${bottom3} Pa`);
  const mean2 = constant(constants, "g") * thickness / (constant(constants, "R") * log(bottom3 / top4));
  if (!(mean2 >= 50 && mean2 <= 1e3)) throw new OutOfRangeError("thickness", thickness, `the thicknesses that give a mean of 50 to 1000 K between ${bottom3} and ${top4} Pa`);
  return mean2;
}
var p1 = (inputs2) => numberOf(inputs2, "pressureBottom");
var p22 = (inputs2) => numberOf(inputs2, "pressureTop");
var dz = (inputs2) => numberOf(inputs2, "thickness");
var value16 = (inputs2, constants) => layerMeanVirtualTemperature(p1(inputs2), p22(inputs2), dz(inputs2), constants);
var layerMeanVirtualTemperatureDefinition = oneFormula({
  key: "layer-mean-virtual-temperature",
  name: "mean virtual temperature of a layer from its thickness",
  symbol: "T̄v",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput("pressureBottom", "pressure at the bottom", "p₁", [100, 12e4]), pressureInput("pressureTop", "pressure at the top", "p₂", [100, 12e4]), lengthInput("thickness", "thickness of the layer", "Δz", [1, 6e4])],
  constants: ["R", "g"],
  formula: {
    key: "hypsometric",
    label: "hypsometric equation",
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"', status: "common practice" },
    validity: "hydrostatic balance, 1–1200 hPa",
    knownError: "g 9.81 or 9.80665, R 287 to 287.05: 0.15 K"
  },
  ask: "The mean virtual temperature T̄v of the layer from its thickness, by the hypsometric equation.",
  value: value16,
  working(inputs2, constants, result2) {
    const ratio2 = log(p1(inputs2) / p22(inputs2));
    return [
      worked("Natural logarithm of the ratio of pressures", "\\ln\\frac{p_1}{p_2}", `\\ln\\frac{${texNumber(p1(inputs2) / 100, 6)}}{${texNumber(p22(inputs2) / 100, 6)}}`, ratio2, "1"),
      worked("Hypsometric equation, solved for the temperature", "\\overline{T_v} = \\frac{g\\,\\Delta z}{R \\ln(p_1/p_2)}", `\\overline{T_v} = \\frac{${texNumber(constant(constants, "g"), 6)} \\cdot ${texNumber(dz(inputs2), 6)}}{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(ratio2, 6)}} = ${texQuantity(result2 - zeroCelsius, "Cel")}`, result2, "K")
    ];
  },
  slips: [
    endUnitSlip("Cel"),
    slip("log10-for-ln", "logarithm to base 10", "This comes from the logarithm to base 10: the formula has the natural one.", (inputs2, _c, right) => right * log(p1(inputs2) / p22(inputs2)) / log10(p1(inputs2) / p22(inputs2))),
    slip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor in place of that of dry air.", (_i, constants, right) => right * constant(constants, "R") / vaporGasConstant),
    slip("cp-for-r", "cp for R", "This comes from cp in place of R.", (_i, constants, right) => right * constant(constants, "R") / constant(constants, "cp")),
    slip("feet-for-meters", "feet taken for meters", "This comes from the thickness in feet where meters go in.", (_i, _c, right) => right / 0.3048),
    slip("ratio-for-logarithm", "ratio for its logarithm", "This takes (p₁ − p₂)/p₁ for the logarithm of p₁/p₂.", (inputs2, _c, right) => right * log(p1(inputs2) / p22(inputs2)) / (1 - p22(inputs2) / p1(inputs2)))
  ],
  example: { inputs: { pressureBottom: 1e5, pressureTop: 5e4, thickness: 5539 }, gives: 273.1442, within: 1e-3 }
});

// shared/thermo/quantities/pressureAltitude.ts
var p8 = (inputs2) => numberOf(inputs2, "pressure");
var value17 = (inputs2) => standardHeight(pascal(p8(inputs2)));
var { gravity, gasConstant, temperature: temperature2, pressure: groundPressure } = standardConstants;
var pressureAltitudeDefinition = oneFormula({
  key: "pressure-altitude",
  name: "pressure altitude",
  symbol: "H_p",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 100,
  inputs: [pressureInput("pressure", "pressure", "p", [868, 127774])],
  constants: [],
  formula: {
    key: "standard",
    label: "height in the standard atmosphere",
    source: { text: "ISO 2533:1975; ICAO Doc 7488/3 (1993); U.S. Standard Atmosphere 1976, Eqs. 33a, 33b", status: "verified" },
    validity: "−2 to 32 km",
    knownError: "R 287.05 for 287.05287: 0.3 m at 3 km"
  },
  ask: "The pressure altitude: the geopotential height at which the standard atmosphere has the pressure. It is not the height of the instrument.",
  value: value17,
  working(inputs2, _constants, result2) {
    const shown3 = texNumber(p8(inputs2) / 100, 6);
    if (result2 <= 11e3) {
      return [worked("Standard atmosphere, solved for the height", "H_p = \\frac{T_0}{0.0065}\\left[1 - \\left(\\frac{p}{p_0}\\right)^{0.0065\\,R/g_0}\\right]", `H_p = \\frac{${texNumber(temperature2, 6)}}{0.0065}\\left[1 - \\left(\\frac{${shown3}}{1013.25}\\right)^{${texNumber(gasConstant * 65e-4 / gravity, 6)}}\\right]`, result2, "m", void 0, 7)];
    }
    if (result2 <= 2e4) return [worked("Standard atmosphere, isothermal above 11 km", "H_p = 11\\,000 + \\frac{R\\,T}{g_0} \\ln\\frac{p_{11}}{p}", `H_p = 11\\,000 + \\frac{${texNumber(gasConstant, 8)} \\cdot 216.65}{${texNumber(gravity, 6)}} \\ln\\frac{226.321}{${shown3}}`, result2, "m", void 0, 7)];
    return [worked("Standard atmosphere above 20 km, 1 K warmer for each kilometer", "H_p = 20\\,000 + \\frac{216.65}{0.001}\\left[\\left(\\frac{p_{20}}{p}\\right)^{0.001\\,R/g_0} - 1\\right]", `H_p = 20\\,000 + \\frac{216.65}{0.001}\\left[\\left(\\frac{54.7489}{${shown3}}\\right)^{${texNumber(gasConstant * 1e-3 / gravity, 6)}} - 1\\right]`, result2, "m", void 0, 7)];
  },
  slips: [
    slip("isothermal", "one temperature throughout", "This takes 288.15 K all the way up: the standard atmosphere is colder aloft.", (inputs2) => gasConstant * temperature2 / gravity * log(groundPressure / p8(inputs2))),
    slip("from-1000", "1000 hPa at sea level", "This starts from 1000 hPa: the standard atmosphere has 1013.25 hPa at sea level.", (inputs2) => {
      const raised3 = p8(inputs2) * groundPressure / 1e5;
      return raised3 > 127773 ? null : standardHeight(pascal(raised3));
    }),
    slip("inverted-exponent", "exponent turned round", "This comes from the exponent turned round, its inverse.", (inputs2) => temperature2 / 65e-4 * (1 - pow(p8(inputs2) / groundPressure, gravity / (gasConstant * 65e-4)))),
    slip("dry-adiabat", "9.8 K km⁻¹ for 6.5", "This comes from the dry adiabatic lapse rate: the standard atmosphere has 6.5 K km⁻¹.", (inputs2) => temperature2 / 98e-4 * (1 - pow(p8(inputs2) / groundPressure, gasConstant * 98e-4 / gravity))),
    slip("feet", "feet given as meters", "Your number is in feet; the unit beside it says meters.", (_i, _c, right) => right / 0.3048),
    slip("kilometers", "km given as m", "Your number is in kilometers; the unit beside it says meters.", (_i, _c, right) => right / 1e3)
  ],
  example: { inputs: { pressure: 89874.57 }, gives: 1e3, within: 0.01 }
});

// shared/thermo/quantities/pressureAtHeight.ts
var p9 = (inputs2) => numberOf(inputs2, "pressure");
var Tv3 = (inputs2) => numberOf(inputs2, "meanVirtualTemperature");
var dz2 = (inputs2) => numberOf(inputs2, "heightDifference");
var value18 = (inputs2, constants) => pressureAtHeight(pascal(p9(inputs2)), meter(dz2(inputs2)), kelvin(Tv3(inputs2)), constants);
var pressureAtHeightDefinition = oneFormula({
  key: "pressure-at-height",
  name: "pressure at a height above a level",
  symbol: "p₂",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  inputs: [
    pressureInput("pressure", "pressure at the lower level", "p₁", [100, 12e4]),
    lengthInput("heightDifference", "height above that level, negative below it", "Δz", [-1e4, 4e4]),
    temperatureInput("meanVirtualTemperature", "mean virtual temperature between the levels", "T̄v", [150, 350])
  ],
  constants: ["R", "g"],
  formula: {
    key: "hypsometric",
    label: "hypsometric equation",
    source: { text: 'AMS Glossary of Meteorology, "hypsometric equation"', status: "common practice" },
    validity: "hydrostatic balance, 1–1200 hPa",
    knownError: "g 9.81 or 9.80665: 0.03 % of Δz"
  },
  ask: "The pressure p₂ at the height Δz above the level, by the hypsometric equation with the mean virtual temperature in kelvin.",
  value: value18,
  working(inputs2, constants, result2) {
    const scale = constant(constants, "R") * Tv3(inputs2) / constant(constants, "g");
    return [
      worked("Scale height, with T̄v in kelvin", "H = \\frac{R\\,\\overline{T_v}}{g}", `H = \\frac{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(Tv3(inputs2), 6)}}{${texNumber(constant(constants, "g"), 6)}}`, scale, "m"),
      worked("Pressure", "p_2 = p_1 \\exp\\frac{-\\Delta z}{H}", `p_2 = ${texNumber(p9(inputs2) / 100, 6)} \\exp\\frac{-${texFactor(dz2(inputs2), 6)}}{${texNumber(scale, 6)}}`, result2, "Pa", { value: result2 / 100, unit: "hPa" })
    ];
  },
  slips: [
    slip("sign", "higher where it is lower", "Pressure falls with height: your value goes the other way.", (inputs2, _c, right) => p9(inputs2) * p9(inputs2) / right),
    celsiusSlip(value18, "meanVirtualTemperature"),
    feetSlip(value18, "heightDifference"),
    slip("linear", "first term of the exponential", "This takes 1 − x for the exponential of −x: the density falls along the way.", (inputs2, _c, right) => p9(inputs2) * (1 + log(right / p9(inputs2)))),
    slip("base-10", "10 to the power for e", "This raises 10 where the formula raises e.", (inputs2, constants) => {
      const wrong = value18({ ...inputs2, heightDifference: dz2(inputs2) * 2.302585092994046 }, constants);
      return Number.isFinite(wrong) ? wrong : null;
    }),
    vaporConstantSlip(value18),
    slip("eight-meters", "1 hPa for each 8 m", "This takes 1 hPa for each 8 m of height, a rule for the lowest few hundred meters.", (inputs2) => p9(inputs2) - dz2(inputs2) / 8 * 100)
  ],
  example: { inputs: { pressure: 1e5, heightDifference: 1500, meanVirtualTemperature: 283.15 }, gives: 83437.1, within: 0.1 }
});

// shared/thermo/quantities/scaleHeight.ts
function scaleHeight(temperature6, constants) {
  return meter(constant(constants, "R") * temperature6 / constant(constants, "g"));
}
var T7 = (inputs2) => numberOf(inputs2, "temperature");
var value19 = (inputs2, constants) => scaleHeight(kelvin(T7(inputs2)), constants);
var scaleHeightDefinition = oneFormula({
  key: "scale-height",
  name: "scale height of pressure",
  symbol: "H",
  unit: "m",
  shownUnit: "km",
  kind: "ratio",
  inputs: [temperatureInput("temperature", "mean temperature of the column", "T")],
  constants: ["R", "g"],
  formula: {
    key: "isothermal",
    label: "R T/g",
    source: { text: 'AMS Glossary of Meteorology, "scale height"', status: "common practice" },
    validity: "an isothermal column of dry air",
    knownError: "g 9.81 or 9.80665: 0.03 %"
  },
  ask: "The scale height H = R T/g of pressure in an isothermal column, with the temperature in kelvin.",
  value: value19,
  working: (inputs2, constants, result2) => [
    worked("Scale height, with T in kelvin", "H = \\frac{R\\,T}{g}", `H = \\frac{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(T7(inputs2), 6)}}{${texNumber(constant(constants, "g"), 6)}}`, result2, "m", { value: result2 / 1e3, unit: "km" })
  ],
  slips: [
    celsiusSlip(value19, "temperature"),
    vaporConstantSlip(value19),
    otherConstantSlip(value19, "R", "cp"),
    slip("meters-for-kilometers", "m given as km", "Your number is in meters; the unit beside it says kilometers.", (_i, _c, right) => right * 1e3),
    slip("not-divided", "not divided by g", "This is R T: divide it by g.", (_i, constants, right) => right * constant(constants, "g"))
  ],
  example: { inputs: { temperature: 288.15 }, gives: 8430.076, within: 1e-3 }
});

// shared/thermo/seaLevelReduction.ts
function seaLevelReduction(of) {
  const from2 = of.to === "sea level" ? "stationPressure" : "seaLevelPressure";
  const sign = of.to === "sea level" ? -1 : 1;
  const rate7 = of.mean === "isothermal" ? 0 : reductionLapseRate;
  const p10 = (inputs2) => numberOf(inputs2, from2), T11 = (inputs2) => numberOf(inputs2, "stationTemperature"), z4 = (inputs2) => numberOf(inputs2, "stationHeight");
  const through = (inputs2, constants, mean2, direction2 = sign) => pressureAtHeight(pascal(p10(inputs2)), meter(direction2 * z4(inputs2)), kelvin(mean2), constants);
  const meanOf = (inputs2) => fictitiousMeanTemperature(kelvin(T11(inputs2)), meter(z4(inputs2)), rate7);
  const value23 = (inputs2, constants) => through(inputs2, constants, meanOf(inputs2));
  return oneFormula({
    key: of.key,
    name: of.name,
    symbol: of.symbol,
    unit: "Pa",
    shownUnit: "hPa",
    kind: "ratio",
    inputs: [
      of.to === "sea level" ? pressureInput(from2, "station pressure", "p_s", [4e4, 12e4]) : pressureInput(from2, "pressure reduced to mean sea level", "p₀", [85e3, 11e4]),
      lengthInput("stationHeight", "height of the station’s barometer above mean sea level", "z", [-500, 5e3]),
      temperatureInput("stationTemperature", "air temperature at the station", "T", [200, 340])
    ],
    constants: ["g", "R"],
    formula: {
      key: "hypsometric",
      label: `hypsometric equation, ${of.mean === "isothermal" ? "T̄ of the station" : "6.5 K km⁻¹"}`,
      source: { text: 'WMO-No. 8, reduction of station pressure to mean sea level; AMS Glossary of Meteorology, "reduction to sea level"', status: "common practice" },
      validity: "stations below about 750 m",
      knownError: "the mean temperature of air that is not there: 0.2 hPa at 320 m, 2 hPa at 1000 m"
    },
    ask: of.ask,
    value: value23,
    working(inputs2, constants, result2) {
      const mean2 = meanOf(inputs2);
      const first3 = of.mean === "isothermal" ? worked("Mean temperature of the fictitious layer: the station’s, isothermal", "\\overline{T} = T", "\\overline{T}", mean2, "K") : worked("Mean temperature of the fictitious layer, half way along 6.5 K km⁻¹", "\\overline{T} = T + \\tfrac12 \\cdot 0.0065\\,z", `\\overline{T} = ${texNumber(T11(inputs2), 6)} + \\tfrac12 \\cdot 0.0065 \\cdot ${texFactor(z4(inputs2), 6)}`, mean2, "K");
      const minus2 = sign > 0 ? "-" : "", symbols = of.to === "sea level" ? ["p_0", "p_s"] : ["p_s", "p_0"];
      return [first3, worked("Hydrostatic balance through the layer", `${symbols[0]} = ${symbols[1]} \\exp\\frac{${minus2}g\\,z}{R\\,\\overline{T}}`, `${symbols[0]} = ${texNumber(p10(inputs2) / 100, 6)} \\exp\\frac{${minus2}${texNumber(constant(constants, "g"), 6)} \\cdot ${texFactor(z4(inputs2), 6)}}{${texNumber(constant(constants, "R"))} \\cdot ${texNumber(mean2, 6)}}`, result2, "Pa", { value: result2 / 100, unit: "hPa" })];
    },
    slips: [
      slip("wrong-way", "reduced the other way", "Sea level has the higher pressure of the two: your value goes the other way.", (inputs2, constants) => through(inputs2, constants, meanOf(inputs2), -sign)),
      celsiusSlip(value23, "stationTemperature"),
      feetSlip(value23, "stationHeight"),
      fineSlip("linear", "first term of the exponential", "This takes 1 + x for the exponential of x.", (inputs2, constants) => p10(inputs2) * (1 - sign * constant(constants, "g") * z4(inputs2) / (constant(constants, "R") * meanOf(inputs2)))),
      fineSlip("other-mean", of.mean === "isothermal" ? "6.5 K km⁻¹ for isothermal" : "isothermal for 6.5 K km⁻¹", of.mean === "isothermal" ? "This takes the mean temperature along 6.5 K km⁻¹: here the layer is isothermal." : "This takes the station’s temperature for the whole layer: here it rises downwards at 6.5 K km⁻¹.", (inputs2, constants) => through(inputs2, constants, fictitiousMeanTemperature(kelvin(T11(inputs2)), meter(z4(inputs2)), reductionLapseRate - rate7))),
      ...of.mean === "isothermal" ? [] : [fineSlip("lapse-sign", "cooled downwards", "This cools the fictitious air downwards: it is warmer below.", (inputs2, constants) => through(inputs2, constants, fictitiousMeanTemperature(kelvin(T11(inputs2)), meter(z4(inputs2)), -reductionLapseRate)))],
      otherConstantSlip(value23, "R", "cp"),
      slip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", (_i, _c, right) => right * 100)
    ],
    example: of.example
  });
}

// shared/thermo/quantities/seaLevelPressure.ts
var seaLevelPressureDefinition = seaLevelReduction({
  key: "sea-level-pressure",
  name: "pressure reduced to sea level, 6.5 K km⁻¹",
  symbol: "p₀",
  to: "sea level",
  mean: "standard lapse rate",
  ask: "The pressure p₀ reduced to mean sea level through fictitious air that warms downwards at 6.5 K km⁻¹ from the station’s temperature, with its mean temperature half way.",
  example: { inputs: { stationPressure: 97500, stationHeight: 320, stationTemperature: 283.15 }, gives: 101325.76, within: 0.01 }
});

// shared/thermo/quantities/seaLevelPressureIsothermal.ts
var seaLevelPressureIsothermalDefinition = seaLevelReduction({
  key: "sea-level-pressure-isothermal",
  name: "pressure reduced to sea level, isothermal",
  symbol: "p₀",
  to: "sea level",
  mean: "isothermal",
  ask: "The pressure p₀ reduced to mean sea level through fictitious air of the station’s temperature throughout (isothermal).",
  example: { inputs: { stationPressure: 97500, stationHeight: 320, stationTemperature: 283.15 }, gives: 101340.08, within: 0.01 }
});

// shared/thermo/standardAtmosphereQuantity.ts
var units2 = { temperature: ["K", "Cel"], pressure: ["Pa", "hPa"], density: ["kg/m3", "kg/m3"] };
var { gravity: gravity2, gasConstant: gasConstant2, temperature: groundTemperature, pressure: groundPressure2, earthRadius, top: top3 } = standardConstants;
var tropopause = 11e3;
function standardAtmosphereQuantity(of) {
  const isGeometric = of.by === "geometric";
  const name = isGeometric ? "geometricHeight" : "geopotentialHeight";
  const [unit, shownUnit] = units2[of.of];
  const heightOf3 = (inputs2) => isGeometric ? geopotentialOfGeometric(meter(numberOf(inputs2, name)), earthRadius) : meter(numberOf(inputs2, name));
  const value23 = (inputs2) => standardAtmosphere(heightOf3(inputs2))[of.of];
  return oneFormula({
    key: of.key,
    name: of.name,
    symbol: of.symbol,
    unit,
    shownUnit,
    kind: of.of === "temperature" ? "temperature" : "ratio",
    inputs: [lengthInput(name, `${of.by} height above mean sea level`, isGeometric ? "z" : "H", [lowestStandardHeight, isGeometric ? 32161 : top3])],
    constants: [],
    formula: {
      key: "standard",
      label: "standard atmosphere",
      source: { text: "ISO 2533:1975; ICAO Doc 7488/3 (1993); U.S. Standard Atmosphere 1976, Eqs. 23, 33a, 33b", status: "verified" },
      validity: "−2 to 32 km, geopotential",
      knownError: "R 287.05 for 287.05287: 0.03 % of the pressure"
    },
    ask: of.ask,
    value: value23,
    working(inputs2, _constants, result2) {
      const height2 = heightOf3(inputs2), air = standardAtmosphere(height2);
      const steps2 = [];
      if (isGeometric) steps2.push(worked("Geopotential height", "H = \\frac{a\\,z}{a + z}", `H = \\frac{${texNumber(earthRadius, 7)} \\cdot ${texFactor(numberOf(inputs2, name), 6)}}{${texNumber(earthRadius, 7)} + ${texFactor(numberOf(inputs2, name), 6)}}`, height2, "m", void 0, 7));
      steps2.push(...temperatureSteps(height2, air));
      if (of.of !== "temperature") steps2.push(pressureStep(height2, air));
      if (of.of === "density") steps2.push(worked("Density by the equation of state, with the standard’s R", "\\rho = \\frac{p}{R\\,T}", `\\rho = \\frac{${texNumber(air.pressure, 7)}}{${texNumber(gasConstant2, 8)} \\cdot ${texNumber(air.temperature, 6)}}`, result2, unit));
      return of.of === "temperature" ? steps2.map((step, at) => at < steps2.length - 1 ? step : { ...step, filled: `${step.filled} = ${texQuantity(result2 - zeroCelsius, "Cel")}` }) : steps2;
    },
    slips: slipsOf(of, name, value23, heightOf3),
    example: of.example
  });
}
function temperatureSteps(height2, air) {
  if (height2 <= tropopause) return [worked("Temperature: 6.5 K less for each geopotential kilometer", "T = T_0 - 0.0065\\,H", `T = ${texNumber(groundTemperature, 6)} - 0.0065 \\cdot ${texFactor(height2, 7)}`, air.temperature, "K")];
  if (height2 <= 2e4) return [worked("Temperature: constant from 11 to 20 km", "T", "T", air.temperature, "K")];
  return [worked("Temperature: 1 K more for each geopotential kilometer above 20 km", "T = 216.65 + 0.001\\,(H - 20\\,000)", `T = 216.65 + 0.001 \\cdot (${texNumber(height2, 7)} - 20\\,000)`, air.temperature, "K")];
}
function pressureStep(height2, air) {
  const shown3 = { value: air.pressure / 100, unit: "hPa" };
  if (height2 <= tropopause) {
    return worked("Pressure, hydrostatic with a constant lapse rate", "p = p_0 \\left(\\frac{T}{T_0}\\right)^{g_0/(0.0065\\,R)}", `p = 1013.25 \\left(\\frac{${texNumber(air.temperature, 6)}}{${texNumber(groundTemperature, 6)}}\\right)^{${texNumber(gravity2 / (gasConstant2 * 65e-4), 6)}}`, air.pressure, "Pa", shown3);
  }
  const base = standardAtmosphere(meter(height2 <= 2e4 ? tropopause : 2e4));
  if (height2 <= 2e4) {
    return worked("Pressure, hydrostatic and isothermal above 11 km", "p = p_{11} \\exp\\frac{-g_0\\,(H - 11\\,000)}{R\\,T}", `p = ${texNumber(base.pressure / 100, 6)} \\exp\\frac{-${texNumber(gravity2, 6)} \\cdot (${texNumber(height2, 7)} - 11\\,000)}{${texNumber(gasConstant2, 8)} \\cdot 216.65}`, air.pressure, "Pa", shown3);
  }
  return worked("Pressure, hydrostatic with a constant lapse rate above 20 km", "p = p_{20} \\left(\\frac{216.65}{T}\\right)^{g_0/(0.001\\,R)}", `p = ${texNumber(base.pressure / 100, 6)} \\left(\\frac{216.65}{${texNumber(air.temperature, 6)}}\\right)^{${texNumber(gravity2 / (gasConstant2 * 1e-3), 6)}}`, air.pressure, "Pa", shown3);
}
function slipsOf(of, name, value23, heightOf3) {
  const { of: what } = of;
  const slips = [feetSlip(value23, name)];
  if (what === "temperature") {
    slips.push(
      slip("sign", "warmed where it cools", "The standard atmosphere is colder aloft: your value goes the other way.", (_i, _c, right) => 2 * groundTemperature - right),
      slip("dry-adiabat", "9.8 K km⁻¹ for 6.5", "This comes from the dry adiabatic lapse rate: the standard atmosphere has 6.5 K km⁻¹.", (inputs2) => groundTemperature - 98e-4 * heightOf3(inputs2)),
      slip("no-tropopause", "6.5 K km⁻¹ beyond 11 km", "This goes on with 6.5 K km⁻¹ above 11 km, where the temperature of the standard atmosphere stays.", (inputs2) => heightOf3(inputs2) > tropopause ? groundTemperature - 65e-4 * heightOf3(inputs2) : null),
      endUnitSlip("Cel")
    );
    return slips;
  }
  const isothermal = (inputs2, temperature6) => groundPressure2 * exp(-gravity2 * heightOf3(inputs2) / (gasConstant2 * temperature6)) / (what === "density" ? gasConstant2 * standardAtmosphere(meter(heightOf3(inputs2))).temperature : 1);
  slips.push(
    slip("isothermal", "one temperature throughout", "This takes 288.15 K all the way up: the standard atmosphere is colder aloft.", (inputs2) => isothermal(inputs2, groundTemperature)),
    slip("local-temperature", "temperature of the level for the mean", "This takes the temperature at the level for the whole way to it.", (inputs2) => isothermal(inputs2, standardAtmosphere(meter(heightOf3(inputs2))).temperature))
  );
  if (what === "pressure") {
    slips.push(
      slip("from-1000", "1000 hPa at sea level", "This starts from 1000 hPa: the standard atmosphere has 1013.25 hPa at sea level.", (_i, _c, right) => right * 1e5 / groundPressure2),
      slip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", (_i, _c, right) => right * 100)
    );
  } else {
    slips.push(
      slip("ground-temperature", "temperature of the ground", "This puts the temperature of the ground into the equation of state.", (inputs2, _c, right) => right * standardAtmosphere(meter(heightOf3(inputs2))).temperature / groundTemperature),
      slip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the pressure in hPa.", (_i, _c, right) => right / 100)
    );
  }
  if (of.by === "geometric") slips.push(fineSlip("geometric-for-geopotential", "geometric height taken as geopotential", "This takes the geometric height for the geopotential one.", (inputs2) => numberOf(inputs2, name) > top3 ? null : standardAtmosphere(meter(numberOf(inputs2, name)))[what]));
  return slips;
}

// shared/thermo/quantities/standardAtmosphereDensity.ts
var standardAtmosphereDensityDefinition = standardAtmosphereQuantity({
  key: "standard-atmosphere-density",
  name: "density of the standard atmosphere",
  symbol: "ρ",
  of: "density",
  by: "geopotential",
  ask: "The density ρ of the standard atmosphere at the geopotential height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.",
  example: { inputs: { geopotentialHeight: 5e3 }, gives: 0.736116, within: 1e-6 }
});

// shared/thermo/quantities/standardAtmosphereDensityAtGeometricHeight.ts
var standardAtmosphereDensityAtGeometricHeightDefinition = standardAtmosphereQuantity({
  key: "standard-atmosphere-density-at-geometric-height",
  name: "density of the standard atmosphere at a geometric height",
  symbol: "ρ",
  of: "density",
  by: "geometric",
  ask: "The density ρ of the standard atmosphere at the geometric height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.",
  example: { inputs: { geometricHeight: 5e3 }, gives: 0.736429, within: 1e-6 }
});

// shared/thermo/quantities/standardAtmospherePressure.ts
var standardAtmospherePressureDefinition = standardAtmosphereQuantity({
  key: "standard-atmosphere-pressure",
  name: "pressure of the standard atmosphere",
  symbol: "p",
  of: "pressure",
  by: "geopotential",
  ask: "The pressure p of the standard atmosphere at the geopotential height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.",
  example: { inputs: { geopotentialHeight: 5e3 }, gives: 54019.89, within: 0.05 }
});

// shared/thermo/quantities/standardAtmospherePressureAtGeometricHeight.ts
var standardAtmospherePressureAtGeometricHeightDefinition = standardAtmosphereQuantity({
  key: "standard-atmosphere-pressure-at-geometric-height",
  name: "pressure of the standard atmosphere at a geometric height",
  symbol: "p",
  of: "pressure",
  by: "geometric",
  ask: "The pressure p of the standard atmosphere at the geometric height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.",
  example: { inputs: { geometricHeight: 5e3 }, gives: 54048.26, within: 0.05 }
});

// shared/thermo/quantities/standardAtmosphereTemperature.ts
var standardAtmosphereTemperatureDefinition = standardAtmosphereQuantity({
  key: "standard-atmosphere-temperature",
  name: "temperature of the standard atmosphere",
  symbol: "T",
  of: "temperature",
  by: "geopotential",
  ask: "The temperature T of the standard atmosphere at the geopotential height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.",
  example: { inputs: { geopotentialHeight: 5e3 }, gives: 255.65, within: 1e-4 }
});

// shared/thermo/quantities/standardAtmosphereTemperatureAtGeometricHeight.ts
var standardAtmosphereTemperatureAtGeometricHeightDefinition = standardAtmosphereQuantity({
  key: "standard-atmosphere-temperature-at-geometric-height",
  name: "temperature of the standard atmosphere at a geometric height",
  symbol: "T",
  of: "temperature",
  by: "geometric",
  ask: "The temperature T of the standard atmosphere at the geometric height above mean sea level, 6.5 K colder for each geopotential kilometer up to 11 km.",
  example: { inputs: { geometricHeight: 5e3 }, gives: 255.6755, within: 1e-4 }
});

// shared/thermo/quantities/stationPressure.ts
var stationPressureDefinition = seaLevelReduction({
  key: "station-pressure",
  name: "station pressure from the pressure at sea level, 6.5 K km⁻¹",
  symbol: "p_s",
  to: "station",
  mean: "standard lapse rate",
  ask: "The pressure p_s at the station from the pressure reduced to mean sea level, through fictitious air that warms downwards at 6.5 K km⁻¹ from the station’s temperature, with its mean temperature half way.",
  example: { inputs: { seaLevelPressure: 101325, stationHeight: 320, stationTemperature: 283.15 }, gives: 97499.27, within: 0.01 }
});

// shared/thermo/quantities/stationPressureIsothermal.ts
var stationPressureIsothermalDefinition = seaLevelReduction({
  key: "station-pressure-isothermal",
  name: "station pressure from the pressure at sea level, isothermal",
  symbol: "p_s",
  to: "station",
  mean: "isothermal",
  ask: "The pressure p_s at the station from the pressure reduced to mean sea level, through fictitious air of the station’s temperature throughout (isothermal).",
  example: { inputs: { seaLevelPressure: 101325, stationHeight: 320, stationTemperature: 283.15 }, gives: 97485.49, within: 0.01 }
});

// shared/thermo/quantities/geopotential.ts
var z3 = (inputs2) => numberOf(inputs2, "geometricHeight");
var heightOf = (inputs2, constants) => geopotentialOfGeometric(meter(z3(inputs2)), constant(constants, "earthRadius"));
var value20 = (inputs2, constants) => constant(constants, "g") * heightOf(inputs2, constants);
var geopotentialDefinition = oneFormula({
  key: "geopotential",
  name: "geopotential of a geometric height",
  symbol: "Φ",
  unit: "J/kg",
  shownUnit: "kJ/kg",
  kind: "difference",
  nearZero: 100,
  inputs: [lengthInput("geometricHeight", "geometric height above mean sea level", "z", [-500, 1e5])],
  constants: ["earthRadius", "g"],
  formula: {
    key: "inverse-square",
    label: "g a z/(a + z)",
    source: { text: "U.S. Standard Atmosphere 1976, Eqs. 14 to 18", status: "from memory" },
    validity: "gravity that falls by the square of the distance from the earth’s center",
    knownError: "g 9.80665 or 9.81: 0.03 %; radius 6356.766 or 6371 km: 0.04 m at 10 km"
  },
  ask: "The geopotential Φ of the geometric height z above mean sea level, with gravity that falls by the square of the distance from the earth’s center.",
  value: value20,
  working: (inputs2, constants, result2) => [
    worked("Geopotential height: gravity falls by the square of the distance from the earth’s center", "H = \\frac{a\\,z}{a + z}", `H = \\frac{${texNumber(constant(constants, "earthRadius"), 7)} \\cdot ${texFactor(z3(inputs2), 7)}}{${texNumber(constant(constants, "earthRadius"), 7)} + ${texFactor(z3(inputs2), 7)}}`, heightOf(inputs2, constants), "m", void 0, 7),
    worked("Geopotential", "\\Phi = g\\,H", `\\Phi = ${texNumber(constant(constants, "g"), 6)} \\cdot ${texFactor(heightOf(inputs2, constants), 7)}`, result2, "J/kg", { value: result2 / 1e3, unit: "kJ/kg" }, 6)
  ],
  slips: [
    fineSlip("constant-gravity", "gravity taken for constant", "This is g z, with gravity taken for constant: it falls with height.", (inputs2, constants) => constant(constants, "g") * z3(inputs2)),
    slip("height", "the geopotential height itself", "This is the geopotential height: multiply it by g.", (_i, constants, right) => right / constant(constants, "g")),
    joulesSlip,
    kilojoulesSlip,
    feetSlip(value20, "geometricHeight")
  ],
  example: { inputs: { geometricHeight: 1e4 }, gives: 97945.91, within: 0.01 }
});

// shared/thermo/groups/hydrostatics.ts
var hydrostatics = {
  key: "hydrostatics",
  title: "Hydrostatics",
  quantities: [
    hypsometricThicknessDefinition,
    hypsometricThicknessOfLevelsDefinition,
    layerMeanTemperatureDefinition,
    layerMeanVirtualTemperatureDefinition,
    pressureAtHeightDefinition,
    hypsometricHeightAboveLaunchDefinition,
    pressureAltitudeDefinition,
    seaLevelPressureDefinition,
    seaLevelPressureIsothermalDefinition,
    stationPressureDefinition,
    stationPressureIsothermalDefinition,
    scaleHeightDefinition,
    autoconvectiveLapseRateDefinition,
    geopotentialHeightDefinition,
    geometricHeightDefinition,
    geopotentialDefinition,
    standardAtmosphereTemperatureDefinition,
    standardAtmospherePressureDefinition,
    standardAtmosphereDensityDefinition,
    standardAtmosphereTemperatureAtGeometricHeightDefinition,
    standardAtmospherePressureAtGeometricHeightDefinition,
    standardAtmosphereDensityAtGeometricHeightDefinition
  ]
};

// shared/numerics/angles.ts
var bits = 1200n;
function arctanOfInverse(n) {
  let power2 = (1n << bits + 32n) / n;
  let sum = power2;
  for (let k = 3n, sign = -1n; power2 !== 0n; k += 2n, sign = -sign) {
    power2 /= n * n;
    sum += sign * (power2 / k);
  }
  return sum;
}
var piScaled = 16n * arctanOfInverse(5n) - 4n * arctanOfInverse(239n) >> 32n;
var halfPiScaled = piScaled >> 1n;
function takeLeading(scaledValue, length2) {
  const shift2 = Math.max(0, scaledValue.toString(2).length - length2);
  const top4 = scaledValue >> BigInt(shift2);
  return { part: timesTwoTo(Number(top4), shift2 - Number(bits)), rest: scaledValue - (top4 << BigInt(shift2)) };
}
function timesTwoTo(value23, exponent2) {
  let x = value23;
  for (let n = exponent2; n < 0; n++) x /= 2;
  for (let n = exponent2; n > 0; n--) x *= 2;
  return x;
}
var first = takeLeading(halfPiScaled, 33);
var second = takeLeading(first.rest, 33);
var third = takeLeading(second.rest, 33);
var fourth = takeLeading(third.rest, 53).part;
var perHalfPi = 1 / (first.part + second.part);
var halfPi = (() => {
  const hi = takeLeading(halfPiScaled, 53);
  return { hi: hi.part, lo: takeLeading(hi.rest, 53).part };
})();
var quadrant = 0;
var restHi = 0;
var restLo = 0;
function reduce(x) {
  if (Math.abs(x) > 8e5) return reduceExactly(x);
  const n = Math.round(x * perHalfPi);
  const a = x - n * first.part;
  const aLo = sumError(x, -n * first.part, a);
  const b = a - n * second.part;
  const bLo = sumError(a, -n * second.part, b);
  const c2 = b - n * third.part;
  const cLo = sumError(b, -n * third.part, c2);
  const rest = aLo + bLo + cLo - n * fourth;
  restHi = c2 + rest;
  restLo = rest - (restHi - c2);
  quadrant = (n % 4 + 4) % 4;
}
function reduceExactly(x) {
  let whole = Math.abs(x);
  let shift2 = 0n;
  while (whole >= 9007199254740992) {
    whole /= 2;
    shift2 += 1n;
  }
  while (Math.floor(whole) !== whole) {
    whole *= 2;
    shift2 -= 1n;
  }
  const value23 = BigInt(whole) << bits + shift2;
  let n = value23 / halfPiScaled;
  let rest = value23 - n * halfPiScaled;
  if (2n * rest > halfPiScaled) {
    n += 1n;
    rest -= halfPiScaled;
  }
  const negative = rest < 0n;
  const hi = takeLeading(negative ? -rest : rest, 53);
  const lo = takeLeading(hi.rest, 53).part;
  const sign = (negative ? -1 : 1) * (x < 0 ? -1 : 1);
  restHi = sign * hi.part;
  restLo = sign * lo;
  const turn = Number(n % 4n);
  quadrant = x < 0 ? (4 - turn) % 4 : turn;
}
var factorial = [1];
for (let n = 1; n <= 20; n++) factorial.push((factorial[n - 1] ?? 1) * n);
var per = (n) => 1 / (factorial[n] ?? 1);
var s = [3, 5, 7, 9, 11, 13, 15, 17, 19].map((n, at) => at % 2 === 0 ? -per(n) : per(n));
var c = [4, 6, 8, 10, 12, 14, 16, 18, 20].map((n, at) => at % 2 === 0 ? per(n) : -per(n));
function polynomial(coefficients, z4) {
  let sum = 0;
  for (let n = coefficients.length - 1; n >= 0; n--) sum = sum * z4 + (coefficients[n] ?? 0);
  return sum;
}
function sinOfRest() {
  const z4 = restHi * restHi;
  return restHi + (restHi * z4 * polynomial(s, z4) + restLo * (1 - 0.5 * z4));
}
function cosOfRest() {
  const z4 = restHi * restHi;
  const half = 0.5 * z4;
  const w2 = 1 - half;
  return w2 + (1 - w2 - half + (z4 * z4 * polynomial(c, z4) - restHi * restLo));
}
function sin(x) {
  if (!Number.isFinite(x)) return NaN;
  if (x === 0) return x;
  reduce(x);
  const value23 = quadrant % 2 === 0 ? sinOfRest() : cosOfRest();
  return quadrant < 2 ? value23 : -value23;
}
function cos(x) {
  if (!Number.isFinite(x)) return NaN;
  reduce(x);
  const value23 = quadrant % 2 === 0 ? cosOfRest() : sinOfRest();
  return quadrant === 0 || quadrant === 3 ? value23 : -value23;
}
var arcHi = new Float64Array(65);
var arcLo = new Float64Array(65);
{
  let arc = pair(0);
  for (let k = 1; k <= 64; k++) {
    const t = divide(pair(64), pair(4096 + k * (k - 1)));
    const square = multiply(t, t);
    let power2 = t;
    let sum = t;
    for (let n = 3; n < 40; n += 2) {
      power2 = multiply(multiply(power2, square), pair(-1));
      sum = add(sum, divide(power2, pair(n)));
    }
    arc = add(arc, sum);
    arcHi[k] = arc.hi;
    arcLo[k] = arc.lo;
  }
}
function arcInto(a, b) {
  const t = a / b;
  const product = t * b;
  const tLo = (a - product - productError(t, b, product)) / b;
  const k = Math.round(t * 64);
  const at = k / 64;
  const below = 1 + t * at;
  const u = (t - at + tLo) / below;
  const z4 = u * u;
  const series3 = u * z4 * (-1 / 3 + z4 * (1 / 5 + z4 * (-1 / 7 + z4 * (1 / 9 - z4 * (1 / 11)))));
  const uProduct = u * below;
  const belowLo = productError(t, at, t * at) + sumError(1, t * at, below);
  const uLo = (t - at - uProduct - productError(u, below, uProduct) + tLo - u * belowLo) / below;
  const base = arcHi[k] ?? 0;
  const sum = base + u;
  const rest = sumError(base, u, sum) + ((arcLo[k] ?? 0) + (series3 + uLo));
  restHi = sum + rest;
  restLo = rest - (restHi - sum);
}
function atan2(y, x) {
  if (x !== x || y !== y) return NaN;
  const isLeft = x < 0 || Object.is(x, -0);
  const sign = y < 0 || Object.is(y, -0) ? -1 : 1;
  let a = Math.abs(y);
  let b = Math.abs(x);
  if (a === Infinity || b === Infinity) {
    a = a === Infinity ? 1 : 0;
    b = b === Infinity ? 1 : 0;
  }
  if (a === 0) return sign * (isLeft ? 2 * halfPi.hi : 0);
  if (b === 0) return sign * halfPi.hi;
  const larger = Math.max(a, b);
  if (larger > 1e200) {
    a *= 8636168555094445e-93;
    b *= 8636168555094445e-93;
  } else if (larger < 1e-200) {
    a *= 1157920892373162e62;
    b *= 1157920892373162e62;
  }
  if (Math.min(a, b) / Math.max(a, b) < 1e-290) {
    const small = a < b && !isLeft ? a / b : 0;
    const straight = a < b ? isLeft ? 2 * halfPi.hi : small : halfPi.hi;
    return sign * straight;
  }
  let angle;
  if (a <= b) {
    arcInto(a, b);
    angle = { hi: restHi, lo: restLo };
  } else {
    arcInto(b, a);
    angle = add(halfPi, { hi: -restHi, lo: -restLo });
  }
  if (isLeft) angle = add({ hi: 2 * halfPi.hi, lo: 2 * halfPi.lo }, { hi: -angle.hi, lo: -angle.lo });
  return sign * angle.hi;
}

// shared/thermo/richardson.ts
var noShear = 1e-9;
function bulkRichardson(layer4, constants) {
  const shear2 = layer4.du * layer4.du + layer4.dv * layer4.dv;
  if (!(shear2 > noShear * noShear)) return null;
  return constant(constants, "g") / ((layer4.bottom + layer4.top) / 2) * (layer4.top - layer4.bottom) * layer4.depth / shear2;
}
function gradientRichardson(at, constants) {
  const shear2 = at.du * at.du + at.dv * at.dv;
  if (!(shear2 > 1e-18)) return null;
  return constant(constants, "g") / at.theta * at.gradient / shear2;
}
var windComponents = (speed2, direction2) => ({ u: -speed2 * sin(direction2), v: -speed2 * cos(direction2) });
var speedInput = (name, label, symbol) => ({ name, label, symbol, unit: "m/s", shownUnit: "m/s", kind: "difference", shape: "number", range: [0, 200] });
var directionInput = (name, label, symbol) => ({ name, label, symbol, unit: "rad", shownUnit: "deg", kind: "difference", shape: "number", range: [0, 6.283185307179587] });
var theta2 = (name, label, symbol) => ({ name, label, symbol, unit: "K", shownUnit: "K", kind: "temperature", shape: "number", range: [150, 800] });
var virtualThetaLayer = [
  theta2("virtualPotentialTemperatureBottom", "virtual potential temperature at the bottom", "θv₁"),
  theta2("virtualPotentialTemperatureTop", "virtual potential temperature at the top", "θv₂"),
  { name: "depth", label: "depth of the layer", symbol: "Δz", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [0.1, 5e4], trivialWithin: 0 }
];
function windDifference(inputs2) {
  const low = windComponents(numberOf(inputs2, "windSpeedBottom"), numberOf(inputs2, "windDirectionBottom"));
  const high2 = windComponents(numberOf(inputs2, "windSpeedTop"), numberOf(inputs2, "windDirectionTop"));
  return { du: high2.u - low.u, dv: high2.v - low.v };
}

// shared/thermo/wind.ts
var fullTurn = 6.283185307179586;
var noResultant = 1e-9;
var perDegree = fullTurn / 360;
var series = (input2) => ({ ...input2, shape: "series", needs: { least: 1, order: "none" } });
var windSpeedSeries = series({ name: "windSpeed", label: "wind speeds", symbol: "s", unit: "m/s", shownUnit: "m/s", kind: "difference", range: [0, 200] });
var windDirectionSeries = series({ name: "windDirection", label: "wind directions", symbol: "d", unit: "rad", shownUnit: "deg", kind: "difference", range: [0, 6.283185307179587] });
function vectorMean(inputs2) {
  const speeds = seriesOf(inputs2, "windSpeed"), directions = seriesOf(inputs2, "windDirection");
  const parts = speeds.map((speed2, at) => windComponents(speed2, directions[at] ?? 0));
  const u = mean(parts.map((part) => part.u)), v = mean(parts.map((part) => part.v));
  return { u, v, speed: Math.sqrt(u * u + v * v) };
}
function directionOf(u, v, scale) {
  if (!(Math.sqrt(u * u + v * v) > noResultant * scale)) return null;
  const angle = atan2(-u, -v);
  return angle > 1e-12 ? angle : angle < -1e-12 ? angle + fullTurn : fullTurn;
}
function meanDirection(inputs2) {
  const speeds = "windSpeed" in inputs2 ? seriesOf(inputs2, "windSpeed") : null;
  const blowing = seriesOf(inputs2, "windDirection").filter((_direction, at) => speeds === null || (speeds[at] ?? 0) > 0);
  if (blowing.length === 0) return { direction: null, resultant: 0, count: 0 };
  const east = mean(blowing.map(sin)), north = mean(blowing.map(cos));
  return { direction: directionOf(-east, -north, 1), resultant: Math.sqrt(east * east + north * north), count: blowing.length };
}

// shared/thermo/windDefinition.ts
function windComponentDefinition(part) {
  const isEastward = part === "u";
  const towards = isEastward ? "eastward" : "northward", own = isEastward ? sin : cos, other2 = isEastward ? cos : sin;
  const functionTex = isEastward ? "\\sin" : "\\cos";
  return {
    key: `${towards}-wind`,
    name: `${towards} component of the wind`,
    symbol: part,
    unit: "m/s",
    shownUnit: "m/s",
    kind: "difference",
    nearZero: 0.1,
    inputs: [speedInput("windSpeed", "wind speed", "s"), directionInput("windDirection", "wind direction, where the wind comes from", "d")],
    variants: [{
      key: "meteorological",
      label: "direction that the wind comes from",
      source: { text: 'AMS Glossary of Meteorology, "wind direction"', status: "verified" },
      validity: "any wind",
      knownError: "none: the two readings alone decide",
      evaluate: (inputs2) => ({ is: "value", value: windComponents(numberOf(inputs2, "windSpeed"), numberOf(inputs2, "windDirection"))[part] })
    }],
    constants: [],
    ask: `The ${towards} component ${part} of the wind, positive where the air moves ${isEastward ? "to the east" : "to the north"}; the direction is that from which the wind comes, clockwise from north.`,
    trace(inputs2) {
      const s2 = numberOf(inputs2, "windSpeed"), d = numberOf(inputs2, "windDirection"), value23 = windComponents(s2, d)[part];
      return [{ text: `${isEastward ? "Eastward" : "Northward"} component`, formula: `${part} = -s ${functionTex} d`, filled: `${part} = -${texNumber(s2)} ${functionTex} ${texNumber(d / perDegree)}^{\\circ}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value23, "m/s")}`, value: value23, unit: "m/s" }];
    },
    slips: [
      slip("sign", "sign turned round", "The direction is where the wind comes from: the air moves the other way.", (_i, _c, right) => -right),
      slip("sine-for-cosine", "sine and cosine swapped", `The angle counts from north: ${part} takes the ${isEastward ? "sine" : "cosine"}.`, (inputs2) => -numberOf(inputs2, "windSpeed") * other2(numberOf(inputs2, "windDirection"))),
      slip("swapped-and-turned", "angle counted from east", "The angle is counted from east, as in mathematics: here it counts clockwise from north.", (inputs2) => numberOf(inputs2, "windSpeed") * other2(numberOf(inputs2, "windDirection"))),
      slip("degrees-for-radians", "degrees taken for radians", "The degrees went into a function that takes radians.", (inputs2) => -numberOf(inputs2, "windSpeed") * own(numberOf(inputs2, "windDirection") / perDegree))
    ],
    example: { inputs: { windSpeed: 10, windDirection: 4.71238898038469 }, gives: isEastward ? 10 : 0, within: 1e-9 }
  };
}

// shared/thermo/quantities/eastwardWind.ts
var eastwardWindDefinition = windComponentDefinition("u");

// shared/thermo/logProfile.ts
var heightInput = (name, label, symbol) => ({ name, label, symbol, unit: "m", shownUnit: "m", kind: "ratio", shape: "number", range: [0.01, 1e3] });
var windInput = (name, label, symbol) => ({ name, label, symbol, unit: "m/s", shownUnit: "m/s", kind: "ratio", shape: "number", range: [0.01, 200] });
var displacementInput = { name: "displacementHeight", label: "displacement height", symbol: "d", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [0, 100], isOptional: true };
var measurementHeightInput = heightInput("measurementHeight", "height above the ground", "z");
var roughnessInput = { name: "roughnessLength", label: "roughness length", symbol: "z_0", unit: "m", shownUnit: "m", kind: "ratio", shape: "number", range: [1e-6, 10], trivialWithin: 0 };
var frictionVelocityInput = { name: "frictionVelocity", label: "friction velocity", symbol: "u_*", unit: "m/s", shownUnit: "m/s", kind: "ratio", shape: "number", range: [0, 10], trivialWithin: 0 };
var twoHeightInputs = [
  heightInput("lowHeight", "lower height above the ground", "z_1"),
  windInput("lowSpeed", "wind speed at the lower height", "u_1"),
  heightInput("highHeight", "upper height above the ground", "z_2"),
  windInput("highSpeed", "wind speed at the upper height", "u_2"),
  displacementInput
];
var displacementOf = (inputs2) => "displacementHeight" in inputs2 ? numberOf(inputs2, "displacementHeight") : 0;
function twoHeightsOf(inputs2) {
  const d = displacementOf(inputs2), low = numberOf(inputs2, "lowHeight") - d, high2 = numberOf(inputs2, "highHeight") - d;
  if (!(low > 0)) throw new OutOfRangeError("lowHeight", numberOf(inputs2, "lowHeight"), `heights above the displacement height of ${d} m`);
  if (!(high2 > low)) throw new OutOfRangeError("highHeight", numberOf(inputs2, "highHeight"), "heights above the lower one");
  return { low, high: high2, lowSpeed: numberOf(inputs2, "lowSpeed"), highSpeed: numberOf(inputs2, "highSpeed") };
}
var logWind = (frictionVelocity2, height2, roughness, constants) => frictionVelocity2 / constant(constants, "vonKarman") * log(height2 / roughness);
var frictionVelocity = ({ low, high: high2, lowSpeed, highSpeed }, constants) => constant(constants, "vonKarman") * (highSpeed - lowSpeed) / log(high2 / low);
function roughnessLength({ low, high: high2, lowSpeed, highSpeed }) {
  return highSpeed > lowSpeed ? exp((highSpeed * log(low) - lowSpeed * log(high2)) / (highSpeed - lowSpeed)) : null;
}

// shared/thermo/quantities/frictionVelocity.ts
var frictionVelocityDefinition = {
  key: "friction-velocity",
  name: "friction velocity from the wind at two heights",
  symbol: "u_*",
  unit: "m/s",
  shownUnit: "m/s",
  kind: "difference",
  nearZero: 0.01,
  inputs: twoHeightInputs,
  variants: [{
    key: "neutral",
    label: "neutral logarithmic profile",
    source: { text: 'AMS Glossary of Meteorology, "logarithmic velocity profile", at two heights', status: "verified" },
    validity: "neutral air over even ground",
    knownError: "the von Kármán constant is taught as 0.40 or 0.41",
    evaluate: (inputs2, constants) => ({ is: "value", value: frictionVelocity(twoHeightsOf(inputs2), constants) })
  }],
  constants: ["vonKarman"],
  ask: "The friction velocity u_* = k (u₂ − u₁) / ln[(z₂ − d)/(z₁ − d)] from the wind at two heights; d is 0 where no displacement height is given.",
  trace(inputs2, constants) {
    const { low, high: high2, lowSpeed, highSpeed } = twoHeightsOf(inputs2), value23 = frictionVelocity(twoHeightsOf(inputs2), constants);
    return [{ text: "Friction velocity", formula: "u_* = \\frac{k (u_2 - u_1)}{\\ln (z_2 / z_1)}", filled: `u_* = \\frac{${texNumber(constant(constants, "vonKarman"))} \\times ${texFactor(highSpeed - lowSpeed)}}{\\ln (${texNumber(high2)} / ${texNumber(low)})}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value23, "m/s")}`, value: value23, unit: "m/s" }];
  },
  slips: [
    signSlip("The sign is turned round: one of the differences is taken upside down."),
    slip("base-ten", "log₁₀ for ln", "This takes the logarithm to base 10: the natural one is needed.", (inputs2, constants) => {
      const { low, high: high2, lowSpeed, highSpeed } = twoHeightsOf(inputs2);
      return constant(constants, "vonKarman") * (highSpeed - lowSpeed) / log10(high2 / low);
    }),
    slip("constant-left-out", "k left out", "The von Kármán constant is left out.", (_i, constants, right) => right / constant(constants, "vonKarman")),
    slip("constant-divided", "divided by k", "This divides by the von Kármán constant in place of multiplying.", (_i, constants, right) => right / constant(constants, "vonKarman") / constant(constants, "vonKarman")),
    slip("logarithm-left-out", "difference of heights for the logarithm", "This divides by the difference of the heights: the logarithm of their ratio is needed.", (inputs2, constants) => {
      const { low, high: high2, lowSpeed, highSpeed } = twoHeightsOf(inputs2);
      return constant(constants, "vonKarman") * (highSpeed - lowSpeed) / (high2 - low);
    })
  ],
  example: { inputs: { lowHeight: 2, lowSpeed: 3.2, highHeight: 10, highSpeed: 4.6 }, gives: 0.34795, within: 1e-5 }
};

// shared/thermo/sensorLag.ts
var timeConstantInput = { name: "timeConstant", label: "time constant of the sensor", symbol: "τ", unit: "s", shownUnit: "s", kind: "ratio", shape: "number", range: [0, 3600], trivialWithin: 0 };
var verticalSpeedInput = { name: "verticalSpeed", label: "vertical speed, positive on ascent", symbol: "w", unit: "m/s", shownUnit: "m/s", kind: "difference", shape: "number", range: [-50, 50] };
var stepResponse = (step) => step.air + (step.start - step.air) * exp(-step.elapsed / step.timeConstant);
function timeConstantOfStep(step) {
  const ratio2 = step.indicated === step.air ? 0 : (step.start - step.air) / (step.indicated - step.air);
  return ratio2 > 1 ? step.elapsed / log(ratio2) : null;
}
var steadyLagError = (ascent) => ascent.timeConstant * ascent.verticalSpeed * ascent.lapseRate;
var lagCorrected = (reading) => reading.indicated + reading.timeConstant * reading.rate;

// shared/thermo/quantities/lagCorrectedTemperature.ts
var lagCorrectedTemperatureDefinition = {
  key: "lag-corrected-temperature",
  name: "temperature corrected for a sensor’s lag",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [
    { name: "indicatedTemperature", label: "indicated temperature", symbol: "T_i", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] },
    { name: "indicatedRate", label: "rate of change of the indicated temperature in time", symbol: "dT_i/dt", unit: "K/s", shownUnit: "K/s", kind: "difference", shape: "number", range: [-10, 10] },
    timeConstantInput
  ],
  variants: [{
    key: "first-order",
    label: "first-order sensor",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant", status: "common practice" },
    validity: "a sensor with one time constant, on ascent and descent",
    knownError: "noise of the indication is enlarged by τ/Δt",
    evaluate: (inputs2) => ({ is: "value", value: lagCorrected(given(inputs2)) })
  }],
  constants: [],
  ask: "The air temperature T = T_i + τ dT_i/dt from the indication of a first-order sensor.",
  trace(inputs2) {
    const { indicated, rate: rate7, timeConstant } = given(inputs2), value23 = lagCorrected(given(inputs2));
    return [
      { text: "Correction", formula: "\\tau \\frac{dT_i}{dt}", filled: `${texNumber(timeConstant)}\\,\\mathrm{s} \\times ${texFactor(rate7)}\\,\\mathrm{K\\,s^{-1}} = ${texQuantity(timeConstant * rate7, "K")}`, value: timeConstant * rate7, unit: "K" },
      { text: "Air temperature", formula: "T = T_i + \\tau \\frac{dT_i}{dt}", filled: `T = ${texQuantity(indicated - zeroCelsius, "Cel")} + ${texFactor(timeConstant * rate7)}\\,\\mathrm{K} = ${texQuantity(value23 - zeroCelsius, "Cel")}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    slip("sign-of-correction", "correction with its sign turned", "The correction has its sign turned: a sensor that falls is still too warm.", (inputs2) => {
      const { indicated, rate: rate7, timeConstant } = given(inputs2);
      return indicated - timeConstant * rate7;
    }),
    slip("rate-alone", "rate without the time constant", "The rate has to be multiplied by the time constant.", (inputs2) => given(inputs2).indicated + given(inputs2).rate),
    slip("divided", "rate divided by the time constant", "The rate is divided by the time constant: multiply.", (inputs2) => {
      const { indicated, rate: rate7, timeConstant } = given(inputs2);
      return timeConstant > 0 ? indicated + rate7 / timeConstant : null;
    }),
    slip("per-minute", "rate per minute", "The rate went in per minute: per second is needed.", (inputs2) => {
      const { indicated, rate: rate7, timeConstant } = given(inputs2);
      return indicated + timeConstant * rate7 * 60;
    })
  ],
  example: { inputs: { indicatedTemperature: 285.55, indicatedRate: -0.03, timeConstant: 12 }, gives: 285.19, within: 1e-9 }
};
var given = (inputs2) => ({ indicated: numberOf(inputs2, "indicatedTemperature"), rate: numberOf(inputs2, "indicatedRate"), timeConstant: numberOf(inputs2, "timeConstant") });

// shared/thermo/quantities/lagCorrectedTemperatureInFlight.ts
var lagCorrectedTemperatureInFlightDefinition = {
  key: "lag-corrected-temperature-in-flight",
  name: "temperature corrected for a sensor’s lag on ascent or descent",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [
    { name: "indicatedTemperature", label: "indicated temperature", symbol: "T_i", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] },
    { name: "indicatedLapseRate", label: "lapse rate as indicated on this leg", symbol: "Γ_i", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] },
    verticalSpeedInput,
    timeConstantInput
  ],
  variants: [{
    key: "first-order",
    label: "first-order sensor, steady motion",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant", status: "common practice" },
    validity: "a sensor with one time constant",
    knownError: "the time constant depends on ventilation",
    evaluate: (inputs2) => ({ is: "value", value: corrected2(inputs2) })
  }],
  constants: [],
  ask: "The air temperature T = T_i − τ w Γ_i from the indication of a first-order sensor in flight, with the vertical speed w positive on ascent and the indicated lapse rate Γ_i positive where the indication falls with height.",
  trace(inputs2) {
    const { indicated, rate: rate7, timeConstant } = given2(inputs2), value23 = corrected2(inputs2);
    return [
      { text: "How fast the indication changes", formula: "\\frac{dT_i}{dt} = -w\\,\\Gamma_i", filled: `\\frac{dT_i}{dt} = ${texQuantity(rate7, "K/s")}`, value: rate7, unit: "K/s" },
      { text: "Air temperature", formula: "T = T_i + \\tau \\frac{dT_i}{dt}", filled: `T = ${texQuantity(indicated - zeroCelsius, "Cel")} + ${texNumber(timeConstant)} \\times ${texFactor(rate7)}\\,\\mathrm{K} = ${texQuantity(value23 - zeroCelsius, "Cel")}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    fineSlip("sign-of-correction", "correction with its sign turned", "The correction has its sign turned: on ascent through air that cools with height the sensor is too warm.", (inputs2) => {
      const { indicated, rate: rate7, timeConstant } = given2(inputs2);
      return indicated - timeConstant * rate7;
    }),
    fineSlip("speed-left-out", "vertical speed left out", "The vertical speed is left out.", (inputs2) => given2(inputs2).indicated - given2(inputs2).timeConstant * numberOf(inputs2, "indicatedLapseRate")),
    fineSlip("time-constant-left-out", "time constant left out", "The time constant is left out.", (inputs2) => given2(inputs2).indicated + given2(inputs2).rate),
    slip("per-kilometer", "K km⁻¹ in place of K m⁻¹", "The lapse rate went in in K per kilometer: per meter is needed.", (inputs2) => given2(inputs2).indicated + 1e3 * given2(inputs2).timeConstant * given2(inputs2).rate)
  ],
  example: { inputs: { indicatedTemperature: 285.55, indicatedLapseRate: 98e-4, verticalSpeed: 2, timeConstant: 12 }, gives: 285.3148, within: 1e-9 }
};
var given2 = (inputs2) => ({ indicated: numberOf(inputs2, "indicatedTemperature"), rate: -numberOf(inputs2, "verticalSpeed") * numberOf(inputs2, "indicatedLapseRate"), timeConstant: numberOf(inputs2, "timeConstant") });
var corrected2 = (inputs2) => lagCorrected(given2(inputs2));

// shared/thermo/quantities/logarithmicWindSpeed.ts
var logarithmicWindSpeedDefinition = {
  key: "logarithmic-wind-speed",
  name: "wind speed by the neutral logarithmic profile",
  symbol: "u",
  unit: "m/s",
  shownUnit: "m/s",
  kind: "ratio",
  nearZero: 0.1,
  inputs: [frictionVelocityInput, measurementHeightInput, roughnessInput, displacementInput],
  variants: [{
    key: "neutral",
    label: "neutral profile",
    source: { text: 'AMS Glossary of Meteorology, "logarithmic velocity profile"', status: "verified" },
    validity: "neutral air over even ground, the lowest tenth of the boundary layer",
    knownError: "the von Kármán constant is taught as 0.40 or 0.41",
    evaluate: (inputs2, constants) => ({ is: "value", value: speed(inputs2, constants) })
  }],
  constants: ["vonKarman"],
  ask: "The wind speed u = (u_*/k) ln[(z − d)/z₀] of the neutral logarithmic profile; d is 0 where no displacement height is given.",
  trace(inputs2, constants) {
    const height2 = heightOf2(inputs2), value23 = speed(inputs2, constants), k = constant(constants, "vonKarman");
    return [
      { text: "Height above the displacement height", formula: "z - d", filled: `z - d = ${texQuantity(height2, "m")}`, value: height2, unit: "m" },
      { text: "Wind speed", formula: "u = \\frac{u_*}{k} \\ln \\frac{z - d}{z_0}", filled: `u = \\frac{${texNumber(numberOf(inputs2, "frictionVelocity"))}}{${texNumber(k)}} \\ln \\frac{${texNumber(height2)}}{${texNumber(numberOf(inputs2, "roughnessLength"))}}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value23, "m/s")}`, value: value23, unit: "m/s" }
    ];
  },
  slips: [
    slip("base-ten", "log₁₀ for ln", "This takes the logarithm to base 10: the natural one is needed.", (inputs2, constants) => numberOf(inputs2, "frictionVelocity") / constant(constants, "vonKarman") * log10(heightOf2(inputs2) / numberOf(inputs2, "roughnessLength"))),
    slip("constant-left-out", "k left out", "The von Kármán constant is left out.", (_i, constants, right) => right * constant(constants, "vonKarman")),
    slip("constant-multiplied", "multiplied by k", "This multiplies by the von Kármán constant in place of dividing.", (_i, constants, right) => right * constant(constants, "vonKarman") * constant(constants, "vonKarman")),
    slip("ratio-inverted", "z₀/z for z/z₀", "The ratio is turned over: the sign of the result tells.", (_i, _c, right) => -right),
    slip("displacement-added", "d added", "The displacement height is added: it has to be taken off.", (inputs2, constants) => displacementOf(inputs2) > 0 ? logWind(numberOf(inputs2, "frictionVelocity"), numberOf(inputs2, "measurementHeight") + displacementOf(inputs2), numberOf(inputs2, "roughnessLength"), constants) : null),
    slip("displacement-left-out", "d left out", "The displacement height is left out.", (inputs2, constants) => displacementOf(inputs2) > 0 ? logWind(numberOf(inputs2, "frictionVelocity"), numberOf(inputs2, "measurementHeight"), numberOf(inputs2, "roughnessLength"), constants) : null)
  ],
  example: { inputs: { frictionVelocity: 0.35, measurementHeight: 10, roughnessLength: 0.03 }, gives: 5.083, within: 1e-4 }
};
function heightOf2(inputs2) {
  const height2 = numberOf(inputs2, "measurementHeight") - displacementOf(inputs2);
  if (!(height2 > numberOf(inputs2, "roughnessLength"))) throw new OutOfRangeError("measurementHeight", numberOf(inputs2, "measurementHeight"), "heights above the roughness length and the displacement height");
  return height2;
}
var speed = (inputs2, constants) => logWind(numberOf(inputs2, "frictionVelocity"), heightOf2(inputs2), numberOf(inputs2, "roughnessLength"), constants);

// shared/thermo/quantities/meanWindDirection.ts
var meanWindDirectionDefinition = {
  key: "mean-wind-direction",
  name: "mean wind direction by unit vectors",
  symbol: "d̄",
  unit: "rad",
  shownUnit: "deg",
  kind: "difference",
  isDirection: true,
  nearZero: 1.75,
  inputs: [windDirectionSeries, { ...windSpeedSeries, label: "wind speeds, to know the calm rows", isOptional: true }],
  variants: [{
    key: "unit-vectors",
    label: "unit vectors, calm rows left out",
    source: { text: "Mardia & Jupp (2000), Directional Statistics, section 2.2; WMO-No. 8, vol. I, ch. 5", status: "from memory" },
    validity: "directions that do not cancel",
    knownError: "none: the rows alone decide",
    evaluate(inputs2) {
      const { direction: direction2, resultant, count } = meanDirection(inputs2);
      if (direction2 === null) return { is: "not_defined", why: count === 0 ? "All rows are calm: calm air has no direction." : "The directions cancel: they have no mean." };
      return { is: "value", value: direction2, more: { resultant, count } };
    }
  }],
  constants: [],
  ask: 'The mean wind direction of your rows by unit vectors, clockwise from north, which is 360°; rows with a speed of 0 stay out; "not defined" where the directions cancel.',
  trace(inputs2) {
    const { direction: direction2, resultant, count } = meanDirection(inputs2);
    const first3 = { text: `Mean of ${count} unit vectors`, formula: "R = \\sqrt{\\overline{\\sin d}^2 + \\overline{\\cos d}^2}", filled: `R = ${texNumber(resultant)}` };
    if (direction2 === null) return [first3];
    return [first3, { text: "Its direction", formula: "\\bar d = \\mathrm{atan2}(\\overline{\\sin d}, \\overline{\\cos d})", filled: `\\bar d = ${texNumber(direction2 / perDegree)}^{\\circ}`, value: direction2, unit: "rad" }];
  },
  slips: [
    fineSlip("plain-mean", "plain mean of the angles", "This is the plain mean of the angles: 350° and 10° have a mean of 360°, not 180°.", (inputs2) => mean(seriesOf(inputs2, "windDirection"))),
    fineSlip("opposite", "direction that it blows to", "This is half a turn away: where the wind blows to.", (_i, _c, right) => right > fullTurn / 2 ? right - fullTurn / 2 : right + fullTurn / 2),
    fineSlip("swapped-arguments", "arguments of the arctangent swapped", "The arguments of the arctangent are swapped.", (_i, _c, right) => {
      const turned2 = fullTurn / 4 - right;
      return turned2 > 0 ? turned2 : turned2 + fullTurn;
    })
  ],
  example: { inputs: { windDirection: [6.1086523819801535, 0.17453292519943295, 0.3490658503988659] }, gives: 0.117024, within: 1e-6 }
};

// shared/thermo/quantities/northwardWind.ts
var northwardWindDefinition = windComponentDefinition("v");

// shared/thermo/quantities/roughnessLength.ts
var roughnessLengthDefinition = {
  key: "roughness-length",
  name: "roughness length from the wind at two heights",
  symbol: "z_0",
  unit: "m",
  shownUnit: "m",
  kind: "ratio",
  nearZero: 1e-4,
  inputs: twoHeightInputs,
  variants: [{
    key: "neutral",
    label: "neutral logarithmic profile",
    source: { text: 'AMS Glossary of Meteorology, "logarithmic velocity profile", at two heights', status: "verified" },
    validity: "neutral air over even ground",
    knownError: "very sensitive to the two speeds",
    evaluate(inputs2) {
      const value23 = roughnessLength(twoHeightsOf(inputs2));
      return value23 === null ? { is: "not_defined", why: "The wind does not grow with height: no roughness length follows." } : { is: "value", value: value23 };
    }
  }],
  constants: [],
  ask: 'The roughness length z₀ from the wind at two heights by the neutral logarithmic profile; heights above the displacement height, which is 0 where none is given; "not defined" where the wind does not grow with height.',
  trace(inputs2) {
    const { low, high: high2, lowSpeed, highSpeed } = twoHeightsOf(inputs2), value23 = roughnessLength(twoHeightsOf(inputs2));
    if (value23 === null) return [{ text: "The wind does not grow with height", formula: "u_2 \\le u_1", filled: `${texNumber(highSpeed)} \\le ${texNumber(lowSpeed)}` }];
    const logarithm = (highSpeed * log(low) - lowSpeed * log(high2)) / (highSpeed - lowSpeed);
    return [
      { text: "Height at which the profile comes to 0, as a logarithm", formula: "\\ln z_0 = \\frac{u_2 \\ln z_1 - u_1 \\ln z_2}{u_2 - u_1}", filled: `\\ln z_0 = \\frac{${texNumber(highSpeed)} \\ln ${texNumber(low)} - ${texNumber(lowSpeed)} \\ln ${texNumber(high2)}}{${texNumber(highSpeed - lowSpeed)}} = ${texNumber(logarithm)}` },
      { text: "Roughness length", formula: "z_0 = e^{\\ln z_0}", filled: `z_0 = ${texQuantity(value23, "m")}`, value: value23, unit: "m" }
    ];
  },
  slips: [
    slip("speeds-swapped", "speeds swapped", "The two speeds are swapped.", (inputs2) => {
      const { low, high: high2, lowSpeed, highSpeed } = twoHeightsOf(inputs2);
      return exp((highSpeed * log(high2) - lowSpeed * log(low)) / (highSpeed - lowSpeed));
    }),
    slip("logarithm", "ln z₀ for z₀", "This is ln z₀: take its exponential.", (_i, _c, right) => log(right)),
    slip("powers-of-ten", "power of 10 of a natural logarithm", "This mixes natural logarithms and powers of 10.", (_i, _c, right) => exp(2.302585092994046 * log(right))),
    slip("linear", "straight line in height", "This lets the wind grow in proportion to height: it grows with its logarithm.", (inputs2) => {
      const { low, high: high2, lowSpeed, highSpeed } = twoHeightsOf(inputs2);
      return low - lowSpeed * (high2 - low) / (highSpeed - lowSpeed);
    }),
    fineSlip("in-centimeters", "cm given as m", "Your number is in centimeters; the unit beside it says meters.", (_i, _c, right) => right * 100)
  ],
  example: { inputs: { lowHeight: 2, lowSpeed: 3.2, highHeight: 10, highSpeed: 4.6 }, gives: 0.050511, within: 1e-5 }
};

// shared/thermo/quantities/scalarMeanWindSpeed.ts
var scalarMeanWindSpeedDefinition = {
  key: "scalar-mean-wind-speed",
  name: "scalar mean wind speed",
  symbol: "s̄",
  unit: "m/s",
  shownUnit: "m/s",
  kind: "ratio",
  nearZero: 0.1,
  inputs: [windSpeedSeries, { ...windDirectionSeries, isOptional: true, isForSlips: true }],
  variants: [{
    key: "scalar",
    label: "mean of the speeds",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5", status: "common practice" },
    validity: "any rows",
    knownError: "none: the rows alone decide",
    evaluate: (inputs2) => ({ is: "value", value: mean(seriesOf(inputs2, "windSpeed")) })
  }],
  constants: [],
  ask: "The scalar mean of the wind speeds of your rows, whatever their directions; calm rows count with 0.",
  trace(inputs2) {
    const speeds = seriesOf(inputs2, "windSpeed"), value23 = mean(speeds);
    return [{ text: "Mean of the speeds", formula: "\\bar s = \\frac{\\sum s}{n}", filled: `\\bar s = \\frac{${texNumber(value23 * speeds.length)}}{${speeds.length}}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value23, "m/s")}`, value: value23, unit: "m/s" }];
  },
  slips: [
    fineSlip("vector-mean", "vector mean in place of the scalar one", "This is the size of the mean vector: the ask takes the mean of the speeds.", (inputs2) => "windDirection" in inputs2 ? vectorMean(inputs2).speed : null),
    fineSlip("root-mean-square", "root of the mean square", "This is the root of the mean square.", (inputs2) => {
      const speeds = seriesOf(inputs2, "windSpeed");
      return Math.sqrt(mean(speeds.map((speed2) => speed2 * speed2)));
    }),
    fineSlip("calms-left-out", "calm rows left out", "Calm rows are left out: they count with 0.", (inputs2) => {
      const blowing = seriesOf(inputs2, "windSpeed").filter((speed2) => speed2 > 0);
      return blowing.length > 0 ? mean(blowing) : null;
    })
  ],
  example: { inputs: { windSpeed: [5, 5], windDirection: [6.283185307179586, 1.5707963267948966] }, gives: 5, within: 1e-12 }
};

// shared/thermo/quantities/sensorLagError.ts
var sensorLagErrorDefinition = {
  key: "sensor-lag-error",
  name: "lag error of a sensor in steady ascent or descent",
  symbol: "T_i − T",
  unit: "K",
  shownUnit: "K",
  kind: "difference",
  nearZero: 0.01,
  inputs: [
    timeConstantInput,
    verticalSpeedInput,
    { name: "lapseRate", label: "lapse rate of the layer", symbol: "Γ", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] }
  ],
  variants: [{
    key: "steady",
    label: "first-order sensor, steady motion, start forgotten",
    source: { text: "closed form: first-order sensor in a layer of one lapse rate; WMO-No. 8, vol. I, ch. 1", status: "verified" },
    validity: "after about five time constants in a layer of one lapse rate",
    knownError: "the time constant depends on ventilation",
    evaluate: (inputs2) => ({ is: "value", value: error(inputs2) })
  }],
  constants: [],
  ask: "The error T_i − T of a first-order sensor that moves steadily through the layer, once its start is forgotten: indicated less true, vertical speed positive on ascent.",
  trace(inputs2) {
    const { timeConstant, verticalSpeed, lapseRate } = given3(inputs2), value23 = error(inputs2);
    return [
      { text: "How fast the air’s temperature falls for the sensor", formula: "-\\frac{dT}{dt} = w\\,\\Gamma", filled: `w\\,\\Gamma = ${texFactor(verticalSpeed)} \\times ${texFactor(lapseRate)}\\,\\mathrm{K\\,s^{-1}} = ${texQuantity(verticalSpeed * lapseRate, "K/s")}` },
      { text: "Error", formula: "T_i - T = \\tau\\,w\\,\\Gamma", filled: `T_i - T = ${texNumber(timeConstant)}\\,\\mathrm{s} \\times ${texFactor(verticalSpeed * lapseRate)}\\,\\mathrm{K\\,s^{-1}} = ${texQuantity(value23, "K")}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    signSlip("On ascent through air that cools with height the sensor is too warm: indicated less true is positive."),
    slip("speed-left-out", "vertical speed left out", "The vertical speed is left out.", (inputs2) => given3(inputs2).timeConstant * given3(inputs2).lapseRate),
    slip("time-constant-left-out", "time constant left out", "The time constant is left out.", (inputs2) => given3(inputs2).verticalSpeed * given3(inputs2).lapseRate),
    slip("per-kilometer", "K km⁻¹ in place of K m⁻¹", "The lapse rate went in in K per kilometer: per meter is needed.", (_i, _c, right) => right * 1e3),
    slip("feet-per-minute", "speed in feet per minute", "The vertical speed went in in feet per minute.", (_i, _c, right) => right * 60 / 0.3048)
  ],
  example: { inputs: { timeConstant: 10, verticalSpeed: 5, lapseRate: 65e-4 }, gives: 0.325, within: 1e-12 }
};
var given3 = (inputs2) => ({ timeConstant: numberOf(inputs2, "timeConstant"), verticalSpeed: numberOf(inputs2, "verticalSpeed"), lapseRate: numberOf(inputs2, "lapseRate") });
var error = (inputs2) => steadyLagError(given3(inputs2));

// shared/thermo/quantities/sensorLagHeightShift.ts
var sensorLagHeightShiftDefinition = {
  key: "sensor-lag-height-shift",
  name: "shift of a profile’s features by a sensor’s lag",
  symbol: "Δz",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 1,
  inputs: [timeConstantInput, verticalSpeedInput],
  variants: [{
    key: "steady",
    label: "delay of one time constant",
    source: { text: "closed form: first-order sensor behind a steady change; WMO-No. 8, vol. I, ch. 1", status: "verified" },
    validity: "features deeper than the shift",
    knownError: "sharp features are smeared as well as shifted",
    evaluate: (inputs2) => ({ is: "value", value: shift(inputs2) })
  }],
  constants: [],
  ask: "The height Δz by which the sensor’s lag shifts a feature of the profile, positive upwards; vertical speed positive on ascent.",
  trace(inputs2) {
    const value23 = shift(inputs2);
    return [{ text: "Delay times speed", formula: "\\Delta z = \\tau\\,w", filled: `\\Delta z = ${texNumber(numberOf(inputs2, "timeConstant"))}\\,\\mathrm{s} \\times ${texFactor(numberOf(inputs2, "verticalSpeed"))}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value23, "m")}`, value: value23, unit: "m" }];
  },
  slips: [
    signSlip("The sensor shows a feature late: higher up on ascent, lower down on descent."),
    slip("divided", "divided in place of multiplied", "This divides the speed by the time constant.", (inputs2) => numberOf(inputs2, "verticalSpeed") / numberOf(inputs2, "timeConstant")),
    slip("inverted", "τ/w for τ w", "This divides the time constant by the speed.", (inputs2) => numberOf(inputs2, "timeConstant") / numberOf(inputs2, "verticalSpeed")),
    slip("feet-for-meters", "feet for meters", "Your number is in feet; the unit beside it says meters.", (_i, _c, right) => right / 0.3048)
  ],
  example: { inputs: { timeConstant: 12, verticalSpeed: 2 }, gives: 24, within: 1e-12 }
};
var shift = (inputs2) => numberOf(inputs2, "timeConstant") * numberOf(inputs2, "verticalSpeed");

// shared/thermo/quantities/sensorStepResponse.ts
var sensorStepResponseDefinition = {
  key: "sensor-step-response",
  name: "indication of a first-order sensor after a step",
  symbol: "T_i",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [
    { name: "temperatureStart", label: "temperature of the sensor at the start", symbol: "T_0", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] },
    { name: "airTemperature", label: "air temperature after the step", symbol: "T_a", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] },
    { name: "elapsedTime", label: "time since the step", symbol: "t", unit: "s", shownUnit: "s", kind: "ratio", shape: "number", range: [0, 86400] },
    { ...timeConstantInput, range: [1e-3, 3600] }
  ],
  variants: [{
    key: "exponential",
    label: "first-order response",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant", status: "common practice" },
    validity: "a sensor with one time constant",
    knownError: "the time constant depends on ventilation",
    evaluate: (inputs2) => ({ is: "value", value: stepResponse(given4(inputs2)) })
  }],
  constants: [],
  ask: "The temperature T_i that a first-order sensor shows at the given time after it was brought into air of another temperature.",
  trace(inputs2) {
    const { start: start5, air, elapsed, timeConstant } = given4(inputs2), rest = exp(-elapsed / timeConstant), value23 = stepResponse(given4(inputs2));
    return [
      { text: "Part of the step that is left", formula: "e^{-t/\\tau}", filled: `e^{-${texNumber(elapsed)}/${texNumber(timeConstant)}} = ${texNumber(rest)}`, value: rest, unit: "1" },
      { text: "Indication", formula: "T_i = T_a + (T_0 - T_a) e^{-t/\\tau}", filled: `T_i = ${texNumber(air, 6)} + ${texFactor(start5 - air)} \\times ${texNumber(rest)}\\,\\mathrm{K} = ${texQuantity(value23, "K", 6)} = ${texQuantity(value23 - zeroCelsius, "Cel")}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    slip("parts-swapped", "done part for the part left", "This takes e^(−t/τ) for the part of the step that is done: it is the part that is left.", (inputs2) => {
      const { start: start5, air, elapsed, timeConstant } = given4(inputs2);
      return start5 + (air - start5) * exp(-elapsed / timeConstant);
    }),
    slip("ratio-inverted", "τ/t for t/τ", "The exponent is t/τ, not τ/t.", (inputs2) => {
      const { start: start5, air, elapsed, timeConstant } = given4(inputs2);
      return elapsed > 0 ? air + (start5 - air) * exp(-timeConstant / elapsed) : null;
    }),
    slip("sign-of-exponent", "sign of the exponent", "The exponent has to be negative: the difference shrinks.", (inputs2) => {
      const { start: start5, air, elapsed, timeConstant } = given4(inputs2);
      return elapsed / timeConstant < 20 ? air + (start5 - air) * exp(elapsed / timeConstant) : null;
    }),
    slip("base-ten", "10 for e", "This takes powers of 10 in place of e.", (inputs2) => {
      const { start: start5, air, elapsed, timeConstant } = given4(inputs2);
      return air + (start5 - air) * exp(-2.302585092994046 * elapsed / timeConstant);
    }),
    slip("linear", "linear in time", "This takes the step as done in proportion to t/τ: the response is exponential.", (inputs2) => {
      const { start: start5, air, elapsed, timeConstant } = given4(inputs2);
      return elapsed < timeConstant ? start5 + (air - start5) * elapsed / timeConstant : null;
    })
  ],
  example: { inputs: { temperatureStart: 295.15, airTemperature: 288.15, elapsedTime: 30, timeConstant: 20 }, gives: 289.7119, within: 1e-4 }
};
var given4 = (inputs2) => ({ start: numberOf(inputs2, "temperatureStart"), air: numberOf(inputs2, "airTemperature"), elapsed: numberOf(inputs2, "elapsedTime"), timeConstant: numberOf(inputs2, "timeConstant") });

// shared/thermo/quantities/sensorTimeConstant.ts
var sensorTimeConstantDefinition = {
  key: "sensor-time-constant",
  name: "time constant of a sensor from its step response",
  symbol: "τ",
  unit: "s",
  shownUnit: "s",
  kind: "ratio",
  nearZero: 0.1,
  inputs: [
    { name: "temperatureStart", label: "temperature of the sensor at the start", symbol: "T_0", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] },
    { name: "airTemperature", label: "air temperature after the step", symbol: "T_a", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] },
    { name: "elapsedTime", label: "time since the step", symbol: "t", unit: "s", shownUnit: "s", kind: "ratio", shape: "number", range: [1e-3, 86400] },
    { name: "indicatedTemperature", label: "temperature that the sensor shows then", symbol: "T_i", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [100, 400] }
  ],
  variants: [{
    key: "exponential",
    label: "first-order response",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 1, time constant", status: "common practice" },
    validity: "a sensor with one time constant",
    knownError: "grows where the indication has nearly arrived",
    evaluate(inputs2) {
      const value23 = timeConstantOfStep(given5(inputs2));
      return value23 === null ? { is: "not_defined", why: "The indication has not come closer to the air, or has passed it." } : { is: "value", value: value23 };
    }
  }],
  constants: [],
  ask: 'The time constant τ of the first-order sensor from what it shows at the given time after the step; "not defined" where it has not come closer to the air.',
  trace(inputs2) {
    const { start: start5, air, elapsed, indicated } = given5(inputs2), value23 = timeConstantOfStep(given5(inputs2));
    const first3 = { text: "Step, and what is left of it", formula: "T_0 - T_a;\\quad T_i - T_a", filled: `${texQuantity(start5 - air, "K")};\\quad ${texQuantity(indicated - air, "K")}` };
    if (value23 === null) return [first3];
    return [first3, { text: "Time constant", formula: "\\tau = \\frac{t}{\\ln \\frac{T_0 - T_a}{T_i - T_a}}", filled: `\\tau = \\frac{${texNumber(elapsed)}\\,\\mathrm{s}}{\\ln (${texFactor(start5 - air)} / ${texFactor(indicated - air)})} = ${texQuantity(value23, "s")}`, value: value23, unit: "s" }];
  },
  slips: [
    slip("base-ten", "log₁₀ for ln", "This takes the logarithm to base 10: the natural one is needed.", (_i, _c, right) => right * 2.302585092994046),
    slip("multiplied", "logarithm multiplied", "This multiplies by the logarithm in place of dividing.", (inputs2, _c, right) => numberOf(inputs2, "elapsedTime") * numberOf(inputs2, "elapsedTime") / right),
    slip("inverted", "1/τ for τ", "This is 1/τ.", (_i, _c, right) => 1 / right),
    slip("in-minutes", "minutes for seconds", "Your number is in minutes; the unit beside it says seconds.", (_i, _c, right) => right / 60)
  ],
  example: { inputs: { temperatureStart: 295.15, airTemperature: 288.15, elapsedTime: 30, indicatedTemperature: 289.7119 }, gives: 20, within: 1e-3 }
};
var given5 = (inputs2) => ({ start: numberOf(inputs2, "temperatureStart"), air: numberOf(inputs2, "airTemperature"), elapsed: numberOf(inputs2, "elapsedTime"), indicated: numberOf(inputs2, "indicatedTemperature") });

// shared/thermo/quantities/vectorMeanWindDirection.ts
var vectorMeanWindDirectionDefinition = {
  key: "vector-mean-wind-direction",
  name: "direction of the vector mean wind",
  symbol: "d_V",
  unit: "rad",
  shownUnit: "deg",
  kind: "difference",
  isDirection: true,
  nearZero: 1.75,
  inputs: [windSpeedSeries, windDirectionSeries],
  variants: [{
    key: "vectors",
    label: "mean of the components",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5", status: "common practice" },
    validity: "winds that do not cancel",
    knownError: "none: the rows alone decide",
    evaluate(inputs2) {
      const value23 = direction(inputs2);
      return value23 === null ? { is: "not_defined", why: "The winds cancel: the mean vector has no direction." } : { is: "value", value: value23 };
    }
  }],
  constants: [],
  ask: 'The direction from which the mean wind vector of your rows comes, clockwise from north, which is 360°; "not defined" where the winds cancel.',
  trace(inputs2) {
    const { u, v } = vectorMean(inputs2), value23 = direction(inputs2);
    const first3 = { text: "Mean components", formula: "\\bar u = -\\overline{s \\sin d},\\quad \\bar v = -\\overline{s \\cos d}", filled: `\\bar u = ${texNumber(u)},\\quad \\bar v = ${texNumber(v)}\\,\\mathrm{m\\,s^{-1}}` };
    if (value23 === null) return [first3];
    return [first3, { text: "Where it comes from", formula: "d = \\mathrm{atan2}(-\\bar u, -\\bar v)", filled: `d = \\mathrm{atan2}(${texFactor(-u)}, ${texFactor(-v)}) = ${texNumber(value23 / perDegree)}^{\\circ}`, value: value23, unit: "rad" }];
  },
  slips: [
    fineSlip("plain-mean", "plain mean of the angles", "This is the plain mean of the angles: directions are averaged by their vectors.", (inputs2) => mean(seriesOf(inputs2, "windDirection"))),
    fineSlip("unit-vectors", "speeds left out", "This gives every row the same weight: the vector mean weighs by speed.", (inputs2) => meanDirection(inputs2).direction),
    fineSlip("opposite", "direction that it blows to", "This is where the wind blows to: a direction is where it comes from.", (_i, _c, right) => right > fullTurn / 2 ? right - fullTurn / 2 : right + fullTurn / 2),
    fineSlip("swapped-arguments", "arguments of the arctangent swapped", "The arguments of the arctangent are swapped.", (inputs2) => {
      const { u, v, speed: speed2 } = vectorMean(inputs2);
      return directionOf(v, u, speed2);
    })
  ],
  example: { inputs: { windSpeed: [5, 5], windDirection: [6.283185307179586, 1.5707963267948966] }, gives: 0.7853981634, within: 1e-9 }
};
function direction(inputs2) {
  const { u, v } = vectorMean(inputs2);
  return directionOf(u, v, mean(seriesOf(inputs2, "windSpeed")));
}

// shared/thermo/quantities/vectorMeanWindSpeed.ts
var vectorMeanWindSpeedDefinition = {
  key: "vector-mean-wind-speed",
  name: "speed of the vector mean wind",
  symbol: "V̄",
  unit: "m/s",
  shownUnit: "m/s",
  kind: "ratio",
  nearZero: 0.1,
  inputs: [windSpeedSeries, windDirectionSeries],
  variants: [{
    key: "vectors",
    label: "mean of the components",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, vol. I, ch. 5", status: "common practice" },
    validity: "any rows",
    knownError: "none: the rows alone decide",
    evaluate: (inputs2) => ({ is: "value", value: vectorMean(inputs2).speed })
  }],
  constants: [],
  ask: "The speed of the mean wind vector of your rows: the means of the components u = −s sin d and v = −s cos d, and the size of the vector that they make.",
  trace(inputs2) {
    const { u, v, speed: speed2 } = vectorMean(inputs2);
    return [
      { text: "Mean components", formula: "\\bar u = -\\overline{s \\sin d},\\quad \\bar v = -\\overline{s \\cos d}", filled: `\\bar u = ${texQuantity(u, "m/s")},\\quad \\bar v = ${texQuantity(v, "m/s")}` },
      { text: "Size of the mean vector", formula: "\\bar V = \\sqrt{\\bar u^2 + \\bar v^2}", filled: `\\bar V = \\sqrt{${texFactor(u)}^2 + ${texFactor(v)}^2}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(speed2, "m/s")}`, value: speed2, unit: "m/s" }
    ];
  },
  slips: [
    fineSlip("scalar-mean", "scalar mean in place of the vector one", "This is the mean of the speeds: winds from different directions partly cancel.", (inputs2) => mean(seriesOf(inputs2, "windSpeed"))),
    fineSlip("components-added", "sizes of components added", "This adds the sizes of both mean components: add their squares and take the root.", (inputs2) => {
      const { u, v } = vectorMean(inputs2);
      return Math.abs(u) + Math.abs(v);
    }),
    fineSlip("sum-for-mean", "sum in place of the mean", "This is the size of the sum of the vectors: divide by their number.", (inputs2, _c, right) => right * seriesOf(inputs2, "windSpeed").length)
  ],
  example: { inputs: { windSpeed: [5, 5], windDirection: [6.283185307179586, 1.5707963267948966] }, gives: 3.5355339, within: 1e-7 }
};

// shared/thermo/groups/instruments.ts
var instruments = {
  key: "instruments",
  title: "Instruments and the surface layer",
  quantities: [
    sensorLagErrorDefinition,
    sensorLagHeightShiftDefinition,
    sensorStepResponseDefinition,
    sensorTimeConstantDefinition,
    lagCorrectedTemperatureDefinition,
    lagCorrectedTemperatureInFlightDefinition,
    logarithmicWindSpeedDefinition,
    frictionVelocityDefinition,
    roughnessLengthDefinition,
    eastwardWindDefinition,
    northwardWindDefinition,
    scalarMeanWindSpeedDefinition,
    vectorMeanWindSpeedDefinition,
    vectorMeanWindDirectionDefinition,
    meanWindDirectionDefinition
  ]
};

// shared/thermo/humidity.ts
var mixingRatioFrom = (vaporPressure, pressure4, epsilon) => epsilon * vaporPressure / (pressure4 - vaporPressure);
var vaporPressureFrom = (mixingRatio, pressure4, epsilon) => mixingRatio * pressure4 / (epsilon + mixingRatio);
var specificHumidityFrom = (mixingRatio) => mixingRatio / (1 + mixingRatio);
var mixingRatioOfSpecificHumidity = (specificHumidity) => specificHumidity / (1 - specificHumidity);
var virtualTemperatureFrom = (temperature6, mixingRatio, epsilon) => temperature6 * (1 + mixingRatio / epsilon) / (1 + mixingRatio);

// shared/numerics/rootFinding.ts
var BracketError = class extends Error {
  constructor(low, high2) {
    super(`no change of sign between ${low} and ${high2}`);
    this.low = low;
    this.high = high2;
  }
  low;
  high;
  name = "BracketError";
};
function findRoot(f, low, high2, tolerance = 1e-12) {
  let b = low, a = high2, c2 = high2;
  let fb = f(b), fa = f(a), fc = fa;
  if (fb === 0) return b;
  if (fa === 0) return a;
  if (!(fa > 0 && fb < 0) && !(fa < 0 && fb > 0)) throw new BracketError(low, high2);
  let t = 0.5;
  for (let n = 0; n < 100; n++) {
    const x = a + t * (b - a);
    const fx = f(x);
    if (fx !== fx) throw new BracketError(low, high2);
    if (fx > 0 === fa > 0) {
      c2 = a;
      fc = fa;
    } else {
      c2 = b;
      b = a;
      fc = fb;
      fb = fa;
    }
    a = x;
    fa = fx;
    const isFirstBest = Math.abs(fa) < Math.abs(fb);
    const best = isFirstBest ? a : b;
    const width = Math.abs(b - a);
    const limit = tolerance * Math.abs(best) + 1e-300;
    if (fa === 0 || width <= 2 * limit) return best;
    const xi = (a - b) / (c2 - b), phi = (fa - fb) / (fc - fb);
    const isSafe = phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi;
    const guess = isSafe ? fa / (fb - fa) * fc / (fb - fc) + (c2 - a) / (b - a) * fa / (fc - fa) * fb / (fc - fb) : 0.5;
    const edge = limit / width;
    t = Math.min(1 - edge, Math.max(edge, guess));
  }
  return Math.abs(fa) < Math.abs(fb) ? a : b;
}

// shared/thermo/latentHeat.ts
var zeroCelsius2 = 273.15;
var shown2 = (value23) => texQuantity(value23 / 1e3, "kJ/kg", 6);
var linearLatentHeat = (temperature6) => 2501e3 - 2370 * (temperature6 - zeroCelsius2);
function kirchhoffLatentHeat(temperature6, constants) {
  return constant(constants, "latentHeat") - (constant(constants, "cw") - constant(constants, "cpv")) * (temperature6 - zeroCelsius2);
}
function cubicLatentHeat(temperature6) {
  const t = temperature6 - zeroCelsius2;
  return 1e3 * (2500.8 - 2.36 * t + 16e-4 * t * t - 6e-5 * t * t * t);
}
function murphyKoopSublimation(temperature6) {
  const scaled2 = temperature6 / 123.75;
  return (46782.5 + 35.8925 * temperature6 - 0.07414 * temperature6 * temperature6 + 541.5 * exp(-scaled2 * scaled2)) / 0.018015;
}
function quadraticSublimation(temperature6) {
  const t = temperature6 - zeroCelsius2;
  return 1e3 * (2834.1 - 0.29 * t - 4e-3 * t * t);
}
var vaporizationForms = [
  {
    key: "linear",
    label: "linear in the temperature",
    source: { text: "Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 2", status: "verified" },
    validity: "−30 to 40 °C",
    knownError: "1 kJ kg⁻¹ above 0 °C",
    holds: [243.15, 313.15],
    constants: [],
    of: () => linearLatentHeat,
    formula: "L_v = 2501 - 2.37\\,t",
    filled: (temperature6, _constants, value23) => `L_v = 2501 - 2.37 \\cdot ${texFactor(temperature6 - zeroCelsius2)} = ${shown2(value23)}`
  },
  {
    key: "constant",
    label: "a constant, as taught",
    source: { text: 'common practice: the value at 0 °C, 2.501 MJ kg⁻¹ (AMS Glossary of Meteorology, "latent heat")', status: "common practice" },
    validity: "near 0 °C",
    knownError: "2 % at 20 °C, 4 % at 40 °C",
    constants: ["latentHeat"],
    of: (constants) => {
      const value23 = constant(constants, "latentHeat");
      return () => value23;
    },
    formula: "L_v = \\text{const.}",
    filled: (_temperature, _constants, value23) => `L_v = ${shown2(value23)}`
  },
  {
    key: "kirchhoff",
    label: "Kirchhoff’s relation with constant specific heats",
    source: { text: 'AMS Glossary of Meteorology, "Kirchhoff’s equation"; Emanuel (1994), Atmospheric Convection, Eq. 4.4.4', status: "from memory" },
    validity: "−40 to 40 °C",
    knownError: "3 kJ kg⁻¹ at 40 °C",
    holds: [233.15, 313.15],
    constants: ["latentHeat", "cw", "cpv"],
    of: (constants) => (temperature6) => kirchhoffLatentHeat(temperature6, constants),
    formula: "L_v = L_0 - (c_w - c_{pv})\\,t",
    filled: (temperature6, constants, value23) => `L_v = ${texNumber(constant(constants, "latentHeat") / 1e3, 6)} - (${texNumber(constant(constants, "cw") / 1e3)} - ${texNumber(constant(constants, "cpv") / 1e3)}) \\cdot ${texFactor(temperature6 - zeroCelsius2)} = ${shown2(value23)}`
  },
  {
    key: "cubic",
    label: "cubic in the temperature",
    source: { text: "Rogers & Yau (1989), A Short Course in Cloud Physics, Table 2.1, as a fit", status: "from memory" },
    validity: "−25 to 40 °C",
    knownError: "2 kJ kg⁻¹",
    holds: [248.15, 313.15],
    constants: [],
    of: () => cubicLatentHeat,
    formula: "L_v = 2500.8 - 2.36\\,t + 0.0016\\,t^2 - 0.00006\\,t^3",
    filled: (temperature6, _constants, value23) => `L_v = 2500.8 - 2.36 \\cdot ${texFactor(temperature6 - zeroCelsius2)} + \\dots = ${shown2(value23)}`
  }
];
var sublimationForms = [
  {
    key: "constant",
    label: "a constant, as taught",
    source: { text: 'common practice: the value at 0 °C, 2.834 MJ kg⁻¹ (AMS Glossary of Meteorology, "latent heat")', status: "common practice" },
    validity: "−40 to 0 °C",
    knownError: "0.2 %",
    holds: [233.15, 273.16],
    constants: ["latentHeatIce"],
    of: (constants) => {
      const value23 = constant(constants, "latentHeatIce");
      return () => value23;
    },
    formula: "L_s = \\text{const.}",
    filled: (_temperature, _constants, value23) => `L_s = ${shown2(value23)}`
  },
  {
    key: "murphy-koop",
    label: "Murphy & Koop (2005)",
    source: { text: "Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 5; coefficients read in transcriptions", status: "verified" },
    validity: "30 K to 0.01 °C",
    knownError: "0.1 %",
    holds: [30, 273.16],
    constants: [],
    of: () => murphyKoopSublimation,
    formula: "L_s = \\frac{46782.5 + 35.8925\\,T - 0.07414\\,T^2 + 541.5 \\exp[-(T/123.75)^2]}{0.018015}",
    filled: (temperature6, _constants, value23) => `L_s(${texQuantity(temperature6, "K", 6)}) = ${shown2(value23)}`
  },
  {
    key: "quadratic",
    label: "quadratic in the temperature",
    source: { text: "Rogers & Yau (1989), A Short Course in Cloud Physics, Table 2.1, as a fit; coefficients read in transcriptions", status: "verified" },
    validity: "−40 to 0 °C",
    knownError: "0.1 %",
    holds: [233.15, 273.16],
    constants: [],
    of: () => quadraticSublimation,
    formula: "L_s = 2834.1 - 0.29\\,t - 0.004\\,t^2",
    filled: (temperature6, _constants, value23) => `L_s = 2834.1 - 0.29 \\cdot ${texFactor(temperature6 - zeroCelsius2)} - 0.004 \\cdot ${texFactor(temperature6 - zeroCelsius2)}^2 = ${shown2(value23)}`
  }
];

// shared/thermo/latentHeatDefinition.ts
var T8 = (inputs2) => numberOf(inputs2, "temperature");
function latentHeatDefinition({ range, forms: forms2, slips, ...named2 }) {
  const temperature6 = { name: "temperature", label: "temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range };
  return {
    ...named2,
    unit: "J/kg",
    shownUnit: "kJ/kg",
    kind: "ratio",
    inputs: [temperature6],
    variants: forms2.map(({ key, label, source: source2, validity, knownError, holds, of }) => ({
      key,
      label,
      source: source2,
      validity,
      knownError,
      ...holds ? { holds: { temperature: holds } } : {},
      evaluate: (inputs2, constants) => ({ is: "value", value: of(constants)(T8(inputs2)) })
    })),
    constants: [...new Set(forms2.flatMap((form) => form.constants))],
    trace(inputs2, constants, variant) {
      const form = forms2.find((one2) => one2.key === variant) ?? forms2[0];
      if (!form) throw new Error(`${named2.key} has no form`);
      const value23 = form.of(constants)(T8(inputs2));
      return [{ text: form.label, formula: form.formula, filled: form.filled(T8(inputs2), constants, value23), value: value23, unit: "J/kg" }];
    },
    slips: [
      ...slips,
      slip("fusion", "latent heat of fusion", "This is the latent heat of fusion, 334 kJ kg⁻¹.", () => 334e3),
      joulesSlip,
      slip("megajoules-for-kilojoules", "MJ given as kJ", "Your number is in megajoules; the unit beside it says kilojoules.", (_i, _c, right) => right / 1e3)
    ]
  };
}

// shared/thermo/quantities/latentHeatOfSublimation.ts
var latentHeatOfSublimationDefinition = latentHeatDefinition({
  key: "latent-heat-of-sublimation",
  name: "latent heat of sublimation",
  symbol: "L_s",
  range: [150, 273.16],
  forms: sublimationForms,
  ask: "The latent heat of sublimation of ice at the temperature, per kilogram.",
  slips: [
    slip("vaporization", "latent heat of vaporization", "This is the latent heat of vaporization, from liquid water to vapor.", (_i, constants) => constant(constants, "latentHeat"))
  ],
  example: { inputs: { temperature: 263.15 }, gives: 2834e3, within: 1 }
});

// shared/thermo/quantities/latentHeatOfVaporization.ts
var latentHeatOfVaporizationDefinition = latentHeatDefinition({
  key: "latent-heat-of-vaporization",
  name: "latent heat of vaporization",
  symbol: "L_v",
  range: [200, 375],
  forms: vaporizationForms,
  ask: "The latent heat of vaporization of water at the temperature, per kilogram.",
  slips: [
    // beside the constants that are taught it is never half the way off
    constantSlip("sign", "sign of the slope turned round", "The latent heat of vaporization falls as the temperature rises: here it rises.", (inputs2) => {
      const t = Number(inputs2.temperature) - zeroCelsius;
      return t === 0 ? null : 2501e3 + 2370 * t;
    }),
    slip("kelvin-for-celsius", "kelvin put in for Celsius", "This is what comes out with the temperature in kelvin: the linear law takes °C.", (inputs2) => 2501e3 - 2370 * Number(inputs2.temperature)),
    slip("sublimation", "latent heat of sublimation", "This is the latent heat of sublimation, from ice to vapor.", (_i, constants) => constant(constants, "latentHeatIce"))
  ],
  example: { inputs: { temperature: 293.15 }, gives: 2453600, within: 1 }
});

// shared/thermo/saturationDefinition.ts
var saturationInput = (range) => ({ name: "temperature", label: "temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range });
var T9 = (inputs2) => numberOf(inputs2, "temperature");
function saturationDefinition({ input: input2, forms: forms2, slips, ...named2 }) {
  return {
    ...named2,
    unit: "Pa",
    shownUnit: "hPa",
    kind: "ratio",
    inputs: [input2],
    variants: forms2.map(({ key, label, source: source2, validity, knownError, holds, pressure: pressure4 }) => ({
      key,
      label,
      source: source2,
      validity,
      knownError,
      holds: { temperature: holds },
      evaluate: (inputs2, constants) => ({ is: "value", value: enhancementOf(constants) * pressure4(T9(inputs2)) })
    })),
    constants: ["enhancementFactor"],
    trace(inputs2, constants, variant) {
      const form = forms2.find((one2) => one2.key === variant) ?? forms2[0];
      if (!form) throw new Error(`${named2.key} has no form`);
      const pure = form.pressure(T9(inputs2)), factor = enhancementOf(constants);
      const steps2 = [{ text: `${form.label}, with ${form.temperature ? "t in °C" : "T in kelvin"}`, formula: form.formula, filled: form.filled(T9(inputs2)), value: pure, unit: "Pa" }];
      if (factor !== 1) steps2.push({ text: "Enhancement factor of moist air", formula: `f\\,${named2.symbol}`, filled: `${texNumber(factor)} \\cdot ${texNumber(pure / 100, 6)} = ${texQuantity(factor * pure / 100, "hPa", 6)}`, value: factor * pure, unit: "Pa" });
      return steps2;
    },
    slips: [
      ...slips,
      slip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", (_i, _c, right) => right * 100),
      slip("kilopascal-for-hectopascal", "kPa given as hPa", "Your number is in kilopascal; the unit beside it says hectopascal.", (_i, _c, right) => right / 10),
      slip("fahrenheit", "°F put in for °C", "This comes from a temperature in °F put into a formula that takes °C.", (inputs2) => {
        const fahrenheit = (T9(inputs2) - zeroCelsius) * 1.8 + 32;
        return fahrenheit > -80 ? forms2[0]?.pressure(zeroCelsius + fahrenheit) ?? null : null;
      })
    ]
  };
}

// shared/thermo/saturation.ts
var zeroCelsius3 = 273.15;
function magnus({ a, b, c: c2 }, symbol) {
  return {
    pressure: (temperature6) => {
      const t = temperature6 - zeroCelsius3;
      return a * exp(b * t / (t + c2));
    },
    temperature: (pressure4) => {
      const logarithm = log(pressure4 / a);
      return zeroCelsius3 + c2 * logarithm / (b - logarithm);
    },
    formula: `${symbol} = ${texNumber(a / 100, 6)} \\exp\\frac{${texNumber(b, 6)}\\,t}{t + ${texNumber(c2, 6)}}`,
    filled: (temperature6) => {
      const t = temperature6 - zeroCelsius3;
      return `${symbol} = ${texNumber(a / 100, 6)} \\exp\\frac{${texNumber(b, 6)} \\cdot ${texFactor(t)}}{${texNumber(t)} + ${texNumber(c2, 6)}} = ${texQuantity(a * exp(b * t / (t + c2)) / 100, "hPa", 6)}`;
    }
  };
}
var long = (symbol, formula, pressure4) => ({
  pressure: pressure4,
  formula,
  filled: (temperature6) => `${symbol}(${texQuantity(temperature6, "K", 6)}) = ${texQuantity(pressure4(temperature6) / 100, "hPa", 6)}`
});
function boltonOverWater(temperature6) {
  const t = temperature6 - zeroCelsius3;
  return 611.2 * exp(17.67 * t / (t + 243.5));
}
function murphyKoopOverWater(temperature6) {
  const logT = log(temperature6);
  const tanh = 1 - 2 / (exp(2 * 0.0415 * (temperature6 - 218.8)) + 1);
  return exp(54.842763 - 6763.22 / temperature6 - 4.21 * logT + 367e-6 * temperature6 + tanh * (53.878 - 1331.22 / temperature6 - 9.44523 * logT + 0.014025 * temperature6));
}
function wagnerPrussOverWater(temperature6) {
  const tau = 1 - temperature6 / 647.096;
  const root = pow(tau, 0.5);
  const cube = tau * tau * tau;
  const sum = -7.85951783 * tau + 1.84408259 * tau * root - 11.7866497 * cube + 22.6807411 * cube * root - 15.9618719 * cube * tau + 1.80122502 * cube * cube * tau * root;
  return 22064e3 * exp(647.096 / temperature6 * sum);
}
function industrialOverWater(temperature6) {
  const theta5 = temperature6 - 0.23855557567849 / (temperature6 - 650.17534844798);
  const A = theta5 * theta5 + 1167.0521452767 * theta5 - 724213.16703206;
  const B = -17.073846940092 * theta5 * theta5 + 12020.82470247 * theta5 - 32325550322333e-7;
  const C = 14.91510861353 * theta5 * theta5 - 4823.2657361591 * theta5 + 405113.40542057;
  const root = 2 * C / (-B + pow(B * B - 4 * A * C, 0.5));
  return 1e6 * root * root * root * root;
}
function goffGratchOverWater(temperature6) {
  const ratio2 = 373.16 / (temperature6 + 0.01);
  const exponent2 = -7.90298 * (ratio2 - 1) + 5.02808 * log10(ratio2) - 13816e-11 * (pow(10, 11.344 * (1 - 1 / ratio2)) - 1) + 81328e-7 * (pow(10, -3.49149 * (ratio2 - 1)) - 1);
  return 101324.6 * pow(10, exponent2);
}
function murphyKoopOverIce(temperature6) {
  return exp(9.550426 - 5723.265 / temperature6 + 3.53068 * log(temperature6) - 728332e-8 * temperature6);
}
function sublimationPressure(temperature6) {
  const theta5 = temperature6 / 273.16;
  const sum = -21.2144006 * pow(theta5, 0.00333333333) + 27.3203819 * pow(theta5, 1.20666667) - 6.1059813 * pow(theta5, 1.70333333);
  return 611.657 * exp(sum / theta5);
}
function goffGratchOverIce(temperature6) {
  const ratio2 = 273.16 / (temperature6 + 0.01);
  return 610.71 * pow(10, -9.09718 * (ratio2 - 1) - 3.56654 * log10(ratio2) + 0.876793 * (1 - 1 / ratio2));
}
var water = "e_s";
var ice = "e_i";
var murphyKoop = { text: "Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 10", status: "verified" };
var goffGratch = { text: "Goff & Gratch (1946), Trans. ASHVE 52, 95–121; Smithsonian Meteorological Tables (List 1951), Table 94; coefficients read in transcriptions", status: "verified" };
var overWaterForms = [
  {
    key: "bolton",
    label: "Bolton (1980)",
    source: { text: "Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 10", status: "verified" },
    validity: "−30 to 35 °C",
    knownError: "0.1 % above −10 °C and 0.2 % at −30 °C; +0.14 % at 40 °C, +0.26 % at 45 °C",
    holds: [243.15, 308.15],
    ...magnus({ a: 611.2, b: 17.67, c: 243.5 }, water),
    pressure: boltonOverWater
  },
  {
    key: "wmo",
    label: "Magnus form of WMO-No. 8",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B", status: "verified" },
    validity: "−45 to 60 °C",
    knownError: "−0.3 % at 20 to 35 °C, +0.5 % at −30 °C",
    holds: [228.15, 333.15],
    ...magnus({ a: 611.2, b: 17.62, c: 243.12 }, water)
  },
  {
    key: "murphy-koop",
    label: "Murphy & Koop (2005)",
    source: murphyKoop,
    validity: "123 to 332 K",
    knownError: "0.05 % above 0 °C",
    holds: [123, 332],
    ...long(water, "\\ln e_s = 54.842763 - \\frac{6763.22}{T} - 4.210 \\ln T + 0.000367\\,T + \\tanh[0.0415\\,(T - 218.8)]\\left(53.878 - \\frac{1331.22}{T} - 9.44523 \\ln T + 0.014025\\,T\\right)", murphyKoopOverWater)
  },
  {
    key: "wagner-pruss",
    label: "Wagner & Pruß, saturation line of IAPWS-95",
    source: { text: "Wagner & Pruß (2002), J. Phys. Chem. Ref. Data 31, 387–535, Eq. 2.5", status: "verified" },
    validity: "0.01 °C to the critical point",
    knownError: "0.02 %",
    holds: [273.16, 647.096],
    ...long(water, "\\ln\\frac{e_s}{p_c} = \\frac{T_c}{T}\\left(a_1\\tau + a_2\\tau^{1.5} + a_3\\tau^{3} + a_4\\tau^{3.5} + a_5\\tau^{4} + a_6\\tau^{7.5}\\right),\\quad \\tau = 1 - \\frac{T}{T_c}", wagnerPrussOverWater)
  },
  {
    key: "industrial",
    label: "IAPWS industrial formulation (IF97)",
    source: { text: "IAPWS R7-97(2012), Eq. 30, Table 34", status: "verified" },
    validity: "0 °C to the critical point",
    knownError: "0.03 %",
    holds: [273.15, 647.096],
    ...long(water, "e_s = \\left[\\frac{2C}{-B + \\sqrt{B^2 - 4AC}}\\right]^4,\\quad A, B, C \\text{ quadratic in } \\vartheta = T + \\frac{n_9}{T - n_{10}}", industrialOverWater)
  },
  {
    key: "goff-gratch",
    label: "Goff & Gratch (1946)",
    source: goffGratch,
    validity: "−50 to 102 °C",
    knownError: "0.1 % above −40 °C",
    holds: [223.15, 375.15],
    ...long(water, "\\log_{10} e_s = -7.90298\\left(\\frac{T_s}{T} - 1\\right) + 5.02808 \\log_{10}\\frac{T_s}{T} - 1.3816\\times 10^{-7}\\left(10^{11.344(1 - T/T_s)} - 1\\right) + 8.1328\\times 10^{-3}\\left(10^{-3.49149(T_s/T - 1)} - 1\\right) + \\log_{10} 1013.246", goffGratchOverWater)
  },
  {
    key: "buck",
    label: "Buck (1981)",
    source: { text: "Buck (1981), J. Appl. Meteor. 20, 1527–1532, Table 2, e_w1; coefficients read in transcriptions", status: "verified" },
    validity: "−20 to 50 °C",
    knownError: "0.14 %",
    holds: [253.15, 323.15],
    ...magnus({ a: 611.21, b: 17.502, c: 240.97 }, water)
  },
  {
    key: "tetens",
    label: "Tetens (1930)",
    source: { text: "Tetens (1930), Z. Geophys. 6, 297–309, with the coefficients 17.27 and 237.3 of FAO Irrigation and Drainage Paper 56, Eq. 11", status: "verified" },
    validity: "0 to 40 °C",
    knownError: "0.13 % within; −0.7 % at −20 °C",
    holds: [273.15, 313.15],
    ...magnus({ a: 610.78, b: 17.27, c: 237.3 }, water)
  }
];
var overIceForms = [
  {
    key: "murphy-koop",
    label: "Murphy & Koop (2005)",
    source: { ...murphyKoop, text: "Murphy & Koop (2005), Q. J. R. Meteorol. Soc. 131, 1539–1565, Eq. 7" },
    validity: "110 K to 0.01 °C",
    knownError: "0.07 % above −80 °C",
    holds: [110, 273.16],
    ...long(ice, "\\ln e_i = 9.550426 - \\frac{5723.265}{T} + 3.53068 \\ln T - 0.00728332\\,T", murphyKoopOverIce)
  },
  {
    key: "sublimation",
    label: "IAPWS sublimation curve",
    source: { text: "IAPWS R14-08(2011), Eq. 6, Table 3", status: "verified" },
    validity: "50 K to 0.01 °C",
    knownError: "0.1 % above −100 °C",
    holds: [50, 273.16],
    ...long(ice, "\\ln\\frac{e_i}{p_t} = \\frac{1}{\\theta}\\left(a_1\\theta^{b_1} + a_2\\theta^{b_2} + a_3\\theta^{b_3}\\right),\\quad \\theta = \\frac{T}{273.16}", sublimationPressure)
  },
  {
    key: "wmo",
    label: "Magnus form of WMO-No. 8",
    source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B; coefficients read in transcriptions", status: "verified" },
    validity: "−65 to 0 °C",
    knownError: "0.25 %",
    holds: [208.15, 273.16],
    ...magnus({ a: 611.2, b: 22.46, c: 272.62 }, ice)
  },
  {
    key: "goff-gratch",
    label: "Goff & Gratch (1946)",
    source: { ...goffGratch, text: "Goff & Gratch (1946), Trans. ASHVE 52, 95–121; Smithsonian Meteorological Tables (List 1951), Table 96; coefficients read in transcriptions" },
    validity: "−100 to 0 °C",
    knownError: "0.35 %",
    holds: [173.15, 273.16],
    ...long(ice, "\\log_{10} e_i = -9.09718\\left(\\frac{T_0}{T} - 1\\right) - 3.56654 \\log_{10}\\frac{T_0}{T} + 0.876793\\left(1 - \\frac{T}{T_0}\\right) + \\log_{10} 6.1071", goffGratchOverIce)
  }
];

// shared/thermo/quantities/saturationVaporPressure.ts
var celsius = (kelvins) => kelvins - zeroCelsius;
var saturationVaporPressureDefinition = saturationDefinition({
  key: "saturation-vapor-pressure",
  name: "saturation vapor pressure over liquid water",
  symbol: "e_s",
  input: saturationInput([150, 375]),
  forms: overWaterForms,
  ask: "The saturation vapor pressure over a plane surface of liquid water, also below 0 °C, where the water is supercooled.",
  slips: [
    fineSlip("ice-for-water", "over ice for over water", "This is the saturation vapor pressure over ice; asked is that over liquid water, also below 0 °C.", (inputs2) => {
      const T11 = Number(inputs2.temperature);
      return T11 < zeroCelsius ? overIceForms[0]?.pressure(T11) ?? null : null;
    }),
    slip("kelvin-for-celsius", "kelvin put in for Celsius", "This is what a formula in °C gives when the temperature goes in in kelvin.", (inputs2) => {
      const T11 = Number(inputs2.temperature);
      return 611.2 * exp(17.67 * T11 / (T11 + 243.5));
    }),
    slip("base-ten-for-e", "power of ten for exp", "This comes from coefficients that belong to exp, taken as a power of ten.", (inputs2) => {
      const t = celsius(Number(inputs2.temperature));
      return t === 0 ? null : 611.2 * pow(10, 17.67 * t / (t + 243.5));
    }),
    slip("e-for-base-ten", "exp for power of ten", "This comes from coefficients that belong to a power of ten (7.5 and 237.3), put into exp.", (inputs2) => {
      const t = celsius(Number(inputs2.temperature));
      return t === 0 ? null : 611 * exp(7.5 * t / (t + 237.3));
    }),
    constantSlip("sign-in-denominator", "difference for sum in the denominator", "This comes from a denominator that takes t away from its constant: the two are added.", (inputs2) => {
      const t = celsius(Number(inputs2.temperature));
      return t === 0 || t > 120 ? null : 611.2 * exp(17.67 * t / (243.5 - t));
    })
  ],
  example: { inputs: { temperature: 293.15 }, gives: 2336.947, within: 1e-3 }
});

// shared/thermo/quantities/saturationVaporPressureOverIce.ts
var celsius2 = (kelvins) => kelvins - zeroCelsius;
var saturationVaporPressureOverIceDefinition = saturationDefinition({
  key: "saturation-vapor-pressure-over-ice",
  name: "saturation vapor pressure over ice",
  symbol: "e_i",
  input: saturationInput([110, 273.16]),
  forms: overIceForms,
  ask: "The saturation vapor pressure over a plane surface of ice.",
  slips: [
    fineSlip("water-for-ice", "over water for over ice", "This is the saturation vapor pressure over supercooled water; asked is that over ice.", (inputs2) => overWaterForms[0]?.pressure(Number(inputs2.temperature)) ?? null),
    slip("kelvin-for-celsius", "kelvin put in for Celsius", "This is what a formula in °C gives when the temperature goes in in kelvin.", (inputs2) => {
      const T11 = Number(inputs2.temperature);
      return 611.2 * exp(22.46 * T11 / (T11 + 272.62));
    }),
    slip("base-ten-for-e", "power of ten for exp", "This comes from coefficients that belong to exp, taken as a power of ten.", (inputs2) => {
      const t = celsius2(Number(inputs2.temperature));
      return t === 0 ? null : 611.2 * pow(10, 22.46 * t / (t + 272.62));
    }),
    slip("sign", "sign of the temperature lost", "This comes from a temperature without its minus sign.", (inputs2) => {
      const t = celsius2(Number(inputs2.temperature));
      return t === 0 ? null : 611.2 * exp(22.46 * -t / (-t + 272.62));
    })
  ],
  example: { inputs: { temperature: 263.15 }, gives: 259.892, within: 1e-3 }
});

// shared/thermo/saturationFunction.ts
var overWaterKey = saturationVaporPressureDefinition.key;
var overIceKey = saturationVaporPressureOverIceDefinition.key;
var vaporizationKey = latentHeatOfVaporizationDefinition.key;
var sublimationKey = latentHeatOfSublimationDefinition.key;
function byTemperature(definition, formulae, make) {
  const named2 = variantOf(definition, formulae.variants[definition.key]);
  const inside = make(named2.key);
  const range = named2.holds?.temperature;
  if (!range || formulae.beyond === "compute") return inside;
  const made2 = /* @__PURE__ */ new Map();
  return (temperature6) => {
    if (temperature6 >= range[0] && temperature6 <= range[1]) return inside(temperature6);
    const { key } = chooseVariant(definition, { temperature: temperature6 }, formulae).variant;
    const known = made2.get(key) ?? make(key);
    made2.set(key, known);
    return known(temperature6);
  };
}
function formOf(forms2, key) {
  const form = forms2.find((one2) => one2.key === key);
  if (!form) throw new Error(`no form ${key}`);
  return form;
}
function pressureFunction(definition, forms2, constants, formulae) {
  const factor = enhancementOf(constants);
  return byTemperature(definition, formulae, (key) => {
    const { pressure: pressure4 } = formOf(forms2, key);
    return factor === 1 ? pressure4 : (temperature6) => factor * pressure4(temperature6);
  });
}
var saturationPressureFunction = (constants, formulae) => pressureFunction(saturationVaporPressureDefinition, overWaterForms, constants, formulae);
var iceSaturationPressureFunction = (constants, formulae) => pressureFunction(saturationVaporPressureOverIceDefinition, overIceForms, constants, formulae);
var latentHeatFunction = (constants, formulae) => byTemperature(latentHeatOfVaporizationDefinition, formulae, (key) => formOf(vaporizationForms, key).of(constants));
var sublimationHeatFunction = (constants, formulae) => byTemperature(latentHeatOfSublimationDefinition, formulae, (key) => formOf(sublimationForms, key).of(constants));
function notesOf(definition, temperatures, formulae) {
  const notes = /* @__PURE__ */ new Set();
  for (const temperature6 of temperatures) {
    const { note } = chooseVariant(definition, { temperature: temperature6 }, formulae);
    if (note !== null) notes.add(`${definition.name[0]?.toUpperCase()}${definition.name.slice(1)}: ${note}`);
  }
  return [...notes];
}
var saturationNotes = (temperatures, formulae) => notesOf(saturationVaporPressureDefinition, temperatures, formulae);
var iceSaturationNotes = (temperatures, formulae) => notesOf(saturationVaporPressureOverIceDefinition, temperatures, formulae);
var latentHeatNotes = (temperatures, formulae) => notesOf(latentHeatOfVaporizationDefinition, temperatures, formulae);

// shared/thermo/moistAir.ts
function moistAir(constants, formulae) {
  return {
    es: saturationPressureFunction(constants, formulae),
    L: latentHeatFunction(constants, formulae),
    epsilon: epsilonOf(constants),
    R: constant(constants, "R"),
    Rv: constant(constants, "Rv"),
    cp: constant(constants, "cp"),
    cpv: constant(constants, "cpv"),
    cw: constant(constants, "cw"),
    g: constant(constants, "g"),
    kappa: kappaOf(constants)
  };
}

// shared/thermo/liftingCondensation.ts
var boltonLclTemperature = (temperature6, dewpoint) => 1 / (1 / (dewpoint - 56) + log(temperature6 / dewpoint) / 800) + 56;
var romps = { Ra: 287.04, Rv: 461, cva: 719, cvv: 1418, cvl: 4119, g: 9.81, triple: 273.16, E0v: 2374e3 };
function rompsLcl(temperature6, relativeHumidity, pressure4, specificHumidity) {
  const { Ra, Rv, cva, cvv, cvl, g, triple, E0v } = romps;
  const Rm = (1 - specificHumidity) * Ra + specificHumidity * Rv;
  const cpm = (1 - specificHumidity) * (cva + Ra) + specificHumidity * (cvv + Rv);
  const a = cpm / Rm + (cvl - (cvv + Rv)) / Rv;
  const c2 = -(E0v - (cvv - cvl) * triple) / (Rv * temperature6) / a;
  const target = -(log(relativeHumidity) / a + log(-c2) + c2);
  let y = -c2;
  for (let n = 0; n < 50; n++) {
    const change2 = (y - log(y) - target) / (1 - 1 / y);
    y -= change2;
    if (Math.abs(change2) <= 1e-15 * y) break;
  }
  const lcl = c2 / -y * temperature6;
  return { temperature: lcl, pressure: pressure4 * pow(lcl / temperature6, cpm / Rm), heightAboveStart: cpm / g * (temperature6 - lcl) };
}
function solvedLclTemperature(temperature6, dewpoint, pressure4, air) {
  if (dewpoint >= temperature6) return temperature6;
  const w2 = mixingRatioFrom(air.es(dewpoint), pressure4, air.epsilon);
  const excess = (T11) => {
    const p10 = pressure4 * pow(T11 / temperature6, 1 / air.kappa);
    const e = air.es(T11);
    return e < p10 ? mixingRatioFrom(e, p10, air.epsilon) - w2 : Infinity;
  };
  return findRoot(excess, Math.max(dewpoint - 60, 150), temperature6);
}
var lclTemperatureKey = "lifting-condensation-level-temperature";
function lclFunction(constants, formulae, variant = formulae.variants[lclTemperatureKey]) {
  const air = moistAir(constants, formulae);
  return (temperature6, given8, pressure4) => {
    const dewpoint = Math.min(given8, temperature6);
    if (variant === "romps") {
      const e = air.es(dewpoint), w2 = mixingRatioFrom(e, pressure4, air.epsilon);
      return rompsLcl(temperature6, e / air.es(temperature6), pressure4, w2 / (1 + w2));
    }
    const lcl = variant === "solved" ? solvedLclTemperature(temperature6, dewpoint, pressure4, air) : boltonLclTemperature(temperature6, dewpoint);
    return { temperature: lcl, pressure: pressure4 * pow(lcl / temperature6, 1 / air.kappa), heightAboveStart: air.cp / air.g * (temperature6 - lcl) };
  };
}

// shared/thermo/moistInputs.ts
var pressureInput2 = { name: "pressure", label: "pressure", symbol: "p", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [500, 12e4] };
var temperatureInput2 = { name: "temperature", label: "air temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [180, 340] };
var dewpointInput = { name: "dewpoint", label: "dewpoint", symbol: "T_d", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [160, 340] };
var relativeHumidityInput = { name: "relativeHumidity", label: "relative humidity over liquid water, e/es", symbol: "RH", unit: "1", shownUnit: "%", kind: "fraction", shape: "number", range: [1e-3, 1.5] };
var mixingRatioInput = { name: "mixingRatio", label: "mixing ratio", symbol: "w", unit: "1", shownUnit: "g/kg", kind: "ratio", shape: "number", range: [1e-6, 0.2] };
var vaporPressureInput = { name: "vaporPressure", label: "vapor pressure", symbol: "e", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [0.01, 3e4] };
var wetBulbInput = { name: "wetBulb", label: "wet-bulb temperature", symbol: "T_w", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [220, 330] };
var temperatureForSlips = { ...temperatureInput2, label: "air temperature, to know the slip of taking it for the dewpoint", isOptional: true, isForSlips: true };

// shared/thermo/moistQuantity.ts
var keys = { es: overWaterKey, ei: overIceKey, L: vaporizationKey, Ls: sublimationKey };
var moistSlip = (key, label, sentence, apply) => ({ key, weight: "gross", label, sentence, apply });
var fineMoistSlip = (key, label, sentence, apply) => ({ key, weight: "fine", label, sentence, apply });
var smallMoistSlip = (key, label, sentence, apply) => ({ key, weight: "constant", label, sentence, apply });
function moistQuantity({ inside = [], notedAt, remarks, working, slips, variants, ...rest }) {
  const handOf = (inputs2, constants, formulae, variant) => ({ given: (name) => numberOf(inputs2, name), air: moistAir(constants, formulae), constants, formulae, variant });
  const outcomeOf = (variant, hand) => {
    const found = variant.value(hand);
    return typeof found === "number" ? { is: "value", value: found } : found;
  };
  const find2 = (key) => {
    const variant = variants.find((one2) => one2.key === key) ?? variants[0];
    if (!variant) throw new Error(`${rest.key} has no variant`);
    return variant;
  };
  const definition = {
    ...rest,
    variants: variants.map(({ value: value23, ...about }) => ({
      ...about,
      evaluate: (inputs2, constants, formulae) => {
        const hand = handOf(inputs2, constants, formulae, about.key);
        checkNoneBoils(inputs2, hand.air);
        const outcome3 = outcomeOf({ ...about, value: value23 }, hand);
        if (outcome3.is !== "value" || !remarks) return outcome3;
        const said = remarks(hand, outcome3.value).filter((one2) => one2 !== null);
        return said.length === 0 ? outcome3 : { ...outcome3, notes: said };
      }
    })),
    uses: inside.map((one2) => keys[one2] ?? one2),
    notes: (inputs2, _constants, formulae) => {
      const given8 = (name) => numberOf(inputs2, name);
      return [...saturationNotes(notedAt?.es?.(given8) ?? [], formulae), ...iceSaturationNotes(notedAt?.ei?.(given8) ?? [], formulae), ...latentHeatNotes(notedAt?.L?.(given8) ?? [], formulae)];
    },
    trace(inputs2, constants, key, formulae) {
      const hand = handOf(inputs2, constants, formulae, find2(key).key);
      const outcome3 = outcomeOf(find2(key), hand);
      if (outcome3.is !== "value") return [{ text: outcome3.why, formula: rest.symbol, filled: `\\text{${outcome3.is === "none" ? "none" : outcome3.is === "not_reached" ? "not reached" : "not defined"}}` }];
      const steps2 = working(hand, outcome3.value);
      return steps2.map((step, at) => at === steps2.length - 1 ? { ...step, value: outcome3.value, unit: rest.unit } : step);
    },
    slips: slips.map((one2) => ({
      ...one2,
      apply: (inputs2, constants, right, formulae) => {
        const { key } = variantOf(definition, formulae.variants[rest.key]);
        const hand = handOf(inputs2, constants, formulae, key);
        const again = (changes) => {
          const outcome3 = outcomeOf(find2(key), { ...hand, given: (name) => changes[name] ?? hand.given(name) });
          return outcome3.is === "value" ? outcome3.value : NaN;
        };
        const found = one2.apply({ ...hand, right, again });
        return found === null || !Number.isFinite(found) ? null : found;
      }
    }))
  };
  return definition;
}
function checkNoneBoils({ pressure: pressure4, ...inputs2 }, air) {
  if (typeof pressure4 !== "number") return;
  for (const name of ["temperature", "dewpoint", "wetBulb"]) {
    const temperature6 = inputs2[name];
    if (typeof temperature6 === "number" && !(air.es(temperature6) < pressure4)) throw new OutOfRangeError(name, temperature6, `temperatures whose saturation vapor pressure is below ${pressure4} Pa`);
  }
}
function optionally(hand, name) {
  try {
    return hand.given(name);
  } catch {
    return null;
  }
}
var supersaturated = (relativeHumidity) => relativeHumidity > 1 + 1e-12 ? `Supersaturated: the vapor pressure is ${(100 * relativeHumidity).toFixed(1)} % of that of saturation over liquid water.` : null;
var foggy = (temperature6, dewpoint) => dewpoint > temperature6 ? "The dewpoint lies above the temperature, as sensors in fog show it: the air is taken as saturated where it is." : null;

// shared/thermo/moistSlips.ts
var pascalSlip = moistSlip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", ({ right }) => right * 100);
var kilopascalSlip = moistSlip("kilopascal-for-hectopascal", "kPa given as hPa", "Your number is in kilopascal; the unit beside it says hectopascal.", ({ right }) => right / 10);
var kilogramSlip = moistSlip("kilogram-for-gram", "kg kg⁻¹ given as g kg⁻¹", "Your number is in kg kg⁻¹; the unit beside it says g kg⁻¹.", ({ right }) => right / 1e3);
var kelvinAsCelsiusSlip = moistSlip("end-unit", "kelvin and °C mixed up", "Your number is in kelvin; the unit beside it says °C.", ({ right }) => right + zeroCelsius);
var celsiusAsKelvinSlip = moistSlip("end-unit", "°C given as kelvin", "Your number is the temperature in °C; the unit beside it says kelvin.", ({ right }) => right > zeroCelsius + 1 ? right - zeroCelsius : null);
var fractionAsPercentSlip = moistSlip("fraction-for-percent", "fraction given as percent", "Your number is the fraction; the unit beside it says percent.", ({ right }) => right / 100);
function overIce({ constants, formulae }, temperature6) {
  return temperature6 < zeroCelsius ? iceSaturationPressureFunction(constants, formulae)(temperature6) : null;
}
var atTemperatureSlip = (what) => fineMoistSlip("temperature-for-dewpoint", "temperature for dewpoint", `This is ${what} at the air temperature, that of saturation: the dewpoint tells what the air holds.`, (hand) => {
  const temperature6 = optionally(hand, "temperature");
  return temperature6 === null || temperature6 === hand.given("dewpoint") ? null : hand.again({ dewpoint: temperature6 });
});
var swappedSlip2 = moistSlip("swapped", "temperature and dewpoint swapped", "This comes from the temperature and the dewpoint in each other’s place.", ({ given: given8, again }) => again({ temperature: given8("dewpoint"), dewpoint: given8("temperature") }));

// shared/thermo/moistTex.ts
var inHectopascal = (pressure4, digits = 5) => texQuantity(pressure4 / 100, "hPa", digits);
var inGrams = (ratio2, digits = 5) => texQuantity(ratio2 * 1e3, "g/kg", digits);
var inCelsius = (temperature6, digits = 5) => texQuantity(temperature6 - 273.15, "Cel", digits);
var inKelvin = (temperature6, digits = 6) => texQuantity(temperature6, "K", digits);
var saturationStep = (symbol, of, temperature6, pressure4, text = "Saturation vapor pressure over liquid water") => ({ text, formula: `${symbol} = e_s(${of})`, filled: `${symbol} = e_s(${inCelsius(temperature6)}) = ${inHectopascal(pressure4)}`, value: pressure4, unit: "Pa" });
var mixingRatioStep = (symbol, e, vaporPressure, pressure4, air) => {
  const w2 = mixingRatioFrom(vaporPressure, pressure4, air.epsilon);
  return { text: "Mixing ratio", formula: `${symbol} = \\varepsilon\\,\\frac{${e}}{p - ${e}}`, filled: `${symbol} = ${texNumber(air.epsilon)} \\cdot \\frac{${texNumber(vaporPressure / 100)}}{${texNumber(pressure4 / 100, 6)} - ${texNumber(vaporPressure / 100)}} = ${inGrams(w2)}`, value: w2, unit: "1" };
};

// shared/thermo/pseudoadiabat.ts
var longestStep = 0.05;
var pseudoadiabaticSlope = (temperature6, pressure4, air) => slopeAt(temperature6, pressure4, air.es(temperature6), air);
function slopeAt(temperature6, pressure4, saturationPressure, air) {
  if (!(saturationPressure < pressure4)) throw new OutOfRangeError("temperature", temperature6, `temperatures whose saturation vapor pressure is below ${pressure4} Pa`);
  const w2 = air.epsilon * saturationPressure / (pressure4 - saturationPressure);
  const L = air.L(temperature6);
  const RT = air.R * temperature6;
  return (RT + L * w2) / (air.cp + L * L * w2 * air.epsilon / (RT * temperature6));
}
function pseudoadiabaticTemperature(temperature6, from2, to2, air, step = longestStep) {
  if (from2 === to2) return temperature6;
  const start5 = log(from2), whole = log(to2) - start5;
  const count = Math.ceil(Math.abs(whole) / step);
  const h = whole / count;
  let T11 = temperature6;
  let p10 = from2;
  for (let n = 1; n <= count; n++) {
    const middle = exp(start5 + (n - 0.5) * h);
    const next = n === count ? to2 : exp(start5 + n * h);
    const k1 = pseudoadiabaticSlope(T11, p10, air);
    const k2 = pseudoadiabaticSlope(T11 + 0.5 * h * k1, middle, air);
    const k3 = pseudoadiabaticSlope(T11 + 0.5 * h * k2, middle, air);
    const k4 = pseudoadiabaticSlope(T11 + h * k3, next, air);
    T11 += h / 6 * (k1 + 2 * k2 + 2 * k3 + k4);
    p10 = next;
  }
  return T11;
}

// shared/thermo/reversiblePath.ts
function reversibleTemperature(temperature6, from2, to2, totalWater, air) {
  const entropy = (T11, p10) => {
    const e = air.es(T11);
    return e < p10 ? (air.cp + totalWater * air.cw) * log(T11) - air.R * log(p10 - e) + air.L(T11) * mixingRatioFrom(e, p10, air.epsilon) / T11 : Infinity;
  };
  const kept = entropy(temperature6, from2);
  return findRoot((T11) => entropy(T11, to2) - kept, 130, 400);
}

// shared/thermo/quantities/adiabaticLiquidWater.ts
var lclOf = ({ given: given8, constants, formulae }) => lclFunction(constants, formulae)(given8("temperature"), given8("dewpoint"), given8("pressureStart"));
var waterOf = ({ given: given8, air }) => mixingRatioFrom(air.es(Math.min(given8("dewpoint"), given8("temperature"))), given8("pressureStart"), air.epsilon);
function endTemperature(hand) {
  const { given: given8, air, variant } = hand;
  const lcl = lclOf(hand), end = given8("pressureEnd");
  if (end >= lcl.pressure) return given8("temperature") * pow(end / given8("pressureStart"), air.kappa);
  return variant === "reversible" ? reversibleTemperature(lcl.temperature, lcl.pressure, end, waterOf(hand), air) : pseudoadiabaticTemperature(lcl.temperature, lcl.pressure, end, air);
}
function liquid(hand) {
  const { given: given8, air } = hand;
  if (given8("pressureEnd") > given8("pressureStart")) throw new OutOfRangeError("pressureEnd", given8("pressureEnd"), `pressures up to ${given8("pressureStart")} Pa, that of the start`);
  if (given8("pressureEnd") >= lclOf(hand).pressure) return 0;
  return waterOf(hand) - mixingRatioFrom(air.es(endTemperature(hand)), given8("pressureEnd"), air.epsilon);
}
var adiabaticLiquidWaterDefinition = moistQuantity({
  key: "adiabatic-liquid-water",
  name: "adiabatic liquid water mixing ratio",
  symbol: "w_l",
  unit: "1",
  shownUnit: "g/kg",
  kind: "ratio",
  nearZero: 1e-4,
  inputs: [
    { ...pressureInput2, name: "pressureStart", label: "pressure at the start", symbol: "p₁" },
    { ...temperatureInput2, label: "temperature at the start" },
    { ...dewpointInput, label: "dewpoint at the start" },
    { ...pressureInput2, name: "pressureEnd", label: "pressure at the end", symbol: "p₂" }
  ],
  variants: [
    { key: "pseudoadiabat", label: "with the temperature of the pseudoadiabat", source: { text: 'AMS Glossary of Meteorology, "adiabatic liquid water content"', status: "common practice" }, validity: "over liquid water", knownError: "1 % against the reversible path", value: liquid },
    { key: "reversible", label: "with the temperature of the reversible path", source: { text: 'AMS Glossary of Meteorology, "adiabatic liquid water content"; Emanuel (1994), Eq. 4.5.9', status: "common practice" }, validity: "over liquid water", knownError: "0.5 %", value: liquid }
  ],
  constants: ["R", "Rv", "cp", "kappa", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L", lclTemperatureKey],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  remarks: (hand, value23) => [foggy(hand.given("temperature"), hand.given("dewpoint")), value23 === 0 ? "The end lies below the condensation level: nothing has condensed." : null],
  ask: "The liquid water that has condensed per kilogram of dry air in a parcel lifted adiabatically, without mixing and without fallout, over liquid water.",
  working: (hand, value23) => {
    const { given: given8, air } = hand, lcl = lclOf(hand), T11 = endTemperature(hand), ws2 = mixingRatioFrom(air.es(T11), given8("pressureEnd"), air.epsilon);
    if (value23 === 0) return [{ text: "The end lies below the condensation level: nothing has condensed", formula: "w_l = 0", filled: `p_L = ${inHectopascal(lcl.pressure)},\\ w_l = 0` }];
    return [
      { text: "Mixing ratio at the start", formula: "w = w_s(T_d)", filled: `w = ${inGrams(waterOf(hand))}`, value: waterOf(hand), unit: "1" },
      { text: "Lifting condensation level", formula: "T_L,\\ p_L", filled: `T_L = ${inCelsius(lcl.temperature)},\\ p_L = ${inHectopascal(lcl.pressure)}`, value: lcl.temperature, unit: "K" },
      { text: "Temperature at the end, along the saturated adiabat", formula: "T_2", filled: `T_2 = ${inCelsius(T11)}`, value: T11, unit: "K" },
      { text: "What no longer stays vapor", formula: "w_l = w - w_s(T_2, p_2)", filled: `w_l = ${inGrams(waterOf(hand))} - ${inGrams(ws2)} = ${inGrams(value23)}` }
    ];
  },
  slips: [
    moistSlip("vapor", "vapor that is left", "This is the vapor that is left at the end: asked is what has condensed.", (hand) => hand.right === 0 ? null : waterOf(hand) - hand.right),
    fineMoistSlip("dry", "dry adiabat above the level", "This takes the temperature of the dry adiabat above the condensation level: it is too cold, and too much condenses.", (hand) => {
      const T11 = hand.given("temperature") * pow(hand.given("pressureEnd") / hand.given("pressureStart"), hand.air.kappa);
      return hand.right === 0 ? null : waterOf(hand) - mixingRatioFrom(hand.air.es(T11), hand.given("pressureEnd"), hand.air.epsilon);
    }),
    moistSlip("all", "all of its vapor", "This is the mixing ratio at the start: not all of it has condensed.", (hand) => waterOf(hand)),
    kilogramSlip
  ],
  example: { inputs: { pressureStart: 95e3, temperature: 293.15, dewpoint: 288.15, pressureEnd: 8e4 }, gives: 1689933e-9, within: 1e-8 }
});

// shared/thermo/convectiveCondensation.ts
var series2 = (name, label, symbol, range, order) => ({ name, label, symbol, unit: name === "pressure" ? "Pa" : "K", shownUnit: name === "pressure" ? "hPa" : "Cel", kind: name === "pressure" ? "ratio" : "temperature", shape: "series", range, needs: { least: 2, order } });
var inputs = [
  series2("pressure", "pressures of the rows, from the ground up", "p", [1e3, 11e4], "descending"),
  series2("temperature", "air temperatures of the rows", "T", [150, 340], "none"),
  series2("dewpoint", "dewpoints of the rows", "T_d", [130, 320], "none")
];
function convectiveLevel(pressures2, temperatures, surfaceDewpoint, air) {
  const surface = pressures2[0] ?? 0, e = air.es(surfaceDewpoint);
  if (!(e < surface)) throw new OutOfRangeError("dewpoint", surfaceDewpoint, `dewpoints whose vapor pressure is below ${surface} Pa`);
  const w2 = mixingRatioFrom(e, surface, air.epsilon);
  const excess = (T11, p10) => {
    const es = air.es(T11);
    return es < p10 ? mixingRatioFrom(es, p10, air.epsilon) - w2 : Infinity;
  };
  if (excess(temperatures[0] ?? 0, surface) <= 0) return { pressure: surface, temperature: temperatures[0] ?? 0, mixingRatio: w2, surfacePressure: surface };
  for (let at = 1; at < pressures2.length; at++) {
    const p10 = pressures2[at] ?? 0, T11 = temperatures[at] ?? 0;
    if (excess(T11, p10) > 0) continue;
    const low = log(pressures2[at - 1] ?? p10), high2 = log(p10), below = temperatures[at - 1] ?? T11;
    const between3 = (x) => below + (T11 - below) * (x - low) / (high2 - low);
    const root = findRoot((x) => excess(between3(x), exp(x)), low, high2);
    return { pressure: exp(root), temperature: between3(root), mixingRatio: w2, surfacePressure: surface };
  }
  return null;
}
var convectiveTemperatureOf = (level, kappa) => level.temperature * pow(level.surfacePressure / level.pressure, kappa);
function find(given8, constants, formulae) {
  const air = moistAir(constants, formulae);
  return { level: convectiveLevel(seriesOf(given8, "pressure"), seriesOf(given8, "temperature"), seriesOf(given8, "dewpoint")[0] ?? 0, air), air };
}
function convectiveDefinition({ value: value23, last, slips, ...named2 }) {
  const missing = "The data end before the sounding is as cold as saturation with the mixing ratio of the lowest row.";
  const outcome3 = (given8, constants, formulae) => {
    const { level, air } = find(given8, constants, formulae);
    return level ? { is: "value", value: value23(level, air), more: { pressure: level.pressure, temperature: level.temperature } } : { is: "not_reached", why: missing };
  };
  return {
    ...named2,
    inputs,
    variants: [{ key: "lowest-row", label: "moisture of the lowest row", source: { text: 'AMS Glossary of Meteorology, "convective condensation level"', status: "common practice" }, validity: "a sounding from the ground", knownError: "the spacing of the rows; 0.3 hPa by the formula of eₛ", evaluate: outcome3 }],
    constants: ["R", "Rv", "cp", "kappa", "enhancementFactor"],
    uses: [overWaterKey],
    notes: (given8, _constants, formulae) => saturationNotes(seriesOf(given8, "dewpoint").slice(0, 1), formulae),
    trace(given8, constants, _variant, formulae) {
      const { level, air } = find(given8, constants, formulae);
      if (!level) return [{ text: missing, formula: "w_s(T(p), p) > w", filled: "\\text{not reached}" }];
      const result2 = value23(level, air);
      return [
        { text: "Mixing ratio of the lowest row", formula: "w = w_s(T_{d0}, p_0)", filled: `w = ${inGrams(level.mixingRatio)}`, value: level.mixingRatio, unit: "1" },
        { text: "Where the sounding is as cold as saturation with it; T linear in ln p between rows", formula: "w_s(T(p), p) = w", filled: `p = ${inHectopascal(level.pressure)},\\ T = ${inCelsius(level.temperature)}`, value: level.pressure, unit: "Pa" },
        ...named2.unit === "Pa" ? [] : [last(level, air, result2)]
      ].map((step, at, all) => at === all.length - 1 ? { ...step, value: result2, unit: named2.unit } : step);
    },
    slips: slips(find)
  };
}
var downStep = (level, air, value23) => ({ text: "Down the dry adiabat to the ground", formula: "T_c = T\\left(\\frac{p_0}{p}\\right)^{\\kappa}", filled: `T_c = ${texNumber(level.temperature, 6)}\\left(\\frac{${texNumber(level.surfacePressure / 100, 6)}}{${texNumber(level.pressure / 100, 6)}}\\right)^{${texNumber(air.kappa)}} = ${inCelsius(value23)}` });

// shared/thermo/quantities/convectiveCondensationLevelPressure.ts
var convectiveCondensationLevelPressureDefinition = convectiveDefinition({
  key: "convective-condensation-level-pressure",
  name: "pressure at the convective condensation level",
  symbol: "p_ccl",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  ask: 'The pressure at the convective condensation level: the lowest level at which the sounding is as cold as saturation with the mixing ratio of its lowest row; temperature linear in ln p between rows; "not reached" where the data end before it.',
  value: (level) => level.pressure,
  last: downStep,
  slips: (find2) => [
    fineSlip("lifted", "lifting condensation level", "This is the lifting condensation level of the lowest row: it is lifted there without being heated first.", (inputs2, constants, _right, formulae) => lclFunction(constants, formulae)(seriesOf(inputs2, "temperature")[0] ?? 0, seriesOf(inputs2, "dewpoint")[0] ?? 0, seriesOf(inputs2, "pressure")[0] ?? 0).pressure),
    fineSlip("row-below", "row below in place of interpolation", "This is the last row below the level: the ask interpolates between rows.", (inputs2, constants, _right, formulae) => {
      const { level } = find2(inputs2, constants, formulae);
      const rows = seriesOf(inputs2, "pressure").filter((p10) => level && p10 > level.pressure);
      return rows[rows.length - 1] ?? null;
    }),
    fineSlip("row-above", "row above in place of interpolation", "This is the first row above the level: the ask interpolates between rows.", (inputs2, constants, _right, formulae) => {
      const { level } = find2(inputs2, constants, formulae);
      return seriesOf(inputs2, "pressure").find((p10) => level && p10 < level.pressure) ?? null;
    }),
    slip("pascal-for-hectopascal", "Pa given as hPa", "Your number is in pascal; the unit beside it says hectopascal.", (_i, _c, right) => right * 100)
  ],
  example: { inputs: { pressure: [99300, 95700, 92500, 88600, 85e3, 81300, 79800, 73200, 71600, 7e4], temperature: [307.75, 304.25, 300.95, 297.45, 294.55, 292.75, 291.85, 286.15, 286.65, 286.15], dewpoint: [292.75, 291.85, 290.95, 289.45, 285.55, 272.75, 269.35, 267.15, 259.95, 262.15] }, gives: 75834.8, within: 60 }
});

// shared/thermo/quantities/convectiveTemperature.ts
var convectiveTemperatureDefinition = convectiveDefinition({
  key: "convective-temperature",
  name: "convective temperature",
  symbol: "T_c",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  ask: 'The convective temperature: from the convective condensation level of the lowest row’s mixing ratio down the dry adiabat to the pressure of the lowest row; "not reached" where the data end before the level.',
  value: (level, air) => convectiveTemperatureOf(level, air.kappa),
  last: downStep,
  slips: (find2) => [
    fineSlip("at-level", "temperature at the level", "This is the temperature at the convective condensation level: it is still to be taken down the dry adiabat to the ground.", (inputs2, constants, _right, formulae) => find2(inputs2, constants, formulae).level?.temperature ?? null),
    fineSlip("to-1000", "down to 1000 hPa", "This goes down to 1000 hPa: the ground is at the pressure of the lowest row.", (inputs2, constants, right, formulae) => {
      const { level, air } = find2(inputs2, constants, formulae);
      return level && level.surfacePressure !== 1e5 ? right * pow(1e5 / level.surfacePressure, air.kappa) : null;
    }),
    fineSlip("surface", "temperature of the lowest row", "This is the temperature of the lowest row as it is: asked is what it has to become.", (inputs2) => seriesOf(inputs2, "temperature")[0] ?? null),
    slip("end-unit", "kelvin and °C mixed up", "Your number is in kelvin; the unit beside it says °C.", (_i, _c, right) => right + zeroCelsius)
  ],
  example: { inputs: { pressure: [99300, 95700, 92500, 88600, 85e3, 81300, 79800, 73200, 71600, 7e4], temperature: [307.75, 304.25, 300.95, 297.45, 294.55, 292.75, 291.85, 286.15, 286.65, 286.15], dewpoint: [292.75, 291.85, 290.95, 289.45, 285.55, 272.75, 269.35, 267.15, 259.95, 262.15] }, gives: 311.58, within: 0.1 }
});

// shared/thermo/equivalentPotential.ts
function bolton39(temperature6, lclTemperature, pressure4, vaporPressure, mixingRatio, kappa) {
  const dry = temperature6 * pow(1e5 / (pressure4 - vaporPressure), kappa) * pow(temperature6 / lclTemperature, 0.28 * mixingRatio);
  return dry * exp((3036 / lclTemperature - 1.78) * mixingRatio * (1 + 0.448 * mixingRatio));
}
function bolton43(temperature6, lclTemperature, pressure4, mixingRatio) {
  return temperature6 * pow(1e5 / pressure4, 0.2854 * (1 - 0.28 * mixingRatio)) * exp((3376 / lclTemperature - 2.54) * mixingRatio * (1 + 0.81 * mixingRatio));
}
function equivalentPotentialTemperature(temperature6, dewpoint, pressure4, air, variant) {
  const e = air.es(dewpoint), w2 = mixingRatioFrom(e, pressure4, air.epsilon);
  const lcl = dewpoint >= temperature6 ? temperature6 : boltonLclTemperature(temperature6, dewpoint);
  return variant === "bolton-43" ? bolton43(temperature6, lcl, pressure4, w2) : bolton39(temperature6, lcl, pressure4, e, w2, air.kappa);
}
function equivalentShortcut(temperature6, dewpoint, pressure4, air) {
  const w2 = mixingRatioFrom(air.es(dewpoint), pressure4, air.epsilon);
  return temperature6 * pow(1e5 / pressure4, air.kappa) * exp(air.L(temperature6) * w2 / (air.cp * temperature6));
}
function daviesJonesWetBulbPotential(equivalentPotential) {
  const x = equivalentPotential / 273.15;
  const above = 7.101574 + x * (-20.68208 + x * (16.11182 + x * (2.574631 - x * 5.205688)));
  const below = 1 + x * (-3.552497 + x * (3.781782 + x * (-0.6899655 - x * 0.592934)));
  return equivalentPotential - exp(above / below);
}

// shared/thermo/quantities/equivalentPotentialTemperature.ts
var by = ({ given: given8, air }, variant) => equivalentPotentialTemperature(given8("temperature"), given8("dewpoint"), given8("pressure"), air, variant);
var wOf = ({ given: given8, air }, T11 = given8("dewpoint")) => mixingRatioFrom(air.es(T11), given8("pressure"), air.epsilon);
var bolton = (equation) => ({ text: `Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. ${equation}`, status: "verified" });
var equivalentPotentialTemperatureDefinition = moistQuantity({
  key: "equivalent-potential-temperature",
  name: "equivalent potential temperature",
  symbol: "θe",
  unit: "K",
  shownUnit: "K",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [
    { key: "bolton-39", label: "Bolton’s equation 39", source: bolton("39"), validity: "θe below 480 K", knownError: "0.02 K", value: (hand) => by(hand, "bolton-39") },
    { key: "bolton-43", label: "Bolton’s equation 43", source: bolton("43"), validity: "θe below 380 K", knownError: "0.3 K, 2 K above 420 K", value: (hand) => by(hand, "bolton-43") }
  ],
  constants: ["R", "Rv", "cp", "kappa", "cpv", "latentHeat", "cw", "enhancementFactor"],
  // the latent heat enters slips alone: the shortcut is as wide as those that are taught
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  remarks: ({ given: given8 }) => [foggy(given8("temperature"), given8("dewpoint"))],
  ask: "The equivalent potential temperature θe by Bolton’s formula, with the temperature at the condensation level, referred to 1000 hPa; not θ exp(Lw/cpT).",
  working: (hand, value23) => {
    const { given: given8, air, variant } = hand;
    const T11 = given8("temperature"), Td = Math.min(given8("dewpoint"), T11), e = air.es(given8("dewpoint")), TL = Td < T11 ? boltonLclTemperature(T11, Td) : T11;
    const formula = variant === "bolton-43" ? "\\theta_e = T\\left(\\frac{p_0}{p}\\right)^{0.2854\\,(1 - 0.28\\,w)}\\exp\\left[\\left(\\frac{3376}{T_L} - 2.54\\right) w\\,(1 + 0.81\\,w)\\right]" : "\\theta_e = T\\left(\\frac{p_0}{p - e}\\right)^{\\kappa}\\left(\\frac{T}{T_L}\\right)^{0.28\\,w}\\exp\\left[\\left(\\frac{3036}{T_L} - 1.78\\right) w\\,(1 + 0.448\\,w)\\right]";
    return [
      { ...mixingRatioStep("w", "e", e, given8("pressure"), air), text: "Mixing ratio, with e = es(Td)" },
      { text: "Temperature at the condensation level", formula: "T_L = \\frac{1}{\\frac{1}{T_d - 56} + \\frac{\\ln(T/T_d)}{800}} + 56", filled: `T_L = ${inKelvin(TL)}`, value: TL, unit: "K" },
      { text: "Bolton’s formula, with w in kg per kg", formula, filled: `\\theta_e = ${inKelvin(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("shortcut", "θ exp(Lw/cpT)", "This is the shortcut θ exp(Lw/cpT), with the temperature of the parcel: asked is Bolton’s formula with that of the condensation level.", ({ given: given8, air }) => equivalentShortcut(given8("temperature"), given8("dewpoint"), given8("pressure"), air)),
    fineMoistSlip("at-parcel", "temperature of the parcel for that at the level", "This takes the temperature of the parcel in place of that at its condensation level.", (hand) => {
      const T11 = hand.given("temperature"), w2 = wOf(hand);
      return hand.given("dewpoint") >= T11 ? null : T11 * pow(1e5 / hand.given("pressure"), 0.2854 * (1 - 0.28 * w2)) * exp((3376 / T11 - 2.54) * w2 * (1 + 0.81 * w2));
    }),
    fineMoistSlip("saturated", "w at T for w at Td", "This takes the saturation mixing ratio at the temperature: that gives the saturation equivalent potential temperature.", ({ given: given8, again }) => given8("dewpoint") === given8("temperature") ? null : again({ dewpoint: given8("temperature") })),
    fineMoistSlip("theta", "potential temperature", "This is the potential temperature: the latent heat of the vapor is not in it, or all but vanishes by w in kg per kg in a formula that takes g per kg.", ({ given: given8, air }) => given8("temperature") * pow(1e5 / given8("pressure"), air.kappa)),
    moistSlip("standard-pressure", "1013.25 hPa for 1000 hPa", "This refers to 1013.25 hPa: θe refers to 1000 hPa.", ({ air, right }) => right * pow(1.01325, air.kappa)),
    moistSlip("celsius-exponential", "Celsius put in for kelvin in the exponential", "This comes from the shortcut with the temperature in °C in the exponential.", (hand) => {
      const t = hand.given("temperature") - zeroCelsius, value23 = hand.given("temperature") * pow(1e5 / hand.given("pressure"), hand.air.kappa) * exp(Math.min(50, hand.air.L(hand.given("temperature")) * wOf(hand) / (hand.air.cp * t)));
      return t > 3 && value23 < 1e6 ? value23 : null;
    }),
    celsiusAsKelvinSlip
  ],
  example: { inputs: { pressure: 85e3, temperature: 293.15, dewpoint: 291.15 }, gives: 353.9419, within: 1e-4 }
});

// shared/thermo/quantities/equivalentPotentialTemperatureShortcut.ts
var equivalentPotentialTemperatureShortcutDefinition = moistQuantity({
  key: "equivalent-potential-temperature-shortcut",
  name: "equivalent potential temperature by the shortcut θ exp(Lw/cpT)",
  symbol: "θ exp(Lw/cpT)",
  unit: "K",
  shownUnit: "K",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [{ key: "parcel", label: "with the temperature of the parcel", source: { text: "common practice: θ exp[L w/(cp T)] as textbooks print it", status: "common practice" }, validity: "as an approximation", knownError: "0.1 to 16 K below θe", value: ({ given: given8, air }) => equivalentShortcut(given8("temperature"), given8("dewpoint"), given8("pressure"), air) }],
  constants: ["R", "Rv", "cp", "kappa", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("dewpoint")], L: (given8) => [given8("temperature")] },
  remarks: ({ given: given8 }) => [foggy(given8("temperature"), given8("dewpoint"))],
  ask: "The shortcut θ exp(Lw/cpT) for the equivalent potential temperature, with the mixing ratio and the temperature of the parcel itself.",
  working: ({ given: given8, air }, value23) => {
    const T11 = given8("temperature"), theta5 = T11 * pow(1e5 / given8("pressure"), air.kappa), w2 = mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon), L = air.L(T11);
    return [
      { ...mixingRatioStep("w", "e", air.es(given8("dewpoint")), given8("pressure"), air), text: "Mixing ratio, with e = es(Td)" },
      { text: "Potential temperature", formula: "\\theta = T\\,(p_0/p)^{\\kappa}", filled: `\\theta = ${inKelvin(theta5)}`, value: theta5, unit: "K" },
      { text: "With the latent heat of all its vapor", formula: "\\theta \\exp\\frac{L\\,w}{c_p\\,T}", filled: `${texNumber(theta5, 6)} \\exp\\frac{${texNumber(L, 6)} \\cdot ${texNumber(w2)}}{${texNumber(air.cp, 6)} \\cdot ${texNumber(T11, 6)}} = ${inKelvin(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("bolton", "Bolton’s θe", "This is the equivalent potential temperature by Bolton’s formula: asked is the shortcut.", ({ given: given8, air }) => equivalentPotentialTemperature(given8("temperature"), given8("dewpoint"), given8("pressure"), air)),
    fineMoistSlip("theta", "potential temperature", "This is the potential temperature: the latent heat of the vapor is not in it.", ({ given: given8, air }) => given8("temperature") * pow(1e5 / given8("pressure"), air.kappa)),
    fineMoistSlip("saturated", "w at T for w at Td", "This takes the saturation mixing ratio at the temperature.", ({ given: given8, again }) => given8("dewpoint") === given8("temperature") ? null : again({ dewpoint: given8("temperature") })),
    celsiusAsKelvinSlip
  ],
  example: { inputs: { pressure: 85e3, temperature: 293.15, dewpoint: 291.15 }, gives: 349.3488, within: 1e-4 }
});

// shared/thermo/sources.ts
var glossary = (entry, status = "verified") => ({ text: `AMS Glossary of Meteorology, "${entry}"`, status });
var wmoHumidity = { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, chapter 4 and Annex 4.A", status: "common practice" };

// shared/thermo/isobaricMixingDefinition.ts
var first2 = "First";
var second2 = "Second";
var massOf = ({ given: given8 }, which) => given8(`mass${which}`);
var shareOf = (hand) => massOf(hand, first2) / (massOf(hand, first2) + massOf(hand, second2));
var vaporOf = ({ given: given8, air }, which) => given8(`relativeHumidity${which}`) * air.es(given8(`temperature${which}`));
var humidityOf = (hand, which) => specificHumidityFrom(mixingRatioFrom(vaporOf(hand, which), hand.given("pressure"), hand.air.epsilon));
var blend = (hand, a, b) => shareOf(hand) * a + (1 - shareOf(hand)) * b;
var mixedTemperature = (hand) => blend(hand, hand.given("temperatureFirst"), hand.given("temperatureSecond"));
function mixedVaporPressure(hand) {
  if (hand.variant === "mean-vapor-pressure") return blend(hand, vaporOf(hand, first2), vaporOf(hand, second2));
  const q2 = blend(hand, humidityOf(hand, first2), humidityOf(hand, second2)), { epsilon } = hand.air;
  return q2 * hand.given("pressure") / (epsilon + (1 - epsilon) * q2);
}
var mass = (which, words2) => ({ name: `mass${which}`, label: `mass of the ${words2} air`, symbol: words2 === "first" ? "m₁" : "m₂", unit: "kg", shownUnit: "kg", kind: "ratio", shape: "number", range: [1e-3, 1e9] });
var temperature3 = (which, words2) => ({ ...temperatureInput2, name: `temperature${which}`, label: `temperature of the ${words2} air`, symbol: words2 === "first" ? "T₁" : "T₂" });
var humidity = (which, words2) => ({ ...relativeHumidityInput, name: `relativeHumidity${which}`, label: `relative humidity of the ${words2} air, e/es`, symbol: words2 === "first" ? "RH₁" : "RH₂" });
function isobaricMixingDefinition({ part, slips, ...named2 }) {
  const isMoist = part !== "temperature";
  const relative = (hand) => mixedVaporPressure(hand) / hand.air.es(mixedTemperature(hand));
  const value23 = (hand) => part === "temperature" ? mixedTemperature(hand) : part === "vapor-pressure" ? mixedVaporPressure(hand) : relative(hand);
  return moistQuantity({
    ...named2,
    inputs: [mass(first2, "first"), temperature3(first2, "first"), mass(second2, "second"), temperature3(second2, "second"), ...isMoist ? [humidity(first2, "first"), humidity(second2, "second"), pressureInput2] : []],
    variants: isMoist ? [
      { key: "vapor-kept", label: "mean of the specific humidities by mass", source: glossary("mixing cloud", "common practice"), validity: "mixing at one pressure without condensation", knownError: "0.2 % by the heat capacity of the vapor", value: value23 },
      { key: "mean-vapor-pressure", label: "mean of the vapor pressures by mass", source: { text: "common practice: the straight line between two states in a diagram of e on T", status: "common practice" }, validity: "mixing at one pressure without condensation", knownError: "1 %", value: value23 }
    ] : [{ key: "by-mass", label: "mean of the temperatures by mass", source: glossary("mixing cloud", "common practice"), validity: "mixing at one pressure without condensation", knownError: "0.1 K by the heat capacity of the vapor", value: value23 }],
    constants: isMoist ? part === "vapor-pressure" ? ["R", "Rv", "enhancementFactor"] : ["R", "Rv"] : [],
    inside: isMoist ? ["es"] : [],
    notedAt: isMoist ? { es: (given8) => [given8("temperatureFirst"), given8("temperatureSecond")] } : {},
    remarks: (hand) => isMoist ? [supersaturated(relative(hand))] : [],
    working: (hand, result2) => {
      const T11 = mixedTemperature(hand), m1 = massOf(hand, first2), m2 = massOf(hand, second2);
      const temperatureStep = { text: "Temperature of the mixture, by mass", formula: "T = \\frac{m_1 T_1 + m_2 T_2}{m_1 + m_2}", filled: `T = \\frac{${texNumber(m1)} \\cdot ${texNumber(hand.given("temperatureFirst"), 6)} + ${texNumber(m2)} \\cdot ${texNumber(hand.given("temperatureSecond"), 6)}}{${texNumber(m1)} + ${texNumber(m2)}} = ${texQuantity(T11, "K", 6)} = ${inCelsius(T11)}`, value: T11, unit: "K" };
      if (!isMoist) return [temperatureStep];
      const e = mixedVaporPressure(hand);
      const vaporStep = {
        text: hand.variant === "mean-vapor-pressure" ? "Vapor pressure of the mixture, by mass" : "Vapor pressure of the mixture: the vapor is kept",
        formula: hand.variant === "mean-vapor-pressure" ? "e = \\frac{m_1 e_1 + m_2 e_2}{m_1 + m_2}" : "q = \\frac{m_1 q_1 + m_2 q_2}{m_1 + m_2},\\ e = \\frac{q\\,p}{\\varepsilon + (1 - \\varepsilon)\\,q}",
        filled: `e_1 = ${inHectopascal(vaporOf(hand, first2))},\\ e_2 = ${inHectopascal(vaporOf(hand, second2))},\\ e = ${inHectopascal(e)}`,
        value: e,
        unit: "Pa"
      };
      if (part === "vapor-pressure") return [vaporStep];
      return [temperatureStep, vaporStep, { text: "Over saturation at the temperature of the mixture; above 100 % it is supersaturated", formula: "\\mathit{RH} = \\frac{e}{e_s(T)}", filled: `\\mathit{RH} = \\frac{${texNumber(e / 100)}}{${texNumber(hand.air.es(T11) / 100)}} = ${texQuantity(result2 * 100, "%")}` }];
    },
    slips
  });
}

// shared/thermo/quantities/isobaricMixingRelativeHumidity.ts
var isobaricMixingRelativeHumidityDefinition = isobaricMixingDefinition({
  key: "isobaric-mixing-relative-humidity",
  name: "relative humidity after isobaric mixing",
  symbol: "RH",
  unit: "1",
  shownUnit: "%",
  kind: "fraction",
  part: "relative-humidity",
  ask: "The relative humidity e/es over liquid water of the mixture of the two bodies of air at one pressure, before anything condenses: it may be above 100 %.",
  slips: [
    fineMoistSlip("mean-humidity", "mean of the relative humidities", "This is the mean of the relative humidities: vapor is kept, relative humidity is not.", (hand) => shareOf(hand) * hand.given("relativeHumidityFirst") + (1 - shareOf(hand)) * hand.given("relativeHumiditySecond")),
    fineMoistSlip("cut-off", "cut off at 100 %", "This stops at 100 %: before anything condenses the mixture is supersaturated, and that is asked.", ({ right }) => right > 1.0005 ? 1 : null),
    fineMoistSlip("masses-swapped", "masses swapped", "This comes from the masses in each other’s place.", ({ given: given8, again }) => given8("massFirst") === given8("massSecond") ? null : again({ massFirst: given8("massSecond"), massSecond: given8("massFirst") })),
    fractionAsPercentSlip
  ],
  example: { inputs: { massFirst: 1, temperatureFirst: 273.15, massSecond: 1, temperatureSecond: 303.15, relativeHumidityFirst: 1, relativeHumiditySecond: 0.8, pressure: 1e5 }, gives: 1.1802588, within: 1e-6 }
});

// shared/thermo/quantities/isobaricMixingTemperature.ts
var isobaricMixingTemperatureDefinition = isobaricMixingDefinition({
  key: "isobaric-mixing-temperature",
  name: "temperature after isobaric mixing",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  part: "temperature",
  ask: "The temperature of the mixture of the two bodies of air at one pressure, before anything condenses.",
  slips: [
    fineMoistSlip("plain-mean", "mean without the masses", "This is the plain mean: the masses differ.", ({ given: given8 }) => given8("massFirst") === given8("massSecond") ? null : (given8("temperatureFirst") + given8("temperatureSecond")) / 2),
    fineMoistSlip("masses-swapped", "masses swapped", "This comes from the masses in each other’s place.", ({ given: given8, again }) => given8("massFirst") === given8("massSecond") ? null : again({ massFirst: given8("massSecond"), massSecond: given8("massFirst") })),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { massFirst: 1, temperatureFirst: 273.15, massSecond: 1, temperatureSecond: 303.15 }, gives: 288.15, within: 1e-9 }
});

// shared/thermo/quantities/isobaricMixingVaporPressure.ts
var isobaricMixingVaporPressureDefinition = isobaricMixingDefinition({
  key: "isobaric-mixing-vapor-pressure",
  name: "vapor pressure after isobaric mixing",
  symbol: "e",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  part: "vapor-pressure",
  ask: "The vapor pressure of the mixture of the two bodies of air at one pressure, before anything condenses: it may be supersaturated.",
  slips: [
    fineMoistSlip("mean-humidity", "mean of the relative humidities", "This comes from the mean of the relative humidities at the mean temperature: vapor is kept, relative humidity is not.", (hand) => {
      const share = hand.given("massFirst") / (hand.given("massFirst") + hand.given("massSecond"));
      return (share * hand.given("relativeHumidityFirst") + (1 - share) * hand.given("relativeHumiditySecond")) * hand.air.es(mixedTemperature(hand));
    }),
    fineMoistSlip("plain-mean", "mean without the masses", "This is the plain mean of the vapor pressures: the masses differ.", (hand) => hand.given("massFirst") === hand.given("massSecond") ? null : (vaporOf(hand, "First") + vaporOf(hand, "Second")) / 2),
    fineMoistSlip("saturation", "saturation at the mixture’s temperature", "This is saturation at the temperature of the mixture: what it holds is the mean of what the two held.", (hand) => hand.air.es(mixedTemperature(hand))),
    fineMoistSlip("masses-swapped", "masses swapped", "This comes from the masses in each other’s place.", ({ given: given8, again }) => given8("massFirst") === given8("massSecond") ? null : again({ massFirst: given8("massSecond"), massSecond: given8("massFirst") })),
    pascalSlip,
    kilopascalSlip
  ],
  example: { inputs: { massFirst: 1, temperatureFirst: 273.15, massSecond: 1, temperatureSecond: 303.15, relativeHumidityFirst: 1, relativeHumiditySecond: 0.8, pressure: 1e5 }, gives: 2011.219, within: 1e-3 }
});

// shared/thermo/lclDefinition.ts
var lclOf2 = ({ given: given8, constants, formulae, variant }) => lclFunction(constants, formulae, variant)(given8("temperature"), given8("dewpoint"), given8("pressure"));
var solution = {
  bolton: { text: "Temperature at the level, by Bolton’s equation 15", formula: "T_L = \\frac{1}{\\frac{1}{T_d - 56} + \\frac{\\ln(T/T_d)}{800}} + 56" },
  romps: { text: "Temperature at the level, by Romps’ closed form", formula: "T_L = c\\,\\left[W_{-1}\\left(\\mathit{RH}^{1/a}\\,c\\,e^{c}\\right)\\right]^{-1} T" },
  solved: { text: "Where the mixing ratio is that of saturation along the dry adiabat, found by a bracket", formula: "w_s\\left(T_L,\\ p\\,(T_L/T)^{1/\\kappa}\\right) = w" }
};
function lclDefinition({ part, more = [], slips, ...named2 }) {
  const value23 = (hand) => lclOf2(hand)[part];
  const bolton2 = { key: "bolton", label: "Bolton (1980), Eq. 15", source: { text: "Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 15", status: "verified" }, validity: "temperatures of −35 to 35 °C", knownError: "0.1 K, 0.8 hPa; the height by the dry rate 1 % low", holds: { temperature: [238.15, 308.15] }, value: value23 };
  const romps2 = { key: "romps", label: "Romps (2017), Eq. 22", source: { text: "Romps (2017), J. Atmos. Sci. 74, 3891–3900, Eq. 22, with its constants", status: "verified" }, validity: "unsaturated air", knownError: "5 m", value: value23 };
  const solved2 = { key: "solved", label: "w = wₛ along the dry adiabat", source: { text: 'AMS Glossary of Meteorology, "lifting condensation level", solved by a bracket', status: "common practice" }, validity: "unsaturated air", knownError: "0.1 K by the formula of eₛ; the height by the dry rate 1 % low", value: value23 };
  return moistQuantity({
    ...named2,
    inputs: [pressureInput2, temperatureInput2, dewpointInput],
    // the height of the vapor's own heat capacity first: the dry one leaves it 1 % low
    variants: [...part === "heightAboveStart" ? [romps2, bolton2] : [bolton2, romps2], solved2, ...more],
    constants: part === "heightAboveStart" ? ["R", "Rv", "cp", "g", "kappa"] : ["R", "Rv", "cp", "kappa"],
    inside: ["es"],
    remarks: ({ given: given8 }) => [foggy(given8("temperature"), given8("dewpoint"))],
    working: (hand, value24) => {
      const { given: given8, air, variant } = hand;
      if (variant === "espy") return [{ text: "The 125 m per kelvin rule", formula: "z_L = 125\\,(T - T_d)", filled: `z_L = 125 \\cdot ${texNumber(given8("temperature") - given8("dewpoint"))} = ${texQuantity(value24, "m")}` }];
      const lcl = lclOf2(hand), how = solution[variant] ?? solution.bolton;
      const first3 = { text: how?.text ?? "", formula: how?.formula ?? "", filled: `T_L = ${texQuantity(lcl.temperature, "K", 6)} = ${inCelsius(lcl.temperature)}`, value: lcl.temperature, unit: "K" };
      const exponent2 = variant === "romps" ? "c_{pm}/R_m" : "1/\\kappa";
      if (part === "temperature") return [first3];
      if (part === "pressure") return [first3, { text: "Along the dry adiabat, with the temperatures in kelvin", formula: `p_L = p\\left(\\frac{T_L}{T}\\right)^{${exponent2}}`, filled: `p_L = ${texNumber(given8("pressure") / 100, 6)}\\left(\\frac{${texNumber(lcl.temperature, 6)}}{${texNumber(given8("temperature"), 6)}}\\right)^{${exponent2}} = ${inHectopascal(value24)}` }];
      return [first3, { text: "At the dry adiabatic lapse rate, above the parcel’s start", formula: variant === "romps" ? "z_L = \\frac{c_{pm}}{g}\\,(T - T_L)" : "z_L = \\frac{c_p}{g}\\,(T - T_L)", filled: `z_L = ${variant === "romps" ? "\\frac{c_{pm}}{g}" : `\\frac{${texNumber(air.cp, 6)}}{${texNumber(air.g, 6)}}`} \\cdot ${texNumber(given8("temperature") - lcl.temperature)} = ${texQuantity(value24, "m")}` }];
    },
    slips
  });
}

// shared/thermo/quantities/liftingCondensationLevelHeight.ts
var liftingCondensationLevelHeightDefinition = lclDefinition({
  key: "lifting-condensation-level-height",
  name: "height of the lifting condensation level above the start",
  symbol: "z_L",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 50,
  part: "heightAboveStart",
  more: [{ key: "espy", label: "the 125 m per kelvin rule", source: { text: "Lawrence (2005), Bull. Amer. Meteor. Soc. 86, 225–233", status: "from memory" }, validity: "RH above 50 %", knownError: "1 to 3 %", value: ({ given: given8 }) => 125 * Math.max(0, given8("temperature") - given8("dewpoint")) }],
  ask: "The height of the lifting condensation level above the parcel’s start, lifted without mixing; above ground or sea level it is the start’s height more.",
  slips: [
    fineMoistSlip("whole-spread", "T − Td at Γd", "This takes the whole of T − Td at the dry adiabatic lapse rate: the dewpoint falls too as the parcel rises.", ({ given: given8, air }) => given8("dewpoint") >= given8("temperature") ? null : air.cp / air.g * (given8("temperature") - given8("dewpoint"))),
    moistSlip("feet-for-meters", "feet given as meters", "Your number is in feet; the unit beside it says meters.", ({ right }) => right / 0.3048),
    moistSlip("kilometers-for-meters", "km given as m", "Your number is in kilometers; the unit beside it says meters.", ({ right }) => right / 1e3),
    moistSlip("standard-atmosphere", "6.5 K km⁻¹ for Γd", "This comes from 6.5 K km⁻¹, the mean rate of the standard atmosphere: an unsaturated parcel cools at Γd.", ({ right, air }) => right * (air.g / air.cp) / 65e-4)
  ],
  example: { inputs: { pressure: 1e5, temperature: 293.15, dewpoint: 285.15 }, gives: 1011.791, within: 0.01 }
});

// shared/thermo/quantities/liftingCondensationLevelPressure.ts
var liftingCondensationLevelPressureDefinition = lclDefinition({
  key: "lifting-condensation-level-pressure",
  name: "pressure at the lifting condensation level",
  symbol: "p_L",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  part: "pressure",
  ask: "The pressure at the lifting condensation level of a parcel lifted dry-adiabatically from the start.",
  slips: [
    fineMoistSlip("from-1000", "1000 hPa for the start", "This starts from 1000 hPa: the parcel starts at the pressure given.", ({ given: given8, right }) => given8("pressure") === 1e5 ? null : right * 1e5 / given8("pressure")),
    fineMoistSlip("dewpoint", "dewpoint for the temperature at the level", "This comes from the dewpoint at the start in place of the temperature at the level.", ({ given: given8, air }) => given8("dewpoint") >= given8("temperature") ? null : given8("pressure") * pow(given8("dewpoint") / given8("temperature"), 1 / air.kappa)),
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This comes from temperatures in °C: Poisson’s relation takes kelvin.", (hand) => {
      const T11 = hand.given("temperature") - zeroCelsius, TL = lclOf2(hand).temperature - zeroCelsius;
      return T11 > 0 && TL > 0 && TL < T11 ? hand.given("pressure") * pow(TL / T11, 1 / hand.air.kappa) : null;
    }),
    moistSlip("inverted-exponent", "exponent turned round", "This comes from the exponent κ in place of 1/κ.", (hand) => hand.given("dewpoint") >= hand.given("temperature") ? null : hand.given("pressure") * pow(lclOf2(hand).temperature / hand.given("temperature"), hand.air.kappa)),
    moistSlip("inverted-ratio", "ratio turned round", "This lies below the start: the ratio of the temperatures is turned round.", ({ given: given8, right }) => given8("dewpoint") >= given8("temperature") ? null : given8("pressure") * given8("pressure") / right),
    pascalSlip,
    kilopascalSlip
  ],
  example: { inputs: { pressure: 94300, temperature: 306.15, dewpoint: 301.15 }, gives: 87755, within: 1 }
});

// shared/thermo/quantities/liftingCondensationLevelTemperature.ts
var liftingCondensationLevelTemperatureDefinition = lclDefinition({
  key: "lifting-condensation-level-temperature",
  name: "temperature at the lifting condensation level",
  symbol: "T_L",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  part: "temperature",
  ask: "The temperature of the parcel at its lifting condensation level, lifted dry-adiabatically from the start.",
  slips: [
    fineMoistSlip("dewpoint", "dewpoint at the start", "This is the dewpoint at the start: it falls as the parcel rises, by about 2 K per km.", ({ given: given8 }) => given8("dewpoint") >= given8("temperature") ? null : given8("dewpoint")),
    fineMoistSlip("mean", "mean of temperature and dewpoint", "This is the mean of temperature and dewpoint.", ({ given: given8 }) => given8("dewpoint") >= given8("temperature") ? null : (given8("temperature") + given8("dewpoint")) / 2),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressure: 94300, temperature: 306.15, dewpoint: 301.15 }, gives: 299.919, within: 1e-3 }
});

// shared/thermo/quantities/moistStaticEnergy.ts
var moistStaticEnergyDefinition = moistQuantity({
  key: "moist-static-energy",
  name: "moist static energy",
  symbol: "h",
  unit: "J/kg",
  shownUnit: "kJ/kg",
  kind: "ratio",
  inputs: [
    temperatureInput2,
    { name: "heightAboveDatum", label: "height above the datum", symbol: "z", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [-500, 3e4] },
    { ...mixingRatioInput, name: "specificHumidity", label: "specific humidity", symbol: "q", range: [0, 0.1] }
  ],
  variants: [{ key: "sum", label: "cp T + g z + L q", source: glossary("moist static energy", "common practice"), validity: "hydrostatic air", knownError: "0.7 kJ kg⁻¹ by cp and L", value: ({ given: given8, air }) => air.cp * given8("temperature") + air.g * given8("heightAboveDatum") + air.L(given8("temperature")) * given8("specificHumidity") }],
  constants: ["cp", "g", "cpv", "latentHeat", "cw"],
  inside: ["L"],
  notedAt: { L: (given8) => [given8("temperature")] },
  ask: "The moist static energy cp T + g z + L q per kilogram, with T in kelvin, z above the datum and the specific humidity.",
  working: ({ given: given8, air }, value23) => {
    const T11 = given8("temperature"), z4 = given8("heightAboveDatum"), q2 = given8("specificHumidity"), L = air.L(T11);
    return [
      { text: "Enthalpy, with T in kelvin", formula: "c_p\\,T", filled: `${texNumber(air.cp / 1e3, 6)} \\cdot ${texNumber(T11, 6)} = ${texQuantity(air.cp * T11 / 1e3, "kJ/kg", 6)}`, value: air.cp * T11, unit: "J/kg" },
      { text: "Geopotential", formula: "g\\,z", filled: `${texNumber(air.g, 6)} \\cdot ${texFactor(z4)} = ${texQuantity(air.g * z4 / 1e3, "kJ/kg", 6)}`, value: air.g * z4, unit: "J/kg" },
      { text: "Latent heat, with q in kg per kg", formula: "L\\,q", filled: `${texNumber(L / 1e3, 6)} \\cdot ${texNumber(q2)} = ${texQuantity(L * q2 / 1e3, "kJ/kg", 6)}`, value: L * q2, unit: "J/kg" },
      { text: "Together", formula: "h = c_p\\,T + g\\,z + L\\,q", filled: `h = ${texQuantity(value23 / 1e3, "kJ/kg", 6)}` }
    ];
  },
  slips: [
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This counts the temperature from 0 °C: it is counted from 0 K. Differences are right, values are not.", ({ air, right }) => right - air.cp * zeroCelsius),
    fineMoistSlip("dry", "without L q", "This is the dry static energy: the latent heat of the vapor is missing.", ({ given: given8, air }) => air.cp * given8("temperature") + air.g * given8("heightAboveDatum")),
    fineMoistSlip("without-height", "without g z", "This leaves out the geopotential g z.", ({ given: given8, air, right }) => given8("heightAboveDatum") === 0 ? null : right - air.g * given8("heightAboveDatum")),
    moistSlip("grams", "g kg⁻¹ put in for kg kg⁻¹", "This is what comes out with the humidity in g per kg: the formula takes kg per kg.", ({ given: given8, again }) => given8("specificHumidity") === 0 ? null : again({ specificHumidity: 1e3 * given8("specificHumidity") })),
    moistSlip("joules-for-kilojoules", "J given as kJ", "Your number is in joules; the unit beside it says kilojoules.", ({ right }) => right * 1e3),
    moistSlip("kilojoules-added", "kJ and J added", "This adds g z in joules to terms in kilojoules.", ({ given: given8, air, right }) => given8("heightAboveDatum") === 0 ? null : right + 999 * air.g * given8("heightAboveDatum"))
  ],
  example: { inputs: { temperature: 298.15, heightAboveDatum: 500, specificHumidity: 0.012 }, gives: 333548.6, within: 1 }
});

// shared/thermo/arctangent.ts
var arctangent = (x) => atan2(x, 1);

// shared/thermo/wetBulb.ts
function mixingRatioFromWetBulb(temperature6, wetBulb, pressure4, air, vaporHeat = true) {
  const ws2 = mixingRatioFrom(air.es(wetBulb), pressure4, air.epsilon), L = air.L(wetBulb), depression2 = temperature6 - wetBulb;
  return (L * ws2 - air.cp * depression2) / (L + (vaporHeat ? air.cpv * depression2 : 0));
}
function isobaricWetBulb(temperature6, mixingRatio, pressure4, air, vaporHeat = true) {
  const at = (wetBulb) => mixingRatioFromWetBulb(temperature6, wetBulb, pressure4, air, vaporHeat) - mixingRatio;
  if (at(temperature6) <= 0) return temperature6;
  return findRoot(at, Math.max(temperature6 - 80, 150), temperature6);
}
function pseudoadiabaticWetBulb(pressure4, lcl, air) {
  return pseudoadiabaticTemperature(lcl.temperature, lcl.pressure, pressure4, air);
}
function stullWetBulb(temperature6, relativeHumidity) {
  const t = temperature6 - 273.15, RH = 100 * relativeHumidity;
  return 273.15 + t * arctangent(0.151977 * pow(RH + 8.313659, 0.5)) + arctangent(t + RH) - arctangent(RH - 1.676331) + 391838e-8 * pow(RH, 1.5) * arctangent(0.023101 * RH) - 4.686035;
}
var ventilatedCoefficients = [
  { key: "wmo", label: "WMO-No. 8, 6.53·10⁻⁴ (1 + 0.000944 t_w)", source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B, Assmann type", status: "from memory" }, of: (wetBulb) => 653e-6 * (1 + 944e-6 * (wetBulb - 273.15)), tex: "6.53\\times 10^{-4}\\,(1 + 0.000944\\,t_w)" },
  { key: "ferrel", label: "Ferrel, 6.60·10⁻⁴ (1 + 0.00115 t_w)", source: { text: 'AMS Glossary of Meteorology, "psychrometric formula"; Ferrel (1886)', status: "verified" }, of: (wetBulb) => 66e-5 * (1 + 115e-5 * (wetBulb - 273.15)), tex: "6.60\\times 10^{-4}\\,(1 + 0.00115\\,t_w)" },
  { key: "assmann", label: "Assmann, 6.62·10⁻⁴", source: { text: "common practice: the constant of the aspirated psychrometer", status: "common practice" }, of: () => 662e-6, tex: "6.62\\times 10^{-4}" }
];
var screenCoefficients = [
  { key: "screen", label: "screen, 7.99·10⁻⁴", source: { text: "common practice: psychrometer tables for screens with natural ventilation of about 1 m s⁻¹", status: "common practice" }, of: () => 799e-6, tex: "7.99\\times 10^{-4}" }
];
var iceCoefficients = [
  { key: "wmo", label: "WMO-No. 8, 5.75·10⁻⁴", source: { text: "WMO-No. 8, Guide to Instruments and Methods of Observation, Annex 4.B, Assmann type, ice", status: "from memory" }, of: () => 575e-6, tex: "5.75\\times 10^{-4}" },
  { key: "assmann", label: "Assmann, 5.84·10⁻⁴", source: { text: "common practice: the constant of the aspirated psychrometer with ice", status: "common practice" }, of: () => 584e-6, tex: "5.84\\times 10^{-4}" }
];

// shared/thermo/quantities/pseudoadiabaticWetBulbTemperature.ts
var lclOf3 = ({ given: given8, constants, formulae }) => lclFunction(constants, formulae)(given8("temperature"), given8("dewpoint"), given8("pressure"));
var pseudoadiabaticWetBulbTemperatureDefinition = moistQuantity({
  key: "pseudoadiabatic-wet-bulb-temperature",
  name: "pseudoadiabatic wet-bulb temperature",
  symbol: "T_sw",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [{ key: "normand", label: "Normand’s rule", source: glossary("wet-bulb temperature", "common practice"), validity: "over liquid water", knownError: "0.1 K by the formulae inside", value: (hand) => pseudoadiabaticWetBulb(hand.given("pressure"), lclOf3(hand), hand.air) }],
  constants: ["R", "Rv", "cp", "kappa", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L", lclTemperatureKey],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  remarks: ({ given: given8 }) => [foggy(given8("temperature"), given8("dewpoint"))],
  ask: "The pseudoadiabatic wet-bulb temperature: lifted dry-adiabatically to condensation, then lowered along the pseudoadiabat to the pressure of the start.",
  working: (hand, value23) => {
    const lcl = lclOf3(hand);
    return [
      { text: "Up the dry adiabat to the lifting condensation level", formula: "T \\to T_L,\\ p \\to p_L", filled: `T_L = ${inCelsius(lcl.temperature)},\\ p_L = ${inHectopascal(lcl.pressure)}`, value: lcl.temperature, unit: "K" },
      { text: "Down the pseudoadiabat to the pressure of the start", formula: "T_L \\to T_{sw}", filled: `T_{sw} = ${inCelsius(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("isobaric", "isobaric wet bulb", "This is the isobaric wet bulb: asked is that by lifting and lowering.", ({ given: given8, air }) => given8("dewpoint") >= given8("temperature") ? null : isobaricWetBulb(given8("temperature"), mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon), given8("pressure"), air)),
    fineMoistSlip("lcl", "temperature at the condensation level", "This is the temperature at the condensation level: it is still to be lowered to the start.", (hand) => hand.given("dewpoint") >= hand.given("temperature") ? null : lclOf3(hand).temperature),
    fineMoistSlip("mean", "mean of temperature and dewpoint", "This is the mean of temperature and dewpoint.", ({ given: given8 }) => given8("dewpoint") === given8("temperature") ? null : (given8("temperature") + given8("dewpoint")) / 2),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressure: 95461, temperature: 303.15, dewpoint: 296.49 }, gives: 298.1528, within: 1e-4 }
});

// shared/thermo/quantities/reversibleAscentTemperature.ts
var reversibleAscentTemperatureDefinition = moistQuantity({
  key: "reversible-ascent-temperature",
  name: "temperature after reversible ascent of saturated air",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [
    { ...pressureInput2, name: "pressureStart", label: "pressure at the start", symbol: "p₁" },
    { ...temperatureInput2, label: "temperature at the start, saturated and without liquid water", range: [200, 320] },
    { ...pressureInput2, name: "pressureEnd", label: "pressure at the end", symbol: "p₂" }
  ],
  variants: [{
    key: "moist-entropy",
    label: "moist entropy kept",
    source: { text: "Emanuel (1994), Atmospheric Convection, Eq. 4.5.9", status: "from memory" },
    validity: "saturated air over liquid water",
    knownError: "0.1 K",
    value: ({ given: given8, air }) => reversibleTemperature(given8("temperature"), given8("pressureStart"), given8("pressureEnd"), mixingRatioFrom(air.es(given8("temperature")), given8("pressureStart"), air.epsilon), air)
  }],
  constants: ["R", "Rv", "cp", "cw", "cpv", "latentHeat", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("temperature")], L: (given8) => [given8("temperature")] },
  remarks: ({ given: given8 }) => [given8("pressureEnd") > given8("pressureStart") ? "The end lies below the start, where the air has no liquid water to evaporate: it would warm dry-adiabatically." : null],
  ask: "The temperature of saturated air after it is lifted reversibly, over liquid water; condensed water stays in the parcel and is cooled with it.",
  working: ({ given: given8, air }, value23) => {
    const water2 = mixingRatioFrom(air.es(given8("temperature")), given8("pressureStart"), air.epsilon);
    return [
      { text: "All the water of the parcel: saturation at the start", formula: "w_t = w_s(T_1, p_1)", filled: `w_t = ${inGrams(water2)}`, value: water2, unit: "1" },
      { text: "The temperature at the end that keeps the moist entropy, found by a bracket", formula: "(c_p + w_t c_w) \\ln T - R \\ln(p - e_s) + \\frac{L w_s}{T} = \\text{const.}", filled: `T_2 = ${inCelsius(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("pseudoadiabatic", "along the pseudoadiabat", "This leaves the condensed water behind: asked is the reversible ascent.", ({ given: given8, air }) => pseudoadiabaticTemperature(given8("temperature"), given8("pressureStart"), given8("pressureEnd"), air)),
    moistSlip("dry", "dry adiabat", "This goes along the dry adiabat: saturated air cools less as it rises.", ({ given: given8, air }) => given8("temperature") * pow(given8("pressureEnd") / given8("pressureStart"), air.kappa)),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressureStart: 92500, temperature: 278.15, pressureEnd: 7e4 }, gives: 264.3384, within: 1e-4 }
});

// shared/thermo/saturatedRate.ts
function saturatedRate(temperature6, pressure4, air) {
  const w2 = mixingRatioFrom(air.es(temperature6), pressure4, air.epsilon), L = air.L(temperature6);
  return air.g * (1 + L * w2 / (air.R * temperature6)) / (air.cp + L * L * w2 * air.epsilon / (air.R * temperature6 * temperature6));
}
function fullSaturatedRate(temperature6, pressure4, liquid2, air) {
  const w2 = mixingRatioFrom(air.es(temperature6), pressure4, air.epsilon), L = air.L(temperature6);
  return air.g * (1 + w2 + liquid2) * (1 + L * w2 / (air.R * temperature6)) / (air.cp + w2 * air.cpv + liquid2 * air.cw + L * L * w2 * (air.epsilon + w2) / (air.R * temperature6 * temperature6));
}

// shared/thermo/quantities/reversibleSaturatedLapseRate.ts
var reversibleSaturatedLapseRateDefinition = moistQuantity({
  key: "reversible-saturated-lapse-rate",
  name: "reversible saturated adiabatic lapse rate",
  symbol: "Γrm",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [pressureInput2, temperatureInput2, { ...mixingRatioInput, name: "liquidWater", label: "liquid water mixing ratio of the parcel", symbol: "w_l", range: [0, 0.05] }],
  variants: [{ key: "full", label: "with the heat capacities of vapor and liquid", source: glossary("moist-adiabatic lapse rate"), validity: "saturated air over liquid water", knownError: "0.2 %", value: ({ given: given8, air }) => fullSaturatedRate(given8("temperature"), given8("pressure"), given8("liquidWater"), air) }],
  constants: ["R", "Rv", "cp", "g", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("temperature")], L: (given8) => [given8("temperature")] },
  ask: "The reversible saturated adiabatic lapse rate −dT/dz at the temperature and the pressure, over liquid water; condensed water stays in the parcel.",
  working: ({ given: given8, air }, value23) => {
    const e = air.es(given8("temperature"));
    return [
      { ...mixingRatioStep("w_s", "e_s", e, given8("pressure"), air), text: "Saturation mixing ratio" },
      { text: "All the water of the parcel", formula: "w_t = w_s + w_l", filled: `w_t = ${inGrams(mixingRatioFrom(e, given8("pressure"), air.epsilon) + given8("liquidWater"))}`, value: mixingRatioFrom(e, given8("pressure"), air.epsilon) + given8("liquidWater"), unit: "1" },
      { text: "The water that stays is cooled too", formula: "\\Gamma_{rm} = g\\,\\frac{(1 + w_t)\\left(1 + \\frac{L w_s}{R T}\\right)}{c_p + w_s c_{pv} + w_l c_w + \\frac{L^2 w_s (\\varepsilon + w_s)}{R T^2}}", filled: `\\Gamma_{rm} = ${texQuantity(value23 * 1e3, "K/km")}` }
    ];
  },
  slips: [
    moistSlip("sign", "sign turned round", "A lapse rate is positive where temperature falls with height.", ({ right }) => -right),
    moistSlip("per-meter", "K m⁻¹ given as K km⁻¹", "Your value is the rate per meter: multiply it by 1000 for the rate per kilometer.", ({ right }) => right / 1e3),
    // with little liquid as small as the spread of accepted formulae
    smallMoistSlip("pseudoadiabatic", "condensed water left out", "This is the pseudoadiabatic rate, of which the condensed water is no part: asked is the reversible one.", ({ given: given8, air }) => saturatedRate(given8("temperature"), given8("pressure"), air)),
    moistSlip("dry-rate", "Γd for Γm", "This is the dry adiabatic lapse rate g/cp: saturated air cools less as it rises.", ({ air }) => air.g / air.cp)
  ],
  example: { inputs: { pressure: 7e4, temperature: 273.15, liquidWater: 6e-3 }, gives: 5705015e-9, within: 1e-8 }
});

// shared/thermo/quantities/saturatedAdiabaticLapseRate.ts
var saturatedAdiabaticLapseRateDefinition = moistQuantity({
  key: "saturated-adiabatic-lapse-rate",
  name: "saturated adiabatic lapse rate",
  symbol: "Γm",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [pressureInput2, temperatureInput2],
  variants: [
    { key: "approximate", label: "without the heat capacity of the vapor", source: glossary("adiabatic lapse rate"), validity: "saturated air over liquid water", knownError: "1 %", value: ({ given: given8, air }) => saturatedRate(given8("temperature"), given8("pressure"), air) },
    { key: "full", label: "with the heat capacity of the vapor", source: glossary("moist-adiabatic lapse rate"), validity: "saturated air over liquid water", knownError: "0.2 %", value: ({ given: given8, air }) => fullSaturatedRate(given8("temperature"), given8("pressure"), 0, air) }
  ],
  constants: ["R", "Rv", "cp", "g", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("temperature")], L: (given8) => [given8("temperature")] },
  ask: "The saturated (pseudo)adiabatic lapse rate Γm = −dT/dz at the temperature and the pressure, over liquid water; condensed water leaves at once.",
  working: ({ given: given8, air, variant }, value23) => {
    const T11 = given8("temperature"), e = air.es(T11), w2 = mixingRatioFrom(e, given8("pressure"), air.epsilon), L = air.L(T11);
    const a = L * w2 / (air.R * T11), b = L * L * w2 * air.epsilon / (air.R * T11 * T11);
    return [
      { ...mixingRatioStep("w_s", "e_s", e, given8("pressure"), air), text: "Saturation mixing ratio" },
      { text: "Latent heat", formula: "L", filled: `L = ${texQuantity(L / 1e3, "kJ/kg", 6)}`, value: L, unit: "J/kg" },
      variant === "full" ? { text: "With the heat capacity of the vapor", formula: "\\Gamma_m = g\\,\\frac{(1 + w_s)\\left(1 + \\frac{L w_s}{R T}\\right)}{c_p + w_s c_{pv} + \\frac{L^2 w_s (\\varepsilon + w_s)}{R T^2}}", filled: `\\Gamma_m = ${texQuantity(value23 * 1e3, "K/km")}` } : { text: "The latent heat pays for part of the cooling", formula: "\\Gamma_m = g\\,\\frac{1 + \\frac{L w_s}{R T}}{c_p + \\frac{L^2 w_s \\varepsilon}{R T^2}}", filled: `\\Gamma_m = ${texNumber(air.g)} \\cdot \\frac{1 + ${texNumber(a)}}{${texNumber(air.cp, 6)} + ${texNumber(b)}} = ${texQuantity(value23 * 1e3, "K/km")}` }
    ];
  },
  slips: [
    moistSlip("sign", "sign turned round", "A lapse rate is positive where temperature falls with height.", ({ right }) => -right),
    moistSlip("per-meter", "K m⁻¹ given as K km⁻¹", "Your value is the rate per meter: multiply it by 1000 for the rate per kilometer.", ({ right }) => right / 1e3),
    moistSlip("per-100-m", "K per 100 m given as K km⁻¹", "Your value is the rate per 100 m: multiply it by 10 for the rate per kilometer.", ({ right }) => right / 10),
    fineMoistSlip("dry-rate", "Γd for Γm", "This is the dry adiabatic lapse rate g/cp: saturated air cools less as it rises.", ({ air }) => air.g / air.cp),
    fineMoistSlip("six", "6 K km⁻¹ as a constant", "This is a round number for the middle latitudes: Γm depends on temperature and pressure.", () => 6e-3),
    fineMoistSlip("six-and-a-half", "6.5 K km⁻¹", "This is the mean lapse rate of the standard atmosphere, which is no saturated rate.", () => 65e-4),
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This comes from R T and R T² with the temperature in °C: they take kelvin.", ({ given: given8, air }) => {
      const T11 = given8("temperature"), t = T11 - zeroCelsius, w2 = mixingRatioFrom(air.es(T11), given8("pressure"), air.epsilon), L = air.L(T11);
      return Math.abs(t) < 0.5 ? null : air.g * (1 + L * w2 / (air.R * t)) / (air.cp + L * L * w2 * air.epsilon / (air.R * t * t));
    }),
    fineMoistSlip("numerator", "without 1 + Lw/RT", "This comes without the term L w/(R T) in the numerator.", ({ given: given8, air }) => {
      const T11 = given8("temperature"), w2 = mixingRatioFrom(air.es(T11), given8("pressure"), air.epsilon), L = air.L(T11);
      return air.g / (air.cp + L * L * w2 * air.epsilon / (air.R * T11 * T11));
    }),
    fineMoistSlip("epsilon-left-out", "without ε", "This comes without ε in the denominator, which is R/Rv there.", ({ given: given8, air }) => {
      const T11 = given8("temperature"), w2 = mixingRatioFrom(air.es(T11), given8("pressure"), air.epsilon), L = air.L(T11);
      return air.g * (1 + L * w2 / (air.R * T11)) / (air.cp + L * L * w2 / (air.R * T11 * T11));
    })
  ],
  example: { inputs: { pressure: 1e5, temperature: 293.15 }, gives: 431136e-8, within: 1e-7 }
});

// shared/thermo/saturatedPathDefinition.ts
var from = ({ given: given8 }) => given8("pressureStart");
var to = ({ given: given8 }) => given8("pressureEnd");
var start4 = ({ given: given8 }) => given8("temperature");
function saturatedPathDefinition({ direction: direction2, ...named2 }) {
  const path = (hand) => {
    if (direction2 === "up" ? to(hand) > from(hand) : to(hand) < from(hand)) throw new OutOfRangeError("pressureEnd", to(hand), `pressures ${direction2 === "up" ? "up to" : "from"} ${from(hand)} Pa, that of the start: the other way is another quantity`);
    return pseudoadiabaticTemperature(start4(hand), from(hand), to(hand), hand.air);
  };
  return moistQuantity({
    ...named2,
    symbol: "T",
    unit: "K",
    shownUnit: "Cel",
    kind: "temperature",
    inputs: [
      { ...pressureInput2, name: "pressureStart", label: "pressure at the start", symbol: "p₁" },
      { ...temperatureInput2, label: "temperature at the start, saturated" },
      { ...pressureInput2, name: "pressureEnd", label: "pressure at the end", symbol: "p₂" }
    ],
    variants: [{ key: "pseudoadiabat", label: "pseudoadiabat, integrated in ln p", source: glossary("adiabatic lapse rate"), validity: "saturated air over liquid water", knownError: "0.6 K over 600 hPa by the latent heat", value: path }],
    constants: ["R", "Rv", "cp", "cpv", "latentHeat", "cw", "enhancementFactor"],
    inside: ["es", "L"],
    notedAt: { es: (given8) => [given8("temperature")], L: (given8) => [given8("temperature")] },
    working: (hand, value23) => {
      const slope = (T11, p10) => pseudoadiabaticSlope(T11, p10, hand.air);
      return [
        { text: "At the start", formula: "\\frac{dT}{d\\ln p} = \\frac{R T + L w_s}{c_p + \\frac{L^2 w_s \\varepsilon}{R T^2}}", filled: `\\frac{dT}{d\\ln p} = ${texQuantity(slope(start4(hand), from(hand)), "K")}`, value: slope(start4(hand), from(hand)), unit: "K" },
        { text: `In equal steps of ln p, fourth-order Runge–Kutta, with T, L and ws anew at each; at the end it is ${texNumber(slope(value23, to(hand)), 4)} K`, formula: "T_2 = T_1 + \\int_{p_1}^{p_2} \\frac{dT}{d\\ln p}\\,d\\ln p", filled: `T_2 = ${inCelsius(start4(hand))} ${value23 < start4(hand) ? "-" : "+"} ${texQuantity(Math.abs(value23 - start4(hand)), "K")} = ${inCelsius(value23)}` }
      ];
    },
    slips: [
      fineMoistSlip("dry", "dry adiabat", "This goes along the dry adiabat: saturated air that condenses or evaporates water changes its temperature less.", (hand) => start4(hand) * pow(to(hand) / from(hand), hand.air.kappa)),
      moistSlip("wrong-way", direction2 === "up" ? "warmed where it cools" : "cooled where it warms", direction2 === "up" ? "Air cools as it rises: your value goes the other way." : "Air warms as it sinks: your value goes the other way.", (hand) => to(hand) === from(hand) ? null : 2 * start4(hand) - hand.right),
      fineMoistSlip("constant-rate", "rate of the start all the way", "This keeps the rate of the start all the way: it changes as the air goes along.", (hand) => start4(hand) + pseudoadiabaticSlope(start4(hand), from(hand), hand.air) * log(to(hand) / from(hand))),
      fineMoistSlip("six", "6 K km⁻¹ all the way", "This takes 6 K for each kilometer of the air’s own column: the saturated rate depends on temperature and pressure.", (hand) => start4(hand) + 6e-3 * hand.air.R * start4(hand) / hand.air.g * log(to(hand) / from(hand))),
      moistSlip("change-only", "change for temperature", "This is the change of temperature: add it to the temperature at the start.", (hand) => to(hand) === from(hand) ? null : 273.15 + hand.right - start4(hand)),
      kelvinAsCelsiusSlip
    ]
  });
}

// shared/thermo/quantities/saturatedAscentTemperature.ts
var saturatedAscentTemperatureDefinition = saturatedPathDefinition({
  key: "saturated-ascent-temperature",
  name: "temperature after pseudoadiabatic ascent of saturated air",
  direction: "up",
  ask: "The temperature of saturated air after it is lifted along its pseudoadiabat, over liquid water; condensed water leaves at once.",
  example: { inputs: { pressureStart: 92500, temperature: 278.15, pressureEnd: 7e4 }, gives: 264.2758, within: 2e-4 }
});

// shared/thermo/quantities/saturatedDescentTemperature.ts
var saturatedDescentTemperatureDefinition = saturatedPathDefinition({
  key: "saturated-descent-temperature",
  name: "temperature after saturated descent along the pseudoadiabat",
  direction: "down",
  ask: "The temperature of air that is kept saturated as it is lowered along its pseudoadiabat, by water that evaporates into it; air without liquid water warms dry-adiabatically instead.",
  example: { inputs: { pressureStart: 7e4, temperature: 264.2758, pressureEnd: 92500 }, gives: 278.15, within: 5e-4 }
});

// shared/thermo/quantities/saturationEquivalentPotentialTemperature.ts
var by2 = ({ given: given8, air }, variant) => equivalentPotentialTemperature(given8("temperature"), given8("temperature"), given8("pressure"), air, variant);
var saturationEquivalentPotentialTemperatureDefinition = moistQuantity({
  key: "saturation-equivalent-potential-temperature",
  name: "saturation equivalent potential temperature",
  symbol: "θes",
  unit: "K",
  shownUnit: "K",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2],
  variants: [
    { key: "bolton-39", label: "Bolton’s equation 39", source: { text: "Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 39", status: "verified" }, validity: "θe below 480 K", knownError: "0.02 K", value: (hand) => by2(hand, "bolton-39") },
    { key: "bolton-43", label: "Bolton’s equation 43", source: { text: "Bolton (1980), Mon. Wea. Rev. 108, 1046–1053, Eq. 43", status: "verified" }, validity: "θe below 380 K", knownError: "0.3 K, 2 K above 420 K", value: (hand) => by2(hand, "bolton-43") }
  ],
  constants: ["R", "Rv", "cp", "kappa", "enhancementFactor"],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("temperature")] },
  ask: "The saturation equivalent potential temperature by Bolton’s formula: θe of the air if it were saturated over liquid water at its temperature.",
  working: ({ given: given8, air, variant }, value23) => [
    { ...mixingRatioStep("w_s", "e_s", air.es(given8("temperature")), given8("pressure"), air), text: "Saturation mixing ratio" },
    { text: "Bolton’s formula with w in kg per kg; the condensation level is here, TL = T", formula: variant === "bolton-43" ? "\\theta_{es} = T\\left(\\frac{p_0}{p}\\right)^{0.2854\\,(1 - 0.28\\,w_s)}\\exp\\left[\\left(\\frac{3376}{T} - 2.54\\right) w_s\\,(1 + 0.81\\,w_s)\\right]" : "\\theta_{es} = T\\left(\\frac{p_0}{p - e_s}\\right)^{\\kappa}\\exp\\left[\\left(\\frac{3036}{T} - 1.78\\right) w_s\\,(1 + 0.448\\,w_s)\\right]", filled: `\\theta_{es} = ${inKelvin(value23)}` }
  ],
  slips: [
    fineMoistSlip("theta", "potential temperature", "This is the potential temperature: the latent heat of saturation is not in it.", ({ given: given8, air }) => given8("temperature") * pow(1e5 / given8("pressure"), air.kappa)),
    moistSlip("standard-pressure", "1013.25 hPa for 1000 hPa", "This refers to 1013.25 hPa: θe refers to 1000 hPa.", ({ air, right }) => right * pow(1.01325, air.kappa)),
    celsiusAsKelvinSlip
  ],
  example: { inputs: { pressure: 5e4, temperature: 253.15 }, gives: 313.8347, within: 1e-4 }
});

// shared/thermo/quantities/virtualPotentialTemperature.ts
var wOf2 = ({ given: given8, air }) => mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon);
var exner = ({ given: given8, air }) => pow(1e5 / given8("pressure"), air.kappa);
var virtual = (hand, temperature6 = hand.given("temperature")) => hand.variant === "linear" ? temperature6 * (1 + 0.61 * wOf2(hand)) : virtualTemperatureFrom(temperature6, wOf2(hand), hand.air.epsilon);
var virtualPotentialTemperatureDefinition = moistQuantity({
  key: "virtual-potential-temperature",
  name: "virtual potential temperature",
  symbol: "θv",
  unit: "K",
  shownUnit: "K",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [
    { key: "exact", label: "with the exact virtual factor", source: glossary("virtual potential temperature"), validity: "no liquid water in the air", knownError: "κ 0.2854 to 0.286: 0.06 K at 700 hPa", value: (hand) => virtual(hand) * exner(hand) },
    { key: "linear", label: "with 1 + 0.61 w, as an approximation", source: glossary("virtual potential temperature", "common practice"), validity: "w below 20 g/kg", knownError: "0.13 K at 28 g/kg", value: (hand) => virtual(hand) * exner(hand) }
  ],
  constants: ["R", "Rv", "cp", "kappa", "enhancementFactor"],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  ask: "The virtual potential temperature θv of the air, with the exact virtual factor, referred to 1000 hPa.",
  working: (hand, value23) => {
    const { given: given8, air } = hand, Tv6 = virtual(hand);
    return [
      { ...mixingRatioStep("w", "e", air.es(given8("dewpoint")), given8("pressure"), air), text: "Mixing ratio, with e = es(Td)" },
      { text: "Virtual temperature", formula: hand.variant === "linear" ? "T_v = T\\,(1 + 0.61\\,w)" : "T_v = T\\,\\frac{1 + w/\\varepsilon}{1 + w}", filled: `T_v = ${inKelvin(Tv6)}`, value: Tv6, unit: "K" },
      { text: "Referred to 1000 hPa", formula: "\\theta_v = T_v\\left(\\frac{p_0}{p}\\right)^{\\kappa}", filled: `\\theta_v = ${texNumber(Tv6, 6)}\\left(\\frac{1000}{${texNumber(given8("pressure") / 100, 6)}}\\right)^{${texNumber(air.kappa)}} = ${inKelvin(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("theta", "potential temperature", "This is the potential temperature: the vapor is not in it.", (hand) => hand.given("temperature") * exner(hand)),
    fineMoistSlip("virtual-only", "virtual temperature", "This is the virtual temperature: it is still to be referred to 1000 hPa.", (hand) => hand.given("pressure") === 1e5 ? null : virtual(hand)),
    fineMoistSlip("saturated", "w at T for w at Td", "This takes the saturation mixing ratio at the temperature: the dewpoint tells what the air holds.", ({ given: given8, again }) => given8("dewpoint") === given8("temperature") ? null : again({ dewpoint: given8("temperature") })),
    moistSlip("standard-pressure", "1013.25 hPa for 1000 hPa", "This refers to 1013.25 hPa: θv refers to 1000 hPa.", ({ air, right }) => right * pow(1.01325, air.kappa)),
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: Poisson’s relation takes kelvin.", (hand) => hand.given("temperature") === zeroCelsius ? null : zeroCelsius + virtual(hand, hand.given("temperature") - zeroCelsius) * exner(hand)),
    celsiusAsKelvinSlip
  ],
  example: { inputs: { pressure: 95900, temperature: 295.35, dewpoint: 292.15 }, gives: 301.5164, within: 1e-4 }
});

// shared/thermo/quantities/wetBulbPotentialTemperature.ts
var lclOf4 = ({ given: given8, constants, formulae }) => lclFunction(constants, formulae)(given8("temperature"), given8("dewpoint"), given8("pressure"));
var thetaE = ({ given: given8, air }) => equivalentPotentialTemperature(given8("temperature"), given8("dewpoint"), given8("pressure"), air);
var wetBulbPotentialTemperatureDefinition = moistQuantity({
  key: "wet-bulb-potential-temperature",
  name: "wet-bulb potential temperature",
  symbol: "θw",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [
    { key: "pseudoadiabat", label: "down the pseudoadiabat to 1000 hPa", source: { text: 'AMS Glossary of Meteorology, "wet-bulb potential temperature"', status: "verified" }, validity: "over liquid water", knownError: "0.2 K by the latent heat", value: (hand) => pseudoadiabaticWetBulb(1e5, lclOf4(hand), hand.air) },
    { key: "davies-jones", label: "Davies-Jones’ fit to θe", source: { text: "Davies-Jones (2008), Mon. Wea. Rev. 136, 2764–2785, Eq. 3.8; coefficients read in transcriptions", status: "verified" }, validity: "θe 257–377 K", knownError: "0.02 K of its pseudoadiabats", value: (hand) => daviesJonesWetBulbPotential(thetaE(hand)) }
  ],
  constants: ["R", "Rv", "cp", "kappa", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L", lclTemperatureKey],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  remarks: ({ given: given8 }) => [foggy(given8("temperature"), given8("dewpoint"))],
  ask: "The wet-bulb potential temperature: the temperature that the parcel’s pseudoadiabat has at 1000 hPa.",
  working: (hand, value23) => {
    if (hand.variant === "davies-jones") return [
      { text: "Equivalent potential temperature by Bolton’s equation 39", formula: "\\theta_e", filled: `\\theta_e = ${inKelvin(thetaE(hand))}`, value: thetaE(hand), unit: "K" },
      { text: "Davies-Jones’ fit, with X = θe/273.15 K", formula: "\\theta_w = \\theta_e - \\exp\\frac{7.101574 - 20.68208 X + 16.11182 X^2 + 2.574631 X^3 - 5.205688 X^4}{1 - 3.552497 X + 3.781782 X^2 - 0.6899655 X^3 - 0.5929340 X^4}", filled: `\\theta_w = ${inKelvin(value23)} = ${inCelsius(value23)}` }
    ];
    const lcl = lclOf4(hand);
    return [
      { text: "Up the dry adiabat to the lifting condensation level", formula: "T \\to T_L,\\ p \\to p_L", filled: `T_L = ${inCelsius(lcl.temperature)},\\ p_L = ${inHectopascal(lcl.pressure)}`, value: lcl.temperature, unit: "K" },
      { text: "Along the pseudoadiabat to 1000 hPa", formula: "T_L \\to \\theta_w", filled: `\\theta_w = ${inCelsius(value23)} = ${inKelvin(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("wet-bulb", "wet bulb at its own pressure", "This is the wet-bulb temperature at the parcel’s own pressure: it is still to be taken to 1000 hPa.", (hand) => hand.given("pressure") === 1e5 ? null : pseudoadiabaticWetBulb(hand.given("pressure"), lclOf4(hand), hand.air)),
    fineMoistSlip("dry-down", "down the dry adiabat", "This takes the wet-bulb temperature to 1000 hPa along the dry adiabat: it goes along the pseudoadiabat.", (hand) => hand.given("pressure") === 1e5 ? null : pseudoadiabaticWetBulb(hand.given("pressure"), lclOf4(hand), hand.air) * pow(1e5 / hand.given("pressure"), hand.air.kappa)),
    fineMoistSlip("theta", "potential temperature", "This is the potential temperature of the parcel.", ({ given: given8, air }) => given8("dewpoint") >= given8("temperature") && given8("pressure") === 1e5 ? null : given8("temperature") * pow(1e5 / given8("pressure"), air.kappa)),
    fineMoistSlip("theta-e", "equivalent potential temperature", "This is the equivalent potential temperature of the parcel.", thetaE),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressure: 85e3, temperature: 293.15, dewpoint: 291.15 }, gives: 297.4164, within: 1e-4 }
});

// shared/thermo/groups/moistProcesses.ts
var moistProcesses = {
  key: "moist-processes",
  title: "Moist processes",
  quantities: [
    liftingCondensationLevelTemperatureDefinition,
    liftingCondensationLevelPressureDefinition,
    liftingCondensationLevelHeightDefinition,
    saturatedAdiabaticLapseRateDefinition,
    reversibleSaturatedLapseRateDefinition,
    saturatedAscentTemperatureDefinition,
    saturatedDescentTemperatureDefinition,
    reversibleAscentTemperatureDefinition,
    equivalentPotentialTemperatureDefinition,
    equivalentPotentialTemperatureShortcutDefinition,
    saturationEquivalentPotentialTemperatureDefinition,
    wetBulbPotentialTemperatureDefinition,
    pseudoadiabaticWetBulbTemperatureDefinition,
    virtualPotentialTemperatureDefinition,
    moistStaticEnergyDefinition,
    adiabaticLiquidWaterDefinition,
    isobaricMixingTemperatureDefinition,
    isobaricMixingVaporPressureDefinition,
    isobaricMixingRelativeHumidityDefinition,
    convectiveCondensationLevelPressureDefinition,
    convectiveTemperatureDefinition
  ]
};

// shared/thermo/quantities/absoluteHumidity.ts
var absoluteHumidityDefinition = moistQuantity({
  key: "absolute-humidity",
  name: "absolute humidity",
  symbol: "ρv",
  unit: "kg/m3",
  shownUnit: "g/m3",
  kind: "ratio",
  inputs: [temperatureInput2, vaporPressureInput],
  variants: [{ key: "ideal-gas", label: "e/(Rv T)", source: glossary("absolute humidity"), validity: "vapor at less than 100 hPa", knownError: "0.2 %", value: ({ given: given8, air }) => given8("vaporPressure") / (air.Rv * given8("temperature")) }],
  constants: ["Rv"],
  ask: "The absolute humidity of the air, mass of vapor per volume of air.",
  working: ({ given: given8, air }, value23) => [{ text: "Equation of state of the vapor, with e in pascal and T in kelvin", formula: "\\rho_v = \\frac{e}{R_v\\,T}", filled: `\\rho_v = \\frac{${texNumber(given8("vaporPressure"))}}{${texNumber(air.Rv)} \\cdot ${texNumber(given8("temperature"))}} = ${texQuantity(value23 * 1e3, "g/m3")}` }],
  slips: [
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the equation of state takes kelvin.", ({ given: given8, right }) => given8("temperature") === zeroCelsius ? null : right * given8("temperature") / (given8("temperature") - zeroCelsius)),
    moistSlip("dry-gas-constant", "gas constant of dry air", "This comes from the gas constant of dry air: the vapor has its own.", ({ air, right }) => right * air.Rv / air.R),
    moistSlip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the vapor pressure in hPa: it goes in in pascal.", ({ right }) => right / 100),
    moistSlip("kilogram-for-gram", "kg m⁻³ given as g m⁻³", "Your number is in kg m⁻³; the unit beside it says g m⁻³.", ({ right }) => right / 1e3)
  ],
  example: { inputs: { temperature: 293.15, vaporPressure: 2336.947 }, gives: 0.01727378, within: 1e-8 }
});

// shared/thermo/quantities/densityOfMoistAir.ts
var densityOfMoistAirDefinition = moistQuantity({
  key: "density-of-moist-air",
  name: "density of moist air",
  symbol: "ρ",
  unit: "kg/m3",
  shownUnit: "kg/m3",
  kind: "ratio",
  inputs: [pressureInput2, temperatureInput2, vaporPressureInput],
  variants: [{ key: "ideal-gases", label: "dry air and vapor as ideal gases", source: glossary("equation of state", "common practice"), validity: "180–340 K, below 1200 hPa", knownError: "0.1 %", value: ({ given: given8, air }) => (given8("pressure") - given8("vaporPressure")) / (air.R * given8("temperature")) + given8("vaporPressure") / (air.Rv * given8("temperature")) }],
  constants: ["R", "Rv"],
  ask: "The density of the moist air, mass of dry air and vapor per volume.",
  working: ({ given: given8, air }, value23) => {
    const p10 = given8("pressure"), e = given8("vaporPressure"), T11 = given8("temperature");
    return [
      { text: "Density of the dry air, with its partial pressure", formula: "\\rho_d = \\frac{p - e}{R\\,T}", filled: `\\rho_d = \\frac{${texNumber(p10 - e, 7)}}{${texNumber(air.R)} \\cdot ${texNumber(T11)}} = ${texQuantity((p10 - e) / (air.R * T11), "kg/m3")}`, value: (p10 - e) / (air.R * T11), unit: "kg/m3" },
      { text: "Together with the vapor", formula: "\\rho = \\rho_d + \\frac{e}{R_v\\,T}", filled: `\\rho = ${texNumber((p10 - e) / (air.R * T11))} + \\frac{${texNumber(e)}}{${texNumber(air.Rv)} \\cdot ${texNumber(T11)}} = ${texQuantity(value23, "kg/m3")}` }
    ];
  },
  slips: [
    fineMoistSlip("dry", "as if dry", "This is the density of dry air at the pressure: the vapor, which is lighter, is not in it.", ({ given: given8, air }) => given8("pressure") / (air.R * given8("temperature"))),
    fineMoistSlip("added", "p in place of p − e", "This adds the vapor to dry air at the whole pressure: the dry air has p − e.", ({ given: given8, air }) => given8("pressure") / (air.R * given8("temperature")) + given8("vaporPressure") / (air.Rv * given8("temperature"))),
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the equation of state takes kelvin.", ({ given: given8, right }) => given8("temperature") === zeroCelsius ? null : right * given8("temperature") / (given8("temperature") - zeroCelsius)),
    moistSlip("hectopascal-for-pascal", "hPa put in for Pa", "This is what comes out with the pressures in hPa: they go in in pascal.", ({ right }) => right / 100),
    moistSlip("vapor-gas-constant", "gas constant of vapor", "This comes from the gas constant of water vapor for the whole air.", ({ given: given8, air }) => given8("pressure") / (air.Rv * given8("temperature")))
  ],
  example: { inputs: { pressure: 1e5, temperature: 298.15, vaporPressure: 2e3 }, gives: 1.15981, within: 1e-4 }
});

// shared/thermo/dewpoints.ts
var coldest = 130;
var hottest = 373;
function dewpointFunction(constants, formulae) {
  const solved2 = overWaterForms.find((form) => form.key === (formulae.variants[overWaterKey] ?? overWaterForms[0]?.key))?.temperature;
  if (solved2 && formulae.beyond === "compute") return (e) => solved2(e / enhancementOf(constants));
  const es = saturationPressureFunction(constants, formulae);
  return (e) => findRoot((T11) => es(T11) / e - 1, coldest, hottest);
}
function frostPoint(vaporPressure, constants, formulae) {
  const ei = iceSaturationPressureFunction(constants, formulae);
  const triple = 273.16;
  if (vaporPressure > ei(triple)) return { is: "not_defined", why: "The vapor pressure is above that of the triple point of water: at saturation there is no ice." };
  const solved2 = overIceForms.find((form) => form.key === (formulae.variants[overIceKey] ?? overIceForms[0]?.key))?.temperature;
  return { is: "value", value: solved2 && formulae.beyond === "compute" ? solved2(vaporPressure / enhancementOf(constants)) : findRoot((T11) => ei(T11) / vaporPressure - 1, 120, triple) };
}

// shared/thermo/quantities/dewpoint.ts
var dewpointDefinition = moistQuantity({
  key: "dewpoint",
  name: "dewpoint from the vapor pressure",
  symbol: "T_d",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [{ ...vaporPressureInput, range: [0.1, 3e4] }],
  variants: [{ key: "over-water", label: "eₛ(T_d) = e", source: glossary("dewpoint"), validity: "over liquid water, also below 0 °C", knownError: "0.05 K by the formula of eₛ", value: ({ given: given8, constants, formulae }) => dewpointFunction(constants, formulae)(given8("vaporPressure")) }],
  constants: ["enhancementFactor"],
  inside: ["es"],
  ask: "The dewpoint over liquid water, also below 0 °C: the temperature at which the air’s vapor pressure is that of saturation.",
  working: ({ given: given8 }, value23) => [{ text: "The temperature at which the vapor pressure is that of saturation", formula: "e_s(T_d) = e", filled: `e_s(${inCelsius(value23)}) = ${inHectopascal(given8("vaporPressure"))}` }],
  slips: [
    fineMoistSlip("frost-point", "frost point for dewpoint", "This is the frost point, over ice; the dewpoint refers to liquid water, also below 0 °C.", ({ given: given8, constants, formulae, right }) => {
      if (right > 273.15) return null;
      const outcome3 = frostPoint(given8("vaporPressure"), constants, formulae);
      return outcome3.is === "value" ? outcome3.value : null;
    }),
    moistSlip("base-ten", "log₁₀ for ln", "This comes from the logarithm to base 10 in place of the natural one.", ({ given: given8 }) => {
      const logarithm = log10(given8("vaporPressure") / 611.2);
      return logarithm === 0 ? null : 273.15 + 243.5 * logarithm / (17.67 - logarithm);
    }),
    moistSlip("pascal-for-hectopascal", "Pa put in for hPa", "This is what comes out with the vapor pressure in pascal where the formula takes hectopascal.", ({ given: given8, again }) => given8("vaporPressure") < 3e4 ? again({ vaporPressure: 100 * given8("vaporPressure") }) : null),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { vaporPressure: 1401.539 }, gives: 285.15, within: 2e-4 }
});

// shared/thermo/quantities/dewpointFromMixingRatio.ts
var dewpointFromMixingRatioDefinition = moistQuantity({
  key: "dewpoint-from-mixing-ratio",
  name: "dewpoint from the mixing ratio",
  symbol: "T_d",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput2, mixingRatioInput],
  variants: [{ key: "over-water", label: "eₛ(T_d) = w p/(ε + w)", source: glossary("dewpoint"), validity: "over liquid water, also below 0 °C", knownError: "0.05 K by the formula of eₛ", value: ({ given: given8, air, constants, formulae }) => dewpointFunction(constants, formulae)(vaporPressureFrom(given8("mixingRatio"), given8("pressure"), air.epsilon)) }],
  constants: ["R", "Rv", "enhancementFactor"],
  inside: ["es"],
  ask: "The dewpoint over liquid water, also below 0 °C, of air with the mixing ratio at the pressure.",
  working: ({ given: given8, air }, value23) => {
    const e = vaporPressureFrom(given8("mixingRatio"), given8("pressure"), air.epsilon);
    return [
      { text: "Vapor pressure, with w in kg per kg", formula: "e = \\frac{w\\,p}{\\varepsilon + w}", filled: `e = \\frac{${texNumber(given8("mixingRatio"))} \\cdot ${texNumber(given8("pressure") / 100, 6)}}{${texNumber(air.epsilon)} + ${texNumber(given8("mixingRatio"))}} = ${inHectopascal(e)}`, value: e, unit: "Pa" },
      { text: "The temperature at which this is saturation", formula: "e_s(T_d) = e", filled: `e_s(${inCelsius(value23)}) = ${inHectopascal(e)}` }
    ];
  },
  slips: [
    smallMoistSlip("without-w", "w neglected against ε", "This comes from e = w p/ε: in the denominator stands ε + w.", ({ given: given8, air, constants, formulae }) => dewpointFunction(constants, formulae)(given8("mixingRatio") * given8("pressure") / air.epsilon)),
    moistSlip("epsilon-left-out", "ε left out", "This comes from e = w p: the ratio of the molar masses, ε = 0.622, is missing.", ({ given: given8, constants, formulae }) => dewpointFunction(constants, formulae)(given8("mixingRatio") * given8("pressure"))),
    fineMoistSlip("frost-point", "frost point for dewpoint", "This is the frost point, over ice; the dewpoint refers to liquid water, also below 0 °C.", ({ given: given8, air, constants, formulae, right }) => {
      if (right > 273.15) return null;
      const outcome3 = frostPoint(vaporPressureFrom(given8("mixingRatio"), given8("pressure"), air.epsilon), constants, formulae);
      return outcome3.is === "value" ? outcome3.value : null;
    }),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressure: 1e5, mixingRatio: 0.01 }, gives: 287.0064, within: 1e-4 }
});

// shared/thermo/quantities/dewpointFromRelativeHumidity.ts
var dewpointFromRelativeHumidityDefinition = moistQuantity({
  key: "dewpoint-from-relative-humidity",
  name: "dewpoint from the relative humidity",
  symbol: "T_d",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [temperatureInput2, relativeHumidityInput],
  variants: [{ key: "over-water", label: "eₛ(T_d) = RH eₛ(T)", source: glossary("dewpoint"), validity: "over liquid water, also below 0 °C", knownError: "0.05 K by the formula of eₛ", value: ({ given: given8, air, constants, formulae }) => dewpointFunction(constants, formulae)(given8("relativeHumidity") * air.es(given8("temperature"))) }],
  constants: [],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("temperature")] },
  remarks: ({ given: given8 }) => [supersaturated(given8("relativeHumidity"))],
  ask: "The dewpoint over liquid water, also below 0 °C, from the temperature and the relative humidity e/es.",
  working: ({ given: given8, air }, value23) => {
    const es = air.es(given8("temperature")), e = given8("relativeHumidity") * es;
    return [
      saturationStep("e_s", "T", given8("temperature"), es),
      { text: "Vapor pressure", formula: "e = \\mathit{RH}\\,e_s", filled: `e = ${texNumber(given8("relativeHumidity"))} \\cdot ${texNumber(es / 100)} = ${inHectopascal(e)}`, value: e, unit: "Pa" },
      { text: "The temperature at which this is saturation", formula: "e_s(T_d) = e", filled: `e_s(${inCelsius(value23)}) = ${inHectopascal(e)}` }
    ];
  },
  slips: [
    fineMoistSlip("frost-point", "frost point for dewpoint", "This is the frost point, over ice; the dewpoint refers to liquid water, also below 0 °C.", ({ given: given8, air, constants, formulae, right }) => {
      if (right > 273.15) return null;
      const outcome3 = frostPoint(given8("relativeHumidity") * air.es(given8("temperature")), constants, formulae);
      return outcome3.is === "value" ? outcome3.value : null;
    }),
    moistSlip("share-of-celsius", "T in °C times RH", "This is the temperature in °C times the relative humidity: the ratio is of vapor pressures.", ({ given: given8 }) => given8("relativeHumidity") === 1 || given8("temperature") === zeroCelsius ? null : zeroCelsius + given8("relativeHumidity") * (given8("temperature") - zeroCelsius)),
    fineMoistSlip("five-per-kelvin", "T − (100 − RH)/5", "This is the rule of thumb T − (100 − RH)/5: it is within 1 K in damp air only.", ({ given: given8 }) => given8("relativeHumidity") === 1 ? null : given8("temperature") - 20 * (1 - given8("relativeHumidity"))),
    moistSlip("base-ten", "log₁₀ for ln", "This comes from the logarithm of RH to base 10 in place of the natural one.", ({ given: given8 }) => {
      const t = given8("temperature") - zeroCelsius, RH = given8("relativeHumidity");
      const gamma = log10(RH) + 17.67 * t / (t + 243.5);
      return RH === 1 ? null : zeroCelsius + 243.5 * gamma / (17.67 - gamma);
    }),
    moistSlip("percent", "percent not divided by 100", "This comes from the relative humidity in percent where the formula takes a fraction.", ({ given: given8 }) => {
      const t = given8("temperature") - zeroCelsius;
      const gamma = log(100 * given8("relativeHumidity")) + 17.67 * t / (t + 243.5);
      return gamma > 14 ? null : zeroCelsius + 243.5 * gamma / (17.67 - gamma);
    }),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { temperature: 298.15, relativeHumidity: 0.5 }, gives: 287.0176, within: 1e-4 }
});

// shared/thermo/quantities/frostPoint.ts
var frostPointDefinition = moistQuantity({
  key: "frost-point",
  name: "frost point from the vapor pressure",
  symbol: "T_f",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [{ ...vaporPressureInput, range: [0.01, 5e3] }],
  variants: [{ key: "over-ice", label: "eᵢ(T_f) = e", source: glossary("frost point"), validity: "up to the triple point", knownError: "0.05 K by the formula of eᵢ", value: ({ given: given8, constants, formulae }) => frostPoint(given8("vaporPressure"), constants, formulae) }],
  constants: ["enhancementFactor"],
  inside: ["ei"],
  ask: "The frost point: the temperature at which the air’s vapor pressure is that of saturation over ice; not defined where that lies above 0 °C.",
  working: ({ given: given8 }, value23) => [{ text: "The temperature at which the vapor pressure is that of saturation over ice", formula: "e_i(T_f) = e", filled: `e_i(${inCelsius(value23)}) = ${inHectopascal(given8("vaporPressure"))}` }],
  slips: [
    fineMoistSlip("dewpoint", "dewpoint for frost point", "This is the dewpoint, over liquid water; the frost point refers to ice and lies higher.", ({ given: given8, constants, formulae }) => dewpointFunction(constants, formulae)(given8("vaporPressure"))),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { vaporPressure: 200 }, gives: 260.2325, within: 1e-4 }
});

// shared/thermo/quantities/frostPointFromRelativeHumidity.ts
var frostPointFromRelativeHumidityDefinition = moistQuantity({
  key: "frost-point-from-relative-humidity",
  name: "frost point from the relative humidity",
  symbol: "T_f",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [{ ...temperatureInput2, range: [180, 310] }, relativeHumidityInput],
  variants: [{ key: "over-ice", label: "eᵢ(T_f) = RH eₛ(T)", source: glossary("frost point"), validity: "up to the triple point", knownError: "0.05 K by the formulae", value: ({ given: given8, air, constants, formulae }) => frostPoint(given8("relativeHumidity") * air.es(given8("temperature")), constants, formulae) }],
  constants: [],
  inside: ["es", "ei"],
  notedAt: { es: (given8) => [given8("temperature")] },
  ask: "The frost point, at which the vapor pressure is that of saturation over ice, from the temperature and the relative humidity over liquid water; not defined where that lies above 0 °C.",
  working: ({ given: given8, air }, value23) => {
    const es = air.es(given8("temperature")), e = given8("relativeHumidity") * es;
    return [
      saturationStep("e_s", "T", given8("temperature"), es),
      { text: "Vapor pressure", formula: "e = \\mathit{RH}\\,e_s", filled: `e = ${texNumber(given8("relativeHumidity"))} \\cdot ${texNumber(es / 100)} = ${inHectopascal(e)}`, value: e, unit: "Pa" },
      { text: "The temperature at which this is saturation over ice", formula: "e_i(T_f) = e", filled: `e_i(${inCelsius(value23)}) = ${inHectopascal(e)}` }
    ];
  },
  slips: [
    fineMoistSlip("dewpoint", "dewpoint for frost point", "This is the dewpoint, over liquid water; the frost point refers to ice and lies higher.", ({ given: given8, air, constants, formulae }) => dewpointFunction(constants, formulae)(given8("relativeHumidity") * air.es(given8("temperature")))),
    fineMoistSlip("humidity-over-ice", "RH taken over ice", "This takes the relative humidity for one over ice; it refers to liquid water.", ({ given: given8, constants, formulae }) => {
      if (given8("temperature") > 273.15 || given8("relativeHumidity") === 1) return null;
      const outcome3 = frostPoint(given8("relativeHumidity") * iceSaturationPressureFunction(constants, formulae)(given8("temperature")), constants, formulae);
      return outcome3.is === "value" ? outcome3.value : null;
    }),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { temperature: 263.15, relativeHumidity: 0.7 }, gives: 260.2731, within: 1e-4 }
});

// shared/thermo/mixingRatioDefinition.ts
function checkedVapor(hand, e) {
  if (!(e < hand.given("pressure"))) throw new OutOfRangeError("pressure", hand.given("pressure"), `pressures above the vapor pressure of ${e.toPrecision(5)} Pa`);
  return e;
}
function mixingRatioDefinition({ vaporPressure, step, temperatureName, inside, slips, inputs: inputs2, ...named2 }) {
  const over2 = (hand, ratio2) => ratio2(vaporPressure(hand), hand.given("pressure"));
  const at = temperatureName;
  return moistQuantity({
    ...named2,
    unit: "1",
    shownUnit: "g/kg",
    kind: "ratio",
    inputs: [pressureInput2, ...inputs2],
    variants: [
      { key: "exact", label: "ε e/(p − e)", source: glossary("mixing ratio"), validity: "e < p", knownError: "below 0.5 %: the enhancement factor of moist air", value: (hand) => mixingRatioFrom(checkedVapor(hand, vaporPressure(hand)), hand.given("pressure"), hand.air.epsilon) },
      { key: "approximate", label: "ε e/p, as an approximation", source: { text: "common practice: e neglected against p", status: "common practice" }, validity: "cold or dry air", knownError: "1 % at 10 hPa of vapor, 4 % at 40 hPa", value: (hand) => hand.air.epsilon * checkedVapor(hand, vaporPressure(hand)) / hand.given("pressure") }
    ],
    constants: ["R", "Rv", ...inside.length > 0 ? ["enhancementFactor"] : []],
    inside,
    notedAt: at === null ? {} : inside.includes("ei") ? { ei: (given8) => [given8(at)] } : { es: (given8) => [given8(at)] },
    working: (hand, value23) => {
      const e = vaporPressure(hand), p10 = hand.given("pressure"), { epsilon } = hand.air;
      const last = hand.variant === "approximate" ? { text: "Mixing ratio, with e neglected against p", formula: `${named2.symbol} = \\varepsilon\\,\\frac{e}{p}`, filled: `${named2.symbol} = ${texNumber(epsilon)} \\cdot \\frac{${texNumber(e / 100)}}{${texNumber(p10 / 100, 6)}} = ${inGrams(value23)}` } : mixingRatioStep(named2.symbol, "e", e, p10, hand.air);
      return step ? [step(hand, e), last] : [last];
    },
    slips: [
      smallMoistSlip("without-e", "e neglected against p", "This is ε e/p: in the denominator stands p − e.", (hand) => hand.variant === "approximate" ? null : over2(hand, (e, p10) => hand.air.epsilon * e / p10)),
      smallMoistSlip("specific-humidity", "specific humidity", "This is the specific humidity, per kilogram of moist air; the mixing ratio is per kilogram of dry air.", (hand) => hand.right / (1 + hand.right)),
      smallMoistSlip("plus", "p + e for p − e", "This comes from p + e in the denominator: the pressure of the dry air is p − e.", (hand) => over2(hand, (e, p10) => hand.air.epsilon * e / (p10 + e))),
      moistSlip("inverted-epsilon", "ε turned round", "This comes from 1/ε, the ratio of the gas constants the other way round.", (hand) => over2(hand, (e, p10) => e / (hand.air.epsilon * (p10 - e)))),
      moistSlip("epsilon-left-out", "ε left out", "This is e/(p − e): the ratio of the molar masses, ε = 0.622, is missing.", (hand) => over2(hand, (e, p10) => e / (p10 - e))),
      kilogramSlip,
      ...slips
    ]
  });
}

// shared/thermo/quantities/mixingRatio.ts
var mixingRatioDefinition2 = mixingRatioDefinition({
  key: "mixing-ratio",
  name: "mixing ratio",
  symbol: "w",
  inputs: [dewpointInput, temperatureForSlips],
  vaporPressure: ({ given: given8, air }) => air.es(given8("dewpoint")),
  step: ({ given: given8 }, e) => saturationStep("e", "T_d", given8("dewpoint"), e, "Vapor pressure: that of saturation at the dewpoint"),
  temperatureName: "dewpoint",
  inside: ["es"],
  ask: "The mixing ratio w of the air, mass of vapor per mass of dry air, from its dewpoint over liquid water.",
  slips: [
    atTemperatureSlip("the mixing ratio"),
    fineMoistSlip("ice-for-water", "over ice for over water", "This comes from the vapor pressure over ice; a dewpoint refers to liquid water, also below 0 °C.", (hand) => {
      const e = overIce(hand, hand.given("dewpoint"));
      return e === null ? null : hand.air.epsilon * e / (hand.given("pressure") - e);
    })
  ],
  example: { inputs: { pressure: 95900, dewpoint: 292.15 }, gives: 0.01457423, within: 1e-8 }
});

// shared/thermo/quantities/mixingRatioFromVaporPressure.ts
var mixingRatioFromVaporPressureDefinition = mixingRatioDefinition({
  key: "mixing-ratio-from-vapor-pressure",
  name: "mixing ratio from the vapor pressure",
  symbol: "w",
  inputs: [vaporPressureInput],
  vaporPressure: ({ given: given8 }) => given8("vaporPressure"),
  step: null,
  temperatureName: null,
  inside: [],
  ask: "The mixing ratio w of the air, mass of vapor per mass of dry air, from its vapor pressure.",
  slips: [],
  example: { inputs: { pressure: 95461, vaporPressure: 3169.7 }, gives: 0.02135834, within: 1e-8 }
});

// shared/thermo/quantities/mixingRatioFromWetBulb.ts
var ws = ({ given: given8, air }) => mixingRatioFrom(air.es(given8("wetBulb")), given8("pressure"), air.epsilon);
var depression = ({ given: given8 }) => given8("temperature") - given8("wetBulb");
function checked(hand, w2) {
  if (!(w2 > 0)) throw new OutOfRangeError("wetBulb", hand.given("wetBulb"), "wet-bulb temperatures that dry air or moister reaches");
  return w2;
}
var mixingRatioFromWetBulbDefinition = moistQuantity({
  key: "mixing-ratio-from-wet-bulb",
  name: "mixing ratio from the wet-bulb temperature",
  symbol: "w",
  unit: "1",
  shownUnit: "g/kg",
  kind: "ratio",
  inputs: [pressureInput2, temperatureInput2, wetBulbInput],
  variants: [
    { key: "isobaric", label: "with the heat capacity of the vapor", source: { text: "ASHRAE Handbook – Fundamentals (2017), SI, ch. 1, Eq. 33; read in the documentation of PsychroLib", status: "verified" }, validity: "liquid water on the bulb", knownError: "0.5 %", value: (hand) => checked(hand, mixingRatioFromWetBulb(hand.given("temperature"), hand.given("wetBulb"), hand.given("pressure"), hand.air)) },
    { key: "dry-heat", label: "with the heat capacity of dry air", source: { text: 'AMS Glossary of Meteorology, "wet-bulb temperature" (isobaric)', status: "common practice" }, validity: "liquid water on the bulb", knownError: "0.5 %", value: (hand) => checked(hand, mixingRatioFromWetBulb(hand.given("temperature"), hand.given("wetBulb"), hand.given("pressure"), hand.air, false)) }
  ],
  constants: ["R", "Rv", "cp", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("wetBulb")], L: (given8) => [given8("wetBulb")] },
  ask: "The mixing ratio w of the air from its (thermodynamic, isobaric) wet-bulb temperature over liquid water.",
  working: (hand, value23) => {
    const { given: given8, air } = hand, L = air.L(given8("wetBulb"));
    return [
      { ...mixingRatioStep("w_s", "e_s", air.es(given8("wetBulb")), given8("pressure"), air), text: "Saturation mixing ratio at the wet bulb" },
      { text: "The air’s heat pays for the water that evaporates", formula: hand.variant === "dry-heat" ? "w = w_s - \\frac{c_p\\,(T - T_w)}{L}" : "w = \\frac{L\\,w_s - c_p\\,(T - T_w)}{L + c_{pv}\\,(T - T_w)}", filled: hand.variant === "dry-heat" ? `w = ${texNumber(ws(hand))} - \\frac{${texNumber(air.cp)} \\cdot ${texNumber(depression(hand))}}{${texNumber(L, 6)}} = ${inGrams(value23)}` : `w = \\frac{${texNumber(L, 6)} \\cdot ${texNumber(ws(hand))} - ${texNumber(air.cp)} \\cdot ${texNumber(depression(hand))}}{${texNumber(L, 6)} + ${texNumber(air.cpv)} \\cdot ${texNumber(depression(hand))}} = ${inGrams(value23)}` }
    ];
  },
  slips: [
    fineMoistSlip("saturation", "saturation at the wet bulb", "This is the saturation mixing ratio at the wet bulb: the air holds less, since its heat paid for what evaporated.", ws),
    moistSlip("sign", "added in place of taken away", "What evaporates comes on top of what the air held: it is taken away, not added.", (hand) => depression(hand) === 0 ? null : (hand.air.L(hand.given("wetBulb")) * ws(hand) + hand.air.cp * depression(hand)) / (hand.air.L(hand.given("wetBulb")) - hand.air.cpv * depression(hand))),
    moistSlip("swapped", "dry and wet bulb swapped", "This comes from the dry and the wet bulb in each other’s place.", ({ given: given8, air }) => given8("temperature") === given8("wetBulb") ? null : mixingRatioFromWetBulb(given8("wetBulb"), given8("temperature"), given8("pressure"), air)),
    kilogramSlip
  ],
  example: { inputs: { pressure: 95461, temperature: 303.15, wetBulb: 298.15 }, gives: 0.01921305, within: 1e-8 }
});

// shared/thermo/quantities/relativeHumidity.ts
var relativeHumidityDefinition = moistQuantity({
  key: "relative-humidity",
  name: "relative humidity",
  symbol: "RH",
  unit: "1",
  shownUnit: "%",
  kind: "fraction",
  inputs: [temperatureInput2, dewpointInput],
  variants: [{ key: "vapor-pressures", label: "e/eₛ, ratio of vapor pressures", source: wmoHumidity, validity: "over liquid water, also below 0 °C", knownError: "0.1 of a percent by the formula of eₛ", value: ({ given: given8, air }) => air.es(given8("dewpoint")) / air.es(given8("temperature")) }],
  constants: [],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("temperature"), given8("dewpoint")] },
  remarks: (_hand, value23) => [supersaturated(value23)],
  ask: "The relative humidity over liquid water, also below 0 °C, as the ratio of vapor pressures e/es.",
  working: ({ given: given8, air }, value23) => {
    const e = air.es(given8("dewpoint")), es = air.es(given8("temperature"));
    return [
      saturationStep("e", "T_d", given8("dewpoint"), e, "Vapor pressure: that of saturation at the dewpoint"),
      saturationStep("e_s", "T", given8("temperature"), es),
      { text: "Their ratio", formula: "\\mathit{RH} = \\frac{e}{e_s}", filled: `\\mathit{RH} = \\frac{${texNumber(e / 100)}}{${texNumber(es / 100)}} = ${texQuantity(value23 * 100, "%")}` }
    ];
  },
  slips: [
    moistSlip("swapped", "vapor pressures swapped", "This is es/e: the air holds e, and at saturation it would hold es.", (hand) => swappedSlip2.apply(hand)),
    moistSlip("celsius-ratio", "ratio of temperatures in °C", "This is Td/T in °C: the ratio is of vapor pressures.", ({ given: given8 }) => given8("temperature") > zeroCelsius + 1 && given8("dewpoint") !== given8("temperature") ? (given8("dewpoint") - zeroCelsius) / (given8("temperature") - zeroCelsius) : null),
    moistSlip("kelvin-ratio", "ratio of temperatures in kelvin", "This is Td/T in kelvin: the ratio is of vapor pressures.", ({ given: given8 }) => given8("dewpoint") === given8("temperature") ? null : given8("dewpoint") / given8("temperature")),
    fineMoistSlip("five-per-kelvin", "5 % for each kelvin of T − Td", "This is the rule of thumb of 5 % for each kelvin between temperature and dewpoint.", ({ given: given8 }) => given8("temperature") - given8("dewpoint") < 19 ? 1 - 0.05 * (given8("temperature") - given8("dewpoint")) : null),
    fineMoistSlip("ice-for-water", "over ice for over water", "This is relative to saturation over ice; relative humidity refers to liquid water, also below 0 °C.", (hand) => {
      const es = overIce(hand, hand.given("temperature"));
      return es === null ? null : hand.air.es(hand.given("dewpoint")) / es;
    }),
    fractionAsPercentSlip
  ],
  example: { inputs: { temperature: 303.15, dewpoint: 293.15 }, gives: 0.550443, within: 1e-6 }
});

// shared/thermo/quantities/relativeHumidityByMixingRatio.ts
var relativeHumidityByMixingRatioDefinition = moistQuantity({
  key: "relative-humidity-by-mixing-ratio",
  name: "relative humidity as the ratio of mixing ratios",
  symbol: "w/ws",
  unit: "1",
  shownUnit: "%",
  kind: "fraction",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [{
    key: "mixing-ratios",
    label: "w/wₛ, ratio of mixing ratios",
    source: glossary("relative humidity", "common practice"),
    validity: "over liquid water, also below 0 °C",
    knownError: "0.1 of a percent by the formula of eₛ",
    value: ({ given: given8, air }) => mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon) / mixingRatioFrom(air.es(given8("temperature")), given8("pressure"), air.epsilon)
  }],
  constants: ["R", "Rv", "enhancementFactor"],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("temperature"), given8("dewpoint")] },
  remarks: (_hand, value23) => [value23 > 1 + 1e-12 ? "Supersaturated: the mixing ratio is above that of saturation over liquid water." : null],
  ask: "The relative humidity over liquid water as the ratio of mixing ratios w/ws, not of vapor pressures.",
  working: ({ given: given8, air }, value23) => {
    const e = air.es(given8("dewpoint")), es = air.es(given8("temperature")), p10 = given8("pressure");
    return [
      { ...mixingRatioStep("w", "e", e, p10, air), text: "Mixing ratio, with e = es(Td)" },
      { ...mixingRatioStep("w_s", "e_s", es, p10, air), text: "Saturation mixing ratio at the temperature" },
      { text: "Their ratio", formula: "\\mathit{RH} = \\frac{w}{w_s}", filled: `\\frac{${texNumber(1e3 * mixingRatioFrom(e, p10, air.epsilon))}}{${texNumber(1e3 * mixingRatioFrom(es, p10, air.epsilon))}} = ${texQuantity(value23 * 100, "%")}` }
    ];
  },
  slips: [
    fineMoistSlip("vapor-pressures", "e/eₛ for w/wₛ", "This is the ratio of vapor pressures; asked is that of mixing ratios.", ({ given: given8, air }) => air.es(given8("dewpoint")) / air.es(given8("temperature"))),
    moistSlip("swapped", "mixing ratios swapped", "This is ws/w: the air holds w, and at saturation it would hold ws.", (hand) => swappedSlip2.apply(hand)),
    fractionAsPercentSlip
  ],
  example: { inputs: { pressure: 1e5, temperature: 303.15, dewpoint: 293.15 }, gives: 0.5396857, within: 1e-6 }
});

// shared/thermo/psychrometerDefinition.ts
var coefficientsOf = { ventilated: ventilatedCoefficients, screen: screenCoefficients, ice: iceCoefficients };
var wordsOf = {
  ventilated: "a ventilated psychrometer (2.5 m/s and more) with a wet bulb",
  screen: "a psychrometer in a screen with natural ventilation and a wet bulb",
  ice: "a ventilated psychrometer whose bulb bears ice"
};
var coefficientInput = { name: "psychrometerCoefficient", label: "psychrometer coefficient A, where it is given", symbol: "A", unit: "1/K", shownUnit: "1/K", kind: "ratio", shape: "number", range: [3e-4, 15e-4], isOptional: true };
var psychrometerVaporPressure = (atBulb, pressure4, depression2, coefficient) => atBulb - coefficient * pressure4 * depression2;
var bulbPressure = (hand, bulb) => bulb === "ice" ? iceSaturationPressureFunction(hand.constants, hand.formulae)(hand.given("wetBulb")) : hand.air.es(hand.given("wetBulb"));
var depressionOf = ({ given: given8 }) => given8("temperature") - given8("wetBulb");
var coefficientOf = (hand, bulb) => optionally(hand, "psychrometerCoefficient") ?? (coefficientsOf[bulb].find((one2) => one2.key === hand.variant) ?? coefficientsOf[bulb][0])?.of(hand.given("wetBulb")) ?? NaN;
function vaporOf2(hand, bulb, coefficient = coefficientOf(hand, bulb), atBulb = bulbPressure(hand, bulb)) {
  const e = psychrometerVaporPressure(atBulb, hand.given("pressure"), depressionOf(hand), coefficient);
  if (!(e > 0)) throw new OutOfRangeError("wetBulb", hand.given("wetBulb"), "wet-bulb temperatures that leave a vapor pressure above zero");
  return e;
}
function psychrometerDefinition({ bulb, gives, ...named2 }) {
  const isHumidity = gives === "relative-humidity";
  const finish = (hand, e) => isHumidity ? e / hand.air.es(hand.given("temperature")) : e;
  const withCoefficient = (coefficient, hand, atBulb) => finish(hand, psychrometerVaporPressure(atBulb ?? bulbPressure(hand, bulb), hand.given("pressure"), depressionOf(hand), coefficient));
  return moistQuantity({
    ...named2,
    symbol: isHumidity ? "RH" : "e",
    unit: isHumidity ? "1" : "Pa",
    shownUnit: isHumidity ? "%" : "hPa",
    kind: isHumidity ? "fraction" : "ratio",
    inputs: [pressureInput2, { ...temperatureInput2, label: "dry-bulb temperature", range: bulb === "ice" ? [230, 280] : [230, 330] }, bulb === "ice" ? { ...wetBulbInput, range: [220, 273.16] } : wetBulbInput, coefficientInput],
    variants: coefficientsOf[bulb].map(({ key, label, source: source2 }) => ({ key, label, source: source2, validity: wordsOf[bulb], knownError: "0.1 hPa by the coefficients in use", value: (hand) => finish(hand, vaporOf2(hand, bulb)) })),
    constants: isHumidity ? [] : ["enhancementFactor"],
    inside: bulb === "ice" ? isHumidity ? ["ei", "es"] : ["ei"] : ["es"],
    notedAt: bulb === "ice" ? { ei: (given8) => [given8("wetBulb")] } : { es: (given8) => [given8("wetBulb")] },
    remarks: ({ given: given8 }) => [given8("wetBulb") > given8("temperature") ? "The wet bulb reads above the dry one: one of the two is wrong, or the air is supersaturated." : null],
    ask: isHumidity ? `The relative humidity over liquid water, e/es, by the readings of ${wordsOf[bulb]}.` : `The vapor pressure e of the air by the readings of ${wordsOf[bulb]}.`,
    working: (hand, value23) => {
      const atBulb = bulbPressure(hand, bulb), A = coefficientOf(hand, bulb), e = withCoefficientPlain(hand, A, atBulb);
      const symbol = bulb === "ice" ? "e_i" : "e_s";
      const given8 = optionally(hand, "psychrometerCoefficient") !== null;
      const steps2 = [
        { text: bulb === "ice" ? "Saturation over ice at the bulb" : "Saturation over water at the bulb", formula: `e_w = ${symbol}(T_w)`, filled: `e_w = ${symbol}(${inCelsius(hand.given("wetBulb"))}) = ${inHectopascal(atBulb)}`, value: atBulb, unit: "Pa" },
        { text: given8 ? "Coefficient, as given" : "Coefficient of the ventilation", formula: `A${given8 ? "" : ` = ${(coefficientsOf[bulb].find((one2) => one2.key === hand.variant) ?? coefficientsOf[bulb][0])?.tex ?? ""}`}`, filled: `A = ${texQuantity(A, "1/K")}`, value: A, unit: "1/K" },
        { text: "Psychrometer equation", formula: "e = e_w - A\\,p\\,(T - T_w)", filled: `e = ${texNumber(atBulb / 100)} - ${texNumber(A)} \\cdot ${texNumber(hand.given("pressure") / 100, 6)} \\cdot ${texNumber(depressionOf(hand))} = ${inHectopascal(e)}`, value: e, unit: "Pa" }
      ];
      if (isHumidity) steps2.push({ text: "Over the saturation vapor pressure over liquid water at the dry bulb", formula: "\\mathit{RH} = \\frac{e}{e_s(T)}", filled: `\\mathit{RH} = \\frac{${texNumber(e / 100)}}{${texNumber(hand.air.es(hand.given("temperature")) / 100)}} = ${texQuantity(value23 * 100, "%")}` });
      return steps2;
    },
    slips: slipsOf2(bulb, isHumidity, withCoefficient)
  });
}
var withCoefficientPlain = (hand, A, atBulb) => psychrometerVaporPressure(atBulb, hand.given("pressure"), depressionOf(hand), A);
function slipsOf2(bulb, isHumidity, by3) {
  const isGiven = (hand) => optionally(hand, "psychrometerCoefficient") !== null;
  const other2 = (key, label, sentence, coefficient) => fineMoistSlip(key, label, sentence, (hand) => isGiven(hand) || depressionOf(hand) === 0 ? null : by3(coefficient, hand));
  return [
    ...bulb === "ventilated" ? [other2("screen", "coefficient of a screen", "This comes from the coefficient of a screen with natural ventilation: this bulb is ventilated.", 799e-6)] : [],
    ...bulb === "screen" ? [other2("ventilated", "coefficient of a ventilated bulb", "This comes from the coefficient of a ventilated psychrometer: in a screen the bulb is ventilated less.", 662e-6)] : [],
    ...bulb === "ice" ? [other2("wet", "coefficient of a wet bulb", "This comes from the coefficient of a wet bulb: this one bears ice.", 662e-6)] : [],
    bulb === "ice" ? fineMoistSlip("water-for-ice", "over water for over ice", "This takes the saturation vapor pressure over water at the bulb: it bears ice.", (hand) => by3(coefficientOf(hand, bulb), hand, hand.air.es(hand.given("wetBulb")))) : fineMoistSlip("ice-for-water", "over ice for over water", "This takes the saturation vapor pressure over ice at the bulb: it is wet.", (hand) => hand.given("wetBulb") < 273.15 ? by3(coefficientOf(hand, bulb), hand, iceSaturationPressureFunction(hand.constants, hand.formulae)(hand.given("wetBulb"))) : null),
    moistSlip("sign", "added in place of taken away", "The evaporation costs vapor: A p (T − Tw) is taken away.", (hand) => depressionOf(hand) === 0 ? null : by3(-coefficientOf(hand, bulb), hand)),
    fineMoistSlip("no-depression", "without the depression", "This takes saturation at the wet bulb for the air’s vapor pressure: A p (T − Tw) is missing.", (hand) => depressionOf(hand) === 0 ? null : by3(0, hand)),
    moistSlip("at-dry-bulb", "saturation at the dry bulb", "This takes the saturation vapor pressure at the dry bulb in the psychrometer equation: it is that at the wet bulb.", (hand) => depressionOf(hand) === 0 ? null : by3(coefficientOf(hand, bulb), hand, hand.air.es(hand.given("temperature")))),
    ...isHumidity ? [fineMoistSlip("over-wet-bulb", "over saturation at the wet bulb", "This divides by the saturation vapor pressure at the wet bulb: it is that at the dry bulb.", ({ given: given8, air, right }) => right * air.es(given8("temperature")) / air.es(given8("wetBulb"))), fractionAsPercentSlip] : [pascalSlip, kilopascalSlip]
  ];
}

// shared/thermo/quantities/relativeHumidityFromIcePsychrometer.ts
var relativeHumidityFromIcePsychrometerDefinition = psychrometerDefinition({
  key: "relative-humidity-from-ice-psychrometer",
  name: "relative humidity by a psychrometer with ice",
  bulb: "ice",
  gives: "relative-humidity",
  example: { inputs: { pressure: 9e4, temperature: 270.15, wetBulb: 268.65 }, gives: 0.6968049, within: 1e-6 }
});

// shared/thermo/quantities/relativeHumidityFromPsychrometer.ts
var relativeHumidityFromPsychrometerDefinition = psychrometerDefinition({
  key: "relative-humidity-from-psychrometer",
  name: "relative humidity by a ventilated psychrometer",
  bulb: "ventilated",
  gives: "relative-humidity",
  example: { inputs: { pressure: 1e5, temperature: 293.15, wetBulb: 288.15 }, gives: 0.5874871, within: 1e-6 }
});

// shared/thermo/quantities/relativeHumidityFromScreenPsychrometer.ts
var relativeHumidityFromScreenPsychrometerDefinition = psychrometerDefinition({
  key: "relative-humidity-from-screen-psychrometer",
  name: "relative humidity by a psychrometer in a screen",
  bulb: "screen",
  gives: "relative-humidity",
  example: { inputs: { pressure: 1e5, temperature: 293.15, wetBulb: 288.15 }, gives: 0.5582281, within: 1e-6 }
});

// shared/thermo/quantities/relativeHumidityOverIce.ts
var relativeHumidityOverIceDefinition = moistQuantity({
  key: "relative-humidity-over-ice",
  name: "relative humidity over ice",
  symbol: "RHi",
  unit: "1",
  shownUnit: "%",
  kind: "fraction",
  inputs: [{ ...temperatureInput2, range: [180, 273.16] }, { ...dewpointInput, range: [160, 275] }],
  variants: [{ key: "vapor-pressures", label: "e/eᵢ, ratio of vapor pressures", source: wmoHumidity, validity: "below 0 °C", knownError: "0.5 of a percent by the formulae", value: ({ given: given8, air, constants, formulae }) => air.es(given8("dewpoint")) / iceSaturationPressureFunction(constants, formulae)(given8("temperature")) }],
  constants: [],
  inside: ["es", "ei"],
  notedAt: { es: (given8) => [given8("dewpoint")], ei: (given8) => [given8("temperature")] },
  remarks: (_hand, value23) => [value23 > 1 + 1e-12 ? "Supersaturated over ice, as cold air without ice often is." : null],
  ask: "The relative humidity over ice, e over the saturation vapor pressure over ice; the dewpoint refers to liquid water.",
  working: ({ given: given8, air, constants, formulae }, value23) => {
    const e = air.es(given8("dewpoint")), ei = iceSaturationPressureFunction(constants, formulae)(given8("temperature"));
    return [
      saturationStep("e", "T_d", given8("dewpoint"), e, "Vapor pressure: that of saturation over water at the dewpoint"),
      { text: "Saturation vapor pressure over ice", formula: "e_i(T)", filled: `e_i = ${inHectopascal(ei)}`, value: ei, unit: "Pa" },
      { text: "Their ratio", formula: "\\mathit{RH}_i = \\frac{e}{e_i}", filled: `\\frac{${texNumber(e / 100)}}{${texNumber(ei / 100)}} = ${texQuantity(value23 * 100, "%")}` }
    ];
  },
  slips: [
    fineMoistSlip("water-for-ice", "over water for over ice", "This is relative to saturation over liquid water; asked is that over ice.", ({ given: given8, air }) => air.es(given8("dewpoint")) / air.es(given8("temperature"))),
    fineMoistSlip("frost-point", "dewpoint taken for a frost point", "This takes the vapor pressure over ice at the dewpoint; the dewpoint refers to liquid water.", ({ given: given8, constants, formulae }) => {
      const ei = iceSaturationPressureFunction(constants, formulae);
      return given8("dewpoint") < 273.16 ? ei(given8("dewpoint")) / ei(given8("temperature")) : null;
    }),
    moistSlip("swapped", "vapor pressures swapped", "This is the ratio turned round.", ({ right }) => right === 1 ? null : 1 / right),
    fractionAsPercentSlip
  ],
  example: { inputs: { temperature: 263.15, dewpoint: 261.85 }, gives: 0.9952592, within: 1e-6 }
});

// shared/thermo/quantities/saturationMixingRatio.ts
var saturationMixingRatioDefinition = mixingRatioDefinition({
  key: "saturation-mixing-ratio",
  name: "saturation mixing ratio over liquid water",
  symbol: "w_s",
  inputs: [temperatureInput2],
  vaporPressure: ({ given: given8, air }) => air.es(given8("temperature")),
  step: ({ given: given8 }, e) => saturationStep("e", "T", given8("temperature"), e),
  temperatureName: "temperature",
  inside: ["es"],
  ask: "The mixing ratio of air that is saturated over liquid water at the temperature and the pressure.",
  slips: [
    fineMoistSlip("ice-for-water", "over ice for over water", "This comes from the vapor pressure over ice; asked is saturation over liquid water, also below 0 °C.", (hand) => {
      const e = overIce(hand, hand.given("temperature"));
      return e === null ? null : hand.air.epsilon * e / (hand.given("pressure") - e);
    })
  ],
  example: { inputs: { pressure: 101325, temperature: 298.15 }, gives: 0.0200675, within: 1e-8 }
});

// shared/thermo/quantities/saturationMixingRatioOverIce.ts
var saturationMixingRatioOverIceDefinition = mixingRatioDefinition({
  key: "saturation-mixing-ratio-over-ice",
  name: "saturation mixing ratio over ice",
  symbol: "w_i",
  inputs: [{ ...temperatureInput2, range: [160, 273.16] }],
  vaporPressure: ({ given: given8, constants, formulae }) => iceSaturationPressureFunction(constants, formulae)(given8("temperature")),
  step: ({ given: given8 }, e) => ({ ...saturationStep("e", "T", given8("temperature"), e, "Saturation vapor pressure over ice"), formula: "e = e_i(T)" }),
  temperatureName: "temperature",
  inside: ["ei"],
  ask: "The mixing ratio of air that is saturated over ice at the temperature and the pressure.",
  slips: [
    fineMoistSlip("water-for-ice", "over water for over ice", "This comes from the vapor pressure over liquid water; asked is saturation over ice.", ({ given: given8, air }) => {
      const e = air.es(given8("temperature"));
      return air.epsilon * e / (given8("pressure") - e);
    })
  ],
  example: { inputs: { pressure: 7e4, temperature: 258.15 }, gives: 1471929e-9, within: 1e-9 }
});

// shared/thermo/quantities/specificEnthalpyOfMoistAir.ts
var specificEnthalpyOfMoistAirDefinition = moistQuantity({
  key: "specific-enthalpy-of-moist-air",
  name: "specific enthalpy of moist air",
  symbol: "h",
  unit: "J/kg",
  shownUnit: "kJ/kg",
  kind: "difference",
  nearZero: 1e3,
  inputs: [temperatureInput2, mixingRatioInput],
  variants: [{ key: "constant-heats", label: "cp t + w (L₀ + cpv t)", source: { text: "ASHRAE Handbook – Fundamentals (2017), SI, ch. 1, Eq. 30; read in the documentation of PsychroLib", status: "verified" }, validity: "−50 to 50 °C", knownError: "0.1 kJ kg⁻¹", value: ({ given: given8, air, constants }) => air.cp * (given8("temperature") - zeroCelsius) + given8("mixingRatio") * (constant(constants, "latentHeat") + air.cpv * (given8("temperature") - zeroCelsius)) }],
  constants: ["cp", "cpv", "latentHeat"],
  ask: "The specific enthalpy of the moist air per kilogram of dry air, counted from 0 °C with the water liquid.",
  working: ({ given: given8, air, constants }, value23) => {
    const t = given8("temperature") - zeroCelsius, w2 = given8("mixingRatio"), L0 = constant(constants, "latentHeat");
    return [{ text: "Dry air and vapor, with t in °C and L at 0 °C", formula: "h = c_p\\,t + w\\,(L_0 + c_{pv}\\,t)", filled: `h = ${texNumber(air.cp / 1e3)} \\cdot ${texFactor(t)} + ${texNumber(w2)}\\,(${texNumber(L0 / 1e3)} + ${texNumber(air.cpv / 1e3)} \\cdot ${texFactor(t)}) = ${texQuantity(value23 / 1e3, "kJ/kg")}` }];
  },
  slips: [
    moistSlip("kelvin-for-celsius", "kelvin put in for Celsius", "This counts from 0 K: the enthalpy is counted from 0 °C.", ({ given: given8, again }) => given8("temperature") < 320 ? again({ temperature: given8("temperature") + zeroCelsius }) : null),
    moistSlip("dry", "without the vapor", "This is cp t alone: the vapor’s part w (L + cpv t) is missing.", ({ given: given8, air }) => given8("temperature") === zeroCelsius ? null : air.cp * (given8("temperature") - zeroCelsius)),
    moistSlip("latent-only", "without cp t", "This is the vapor’s part alone: cp t of the dry air is missing.", ({ given: given8, air, right }) => given8("temperature") === zeroCelsius ? null : right - air.cp * (given8("temperature") - zeroCelsius)),
    moistSlip("joules-for-kilojoules", "J given as kJ", "Your number is in joules; the unit beside it says kilojoules.", ({ right }) => right * 1e3),
    moistSlip("sign", "sign turned round", "The enthalpy is counted positive above 0 °C and for the vapor.", ({ right }) => -right)
  ],
  example: { inputs: { temperature: 313.15, mixingRatio: 65e-4 }, gives: 56902.7, within: 1 }
});

// shared/thermo/moistHeatDefinition.ts
function moistHeatDefinition({ tex, dryTex, vaporTex, dry, vapor: vapor2, ...named2 }) {
  const whole = (constants, w2) => (dry(constants) + w2 * vapor2(constants)) / (1 + w2);
  return moistQuantity({
    ...named2,
    unit: "J/(kg.K)",
    shownUnit: "J/(kg.K)",
    kind: "ratio",
    inputs: [mixingRatioInput],
    variants: [{ key: "by-mass", label: "dry air and vapor by mass", source: glossary("specific heat", "common practice"), validity: "near the temperatures of the lower atmosphere", knownError: "0.2 %", value: ({ given: given8, constants }) => whole(constants, given8("mixingRatio")) }],
    working: ({ given: given8, constants }, value23) => {
      const w2 = given8("mixingRatio");
      return [{ text: "Dry air and vapor by their masses, with w in kg per kg", formula: `${tex} = \\frac{${dryTex} + w\\,${vaporTex}}{1 + w}`, filled: `${tex} = \\frac{${texNumber(dry(constants), 6)} + ${texNumber(w2)} \\cdot ${texNumber(vapor2(constants))}}{1 + ${texNumber(w2)}} = ${texQuantity(value23, "J/(kg.K)", 6)}` }];
    },
    slips: [
      smallMoistSlip("dry", "as if dry", "This is that of dry air: the vapor, which takes twice as much, is not in it.", ({ constants }) => dry(constants)),
      smallMoistSlip("per-dry-air", "per kilogram of dry air", "This is per kilogram of dry air: divide by 1 + w.", ({ given: given8, right }) => right * (1 + given8("mixingRatio"))),
      smallMoistSlip("liquid", "liquid water for vapor", "This comes from the specific heat of liquid water: the air holds vapor.", ({ given: given8, constants }) => (dry(constants) + given8("mixingRatio") * constant(constants, "cw")) / (1 + given8("mixingRatio"))),
      moistSlip("grams", "g kg⁻¹ put in for kg kg⁻¹", "This is what comes out with w in g per kg: the formula takes kg per kg.", ({ given: given8, again }) => again({ mixingRatio: 1e3 * given8("mixingRatio") }))
    ]
  });
}

// shared/thermo/quantities/specificHeatAtConstantVolumeOfMoistAir.ts
var specificHeatAtConstantVolumeOfMoistAirDefinition = moistHeatDefinition({
  key: "specific-heat-at-constant-volume-of-moist-air",
  name: "specific heat of moist air at constant volume",
  symbol: "c_vm",
  ask: "The specific heat of the moist air at constant volume, per kilogram of moist air.",
  constants: ["cv", "cpv", "Rv"],
  tex: "c_{vm}",
  dryTex: "c_v",
  vaporTex: "(c_{pv} - R_v)",
  dry: (constants) => constant(constants, "cv"),
  vapor: (constants) => constant(constants, "cpv") - constant(constants, "Rv"),
  example: { inputs: { mixingRatio: 0.015 }, gives: 727.219, within: 1e-3 }
});

// shared/thermo/quantities/specificHeatOfMoistAir.ts
var specificHeatOfMoistAirDefinition = moistHeatDefinition({
  key: "specific-heat-of-moist-air",
  name: "specific heat of moist air at constant pressure",
  symbol: "c_pm",
  ask: "The specific heat of the moist air at constant pressure, per kilogram of moist air.",
  constants: ["cp", "cpv"],
  tex: "c_{pm}",
  dryTex: "c_p",
  vaporTex: "c_{pv}",
  dry: (constants) => constant(constants, "cp"),
  vapor: (constants) => constant(constants, "cpv"),
  example: { inputs: { mixingRatio: 0.015 }, gives: 1016.798, within: 1e-3 }
});

// shared/thermo/quantities/specificHumidity.ts
var specificHumidityDefinition = moistQuantity({
  key: "specific-humidity",
  name: "specific humidity from the mixing ratio",
  symbol: "q",
  unit: "1",
  shownUnit: "g/kg",
  kind: "ratio",
  inputs: [mixingRatioInput],
  variants: [{ key: "exact", label: "w/(1 + w)", source: glossary("specific humidity"), validity: "any", knownError: "none: by definition", value: ({ given: given8 }) => specificHumidityFrom(given8("mixingRatio")) }],
  constants: [],
  ask: "The specific humidity q of the air, mass of vapor per mass of moist air.",
  working: ({ given: given8 }, value23) => [{ text: "Per kilogram of moist air, with w in kg per kg", formula: "q = \\frac{w}{1 + w}", filled: `q = \\frac{${texNumber(given8("mixingRatio"))}}{1 + ${texNumber(given8("mixingRatio"))}} = ${inGrams(value23)}` }],
  slips: [
    fineMoistSlip("mixing-ratio", "the mixing ratio itself", "This is the mixing ratio, per kilogram of dry air: the specific humidity is per kilogram of moist air.", ({ given: given8 }) => given8("mixingRatio")),
    fineMoistSlip("turned-round", "conversion turned round", "This is w/(1 − w), the conversion the other way round.", ({ given: given8 }) => given8("mixingRatio") / (1 - given8("mixingRatio"))),
    moistSlip("grams", "g kg⁻¹ put in for kg kg⁻¹", "This is what comes out with w in g per kg: the formula takes kg per kg.", ({ given: given8, again }) => again({ mixingRatio: 1e3 * given8("mixingRatio") })),
    kilogramSlip
  ],
  example: { inputs: { mixingRatio: 0.015 }, gives: 0.014778, within: 1e-6 }
});

// shared/thermo/quantities/specificHumidityFromDewpoint.ts
var specificHumidityFromDewpointDefinition = moistQuantity({
  key: "specific-humidity-from-dewpoint",
  name: "specific humidity from the dewpoint",
  symbol: "q",
  unit: "1",
  shownUnit: "g/kg",
  kind: "ratio",
  inputs: [pressureInput2, dewpointInput, temperatureForSlips],
  variants: [{
    key: "exact",
    label: "ε e/[p − (1 − ε) e]",
    source: glossary("specific humidity"),
    validity: "e < p",
    knownError: "below 0.5 %: the enhancement factor of moist air",
    value: ({ given: given8, air }) => specificHumidityFrom(mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon))
  }],
  constants: ["R", "Rv", "enhancementFactor"],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  ask: "The specific humidity q of the air, mass of vapor per mass of moist air, from its dewpoint over liquid water.",
  working: ({ given: given8, air }, value23) => {
    const e = air.es(given8("dewpoint"));
    return [
      saturationStep("e", "T_d", given8("dewpoint"), e, "Vapor pressure: that of saturation at the dewpoint"),
      { text: "Per kilogram of moist air", formula: "q = \\frac{\\varepsilon\\,e}{p - (1 - \\varepsilon)\\,e}", filled: `q = \\frac{${texNumber(air.epsilon)} \\cdot ${texNumber(e / 100)}}{${texNumber(given8("pressure") / 100, 6)} - ${texNumber(1 - air.epsilon)} \\cdot ${texNumber(e / 100)}} = ${inGrams(value23)}` }
    ];
  },
  slips: [
    atTemperatureSlip("the specific humidity"),
    smallMoistSlip("mixing-ratio", "the mixing ratio", "This is the mixing ratio, per kilogram of dry air: the specific humidity is per kilogram of moist air.", ({ right }) => right / (1 - right)),
    fineMoistSlip("ice-for-water", "over ice for over water", "This comes from the vapor pressure over ice; a dewpoint refers to liquid water, also below 0 °C.", (hand) => {
      const e = overIce(hand, hand.given("dewpoint"));
      return e === null ? null : specificHumidityFrom(mixingRatioFrom(e, hand.given("pressure"), hand.air.epsilon));
    }),
    moistSlip("epsilon-left-out", "ε left out", "This is e/p: the ratio of the molar masses, ε = 0.622, is missing.", ({ given: given8, air }) => air.es(given8("dewpoint")) / given8("pressure")),
    kilogramSlip
  ],
  example: { inputs: { pressure: 85e3, dewpoint: 285.65 }, gives: 0.01066567, within: 1e-8 }
});

// shared/thermo/quantities/vaporPressure.ts
var vaporPressureDefinition = moistQuantity({
  key: "vapor-pressure",
  name: "vapor pressure",
  symbol: "e",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  inputs: [dewpointInput, temperatureForSlips],
  variants: [{ key: "at-dewpoint", label: "that of saturation at the dewpoint", source: glossary("dewpoint"), validity: "as of the formula of eₛ", knownError: "0.1 to 0.3 % by the formula of eₛ", value: ({ given: given8, air }) => air.es(given8("dewpoint")) }],
  constants: ["enhancementFactor"],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  ask: "The vapor pressure e of the air from its dewpoint over liquid water.",
  working: ({ given: given8 }, value23) => [saturationStep("e", "T_d", given8("dewpoint"), value23, "By the definition of the dewpoint")],
  slips: [
    atTemperatureSlip("the vapor pressure"),
    fineMoistSlip("ice-for-water", "over ice for over water", "This is the vapor pressure over ice at the dewpoint; a dewpoint refers to liquid water, also below 0 °C.", (hand) => overIce(hand, hand.given("dewpoint"))),
    moistSlip("sign", "sign of the dewpoint lost", "This comes from the dewpoint with its sign turned round.", ({ given: given8, again }) => given8("dewpoint") > 220 && given8("dewpoint") < 330 && given8("dewpoint") !== zeroCelsius ? again({ dewpoint: 2 * zeroCelsius - given8("dewpoint") }) : null),
    pascalSlip,
    kilopascalSlip
  ],
  example: { inputs: { dewpoint: 285.15 }, gives: 1401.539, within: 1e-3 }
});

// shared/thermo/quantities/vaporPressureFromIcePsychrometer.ts
var vaporPressureFromIcePsychrometerDefinition = psychrometerDefinition({
  key: "vapor-pressure-from-ice-psychrometer",
  name: "vapor pressure by a psychrometer with ice",
  bulb: "ice",
  gives: "vapor-pressure",
  example: { inputs: { pressure: 9e4, temperature: 270.15, wetBulb: 268.65 }, gives: 341.64, within: 1e-3 }
});

// shared/thermo/quantities/vaporPressureFromMixingRatio.ts
var vaporPressureFromMixingRatioDefinition = moistQuantity({
  key: "vapor-pressure-from-mixing-ratio",
  name: "vapor pressure from the mixing ratio",
  symbol: "e",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  inputs: [pressureInput2, mixingRatioInput],
  variants: [
    { key: "exact", label: "w p/(ε + w)", source: glossary("mixing ratio"), validity: "any", knownError: "0.1 % by the gas constants", value: ({ given: given8, air }) => vaporPressureFrom(given8("mixingRatio"), given8("pressure"), air.epsilon) },
    { key: "approximate", label: "w p/ε, as an approximation", source: { text: "common practice: w neglected against ε", status: "common practice" }, validity: "cold or dry air", knownError: "1.6 % at 10 g/kg", value: ({ given: given8, air }) => given8("mixingRatio") * given8("pressure") / air.epsilon }
  ],
  constants: ["R", "Rv"],
  ask: "The vapor pressure e of air with the mixing ratio at the pressure.",
  working: ({ given: given8, air, variant }, value23) => [variant === "approximate" ? { text: "With w neglected against ε", formula: "e = \\frac{w\\,p}{\\varepsilon}", filled: `e = \\frac{${texNumber(given8("mixingRatio"))} \\cdot ${texNumber(given8("pressure") / 100, 6)}}{${texNumber(air.epsilon)}} = ${inHectopascal(value23)}` } : { text: "The mixing ratio solved for e, with w in kg per kg", formula: "e = \\frac{w\\,p}{\\varepsilon + w}", filled: `e = \\frac{${texNumber(given8("mixingRatio"))} \\cdot ${texNumber(given8("pressure") / 100, 6)}}{${texNumber(air.epsilon)} + ${texNumber(given8("mixingRatio"))}} = ${inHectopascal(value23)}` }],
  slips: [
    fineMoistSlip("without-w", "w neglected against ε", "This is w p/ε: in the denominator stands ε + w.", ({ given: given8, air, variant }) => variant === "approximate" ? null : given8("mixingRatio") * given8("pressure") / air.epsilon),
    moistSlip("grams", "g kg⁻¹ put in for kg kg⁻¹", "This is what comes out with w in g per kg: the formula takes kg per kg.", ({ given: given8, again }) => again({ mixingRatio: 1e3 * given8("mixingRatio") })),
    moistSlip("inverted-epsilon", "ε turned round", "This comes from 1/ε, the ratio of the gas constants the other way round.", ({ given: given8, air }) => vaporPressureFrom(given8("mixingRatio"), given8("pressure"), 1 / air.epsilon)),
    moistSlip("epsilon-left-out", "ε for 1", "This is w p/(1 + w): the ratio of the molar masses, ε = 0.622, is missing.", ({ given: given8 }) => vaporPressureFrom(given8("mixingRatio"), given8("pressure"), 1)),
    pascalSlip,
    kilopascalSlip
  ],
  example: { inputs: { pressure: 1e5, mixingRatio: 0.01 }, gives: 1582.566, within: 1e-3 }
});

// shared/thermo/quantities/vaporPressureFromPsychrometer.ts
var vaporPressureFromPsychrometerDefinition = psychrometerDefinition({
  key: "vapor-pressure-from-psychrometer",
  name: "vapor pressure by a ventilated psychrometer",
  bulb: "ventilated",
  gives: "vapor-pressure",
  example: { inputs: { pressure: 1e5, temperature: 293.15, wetBulb: 288.15 }, gives: 1372.926, within: 1e-3 }
});

// shared/thermo/quantities/vaporPressureFromRelativeHumidity.ts
var vaporPressureFromRelativeHumidityDefinition = moistQuantity({
  key: "vapor-pressure-from-relative-humidity",
  name: "vapor pressure from the relative humidity",
  symbol: "e",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  inputs: [temperatureInput2, relativeHumidityInput],
  variants: [{ key: "share-of-saturation", label: "RH eₛ(T)", source: glossary("relative humidity"), validity: "RH over liquid water, also below 0 °C", knownError: "0.1 to 0.3 % by the formula of eₛ", value: ({ given: given8, air }) => given8("relativeHumidity") * air.es(given8("temperature")) }],
  constants: ["enhancementFactor"],
  inside: ["es"],
  notedAt: { es: (given8) => [given8("temperature")] },
  remarks: ({ given: given8 }) => [supersaturated(given8("relativeHumidity"))],
  ask: "The vapor pressure e of the air from its relative humidity over liquid water, RH = e/es.",
  working: ({ given: given8, air }, value23) => [
    saturationStep("e_s", "T", given8("temperature"), air.es(given8("temperature"))),
    { text: "Of which the air holds its share", formula: "e = \\mathit{RH}\\,e_s", filled: `e = ${texNumber(given8("relativeHumidity"))} \\cdot ${texNumber(air.es(given8("temperature")) / 100)} = ${inHectopascal(value23)}` }
  ],
  slips: [
    moistSlip("factor-100", "a factor of 100: percent not divided, or Pa given as hPa", "Your value is a hundred times too large: a percentage was not divided by 100, or pascal was given as hectopascal.", ({ right }) => right * 100),
    moistSlip("divided", "divided by RH", "This is es divided by the relative humidity: the air holds a share of it, es times RH.", ({ given: given8, air }) => given8("relativeHumidity") === 1 ? null : air.es(given8("temperature")) / given8("relativeHumidity")),
    fineMoistSlip("saturation", "saturation vapor pressure", "This is the vapor pressure of saturation: the relative humidity is not in it.", ({ given: given8, air }) => given8("relativeHumidity") === 1 ? null : air.es(given8("temperature"))),
    fineMoistSlip("ice-for-water", "over ice for over water", "This comes from the saturation vapor pressure over ice; relative humidity refers to liquid water, also below 0 °C.", (hand) => {
      const e = overIce(hand, hand.given("temperature"));
      return e === null ? null : hand.given("relativeHumidity") * e;
    }),
    kilopascalSlip
  ],
  example: { inputs: { temperature: 298.15, relativeHumidity: 0.5 }, gives: 1583.715, within: 1e-3 }
});

// shared/thermo/quantities/vaporPressureFromScreenPsychrometer.ts
var vaporPressureFromScreenPsychrometerDefinition = psychrometerDefinition({
  key: "vapor-pressure-from-screen-psychrometer",
  name: "vapor pressure by a psychrometer in a screen",
  bulb: "screen",
  gives: "vapor-pressure",
  example: { inputs: { pressure: 1e5, temperature: 293.15, wetBulb: 288.15 }, gives: 1304.549, within: 1e-3 }
});

// shared/thermo/quantities/virtualTemperature.ts
var virtualTemperatureDefinition = moistQuantity({
  key: "virtual-temperature",
  name: "virtual temperature",
  symbol: "T_v",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [temperatureInput2, mixingRatioInput],
  variants: [
    { key: "exact", label: "T (1 + w/ε)/(1 + w)", source: glossary("virtual temperature"), validity: "any", knownError: "none beyond the gas constants", value: ({ given: given8, air }) => virtualTemperatureFrom(given8("temperature"), given8("mixingRatio"), air.epsilon) },
    { key: "linear", label: "T (1 + 0.61 w), as an approximation", source: glossary("virtual temperature", "common practice"), validity: "w below 20 g/kg", knownError: "0.13 K at 28 g/kg", value: ({ given: given8 }) => given8("temperature") * (1 + 0.61 * given8("mixingRatio")) }
  ],
  constants: ["R", "Rv"],
  ask: "The virtual temperature of the air, exactly: T (1 + w/ε)/(1 + w).",
  working: ({ given: given8, variant, air }, value23) => [variant === "linear" ? { text: "With T in kelvin and w in kg per kg", formula: "T_v = T\\,(1 + 0.61\\,w)", filled: `T_v = ${texNumber(given8("temperature"), 6)}\\,(1 + 0.61 \\cdot ${texNumber(given8("mixingRatio"))}) = ${inKelvin(value23)} = ${inCelsius(value23)}` } : { text: "With T in kelvin and w in kg per kg", formula: "T_v = T\\,\\frac{1 + w/\\varepsilon}{1 + w}", filled: `T_v = ${texNumber(given8("temperature"), 6)} \\cdot \\frac{1 + ${texNumber(given8("mixingRatio"))}/${texNumber(air.epsilon)}}{1 + ${texNumber(given8("mixingRatio"))}} = ${inKelvin(value23)} = ${inCelsius(value23)}` }],
  slips: [
    moistSlip("celsius-for-kelvin", "Celsius put in for kelvin", "This is what comes out with the temperature in °C: the factor belongs to kelvin.", ({ given: given8, again }) => given8("temperature") === zeroCelsius ? null : zeroCelsius + again({ temperature: given8("temperature") - zeroCelsius })),
    moistSlip("grams", "g kg⁻¹ put in for kg kg⁻¹", "This is what comes out with w in g per kg: the formula takes kg per kg.", ({ given: given8 }) => given8("temperature") * (1 + 0.61 * 1e3 * given8("mixingRatio"))),
    moistSlip("cooler", "cooler where it is warmer", "Moist air is lighter than dry air, so its virtual temperature is above its temperature: yours is below.", ({ given: given8, right }) => 2 * given8("temperature") - right),
    moistSlip("epsilon-left-out", "ε for 0.61", "This comes from 1 + 0.622 w: the factor is 1 + 0.61 w, with 0.61 = 1/ε − 1.", ({ given: given8 }) => given8("mixingRatio") < 0.03 ? null : given8("temperature") * (1 + 0.622 * given8("mixingRatio"))),
    moistSlip("dry", "w/ε without 1 + w", "This is T (1 + w/ε): the denominator 1 + w is missing.", ({ given: given8, air }) => given8("temperature") * (1 + given8("mixingRatio") / air.epsilon)),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { temperature: 303.15, mixingRatio: 0.02 }, gives: 306.764, within: 1e-3 }
});

// shared/thermo/quantities/wetBulbTemperature.ts
var wetBulbTemperatureDefinition = moistQuantity({
  key: "wet-bulb-temperature",
  name: "wet-bulb temperature",
  symbol: "T_w",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, dewpointInput],
  variants: [
    { key: "isobaric", label: "isobaric, with the heat capacity of the vapor", source: glossary("wet-bulb temperature"), validity: "liquid water on the bulb", knownError: "0.05 K by the formulae inside", value: ({ given: given8, air }) => isobaricWetBulb(given8("temperature"), mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon), given8("pressure"), air) },
    { key: "dry-heat", label: "isobaric, with the heat capacity of dry air", source: glossary("wet-bulb temperature", "common practice"), validity: "liquid water on the bulb", knownError: "0.1 K", value: ({ given: given8, air }) => isobaricWetBulb(given8("temperature"), mixingRatioFrom(air.es(given8("dewpoint")), given8("pressure"), air.epsilon), given8("pressure"), air, false) }
  ],
  constants: ["R", "Rv", "cp", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("dewpoint")] },
  remarks: ({ given: given8 }) => [foggy(given8("temperature"), given8("dewpoint"))],
  ask: "The isobaric wet-bulb temperature over liquid water, at which the air is saturated by water that evaporates into it at constant pressure, not by lifting.",
  working: ({ given: given8, air }, value23) => [
    { ...mixingRatioStep("w", "e", air.es(given8("dewpoint")), given8("pressure"), air), text: "Mixing ratio of the air, with e = es(Td)" },
    { text: "The temperature at which the air’s heat has paid for saturation, found by a bracket", formula: "(c_p + w\\,c_{pv})\\,(T - T_w) = L\\,[w_s(T_w) - w]", filled: `T_w = ${inCelsius(value23)}` }
  ],
  slips: [
    fineMoistSlip("pseudoadiabatic", "by lifting and lowering", "This is the pseudoadiabatic wet bulb, by lifting to condensation and lowering: asked is the isobaric one.", ({ given: given8, air, constants, formulae }) => given8("dewpoint") >= given8("temperature") ? null : pseudoadiabaticWetBulb(given8("pressure"), lclFunction(constants, formulae)(given8("temperature"), given8("dewpoint"), given8("pressure")), air)),
    fineMoistSlip("mean", "mean of temperature and dewpoint", "This is the mean of temperature and dewpoint.", ({ given: given8 }) => given8("dewpoint") === given8("temperature") ? null : (given8("temperature") + given8("dewpoint")) / 2),
    fineMoistSlip("third", "a third of the way to the dewpoint", "This is the rule of thumb T − (T − Td)/3.", ({ given: given8 }) => given8("dewpoint") === given8("temperature") ? null : given8("temperature") - (given8("temperature") - given8("dewpoint")) / 3),
    fineMoistSlip("dewpoint", "dewpoint for wet bulb", "This is the dewpoint: the wet bulb lies between it and the temperature.", ({ given: given8 }) => given8("dewpoint") === given8("temperature") ? null : given8("dewpoint")),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressure: 95461, temperature: 303.15, dewpoint: 296.49 }, gives: 298.1741, within: 1e-4 }
});

// shared/thermo/quantities/wetBulbTemperatureFromRelativeHumidity.ts
var vapor = ({ given: given8, air }) => given8("relativeHumidity") * air.es(given8("temperature"));
var solved = (hand, vaporHeat) => isobaricWetBulb(hand.given("temperature"), mixingRatioFrom(vapor(hand), hand.given("pressure"), hand.air.epsilon), hand.given("pressure"), hand.air, vaporHeat);
var wetBulbTemperatureFromRelativeHumidityDefinition = moistQuantity({
  key: "wet-bulb-temperature-from-relative-humidity",
  name: "wet-bulb temperature from the relative humidity",
  symbol: "T_w",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [pressureInput2, temperatureInput2, relativeHumidityInput],
  variants: [
    { key: "isobaric", label: "isobaric, with the heat capacity of the vapor", source: glossary("wet-bulb temperature"), validity: "liquid water on the bulb", knownError: "0.05 K by the formulae inside", value: (hand) => solved(hand, true) },
    { key: "dry-heat", label: "isobaric, with the heat capacity of dry air", source: glossary("wet-bulb temperature", "common practice"), validity: "liquid water on the bulb", knownError: "0.1 K", value: (hand) => solved(hand, false) },
    { key: "stull", label: "Stull’s fit at 1013.25 hPa", source: { text: "Stull (2011), J. Appl. Meteor. Climatol. 50, 2267–2269, Eq. 1; coefficients read in transcriptions", status: "verified" }, validity: "about 1013.25 hPa, RH 5–99 %, −20 to 50 °C", knownError: "−1.0 to +0.65 K by its paper, which leaves out air both cold and dry; −1.2 to +1.3 K above 0 °C as measured, farthest where it is dry", holds: { pressure: [98e3, 104e3], temperature: [253.15, 323.15], relativeHumidity: [0.05, 0.99] }, value: ({ given: given8 }) => stullWetBulb(given8("temperature"), given8("relativeHumidity")) }
  ],
  constants: ["R", "Rv", "cp", "cpv", "latentHeat", "cw", "enhancementFactor"],
  inside: ["es", "L"],
  notedAt: { es: (given8) => [given8("temperature")] },
  remarks: ({ given: given8 }) => [supersaturated(given8("relativeHumidity"))],
  ask: "The isobaric wet-bulb temperature over liquid water, from the temperature, the relative humidity e/es and the pressure.",
  working: (hand, value23) => hand.variant === "stull" ? [{ text: "Stull’s fit, with t in °C and RH in percent", formula: "T_w = t \\arctan[0.151977\\,(\\mathit{RH} + 8.313659)^{1/2}] + \\arctan(t + \\mathit{RH}) - \\arctan(\\mathit{RH} - 1.676331) + 0.00391838\\,\\mathit{RH}^{3/2}\\arctan(0.023101\\,\\mathit{RH}) - 4.686035", filled: `T_w = ${inCelsius(value23)}` }] : [
    { ...mixingRatioStep("w", "e", vapor(hand), hand.given("pressure"), hand.air), text: "Mixing ratio of the air, with e = RH es(T)" },
    { text: "The temperature at which the air’s heat has paid for saturation, found by a bracket", formula: "(c_p + w\\,c_{pv})\\,(T - T_w) = L\\,[w_s(T_w) - w]", filled: `T_w = ${inCelsius(value23)}` }
  ],
  slips: [
    fineMoistSlip("stull", "Stull’s fit", "This is a fit that holds at 1013.25 hPa only: asked is the wet bulb at this pressure.", ({ given: given8, variant }) => variant === "stull" || given8("relativeHumidity") > 1 ? null : stullWetBulb(given8("temperature"), given8("relativeHumidity"))),
    moistSlip("share-of-celsius", "T in °C times RH", "This is the temperature in °C times the relative humidity.", ({ given: given8 }) => given8("relativeHumidity") === 1 || given8("temperature") === zeroCelsius ? null : zeroCelsius + given8("relativeHumidity") * (given8("temperature") - zeroCelsius)),
    kelvinAsCelsiusSlip
  ],
  example: { inputs: { pressure: 101325, temperature: 293.15, relativeHumidity: 0.5 }, gives: 286.9318, within: 1e-4 }
});

// shared/thermo/quantities/latentHeatOfFusion.ts
var latentHeatOfFusionDefinition = {
  key: "latent-heat-of-fusion",
  name: "latent heat of fusion",
  symbol: "L_f",
  unit: "J/kg",
  shownUnit: "kJ/kg",
  kind: "ratio",
  inputs: [{ name: "temperature", label: "temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [200, 273.16] }],
  variants: [
    {
      key: "difference",
      label: "L_s − L_v at the temperature",
      source: { text: 'AMS Glossary of Meteorology, "latent heat"', status: "common practice" },
      validity: "−40 to 0 °C",
      knownError: "3 kJ kg⁻¹ at −10 °C with a constant L_s",
      holds: { temperature: [233.15, 273.16] },
      evaluate: (inputs2, constants, formulae) => ({ is: "value", value: difference(inputs2, constants, formulae) })
    },
    {
      key: "constant",
      label: "a constant, as taught: the value at 0 °C",
      source: { text: 'common practice: the value at 0 °C, 0.3337 MJ kg⁻¹ (AMS Glossary of Meteorology, "latent heat")', status: "common practice" },
      validity: "near 0 °C",
      knownError: "7 % at −10 °C",
      evaluate: (_inputs, constants) => ({ is: "value", value: atZero(constants) })
    }
  ],
  constants: ["latentHeat", "latentHeatIce", "cw", "cpv"],
  uses: [vaporizationKey, sublimationKey],
  notes: (inputs2, _constants, formulae) => latentHeatNotes([T10(inputs2)], formulae),
  ask: "The latent heat of fusion of ice at the temperature, per kilogram.",
  trace(inputs2, constants, variant, formulae) {
    const isConstant = variant === "constant";
    const value23 = isConstant ? atZero(constants) : difference(inputs2, constants, formulae);
    const [ice2, water2] = isConstant ? [constant(constants, "latentHeatIce"), constant(constants, "latentHeat")] : [sublimationHeatFunction(constants, formulae)(T10(inputs2)), latentHeatFunction(constants, formulae)(T10(inputs2))];
    return [
      { text: isConstant ? "From ice to vapor and from water to vapor, at 0 °C" : "From ice to vapor and from water to vapor", formula: "L_s,\\ L_v", filled: `L_s = ${texQuantity(ice2 / 1e3, "kJ/kg", 6)},\\quad L_v = ${texQuantity(water2 / 1e3, "kJ/kg", 6)}` },
      { text: "From ice to water", formula: "L_f = L_s - L_v", filled: `L_f = ${texQuantity(value23 / 1e3, "kJ/kg")}`, value: value23, unit: "J/kg" }
    ];
  },
  slips: [
    slip("sign", "sign turned round", "The sign is turned round: from ice to vapor takes more heat than from water to vapor.", (_i, _c, right) => -right),
    slip("vaporization", "latent heat of vaporization", "This is the latent heat of vaporization, from liquid water to vapor.", (inputs2, constants, _right, formulae) => latentHeatFunction(constants, formulae)(T10(inputs2))),
    slip("sublimation", "latent heat of sublimation", "This is the latent heat of sublimation, from ice to vapor.", (inputs2, constants, _right, formulae) => sublimationHeatFunction(constants, formulae)(T10(inputs2))),
    joulesSlip,
    slip("megajoules-for-kilojoules", "MJ given as kJ", "Your number is in megajoules; the unit beside it says kilojoules.", (_i, _c, right) => right / 1e3)
  ],
  example: { inputs: { temperature: 273.15 }, gives: 333e3, within: 1 }
};
var T10 = (inputs2) => numberOf(inputs2, "temperature");
var difference = (inputs2, constants, formulae) => sublimationHeatFunction(constants, formulae)(T10(inputs2)) - latentHeatFunction(constants, formulae)(T10(inputs2));
var atZero = (constants) => constant(constants, "latentHeatIce") - constant(constants, "latentHeat");

// shared/thermo/quantities/mixingRatioFromSpecificHumidity.ts
var mixingRatioFromSpecificHumidityDefinition = moistQuantity({
  key: "mixing-ratio-from-specific-humidity",
  name: "mixing ratio from the specific humidity",
  symbol: "w",
  unit: "1",
  shownUnit: "g/kg",
  kind: "ratio",
  inputs: [{ ...mixingRatioInput, name: "specificHumidity", label: "specific humidity", symbol: "q" }],
  variants: [{ key: "exact", label: "q/(1 − q)", source: glossary("specific humidity"), validity: "any", knownError: "none: by definition", value: ({ given: given8 }) => mixingRatioOfSpecificHumidity(given8("specificHumidity")) }],
  constants: [],
  ask: "The mixing ratio w of the air, mass of vapor per mass of dry air, from its specific humidity.",
  working: ({ given: given8 }, value23) => [{ text: "Per kilogram of dry air, with q in kg per kg", formula: "w = \\frac{q}{1 - q}", filled: `w = \\frac{${texNumber(given8("specificHumidity"))}}{1 - ${texNumber(given8("specificHumidity"))}} = ${inGrams(value23)}` }],
  slips: [
    fineMoistSlip("specific-humidity", "the specific humidity itself", "This is the specific humidity, per kilogram of moist air: the mixing ratio is per kilogram of dry air.", ({ given: given8 }) => given8("specificHumidity")),
    fineMoistSlip("turned-round", "conversion turned round", "This is q/(1 + q), the conversion the other way round.", ({ given: given8 }) => given8("specificHumidity") / (1 + given8("specificHumidity"))),
    moistSlip("grams", "g kg⁻¹ put in for kg kg⁻¹", "This is what comes out with q in g per kg: the formula takes kg per kg.", ({ given: given8, again }) => again({ specificHumidity: 1e3 * given8("specificHumidity") })),
    kilogramSlip
  ],
  example: { inputs: { specificHumidity: 0.0147783 }, gives: 0.015, within: 1e-7 }
});

// shared/thermo/groups/moisture.ts
var moisture = {
  key: "moisture",
  title: "Moisture",
  quantities: [
    saturationVaporPressureDefinition,
    saturationVaporPressureOverIceDefinition,
    latentHeatOfVaporizationDefinition,
    latentHeatOfSublimationDefinition,
    latentHeatOfFusionDefinition,
    vaporPressureDefinition,
    vaporPressureFromRelativeHumidityDefinition,
    vaporPressureFromMixingRatioDefinition,
    mixingRatioDefinition2,
    mixingRatioFromVaporPressureDefinition,
    mixingRatioFromSpecificHumidityDefinition,
    saturationMixingRatioDefinition,
    saturationMixingRatioOverIceDefinition,
    specificHumidityDefinition,
    specificHumidityFromDewpointDefinition,
    absoluteHumidityDefinition,
    relativeHumidityDefinition,
    relativeHumidityByMixingRatioDefinition,
    relativeHumidityOverIceDefinition,
    dewpointDefinition,
    dewpointFromRelativeHumidityDefinition,
    dewpointFromMixingRatioDefinition,
    frostPointDefinition,
    frostPointFromRelativeHumidityDefinition,
    virtualTemperatureDefinition,
    densityOfMoistAirDefinition,
    specificEnthalpyOfMoistAirDefinition,
    specificHeatOfMoistAirDefinition,
    specificHeatAtConstantVolumeOfMoistAirDefinition,
    vaporPressureFromPsychrometerDefinition,
    vaporPressureFromScreenPsychrometerDefinition,
    vaporPressureFromIcePsychrometerDefinition,
    relativeHumidityFromPsychrometerDefinition,
    relativeHumidityFromScreenPsychrometerDefinition,
    relativeHumidityFromIcePsychrometerDefinition,
    wetBulbTemperatureDefinition,
    wetBulbTemperatureFromRelativeHumidityDefinition,
    mixingRatioFromWetBulbDefinition
  ]
};

// shared/thermo/parcel.ts
var p0 = 1e5;
function dewpointAt(vaporPressure, air) {
  if (!(vaporPressure > 0)) throw new OutOfRangeError("vaporPressure", vaporPressure, "positive pressures");
  const ratio2 = log(vaporPressure / 611.2);
  let T11 = 273.15 + 243.5 * ratio2 / (17.67 - ratio2);
  for (let n = 0; n < 60; n++) {
    const change2 = air.Rv * T11 * T11 / air.L(T11) * log(vaporPressure / air.es(T11));
    T11 += change2;
    if (!(T11 > 100 && T11 < 400)) break;
    if (Math.abs(change2) < 1e-11) return T11;
  }
  throw new OutOfRangeError("vaporPressure", vaporPressure, "vapor pressures that have a dewpoint");
}
function levelParcel(sounding, at) {
  return { pressure: sounding.pressure[at] ?? 0, temperature: sounding.temperature[at] ?? 0, dewpoint: sounding.dewpoint[at] ?? 0, mixingRatio: sounding.mixingRatio[at] ?? 0 };
}
var surfaceParcel = (sounding) => levelParcel(sounding, 0);
function statedParcel(theta5, mixingRatio, pressure4, air) {
  return { pressure: pressure4, temperature: theta5 * pow(pressure4 / p0, air.kappa), dewpoint: dewpointAt(vaporPressureFrom(mixingRatio, pressure4, air.epsilon), air), mixingRatio };
}
function mixedLayerMean(sounding, depth, air) {
  const { count, pressure: pressure4, logPressure, temperature: temperature6, mixingRatio } = sounding;
  const bottom3 = pressure4[0] ?? 0, top4 = bottom3 - depth;
  if (!(top4 > 0 && (pressure4[count - 1] ?? 0) <= top4)) return null;
  let theta5 = (temperature6[0] ?? 0) * pow(p0 / bottom3, air.kappa), w2 = mixingRatio[0] ?? 0, p10 = bottom3;
  let thetaSum = 0, wSum = 0;
  for (let at = 1; at < count && p10 > top4; at++) {
    let nextP = pressure4[at] ?? 0, nextTheta = (temperature6[at] ?? 0) * pow(p0 / nextP, air.kappa), nextW = mixingRatio[at] ?? 0;
    if (nextP < top4) {
      const part = (log(top4) - (logPressure[at - 1] ?? 0)) / ((logPressure[at] ?? 0) - (logPressure[at - 1] ?? 0));
      nextTheta = theta5 + part * (nextTheta - theta5);
      nextW = w2 + part * (nextW - w2);
      nextP = top4;
    }
    thetaSum += 0.5 * (theta5 + nextTheta) * (p10 - nextP);
    wSum += 0.5 * (w2 + nextW) * (p10 - nextP);
    theta5 = nextTheta;
    w2 = nextW;
    p10 = nextP;
  }
  return { theta: thetaSum / depth, mixingRatio: wSum / depth, top: top4 };
}
function mixedLayerParcel(sounding, depth, air) {
  const mean2 = mixedLayerMean(sounding, depth, air);
  return mean2 && statedParcel(mean2.theta, mean2.mixingRatio, sounding.pressure[0] ?? 0, air);
}
var unstableDepth = 3e4;
function mostUnstableParcel(sounding, air, variant) {
  const top4 = (sounding.pressure[0] ?? 0) - unstableDepth;
  let best = 0, most2 = -Infinity;
  for (let at = 0; at < sounding.count && (sounding.pressure[at] ?? 0) >= top4; at++) {
    const theta5 = equivalentPotentialTemperature(sounding.temperature[at] ?? 0, sounding.dewpoint[at] ?? 0, sounding.pressure[at] ?? 0, air, variant);
    if (theta5 > most2) {
      most2 = theta5;
      best = at;
    }
  }
  return levelParcel(sounding, best);
}

// shared/thermo/parcelAscent.ts
var neutral = 1e-9;
var room = 512;
var nodeLog = new Float64Array(room);
var nodePressure = new Float64Array(room);
var nodeExcess = new Float64Array(room);
var nodeCount = 0;
function makeRoom(least2) {
  if (least2 <= room) return;
  room = 2 * least2;
  nodeLog = new Float64Array(room);
  nodePressure = new Float64Array(room);
  nodeExcess = new Float64Array(room);
}
function addSegment(toLog, toPressure, toColumn) {
  const last = nodeCount - 1;
  const fromLog = nodeLog[last] ?? 0, fromColumn = nodeExcess[last] ?? 0;
  const whole = toLog - fromLog;
  const parts = Math.ceil(-whole / longestStep);
  for (let n = 1; n < parts; n++) {
    const share = n / parts;
    nodeLog[nodeCount] = fromLog + share * whole;
    nodePressure[nodeCount] = exp(fromLog + share * whole);
    nodeExcess[nodeCount] = fromColumn + share * (toColumn - fromColumn);
    nodeCount++;
  }
  nodeLog[nodeCount] = toLog;
  nodePressure[nodeCount] = toPressure;
  nodeExcess[nodeCount] = toColumn;
  nodeCount++;
}
function layNodes(sounding, column, parcel, lclPressure) {
  const { count, pressure: pressure4, logPressure } = sounding;
  const start5 = log(parcel.pressure), lclLog = log(lclPressure);
  makeRoom(count + 4 + Math.ceil((start5 - (logPressure[count - 1] ?? 0)) / longestStep));
  let at = 0;
  while (at < count - 1 && (pressure4[at + 1] ?? 0) >= parcel.pressure) at++;
  nodeCount = 1;
  nodeLog[0] = start5;
  nodePressure[0] = parcel.pressure;
  nodeExcess[0] = between(logPressure, column, at, start5);
  let lclNode = lclLog >= start5 ? 0 : -1;
  for (let level = at + 1; level < count; level++) {
    const toLog = logPressure[level] ?? 0;
    if (lclNode < 0 && toLog <= lclLog) {
      if (toLog < lclLog) addSegment(lclLog, lclPressure, between(logPressure, column, level - 1, lclLog));
      else addSegment(toLog, pressure4[level] ?? 0, column[level] ?? 0);
      lclNode = nodeCount - 1;
      if (toLog === lclLog) continue;
    }
    addSegment(toLog, pressure4[level] ?? 0, column[level] ?? 0);
  }
  return lclNode < 0 ? nodeCount : lclNode;
}
function between(logPressure, column, at, where) {
  const from2 = logPressure[at] ?? 0, to2 = logPressure[at + 1] ?? from2, below = column[at] ?? 0;
  return to2 === from2 ? below : below + (where - from2) / (to2 - from2) * ((column[at + 1] ?? below) - below);
}
var state = new Float64Array(3);
function startSaturated(T11, p10, air) {
  const e = air.es(T11);
  state[0] = T11;
  state[1] = e;
  state[2] = slopeAt(T11, p10, e, air);
}
function saturatedStep(from2, to2, h, air) {
  const middle = Math.sqrt(from2 * to2);
  const T11 = state[0] ?? 0;
  let slope = state[2] ?? 0, sum = slope, here = T11, e = 0;
  for (let stage = 1; stage <= 4; stage++) {
    here = T11 + (stage === 4 ? h / 6 * sum : (stage === 3 ? h : 0.5 * h) * slope);
    e = air.es(here);
    slope = slopeAt(here, stage < 3 ? middle : to2, e, air);
    sum += stage < 3 ? 2 * slope : slope;
  }
  state[0] = here;
  state[1] = e;
  state[2] = slope;
}
function liftThroughNodes(parcel, lcl, lclNode, isVirtual, air) {
  const { kappa, epsilon } = air;
  const start5 = nodeLog[0] ?? 0;
  const dryFactor = isVirtual ? (1 + parcel.mixingRatio / epsilon) / (1 + parcel.mixingRatio) : 1;
  const dryNodes = Math.min(lclNode, nodeCount);
  for (let n = 0; n < dryNodes; n++) nodeExcess[n] = parcel.temperature * exp(kappa * ((nodeLog[n] ?? 0) - start5)) * dryFactor - (nodeExcess[n] ?? 0);
  if (lclNode >= nodeCount) return;
  nodeExcess[lclNode] = lcl.temperature * dryFactor - (nodeExcess[lclNode] ?? 0);
  startSaturated(lcl.temperature, nodePressure[lclNode] ?? 0, air);
  for (let n = lclNode + 1; n < nodeCount; n++) {
    const p10 = nodePressure[n] ?? 0;
    saturatedStep(nodePressure[n - 1] ?? 0, p10, (nodeLog[n] ?? 0) - (nodeLog[n - 1] ?? 0), air);
    const T11 = state[0] ?? 0, e = state[1] ?? 0, w2 = epsilon * e / (p10 - e);
    nodeExcess[n] = (isVirtual ? T11 * (1 + w2 / epsilon) / (1 + w2) : T11) - (nodeExcess[n] ?? 0);
  }
}
function lift(sounding, parcel, lcl, isVirtual, air) {
  const lclNode = layNodes(sounding, isVirtual ? sounding.virtualTemperature : sounding.temperature, parcel, lcl.pressure);
  liftThroughNodes(parcel, lcl, lclNode, isVirtual, air);
  const { R } = air;
  let lfcLog = NaN, elLog = NaN, positive = 0, negative = 0;
  if (lclNode === 0 && (nodeExcess[0] ?? 0) > neutral) lfcLog = nodeLog[0] ?? 0;
  for (let n = 1; n < nodeCount; n++) {
    const below = nodeExcess[n - 1] ?? 0, above = nodeExcess[n] ?? 0;
    const from2 = nodeLog[n - 1] ?? 0, depth = from2 - (nodeLog[n] ?? 0);
    const isRising = above > neutral && !(below > neutral), isFalling = below > neutral && !(above > neutral);
    const crosses = below > 0 && above < 0 || below < 0 && above > 0;
    const share = crosses ? below / (below - above) : 1;
    const hasLfc = lfcLog === lfcLog;
    if (crosses) {
      const first3 = 0.5 * R * below * share * depth, second3 = 0.5 * R * above * (1 - share) * depth;
      if (first3 < 0 && !hasLfc) negative += first3;
      if (first3 > 0 && hasLfc) positive += first3;
      if (isRising && !hasLfc && n > lclNode) lfcLog = from2 - share * depth;
      const isFree = lfcLog === lfcLog;
      if (second3 > 0 && isFree) positive += second3;
      if (second3 < 0 && !isFree) negative += second3;
    } else {
      if (isRising && !hasLfc && n > lclNode) lfcLog = from2;
      const area = 0.5 * R * (below + above) * depth, isFree = lfcLog === lfcLog;
      if (area < 0 && !isFree) negative += area;
      if (area > 0 && isFree) positive += area;
    }
    if (isFalling && lfcLog === lfcLog) elLog = from2 - share * depth;
    if (n === lclNode && above > neutral && lfcLog !== lfcLog) lfcLog = nodeLog[n] ?? 0;
  }
  const isWarmAtTop = (nodeExcess[nodeCount - 1] ?? 0) > neutral && lfcLog === lfcLog;
  return {
    lcl,
    lfc: lfcLog === lfcLog ? exp(lfcLog) : null,
    el: elLog === elLog && !isWarmAtTop ? exp(elLog) : null,
    cape: positive,
    cin: negative,
    isWarmAtTop,
    top: nodePressure[nodeCount - 1] ?? 0
  };
}
function parcelTemperatureAt(parcel, lcl, pressure4, isVirtual, air) {
  if (pressure4 >= lcl.pressure) {
    const T12 = parcel.temperature * exp(air.kappa * (log(pressure4) - log(parcel.pressure)));
    return isVirtual ? T12 * (1 + parcel.mixingRatio / air.epsilon) / (1 + parcel.mixingRatio) : T12;
  }
  const start5 = log(lcl.pressure), whole = log(pressure4) - start5, parts = Math.ceil(-whole / longestStep);
  startSaturated(lcl.temperature, lcl.pressure, air);
  let p10 = lcl.pressure;
  for (let n = 1; n <= parts; n++) {
    const next = n === parts ? pressure4 : exp(start5 + n / parts * whole);
    saturatedStep(p10, next, whole / parts, air);
    p10 = next;
  }
  const T11 = state[0] ?? 0, e = state[1] ?? 0;
  if (!isVirtual) return T11;
  const w2 = air.epsilon * e / (pressure4 - e);
  return T11 * (1 + w2 / air.epsilon) / (1 + w2);
}

// shared/thermo/sounding.ts
var soundingInputs = [
  { name: "pressure", label: "pressures of the rows, from the ground up", symbol: "p", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "series", range: [100, 11e4], needs: { least: 2, order: "descending" } },
  { name: "temperature", label: "air temperatures of the rows", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "series", range: [150, 340], needs: { least: 2, order: "none" } },
  { name: "dewpoint", label: "dewpoints of the rows", symbol: "T_d", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "series", range: [130, 320], needs: { least: 2, order: "none" } }
];
var surfacePressureInput = { name: "surfacePressure", label: "pressure at the ground; rows below it are left out", symbol: "p_s", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [3e4, 11e4], isOptional: true };
var widestGap = 2;
function roomForSounding(count) {
  const memory = new ArrayBuffer(6 * 8 * count);
  const column = (at) => new Float64Array(memory, 8 * count * at, count);
  return { count, pressure: column(0), logPressure: column(1), temperature: column(2), dewpoint: column(3), mixingRatio: column(4), virtualTemperature: column(5) };
}
function makeSounding(pressures2, temperatures, dewpoints, air, ground = Infinity, into) {
  let first3 = 0;
  while (first3 < pressures2.length && (pressures2[first3] ?? 0) > ground) first3++;
  const count = pressures2.length - first3;
  if (count < 2) throw new SeriesError("pressure", "fewer than two rows are above the ground");
  const sounding = into?.count === count ? into : roomForSounding(count);
  const { pressure: pressure4, logPressure, temperature: temperature6, dewpoint, mixingRatio, virtualTemperature } = sounding;
  let before = 0;
  for (let at = 0; at < count; at++) {
    const p10 = pressures2[first3 + at] ?? 0, T11 = temperatures[first3 + at] ?? 0, Td = dewpoints[first3 + at] ?? 0;
    if (at > 0 && before > widestGap * p10) throw new SeriesError("pressure", `a gap from ${before / 100} to ${p10 / 100} hPa; an ascent needs rows that are at most a factor of ${widestGap} apart`);
    before = p10;
    const e = air.es(Td);
    if (!(e < p10)) throw new OutOfRangeError("dewpoint", Td, `dewpoints whose vapor pressure is below ${p10} Pa`);
    const w2 = mixingRatioFrom(e, p10, air.epsilon);
    pressure4[at] = p10;
    logPressure[at] = log(p10);
    temperature6[at] = T11;
    dewpoint[at] = Td;
    mixingRatio[at] = w2;
    virtualTemperature[at] = virtualTemperatureFrom(T11, w2, air.epsilon);
  }
  return sounding;
}
function soundingOf(inputs2, air) {
  return makeSounding(seriesOf(inputs2, "pressure"), seriesOf(inputs2, "temperature"), seriesOf(inputs2, "dewpoint"), air, "surfacePressure" in inputs2 ? numberOf(inputs2, "surfacePressure") : Infinity);
}
function atPressure(sounding, column, pressure4) {
  const { count, pressure: p10, logPressure } = sounding;
  const bottom3 = p10[0] ?? 0, top4 = p10[count - 1] ?? 0;
  if (!(pressure4 <= bottom3 && pressure4 >= top4)) return null;
  let low = 0, high2 = count - 1;
  while (high2 - low > 1) {
    const middle = low + high2 >> 1;
    if ((p10[middle] ?? 0) >= pressure4) low = middle;
    else high2 = middle;
  }
  const below = column[low] ?? 0, above = column[high2] ?? 0;
  if (pressure4 === p10[low]) return below;
  if (pressure4 === p10[high2]) return above;
  const from2 = logPressure[low] ?? 0, to2 = logPressure[high2] ?? 0;
  return below + (log(pressure4) - from2) / (to2 - from2) * (above - below);
}

// shared/thermo/parcelContext.ts
var equivalentKey = "equivalent-potential-temperature";
var ascentConstants = ["cp", "R", "Rv", "g", "kappa", "latentHeat", "cpv", "cw", "enhancementFactor"];
var ascentUses = ["saturation-vapor-pressure", "latent-heat-of-vaporization", lclTemperatureKey];
var mixedLayerDepthInput = { name: "mixedLayerDepth", label: "depth of the layer that the parcel is the mean of", symbol: "Δp", unit: "Pa", shownUnit: "hPa", kind: "difference", shape: "number", range: [500, 4e4] };
var statedInputs = [
  { name: "parcelPotentialTemperature", label: "potential temperature of the parcel", symbol: "θ_p", unit: "K", shownUnit: "K", kind: "temperature", shape: "number", range: [230, 360] },
  { name: "parcelMixingRatio", label: "mixing ratio of the parcel", symbol: "w_p", unit: "kg/kg", shownUnit: "g/kg", kind: "ratio", shape: "number", range: [1e-5, 0.05], trivialWithin: 0 }
];
var origins = {
  "surface": { title: "surface parcel", short: "the surface parcel", ask: "the parcel of the lowest row at or above the ground", inputs: [...soundingInputs, surfacePressureInput] },
  "mixed-layer": {
    title: "mixed-layer parcel",
    short: "the mixed-layer parcel",
    ask: "the parcel with the means of θ and w over the lowest layer of the given depth (weighted by pressure, trapezoids between rows, θ and w linear in ln p), started at the pressure of the ground",
    inputs: [...soundingInputs, mixedLayerDepthInput, surfacePressureInput]
  },
  "most-unstable": { title: "most unstable parcel", short: "the most unstable parcel", ask: "the parcel of the row with the largest θe within 300 hPa above the ground", inputs: [...soundingInputs, surfacePressureInput] },
  "stated": { title: "parcel with stated θ and w", short: "the stated parcel", ask: "the parcel with the given θ and w, started at the pressure of the ground", inputs: [...soundingInputs, ...statedInputs, surfacePressureInput] }
};
var ParcelContext = class {
  constructor(inputs2, constants, formulae) {
    this.inputs = inputs2;
    this.constants = constants;
    this.formulae = formulae;
    this.air = moistAir(constants, formulae);
    this.sounding = soundingOf(inputs2, this.air);
    this.lclOf = lclFunction(constants, formulae);
  }
  inputs;
  constants;
  formulae;
  air;
  sounding;
  lclOf;
  parcels = /* @__PURE__ */ new Map();
  ascents = /* @__PURE__ */ new Map();
  /** Null where the data end within the layer that the parcel is the mean of. */
  parcel(origin) {
    const known = this.parcels.get(origin);
    if (known !== void 0) return known;
    const made2 = this.makeParcel(origin);
    this.parcels.set(origin, made2);
    return made2;
  }
  makeParcel(origin) {
    const { sounding, air, inputs: inputs2 } = this;
    switch (origin) {
      case "surface":
        return surfaceParcel(sounding);
      case "mixed-layer":
        return mixedLayerParcel(sounding, numberOf(inputs2, "mixedLayerDepth"), air);
      case "most-unstable":
        return mostUnstableParcel(sounding, air, this.formulae.variants[equivalentKey]);
      case "stated":
        return statedParcel(numberOf(inputs2, "parcelPotentialTemperature"), numberOf(inputs2, "parcelMixingRatio"), sounding.pressure[0] ?? 0, air);
    }
  }
  lcl(parcel) {
    return this.lclOf(parcel.temperature, parcel.dewpoint, parcel.pressure);
  }
  ascent(origin, isVirtual) {
    const key = `${origin} ${isVirtual}`;
    const known = this.ascents.get(key);
    if (known !== void 0) return known;
    const parcel = this.parcel(origin);
    const made2 = parcel && lift(this.sounding, parcel, this.lcl(parcel), isVirtual, this.air);
    this.ascents.set(key, made2);
    return made2;
  }
};
var made = /* @__PURE__ */ new WeakMap();
var mostKept = 64;
function parcelContext(inputs2, constants, formulae) {
  const kept = made.get(inputs2) ?? [];
  const known = kept.find((one2) => one2.constants === constants && one2.formulae === formulae);
  if (known) return known;
  const context = new ParcelContext(inputs2, constants, formulae);
  if (kept.length >= mostKept) kept.shift();
  kept.push(context);
  made.set(inputs2, kept);
  return context;
}

// shared/thermo/parcelDefinition.ts
var searchedUpTo = 3e4;
var exampleSounding = {
  pressure: [1e5, 92500, 85e3, 7e4, 5e4, 4e4, 3e4, 25e3, 2e4, 15e3, 1e4],
  temperature: [301.15, 295.65, 290.65, 281.15, 264.15, 252.65, 237.15, 228.15, 218.15, 210.15, 207.15],
  dewpoint: [295.15, 292.65, 286.15, 268.15, 246.15, 232.15, 216.15, 208.15, 198.15, 190.15, 187.15]
};
var exampleMore = { "surface": {}, "most-unstable": {}, "mixed-layer": { mixedLayerDepth: 1e4 }, "stated": { parcelPotentialTemperature: 300, parcelMixingRatio: 0.015 } };
function endOfData(ascent) {
  if (!ascent) return { is: "not_reached", why: "The data end within the layer that the parcel is the mean of." };
  if (ascent.lfc === null && ascent.top > searchedUpTo) return { is: "not_reached", why: `The data end at ${Math.round(ascent.top / 100)} hPa, and the parcel has not become warmer than its surroundings up to there.` };
  return null;
}
function parcelDefinition(origin, result2, isVirtual, example) {
  const words2 = origins[origin];
  const inputs2 = words2.inputs;
  const correction = !result2.hasVirtual ? "" : isVirtual ? ", with the virtual temperature for both" : ", with the temperature itself for both, no virtual correction";
  const outcomeOf = (given8, constants, formulae, variant) => result2.outcome(parcelContext(given8, constants, formulae), origin, isVirtual, variant);
  return {
    key: `${origin}-parcel-${result2.key}${isVirtual ? "-virtual" : ""}`,
    name: `${result2.name} of the ${words2.title}${isVirtual ? ", with virtual correction" : ""}`,
    symbol: result2.symbol,
    unit: result2.unit,
    shownUnit: result2.shownUnit,
    kind: result2.kind,
    nearZero: result2.nearZero,
    inputs: inputs2,
    variants: result2.variants.map((variant) => ({ ...variant, evaluate: (given8, constants, formulae) => outcomeOf(given8, constants, formulae, variant.key) })),
    constants: ascentConstants,
    uses: origin === "most-unstable" ? [...ascentUses, equivalentKey] : ascentUses,
    notes: (given8) => notesOf2(given8),
    classLimits: result2.classLimits,
    ask: `${result2.ask} The parcel is ${words2.ask}, lifted dry to its condensation level and along the pseudoadiabat above${result2.hasVirtual ? `; it is compared with its surroundings at one pressure${correction}` : ""}. Between rows temperature is linear in ln p.`,
    trace(given8, constants, variant, formulae) {
      const context = parcelContext(given8, constants, formulae), parcel = context.parcel(origin);
      if (!parcel) return [{ text: "The data end within the layer of the parcel", formula: "p_{top}", filled: "p_{top}" }];
      const lcl = context.lcl(parcel), outcome3 = outcomeOf(given8, constants, formulae, variant);
      const first3 = [
        { text: `The parcel: ${words2.short}`, formula: "p,\\,T,\\,T_d,\\,w", filled: `p = ${texQuantity(parcel.pressure / 100, "hPa")},\\ T = ${texQuantity(parcel.temperature - zeroCelsius, "Cel")},\\ T_d = ${texQuantity(parcel.dewpoint - zeroCelsius, "Cel")},\\ w = ${texQuantity(parcel.mixingRatio * 1e3, "g/kg")}` },
        { text: "Its condensation level", formula: "p_{LCL},\\,T_{LCL}", filled: `p_{LCL} = ${texQuantity(lcl.pressure / 100, "hPa")},\\ T_{LCL} = ${texQuantity(lcl.temperature - zeroCelsius, "Cel")}` }
      ];
      return outcome3.is === "value" ? [...first3, ...result2.trace(context, origin, isVirtual, outcome3.value)] : first3;
    },
    slips: result2.slips(origin, isVirtual),
    example: { inputs: { ...exampleSounding, ...exampleMore[origin] }, ...example }
  };
  function notesOf2(given8) {
    const supersaturated2 = seriesOf(given8, "dewpoint").some((Td, at) => Td > (seriesOf(given8, "temperature")[at] ?? Infinity));
    return supersaturated2 ? ["In some rows the dewpoint lies above the temperature; they are taken as they stand."] : [];
  }
}
var levelStep = (text, symbol, pressure4) => ({ text, formula: symbol, filled: `${symbol} = ${texQuantity(pressure4 / 100, "hPa")}`, value: pressure4, unit: "Pa" });
var energyStep = (text, formula, symbol, value23) => ({ text, formula, filled: `${symbol} = ${texNumber(value23)}\\,\\mathrm{J\\,kg^{-1}}`, value: value23, unit: "J/kg" });

// shared/thermo/stabilityIndices.ts
function threeLevels(inputs2, constants, formulae) {
  const { sounding } = parcelContext(inputs2, constants, formulae);
  const { temperature: temperature6, dewpoint } = sounding;
  const t850 = atPressure(sounding, temperature6, 85e3), d850 = atPressure(sounding, dewpoint, 85e3), t700 = atPressure(sounding, temperature6, 7e4);
  const d700 = atPressure(sounding, dewpoint, 7e4), t500 = atPressure(sounding, temperature6, 5e4);
  return t850 === null || d850 === null || t700 === null || d700 === null || t500 === null ? null : { t850, d850, t700, d700, t500 };
}
var kIndex = ({ t850, d850, t700, d700, t500 }) => t850 - t500 + d850 - (t700 - d700);
var totalTotals = ({ t850, d850, t500 }) => t850 + d850 - 2 * t500;
function showalter(levels, inputs2, constants, formulae) {
  const context = parcelContext(inputs2, constants, formulae), { air } = context;
  const e = air.es(levels.d850);
  const start5 = { pressure: 85e3, temperature: levels.t850, dewpoint: levels.d850, mixingRatio: air.epsilon * e / (85e3 - e) };
  const parcel = parcelTemperatureAt(start5, context.lcl(start5), 5e4, false, air);
  return { parcel, index: levels.t500 - parcel };
}

// shared/thermo/indexDefinition.ts
var ofLevels = (of) => (inputs2, constants, _right, formulae) => {
  const levels = threeLevels(inputs2, constants, formulae);
  return levels && of(levels, inputs2, constants, formulae);
};
function indexDefinition({ source: source2, isAscent, of, steps: steps2, slips, gives, within, ask, ...named2 }) {
  const outcome3 = (inputs2, constants, formulae) => {
    const levels = threeLevels(inputs2, constants, formulae);
    return levels ? { is: "value", value: of(levels, inputs2, constants, formulae) } : { is: "not_defined", why: "The ground lies above 850 hPa, or the data end below 500 hPa: nothing is extrapolated." };
  };
  return {
    ...named2,
    unit: "K",
    inputs: [...soundingInputs, surfacePressureInput],
    variants: [{
      key: "three-levels",
      label: "linear in ln p between rows",
      source: { text: source2, status: "common practice" },
      validity: "soundings from below 850 to above 500 hPa",
      knownError: isAscent ? "latent heat by temperature or constant, up to 0.35 K" : "rounding of the levels",
      evaluate: outcome3
    }],
    constants: isAscent ? ascentConstants : [],
    uses: isAscent ? ascentUses : [],
    ask: `${ask} Temperatures and dewpoints are linear in ln p between rows; "not defined" where the ground lies above 850 hPa or the data end below 500 hPa.`,
    trace(inputs2, constants, _variant, formulae) {
      const levels = threeLevels(inputs2, constants, formulae);
      if (!levels) return [{ text: "A level is missing", formula: "850,\\,700,\\,500\\,\\mathrm{hPa}", filled: "850,\\,700,\\,500\\,\\mathrm{hPa}" }];
      const { t850, d850, t700, d700, t500 } = levels, c2 = (T11) => texQuantity(T11 - zeroCelsius, "Cel", 4);
      return [
        { text: "The levels", formula: "T_{850},\\,T_{d,850},\\,T_{700},\\,T_{d,700},\\,T_{500}", filled: `${c2(t850)},\\ ${c2(d850)},\\ ${c2(t700)},\\ ${c2(d700)},\\ ${c2(t500)}` },
        ...steps2(levels, of(levels, inputs2, constants, formulae), inputs2, constants, formulae)
      ];
    },
    slips,
    example: { inputs: exampleSounding, gives, within }
  };
}

// shared/thermo/quantities/kIndex.ts
var kIndexDefinition = indexDefinition({
  key: "k-index",
  name: "K index",
  symbol: "K",
  kind: "temperature",
  shownUnit: "Cel",
  source: 'AMS Glossary of Meteorology, "K index"',
  isAscent: false,
  ask: "The K index, T at 850 less T at 500 hPa, plus the dewpoint at 850, less the dewpoint depression at 700 hPa, in °C.",
  of: kIndex,
  steps: (_levels, value23) => [{ text: "K index", formula: "K = T_{850} - T_{500} + T_{d,850} - (T_{700} - T_{d,700})", filled: `K = ${texQuantity(value23 - zeroCelsius, "Cel", 4)}`, value: value23, unit: "K" }],
  slips: [
    slip("depression-added", "dewpoint depression added", "The dewpoint depression at 700 hPa is added: it has to be taken off.", ofLevels(({ t850, d850, t700, d700, t500 }) => t850 - t500 + d850 + (t700 - d700))),
    slip("depression-left-out", "dewpoint depression left out", "The dewpoint depression at 700 hPa is left out.", ofLevels(({ t850, d850, t500 }) => t850 - t500 + d850)),
    slip("dewpoint-left-out", "dewpoint at 850 hPa left out", "The dewpoint at 850 hPa is left out.", ofLevels(({ t850, t700, d700, t500 }) => t850 - t500 - (t700 - d700) + zeroCelsius)),
    slip("dewpoint-for-depression", "dewpoint for its depression", "This takes off the dewpoint at 700 hPa: its depression below T is needed.", ofLevels(({ t850, d850, d700, t500 }) => t850 - t500 + d850 - (d700 - zeroCelsius))),
    fineSlip("total-totals", "total totals in place of it", "This is the total totals index.", ofLevels(({ t850, d850, t500 }) => t850 + d850 - 2 * t500 + zeroCelsius))
  ],
  gives: 299.65,
  within: 3e-4
});

// shared/thermo/layerMeans.ts
var heightInputs = [
  { name: "height", label: "heights of the rows, rising", symbol: "z", unit: "m", shownUnit: "m", kind: "difference", shape: "series", range: [-500, 1e5], needs: { least: 2, order: "ascending" } },
  ...soundingInputs,
  { name: "depth", label: "depth of the layer", symbol: "Δz", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [1, 5e3] }
];
function meanByHeight(inputs2, constants, formulae) {
  const { sounding, air } = parcelContext(inputs2, constants, formulae);
  const z4 = seriesOf(inputs2, "height"), depth = numberOf(inputs2, "depth");
  if (z4.length !== sounding.count) throw new SeriesError("height", "a height is needed for each row");
  const top4 = (z4[0] ?? 0) + depth;
  const thetaAt = (row) => (sounding.temperature[row] ?? 0) * pow(1e5 / (sounding.pressure[row] ?? 1), air.kappa);
  let theta5 = 0, mixingRatio = 0;
  for (let row = 1; row < z4.length; row++) {
    const low = z4[row - 1] ?? 0, high2 = z4[row] ?? 0, end = Math.min(high2, top4), share = (end - low) / (high2 - low);
    const from2 = thetaAt(row - 1), to2 = from2 + share * (thetaAt(row) - from2);
    const dry = sounding.mixingRatio[row - 1] ?? 0, wet = dry + share * ((sounding.mixingRatio[row] ?? 0) - dry);
    theta5 += 0.5 * (from2 + to2) * (end - low);
    mixingRatio += 0.5 * (dry + wet) * (end - low);
    if (high2 >= top4) return { theta: theta5 / depth, mixingRatio: mixingRatio / depth };
  }
  return null;
}
function meanByPressure(inputs2, constants, formulae) {
  const { sounding, air } = parcelContext(inputs2, constants, formulae);
  return mixedLayerMean(sounding, numberOf(inputs2, "mixedLayerDepth"), air);
}
function layerMeanDefinition(mean2, by3, example) {
  const isTheta = mean2 === "theta", isByPressure = by3 === "pressure";
  const of = isByPressure ? meanByPressure : meanByHeight;
  const symbol = isTheta ? "\\bar\\theta" : "\\bar w", name = isTheta ? "potential temperature" : "mixing ratio";
  const outcome3 = (inputs2, constants, formulae) => {
    const found = of(inputs2, constants, formulae);
    return found ? { is: "value", value: found[mean2] } : { is: "not_reached", why: "The data end below the layer’s top." };
  };
  const surface = (inputs2, constants, formulae) => {
    const { sounding, air } = parcelContext(inputs2, constants, formulae);
    return isTheta ? (sounding.temperature[0] ?? 0) * pow(1e5 / (sounding.pressure[0] ?? 1), air.kappa) : sounding.mixingRatio[0] ?? 0;
  };
  return {
    key: `mixed-layer-mean-${isTheta ? "potential-temperature" : "mixing-ratio"}${isByPressure ? "" : "-by-height"}`,
    name: `mean ${name} of the lowest layer, weighted by ${by3}`,
    symbol: isTheta ? "θ̄" : "w̄",
    unit: isTheta ? "K" : "kg/kg",
    shownUnit: isTheta ? "K" : "g/kg",
    kind: isTheta ? "temperature" : "ratio",
    nearZero: isTheta ? void 0 : 1e-4,
    inputs: isByPressure ? [...soundingInputs, mixedLayerDepthInput] : heightInputs,
    variants: [{
      key: "trapezoids",
      label: `trapezoids in ${by3} between rows`,
      source: { text: "common practice: layer means by the trapezoidal rule", status: "common practice" },
      validity: "rows without gaps",
      knownError: "the spacing of the rows",
      evaluate: outcome3
    }],
    constants: ascentConstants,
    uses: ["saturation-vapor-pressure"],
    ask: `The mean ${name} of the lowest layer of the given depth, weighted by ${by3}: trapezoids between rows, ${isTheta ? "θ" : "w"} linear in ${isByPressure ? "ln p" : "height"} at the layer’s top; "not reached" where the data end below it.`,
    trace(inputs2, constants, _variant, formulae) {
      const found = of(inputs2, constants, formulae);
      if (!found) return [{ text: "The data end below the layer’s top", formula: symbol, filled: symbol }];
      const value23 = found[mean2];
      return [{ text: "Mean over the layer", formula: `${symbol} = \\frac{\\int ${isTheta ? "\\theta" : "w"}\\,d${isByPressure ? "p" : "z"}}{\\int d${isByPressure ? "p" : "z"}}`, filled: `${symbol} = ${isTheta ? texQuantity(value23, "K", 6) : texQuantity(value23 * 1e3, "g/kg")}`, value: value23, unit: isTheta ? "K" : "kg/kg" }];
    },
    slips: [fineSlip("surface-value", "value at the ground for the mean", "This is the value of the lowest row: the ask takes the mean of the layer.", (inputs2, constants, _right, formulae) => surface(inputs2, constants, formulae))],
    example: {
      inputs: isByPressure ? { ...exampleSounding, mixedLayerDepth: 1e4 } : { height: [100, 780, 1500, 3100, 5800, 7500, 9600, 10800, 12300, 14100, 16600], ...exampleSounding, depth: 500 },
      ...example
    }
  };
}

// shared/thermo/quantities/mixedLayerMeanMixingRatio.ts
var mixedLayerMeanMixingRatioDefinition = layerMeanDefinition("mixingRatio", "pressure", { gives: 0.01590815, within: 2e-8 });

// shared/thermo/quantities/mixedLayerMeanMixingRatioByHeight.ts
var mixedLayerMeanMixingRatioByHeightDefinition = layerMeanDefinition("mixingRatio", "height", { gives: 0.01641539, within: 2e-8 });

// shared/thermo/quantities/mixedLayerMeanPotentialTemperature.ts
var mixedLayerMeanPotentialTemperatureDefinition = layerMeanDefinition("theta", "pressure", { gives: 301.9642, within: 3e-4 });

// shared/thermo/quantities/mixedLayerMeanPotentialTemperatureByHeight.ts
var mixedLayerMeanPotentialTemperatureByHeightDefinition = layerMeanDefinition("theta", "height", { gives: 301.5775, within: 3e-4 });

// shared/thermo/parcelResults.ts
var ln102 = 2.302585092994046;
var glossary2 = (entry) => ({ text: `AMS Glossary of Meteorology, "${entry}"; rules stated in the ask`, status: "common practice" });
var pseudoadiabatic = (entry) => ({
  key: "pseudoadiabatic",
  label: "along the pseudoadiabat, liquid water",
  source: glossary2(entry),
  validity: "rows without gaps in falling pressure",
  knownError: "latent heat by temperature or constant, up to 7 % of CAPE and 0.35 K in the lifted index"
});
function otherAscents(of, weigh = fineSlip) {
  const valueOf = (inputs2, constants, formulae, origin, isVirtual) => {
    const context = parcelContext(inputs2, constants, formulae);
    const outcome3 = of(context, origin, isVirtual);
    if (outcome3.is !== "value" || outcome3.value === 0) return null;
    const lcl = context.ascent(origin, isVirtual)?.lcl.pressure ?? 0;
    return Math.abs(outcome3.value - lcl) <= 1e-9 * lcl ? null : outcome3.value;
  };
  return (origin, isVirtual) => [
    isVirtual ? weigh("virtual-left-out", "virtual correction left out", "This leaves the virtual correction out: the ask takes the virtual temperature of parcel and surroundings.", (inputs2, constants, _right, formulae) => valueOf(inputs2, constants, formulae, origin, false)) : weigh("virtual-put-in", "virtual correction put in", "This has the virtual correction in it: the ask takes the temperatures themselves.", (inputs2, constants, _right, formulae) => valueOf(inputs2, constants, formulae, origin, true)),
    ...origin === "surface" ? [] : [fineSlip("surface-parcel", "surface parcel in place of the one asked", "This is the result of the surface parcel: the ask takes another one.", (inputs2, constants, _right, formulae) => valueOf(inputs2, constants, formulae, "surface", isVirtual))]
  ];
}
function levelSlip(key, label, sentence, origin, isVirtual, level) {
  return fineSlip(key, label, sentence, (inputs2, constants, _right, formulae) => {
    const ascent = parcelContext(inputs2, constants, formulae).ascent(origin, isVirtual);
    return ascent && (level === "lcl" ? ascent.lcl.pressure : ascent[level]);
  });
}
var lclPressureResult = {
  key: "lcl-pressure",
  name: "pressure of the lifting condensation level",
  symbol: "p_LCL",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  hasVirtual: false,
  ask: "The pressure of the lifting condensation level of a parcel.",
  variants: [pseudoadiabatic("lifting condensation level")],
  outcome(context, origin) {
    const parcel = context.parcel(origin);
    return parcel ? { is: "value", value: context.lcl(parcel).pressure } : endOfData(null) ?? { is: "not_reached", why: "" };
  },
  trace: (_context, _origin, _isVirtual, value23) => [levelStep("Pressure of the condensation level", "p_{LCL}", value23)],
  slips: (origin) => origin === "surface" ? [] : [fineSlip("surface-parcel", "surface parcel in place of the one asked", "This is the level of the surface parcel: the ask takes another one.", (inputs2, constants, _right, formulae) => {
    const context = parcelContext(inputs2, constants, formulae), parcel = context.parcel("surface");
    return parcel && context.lcl(parcel).pressure;
  })]
};
var lclTemperatureResult = {
  key: "lcl-temperature",
  name: "temperature at the lifting condensation level",
  symbol: "T_LCL",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  hasVirtual: false,
  ask: "The temperature at the lifting condensation level of a parcel.",
  variants: [pseudoadiabatic("lifting condensation level")],
  outcome(context, origin) {
    const parcel = context.parcel(origin);
    return parcel ? { is: "value", value: context.lcl(parcel).temperature } : endOfData(null) ?? { is: "not_reached", why: "" };
  },
  trace: (_context, _origin, _isVirtual, value23) => [{ text: "Temperature at the condensation level", formula: "T_{LCL}", filled: `T_{LCL} = ${texQuantity(value23, "K", 6)}`, value: value23, unit: "K" }],
  slips: (origin) => origin === "surface" ? [] : [fineSlip("surface-parcel", "surface parcel in place of the one asked", "This is the level of the surface parcel: the ask takes another one.", (inputs2, constants, _right, formulae) => {
    const context = parcelContext(inputs2, constants, formulae), parcel = context.parcel("surface");
    return parcel && context.lcl(parcel).temperature;
  })]
};
function lfcOf(context, origin, isVirtual) {
  const ascent = context.ascent(origin, isVirtual);
  if (ascent && ascent.lfc !== null) return { is: "value", value: ascent.lfc };
  return endOfData(ascent) ?? { is: "none", why: "The parcel is nowhere warmer than its surroundings." };
}
var lfcResult = {
  key: "lfc",
  name: "level of free convection",
  symbol: "p_LFC",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  hasVirtual: true,
  ask: 'The pressure of the level of free convection, the lowest one at or above the condensation level where the parcel becomes warmer than its surroundings; "none" where it never does, "not reached" where the data end below 300 hPa before it does.',
  variants: [pseudoadiabatic("level of free convection")],
  outcome: lfcOf,
  trace: (_context, _origin, _isVirtual, value23) => [levelStep("The lowest level at or above it where the parcel becomes warmer", "p_{LFC}", value23)],
  slips: (origin, isVirtual) => [
    levelSlip("lcl-for-lfc", "condensation level for it", "This is the lifting condensation level: the parcel is not free there yet.", origin, isVirtual, "lcl"),
    levelSlip("el-for-lfc", "equilibrium level for it", "This is the equilibrium level, where the parcel becomes colder again.", origin, isVirtual, "el"),
    ...otherAscents(lfcOf)(origin, isVirtual)
  ]
};
function elOf(context, origin, isVirtual) {
  const ascent = context.ascent(origin, isVirtual);
  const end = endOfData(ascent);
  if (end || !ascent) return end ?? { is: "none", why: "" };
  if (ascent.isWarmAtTop) return { is: "not_reached", why: "The parcel is still warmer than its surroundings at the top of the data." };
  return ascent.el === null ? { is: "none", why: "There is no level of free convection, and so no equilibrium level." } : { is: "value", value: ascent.el };
}
var elResult = {
  key: "el",
  name: "equilibrium level",
  symbol: "p_EL",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  hasVirtual: true,
  ask: 'The pressure of the equilibrium level, the highest one where the parcel becomes colder than its surroundings; "none" without a level of free convection, "not reached" where the data end while the parcel is warmer.',
  variants: [pseudoadiabatic("equilibrium level")],
  outcome: elOf,
  trace: (_context, _origin, _isVirtual, value23) => [levelStep("The highest level where the parcel becomes colder", "p_{EL}", value23)],
  slips: (origin, isVirtual) => [
    levelSlip("lfc-for-el", "level of free convection for it", "This is the level of free convection: the equilibrium level is where the parcel becomes colder again.", origin, isVirtual, "lfc"),
    // as small as the spread of accepted formulae
    ...otherAscents(elOf, constantSlip)(origin, isVirtual)
  ]
};
function capeOf(context, origin, isVirtual, variant = "whole") {
  const ascent = context.ascent(origin, isVirtual);
  const end = endOfData(ascent);
  if (end || !ascent) return end ?? { is: "not_reached", why: "" };
  if (!ascent.isWarmAtTop) return { is: "value", value: ascent.cape };
  if (variant !== "to-data-top") return { is: "not_reached", why: `The data end at ${Math.round(ascent.top / 100)} hPa, below the equilibrium level: the area up to there is no CAPE.` };
  return { is: "value", value: ascent.cape, notes: [`Up to the top of the data at ${Math.round(ascent.top / 100)} hPa, below the equilibrium level.`] };
}
var capeResult = {
  key: "cape",
  name: "convective available potential energy",
  symbol: "CAPE",
  unit: "J/kg",
  shownUnit: "J/kg",
  kind: "difference",
  nearZero: 50,
  hasVirtual: true,
  ask: 'CAPE = R ∫ (T_p − T_e) d ln p, the sum of the positive areas from the level of free convection to the equilibrium level, with zero crossings as nodes; positive area below the condensation level does not count; 0 without a level of free convection, "not reached" where the data end below the equilibrium level.',
  variants: [
    { ...pseudoadiabatic("convective available potential energy"), key: "whole", label: "to the equilibrium level, which the data have to reach" },
    { ...pseudoadiabatic("convective available potential energy"), key: "to-data-top", label: "to the equilibrium level or the top of the data, whichever is lower" }
  ],
  outcome: capeOf,
  trace(context, origin, isVirtual, value23) {
    const ascent = context.ascent(origin, isVirtual);
    const steps2 = ascent && ascent.lfc !== null ? [levelStep("Level of free convection", "p_{LFC}", ascent.lfc)] : [];
    if (ascent && ascent.el !== null) steps2.push(levelStep("Equilibrium level", "p_{EL}", ascent.el));
    return [...steps2, energyStep("Sum of the positive areas between them", "\\mathrm{CAPE} = R \\int \\max(0,\\,T_p - T_e)\\,d\\ln p", "\\mathrm{CAPE}", value23)];
  },
  slips: (origin, isVirtual) => [
    slip("sign", "sign turned round", "CAPE is positive: it is energy that the parcel gains.", (_i, _c, right) => right === 0 ? null : -right),
    slip("base-ten", "log₁₀ p for ln p", "This integrates over log₁₀ p: the natural logarithm is needed.", (_i, _c, right) => right === 0 ? null : right / ln102),
    slip("no-energy", "no energy found", "Nothing was found here: the parcel does become warmer than its surroundings.", (_i, _c, right) => right === 0 ? null : 0),
    fineSlip("cin-added", "CIN taken off", "This is the whole area, with the negative one below taken off: CAPE is the positive area alone.", (inputs2, constants, right, formulae) => {
      if (right === 0) return null;
      const ascent = parcelContext(inputs2, constants, formulae).ascent(origin, isVirtual);
      return ascent && right + ascent.cin;
    }),
    ...otherAscents((context, from2, withVirtual) => capeOf(context, from2, withVirtual, "to-data-top"))(origin, isVirtual)
  ]
};
function cinOf(context, origin, isVirtual) {
  const ascent = context.ascent(origin, isVirtual);
  const end = endOfData(ascent);
  if (end || !ascent) return end ?? { is: "not_reached", why: "" };
  return ascent.lfc === null ? { is: "not_defined", why: "There is no level of free convection that the parcel could be lifted to." } : { is: "value", value: ascent.cin };
}
var cinResult = {
  key: "cin",
  name: "convective inhibition",
  symbol: "CIN",
  unit: "J/kg",
  shownUnit: "J/kg",
  kind: "difference",
  nearZero: 10,
  hasVirtual: true,
  ask: 'CIN = R ∫ (T_p − T_e) d ln p, the sum of the negative areas from the start to the level of free convection, with its sign (CIN ≤ 0); negative area above does not count; "not defined" without a level of free convection.',
  variants: [pseudoadiabatic("convective inhibition")],
  outcome: cinOf,
  trace(context, origin, isVirtual, value23) {
    const ascent = context.ascent(origin, isVirtual);
    return [
      ...ascent && ascent.lfc !== null ? [levelStep("Level of free convection", "p_{LFC}", ascent.lfc)] : [],
      energyStep("Sum of the negative areas below it", "\\mathrm{CIN} = R \\int \\min(0,\\,T_p - T_e)\\,d\\ln p", "\\mathrm{CIN}", value23)
    ];
  },
  slips: (origin, isVirtual) => [
    slip("sign", "sign turned round", "CIN is asked with its sign: it is energy that has to be spent, at most 0.", (_i, _c, right) => right === 0 ? null : -right),
    slip("base-ten", "log₁₀ p for ln p", "This integrates over log₁₀ p: the natural logarithm is needed.", (_i, _c, right) => right === 0 ? null : right / ln102),
    ...otherAscents(cinOf)(origin, isVirtual)
  ]
};
var indexPressure = 5e4;
function at500(context, origin, isVirtual) {
  const { sounding, air } = context;
  const parcel = context.parcel(origin);
  if (!parcel) return endOfData(null) ?? { is: "not_reached", why: "" };
  const environment = atPressure(sounding, isVirtual ? sounding.virtualTemperature : sounding.temperature, indexPressure);
  if (environment === null) return (sounding.pressure[0] ?? 0) < indexPressure ? { is: "not_defined", why: "The ground lies above 500 hPa." } : { is: "not_reached", why: "The data end below 500 hPa." };
  if (parcel.pressure < indexPressure) return { is: "not_defined", why: "The parcel starts above 500 hPa." };
  return { environment, parcel: parcelTemperatureAt(parcel, context.lcl(parcel), indexPressure, isVirtual, air) };
}
function liftedIndexOf(context, origin, isVirtual) {
  const found = at500(context, origin, isVirtual);
  return "is" in found ? found : { is: "value", value: found.environment - found.parcel };
}
var liftedIndexResult = {
  key: "lifted-index",
  name: "lifted index",
  symbol: "LI",
  unit: "K",
  shownUnit: "K",
  kind: "difference",
  nearZero: 1,
  hasVirtual: true,
  ask: 'The lifted index, the temperature of the surroundings less that of the parcel at 500 hPa: negative where the parcel is warmer; "not reached" where the data end below 500 hPa.',
  variants: [{ ...pseudoadiabatic("lifted index") }],
  outcome: liftedIndexOf,
  trace(context, origin, isVirtual, value23) {
    const found = at500(context, origin, isVirtual);
    if ("is" in found) return [];
    const parcelSymbol = isVirtual ? "T_{v,p}" : "T_p";
    return [
      { text: "Parcel at 500 hPa", formula: parcelSymbol, filled: `${parcelSymbol} = ${texQuantity(found.parcel, "K", 6)}`, value: found.parcel, unit: "K" },
      { text: "Surroundings less parcel", formula: `LI = ${isVirtual ? "T_{v,e}" : "T_e"} - ${parcelSymbol}`, filled: `LI = ${texQuantity(found.environment, "K", 6)} - ${texQuantity(found.parcel, "K", 6)} = ${texFactor(value23)}\\,\\mathrm{K}`, value: value23, unit: "K" }
    ];
  },
  slips: (origin, isVirtual) => [
    signSlip("The lifted index is the surroundings less the parcel: negative where the parcel is warmer."),
    fineSlip("dry-all-the-way", "lifted dry all the way", "This lifts the parcel dry all the way: above its condensation level it follows the pseudoadiabat.", (inputs2, constants, _right, formulae) => {
      const context = parcelContext(inputs2, constants, formulae), parcel = context.parcel(origin), found = at500(context, origin, isVirtual);
      if (!parcel || "is" in found) return null;
      const factor = isVirtual ? (1 + parcel.mixingRatio / context.air.epsilon) / (1 + parcel.mixingRatio) : 1;
      return found.environment - parcel.temperature * exp(context.air.kappa * log(indexPressure / parcel.pressure)) * factor;
    }),
    // as small as the spread of accepted formulae
    ...otherAscents(liftedIndexOf, constantSlip)(origin, isVirtual)
  ]
};

// shared/thermo/quantities/mixedLayerParcelCape.ts
var mixedLayerParcelCapeDefinition = parcelDefinition("mixed-layer", capeResult, false, { gives: 2023.693, within: 2e-3 });

// shared/thermo/quantities/mixedLayerParcelCapeVirtual.ts
var mixedLayerParcelCapeVirtualDefinition = parcelDefinition("mixed-layer", capeResult, true, { gives: 2253.851, within: 2e-3 });

// shared/thermo/quantities/mixedLayerParcelCin.ts
var mixedLayerParcelCinDefinition = parcelDefinition("mixed-layer", cinResult, false, { gives: -18.03819, within: 2e-5 });

// shared/thermo/quantities/mixedLayerParcelCinVirtual.ts
var mixedLayerParcelCinVirtualDefinition = parcelDefinition("mixed-layer", cinResult, true, { gives: -10.40273, within: 1e-5 });

// shared/thermo/quantities/mixedLayerParcelEl.ts
var mixedLayerParcelElDefinition = parcelDefinition("mixed-layer", elResult, false, { gives: 18916.22, within: 0.02 });

// shared/thermo/quantities/mixedLayerParcelElVirtual.ts
var mixedLayerParcelElVirtualDefinition = parcelDefinition("mixed-layer", elResult, true, { gives: 18909.3, within: 0.02 });

// shared/thermo/quantities/mixedLayerParcelLclPressure.ts
var mixedLayerParcelLclPressureDefinition = parcelDefinition("mixed-layer", lclPressureResult, false, { gives: 89322.91, within: 0.09 });

// shared/thermo/quantities/mixedLayerParcelLclTemperature.ts
var mixedLayerParcelLclTemperatureDefinition = parcelDefinition("mixed-layer", lclTemperatureResult, false, { gives: 292.3734, within: 3e-4 });

// shared/thermo/quantities/mixedLayerParcelLfc.ts
var mixedLayerParcelLfcDefinition = parcelDefinition("mixed-layer", lfcResult, false, { gives: 84582.55, within: 0.08 });

// shared/thermo/quantities/mixedLayerParcelLfcVirtual.ts
var mixedLayerParcelLfcVirtualDefinition = parcelDefinition("mixed-layer", lfcResult, true, { gives: 86735.87, within: 0.09 });

// shared/thermo/quantities/mixedLayerParcelLiftedIndex.ts
var mixedLayerParcelLiftedIndexDefinition = parcelDefinition("mixed-layer", liftedIndexResult, false, { gives: -5.613484, within: 6e-6 });

// shared/thermo/quantities/mixedLayerParcelLiftedIndexVirtual.ts
var mixedLayerParcelLiftedIndexVirtualDefinition = parcelDefinition("mixed-layer", liftedIndexResult, true, { gives: -6.453964, within: 6e-6 });

// shared/thermo/quantities/mostUnstableParcelCape.ts
var mostUnstableParcelCapeDefinition = parcelDefinition("most-unstable", capeResult, false, { gives: 2384.946, within: 2e-3 });

// shared/thermo/quantities/mostUnstableParcelCapeVirtual.ts
var mostUnstableParcelCapeVirtualDefinition = parcelDefinition("most-unstable", capeResult, true, { gives: 2635.367, within: 3e-3 });

// shared/thermo/quantities/mostUnstableParcelCin.ts
var mostUnstableParcelCinDefinition = parcelDefinition("most-unstable", cinResult, false, { gives: -27.77756, within: 3e-5 });

// shared/thermo/quantities/mostUnstableParcelCinVirtual.ts
var mostUnstableParcelCinVirtualDefinition = parcelDefinition("most-unstable", cinResult, true, { gives: -19.00571, within: 2e-5 });

// shared/thermo/quantities/mostUnstableParcelEl.ts
var mostUnstableParcelElDefinition = parcelDefinition("most-unstable", elResult, false, { gives: 18265.11, within: 0.02 });

// shared/thermo/quantities/mostUnstableParcelElVirtual.ts
var mostUnstableParcelElVirtualDefinition = parcelDefinition("most-unstable", elResult, true, { gives: 18259.05, within: 0.02 });

// shared/thermo/quantities/mostUnstableParcelLclPressure.ts
var mostUnstableParcelLclPressureDefinition = parcelDefinition("most-unstable", lclPressureResult, false, { gives: 91631.65, within: 0.09 });

// shared/thermo/quantities/mostUnstableParcelLclTemperature.ts
var mostUnstableParcelLclTemperatureDefinition = parcelDefinition("most-unstable", lclTemperatureResult, false, { gives: 293.7199, within: 3e-4 });

// shared/thermo/quantities/mostUnstableParcelLfc.ts
var mostUnstableParcelLfcDefinition = parcelDefinition("most-unstable", lfcResult, false, { gives: 86442.37, within: 0.09 });

// shared/thermo/quantities/mostUnstableParcelLfcVirtual.ts
var mostUnstableParcelLfcVirtualDefinition = parcelDefinition("most-unstable", lfcResult, true, { gives: 88324.97, within: 0.09 });

// shared/thermo/quantities/mostUnstableParcelLiftedIndex.ts
var mostUnstableParcelLiftedIndexDefinition = parcelDefinition("most-unstable", liftedIndexResult, false, { gives: -6.28649, within: 6e-6 });

// shared/thermo/quantities/mostUnstableParcelLiftedIndexVirtual.ts
var mostUnstableParcelLiftedIndexVirtualDefinition = parcelDefinition("most-unstable", liftedIndexResult, true, { gives: -7.179813, within: 7e-6 });

// shared/thermo/quantities/showalterIndex.ts
var showalterIndexDefinition = indexDefinition({
  key: "showalter-index",
  name: "Showalter index",
  symbol: "SI",
  kind: "difference",
  shownUnit: "K",
  nearZero: 1,
  source: 'Showalter (1953), Bull. Amer. Meteor. Soc. 34, 250–252; AMS Glossary of Meteorology, "Showalter index"',
  isAscent: true,
  ask: "The Showalter index, T of the surroundings at 500 hPa less that of a parcel lifted from 850 hPa, dry to its condensation level and along the pseudoadiabat above, no virtual correction; negative where the parcel is warmer.",
  of: (levels, inputs2, constants, formulae) => showalter(levels, inputs2, constants, formulae).index,
  steps(levels, value23, inputs2, constants, formulae) {
    const { parcel } = showalter(levels, inputs2, constants, formulae);
    return [
      { text: "Parcel of 850 hPa at 500 hPa", formula: "T_p", filled: `T_p = ${texQuantity(parcel, "K", 6)}`, value: parcel, unit: "K" },
      { text: "Surroundings less parcel", formula: "SI = T_{500} - T_p", filled: `SI = ${texQuantity(levels.t500, "K", 6)} - ${texQuantity(parcel, "K", 6)} = ${texFactor(value23)}\\,\\mathrm{K}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    signSlip("The index is the surroundings less the parcel: negative where the parcel is warmer."),
    fineSlip("dry-all-the-way", "lifted dry all the way", "This lifts the parcel dry all the way: above its condensation level it follows the pseudoadiabat.", ofLevels((levels, inputs2, constants, formulae) => levels.t500 - levels.t850 * exp(parcelContext(inputs2, constants, formulae).air.kappa * log(5e4 / 85e3))))
  ],
  gives: -1.280154,
  within: 1e-6
});

// shared/thermo/quantities/statedParcelCape.ts
var statedParcelCapeDefinition = parcelDefinition("stated", capeResult, false, { gives: 1121.267, within: 1e-3 });

// shared/thermo/quantities/statedParcelCapeVirtual.ts
var statedParcelCapeVirtualDefinition = parcelDefinition("stated", capeResult, true, { gives: 1293.311, within: 1e-3 });

// shared/thermo/quantities/statedParcelCin.ts
var statedParcelCinDefinition = parcelDefinition("stated", cinResult, false, { gives: -112.0671, within: 1e-4 });

// shared/thermo/quantities/statedParcelCinVirtual.ts
var statedParcelCinVirtualDefinition = parcelDefinition("stated", cinResult, true, { gives: -98.96067, within: 1e-4 });

// shared/thermo/quantities/statedParcelEl.ts
var statedParcelElDefinition = parcelDefinition("stated", elResult, false, { gives: 21605.45, within: 0.02 });

// shared/thermo/quantities/statedParcelElVirtual.ts
var statedParcelElVirtualDefinition = parcelDefinition("stated", elResult, true, { gives: 21580.13, within: 0.02 });

// shared/thermo/quantities/statedParcelLclPressure.ts
var statedParcelLclPressureDefinition = parcelDefinition("stated", lclPressureResult, false, { gives: 90641.58, within: 0.09 });

// shared/thermo/quantities/statedParcelLclTemperature.ts
var statedParcelLclTemperatureDefinition = parcelDefinition("stated", lclTemperatureResult, false, { gives: 291.691, within: 3e-4 });

// shared/thermo/quantities/statedParcelLfc.ts
var statedParcelLfcDefinition = parcelDefinition("stated", lfcResult, false, { gives: 75704.93, within: 0.08 });

// shared/thermo/quantities/statedParcelLfcVirtual.ts
var statedParcelLfcVirtualDefinition = parcelDefinition("stated", lfcResult, true, { gives: 80121.27, within: 0.08 });

// shared/thermo/quantities/statedParcelLiftedIndex.ts
var statedParcelLiftedIndexDefinition = parcelDefinition("stated", liftedIndexResult, false, { gives: -3.742013, within: 4e-6 });

// shared/thermo/quantities/statedParcelLiftedIndexVirtual.ts
var statedParcelLiftedIndexVirtualDefinition = parcelDefinition("stated", liftedIndexResult, true, { gives: -4.448151, within: 4e-6 });

// shared/thermo/quantities/surfaceParcelCape.ts
var surfaceParcelCapeDefinition = parcelDefinition("surface", capeResult, false, { gives: 2384.946, within: 2e-3 });

// shared/thermo/quantities/surfaceParcelCapeVirtual.ts
var surfaceParcelCapeVirtualDefinition = parcelDefinition("surface", capeResult, true, { gives: 2635.367, within: 3e-3 });

// shared/thermo/quantities/surfaceParcelCin.ts
var surfaceParcelCinDefinition = parcelDefinition("surface", cinResult, false, { gives: -27.77756, within: 3e-5 });

// shared/thermo/quantities/surfaceParcelCinVirtual.ts
var surfaceParcelCinVirtualDefinition = parcelDefinition("surface", cinResult, true, { gives: -19.00571, within: 2e-5 });

// shared/thermo/quantities/surfaceParcelEl.ts
var surfaceParcelElDefinition = parcelDefinition("surface", elResult, false, { gives: 18265.11, within: 0.02 });

// shared/thermo/quantities/surfaceParcelElVirtual.ts
var surfaceParcelElVirtualDefinition = parcelDefinition("surface", elResult, true, { gives: 18259.05, within: 0.02 });

// shared/thermo/quantities/surfaceParcelLclPressure.ts
var surfaceParcelLclPressureDefinition = parcelDefinition("surface", lclPressureResult, false, { gives: 91631.65, within: 0.09 });

// shared/thermo/quantities/surfaceParcelLclTemperature.ts
var surfaceParcelLclTemperatureDefinition = parcelDefinition("surface", lclTemperatureResult, false, { gives: 293.7199, within: 3e-4 });

// shared/thermo/quantities/surfaceParcelLfc.ts
var surfaceParcelLfcDefinition = parcelDefinition("surface", lfcResult, false, { gives: 86442.37, within: 0.09 });

// shared/thermo/quantities/surfaceParcelLfcVirtual.ts
var surfaceParcelLfcVirtualDefinition = parcelDefinition("surface", lfcResult, true, { gives: 88324.97, within: 0.09 });

// shared/thermo/quantities/surfaceParcelLiftedIndex.ts
var surfaceParcelLiftedIndexDefinition = parcelDefinition("surface", liftedIndexResult, false, { gives: -6.28649, within: 6e-6 });

// shared/thermo/quantities/surfaceParcelLiftedIndexVirtual.ts
var surfaceParcelLiftedIndexVirtualDefinition = parcelDefinition("surface", liftedIndexResult, true, { gives: -7.179813, within: 7e-6 });

// shared/thermo/quantities/totalTotalsIndex.ts
var totalTotalsIndexDefinition = indexDefinition({
  key: "total-totals-index",
  name: "total totals index",
  symbol: "TT",
  kind: "difference",
  shownUnit: "K",
  nearZero: 1,
  source: 'AMS Glossary of Meteorology, "total totals index"',
  isAscent: false,
  ask: "The total totals index, T and dewpoint at 850 hPa less twice T at 500 hPa.",
  of: totalTotals,
  steps: (_levels, value23) => [{ text: "Total totals", formula: "TT = T_{850} + T_{d,850} - 2\\,T_{500}", filled: `TT = ${texQuantity(value23, "K", 4)}`, value: value23, unit: "K" }],
  slips: [
    slip("vertical-totals", "vertical totals alone", "These are the vertical totals, T at 850 less T at 500 hPa: the cross totals have to be added.", ofLevels(({ t850, t500 }) => t850 - t500)),
    slip("cross-totals", "cross totals alone", "These are the cross totals, dewpoint at 850 less T at 500 hPa: the vertical totals have to be added.", ofLevels(({ d850, t500 }) => d850 - t500)),
    slip("once-for-twice", "T at 500 hPa taken off once", "T at 500 hPa is taken off once: it has to be taken off twice.", ofLevels(({ t850, d850, t500 }) => t850 + d850 - t500 - zeroCelsius)),
    slip("sign-at-500", "T at 500 hPa added", "Twice T at 500 hPa is added: it has to be taken off.", ofLevels(({ t850, d850, t500 }) => t850 + d850 + 2 * t500 - 4 * zeroCelsius)),
    fineSlip("k-index", "K index in place of it", "This is the K index.", ofLevels((levels) => kIndex(levels) - zeroCelsius))
  ],
  gives: 48.5,
  within: 5e-5
});

// shared/thermo/precipitableWater.ts
var waterDensity = 1e3;
var source = { text: 'AMS Glossary of Meteorology, "precipitable water"', status: "verified" };
function precipitableWater(inputs2, constants, formulae, humidity2) {
  const { sounding } = parcelContext(inputs2, constants, formulae);
  let sum = 0, before = 0;
  for (let row = 0; row < sounding.count; row++) {
    const w2 = sounding.mixingRatio[row] ?? 0, here = humidity2 === "q" ? w2 / (1 + w2) : w2;
    if (row > 0) sum += 0.5 * (before + here) * ((sounding.pressure[row - 1] ?? 0) - (sounding.pressure[row] ?? 0));
    before = here;
  }
  return sum / (constant(constants, "g") * waterDensity);
}
function layerPrecipitableWater(mixingRatio, bottom3, top4, constants, humidity2) {
  return (humidity2 === "q" ? mixingRatio / (1 + mixingRatio) : mixingRatio) * (bottom3 - top4) / (constant(constants, "g") * waterDensity);
}
var inWords = { q: "specific humidity q", w: "mixing ratio w" };
var other = (humidity2) => humidity2 === "q" ? "w" : "q";
var shared = { symbol: "PW", unit: "m", shownUnit: "mm", kind: "ratio", nearZero: 1e-4 };
function soundingWaterDefinition(humidity2, example) {
  return {
    ...shared,
    key: `precipitable-water${humidity2 === "q" ? "" : "-by-mixing-ratio"}`,
    name: `precipitable water of a sounding by ${inWords[humidity2]}`,
    inputs: [...soundingInputs, surfacePressureInput],
    variants: [{
      key: "trapezoids",
      label: "trapezoids in p between rows",
      source,
      validity: "the layer that the data span",
      knownError: "the spacing of the rows: 1 %",
      evaluate: (inputs2, constants, formulae) => ({ is: "value", value: precipitableWater(inputs2, constants, formulae, humidity2) })
    }],
    constants: ["g", "R", "Rv", "enhancementFactor"],
    uses: ["saturation-vapor-pressure"],
    ask: `The precipitable water of the layer that your rows span, PW = (1/ρg) ∫ ${humidity2} dp with the ${inWords[humidity2]}, trapezoids in p between rows, as the depth of liquid water (1 mm is 1 kg m⁻²).`,
    trace(inputs2, constants, _variant, formulae) {
      const { sounding } = parcelContext(inputs2, constants, formulae), value23 = precipitableWater(inputs2, constants, formulae, humidity2);
      return [
        { text: "Humidity at the bottom", formula: "w = \\frac{\\varepsilon e}{p - e}", filled: `w = ${texQuantity((sounding.mixingRatio[0] ?? 0) * 1e3, "g/kg")},\\quad \\varepsilon = ${texNumber(epsilonOf(constants))}` },
        { text: "Sum over the layers", formula: `PW = \\frac{1}{\\rho g} \\sum \\bar ${humidity2}\\,\\Delta p`, filled: `PW = ${texQuantity(value23 * 1e3, "mm")}`, value: value23, unit: "m" }
      ];
    },
    slips: [
      constantSlip("other-humidity", `${other(humidity2)} in place of ${humidity2}`, `This takes the ${inWords[other(humidity2)]}: the ask takes the ${inWords[humidity2]}.`, (inputs2, constants, _right, formulae) => precipitableWater(inputs2, constants, formulae, other(humidity2))),
      slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right * constant(constants, "g")),
      slip("hectopascal", "hPa in place of Pa", "The pressures went in in hectopascal: pascal are needed.", (_i, _c, right) => right / 100),
      slip("grams", "g kg⁻¹ in place of kg kg⁻¹", "The humidity went in in g/kg: kg/kg is needed.", (_i, _c, right) => right * 1e3),
      slip("centimeters", "cm given as mm", "Your number is in centimeters; the unit beside it says millimeters.", (_i, _c, right) => right / 10),
      fineSlip("saturated", "T for the dewpoint", "This takes the humidity of saturated air, from T: the dewpoint gives the actual one.", (inputs2, constants, _right, formulae) => precipitableWater({ ...inputs2, dewpoint: inputs2.temperature ?? [] }, constants, formulae, humidity2))
    ],
    example: { inputs: exampleSounding, ...example }
  };
}
var layerInputs = [
  { name: "mixingRatio", label: "mean mixing ratio of the layer", symbol: "w", unit: "kg/kg", shownUnit: "g/kg", kind: "ratio", shape: "number", range: [0, 0.06] },
  { name: "pressureBottom", label: "pressure at the bottom", symbol: "p_1", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [1e3, 11e4] },
  { name: "pressureTop", label: "pressure at the top", symbol: "p_2", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [100, 11e4] }
];
function layerWaterDefinition(humidity2, example) {
  const of = (inputs2, constants, by3 = humidity2) => layerPrecipitableWater(numberOf(inputs2, "mixingRatio"), numberOf(inputs2, "pressureBottom"), numberOf(inputs2, "pressureTop"), constants, by3);
  return {
    ...shared,
    kind: "difference",
    key: `layer-precipitable-water${humidity2 === "q" ? "" : "-by-mixing-ratio"}`,
    name: `precipitable water of a layer by ${inWords[humidity2]}`,
    inputs: layerInputs,
    variants: [{
      key: "one-value",
      label: "one mixing ratio for the layer",
      source,
      validity: "a layer with little change of mixing ratio",
      knownError: "none: the mean decides",
      evaluate: (inputs2, constants) => ({ is: "value", value: of(inputs2, constants) })
    }],
    constants: ["g"],
    ask: `The precipitable water of the layer alone, PW = ${humidity2} (p₁ − p₂)/(ρ g) with the ${inWords[humidity2]} of its mean mixing ratio, as the depth of liquid water (1 mm is 1 kg m⁻²).`,
    trace(inputs2, constants) {
      const w2 = numberOf(inputs2, "mixingRatio"), value23 = of(inputs2, constants), taken = humidity2 === "q" ? w2 / (1 + w2) : w2;
      return [
        { text: "Humidity", formula: humidity2 === "q" ? "q = \\frac{w}{1 + w}" : "w", filled: `${humidity2} = ${texQuantity(taken * 1e3, "g/kg")}` },
        { text: "Water in the layer", formula: `PW = \\frac{${humidity2} (p_1 - p_2)}{\\rho g}`, filled: `PW = \\frac{${texNumber(taken)} \\times ${texNumber(numberOf(inputs2, "pressureBottom") - numberOf(inputs2, "pressureTop"))}}{1000 \\times ${texNumber(constant(constants, "g"), 6)}}\\,\\mathrm{m} = ${texQuantity(value23 * 1e3, "mm")}`, value: value23, unit: "m" }
      ];
    },
    slips: [
      constantSlip("other-humidity", `${other(humidity2)} in place of ${humidity2}`, `This takes the ${inWords[other(humidity2)]}: the ask takes the ${inWords[humidity2]}.`, (inputs2, constants) => of(inputs2, constants, other(humidity2))),
      slip("sign", "layer upside down", "The layer is taken upside down: the bottom has the higher pressure.", (_i, _c, right) => -right),
      slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right * constant(constants, "g")),
      slip("hectopascal", "hPa in place of Pa", "The pressures went in in hectopascal: pascal are needed.", (_i, _c, right) => right / 100),
      slip("grams", "g kg⁻¹ in place of kg kg⁻¹", "The humidity went in in g/kg: kg/kg is needed.", (_i, _c, right) => right * 1e3),
      slip("centimeters", "cm given as mm", "Your number is in centimeters; the unit beside it says millimeters.", (_i, _c, right) => right / 10)
    ],
    example: { inputs: { mixingRatio: 8e-3, pressureBottom: 1e5, pressureTop: 7e4 }, ...example }
  };
}

// shared/thermo/quantities/precipitableWater.ts
var precipitableWaterDefinition = soundingWaterDefinition("q", { gives: 0.03906055, within: 4e-8 });

// shared/thermo/quantities/precipitableWaterByMixingRatio.ts
var precipitableWaterByMixingRatioDefinition = soundingWaterDefinition("w", { gives: 0.03951854, within: 4e-8 });

// shared/thermo/quantities/layerPrecipitableWater.ts
var layerPrecipitableWaterDefinition = layerWaterDefinition("q", { gives: 0.0242706, within: 1e-6 });

// shared/thermo/quantities/layerPrecipitableWaterByMixingRatio.ts
var layerPrecipitableWaterByMixingRatioDefinition = layerWaterDefinition("w", { gives: 0.0244648, within: 1e-6 });

// shared/thermo/groups/parcels.ts
var parcels = {
  key: "parcels",
  title: "Parcels in a sounding",
  quantities: [
    surfaceParcelLclPressureDefinition,
    surfaceParcelLclTemperatureDefinition,
    surfaceParcelLfcDefinition,
    surfaceParcelLfcVirtualDefinition,
    surfaceParcelElDefinition,
    surfaceParcelElVirtualDefinition,
    surfaceParcelCapeDefinition,
    surfaceParcelCapeVirtualDefinition,
    surfaceParcelCinDefinition,
    surfaceParcelCinVirtualDefinition,
    surfaceParcelLiftedIndexDefinition,
    surfaceParcelLiftedIndexVirtualDefinition,
    mixedLayerParcelLclPressureDefinition,
    mixedLayerParcelLclTemperatureDefinition,
    mixedLayerParcelLfcDefinition,
    mixedLayerParcelLfcVirtualDefinition,
    mixedLayerParcelElDefinition,
    mixedLayerParcelElVirtualDefinition,
    mixedLayerParcelCapeDefinition,
    mixedLayerParcelCapeVirtualDefinition,
    mixedLayerParcelCinDefinition,
    mixedLayerParcelCinVirtualDefinition,
    mixedLayerParcelLiftedIndexDefinition,
    mixedLayerParcelLiftedIndexVirtualDefinition,
    mostUnstableParcelLclPressureDefinition,
    mostUnstableParcelLclTemperatureDefinition,
    mostUnstableParcelLfcDefinition,
    mostUnstableParcelLfcVirtualDefinition,
    mostUnstableParcelElDefinition,
    mostUnstableParcelElVirtualDefinition,
    mostUnstableParcelCapeDefinition,
    mostUnstableParcelCapeVirtualDefinition,
    mostUnstableParcelCinDefinition,
    mostUnstableParcelCinVirtualDefinition,
    mostUnstableParcelLiftedIndexDefinition,
    mostUnstableParcelLiftedIndexVirtualDefinition,
    statedParcelLclPressureDefinition,
    statedParcelLclTemperatureDefinition,
    statedParcelLfcDefinition,
    statedParcelLfcVirtualDefinition,
    statedParcelElDefinition,
    statedParcelElVirtualDefinition,
    statedParcelCapeDefinition,
    statedParcelCapeVirtualDefinition,
    statedParcelCinDefinition,
    statedParcelCinVirtualDefinition,
    statedParcelLiftedIndexDefinition,
    statedParcelLiftedIndexVirtualDefinition,
    mixedLayerMeanPotentialTemperatureDefinition,
    mixedLayerMeanMixingRatioDefinition,
    mixedLayerMeanPotentialTemperatureByHeightDefinition,
    mixedLayerMeanMixingRatioByHeightDefinition,
    showalterIndexDefinition,
    kIndexDefinition,
    totalTotalsIndexDefinition,
    precipitableWaterDefinition,
    precipitableWaterByMixingRatioDefinition,
    layerPrecipitableWaterDefinition,
    layerPrecipitableWaterByMixingRatioDefinition
  ]
};

// shared/thermo/stratification.ts
var theta3 = (name, label, symbol) => ({ name, label, symbol, unit: "K", shownUnit: "K", kind: "temperature", shape: "number", range: [150, 800] });
var thetaLayerInputs = [
  theta3("potentialTemperatureBottom", "potential temperature at the bottom (virtual, where the air is moist)", "θ₁"),
  theta3("potentialTemperatureTop", "potential temperature at the top (virtual, where the air is moist)", "θ₂"),
  { name: "depth", label: "depth of the layer", symbol: "Δz", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [0.1, 5e4], trivialWithin: 0 }
];
var virtualTemperatureInput = (label) => ({ name: "virtualTemperature", label, symbol: "T_v", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [150, 400] });
var virtualRateInput = { name: "virtualLapseRate", label: "lapse rate of the virtual temperature", symbol: "Γ_v", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] };
function bruntVaisalaSquared(bottom3, top4, depth, constants) {
  return constant(constants, "g") / ((bottom3 + top4) / 2) * (top4 - bottom3) / depth;
}
function bruntVaisalaSquaredFromLapseRate(temperature6, lapseRate, constants) {
  return constant(constants, "g") / temperature6 * (dryRateOf(constants) - lapseRate);
}
function potentialTemperatureGradient(temperature6, theta5, lapseRate, constants) {
  return theta5 / temperature6 * (dryRateOf(constants) - lapseRate);
}

// shared/thermo/quantities/bruntVaisalaFrequency.ts
var bruntVaisalaFrequencyDefinition = {
  key: "brunt-vaisala-frequency",
  name: "Brunt–Väisälä frequency",
  symbol: "N",
  unit: "s-1",
  shownUnit: "s-1",
  kind: "ratio",
  nearZero: 1e-3,
  inputs: thetaLayerInputs,
  variants: [{
    key: "mean-theta",
    label: "with the mean of θ at bottom and top",
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: "verified" },
    validity: "a layer whose θ does not fall with height",
    knownError: "(Δθ/θ)²/24 against the logarithmic form",
    evaluate(inputs2, constants) {
      const value23 = squared(inputs2, constants);
      return value23 < 0 ? { is: "not_defined", why: "N² is negative: θ falls with height, and the layer does not oscillate." } : { is: "value", value: Math.sqrt(value23) };
    }
  }],
  constants: ["g"],
  ask: 'The Brunt–Väisälä frequency N = √[(g/θ̄) Δθ/Δz] of the layer, with the mean θ̄ of bottom and top; "not defined" where N² is negative.',
  trace(inputs2, constants) {
    const value23 = squared(inputs2, constants);
    const first3 = { text: "Frequency squared", formula: "N^2 = \\frac{g}{\\bar\\theta} \\frac{\\theta_2 - \\theta_1}{\\Delta z}", filled: `N^2 = ${texQuantity(value23, "s-2")}`, value: value23, unit: "s-2" };
    if (value23 < 0) return [first3];
    return [first3, { text: "Its root", formula: "N = \\sqrt{N^2}", filled: `N = \\sqrt{${texNumber(value23)}}\\,\\mathrm{s^{-1}} = ${texQuantity(Math.sqrt(value23), "s-1")}`, value: Math.sqrt(value23), unit: "s-1" }];
  },
  slips: [
    slip("root-left-out", "N² in place of N", "This is N squared: take its root.", (_i, _c, right) => right * right),
    slip("in-hertz", "cycles for radians", "This counts whole swings: N is an angular frequency, 2π times as large.", (_i, _c, right) => right / 6.283185307179586),
    slip("period", "the period in place of N", "This is the period 2π/N.", (_i, _c, right) => right > 0 ? 6.283185307179586 / right : null),
    slip("celsius-for-kelvin", "°C in place of K", "The mean θ went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => {
      const mean2 = (numberOf(inputs2, "potentialTemperatureBottom") + numberOf(inputs2, "potentialTemperatureTop")) / 2;
      return mean2 > zeroCelsius ? right * Math.sqrt(mean2 / (mean2 - zeroCelsius)) : null;
    }),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / Math.sqrt(constant(constants, "g")))
  ],
  example: { inputs: { potentialTemperatureBottom: 300, potentialTemperatureTop: 303, depth: 1e3 }, gives: 98799e-7, within: 1e-7 }
};
function squared(inputs2, constants) {
  return bruntVaisalaSquared(kelvin(numberOf(inputs2, "potentialTemperatureBottom")), kelvin(numberOf(inputs2, "potentialTemperatureTop")), meter(numberOf(inputs2, "depth")), constants);
}

// shared/thermo/quantities/bruntVaisalaFrequencySquared.ts
var bruntVaisalaFrequencySquaredDefinition = {
  key: "brunt-vaisala-frequency-squared",
  name: "Brunt–Väisälä frequency squared",
  symbol: "N²",
  unit: "s-2",
  shownUnit: "s-2",
  kind: "difference",
  nearZero: 1e-5,
  inputs: thetaLayerInputs,
  variants: [{
    key: "mean-theta",
    label: "with the mean of θ at bottom and top",
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: "verified" },
    validity: "any layer",
    knownError: "(Δθ/θ)²/12 against the logarithmic form: 0.001 % for 3 K",
    evaluate: (inputs2, constants) => ({ is: "value", value: squared2(inputs2, constants) })
  }],
  constants: ["g"],
  classLimits: () => [{ label: "neutral", value: 0 }],
  ask: "The Brunt–Väisälä frequency squared N² = (g/θ̄) Δθ/Δz of the layer, with the mean θ̄ of bottom and top, negative where θ falls with height.",
  trace(inputs2, constants) {
    const { bottom: bottom3, top: top4, depth } = layer(inputs2), value23 = squared2(inputs2, constants);
    return [
      { text: "Mean potential temperature", formula: "\\bar\\theta = \\frac{\\theta_1 + \\theta_2}{2}", filled: `\\bar\\theta = ${texQuantity((bottom3 + top4) / 2, "K", 6)}`, value: (bottom3 + top4) / 2, unit: "K" },
      { text: "Frequency squared", formula: "N^2 = \\frac{g}{\\bar\\theta} \\frac{\\theta_2 - \\theta_1}{\\Delta z}", filled: `N^2 = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber((bottom3 + top4) / 2, 6)}} \\times \\frac{${texFactor(top4 - bottom3)}}{${texNumber(depth, 6)}}\\,\\mathrm{s^{-2}} = ${texQuantity(value23, "s-2")}`, value: value23, unit: "s-2" }
    ];
  },
  slips: [
    signSlip("N² is positive where θ rises with height; the layer may have been taken upside down."),
    slip("celsius-for-kelvin", "°C in place of K", "The mean θ went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => {
      const { bottom: bottom3, top: top4 } = layer(inputs2), mean2 = (bottom3 + top4) / 2;
      return mean2 === zeroCelsius ? null : right * mean2 / (mean2 - zeroCelsius);
    }),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / constant(constants, "g")),
    slip("theta-left-out", "θ̄ left out", "The division by the mean θ is left out.", (inputs2, _c, right) => right * (layer(inputs2).bottom + layer(inputs2).top) / 2),
    slip("root-taken", "N in place of N²", "This is N itself: the ask is N squared.", (_i, _c, right) => right > 0 ? Math.sqrt(right) : null),
    slip("root-of-size", "root of the size of a negative N²", "N² is negative here, and N is not defined: the root of its size is no frequency.", (_i, _c, right) => right < 0 ? Math.sqrt(-right) : null),
    fineSlip("bottom-theta", "θ at the bottom for the mean", "This divides by θ at the bottom: the ask takes the mean of the layer.", (inputs2, _c, right) => right * (layer(inputs2).bottom + layer(inputs2).top) / 2 / layer(inputs2).bottom)
  ],
  example: { inputs: { potentialTemperatureBottom: 300, potentialTemperatureTop: 303, depth: 1e3 }, gives: 97612e-9, within: 1e-9 }
};
var layer = (inputs2) => ({ bottom: kelvin(numberOf(inputs2, "potentialTemperatureBottom")), top: kelvin(numberOf(inputs2, "potentialTemperatureTop")), depth: meter(numberOf(inputs2, "depth")) });
function squared2(inputs2, constants) {
  const { bottom: bottom3, top: top4, depth } = layer(inputs2);
  return bruntVaisalaSquared(bottom3, top4, depth, constants);
}

// shared/thermo/layer.ts
function layerInputs2(least2) {
  return [
    { name: "height", label: "heights of the rows", symbol: "z", unit: "m", shownUnit: "m", kind: "difference", shape: "series", range: [-500, 1e5], needs: { least: least2, order: "none" } },
    { name: "temperature", label: "air temperatures of the rows", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "series", range: [100, 400], needs: { least: least2, order: "none" } }
  ];
}
var heightsOf = (inputs2) => seriesOf(inputs2, "height");
var temperaturesOf = (inputs2) => seriesOf(inputs2, "temperature");
function lineOf(inputs2) {
  const line = straightLine(heightsOf(inputs2), temperaturesOf(inputs2));
  if (!line) throw new SeriesError("height", "all rows have the same height; a lapse rate needs a layer");
  return line;
}
function endsOf(inputs2) {
  const heights2 = heightsOf(inputs2);
  const temperatures = temperaturesOf(inputs2);
  let low = Infinity, high2 = -Infinity;
  for (const z4 of heights2) {
    if (z4 < low) low = z4;
    if (z4 > high2) high2 = z4;
  }
  if (!(high2 > low)) throw new SeriesError("height", "all rows have the same height; a lapse rate needs a layer");
  const meanAt = (z4) => {
    let sum = 0, count = 0;
    heights2.forEach((height2, at) => {
      if (height2 !== z4) return;
      sum += temperatures[at] ?? 0;
      count++;
    });
    return { temperature: kelvin(sum / count), count };
  };
  const bottom3 = meanAt(low), top4 = meanAt(high2);
  return { lowHeight: meter(low), highHeight: meter(high2), lowTemperature: bottom3.temperature, highTemperature: top4.temperature, lowCount: bottom3.count, highCount: top4.count };
}
function endPointRate(ends) {
  return kelvinPerMeter((ends.lowTemperature - ends.highTemperature) / (ends.highHeight - ends.lowHeight));
}
function dryClassLimits(_inputs, constants) {
  const rate7 = dryRateOf(constants);
  const tolerance = constant(constants, "neutralTolerance");
  return [
    { label: "Γd less the tolerance of a neutral layer", value: rate7 - tolerance },
    { label: "Γd with the tolerance of a neutral layer", value: rate7 + tolerance }
  ];
}

// shared/thermo/quantities/bruntVaisalaFrequencySquaredFromLapseRate.ts
var bruntVaisalaFrequencySquaredFromLapseRateDefinition = {
  key: "brunt-vaisala-frequency-squared-from-lapse-rate",
  name: "Brunt–Väisälä frequency squared from a lapse rate",
  symbol: "N²",
  unit: "s-2",
  shownUnit: "s-2",
  kind: "difference",
  nearZero: 1e-5,
  inputs: [
    { name: "temperature", label: "mean air temperature of the layer", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [150, 400] },
    { name: "lapseRate", label: "lapse rate of the layer", symbol: "Γ", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] }
  ],
  variants: [{
    key: "dry",
    label: "(g/T)(Γd − Γ), dry air",
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: "verified" },
    validity: "unsaturated air",
    knownError: "moisture gradients are left out",
    evaluate: (inputs2, constants) => ({ is: "value", value: squared3(inputs2, constants) })
  }],
  constants: ["g", "cp"],
  classLimits: (inputs2, constants) => dryClassLimits(inputs2, constants).map(({ label, value: value23 }) => ({ label, value: constant(constants, "g") / numberOf(inputs2, "temperature") * (dryRateOf(constants) - value23) })),
  ask: "The Brunt–Väisälä frequency squared N² = (g/T)(Γd − Γ) of the dry layer with Γd = g/cp, negative where the layer is superadiabatic.",
  trace(inputs2, constants) {
    const value23 = squared3(inputs2, constants), dry = dryRateOf(constants), rate7 = numberOf(inputs2, "lapseRate");
    return [
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(dry * 1e3, "K/km")}`, value: dry, unit: "K/m" },
      { text: "Frequency squared", formula: "N^2 = \\frac{g}{T} (\\Gamma_d - \\Gamma)", filled: `N^2 = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(numberOf(inputs2, "temperature"), 6)}} \\times (${texNumber(dry)} - ${texFactor(rate7)})\\,\\mathrm{s^{-2}} = ${texQuantity(value23, "s-2")}`, value: value23, unit: "s-2" }
    ];
  },
  slips: [
    signSlip("N² is positive where the layer is stable, Γ < Γd."),
    slip("gradient-sign", "Γd + Γ for Γd − Γ", "The lapse rate went in with its sign turned: Γ is positive where temperature falls with height.", (inputs2, constants) => constant(constants, "g") / numberOf(inputs2, "temperature") * (dryRateOf(constants) + numberOf(inputs2, "lapseRate"))),
    slip("celsius-for-kelvin", "°C in place of K", "The temperature went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => {
      const T11 = numberOf(inputs2, "temperature");
      return T11 === zeroCelsius ? null : right * T11 / (T11 - zeroCelsius);
    }),
    slip("per-kilometer", "K km⁻¹ in place of K m⁻¹", "The lapse rates went in in K per kilometer: per meter is needed.", (_i, _c, right) => right * 1e3),
    slip("dry-rate-left-out", "Γd left out", "The dry adiabatic lapse rate is left out: a layer is neutral at Γd, not at 0.", (inputs2, constants) => -constant(constants, "g") / numberOf(inputs2, "temperature") * numberOf(inputs2, "lapseRate")),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / constant(constants, "g"))
  ],
  example: { inputs: { temperature: 288.15, lapseRate: 65e-4 }, gives: 11136e-8, within: 1e-8 }
};
var squared3 = (inputs2, constants) => bruntVaisalaSquaredFromLapseRate(kelvin(numberOf(inputs2, "temperature")), kelvinPerMeter(numberOf(inputs2, "lapseRate")), constants);

// shared/thermo/quantities/bulkRichardsonNumber.ts
var difference2 = (name, label, symbol) => ({ name, label, symbol, unit: "m/s", shownUnit: "m/s", kind: "difference", shape: "number", range: [-200, 200] });
var bulkRichardsonNumberDefinition = {
  key: "bulk-richardson-number",
  name: "bulk Richardson number",
  symbol: "Ri_B",
  unit: "1",
  shownUnit: "1",
  kind: "difference",
  nearZero: 0.01,
  inputs: [
    ...virtualThetaLayer,
    difference2("eastwardDifference", "difference of the eastward wind, top less bottom", "Δu"),
    difference2("northwardDifference", "difference of the northward wind, top less bottom", "Δv")
  ],
  variants: [{
    key: "mean-theta",
    label: "with the mean of θv at bottom and top",
    source: { text: 'AMS Glossary of Meteorology, "bulk Richardson number"', status: "verified" },
    validity: "any layer with shear",
    knownError: "none: the four readings alone decide",
    evaluate(inputs2, constants) {
      const value23 = bulkRichardson(layer2(inputs2), constants);
      return value23 === null ? { is: "not_defined", why: "The wind is the same at bottom and top: there is no shear." } : { is: "value", value: value23 };
    }
  }],
  constants: ["g"],
  classLimits: () => [{ label: "critical, 0.25", value: 0.25 }],
  ask: 'The bulk Richardson number Ri = (g/θ̄v) Δθv Δz / (Δu² + Δv²) of the layer, with the mean θ̄v of bottom and top and the vector difference of the wind; "not defined" without shear.',
  trace(inputs2, constants) {
    const { bottom: bottom3, top: top4, depth, du, dv } = layer2(inputs2), value23 = bulkRichardson(layer2(inputs2), constants);
    const shear2 = { text: "Vector difference of the wind, squared", formula: "|\\Delta V|^2 = \\Delta u^2 + \\Delta v^2", filled: `|\\Delta V|^2 = ${texFactor(du)}^2 + ${texFactor(dv)}^2 = ${texNumber(du * du + dv * dv)}\\,\\mathrm{m^2\\,s^{-2}}` };
    if (value23 === null) return [shear2];
    return [shear2, { text: "Bulk Richardson number", formula: "Ri_B = \\frac{g}{\\bar\\theta_v} \\frac{\\Delta\\theta_v\\,\\Delta z}{|\\Delta V|^2}", filled: `Ri_B = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber((bottom3 + top4) / 2, 6)}} \\times \\frac{${texFactor(top4 - bottom3)} \\times ${texNumber(depth, 6)}}{${texNumber(du * du + dv * dv)}} = ${texNumber(value23)}`, value: value23, unit: "1" }];
  },
  slips: [
    signSlip("The number is positive where θv rises with height."),
    slip("speeds-not-squared", "square of the wind difference left out", "The wind difference has to be squared.", (inputs2, _c, right) => {
      const { du, dv } = layer2(inputs2);
      return right * Math.sqrt(du * du + dv * dv);
    }),
    slip("components-added", "components added before squaring", "The components are added and then squared: square each, then add.", (inputs2, _c, right) => {
      const { du, dv } = layer2(inputs2);
      return du + dv === 0 ? null : right * (du * du + dv * dv) / ((du + dv) * (du + dv));
    }),
    slip("depth-left-out", "Δz left out", "The depth of the layer is left out.", (inputs2, _c, right) => right / layer2(inputs2).depth),
    slip("celsius-for-kelvin", "°C in place of K", "The mean θv went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => {
      const mean2 = (layer2(inputs2).bottom + layer2(inputs2).top) / 2;
      return mean2 === zeroCelsius ? null : right * mean2 / (mean2 - zeroCelsius);
    }),
    slip("inverted", "shear over stratification", "This is the reciprocal: stratification stands above shear.", (_i, _c, right) => right === 0 ? null : 1 / right),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / constant(constants, "g")),
    fineSlip("bottom-theta", "θv at the bottom for the mean", "This divides by θv at the bottom: the ask takes the mean of the layer.", (inputs2, _c, right) => right * (layer2(inputs2).bottom + layer2(inputs2).top) / 2 / layer2(inputs2).bottom)
  ],
  example: { inputs: { virtualPotentialTemperatureBottom: 298, virtualPotentialTemperatureTop: 299.2, depth: 100, eastwardDifference: 4, northwardDifference: 1 }, gives: 0.2319, within: 1e-5 }
};
var layer2 = (inputs2) => ({
  bottom: numberOf(inputs2, "virtualPotentialTemperatureBottom"),
  top: numberOf(inputs2, "virtualPotentialTemperatureTop"),
  depth: numberOf(inputs2, "depth"),
  du: numberOf(inputs2, "eastwardDifference"),
  dv: numberOf(inputs2, "northwardDifference")
});

// shared/thermo/quantities/bulkRichardsonNumberFromWinds.ts
var bulkRichardsonNumberFromWindsDefinition = {
  key: "bulk-richardson-number-from-winds",
  name: "bulk Richardson number from speed and direction",
  symbol: "Ri_B",
  unit: "1",
  shownUnit: "1",
  kind: "difference",
  nearZero: 0.01,
  inputs: [
    ...virtualThetaLayer,
    speedInput("windSpeedBottom", "wind speed at the bottom", "s₁"),
    directionInput("windDirectionBottom", "wind direction at the bottom", "d₁"),
    speedInput("windSpeedTop", "wind speed at the top", "s₂"),
    directionInput("windDirectionTop", "wind direction at the top", "d₂")
  ],
  variants: [{
    key: "mean-theta",
    label: "with the mean of θv at bottom and top",
    source: { text: 'AMS Glossary of Meteorology, "bulk Richardson number"', status: "verified" },
    validity: "any layer with shear",
    knownError: "none: the readings alone decide",
    evaluate(inputs2, constants) {
      const value23 = number(inputs2, constants);
      return value23 === null ? { is: "not_defined", why: "The wind vector is the same at bottom and top: there is no shear." } : { is: "value", value: value23 };
    }
  }],
  constants: ["g"],
  classLimits: () => [{ label: "critical, 0.25", value: 0.25 }],
  ask: 'The bulk Richardson number Ri = (g/θ̄v) Δθv Δz / |ΔV|² of the layer, with the mean θ̄v of bottom and top and the difference of the wind vectors; "not defined" where they are alike.',
  trace(inputs2, constants) {
    const { du, dv } = windDifference(inputs2), value23 = number(inputs2, constants);
    const { bottom: bottom3, top: top4, depth } = layer3(inputs2);
    const shear2 = { text: "Difference of the wind vectors, u = −s sin d, v = −s cos d", formula: "|\\Delta V|^2 = (u_2 - u_1)^2 + (v_2 - v_1)^2", filled: `|\\Delta V|^2 = ${texFactor(du)}^2 + ${texFactor(dv)}^2 = ${texNumber(du * du + dv * dv)}\\,\\mathrm{m^2\\,s^{-2}}` };
    if (value23 === null) return [shear2];
    return [shear2, { text: "Bulk Richardson number", formula: "Ri_B = \\frac{g}{\\bar\\theta_v} \\frac{\\Delta\\theta_v\\,\\Delta z}{|\\Delta V|^2}", filled: `Ri_B = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber((bottom3 + top4) / 2, 6)}} \\times \\frac{${texFactor(top4 - bottom3)} \\times ${texNumber(depth, 6)}}{${texNumber(du * du + dv * dv)}} = ${texNumber(value23)}`, value: value23, unit: "1" }];
  },
  slips: [
    signSlip("The number is positive where θv rises with height."),
    slip("speeds-subtracted", "difference of speeds for that of vectors", "This takes the difference of the speeds: a turning wind shears too.", (inputs2, constants) => bulkRichardson({ ...layer3(inputs2), du: numberOf(inputs2, "windSpeedTop") - numberOf(inputs2, "windSpeedBottom"), dv: 0 }, constants)),
    slip("speed-not-squared", "square of the wind difference left out", "The wind difference has to be squared.", (inputs2, _c, right) => {
      const { du, dv } = windDifference(inputs2);
      return right * Math.sqrt(du * du + dv * dv);
    }),
    slip("depth-left-out", "Δz left out", "The depth of the layer is left out.", (inputs2, _c, right) => right / layer3(inputs2).depth),
    slip("celsius-for-kelvin", "°C in place of K", "The mean θv went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => {
      const mean2 = (layer3(inputs2).bottom + layer3(inputs2).top) / 2;
      return mean2 === zeroCelsius ? null : right * mean2 / (mean2 - zeroCelsius);
    }),
    slip("inverted", "shear over stratification", "This is the reciprocal: stratification stands above shear.", (_i, _c, right) => right === 0 ? null : 1 / right),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / constant(constants, "g"))
  ],
  example: { inputs: { virtualPotentialTemperatureBottom: 298, virtualPotentialTemperatureTop: 299.2, depth: 100, windSpeedBottom: 5, windDirectionBottom: 3.490658503988659, windSpeedTop: 5, windDirectionTop: 4.537856055185257 }, gives: 0.15769, within: 1e-5 }
};
var layer3 = (inputs2) => ({ bottom: numberOf(inputs2, "virtualPotentialTemperatureBottom"), top: numberOf(inputs2, "virtualPotentialTemperatureTop"), depth: numberOf(inputs2, "depth") });
var number = (inputs2, constants) => bulkRichardson({ ...layer3(inputs2), ...windDifference(inputs2) }, constants);

// shared/thermo/quantities/fittedTemperatureAtZeroHeight.ts
var fittedTemperatureAtZeroHeightDefinition = oneFormula({
  key: "fitted-temperature-at-zero-height",
  name: "fitted temperature at height zero",
  symbol: "T₀",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: layerInputs2(3),
  constants: [],
  formula: {
    key: "ordinary",
    label: "ordinary least squares of T on z, at z = 0",
    source: { text: "ordinary least squares; NIST StRD linear regression for the arithmetic", status: "common practice" },
    validity: "any layer with two heights",
    knownError: "none: the rows alone decide"
  },
  value: intercept,
  ask: "The temperature at height 0 of the straight line by ordinary least squares of temperature on height over all your rows; height 0 is that of the heights as given.",
  working(inputs2, _constants, value23) {
    const line = lineOf(inputs2);
    return [
      { text: `Means of the ${line.count} rows`, formula: "\\bar z,\\ \\bar T", filled: `\\bar z = ${texQuantity(line.meanX, "m", 6)},\\quad \\bar T = ${texQuantity(line.meanY - zeroCelsius, "Cel")}` },
      { text: "Slope", formula: "\\frac{dT}{dz} = \\frac{\\sum (z - \\bar z)(T - \\bar T)}{\\sum (z - \\bar z)^2}", filled: `\\frac{dT}{dz} = \\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(line.slope * 1e3, "K/km")}` },
      { text: "At height 0", formula: "T_0 = \\bar T - \\frac{dT}{dz}\\,\\bar z", filled: `T_0 = ${texQuantity(value23 - zeroCelsius, "Cel", 5)}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    slip("slope-turned", "slope with its sign turned", "This goes down the line in the wrong direction: T₀ = T̄ − (dT/dz) z̄.", (inputs2) => 2 * lineOf(inputs2).meanY - intercept(inputs2)),
    fineSlip("lowest-row", "lowest row in place of the intercept", "This is the temperature of the lowest row: the ask takes the line at height 0.", lowestTemperature),
    fineSlip("mean", "mean in place of the intercept", "This is the mean temperature of the rows: the ask takes the line at height 0.", (inputs2) => lineOf(inputs2).meanY)
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 289.25, within: 1e-9 }
});
function intercept(inputs2) {
  const line = lineOf(inputs2);
  return line.meanY - line.slope * line.meanX;
}
function lowestTemperature(inputs2) {
  const heights2 = heightsOf(inputs2), temperatures = temperaturesOf(inputs2);
  let lowest = 0;
  heights2.forEach((height2, at) => {
    if (height2 < (heights2[lowest] ?? height2)) lowest = at;
  });
  return temperatures[lowest] ?? null;
}

// shared/thermo/inversion.ts
var profileInputs = (least2) => [
  { name: "height", label: "heights of the rows, rising", symbol: "z", unit: "m", shownUnit: "m", kind: "difference", shape: "series", range: [-500, 1e5], needs: { least: least2, order: "ascending" } },
  { name: "temperature", label: "air temperatures of the rows", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "series", range: [100, 400], needs: { least: least2, order: "none" } }
];
var inversionInputs = [
  ...profileInputs(2),
  { name: "minimumDepth", label: "depth from which a layer counts", symbol: "d_min", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [0, 5e3] }
];
function lowestInversion(inputs2) {
  const z4 = seriesOf(inputs2, "height"), T11 = seriesOf(inputs2, "temperature"), least2 = numberOf(inputs2, "minimumDepth");
  let base = -1, top4 = -1;
  const found = () => {
    if (base < 0) return null;
    const low = z4[base] ?? 0, high2 = z4[top4] ?? 0;
    return high2 - low >= least2 ? { base: low, top: high2, baseTemperature: T11[base] ?? 0, topTemperature: T11[top4] ?? 0 } : null;
  };
  for (let at = 1; at < z4.length; at++) {
    const change2 = (T11[at] ?? 0) - (T11[at - 1] ?? 0);
    if (change2 > 0) {
      if (base < 0) base = at - 1;
      top4 = at;
    } else if (change2 < 0) {
      const inversion = found();
      if (inversion) return inversion;
      base = -1;
    }
  }
  return found();
}
var inversionRule = 'the lowest layer in which temperature rises with height from row to row, from the row below the first rise to the last row before temperature falls; isothermal steps count inside it and not at its ends; layers that are less deep than the given depth do not count; "none" where there is no such layer';

// shared/thermo/quantities/freezingLevel.ts
var freezingLevelDefinition = {
  key: "freezing-level",
  name: "height of the freezing level",
  symbol: "z₀",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: profileInputs(2),
  variants: [{
    key: "lowest",
    label: "lowest fall through 0 °C, linear between rows",
    source: { text: 'AMS Glossary of Meteorology, "freezing level"', status: "common practice" },
    validity: "rows in rising order",
    knownError: "the spacing of the rows",
    evaluate: outcome
  }],
  constants: ["zeroCelsius"],
  ask: 'The height of the freezing level: the lowest height at which temperature falls through 0 °C, linear in height between rows; "none" where every row is at or below 0 °C, "not reached" where the data end before it.',
  trace(inputs2, constants) {
    const found = crossing(inputs2, constants);
    if (!found) return [{ text: "Temperature does not fall through 0 °C in the data", formula: "T(z) = 0\\,{}^{\\circ}C", filled: "T(z) \\ne 0\\,{}^{\\circ}C" }];
    const z4 = seriesOf(inputs2, "height"), T11 = seriesOf(inputs2, "temperature"), zero2 = constant(constants, "zeroCelsius");
    const low = z4[found.below] ?? 0, high2 = z4[found.below + 1] ?? 0;
    return [
      { text: "Rows on both sides", formula: "z_1,\\,T_1;\\quad z_2,\\,T_2", filled: `z_1 = ${texQuantity(low, "m", 6)},\\ T_1 = ${texQuantity((T11[found.below] ?? 0) - zero2, "Cel")};\\quad z_2 = ${texQuantity(high2, "m", 6)},\\ T_2 = ${texQuantity((T11[found.below + 1] ?? 0) - zero2, "Cel")}` },
      { text: "Linear between them", formula: "z_0 = z_1 + (z_2 - z_1) \\frac{T_1}{T_1 - T_2}", filled: `z_0 = ${texQuantity(found.height, "m", 6)}`, value: found.height, unit: "m" }
    ];
  },
  slips: [
    fineSlip("row-below", "last row above 0 °C in place of interpolation", "This is the last row that is warmer than 0 °C: the ask interpolates between rows.", (inputs2, constants) => rowAt(inputs2, constants, 0)),
    fineSlip("row-above", "first row below 0 °C in place of interpolation", "This is the first row that is colder than 0 °C: the ask interpolates between rows.", (inputs2, constants) => rowAt(inputs2, constants, 1))
  ],
  example: { inputs: { height: [100, 600, 1100], temperature: [278.15, 275.15, 272.15] }, gives: 933.333, within: 1e-3 }
};
function crossing(inputs2, constants) {
  const z4 = seriesOf(inputs2, "height"), T11 = seriesOf(inputs2, "temperature"), zero2 = constant(constants, "zeroCelsius");
  for (let at = 0; at + 1 < z4.length; at++) {
    const warm = (T11[at] ?? 0) - zero2, cold = (T11[at + 1] ?? 0) - zero2;
    if (warm > 0 && cold <= 0) return { below: at, height: (z4[at] ?? 0) + warm / (warm - cold) * ((z4[at + 1] ?? 0) - (z4[at] ?? 0)) };
  }
  return null;
}
function outcome(inputs2, constants) {
  const found = crossing(inputs2, constants);
  if (found) return { is: "value", value: found.height };
  const zero2 = constant(constants, "zeroCelsius");
  return seriesOf(inputs2, "temperature").every((T11) => T11 <= zero2) ? { is: "none", why: "Every row is at or below 0 °C." } : { is: "not_reached", why: "The data end before temperature falls through 0 °C." };
}
function rowAt(inputs2, constants, above) {
  const found = crossing(inputs2, constants);
  return found && (seriesOf(inputs2, "height")[found.below + above] ?? null);
}

// shared/thermo/quantities/gradientRichardsonNumber.ts
var shear = (name, label, symbol) => ({ name, label, symbol, unit: "s-1", shownUnit: "s-1", kind: "difference", shape: "number", range: [-10, 10] });
var gradientRichardsonNumberDefinition = {
  key: "gradient-richardson-number",
  name: "gradient Richardson number",
  symbol: "Ri",
  unit: "1",
  shownUnit: "1",
  kind: "difference",
  nearZero: 0.01,
  inputs: [
    { name: "virtualPotentialTemperature", label: "virtual potential temperature", symbol: "θv", unit: "K", shownUnit: "K", kind: "temperature", shape: "number", range: [150, 800] },
    { name: "virtualPotentialTemperatureGradient", label: "vertical gradient of the virtual potential temperature", symbol: "dθv/dz", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] },
    shear("eastwardShear", "vertical gradient of the eastward wind", "du/dz"),
    shear("northwardShear", "vertical gradient of the northward wind", "dv/dz")
  ],
  variants: [{
    key: "gradients",
    label: "local gradients",
    source: { text: 'AMS Glossary of Meteorology, "gradient Richardson number"', status: "verified" },
    validity: "any height with shear",
    knownError: "none beyond that of the gradients",
    evaluate(inputs2, constants) {
      const value23 = number2(inputs2, constants);
      return value23 === null ? { is: "not_defined", why: "The wind does not change with height: there is no shear." } : { is: "value", value: value23 };
    }
  }],
  constants: ["g"],
  classLimits: () => [{ label: "critical, 0.25", value: 0.25 }],
  ask: 'The gradient Richardson number Ri = (g/θv)(dθv/dz) / [(du/dz)² + (dv/dz)²]; "not defined" without shear.',
  trace(inputs2, constants) {
    const { theta: theta5, gradient: gradient2, du, dv } = given6(inputs2), value23 = number2(inputs2, constants);
    const first3 = { text: "Shear squared", formula: "S^2 = \\left(\\frac{du}{dz}\\right)^2 + \\left(\\frac{dv}{dz}\\right)^2", filled: `S^2 = ${texFactor(du)}^2 + ${texFactor(dv)}^2 = ${texNumber(du * du + dv * dv)}\\,\\mathrm{s^{-2}}` };
    if (value23 === null) return [first3];
    return [first3, { text: "Richardson number", formula: "Ri = \\frac{g}{\\theta_v} \\frac{d\\theta_v/dz}{S^2}", filled: `Ri = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(theta5, 6)}} \\times \\frac{${texFactor(gradient2)}}{${texNumber(du * du + dv * dv)}} = ${texNumber(value23)}`, value: value23, unit: "1" }];
  },
  slips: [
    signSlip("The number is positive where θv rises with height."),
    slip("shear-not-squared", "square of the shear left out", "The shear has to be squared.", (inputs2, _c, right) => {
      const { du, dv } = given6(inputs2);
      return right * Math.sqrt(du * du + dv * dv);
    }),
    slip("per-kilometer", "K km⁻¹ in place of K m⁻¹", "The gradient went in in K per kilometer: per meter is needed.", (_i, _c, right) => right * 1e3),
    slip("celsius-for-kelvin", "°C in place of K", "θv went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => {
      const { theta: theta5 } = given6(inputs2);
      return theta5 === zeroCelsius ? null : right * theta5 / (theta5 - zeroCelsius);
    }),
    slip("inverted", "shear over stratification", "This is the reciprocal: stratification stands above shear.", (_i, _c, right) => right === 0 ? null : 1 / right),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / constant(constants, "g"))
  ],
  example: { inputs: { virtualPotentialTemperature: 300, virtualPotentialTemperatureGradient: 5e-3, eastwardShear: 0.02, northwardShear: 0.01 }, gives: 0.327, within: 1e-6 }
};
var given6 = (inputs2) => ({ theta: numberOf(inputs2, "virtualPotentialTemperature"), gradient: numberOf(inputs2, "virtualPotentialTemperatureGradient"), du: numberOf(inputs2, "eastwardShear"), dv: numberOf(inputs2, "northwardShear") });
var number2 = (inputs2, constants) => gradientRichardson(given6(inputs2), constants);

// shared/thermo/inversionDefinition.ts
var ofInversion = (of) => (inputs2) => {
  const inversion = lowestInversion(inputs2);
  return inversion && of(inversion);
};
function inversionDefinition({ key, name, symbol, unit, nearZero, asked, formula, of, slips, gives }) {
  return {
    key,
    name,
    symbol,
    unit,
    shownUnit: unit,
    kind: "difference",
    nearZero,
    inputs: inversionInputs,
    variants: [{
      key: "row-to-row",
      label: "rise of temperature from row to row",
      source: { text: 'AMS Glossary of Meteorology, "inversion"; rules of depth and isothermal steps stated in the ask', status: "common practice" },
      validity: "rows in rising order, noise less than the rise",
      knownError: "the spacing of the rows",
      evaluate(inputs2) {
        const inversion = lowestInversion(inputs2);
        return inversion ? { is: "value", value: of(inversion), more: { base: inversion.base, top: inversion.top } } : { is: "none", why: "No layer of the given depth has temperature rising with height." };
      }
    }],
    constants: [],
    ask: `${asked}: ${inversionRule}.`,
    trace(inputs2) {
      const inversion = lowestInversion(inputs2);
      if (!inversion) return [{ text: "No layer of this depth has temperature rising with height", formula: "\\Delta T \\le 0", filled: "\\Delta T \\le 0" }];
      const value23 = of(inversion);
      return [
        { text: "Base and top", formula: "z_1,\\,T_1;\\quad z_2,\\,T_2", filled: `z_1 = ${texQuantity(inversion.base, "m", 6)},\\ T_1 = ${texQuantity(inversion.baseTemperature - zeroCelsius, "Cel")};\\quad z_2 = ${texQuantity(inversion.top, "m", 6)},\\ T_2 = ${texQuantity(inversion.topTemperature - zeroCelsius, "Cel")}` },
        { text: asked, formula, filled: `${formula} = ${texQuantity(value23, unit, 6)}`, value: value23, unit }
      ];
    },
    slips,
    example: { inputs: { height: [0, 100, 200, 300, 400], temperature: [283.15, 282.15, 284.15, 285.15, 284.15], minimumDepth: 50 }, gives, within: 1e-9 }
  };
}

// shared/thermo/quantities/inversionBase.ts
var inversionBaseDefinition = inversionDefinition({
  key: "inversion-base",
  name: "height of an inversion’s base",
  symbol: "z_b",
  unit: "m",
  asked: "The height of the base of the inversion",
  formula: "z_b = z_1",
  of: (inversion) => inversion.base,
  slips: [
    fineSlip("top-for-base", "top in place of the base", "This is the top of the inversion: its base is where temperature begins to rise.", ofInversion((inversion) => inversion.top)),
    fineSlip("middle", "middle of the inversion", "This is the middle of the inversion.", ofInversion((inversion) => (inversion.base + inversion.top) / 2))
  ],
  gives: 100
});

// shared/thermo/quantities/inversionStrength.ts
var inversionStrengthDefinition = inversionDefinition({
  key: "inversion-strength",
  name: "strength of an inversion",
  symbol: "ΔT",
  unit: "K",
  nearZero: 0.1,
  asked: "The strength of the inversion, T at its top less T at its base",
  formula: "\\Delta T = T_2 - T_1",
  of: (inversion) => inversion.topTemperature - inversion.baseTemperature,
  slips: [
    signSlip("The strength is T at the top less T at the base: positive in an inversion."),
    fineSlip("per-100-m", "K per 100 m in place of K", "This is the rise per 100 m: the strength is the whole rise.", ofInversion((inversion) => (inversion.topTemperature - inversion.baseTemperature) / (inversion.top - inversion.base) * 100)),
    fineSlip("per-kilometer", "K per km in place of K", "This is the rise per kilometer: the strength is the whole rise.", ofInversion((inversion) => (inversion.topTemperature - inversion.baseTemperature) / (inversion.top - inversion.base) * 1e3))
  ],
  gives: 3
});

// shared/thermo/quantities/inversionTop.ts
var inversionTopDefinition = inversionDefinition({
  key: "inversion-top",
  name: "height of an inversion’s top",
  symbol: "z_t",
  unit: "m",
  asked: "The height of the top of the inversion",
  formula: "z_t = z_2",
  of: (inversion) => inversion.top,
  slips: [
    fineSlip("base-for-top", "base in place of the top", "This is the base of the inversion: its top is where temperature is highest.", ofInversion((inversion) => inversion.base)),
    fineSlip("depth", "depth in place of the height", "This is the depth of the inversion, not the height of its top.", ofInversion((inversion) => inversion.top - inversion.base)),
    fineSlip("middle", "middle of the inversion", "This is the middle of the inversion.", ofInversion((inversion) => (inversion.base + inversion.top) / 2))
  ],
  gives: 300
});

// shared/thermo/quantities/lapseRateEndPoints.ts
var lapseRateEndPointsDefinition = {
  key: "lapse-rate-end-points",
  name: "lapse rate of a layer by its end points",
  symbol: "Γ",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: layerInputs2(2),
  variants: [{
    key: "end-points",
    label: "lowest and highest row",
    source: { text: 'AMS Glossary of Meteorology, "lapse rate"', status: "verified" },
    validity: "any layer with two heights",
    knownError: "none: the two readings alone decide",
    evaluate(inputs2) {
      const ends = endsOf(inputs2);
      const notes = ends.lowCount > 1 || ends.highCount > 1 ? ["Several rows share an end’s height; their mean is used."] : void 0;
      return { is: "value", value: endPointRate(ends), notes, more: { lowHeight: ends.lowHeight, highHeight: ends.highHeight } };
    }
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: "The lapse rate Γ = −ΔT/Δz between the lowest and the highest of your rows, positive where temperature falls with height; divide by the heights of these rows.",
  trace(inputs2) {
    const ends = endsOf(inputs2);
    const change2 = ends.highTemperature - ends.lowTemperature;
    const depth = ends.highHeight - ends.lowHeight;
    const value23 = endPointRate(ends);
    return [
      { text: "Lowest and highest row", formula: "z_1,\\,T_1;\\quad z_2,\\,T_2", filled: `z_1 = ${texQuantity(ends.lowHeight, "m", 6)},\\ T_1 = ${texQuantity(ends.lowTemperature - zeroCelsius, "Cel")};\\quad z_2 = ${texQuantity(ends.highHeight, "m", 6)},\\ T_2 = ${texQuantity(ends.highTemperature - zeroCelsius, "Cel")}` },
      { text: "Lapse rate", formula: "\\Gamma = -\\frac{T_2 - T_1}{z_2 - z_1}", filled: `\\Gamma = -\\frac{${texFactor(change2)}\\,\\mathrm{K}}{${texNumber(depth / 1e3, 6)}\\,\\mathrm{km}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height; the layer may also have been taken upside down."),
    perMeterSlip,
    per100MetersSlip,
    fineSlip("least-squares", "a fit in place of the end points", "This is the slope of a straight line through all rows: the ask takes the lowest and the highest row alone.", (inputs2) => -lineOf(inputs2).slope),
    fineSlip("first-and-last-row", "first and last row in place of the end points", "This is taken between the first and the last row: the ask takes the lowest and the highest by height.", firstAndLast),
    fineSlip("mean-of-parts", "plain mean of the rates between rows", "This is the plain mean of the rates between neighbors: thick and thin parts do not count alike.", meanOfParts)
  ],
  example: { inputs: { height: [20, 220], temperature: [291.15, 289.35] }, gives: 9e-3, within: 1e-12 }
};
function firstAndLast(inputs2) {
  const z4 = heightsOf(inputs2), T11 = temperaturesOf(inputs2);
  const last = z4.length - 1;
  const depth = (z4[last] ?? 0) - (z4[0] ?? 0);
  return depth === 0 ? null : -((T11[last] ?? 0) - (T11[0] ?? 0)) / depth;
}
function meanOfParts(inputs2) {
  const z4 = heightsOf(inputs2), T11 = temperaturesOf(inputs2);
  if (z4.length < 3) return null;
  let sum = 0;
  for (let at = 1; at < z4.length; at++) {
    const depth = (z4[at] ?? 0) - (z4[at - 1] ?? 0);
    if (depth === 0) return null;
    sum -= ((T11[at] ?? 0) - (T11[at - 1] ?? 0)) / depth;
  }
  return sum / (z4.length - 1);
}

// shared/thermo/quantities/lapseRateEndPointsStandardError.ts
var lapseRateEndPointsStandardErrorDefinition = {
  key: "lapse-rate-end-points-standard-error",
  name: "standard error of the lapse rate by end points",
  symbol: "s(Γ)",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "ratio",
  nearZero: 1e-5,
  inputs: [
    ...layerInputs2(2),
    { name: "readingDeviation", label: "standard deviation of one temperature reading, independent from row to row", symbol: "s_T", unit: "K", shownUnit: "K", kind: "difference", shape: "number", range: [0, 10] }
  ],
  variants: [{
    key: "independent",
    label: "independent errors of the readings",
    source: { text: "JCGM 100:2008, Eq. 10", status: "verified" },
    validity: "independent errors; heights without error",
    knownError: "none: the formula is exact for independent errors",
    evaluate: (inputs2) => ({ is: "value", value: errorOf(inputs2) })
  }],
  constants: [],
  ask: "The standard error of the lapse rate between the lowest and the highest of your rows, where each temperature has the given standard deviation, independent from row to row, and heights have none.",
  trace(inputs2) {
    const ends = endsOf(inputs2), s2 = numberOf(inputs2, "readingDeviation"), value23 = errorOf(inputs2);
    const depth = ends.highHeight - ends.lowHeight;
    const share = Math.sqrt(1 / ends.lowCount + 1 / ends.highCount);
    return [
      { text: "Error of the difference of temperature", formula: "s_{\\Delta T} = s_T \\sqrt{\\frac{1}{n_1} + \\frac{1}{n_2}}", filled: `s_{\\Delta T} = ${texNumber(s2)} \\sqrt{\\frac{1}{${ends.lowCount}} + \\frac{1}{${ends.highCount}}}\\,\\mathrm{K} = ${texQuantity(s2 * share, "K")}`, value: s2 * share, unit: "K" },
      { text: "Error of the lapse rate", formula: "s_\\Gamma = \\frac{s_{\\Delta T}}{z_2 - z_1}", filled: `s_\\Gamma = \\frac{${texQuantity(s2 * share, "K")}}{${texQuantity(depth / 1e3, "km", 6)}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    slip("one-reading", "error of one reading alone", "This divides the error of one reading by the depth: the difference has two readings, whose squares add up.", (inputs2) => numberOf(inputs2, "readingDeviation") / depthOf(inputs2)),
    slip("errors-added", "errors added in place of their squares", "This adds the errors of both readings: independent errors add by their squares.", (inputs2) => 2 * numberOf(inputs2, "readingDeviation") / depthOf(inputs2)),
    fineSlip("variance", "root left out", "This leaves out the square root.", (inputs2) => {
      const s2 = numberOf(inputs2, "readingDeviation"), { lowCount, highCount } = endsOf(inputs2);
      return s2 * s2 * (1 / lowCount + 1 / highCount) / depthOf(inputs2);
    })
  ],
  example: { inputs: { height: [20, 220], temperature: [291.15, 289.35], readingDeviation: 0.1 }, gives: 707107e-9, within: 1e-9 }
};
function depthOf(inputs2) {
  const { lowHeight, highHeight } = endsOf(inputs2);
  return highHeight - lowHeight;
}
function errorOf(inputs2) {
  const { lowCount, highCount } = endsOf(inputs2);
  return numberOf(inputs2, "readingDeviation") * Math.sqrt(1 / lowCount + 1 / highCount) / depthOf(inputs2);
}

// shared/thermo/residuals.ts
var noScatter = 1e-9;
function lagOneCorrelation(inputs2) {
  const line = lineOf(inputs2);
  if (!((line.residualDeviation ?? 0) > noScatter)) return null;
  const z4 = heightsOf(inputs2), T11 = temperaturesOf(inputs2);
  let squares = 0, products = 0, before = 0;
  for (let at = 0; at < z4.length; at++) {
    const residual = (T11[at] ?? 0) - line.meanY - line.slope * ((z4[at] ?? 0) - line.meanX);
    squares += residual * residual;
    if (at > 0) products += residual * before;
    before = residual;
  }
  return products / squares;
}
function lagOneCorrelationAbout(inputs2, rate7) {
  const z4 = heightsOf(inputs2), T11 = temperaturesOf(inputs2), bottom3 = z4[0] ?? 0, first3 = T11[0] ?? 0;
  const rest = T11.map((one2, at) => one2 - first3 + rate7 * ((z4[at] ?? 0) - bottom3));
  const mean2 = rest.reduce((sum, one2) => sum + one2, 0) / rest.length;
  let squares = 0, products = 0, before = 0;
  rest.forEach((one2, at) => {
    const residual = one2 - mean2;
    squares += residual * residual;
    if (at > 0) products += residual * before;
    before = residual;
  });
  return Math.sqrt(squares / rest.length) > noScatter ? products / squares : null;
}
function effectiveRows(count, correlation) {
  if (correlation <= 0) return count;
  return Math.max(1, count * (1 - correlation) / (1 + correlation));
}
function inflation(correlation) {
  if (!(correlation < 1)) return null;
  return correlation <= 0 ? 1 : Math.sqrt((1 + correlation) / (1 - correlation));
}

// shared/thermo/quantities/lapseRateInflatedStandardError.ts
var lapseRateInflatedStandardErrorDefinition = {
  key: "lapse-rate-inflated-standard-error",
  name: "standard error of the lapse rate by least squares, inflated for correlated residuals",
  symbol: "s′(Γ)",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "ratio",
  nearZero: 1e-5,
  inputs: layerInputs2(4),
  variants: [{
    key: "first-order",
    label: "effective number of rows of a first-order autoregression",
    source: { text: "Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., section 5.2.4", status: "from memory" },
    validity: "rows at even steps whose residuals follow a first-order autoregression",
    knownError: "r₁ of short series is biased low, and so is this",
    evaluate(inputs2) {
      const line = lineOf(inputs2), correlation = lagOneCorrelation(inputs2);
      if (correlation === null) return { is: "value", value: line.slopeError ?? 0, notes: ["The rows lie on their line; nothing is inflated."] };
      const factor = inflation(correlation);
      if (factor === null) return { is: "not_defined", why: "The residuals correlate fully: no error follows." };
      return { is: "value", value: (line.slopeError ?? 0) * factor, more: { correlation, factor } };
    }
  }],
  constants: [],
  ask: "The standard error of the least-squares lapse rate of your rows (n − 2 degrees of freedom), times √[(1 + r₁)/(1 − r₁)] with the lag-1 correlation r₁ of the residuals in the order of your rows; the factor is 1 where r₁ is negative.",
  trace(inputs2) {
    const error2 = lineOf(inputs2).slopeError ?? 0, correlation = lagOneCorrelation(inputs2) ?? 0, factor = inflation(correlation) ?? 1;
    const value23 = error2 * factor;
    return [
      { text: "Standard error for independent rows", formula: "s_\\Gamma", filled: `s_\\Gamma = ${texQuantity(error2 * 1e3, "K/km")}`, value: error2, unit: "K/m" },
      { text: "Lag-1 correlation of the residuals", formula: "r_1 = \\frac{\\sum e_i e_{i+1}}{\\sum e_i^2}", filled: `r_1 = ${texNumber(correlation)}`, value: correlation, unit: "1" },
      { text: "Inflated", formula: "s'_\\Gamma = s_\\Gamma \\sqrt{\\frac{1 + r_1}{1 - r_1}}", filled: `s'_\\Gamma = ${texNumber(error2 * 1e3)} \\times ${texNumber(factor)}\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip("not-inflated", "not inflated", "This is the standard error for independent rows: neighbors here have much in common.", (inputs2) => lineOf(inputs2).slopeError),
    fineSlip("root-left-out", "root left out", "This multiplies by (1 + r₁)/(1 − r₁) without its root.", (inputs2, _c, right) => right * (factorOf(inputs2) ?? 1)),
    fineSlip("inverted-factor", "factor turned over", "This divides by the factor: correlated rows tell less, and the error grows.", (inputs2) => {
      const factor = factorOf(inputs2);
      return factor === null ? null : (lineOf(inputs2).slopeError ?? 0) / factor;
    })
  ],
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 48656e-7, within: 1e-7 }
};
function factorOf(inputs2) {
  const correlation = lagOneCorrelation(inputs2);
  return correlation === null ? null : inflation(correlation);
}

// shared/thermo/quantities/lapseRateLagOneCorrelation.ts
var lapseRateLagOneCorrelationDefinition = {
  key: "lapse-rate-lag-one-correlation",
  name: "lag-1 correlation of the residuals of a lapse rate",
  symbol: "r₁",
  unit: "1",
  shownUnit: "1",
  kind: "difference",
  nearZero: 0.1,
  inputs: layerInputs2(4),
  variants: [{
    key: "residuals",
    label: "residuals of the least-squares line in the order of the rows",
    source: { text: "Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32", status: "from memory" },
    validity: "rows at even steps of time or height",
    knownError: "biased low by about 4/n for short series",
    evaluate(inputs2) {
      const value23 = lagOneCorrelation(inputs2);
      return value23 === null ? { is: "not_defined", why: "The rows lie on their line: there are no residuals to correlate." } : { is: "value", value: value23 };
    }
  }],
  constants: [],
  ask: 'The lag-1 correlation r₁ = Σ eᵢeᵢ₊₁ / Σ eᵢ² of the residuals e of temperature about its least-squares line on height, in the order of your rows. "Not defined" where the rows lie on the line.',
  trace(inputs2) {
    const line = lineOf(inputs2), value23 = lagOneCorrelation(inputs2);
    const scatter = { text: "Residuals about the line", formula: "e_i = T_i - \\hat T_i", filled: `s = ${texQuantity(line.residualDeviation ?? 0, "K")},\\quad n = ${line.count}` };
    return value23 === null ? [scatter] : [scatter, { text: "Correlation of neighbors", formula: "r_1 = \\frac{\\sum e_i e_{i+1}}{\\sum e_i^2}", filled: `r_1 = ${texNumber(value23)}`, value: value23, unit: "1" }];
  },
  slips: [
    signSlip("The sign is turned round: neighbors that lie on one side of the line correlate positively."),
    fineSlip("of-temperature", "correlation of T in place of the residuals", "This is the lag-1 correlation of the temperatures: take the line off first.", (inputs2) => {
      const T11 = temperaturesOf(inputs2), { meanY, sumYY } = lineOf(inputs2);
      let products = 0;
      for (let at = 1; at < T11.length; at++) products += ((T11[at] ?? 0) - meanY) * ((T11[at - 1] ?? 0) - meanY);
      return sumYY > 0 ? products / sumYY : null;
    }),
    fineSlip("mean-of-products", "sums divided by their counts", "This divides the sum of n − 1 products by n − 1 and the sum of n squares by n: the ask divides the sums.", (inputs2, _c, right) => right * heightsOf(inputs2).length / (heightsOf(inputs2).length - 1))
  ],
  example: { inputs: { height: [0, 1, 2, 3], temperature: [280, 281, 280, 281] }, gives: -0.75, within: 1e-9 }
};

// shared/thermo/quantities/lapseRateLeastSquares.ts
var lapseRateLeastSquaresDefinition = {
  key: "lapse-rate-least-squares",
  name: "lapse rate of a layer by least squares",
  symbol: "Γ",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: layerInputs2(3),
  variants: [{
    key: "ordinary",
    label: "ordinary least squares of T on z",
    source: { text: "ordinary least squares; NIST StRD linear regression for the arithmetic", status: "common practice" },
    validity: "any layer with two heights",
    knownError: "none: the rows alone decide",
    evaluate(inputs2) {
      const line = lineOf(inputs2);
      return { is: "value", value: -line.slope, more: { rSquared: line.rSquared ?? 0, standardError: line.slopeError ?? 0, count: line.count } };
    }
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: "The lapse rate Γ = −dT/dz by ordinary least squares of temperature on height over all your rows, positive where temperature falls with height.",
  trace(inputs2) {
    const line = lineOf(inputs2);
    const value23 = -line.slope;
    return [
      { text: `Means of the ${line.count} rows`, formula: "\\bar z,\\ \\bar T", filled: `\\bar z = ${texQuantity(line.meanX, "m", 6)},\\quad \\bar T = ${texQuantity(line.meanY - zeroCelsius, "Cel")}` },
      { text: "Sums about the means", formula: "\\sum (z - \\bar z)^2,\\ \\sum (z - \\bar z)(T - \\bar T)", filled: `\\sum (z - \\bar z)^2 = ${texNumber(line.sumXX)}\\,\\mathrm{m^2},\\quad \\sum (z - \\bar z)(T - \\bar T) = ${texNumber(line.sumXY)}\\,\\mathrm{K\\,m}` },
      { text: "Lapse rate", formula: "\\Gamma = -\\frac{\\sum (z - \\bar z)(T - \\bar T)}{\\sum (z - \\bar z)^2}", filled: `\\Gamma = -\\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height: it is the slope of T on z with its sign turned."),
    perMeterSlip,
    per100MetersSlip,
    fineSlip("inverse-fit", "z fitted on T and inverted", "This comes from fitting height on temperature and inverting the slope: the ask fits temperature on height.", inverseFit),
    slip("swapped-arguments", "x and y swapped", "This is the slope of height on temperature, in meters per kelvin: x and y are swapped.", (inputs2) => {
      const line = lineOf(inputs2);
      return line.sumYY > 0 ? line.sumXY / line.sumYY / 1e3 : null;
    }),
    fineSlip("end-points", "end points in place of a fit", "This is the rate between the lowest and the highest row alone: the ask takes a fit through all rows.", (inputs2) => endPointRate(endsOf(inputs2)))
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 0.0102, within: 1e-12 }
};
function inverseFit(inputs2) {
  const line = lineOf(inputs2);
  return line.sumXY === 0 ? null : -line.sumYY / line.sumXY;
}

// shared/thermo/quantities/lapseRateStandardError.ts
var lapseRateStandardErrorDefinition = {
  key: "lapse-rate-standard-error",
  name: "standard error of the lapse rate by least squares",
  symbol: "s(Γ)",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "ratio",
  nearZero: 1e-5,
  inputs: layerInputs2(3),
  variants: [{
    key: "ordinary",
    label: "ordinary least squares, n − 2 degrees of freedom",
    source: { text: "ordinary least squares; NIST StRD linear regression for the arithmetic", status: "common practice" },
    validity: "independent residuals",
    knownError: "too small where neighboring rows are correlated",
    evaluate: (inputs2) => ({ is: "value", value: standardError(inputs2) })
  }],
  constants: [],
  ask: "The standard error of the lapse rate by ordinary least squares of temperature on height over all your rows, with n − 2 degrees of freedom.",
  trace(inputs2) {
    const line = lineOf(inputs2);
    const value23 = standardError(inputs2);
    const deviation = line.residualDeviation ?? 0;
    return [
      { text: "Scatter of the rows about the line", formula: "s = \\sqrt{\\frac{\\sum (T - \\hat T)^2}{n - 2}}", filled: `s = \\sqrt{\\frac{${texNumber(deviation * deviation * (line.count - 2))}}{${line.count} - 2}} = ${texQuantity(deviation, "K")}`, value: deviation, unit: "K" },
      { text: "Standard error of the slope", formula: "s_\\Gamma = \\frac{s}{\\sqrt{\\sum (z - \\bar z)^2}}", filled: `s_\\Gamma = \\frac{${texNumber(deviation)}}{\\sqrt{${texNumber(line.sumXX)}}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip("n-minus-1", "n − 1 for n − 2", "This comes from n − 1 degrees of freedom: the line takes two from n.", (inputs2, _c, right) => right * Math.sqrt((lineOf(inputs2).count - 2) / (lineOf(inputs2).count - 1))),
    fineSlip("n", "n for n − 2", "This comes from dividing by n: the line takes two degrees of freedom from n.", (inputs2, _c, right) => right * Math.sqrt((lineOf(inputs2).count - 2) / lineOf(inputs2).count)),
    slip("scatter", "scatter for standard error", "This is the scatter of the rows about the line, in kelvin: divide it by the root of Σ(z − z̄)².", (inputs2) => (lineOf(inputs2).residualDeviation ?? 0) / 1e3),
    slip("double", "twice the standard error", "This is twice the standard error, the half-width of an interval.", (_i, _c, right) => 2 * right)
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 825e-6, within: 1e-6 }
};
var standardError = (inputs2) => lineOf(inputs2).slopeError ?? 0;

// shared/numerics/selection.ts
function kthSmallest(values, count, k) {
  let low = 0, high2 = count - 1;
  while (low < high2) {
    const middle = low + (high2 - low >> 1);
    const pivot = medianOfThree(values[low] ?? 0, values[middle] ?? 0, values[high2] ?? 0);
    let left = low, right = high2;
    while (left <= right) {
      while ((values[left] ?? 0) < pivot) left++;
      while ((values[right] ?? 0) > pivot) right--;
      if (left > right) break;
      const kept = values[left] ?? 0;
      values[left] = values[right] ?? 0;
      values[right] = kept;
      left++;
      right--;
    }
    if (k <= right) high2 = right;
    else if (k >= left) low = left;
    else break;
  }
  return values[k] ?? NaN;
}
var medianOfThree = (a, b, c2) => Math.max(Math.min(a, b), Math.min(Math.max(a, b), c2));
function atRank(values, count, rank) {
  const whole = Math.floor(rank);
  const below = kthSmallest(values, count, whole);
  const rest = rank - whole;
  return rest === 0 ? below : below + rest * (kthSmallest(values, count, whole + 1) - below);
}

// shared/thermo/theilSen.ts
var mostRows = 3e3;
function slopesOf(inputs2) {
  const z4 = heightsOf(inputs2), T11 = temperaturesOf(inputs2);
  const rows = z4.length;
  if (rows > mostRows) throw new SeriesError("height", `${rows} rows; at most ${mostRows} can be paired`);
  const values = new Float64Array(rows * (rows - 1) / 2);
  let count = 0;
  for (let i = 0; i < rows; i++) {
    const zi = z4[i] ?? 0, Ti = T11[i] ?? 0;
    for (let j = i + 1; j < rows; j++) {
      const depth = (z4[j] ?? 0) - zi;
      if (depth !== 0) values[count++] = (Ti - (T11[j] ?? 0)) / depth;
    }
  }
  if (count === 0) throw new SeriesError("height", "all rows have the same height; a lapse rate needs a layer");
  return { values, count, rows, ties: values.length - count };
}
function theilSenRate(inputs2) {
  const { values, count, ties } = slopesOf(inputs2);
  return { rate: atRank(values, count, (count - 1) / 2), pairs: count, tiedPairs: ties };
}
var normalPoint = 1.959963984540054;
function theilSenInterval(inputs2) {
  const { values, count, rows } = slopesOf(inputs2);
  const halfRanks = normalPoint * Math.sqrt(rows * (rows - 1) * (2 * rows + 5) / 18);
  const first3 = (count - halfRanks) / 2, last = (count + halfRanks) / 2 + 1;
  if (!(first3 >= 1 && last <= count)) return null;
  return { low: atRank(values, count, first3 - 1), high: atRank(values, count, last - 1), halfRanks, pairs: count };
}
function meanOfPairs(inputs2) {
  const { values, count } = slopesOf(inputs2);
  let sum = 0;
  for (let at = 0; at < count; at++) sum += values[at] ?? 0;
  return sum / count;
}

// shared/thermo/quantities/lapseRateTheilSen.ts
var lapseRateTheilSenDefinition = {
  key: "lapse-rate-theil-sen",
  name: "lapse rate of a layer by the Theil–Sen estimator",
  symbol: "Γ",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: layerInputs2(3),
  variants: [{
    key: "median-of-pairs",
    label: "median of the slopes between all pairs of rows",
    source: { text: "Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389, section 4", status: "from memory" },
    validity: "any layer with two heights, 3 to 3000 rows",
    knownError: "none: the rows alone decide",
    evaluate(inputs2) {
      const { rate: rate7, pairs, tiedPairs } = theilSenRate(inputs2);
      const notes = tiedPairs > 0 ? [`${tiedPairs} pairs of rows at one height are left out.`] : void 0;
      return { is: "value", value: rate7, notes, more: { pairs } };
    }
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: "The lapse rate Γ by the Theil–Sen estimator: the median of −ΔT/Δz over all pairs of your rows, pairs at one height left out, positive where temperature falls with height.",
  trace(inputs2) {
    const { rate: rate7, pairs } = theilSenRate(inputs2);
    return [
      { text: "Slopes between all pairs of rows at different heights", formula: "\\Gamma_{ij} = -\\frac{T_j - T_i}{z_j - z_i},\\quad i < j", filled: `N = ${pairs}` },
      { text: "Their median", formula: "\\Gamma = \\mathrm{median}\\,\\Gamma_{ij}", filled: `\\Gamma = ${texQuantity(rate7 * 1e3, "K/km")}\\quad (N = ${texNumber(pairs, 7)})`, value: rate7, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height: it is the slope of T on z with its sign turned."),
    perMeterSlip,
    per100MetersSlip,
    fineSlip("least-squares", "least squares in place of the median", "This is the slope by least squares: the ask takes the median of the slopes between all pairs.", (inputs2) => -lineOf(inputs2).slope),
    fineSlip("end-points", "end points in place of the median", "This is the rate between the lowest and the highest row alone: the ask takes all pairs.", (inputs2) => endPointRate(endsOf(inputs2))),
    fineSlip("mean-of-pairs", "mean of the pairs in place of the median", "This is the mean of the slopes between all pairs: the ask takes their median.", meanOfPairs)
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05] }, gives: 95e-4, within: 1e-12 }
};

// shared/thermo/quantities/lapseRateTheilSenStandardError.ts
var lapseRateTheilSenStandardErrorDefinition = {
  key: "lapse-rate-theil-sen-standard-error",
  name: "standard error of the lapse rate by the Theil–Sen estimator",
  symbol: "s(Γ)",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "ratio",
  nearZero: 1e-5,
  inputs: layerInputs2(3),
  variants: [{
    key: "rank-interval",
    label: "width of the 95 % interval by ranks, over 2 · 1.96",
    source: { text: "Sen (1968), J. Amer. Statist. Assoc. 63, section 5; Gilbert (1987), section 16.5", status: "from memory" },
    validity: "independent rows at different heights, six or more",
    knownError: "the normal approximation of the ranks; too small where neighboring rows are correlated",
    evaluate(inputs2) {
      const interval = theilSenInterval(inputs2);
      if (!interval) return { is: "not_defined", why: "The rows are too few for an interval by ranks at 95 %." };
      return { is: "value", value: errorOf2(interval), more: { low: interval.low, high: interval.high } };
    }
  }],
  constants: [],
  ask: 'The standard error of the Theil–Sen lapse rate of your rows: the width of its 95 % interval by ranks, C = 1.96 √[n(n − 1)(2n + 5)/18], bounds at ranks (N − C)/2 and (N + C)/2 + 1 with linear interpolation between ranks, divided by 2 · 1.96. "Not defined" where a rank lies beyond the slopes.',
  trace(inputs2) {
    const interval = theilSenInterval(inputs2);
    if (!interval) return [{ text: "The ranks lie beyond the slopes", formula: "\\frac{N - C}{2} < 1", filled: "\\frac{N - C}{2} < 1" }];
    const value23 = errorOf2(interval);
    return [
      { text: "Half-width in ranks", formula: "C = 1.96 \\sqrt{\\frac{n (n - 1)(2 n + 5)}{18}}", filled: `C = ${texNumber(interval.halfRanks)},\\quad N = ${interval.pairs}` },
      { text: "Bounds at 95 %", formula: "\\Gamma_L,\\ \\Gamma_U", filled: `\\Gamma_L = ${texQuantity(interval.low * 1e3, "K/km")},\\quad \\Gamma_U = ${texQuantity(interval.high * 1e3, "K/km")}` },
      { text: "Standard error", formula: "s_\\Gamma = \\frac{\\Gamma_U - \\Gamma_L}{2 \\cdot 1.96}", filled: `s_\\Gamma = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip("half-width", "half the interval in place of the standard error", "This is half the width of the 95 % interval: divide it by 1.96.", (_i, _c, right) => normalPoint * right),
    fineSlip("whole-width", "the interval in place of the standard error", "This is the whole width of the 95 % interval: divide it by 2 · 1.96.", (_i, _c, right) => 2 * normalPoint * right),
    fineSlip("least-squares", "error of least squares in place of it", "This is the standard error of the fit by least squares.", (inputs2) => lineOf(inputs2).slopeError)
  ],
  example: { inputs: { height: [0, 100, 200, 300, 400, 500, 600], temperature: [293.15, 292.25, 291.45, 290.15, 289.55, 288.35, 287.65] }, gives: 51341e-8, within: 1e-8 }
};
var errorOf2 = ({ low, high: high2 }) => (high2 - low) / (2 * normalPoint);

// shared/thermo/mixedLayer.ts
var mixedLayerInputs = [
  { name: "height", label: "heights of the rows above the ground, rising", symbol: "z", unit: "m", shownUnit: "m", kind: "difference", shape: "series", range: [0, 1e5], needs: { least: 3, order: "ascending" } },
  { name: "potentialTemperature", label: "potential temperatures of the rows (virtual, where the text says so)", symbol: "θ", unit: "K", shownUnit: "K", kind: "temperature", shape: "series", range: [150, 800], needs: { least: 3, order: "none" } }
];
var heights = (inputs2) => seriesOf(inputs2, "height");
var thetas = (inputs2) => seriesOf(inputs2, "potentialTemperature");
function firstAbove(z4, values, limit) {
  for (let at = 1; at < z4.length; at++) {
    const above = values[at] ?? 0;
    if (!(above > limit)) continue;
    const below = values[at - 1] ?? 0, low = z4[at - 1] ?? 0;
    return above === Infinity ? z4[at] ?? 0 : low + Math.max(0, limit - below) / (above - below) * ((z4[at] ?? 0) - low);
  }
  return null;
}
var parcelMixedLayerDepth = (inputs2, excess = numberOf(inputs2, "excess")) => firstAbove(heights(inputs2), thetas(inputs2), (thetas(inputs2)[0] ?? 0) + excess);
function bulkRichardsonProfile(inputs2, constants) {
  const z4 = heights(inputs2), theta5 = thetas(inputs2), speed2 = seriesOf(inputs2, "windSpeed");
  const ground = theta5[0] ?? 0, start5 = z4[0] ?? 0;
  return z4.map((height2, at) => {
    const buoyancy = constant(constants, "g") / ground * ((theta5[at] ?? 0) - ground) * (height2 - start5), square = (speed2[at] ?? 0) * (speed2[at] ?? 0);
    return buoyancy === 0 ? 0 : square > 0 ? buoyancy / square : buoyancy > 0 ? Infinity : -1e12;
  });
}
var richardsonMixedLayerDepth = (inputs2, constants) => firstAbove(heights(inputs2), bulkRichardsonProfile(inputs2, constants), numberOf(inputs2, "criticalRichardsonNumber"));
function steepestStep(inputs2) {
  const z4 = heights(inputs2), theta5 = thetas(inputs2);
  let best = { height: 0, gradient: -Infinity };
  for (let at = 1; at < z4.length; at++) {
    const low = z4[at - 1] ?? 0, high2 = z4[at] ?? 0;
    const gradient2 = ((theta5[at] ?? 0) - (theta5[at - 1] ?? 0)) / (high2 - low);
    if (gradient2 > best.gradient) best = { height: (low + high2) / 2, gradient: gradient2 };
  }
  return best;
}
var groundTheta = (inputs2) => thetas(inputs2)[0] ?? 0;
function firstRowAbove(inputs2, values, limit) {
  const at = values.findIndex((value23, row) => row > 0 && value23 > limit);
  return at < 0 ? null : heights(inputs2)[at] ?? null;
}

// shared/thermo/quantities/mixedLayerDepthBulkRichardson.ts
var mixedLayerDepthBulkRichardsonDefinition = {
  key: "mixed-layer-depth-bulk-richardson",
  name: "mixed-layer depth by the bulk Richardson number",
  symbol: "h",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: [
    ...mixedLayerInputs,
    { name: "windSpeed", label: "wind speeds of the rows", symbol: "V", unit: "m/s", shownUnit: "m/s", kind: "difference", shape: "series", range: [0, 200], needs: { least: 3, order: "none" } },
    { name: "criticalRichardsonNumber", label: "critical bulk Richardson number", symbol: "Ri_c", unit: "1", shownUnit: "1", kind: "ratio", shape: "number", range: [0.01, 10] }
  ],
  variants: [{
    key: "calm-ground",
    label: "from the lowest row, wind at the ground taken as calm",
    source: { text: "Seidel et al. (2012), J. Geophys. Res. 117, D17106, Eq. 1, without its friction term", status: "from memory" },
    validity: "convective and stable layers, heights above ground",
    knownError: "the critical number is taught as 0.2 to 0.5",
    evaluate(inputs2, constants) {
      const value23 = richardsonMixedLayerDepth(inputs2, constants);
      return value23 === null ? { is: "not_reached", why: "The bulk Richardson number stays below the critical one up to the top of the data." } : { is: "value", value: value23 };
    }
  }],
  constants: ["g"],
  ask: 'The mixed-layer depth above ground by the bulk Richardson number Ri(z) = (g/θ_s)(θ(z) − θ_s)(z − z_s)/V(z)² from the lowest row, wind at the ground taken as calm: the lowest height at which Ri exceeds the critical number, linear between rows; "not reached" where the data end below it.',
  trace(inputs2, constants) {
    const value23 = richardsonMixedLayerDepth(inputs2, constants), profile = bulkRichardsonProfile(inputs2, constants);
    const first3 = { text: "Bulk Richardson number of each row", formula: "Ri(z) = \\frac{g}{\\theta_s} \\frac{(\\theta - \\theta_s)(z - z_s)}{V^2}", filled: `Ri_c = ${texNumber(numberOf(inputs2, "criticalRichardsonNumber"))},\\quad Ri \\text{ of } ${profile.length} \\text{ rows}` };
    if (value23 === null) return [first3];
    return [first3, { text: "The lowest height at which it exceeds the critical one, linear between rows", formula: "Ri(h) = Ri_c", filled: `h = ${texQuantity(value23, "m")}`, value: value23, unit: "m" }];
  },
  slips: [
    fineSlip("row-above", "row above in place of interpolation", "This is the first row above: the ask interpolates between rows.", (inputs2, constants) => firstRowAbove(inputs2, bulkRichardsonProfile(inputs2, constants), numberOf(inputs2, "criticalRichardsonNumber"))),
    fineSlip("parcel-method", "parcel method in place of it", "This is the depth by the parcel method without excess.", (inputs2) => parcelMixedLayerDepth(inputs2, 0))
  ],
  example: { inputs: { height: [2, 100, 500, 800, 1e3], potentialTemperature: [300, 299.8, 299.8, 300.2, 303], windSpeed: [2, 5, 6, 7, 8], criticalRichardsonNumber: 0.25 }, gives: 820.16, within: 0.01 }
};

// shared/thermo/quantities/mixedLayerDepthGradient.ts
var mixedLayerDepthGradientDefinition = {
  key: "mixed-layer-depth-gradient",
  name: "mixed-layer depth by the greatest gradient of potential temperature",
  symbol: "h",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: [...mixedLayerInputs, { name: "leastGradient", label: "least gradient of θ that counts", symbol: "γ_min", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [0, 1] }],
  variants: [{
    key: "greatest-gradient",
    label: "mean height of the two neighboring rows with the greatest gradient",
    source: { text: "Seidel et al. (2010), J. Geophys. Res. 115, D16113, section 2", status: "from memory" },
    validity: "a mixed layer under an inversion, heights above ground",
    knownError: "half the spacing of the rows; a surface inversion is found in place of a mixed layer",
    evaluate(inputs2) {
      const { height: height2, gradient: gradient2 } = steepestStep(inputs2);
      return gradient2 >= numberOf(inputs2, "leastGradient") && gradient2 > 0 ? { is: "value", value: height2, more: { gradient: gradient2 } } : { is: "not_reached", why: "No gradient of θ in the data is as great as the least that counts." };
    }
  }],
  constants: [],
  ask: 'The mixed-layer depth above ground by the gradient method: the mean height of the two neighboring rows between which θ rises fastest with height, the lower ones where two are alike; "not reached" where no gradient is as great as the least that counts.',
  trace(inputs2) {
    const { height: height2, gradient: gradient2 } = steepestStep(inputs2);
    return [
      { text: "Greatest gradient between neighboring rows", formula: "\\max \\frac{\\Delta\\theta}{\\Delta z}", filled: `\\max \\frac{\\Delta\\theta}{\\Delta z} = ${texQuantity(gradient2 * 1e3, "K/km")}`, value: gradient2, unit: "K/m" },
      { text: "Their mean height", formula: "h = \\frac{z_i + z_{i+1}}{2}", filled: `h = ${texQuantity(height2, "m")}`, value: height2, unit: "m" }
    ];
  },
  slips: [
    fineSlip("parcel-method", "parcel method in place of it", "This is the depth by the parcel method without excess.", (inputs2) => parcelMixedLayerDepth(inputs2, 0)),
    fineSlip("highest-theta", "height of the highest θ", "This is where θ is highest: the ask looks for where it rises fastest.", (inputs2) => {
      const theta5 = inputs2.potentialTemperature, z4 = inputs2.height;
      if (!Array.isArray(theta5) || !Array.isArray(z4)) return null;
      return z4[theta5.indexOf(Math.max(...theta5))] ?? null;
    })
  ],
  example: { inputs: { height: [2, 100, 500, 800, 1e3], potentialTemperature: [300, 299.8, 299.8, 300.2, 303], leastGradient: 5e-3 }, gives: 900, within: 1e-9 }
};

// shared/thermo/quantities/mixedLayerDepthParcel.ts
var mixedLayerDepthParcelDefinition = {
  key: "mixed-layer-depth-parcel",
  name: "mixed-layer depth by the parcel method",
  symbol: "h",
  unit: "m",
  shownUnit: "m",
  kind: "difference",
  nearZero: 10,
  inputs: [...mixedLayerInputs, { name: "excess", label: "excess of the parcel over θ of the lowest row", symbol: "δθ", unit: "K", shownUnit: "K", kind: "difference", shape: "number", range: [0, 10] }],
  variants: [{
    key: "parcel",
    label: "height at which θ reaches that of the lowest row and the excess",
    source: { text: "Holzworth (1964), Mon. Wea. Rev. 92, 235–242; Seidel et al. (2010), J. Geophys. Res. 115, D16113, section 2", status: "from memory" },
    validity: "a convective day, heights above ground",
    knownError: "the spacing of the rows and the reading of the lowest one",
    evaluate(inputs2) {
      const value23 = parcelMixedLayerDepth(inputs2);
      return value23 === null ? { is: "not_reached", why: "θ stays below that of the lowest row and the excess up to the top of the data." } : { is: "value", value: value23 };
    }
  }],
  constants: [],
  ask: 'The mixed-layer depth above ground by the parcel method: the lowest height at which θ exceeds θ of the lowest row plus the excess, linear between rows; "not reached" where the data end below it.',
  trace(inputs2) {
    const limit = groundTheta(inputs2) + numberOf(inputs2, "excess"), value23 = parcelMixedLayerDepth(inputs2);
    const first3 = { text: "θ of the parcel", formula: "\\theta_p = \\theta_s + \\delta\\theta", filled: `\\theta_p = ${texNumber(groundTheta(inputs2), 6)} + ${texNumber(numberOf(inputs2, "excess"))}\\,\\mathrm{K} = ${texQuantity(limit, "K", 6)}`, value: limit, unit: "K" };
    if (value23 === null) return [first3];
    return [first3, { text: "The lowest height with this θ, linear between rows", formula: "\\theta(h) = \\theta_p", filled: `h = ${texQuantity(value23, "m")}`, value: value23, unit: "m" }];
  },
  slips: [
    fineSlip("excess-left-out", "excess left out", "The excess is left out.", (inputs2) => parcelMixedLayerDepth(inputs2, 0)),
    fineSlip("row-above", "row above in place of interpolation", "This is the first row above: the ask interpolates between rows.", (inputs2) => firstRowAbove(inputs2, seriesOf(inputs2, "potentialTemperature"), groundTheta(inputs2) + numberOf(inputs2, "excess")))
  ],
  example: { inputs: { height: [2, 100, 500, 800, 1e3], potentialTemperature: [300, 299.8, 299.8, 300.2, 303], excess: 0.5 }, gives: 821.43, within: 0.01 }
};

// shared/thermo/quantities/potentialTemperatureGradient.ts
var potentialTemperatureGradientDefinition = {
  key: "potential-temperature-gradient",
  name: "gradient of potential temperature from a lapse rate",
  symbol: "dθ/dz",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [
    { name: "temperature", label: "air temperature", symbol: "T", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [150, 400] },
    { name: "potentialTemperature", label: "potential temperature", symbol: "θ", unit: "K", shownUnit: "K", kind: "temperature", shape: "number", range: [150, 800] },
    { name: "lapseRate", label: "lapse rate", symbol: "Γ", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] }
  ],
  variants: [{
    key: "hydrostatic",
    label: "(θ/T)(Γd − Γ)",
    source: { text: "closed form: Poisson’s relation differentiated with the hydrostatic equation", status: "verified" },
    validity: "dry hydrostatic air",
    knownError: "none beyond cp taken as constant",
    evaluate: (inputs2, constants) => ({ is: "value", value: gradient(inputs2, constants) })
  }],
  constants: ["g", "cp"],
  classLimits: () => [{ label: "neutral", value: 0 }],
  ask: "The gradient of potential temperature dθ/dz = (θ/T)(Γd − Γ), positive where θ rises with height.",
  trace(inputs2, constants) {
    const value23 = gradient(inputs2, constants), dry = dryRateOf(constants);
    return [
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(dry * 1e3, "K/km")}`, value: dry, unit: "K/m" },
      { text: "Gradient", formula: "\\frac{d\\theta}{dz} = \\frac{\\theta}{T} (\\Gamma_d - \\Gamma)", filled: `\\frac{d\\theta}{dz} = \\frac{${texNumber(numberOf(inputs2, "potentialTemperature"), 6)}}{${texNumber(numberOf(inputs2, "temperature"), 6)}} \\times (${texNumber(dry * 1e3)} - ${texFactor(numberOf(inputs2, "lapseRate") * 1e3)})\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("θ rises with height where the layer is stable, Γ < Γd."),
    perMeterSlip,
    per100MetersSlip,
    fineSlip("ratio-left-out", "θ/T left out", "The factor θ/T is left out.", (inputs2, constants) => dryRateOf(constants) - numberOf(inputs2, "lapseRate")),
    fineSlip("ratio-inverted", "T/θ for θ/T", "The factor is θ/T, not T/θ.", (inputs2, constants) => numberOf(inputs2, "temperature") / numberOf(inputs2, "potentialTemperature") * (dryRateOf(constants) - numberOf(inputs2, "lapseRate"))),
    slip("gradient-sign", "Γd + Γ for Γd − Γ", "The lapse rate went in with its sign turned: Γ is positive where temperature falls with height.", (inputs2, constants) => numberOf(inputs2, "potentialTemperature") / numberOf(inputs2, "temperature") * (dryRateOf(constants) + numberOf(inputs2, "lapseRate"))),
    slip("dry-rate-left-out", "Γd left out", "The dry adiabatic lapse rate is left out: this is a gradient of temperature.", (inputs2) => -numberOf(inputs2, "lapseRate") * numberOf(inputs2, "potentialTemperature") / numberOf(inputs2, "temperature"))
  ],
  example: { inputs: { temperature: 290, potentialTemperature: 293, lapseRate: 65e-4 }, gives: 3305e-6, within: 1e-6 }
};
var gradient = (inputs2, constants) => potentialTemperatureGradient(kelvin(numberOf(inputs2, "temperature")), kelvin(numberOf(inputs2, "potentialTemperature")), kelvinPerMeter(numberOf(inputs2, "lapseRate")), constants);

// shared/thermo/quantities/staticStability.ts
function staticStability(lapseRate, constants) {
  const excess = lapseRate - dryRateOf(constants);
  const tolerance = constant(constants, "neutralTolerance");
  if (excess > tolerance) return "superadiabatic";
  return excess < -tolerance ? "stable" : "dry-neutral";
}
var rate = (inputs2) => numberOf(inputs2, "lapseRate");
var staticStabilityDefinition = {
  key: "static-stability",
  name: "static stability of an unsaturated layer",
  symbol: "class",
  unit: "1",
  shownUnit: "1",
  kind: "class",
  inputs: [
    { name: "lapseRate", label: "lapse rate of the layer", symbol: "Γ", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] }
  ],
  variants: [{
    key: "against-dry-rate",
    label: "against Γd alone",
    source: { text: 'AMS Glossary of Meteorology, "static stability"', status: "common practice" },
    validity: "an unsaturated layer",
    knownError: "Γd is 9.75 to 9.80 K km⁻¹ by the constants taught",
    evaluate: (inputs2, constants) => ({ is: "class", key: staticStability(rate(inputs2), constants), more: { dryRate: dryRateOf(constants) } })
  }],
  constants: ["g", "cp", "neutralTolerance"],
  classLimits: dryClassLimits,
  classes: [
    { key: "stable", label: "stable", alsoTyped: ["statically stable", "subadiabatic"] },
    { key: "dry-neutral", label: "dry-neutral", alsoTyped: ["neutral", "dry neutral", "dry adiabatic", "dry-adiabatic"] },
    { key: "superadiabatic", label: "superadiabatic", alsoTyped: ["unstable", "absolutely unstable", "super-adiabatic", "statically unstable"] }
  ],
  ask: "The static stability of the unsaturated layer against Γd alone: stable, dry-neutral (Γ within 0.1 K/km of Γd) or superadiabatic.",
  trace(inputs2, constants) {
    const limit = dryRateOf(constants);
    const key = staticStability(rate(inputs2), constants);
    const sign = key === "stable" ? "<" : key === "superadiabatic" ? ">" : "\\approx";
    return [
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(limit * 1e3, "K/km")}`, value: limit, unit: "K/m" },
      { text: `The layer is ${key}, with a tolerance of ${Number((constant(constants, "neutralTolerance") * 1e3).toPrecision(3))} K/km`, formula: "\\Gamma \\lessgtr \\Gamma_d", filled: `${texNumber(rate(inputs2) * 1e3)} ${sign} ${texQuantity(limit * 1e3, "K/km")}`, value: rate(inputs2), unit: "K/m" }
    ];
  },
  slips: [],
  example: { inputs: { lapseRate: 65e-4 }, gives: "stable", within: 0 }
};

// shared/thermo/quantities/vectorWindDifference.ts
var vectorWindDifferenceDefinition = {
  key: "vector-wind-difference",
  name: "vector difference of two winds",
  symbol: "|ΔV|",
  unit: "m/s",
  shownUnit: "m/s",
  kind: "difference",
  nearZero: 0.1,
  inputs: [
    speedInput("windSpeedBottom", "wind speed at the bottom", "s₁"),
    directionInput("windDirectionBottom", "wind direction at the bottom", "d₁"),
    speedInput("windSpeedTop", "wind speed at the top", "s₂"),
    directionInput("windDirectionTop", "wind direction at the top", "d₂")
  ],
  variants: [{
    key: "vectors",
    label: "difference of components",
    source: { text: 'AMS Glossary of Meteorology, "wind shear"', status: "common practice" },
    validity: "any two winds",
    knownError: "none: the four readings alone decide",
    evaluate: (inputs2) => ({ is: "value", value: size(inputs2) })
  }],
  constants: [],
  ask: "The size |ΔV| of the difference of the two wind vectors.",
  trace(inputs2) {
    const { du, dv } = windDifference(inputs2), value23 = size(inputs2);
    return [
      { text: "Differences of the components, u = −s sin d, v = −s cos d", formula: "\\Delta u,\\ \\Delta v", filled: `\\Delta u = ${texQuantity(du, "m/s")},\\quad \\Delta v = ${texQuantity(dv, "m/s")}` },
      { text: "Size of the difference", formula: "|\\Delta V| = \\sqrt{\\Delta u^2 + \\Delta v^2}", filled: `|\\Delta V| = \\sqrt{${texFactor(du)}^2 + ${texFactor(dv)}^2}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value23, "m/s")}`, value: value23, unit: "m/s" }
    ];
  },
  slips: [
    slip("speeds-subtracted", "difference of speeds for that of vectors", "This is the difference of the speeds: a turning wind differs too.", (inputs2) => Math.abs(numberOf(inputs2, "windSpeedTop") - numberOf(inputs2, "windSpeedBottom"))),
    slip("vectors-added", "sum in place of the difference", "This adds the vectors in place of subtracting them.", (inputs2) => {
      const s1 = numberOf(inputs2, "windSpeedBottom"), s2 = numberOf(inputs2, "windSpeedTop");
      const difference3 = size(inputs2);
      return Math.sqrt(Math.max(0, 2 * (s1 * s1 + s2 * s2) - difference3 * difference3));
    }),
    slip("root-left-out", "root left out", "This is the square of the difference: take its root.", (_i, _c, right) => right * right),
    slip("components-added", "sizes of components added", "This adds the sizes of both components: add their squares and take the root.", (inputs2) => {
      const { du, dv } = windDifference(inputs2);
      return Math.abs(du) + Math.abs(dv);
    })
  ],
  example: { inputs: { windSpeedBottom: 5, windDirectionBottom: 3.490658503988659, windSpeedTop: 5, windDirectionTop: 4.537856055185257 }, gives: 5, within: 1e-9 }
};
function size(inputs2) {
  const { du, dv } = windDifference(inputs2);
  return Math.sqrt(du * du + dv * dv);
}

// shared/thermo/layerStability.ts
function layerStability(layer4, constants) {
  const tolerance = constant(constants, "neutralTolerance"), { lapseRate, saturated } = layer4;
  if (lapseRate < saturated - tolerance) return "absolutely-stable";
  if (lapseRate <= saturated + tolerance) return "saturated-neutral";
  if (layer4.isSaturated) return "absolutely-unstable";
  const dry = dryRateOf(constants);
  if (lapseRate > dry + tolerance) return "absolutely-unstable";
  return lapseRate < dry - tolerance ? "conditionally-unstable" : "dry-neutral";
}
var layerSaturatedRate = (inputs2, constants, formulae) => saturatedRate(numberOf(inputs2, "meanTemperature"), numberOf(inputs2, "meanPressure"), moistAir(constants, formulae));
function equivalentAtEnds(inputs2, constants, formulae) {
  const air = moistAir(constants, formulae), variant = formulae.variants[equivalentKey];
  const at = (end) => equivalentPotentialTemperature(numberOf(inputs2, `temperature${end}`), numberOf(inputs2, `dewpoint${end}`), numberOf(inputs2, `pressure${end}`), air, variant);
  return { bottom: at("Bottom"), top: at("Top"), depth: numberOf(inputs2, "depth") };
}
var equivalentGradient = ({ bottom: bottom3, top: top4, depth }) => (top4 - bottom3) / depth;

// shared/thermo/quantities/layerStability.ts
var rate2 = (inputs2) => numberOf(inputs2, "lapseRate");
var isSaturated = (inputs2) => "relativeHumidity" in inputs2 && numberOf(inputs2, "relativeHumidity") >= 1;
var classOf = (inputs2, constants, formulae) => layerStability({ lapseRate: rate2(inputs2), saturated: layerSaturatedRate(inputs2, constants, formulae), isSaturated: isSaturated(inputs2) }, constants);
var layerStabilityDefinition = {
  key: "layer-stability",
  name: "stability of a layer against both adiabats",
  symbol: "class",
  unit: "1",
  shownUnit: "1",
  kind: "class",
  inputs: [
    { name: "lapseRate", label: "lapse rate of the layer", symbol: "Γ", unit: "K/m", shownUnit: "K/km", kind: "difference", shape: "number", range: [-1, 1] },
    { name: "meanTemperature", label: "mean temperature of the layer", symbol: "T̄", unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [200, 330] },
    { name: "meanPressure", label: "mean pressure of the layer", symbol: "p̄", unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [1e4, 11e4] },
    { name: "relativeHumidity", label: "mean relative humidity; from 100 % on the layer is saturated, and without it unsaturated", symbol: "RH", unit: "1", shownUnit: "%", kind: "fraction", shape: "number", range: [0, 1.2], isOptional: true }
  ],
  variants: [{
    key: "both-adiabats",
    label: "against Γm at the layer’s mean p and T, and Γd",
    source: { text: 'AMS Glossary of Meteorology, "absolute instability", "conditional instability"', status: "common practice" },
    validity: "thin layers",
    knownError: "Γd is 9.75 to 9.80 K km⁻¹ by the constants taught; Γm by the formulae of eₛ and L, 0.06 K km⁻¹",
    evaluate: (inputs2, constants, formulae) => ({ is: "class", key: classOf(inputs2, constants, formulae), more: { saturatedRate: layerSaturatedRate(inputs2, constants, formulae), dryRate: dryRateOf(constants) } })
  }],
  constants: ["g", "cp", "R", "Rv", "latentHeat", "cpv", "cw", "enhancementFactor", "neutralTolerance"],
  uses: ["saturation-vapor-pressure", "latent-heat-of-vaporization"],
  classLimits(inputs2, constants, formulae) {
    const saturated = layerSaturatedRate(inputs2, constants, formulae), dry = dryRateOf(constants), tolerance = constant(constants, "neutralTolerance");
    const about = (label, value23) => [{ label: `${label} less the tolerance of a neutral layer`, value: value23 - tolerance }, { label: `${label} with the tolerance of a neutral layer`, value: value23 + tolerance }];
    return [...about("Γm", saturated), ...isSaturated(inputs2) ? [] : about("Γd", dry)];
  },
  classes: [
    { key: "absolutely-stable", label: "absolutely stable", alsoTyped: ["stable", "statically stable", "absolute stability"] },
    { key: "saturated-neutral", label: "saturated-neutral", alsoTyped: ["saturated neutral", "moist neutral", "moist-neutral", "neutral for saturated air"] },
    { key: "conditionally-unstable", label: "conditionally unstable", alsoTyped: ["conditional", "conditional instability", "conditionally-unstable"] },
    { key: "dry-neutral", label: "dry-neutral", alsoTyped: ["neutral", "dry neutral", "dry adiabatic", "dry-adiabatic"] },
    { key: "absolutely-unstable", label: "absolutely unstable", alsoTyped: ["unstable", "superadiabatic", "super-adiabatic", "statically unstable", "absolute instability"] }
  ],
  ask: "The stability of the layer: absolutely stable (Γ < Γm), saturated-neutral (Γ within 0.1 K/km of Γm), conditionally unstable (Γm < Γ < Γd), dry-neutral (Γ within 0.1 K/km of Γd) or absolutely unstable, which is superadiabatic (Γ > Γd), with Γm at the layer’s mean pressure and temperature; a saturated layer is judged against Γm alone.",
  trace(inputs2, constants, _variant, formulae) {
    const saturated = layerSaturatedRate(inputs2, constants, formulae), dry = dryRateOf(constants);
    return [
      { text: "Saturated adiabatic lapse rate at the layer’s mean pressure and temperature", formula: "\\Gamma_m(\\bar T, \\bar p)", filled: `\\Gamma_m = ${texQuantity(saturated * 1e3, "K/km")}`, value: saturated, unit: "K/m" },
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(dry * 1e3, "K/km")}`, value: dry, unit: "K/m" },
      { text: `The ${isSaturated(inputs2) ? "saturated" : "unsaturated"} layer is ${classOf(inputs2, constants, formulae).replace("-", " ")}, with a tolerance of ${Number((constant(constants, "neutralTolerance") * 1e3).toPrecision(3))} K/km`, formula: "\\Gamma \\lessgtr \\Gamma_m,\\,\\Gamma_d", filled: `\\Gamma = ${texNumber(rate2(inputs2) * 1e3)}\\,\\mathrm{K\\,km^{-1}}`, value: rate2(inputs2), unit: "K/m" }
    ];
  },
  slips: [],
  example: { inputs: { lapseRate: 5e-3, meanTemperature: 298.15, meanPressure: 95e3 }, gives: "conditionally-unstable", within: 0 }
};

// shared/thermo/potentialStabilityInputs.ts
var temperature4 = (name, label, symbol) => ({ name, label, symbol, unit: "K", shownUnit: "Cel", kind: "temperature", shape: "number", range: [200, 330] });
var pressure2 = (name, label, symbol) => ({ name, label, symbol, unit: "Pa", shownUnit: "hPa", kind: "ratio", shape: "number", range: [1e4, 11e4] });
var potentialStabilityInputs = [
  pressure2("pressureBottom", "pressure at the bottom", "p_1"),
  temperature4("temperatureBottom", "temperature at the bottom", "T_1"),
  temperature4("dewpointBottom", "dewpoint at the bottom", "T_d1"),
  pressure2("pressureTop", "pressure at the top", "p_2"),
  temperature4("temperatureTop", "temperature at the top", "T_2"),
  temperature4("dewpointTop", "dewpoint at the top", "T_d2"),
  { name: "depth", label: "depth of the layer", symbol: "Δz", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [1, 2e4], trivialWithin: 0 }
];

// shared/thermo/quantities/equivalentPotentialTemperatureGradient.ts
var equivalentPotentialTemperatureGradientDefinition = {
  key: "equivalent-potential-temperature-gradient",
  name: "potential instability: gradient of the equivalent potential temperature",
  symbol: "∂θe/∂z",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: potentialStabilityInputs,
  variants: [{
    key: "ends",
    label: "θe at the top less θe at the bottom, by the depth",
    source: { text: 'AMS Glossary of Meteorology, "potential instability"', status: "common practice" },
    validity: "thin layers",
    knownError: "that of θe, 0.03 K usually",
    evaluate: (inputs2, constants, formulae) => ({ is: "value", value: equivalentGradient(equivalentAtEnds(inputs2, constants, formulae)) })
  }],
  constants: ascentConstants,
  uses: ["saturation-vapor-pressure", "latent-heat-of-vaporization", equivalentKey],
  classLimits: () => [{ label: "potentially neutral", value: 0 }],
  ask: "The gradient of the equivalent potential temperature ∂θe/∂z = (θe₂ − θe₁)/Δz of the layer, with its sign: negative where the layer is potentially (convectively) unstable.",
  trace(inputs2, constants, _variant, formulae) {
    const ends = equivalentAtEnds(inputs2, constants, formulae), value23 = equivalentGradient(ends);
    return [
      { text: "θe at both ends", formula: "\\theta_{e1},\\ \\theta_{e2}", filled: `\\theta_{e1} = ${texQuantity(ends.bottom, "K", 6)},\\quad \\theta_{e2} = ${texQuantity(ends.top, "K", 6)}` },
      { text: "Gradient", formula: "\\frac{\\partial\\theta_e}{\\partial z} = \\frac{\\theta_{e2} - \\theta_{e1}}{\\Delta z}", filled: `\\frac{\\partial\\theta_e}{\\partial z} = \\frac{${texFactor(ends.top - ends.bottom)}\\,\\mathrm{K}}{${texNumber(ends.depth / 1e3)}\\,\\mathrm{km}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("The gradient is the top less the bottom: negative where θe falls with height."),
    perMeterSlip,
    per100MetersSlip,
    slip("theta-for-theta-e", "θ for θe", "This is the gradient of θ: potential instability goes by θe.", (inputs2, constants) => {
      const at = (end) => numberOf(inputs2, `temperature${end}`) * pow(1e5 / numberOf(inputs2, `pressure${end}`), kappaOf(constants));
      return (at("Top") - at("Bottom")) / numberOf(inputs2, "depth");
    }),
    slip("temperature", "T for θe", "This is the gradient of temperature.", (inputs2) => (numberOf(inputs2, "temperatureTop") - numberOf(inputs2, "temperatureBottom")) / numberOf(inputs2, "depth"))
  ],
  example: { inputs: { pressureBottom: 95e3, temperatureBottom: 298.15, dewpointBottom: 293.15, pressureTop: 85e3, temperatureTop: 291.15, dewpointTop: 281.15, depth: 970 }, gives: -0.02062035, within: 2e-8 }
};

// shared/thermo/quantities/potentialStability.ts
function classOf2(inputs2, constants, formulae) {
  const gradient2 = equivalentGradient(equivalentAtEnds(inputs2, constants, formulae)), tolerance = constant(constants, "neutralTolerance");
  return gradient2 < -tolerance ? "potentially-unstable" : gradient2 > tolerance ? "potentially-stable" : "potentially-neutral";
}
var potentialStabilityDefinition = {
  key: "potential-stability",
  name: "potential stability of a layer",
  symbol: "class",
  unit: "1",
  shownUnit: "1",
  kind: "class",
  inputs: potentialStabilityInputs,
  variants: [{
    key: "theta-e",
    label: "by the sign of ∂θe/∂z",
    source: { text: 'AMS Glossary of Meteorology, "potential instability"', status: "common practice" },
    validity: "thin layers",
    knownError: "that of θe, 0.03 K usually",
    evaluate: (inputs2, constants, formulae) => ({ is: "class", key: classOf2(inputs2, constants, formulae) })
  }],
  constants: [...ascentConstants, "neutralTolerance"],
  uses: ["saturation-vapor-pressure", "latent-heat-of-vaporization", equivalentKey],
  classes: [
    { key: "potentially-unstable", label: "potentially unstable", alsoTyped: ["convectively unstable", "potential instability", "unstable"] },
    { key: "potentially-neutral", label: "potentially neutral", alsoTyped: ["convectively neutral", "neutral"] },
    { key: "potentially-stable", label: "potentially stable", alsoTyped: ["convectively stable", "stable"] }
  ],
  ask: "The potential (convective) stability of the layer by the sign of ∂θe/∂z: potentially unstable below 0, potentially neutral within 0.1 K/km of 0, potentially stable above.",
  trace(inputs2, constants, _variant, formulae) {
    const ends = equivalentAtEnds(inputs2, constants, formulae), value23 = equivalentGradient(ends);
    return [
      { text: "θe at both ends", formula: "\\theta_{e1},\\ \\theta_{e2}", filled: `\\theta_{e1} = ${texQuantity(ends.bottom, "K", 6)},\\quad \\theta_{e2} = ${texQuantity(ends.top, "K", 6)}` },
      { text: `The layer is ${classOf2(inputs2, constants, formulae).replace("-", " ")}`, formula: "\\frac{\\partial\\theta_e}{\\partial z} \\lessgtr 0", filled: `\\frac{\\partial\\theta_e}{\\partial z} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [],
  example: { inputs: { pressureBottom: 95e3, temperatureBottom: 298.15, dewpointBottom: 293.15, pressureTop: 85e3, temperatureTop: 291.15, dewpointTop: 281.15, depth: 970 }, gives: "potentially-unstable", within: 0 }
};

// shared/thermo/lagOneDefinition.ts
function lagOneDefinition({ line, source: source2, rate: rate7, ...named2 }) {
  const correlation = (inputs2) => lagOneCorrelationAbout(inputs2, rate7(inputs2));
  return {
    ...named2,
    symbol: "r₁",
    unit: "1",
    shownUnit: "1",
    kind: "difference",
    nearZero: 0.1,
    inputs: layerInputs2(4),
    variants: [{
      key: "residuals",
      label: `residuals about ${line}, less their mean, in the order of the rows`,
      source: source2,
      validity: "rows at even steps of time or height",
      knownError: "biased low by about 4/n for short series",
      evaluate(inputs2) {
        const value23 = correlation(inputs2);
        return value23 === null ? { is: "not_defined", why: "The rows lie on the line: there are no residuals to correlate." } : { is: "value", value: value23 };
      }
    }],
    constants: [],
    ask: `The lag-1 correlation r₁ = Σ (eᵢ − ē)(eᵢ₊₁ − ē) / Σ (eᵢ − ē)² of the residuals e of temperature about ${line}, less their mean, in the order of your rows. "Not defined" where the rows lie on the line.`,
    trace(inputs2) {
      const value23 = correlation(inputs2);
      const residuals = { text: "Residuals about the line; where the line stands falls out with their mean", formula: "e_i = T_i + \\Gamma z_i", filled: `\\Gamma = ${texQuantity(rate7(inputs2) * 1e3, "K/km")},\\quad n = ${heightsOf(inputs2).length}` };
      return value23 === null ? [residuals] : [residuals, { text: "Correlation of neighbors", formula: "r_1 = \\frac{\\sum (e_i - \\bar e)(e_{i+1} - \\bar e)}{\\sum (e_i - \\bar e)^2}", filled: `r_1 = ${texNumber(value23)}`, value: value23, unit: "1" }];
    },
    slips: [
      signSlip("The sign is turned round: neighbors that lie on one side of the line correlate positively."),
      fineSlip("least-squares", "residuals about the line of least squares", `These are the residuals about the line of least squares: the ask takes ${line}.`, (inputs2) => lagOneCorrelationAbout(inputs2, -lineOf(inputs2).slope)),
      fineSlip("of-temperature", "correlation of T in place of the residuals", "This is the lag-1 correlation of the temperatures: take the line off first.", (inputs2) => lagOneCorrelationAbout({ height: heightsOf(inputs2), temperature: temperaturesOf(inputs2) }, 0)),
      fineSlip("mean-of-products", "sums divided by their counts", "This divides the sum of n − 1 products by n − 1 and the sum of n squares by n: the ask divides the sums.", (inputs2, _c, right) => right * heightsOf(inputs2).length / (heightsOf(inputs2).length - 1))
    ]
  };
}

// shared/thermo/quantities/lapseRateEndPointsLagOneCorrelation.ts
var lapseRateEndPointsLagOneCorrelationDefinition = lagOneDefinition({
  key: "lapse-rate-end-points-lag-one-correlation",
  name: "lag-1 correlation of the residuals of a lapse rate by end points",
  line: "the straight line between the lowest and the highest row",
  source: { text: "Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32", status: "from memory" },
  rate: (inputs2) => endPointRate(endsOf(inputs2)),
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.602541, within: 1e-6 }
});

// shared/thermo/quantities/lapseRateEndPointsInflatedStandardError.ts
var lapseRateEndPointsInflatedStandardErrorDefinition = {
  key: "lapse-rate-end-points-inflated-standard-error",
  name: "standard error of the lapse rate by end points, inflated for correlated residuals",
  symbol: "s′(Γ)",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "ratio",
  nearZero: 1e-5,
  inputs: [
    ...layerInputs2(4),
    { name: "readingDeviation", label: "standard deviation of one temperature reading", symbol: "s_T", unit: "K", shownUnit: "K", kind: "difference", shape: "number", range: [0, 10] }
  ],
  variants: [{
    key: "effective-rows",
    label: "effective number of rows at each end",
    source: { text: "JCGM 100:2008, Eq. 10; Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., section 5.2.4", status: "from memory" },
    validity: "residuals that follow a first-order autoregression; heights without error",
    knownError: "r₁ of short series is biased low, and so is this",
    evaluate(inputs2) {
      const correlation = correlationOf(inputs2);
      if (correlation === null) return { is: "value", value: errorOf3(inputs2, 0), notes: ["The rows lie on the line; nothing is inflated."] };
      const { lowCount, highCount } = endsOf(inputs2);
      const notes = lowCount === 1 && highCount === 1 ? ["Each end is a single reading: correlation takes nothing from it."] : void 0;
      return { is: "value", value: errorOf3(inputs2, correlation), notes, more: { correlation } };
    }
  }],
  constants: [],
  ask: "The standard error of the lapse rate between the lowest and the highest of your rows, where each temperature has the given standard deviation and heights have none; the n rows at an end’s height count as n (1 − r₁)/(1 + r₁), one at least, with the lag-1 correlation r₁ of the residuals about the line between the ends, less their mean, in the order of your rows; as n where r₁ is negative.",
  trace(inputs2) {
    const { lowCount, highCount } = endsOf(inputs2), s2 = numberOf(inputs2, "readingDeviation"), correlation = correlationOf(inputs2) ?? 0, value23 = errorOf3(inputs2, correlation);
    const low = effectiveRows(lowCount, correlation), high2 = effectiveRows(highCount, correlation), depth = depthOf2(inputs2);
    return [
      { text: "Lag-1 correlation of the residuals", formula: "r_1 = \\frac{\\sum (e_i - \\bar e)(e_{i+1} - \\bar e)}{\\sum (e_i - \\bar e)^2}", filled: `r_1 = ${texNumber(correlation)}`, value: correlation, unit: "1" },
      { text: "Effective rows at the ends", formula: "n' = n \\frac{1 - r_1}{1 + r_1}", filled: `n'_1 = ${texNumber(low)},\\quad n'_2 = ${texNumber(high2)}` },
      { text: "Error of the lapse rate", formula: "s'_\\Gamma = \\frac{s_T}{z_2 - z_1} \\sqrt{\\frac{1}{n'_1} + \\frac{1}{n'_2}}", filled: `s'_\\Gamma = \\frac{${texQuantity(s2, "K")}}{${texQuantity(depth / 1e3, "km", 6)}} \\sqrt{\\frac{1}{${texNumber(low)}} + \\frac{1}{${texNumber(high2)}}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip("not-inflated", "not inflated", "This is the standard error for independent rows: neighbors here have something in common.", (inputs2, _c, right) => {
      const plain = errorOf3(inputs2, 0);
      return plain === right ? null : plain;
    }),
    fineSlip("factor-of-all-rows", "factor of a fit put on the ends", "This multiplies by √[(1 + r₁)/(1 − r₁)], as for a fit through all rows: only the means at the ends lose by correlation.", (inputs2) => {
      const correlation = correlationOf(inputs2) ?? 0;
      return correlation <= 0 || correlation >= 1 ? null : errorOf3(inputs2, 0) * Math.sqrt((1 + correlation) / (1 - correlation));
    }),
    slip("errors-added", "errors added in place of their squares", "This adds the errors of both readings: independent errors add by their squares.", (inputs2) => 2 * numberOf(inputs2, "readingDeviation") / depthOf2(inputs2))
  ],
  example: {
    inputs: { height: [10, 10, 10, 10, 60, 110, 160, 210, 210, 210, 210], temperature: [290, 290.1, 290.2, 290.1, 289.9, 289.3, 288.6, 288.2, 288.1, 288, 288.1], readingDeviation: 0.1 },
    gives: 43673e-8,
    within: 1e-8
  }
};
var correlationOf = (inputs2) => lagOneCorrelationAbout(inputs2, endPointRate(endsOf(inputs2)));
function depthOf2(inputs2) {
  const { lowHeight, highHeight } = endsOf(inputs2);
  return highHeight - lowHeight;
}
function errorOf3(inputs2, correlation) {
  const { lowCount, highCount } = endsOf(inputs2);
  return numberOf(inputs2, "readingDeviation") * Math.sqrt(1 / effectiveRows(lowCount, correlation) + 1 / effectiveRows(highCount, correlation)) / depthOf2(inputs2);
}

// shared/thermo/quantities/lapseRateTheilSenLagOneCorrelation.ts
var lapseRateTheilSenLagOneCorrelationDefinition = lagOneDefinition({
  key: "lapse-rate-theil-sen-lag-one-correlation",
  name: "lag-1 correlation of the residuals of a lapse rate by the Theil–Sen estimator",
  line: "the line with the Theil–Sen lapse rate",
  source: { text: "Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., Eq. 3.32; Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389", status: "from memory" },
  rate: (inputs2) => theilSenRate(inputs2).rate,
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.323305, within: 1e-6 }
});

// shared/thermo/quantities/lapseRateTheilSenInflatedStandardError.ts
var lapseRateTheilSenInflatedStandardErrorDefinition = {
  key: "lapse-rate-theil-sen-inflated-standard-error",
  name: "standard error of the lapse rate by the Theil–Sen estimator, inflated for correlated residuals",
  symbol: "s′(Γ)",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "ratio",
  nearZero: 1e-5,
  inputs: layerInputs2(4),
  variants: [{
    key: "first-order",
    label: "effective number of rows of a first-order autoregression",
    source: { text: "Sen (1968), J. Amer. Statist. Assoc. 63, section 5; Wilks (2011), Statistical Methods in the Atmospheric Sciences, 3rd ed., section 5.2.4", status: "from memory" },
    validity: "six or more rows at even steps whose residuals follow a first-order autoregression",
    knownError: "r₁ of short series is biased low, and so is this",
    evaluate(inputs2) {
      const error2 = plainError(inputs2);
      if (error2 === null) return { is: "not_defined", why: "The rows are too few for an interval by ranks at 95 %." };
      const correlation = correlationOf2(inputs2);
      if (correlation === null) return { is: "value", value: error2, notes: ["The rows lie on their line; nothing is inflated."] };
      const factor = inflation(correlation);
      if (factor === null) return { is: "not_defined", why: "The residuals correlate fully: no error follows." };
      return { is: "value", value: error2 * factor, more: { correlation, factor } };
    }
  }],
  constants: [],
  ask: "The standard error of the Theil–Sen lapse rate of your rows (the width of its 95 % interval by ranks over 2 · 1.96), times √[(1 + r₁)/(1 − r₁)] with the lag-1 correlation r₁ of the residuals about the line with the Theil–Sen rate, less their mean, in the order of your rows; the factor is 1 where r₁ is negative.",
  trace(inputs2) {
    const error2 = plainError(inputs2);
    if (error2 === null) return [{ text: "The ranks lie beyond the slopes", formula: "\\frac{N - C}{2} < 1", filled: "\\frac{N - C}{2} < 1" }];
    const correlation = correlationOf2(inputs2) ?? 0, factor = inflation(correlation) ?? 1, value23 = error2 * factor;
    return [
      { text: "Standard error for independent rows, from the ranks", formula: "s_\\Gamma = \\frac{\\Gamma_U - \\Gamma_L}{2 \\cdot 1.96}", filled: `s_\\Gamma = ${texQuantity(error2 * 1e3, "K/km")}`, value: error2, unit: "K/m" },
      { text: "Lag-1 correlation of the residuals", formula: "r_1 = \\frac{\\sum (e_i - \\bar e)(e_{i+1} - \\bar e)}{\\sum (e_i - \\bar e)^2}", filled: `r_1 = ${texNumber(correlation)}`, value: correlation, unit: "1" },
      { text: "Inflated", formula: "s'_\\Gamma = s_\\Gamma \\sqrt{\\frac{1 + r_1}{1 - r_1}}", filled: `s'_\\Gamma = ${texNumber(error2 * 1e3)} \\times ${texNumber(factor)}\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    perMeterSlip,
    per100MetersSlip,
    fineSlip("not-inflated", "not inflated", "This is the standard error for independent rows: neighbors here have much in common.", (inputs2) => plainError(inputs2)),
    fineSlip("root-left-out", "root left out", "This multiplies by (1 + r₁)/(1 − r₁) without its root.", (inputs2, _c, right) => right * (factorOf2(inputs2) ?? 1)),
    fineSlip("inverted-factor", "factor turned over", "This divides by the factor: correlated rows tell less, and the error grows.", (inputs2) => {
      const error2 = plainError(inputs2), factor = factorOf2(inputs2);
      return error2 === null || factor === null ? null : error2 / factor;
    })
  ],
  example: { inputs: { height: [0, 10, 20, 30, 40, 50, 60, 70], temperature: [290, 290.1, 290.2, 289.9, 289.4, 289.1, 289.1, 289.3] }, gives: 0.0105381, within: 1e-7 }
};
function plainError(inputs2) {
  const interval = theilSenInterval(inputs2);
  return interval && (interval.high - interval.low) / (2 * normalPoint);
}
var correlationOf2 = (inputs2) => lagOneCorrelationAbout(inputs2, theilSenRate(inputs2).rate);
function factorOf2(inputs2) {
  const correlation = correlationOf2(inputs2);
  return correlation === null ? null : inflation(correlation);
}

// shared/thermo/bins.ts
var binInputs = [
  ...layerInputs2(3),
  { name: "binDepth", label: "depth of a bin", symbol: "d", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [0.5, 5e3] },
  { name: "binStart", label: "a height at which a bin begins", symbol: "z₀", unit: "m", shownUnit: "m", kind: "difference", shape: "number", range: [-500, 1e5] }
];
var boundSlack = 1e-9;
function binnedRows(inputs2) {
  const z4 = heightsOf(inputs2), T11 = temperaturesOf(inputs2), depth = numberOf(inputs2, "binDepth"), start5 = numberOf(inputs2, "binStart");
  const rowsOf = /* @__PURE__ */ new Map();
  z4.forEach((height2, at) => {
    const bin = Math.floor((height2 - start5) / depth + boundSlack);
    const rows = rowsOf.get(bin);
    if (rows) rows.push(at);
    else rowsOf.set(bin, [at]);
  });
  const bins = [...rowsOf].sort(([a], [b]) => a - b);
  if (bins.length < 2) throw new SeriesError("height", "all rows lie in one bin; a lapse rate needs two");
  const meanOf = (column, rows) => rows.reduce((sum, at) => sum + (column[at] ?? 0), 0) / rows.length;
  const center = (bin) => start5 + (bin + 0.5) * depth;
  const filled = new Set(rowsOf.keys()), [lowest = 0] = bins[0] ?? [], [highest = 0] = bins[bins.length - 1] ?? [];
  const emptyBetween = [];
  if (highest - lowest < 1e4) {
    for (let bin = lowest + 1; bin < highest; bin++) if (!filled.has(bin)) emptyBetween.push(center(bin));
  }
  return {
    height: bins.map(([, rows]) => meanOf(z4, rows)),
    temperature: bins.map(([, rows]) => meanOf(T11, rows)),
    counts: bins.map(([, rows]) => rows.length),
    centers: bins.map(([bin]) => center(bin)),
    emptyBetween
  };
}

// shared/thermo/quantities/lapseRateBinnedLeastSquares.ts
var lapseRateBinnedLeastSquaresDefinition = {
  key: "lapse-rate-binned-least-squares",
  name: "lapse rate of a layer by least squares over bins of height",
  symbol: "Γ",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: binInputs,
  variants: [{
    key: "bin-means",
    label: "ordinary least squares over the means of the bins",
    source: { text: "ordinary least squares; NIST StRD linear regression for the arithmetic", status: "common practice" },
    validity: "any layer with two bins that have rows",
    knownError: "none: the rows and the bins alone decide",
    evaluate(inputs2) {
      const { counts, emptyBetween } = binnedRows(inputs2), line = fit(inputs2);
      const notes = emptyBetween.length > 0 ? [`${emptyBetween.length} ${emptyBetween.length === 1 ? "bin has" : "bins have"} no row and ${emptyBetween.length === 1 ? "is" : "are"} left out.`] : void 0;
      return { is: "value", value: -line.slope, notes, more: { bins: counts.length, rows: counts.reduce((sum, one2) => sum + one2, 0), standardError: line.slopeError ?? 0 } };
    }
  }],
  constants: [],
  classLimits: dryClassLimits,
  ask: "The lapse rate Γ = −dT/dz by ordinary least squares over bins of height, positive where temperature falls with height: each bin holds the rows from its lower bound up to, and without, its upper bound, and stands with the mean height and the mean temperature of its rows; bins count alike, and those without rows are left out.",
  trace(inputs2) {
    const { counts, height: height2, temperature: temperature6 } = binnedRows(inputs2), line = fit(inputs2), value23 = -line.slope, last = counts.length - 1;
    return [
      { text: `Means of the ${counts.length} bins, which hold ${counts.join(", ")} rows`, formula: "z_b = \\frac{1}{n_b} \\sum z,\\quad T_b = \\frac{1}{n_b} \\sum T", filled: `z_1 = ${texQuantity(height2[0] ?? 0, "m", 6)},\\ T_1 = ${texQuantity((temperature6[0] ?? 0) - zeroCelsius, "Cel")};\\quad z_{${last + 1}} = ${texQuantity(height2[last] ?? 0, "m", 6)},\\ T_{${last + 1}} = ${texQuantity((temperature6[last] ?? 0) - zeroCelsius, "Cel")}` },
      { text: "Sums about the means of the bins", formula: "\\sum (z_b - \\bar z)^2,\\ \\sum (z_b - \\bar z)(T_b - \\bar T)", filled: `\\sum (z_b - \\bar z)^2 = ${texNumber(line.sumXX)}\\,\\mathrm{m^2},\\quad \\sum (z_b - \\bar z)(T_b - \\bar T) = ${texNumber(line.sumXY)}\\,\\mathrm{K\\,m}` },
      { text: "Lapse rate", formula: "\\Gamma = -\\frac{\\sum (z_b - \\bar z)(T_b - \\bar T)}{\\sum (z_b - \\bar z)^2}", filled: `\\Gamma = -\\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height: it is the slope of T on z with its sign turned."),
    perMeterSlip,
    per100MetersSlip,
    fineSlip("as-served", "rows fitted as served", "This is the fit through all rows as they are: the ask takes the means of the bins, each counted once.", (inputs2) => -lineOf(inputs2).slope),
    fineSlip("bin-centers", "centers of the bins in place of mean heights", "This puts each bin at its center: it stands at the mean height of its rows.", (inputs2) => {
      const { centers, temperature: temperature6 } = binnedRows(inputs2), line = straightLine(centers, temperature6);
      return line && -line.slope;
    }),
    slip("empty-as-zero", "empty bins taken for 0 °C", "This takes bins without rows for rows of 0 °C: they are left out.", (inputs2) => {
      const { height: height2, temperature: temperature6, emptyBetween } = binnedRows(inputs2);
      if (emptyBetween.length === 0) return null;
      const line = straightLine([...height2, ...emptyBetween], [...temperature6, ...emptyBetween.map(() => zeroCelsius)]);
      return line && -line.slope;
    }),
    fineSlip("end-points", "end points in place of a fit", "This is the rate between the lowest and the highest row alone: the ask takes a fit through the bins.", (inputs2) => endPointRate(endsOf(inputs2)))
  ],
  example: {
    inputs: { height: [100, 150, 150, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.55, 287.55, 287.25, 286.85, 286.05], binDepth: 50, binStart: 75 },
    gives: 993333e-8,
    within: 1e-8
  }
};
function fit(inputs2) {
  const { height: height2, temperature: temperature6 } = binnedRows(inputs2), line = straightLine(height2, temperature6);
  if (!line) throw new SeriesError("height", "the bins have no two heights; a lapse rate needs a layer");
  return line;
}

// shared/thermo/virtualLayer.ts
var virtualTemperatureKey = "virtual-temperature";
function moistLayerInputs(least2) {
  return [
    ...layerInputs2(least2),
    { name: "mixingRatio", label: "mixing ratios of the rows", symbol: "w", unit: "1", shownUnit: "g/kg", kind: "ratio", shape: "series", range: [0, 0.2], needs: { least: least2, order: "none" } }
  ];
}
function virtualRows(inputs2, constants, formulae) {
  const w2 = seriesOf(inputs2, "mixingRatio"), epsilon = epsilonOf(constants), isLinear = formulae.variants[virtualTemperatureKey] === "linear";
  const temperature6 = temperaturesOf(inputs2).map((T11, at) => {
    const ratio2 = w2[at] ?? 0;
    return isLinear ? T11 * (1 + 0.61 * ratio2) : virtualTemperatureFrom(T11, ratio2, epsilon);
  });
  return { height: heightsOf(inputs2), temperature: temperature6 };
}
var plainRows = (inputs2) => ({ height: heightsOf(inputs2), temperature: temperaturesOf(inputs2) });
function rowsVirtualInCelsius(inputs2, constants, formulae) {
  const celsius3 = temperaturesOf(inputs2).map((T11) => T11 - zeroCelsius4);
  const { temperature: temperature6 } = virtualRows({ ...inputs2, temperature: celsius3 }, constants, formulae);
  return { height: heightsOf(inputs2), temperature: Array.isArray(temperature6) ? temperature6.map((T11) => T11 + zeroCelsius4) : [] };
}
var zeroCelsius4 = 273.15;

// shared/thermo/virtualLapseRateDefinition.ts
function virtualLapseRateDefinition({ least: least2, formula, rate: rate7, beside, steps: steps2, otherMethods, ...named2 }) {
  return {
    ...named2,
    symbol: "Γ_v",
    unit: "K/m",
    shownUnit: "K/km",
    kind: "difference",
    nearZero: 1e-3,
    inputs: moistLayerInputs(least2),
    variants: [{
      ...formula,
      evaluate: (inputs2, constants, formulae) => {
        const rows = virtualRows(inputs2, constants, formulae);
        return { is: "value", value: rate7(rows), ...beside?.(rows) };
      }
    }],
    constants: ["R", "Rv"],
    uses: [virtualTemperatureKey],
    classLimits: dryClassLimits,
    trace(inputs2, constants, _variant, formulae) {
      const rows = virtualRows(inputs2, constants, formulae);
      return [virtualStep(rows, formulae.variants[virtualTemperatureKey] === "linear"), ...steps2(rows, rate7(rows))];
    },
    slips: [
      signSlip("A lapse rate is positive where the virtual temperature falls with height; the layer may also have been taken upside down."),
      perMeterSlip,
      per100MetersSlip,
      fineSlip("plain-temperature", "T in place of Tv", "This is the lapse rate of the temperature itself: the ask takes the virtual temperature, with the vapor of each row.", (inputs2) => rate7(plainRows(inputs2))),
      fineSlip("celsius-for-kelvin", "Tv made of °C", "This comes from virtual temperatures that were made with T in °C: the factor belongs to kelvin.", (inputs2, constants, _right, formulae) => rate7(rowsVirtualInCelsius(inputs2, constants, formulae))),
      ...otherMethods.map(({ key, label, sentence, rate: other2 }) => fineSlip(key, label, sentence, (inputs2, constants, _right, formulae) => other2(virtualRows(inputs2, constants, formulae))))
    ]
  };
}
function virtualStep(rows, isLinear) {
  const T11 = Array.isArray(rows.temperature) ? rows.temperature : [];
  const [first3 = 0, last = 0] = [T11[0], T11[T11.length - 1]];
  return {
    text: `Virtual temperatures of the ${T11.length} rows, with T in kelvin and w in kg per kg`,
    formula: isLinear ? "T_v = T\\,(1 + 0.61\\,w)" : "T_v = T\\,\\frac{1 + w/\\varepsilon}{1 + w}",
    filled: `T_{v,1} = ${texQuantity(first3, "K", 6)},\\quad T_{v,${T11.length}} = ${texQuantity(last, "K", 6)}`
  };
}

// shared/thermo/quantities/virtualTemperatureLapseRateEndPoints.ts
var virtualTemperatureLapseRateEndPointsDefinition = virtualLapseRateDefinition({
  key: "virtual-temperature-lapse-rate-end-points",
  name: "lapse rate of virtual temperature by end points",
  least: 2,
  formula: {
    key: "end-points",
    label: "lowest and highest row",
    source: { text: 'AMS Glossary of Meteorology, "virtual temperature" and "lapse rate"', status: "common practice" },
    validity: "any layer with two heights",
    knownError: "1 + 0.61 w for the exact factor: 0.01 K km⁻¹ where w falls by 8 g kg⁻¹ in a kilometer"
  },
  rate: (rows) => endPointRate(endsOf(rows)),
  beside(rows) {
    const ends = endsOf(rows);
    const notes = ends.lowCount > 1 || ends.highCount > 1 ? ["Several rows share an end’s height; their mean is used."] : void 0;
    return { notes, more: { lowHeight: ends.lowHeight, highHeight: ends.highHeight } };
  },
  ask: "The lapse rate Γv = −ΔTv/Δz of the virtual temperature between the lowest and the highest of your rows, positive where it falls with height; make each row’s temperature virtual with its mixing ratio first.",
  steps(rows, value23) {
    const ends = endsOf(rows), change2 = ends.highTemperature - ends.lowTemperature, depth = ends.highHeight - ends.lowHeight;
    return [
      { text: "Lowest and highest row", formula: "z_1,\\,T_{v1};\\quad z_2,\\,T_{v2}", filled: `z_1 = ${texQuantity(ends.lowHeight, "m", 6)},\\ T_{v1} = ${texQuantity(ends.lowTemperature, "K", 6)};\\quad z_2 = ${texQuantity(ends.highHeight, "m", 6)},\\ T_{v2} = ${texQuantity(ends.highTemperature, "K", 6)}` },
      { text: "Lapse rate", formula: "\\Gamma_v = -\\frac{T_{v2} - T_{v1}}{z_2 - z_1}", filled: `\\Gamma_v = -\\frac{${texFactor(change2)}\\,\\mathrm{K}}{${texNumber(depth / 1e3, 6)}\\,\\mathrm{km}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  otherMethods: [
    { key: "least-squares", label: "a fit in place of the end points", sentence: "This is the slope of a straight line through all rows: the ask takes the lowest and the highest row alone.", rate: (rows) => -lineOf(rows).slope },
    { key: "theil-sen", label: "the median of the pairs in place of the end points", sentence: "This is the median of the slopes between all pairs: the ask takes the lowest and the highest row alone.", rate: (rows) => theilSenRate(rows).rate }
  ],
  example: { inputs: { height: [0, 500], temperature: [288.15, 284.15], mixingRatio: [0.012, 8e-3] }, gives: 941e-5, within: 5e-6 }
});

// shared/thermo/quantities/virtualTemperatureLapseRateLeastSquares.ts
var virtualTemperatureLapseRateLeastSquaresDefinition = virtualLapseRateDefinition({
  key: "virtual-temperature-lapse-rate-least-squares",
  name: "lapse rate of virtual temperature by least squares",
  least: 3,
  formula: {
    key: "ordinary",
    label: "ordinary least squares of Tv on z",
    source: { text: 'AMS Glossary of Meteorology, "virtual temperature"; ordinary least squares', status: "common practice" },
    validity: "any layer with two heights",
    knownError: "1 + 0.61 w for the exact factor: 0.01 K km⁻¹ where w falls by 8 g kg⁻¹ in a kilometer"
  },
  rate: (rows) => -lineOf(rows).slope,
  beside(rows) {
    const line = lineOf(rows);
    return { more: { rSquared: line.rSquared ?? 0, standardError: line.slopeError ?? 0, count: line.count } };
  },
  ask: "The lapse rate Γv = −dTv/dz of the virtual temperature by ordinary least squares on height over all your rows, positive where it falls with height; make each row’s temperature virtual with its mixing ratio first.",
  steps(rows, value23) {
    const line = lineOf(rows);
    return [
      { text: `Means of the ${line.count} rows`, formula: "\\bar z,\\ \\bar T_v", filled: `\\bar z = ${texQuantity(line.meanX, "m", 6)},\\quad \\bar T_v = ${texQuantity(line.meanY, "K", 6)}` },
      { text: "Sums about the means", formula: "\\sum (z - \\bar z)^2,\\ \\sum (z - \\bar z)(T_v - \\bar T_v)", filled: `\\sum (z - \\bar z)^2 = ${texNumber(line.sumXX)}\\,\\mathrm{m^2},\\quad \\sum (z - \\bar z)(T_v - \\bar T_v) = ${texNumber(line.sumXY)}\\,\\mathrm{K\\,m}` },
      { text: "Lapse rate", formula: "\\Gamma_v = -\\frac{\\sum (z - \\bar z)(T_v - \\bar T_v)}{\\sum (z - \\bar z)^2}", filled: `\\Gamma_v = -\\frac{${texNumber(line.sumXY)}}{${texNumber(line.sumXX)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  otherMethods: [
    { key: "end-points", label: "end points in place of a fit", sentence: "This is the rate between the lowest and the highest row alone: the ask takes a fit through all rows.", rate: (rows) => endPointRate(endsOf(rows)) },
    { key: "theil-sen", label: "the median of the pairs in place of a fit", sentence: "This is the median of the slopes between all pairs: the ask takes a fit by least squares.", rate: (rows) => theilSenRate(rows).rate }
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05], mixingRatio: [9e-3, 88e-4, 85e-4, 81e-4, 76e-4] }, gives: 0.0114532, within: 1e-7 }
});

// shared/thermo/quantities/virtualTemperatureLapseRateTheilSen.ts
var virtualTemperatureLapseRateTheilSenDefinition = virtualLapseRateDefinition({
  key: "virtual-temperature-lapse-rate-theil-sen",
  name: "lapse rate of virtual temperature by the Theil–Sen estimator",
  least: 3,
  formula: {
    key: "median-of-pairs",
    label: "median of the slopes between all pairs of rows",
    source: { text: 'Sen (1968), J. Amer. Statist. Assoc. 63, 1379–1389, section 4; AMS Glossary of Meteorology, "virtual temperature"', status: "from memory" },
    validity: "any layer with two heights, 3 to 3000 rows",
    knownError: "1 + 0.61 w for the exact factor: 0.01 K km⁻¹ where w falls by 8 g kg⁻¹ in a kilometer"
  },
  rate: (rows) => theilSenRate(rows).rate,
  beside(rows) {
    const { pairs, tiedPairs } = theilSenRate(rows);
    return { notes: tiedPairs > 0 ? [`${tiedPairs} pairs of rows at one height are left out.`] : void 0, more: { pairs } };
  },
  ask: "The lapse rate Γv of the virtual temperature by the Theil–Sen estimator: the median of −ΔTv/Δz over all pairs of your rows, pairs at one height left out, positive where it falls with height; make each row’s temperature virtual with its mixing ratio first.",
  steps(rows, value23) {
    const { pairs } = theilSenRate(rows);
    return [
      { text: "Slopes between all pairs of rows at different heights", formula: "\\Gamma_{ij} = -\\frac{T_{v,j} - T_{v,i}}{z_j - z_i},\\quad i < j", filled: `N = ${pairs}` },
      { text: "Their median", formula: "\\Gamma_v = \\mathrm{median}\\,\\Gamma_{ij}", filled: `\\Gamma_v = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  otherMethods: [
    { key: "least-squares", label: "least squares in place of the median", sentence: "This is the slope by least squares: the ask takes the median of the slopes between all pairs.", rate: (rows) => -lineOf(rows).slope },
    { key: "end-points", label: "end points in place of the median", sentence: "This is the rate between the lowest and the highest row alone: the ask takes all pairs.", rate: (rows) => endPointRate(endsOf(rows)) }
  ],
  example: { inputs: { height: [100, 150, 200, 250, 300], temperature: [288.15, 287.75, 287.25, 286.85, 286.05], mixingRatio: [9e-3, 88e-4, 85e-4, 81e-4, 76e-4] }, gives: 0.01066564, within: 1e-8 }
});

// shared/thermo/quantities/staticStabilityByVirtualTemperature.ts
var rate3 = (inputs2) => numberOf(inputs2, "virtualLapseRate");
var staticStabilityByVirtualTemperatureDefinition = {
  key: "static-stability-by-virtual-temperature",
  name: "static stability of an unsaturated layer by virtual temperature",
  symbol: "class",
  unit: "1",
  shownUnit: "1",
  kind: "class",
  inputs: [virtualRateInput],
  variants: [{
    key: "against-dry-rate",
    label: "Γv against Γd",
    source: { text: 'AMS Glossary of Meteorology, "static stability"', status: "common practice" },
    validity: "an unsaturated layer",
    knownError: "Γd is 9.75 to 9.80 K km⁻¹ by the constants taught; in Tv that of moist air is 0.04 K km⁻¹ smaller at 15 g kg⁻¹",
    evaluate: (inputs2, constants) => ({ is: "class", key: staticStability(rate3(inputs2), constants), more: { dryRate: dryRateOf(constants) } })
  }],
  constants: staticStabilityDefinition.constants,
  classLimits: dryClassLimits,
  classes: staticStabilityDefinition.classes,
  ask: "The static stability of the unsaturated layer by the lapse rate Γv of its virtual temperature against Γd: stable, dry-neutral (Γv within 0.1 K/km of Γd) or superadiabatic.",
  trace(inputs2, constants) {
    const limit = dryRateOf(constants), key = staticStability(rate3(inputs2), constants);
    const sign = key === "stable" ? "<" : key === "superadiabatic" ? ">" : "\\approx";
    return [
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(limit * 1e3, "K/km")}`, value: limit, unit: "K/m" },
      { text: `The layer is ${key}, with a tolerance of ${Number((constant(constants, "neutralTolerance") * 1e3).toPrecision(3))} K/km`, formula: "\\Gamma_v \\lessgtr \\Gamma_d", filled: `${texNumber(rate3(inputs2) * 1e3)} ${sign} ${texQuantity(limit * 1e3, "K/km")}`, value: rate3(inputs2), unit: "K/m" }
    ];
  },
  slips: [],
  example: { inputs: { virtualLapseRate: 941e-5 }, gives: "stable", within: 0 }
};

// shared/thermo/quantities/virtualPotentialTemperatureGradient.ts
var rate4 = (inputs2) => numberOf(inputs2, "virtualLapseRate");
var theta4 = (inputs2) => numberOf(inputs2, "virtualPotentialTemperature");
var Tv4 = (inputs2) => numberOf(inputs2, "virtualTemperature");
var value21 = (inputs2, constants) => potentialTemperatureGradient(kelvin(Tv4(inputs2)), kelvin(theta4(inputs2)), kelvinPerMeter(rate4(inputs2)), constants);
var virtualPotentialTemperatureGradientDefinition = oneFormula({
  key: "virtual-potential-temperature-gradient",
  name: "gradient of virtual potential temperature from a lapse rate of virtual temperature",
  symbol: "dθv/dz",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [
    virtualTemperatureInput("virtual temperature"),
    { name: "virtualPotentialTemperature", label: "virtual potential temperature", symbol: "θv", unit: "K", shownUnit: "K", kind: "temperature", shape: "number", range: [150, 800] },
    virtualRateInput
  ],
  constants: ["g", "cp"],
  formula: {
    key: "hydrostatic",
    label: "(θv/Tv)(Γd − Γv)",
    source: { text: "closed form: Poisson’s relation of Tv differentiated with the hydrostatic equation", status: "verified" },
    validity: "unsaturated hydrostatic air",
    knownError: "κ of dry air for that of moist air: 0.04 K km⁻¹ at 15 g kg⁻¹"
  },
  classLimits: () => [{ label: "neutral", value: 0 }],
  ask: "The gradient of virtual potential temperature dθv/dz = (θv/Tv)(Γd − Γv) from the lapse rate Γv of the virtual temperature, positive where θv rises with height.",
  value: value21,
  working(inputs2, constants, result2) {
    const dry = dryRateOf(constants);
    return [
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(dry * 1e3, "K/km")}`, value: dry, unit: "K/m" },
      { text: "Gradient", formula: "\\frac{d\\theta_v}{dz} = \\frac{\\theta_v}{T_v} (\\Gamma_d - \\Gamma_v)", filled: `\\frac{d\\theta_v}{dz} = \\frac{${texNumber(theta4(inputs2), 6)}}{${texNumber(Tv4(inputs2), 6)}} \\times (${texNumber(dry * 1e3)} - ${texFactor(rate4(inputs2) * 1e3)})\\,\\mathrm{K\\,km^{-1}} = ${texQuantity(result2 * 1e3, "K/km")}`, value: result2, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("θv rises with height where the layer is stable, Γv < Γd."),
    perMeterSlip,
    per100MetersSlip,
    fineSlip("ratio-left-out", "θv/Tv left out", "The factor θv/Tv is left out.", (inputs2, constants) => dryRateOf(constants) - rate4(inputs2)),
    fineSlip("ratio-inverted", "Tv/θv for θv/Tv", "The factor is θv/Tv, not Tv/θv.", (inputs2, constants) => Tv4(inputs2) / theta4(inputs2) * (dryRateOf(constants) - rate4(inputs2))),
    slip("gradient-sign", "Γd + Γv for Γd − Γv", "The lapse rate went in with its sign turned: Γv is positive where the virtual temperature falls with height.", (inputs2, constants) => theta4(inputs2) / Tv4(inputs2) * (dryRateOf(constants) + rate4(inputs2))),
    slip("dry-rate-left-out", "Γd left out", "The dry adiabatic lapse rate is left out: this is a gradient of temperature.", (inputs2) => -rate4(inputs2) * theta4(inputs2) / Tv4(inputs2))
  ],
  example: { inputs: { virtualTemperature: 290, virtualPotentialTemperature: 293, virtualLapseRate: 941e-5 }, gives: 36465e-8, within: 1e-8 }
});

// shared/thermo/quantities/bruntVaisalaFrequencySquaredFromVirtualLapseRate.ts
var rate5 = (inputs2) => numberOf(inputs2, "virtualLapseRate");
var Tv5 = (inputs2) => numberOf(inputs2, "virtualTemperature");
var value22 = (inputs2, constants) => bruntVaisalaSquaredFromLapseRate(kelvin(Tv5(inputs2)), kelvinPerMeter(rate5(inputs2)), constants);
var bruntVaisalaFrequencySquaredFromVirtualLapseRateDefinition = oneFormula({
  key: "brunt-vaisala-frequency-squared-from-virtual-lapse-rate",
  name: "Brunt–Väisälä frequency squared from a lapse rate of virtual temperature",
  symbol: "N²",
  unit: "s-2",
  shownUnit: "s-2",
  kind: "difference",
  nearZero: 1e-5,
  inputs: [virtualTemperatureInput("mean virtual temperature of the layer"), virtualRateInput],
  constants: ["g", "cp"],
  formula: {
    key: "unsaturated",
    label: "(g/Tv)(Γd − Γv)",
    source: { text: 'AMS Glossary of Meteorology, "Brunt–Väisälä frequency"', status: "common practice" },
    validity: "unsaturated air",
    knownError: "κ of dry air for that of moist air: 1.2·10⁻⁶ s⁻² at 15 g kg⁻¹"
  },
  classLimits: (inputs2, constants) => dryClassLimits(inputs2, constants).map(({ label, value: limit }) => ({ label, value: constant(constants, "g") / Tv5(inputs2) * (dryRateOf(constants) - limit) })),
  ask: "The Brunt–Väisälä frequency squared N² = (g/Tv)(Γd − Γv) of the unsaturated layer from the lapse rate Γv of its virtual temperature, with Γd = g/cp, negative where the layer is superadiabatic.",
  value: value22,
  working(inputs2, constants, result2) {
    const dry = dryRateOf(constants);
    return [
      { text: "Dry adiabatic lapse rate", formula: "\\Gamma_d = \\frac{g}{c_p}", filled: `\\Gamma_d = ${texQuantity(dry * 1e3, "K/km")}`, value: dry, unit: "K/m" },
      { text: "Frequency squared", formula: "N^2 = \\frac{g}{T_v} (\\Gamma_d - \\Gamma_v)", filled: `N^2 = \\frac{${texNumber(constant(constants, "g"), 6)}}{${texNumber(Tv5(inputs2), 6)}} \\times (${texNumber(dry)} - ${texFactor(rate5(inputs2))})\\,\\mathrm{s^{-2}} = ${texQuantity(result2, "s-2")}`, value: result2, unit: "s-2" }
    ];
  },
  slips: [
    signSlip("N² is positive where the layer is stable, Γv < Γd."),
    slip("gradient-sign", "Γd + Γv for Γd − Γv", "The lapse rate went in with its sign turned: Γv is positive where the virtual temperature falls with height.", (inputs2, constants) => constant(constants, "g") / Tv5(inputs2) * (dryRateOf(constants) + rate5(inputs2))),
    slip("celsius-for-kelvin", "°C in place of K", "The virtual temperature went in in degrees Celsius: it has to be in kelvin.", (inputs2, _c, right) => Tv5(inputs2) === zeroCelsius ? null : right * Tv5(inputs2) / (Tv5(inputs2) - zeroCelsius)),
    slip("per-kilometer", "K km⁻¹ in place of K m⁻¹", "The lapse rates went in in K per kilometer: per meter is needed.", (_i, _c, right) => right * 1e3),
    slip("dry-rate-left-out", "Γd left out", "The dry adiabatic lapse rate is left out: a layer is neutral at Γd, not at 0.", (inputs2, constants) => -constant(constants, "g") / Tv5(inputs2) * rate5(inputs2)),
    slip("gravity-left-out", "g left out", "The acceleration of gravity is left out.", (_i, constants, right) => right / constant(constants, "g"))
  ],
  example: { inputs: { virtualTemperature: 288, virtualLapseRate: 941e-5 }, gives: 1229371e-11, within: 1e-11 }
});

// shared/thermo/groups/profiles.ts
var profiles = {
  key: "profiles",
  title: "Profiles",
  quantities: [
    lapseRateEndPointsDefinition,
    lapseRateEndPointsStandardErrorDefinition,
    lapseRateEndPointsLagOneCorrelationDefinition,
    lapseRateEndPointsInflatedStandardErrorDefinition,
    lapseRateLeastSquaresDefinition,
    lapseRateStandardErrorDefinition,
    fittedTemperatureAtZeroHeightDefinition,
    lapseRateTheilSenDefinition,
    lapseRateTheilSenStandardErrorDefinition,
    lapseRateTheilSenLagOneCorrelationDefinition,
    lapseRateTheilSenInflatedStandardErrorDefinition,
    lapseRateLagOneCorrelationDefinition,
    lapseRateInflatedStandardErrorDefinition,
    lapseRateBinnedLeastSquaresDefinition,
    virtualTemperatureLapseRateEndPointsDefinition,
    virtualTemperatureLapseRateLeastSquaresDefinition,
    virtualTemperatureLapseRateTheilSenDefinition,
    staticStabilityDefinition,
    staticStabilityByVirtualTemperatureDefinition,
    layerStabilityDefinition,
    potentialStabilityDefinition,
    equivalentPotentialTemperatureGradientDefinition,
    potentialTemperatureGradientDefinition,
    virtualPotentialTemperatureGradientDefinition,
    bruntVaisalaFrequencySquaredDefinition,
    bruntVaisalaFrequencySquaredFromLapseRateDefinition,
    bruntVaisalaFrequencySquaredFromVirtualLapseRateDefinition,
    bruntVaisalaFrequencyDefinition,
    gradientRichardsonNumberDefinition,
    bulkRichardsonNumberDefinition,
    bulkRichardsonNumberFromWindsDefinition,
    vectorWindDifferenceDefinition,
    inversionBaseDefinition,
    inversionTopDefinition,
    inversionStrengthDefinition,
    mixedLayerDepthParcelDefinition,
    mixedLayerDepthBulkRichardsonDefinition,
    mixedLayerDepthGradientDefinition,
    freezingLevelDefinition
  ]
};

// shared/thermo/observedQuantity.ts
function observedQuantity({ key, measured, symbol, unit, shownUnit, kind, range, nearZero, shown: shown3, slips, example }) {
  const input2 = { name: "station", label: `${measured} by the station`, symbol, unit, shownUnit, kind, shape: "number", range };
  return oneFormula({
    key,
    name: `own reading of the ${measured}`,
    symbol,
    unit,
    shownUnit,
    kind,
    ...nearZero === void 0 ? {} : { nearZero },
    inputs: [input2],
    constants: [],
    formula: {
      key: "beside-the-station",
      label: "compared with the station",
      source: { text: "WMO-No. 8, vol. I, ch. 1: two instruments compared within their stated uncertainties", status: "common practice" },
      validity: "read at the station, at the time that is asked",
      knownError: "the accuracies of both instruments, which the lab states"
    },
    value: (inputs2) => numberOf(inputs2, "station"),
    ask: `Your own reading of the ${measured}, on the instrument you were given, at the place and time stated.`,
    working: (_inputs, _constants, value23) => [{ text: "The station read", formula: symbol, filled: `${symbol} = ${texQuantity(shown3(value23), shownUnit)}`, value: value23, unit }],
    slips,
    example: { inputs: { station: example }, gives: example, within: 0 }
  });
}

// shared/thermo/quantities/observedAirTemperature.ts
var observedAirTemperatureDefinition = observedQuantity({
  key: "observed-air-temperature",
  measured: "air temperature",
  symbol: "T",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  range: [200, 335],
  shown: (si) => si - zeroCelsius,
  slips: [slip("fahrenheit", "°F given as °C", "Your number fits the scale in degrees Fahrenheit; the unit beside it says Celsius.", (_i, _c, right) => (right - zeroCelsius) * 1.8 + 32 + zeroCelsius)],
  example: 293.15
});

// shared/thermo/quantities/observedPressure.ts
var observedPressureDefinition = observedQuantity({
  key: "observed-pressure",
  measured: "pressure",
  symbol: "p",
  unit: "Pa",
  shownUnit: "hPa",
  kind: "ratio",
  range: [3e4, 11e4],
  shown: (si) => si / 100,
  slips: [
    slip("millimeters-of-mercury", "mmHg given as hPa", "Your number fits the scale in millimeters of mercury; the unit beside it says hPa.", (_i, _c, right) => right / 1.333224),
    slip("inches-of-mercury", "inHg given as hPa", "Your number fits the scale in inches of mercury; the unit beside it says hPa.", (_i, _c, right) => right / 33.86389)
  ],
  example: 98e3
});

// shared/thermo/quantities/observedRelativeHumidity.ts
var observedRelativeHumidityDefinition = observedQuantity({
  key: "observed-relative-humidity",
  measured: "relative humidity",
  symbol: "U",
  unit: "1",
  shownUnit: "%",
  kind: "fraction",
  range: [0, 1.1],
  nearZero: 0.05,
  shown: (si) => si * 100,
  slips: [slip("dryness", "100 % less the reading", "This is what is missing to 100 %.", (_i, _c, right) => 1 - right)],
  example: 0.65
});

// shared/thermo/quantities/observedWetBulbTemperature.ts
var observedWetBulbTemperatureDefinition = observedQuantity({
  key: "observed-wet-bulb-temperature",
  measured: "wet-bulb temperature",
  symbol: "T_w",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  range: [200, 335],
  shown: (si) => si - zeroCelsius,
  slips: [slip("fahrenheit", "°F given as °C", "Your number fits the scale in degrees Fahrenheit; the unit beside it says Celsius.", (_i, _c, right) => (right - zeroCelsius) * 1.8 + 32 + zeroCelsius)],
  example: 288.15
});

// shared/thermo/quantities/observedWindSpeed.ts
var observedWindSpeedDefinition = observedQuantity({
  key: "observed-wind-speed",
  measured: "wind speed",
  symbol: "V",
  unit: "m/s",
  shownUnit: "m/s",
  kind: "ratio",
  range: [0, 75],
  nearZero: 0.5,
  shown: (si) => si,
  slips: [
    slip("knots", "knots given as m/s", "Your number fits the scale in knots; the unit beside it says meters per second.", (_i, _c, right) => right / 0.514444),
    slip("kilometers-per-hour", "km/h given as m/s", "Your number fits the scale in kilometers per hour; the unit beside it says meters per second.", (_i, _c, right) => right * 3.6)
  ],
  example: 4.2
});

// shared/thermo/quantities/lapseRateOfTwoReadings.ts
var lapseRateOfTwoReadingsDefinition = oneFormula({
  key: "lapse-rate-of-two-readings",
  name: "lapse rate between two readings",
  symbol: "Γ",
  unit: "K/m",
  shownUnit: "K/km",
  kind: "difference",
  nearZero: 1e-3,
  inputs: [
    lengthInput("lowerHeight", "height of the lower reading", "z₁", [-500, 1e5]),
    temperatureInput("lowerTemperature", "temperature of the lower reading", "T₁"),
    lengthInput("upperHeight", "height of the upper reading", "z₂", [-500, 1e5]),
    temperatureInput("upperTemperature", "temperature of the upper reading", "T₂")
  ],
  constants: [],
  classLimits: dryClassLimits,
  formula: {
    key: "difference",
    label: "difference quotient of two readings",
    source: { text: 'AMS Glossary of Meteorology, "lapse rate", as a difference quotient', status: "common practice" },
    validity: "two heights that differ",
    knownError: "what the two readings are good to"
  },
  value: rate6,
  ask: "The lapse rate Γ = −(T₂ − T₁)/(z₂ − z₁) between the two readings, positive where temperature falls with height.",
  working(inputs2, _constants, value23) {
    const [z1, T12, z22, T23] = given7(inputs2);
    return [
      { text: "Differences", formula: "T_2 - T_1,\\quad z_2 - z_1", filled: `T_2 - T_1 = ${texQuantity(T23 - T12, "K")},\\quad z_2 - z_1 = ${texQuantity(z22 - z1, "m", 6)}` },
      { text: "Lapse rate", formula: "\\Gamma = -\\frac{T_2 - T_1}{z_2 - z_1}", filled: `\\Gamma = -\\frac{${texNumber(T23 - T12)}}{${texNumber(z22 - z1)}}\\,\\mathrm{K\\,m^{-1}} = ${texQuantity(value23 * 1e3, "K/km")}`, value: value23, unit: "K/m" }
    ];
  },
  slips: [
    signSlip("A lapse rate is positive where temperature falls with height: it is the difference quotient with its sign turned."),
    perMeterSlip,
    per100MetersSlip,
    slip("upper-height", "height in place of the difference of heights", "This divides by the upper height: the difference of the two heights is needed.", (inputs2) => {
      const [, T12, z22, T23] = given7(inputs2);
      return z22 === 0 ? null : -(T23 - T12) / z22;
    })
  ],
  example: { inputs: { lowerHeight: 20, lowerTemperature: 291.15, upperHeight: 220, upperTemperature: 289.35 }, gives: 9e-3, within: 1e-12 }
});
var given7 = (inputs2) => [numberOf(inputs2, "lowerHeight"), numberOf(inputs2, "lowerTemperature"), numberOf(inputs2, "upperHeight"), numberOf(inputs2, "upperTemperature")];
function rate6(inputs2) {
  const [z1, T12, z22, T23] = given7(inputs2);
  if (z1 === z22) throw new OutOfRangeError("upperHeight", z22, "a height other than the lower one");
  return -(T23 - T12) / (z22 - z1);
}

// shared/thermo/quantities/profileTemperatureAtHeight.ts
var profileTemperatureAtHeightDefinition = {
  key: "profile-temperature-at-height",
  name: "temperature of a profile at a height",
  symbol: "T(z)",
  unit: "K",
  shownUnit: "Cel",
  kind: "temperature",
  inputs: [...layerInputs2(2), lengthInput("level", "height that is asked for", "z", [-500, 1e5])],
  variants: [{
    key: "linear",
    label: "linear in height between the nearest rows",
    source: { text: "linear interpolation between levels", status: "common practice" },
    validity: "between the lowest and the highest row",
    knownError: "the spacing of the rows",
    evaluate: outcome2
  }],
  constants: [],
  ask: 'The temperature at the given height, linear in height between the nearest row below and the nearest row above; "not reached" where the data do not reach it.',
  trace(inputs2) {
    const found = bracketOf(inputs2), level = numberOf(inputs2, "level");
    if (!found) return [{ text: "The data do not reach the height", formula: "z_{\\min} \\le z \\le z_{\\max}", filled: `z = ${texQuantity(level, "m", 6)}` }];
    const value23 = between2(found, level);
    return [
      { text: "Nearest rows", formula: "z_1,\\,T_1;\\quad z_2,\\,T_2", filled: `z_1 = ${texQuantity(found.lowHeight, "m", 6)},\\ T_1 = ${texQuantity(found.lowTemperature - zeroCelsius, "Cel")};\\quad z_2 = ${texQuantity(found.highHeight, "m", 6)},\\ T_2 = ${texQuantity(found.highTemperature - zeroCelsius, "Cel")}` },
      { text: "Linear between them", formula: "T = T_1 + (T_2 - T_1)\\frac{z - z_1}{z_2 - z_1}", filled: `T = ${texQuantity(value23 - zeroCelsius, "Cel", 5)}`, value: value23, unit: "K" }
    ];
  },
  slips: [
    fineSlip("row-below", "row below in place of interpolation", "This is the row below: the ask goes on linearly to the height.", (inputs2) => bracketOf(inputs2)?.lowTemperature ?? null),
    fineSlip("row-above", "row above in place of interpolation", "This is the row above: the ask stays linear up to the height.", (inputs2) => bracketOf(inputs2)?.highTemperature ?? null),
    fineSlip("parts-exchanged", "parts of the way exchanged", "This goes from the upper row down as far as it should have gone up from the lower one.", (inputs2) => {
      const found = bracketOf(inputs2);
      return found && found.lowTemperature + found.highTemperature - between2(found, numberOf(inputs2, "level"));
    })
  ],
  example: { inputs: { height: [100, 150, 200], temperature: [288.15, 287.75, 287.25], level: 175 }, gives: 287.5, within: 1e-9 }
};
function bracketOf(inputs2) {
  const heights2 = heightsOf(inputs2), temperatures = temperaturesOf(inputs2), level = numberOf(inputs2, "level");
  let low = -1, high2 = -1;
  heights2.forEach((height2, at) => {
    if (height2 <= level && (low < 0 || height2 > (heights2[low] ?? height2))) low = at;
    if (height2 >= level && (high2 < 0 || height2 < (heights2[high2] ?? height2))) high2 = at;
  });
  if (low < 0 || high2 < 0) return null;
  return { lowHeight: heights2[low] ?? level, lowTemperature: temperatures[low] ?? 0, highHeight: heights2[high2] ?? level, highTemperature: temperatures[high2] ?? 0 };
}
var between2 = (rows, level) => rows.highHeight === rows.lowHeight ? rows.lowTemperature : rows.lowTemperature + (rows.highTemperature - rows.lowTemperature) * ((level - rows.lowHeight) / (rows.highHeight - rows.lowHeight));
function outcome2(inputs2) {
  const found = bracketOf(inputs2);
  return found ? { is: "value", value: between2(found, numberOf(inputs2, "level")) } : { is: "not_reached", why: "The data do not reach this height." };
}

// shared/thermo/groups/readings.ts
var readings = {
  key: "readings",
  title: "Readings, off a plot and one’s own",
  quantities: [
    profileTemperatureAtHeightDefinition,
    lapseRateOfTwoReadingsDefinition,
    observedAirTemperatureDefinition,
    observedWetBulbTemperatureDefinition,
    observedPressureDefinition,
    observedRelativeHumidityDefinition,
    observedWindSpeedDefinition
  ]
};

// shared/thermo/registry.ts
var quantityGroups = [dryAir, hydrostatics, moisture, moistProcesses, profiles, parcels, instruments, readings];
var quantities = quantityGroups.flatMap((group) => group.quantities);
var byKey = new Map(quantities.map((definition) => [definition.key, definition]));
var findQuantity = (key) => byKey.get(key) ?? null;

// shared/units/formatQuantity.ts
var minusSign = "−";
var raised2 = ["⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"];
var shownSymbols = {
  "Cel": "°C",
  "[degF]": "°F",
  "[degR]": "°F",
  "[ft_i]": "ft",
  "[in_i]": "in",
  "[mi_i]": "mi",
  "[nmi_i]": "nmi",
  "[kn_i]": "kt",
  "m[Hg]": "mHg",
  "mm[Hg]": "mmHg",
  "[in_i'Hg]": "inHg",
  "[psi]": "psi",
  "[lb_av]": "lb",
  "[ppth]": "‰",
  "[ppm]": "ppm",
  "deg": "°",
  "um": "µm"
};
function unitParts(code) {
  const parts = [];
  let sign = 1;
  const signs = [];
  let pending = 1;
  for (const token of code.match(/\[[^\]]+\]|[A-Za-z%]+(?:\[[^\]]+\])?[+-]?\d?|\[[^\]]+\][+-]?\d?|\d+|[()./]/g) ?? []) {
    if (token === "(") {
      signs.push(sign);
      sign *= pending;
      pending = 1;
    } else if (token === ")") sign = signs.pop() ?? 1;
    else if (token === "/") pending = -1;
    else if (token === ".") pending = 1;
    else {
      const match = /^(.*?)([+-]?\d)?$/.exec(token);
      const symbol = /^\d+$/.test(token) ? token : match?.[1] ?? token;
      const exponent2 = /^\d+$/.test(token) ? 1 : Number(match?.[2] ?? 1);
      if (token !== "1") parts.push({ symbol: shownSymbols[symbol] ?? symbol, exponent: exponent2 * sign * pending });
      pending = 1;
    }
  }
  return parts;
}
function formatUnit(code) {
  return unitParts(code).map(({ symbol, exponent: exponent2 }) => exponent2 === 1 ? symbol : `${symbol}${exponent2 < 0 ? "⁻" : ""}${[...String(Math.abs(exponent2))].map((digit) => raised2[Number(digit)] ?? "").join("")}`).join(" ");
}
function formatDecimal(value23, to2) {
  const exponent2 = leadingExponent(value23);
  const place = "place" in to2 ? to2.place : exponent2 - to2.digits + 1;
  const isPlain = value23.numerator === 0n || exponent2 < 7 && exponent2 > -5;
  if (isPlain) return toPlace(value23, place).replace("-", minusSign);
  const digits = Math.max(1, Math.min(12, exponent2 - place + 1));
  const scale = rational(tenTo(Math.abs(exponent2)));
  const mantissa = exponent2 >= 0 ? rational(value23.numerator, value23.denominator * scale.numerator) : rational(value23.numerator * scale.numerator, value23.denominator);
  const power2 = [...String(Math.abs(exponent2))].map((digit) => raised2[Number(digit)] ?? "").join("");
  return `${toPlace(mantissa, 1 - digits).replace("-", minusSign)}×10${exponent2 < 0 ? "⁻" : ""}${power2}`;
}
function formatQuantity(value23, unit, digits = 3) {
  const number3 = formatDecimal(fromDouble(value23), { digits });
  const text = formatUnit(unit);
  return { number: number3, unit: unitParts(unit), text: text === "" ? number3 : `${number3} ${text}` };
}

// shared/units/dimension.ts
var none = [0, 0, 0, 0, 0];
function combine(a, b, times3 = 1) {
  return [a[0] + times3 * b[0], a[1] + times3 * b[1], a[2] + times3 * b[2], a[3] + times3 * b[3], a[4] + times3 * b[4]];
}
var isSame = (a, b) => a.every((exponent2, at) => exponent2 === b[at]);

// shared/units/ucum.ts
var decimal = (text) => fromDecimal(text) ?? zero;
var length = [1, 0, 0, 0, 0];
var mass2 = [0, 1, 0, 0, 0];
var time = [0, 0, 1, 0, 0];
var temperature5 = [0, 0, 0, 1, 0];
var pressure3 = [-1, 1, -2, 0, 0];
var energy = [2, 1, -2, 0, 0];
var foot = decimal("0.3048");
var fahrenheitStep = rational(5n, 9n);
var atoms = {
  "m": { dimension: length, factor: one, takesPrefix: true },
  "g": { dimension: mass2, factor: decimal("0.001"), takesPrefix: true },
  "s": { dimension: time, factor: one, takesPrefix: true },
  "K": { dimension: temperature5, factor: one, takesPrefix: true },
  "mol": { dimension: [0, 0, 0, 0, 1], factor: one, takesPrefix: true },
  "Cel": { dimension: temperature5, factor: one, offset: decimal("273.15") },
  "[degF]": { dimension: temperature5, factor: fahrenheitStep, offset: times(decimal("459.67"), fahrenheitStep) },
  // a step of °F: a scale with an offset cannot stand in a compound
  "[degR]": { dimension: temperature5, factor: fahrenheitStep },
  "Pa": { dimension: pressure3, factor: one, takesPrefix: true },
  "bar": { dimension: pressure3, factor: decimal("100000"), takesPrefix: true },
  "atm": { dimension: pressure3, factor: decimal("101325") },
  "m[Hg]": { dimension: pressure3, factor: decimal("133322"), takesPrefix: true },
  "[in_i'Hg]": { dimension: pressure3, factor: times(decimal("133322"), decimal("0.0254")) },
  "[psi]": { dimension: pressure3, factor: over(times(decimal("0.45359237"), decimal("9.80665")), times(decimal("0.0254"), decimal("0.0254"))) },
  "J": { dimension: energy, factor: one, takesPrefix: true },
  "cal": { dimension: energy, factor: decimal("4.184"), takesPrefix: true },
  "W": { dimension: [2, 1, -3, 0, 0], factor: one, takesPrefix: true },
  "N": { dimension: [1, 1, -2, 0, 0], factor: one, takesPrefix: true },
  "Hz": { dimension: [0, 0, -1, 0, 0], factor: one, takesPrefix: true },
  "L": { dimension: [3, 0, 0, 0, 0], factor: decimal("0.001"), takesPrefix: true },
  "min": { dimension: time, factor: decimal("60") },
  "h": { dimension: time, factor: decimal("3600") },
  "d": { dimension: time, factor: decimal("86400") },
  "[ft_i]": { dimension: length, factor: foot },
  "[in_i]": { dimension: length, factor: decimal("0.0254") },
  "[mi_i]": { dimension: length, factor: decimal("1609.344") },
  "[nmi_i]": { dimension: length, factor: decimal("1852") },
  "[kn_i]": { dimension: [1, 0, -1, 0, 0], factor: over(decimal("1852"), decimal("3600")) },
  "[lb_av]": { dimension: mass2, factor: decimal("0.45359237") },
  "%": { dimension: none, factor: decimal("0.01") },
  "[ppth]": { dimension: none, factor: decimal("0.001") },
  "[ppm]": { dimension: none, factor: decimal("0.000001") },
  "rad": { dimension: none, factor: one },
  // π to 40 digits: an angle in degrees is the one unit here whose factor is not exact
  "deg": { dimension: none, factor: over(decimal("3.141592653589793238462643383279502884197"), decimal("180")) }
};
var prefixes = {
  G: decimal("1000000000"),
  M: decimal("1000000"),
  k: decimal("1000"),
  h: decimal("100"),
  da: decimal("10"),
  d: decimal("0.1"),
  c: decimal("0.01"),
  m: decimal("0.001"),
  u: decimal("0.000001"),
  n: decimal("0.000000001")
};
function findAtom(code) {
  const plain = Object.hasOwn(atoms, code) ? atoms[code] : void 0;
  if (plain) return plain;
  for (const [prefix, factor] of Object.entries(prefixes)) {
    if (!code.startsWith(prefix)) continue;
    const rest = code.slice(prefix.length);
    const atom = Object.hasOwn(atoms, rest) ? atoms[rest] : void 0;
    if (atom?.takesPrefix) return { dimension: atom.dimension, factor: times(factor, atom.factor) };
  }
  return null;
}
var read = /* @__PURE__ */ new Map();
function findUnit(code) {
  const known = read.get(code);
  if (known !== void 0) return known;
  const unit = code.length <= 60 ? new CodeReader(code).unit() : null;
  if (read.size < 1e3) read.set(code, unit);
  return unit;
}
function getUnit(code) {
  const unit = findUnit(code);
  if (!unit) throw new Error(`no unit has the code ${code}`);
  return unit;
}
var CodeReader = class {
  constructor(code) {
    this.code = code;
  }
  code;
  at = 0;
  unit() {
    if (this.code === "1") return { code: "1", dimension: none, factor: one, offset: zero };
    const whole = findAtom(this.code);
    if (whole) return { code: this.code, dimension: whole.dimension, factor: whole.factor, offset: whole.offset ?? zero };
    const result2 = this.term();
    return result2 && this.at === this.code.length ? { code: this.code, ...result2, offset: zero } : null;
  }
  term() {
    let sign = 1;
    if (this.code[this.at] === "/") {
      sign = -1;
      this.at++;
    }
    let dimension = none;
    let factor = one;
    for (; ; ) {
      const part = this.component();
      if (!part) return null;
      dimension = combine(dimension, part.dimension, sign);
      factor = sign > 0 ? times(factor, part.factor) : over(factor, part.factor);
      const operator = this.code[this.at];
      if (operator !== "." && operator !== "/") return { dimension, factor };
      sign = operator === "/" ? -1 : 1;
      this.at++;
    }
  }
  component() {
    if (this.code[this.at] === "(") {
      this.at++;
      const inner = this.term();
      if (!inner || this.code[this.at] !== ")") return null;
      this.at++;
      return inner;
    }
    const rest = this.code.slice(this.at);
    const digits = /^\d{1,9}/.exec(rest)?.[0];
    if (digits !== void 0) {
      this.at += digits.length;
      return digits === "0".repeat(digits.length) ? null : { dimension: none, factor: decimal(digits) };
    }
    const match = /^(\[[A-Za-z_']+\]|%|[A-Za-z]+(?:\[[A-Za-z_']+\])?)([+-]?\d)?/.exec(rest);
    if (!match) return null;
    const [all, symbol = "", exponentText] = match;
    const atom = findAtom(symbol);
    if (!atom || atom.offset) return null;
    const exponent2 = exponentText === void 0 ? 1 : Number(exponentText);
    if (exponent2 === 0) return null;
    this.at += all.length;
    return { dimension: combine(none, atom.dimension, exponent2), factor: power(atom.factor, exponent2) };
  }
};
function fromSi(value23, unit, isDifference) {
  return over(isDifference ? value23 : minus(value23, unit.offset), unit.factor);
}
var isCommensurable = (a, b) => isSame(a.dimension, b.dimension);

// shared/thermo/conventions/closes.ts
function withAlternative(own, alternative) {
  if (!alternative) return own;
  const merged = { ...own, ...alternative };
  const changesKappa = ("cp" in alternative || "R" in alternative) && !("kappa" in alternative);
  if (changesKappa) delete merged.kappa;
  return merged;
}

// shared/marking/alternatives.ts
function taughtVariant(definition, convention, pinned) {
  return pinned ?? convention.variants[definition.key] ?? definition.variants[0]?.key ?? "";
}
function acceptedWays(definition, convention, pinned) {
  const last = lastFound;
  if (last && last.definition === definition && last.convention === convention && last.pinned === pinned) return last.ways;
  const ways = findWays(definition, convention, pinned);
  lastFound = { definition, convention, pinned, ways };
  return ways;
}
var lastFound = null;
function findWays(definition, convention, pinned) {
  const own = wayOf(definition, convention, pinned, null);
  const seen = /* @__PURE__ */ new Set([fingerprint(definition, own)]);
  const ways = [own];
  for (const alternative of convention.accepted) {
    const way = wayOf(definition, convention, pinned, alternative);
    const mark = fingerprint(definition, way);
    if (seen.has(mark)) continue;
    seen.add(mark);
    ways.push(way);
  }
  return ways;
}
function wayOf(definition, convention, pinned, alternative) {
  const variants = alternative?.variants ? { ...convention.variants, ...alternative.variants } : convention.variants;
  return {
    label: alternative?.label ?? convention.title,
    constants: withAlternative(convention.constants, alternative?.constants),
    variant: pinned ?? alternative?.variants?.[definition.key] ?? taughtVariant(definition, convention, pinned),
    formulae: { variants, beyond: convention.beyond ?? "compute" },
    alternative
  };
}
function fingerprint(definition, way) {
  const constants = definition.constants.map((name) => String(way.constants[name]));
  const formulae = (definition.uses ?? []).map((key) => way.formulae.variants[key] ?? "");
  return [way.variant, ...constants, ...formulae].join("|");
}
function valuesOfWays(definition, convention, pinned, inputs2) {
  const last = lastValues;
  if (last && last.definition === definition && last.convention === convention && last.pinned === pinned && last.inputs === inputs2) return last.values;
  const values = [];
  const add2 = (way) => {
    const outcome3 = evaluateQuantity(definition, inputs2, way.constants, way.variant, way.formulae);
    if (outcome3.is === "value") values.push({ way, value: outcome3.value });
  };
  acceptedWays(definition, convention, pinned).forEach(add2);
  const own = values[0];
  if (own && own.way.alternative === null) for (const direction2 of [1, -1]) farthest(definition, convention, pinned, values, own.value, direction2).forEach(add2);
  lastValues = { definition, convention, pinned, inputs: inputs2, values };
  return values;
}
var lastValues = null;
function farthest(definition, convention, pinned, values, own, direction2) {
  const best = /* @__PURE__ */ new Map();
  for (const one2 of values) {
    const group = one2.way.alternative?.group;
    if (group === void 0 || !(direction2 * (one2.value - own) > 0)) continue;
    const before = best.get(group);
    if (!before || direction2 * (one2.value - before.value) > 0) best.set(group, one2);
  }
  if (best.size < 2) return [];
  const joined = { label: [...best.values()].map((one2) => one2.way.label).join("; "), constants: {}, variants: {} };
  let constants = {}, variants = {};
  for (const { way } of best.values()) {
    constants = { ...constants, ...way.alternative?.constants };
    variants = { ...variants, ...way.alternative?.variants };
  }
  return [wayOf(definition, convention, pinned, { ...joined, constants, variants })];
}

// shared/marking/decimalEdges.ts
function outwardDecimals(low, high2, unit, isDifference) {
  const exactLow = fromDouble(low), exactHigh = fromDouble(high2);
  const inUnitLow = fromSi(exactLow, unit, isDifference), inUnitHigh = fromSi(exactHigh, unit, isDifference);
  const sizes = [inUnitLow, inUnitHigh, ...isDifference ? [] : [exactLow, exactHigh]].map(absolute);
  const largest = sizes.reduce((a, b) => compare(a, b) >= 0 ? a : b);
  const place = largest.numerator === 0n ? -9 : leadingExponent(largest) - 9;
  return { lowDecimal: toPlace(inUnitLow, place, "down"), highDecimal: toPlace(inUnitHigh, place, "up") };
}
function liesWithin(typed, lowDecimal, highDecimal) {
  const value23 = fromDecimal(typed), low = fromDecimal(lowDecimal), high2 = fromDecimal(highDecimal);
  if (!value23 || !low || !high2) return false;
  return compare(low, value23) <= 0 && compare(value23, high2) <= 0;
}
function exactInUnit(si, unit, isDifference) {
  return fromSi(fromDouble(si), unit, isDifference);
}

// shared/marking/rounding.ts
function lastPlaceAsked(definition, reference, unit, digits) {
  if (definition.kind === "temperature") return 2 - digits;
  const size2 = absolute(fromSi(fromDouble(reference), unit, true));
  const least2 = definition.nearZero === void 0 ? null : over(fromDouble(definition.nearZero), unit.factor);
  const counted = least2 && compare(size2, least2) < 0 ? least2 : size2;
  return (counted.numerator === 0n ? 0 : leadingExponent(counted)) - digits + 1;
}
function halfUnitAsked(definition, reference, unit, digits) {
  const place = lastPlaceAsked(definition, reference, unit, digits);
  const step = place >= 0 ? rational(tenTo(place)) : rational(1n, tenTo(-place));
  return toDouble(times(times(step, rational(1n, 2n)), absolute(unit.factor)));
}

// shared/marking/band.ts
var QuestionFault = class extends Error {
  constructor(code, message) {
    super(message);
    this.code = code;
  }
  code;
  name = "QuestionFault";
};
function referenceOf(definition, question, inputs2) {
  const [own] = acceptedWays(definition, question.convention, question.variant);
  if (!own) throw new Error("a question has its own way");
  return { outcome: evaluateQuantity(definition, inputs2, own.constants, own.variant, own.formulae), way: own };
}
function makeBand(definition, question, inputs2, center, unit, carried = {}) {
  const values = valuesOfWays(definition, question.convention, question.variant, inputs2).map((one2) => one2.value);
  const part = (key, label, below2, above2) => ({ key, label, below: below2, above: above2 });
  const parts = [];
  const lowest = Math.min(center, ...values), highest = Math.max(center, ...values);
  if (lowest < center || highest > center) parts.push(part("formulae", "accepted formulae and constants", center - lowest, highest - center));
  const granted = grantedWidth(definition, question.granted, center);
  if (granted > 0) parts.push(part("granted", "granted by the author", granted, granted));
  for (const [name, half2] of Object.entries(question.readOff ?? {})) {
    const spread = name === "result" ? { below: half2, above: half2 } : carriedSpread(definition, question, inputs2, center, name, half2);
    if (spread.below > 0 || spread.above > 0) parts.push(part("reading", name === "result" ? "half a division of the axis" : `half a division of the axis (${labelOf(definition, name)})`, spread.below, spread.above));
  }
  for (const [name, half2] of Object.entries(question.ownRead ?? {})) {
    const spread = carriedSpread(definition, question, inputs2, center, name, half2);
    if (spread.below > 0 || spread.above > 0) parts.push(part("carried", `digits of your own reading (${labelOf(definition, name)})`, spread.below, spread.above));
  }
  if (question.accuracy) {
    parts.push(part("reading", "accuracy of the station’s sensor", question.accuracy.stationSi, question.accuracy.stationSi));
    parts.push(part("reading", "accuracy of your own instrument", question.accuracy.ownSi, question.accuracy.ownSi));
  }
  for (const [name, half2] of Object.entries(carried)) {
    const spread = carriedSpread(definition, question, inputs2, center, name, half2);
    if (spread.below > 0 || spread.above > 0) parts.push(part("carried", `digits of your earlier value (${labelOf(definition, name)})`, spread.below, spread.above));
  }
  const half = halfUnitAsked(definition, center, unit, question.digits);
  parts.push(part("rounding", "rounding at the digits asked", half, half));
  let below = 0, above = 0;
  for (const one2 of parts) {
    below += one2.below;
    above += one2.above;
  }
  const low = center - below, high2 = center + above;
  return { center, low, high: high2, ...outwardDecimals(low, high2, unit, definition.kind !== "temperature"), unit: question.unit, parts };
}
var labelOf = (definition, name) => definition.inputs.find((input2) => input2.name === name)?.label ?? name;
function grantedWidth(definition, granted, center) {
  const { absoluteSi = 0, relative = 0 } = granted;
  if (!(absoluteSi >= 0 && Number.isFinite(absoluteSi))) throw new QuestionFault("grant_invalid", `A width of ${absoluteSi} cannot be granted.`);
  if (!(relative >= 0 && relative <= 1)) throw new QuestionFault("grant_invalid", `A share of ${relative} cannot be granted.`);
  if (relative > 0 && definition.kind === "temperature") throw new QuestionFault("grant_invalid", "A temperature takes an absolute width: a share of it depends on where zero is.");
  return Math.max(absoluteSi, relative * Math.abs(center));
}
function carriedSpread(definition, question, inputs2, center, name, half) {
  const value23 = inputs2[name];
  if (typeof value23 !== "number" || !(half > 0)) return { below: 0, above: 0 };
  const at = [value23 - half, value23 + half].map((moved) => {
    try {
      const { outcome: outcome3 } = referenceOf(definition, question, { ...inputs2, [name]: moved });
      return outcome3.is === "value" ? outcome3.value : center;
    } catch {
      return center;
    }
  });
  return { below: Math.max(0, center - Math.min(...at)), above: Math.max(0, Math.max(...at) - center) };
}

// shared/marking/graph.ts
function carriedFault(input2, value23) {
  if (!(value23 >= input2.range[0] && value23 <= input2.range[1])) return `your earlier value of the ${input2.label} lies outside what is physical here`;
  if (input2.trivialWithin !== void 0 && Math.abs(value23) <= input2.trivialWithin) return `your earlier value of the ${input2.label} would leave nothing to compute`;
  return null;
}
function withCarried(definition, question) {
  const halfUnits = {};
  const notes = [];
  const inputs2 = { ...question.inputs };
  let isCarried = false;
  for (const [name, carried] of Object.entries(question.carried ?? {})) {
    const input2 = definition.inputs.find((one2) => one2.name === name && one2.shape === "number");
    if (!input2) continue;
    if ("notCarried" in carried) {
      notes.push(`Not carried: ${carried.notCarried}.`);
      continue;
    }
    const fault = carriedFault(input2, carried.valueSi);
    if (fault !== null) {
      notes.push(`Not carried: ${fault}.`);
      continue;
    }
    inputs2[name] = carried.valueSi;
    halfUnits[name] = carried.halfUnitSi >= 0 && Number.isFinite(carried.halfUnitSi) ? carried.halfUnitSi : 0;
    isCarried = true;
  }
  return { inputs: isCarried ? inputs2 : null, halfUnits, notes };
}

// shared/marking/points.ts
function withinStep(pointsMilli, maxMilli) {
  assertWhole(pointsMilli);
  assertWhole(maxMilli);
  return Math.min(Math.max(pointsMilli, 0), Math.max(maxMilli, 0));
}
function earnedMilli(of, value23) {
  if (value23.isAccepted) return withinStep(of.maxMilli - (value23.hasDigits ? 0 : of.digitsMilli ?? 0), of.maxMilli);
  if (value23.isSlip) return withinStep(of.slipMilli ?? 0, of.maxMilli);
  return withinStep(value23.isNear ? of.near?.milli ?? 0 : 0, of.maxMilli);
}
function showMilli(milli, places) {
  assertWhole(milli);
  const step = [1e3, 100, 10, 1][places] ?? 1;
  const size2 = Math.abs(milli);
  const whole = Math.floor((2 * size2 + step) / (2 * step));
  const digits = String(whole).padStart(places + 1, "0");
  const sign = milli < 0 && whole > 0 ? "−" : "";
  return places === 0 ? `${sign}${digits}` : `${sign}${digits.slice(0, -places)}.${digits.slice(-places)}`;
}
function assertWhole(milli) {
  if (!Number.isSafeInteger(milli)) throw new Error(`${milli} is no whole number of thousandths`);
}

// shared/marking/choice.ts
var optionsIn = (typed) => [...new Set(typed.split(/[\s,;]+/).filter((part) => part !== ""))];
function judgedChoice(choice, maxMilli, answer, blank2) {
  const chosen = answer.reading === "class" ? optionsIn(answer.typed) : [];
  const isRight = chosen.length === choice.right.length && choice.right.every((key) => chosen.includes(key));
  return {
    ...blank2,
    outcome: "class",
    classes: choice.right,
    isAccepted: isRight,
    acceptedBy: isRight ? "word" : null,
    pointsMilli: isRight ? withinStep(maxMilli, maxMilli) : 0,
    trace: choice.why.map((text) => ({ text, formula: "", filled: "" }))
  };
}

// shared/marking/slips.ts
var widest = 0.025;
function slipRanges(definition, question, inputs2, right) {
  const ways = valuesOfWays(definition, question.convention, question.variant, inputs2);
  const ranges = [];
  for (const slip2 of definition.slips) {
    const values = [];
    for (const { way, value: rightByWay } of ways) {
      const value23 = tried(() => slip2.apply(inputs2, way.constants, rightByWay, way.formulae));
      if (value23 !== null && Number.isFinite(value23)) values.push(value23);
    }
    const [own] = values;
    if (own === void 0 || Math.abs(own - right) <= 1e-12 * Math.abs(right)) continue;
    ranges.push({ slip: slip2, value: own, low: Math.min(...values), high: Math.max(...values) });
  }
  return ranges;
}
function tried(work) {
  try {
    return work();
  } catch {
    return null;
  }
}
function explainingSlip(definition, question, answer, ranges, unit) {
  const typed = answer.decimal === null ? null : fromDecimal(answer.decimal);
  if (!typed) return null;
  const fitting = ranges.filter((range) => fits(definition, question, answer, typed, range, unit));
  const [only, ...others] = fitting;
  return only && others.length === 0 ? only : null;
}
function fits(definition, question, answer, typed, range, unit) {
  const isDifference = definition.kind !== "temperature";
  const asked = halfUnitAsked(definition, range.value, unit, question.digits);
  const most2 = Math.max(asked, widest * Math.abs(isDifference ? range.value : range.value - toDouble(unit.offset)));
  const room2 = Math.min(Math.max(answer.halfUnitSi ?? 0, asked), most2);
  if (answer.valueSi !== null) {
    const far = 1.01 * room2 + 1e-6 * Math.abs(range.value);
    if (answer.valueSi < range.low - far || answer.valueSi > range.high + far) return false;
  }
  const around = plus(exactInUnit(room2, unit, true), times(absolute(exactInUnit(range.value, unit, true)), rational(1n, 1000000000n)));
  const low = minus(exactInUnit(range.low, unit, isDifference), around);
  const high2 = plus(exactInUnit(range.high, unit, isDifference), around);
  return compare(low, typed) <= 0 && compare(typed, high2) <= 0;
}
var sentenceOf = (range, shown3) => range.slip.sentence.replace("{value}", shown3.value).replace("{unit}", shown3.unit);

// shared/marking/version.ts
var referenceVersion = "1.1.0";
var judgeInterface = 1;

// shared/marking/judge.ts
var carriedWords = "Right by the value that follows from your own earlier one.";
function judgeStep(question, answer) {
  try {
    return judged(question, answer);
  } catch (error2) {
    return refused(faultCode(error2), error2 instanceof Error ? error2.message : "not judged");
  }
}
function faultCode(error2) {
  if (error2 instanceof OutOfRangeError) return "out_of_range";
  if (error2 instanceof MissingInputError) return "missing_input";
  if (error2 instanceof UnknownInputError) return "unknown_input";
  if (error2 instanceof SeriesError) return "series_unusable";
  if (error2 instanceof QuestionFault) return error2.code;
  return "not_judged";
}
var blank = {
  refusalCode: null,
  reason: null,
  classes: [],
  band: null,
  carriedBand: null,
  carriedNote: null,
  isAccepted: false,
  acceptedBy: null,
  slip: null,
  slipValues: [],
  pointsMilli: 0,
  trace: [],
  notes: []
};
var refused = (refusalCode, reason) => ({ ...blank, outcome: "refused", refusalCode, reason });
function judged(question, answer) {
  if (question.choice) return judgedChoice(question.choice, question.maxMilli, answer, blank);
  const definition = findQuantity(question.quantity);
  if (!definition) return refused("unknown_quantity", `There is no quantity ${question.quantity}.`);
  const unit = checkedUnit(definition, question);
  const { outcome: outcome3, way } = referenceOf(definition, question, question.inputs);
  const carried = withCarried(definition, question);
  const carriedNote = carried.notes.length > 0 ? carried.notes.join(" ") : null;
  const trace = definition.trace(question.inputs, way.constants, way.variant, way.formulae);
  const notes = "notes" in outcome3 ? outcome3.notes ?? [] : [];
  if (outcome3.is === "class") return judgedClass(definition, question, answer, carried, { ...blank, outcome: "class", carriedNote, trace, notes });
  if (outcome3.is !== "value") return judgedWord(definition, question, answer, unit, carried, { ...blank, outcome: outcome3.is, reason: outcome3.why, carriedNote, trace, notes });
  return judgedValue(definition, question, answer, unit, outcome3.value, carried, { ...blank, outcome: "value", carriedNote, trace, notes });
}
function checkedUnit(definition, question) {
  const unit = findUnit(question.unit);
  if (!unit || !isCommensurable(unit, getUnit(definition.unit))) throw new QuestionFault("unit_invalid", `The ${definition.name} cannot be asked in ${question.unit}.`);
  if (!(Number.isInteger(question.digits) && question.digits >= 1 && question.digits <= 15)) throw new QuestionFault("digits_invalid", `Cannot ask for ${question.digits} digits.`);
  return unit;
}
function judgedValue(definition, question, answer, unit, center, carried, base) {
  const band = makeBand(definition, question, question.inputs, center, unit);
  const carriedBand = carried.inputs && bandOf(definition, question, carried.inputs, unit, carried.halfUnits);
  const ranges = slipRanges(definition, question, question.inputs, center);
  const near = definition.isDirection ? onNearestTurn(answer, center, unit) : answer;
  const typed = near.reading === "ok" ? near.decimal : null;
  const isExplained = typed === null || isNear(band, near) || carriedBand && isNear(carriedBand, near);
  const slip2 = isExplained ? null : explainingSlip(definition, question, answer, ranges, unit);
  const acceptedBy = typed === null ? null : isIn(band, typed) ? "band" : carriedBand && isIn(carriedBand, typed) ? "carried" : isRuledIn(definition, question, typed, unit, ranges, answer) ? "ruling" : null;
  const isAccepted = acceptedBy !== null;
  const notes = [...base.notes];
  if (acceptedBy === "carried") notes.push(carriedWords);
  const digits = hasDigits(definition, question, answer, center, unit);
  if (isAccepted && !digits && (question.digitsMilli ?? 0) > 0) notes.push(`Right, with fewer digits than asked: ${showMilli(question.digitsMilli ?? 0, 2)} of the marks are for them.`);
  const nearMiss = !isAccepted && slip2 === null && question.near !== void 0 && answer.reading === "ok" && [band, ...carriedBand ? [carriedBand] : []].some((one2) => isWithinWidths(one2, near, question.near?.widths ?? 1));
  if (nearMiss && (question.near?.milli ?? 0) > 0) notes.push(`A near miss: within ${question.near?.widths} half-widths of the reference.`);
  return {
    ...base,
    band,
    carriedBand,
    acceptedBy,
    isAccepted,
    notes,
    slip: slip2 && acceptedBy === null ? named(slip2, unit, question, definition) : null,
    slipValues: ranges.map(({ slip: { key, label }, value: value23 }) => ({ key, label, value: value23 })),
    pointsMilli: earnedMilli(question, { isAccepted, hasDigits: digits, isSlip: slip2 !== null, isNear: nearMiss })
  };
}
function judgedWord(definition, question, answer, unit, carried, base) {
  const carriedBand = carried.inputs && bandOf(definition, question, carried.inputs, unit, carried.halfUnits);
  const near = carriedBand && definition.isDirection ? onNearestTurn(answer, carriedBand.center, unit) : answer;
  const isRight = answer.reading === base.outcome;
  const isCarried = !isRight && carriedBand !== null && near.reading === "ok" && near.decimal !== null && isIn(carriedBand, near.decimal);
  return {
    ...base,
    carriedBand,
    isAccepted: isRight || isCarried,
    acceptedBy: isRight ? "word" : isCarried ? "carried" : null,
    notes: isCarried ? [...base.notes, carriedWords] : base.notes,
    pointsMilli: isRight || isCarried ? withinStep(question.maxMilli, question.maxMilli) : 0
  };
}
function onNearestTurn(answer, center, unit) {
  const typed = answer.decimal === null || unit.code !== "deg" ? null : fromDecimal(answer.decimal);
  if (!typed || answer.valueSi === null) return answer;
  const turn = center - answer.valueSi > fullTurn / 2 ? 1 : center - answer.valueSi < -fullTurn / 2 ? -1 : 0;
  return turn === 0 ? answer : { ...answer, decimal: toDecimal(plus(typed, rational(BigInt(360 * turn))), 60), valueSi: answer.valueSi + turn * fullTurn };
}
function isNear(band, answer) {
  const half = answer.halfUnitSi ?? 0;
  return answer.decimal !== null && (isIn(band, answer.decimal) || answer.valueSi !== null && answer.valueSi >= band.low - half && answer.valueSi <= band.high + half);
}
function hasDigits(definition, question, answer, center, unit) {
  if (definition.kind === "temperature") return (answer.halfUnitSi ?? 0) <= halfUnitAsked(definition, center, unit, question.digits) * (1 + 1e-9);
  return (answer.digits ?? 0) >= question.digits || (answer.halfUnitSi ?? Infinity) <= halfUnitAsked(definition, center, unit, question.digits) * (1 + 1e-9);
}
function isWithinWidths(band, answer, widths) {
  if (answer.valueSi === null) return false;
  const away = answer.valueSi - band.center;
  return Math.abs(away) <= widths * (away < 0 ? band.center - band.low : band.high - band.center) * (1 + 1e-9);
}
var isIn = (band, decimal2) => liesWithin(decimal2, band.lowDecimal, band.highDecimal);
function named(range, unit, question, definition) {
  const inUnit = (range.value - (definition.kind === "temperature" ? Number(unit.offset.numerator) / Number(unit.offset.denominator) : 0)) / (Number(unit.factor.numerator) / Number(unit.factor.denominator));
  const shown3 = formatQuantity(inUnit, question.unit, Math.max(question.digits, 3));
  return { key: range.slip.key, label: range.slip.label, sentence: sentenceOf(range, { value: shown3.number, unit: shown3.text.slice(shown3.number.length).trim() }), value: range.value };
}
function bandOf(definition, question, inputs2, unit, halfUnits) {
  try {
    const { outcome: outcome3 } = referenceOf(definition, question, inputs2);
    return outcome3.is === "value" ? makeBand(definition, question, inputs2, outcome3.value, unit, halfUnits) : null;
  } catch (error2) {
    if (error2 instanceof OutOfRangeError || error2 instanceof SeriesError || error2 instanceof RangeError) return null;
    throw error2;
  }
}
function isRuledIn(definition, question, typed, unit, ranges, answer) {
  const isDifference = definition.kind !== "temperature";
  return (question.accepted ?? []).some((accepted) => {
    if (accepted.kind === "slip") return explainingSlip(definition, question, answer, ranges.filter((range) => range.slip.key === accepted.slip), unit) !== null;
    if (accepted.kind === "value") {
      if (!(accepted.lowSi <= accepted.highSi) || !Number.isFinite(accepted.highSi - accepted.lowSi)) return false;
      const { lowDecimal, highDecimal } = outwardDecimals(accepted.lowSi, accepted.highSi, unit, isDifference);
      return liesWithin(typed, lowDecimal, highDecimal);
    }
    if (!definition.variants.some((variant) => variant.key === accepted.variant)) return false;
    const band = bandOf(definition, { ...question, variant: accepted.variant }, question.inputs, unit, {});
    return band !== null && isIn(band, typed);
  });
}
function judgedClass(definition, question, answer, carried, base) {
  const classes = classesOf(definition, question, question.inputs);
  const carriedClasses = carried.inputs ? tryClasses(definition, question, carried.inputs) : [];
  const typed = answer.reading === "class" && answer.valueSi !== null ? definition.classes?.[answer.valueSi]?.key ?? null : null;
  const isRight = typed !== null && classes.includes(typed);
  const isCarried = typed !== null && !isRight && carriedClasses.includes(typed);
  return {
    ...base,
    classes,
    isAccepted: isRight || isCarried,
    acceptedBy: isRight ? "word" : isCarried ? "carried" : null,
    notes: isCarried ? [...base.notes, carriedWords] : base.notes,
    pointsMilli: isRight || isCarried ? withinStep(question.maxMilli, question.maxMilli) : 0
  };
}
function classesOf(definition, question, inputs2) {
  const found = [];
  for (const way of acceptedWays(definition, question.convention, question.variant)) {
    const outcome3 = evaluateQuantity(definition, inputs2, way.constants, way.variant, way.formulae);
    if (outcome3.is === "class" && !found.includes(outcome3.key)) found.push(outcome3.key);
  }
  return found;
}
function tryClasses(definition, question, inputs2) {
  try {
    return classesOf(definition, question, inputs2);
  } catch {
    return [];
  }
}
export {
  judgeInterface,
  judgeStep,
  referenceVersion
};
