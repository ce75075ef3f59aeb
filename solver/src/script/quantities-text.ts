/** Python: the quantities, read off the stretches by sampling, polishing and quadrature. */
export const quantitiesText = `
# ---- What the run comes to -----------------------------------------------------------------------------------------

# Nodes on [-1, 1], both ends among them, and the weights that integrate any polynomial through them.
NODES = -np.cos(np.pi * np.arange(9) / 8)
EVEN = np.arange(9) % 2 == 0
WEIGHTS = np.linalg.solve(chebvander(NODES, 8).T, np.where(EVEN, 2.0 / np.where(EVEN, 1.0 - np.arange(9.0) ** 2, 1.0), 0.0))


class Window:
    """The run from one time to another, as tables of its values."""

    def __init__(self, stretches, start, end):
        self.start, self.end = start, end
        self.stretches = [s for s in stretches if max(start, s.start) < min(end, s.end) or start <= s.start == s.end <= end and s.side == 0]
        self.tables = [Table(side, list(some), start, end) for side, some in groupby(self.stretches, lambda s: s.side)]

    def integral(self, of):
        return sum(float(np.dot(table.weights, of(table.values))) for table in self.tables)

    def mean(self, of):
        return self.integral(of) / (self.end - self.start)

    def largest(self, of, sides=(-1, 0, 1)):
        """The largest value: of the nodes, and of the crests between them that may stand higher, each polished."""
        largest, tops = -np.inf, []
        for table in [table for table in self.tables if table.side in sides]:
            times, column = table.values["t"], of(table.values) + 0.0 * table.values["t"]
            guess = crests(times, column)
            largest = max(largest, float(np.max(column)))
            least = largest - 0.05 * (np.max(column) - np.min(column))
            if np.min(column) == np.max(column):
                continue
            tops += [(guess[i], times[max(0, i - 1)], times[min(len(times) - 1, i + 1)], table) for i in np.flatnonzero(is_crest(guess) & (guess >= least))]
        for guess, low, high, table in sorted(tops, key=lambda top: -top[0])[:MOST_TOPS]:
            look = lambda t: -float(of(table.at(t)))
            if not high > low:
                continue
            tolerance = 1e-9 * (high - low)
            largest = max(largest, -minimize_scalar(look, bounds=(low, high), method="bounded", options={"xatol": tolerance}).fun)
        return largest

    def peak(self, of):
        return max(self.largest(of), self.largest(lambda s: -of(s)))

    def half_swing(self, of):
        return (self.largest(of) + self.largest(lambda s: -of(s))) / 2

    def stuck(self):
        times = [min(self.end, s.end) - max(self.start, s.start) for s in self.stretches if s.side == 0]
        return sum(times) / (self.end - self.start)


class Table:
    """Stretches of one side that follow each other: values by name at the nodes of their pieces, and the weights of these."""

    def __init__(self, side, stretches, start, end):
        self.side = side
        rows, weights, pieces = zip(*(tabulated(s, max(start, s.start), min(end, s.end)) for s in stretches))
        self.values = dict(zip(stretches[0].names(), np.concatenate(rows, axis=1)))
        self.weights = np.concatenate(weights)
        self.pieces = [piece for some in pieces for piece in some]
        self.ends = [end for end, _, _ in self.pieces]

    def at(self, t):
        """Values by name at a time between nodes."""
        _, stretch, piece = self.pieces[min(bisect_left(self.ends, t), len(self.ends) - 1)]
        return stretch.state(t, piece)


def tabulated(stretch, low, high):
    """Rows of values at the nodes of every piece between low and high, their weights, and the pieces by their ends."""
    pieces = [(max(low, a), min(high, b), p) for a, b, p in stretch.pieces if a < high and b > low or a == b]
    if not pieces:
        cuts = np.sort([*np.linspace(low, high, 5 + int((high - low) * FASTEST_HZ * 20)), *stretch.kinks(low, high)])
        pieces = [(a, b, None) for a, b in zip(cuts[:-1], cuts[1:])]
    parts, weights = [], np.zeros(8 * len(pieces) + 1)
    for a, b, piece in pieces:
        times = (a + b) / 2 + (b - a) / 2 * NODES
        times[0], times[-1] = a, b
        first = 1 if parts else 0  # two pieces share the node between them
        parts.append(np.array([value + 0.0 * times for value in stretch.state(times, piece).values()])[:, first:])
        weights[8 * len(parts) - 8 : 8 * len(parts) + 1] += (b - a) / 2 * WEIGHTS
    return np.concatenate(parts, axis=1), weights, [(b, stretch, piece) for _, b, piece in pieces]


def is_crest(values):
    """Whether no neighbour stands higher."""
    padded = np.concatenate([[-np.inf], values, [-np.inf]])
    return (values >= padded[:-2]) & (values >= padded[2:])


def crests(t, values):
    """values, raised where a parabola through a crest and its neighbours stands higher."""
    raised = values.copy()
    if len(values) < 3:
        return raised
    left, right = t[1:-1] - t[:-2], t[2:] - t[1:-1]
    rise, fall = values[1:-1] - values[:-2], values[1:-1] - values[2:]
    i = np.flatnonzero((rise >= 0) & (fall >= 0) & (left > 0) & (right > 0)) + 1
    p, q, a, b = left[i - 1], right[i - 1], rise[i - 1], fall[i - 1]
    bend = (a / p + b / q) / (p + q)
    slope = (a / p * q - b / q * p) / (p + q)
    raised[i] += np.where(bend > 0, slope**2 / (4 * np.where(bend > 0, bend, 1.0)), 0.0)
    return raised


def rest_time(events, stretches, end):
    """When the body stands still for good; None where it does not."""
    last = stretches[-1]
    if last.side != 0 or breaks_later(end, last.end_state()["x"]):
        return None
    stops = [t for kind, t, *_ in events if kind == "stop"]
    if end < CONSTANT_FROM:
        return stops[-1] if stops else None
    since = max([s.end for s in stretches if s.side != 0], default=0.0)
    return max(since, CONSTANT_FROM)


def equilibrium(load):
    """d with k d + k3 d^3 = load, None where there is none."""
    if STIFFNESS == 0 and CUBIC == 0:
        return None
    reach = np.sqrt(STIFFNESS / (-3 * CUBIC)) if CUBIC < 0 else 1.0
    g = lambda d: STIFFNESS * d + CUBIC * d**3 - load
    if CUBIC < 0:
        return None if abs(load) > 2 * STIFFNESS / 3 * reach else brentq(g, -reach, reach, xtol=1e-18)
    while g(reach) * g(-reach) > 0:
        reach *= 2
    return brentq(g, -reach, reach, xtol=1e-18)


def quantities(events, stretches):
    """Every quantity by name, None where it has no meaning; and the whole run as a window."""
    end = stretches[-1].end
    start = steady_start(end)
    whole = Window(stretches, 0.0, end)
    steady = Window(stretches, start, end) if start > 0 else whole
    times = lambda kind: [t for k, t, *_ in events if k == kind]
    breaks, stops, turns = times("break-away"), times("stop"), times("turn")
    blur = 1e-12 * end
    within = lambda ts: [t for t in ts if t >= start - blur and (not PERIODIC or start == 0 or t < end - blur)]
    jumps, begun = within(breaks), within(stops)
    cycles = None
    if LOWEST_HZ is not None and end > start:
        cycles = 10 if PERIODIC and end >= 10 / LOWEST_HZ * (1 - 1e-12) else (end - start) * LOWEST_HZ
    excursion = (lambda s: s["d"]) if FED else (lambda s: s["x"])
    read = lambda name: lambda s: s[name]
    q = {}

    has_spring = STIFFNESS > 0
    critical = 2 * np.sqrt(STIFFNESS * MASS)
    q["naturalHz"] = np.sqrt(STIFFNESS / MASS) / TURN if has_spring else None
    q["dampingRatio"] = (DAMPING + SOLID_VISCOUS) / critical if has_spring else None
    q["restBand"] = friction(0.0) * NORMAL * RADIUS / STIFFNESS if has_spring else None

    rest = rest_time(events, stretches, end)
    q["restTime"] = rest
    at_rest = None
    if rest is not None:
        here = next(s for s in reversed(stretches) if s.start <= rest)
        at_rest = here.state(rest)
    q["restDisplacement"] = at_rest and at_rest["x"]
    level = equilibrium(force(rest, here.at) + WEIGHT) if rest is not None and rest >= FORCE_CONSTANT_FROM else None
    q["restOffset"] = None if level is None else at_rest["d"] - level
    q["halfCycles"] = None if rest is None else len(stops) + len(turns)

    q["peakDisplacement"] = whole.peak(read("x"))
    q["peakVelocity"] = whole.peak(read("v"))
    q["peakAcceleration"] = whole.peak(read("a"))
    q["slipVelocityPeak"] = whole.peak(read("slip"))
    q["amplitude"] = steady.half_swing(excursion)
    q["meanDisplacement"] = steady.mean(excursion) if end > start else float(excursion(stretches[-1].end_state()))
    q["stickFraction"] = steady.stuck() if end > start else float(stretches[-1].side == 0)
    q["sticksPerCycle"] = None if cycles is None else len(begun) / cycles
    between = Window(stretches, jumps[0], jumps[-1]) if len(jumps) > 1 else None
    q["stickSlipHz"] = between and (len(jumps) - 1) / (jumps[-1] - jumps[0])
    q["cycleStickFraction"] = between and between.stuck()
    q["slipDistance"] = between and between.integral(lambda s: np.abs(s["slip"])) / (len(jumps) - 1)
    mean_speed = abs(steady.mean(read("v"))) if end > start else abs(stretches[-1].end_state()["v"])
    q["velocityRipple"] = 2 * steady.half_swing(read("v")) / mean_speed if FED and mean_speed > 0 else None
    q["followingErrorPeak"] = steady.peak(read("d"))
    square = steady.mean(lambda s: s["d"] ** 2) if end > start else stretches[-1].end_state()["d"] ** 2
    q["followingErrorRms"] = np.sqrt(square)

    travelled = max((to for _, to, _ in TRAVELS), default=np.inf)
    final = float(stretches[-1].end_state()["d"])
    moved = travelled <= end
    q["settleTime"] = settle_time(stretches, max(0.0, travelled), travelled, end) if moved and SETTLE_BAND and abs(final) <= SETTLE_BAND else None
    q["settleOffset"] = final if moved else None
    back = next((since for since, _, distance in TRAVELS[1:] if distance * TRAVELS[0][2] < 0), None)
    free = next((t for t in breaks if back is not None and t >= back), None)
    q["lostMotion"] = None if free is None else abs(place_of_base(stretches, free) - place_of_base(stretches, back))

    grip = lambda s: friction(0.0) * RADIUS * s["pressed"]
    share = lambda s: np.where(grip(s) > 0, np.abs(s["f"]) / np.where(grip(s) > 0, grip(s), 1.0), -1.0)
    used = whole.largest(share, sides=(0,))
    if friction(0.0) > 0 and any(pressing(t) > 0 for t in breaks):
        used = 1.0
    q["holdUse"] = None if used < 0 or LAW == "bristle" else min(1.0, used)
    q["slipPerCycle"] = None if cycles is None else steady.integral(lambda s: np.abs(s["slip"])) / cycles
    q["driftPerCycle"] = None if cycles is None else steady.integral(read("slip")) / cycles
    q["driveForcePeak"] = whole.peak(read("drive"))
    q["driveForceRms"] = np.sqrt(whole.mean(lambda s: s["drive"] ** 2)) if end > 0 else abs(stretches[-1].end_state()["drive"])
    heat = lambda s: -s["f"] * s["slip"]
    q["frictionPowerPeak"] = whole.largest(heat)
    q["frictionPowerMean"] = steady.mean(heat) if end > start else float(heat(stretches[-1].end_state()))
    carried = "x" if DRIVEN_BY_BASE else "crossing"
    q["transmissibility"] = steady.half_swing(read(carried)) / DRIVE_AMPLITUDE if DRIVE_AMPLITUDE else None
    return {name: None if value is None else float(value) for name, value in q.items()}, whole


def settle_time(stretches, since, travelled, end):
    """From the end of the last travel to the last time |d| stood outside the band; both ends of the crossing are polished."""
    for table in reversed(Window(stretches, since, end).tables):
        over = np.abs(table.values["d"]) - SETTLE_BAND
        outside = np.flatnonzero(over > 0)
        if len(outside) == 0:
            continue
        i, times = outside[-1], table.values["t"]
        if i == len(over) - 1:
            return times[i] - travelled
        return brentq(lambda t: abs(float(table.at(t)["d"])) - SETTLE_BAND, times[i], times[i + 1], xtol=1e-15) - travelled
    return 0.0


def place_of_base(stretches, t):
    return float(base(t, next(s for s in stretches if t <= s.end).at)[0])
`;
