"""The chain of the benchmark well in NumPy and pandas: what one would write for this one well instead of running DepthStress.

Needs python3-numpy, python3-pandas and, for --pictures, python3-matplotlib (names of the Debian packages).

    dotnet run -c Release --project tests/DepthStress.Benchmarks -- well /tmp/well 15000
    /usr/bin/python3 tests/DepthStress.Benchmarks/comparison/chain.py /tmp/well [--pictures] [--check DEPTH.CSV]

Writes depth.csv (the columns of the program's), layers.csv and with --pictures tracks.png into WELL/script. --check prints
the greatest relative difference of every column from a depth.csv of the program, and fails above half a printed digit.
Everything that the well file says is written into the code here. It checks no input, keeps no record and writes no LAS file.
"""

import argparse
import os

import numpy as np
import pandas as pd

G = 9.80665
MPSI = 6894757293.168361
DATUM, GROUND, WATER_TABLE = 312.4, 304.9, 18.0
ZONES = [
    # name, top md, Lacy's coefficients, Biot
    ("apricot shale", 900.0, (0.0428, 0.2334), 0.90),
    ("bracken sand", 1044.1, (0.0293, 0.4533), 0.79),
    ("cinder marl", 1366.0, (0.018, 0.422), 0.74),
    ("dapple shale", 1716.5, (0.0428, 0.2334), 0.85),
    ("elm limestone", 2285.0, (0.018, 0.422), 0.62),
    ("fern shale", 2687.5, (0.0428, 0.2334), 0.81),
]
CLEAN, SHALE = 28.0, 128.0
MATRIX, FLUID = 2660.0, 1030.0
ABOVE_LOG, PORE_FLUID = 2100.0, 1030.0
STRAIN_MIN, STRAIN_MAX = 150e-6, 400e-6
MAX_THICKNESS = 150.0
# column of the program without its unit, factor to the printed unit, decimals
UNITS = {
    "md_m": (1, 4), "tvd_m": (1, 4), "tvdss_m": (1, 4), "vp_m_s": (1, 1), "vs_m_s": (1, 1), "density_g_cm3": (1e-3, 4),
    "shale_volume": (1, 4), "porosity": (1, 4), "youngs_dynamic_gpa": (1e-9, 4), "poisson_dynamic": (1, 5),
    "youngs_static_gpa": (1e-9, 4), "poisson_static": (1, 5), "shear_static_gpa": (1e-9, 4), "bulk_static_gpa": (1e-9, 4),
    "lame_lambda_static_gpa": (1e-9, 4), "biot": (1, 5), "ucs_mpa": (1e-6, 4), "friction_angle_deg": (180 / np.pi, 3),
    "tensile_strength_mpa": (1e-6, 4), "sv_mpa": (1e-6, 4), "pp_mpa": (1e-6, 4), "shmin_mpa": (1e-6, 4), "shmax_mpa": (1e-6, 4),
    "sv_gradient_kpa_m": (1e-3, 4), "pp_gradient_kpa_m": (1e-3, 4), "shmin_gradient_kpa_m": (1e-3, 4),
    "shmax_gradient_kpa_m": (1e-3, 4), "pp_emw_g_cm3": (1e-3, 3), "shmin_emw_g_cm3": (1e-3, 3), "sv_emw_g_cm3": (1e-3, 3),
    "a_phi": (1, 5), "sv_unlogged_share": (1, 4),
}


def vertical_depth(survey, md):
    """Minimum curvature: the arc between two stations, at any depth along it."""
    s_md = survey["md_m"].to_numpy()
    inc = np.radians(survey["inclination_deg"].to_numpy())
    azi = np.radians(survey["azimuth_deg"].to_numpy())
    cosine = np.cos(inc[1:] - inc[:-1]) - np.sin(inc[:-1]) * np.sin(inc[1:]) * (1 - np.cos(azi[1:] - azi[:-1]))
    dogleg = np.arccos(np.clip(cosine, -1, 1))
    length = np.diff(s_md)
    bent = dogleg > 1e-6
    safe = np.where(bent, dogleg, 1)
    factor = np.where(bent, 2 / safe * np.tan(safe / 2), 1)
    s_tvd = s_md[0] + np.concatenate([[0], np.cumsum(length / 2 * (np.cos(inc[:-1]) + np.cos(inc[1:])) * factor)])

    k = np.clip(np.searchsorted(s_md, md, side="right") - 1, 0, len(length) - 1)
    along = md - s_md[k]
    b = dogleg[k] * along / length[k]
    bent = dogleg[k] > 1e-6
    whole, part = np.where(bent, dogleg[k], 1), np.where(bent & (b > 0), b, 1)
    down = np.where(bent, (np.sin(whole - b) * np.cos(inc[k]) + np.sin(b) * np.cos(inc[k + 1])) / np.sin(whole), np.cos(inc[k]))
    factor = np.where(bent & (b > 0), 2 / part * np.tan(part / 2), 1)
    return s_tvd[k] + along / 2 * (np.cos(inc[k]) + down) * factor


def compute(log, survey):
    """Every column of depth.csv in SI."""
    d = {}
    md = log["DEPT[m]"].to_numpy()
    vp = 0.3048e6 / log["DTC[us/ft]"].to_numpy()
    vs = 0.3048e6 / log["DTS[us/ft]"].to_numpy()
    density = 1000 * log["RHOB[g/cm3]"].to_numpy()
    tvd = vertical_depth(survey, md)
    zone = np.searchsorted([top for _, top, _, _ in ZONES], md, side="right") - 1

    shale_volume = np.clip((log["GR[gAPI]"].to_numpy() - CLEAN) / (SHALE - CLEAN), 0, 1)
    porosity = (MATRIX - density) / (MATRIX - FLUID)
    porosity[(porosity < 0) | (porosity > 1)] = np.nan

    p2, s2 = vp * vp, vs * vs
    nu = (p2 - 2 * s2) / (2 * (p2 - s2))
    dynamic = 2 * density * s2 * (1 + nu)
    a = np.array([law[0] for _, _, law, _ in ZONES])[zone]
    b = np.array([law[1] for _, _, law, _ in ZONES])[zone]
    biot = np.array([z[3] for z in ZONES])[zone]
    m = dynamic / MPSI
    e = (a * m + b) * m * MPSI
    ucs = 0.77e6 * (vp / 1000) ** 2.93
    friction = np.arcsin((vp - 1000) / (vp + 1000))

    ground = DATUM - GROUND
    above = ABOVE_LOG * G * (tvd[0] - ground)
    sv = above + np.concatenate([[0], np.cumsum(0.5 * (density[1:] + density[:-1]) * G * np.diff(tvd))])
    pp = np.maximum(0, PORE_FLUID * G * (tvd - ground - WATER_TABLE))
    uniaxial = nu / (1 - nu) * (sv - biot * pp) + biot * pp
    plane = e / (1 - nu * nu)
    shmin = uniaxial + plane * (STRAIN_MIN + nu * STRAIN_MAX)
    shmax = uniaxial + plane * (STRAIN_MAX + nu * STRAIN_MIN)

    d["md_m"], d["tvd_m"], d["tvdss_m"] = md, tvd, tvd - DATUM
    d["vp_m_s"], d["vs_m_s"], d["density_g_cm3"] = vp, vs, density
    d["shale_volume"], d["porosity"] = shale_volume, porosity
    d["youngs_dynamic_gpa"], d["poisson_dynamic"] = dynamic, nu
    d["youngs_static_gpa"], d["poisson_static"] = e, nu
    d["shear_static_gpa"] = e / (2 * (1 + nu))
    d["bulk_static_gpa"] = e / (3 * (1 - 2 * nu))
    d["lame_lambda_static_gpa"] = e * nu / ((1 + nu) * (1 - 2 * nu))
    d["biot"], d["ucs_mpa"], d["friction_angle_deg"], d["tensile_strength_mpa"] = biot, ucs, friction, 0.1 * ucs
    d["sv_mpa"], d["pp_mpa"], d["shmin_mpa"], d["shmax_mpa"] = sv, pp, shmin, shmax
    for name, stress in (("sv", sv), ("pp", pp), ("shmin", shmin), ("shmax", shmax)):
        d[name + "_gradient_kpa_m"] = stress / (tvd - ground)
    for name, stress in (("pp", pp), ("shmin", shmin), ("sv", sv)):
        d[name + "_emw_g_cm3"] = stress / (G * tvd)
    names = np.array(["normal", "strike-slip", "reverse"])
    order = np.where(shmax <= sv, 0, np.where(shmin < sv, 1, 2))
    d["regime"] = names[order]
    n = (shmin > sv).astype(int) + (shmax > sv)
    ranked = np.sort(np.stack([sv, shmin, shmax]), axis=0)
    phi = (ranked[1] - ranked[0]) / (ranked[2] - ranked[0])
    d["a_phi"] = n + 0.5 + np.where(n % 2 == 0, 1, -1) * (phi - 0.5)
    d["zone"] = np.array([name for name, _, _, _ in ZONES])[zone]
    d["lithology"] = ""
    for column in ("vp_origin", "vs_origin", "density_origin", "stress_basis"):
        d[column] = "measured"
    d["sv_unlogged_share"] = above / sv
    return d, zone


def layer_table(d, zone):
    """Zones in nearly equal parts no thicker than allowed, averaged over true vertical thickness."""
    tvd = d["tvd_m"]
    edges = np.concatenate([[tvd[0]], 0.5 * (tvd[1:] + tvd[:-1]), [tvd[-1]]])
    top, base = edges[:-1], edges[1:]
    starts = np.flatnonzero(np.diff(zone, prepend=-1))
    ends = np.append(starts[1:], len(zone))
    thickness = base[ends - 1] - top[starts]
    parts = np.ceil(thickness / MAX_THICKNESS)
    part = np.floor((0.5 * (top + base) - top[starts][zone]) / (thickness / parts)[zone])
    first = np.flatnonzero((np.diff(zone, prepend=-1) != 0) | (np.diff(part, prepend=-1) != 0))
    last = np.append(first[1:], len(zone)) - 1
    weight = base - top

    def mean(values):
        known = ~np.isnan(values)
        return np.add.reduceat(np.where(known, weight * values, 0), first) / np.add.reduceat(np.where(known, weight, 0), first)

    t = {"layer": np.arange(1, len(first) + 1), "zone": d["zone"][first]}
    t["top_tvd_m"], t["base_tvd_m"], t["samples"] = top[first], base[last], last - first + 1
    for name in ("density_g_cm3", "youngs_static_gpa", "poisson_static", "biot", "porosity", "shale_volume", "ucs_mpa",
                 "friction_angle_deg", "tensile_strength_mpa"):
        t[name] = mean(d[name]) * UNITS[name][0]
    for name in ("pp", "sv", "shmin", "shmax"):
        values, factor = d[name + "_mpa"], UNITS[name + "_mpa"][0]
        t[name + "_top_mpa"], t[name + "_base_mpa"], t[name + "_mean_mpa"] = values[first] * factor, values[last] * factor, mean(values) * factor
    t["shmin_contrast_above_mpa"] = np.append(np.nan, t["shmin_mean_mpa"][:-1] - t["shmin_mean_mpa"][1:])
    t["shmin_contrast_below_mpa"] = np.append(t["shmin_mean_mpa"][1:] - t["shmin_mean_mpa"][:-1], np.nan)
    return pd.DataFrame(t)


def draw(table, gamma_ray, path):
    """Depth tracks beside each other."""
    import matplotlib
    matplotlib.use("Agg")
    import matplotlib.pyplot as plt

    tracks = [
        ["shale_volume", "porosity"], ["vp_m_s", "vs_m_s"], ["density_g_cm3"], ["youngs_dynamic_gpa", "youngs_static_gpa"],
        ["poisson_static", "biot"], ["ucs_mpa"], ["friction_angle_deg"], ["sv_mpa", "pp_mpa", "shmin_mpa", "shmax_mpa"],
        ["pp_emw_g_cm3", "shmin_emw_g_cm3", "sv_emw_g_cm3"],
    ]
    figure, axes = plt.subplots(1, len(tracks) + 1, figsize=(2 * len(tracks) + 2, 12), sharey=True)
    depth = table["md_m"].to_numpy()
    axes[0].plot(gamma_ray, depth, lw=0.6, label="gamma ray gAPI")
    for axis, columns in zip(axes[1:], tracks):
        for column in columns:
            axis.plot(table[column].to_numpy(), depth, lw=0.6, label=column)
    for axis in axes:
        axis.legend(fontsize=6, loc="upper right")
        axis.grid(alpha=0.3)
        for _, top, _, _ in ZONES:
            axis.axhline(top, color="grey", lw=0.4)
    axes[0].set_ylim(depth[-1], depth[0])
    axes[0].set_ylabel("measured depth, m")
    figure.tight_layout()
    figure.savefig(path)


def check(table, path):
    """Greatest relative difference of every column from the program's; words must be equal."""
    theirs = pd.read_csv(path)
    good = list(theirs.columns) == list(table.columns) and len(theirs) == len(table)
    worst = 0.0
    for column in table.columns:
        if column not in UNITS:
            good &= bool((theirs[column].fillna("") == table[column]).all())
            continue
        a, b = table[column].to_numpy(), theirs[column].to_numpy()
        difference = np.abs(a - b)
        good &= bool((np.isnan(a) == np.isnan(b)).all())
        # Half a printed digit is the program's rounding; both sides also round in floating point.
        good &= bool(np.nanmax(difference) <= 0.5 * 10.0 ** -UNITS[column][1] + 1e-9 * np.nanmax(np.abs(a)))
        relative = np.nanmax(difference / np.nanmax(np.abs(a)))
        worst = max(worst, relative)
        print(f"{column:24} {relative:.1e}")
    print(f"greatest difference, relative to the column's greatest value: {worst:.1e}; within the printed digits: {'yes' if good else 'NO'}")
    return good


def main():
    parser = argparse.ArgumentParser()
    parser.add_argument("well", help="folder of twin.csv and twin-survey.csv")
    parser.add_argument("--pictures", action="store_true", help="draw depth tracks")
    parser.add_argument("--check", metavar="DEPTH.CSV", help="compare with the program's result")
    options = parser.parse_args()
    log = pd.read_csv(os.path.join(options.well, "twin.csv"))
    survey = pd.read_csv(os.path.join(options.well, "twin-survey.csv"))
    values, zone = compute(log, survey)
    layers = layer_table(values, zone)
    table = pd.DataFrame({name: v * UNITS[name][0] if name in UNITS else v for name, v in values.items()})
    out = os.path.join(options.well, "script")
    os.makedirs(out, exist_ok=True)
    table.round({name: decimals for name, (_, decimals) in UNITS.items()}).to_csv(os.path.join(out, "depth.csv"), index=False)
    layers.round(4).to_csv(os.path.join(out, "layers.csv"), index=False)
    if options.pictures:
        draw(table, log["GR[gAPI]"].to_numpy(), os.path.join(out, "tracks.png"))
    return 0 if not options.check or check(table, options.check) else 1


if __name__ == "__main__":
    raise SystemExit(main())
