#!/usr/bin/python3
"""Writes a grid of points computed by the general-purpose library fluids, as check values that Nappe runs through its method sheets: grid.py FILE.

One row is one point: the columns are those of src/main/resources/checks. The id starts with the name under which the largest difference is
stated. To add a device: one generator of rows, and its name in DEVICES.
"""
import csv
import math
import sys

import fluids
from fluids import flow_meter, open_flow

RHO, MU = 998.2, 0.001002
SOURCE = "general-purpose library fluids " + fluids.__version__


def steps(low, high, count):
    """Numbers from low to high in equal ratios."""
    return [low * (high / low) ** (i / (count - 1)) for i in range(count)]


def meter(D, beta, **more):
    """The entries of a pressure meter in a pipe."""
    return dict(T="293.15 K", D=f"{D!r} m", d=f"{beta * D!r} m", rho_t=f"{RHO!r} kg/m3", mu_t=f"{MU!r} Pa.s", **more)


def mass_flow(D, Re):
    return Re * math.pi * D * MU / 4


def solved(kind, D, beta, dp, taps=None):
    """The volume flow that the library finds for a difference of pressure."""
    m = flow_meter.differential_pressure_meter_solver(
        D=D, D2=beta * D, P1=1e6, P2=1e6 - dp, rho=RHO, mu=MU, k=1.3, meter_type=kind, taps=taps, epsilon_specified=1.0)
    return m / RHO


def orifice_coefficient():
    for taps in ("corner", "flange", "D and D/2"):
        for D in (0.05, 0.0711, 0.0712, 0.1, 0.2, 0.4, 0.7, 1.0):
            for beta in (0.26, 0.35, 0.45, 0.5, 0.55, 0.57, 0.62, 0.7, 0.75):
                least = max(5000, 170000 * beta**2 * D) if taps == "flange" else 5000 if beta <= 0.56 else 16000 * beta**2
                for Re in steps(1.001 * least, 9e7, 10):
                    C = flow_meter.C_Reader_Harris_Gallagher(D, beta * D, RHO, MU, mass_flow(D, Re), taps)
                    yield "orifice-plate", meter(D, beta, taps=f'"{taps}"', Re=repr(Re)), "C", C, "1"


def orifice_flow():
    for taps in ("corner", "flange", "D and D/2"):
        for D in (0.05, 0.09, 0.2, 0.6, 1.0):
            for beta in (0.3, 0.45, 0.6, 0.74):
                for dp in (2000, 9000, 40000, 240000):
                    yield "orifice-plate", meter(D, beta, taps=f'"{taps}"', p_g=f"{dp} Pa"), "Q_1", solved("ISO 5167 orifice", D, beta, dp, taps), "m3/s"


def nozzle_coefficient():
    forms = {
        "ISA 1932": (flow_meter.C_ISA_1932_nozzle, lambda beta: (7e4 if beta < 0.44 else 2e4, 1e7)),
        "long radius": (flow_meter.C_long_radius_nozzle, lambda beta: (1e4, 1e7)),
    }
    # the Venturi nozzle of this build has another coefficient than the standard (0.198 for 0.196) and is left out
    for word, (coefficient, ends) in forms.items():
        for D in (0.05, 0.08, 0.2, 0.35, 0.5):
            for beta in steps(0.3, 0.8, 14):
                least, greatest = ends(beta)
                for Re in steps(1.001 * least, 0.999 * greatest, 15):
                    C = coefficient(D, beta * D, RHO, MU, mass_flow(D, Re))
                    yield "flow-nozzle", meter(D, beta, nozzle=f'"{word}"', Re=repr(Re)), "C", C, "1"


def nozzle_flow():
    # each stays inside the range of Reynolds number, beyond which Nappe holds the coefficient
    kinds = {"ISA 1932": "ISA 1932 nozzle", "long radius": "long radius nozzle"}
    for word, kind in kinds.items():
        for D in (0.05, 0.2, 0.5):
            for beta in (0.45, 0.6, 0.78):
                for dp in (4000, 9000, 40000):
                    yield "flow-nozzle", meter(D, beta, nozzle=f'"{word}"', p_g=f"{dp} Pa"), "Q_1", solved(kind, D, beta, dp), "m3/s"


def venturi_flow():
    kinds = {
        "as cast": ("as cast convergent venturi tube", 0.1, 0.8, 0.3, 0.75),
        "machined": ("machined convergent venturi tube", 0.05, 0.25, 0.4, 0.75),
        "rough-welded sheet": ("rough welded convergent venturi tube", 0.2, 1.2, 0.4, 0.7),
    }
    for word, (kind, D_lo, D_hi, b_lo, b_hi) in kinds.items():
        for D in steps(D_lo, D_hi, 8):
            for beta in steps(b_lo, b_hi, 10):
                for dp in steps(3000, 240000, 9):
                    yield "venturi-tube", meter(D, beta, kind=f'"{word}"', p_g=f"{dp!r} Pa"), "Q_1", solved(kind, D, beta, dp), "m3/s"


def typed_coefficient_flow():
    for C in (0.6, 0.61, 0.95, 0.98, 0.99):
        for D in steps(0.05, 1.2, 7):
            for beta in steps(0.2, 0.8, 10):
                for dp in steps(500, 240000, 6):
                    # the library takes pressures at the taps and gives a mass flow
                    m = flow_meter.flow_meter_discharge(D, beta * D, 1e6 + dp, 1e6, RHO, C)
                    yield "pressure-meter", meter(D, beta, C=repr(C), p_g=f"{dp!r} Pa"), "Q_1", m / RHO, "m3/s"


def loss():
    for C in (0.58, 0.6, 0.62, 0.95, 0.98):
        for beta in steps(0.1, 0.8, 12):
            ratio = flow_meter.dP_orifice(0.2, beta * 0.2, 1.01e6, 1e6, C) / 1e4
            yield "pressure-meter", meter(0.2, beta, C=repr(C)), "xi", ratio, "1"
            yield "pressure-meter", meter(0.2, beta, C=repr(C)), "K_e", flow_meter.discharge_coefficient_to_K(0.2, beta * 0.2, C), "1"


def full_width(most, widths, heights, heads):
    """Width, crest height and head of weirs as wide as their channel, heads from 0.03 m up to a part of the crest height."""
    for b in steps(0.3, 6, widths):
        for p in steps(0.1, 1.5, heights):
            for h in steps(0.03, most * p, heads):
                yield b, p, h


def kindsvater_carter():
    # the library has a k_b of -1.0 mm, Nappe -0.9 mm; its formula for contracted weirs and its V-notches are wrong and left out
    for b, p, h in full_width(2.5, 13, 13, 12):
        typed = dict(set='"ISO 1438"', b=f"{b!r} m", B=f"{b!r} m", p=f"{p!r} m", h=f"{h!r} m")
        yield "rectangular-weir", typed, "Q_h", open_flow.Q_weir_rectangular_full_Kindsvater_Carter(h, p, b), "m3/s"


def rehbock():
    # the library has 0.0832 and 1.25 mm, Nappe 0.083 and 1.2 mm
    for b, p, h in full_width(1, 10, 10, 10):
        typed = dict(formula='"Rehbock, range of 1980"', b=f"{b!r} m", p=f"{p!r} m", h=f"{h!r} m")
        yield "full-width-weir", typed, "Q_h", open_flow.Q_weir_rectangular_full_Rehbock(h, p, b), "m3/s"


def ackers():
    for b, p, h in full_width(2.2, 10, 11, 10):
        typed = dict(formula='"Ackers 1978"', b=f"{b!r} m", p=f"{p!r} m", h=f"{h!r} m")
        yield "full-width-weir", typed, "Q_h", open_flow.Q_weir_rectangular_full_Ackers(h, p, b), "m3/s"


# one tuple a device: the name, its rows, the tolerance. A coefficient is closed; a flow is found by either side's iteration.
DEVICES = [
    ("orifice-coefficient", orifice_coefficient, "0.0000001 %"),
    ("orifice-flow", orifice_flow, "0.000001 %"),
    ("nozzle-coefficient", nozzle_coefficient, "0.0000001 %"),
    ("nozzle-flow", nozzle_flow, "0.000001 %"),
    ("venturi-flow", venturi_flow, "0.000001 %"),
    ("typed-coefficient-flow", typed_coefficient_flow, "0.0000001 %"),
    ("loss-of-plates", loss, "0.0000001 %"),
    ("full-width-kindsvater-carter", kindsvater_carter, "0.034 %"),
    ("full-width-rehbock", rehbock, "0.25 %"),
    ("full-width-ackers", ackers, "0.0001 %"),
]


def write(file):
    out = csv.writer(file, lineterminator="\n")
    out.writerow("id,method,entries,target,expected,unit,tolerance,source,kind,note".split(","))
    for name, rows, tolerance in DEVICES:
        for number, (method, entries, target, expected, unit) in enumerate(rows()):
            typed = "; ".join(f"{symbol} = {value}" for symbol, value in entries.items())
            out.writerow([f"{name} {number}", method, typed, target, repr(float(expected)), unit, tolerance, SOURCE, "library", ""])


if __name__ == "__main__":
    with open(sys.argv[1], "w", encoding="utf-8") as grid:
        write(grid)
