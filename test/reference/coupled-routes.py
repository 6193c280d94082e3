"""Two hundred random coupled routes, integrated by scipy.integrate.solve_ivp (DOP853, rtol 1e-10) on the equations of
second-method.py. Writes coupled-routes.json.

    python3 test/reference/coupled-routes.py > test/reference/coupled-routes.json

Each case holds the days to its limits and, beside them, the condition number of the crossing, |d ln day / d ln value|.
Where that exceeds 1e3 a day says more about the last digits of the value than about the method; the value on that day
is compared instead, so the day joins `report_days`.
Needs scipy (Debian: python3-scipy). The seed is fixed.
"""
import importlib.util
import json
import math
import os
import random
import sys

import numpy as np

HERE = os.path.dirname(os.path.abspath(__file__))
spec = importlib.util.spec_from_file_location("second_method", os.path.join(HERE, "second-method.py"))
second = importlib.util.module_from_spec(spec)
spec.loader.exec_module(second)

CASES = 200
MOST_CONDITION = 1e3
GAUSS = list(zip(*(list(map(float, x)) for x in np.polynomial.legendre.leggauss(10))))
Wall = second.Wall


class SecantWall(Wall):
    """The same equations as second_method.Wall, the flux found by secants in its logarithm: fifty times as fast."""

    def __init__(self, layers, t):
        super().__init__(layers, t)
        self.tight = any(la["kind"] == "foil" and not la.get("defects") for la in layers)
        self.holed = any(la.get("defects") for la in layers)
        self.guess = None

    def solve(self, hout, hin):
        lo, hi = min(hout, hin), max(hout, hin)
        if self.tight or hi - lo < 1e-9:
            return super().solve(hout, hin)
        n = self.n
        dw = [self.holes(i, "water", hout, hin) for i in range(n)] if self.holed else [0.0] * n
        do = [self.holes(i, "oxygen", hout, hin) for i in range(n)] if self.holed else [0.0] * n
        gw, fw = self.g["water"], self.f["water"]
        order = list(range(n - 1, -1, -1) if hin < hout else range(n))
        rise = [0.0] * n
        start = [0.0] * n

        def total(j):
            r = 0.0
            for i in order:
                a = lo + r
                start[i] = a
                rise[i] = j / (gw[i] + dw[i]) if fw[i].none else self.invert(fw[i], gw[i], dw[i], a, j) - a
                r += rise[i]
            return r

        x = math.log(self.guess * (hi - lo)) if self.guess else None
        if x is None:
            x = math.log((hi - lo) / sum(1 / (gw[i] * fw[i](0.5 * (lo + hi)) + dw[i]) for i in range(n)))
        y = math.log(total(math.exp(x)) / (hi - lo))
        x1 = x - y
        for _ in range(40):
            y1 = math.log(total(math.exp(x1)) / (hi - lo))
            if abs(y1) < 4e-16 / (hi - lo) + 4e-16 or x1 == x or y1 == y:
                break
            x, y, x1 = x1, y1, x1 - y1 * (x1 - x) / (y1 - y)
            if not abs(x1 - x) < 50:
                return super().solve(hout, hin)
        else:
            return super().solve(hout, hin)
        self.guess = math.exp(x1) / (hi - lo)
        resistance = 0.0
        self.rise, self.oxygen = rise, []
        for i in range(n):
            own, fo = self.g["oxygen"][i], self.f["oxygen"][i]
            if own > 0 and not fo.none:
                a, b = start[i], start[i] + rise[i]
                if b - a < 1e-10:
                    own *= fo(0.5 * (a + b))
                else:
                    pts = sorted({a, b} | {k for k in fo.h + fw[i].h if a < k < b})
                    num = den = 0.0
                    for p, s in zip(pts, pts[1:]):
                        m, d = 0.5 * (p + s), 0.5 * (s - p)
                        for u, w in GAUSS:
                            lw = fw[i].ln(m + d * u)
                            num += w * d * math.exp(lw - fo.ln(m + d * u))
                            den += w * d * math.exp(lw)
                    own *= den / num
            self.oxygen.append(1 / (own + do[i]))
            resistance += self.oxygen[i]
        return self.guess, 1 / resistance


second.Wall = SecantWall
rnd = second.rnd

KINDS = ["evoh", "evoh turned", "two", "cellulose", "starch", "coated", "coated curved", "coated holed", "foil holed"]


def case():
    kinds = [rnd.choice(KINDS)] if rnd.random() < 0.8 else [rnd.choice(KINDS), rnd.choice(KINDS)]
    after = "repeat" if rnd.random() < 0.25 else "hold"
    legs = [second.leg() for _ in range(rnd.randint(1, 4))]
    if rnd.random() < 0.15:
        legs[rnd.randrange(len(legs))]["temperature_C"] = round(rnd.uniform(-25, -2), 1)
    more = {"uptake": rnd.choice([15, 40, 90]), "headspace": rnd.random() < 0.8, "seal": rnd.random() < 0.2,
            "leaks": rnd.random() < 0.15, "mass": rnd.choice([0.02, 0.06, 0.2]), "horizon": 720.7}
    if rnd.random() < 0.2:
        more["absorber"] = rnd.choice([2, 8, 20])
    mode = rnd.choice(["at_once", "none", "rate", "rate"])
    if mode == "none" and not more["headspace"]:
        mode = "rate"
    is_gain = rnd.random() < 0.65
    s = second.build(kinds, mode, rnd.choice(["GAB", "GAB", "linear"]), is_gain, after, legs, **more)
    if is_gain and after == "hold" and rnd.random() < 0.25 and legs[-1]["relative_humidity"] > 0.3:
        # A limit so near to rest with the air of the last leg that its crossing is badly conditioned.
        moisture, _ = second.iso(s["food"]["isotherm"])
        s["limits"]["moisture_max_g_per_g"] = moisture(legs[-1]["relative_humidity"] - 10 ** rnd.uniform(-6, -4))
        s["food"]["mass_kg"] = 0.02
        s["horizon_days"] = 2000.7
    return s


def rounded(x):
    if isinstance(x, float):
        return float(f"{x:.12g}")
    if isinstance(x, dict):
        return {k: rounded(v) for k, v in x.items()}
    return [rounded(v) for v in x] if isinstance(x, list) else x


def main():
    rnd.seed(20260805)
    cases = []
    for i in range(CASES):
        s = case()
        conditions = {}
        got = second.storage(s, rtol=1e-10, atol=1e-14, conditions=conditions)
        bad = [k for k, c in conditions.items() if c > MOST_CONDITION and not math.isinf(c)]
        if bad:
            s["report_days"] += [got["limits"][k]["days"] for k in bad]
            got = second.storage(s, rtol=1e-10, atol=1e-14)
        expected = {"limits": got["limits"], "courses": got["courses"]}
        for k, c in conditions.items():
            expected["limits"][k]["condition"] = -1 if math.isinf(c) else float(f"{c:.3g}")
        cases.append({"id": f"R{i + 1:03d}", "input": s, "expected": rounded(expected)})
        print(cases[-1]["id"], {k: v.get("days") for k, v in got["limits"].items()}, conditions, file=sys.stderr,
              flush=True)
    json.dump({"title": "Random coupled routes by coupled-routes.py: solve_ivp, DOP853, rtol 1e-10",
               "cases": cases}, sys.stdout, separators=(",", ":"))
    print()


if __name__ == "__main__":
    main()
