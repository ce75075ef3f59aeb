import { compileProblem } from "../scenario/compile-problem.ts";
import type { Scenario } from "../scenario/scenario.ts";
import { bristleText } from "./bristle-text.ts";
import { comparisonText } from "./comparison-text.ts";
import { frozenPart, type Frozen } from "./frozen-part.ts";
import { inputText } from "./input-text.ts";
import { pythonText } from "./literals.ts";
import { motionText } from "./motion-text.ts";
import { quantitiesText } from "./quantities-text.ts";
import { runText } from "./run-text.ts";
import { settingsText } from "./settings-text.ts";
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
    "# ---- What is claimed -----------------------------------------------------------------------------------------------\n",
    frozenPart(motion, claim),
    "# ---- Corners and sizes -------------------------------------------------------------------------------------------",
    settingsText,
    ...(scenario.contact.law.model === "bristle" ? [bristleText] : [motionText, runText]),
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

import base64
import hashlib
import sys
from bisect import bisect_left
from itertools import groupby

import numpy as np
from numpy.polynomial.chebyshev import chebvander
from scipy.integrate import DOP853, LSODA
from scipy.interpolate import CubicHermiteSpline
from scipy.optimize import brentq, minimize_scalar

TURN = 2 * np.pi
INFINITE = np.inf
`;
