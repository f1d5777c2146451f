/* The shortcut arithmetic in plain C, to measure the array kernel against in the same run.
   gcc -O3 -march=native -o shortcutReference shortcutReference.c -lm; ./shortcutReference [cases]
   Prints: nanoseconds per case, checksum of all cases, of the first 2000, and of the roots. */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define COMPONENTS 5

typedef struct {
  double volatility[COMPONENTS], fraction[COMPONENTS], q, light_recovery, heavy_recovery, reflux_factor;
  int light, heavy;
} Case;

/* Park and Miller's minimal standard generator: the same cases in every language. */
static long long state = 12345;
static double uniform(void) {
  state = 16807LL * state % 2147483647LL;
  return (double)state / 2147483647.0;
}

static void draw(Case *c) {
  double sum = 0;
  c->volatility[COMPONENTS - 1] = 1;
  for (int i = COMPONENTS - 2; i >= 0; i--) c->volatility[i] = c->volatility[i + 1] * (1.15 + 1.35 * uniform());
  for (int i = 0; i < COMPONENTS; i++) sum += c->fraction[i] = 0.05 + uniform();
  for (int i = 0; i < COMPONENTS; i++) c->fraction[i] /= sum;
  c->q = 1.25 * uniform();
  c->light = (int)(4 * uniform());
  if (c->light > 3) c->light = 3;
  c->heavy = c->light + 1;
  c->light_recovery = 0.90 + 0.0999 * uniform();
  c->heavy_recovery = 0.90 + 0.0999 * uniform();
  c->reflux_factor = 1.05 + 0.95 * uniform();
}

/* Newton's iteration on f(t) (upper - t)(t - lower), bisected when it leaves the bracket. */
static double underwood_root(const Case *c, int k) {
  const double *a = c->volatility;
  double low = a[k + 1], high = a[k], t = 0.5 * (low + high);
  for (int iteration = 0; iteration < 200; iteration++) {
    double f = c->q - 1, slope = 0;
    for (int i = 0; i < COMPONENTS; i++) {
      double r = 1 / (a[i] - t), term = a[i] * c->fraction[i] * r;
      f += term;
      slope += term * r;
    }
    if (f < 0) low = t; else high = t;
    double p = (a[k] - t) * (t - a[k + 1]), dp = a[k] + a[k + 1] - 2 * t;
    double next = t - f * p / (slope * p + f * dp);
    if (fabs(next - t) <= 1e-12 * t) return next;
    if (!(next > low && next < high)) next = 0.5 * (low + high);
    if (high - low <= 1e-14 * t) return next;
    t = next;
  }
  return t;
}

static double root_sum;

/* Four roots, Fenske's split, minimum reflux from the root between the keys, stages, feed stage; N + Rmin + NR. */
static double design(const Case *c) {
  const double *a = c->volatility, *z = c->fraction;
  double root[COMPONENTS - 1], split[COMPONENTS], d[COMPONENTS], flow = 0, vapor = 0;
  for (int k = 0; k < COMPONENTS - 1; k++) root[k] = underwood_root(c, k);
  double light_split = c->light_recovery / (1 - c->light_recovery), heavy_split = (1 - c->heavy_recovery) / c->heavy_recovery;
  double minimum_stages = log(light_split / heavy_split) / log(a[c->light] / a[c->heavy]);
  for (int i = 0; i < COMPONENTS; i++) {
    split[i] = i == c->light ? light_split : i == c->heavy ? heavy_split : heavy_split * pow(a[i] / a[c->heavy], minimum_stages);
    d[i] = z[i] * split[i] / (1 + split[i]);
    flow += d[i];
    vapor += a[i] * d[i] / (a[i] - root[c->light]);
  }
  double minimum_reflux = fmax(vapor / flow - 1, 0.05), reflux = c->reflux_factor * minimum_reflux;
  double x = (reflux - minimum_reflux) / (reflux + 1);
  double y = 1 - exp((1 + 54.4 * x) / (11 + 117.2 * x) * (x - 1) / sqrt(x));
  double stages = (minimum_stages + y) / (1 - y), bottoms = 1 - flow;
  double impurities = (z[c->light] - d[c->light]) / bottoms / (d[c->heavy] / flow);
  double ratio = pow(z[c->heavy] / z[c->light] * impurities * impurities * bottoms / flow, 0.206);
  root_sum += root[0] + root[1] + root[2] + root[3];
  return stages + minimum_reflux + stages * ratio / (1 + ratio);
}

static double seconds(void) {
  struct timespec t;
  clock_gettime(CLOCK_MONOTONIC, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

int main(int count, char **words) {
  int cases = count > 1 ? atoi(words[1]) : 1000000;
  Case *all = malloc(sizeof(Case) * cases);
  for (int i = 0; i < cases; i++) draw(&all[i]);
  double sum = 0, first = 0, start = seconds();
  for (int i = 0; i < cases; i++) {
    sum += design(&all[i]);
    if (i == 1999) first = sum;
  }
  printf("%.3f %.12e %.12e %.12e\n", (seconds() - start) / cases * 1e9, sum, first, root_sum);
  free(all);
  return 0;
}
