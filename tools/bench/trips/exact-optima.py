"""Exact optima of the closed tours in libs/trips/fixtures, by an integer program that shares no code with the library.

Degree equations plus subtour cuts: cuts are added from minimum cuts of the linear relaxation, then from the loops of
integer solutions, until the integer optimum is a single loop. Writes exact_optima.csv with the versions it ran on.
Run with Debian's python3-scipy:  /usr/bin/python3 tools/bench/trips/exact-optima.py [names]
"""
import csv
import math
import pathlib
import sys

import numpy
import scipy
from scipy.optimize import Bounds, LinearConstraint, linprog, milp
from scipy.sparse import csr_matrix, vstack
from scipy.sparse.csgraph import connected_components

FIXTURES = pathlib.Path(__file__).resolve().parents[3] / "libs" / "trips" / "fixtures"
NAMES = ["eil51", "berlin52", "st70", "eil76", "kroA100"] + [f"uniform100_{k}" for k in range(1, 6)]


def distances(name):
    with open(FIXTURES / f"{name}.csv", newline="") as file:
        nodes = [(float(row["x"]), float(row["y"])) for row in csv.DictReader(file)]
    return [[math.floor(math.hypot(a[0] - b[0], a[1] - b[1]) + 0.5) for b in nodes] for a in nodes]


def minimum_cut(weights):
    """Stoer and Wagner's minimum cut: its weight and one side."""
    weights = weights.copy()
    groups = [[i] for i in range(len(weights))]
    best = (math.inf, [])
    while len(groups) > 1:
        added = numpy.zeros(len(groups), bool)
        reach = numpy.zeros(len(groups))
        order = []
        for _ in groups:
            nxt = int(numpy.argmax(numpy.where(added, -1, reach)))
            order.append(nxt)
            added[nxt] = True
            last_reach = reach[nxt]
            reach = reach + weights[nxt]
        s, t = order[-2], order[-1]
        if last_reach < best[0]:
            best = (last_reach, list(groups[t]))
        weights[s] += weights[t]
        weights[:, s] += weights[:, t]
        weights[s, s] = 0
        weights = numpy.delete(numpy.delete(weights, t, 0), t, 1)
        groups[s] = groups[s] + groups[t]
        del groups[t]
    return best


def solve(d):
    n = len(d)
    edges = [(i, j) for i in range(n) for j in range(i + 1, n)]
    cost = numpy.array([d[i][j] for i, j in edges], float)
    rows = [i for i, _ in edges] + [j for _, j in edges]
    columns = list(range(len(edges))) * 2
    degree = csr_matrix((numpy.ones(2 * len(edges)), (rows, columns)), shape=(n, len(edges)))
    ends = numpy.array(edges)
    cuts = []

    def cut_row(side):
        inside = numpy.isin(ends[:, 0], side) != numpy.isin(ends[:, 1], side)
        cuts.append(csr_matrix(inside.astype(float)))

    def support(x):
        weights = numpy.zeros((n, n))
        for k in numpy.nonzero(x > 1e-9)[0]:
            i, j = edges[k]
            weights[i, j] = weights[j, i] = x[k]
        return weights

    while True:
        relaxed = linprog(
            cost, A_eq=degree, b_eq=numpy.full(n, 2.0), bounds=(0, 1), method="highs",
            A_ub=-vstack(cuts) if cuts else None, b_ub=numpy.full(len(cuts), -2.0) if cuts else None,
        )
        weights = support(relaxed.x)
        count, label = connected_components(csr_matrix(weights), directed=False)
        if count > 1:
            for c in range(count):
                cut_row(numpy.nonzero(label == c)[0])
            continue
        value, side = minimum_cut(weights)
        if value > 2 - 1e-6:
            break
        cut_row(side)
    while True:
        constraints = [LinearConstraint(degree, 2, 2)]
        if cuts:
            constraints.append(LinearConstraint(vstack(cuts), 2, numpy.inf))
        exact = milp(cost, integrality=numpy.ones(len(edges)), bounds=Bounds(0, 1), constraints=constraints,
                     options={"mip_rel_gap": 0})
        if exact.status != 0:
            raise RuntimeError(exact.message)
        count, label = connected_components(csr_matrix(support(numpy.round(exact.x))), directed=False)
        if count == 1:
            return round(exact.fun), relaxed.fun, len(cuts)
        for c in range(count):
            cut_row(numpy.nonzero(label == c)[0])


def main():
    found = []
    for name in sys.argv[1:] or NAMES:
        optimum, relaxed, cuts = solve(distances(name))
        print(name, optimum, f"relaxed {relaxed:.2f}, {cuts} cuts", flush=True)
        found.append([name, optimum, f"scipy {scipy.__version__} (HiGHS)"])
    if len(sys.argv) == 1:
        with open(FIXTURES / "exact_optima.csv", "w", newline="") as file:
            csv.writer(file, lineterminator="\n").writerows([["instance", "optimum", "solver"], *found])


main()
