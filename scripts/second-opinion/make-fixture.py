"""Writes fixtures/second-opinion/fluids.json: friction factors and loss coefficients as the open package fluids has them.

Debian: apt-get install python3-fluids; then /usr/bin/python3 scripts/second-opinion/make-fixture.py
Run by hand, when a formula is added; the tests read the file and never this script.
"""

import json
import math
import pathlib
import platform

import fluids
from fluids import fittings
from fluids.friction import Clamond, Colebrook, friction_factor

OUT = pathlib.Path(__file__).resolve().parents[2] / "fixtures" / "second-opinion" / "fluids.json"
DIAMETER = 0.3  # m; the formulas see ratios only


def geometric(low, high, count):
    return [low * (high / low) ** (i / (count - 1)) for i in range(count)]


def short(value, digits):
    """The shortest number that rounds to so many digits."""
    return float(f"{value:.{digits}g}")


def friction():
    reynolds = sorted({short(Re, 4) for Re in geometric(1, 1e8, 98)} | {2000.0, 4000.0, 4001.0})
    roughness = [0.0] + [short(e, 3) for e in geometric(1e-7, 0.05, 33)]
    rows, worst = [], 0.0
    for Re in reynolds:
        for eD in roughness if Re > 2000 else roughness[::8]:
            if Re < 2000:
                f = friction_factor(Re=Re, eD=eD)
            else:
                # By its root search: its closed form loses five digits where eD Re is great.
                f = Colebrook(Re=Re, eD=eD, tol=1e-15)
                worst = max(worst, abs(Clamond(Re, eD) / f - 1))
            rows.append([Re, eD, short(f, 15)])
    if worst > 1e-14:
        raise SystemExit(f"Colebrook and Clamond of the package differ by {worst}")
    return {"columns": ["Re", "eps_over_D", "f"], "rows": rows}


def table(columns, rows):
    return {"columns": columns, "rows": [[*row[:-1], short(float(row[-1]), 12)] for row in rows]}


def bends():
    radii = [0.5, 0.6, 0.75, 1.0, 1.5, 2.0, 3.0, 5.0, 10.0]
    rennels = [
        [a, r, f, fittings.bend_rounded(Di=DIAMETER, rc=r * DIAMETER, angle=a, fd=f, method="Rennels")]
        for a in [5, 15, 30, 45, 60, 75, 90, 120, 150, 180]
        for r in radii
        for f in [0.012, 0.03]
    ]
    # Below Re (D/r)^2 = 360 the package changes over to the friction of a curved pipe.
    ito = [
        [a, r, Re, fittings.bend_rounded_Ito(Di=DIAMETER, rc=r * DIAMETER, angle=a, Re=Re)]
        for a in [45, 60, 90, 110, 135, 180]
        for r in radii
        for Re in [4e4, 2e5, 1e6]
        if Re / r**2 > 370
    ]
    miller = [
        [a, r, Re, eps, fittings.bend_rounded_Miller(Di=1.0, rc=r, angle=a, Re=Re, roughness=eps)]
        for a in [20, 30, 45, 65, 90, 110, 135, 180]
        for r in [0.75, 1.0, 1.2, 1.5, 1.7, 2.0, 2.5, 3.5, 4.0]
        for Re, eps in [(2e4, 0.0), (7e4, 3e-4), (3e5, 3e-4), (9e5, 1e-3)]
    ]
    return {
        "bend-rennels": table(["angle", "r_over_D", "f", "K"], rennels),
        "bend-ito": table(["angle", "r_over_D", "Re", "K"], ito),
        "bend-miller": table(["angle", "r_over_D", "Re", "eps_over_D", "K"], miller),
        "mitre-rennels": table(["angle", "K"], [[a, fittings.bend_miter(a, method="Rennels")] for a in range(0, 121, 5)]),
    }


def area_changes():
    areas = [0.02, 0.05, 0.1, 0.2, 0.24, 0.26, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.98]
    angles = [3, 5, 10, 15, 20, 21, 30, 40, 50, 60, 61, 75, 90, 120, 150, 180]

    def narrowing(angle, area, method, **more):
        return fittings.contraction_conical(Di1=1.0, Di2=math.sqrt(area), angle=angle, method=method, **more)

    def widening(angle, area, method, **more):
        return fittings.diffuser_conical(Di1=math.sqrt(area), Di2=1.0, angle=angle, method=method, **more)

    # The table itself, without the friction that the package adds from another table.
    cones = [
        [angle, area, fittings.diffuser_conical_Idelchik_obj(area, angle)]
        for angle in [3, 6, 8, 10, 11, 12, 14, 16, 18, 20, 24, 30, 35, 40, 60, 90, 180]
        for area in [0.05, 0.075, 0.1, 0.15, 0.2, 0.25, 0.3, 0.35, 0.4, 0.5, 0.6]
    ]
    return {
        "sudden-expansion": table(
            ["area_ratio", "K"], [[a, fittings.diffuser_sharp(Di1=math.sqrt(a), Di2=1.0, method="Rennels")] for a in areas]
        ),
        "sudden-contraction-rennels": table(
            ["area_ratio", "K"], [[a, fittings.contraction_sharp(Di1=1.0, Di2=math.sqrt(a), method="Rennels")] for a in areas]
        ),
        "gradual-expansion-rennels": table(
            ["angle", "area_ratio", "f", "K"],
            [[d, a, f, widening(d, a, "Rennels", fd=f)] for d in angles for a in areas for f in [0.018]],
        ),
        "gradual-expansion-idelchik-table": table(["angle", "area_ratio", "K"], cones),
        "gradual-contraction-rennels": table(
            ["angle", "area_ratio", "f", "K"],
            [[d, a, f, narrowing(d, a, "Rennels", fd=f)] for d in angles for a in areas for f in [0.018]],
        ),
        "gradual-contraction-idelchik": table(
            ["angle", "area_ratio", "K"],
            [[d, a, narrowing(d, a, "Idelchik")] for d in [20, 30, 40, 60, 90, 120, 150, 180] for a in [0.1, 0.25, 0.4, 0.64]],
        ),
    }


def entries():
    radii = [0.0, 0.005, 0.01, 0.02, 0.03, 0.04, 0.05, 0.06, 0.07, 0.08, 0.1, 0.12, 0.14, 0.16, 0.18, 0.2]

    def rounded(ratio, method):
        return fittings.entrance_rounded(Di=DIAMETER, rc=ratio * DIAMETER, method=method)

    return {
        "entry-rounded-rennels": table(["r_over_D", "K"], [[r, rounded(r, "Rennels")] for r in [*radii, 0.3, 0.5, 0.75, 1.0]]),
        "entry-rounded-idelchik": table(["r_over_D", "K"], [[r, rounded(r, "Idelchik")] for r in radii]),
        "entry-angled-idelchik": table(["angle", "K"], [[a, fittings.entrance_angled(a)] for a in range(20, 91, 5)]),
        "entry-projecting-idelchik": table(
            ["t_over_D", "l_over_D", "K"],
            [
                [t, l, fittings.entrance_distance(Di=1.0, t=t, l=l, method="Idelchik")]
                for t in [0.0, 0.02, 0.05]
                for l in [0.0, 0.002, 0.01, 0.05, 0.2, 0.5, 1.0]
            ],
        ),
        "entry-sharp": table(["K"], [[fittings.entrance_sharp(method="Idelchik")]]),
    }


def junctions():
    flows = [0.05, 0.1, 0.2, 0.3, 0.38, 0.5, 0.57, 0.7, 0.85, 0.95]
    # Clear of the printed limits of 0.35 and 0.4, which the product passes smoothly.
    areas = [0.1, 0.2, 0.3, 0.34, 0.45, 0.55, 0.7, 0.85, 1.0]

    def rows(function, angles):
        return [
            [angle, q, a, function(D_run=1.0, D_branch=math.sqrt(a), Q_run=1 - q, Q_branch=q, angle=angle)]
            for angle in angles
            for q in flows
            for a in areas
        ]

    columns = ["angle", "Qb_over_Qc", "Ab_over_Ac", "K"]
    return {
        "converging-branch-crane": table(columns, rows(fittings.K_branch_converging_Crane, [30, 40, 45, 60, 75, 90])),
        "converging-straight-crane": table(columns, rows(fittings.K_run_converging_Crane, [30, 45, 50, 60, 90])),
        "diverging-branch-crane": table(columns, rows(fittings.K_branch_diverging_Crane, [30, 45, 60, 90])),
        "diverging-straight-crane": table(columns, rows(fittings.K_run_diverging_Crane, [45])),
    }


def text(document):
    """JSON with one row of a table on each line."""
    lines = json.dumps(document, indent="\t")
    plain = json.loads(lines)

    def write(value, depth):
        pad = "\t" * depth
        if isinstance(value, dict):
            inner = [f"{pad}\t{json.dumps(key)}: {write(one, depth + 1)}" for key, one in value.items()]
            return "{\n" + ",\n".join(inner) + f"\n{pad}}}"
        if isinstance(value, list) and value and isinstance(value[0], list):
            return "[\n" + ",\n".join(f"{pad}\t{json.dumps(row)}" for row in value) + f"\n{pad}]"
        return json.dumps(value)

    return write(plain, 0) + "\n"


coefficients = {**bends(), **area_changes(), **entries(), **junctions()}
document = {
    "package": f"fluids {fluids.__version__}",
    "python": platform.python_version(),
    "script": "scripts/second-opinion/make-fixture.py",
    "friction": friction(),
    "coefficients": coefficients,
}
OUT.write_text(text(document), encoding="utf-8")
count = sum(len(one["rows"]) for one in coefficients.values())
print(f"{OUT.name}: {len(document['friction']['rows'])} friction factors, {count} coefficients, {OUT.stat().st_size} bytes")
