"""The bench's other side: the same models, inputs and accuracy in SciPy, on one core.

    OMP_NUM_THREADS=1 python3 test/bench/peer.py

Prints one JSON object. A single wall: secants in the logarithm of the flux over plain Python numbers, which is faster
than scipy.optimize.brentq and than NumPy on arrays of seven. Many walls: NumPy over all of them at once. Routes:
solve_ivp (LSODA) with events, at the loosest tolerance that gives the days to the accuracy asked for. Draws: as many
as are needed for a steady median, scaled to ten thousand.
"""
import copy
import importlib.util
import json
import math
import os
import platform
import statistics
import time

import numpy as np
import scipy

HERE = os.path.dirname(os.path.abspath(__file__))
spec = importlib.util.spec_from_file_location("coupled", os.path.join(HERE, "..", "reference", "coupled-routes.py"))
coupled = importlib.util.module_from_spec(spec)
spec.loader.exec_module(coupled)
second = coupled.second

with open(os.path.join(HERE, "studies.json")) as file:
    STUDIES = json.load(file)


def conditions(i):
    """The i-th of the walls' environments: °C, humidity outside and inside. The same formula is in bench.ts."""
    return 5 + (i % 300) / 10, 0.45 + (i % 97) / 200, 0.05 + (i % 53) / 160


def timed(run, count):
    spent = []
    for i in range(count):
        start = time.perf_counter()
        run(i)
        spent.append(time.perf_counter() - start)
    return statistics.median(spent)


def one_wall(i):
    t, out, inside = conditions(i)
    wall = coupled.SecantWall(STUDIES["wall"], t)
    water, oxygen = wall.solve(out, inside)
    # All that wallState answers: fluxes, shares of the resistance, humidities and pressures at the interfaces.
    saturation, outer = second.psat(t), 20000.0
    flux = water * saturation * (out - inside), oxygen * outer
    shares = [r / (out - inside) for r in wall.rise], [r * oxygen for r in wall.oxygen]
    h, p = [out], [outer]
    for a, b in zip(*shares):
        h.append(h[-1] + (inside - out) * a)
        p.append(p[-1] - outer * b)
    return (water, oxygen), flux, shares, h, [x * saturation for x in h], p


class Curves:
    """A factor on arrays of humidities: its integral from 0 and the inverse of that."""

    def __init__(self, gas):
        f = second.Factor(gas)
        self.none = f.none
        if self.none:
            return
        h, l = list(f.h), list(f.l)
        if h[0] > 0:
            h, l = [0.0] + h, [l[0]] + l
        if h[-1] < 40:
            h, l = h + [50.0], l + [l[-1]]
        self.h, self.l = np.array(h), np.array(l)
        self.f = np.exp(self.l)
        self.s = np.diff(self.l) / np.diff(self.h)
        d = np.diff(self.l)
        mean = np.where(np.abs(d) < 1e-12, 1.0, np.expm1(d) / np.where(d == 0, 1, d))
        self.c = np.concatenate([[0], np.cumsum(self.f[:-1] * mean * np.diff(self.h))])

    def integral(self, h):
        k = np.clip(np.searchsorted(self.h, h, side="right") - 1, 0, len(self.s) - 1)
        x, s = h - self.h[k], self.s[k]
        y = s * x
        return self.c[k] + self.f[k] * x * np.where(np.abs(y) < 1e-9, 1 + y / 2, np.expm1(y) / np.where(y == 0, 1, y))

    def inverse(self, v):
        k = np.clip(np.searchsorted(self.c, v, side="right") - 1, 0, len(self.s) - 1)
        y, s = (v - self.c[k]) / self.f[k], self.s[k]
        z = s * y
        return self.h[k] + y * np.where(np.abs(z) < 1e-9, 1 - z / 2, np.log1p(np.maximum(z, -1 + 1e-15)) / np.where(z == 0, 1, z))


LAYERS = [(la, Curves(la["water"]), Curves(la["oxygen"])) for la in STUDIES["wall"]]


def quotient(water, oxygen):
    """f_w/f_o as a curve of its own, on the knots of both."""
    h = sorted({x for c in (water, oxygen) if not c.none for x in c.h})
    q = Curves.__new__(Curves)
    w = [0.0 if water.none else float(np.interp(x, water.h, water.l)) for x in h]
    o = [0.0 if oxygen.none else float(np.interp(x, oxygen.h, oxygen.l)) for x in h]
    q.__init__({"humidity_curve": {"relative_humidity": h, "factor": [math.exp(a - b) for a, b in zip(w, o)]}})
    shift = w[0] - o[0] - q.l[0]
    q.l, q.f, q.c = q.l + shift, q.f * math.exp(shift), q.c * math.exp(shift)
    return q


QUOTIENTS = [None if o.none else quotient(w, o) for _, w, o in LAYERS]


def many_walls(first, count):
    i = np.arange(first, first + count)
    t, out, inside = conditions(i)
    T = t + 273.15

    def own(la, gas):
        e = la[gas].get("activation_energy_J_per_mol", 0)
        p = la[gas]["permeability_mol_m_per_m2_s_Pa"] / (la["thickness_um"] * 1e-6)
        return p * np.exp(-e / second.R * (1 / T - 1 / (273.15 + la[gas].get("reference_temperature_C", 23))))

    gw = [own(la, "water") for la, _, _ in LAYERS]
    go = [own(la, "oxygen") for la, _, _ in LAYERS]
    faces = np.empty((len(LAYERS) + 1, count))

    def walk(j):
        h = inside.copy()
        faces[-1] = h
        for k in range(len(LAYERS) - 1, -1, -1):
            curve = LAYERS[k][1]
            if curve.none:
                h = h + j / gw[k]
            else:
                v = curve.integral(np.clip(h, 0, 50)) + j / gw[k]
                h = curve.inverse(np.maximum(v, 0))
            faces[k] = h
        return h

    span = out - inside
    low = np.zeros(count)
    scale = 1 / sum(1 / g for g in gw)
    a, b = scale * span * 0.3, scale * span * 3
    fa, fb = walk(a) - out, walk(b) - out
    for _ in range(60):
        d = np.where(fb == fa, 1, fb - fa)
        c = b - np.where(fb == fa, 0, fb * (b - a) / d)
        a, fa = b, fb
        b = c
        fb = walk(b) - out
        if np.max(np.abs(fb)) < 1e-13:
            break
    resistance = low
    for k, (la, water, oxygen) in enumerate(LAYERS):
        g = go[k]
        if not oxygen.none:
            x, y = faces[k + 1], faces[k]
            top = QUOTIENTS[k].integral(y) - QUOTIENTS[k].integral(x)
            bottom = (y - x) if water.none else water.integral(y) - water.integral(x)
            flat = np.abs(y - x) < 1e-9
            g = g * np.where(flat, 1.0, bottom / np.where(flat, 1, top))
        resistance = resistance + 1 / g
    return b / span, 1 / resistance


def days(study, rtol):
    got = second.storage(study, method="LSODA", rtol=rtol, atol=rtol * 1e-4)["limits"]
    return [v.get("days") for v in got.values()]


def loosest(study, accuracy):
    """The loosest tolerance with which LSODA gives the days to the accuracy, beside tight ones."""
    tight = days(study, 1e-11)
    for power in range(3, 11):
        got = days(study, 10.0 ** -power)
        if all(a is not None and b is not None and abs(a / b - 1) <= accuracy for a, b in zip(got, tight) if b):
            return 10.0 ** -power, tight
    return 1e-11, tight


def drawn(study, generator):
    s = copy.deepcopy(study)
    for la in s["pack"]["walls"][0]["layers"]:
        for gas, sd in (("oxygen", 1.3), ("water", 1.25)):
            la[gas]["permeability_mol_m_per_m2_s_Pa"] *= sd ** generator.standard_normal()
    return s


def main():
    one_wall(0)
    single = timed(one_wall, 2000)
    many_walls(0, 1000)
    batch = timed(lambda i: many_walls(1000 * i, 1000), 30) / 1000
    route = STUDIES["route"]
    rtol, route_days = loosest(route, 1e-6)
    seconds = timed(lambda i: days(route, rtol), 5)
    study = STUDIES["draws"]["storage"]
    draw_rtol, draw_days = loosest(study, 1e-4)
    generator = np.random.default_rng(1)
    draws = timed(lambda i: days(drawn(study, generator), draw_rtol), 40)
    many = many_walls(0, 50)
    print(json.dumps({
        "versions": f"Python {platform.python_version()}, NumPy {np.__version__}, SciPy {scipy.__version__}",
        "single_wall_us": single * 1e6,
        "batch_wall_us": batch * 1e6,
        "route_ms": seconds * 1e3,
        "route_rtol": rtol,
        "draws_s": draws * 1e4,
        "draws_rtol": draw_rtol,
        "walls": [list(one_wall(i)[0]) for i in range(50)],
        "batch_walls": [[float(a), float(b)] for a, b in zip(*many)],
        "route_days": route_days,
        "draw_days": draw_days,
    }))


main()
