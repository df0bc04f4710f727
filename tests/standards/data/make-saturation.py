"""Makes saturation.csv with Debian's python3-iapws, a general open library of the same formulation. Run by hand."""

import csv
import pathlib

from iapws import IAPWS97

ATMOSPHERE_BAR = 1.01325
with open(pathlib.Path(__file__).with_name("saturation.csv"), "w", newline="") as out:
    rows = csv.writer(out, lineterminator="\n")
    rows.writerow(["gauge_bar", "t_k", "v_f", "v_g", "h_f", "h_g"])
    for tenth in range(0, 205, 1):
        gauge = tenth / 10
        pressure = (gauge + ATMOSPHERE_BAR) / 10
        water, steam = IAPWS97(P=pressure, x=0), IAPWS97(P=pressure, x=1)
        rows.writerow([gauge, repr(water.T), repr(water.v), repr(steam.v), repr(water.h), repr(steam.h)])
