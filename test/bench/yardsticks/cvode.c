/*
 * CVODE (Adams, fixed-point iteration, rtol 1e-9, atol 1e-12) stopped by its root finding and started anew at every event, for
 * the problems of problems.ts. Sticks are told by closed form, which favours it.
 * Usage: cvode RECORD ROUNDS; prints "name seconds-a-simulation events x-at-the-end" a line. Processor time.
 */
#include <cvode/cvode.h>
#include <math.h>
#include <nvector/nvector_serial.h>
#include <stdio.h>
#include <stdlib.h>
#include <sunnonlinsol/sunnonlinsol_fixedpoint.h>
#include <time.h>

#define PI 3.14159265358979323846
#define RATE 200.0

/* m = 1; F cos(W t) or a record's samples, a fed spring end, friction fk + (fs - fk) exp(-(v/vs)^2) */
typedef struct { double k, c, W, F, feed, fs, fk, vs, x0, seconds; const double *record; int n, s; } Problem;
typedef struct { long events; double x; } Answer;

static double now(void) {
  struct timespec t;
  clock_gettime(CLOCK_PROCESS_CPUTIME_ID, &t);
  return t.tv_sec + 1e-9 * t.tv_nsec;
}

static double force(const Problem *q, double t) {
  if (!q->record) return q->F * cos(q->W * t) + q->k * q->feed * t;
  double at = t * RATE;
  int i = (int)at;
  if (i > q->n - 2) i = q->n - 2;
  return -(q->record[i] + (at - i) * (q->record[i + 1] - q->record[i]));
}

static double friction(const Problem *q, double v) {
  return q->vs > 0 ? q->fk + (q->fs - q->fk) * exp(-(v / q->vs) * (v / q->vs)) : q->fk;
}

static int rates(realtype t, N_Vector y, N_Vector out, void *data) {
  const Problem *q = data;
  double x = NV_Ith_S(y, 0), v = NV_Ith_S(y, 1);
  NV_Ith_S(out, 0) = v;
  NV_Ith_S(out, 1) = force(q, t) - q->k * x - q->c * v - q->s * friction(q, fabs(v));
  return 0;
}

static int speed(realtype t, N_Vector y, realtype *g, void *data) {
  (void)t;
  (void)data;
  g[0] = NV_Ith_S(y, 1);
  return 0;
}

/* The instant at which a body stuck at x is no longer held, and the side it goes to; the end where it is held till then. */
static double held(const Problem *q, double t, double x, int *side) {
  *side = 0;
  if (q->record) {
    for (int i = (int)(t * RATE + 1e-9); i + 1 < q->n; i++) {
      double a = fmax(t, i / RATE), b = (i + 1) / RATE, fa = force(q, a) - q->k * x, fb = force(q, b) - q->k * x;
      if (fabs(fa) > q->fs) { *side = fa > 0 ? 1 : -1; return a; }
      if (fabs(fb) <= q->fs) continue;
      *side = fb > 0 ? 1 : -1;
      return a + (b - a) * (*side * q->fs - fa) / (fb - fa);
    }
    return q->seconds;
  }
  if (q->feed > 0) { *side = 1; return (q->fs / q->k + x) / q->feed; }
  if (q->W == 0) return q->seconds;
  double low = (q->k * x - q->fs) / q->F, high = (q->k * x + q->fs) / q->F, up = 1e300, down = 1e300;
  double theta = fmod(q->W * t, 2 * PI);
  if (high <= 1) up = fmod(2 * PI - acos(high) - theta + 4 * PI, 2 * PI);
  if (low >= -1) down = fmod(acos(low) - theta + 4 * PI, 2 * PI);
  double turn = fmin(up, down);
  if (turn > 1e299) return q->seconds;
  *side = up < down ? 1 : -1;
  return t + turn / q->W;
}

static Answer run(Problem *q) {
  SUNContext context;
  SUNContext_Create(NULL, &context);
  N_Vector y = N_VNew_Serial(2, context);
  void *solver = CVodeCreate(CV_ADAMS, context);
  SUNNonlinearSolver fixed = SUNNonlinSol_FixedPoint(y, 0, context);
  double t = 0, x = q->x0, pull = force(q, 0) - q->k * x;
  Answer a = {0, 0};
  NV_Ith_S(y, 0) = x;
  NV_Ith_S(y, 1) = 0;
  CVodeInit(solver, rates, 0, y);
  CVodeSStolerances(solver, 1e-9, 1e-12);
  CVodeSetNonlinearSolver(solver, fixed);
  CVodeRootInit(solver, 1, speed);
  CVodeSetUserData(solver, q);
  CVodeSetMaxNumSteps(solver, 1000000);
  q->s = fabs(pull) > q->fs ? (pull > 0 ? 1 : -1) : 0;
  if (q->s) a.events++;
  while (t < q->seconds) {
    if (q->s == 0) {
      t = held(q, t, x, &q->s);
      if (q->s == 0 || t >= q->seconds) break;
      a.events++;
    }
    int direction = -q->s, flag;
    NV_Ith_S(y, 0) = x;
    NV_Ith_S(y, 1) = 0;
    CVodeSetRootDirection(solver, &direction);
    do {
      /* a record bends at each sample: CVODE is started anew there */
      double until = q->record ? fmin(q->seconds, (floor(t * RATE + 1e-9) + 1) / RATE) : q->seconds;
      CVodeReInit(solver, t, y);
      CVodeSetStopTime(solver, until);
      flag = CVode(solver, until, y, &t, CV_NORMAL);
    } while (flag != CV_ROOT_RETURN && flag >= 0 && t < q->seconds);
    x = NV_Ith_S(y, 0);
    if (flag != CV_ROOT_RETURN) break;
    a.events++;
    pull = force(q, t) - q->k * x;
    q->s = fabs(pull) <= q->fs * (1 + 1e-9) ? 0 : pull > 0 ? 1 : -1;
  }
  a.x = NV_Ith_S(y, 0);
  CVodeFree(&solver);
  SUNNonlinSolFree(fixed);
  N_VDestroy(y);
  SUNContext_Free(&context);
  return a;
}

static Problem shaken(double friction, double omega, double periods) {
  return (Problem){1, 0.02, omega, 1, 0, friction, friction, 0, 0, periods * 2 * PI / omega, NULL, 0, 0};
}

static void tell(const char *name, double seconds, Answer a) {
  printf("%s %.9g %ld %.15g\n", name, seconds, a.events, a.x);
}

static void timed(const char *name, Problem q) {
  double start = now();
  Answer a = run(&q);
  tell(name, now() - start, a);
}

int main(int count, char **words) {
  if (count < 3) return 1;
  static double record[12001];
  FILE *file = fopen(words[1], "r");
  for (int i = 0; i < 12001; i++) if (fscanf(file, "%lf", record + i) != 1) return 1;
  for (int round = 0; round < atoi(words[2]); round++) {
    timed("P1", (Problem){100, 0, 0, 0, 0, 0.5, 0.5, 0, 1, 40, NULL, 0, 0});
    timed("P2", shaken(0.6, 0.4, 200));
    timed("P3", (Problem){1, 0.05, 0, 0, 0.1, 1, 0.6, 0.2, 0, 500, NULL, 0, 0});
    double start = now();
    Answer all = {0, 0};
    for (int n = 0; n < 400; n += 8) {
      Problem q = shaken(5 * (n / 20) / 99.0, 0.2 + 1.8 * 5 * (n % 20) / 99.0, 100);
      Answer a = run(&q);
      all.events += a.events;
      all.x += a.x;
    }
    tell("P4", (now() - start) / 50, all);
    timed("P5", (Problem){4 * PI * PI, 0, 0, 0, 0, 0.5, 0.5, 0, 0, 60, record, 12001, 0});
  }
  return 0;
}
