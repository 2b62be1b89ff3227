"""The same algebraic system by scipy: sparse LU of I - M and all right-hand sides, one thread.

Reads one JSON object from standard input: n, columns, the triplets of I - M and of the right-hand sides, and whether to solve for those.
Prints the median milliseconds of the factorisation alone and of factorisation with all right-hand sides.
"""

import json
import sys
import time

import numpy as np
from scipy.sparse import csc_matrix
from scipy.sparse.linalg import splu

RUNS = 5


def median(work):
    work()
    times = []
    for _ in range(RUNS):
        start = time.perf_counter()
        work()
        times.append(1000 * (time.perf_counter() - start))
    return sorted(times)[RUNS // 2]


def main():
    data = json.load(sys.stdin)
    n, columns = data["n"], data["columns"]
    rows, cols, values = data["matrix"]
    matrix = csc_matrix((values, (rows, cols)), shape=(n, n))
    rows, cols, values = data["sides"]
    sides = csc_matrix((values, (rows, cols)), shape=(n, columns))

    def factor():
        return splu(matrix)

    def solve():
        lu = factor()
        # In slices, so that 10,000 columns need no array of 10,000 x 100,000.
        for start in range(0, columns, 64):
            lu.solve(sides[:, start : start + 64].toarray())

    all_sides = median(solve) if data["solves"] else None
    print(json.dumps({"factor": median(factor), "solve": all_sides, "numpy": np.__version__}))


main()
