#!/usr/bin/python3
# SPDX-License-Identifier: GPL-3.0-or-later
"""What numpy needs for the work of screen_bench, and the ratios to it: rounds of both in turn, by processor time.

    tests/bench/screen_numpy.py .build/bench/tests/bench/screen_bench      needs python3-numpy
"""
import csv
import json
import os
import statistics
import subprocess
import sys
import tempfile
import time

import numpy as np

POINTS = 1_000_000
CASES = 6
COMBINATIONS = 32
ROUNDS = 3
CHUNK = 2048
A11, A22, A66 = (1 / 196, 1 / 441), (1 / 0.16, 1 / 6.25), 1 / 16


def timed(work):
    start = time.thread_time()
    work()
    return time.thread_time() - start


def squares(s1, s2, t):
    return (np.where(s1 < 0, A11[1], A11[0]) * s1 * s1 + np.where(s2 < 0, A22[1], A22[0]) * s2 * s2 + A66 * t * t)


def loop(stress, cos2, sin2, factors):
    """One pass over all points for each combination, as a script is mostly written."""
    best = np.full(POINTS, -1.0)
    which = np.zeros(POINTS, dtype=np.int32)
    for number, row in enumerate(factors):
        sx, sy, txy = np.tensordot(row, stress, axes=1)
        mean, half = (sx + sy) / 2, (sx - sy) / 2
        x = half * cos2 + txy * sin2
        value = squares(mean + x, mean - x, txy * cos2 - half * sin2)
        worse = ~(value <= best)
        best[worse] = value[worse]
        which[worse] = number
    return best, which


def chunked(stress, cos2, sin2, factors):
    """All combinations of a piece at once, so that it stays in the cache."""
    best = np.empty(POINTS)
    which = np.empty(POINTS, dtype=np.int32)
    for start in range(0, POINTS, CHUNK):
        piece = slice(start, start + CHUNK)
        sx, sy, txy = stress[:, 0, piece], stress[:, 1, piece], stress[:, 2, piece]
        mean, half = (sx + sy) / 2, (sx - sy) / 2
        x = half * cos2[piece] + txy * sin2[piece]
        shear = txy * cos2[piece] - half * sin2[piece]
        mean, x, shear = factors @ mean, factors @ x, factors @ shear
        value = squares(mean + x, mean - x, shear)
        which[piece] = value.argmax(axis=0)
        best[piece] = value.max(axis=0)
    return best, which


def product(bench, name, table):
    """Seconds of one benchmark, the median of three."""
    with tempfile.NamedTemporaryFile(suffix=".json") as out:
        subprocess.run([bench, table, f"--benchmark_filter=^{name}$", "--benchmark_repetitions=3", f"--benchmark_out={out.name}",
                        "--benchmark_out_format=json"], check=True, stdout=subprocess.DEVNULL)
        runs = json.load(out)["benchmarks"]
    return next(run["cpu_time"] for run in runs if run.get("aggregate_name") == "median") / 1e3


def write_table(path, random):
    numbers = random.uniform(-10, 10, (POINTS, 3))
    with open(path, "w", encoding="ascii") as file:
        file.write("point,case,sx,sy,txy\n")
        for i, (sx, sy, txy) in enumerate(numbers):
            file.write(f"{i // CASES},{'ABCDEF'[i % CASES]},{sx:.6g},{sy:.6g},{txy:.6g}\n")


def read_by_csv(path):
    with open(path, newline="", encoding="ascii") as file:
        rows = csv.reader(file)
        next(rows)
        for row in rows:
            float(row[2]), float(row[3]), float(row[4])


def say(what, ratios, bar):
    print(f"{what:<60} {statistics.median(ratios):8.2f}   bar: {bar}")


def main():
    bench = os.path.abspath(sys.argv[1])
    random = np.random.default_rng(1)
    stress = random.uniform(-10, 10, (CASES, 3, POINTS))
    angle = random.uniform(-1, 1, POINTS)
    cos2, sin2 = np.cos(angle), np.sin(angle)
    factors = random.uniform(0.3, 1.5, (COMBINATIONS, CASES))
    one, other = loop(stress, cos2, sin2, factors), chunked(stress, cos2, sin2, factors)
    assert np.allclose(one[0], other[0])
    with tempfile.TemporaryDirectory() as folder:
        table = os.path.join(folder, "points.csv")
        write_table(table, random)
        ratios = {"loop": [], "chunked": [], "loadtxt": [], "csv": []}
        for _ in range(ROUNDS):
            kernels = product(bench, "combinations of 32", table)
            ratios["loop"].append(timed(lambda: loop(stress, cos2, sin2, factors)) / kernels)
            ratios["chunked"].append(timed(lambda: chunked(stress, cos2, sin2, factors)) / kernels)
            reader = product(bench, "read long", table)
            ratios["loadtxt"].append(
                timed(lambda: np.loadtxt(table, delimiter=",", skiprows=1, usecols=(2, 3, 4))) / reader)
            ratios["csv"].append(timed(lambda: read_by_csv(table)) / reader)
    say("numpy, a pass for each of 32 combinations / kernels", ratios["loop"], "at least 12")
    say("numpy in pieces, 32 combinations / kernels", ratios["chunked"], "at least 5")
    say("numpy.loadtxt of three columns / reading all five", ratios["loadtxt"], "at least 1.5")
    say("python's csv / reading", ratios["csv"], "at least 8")


if __name__ == "__main__":
    main()
