#!/usr/bin/env python3
"""Writes annular_mtf.csv: the contrast of an annular aperture by numerical integration of the area that two rings share,
line by line, without the closed form. Needs mpmath."""

from mpmath import mp, mpf, pi, quad, sqrt

mp.dps = 20


def half(radius, y):
    """Half the chord of a circle at height y."""
    return sqrt(radius**2 - y**2) if y < radius else mpf(0)


def intervals(centre, e, y):
    """Where the line at height y lies in the ring."""
    outer, inner = half(1, y), half(e, y)
    return [(centre - outer, centre - inner), (centre + inner, centre + outer)]


def length(s, e, y):
    return sum(
        max(mpf(0), min(b, d) - max(a, c))
        for a, b in intervals(-s / 2, e, y)
        for c, d in intervals(s / 2, e, y)
    )


def contrast(v, e):
    s = 2 * v
    corners = {mpf(0), e, mpf(1)}
    for p in (1, e):
        for q in (1, e):
            # Two circles meet where p^2 - q^2 = 2 s x, x from the middle.
            x = (p**2 - q**2) / (2 * s) + s / 2
            if p**2 > x**2:
                corners.add(sqrt(p**2 - x**2))
    area = 2 * quad(lambda y: length(s, e, y), sorted(corners))
    return area / (pi * (1 - e**2))


with open(__file__.replace(".py", ".csv"), "w") as table:
    table.write("frequency,obstruction,contrast\n")
    for e in ("0.125", "0.25", "0.34375", "0.5", "0.75", "0.9375", "0.9990234375"):
        for v in ("0.0625", "0.125", "0.25", "0.375", "0.5", "0.625", "0.75", "0.875", "0.96875"):
            table.write(f"{v},{e},{mp.nstr(contrast(mpf(v), mpf(e)), 14)}\n")
