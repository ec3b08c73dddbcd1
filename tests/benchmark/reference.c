/*
 * Plain C reference: the same scheme as one fused loop over every cell and step, each cell with an
 * impedance of its own, everything recorded (force envelope with its steps, the traces at four
 * gauges, energy and a row of the field at 128 samples).
 *
 * usage: reference MODE CELLS STEPS REPEATS   MODE graded: every cell differs; uniform: 8 sections
 * prints the seconds of each repeat on one line, then checksums
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#define SAMPLES 128
#define GAUGES 4

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

/* Area of cell i in square metres; must match makeBenchmarkRig in rigs.ts. */
static double areaAt(int graded, int i, int n) {
  double s = (i + 0.5) / n;
  if (graded) return 1e-4 * (1 + 0.3 * s + 0.1 * sin(40 * s));
  return 1e-4 * (1 + 0.25 * (((int)(s * 8)) % 3));
}

int main(int argc, char **argv) {
  if (argc < 5) return 2;
  int graded = strcmp(argv[1], "graded") == 0;
  int n = atoi(argv[2]), steps = atoi(argv[3]), repeats = atoi(argv[4]);
  double *f = malloc(8 * n), *g = malloc(8 * n), *T = malloc(8 * n), *Z = malloc(8 * n);
  double *high = malloc(8 * (n + 1)), *low = malloc(8 * (n + 1));
  int *highStep = malloc(4 * (n + 1)), *lowStep = malloc(4 * (n + 1));
  double *trace = malloc(8 * 2 * GAUGES * (size_t)(steps + 1));
  double *field = malloc(8 * (size_t)(SAMPLES + 1) * SAMPLES), energy[SAMPLES + 1];
  double check = 0, dt = 1.0 / n / 5000;
  for (int i = 0; i < n; i++) Z[i] = 4e7 * areaAt(graded, i, n);
  for (int i = 1; i < n; i++) T[i] = 2 * Z[i] / (Z[i - 1] + Z[i]);
  for (int r = 0; r < repeats; r++) {
    double start = now();
    memset(high, 0, 8 * (n + 1));
    memset(low, 0, 8 * (n + 1));
    memset(highStep, 0, 4 * (n + 1));
    memset(lowStep, 0, 4 * (n + 1));
    for (int i = 0; i < n; i++) f[i] = g[i] = 0;
    int sample = 0;
    for (int k = 0; k <= steps; k++) {
      double arriving = f[0], leftArriving = g[0];
      for (int i = 1; i < n; i++) {
        double fIn = arriving, gIn = g[i], F = 2 * gIn + T[i] * (fIn - gIn);
        arriving = f[i];
        f[i] = F - gIn;
        g[i - 1] = F - fIn;
        if (F > high[i]) {
          high[i] = F;
          highStep[i] = k;
        } else if (F < low[i]) {
          low[i] = F;
          lowStep[i] = k;
        }
      }
      /* left end: a half-sine force pushing right; right end: fixed */
      double t = k * dt, width = 0.1 / 5000;
      double F0 = t < width ? -1000 * sin(M_PI * t / width) : 0;
      f[0] = F0 - leftArriving;
      g[n - 1] = arriving;
      if (F0 > high[0]) high[0] = F0, highStep[0] = k;
      else if (F0 < low[0]) low[0] = F0, lowStep[0] = k;
      if (2 * arriving > high[n]) high[n] = 2 * arriving, highStep[n] = k;
      else if (2 * arriving < low[n]) low[n] = 2 * arriving, lowStep[n] = k;
      for (int j = 0; j < GAUGES; j++) {
        int i = (j + 1) * n / (GAUGES + 1);
        double Y = 2 / (Z[i - 1] + Z[i]);
        trace[2 * (j * (size_t)(steps + 1) + k)] = Y * (Z[i - 1] * f[i] + Z[i] * g[i - 1]);
        trace[2 * (j * (size_t)(steps + 1) + k) + 1] = Y * (g[i - 1] - f[i]);
      }
      if (k % 64 == 0)
        for (int i = 0; i < n; i++) {
          if (fabs(f[i]) < 1e-200) f[i] = 0;
          if (fabs(g[i]) < 1e-200) g[i] = 0;
        }
      if (sample <= SAMPLES && k == (int)((double)sample * steps / SAMPLES + 0.5)) {
        double sum = 0;
        for (int i = 0; i < n; i++) sum += (f[i] * f[i] + g[i] * g[i]) / Z[i];
        energy[sample] = dt * sum;
        for (int j = 0; j < SAMPLES; j++) {
          int i = 1 + (int)((double)j * (n - 2) / SAMPLES);
          double Y = 2 / (Z[i - 1] + Z[i]);
          field[(size_t)sample * SAMPLES + j] = Y * (Z[i - 1] * f[i] + Z[i] * g[i - 1]) * 4e7 / Z[i];
        }
        sample++;
      }
    }
    double end = now();
    for (int i = 0; i <= n; i++) check += high[i] - low[i] + 1e-9 * (highStep[i] + lowStep[i]);
    check += energy[SAMPLES] + field[SAMPLES * SAMPLES / 2] + trace[steps];
    printf("%.9f ", end - start);
  }
  double peak = 0;
  for (int i = 0; i <= n; i++) if (-low[i] > peak) peak = -low[i];
  printf("\n%.15g %.15g %.15g\n", peak, energy[SAMPLES], check);
  return 0;
}
