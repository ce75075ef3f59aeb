/** Python: what acts on the body at an instant, and what holds it; nowhere does it use a solution in closed form. */
export const motionText = `
# ---- What acts, and what holds -------------------------------------------------------------------------------------


class Stretch:
    """One smooth part of the run.

    side is 0 while stuck, +1 or -1 while slipping; pull is the sign of d', 0 where solid damping holds d as it is. pieces are the
    integrator's own interpolants of (d, v_r); without any, x or d is held.
    """

    def __init__(self, start, at, side, pull, x, pieces=()):
        self.start, self.at, self.side, self.pull, self.x, self.pieces, self.end = start, at, side, pull, x, pieces, start

    def state(self, t, piece=None):
        """Everything at the times t, by name."""
        y, y1, y2 = base(t, self.at)
        u, u1, u2 = counterface(t, self.at)
        if piece:
            d, slip = piece(t)
            x = d + y
        elif self.side == 0:
            x, slip = self.x + u - counterface(self.start, self.at)[0], 0.0 * t
            d = x - y
        else:
            d, slip = self.x - base(self.start, self.at)[0] + 0.0 * t, y1 - u1
            x = d + y
        v, stretch = slip + u1, slip + u1 - y1
        spring = STIFFNESS * d + CUBIC * d**3
        damper = DAMPING * stretch
        viscous = SOLID_VISCOUS * stretch
        solid = viscous + self.pull * SOLID_SHARE * STIFFNESS * np.abs(d)
        others = force(t, self.at) - spring - damper + WEIGHT - MASS * floor(t, self.at)
        pressed = pressing(t)
        if self.side == 0:
            a = u2
            contact = MASS * a - others + solid
            if self.pull == 0 and SOLID_SHARE:  # both hold, and the contact takes its share first
                needed, grip = contact, friction(0.0) * pressed * RADIUS
                contact = np.clip(needed, -grip, grip)
                solid = solid + contact - needed
        else:
            contact = -self.side * RADIUS * slide_friction(np.maximum(self.side * slip, 0.0), t, self.at)
            if self.pull == 0:
                a, solid = y2, others + contact - MASS * y2
            else:
                a = (others + contact - solid) / MASS
        return {
            "t": t, "x": x, "v": v, "a": a, "d": d, "f": contact, "slip": slip, "pressed": pressed, "y": y,
            "y1": y1, "y2": y2, "force": force(t, self.at), "drive": spring + damper + solid, "crossing": spring + damper + viscous,
        }

    def names(self):
        """Of the values that state tells."""
        return list(self.end_state())

    def end_state(self):
        return self.state(self.end, self.pieces[-1][2] if self.pieces else None)

    def kinks(self, low, high):
        """When solid damping has a corner while the body is stuck: d passes 0, or the contact's own share is used up."""
        if self.side != 0 or not SOLID_SHARE:
            return []

        def g(t):
            d = self.state(t)["d"]
            return d if self.pull else np.abs(needed_force(t, self.at, d, 0)[0]) - friction(0.0) * pressing(t) * RADIUS

        return sign_changes(g, low, high)


def slide_friction(slip, t, at):
    """What resists at the contact for |v_r| = slip, without the lever arm; at 0 as just above it. Nothing while N = 0."""
    face = np.maximum(RADIUS * slip, 1e-300)
    return friction(face) * pressing(t) + FLUID * face if pressing(at) > 0 else 0.0 * face


def spring_sense(t, at):
    """The sign of d' of a stuck body; 0 where the spring's far end and the counterface move as one."""
    drift = drift_of_spring(t, at)
    return np.where(np.abs(drift) <= 1e-12 * FACE_SPEED, 0.0, np.sign(drift))


def needed_force(t, at, d, pull):
    """The friction that keeps v_r at 0, how much there is to keep it, and what rounding may make of the first."""
    _, u1, u2 = counterface(t, at)
    solid = SOLID_SHARE * STIFFNESS * np.abs(d)
    parts = [
        MASS * u2, -force(t, at), STIFFNESS * d, CUBIC * d**3, (DAMPING + SOLID_VISCOUS) * drift_of_spring(t, at), pull * solid,
        -WEIGHT, MASS * floor(t, at),
    ]
    room = friction(0.0) * pressing(t) * RADIUS + np.where(pull == 0, solid, 0.0)
    return sum(parts), room, ROUNDING * sum(np.abs(part) for part in parts)


def needed_solid(t, at, d, side):
    """The solid damping that keeps d' at 0 while the contact slips, how much there is, and what rounding may make of it."""
    _, y1, y2 = base(t, at)
    slip = np.maximum(side * (y1 - counterface(t, at)[1]), 0.0)
    contact = -side * RADIUS * slide_friction(slip, t, at)
    parts = [force(t, at), -STIFFNESS * d, -CUBIC * d**3, WEIGHT, contact, -MASS * y2]
    return sum(parts), SOLID_SHARE * STIFFNESS * np.abs(d) + 0.0 * t, ROUNDING * sum(np.abs(part) for part in parts)


def over(needed, room, rounding):
    """By how much a hold is passed; not positive while it lasts."""
    return np.abs(needed) - room * (1 + HELD) - rounding
`;
