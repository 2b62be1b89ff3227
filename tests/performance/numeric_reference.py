"""The same numeric work by numpy and scipy, one thread: eigenvalues, step responses, frequency responses.

Reads one JSON object from standard input: `models`, each with A, b, c as doubles, `times` (s) and `omega` (rad/s).
Prints median milliseconds of each, the median of eigvals of a standard normal 200 x 200, and the poles, step and
frequency response found, so that their digits can be held against the truth.
"""

import json
import os
import sys
import time

import numpy as np
from scipy.signal import lsim

RUNS = 7
BLOCK = 50


def median(work):
    work()
    times = []
    for _ in range(RUNS):
        start = time.perf_counter()
        work()
        times.append(1000 * (time.perf_counter() - start))
    return sorted(times)[RUNS // 2]


def response(A, b, c, omega):
    eye = np.eye(len(A))
    out = []
    for start in range(0, len(omega), BLOCK):
        w = omega[start : start + BLOCK]
        x = np.linalg.solve(1j * w[:, None, None] * eye - A, np.broadcast_to(b, (len(w), len(A), 1)))
        out.append((c @ x)[:, 0, 0])
    return np.concatenate(out)


def measured(model):
    A, b, c = (np.array(model[key], dtype=float) for key in ("A", "b", "c"))
    b, c = b.reshape(-1, 1), c.reshape(1, -1)
    t, omega = np.array(model["times"]), np.array(model["omega"])
    ones = np.ones_like(t)
    system = (A, b, c, np.zeros((1, 1)))
    poles = np.linalg.eigvals(A)
    y = lsim(system, ones, t)[1]
    h = response(A, b, c, omega)
    return {
        "eigenvalues": median(lambda: np.linalg.eigvals(A)),
        "step": median(lambda: lsim(system, ones, t)),
        "frequency": median(lambda: response(A, b, c, omega)),
        "poles": [[z.real, z.imag] for z in poles.astype(complex)],
        "y": y.tolist(),
        "h": [[z.real, z.imag] for z in h],
    }


def main():
    models = json.load(sys.stdin)["models"]
    unit = np.random.default_rng(1).standard_normal((200, 200))
    config = np.show_config(mode="dicts")["Build Dependencies"]["blas"]
    print(
        json.dumps(
            {
                "numpy": np.__version__,
                "kernel": f"{config['name']} {config['version']}, {os.environ.get('OPENBLAS_CORETYPE', 'chosen by itself')}",
                "unit": median(lambda: np.linalg.eigvals(unit)),
                "models": [measured(model) for model in models],
            }
        )
    )


main()
