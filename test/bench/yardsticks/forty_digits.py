"""The events of P1, P2 and P5 of problems.ts to forty digits (mpmath): each phase by its closed form, zeros found by looking
forty times a radian and bisecting, which shares nothing with the certificates of the solver.

Usage: forty_digits.py PROBLEM [RECORD]; prints "t x" of each event, to 25 digits.
"""

import sys

from mpmath import cos, exp, findroot, mp, mpf, nstr, pi, sin, sqrt

mp.dps = 40


class Slip:
    """m = 1: x'' + c x' + k x = F cos(W t + phase) + pull + rate t, from (x, v) at t = 0."""

    def __init__(self, k, c, F, W, phase, pull, rate, x, v):
        self.s, self.F, self.W, self.k = c / 2, F, W, k
        self.wd = sqrt(k - self.s**2)
        real, imag = k - W * W, c * W
        size = real**2 + imag**2 if F else mpf(1)
        self.P = ((cos(phase) * real + sin(phase) * imag) * F / size, (sin(phase) * real - cos(phase) * imag) * F / size)
        self.b = rate / k
        self.a = (pull - c * self.b) / k
        self.A = x - self.P[0] - self.a
        self.B = (v + W * self.P[1] - self.b + self.s * self.A) / self.wd

    def at(self, t):
        c, s, e = cos(self.W * t), sin(self.W * t), exp(-self.s * t)
        cd, sd = cos(self.wd * t), sin(self.wd * t)
        x = self.P[0] * c - self.P[1] * s + self.a + self.b * t + e * (self.A * cd + self.B * sd)
        v = -self.W * (self.P[0] * s + self.P[1] * c) + self.b
        v += e * ((self.B * self.wd - self.s * self.A) * cd - (self.A * self.wd + self.s * self.B) * sd)
        return x, v


def first_zero(g, start, end, step):
    """The first t in (start, end] at which g, positive just after start, is 0; None without one."""
    a = start
    while a < end:
        b = min(end, a + step)
        if g(b) <= 0:
            low, high = a, b
            for _ in range(12):
                middle = (low + high) / 2
                low, high = (middle, high) if g(middle) > 0 else (low, middle)
            return findroot(g, (low, high), solver="anderson", tol=mpf(10) ** -70, verify=False)
        a = b
    return None


def tell(t, x):
    print(nstr(t, 25), nstr(x, 25))


def p1():
    x, t, n = mpf(1), mpf(0), 0
    half, friction = mpf("0.5") / 100, pi / 10
    while abs(x) > half:
        if n == 0:
            tell(t, x)
        side = 1 if x > 0 else -1
        x, t, n = -x + 2 * side * half, t + friction, n + 1
        tell(t, x)


def p2():
    F, f, c, k = mpf(1), mpf(0.6), mpf(0.02), mpf(1)
    W = 2 * pi * mpf(0.4 / (2 * 3.141592653589793))  # the scenario tells its frequency in Hz
    end = mpf(200 * 2 * 3.141592653589793 / 0.4)
    t, x = mpf(0), mpf(0)
    side = 1
    tell(t, x)
    while True:
        slip = Slip(k, c, F, W, W * t, -side * f, mpf(0), x, mpf(0))
        tau = first_zero(lambda s: side * slip.at(s)[1], mpf(0), end - t, mpf(1) / 40)
        if tau is None:
            return
        x, t = slip.at(tau)[0], t + tau
        tell(t, x)
        need = F * cos(W * t) - k * x
        if abs(need) > f:
            side = 1 if need > 0 else -1
            continue
        rise = first_zero(lambda s: f - abs(F * cos(W * (t + s)) - k * x), mpf(0), end - t, mpf(1) / 40)
        if rise is None:
            return
        t += rise
        side = 1 if F * cos(W * t) - k * x > 0 else -1
        tell(t, x)


def p5(record):
    """On a base shaken by samples 1/200 s apart; x is relative, one phase a sample."""
    k, f, h = mpf((2 * 3.141592653589793) ** 2), mpf(0.5), mpf(0.005)
    x, v, side = mpf(0), mpf(0), 0
    for i in range(len(record) - 1):
        left = mpf(float(i) * 0.005)
        width = mpf(float(i + 1) * 0.005) - left
        rate = -(record[i + 1] - record[i]) / width
        pull = -record[i]
        at = mpf(0)
        while at < width:
            if side == 0:
                need = lambda s: f - abs(pull + rate * s - k * x)
                leaves = at if need(at) < 0 else first_zero(need, at, width, width)
                if leaves is None:
                    break
                at, side = leaves, 1 if pull + rate * leaves - k * x > 0 else -1
                tell(left + at, x)
            slip = Slip(k, mpf(0), mpf(0), mpf(0), mpf(0), pull + rate * at - side * f, rate, x, v)
            tau = first_zero(lambda s: side * slip.at(s)[1], mpf(0), width - at, (width - at) / 16)
            if tau is None:
                x, v = slip.at(width - at)
                break
            x, v, at = slip.at(tau)[0], mpf(0), at + tau
            tell(left + at, x)
            need = pull + rate * at - k * x
            side = 0 if abs(need) <= f else 1 if need > 0 else -1


problem = sys.argv[1]
if problem == "P5":
    p5([mpf(float(line)) for line in open(sys.argv[2])])
else:
    {"P1": p1, "P2": p2}[problem]()
