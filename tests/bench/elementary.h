/* exp, log and pow of shared/numerics/elementary.ts in plain C: the same steps in the same order with the same constants, made by the same operations at
   the start. What the product has to compute with, so that a mark has the same bits everywhere. Compile without -ffast-math and with -ffp-contract=off. */
#include <math.h>
#include <stdint.h>
#include <string.h>

typedef struct { double hi, lo; } pair_t;
static const double splitter = 134217729.0;
static inline double sum_error(double a, double b, double sum) { double back = sum - a; return (a - (sum - back)) + (b - back); }
static inline double product_error(double a, double b, double product) {
  double scaled = splitter * a, a_hi = scaled - (scaled - a), a_lo = a - a_hi;
  scaled = splitter * b;
  double b_hi = scaled - (scaled - b), b_lo = b - b_hi;
  return ((a_hi * b_hi - product) + a_hi * b_lo + a_lo * b_hi) + a_lo * b_lo;
}
static pair_t pair_of(double hi, double lo) { pair_t p = { hi, lo }; return p; }
static pair_t settle(double hi, double lo) { double sum = hi + lo; return pair_of(sum, lo - (sum - hi)); }
static pair_t add_pairs(pair_t a, pair_t b) {
  double sum = a.hi + b.hi, low = a.lo + b.lo;
  pair_t first = settle(sum, sum_error(a.hi, b.hi, sum) + low);
  return settle(first.hi, first.lo + sum_error(a.lo, b.lo, low));
}
static pair_t multiply_pairs(pair_t a, pair_t b) {
  double product = a.hi * b.hi;
  return settle(product, product_error(a.hi, b.hi, product) + (a.hi * b.lo + a.lo * b.hi));
}
static pair_t divide_pairs(pair_t a, pair_t b) {
  double first = a.hi / b.hi;
  pair_t rest = add_pairs(a, multiply_pairs(pair_of(-first, 0), b));
  double second = rest.hi / b.hi;
  pair_t left = add_pairs(rest, multiply_pairs(pair_of(-second, 0), b));
  return add_pairs(settle(first, second), pair_of(left.hi / b.hi, 0));
}
static pair_t root_of_pair(pair_t a) {
  double root = sqrt(a.hi);
  pair_t rest = add_pairs(a, multiply_pairs(pair_of(-root, 0), pair_of(root, 0)));
  pair_t better = add_pairs(pair_of(root, 0), pair_of(rest.hi / (2 * root), 0));
  pair_t left = add_pairs(a, multiply_pairs(pair_of(-better.hi, -better.lo), better));
  return add_pairs(better, pair_of(left.hi / (2 * root), 0));
}
static pair_t paired_log(double numerator, double denominator) {
  pair_t t = divide_pairs(pair_of(numerator - denominator, 0), pair_of(numerator + denominator, 0)), square = multiply_pairs(t, t), power = t, sum = t;
  for (int n = 3; n < 200; n += 2) {
    power = multiply_pairs(power, square);
    if (fabs(power.hi) < 1e-36) break;
    sum = add_pairs(sum, divide_pairs(power, pair_of(n, 0)));
  }
  return multiply_pairs(pair_of(2, 0), sum);
}
static double leading_bits(double value, int bits) {
  double scale = 1;
  for (int n = bits; n < 53; n++) scale *= 2;
  double big = value * (scale + 1);
  return big - (big - value);
}

enum { parts = 128, least_log = 91, most_log = 181 };
static double powers[2098], root_hi[parts], root_lo[parts], log_hi[most_log + 1], log_lo[most_log + 1];
static double step_hi, step_lo, per_step, ln2_hi, ln2_lo;

static void make_tables(void) {
  double up = 1, down = 1;
  for (int n = 0; n <= 1023; n++, up *= 2) powers[n + 1074] = up;
  for (int n = 0; n <= 1074; n++, down /= 2) powers[1074 - n] = down;
  pair_t ln2 = paired_log(2, 1), root = pair_of(2, 0), power = pair_of(1, 0);
  for (int n = 1; n < parts; n *= 2) root = root_of_pair(root);
  for (int j = 0; j < parts; j++) { root_hi[j] = power.hi; root_lo[j] = power.lo; power = multiply_pairs(power, root); }
  double one = ln2.hi / parts;
  step_hi = leading_bits(one, 32);
  step_lo = (one - step_hi) + ln2.lo / parts;
  per_step = 1 / one;
  for (int k = least_log; k <= most_log; k++) {
    pair_t value = k == parts ? pair_of(0, 0) : paired_log(k, parts);
    log_hi[k] = value.hi; log_lo[k] = value.lo;
  }
  ln2_hi = leading_bits(ln2.hi, 40);
  ln2_lo = (ln2.hi - ln2_hi) + ln2.lo;
}

static inline double two_to(int n) { return powers[n + 1074]; }
static double scaled_by(double value, int n) {
  if (n > 1023) return value * two_to(1023) * two_to(n - 1023);
  if (n < -1022) return value * two_to(n + 54) * two_to(-54);
  return value * two_to(n);
}
static const double to_whole = 6755399441055744.0;

static inline double raised(double r, double whole) {
  double series = r + r * r * (1.0 / 2 + r * (1.0 / 6 + r * (1.0 / 24 + r * (1.0 / 120 + r * (1.0 / 720)))));
  int k = (int)whole, j = k & (parts - 1), n = k >> 7;
  double root = root_hi[j], rest = root_lo[j];
  if (n < -900 || n > 1000) return scaled_by(root + (rest + root * series), n);
  double power = powers[n + 1074], scaled_root = root * power;
  return scaled_root + (rest * power + scaled_root * series);
}
static inline double exp_of(double hi, double lo) {
  double whole = (hi * per_step + to_whole) - to_whole;
  return raised(((hi - whole * step_hi) - whole * step_lo) + lo, whole);
}
static double same_exp(double x) {
  if (!(x < 709.782712893385)) return x != x ? x : INFINITY;
  if (x < -745.14) return 0;
  double whole = (x * per_step + to_whole) - to_whole;
  return raised((x - whole * step_hi) - whole * step_lo, whole);
}
static inline double leading27(double value) { double big = value * 134217729.0; return big - (big - value); }

static inline pair_t log_pair(double x) {
  int e = 0;
  double positive = x;
  if (positive < 2.2250738585072014e-308) { positive *= 18014398509481984.0; e = -54; }
  uint64_t bits;
  memcpy(&bits, &positive, 8);
  int power = (int)(bits >> 52) - 1023;
  e += power;
  double m = positive * powers[1074 - power];
  if (m > 1.4142135623730951) { m *= 0.5; e += 1; }
  int k = (int)(m * parts + 0.5);
  double c = (double)k / parts, d = m - c, r = d / c, r_top = leading27(r), r_lo = ((d - r_top * c) - (r - r_top) * c) / c;
  double square = r * r, square_lo = product_error(r, r, square) + 2 * r * r_lo;
  double series = square * r * (1.0 / 3 - r * (1.0 / 4 - r * (1.0 / 5 - r * (1.0 / 6 - r * (1.0 / 7 - r * (1.0 / 8 - r * (1.0 / 9 - r * (1.0 / 10))))))));
  double table = log_hi[k], a = e * ln2_hi + table, a_lo = sum_error(e * ln2_hi, table, a), b = a + r, b_lo = sum_error(a, r, b);
  double half = -0.5 * square, sum = b + half, sum_lo = sum_error(b, half, sum);
  double rest = (((a_lo + b_lo) + sum_lo) + (e * ln2_lo + log_lo[k])) + ((r_lo - 0.5 * square_lo) + series);
  double leading = sum + rest;
  return pair_of(leading, rest - (leading - sum));
}
static double same_log(double x) {
  if (!(x > 0)) return x == 0 ? -INFINITY : NAN;
  if (x == INFINITY) return x;
  return log_pair(x).hi;
}
static double same_pow(double x, double y) {
  if (y == 0) return 1;
  if (x != x || y != y) return NAN;
  if (y == INFINITY || y == -INFINITY) {
    double size = fabs(x);
    if (size == 1) return NAN;
    return (size > 1) == (y > 0) ? INFINITY : 0;
  }
  int is_whole = fabs(y) >= 9007199254740992.0 || floor(y) == y, is_odd = is_whole && fabs(y) < 9007199254740992.0 && fabs(fmod(y, 2)) == 1;
  int is_negative = signbit(x) != 0;
  double size = fabs(x), sign = is_negative && is_odd ? -1 : 1;
  if (size == 0) return y > 0 ? sign * 0 : sign * INFINITY;
  if (size == INFINITY) return y > 0 ? sign * INFINITY : sign * 0;
  if (is_negative && !is_whole) return NAN;
  if (size == 1) return sign;
  if (y == 1) return x;
  pair_t log_size = log_pair(size);
  double exponent = y * log_size.hi;
  if (exponent > 709.79) return sign * INFINITY;
  if (exponent < -745.2) return sign * 0;
  return sign * exp_of(exponent, product_error(y, log_size.hi, exponent) + y * log_size.lo);
}

#define exp same_exp
#define log same_log
#define pow same_pow
