import { compileProblem } from "../scenario/compile-problem.ts";
import type { Scenario } from "../scenario/scenario.ts";
import { comparisonText } from "./comparison-text.ts";
import { frozenPart, type Frozen } from "./frozen-part.ts";
import { inputText } from "./input-text.ts";
import { pythonText } from "./literals.ts";
import { motionText } from "./motion-text.ts";
import { quantitiesText } from "./quantities-text.ts";
import { scenarioConstants, scenarioFunctions } from "./scenario-part.ts";
import { steadyPart } from "./steady-part.ts";

/** What a file checks: a result's quantities and events, and what they are of. */
export interface Claim extends Frozen {
  readonly solverVersion: string;
  /** SHA-256 of the scenario's canonical text, lower-case hex. */
  readonly digest: string;
  /** As the file names it: "revision 4", "this run". */
  readonly name: string;
}

/**
 * A scenario as one Python file that needs numpy and scipy and nothing else: the equation with the scenario's numbers, integrated
 * from event to event, every quantity printed beside the claim's, exit status 1 where one is more than 1e-6 of the run's peak
 * apart. It shares no solution in closed form with this solver: only definitions of law, inputs and quantities.
 *
 * @throws RangeError where `pythonGap` tells why there is no such file.
 */
export function pythonScript(scenario: Scenario, claim: Claim): string {
  const { motion, title } = scenario;
  const problem = compileProblem(scenario);
  return [
    header(claim, motion),
    `# ${pythonText(title)}\n`,
    "# ---- The scenario ------------------------------------------------------------------------------------------------\n",
    scenarioConstants(scenario),
    inputText.trimStart(),
    "\n# ---- The scenario's functions -----------------------------------------------------------------------------------\n",
    scenarioFunctions(scenario),
    steadyPart(scenario, problem),
    settings,
    "# ---- What is claimed -----------------------------------------------------------------------------------------------\n",
    frozenPart(motion, claim),
    scaleText,
    motionText,
    quantitiesText,
    comparisonText,
  ].join("\n");
}

const header = ({ name, digest, solverVersion }: Claim, motion: Scenario["motion"]) => `#!/usr/bin/env python3
# An independent recheck of ${pythonText(name)}. It needs Python 3.9 or later with numpy and scipy, and nothing else.
#
# It integrates the equation of motion from event to event and prints each quantity beside the one it checks:
#
#     ${motion === "linear" ? "m x''" : "J x''"} = F(t) - c d' - k d - k3 d^3 - S + W + f       d = x - y(t)
#
# Exit status 0 where every quantity and event is within 1e-6 of the run's peak in its unit, else 1. Where a motion hangs on the
# last digits of its inputs, any two programs may part: then a difference here says that, not that one of them is wrong.
# What it could miss: a hold passed and regained, or v_r touching 0 twice, between two looks (64 a period of the inputs).
#
# Digest of the scenario: ${digest}
# Solver that made the numbers: ${pythonText(solverVersion)}
# Units: SI; ${motion === "linear" ? "m, kg, s, N" : "rad, kg m2, s, N m"}; frequencies in Hz, phases in degrees.

import sys

import numpy as np
from numpy.polynomial.chebyshev import chebvander
from scipy.integrate import DOP853
from scipy.interpolate import CubicHermiteSpline
from scipy.optimize import brentq, minimize_scalar

TURN = 2 * np.pi
INFINITE = np.inf
`;

const settings = `
ALLOWED = 1e-6  # of the run's peak
RTOL, ATOL = 1e-11, 1e-13  # of the integration; ATOL a share of the run's peaks
HELD = 1e-10  # a need that passes the hold by less is held: rounding must not decide
NOISE = 1e-11  # v_r below this share of its peak is 0
LOOKS, LOOKS_A_PERIOD = 12, 64  # at a step of a slip, at a period of the inputs while stuck
LONGEST_STEP = 1 / (20 * FASTEST_HZ) if FASTEST_HZ else np.inf


def lost_contact_times():
    """When N falls to 0 and when it comes back."""
    if abs(RIPPLE) <= NORMAL:
        return []
    angle = np.arccos(-NORMAL / RIPPLE)
    turns = np.arange(-2, int(SECONDS * RIPPLE_HZ) + 3)
    shifts = [TURN * turns + angle - np.radians(RIPPLE_PHASE), TURN * turns - angle - np.radians(RIPPLE_PHASE)]
    return list(np.concatenate(shifts) / (TURN * RIPPLE_HZ))


CORNERS = sorted({float(t) for t in [*INPUT_CORNERS, *lost_contact_times()] if np.isfinite(t)})


def steady_start(end):
    """The steady window: the last ten periods of the lowest frequency, the last half under a feed or on a belt, else all."""
    if PERIODIC:
        return max(0.0, end - 10 / LOWEST_HZ)
    return end / 2 if FED or COUNTERFACE == "belt" else 0.0

`;

const scaleText = `# Peaks of d and v_r, for the absolute tolerances alone.
SCALES = np.array([
    (CLAIM.get("driveForcePeak") or 0.0) / STIFFNESS if STIFFNESS else CLAIM.get("peakDisplacement") or 0.0,
    CLAIM.get("slipVelocityPeak") or 0.0,
])
SCALES = np.where(SCALES > 0, SCALES, 1.0)
`;
