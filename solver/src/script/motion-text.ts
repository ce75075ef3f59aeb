/** Python: the motion from event to event. It integrates; nowhere does it use a solution in closed form. */
export const motionText = `
# ---- The motion ----------------------------------------------------------------------------------------------------


class Stretch:
    """One smooth part of the run: side 0 stuck, +1 or -1 slipping; pieces are the integrator's own interpolants of (d, v_r)."""

    def __init__(self, start, at, side, x, pieces=()):
        self.start, self.at, self.side, self.x, self.pieces, self.end = start, at, side, x, pieces, start

    def state(self, t, piece=None):
        """Everything at the times t, by name."""
        y, y1, y2 = base(t, self.at)
        u, u1, u2 = counterface(t, self.at)
        if self.side == 0:
            x, slip = self.x + u - counterface(self.start, self.at)[0], 0.0 * t
            d = x - y
        else:
            d, slip = piece(t)
            x = d + y
        v, stretch = slip + u1, slip + u1 - y1
        spring = STIFFNESS * d + CUBIC * d**3
        damper = DAMPING * stretch
        pressed = pressing(t)
        solid = SOLID_VISCOUS * stretch
        if self.side == 0:
            a = u2
            needed = MASS * a - force(t, self.at) + spring + damper + solid - WEIGHT + MASS * floor(t, self.at)
            grip = friction(0.0) * pressed * RADIUS
            contact = np.clip(needed, -grip, grip) if SOLID_SHARE else needed
            solid = solid + contact - needed
        else:
            contact = -self.side * RADIUS * slide_friction(np.maximum(self.side * slip, 0.0), t, self.at)
            solid = solid + self.side * SOLID_SHARE * STIFFNESS * np.abs(d)
            pull = force(t, self.at) - spring - damper - solid + WEIGHT + contact
            a = pull / MASS - floor(t, self.at)
        return {
            "t": t, "x": x, "v": v, "a": a, "d": d, "f": contact, "slip": slip, "pressed": pressed, "y": y,
            "drive": spring + damper + solid, "crossing": spring + damper + SOLID_VISCOUS * stretch,
        }

    def end_state(self):
        return self.state(self.end, self.pieces[-1][2] if self.pieces else None)


def slide_friction(slip, t, at):
    """What resists at the contact for |v_r| = slip, without the lever arm; at 0 as just above it. Nothing while N = 0."""
    face = np.maximum(RADIUS * slip, 1e-300)
    return friction(face) * pressing(t) + FLUID * face if pressing(at) > 0 else 0.0 * face


def needed_force(t, at, d, x_rate):
    """The friction that keeps v_r at 0, and how much there is to keep it."""
    _, y1, _ = base(t, at)
    _, _, u2 = counterface(t, at)
    stretch = x_rate - y1
    spring = STIFFNESS * d + CUBIC * d**3 + (DAMPING + SOLID_VISCOUS) * stretch
    needed = MASS * u2 - force(t, at) + spring - WEIGHT + MASS * floor(t, at)
    return needed, friction(0.0) * pressing(t) * RADIUS + SOLID_SHARE * STIFFNESS * np.abs(d)


def is_held(needed, grip):
    return abs(needed) <= grip * (1 + HELD)


def slide(start, d, slip, side, at, end):
    """Integrates a slip to the first time v_r passes 0, or to end; the pieces, the time, and d and v_r there."""

    def rates(t, z):
        _, y1, y2 = base(t, at)
        _, u1, u2 = counterface(t, at)
        d, slip = z
        stretch = slip + u1 - y1
        spring = STIFFNESS * d + CUBIC * d**3 + (DAMPING + SOLID_VISCOUS) * stretch
        solid = side * SOLID_SHARE * STIFFNESS * abs(d)
        contact = -side * RADIUS * slide_friction(max(side * slip, 0.0), t, at)
        pull = force(t, at) - spring - solid + WEIGHT + contact
        return stretch, pull / MASS - floor(t, at) - u2

    solver = DOP853(rates, start, (d, slip), end, rtol=RTOL, atol=ATOL * SCALES, max_step=LONGEST_STEP)
    pieces, above, noise = [], start, NOISE * SCALES[1]
    while solver.status == "running":
        message = solver.step()
        if solver.status == "failed":
            sys.exit(f"The integration failed at t = {solver.t}: {message}")
        piece, old, new = solver.dense_output(), solver.t_old, solver.t
        pieces.append((old, new, piece))
        for t in np.linspace(old, new, LOOKS + 1)[1:]:
            speed = side * piece(t)[1]
            if speed > noise:
                above = t
            elif speed < -noise or t == end and is_zero_at(t, speed, side * rates(t, piece(t))[1]):
                zero = found_zero(lambda s: side * piece_at(pieces, s)[1], above, t)
                pieces = [(a, min(b, zero), p) for a, b, p in pieces if a <= zero]
                return pieces, zero, piece_at(pieces, zero)[0], 0.0
    return pieces, end, solver.y[0], solver.y[1]


def is_zero_at(t, speed, gain):
    """Whether v_r passes 0 at t but for rounding; one that only approaches 0 does not."""
    return gain < 0 and abs(speed / gain) < 1e-11 * t


def piece_at(pieces, t):
    for old, _, piece in reversed(pieces):
        if t >= old:
            return piece(t)
    return pieces[0][2](t)


def found_zero(g, low, high):
    """Where g passes from above 0 to below it."""
    return brentq(g, low, high, xtol=1e-15 * max(1.0, high), rtol=9e-16) if g(low) > 0 > g(high) else (low if g(low) <= 0 else high)


def stick(start, x, at, end):
    """When the needed force first passes what friction can hold, looked at LOOKS_A_PERIOD times a period; None if not before end."""
    origin = counterface(start, at)[0]

    def over(t):
        u, u1, _ = counterface(t, at)
        needed, grip = needed_force(t, at, x + u - origin - base(t, at)[0], u1)
        return np.abs(needed) - grip * (1 + HELD)

    count = max(256, int(np.ceil((end - start) * FASTEST_HZ * LOOKS_A_PERIOD)))
    for first in range(0, count, 4096):
        times = start + (end - start) * np.arange(first, min(count, first + 4096) + 1) / count
        passed = np.flatnonzero(over(times) + 0.0 * times > 0)
        if len(passed) == 0:
            continue
        i = passed[0]
        return times[0] if i == 0 else brentq(over, times[i - 1], times[i], xtol=1e-15 * max(1.0, end), rtol=9e-16)
    return None


def breaks_later(t, x):
    """Whether a body stuck at t breaks away if the inputs go on for ever."""
    for end in [corner for corner in CORNERS if corner > t] + [None]:
        at = (t + end) / 2 if end else t + 1.0
        if end is None and (STIFFNESS + CUBIC * (x - base(t, at)[0]) ** 2) * STRETCH_RATE != FORCE_RATE:
            return True
        if stick(t, x, at, end or t + (LOOK_AHEAD or 1.0)) is not None:
            return True
        if end:
            x, t = x + counterface(end, at)[0] - counterface(t, at)[0], end
    return False


def run():
    """The events and stretches of the whole run."""
    t, x, v, side = 0.0, START_PLACE, START_VELOCITY, None
    events, stretches, tell = [], [], None
    ends = [corner for corner in CORNERS if 0 < corner < SECONDS] + [SECONDS]
    for end in ends:
        at = (t + end) / 2
        side, tell = entered(t, x, v, side, at)
        if not events:
            events.append(event("start", t, x, v, side, at))
        if tell:
            events.append(event(tell, t, x, v, side, at))
        while t < end:
            if side == 0 and UNTIL_REST and t >= CONSTANT_FROM and not breaks_later(t, x):
                stretches.append(Stretch(t, at, 0, x))
                return events + [event("end", t, x, v, 0, at)], stretches
            now = Stretch(t, at, side, x)
            stretches.append(now)
            if side == 0:
                broken = stick(t, x, at, end)
                now.end = t = end if broken is None else broken
                x, v = now.end_state()["x"], counterface(t, at)[1]
                if broken is not None:
                    needed, _ = needed_force(t, at, x - base(t, at)[0], v)
                    side = -int(np.sign(needed))
                    events.append(event("break-away", t, x, v, side, at))
                continue
            d, slip = x - base(t, at)[0], v - counterface(t, at)[1]
            now.pieces, t, d, slip = slide(t, d, slip, side, at, end)
            now.end = t
            x, v = d + base(t, at)[0], slip + counterface(t, at)[1]
            if slip == 0.0:
                side, tell = judged(t, d, v, side, at)
                if tell:
                    events.append(event(tell, t, x, v, side, at))
    events.append(event("end", t, x, v, side, at))
    return events, stretches


def judged(t, d, v, before, at):
    """What a body does whose v_r has come to 0."""
    needed, grip = needed_force(t, at, d, v)
    if (LAW != "none" or grip > 0 or before == 0) and is_held(needed, grip):
        return 0, (None if before == 0 else "stop")
    side = -int(np.sign(needed)) or before
    return side, ("break-away" if before == 0 else None if side == before else "turn")


def entered(t, x, v, before, at):
    """What a corner does to the contact: the counterface's own velocity may have jumped."""
    slip = v - counterface(t, at)[1]
    tiny = 1e-12 * max(abs(v), abs(counterface(t, at)[1]))
    d = x - base(t, at)[0]
    if before is None:
        if abs(slip) <= tiny:
            return judged(t, d, v, 0, at)
        return int(np.sign(slip)), None
    if before == 0:
        if abs(slip) <= tiny:
            return judged(t, d, v, 0, at)
        return int(np.sign(slip)), "break-away"
    if COUNTERFACE != "base" or slip * before > tiny:
        return before, None
    if abs(slip) <= tiny:
        return judged(t, d, v, before, at)
    return int(np.sign(slip)), "turn"


def event(kind, t, x, v, side, at):
    """An event with the friction force just after it."""
    d, slip = x - base(t, at)[0], v - counterface(t, at)[1]
    return kind, t, x, v, float(Stretch(t, at, side, x).state(t, lambda s: (d, slip))["f"])
`;
