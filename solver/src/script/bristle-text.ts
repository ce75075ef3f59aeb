/** Python: the motion of a body on bristles, whose bending z is a third unknown; it never holds, `stuck` is a slow creep. */
export const bristleText = `
# ---- The motion ----------------------------------------------------------------------------------------------------
# LuGre friction: z' = v - s0 |v| z / g(v) and f = -r (s0 z + s1 z' + s2 v), with v = r v_r and g(v) = N mu(|v|). A body whose faces
# pass slower than CREEP is told as stuck; stop and break-away are where |v_r| passes that.

CREEP = 1e-3 * BRISTLE_VELOCITY / RADIUS
SCALES = np.array([*SCALES, friction(0.0) * (NORMAL + abs(RIPPLE)) / BRISTLE_STIFFNESS or 1.0])


class Stretch:
    """One smooth part of the run: side 0 creeping, +1 or -1 slipping; pieces are the integrator's own interpolants of (d, v_r, z)."""

    def __init__(self, start, at, side, pieces=()):
        self.start, self.at, self.side, self.pieces, self.end = start, at, side, pieces, start

    def state(self, t, piece):
        """Everything at the times t, by name."""
        y, y1, y2 = base(t, self.at)
        u, u1, u2 = counterface(t, self.at)
        d, slip, bending = piece(t)
        stretch = slip + u1 - y1
        spring = STIFFNESS * d + CUBIC * d**3
        damper, viscous = DAMPING * stretch, SOLID_VISCOUS * stretch
        contact = bristle_friction(t, self.at, slip, bending, np.abs(slip))
        a = (force(t, self.at) - spring - damper - viscous + WEIGHT + contact) / MASS - floor(t, self.at)
        drive = spring + damper + viscous
        return {
            "t": t, "x": d + y, "v": slip + u1, "a": a, "d": d, "f": contact, "slip": slip, "pressed": pressing(t), "y": y,
            "y1": y1, "y2": y2, "force": force(t, self.at), "drive": drive, "crossing": drive,
        }

    def names(self):
        """Of the values that state tells."""
        return list(self.end_state())

    def end_state(self):
        return self.state(self.end, self.pieces[-1][2])


def bending_rate(t, at, slip, bending, speed):
    """z'; speed is |v_r|. Where N fades, g counts as no less than a billionth of its largest."""
    if not pressing(at) > 0:
        return 0.0 * bending
    most = np.maximum(pressing(t), 1e-9 * (NORMAL + abs(RIPPLE))) * friction(RADIUS * speed)
    return RADIUS * slip - BRISTLE_STIFFNESS * RADIUS * speed * bending / most


def bristle_friction(t, at, slip, bending, speed):
    """f on the body; none while N = 0."""
    if not pressing(at) > 0:
        return 0.0 * bending
    rate = bending_rate(t, at, slip, bending, speed)
    return -RADIUS * (BRISTLE_STIFFNESS * bending + BRISTLE_DAMPING * rate + FLUID * RADIUS * slip)


def follow(start, z, side, sense, at, end):
    """Integrates to the first time v_r passes 0 or |v_r| passes CREEP, or to end; the pieces, the time, the unknowns, and which."""

    def rates(t, z):
        _, y1, y2 = base(t, at)
        _, u1, u2 = counterface(t, at)
        d, slip, bending = z
        stretch = slip + u1 - y1
        spring = STIFFNESS * d + CUBIC * d**3 + (DAMPING + SOLID_VISCOUS) * stretch
        contact = bristle_friction(t, at, slip, bending, sense * slip)
        a = (force(t, at) - spring + WEIGHT + contact) / MASS - floor(t, at)
        return stretch, a - u2, bending_rate(t, at, slip, bending, sense * slip)

    def watched(z):
        """What ends the stretch where it falls below 0."""
        speed = sense * z[1]
        return {"stop": speed - CREEP} if side else {"break-away": CREEP - speed, "zero": speed}

    # LSODA goes over to an implicit method by itself where the bristles are stiff
    solver = LSODA(rates, start, z, end, rtol=10 * RTOL, atol=100 * ATOL * SCALES, max_step=LONGEST_STEP)
    pieces, above, noise = [], {}, min(NOISE * SCALES[1], 1e-6 * CREEP)
    for old, new, piece in steps_of(solver):
        pieces.append((old, new, piece))
        for t in np.linspace(old, new, LOOKS + 1)[1:]:
            found = []
            for name, value in watched(piece(t)).items():
                if value > noise:
                    above[name] = t
                elif value < -noise:
                    look = lambda s: watched(piece_at(pieces, s))[name]
                    found.append((found_zero(look, above.get(name, start), t), name))
            if found:
                zero, name = min(found)
                pieces = [(a, min(b, zero), p) for a, b, p in pieces if a <= zero]
                return pieces, zero, piece_at(pieces, zero), name
    return pieces, end, solver.y, None


def breaks_later(t, x):
    """Bristles never hold for good."""
    return True


def run():
    """The events and stretches of the whole run."""
    x, v, bending, side = START_PLACE, START_VELOCITY, 0.0, None
    events, stretches = [], []
    for t, end, at in between(CORNERS):
        z = np.array([x - base(t, at)[0], v - counterface(t, at)[1], bending if pressing(at) > 0 else 0.0])
        before, side = side, 0 if abs(z[1]) < CREEP else int(np.sign(z[1]))
        if before is None:
            events.append(event("start", t, z, at))
        elif (before == 0) != (side == 0):  # the counterface has jumped
            events.append(event("break-away" if side else "stop", t, z, at))
        sense = int(np.sign(z[1])) or 1
        while end - t > 1e-14 * SECONDS:
            now = Stretch(t, at, side)
            stretches.append(now)
            now.pieces, t, z, what = follow(t, z, side, sense, at, end)
            now.end = t
            if what == "zero":
                sense = -sense
            elif what:
                side = sense if what == "break-away" else 0
                events.append(event(what, t, z, at))
        x, v, bending = z[0] + base(t, at)[0], z[1] + counterface(t, at)[1], z[2]
    events.append(event("end", t, z, at))
    return events, stretches


def event(kind, t, z, at):
    """An event with the friction force just after it."""
    return kind, t, z[0] + base(t, at)[0], z[1] + counterface(t, at)[1], float(bristle_friction(t, at, z[1], z[2], abs(z[1])))
`;
