/** Python: how finely the file integrates and looks, the instants between which all is smooth, and the sizes of things. */
export const settingsText = `
ALLOWED = 1e-6  # of the run's peak
RTOL, ATOL = 1e-13, 1e-15  # of the integration; ATOL a share of the run's peaks
HELD = 1e-10  # a need that passes what holds by a smaller share is held: rounding must not decide
ROUNDING = 1e-15  # of the parts of a sum: what their sum may be off
NOISE = 1e-11  # v_r below this share of its peak is 0
TOUCH = 1e-10  # v_r that comes back from below this share of its peak has been 0
NEAR = 1e-11  # of the time: a zero that close to a corner falls on it
LOOKS, LOOKS_A_PERIOD = 12, 64  # at a step of a slip, at a period of the inputs while stuck
MOST_TOPS = 32  # crests that are polished to find a peak
MANY = 20_000  # corners of the inputs
LONGEST_STEP = 1 / (20 * FASTEST_HZ) if FASTEST_HZ else np.inf


def lost_contact_times():
    """When N falls to 0 and when it comes back."""
    if abs(RIPPLE) <= NORMAL:
        return []
    angle = np.arccos(-NORMAL / RIPPLE)
    turns = np.arange(-2, int(SECONDS * RIPPLE_HZ) + 3)
    shifts = [TURN * turns + angle - np.radians(RIPPLE_PHASE), TURN * turns - angle - np.radians(RIPPLE_PHASE)]
    return list(np.concatenate(shifts) / (TURN * RIPPLE_HZ))


def looks_at(low, high):
    """Times from low to high, LOOKS_A_PERIOD of them a period of the inputs and never a few only."""
    return np.linspace(low, high, 1 + max(256, int(np.ceil((high - low) * FASTEST_HZ * LOOKS_A_PERIOD))))


def sign_changes(g, low, high):
    """Where g passes 0, if not twice between two looks."""
    times = looks_at(low, high)
    values = g(times) + 0.0 * times
    passed = np.flatnonzero(values[:-1] * values[1:] < 0)
    return [float(t) for t in times[1:-1][values[1:-1] == 0]] + [brentq(g, times[i], times[i + 1], xtol=1e-15) for i in passed]


def steps_of(solver):
    """The steps of an integration, one by one: from, to, and the integrator's own interpolant."""
    while solver.status == "running":
        message = solver.step()
        if solver.status == "failed":
            sys.exit(f"The integration failed at t = {solver.t}: {message}")
        yield solver.t_old, solver.t, solver.dense_output()


def piece_at(pieces, t):
    for old, _, piece in reversed(pieces):
        if t >= old:
            return piece(t)
    return pieces[0][2](t)


def found_zero(g, low, high):
    """Where g passes from above 0 to below it; from 0 it may have risen by less than what was looked for."""
    rises = [time for time in (low, *(low + (high - low) * 10.0 ** -np.arange(0.5, 14, 0.5))) if g(time) > 0]
    if not rises:
        return low + 1e-12 * (high - low)
    return brentq(g, max(rises), high, xtol=1e-15 * max(1.0, high), rtol=9e-16) if g(high) < 0 else high


def drift_of_spring(t, at):
    """d' of a stuck body: u' - y'."""
    return counterface(t, at)[1] - base(t, at)[1]


def meeting_times():
    """When the spring's far end and the counterface come to one speed: there the solid damping of a stuck body turns round."""
    if not SOLID_SHARE or COUNTERFACE == "base":
        return []
    times = [t for low, high, at in between(CORNERS) for t in sign_changes(lambda s: drift_of_spring(s, at), low, high)]
    return [t for t in times if min(abs(t - corner) for corner in [0.0, SECONDS, *CORNERS]) > 1e-12 * SECONDS]


def between(corners):
    """From, to and middle of the stretches of the run between corners."""
    ends = [0.0]
    for corner in corners:
        if 1e-14 * SECONDS < corner - ends[-1] and corner <= SECONDS * (1 - 1e-14):  # two that rounding parts are one
            ends.append(corner)
    ends.append(SECONDS)
    return [(low, high, (low + high) / 2) for low, high in zip(ends, ends[1:])]


def fastest_face():
    """The largest speed of base and counterface: a v_r below 1e-12 of it is none."""
    speeds = [0.0]
    for low, high, at in between(CORNERS):
        times = np.linspace(low, high, 2 + int((high - low) * FASTEST_HZ * 8))
        speeds += [float(np.max(np.abs(face(times, at)[1]))) for face in (base, counterface)]
    return max(speeds)


CORNERS = sorted({float(t) for t in [*INPUT_CORNERS, *lost_contact_times()] if np.isfinite(t)})
CORNERS = sorted({*CORNERS, *meeting_times()})
FACE_SPEED = fastest_face()

# Peaks of d and v_r, for the absolute tolerances alone; no smaller than what a thousandth of the grip would do.
RATE = max(np.sqrt(STIFFNESS / MASS), TURN * FASTEST_HZ, 1 / SECONDS)
LEAST = 1e-3 * friction(0.0) * (NORMAL + abs(RIPPLE)) * RADIUS / (MASS * RATE)
SCALES = np.array([
    max((CLAIM.get("driveForcePeak") or 0.0) / STIFFNESS if STIFFNESS else CLAIM.get("peakDisplacement") or 0.0, LEAST / RATE),
    max(CLAIM.get("slipVelocityPeak") or 0.0, LEAST),
])
SCALES = np.where(SCALES > 0, SCALES, 1.0)


def steady_start(end):
    """The steady window: the last ten periods of the lowest frequency, the last half under a feed or on a belt, else all."""
    if PERIODIC:
        return max(0.0, end - 10 / LOWEST_HZ)
    return end / 2 if FED or COUNTERFACE == "belt" else 0.0
`;
