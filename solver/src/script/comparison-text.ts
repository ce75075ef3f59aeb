/** Python: what was found beside what is claimed. */
export const comparisonText = `
# ---- Beside the claim -------------------------------------------------------------------------------------------


def peaks_of(found, events):
    """What differences are a share of: the largest number in each unit."""
    peaks = {}
    numbers = [(UNITS[name], found[name]) for name in CLAIM] + [(UNITS[name], said) for name, said in CLAIM.items()]
    numbers += [(unit, value) for row in [*EVENTS, *events] for unit, value in zip(EVENT_UNITS, row[1:])]
    for unit, value in numbers:
        peaks[unit] = max(peaks.get(unit, 0.0), abs(value or 0.0))
    return peaks


def rounding_of(whole):
    """What rounding may make of a number in each unit: a small share of the parts it is the sum of."""
    size = lambda *names: sum(max((float(np.max(np.abs(table.values[name]))) for table in whole.tables), default=0.0) for name in names)
    place, speed = size("x", "d", "y"), size("v", "slip", "y1")
    load = (STIFFNESS + abs(CUBIC) * place**2) * place + (DAMPING + SOLID_VISCOUS) * speed + MASS * size("y2") + size("force") + abs(WEIGHT)
    sizes = {"displacement": place, "velocity": speed, "force": load, "acceleration": load / MASS, "power": load * speed}
    return {UNIT_OF[name]: 1e-14 * value for name, value in sizes.items()}


def share_of(difference, unit, a, b, peaks, rounding):
    if difference <= rounding.get(unit, 0.0):
        return 0.0
    return difference / (max(1.0, abs(a), abs(b)) if unit == "" else peaks[unit])


def compare_quantities(found, peaks, rounding):
    worst = 0.0
    print(f"{'quantity':<22}{'claimed':>26}{'found here':>26}  {'unit':<6}{'apart':>12}{'share':>11}")
    for name, said in CLAIM.items():
        here, unit = found[name], UNITS[name]
        if said is None and here is None:
            continue
        if said is None or here is None:
            worst = np.inf
            print(f"{name:<22}{show(said):>26}{show(here):>26}  {unit:<6}   has a value on one side only")
            continue
        apart = abs(said - here)
        share = share_of(apart, unit, said, here, peaks, rounding)
        worst = max(worst, share)
        print(f"{name:<22}{show(said):>26}{show(here):>26}  {unit:<6}{apart:>12.2e}{share:>11.1e}{mark(share)}")
    return worst


def show(value):
    return "-" if value is None else f"{value:.15g}"


def mark(share):
    return "  <-- more than allowed" if share > ALLOWED else ""


def compare_events(events, peaks, rounding):
    print(f"\\nevents: {EVENT_COUNT} claimed, {len(events)} found here")
    if EVENT_COUNT != len(events):
        return np.inf
    pairs = list(zip(EVENTS, events))
    kinds = [i for i, (said, here) in enumerate(pairs) if said[0] != here[0]]
    if kinds:
        i = kinds[0]
        print(f"event {i} is {EVENTS[i][0]} claimed and {events[i][0]} here")
        return np.inf
    worst = 0.0
    for column, (name, unit) in enumerate(zip(("time", "place", "velocity", "friction"), EVENT_UNITS), 1):
        apart = [abs(said[column] - here[column]) for said, here in pairs]
        i = int(np.argmax(apart))
        said, here = pairs[i][0][column], pairs[i][1][column]
        share = share_of(apart[i], unit, said, here, peaks, rounding)
        worst = max(worst, share)
        label, at = name + " of events", f"event {i}, {pairs[i][0][0]}"
        print(f"{label:<22}{show(said):>26}{show(here):>26}  {unit:<6}{apart[i]:>12.2e}{share:>11.1e}  at {at}{mark(share)}")
    return worst


def main():
    if len(CORNERS) > MANY:
        print(f"The inputs have {len(CORNERS)} corners, and each is met: this takes a few minutes.", file=sys.stderr)
    events, stretches = run()
    found, whole = quantities(events, stretches)
    peaks, rounding = peaks_of(found, events), rounding_of(whole)
    worst = max(compare_quantities(found, peaks, rounding), compare_events(events, peaks, rounding))
    agrees = worst <= ALLOWED
    print(f"\\n{'agrees' if agrees else 'DIFFERS'}: largest difference {worst:.1e} of the run's peak, {ALLOWED:.0e} allowed")
    sys.exit(0 if agrees else 1)


main()
`;
