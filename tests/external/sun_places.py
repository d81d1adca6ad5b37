"""Makes sun_places.csv: the Sun's apparent place of date, geocentric, from 1970 to 2100, by astropy's transformations of
ERFA's built-in ephemeris (IAU 2000 and 2006; the IAU's SOFA routines epv00, ab, pnm06a).

    python -m pip install astropy
    python tests/external/sun_places.py > tests/external/sun_places.csv

Rows: every 97 days and a few hours, and in each decade the moment at which the Astronomical Almanac's low-precision
expression is farthest off, found on a grid of 18 hours. Columns: Unix seconds, right ascension and declination in degrees of
the true equator and equinox of date.
"""
import sys
import warnings

import numpy as np
from astropy.coordinates import TETE, get_body
from astropy.time import Time
from astropy.utils import iers

iers.conf.auto_download = False
iers.conf.auto_max_age = None
iers.conf.iers_degraded_accuracy = "ignore"
warnings.simplefilter("ignore")  # years of which nobody knows the leap seconds

END = 4_102_444_800
DECADE = END / 13


def place(unix):
    time = Time(unix, format="unix", scale="utc")
    sun = get_body("sun", time, ephemeris="builtin").transform_to(TETE(obstime=time))
    return sun.ra.deg, sun.dec.deg


def expression(unix):
    days = unix / 86_400 - 10_957.5
    anomaly = np.radians(357.528 + 0.9856003 * days)
    centre = 1.915 * np.sin(anomaly) + 0.020 * np.sin(2 * anomaly)
    longitude = np.radians(280.460 + 0.9856474 * days + centre)
    obliquity = np.radians(23.439 - 0.0000004 * days)
    east = np.cos(obliquity) * np.sin(longitude)
    return (
        np.degrees(np.arctan2(east, np.cos(longitude))) % 360,
        np.degrees(np.arcsin(np.sin(obliquity) * np.sin(longitude))),
    )


def apart(a, b):
    right_ascension = (a[0] - b[0] + 180) % 360 - 180
    return np.hypot(right_ascension * np.cos(np.radians(a[1])), a[1] - b[1])


def main():
    dense = np.arange(0, END, 64_800, dtype=float)
    off = np.concatenate([apart(place(part), expression(part)) for part in np.array_split(dense, 40)])
    print(f"farthest off: {off.max():.5f} degrees of {len(dense)} moments", file=sys.stderr)
    decade = (dense / DECADE).astype(int)
    worst = [dense[decade == d][off[decade == d].argmax()] for d in range(13)]
    moments = np.unique(np.concatenate([np.arange(0, END, 97 * 86_400 + 12_345, dtype=float), worst, [END - 1.0]]))
    for unix, right_ascension, declination in zip(moments, *place(moments)):
        print(f"{int(unix)},{right_ascension:.6f},{declination:.6f}")


main()
