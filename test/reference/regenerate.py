#!/usr/bin/env python3
"""Recomputes the figures that the reference tests call "recomputed here", and prints them.

Needs Python 3 with NumPy and SciPy (Debian: python3-scipy). Optional: the tests do not run it. It shares nothing with the
solver: slip is the closed form of a linear oscillator, events are found by a dense scan and Brent's method.
Units are those of each table; symbols as in the tests.
"""
import math

import numpy as np
from scipy.optimize import brentq, minimize_scalar


def heading(text):
    print(f"\n{text}\n{'-' * len(text)}")


# --- one forced body with dry friction, m = k = P = 1 -------------------------------------------------------------------


class Forced:
    """x'' + 2 zeta x' + x = cos(r t) - f, friction force beta, static = kinetic; from rest at x = 0."""

    def __init__(self, r, beta, zeta=0.0):
        self.r, self.beta, self.zeta, self.s = r, beta, zeta, math.sqrt(1 - zeta * zeta)
        self.size = 1 / math.hypot(1 - r * r, 2 * zeta * r) if zeta or r != 1 else None
        self.lag = math.atan2(2 * zeta * r, 1 - r * r)

    def steady(self, t):
        if self.size is None:  # undamped resonance: t sin(t)/2
            return t * math.sin(t) / 2, (math.sin(t) + t * math.cos(t)) / 2
        angle = self.r * t - self.lag
        return self.size * math.cos(angle), -self.size * self.r * math.sin(angle)

    def slip(self, t0, x0, v0, side):
        """x and v as functions of t while slipping to `side`."""
        xp, vp = self.steady(t0)
        centre, a = -side * self.beta, x0 + side * self.beta - xp
        b = (v0 - vp + self.zeta * a) / self.s

        def state(t):
            xs, vs = self.steady(t)
            tau = t - t0
            shrink, c, s = math.exp(-self.zeta * tau), math.cos(self.s * tau), math.sin(self.s * tau)
            x = centre + xs + shrink * (a * c + b * s)
            v = vs + shrink * ((self.s * b - self.zeta * a) * c - (self.s * a + self.zeta * b) * s)
            return x, v

        return state

    def next_zero(self, state, t0, side):
        """The first time after t0 at which v has left its side."""
        dt = 0.01 / max(1, self.r)
        t = t0 + 1e-7
        while side * state(t + dt)[1] > 0:
            t += dt
        return brentq(lambda q: state(q)[1], t, t + dt, xtol=1e-15, rtol=1e-15)

    def release(self, t0, x):
        """When and to which side a body stuck at x breaks away: cos(r t) - x leaves [-beta, beta]."""
        best = None
        for side in (1, -1):
            cosine = x + side * self.beta
            if abs(cosine) > 1:
                continue
            # rising through x + beta: r t = -acos; falling through x - beta: r t = +acos
            angle = -math.acos(cosine) if side > 0 else math.acos(cosine)
            turns = math.ceil((self.r * t0 - angle) / (2 * math.pi) - 1e-12)
            t = (angle + 2 * math.pi * turns) / self.r
            if best is None or t < best[0]:
                best = (t, side)
        return best

    def run(self, periods, start=None):
        """Steady figures over the last ten periods: amplitude, sticks a cycle, stuck share; and the peak of the run."""
        end = periods * 2 * math.pi / self.r
        since = end - 20 * math.pi / self.r
        t, x = 0.0, 0.0
        stuck_share, sticks, turning, peak = 0.0, 0, [], 0.0
        phase = 1 if 1 > self.beta else 0
        while t < end:
            if phase == 0:
                t1, side = self.release(t, x)
                stuck_share += max(0.0, min(t1, end) - max(t, since))
                t, phase, v = t1, side, 0.0
                continue
            state = self.slip(t, x, 0.0, phase)
            t = self.next_zero(state, t, phase)
            x = state(t)[0]
            if t >= end:
                break
            peak = max(peak, abs(x))
            if t >= since:
                turning.append(x)
            excess = math.cos(self.r * t) - x
            if abs(excess) <= self.beta * (1 + 1e-12):
                phase, sticks = 0, sticks + (t >= since)
            else:
                phase = 1 if excess > 0 else -1
        amplitude = (max(turning) - min(turning)) / 2
        return amplitude, sticks / 10, stuck_share / (end - since), peak


def den_hartog():
    heading("Den Hartog, no stops, undamped: r, U, S, limit of beta, X at beta 0.2, 0.4, 0.6 (nan beyond the limit)")
    for r in (0.3, 0.5, 0.7, 0.8, 0.9, 1.1, 1.25, 1.5, 2.0, 3.0, 0.999, 1.001):
        V = 1 / (1 - r * r)
        U = math.sin(math.pi / r) / (r * (1 + math.cos(math.pi / r)))

        def bracket(q):
            return (r * math.sin(q / r) + U * r * r * (math.cos(q) - math.cos(q / r))) / math.sin(q)

        grid = np.linspace(1e-4, math.pi - 1e-4, 20001)
        top = grid[np.argmax([bracket(q) for q in grid])]
        S = max(1.0, -minimize_scalar(lambda q: -bracket(q), bounds=(max(1e-6, top - 1e-3), top + 1e-3), method="bounded").fun)
        limit = abs(V) / math.hypot(U, S / r**2)
        X = [math.sqrt(V * V - (b * U) ** 2) if b <= limit else math.nan for b in (0.2, 0.4, 0.6)]
        print(f"{r:6} {U:12.6f} {S:8.4f} {limit:.6f} ", *(f"{x:.6f}" for x in X))
    print(f"r -> infinity: {1 / math.sqrt(1 + math.pi**2 / 4):.6f}; r -> 1: {math.pi / 4:.6f}")
    heading("the same by running 400 periods from rest")
    for r, beta in ((0.8, 0.4), (0.8, 0.6), (0.9, 0.4), (1.25, 0.4), (1.5, 0.4), (2.0, 0.4)):
        print(r, beta, f"{Forced(r, beta).run(400)[0]:.6f}")


def viscous_no_stops():
    heading("no stops with viscous damping: r, zeta, beta, X by formula, X by running, equivalent-viscous estimate")
    for r, z, beta in ((0.8, 0.1, 0.3), (1.0, 0.1, 0.5), (0.6, 0.05, 0.3), (1.25, 0.05, 0.4), (2.0, 0.2, 0.3)):
        s = math.sqrt(1 - z * z)
        D = math.cosh(z * math.pi / r) + math.cos(s * math.pi / r)
        G = (math.sinh(z * math.pi / r) - z / s * math.sin(s * math.pi / r)) / D
        H = math.sin(s * math.pi / r) / (r * s * D)
        q2 = (1 - r * r) ** 2 + (2 * z * r) ** 2
        X = -beta * G + math.sqrt(1 / q2 - (beta * H) ** 2)
        guess = brentq(lambda x: x * x * ((1 - r * r) ** 2 + (2 * z * r + 4 * beta / (math.pi * x)) ** 2) - 1, 4 * beta / math.pi * 1e-3, 50)
        print(r, z, beta, f"{X:.10f} {Forced(r, beta, z).run(120)[0]:.10f} {guess:.5f}")


def stick_rows():
    heading("motion with stops: r, beta, amplitude, sticks a cycle, stuck share")
    for r, beta in ((0.5, 0.5), (0.5, 0.8), (0.6, 0.7), (0.8, 0.9), (1.5, 0.8), (2.0, 0.6), (0.1, 0.3)):
        amplitude, sticks, share, _ = Forced(r, beta).run(200)
        print(r, beta, f"{amplitude:.6f} {sticks} {share:.4f}")
    print("r 0.5, beta 0.2, 400 periods:", *(f"{x:.6f}" for x in Forced(0.5, 0.2).run(400)[:3]))
    print("r 1, beta 0.5, 300 periods: peak", f"{Forced(1.0, 0.5).run(300)[3]:.4f}", "rule", f"{300 * (math.pi - 2):.3f}")


def belt():
    heading("belt: amplitude, slip time, stick time, period")
    for m, k, Fs, Fk, V in ((1, 1, 1, 0.5, 0.2), (1, 1, 1, 0.5, 0.1), (1000, 1e7, 300, 200, 1e-3), (500, 2e7, 1500, 1000, 2e-3)):
        d, w = (Fs - Fk) / k, math.sqrt(k / m)
        slip, stick = 2 / w * (math.pi - math.atan(d * w / V)), 2 * d / V
        print(m, k, Fs, Fk, V, f"{math.hypot(d, V / w):.7g} {slip:.7g} {stick:.7g} {slip + stick:.7g}")


def critical_speed():
    heading("belt with a damper to ground: critical V sqrt(km)/(Fs - Fk), and its ratio to 1/sqrt(4 pi zeta)")
    for z in (0.001, 0.005, 0.01, 0.02, 0.05, 0.1, 0.2):
        s = math.sqrt(1 - z * z)

        def regained(V):
            """The largest velocity of the slip after its first fall, less V; u is measured from the sliding rest point."""
            # m = k = 1, Fs - Fk = 1: it breaks away at kx + cV = Fs, and slides about kx = Fk, so u = 1 - 2 z V, v = V.
            u, v = 1 - 2 * z * V, V
            # v(t) = e^(-zt)(v cos st - (z v + u)/s sin st); its largest value after the fall, where the acceleration is 0
            speed = lambda t: math.exp(-z * t) * (v * math.cos(s * t) - (z * v + u) / s * math.sin(s * t))
            top = minimize_scalar(lambda t: -speed(t), bounds=(math.pi / s, 2 * math.pi / s), method="bounded", options={"xatol": 1e-13})
            return speed(top.x) - V

        V = brentq(regained, 0.01, 0.99 / math.sqrt(4 * math.pi * z) * 1.02, xtol=1e-14)
        print(z, f"{V:.6g}", f"{V * math.sqrt(4 * math.pi * z):.3f}")
    V = 200 / math.sqrt(1e8 * 1000)
    print(f"1000 kg, 1e8 N/m, 200 N, zeta 0.05: {1.09809 * V * 60000:.2f} mm/min; estimate {V / math.sqrt(0.2 * math.pi) * 60000:.2f}")


def reid():
    heading("displacement-proportional damping: loss factor, half-cycle ratio, decrement a cycle (pi eta), T/T0")
    for eta in (0.01, 0.02, 0.05, 0.1, 0.2):
        a = math.pi * eta / 2
        ratio = math.sqrt((1 - a) / (1 + a))
        period = (1 / math.sqrt(1 - a) + 1 / math.sqrt(1 + a)) / 2
        print(eta, f"{ratio:.6f} {-2 * math.log(ratio):.6f} ({math.pi * eta:.6f}) {period:.6f}")


if __name__ == "__main__":
    den_hartog()
    viscous_no_stops()
    stick_rows()
    belt()
    critical_speed()
    reid()
