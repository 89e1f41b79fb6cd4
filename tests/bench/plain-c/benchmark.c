/*
 * The benchmark storm in plain C: what the engine's hot loops are measured against, in the same run.
 * Same algorithm, same order of operations, no fused multiply-add: the fair counterpart of the TypeScript.
 *
 * Usage: benchmark column LEVELS STEPS | slab STEPS REPEATS | density N
 * Prints one line of JSON: nanoseconds and the figures of the run.
 */
#include <math.h>
#include <stdint.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#include "specific-volume.h"

#define OMEGA 7.292115e-5
#define RHO0 1025.0
#define CP0 3991.86795711963
#define G 9.81
#define DT 900.0
#define DZ 1.0
#define PI 3.14159265358979323846
#define BLOCK 16

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec * 1e9 + t.tv_nsec;
}

static uint32_t random_state;

static double mulberry32(void) {
  uint32_t t = (random_state += 0x6D2B79F5u);
  t = (t ^ (t >> 15)) * (t | 1u);
  t ^= t + (t ^ (t >> 7)) * (t | 61u);
  return (t ^ (t >> 14)) / 4294967296.0;
}

static void stress_at(double hour, double *x, double *y) {
  double size = hour < 120 ? 0.05 + 1.95 * hour / 120 : hour < 240 ? 2.0 - 1.9 * (hour - 120) / 120 : 0.1;
  double angle = -2 * PI * hour / 48;
  *x = size * cos(angle);
  *y = size * sin(angle);
}

typedef struct {
  int n;
  double *T, *S, *u, *v, *rho, *ri, *least;
  int blocks;
} Column;

static void homogenise(Column *c, int from, int to) {
  double t = 0, s = 0, u = 0, v = 0;
  int count = to - from;
  for (int k = from; k < to; k++) {
    t += c->T[k];
    s += c->S[k];
    u += c->u[k];
    v += c->v[k];
  }
  t /= count;
  s /= count;
  u /= count;
  v /= count;
  double r = surface_density(s, t);
  for (int k = from; k < to; k++) {
    c->T[k] = t;
    c->S[k] = s;
    c->u[k] = u;
    c->v[k] = v;
    c->rho[k] = r;
  }
}

static void mix_statically(Column *c) {
  for (int k = 0; k + 1 < c->n; k++) {
    if (!(c->rho[k + 1] < c->rho[k] - 1e-10)) continue;
    int top = k, bottom = k + 1;
    homogenise(c, top, bottom + 1);
    for (;;) {
      if (bottom + 1 < c->n && c->rho[bottom + 1] < c->rho[bottom] - 1e-10) bottom++;
      else if (top > 0 && c->rho[top] < c->rho[top - 1] - 1e-10) top--;
      else break;
      homogenise(c, top, bottom + 1);
    }
    k = bottom;
  }
}

static inline double richardson_at(const Column *c, int k) {
  double du = c->u[k + 1] - c->u[k], dv = c->v[k + 1] - c->v[k];
  double shear2 = du * du + dv * dv;
  if (shear2 < 1e-12) return INFINITY;
  double step = c->rho[k + 1] - c->rho[k];
  return step > 0 ? G * DZ / RHO0 * step / shear2 : 0;
}

static inline void renew_block(Column *c, int b) {
  double least = c->ri[b * BLOCK];
  for (int k = b * BLOCK + 1; k < (b + 1) * BLOCK; k++)
    if (c->ri[k] < least) least = c->ri[k];
  c->least[b] = least;
}

static long mix_at_gradients(Column *c) {
  int interfaces = c->n - 1;
  for (int k = 0; k < interfaces; k++) c->ri[k] = richardson_at(c, k);
  for (int b = 0; b < c->blocks; b++) renew_block(c, b);
  for (long exchanges = 0;; exchanges++) {
    int block = 0;
    double least = c->least[0];
    for (int b = 1; b < c->blocks; b++)
      if (c->least[b] < least) {
        least = c->least[b];
        block = b;
      }
    if (!(least < 0.25)) return exchanges;
    int k = block * BLOCK;
    while (c->ri[k] != least) k++;
    double half = (1 - least / 0.30) / 2;
    double dT = half * (c->T[k + 1] - c->T[k]), dS = half * (c->S[k + 1] - c->S[k]);
    double du = half * (c->u[k + 1] - c->u[k]), dv = half * (c->v[k + 1] - c->v[k]);
    c->T[k] += dT;
    c->T[k + 1] -= dT;
    c->S[k] += dS;
    c->S[k + 1] -= dS;
    c->u[k] += du;
    c->u[k + 1] -= du;
    c->v[k] += dv;
    c->v[k + 1] -= dv;
    c->rho[k] = surface_density(c->S[k], c->T[k]);
    c->rho[k + 1] = surface_density(c->S[k + 1], c->T[k + 1]);
    int first = k > 0 ? k - 1 : 0, last = k + 1 < interfaces ? k + 1 : k;
    for (int i = first; i <= last; i++) c->ri[i] = richardson_at(c, i);
    renew_block(c, first / BLOCK);
    if (last / BLOCK != first / BLOCK) renew_block(c, last / BLOCK);
  }
}

static void mix_in_bulk(Column *c, int m) {
  while (m < c->n) {
    double du = c->u[0] - c->u[m], dv = c->v[0] - c->v[m], shear2 = du * du + dv * dv;
    if (shear2 == 0 || G * (c->rho[m] - c->rho[0]) * m * DZ >= 0.65 * RHO0 * shear2) return;
    m++;
    homogenise(c, 0, m);
  }
}

static void rotate(Column *c, double cosine, double sine) {
  for (int k = 0; k < c->n; k++) {
    double u = c->u[k];
    c->u[k] = u * cosine + c->v[k] * sine;
    c->v[k] = c->v[k] * cosine - u * sine;
  }
}

static double light(double z) { return 0.67 * exp(-z) + 0.33 * exp(-z / 17); }

static double *numbers(int n) { return calloc(n, sizeof(double)); }

static void column(int n, int steps) {
  double f = 2 * OMEGA * sin(PI / 6);
  Column c = {n, numbers(n), numbers(n), numbers(n), numbers(n), numbers(n), NULL, NULL, (n - 1 + BLOCK - 1) / BLOCK};
  c.ri = numbers(c.blocks * BLOCK);
  c.least = numbers(c.blocks);
  for (int k = 0; k < c.blocks * BLOCK; k++) c.ri[k] = INFINITY;
  double *share = numbers(n);
  for (int k = 0; k < n; k++) {
    double b = fmax(0, k + 0.5 - 15);
    c.T[k] = fmax(2, 28 - 0.05 * b);
    c.S[k] = 35 + 0.002 * b;
    c.rho[k] = surface_density(c.S[k], c.T[k]);
    share[k] = light(k) - (k == n - 1 ? 0 : light(k + 1));
  }
  double cosine = cos(f * DT / 2), sine = sin(f * DT / 2);
  long exchanges = 0;
  double start = now();
  for (int i = 0; i < steps; i++) {
    double hour = (i + 0.5) * DT / 3600, x, y;
    stress_at(hour, &x, &y);
    double sun = 600 * fmax(0, sin(2 * PI * (hour - 6) / 24)), rain = hour >= 114 && hour < 126 ? 10 / 3.6e6 : 0;
    double warming = DT / (RHO0 * CP0 * DZ);
    for (int k = 0; k < n; k++) c.T[k] += sun * warming * share[k];
    c.T[0] -= 300 * warming;
    c.S[0] -= 35 * rain * DT / DZ;
    for (int k = 0; k < (sun > 0 ? n : 1); k++) c.rho[k] = surface_density(c.S[k], c.T[k]);
    mix_statically(&c);
    int m = 1;
    while (m < n && fabs(c.rho[m] - c.rho[0]) <= 1e-4) m++;
    rotate(&c, cosine, sine);
    for (int k = 0; k < m; k++) {
      c.u[k] += x * DT / (RHO0 * m * DZ);
      c.v[k] += y * DT / (RHO0 * m * DZ);
    }
    rotate(&c, cosine, sine);
    mix_in_bulk(&c, m);
    exchanges += mix_at_gradients(&c);
    mix_statically(&c);
  }
  double nanoseconds = now() - start;
  printf("{\"nanoseconds\":%.0f,\"exchanges\":%ld,\"sst\":%.10g,\"sss\":%.10g}\n", nanoseconds, exchanges, c.T[0], c.S[0]);
}

static void slab(int steps, int repeats) {
  double f = 2 * OMEGA * sin(PI / 6), r = 1 / (4 * 86400.0), mass = RHO0 * 30;
  double *x = numbers(steps + 1), *y = numbers(steps + 1), u = 0, v = 0, east = 0, north = 0, peak = 0;
  for (int k = 0; k <= steps; k++) stress_at(k * DT / 3600, &x[k], &y[k]);
  double w2 = r * r + f * f;
  double e = exp(-r * DT), ex = e * cos(f * DT), ey = -e * sin(f * DT);
  /* p1 = (1 - E)/(omega dt), p2 = (1 - p1)/(omega dt), with omega = r + i f */
  double p1x = ((1 - ex) * r - ey * f) / (w2 * DT), p1y = (-ey * r - (1 - ex) * f) / (w2 * DT);
  double p2x = ((1 - p1x) * r - p1y * f) / (w2 * DT), p2y = (-p1y * r - (1 - p1x) * f) / (w2 * DT);
  double start = now();
  for (int repeat = 0; repeat < repeats; repeat++) {
    u = v = east = north = peak = 0;
    for (int k = 0; k < steps; k++) {
      double ax = x[k] * DT / mass, ay = y[k] * DT / mass;
      double bx = x[k + 1] * DT / mass, by = y[k + 1] * DT / mass;
      double cx = bx - ax, cy = by - ay;
      double u1 = u * ex - v * ey + ax * p1x - ay * p1y + cx * p2x - cy * p2y;
      double v1 = u * ey + v * ex + ax * p1y + ay * p1x + cx * p2y + cy * p2x;
      double dx = (ax + bx) / 2 - (u1 - u), dy = (ay + by) / 2 - (v1 - v);
      east += (dx * r + dy * f) / w2;
      north += (dy * r - dx * f) / w2;
      u = u1;
      v = v1;
      double speed2 = u * u + v * v;
      if (speed2 > peak) peak = speed2;
    }
  }
  double nanoseconds = now() - start;
  printf("{\"nanoseconds\":%.0f,\"u\":%.12g,\"v\":%.12g,\"x\":%.12g,\"y\":%.12g}\n", nanoseconds, u, v, east, north);
}

static void density(int n) {
  double *SA = numbers(n), *CT = numbers(n), *p = numbers(n), *v = numbers(n), *dvdCT = numbers(n), *dvdSA = numbers(n);
  double rho = 0, alpha = 0, beta = 0;
  random_state = 1;
  for (int k = 0; k < n; k++) {
    SA[k] = 42 * mulberry32();
    CT[k] = -2 + 42 * mulberry32();
    p[k] = 8000 * mulberry32();
  }
  double start = now();
  specific_volume_slopes(v, dvdCT, dvdSA, SA, CT, p, n);
  for (int k = 0; k < n; k++) {
    double r = 1 / v[k];
    rho += r;
    alpha += dvdCT[k] * r;
    beta -= dvdSA[k] * r;
  }
  double nanoseconds = now() - start;
  printf("{\"nanoseconds\":%.0f,\"meanRho\":%.15g,\"meanAlpha\":%.15g,\"meanBeta\":%.15g}\n", nanoseconds, rho / n, alpha / n, beta / n);
}

int main(int argc, char **argv) {
  if (argc == 4 && !strcmp(argv[1], "column")) column(atoi(argv[2]), atoi(argv[3]));
  else if (argc == 4 && !strcmp(argv[1], "slab")) slab(atoi(argv[2]), atoi(argv[3]));
  else if (argc == 3 && !strcmp(argv[1], "density")) density(atoi(argv[2]));
  else return fputs("usage: benchmark column LEVELS STEPS | slab STEPS REPEATS | density N\n", stderr), 2;
  return 0;
}
