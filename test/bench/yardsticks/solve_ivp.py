"""SciPy's solve_ivp (DOP853, rtol 1e-9, atol 1e-12), stopped and restarted at every event: what one writes without this solver.

Sticks are told by closed form, which favours it. Usage: solve_ivp.py RECORD PROBLEM ROUNDS; prints "name seconds-a-simulation
events x-at-the-end" for each round. Processor time.
"""

import sys
import time

import numpy as np
from scipy.integrate import solve_ivp
from scipy.optimize import brentq

TURN = 2 * np.pi


def slip_stick(force, friction, fastest, k, c, place, end, corners):
    """m = 1; force(t) on the body, what the base does included; friction(|v|), corners of the force."""
    t, x, v, events, corner = 0.0, place, 0.0, 0, 0
    hold = friction(0.0)
    side = 0
    while t < end:
        while corner < len(corners) and corners[corner] <= t:
            corner += 1
        until = min(end, corners[corner]) if corner < len(corners) else end
        if side == 0:
            need = lambda s: abs(force(s) - k * x) - hold
            if need(t) > 1e-12:
                s = t
            else:
                s = first_rise(need, t, until, fastest)
            if s is None:
                t = until
                continue
            t = s
            side = 1 if force(t + 1e-12) - k * x > 0 else -1
            events += 1
            if t >= end:
                break
        now = side
        fun = lambda s, y: (y[1], force(s) - k * y[0] - c * y[1] - now * friction(abs(y[1])))
        stop = lambda s, y: y[1] if s > t + 1e-9 else now
        stop.terminal, stop.direction = True, -now
        out = solve_ivp(fun, (t, until), (x, v), method="DOP853", rtol=1e-9, atol=1e-12, events=stop)
        t, x, v = out.t[-1], out.y[0, -1], out.y[1, -1]
        if out.status != 1:
            continue
        v, events = 0.0, events + 1
        pull = force(t) - k * x
        side = 0 if abs(pull) <= hold * (1 + 1e-9) else int(np.sign(pull))
    return events, x


def first_rise(g, start, end, fastest):
    """The first sign change of g looked at twenty times a period."""
    step = fastest / 20
    a = start
    while a < end:
        b = min(end, a + step)
        if g(b) > 0:
            return brentq(g, a, b, xtol=1e-12) if g(a) < 0 else a
        a = b
    return None


def harmonic(friction, omega, periods):
    force = lambda t: np.cos(omega * t)
    return slip_stick(force, lambda v: friction, TURN / omega, 1, 0.02, 0.0, periods * TURN / omega, [])


def p1():
    return slip_stick(lambda t: 0.0, lambda v: 0.5, 1.0, 100, 0, 1.0, 40.0, [])


def p3():
    law = lambda v: 0.6 + 0.4 * np.exp(-((v / 0.2) ** 2))
    return slip_stick(lambda t: 0.1 * t, law, 1.0, 1, 0.05, 0.0, 500.0, [])


def p4():
    cells = [(0.2525, 0.65), (0.505, 1.1), (0.7575, 0.47)]
    ends = [harmonic(friction, omega, 100) for friction, omega in cells]
    return sum(events for events, _ in ends), sum(x for _, x in ends)


def p5(record):
    values = record.tolist()

    def floor(t):
        i = min(int(t * 200), len(values) - 2)
        return -(values[i] + (values[i + 1] - values[i]) * (t * 200 - i))

    return slip_stick(floor, lambda v: 0.5, 0.1, TURN**2, 0, 0.0, 60.0, [])


def main():
    record = np.loadtxt(sys.argv[1])
    problems = {
        "P1": (p1, 1),
        "P2": (lambda: harmonic(0.6, 0.4, 200), 1),
        "P3": (p3, 1),
        "P4": (p4, 3),
        "P5": (lambda: p5(record), 1),
    }
    name = sys.argv[2]
    run, share = problems[name]
    for _ in range(int(sys.argv[3])):
        start = time.process_time()
        events, x = run()
        print(name, (time.process_time() - start) / share, events, x, flush=True)


if __name__ == "__main__":
    main()
