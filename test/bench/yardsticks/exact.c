/*
 * The closed form between events in C, for the problems of problems.ts: what the same algorithm costs without a run's record.
 * Slip: v = Re(p e^{iWt}) + Re(z e^{lt}); its first zero is guessed from the last slip of that sign, polished by Halley's
 * method and proven by |w'''| <= |p| W^3 + |z| w0^3 looking ahead from the start and back from the zero.
 * Usage: exact RECORD ROUNDS; prints "name seconds-a-simulation events x-at-the-end" a line. Processor time.
 */
#include <math.h>
#include <stdio.h>
#include <stdlib.h>
#include <time.h>

#define PI 3.14159265358979323846

typedef struct { double m, k, c, W, F, f, x0, seconds; } Problem;
typedef struct { long events; double t, x; } Answer;
typedef struct { double pr, pi, zr, zi, s, wd, w0, W, p3, z3, sigma; double w, w1, w2; } Slip;

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

/* w = s v and two derivatives at t */
static void look(Slip *a, double t) {
  double c = cos(a->W * t), s = sin(a->W * t), e = a->sigma > 0 ? exp(-a->sigma * t) : 1;
  double cd = e * cos(a->wd * t), sd = e * sin(a->wd * t);
  double pr = a->pr * c - a->pi * s, pi = a->pr * s + a->pi * c;
  double zr = a->zr * cd - a->zi * sd, zi = a->zr * sd + a->zi * cd;
  double z1r = -a->sigma * zr - a->wd * zi, z1i = a->wd * zr - a->sigma * zi;
  a->w = a->s * (pr + zr);
  a->w1 = a->s * (-a->W * pi + z1r);
  a->w2 = a->s * (-a->W * a->W * pr - a->sigma * z1r - a->wd * z1i);
}

/* a step over which w + w1 h + w2 h^2/2 - M h^3/6 stays positive */
static double safe(double w, double w1, double w2, double M) {
  if (w == 0) {
    double q = sqrt(w2 * w2 / 4 + 2 * M * w1 / 3);
    return w2 < 0 ? 2 * w1 / (q - w2 / 2) : (w2 / 2 + q) * 3 / M;
  }
  double reach = 1e300, best = 0;
  for (int i = 0; i < 4; i++) {
    if (i == 0) reach = 2 * cbrt(6 * w / M) + (w1 > 0 ? sqrt(6 * w1 / M) : 0);
    double kappa = w2 / 2 - M * reach / 6, D = w1 * w1 - 4 * kappa * w, h;
    if (D < 0) return fmax(best, reach);
    h = w1 < 0 ? 2 * w / (-w1 + sqrt(D)) : kappa < 0 ? (w1 + sqrt(D)) / (-2 * kappa) : reach;
    if (h >= reach) return fmax(best, reach);
    if (h > best) best = h;
    reach = fmin(reach, 1.7 * h);
  }
  return best;
}

/* the first zero of w after 0 and before end; end where there is none */
static double first_zero(Slip *a, double guess, double end) {
  double left = 0, M = a->p3 + a->z3, hf, r = guess;
  look(a, 0);
  double w = 0, w1 = fmax(0, a->w1), w2 = a->w2;
  hf = safe(w, w1, w2, M);
  for (int round = 0; round < 10000; round++) {
    if (left + hf >= end) return end;
    if (r > left && r < 1e300) {
      int ok = 0;
      for (int i = 0; i < 8; i++) {
        look(a, r);
        if (!(a->w1 < 0)) break;
        double step = 2 * a->w * a->w1 / (2 * a->w1 * a->w1 - a->w * a->w2);
        r -= step;
        if (!(r > left)) break;
        if (fabs(step) <= 1e-6 * r) { ok = 1; break; } /* cubic: the next step would be rounding */
      }
      if (ok) {
        look(a, r);
        double right = r - safe(0, -a->w1, a->w2, M);
        while (left + hf < right) {
          left += hf;
          if (left >= end) return end;
          look(a, left);
          if (a->w <= 0) return left;
          M = a->p3 + a->z3 * (a->sigma > 0 ? exp(-a->sigma * left) : 1);
          hf = safe(a->w, a->w1, a->w2, M);
          if (hf < 1e-15 * left) return left;
        }
        return r < end ? r : end;
      }
    }
    if (hf <= 4e-16 * left) return left;
    left += hf;
    look(a, left);
    if (a->w <= 1e-17 && a->w1 < 0) return left;
    hf = safe(fmax(a->w, 0), a->w1, a->w2, M);
    r = a->w1 < 0 ? left + a->w / -a->w1 : 2e300;
  }
  return end;
}

static Answer run(const Problem *q) {
  double sigma = q->c / (2 * q->m), w0 = sqrt(q->k / q->m), wd = sqrt(w0 * w0 - sigma * sigma), W = q->W;
  double dr = w0 * w0 - W * W, di = 2 * sigma * W, d2 = dr * dr + di * di;
  double x = q->x0, t = 0, theta = 0, last[2] = {1e301, 1e301};
  double pull = q->F - q->k * x;
  long events = 0;
  int s = 0;
  if (fabs(pull) > q->f) { s = pull > 0 ? 1 : -1; events++; }
  while (t < q->seconds) {
    if (s == 0) {
      if (W == 0) break;
      double low = (q->k * x - q->f) / q->F, high = (q->k * x + q->f) / q->F, up = 1e300, down = 1e300;
      if (high <= 1) { double g = acos(high); up = fmod(2 * PI - g - theta + 4 * PI, 2 * PI); }
      if (low >= -1) { double g = acos(low); down = fmod(g - theta + 4 * PI, 2 * PI); }
      double turn = fmin(up, down);
      if (turn > 1e299) break;
      s = up < down ? 1 : -1;
      t += turn / W;
      theta += turn;
      if (theta >= 2 * PI) theta -= 2 * PI;
      if (t >= q->seconds) break;
      events++;
    }
    double cr = q->F / q->m * cos(theta), ci = q->F / q->m * sin(theta);
    double Xr = (cr * dr + ci * di) / d2, Xi = (ci * dr - cr * di) / d2;
    double y = x - Xr + s * q->f / q->k, v = W * Xi, B = (v + sigma * y) / wd;
    Slip a = {-W * Xi, W * Xr, v, sigma * B + wd * y, s, wd, w0, W, 0, 0, sigma, 0, 0, 0};
    a.p3 = sqrt(a.pr * a.pr + a.pi * a.pi) * W * W * W;
    a.z3 = sqrt(a.zr * a.zr + a.zi * a.zi) * w0 * w0 * w0;
    double tau = first_zero(&a, last[s > 0], q->seconds - t);
    if (t + tau >= q->seconds) tau = q->seconds - t;
    else last[s > 0] = tau;
    double c = cos(W * tau), sn = sin(W * tau), e = sigma > 0 ? exp(-sigma * tau) : 1;
    x = Xr * c - Xi * sn - s * q->f / q->k + e * (y * cos(wd * tau) + B * sin(wd * tau));
    t += tau;
    theta += W * tau;
    theta -= 2 * PI * floor(theta / (2 * PI));
    if (t >= q->seconds) break;
    events++;
    pull = q->F * cos(theta) - q->k * x;
    s = fabs(pull) <= q->f * (1 + 1e-13) ? 0 : pull > 0 ? 1 : -1;
  }
  return (Answer){events, t, x};
}

/* d'' + w0^2 d = -a(t) - s f over a record of n samples h apart */
static Answer shaken(const double *acc, int n, double h, double w0, double f) {
  double C = cos(w0 * h), S = sin(w0 * h), k = w0 * w0, d = 0, v = 0;
  long events = 0;
  int s = 0;
  for (int i = 0; i + 1 < n; i++) {
    double slope = (acc[i + 1] - acc[i]) / h, at = 0;
    for (;;) {
      double a = acc[i] + slope * at, left = h - at;
      if (left <= 0) break;
      if (s == 0) {
        double g = -a - k * d, over = 1e300;
        if (fabs(g) > f * (1 + 1e-13)) over = 0;
        else if (slope < 0) over = (f - g) / -slope;
        else if (slope > 0) over = (f + g) / slope;
        if (over >= left) break;
        s = over == 0 ? (g > 0 ? 1 : -1) : slope < 0 ? 1 : -1;
        at += over;
        events++;
        continue;
      }
      /* d = A + G t + (d0 - A) cos + (v0 - G)/w0 sin, A + G t the quasi-static part */
      double A = (-a - s * f) / k, G = -slope / k, y = d - A, u = (v - G) / w0, M = (fabs(y) + fabs(u)) * w0 * w0 * w0;
      double c = left == h ? C : cos(w0 * left), sn = left == h ? S : sin(w0 * left);
      double d1 = A + G * left + y * c + u * sn, v1 = G + w0 * (u * c - y * sn);
      double lowest = fmin(s * v, s * v1);
      if (lowest > M * left * left / 8) { d = d1; v = v1; break; }
      double tau = 0, w = s * v, hit = -1;
      for (int n2 = 0; n2 < 200; n2++) {
        double ct = cos(w0 * tau), st = sin(w0 * tau);
        w = n2 == 0 ? s * v : s * (G + w0 * (u * ct - y * st));
        double w1 = -s * w0 * w0 * (y * ct + u * st), w2 = -s * w0 * w0 * w0 * (u * ct - y * st);
        if (n2 > 0 && w <= 1e-16 && w1 < 0) { hit = tau; break; }
        double step = w <= 0 && w1 <= 0 ? 1e-14 : safe(fmax(w, 0), w1, w2, M * w0);
        if (step < 1e-15) { hit = tau; break; }
        tau += step;
        if (tau >= left) break;
      }
      if (hit < 0) { d = d1; v = v1; break; }
      d = A + G * hit + y * cos(w0 * hit) + u * sin(w0 * hit);
      v = 0;
      at += hit;
      events++;
      double g = -(acc[i] + slope * at) - k * d;
      s = fabs(g) <= f * (1 + 1e-13) ? 0 : g > 0 ? 1 : -1;
    }
  }
  return (Answer){events, (n - 1) * h, d};
}

int main(int argc, char **argv) {
  if (argc < 3) return 2;
  int n = 0, rounds = atoi(argv[2]);
  static double acc[20000];
  FILE *file = fopen(argv[1], "r");
  while (file && n < 20000 && fscanf(file, "%lf", &acc[n]) == 1) n++;
  Problem p1 = {1, 100, 0, 0, 0, 0.5, 1, 1e9}, p2 = {1, 1, 0.02, 0.4, 1, 0.6, 0, 200 * 2 * PI / 0.4};
  for (int round = 0; round < rounds; round++) {
    Answer a = {0, 0, 0};
    double start = now();
    for (int i = 0; i < 400; i++) a = run(&p1);
    printf("P1 %.9g %ld %.17g\n", (now() - start) / 400, a.events, a.x);
    start = now();
    for (int i = 0; i < 100; i++) a = run(&p2);
    printf("P2 %.9g %ld %.17g\n", (now() - start) / 100, a.events, a.x);
    long events = 0;
    double sum = 0;
    start = now();
    for (int i = 0; i < 100; i += 5)
      for (int j = 0; j < 100; j += 5) {
        double W = 0.2 + 1.8 * j / 99;
        Problem cell = {1, 1, 0.02, W, 1, i / 99.0, 0, 100 * 2 * PI / W};
        a = run(&cell);
        events += a.events;
        sum += a.x;
      }
    printf("P4 %.9g %ld %.17g\n", (now() - start) / 400, events, sum);
    start = now();
    for (int i = 0; i < 50; i++) a = shaken(acc, n, 0.005, 2 * PI, 0.5);
    printf("P5 %.9g %ld %.17g\n", (now() - start) / 50, a.events, a.x);
  }
  return 0;
}
