/** Python: the motion of a body that sticks and slips, integrated from event to event. */
export const runText = `
# ---- The motion ----------------------------------------------------------------------------------------------------


def slide(start, d, slip, side, pull, at, end):
    """Integrates a slip to the first time that v_r, d' or d passes 0, or to end; the pieces, the time, d and v_r there, and which."""
    half = int(np.sign(d)) or pull
    is_apart = SOLID_SHARE and spring_sense(at, at) != 0  # v_r and d' are not the same motion

    def rates(t, z):
        _, y1, y2 = base(t, at)
        _, u1, u2 = counterface(t, at)
        d, slip = z
        stretch = slip + u1 - y1
        spring = STIFFNESS * d + CUBIC * d**3 + (DAMPING + SOLID_VISCOUS) * stretch
        solid = pull * half * SOLID_SHARE * STIFFNESS * d
        contact = -side * RADIUS * slide_friction(max(side * slip, 0.0), t, at)
        return stretch, (force(t, at) - spring - solid + WEIGHT + contact) / MASS - floor(t, at) - u2

    def watched(t, z):
        """What ends the slip where it falls below 0."""
        values = [("contact", side * z[1], NOISE * SCALES[1])]
        if SOLID_SHARE:
            values.append(("half", half * z[0], NOISE * SCALES[0]))
        if is_apart:
            values.append(("spring", pull * (z[1] + drift_of_spring(t, at)), NOISE * SCALES[1]))
        return values

    speed = lambda t: side * piece_at(pieces, t)[1]
    gain = lambda t: side * rates(t, piece_at(pieces, t))[1]
    solver = DOP853(rates, start, (d, slip), end, rtol=RTOL, atol=ATOL * SCALES, max_step=LONGEST_STEP)
    pieces, above, looks = [], {}, [(start, side * slip)]
    for old, new, piece in steps_of(solver):
        pieces.append((old, new, piece))
        for t in np.linspace(old, new, LOOKS + 1)[1:]:
            found = []
            for i, (name, value, noise) in enumerate(watched(t, piece(t))):
                look = lambda s: watched(s, piece_at(pieces, s))[i][1]
                if value > noise:
                    above[name] = t
                elif value < -noise or t == end and is_zero_at(t, value, look, new - old):
                    found.append((found_zero(look, above.get(name, start), t), name))
            looks = [*looks[-2:], (t, side * piece(t)[1])]
            found = found or touched(looks, speed, gain)
            if found:
                zero, name = min(found)
                zero = end if end - zero < NEAR * end else zero
                pieces = [(a, min(b, zero), p) for a, b, p in pieces if a <= zero]
                d, slip = piece_at(pieces, zero)
                return pieces, zero, 0.0 if name == "half" else d, {"contact": 0.0, "spring": -drift_of_spring(zero, at)}.get(name, slip), name
    return pieces, end, solver.y[0], solver.y[1], None


def touched(looks, speed, gain):
    """Where |v_r| has come down to 0 and goes up again between the last three looks; what stays near 0 only approaches it."""
    if len(looks) < 3:
        return []
    (low, before), (middle, least), (high, after) = looks
    if not before > least < after or least > 1e-2 * SCALES[1] or min(before, after) < 1e3 * TOUCH * SCALES[1]:
        return []
    bottom = brentq(gain, low, high, xtol=1e-15 * max(1.0, high)) if gain(low) < 0 < gain(high) else middle
    return [(bottom, "contact")] if speed(bottom) < TOUCH * SCALES[1] else []


def is_zero_at(t, value, look, step):
    """Whether what is watched passes 0 at t but for rounding; one that only approaches 0 does not."""
    gain = (value - look(t - 1e-4 * step)) / (1e-4 * step)
    return gain < 0 and abs(value / gain) < NEAR * t


def top_near(g, times, i):
    """Where g is largest between the looks about times[i]."""
    low, high = times[max(0, i - 1)], times[min(len(times) - 1, i + 1)]
    return minimize_scalar(lambda t: -g(t), bounds=(low, high), method="bounded", options={"xatol": 1e-9 * (high - low)}).x


def first_passed(hold, start, end):
    """When a hold is first passed, told where the need equals what there is, and a time soon after; None twice if not before end."""
    times = looks_at(start, end)
    passed = lambda t: over(*hold(t))
    for first in range(0, len(times) - 1, 4096):
        some = times[first : first + 4097]
        values = passed(some) + 0.0 * some
        found = np.flatnonzero(crests(some, values) > 0)  # between two looks a hold may be passed and regained
        found = [i for i in found if values[i] > 0 or passed(top_near(passed, some, i)) > 0]
        if not found:
            continue
        i = found[0]
        if i == 0:
            return some[0], some[0]
        after = some[i] if values[i] > 0 else top_near(passed, some, i)
        finest = {"xtol": 1e-15 * max(1.0, end), "rtol": 9e-16}
        broken = brentq(passed, some[i - 1], after, **finest)
        equal = lambda t: abs(hold(t)[0]) - hold(t)[1]
        below = [t for t in some[:i] if equal(t) < 0]
        return brentq(equal, below[-1], broken, **finest) if below and equal(broken) > 0 else broken, after
    return None, None


def stick(start, x, at, end, pull=None):
    """When the needed force first passes what friction can hold, and the side it then slips to; None if not before end.

    Without pull, d' may turn on the way.
    """
    origin = counterface(start, at)[0]

    def needed(t):
        d = x + counterface(t, at)[0] - origin - base(t, at)[0]
        return needed_force(t, at, d, spring_sense(t, at) if pull is None else pull)

    broken, after = first_passed(needed, start, end)
    return broken, 0 if broken is None else -int(np.sign(needed(after)[0]))


def breaks_later(t, x):
    """Whether a body stuck at t breaks away if the inputs go on for ever."""
    for end in [corner for corner in CORNERS if corner > t] + [None]:
        at = (t + end) / 2 if end else t + 1.0
        pull_rate = (STIFFNESS + CUBIC * (x - base(t, at)[0]) ** 2) * STRETCH_RATE
        if end is None and not np.isclose(pull_rate, FORCE_RATE, rtol=1e-12, atol=0.0):
            return True
        if stick(t, x, at, end or t + (LOOK_AHEAD or 1.0))[0] is not None:
            return True
        if end:
            x, t = x + counterface(end, at)[0] - counterface(t, at)[0], end
    return False


def run():
    """The events and stretches of the whole run."""
    t, x, v, side, pull, met = 0.0, START_PLACE, START_VELOCITY, None, None, None
    events, stretches = [], []
    for t, end, at in between(CORNERS):
        side, pull, tell = entered(t, x, v, side, pull, met, at)
        met = None
        if not events:
            events.append(event("start", t, x, v, side, pull, at))
        if tell:
            events.append(event(tell, t, x, v, side, pull, at))
        while t < end:
            if side == 0 and UNTIL_REST and t >= CONSTANT_FROM and not breaks_later(t, x):
                stretches.append(Stretch(t, at, 0, pull, x))
                return events + [event("end", t, x, v, 0, pull, at)], stretches
            now = Stretch(t, at, side, pull, x)
            stretches.append(now)
            d, slip, tell = x - base(t, at)[0], v - counterface(t, at)[1], None
            if side == 0:
                broken, leaves = stick(t, x, at, end, pull)
                now.end = t = end if broken is None else broken
                x, v = now.end_state()["x"], counterface(t, at)[1]
                if broken is not None:
                    side, tell = leaves, "break-away"
                    pull = pull or side
            elif pull == 0:
                broken, after = first_passed(lambda s: needed_solid(s, at, d, side), t, end)
                now.end = t = end if broken is None else broken
                x, v = d + base(t, at)[0], base(t, at)[1]
                if broken is not None:
                    pull = int(np.sign(needed_solid(after, at, d, side)[0]))
            else:
                now.pieces, t, d, slip, met = slide(t, d, slip, side, pull, at, end)
                now.end = t
                x, v = d + base(t, at)[0], slip + counterface(t, at)[1]
                if met and (t < end or end == SECONDS):
                    stretch = 0.0 if met == "spring" else slip + drift_of_spring(t, at)
                    side, pull, tell = settled(t, d, slip, stretch, side, pull, at)
                    met = None
            if tell:
                events.append(event(tell, t, x, v, side, pull, at))
    events.append(event("end", t, x, v, side, pull, at))
    return events, stretches


def entered(t, x, v, side, pull, met, at):
    """What a corner does: side and pull after it, and the event. met tells what has come to 0 on it."""
    slip, stretch, d = v - counterface(t, at)[1], v - base(t, at)[1], x - base(t, at)[0]
    tiny = 1e-12 * max(abs(v), FACE_SPEED)
    if side is None:
        side = int(np.sign(slip)) if abs(slip) > 1e-12 * max(abs(v), abs(counterface(t, at)[1])) else 0
        slip = slip if side else 0.0
    elif met == "contact" or (side == 0 or COUNTERFACE == "base") and abs(slip) <= tiny:
        slip = 0.0
    elif COUNTERFACE != "base" and side * slip < 0:
        slip = -slip  # nothing has jumped, so it has not turned
    if met == "spring" or not pull and abs(stretch) <= tiny:
        stretch = 0.0
    if 0.0 in (slip, stretch) and spring_sense(t, at) == 0:
        slip = stretch = 0.0
    return settled(t, d, slip, stretch, side, pull, at)


def settled(t, d, slip, stretch, side, pull, at):
    """How a body goes on just after t: its side, its pull, and the event; v_r and d' are exactly 0 where they have come to 0."""
    ahead = int(spring_sense(at, at)) if SOLID_SHARE else 0
    before, along = side, int(np.sign(stretch))
    if slip != 0.0:
        side = int(np.sign(slip))
        if ahead == 0:
            pull = side
        elif along:
            pull = along
        else:
            held = needed_solid(t, at, d, side)
            pull = 0 if over(*held) <= 0 else int(np.sign(held[0]))
    elif ahead == 0 or along:
        held = needed_force(t, at, d, along if ahead else 0)
        side = 0 if holds(*held, before) else -int(np.sign(held[0])) or before
        pull = along if ahead else side
    else:
        side, pull = settled_both(t, d, before, ahead, at)
    return side, pull, None if side == before else "stop" if side == 0 else "break-away" if before == 0 else "turn"


def settled_both(t, d, before, ahead, at):
    """The same where v_r and d' are 0 at once for an instant: m a = free - S sgn(a - y'') - f sgn(a - u'') has one solution a."""
    if holds(*needed_force(t, at, d, ahead), before):
        return 0, ahead
    if over(*needed_solid(t, at, d, -ahead)) <= 0:
        return -ahead, 0
    y2, u2 = base(t, at)[2], counterface(t, at)[2]
    free = force(t, at) - STIFFNESS * d - CUBIC * d**3 + WEIGHT
    least = RADIUS * slide_friction(0.0, t, at) + SOLID_SHARE * STIFFNESS * abs(d)
    if free - least > MASS * max(y2, u2):
        return 1, 1
    if free + least < MASS * min(y2, u2):
        return -1, -1
    return -ahead, ahead


def holds(needed, room, rounding, before):
    """Whether v_r stays 0; with no friction at all it only passes."""
    return (LAW != "none" or room > 0 or before == 0) and over(needed, room, rounding) <= 0


def event(kind, t, x, v, side, pull, at):
    """An event with the friction force just after it."""
    d, slip = x - base(t, at)[0], v - counterface(t, at)[1]
    here = Stretch(t, at, side, pull, x).state(t, (lambda s: (d, slip)) if side else None)
    return kind, t, x, v, float(here["f"])
`;
