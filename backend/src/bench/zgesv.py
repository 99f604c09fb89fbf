"""Times LAPACK's zgesv on one thread, for the ratios of docs/performance.md.

Usage: zgesv.py SIZE...   prints a line "size microseconds" for each size.
Needs NumPy and SciPy. The quickest of many batches, one complex symmetric matrix and one
right-hand side; the copy of the matrix that the call makes is counted, as the
program's own solve leaves its matrix whole too.
"""

import os
import sys
import time

for name in ("OPENBLAS_NUM_THREADS", "MKL_NUM_THREADS", "OMP_NUM_THREADS"):
    os.environ[name] = "1"

import numpy  # noqa: E402  the number of threads must be known before
from scipy.linalg import lapack  # noqa: E402


def microseconds(size):
    random = numpy.random.default_rng(4)
    half = random.standard_normal((size, size)) + 1j * random.standard_normal((size, size))
    matrix = numpy.asfortranarray(half + half.T + 2 * size * numpy.eye(size))
    right = numpy.asfortranarray(random.standard_normal((size, 1)) + 0j)
    once = max(1, int(2e7 / (size**3 + 1e4)))
    batches = []
    for _ in range(40):
        start = time.perf_counter()
        for _ in range(once):
            lapack.zgesv(matrix, right)
        batches.append((time.perf_counter() - start) / once)
    return 1e6 * min(batches)


for argument in sys.argv[1:]:
    print(argument, round(microseconds(int(argument)), 2), flush=True)
