"""A sweep in SciPy as one writes it: solve_ivp restarted at every event, cells shared out to a pool of two processes. Eight of the
10,000 cells of the bench's sweep, 100 periods each; prints processor seconds a cell."""

import multiprocessing
import time

from solve_ivp import harmonic

CELLS = [(f, w) for f in (0.0505, 0.303, 0.5556, 0.808) for w in (0.65, 1.47)]


def cell(values):
    friction, omega = values
    start = time.process_time()
    harmonic(friction, omega, 100)
    return time.process_time() - start


if __name__ == "__main__":
    with multiprocessing.Pool(2) as pool:
        print(sum(pool.map(cell, CELLS, chunksize=1)) / len(CELLS))
