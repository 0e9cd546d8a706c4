"""One staged start of the demo crusher with SciPy's solve_ivp, to hold Sliprung's speed against.

Run by hand, with Debian's python3-scipy:

    time python3 src/test/python/one_start.py          one start, import included
    python3 src/test/python/one_start.py 20            that many, the fastest of them timed

The same equations as sliprung.runup: steady circuit, J dw/dt = Te - Tload, stage by stage; beside the
speed the states of the devices: fuse and inverse-time relay (dD/dt = 1/T(I)), overload and sections
(first order). Figures: configs/crusher.yaml, its circuit as Sliprung identifies it (review.json).
"""

import sys
import time

import numpy as np
from scipy.integrate import solve_ivp

R1, X1, XM = 0.0320675, 0.1821351, 4.844540
R2, X2, RATIO = 0.0296061, 0.1821499, 1.579283
VOLTS, HERTZ, POLE_PAIRS = 690.0, 50.0, 2
FAULT_MIN = 9000.0
SECTIONS = [0.1845, 0.0930, 0.0469, 0.0237, 0.0119]
AFTER = [4.2, 2.4, 1.4, 0.9, 0.7]
CLOSING = 0.06
INERTIA = 76.0
WS = 2 * np.pi * HERTZ / POLE_PAIRS
XS = VOLTS / np.sqrt(3) / FAULT_MIN


def circuit(ohms, w):
    """Stator and ring amperes and torque."""
    slip = (WS - w) / WS
    slip = slip if abs(slip) > 1e-12 else 1e-12
    y = (R2 + RATIO**2 * ohms) / slip
    z2 = complex(y, X2)
    parallel = 1j * XM * z2 / (z2 + 1j * XM)
    i1 = VOLTS / np.sqrt(3) / (complex(R1, X1 + XS) + parallel)
    i2 = i1 * 1j * XM / (z2 + 1j * XM)
    return abs(i1), RATIO * abs(i2), 3 * abs(i2) ** 2 * y / WS


def load(w):
    return np.interp(w / WS, [0.0, 0.3, 1.0], [250.0, 300.0, 450.0])


def very_inverse(amps):
    m = amps / 265.0
    return (m - 1.0) / (13.5 * 0.25) if m > 1.0 else 0.0


def rates(t, y, ohms, sections_in):
    stator, ring, torque = circuit(ohms, y[0])
    out = np.zeros_like(y)
    out[0] = (torque - load(y[0])) / INERTIA
    out[1] = stator**2
    out[2] = ring**2
    out[3] = very_inverse(stator)
    out[4] = ((stator / 208.0) ** 2 - y[4]) / 420.0
    for k in range(5):
        drive = (ring / (130.0 if k == 0 else 175.0)) ** 2 if k in sections_in else 0.0
        out[5 + k] = (drive - y[5 + k]) / 300.0
    return out


def start(tolerance):
    """Run-up time, stator and ring I2t at the last closing plus two seconds."""
    y = np.zeros(10)
    t = 0.0
    for step in range(6):
        sections = list(range(step, 5))
        ohms = sum(SECTIONS[k] for k in sections)
        end = t + (AFTER[step] + CLOSING if step < 5 else 2.0)
        solution = solve_ivp(
            rates, (t, end), y, method="DOP853", rtol=tolerance, atol=tolerance * 10,
            args=(ohms, sections))
        y, t = solution.y[:, -1], end
    return y


if __name__ == "__main__":
    repeats = int(sys.argv[1]) if len(sys.argv) > 1 else 1
    best = float("inf")
    for _ in range(repeats):
        begun = time.perf_counter()
        y = start(1e-10)
        best = min(best, time.perf_counter() - begun)
    print("speed %.6f rad/s, stator I2t %.2f A2s, ring I2t %.2f A2s, F3 %.5f" % (y[0], y[1], y[2], y[3]))
    print("%.1f ms a start" % (1e3 * best))
