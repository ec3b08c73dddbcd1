/*
 * C reference for elements: central difference of two-node rods, the same rig and records as
 * reference.c, tiled for the cache. A block of nodes is taken through TILE steps at a time, skewed by
 * one node a step so that each block only needs what lies left of it (time skewing); everything is
 * recorded: envelope of the nodal force with its steps, traces at four gauges, energy and a row of the
 * field at 128 samples.
 *
 * usage: elementsReference MODE CELLS STEPS REPEATS   MODE linear | plastic
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <string.h>
#include <time.h>

#define SAMPLES 128
#define GAUGES 4
#define BLOCK 512

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

/* Area at s, as GRADED_AREA in rigs.ts. */
static double areaAt(double s) { return 1e-4 * (1 + 0.3 * s + 0.1 * sin(40 * s)); }

/* What a line is made of and what is kept of it; see the kernel of the engine for the letters. */
struct line {
  int n;
  double *v, *F, *K, *Y, *R, *P, *high, *low;
  int *highStep, *lowStep;
};

/*
 * Nodes a..b-1 at step k: node j moves, then element j - 1 follows.
 * keep[0]: force of element a - 1 before this step, keep[1]: new velocity of node a - 1.
 */
static inline __attribute__((always_inline)) void sweep(struct line *line, int a, int b, int k, double *keep, int plastic) {
  double *restrict v = line->v, *restrict F = line->F, *restrict K = line->K, *restrict Y = line->Y;
  double *restrict R = line->R, *restrict P = line->P, *restrict high = line->high, *restrict low = line->low;
  int *restrict highStep = line->highStep, *restrict lowStep = line->lowStep, n = line->n;
  double before = keep[0], vBefore = keep[1];
  int stop = b < n ? b : n;
  for (int j = a; j < stop; j++) {
    double here = F[j], vHere = v[j] + Y[j] * (here - before), node = 0.5 * (before + here);
    double trial = before + K[j - 1] * (vHere - vBefore);
    if (plastic) {
      double over = fabs(trial) - R[j - 1];
      if (over > 0) {
        double share = over / (K[j - 1] + P[j - 1]);
        trial -= (trial < 0 ? -1 : 1) * K[j - 1] * share;
        R[j - 1] += P[j - 1] * share;
      }
    }
    v[j] = vHere;
    F[j - 1] = trial;
    if (node > high[j]) high[j] = node, highStep[j] = k;
    else if (node < low[j]) low[j] = node, lowStep[j] = k;
    before = here;
    vBefore = vHere;
  }
  if (b > n) {
    /* The fixed end. */
    double trial = before - K[n - 1] * vBefore;
    if (plastic && fabs(trial) > R[n - 1]) {
      double share = (fabs(trial) - R[n - 1]) / (K[n - 1] + P[n - 1]);
      trial -= (trial < 0 ? -1 : 1) * K[n - 1] * share;
      R[n - 1] += P[n - 1] * share;
    }
    F[n - 1] = trial;
  }
  keep[0] = before;
  keep[1] = vBefore;
}

int main(int argc, char **argv) {
  if (argc < 5) return 2;
  int plastic = strcmp(argv[1], "plastic") == 0;
  int n = atoi(argv[2]), steps = atoi(argv[3]), repeats = atoi(argv[4]);
  double h = 1.0 / n, E = 200e9, rho = 8000, check = 0;
  double dt = h / 5000;
  double *v = malloc(8 * (n + 1)), *F = malloc(8 * (n + 1)), *K = malloc(8 * n), *Y = malloc(8 * (n + 1));
  double *R = malloc(8 * n), *P = malloc(8 * n), *high = malloc(8 * (n + 1)), *low = malloc(8 * (n + 1));
  int *highStep = malloc(4 * (n + 1)), *lowStep = malloc(4 * (n + 1));
  struct line line = {n, v, F, K, Y, R, P, high, low, highStep, lowStep};
  double *trace = malloc(8 * 2 * GAUGES * (size_t)(steps + 1));
  double *field = malloc(8 * (size_t)(SAMPLES + 1) * SAMPLES), *mass = calloc(n + 1, 8);
  double energy[SAMPLES + 1], Et = 20e9;
  for (int i = 0; i < n; i++) {
    double A = areaAt((i + 0.5) * h);
    K[i] = dt * E * A / h;
    P[i] = dt * (E * Et / (E - Et)) * A / h;
    mass[i] += rho * A * h / 2;
    mass[i + 1] += rho * A * h / 2;
  }
  for (int j = 0; j <= n; j++) Y[j] = dt / mass[j];
  for (int r = 0; r < repeats; r++) {
    double start = now();
    for (int j = 0; j <= n; j++) v[j] = F[j] = high[j] = low[j] = 0, highStep[j] = lowStep[j] = 0;
    for (int i = 0; i < n; i++) R[i] = plastic ? 3e6 * areaAt((i + 0.5) * h) : INFINITY;
    int sample = 0;
    double width = 0.1 / 5000;
    int k = 0;
    double(*keep)[2] = malloc(sizeof(double[2]) * 64);
    while (k <= steps) {
      int next = (int)((double)sample * steps / SAMPLES + 0.5);
      int until = next + 1 < k + 32 ? next + 1 : k + 32;
      if (until > steps + 1) until = steps + 1;
      int depth = until - k;
      /* Left ends of all steps of the tile depend on what the tile does; each is started in its turn. */
      for (int from = 0; from < n + depth; from += BLOCK) {
        for (int s = 0; s < depth; s++) {
          int a = from - s, b = from + BLOCK - s;
          if (a < 1) {
            a = 1;
            if (from == 0 && b > 1) {
              double t = (k + s) * dt, T = t < width ? 1000 * sin(M_PI * t / width) : 0;
              double share = k + s == 0 ? 0.5 : 1;
              keep[s][0] = F[0];
              v[0] += share * Y[0] * (F[0] + T);
              keep[s][1] = v[0];
              if (-T < low[0]) low[0] = -T, lowStep[0] = k + s;
            }
          }
          if (b > n + 1) b = n + 1;
          if (a >= b) continue;
          if (plastic) sweep(&line, a, b, k + s, keep[s], 1);
          else sweep(&line, a, b, k + s, keep[s], 0);
          for (int q = 0; q < GAUGES; q++) {
            int j = (q + 1) * n / (GAUGES + 1);
            if (j < a || j >= b) continue;
            trace[2 * (q * (size_t)(steps + 1) + k + s)] = F[j];
            trace[2 * (q * (size_t)(steps + 1) + k + s) + 1] = v[j];
          }
        }
      }
      k = until;
      if (sample <= SAMPLES && k == next + 1) {
        double sum = 0;
        for (int i = 0; i < n; i++) sum += F[i] * F[i] / K[i] * dt + mass[i] * v[i] * v[i];
        energy[sample] = sum / 2;
        for (int j = 0; j < SAMPLES; j++) {
          int i = 1 + (int)((double)j * (n - 2) / SAMPLES);
          field[(size_t)sample * SAMPLES + j] = (F[i - 1] + F[i]) / 2 / areaAt(i * h);
        }
        sample++;
      }
    }
    free(keep);
    double end = now();
    for (int j = 0; j <= n; j++) check += high[j] - low[j] + 1e-9 * (highStep[j] + lowStep[j]);
    check += energy[SAMPLES] + field[SAMPLES * SAMPLES / 2] + trace[steps];
    printf("%.9f ", end - start);
  }
  double peak = 0;
  for (int j = 0; j <= n; j++) if (-low[j] > peak) peak = -low[j];
  printf("\n%.15g %.15g %.15g\n", peak, energy[SAMPLES], check);
  return 0;
}
