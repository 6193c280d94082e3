"""Time lags of three-layer laminates by a finite-volume transient, sharing nothing with the closed form: Fick's second
law on a grid, integrated by scipy.integrate.solve_ivp (Radau) from empty until the flux is steady, the lag read from
the line that the amount passed comes to. Two grids are extrapolated (the scheme is of second order).
Writes laminate-lag.json.

    python3 test/reference/laminate-lag.py > test/reference/laminate-lag.json
"""
import json
import sys

import numpy as np
from scipy.integrate import solve_ivp
from scipy.sparse import diags

LAMINATES = [
    [(12e-6, 6.6e-18, 4e-13), (6e-6, 5e-20, 2e-15), (50e-6, 9.2e-16, 2e-11)],
    [(50e-6, 9.2e-16, 2e-11), (6e-6, 5e-20, 2e-15), (12e-6, 6.6e-18, 4e-13)],
    [(20e-6, 2e-16, 3e-13), (15e-6, 2.1e-18, 9e-14), (60e-6, 9.2e-16, 2e-11)],
    [(30e-6, 1e-16, 1e-12), (30e-6, 1e-16, 1e-12), (30e-6, 1e-16, 1e-12)],
    [(100e-6, 3e-17, 5e-14), (2e-6, 1e-20, 1e-15), (25e-6, 4e-16, 6e-12)],
]


def lag(layers, cells):
    """Pressure p on cells, S dp/dt = d/dx(P dp/dx); p = 1 outside, 0 inside."""
    width = np.concatenate([np.full(cells, l / cells) for l, _, _ in layers])
    perm = np.repeat([p for _, p, _ in layers], cells)
    hold = np.repeat([p / d for _, p, d in layers], cells) * width
    half = width / (2 * perm)
    g = np.concatenate([[1 / half[0]], 1 / (half[:-1] + half[1:]), [1 / half[-1]]])
    steady = 1 / (2 * half).sum()
    scale = sum(l * l / d for l, _, d in layers)
    n = len(width)
    main = -(g[:-1] + g[1:]) / hold * scale
    a = diags([g[1:-1] / hold[1:] * scale, main, g[1:-1] / hold[:-1] * scale], [-1, 0, 1]).tolil()
    a.resize((n + 1, n + 1))
    a[n, n - 1] = g[-1] / steady
    a = a.tocsc()
    b = np.zeros(n + 1)
    b[0] = g[0] / hold[0] * scale
    end = 8.0
    sol = solve_ivp(lambda t, y: a @ y + b, (0, end), np.zeros(n + 1), method="Radau", jac=a, rtol=1e-9, atol=1e-12)
    assert sol.success
    flux = g[-1] * sol.y[n - 1, -1] / steady
    assert abs(flux - 1) < 1e-8, flux
    return (end - sol.y[n, -1]) * scale


def main():
    cases = []
    for layers in LAMINATES:
        coarse, fine = lag(layers, 40), lag(layers, 80)
        best = fine + (fine - coarse) / 3
        print(layers, coarse, fine, best, file=sys.stderr)
        cases.append({
            "layers": [{"thickness_um": l * 1e6, "permeability_mol_m_per_m2_s_Pa": p, "diffusivity_m2_per_s": d}
                       for l, p, d in layers],
            "time_lag_s": float(f"{best:.10g}"),
        })
    json.dump({"title": "Time lags by laminate-lag.py: finite volumes, solve_ivp (Radau)", "cases": cases},
              sys.stdout, indent=1)
    print()


main()
