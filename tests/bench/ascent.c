/* The ascents of shared/thermo/parcelAscent.ts and the equivalent potential temperature of equivalentPotential.ts in plain C: the same steps in the
   same order. With -DSAME exp, log and pow are those of the product, in C (elementary.h); without it those of the C library, which are quicker and differ
   between libraries in their last bits. Reads what ascents.ts writes; prints results and the CPU time that they took.

     gcc -O2 -ffp-contract=off -DSAME -o ascent ascent.c -lm
     ascent FILE REPEATS

   FILE: cp R Rv g kappa, then the number of rows, then p T Td of each row in SI. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>
#ifdef SAME
#include "elementary.h"
#else
static void make_tables(void) {}
#endif

#define MOST 4096
static const double longest_step = 0.05, neutral = 1e-9, p0 = 100000.0;
static double cp, R, Rv, g, kappa, epsilon;

static double es(double T) { double t = T - 273.15; return 611.2 * exp((17.67 * t) / (t + 243.5)); }
static double L(double T) { return 2.501e6 - 2370 * (T - 273.15); }
static double mixing_ratio(double e, double p) { return epsilon * e / (p - e); }
static double virtual_of(double T, double w) { return T * (1 + w / epsilon) / (1 + w); }

typedef struct { int count; double p[MOST], log_p[MOST], T[MOST], Td[MOST], w[MOST], Tv[MOST]; } sounding;
typedef struct { double p, T, Td, w; } parcel;
typedef struct { double T, p; } level;
typedef struct { double lcl, lfc, el, cape, cin; } ascent;

static void make_sounding(sounding *s, int count, const double *p, const double *T, const double *Td) {
  s->count = count;
  for (int at = 0; at < count; at++) {
    double e = es(Td[at]);
    s->p[at] = p[at]; s->log_p[at] = log(p[at]); s->T[at] = T[at]; s->Td[at] = Td[at];
    s->w[at] = mixing_ratio(e, p[at]);
    s->Tv[at] = virtual_of(T[at], s->w[at]);
  }
}

static double bolton_lcl(double T, double Td) { return 1 / (1 / (Td - 56) + log(T / Td) / 800) + 56; }

static level lcl_of(const parcel *from) {
  double Td = from->Td < from->T ? from->Td : from->T;
  level found;
  found.T = bolton_lcl(from->T, Td);
  found.p = from->p * pow(found.T / from->T, 1 / kappa);
  return found;
}

static double theta_e(double T, double Td, double p) {
  double e = es(Td), w = mixing_ratio(e, p), TL = Td >= T ? T : bolton_lcl(T, Td);
  double dry = T * pow(p0 / (p - e), kappa) * pow(T / TL, 0.28 * w);
  return dry * exp((3036 / TL - 1.78) * w * (1 + 0.448 * w));
}

static parcel level_parcel(const sounding *s, int at) { parcel made = { s->p[at], s->T[at], s->Td[at], s->w[at] }; return made; }

static double dewpoint_at(double e) {
  double ratio = log(e / 611.2), T = 273.15 + 243.5 * ratio / (17.67 - ratio);
  for (int n = 0; n < 60; n++) {
    double change = Rv * T * T / L(T) * log(e / es(T));
    T += change;
    if (fabs(change) < 1e-11) break;
  }
  return T;
}

static parcel mixed_parcel(const sounding *s, double depth) {
  double bottom = s->p[0], top = bottom - depth, theta = s->T[0] * pow(p0 / bottom, kappa), w = s->w[0], p = bottom, theta_sum = 0, w_sum = 0;
  for (int at = 1; at < s->count && p > top; at++) {
    double next_p = s->p[at], next_theta = s->T[at] * pow(p0 / next_p, kappa), next_w = s->w[at];
    if (next_p < top) {
      double part = (log(top) - s->log_p[at - 1]) / (s->log_p[at] - s->log_p[at - 1]);
      next_theta = theta + part * (next_theta - theta);
      next_w = w + part * (next_w - w);
      next_p = top;
    }
    theta_sum += 0.5 * (theta + next_theta) * (p - next_p);
    w_sum += 0.5 * (w + next_w) * (p - next_p);
    theta = next_theta; w = next_w; p = next_p;
  }
  parcel made;
  double mean_w = w_sum / depth;
  made.p = bottom;
  made.T = theta_sum / depth * pow(bottom / p0, kappa);
  made.Td = dewpoint_at(mean_w * bottom / (epsilon + mean_w));
  made.w = mean_w;
  return made;
}

static parcel unstable_parcel(const sounding *s) {
  double top = s->p[0] - 30000, most = -INFINITY;
  int best = 0;
  for (int at = 0; at < s->count && s->p[at] >= top; at++) {
    double theta = theta_e(s->T[at], s->Td[at], s->p[at]);
    if (theta > most) { most = theta; best = at; }
  }
  return level_parcel(s, best);
}

static double node_log[MOST], node_p[MOST], node_excess[MOST];
static int node_count;

static void add_segment(double to_log, double to_p, double to_column) {
  double from_log = node_log[node_count - 1], from_column = node_excess[node_count - 1], whole = to_log - from_log;
  int parts = (int)ceil(-whole / longest_step);
  for (int n = 1; n < parts; n++) {
    double share = (double)n / parts;
    node_log[node_count] = from_log + share * whole;
    node_p[node_count] = exp(from_log + share * whole);
    node_excess[node_count] = from_column + share * (to_column - from_column);
    node_count++;
  }
  node_log[node_count] = to_log; node_p[node_count] = to_p; node_excess[node_count] = to_column;
  node_count++;
}

static double between(const double *log_p, const double *column, int count, int at, double where) {
  int above = at + 1 < count ? at + 1 : at;
  double from = log_p[at], to = log_p[above], below = column[at];
  return to == from ? below : below + (where - from) / (to - from) * (column[above] - below);
}

static int lay_nodes(const sounding *s, const double *column, const parcel *from, double lcl_p) {
  double start = log(from->p), lcl_log = log(lcl_p);
  int at = 0;
  while (at < s->count - 1 && s->p[at + 1] >= from->p) at++;
  node_count = 1;
  node_log[0] = start; node_p[0] = from->p; node_excess[0] = between(s->log_p, column, s->count, at, start);
  int lcl_node = lcl_log >= start ? 0 : -1;
  for (int row = at + 1; row < s->count; row++) {
    double to_log = s->log_p[row];
    if (lcl_node < 0 && to_log <= lcl_log) {
      if (to_log < lcl_log) add_segment(lcl_log, lcl_p, between(s->log_p, column, s->count, row - 1, lcl_log));
      else add_segment(to_log, s->p[row], column[row]);
      lcl_node = node_count - 1;
      if (to_log == lcl_log) continue;
    }
    add_segment(to_log, s->p[row], column[row]);
  }
  return lcl_node < 0 ? node_count : lcl_node;
}

static double slope(double T, double p, double e) {
  double w = epsilon * e / (p - e), l = L(T), RT = R * T;
  return (RT + l * w) / (cp + l * l * w * epsilon / (RT * T));
}

typedef struct { double T, e, slope; } saturated;

static void saturated_step(saturated *at, double from, double to, double h) {
  double middle = sqrt(from * to), sum = at->slope, here = at->T, e = 0, k = at->slope;
  for (int stage = 1; stage <= 4; stage++) {
    here = at->T + (stage == 4 ? h / 6 * sum : (stage == 3 ? h : 0.5 * h) * k);
    e = es(here);
    k = slope(here, stage < 3 ? middle : to, e);
    sum += stage < 3 ? 2 * k : k;
  }
  at->T = here; at->e = e; at->slope = k;
}

static void lift_through_nodes(const parcel *from, const level *lcl, int lcl_node) {
  double start = node_log[0], factor = (1 + from->w / epsilon) / (1 + from->w);
  int dry = lcl_node < node_count ? lcl_node : node_count;
  for (int n = 0; n < dry; n++) node_excess[n] = from->T * exp(kappa * (node_log[n] - start)) * factor - node_excess[n];
  if (lcl_node >= node_count) return;
  node_excess[lcl_node] = lcl->T * factor - node_excess[lcl_node];
  saturated at = { lcl->T, es(lcl->T), 0 };
  at.slope = slope(at.T, node_p[lcl_node], at.e);
  for (int n = lcl_node + 1; n < node_count; n++) {
    saturated_step(&at, node_p[n - 1], node_p[n], node_log[n] - node_log[n - 1]);
    double w = epsilon * at.e / (node_p[n] - at.e);
    node_excess[n] = at.T * (1 + w / epsilon) / (1 + w) - node_excess[n];
  }
}

static ascent lift(const sounding *s, const parcel *from) {
  level lcl = lcl_of(from);
  int lcl_node = lay_nodes(s, s->Tv, from, lcl.p);
  lift_through_nodes(from, &lcl, lcl_node);
  double lfc_log = NAN, el_log = NAN, positive = 0, negative = 0;
  if (lcl_node == 0 && node_excess[0] > neutral) lfc_log = node_log[0];
  for (int n = 1; n < node_count; n++) {
    double below = node_excess[n - 1], above = node_excess[n], start = node_log[n - 1], depth = start - node_log[n];
    int rising = above > neutral && !(below > neutral), falling = below > neutral && !(above > neutral);
    int crosses = (below > 0 && above < 0) || (below < 0 && above > 0), has_lfc = lfc_log == lfc_log;
    double share = crosses ? below / (below - above) : 1;
    if (crosses) {
      double first = 0.5 * R * below * share * depth, second = 0.5 * R * above * (1 - share) * depth;
      if (first < 0 && !has_lfc) negative += first;
      if (first > 0 && has_lfc) positive += first;
      if (rising && !has_lfc && n > lcl_node) lfc_log = start - share * depth;
      int is_free = lfc_log == lfc_log;
      if (second > 0 && is_free) positive += second;
      if (second < 0 && !is_free) negative += second;
    } else {
      if (rising && !has_lfc && n > lcl_node) lfc_log = start;
      double area = 0.5 * R * (below + above) * depth;
      int is_free = lfc_log == lfc_log;
      if (area < 0 && !is_free) negative += area;
      if (area > 0 && is_free) positive += area;
    }
    if (falling && lfc_log == lfc_log) el_log = start - share * depth;
    if (n == lcl_node && above > neutral && lfc_log != lfc_log) lfc_log = node_log[n];
  }
  int warm = node_excess[node_count - 1] > neutral && lfc_log == lfc_log;
  ascent made = { lcl.p, exp(lfc_log), el_log == el_log && !warm ? exp(el_log) : NAN, positive, negative };
  return made;
}

static double cpu(void) { struct timespec at; clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &at); return at.tv_sec + at.tv_nsec * 1e-9; }

static int count;
static double p[MOST], T[MOST], Td[MOST];
static sounding made;
static ascent found[3];

static void three_ascents(double moved) {
  T[0] += moved;
  make_sounding(&made, count, p, T, Td);
  parcel from[3] = { level_parcel(&made, 0), mixed_parcel(&made, 10000), unstable_parcel(&made) };
  for (int n = 0; n < 3; n++) found[n] = lift(&made, &from[n]);
  T[0] -= moved;
}

int main(int argc, char **argv) {
  if (argc != 3) return 2;
  make_tables();
  FILE *file = fopen(argv[1], "r");
  long repeats = atol(argv[2]);
  if (!file || fscanf(file, "%lf %lf %lf %lf %lf %d", &cp, &R, &Rv, &g, &kappa, &count) != 6 || count > MOST / 2) return 2;
  for (int at = 0; at < count; at++) if (fscanf(file, "%lf %lf %lf", &p[at], &T[at], &Td[at]) != 3) return 2;
  fclose(file);
  epsilon = R / Rv;
  double sink = 0, start = cpu();
  for (long n = 0; n < repeats; n++) { three_ascents(1e-6 * (double)(n % 1000)); sink += found[0].cape + found[1].cin + found[2].cape; }
  double ascents = cpu() - start;
  three_ascents(0);
  start = cpu();
  double sum = 0;
  for (long n = 0; n < 1000000; n++) sum += theta_e(250 + 50 * ((double)n / 1000000), 245 + 48 * ((double)n / 1000000), 70000 + 30000 * ((double)(n % 1000) / 1000));
  double thetas = cpu() - start;
  printf("{\"ascents\":%.9g,\"thetas\":%.9g,\"thetaSum\":%.17g,\"sink\":%.17g,\"found\":[", ascents, thetas, sum, sink);
  for (int n = 0; n < 3; n++) printf("%s%.17g,%.17g,%.17g,%.17g,%.17g", n ? "," : "", found[n].lcl, found[n].lfc, found[n].el, found[n].cape, found[n].cin);
  printf("]}\n");
  return 0;
}
