"""A second method for sections 4 to 7, sharing nothing with the engine: plain equations, scipy's root search and
integrators at tight tolerances. Writes second-method.json, cases of the shape of check-cases.json.

    python3 test/reference/second-method.py > test/reference/second-method.json

Needs numpy and scipy (Debian: python3-scipy). Takes some minutes. The seed is fixed.
"""
import bisect
import json
import math
import random
import sys

import numpy as np
from scipy.integrate import solve_ivp
from scipy.optimize import brentq

R = 8.314462618
ATM = 101325.0
MW = 18.01528e-3
MO = 31.9988e-3
STP = ATM * 1e-6 / (R * 273.15)
DAY = 86400.0
GX, GW = np.polynomial.legendre.leggauss(12)


def psat(t):
    T = t + 273.15
    if T < 273.16:
        th = T / 273.16
        a = (-21.2144006, 27.3203819, -6.10598130)
        b = (0.00333333333, 1.20666667, 1.70333333)
        return 611.657 * math.exp(sum(x * th ** y for x, y in zip(a, b)) / th)
    tau = 1 - T / 647.096
    a = (-7.85951783, 1.84408259, -11.7866497, 22.6807411, -15.9618719, 1.80122502)
    e = (1, 1.5, 3, 3.5, 4, 7.5)
    return 22.064e6 * math.exp(647.096 / T * sum(x * tau ** y for x, y in zip(a, e)))


class Factor:
    def __init__(self, gas):
        c = gas.get("humidity_curve")
        self.none = c is None
        if self.none:
            self.h, self.l = [0.0], [0.0]
        else:
            self.h = list(c["relative_humidity"])
            l = [math.log(x) for x in c["factor"]]
            self.l = l
            self.l = [x - self.ln(gas.get("reference_relative_humidity", 0.0)) for x in l]

    def ln(self, h):
        x, y = self.h, self.l
        if h <= x[0]:
            return y[0]
        if h >= x[-1]:
            return y[-1]
        k = bisect.bisect_right(x, h) - 1
        return y[k] + (y[k + 1] - y[k]) * ((h - x[k]) / (x[k + 1] - x[k]))

    def __call__(self, h):
        return math.exp(self.ln(h))

    def integral(self, a, b):
        """int_a^b f dh, a < b, exact by pieces (trapezoid in the logarithm)."""
        pts = [a] + [k for k in self.h if a < k < b] + [b]
        s = 0.0
        for p, q in zip(pts, pts[1:]):
            lp, lq = self.ln(p), self.ln(q)
            d = lq - lp
            mean = math.exp(lp) if d == 0 else (math.exp(lp) * (math.expm1(d) / d))
            s += mean * (q - p)
        return s


def gas_value(gas, t):
    v = gas.get("permeability_mol_m_per_m2_s_Pa", gas.get("permeance_mol_per_m2_s_Pa"))
    T, T0 = t + 273.15, gas.get("reference_temperature_C", 23) + 273.15
    return v * math.exp(-gas.get("activation_energy_J_per_mol", 0) / R * (1 / T - 1 / T0))


class Wall:
    def __init__(self, layers, t):
        self.t, self.layers = t, layers
        self.n = len(layers)
        self.g = {"water": [], "oxygen": []}
        self.f = {"water": [], "oxygen": []}
        for la in layers:
            for gas in ("water", "oxygen"):
                if la["kind"] == "foil":
                    self.g[gas].append(0.0)
                    self.f[gas].append(Factor({}))
                else:
                    v = gas_value(la[gas], t)
                    self.g[gas].append(v / (la["thickness_um"] * 1e-6) if la["kind"] == "film" else v)
                    self.f[gas].append(Factor(la[gas]))

    def holes(self, i, gas, hout, hin):
        d = self.layers[i].get("defects")
        if not d:
            return 0.0
        T = self.t + 273.15
        D = {"oxygen": 2.0e-5, "water": 2.42e-5}[gas] * (T / 293.15) ** 1.75
        r = d["diameter_um"] * 0.5e-6
        total = self.layers[i].get("thickness_um", 0) * 1e-6 * R * T / (D * math.pi * r * r)
        for step, h in ((-1, hout), (1, hin)):
            L = res = 0.0
            j = i + step
            k = 0
            while 0 <= j < self.n and self.layers[j]["kind"] != "foil" and not self.layers[j].get("defects"):
                L += self.layers[j].get("thickness_um", 0) * 1e-6
                res += 1 / (self.g[gas][j] * self.f[gas][j](h))
                j += step
                k += 1
            total += res / (math.pi * r * r * (1 + 1.18 * L / r)) if k else R * T / (4 * D * r)
        return d["density_per_m2"] / total

    def solve(self, hout, hin):
        """water permeance, oxygen permeance"""
        if any(la["kind"] == "foil" and not la.get("defects") for la in self.layers):
            return 0.0, 0.0
        dw = [self.holes(i, "water", hout, hin) for i in range(self.n)]
        do = [self.holes(i, "oxygen", hout, hin) for i in range(self.n)]
        gw, fw = self.g["water"], self.f["water"]
        lo, hi = min(hout, hin), max(hout, hin)
        order = list(range(self.n))
        if hin < hout:
            order.reverse()
        faces = {}

        def march(j):
            h = lo
            for i in order:
                a = h
                if fw[i].none:
                    h = a + j / (gw[i] + dw[i])
                else:
                    h = self.invert(fw[i], gw[i], dw[i], a, j)
                faces[i] = (a, h)
                if h > 50:
                    return 1e3
            return h

        if hi - lo < 1e-9:
            m = 0.5 * (lo + hi)
            q = 1 / sum(1 / (gw[i] * fw[i](m) + dw[i]) for i in range(self.n))
            for i in order:
                faces[i] = (m, m)
        else:
            most = (hi - lo) / sum(1 / (gw[i] * max(map(math.exp, fw[i].l)) + dw[i]) for i in range(self.n))
            least = (hi - lo) / sum(1 / (gw[i] * min(map(math.exp, fw[i].l)) + dw[i]) for i in range(self.n))
            if most - least < 1e-13 * most:
                j = most
                march(j)
            else:
                j = brentq(lambda x: march(x) - hi, least * (1 - 1e-9), most * (1 + 1e-9), xtol=1e-300, rtol=9e-16)
                march(j)
            q = j / (hi - lo)
        total = 0.0
        for i in range(self.n):
            own = self.g["oxygen"][i]
            fo = self.f["oxygen"][i]
            if own > 0:
                a, b = faces[i]
                if b - a < 1e-10:
                    own *= fo(0.5 * (a + b))
                elif not fo.none:
                    pts = sorted({a, b} | {k for k in list(fo.h) + list(fw[i].h) if a < k < b})
                    num = den = 0.0
                    for p, s in zip(pts, pts[1:]):
                        x = 0.5 * (s - p) * GX + 0.5 * (s + p)
                        w = 0.5 * (s - p) * GW
                        vw = np.exp(np.interp(x, fw[i].h, fw[i].l))
                        vo = np.exp(np.interp(x, fo.h, fo.l))
                        num += float(np.dot(w, vw / vo))
                        den += float(np.dot(w, vw))
                    own *= den / num
            total += 1 / (own + do[i])
        return q, 1 / total

    @staticmethod
    def invert(f, g, d, a, j):
        """h with g int_a^h f + d (h - a) = j, by pieces."""
        h = a
        left = j
        for k in [x for x in f.h if x > a] + [None]:
            if k is None:
                return h + left / (g * f(h) + d)
            full = g * f.integral(h, k) + d * (k - h)
            if full >= left:
                if d == 0:
                    i = bisect.bisect_right(f.h, h) - 1
                    s = 0.0 if i < 0 else (f.l[i + 1] - f.l[i]) / (f.h[i + 1] - f.h[i])
                    y = left / (g * f(h))
                    return h + (y if s == 0 else math.log1p(s * y) / s)
                return brentq(lambda x: g * f.integral(h, x) + d * (x - h) - left, h, k, xtol=1e-17, rtol=9e-16)
            left -= full
            h = k


class Pack:
    def __init__(self, pack, t):
        self.p, self.t = pack, t
        self.walls = [(w["area_m2"], Wall(w["layers"], t)) for w in pack["walls"]]
        s = pack.get("seal")
        if s:
            film = {"kind": "film", "thickness_um": s["width_mm"] * 1e3, "oxygen": s["oxygen"], "water": s["water"]}
            self.walls.append((s["sealant_thickness_um"] * 1e-6 * s["length_mm"] * 1e-3, Wall([film], t)))
        self.leak = {"oxygen": 0.0, "water": 0.0}
        l = pack.get("leaks")
        if l:
            T = t + 273.15
            d = l["diameter_um"] * 1e-6
            for gas, D in (("oxygen", 2.0e-5), ("water", 2.42e-5)):
                D *= (T / 293.15) ** 1.75
                self.leak[gas] = l["count"] * D / (R * T) * (math.pi * d * d / 4) / (l["length_mm"] * 1e-3 + math.pi * d / 4)

    def K(self, hout, hin):
        w = self.leak["water"]
        o = self.leak["oxygen"]
        for a, wall in self.walls:
            q, r = wall.solve(hout, hin)
            w += a * q
            o += a * r
        return w, o


def iso(d):
    if d["type"] == "linear":
        b, c = d["slope_g_per_g"], d["intercept_g_per_g"]
        return (lambda a: b * a + c), (lambda x: min(1.0, max(0.0, (x - c) / b)))
    m, C, k = d["Xm_g_per_g"], d["C"], d["K"]

    def X(a):
        return m * C * k * a / ((1 - k * a) * (1 - k * a + C * k * a))

    def A(x):
        # x (1-u)(1+(C-1)u) = m C u
        qa, qb, qc = x * (C - 1), m * C - x * (C - 2), -x
        u = (-qb + math.sqrt(qb * qb - 4 * qa * qc)) / (2 * qa) if abs(qa) > 1e-12 else -qc / qb
        return min(1.0, max(0.0, u / k))

    return X, A


ORDER = ["oxygen_uptake_mg_per_kg", "headspace_oxygen_percent", "moisture_max_g_per_g", "moisture_min_g_per_g"]


def storage(s, method="DOP853", rtol=1e-11, atol=1e-15, conditions=None):
    """`conditions` takes, for each limit reached, |d ln day / d ln value| there; infinite for a step between legs."""
    pack, food = s["pack"], s["food"]
    pt = s.get("total_pressure_Pa", ATM)
    V = pack.get("headspace_cm3", 0) * 1e-6
    mode = food["oxygen_mode"]
    km = food.get("rate_constant_mol_per_kg_s_Pa", 0) * food["mass_kg"]
    has = "isotherm" in food
    if has:
        Xof, aof = iso(food["isotherm"])
        X = food["initial_moisture_g_per_g"]
        dry = food["mass_kg"] / (1 + X)
    else:
        X, aof, dry = 0.0, (lambda x: food["inside_relative_humidity"]), 1.0
    legs, hold = s["route"]["legs"], s["route"]["after_last"] == "hold"
    horizon = s["horizon_days"]
    T0 = legs[0]["temperature_C"] + 273.15
    n = pack.get("starting_headspace_oxygen_percent", 0) / 100 * pt * V / (R * T0)
    cap = s.get("absorber_capacity_cm3_STP", 0) * STP
    took = min(n, cap)
    left = cap - took
    n -= took
    exhausted = 0.0 if cap > 0 and left == 0 else None
    u = 0.0
    if mode == "at_once":
        u, n = n, 0.0
    SC = max(cap, pt * V / (R * T0), 1e-4)
    lim = s["limits"]
    got = {}
    to_mg = MO * 1e6 / food["mass_kg"]
    days, out = s.get("report_days", []), {}
    t, i = 0.0, 0

    def values(y, leg):
        T = leg["temperature_C"] + 273.15
        return {
            "oxygen_uptake_mg_per_kg": y[2] * SC * to_mg,
            "headspace_oxygen_percent": 100 * y[1] * SC * R * T / V / pt if V > 0 else 0.0,
            "moisture_max_g_per_g": y[0],
            "moisture_min_g_per_g": y[0],
        }

    def past(name, v):
        return v <= lim[name] if name.endswith("min_g_per_g") else v >= lim[name]

    y = np.array([X, n / SC, u / SC, left / SC])
    while t < horizon * (1 - 1e-14):
        leg = legs[min(i, len(legs) - 1)] if hold else legs[i % len(legs)]
        end = horizon if hold and i >= len(legs) - 1 else min(horizon, t + leg["days"])
        pk = Pack(pack, leg["temperature_C"])
        T = leg["temperature_C"] + 273.15
        ps = psat(leg["temperature_C"])
        ho = leg["relative_humidity"]
        po = 0.2095 * (pt - ho * ps)
        v = values(y, leg)
        for name in lim:
            if name not in got and past(name, v[name]):
                got[name] = t
                if conditions is not None:
                    conditions[name] = math.inf if t > 0 else 0.0
        fixed = None if has else pk.K(ho, food["inside_relative_humidity"])

        def rhs(_t, y, absorbing):
            a = aof(y[0])
            kw, ko = fixed if fixed else pk.K(ho, a)
            dX = MW * kw * ps * (ho - a) / dry * DAY if has else 0.0
            dn = du = dl = 0.0
            if absorbing:
                dl = -ko * po
            elif mode == "at_once":
                du = ko * po
            elif mode == "none":
                dn = ko * (po - y[1] * SC * R * T / V) if V > 0 else 0.0
            elif V > 0:
                p = y[1] * SC * R * T / V
                du = km * p
                dn = ko * (po - p) - du
            else:
                du = km * ko * po / (ko + km)
            return [dX, dn * DAY / SC, du * DAY / SC, dl * DAY / SC]

        while t < end * (1 - 1e-14):
            absorbing = y[3] > 0
            names = [k for k in lim if k not in got]
            events = []
            for name in names:
                def ev(_t, y, _a, name=name):
                    return values(y, leg)[name] / lim[name] - 1
                events.append(ev)
            stop = lambda _t, y, _a: y[3]
            stop.terminal = True
            if absorbing:
                events.append(stop)
            sol = solve_ivp(rhs, (t, end), y, method=method, rtol=rtol, atol=atol, events=events or None,
                            dense_output=True, args=(absorbing,))
            assert sol.success, sol.message
            for k, (name, te) in enumerate(zip(names, sol.t_events or [])):
                if not len(te):
                    continue
                got[name] = float(te[0])
                if conditions is not None:
                    at = sol.y_events[k][0]
                    speed = rhs(te[0], at, absorbing)[{"o": 2, "h": 1, "m": 0}[name[0]]]
                    place = at[{"o": 2, "h": 1, "m": 0}[name[0]]]
                    conditions[name] = abs(place / (te[0] * speed)) if te[0] * speed != 0 else math.inf
            for d in days:
                if t < d <= sol.t[-1] and d not in out:
                    out[d] = (values(sol.sol(d), leg), sol.sol(d)[3])
            t, y = float(sol.t[-1]), sol.y[:, -1].copy()
            if absorbing and t < end * (1 - 1e-14):
                y[3] = 0.0
                exhausted = t
        t = end
        i += 1
    v = values(y, leg)
    res = {}
    for name in ORDER:
        if name not in lim:
            continue
        if name in got:
            res[name] = {"status": "reached", "days": got[name]}
            continue
        res[name] = {"status": "not reached", "value_at_horizon": float(v[name])}
        if hold:
            a = ho if has and pk.K(ho, aof(y[0]))[0] > 0 else aof(y[0])
            ko = pk.K(ho, a)[1]
            if name.startswith("moisture"):
                w = Xof(ho) if pk.K(ho, aof(y[0]))[0] > 0 else float(y[0])
            elif name.startswith("oxygen"):
                w = float(v[name]) if mode == "none" or ko == 0 else None
            else:
                pin = {"at_once": 0.0, "none": po, "rate": ko * po / (ko + km) if mode == "rate" else 0}[mode]
                w = 100 * pin / pt
            res[name]["settles_at"] = w
    first = min(got, key=lambda k: (got[k], ORDER.index(k))) if got else None
    ans = {"limits": res, "first_limit": first, "shelf_life_days": got[first] if first else None}
    if cap > 0:
        ans["absorber_exhausted_day"] = exhausted
    if days:
        c = {"days": days, "oxygen_uptake_mg_per_kg": [float(out[d][0][ORDER[0]]) for d in days]}
        if V > 0:
            c["headspace_oxygen_percent"] = [float(out[d][0][ORDER[1]]) for d in days]
        if has:
            c["moisture_g_per_g"] = [float(out[d][0][ORDER[2]]) for d in days]
        if cap > 0:
            c["absorber_left_cm3_STP"] = [float(out[d][1] * SC / STP) for d in days]
        ans["courses"] = c
    return ans


rnd = random.Random(20260714)


def gas(value, key, energy, curve=None, href=None):
    g = {key: value, "reference_temperature_C": rnd.choice([20, 23, 25]), "activation_energy_J_per_mol": energy}
    if curve:
        g["humidity_curve"] = {"relative_humidity": curve[0], "factor": curve[1]}
        g["reference_relative_humidity"] = href
    return g


P, Q = "permeability_mol_m_per_m2_s_Pa", "permeance_mol_per_m2_s_Pa"


def jig(x, s=0.3):
    return float(f"{x * math.exp(rnd.uniform(-s, s)):.4g}")


def film(name):
    def f(o, eo, w, ew, gauge, co=None, cw=None):
        return {"kind": "film", "name": name, "thickness_um": jig(gauge),
                "oxygen": gas(jig(o), P, eo, co, co and rnd.choice([0, 0.35, 0.6])),
                "water": gas(jig(w), P, ew, cw, cw and rnd.choice([0.1, 0.5]))}
    if name == "polyethylene":
        return f(9e-16, 41000, 4e-14, 34000, 50)
    if name == "polyester":
        return f(7e-18, 31000, 5e-14, 4000, 12)
    if name == "polypropylene":
        return f(2e-16, 47000, 1.1e-14, 42000, 20)
    if name == "vinyl alcohol":
        return f(5e-20, 52000, 1.2e-13, 25000, 6, ([0.05, 0.3, 0.6, 0.75, 0.95], [1, 0.8, 1.6, 4, 45]),
                 ([0, 0.5, 0.8, 0.97], [1, 1.9, 5, 16]))
    if name == "polyamide":
        return f(2.1e-18, 45000, 4e-13, 15000, 15, ([0, 0.5, 1], [1, 1.5, 4.5]), ([0, 0.5, 1], [1, 2.5, 9]))
    if name == "cellulose":
        return f(3e-18, 20000, 1.5e-12, 8000, 23, ([0.1, 0.45, 0.9], [1, 2, 60]), None)
    if name == "starch":
        return f(4e-17, 38000, 3e-13, 12000, 30, None, ([0.2, 0.6, 0.9], [1, 3, 11]))


def coat(curved, holed):
    c = {"kind": "coating", "name": "coating", "thickness_um": rnd.choice([0, 0.05, 0.5]),
         "oxygen": gas(jig(6e-14), Q, 30000, ([0.2, 0.6, 0.9], [1, 1.4, 5]) if curved else None, 0.4),
         "water": gas(jig(1.1e-11), Q, 20000, ([0.1, 0.7], [1, 3]) if curved else None, 0.3)}
    if holed:
        c["defects"] = {"density_per_m2": jig(3e6), "diameter_um": jig(4)}
    return c


def foil(holed):
    f = {"kind": "foil", "name": "foil", "thickness_um": jig(8)}
    if holed:
        f["defects"] = {"density_per_m2": jig(20000), "diameter_um": jig(60)}
    return f


def wall(kind):
    PE, PET, OPP, EV, PA, CE, ST = ("polyethylene", "polyester", "polypropylene", "vinyl alcohol", "polyamide",
                                    "cellulose", "starch")
    return {
        "evoh": lambda: [film(OPP), film(EV), film(PE)],
        "evoh turned": lambda: [film(PE), film(EV), film(OPP)],
        "two": lambda: [film(PA), film(PET), film(EV), film(PE)],
        "cellulose": lambda: [film(CE), film(PE)],
        "starch": lambda: [film(OPP), film(ST), film(CE), film(PE)],
        "coated": lambda: [film(PET), coat(False, False), film(PE)],
        "coated curved": lambda: [film(PA), coat(True, True), film(PE)],
        "coated holed": lambda: [film(PET), coat(False, True), film(EV), film(PE)],
        "foil": lambda: [film(PET), foil(False), film(PE)],
        "foil holed": lambda: [film(PA), foil(True), film(EV), film(PE)],
        "foil and coat": lambda: [film(PET), coat(True, True), film(PA), foil(True), film(PE)],
        "plain": lambda: [film(PET), film(PE)],
    }[kind]()


def leg(t=None, h=None, d=None):
    return {"temperature_C": t if t is not None else round(rnd.uniform(2, 38), 1),
            "relative_humidity": h if h is not None else round(rnd.uniform(0.15, 0.95), 2),
            "days": d if d is not None else round(rnd.uniform(5, 60), 1)}


def build(kinds, mode, isotherm, gain, after, legs, **more):
    pack = {"walls": [{"name": k, "area_m2": jig(0.05), "layers": wall(k)} for k in kinds]}
    if more.get("headspace", True):
        pack["headspace_cm3"] = jig(200)
        pack["starting_headspace_oxygen_percent"] = round(rnd.uniform(0.3, 3), 2)
    if more.get("seal"):
        pack["seal"] = {"sealant_thickness_um": jig(100), "length_mm": jig(600), "width_mm": jig(8),
                        "oxygen": film("polyethylene")["oxygen"], "water": film("polyamide")["water"]}
    if more.get("leaks"):
        pack["leaks"] = {"count": 2, "length_mm": jig(8), "diameter_um": jig(12)}
    food = {"mass_kg": jig(more.get("mass", 0.2)), "oxygen_mode": mode}
    if mode == "rate":
        food["rate_constant_mol_per_kg_s_Pa"] = jig(more.get("k", 1e-13), 1)
    lim = {}
    if isotherm:
        if isotherm == "GAB":
            food["isotherm"] = {"type": "GAB", "Xm_g_per_g": jig(0.06), "C": jig(12), "K": round(rnd.uniform(0.75, 0.95), 3)}
        else:
            food["isotherm"] = {"type": "linear", "slope_g_per_g": jig(0.17), "intercept_g_per_g": 0.012}
        X, _ = iso(food["isotherm"])
        a0, a1 = (rnd.uniform(0.05, 0.2), rnd.uniform(0.35, 0.5)) if gain else (rnd.uniform(0.8, 0.93), rnd.uniform(0.6, 0.7))
        food["initial_moisture_g_per_g"] = float(f"{X(a0):.4g}")
        lim["moisture_max_g_per_g" if gain else "moisture_min_g_per_g"] = float(f"{X(a1):.4g}")
    else:
        food["inside_relative_humidity"] = round(rnd.uniform(0.1, 0.9), 2)
    if mode != "none":
        lim["oxygen_uptake_mg_per_kg"] = jig(more.get("uptake", 40), 0.6)
    if mode != "at_once" and more.get("headspace", True):
        lim["headspace_oxygen_percent"] = round(rnd.uniform(4, 12), 1)
    s = {"pack": pack, "food": food, "route": {"legs": legs, "after_last": after}, "limits": lim,
         "horizon_days": more.get("horizon", 400), "report_days": [1.03, 33.37, 187.71]}
    if more.get("absorber"):
        s["absorber_capacity_cm3_STP"] = jig(more["absorber"])
    if more.get("pressure"):
        s["total_pressure_Pa"] = more["pressure"]
    return s


def main():
    cases = []

    def add(text, s, method="DOP853"):
        ident = f"S{len(cases) + 1:03d}"
        print(ident, text, file=sys.stderr, flush=True)
        cases.append({"id": ident, "section": "7", "description": text, "input": {"calculation": "storage", **s},
                      "expected": storage(s, method), "rtol": 1e-6})

    routes = lambda: [leg() for _ in range(rnd.randint(2, 4))]
    for kind in ("evoh", "evoh turned", "two", "cellulose", "starch", "coated curved", "coated holed", "foil holed", "foil and coat"):
        add(f"{kind}, at once, gain", build([kind], "at_once", "GAB", True, "hold", routes(), seal=kind == "two"))
    for kind in ("evoh", "two", "cellulose", "coated curved", "coated holed", "foil holed"):
        add(f"{kind}, does not react, loss", build([kind], "none", "GAB", False, "hold", routes(), leaks=kind == "evoh"))
    for kind in ("evoh", "two", "starch", "coated curved", "cellulose"):
        add(f"{kind}, reacts at a rate", build([kind], "rate", "linear", True, "hold", routes(), seal=kind == "starch"))
    for kind in ("evoh", "two", "coated curved"):
        add(f"{kind}, at a rate, no headspace", build([kind], "rate", "GAB", True, "hold", routes(), headspace=False))
    for kind in ("evoh", "cellulose"):
        add(f"{kind}, frozen legs, repeated",
            build([kind], "rate", "GAB", True, "repeat", [leg(-22, 0.9, 21.5), leg(-3, 0.8, 2.25), leg(5, 0.85, 6.5), leg(27, 0.6, 9.75)],
                  uptake=15, horizon=190.4))
    add("cold and frozen, does not react, repeated",
        build(["two"], "none", "linear", True, "repeat", [leg(-18, 0.95, 11.5), leg(12, 0.7, 17.25)], horizon=301.3))
    for kind, mode, size in (("evoh", "at_once", 12), ("two", "none", 8), ("cellulose", "rate", 15), ("evoh turned", "at_once", 1.5)):
        add(f"{kind}, absorber, {mode}", build([kind], mode, "GAB", True, "hold", routes(), absorber=size))
    add("tray and lid, seal and leaks", build(["evoh", "coated curved"], "rate", "GAB", True, "hold", routes(), seal=True, leaks=True))
    add("tray and lid, loss, at once", build(["two", "foil holed"], "at_once", "GAB", False, "hold", routes(), seal=True))
    add("tight foil, leaks alone", build(["foil"], "rate", "GAB", True, "hold", routes(), leaks=True))
    add("tight foil, nothing moves", build(["foil"], "at_once", "GAB", True, "hold", routes()))
    add("plain, inside held, absorber and rate", build(["plain"], "rate", None, True, "hold", routes(), absorber=9))
    add("humid wall, inside held", build(["two"], "none", None, True, "repeat", routes(), horizon=211.9))
    add("mountain air", build(["evoh"], "none", "linear", True, "hold", routes(), pressure=78000))
    add("small food, soon at rest", build(["evoh"], "at_once", "GAB", True, "hold", routes(), mass=0.01, uptake=400), "Radau")
    add("fast reaction", build(["evoh"], "rate", "GAB", True, "hold", routes(), k=3e-11), "Radau")
    json.dump({"title": "Cases worked by second-method.py", "atol_by_key": json.load(open(__file__.replace("second-method.py", "check-cases.json")))["atol_by_key"],
               "cases": cases}, sys.stdout, indent=1)


if __name__ == "__main__":
    main()
