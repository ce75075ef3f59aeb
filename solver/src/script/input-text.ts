/** Python: the shapes that terms of force and base take, each by its definition. */
export const inputText = `
# ---- Shapes of inputs ----------------------------------------------------------------------------------------------
# t is a time or an array of times; "at" is one time within the present stretch between corners and tells which branch of a
# definition holds, so that a stretch is smooth up to both of its ends.


def ramp(t, at, rate, start, stop):
    if at < start:
        return 0.0
    return rate * (t - start) if at < stop else rate * (stop - start)


def pulse(t, at, shape, peak, start, duration):
    if not start <= at < start + duration:
        return 0.0
    if shape == "half-sine":
        return peak * np.sin(np.pi * (t - start) / duration)
    if shape == "rectangle":
        return peak
    rising = at < start + duration / 2
    return 2 * peak * ((t - start) if rising else (start + duration - t)) / duration


def chirp(t, at, amplitude, from_hz, to_hz, seconds, spacing):
    if not 0 <= at < seconds:
        return 0.0
    if spacing == "log" and to_hz != from_hz:
        growth = np.log(to_hz / from_hz) / seconds
        cycles = from_hz * np.expm1(growth * t) / growth
    else:
        cycles = from_hz * t + (to_hz - from_hz) / seconds * t**2 / 2
    return amplitude * np.cos(TURN * cycles)


class Travel:
    """Equal moves, one every dwell: speed up, run, slow down; too short to reach the speed, it turns half way."""

    def __init__(self, distance, speed, acceleration, start, count, dwell):
        self.distance, self.start, self.count, self.dwell = distance, start, count, dwell
        self.bend = np.copysign(acceleration, distance)
        length = abs(distance)
        self.rise = min(speed / acceleration, np.sqrt(length / acceleration))
        self.cruise = np.copysign(acceleration * self.rise, distance)
        self.duration = self.rise + length / (acceleration * self.rise) if length else 0.0

    def corners(self):
        begins = self.start + (np.arange(self.count) * self.dwell if self.count > 1 else np.zeros(1))
        inner = [0.0, self.rise, self.duration - self.rise, self.duration]
        return [begin + corner for begin in begins for corner in inner]

    def end(self):
        return self.start + ((self.count - 1) * self.dwell if self.count > 1 else 0.0) + self.duration

    def _step(self, at):
        """Moves done before the present one, and when that began; None before the first."""
        if at < self.start:
            return 0, None
        step = min(self.count - 1, int((at - self.start) // self.dwell)) if self.count > 1 else 0
        return step, self.start + (step * self.dwell if step else 0.0)

    def place(self, t, at):
        step, begin = self._step(at)
        if begin is None:
            return 0.0
        done = step * self.distance
        if at < begin + self.rise:
            return done + self.bend * (t - begin) ** 2 / 2
        if at < begin + self.duration - self.rise:
            return done + self.bend * self.rise**2 / 2 + self.cruise * (t - begin - self.rise)
        if at < begin + self.duration:
            return done + self.distance - self.bend * (begin + self.duration - t) ** 2 / 2
        return done + self.distance

    def speed(self, t, at):
        _, begin = self._step(at)
        if begin is None or at >= begin + self.duration:
            return 0.0
        if at < begin + self.rise:
            return self.bend * (t - begin)
        return self.cruise if at < begin + self.duration - self.rise else self.bend * (begin + self.duration - t)

    def acceleration(self, at):
        _, begin = self._step(at)
        if begin is None or at >= begin + self.duration:
            return 0.0
        if at < begin + self.rise:
            return self.bend
        return 0.0 if at < begin + self.duration - self.rise else -self.bend


def unpacked(digest, text):
    """Times and values of a long record, held against the digest that it is named by in the scenario."""
    packed = base64.b64decode(text)
    if hashlib.sha256(packed).hexdigest() != digest:
        sys.exit(f"The points of the record {digest} are not those that it names.")
    return np.split(np.frombuffer(packed, "<f8"), 2)


class Record:
    """Straight lines through measured points; outside them the end values held, or zero."""

    def __init__(self, times, values, held):
        self.times, self.values, self.held = np.array(times), np.array(values), held

    def _line(self, at):
        i = int(np.searchsorted(self.times, at, side="right")) - 1
        if 0 <= i < len(self.times) - 1:
            slope = (self.values[i + 1] - self.values[i]) / (self.times[i + 1] - self.times[i])
            return self.times[i], self.values[i], slope
        return 0.0, (self.values[0 if i < 0 else -1] if self.held else 0.0), 0.0

    def value(self, t, at):
        begin, level, slope = self._line(at)
        return level + slope * (t - begin)

    def rate(self, at):
        return self._line(at)[2]

    def end(self):
        still = np.flatnonzero(self.values != (self.values[-1] if self.held else 0.0))
        if len(still) == 0:
            return 0.0
        return self.times[min(still[-1] + 1, len(self.times) - 1)] if self.held else self.times[-1]
`;
