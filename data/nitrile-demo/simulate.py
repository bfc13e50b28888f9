#!/usr/bin/env python3
"""Writes experiments/*.csv of this demonstration: a simulated bench, with noise.

Nobody who uses the study needs to run it; it says what the data are. The truth behind them: the
first enzyme is lost in contact with the nitrile, and the acid inhibits it a little. Integrated by
the classical Runge-Kutta rule in steps of 0.01 min.
"""
import pathlib
import random

TRUTH = {"kcat1": 1.0, "Km1": 5.0, "Vmax2": 0.25, "Km2": 6.0, "Ki": 100.0, "kd": 3e-4}
ABSORBANCE = {"scale": 0.013, "offset": 0.12, "sd": 0.024}
TITRANT = {"scale": 2.1, "sd": 0.021}
AMIDE_SD = 0.8
TIMES = [2, 5, 10, 15, 20, 30, 45, 60, 90, 120, 180, 240]
STEP = 0.01
SEED = 1

# nitrile, amide, acid at the beginning; minute and size of a rise of the nitrile
RUNS = {
    "low-load": ((8, 0, 0), None),
    "high-load": ((60, 0, 0), None),
    "topped-up": ((20, 0, 0), (80, 30)),
    "amide-added": ((25, 25, 0), None),
}


def hydrolysis(amide):
    return TRUTH["Vmax2"] * amide / (TRUTH["Km2"] + amide)


def derivatives(y):
    nitrile, amide, acid, enzyme = y
    hydration = TRUTH["kcat1"] * enzyme * nitrile / (TRUTH["Km1"] + nitrile)
    hydration /= 1 + acid / TRUTH["Ki"]
    loss = TRUTH["kd"] * enzyme * nitrile
    return (-hydration, hydration - hydrolysis(amide), hydrolysis(amide), -loss)


def moved(y, slope, by):
    return tuple(value + by * change for value, change in zip(y, slope))


def step(y):
    a = derivatives(y)
    b = derivatives(moved(y, a, STEP / 2))
    c = derivatives(moved(y, b, STEP / 2))
    d = derivatives(moved(y, c, STEP))
    slope = [(p + 2 * q + 2 * r + s) / 6 for p, q, r, s in zip(a, b, c, d)]
    return moved(y, slope, STEP)


def rows(start, dose, noise):
    y = (*map(float, start), 1.0)
    for tick in range(1, round(TIMES[-1] / STEP) + 1):
        y = step(y)
        minute = tick * STEP
        if dose and tick == round(dose[0] / STEP):
            y = (y[0] + dose[1], *y[1:])
        if round(minute, 6) in TIMES:
            nitrile, amide, _, _ = y
            absorbance = ABSORBANCE["scale"] * nitrile + ABSORBANCE["offset"]
            titrant = TITRANT["scale"] * hydrolysis(amide)
            yield (round(minute),
                   amide + noise.gauss(0, AMIDE_SD),
                   absorbance + noise.gauss(0, ABSORBANCE["sd"]),
                   titrant + noise.gauss(0, TITRANT["sd"]))


def main():
    noise = random.Random(SEED)
    folder = pathlib.Path(__file__).parent / "experiments"
    for name, (start, dose) in RUNS.items():
        with open(folder / f"{name}.csv", "w", encoding="utf-8") as table:
            table.write("time,amide,absorbance,titrant\n")
            for minute, amide, absorbance, titrant in rows(start, dose, noise):
                table.write(f"{minute},{amide:.2f},{absorbance:.4f},{titrant:.4f}\n")


if __name__ == "__main__":
    main()
