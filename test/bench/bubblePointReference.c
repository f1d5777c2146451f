/* Bubble temperatures of five Antoine components in plain C, to measure the sweep against in the same run.
   gcc -O3 -march=native -o bubblePointReference bubblePointReference.c -lm; ./bubblePointReference [cases]
   Prints: nanoseconds per case, checksum of all cases and of the first 2000. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define COMPONENTS 5

/* n-pentane to n-nonane: log10(P/Pa) = A - B/(T + C) */
static const double A[COMPONENTS] = {8.97786, 9.00139, 9.02023, 9.05075, 9.07356};
static const double B[COMPONENTS] = {1064.84, 1170.875, 1263.909, 1356.36, 1438.03};
static const double C[COMPONENTS] = {-41.136, -48.833, -56.718, -63.515, -70.456};

typedef struct {
  double fraction[COMPONENTS], pressure;
} Case;

/* Park and Miller's minimal standard generator: the same cases in every language. */
static long long state = 23456;
static double uniform(void) {
  state = 16807LL * state % 2147483647LL;
  return (double)state / 2147483647.0;
}

static void draw(Case *c) {
  double sum = 0;
  for (int i = 0; i < COMPONENTS; i++) sum += c->fraction[i] = 0.05 + uniform();
  for (int i = 0; i < COMPONENTS; i++) c->fraction[i] /= sum;
  c->pressure = 5e4 * pow(10, uniform());
}

/* Newton in 1/T on ln(sum x P) = ln P, from the mean of the boiling temperatures. */
static double bubble_temperature(const Case *c) {
  const double natural = log(10), log_pressure = log(c->pressure);
  double t = 0;
  for (int i = 0; i < COMPONENTS; i++) t += c->fraction[i] * (B[i] / (A[i] - log10(c->pressure)) - C[i]);
  for (int step = 0; step < 100; step++) {
    double sum = 0, slope = 0;
    for (int i = 0; i < COMPONENTS; i++) {
      double w = 1 / (t + C[i]);
      double p = c->fraction[i] * exp(natural * (A[i] - B[i] * w));
      sum += p;
      slope += p * natural * B[i] * w * w;
    }
    double next = 1 / (1 / t + (log(sum) - log_pressure) / (slope / sum * t * t));
    if (fabs(next - t) <= 1e-10 * t) return next;
    t = next;
  }
  return t;
}

int main(int count_of_words, char **words) {
  long cases = count_of_words > 1 ? atol(words[1]) : 1000000;
  Case *list = malloc(cases * sizeof *list);
  for (long i = 0; i < cases; i++) draw(&list[i]);
  struct timespec start, end;
  clock_gettime(CLOCK_MONOTONIC, &start);
  double all = 0, first = 0;
  for (long i = 0; i < cases; i++) {
    all += bubble_temperature(&list[i]);
    if (i == 1999) first = all;
  }
  clock_gettime(CLOCK_MONOTONIC, &end);
  double seconds = end.tv_sec - start.tv_sec + 1e-9 * (end.tv_nsec - start.tv_nsec);
  printf("%.1f %.12e %.12e\n", 1e9 * seconds / cases, all, first);
  free(list);
  return 0;
}
