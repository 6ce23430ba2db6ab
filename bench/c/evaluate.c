/*
 * The formulas of one answer in plain C, to set the library's speed against: vents as lossy
 * lines, the whole circuit, filters, curves, limits, the tuning and the peak air speeds. The
 * geometry arrives worked out, on standard input; pipe resonances are left out.
 *
 * Prints the median time [ms], the tuning [Hz] and the level at each frequency [dB].
 */
#define _POSIX_C_SOURCE 199309L
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define N 400
#define RUNS 400
#define MOST_VENTS 4
#define MOST_LINES 256
#define MOST_SECTIONS 32

static const double PI = 3.14159265358979323846;

typedef struct { double length, radius, perimeter; } line;
typedef struct { double count, area, radius, outer, inner; int lines; line line[MOST_LINES]; } vent;
typedef struct { double high, order, corner, q; } section;
typedef struct { double inner_re, inner_im, outer_re, outer_im; } flow;
typedef struct {
  double q_re, q_im, excursion, z_re, z_im, load, source, array, speed[MOST_VENTS];
} point;

static double rho, c, nu, heat_ratio, prandtl;
static double mass, cms, resistance, bl, sd, re, le;
static double compliance, leak, absorption, rg, voltage;
static double xmax, speed_limit, thermal, voltage_limit, least_load;
static int vents, sections;
static vent all[MOST_VENTS];
static section filter[MOST_SECTIONS];

static flow respond(const vent *v, double om) {
  double dv = sqrt(2 * nu / om), dt = dv / sqrt(prandtl);
  double pr = rho * om * om / (2 * PI * c), pi = om * rho * v->outer / v->area, ur = 1, ui = 0;
  for (int l = 0; l < v->lines; l++) {
    const line *p = &v->line[l];
    double A = p->radius == v->radius ? v->area : PI * p->radius * p->radius;
    double lr = dv / p->perimeter, lt = (heat_ratio - 1) * dt / p->perimeter;
    double q = om * rho / A, s = om * A / (rho * c * c);
    double zr = q * lr, zi = q * (1 + lr), yr = s * lt, yi = s * (1 + lt);
    double parts = fmax(1, ceil(om / c * p->length * 4)), len = p->length / parts;
    for (int m = 0; m < (int)parts; m++) {
      double gr = (zr * yr - zi * yi) * len * len, gi = (zr * yi + zi * yr) * len * len;
      double g2r = gr * gr - gi * gi, g2i = 2 * gr * gi;
      double cr = 1 + gr / 2 + g2r / 24, ci = gi / 2 + g2i / 24;
      double sr = 1 + gr / 6 + g2r / 120, si = gi / 6 + g2i / 120;
      double br = (zr * sr - zi * si) * len, bi = (zr * si + zi * sr) * len;
      double kr = (yr * sr - yi * si) * len, ki = (yr * si + yi * sr) * len;
      double npr = pr * cr - pi * ci + ur * br - ui * bi;
      double npi = pr * ci + pi * cr + ur * bi + ui * br;
      double nur = pr * kr - pi * ki + ur * cr - ui * ci;
      double nui = pr * ki + pi * kr + ur * ci + ui * cr;
      pr = npr, pi = npi, ur = nur, ui = nui;
    }
  }
  double x = om * rho * v->inner / v->area;
  pr -= x * ui, pi += x * ur;
  double d = pr * pr + pi * pi;
  flow f = {(ur * pr + ui * pi) / d, (ui * pr - ur * pi) / d, pr / d, -pi / d};
  return f;
}

static void gain(double om, double *re_out, double *im_out) {
  double r = 1, i = 0;
  for (int k = 0; k < sections; k++) {
    const section *f = &filter[k];
    double x = om / f->corner, nr, ni, dr, di;
    if (f->order == 1) {
      dr = 1, di = x;
      nr = f->high ? 0 : 1, ni = f->high ? x : 0;
    } else {
      dr = 1 - x * x, di = x / f->q;
      nr = f->high ? -x * x : 1, ni = 0;
    }
    double d = dr * dr + di * di;
    double hr = (nr * dr + ni * di) / d, hi = (ni * dr - nr * di) / d;
    double t = r * hr - i * hi;
    i = r * hi + i * hr, r = t;
  }
  *re_out = r, *im_out = i;
}

static void solve(double om, point *out) {
  flow flows[MOST_VENTS];
  double b = om * compliance, loss = b * absorption, share = b / (1 + loss * loss);
  double y_re = share * loss + leak, y_im = share;
  for (int v = 0; v < vents; v++) {
    flows[v] = respond(&all[v], om);
    y_re += all[v].count * flows[v].inner_re;
    y_im += all[v].count * flows[v].inner_im;
  }
  double y2 = y_re * y_re + y_im * y_im;
  double zm_re = resistance + sd * sd * y_re / y2;
  double zm_im = om * mass - 1 / (om * cms) - sd * sd * y_im / y2;
  double zm2 = zm_re * zm_re + zm_im * zm_im, g_re, g_im;
  out->z_re = re + bl * bl * zm_re / zm2;
  out->z_im = om * le - bl * bl * zm_im / zm2;
  gain(om, &g_re, &g_im);
  double e_re = voltage * g_re, e_im = voltage * g_im, rs = re + rg, xs = om * le;
  out->source = sqrt(e_re * e_re + e_im * e_im);
  out->load = sqrt((out->z_re + rg) * (out->z_re + rg) + out->z_im * out->z_im);
  out->array = out->source * sqrt(out->z_re * out->z_re + out->z_im * out->z_im) / out->load;
  double d_re = rs * zm_re - xs * zm_im + bl * bl, d_im = rs * zm_im + xs * zm_re;
  double d = bl / (d_re * d_re + d_im * d_im);
  double u_re = (e_re * d_re + e_im * d_im) * d, u_im = (e_im * d_re - e_re * d_im) * d;
  out->excursion = sqrt(2) * sqrt(u_re * u_re + u_im * u_im) / om;
  double p_re = sd * (u_re * y_re + u_im * y_im) / y2, p_im = sd * (u_im * y_re - u_re * y_im) / y2;
  out->q_re = sd * u_re - p_re * leak, out->q_im = sd * u_im - p_im * leak;
  for (int v = 0; v < vents; v++) {
    const flow *f = &flows[v];
    out->q_re -= all[v].count * (p_re * f->outer_re - p_im * f->outer_im);
    out->q_im -= all[v].count * (p_re * f->outer_im + p_im * f->outer_re);
    double fastest = sqrt(fmax(f->outer_re * f->outer_re + f->outer_im * f->outer_im,
                               f->inner_re * f->inner_re + f->inner_im * f->inner_im));
    out->speed[v] = sqrt(2) * sqrt(p_re * p_re + p_im * p_im) * fastest / all[v].area;
  }
}

static double susceptance(double f) {
  double w = 2 * PI * f, b = w * compliance;
  for (int v = 0; v < vents; v++) b += all[v].count * respond(&all[v], w).inner_im;
  return b * w;
}

static double tuning(void) {
  double lo = 1, hi = 400;
  for (int i = 0; i < 60 && hi - lo > 1e-9 * hi; i++) {
    double mid = (lo + hi) / 2;
    if (susceptance(mid) < 0) lo = mid;
    else hi = mid;
  }
  return (lo + hi) / 2;
}

static double peak(int v, double from, double to) {
  const double golden = (sqrt(5) - 1) / 2;
  double low = log(from), high = log(to), left = high - golden * (high - low);
  double right = low + golden * (high - low);
  point a, b;
  solve(2 * PI * exp(left), &a), solve(2 * PI * exp(right), &b);
  for (int step = 0; step < 12; step++) {
    if (a.speed[v] > b.speed[v]) {
      high = right, right = left, b = a, left = high - golden * (high - low);
      solve(2 * PI * exp(left), &a);
    } else {
      low = left, left = right, a = b, right = low + golden * (high - low);
      solve(2 * PI * exp(right), &b);
    }
  }
  return fmax(a.speed[v], b.speed[v]);
}

static double spl[N], phase[N], delay[N], impedance[N], angle[N], largest[N], fastest[MOST_VENTS];
static point at[N];

static double answer(void) {
  double tuned = tuning();
  for (int i = 0; i < N; i++) {
    double om = 2 * PI * 10 * pow(50, (double)i / (N - 1));
    point *p = &at[i], ahead;
    solve(om, p), solve(om * (1 + 1e-6), &ahead);
    spl[i] = 20 * log10(om * rho / (2 * PI * 20e-6) * sqrt(p->q_re * p->q_re + p->q_im * p->q_im));
    phase[i] = atan2(p->q_re, -p->q_im) * 180 / PI;
    delay[i] = -atan2(ahead.q_im * p->q_re - ahead.q_re * p->q_im,
                      ahead.q_re * p->q_re + ahead.q_im * p->q_im) / (1e-6 * om);
    impedance[i] = sqrt(p->z_re * p->z_re + p->z_im * p->z_im);
    angle[i] = atan2(p->z_im, p->z_re) * 180 / PI;
    double scale = xmax / p->excursion;
    for (int v = 0; v < vents; v++) scale = fmin(scale, speed_limit / p->speed[v]);
    scale = fmin(scale, fmin(thermal / p->array, voltage_limit / p->source));
    if (p->load < least_load) scale = fmin(scale, voltage_limit * p->load / (least_load * p->source));
    largest[i] = spl[i] + 20 * log10(scale);
  }
  for (int v = 0; v < vents; v++) {
    int top = 1;
    for (int i = 1; i < N - 1; i++) if (at[i].speed[v] > at[top].speed[v]) top = i;
    fastest[v] = peak(v, 10 * pow(50, (top - 1.0) / (N - 1)), 10 * pow(50, (top + 1.0) / (N - 1)));
  }
  return tuned;
}

static double next(void) {
  double value;
  if (scanf("%lf", &value) != 1) exit(2);
  return value;
}

static int ascending(const void *a, const void *b) {
  double x = *(const double *)a, y = *(const double *)b;
  return (x > y) - (x < y);
}

int main(void) {
  double *const numbers[] = {&rho, &c, &nu, &heat_ratio, &prandtl, &mass, &cms, &resistance, &bl,
                             &sd, &re, &le, &compliance, &leak, &absorption, &rg, &voltage, &xmax,
                             &speed_limit, &thermal, &voltage_limit, &least_load};
  for (size_t i = 0; i < sizeof numbers / sizeof *numbers; i++) *numbers[i] = next();
  sections = (int)next();
  if (sections > MOST_SECTIONS) return 2;
  for (int i = 0; i < sections; i++) {
    section s = {next(), 0, 0, 0};
    s.order = next(), s.corner = next(), s.q = next();
    filter[i] = s;
  }
  vents = (int)next();
  if (vents > MOST_VENTS) return 2;
  for (int v = 0; v < vents; v++) {
    vent *p = &all[v];
    p->count = next(), p->area = next(), p->radius = next(), p->outer = next(), p->inner = next();
    p->lines = (int)next();
    if (p->lines > MOST_LINES) return 2;
    for (int l = 0; l < p->lines; l++)
      p->line[l].length = next(), p->line[l].radius = next(), p->line[l].perimeter = next();
  }
  static double times[RUNS];
  double tuned = 0;
  for (int run = -20; run < RUNS; run++) {
    struct timespec began, ended;
    clock_gettime(CLOCK_MONOTONIC, &began);
    tuned = answer();
    clock_gettime(CLOCK_MONOTONIC, &ended);
    if (run >= 0)
      times[run] = (ended.tv_sec - began.tv_sec) * 1e3 + (ended.tv_nsec - began.tv_nsec) / 1e6;
  }
  qsort(times, RUNS, sizeof *times, ascending);
  printf("%.9g %.9g", times[RUNS / 2], tuned);
  for (int i = 0; i < N; i++) printf(" %.9g", spl[i]);
  printf("\n");
  return 0;
}
