#!/usr/bin/env python3
"""Reference values for the barrier analysis, by general libraries only.

Usage: python3 reference.py TABLES_FOLDER OUT_FOLDER

Reads tables.csv, uncertainties.csv, fieller.csv and the tables they name; writes one JSON file per table, grid.json and
fieller.json. Three programs compute the same quantities from the same text:

* the arbiter: weighted normal equations with mpmath at 60 decimal digits, inputs taken as exact decimals;
* SciPy: least squares in double precision, columns scaled, two steps of refinement with extended-precision residuals;
* R: reference.R beside this file, function lm (left out when Rscript is not on the path).

The JSON files hold the arbiter's values with 20 digits and to how many digits SciPy and R agree with them.
Formulas: least squares on ln k (Draper and Smith, Applied Regression Analysis); Arrhenius, Eyring and modified Arrhenius
equations (IUPAC Gold Book); AIC and BIC as R's AIC() and BIC() define them, AICc after Hurvich and Tsai, Biometrika 76
(1989) 297; Fieller, J. R. Stat. Soc. B 16 (1954) 175.
"""
import csv
import json
import math
import platform
import re
import shutil
import subprocess
import sys
from fractions import Fraction
from pathlib import Path

import mpmath
import numpy as np
import scipy
from mpmath import mp, mpf
from scipy import linalg, optimize, special, stats

mp.dps = 60
LEVEL = Fraction(95, 100)
BOLTZMANN = "1.380649e-23"
PLANCK = "6.62607015e-34"
AVOGADRO = "6.02214076e23"
REFERENCE_KELVIN = "298.15"
STANDARDS = {"1 mol/L": ("concentration", "1000"), "1 bar": ("pressure", "100000")}
MODELS = {
    "arrhenius": ["lnA", "Ea"],
    "eyring": ["dS", "dH"],
    "modified-arrhenius": ["lnA", "n", "E"],
}


class Exact:
    """Arithmetic of the arbiter."""

    name = "arbiter"
    log, exp, sqrt = staticmethod(mpmath.log), staticmethod(mpmath.exp), staticmethod(mpmath.sqrt)

    @staticmethod
    def number(text):
        fraction = Fraction(text)
        return mpf(fraction.numerator) / mpf(fraction.denominator)

    @staticmethod
    def least_squares(rows, y, w):
        p = len(rows[0])
        normal, right = mp.matrix(p, p), mp.matrix(p, 1)
        for row, value, weight in zip(rows, y, w):
            for i in range(p):
                right[i] += weight * row[i] * value
                for j in range(p):
                    normal[i, j] += weight * row[i] * row[j]
        inverse = normal ** -1
        solution = inverse * right
        return list(solution), [[inverse[i, j] for j in range(p)] for i in range(p)]

    @staticmethod
    def t_quantile(dof):
        start = mpf(float(stats.t.ppf(float((1 + LEVEL) / 2), dof)))
        tail = mpf((1 - LEVEL).numerator) / mpf((1 - LEVEL).denominator) / 2
        half = mpf(1) / 2

        def excess(t):
            return half * mpmath.betainc(mpf(dof) / 2, half, 0, dof / (dof + t * t), regularized=True) - tail

        return mpmath.findroot(excess, start)

    @staticmethod
    def normal_quantile():
        return mpmath.sqrt(2) * mpmath.erfinv(mpf(LEVEL.numerator) / mpf(LEVEL.denominator))

    @staticmethod
    def chi_squared_tail(x, dof):
        return mpmath.gammainc(mpf(dof) / 2, x / 2, mpmath.inf, regularized=True)


class Double:
    """The same in double precision with NumPy and SciPy."""

    name = "scipy"
    log, exp, sqrt = staticmethod(math.log), staticmethod(math.exp), staticmethod(math.sqrt)

    @staticmethod
    def number(text):
        return float(Fraction(text))

    @staticmethod
    def least_squares(rows, y, w):
        root = np.sqrt(np.array(w, dtype=float))
        design = np.array(rows, dtype=float) * root[:, None]
        target = np.array(y, dtype=float) * root
        scale = np.linalg.norm(design, axis=0)
        scaled = design / scale
        solution = linalg.lstsq(scaled, target)[0]
        for _ in range(2):
            residual = target.astype(np.longdouble) - scaled.astype(np.longdouble) @ solution.astype(np.longdouble)
            solution = solution + linalg.lstsq(scaled, residual.astype(float))[0]
        triangle = linalg.qr(scaled, mode="economic")[1]
        inverse = linalg.solve_triangular(triangle, np.eye(len(scale)))
        covariance = (inverse @ inverse.T) / np.outer(scale, scale)
        return list(map(float, solution / scale)), covariance.tolist()

    @staticmethod
    def t_quantile(dof):
        return float(stats.t.ppf(float((1 + LEVEL) / 2), dof))

    @staticmethod
    def normal_quantile():
        return float(stats.norm.ppf(float((1 + LEVEL) / 2)))

    @staticmethod
    def chi_squared_tail(x, dof):
        return float(special.gammaincc(dof / 2, x / 2))


def row_and_offset(engine, model, kelvin, order, standard):
    """Design row and offset: ln(k in SI) = offset + row . parameters."""
    number, log = engine.number, engine.log
    gas = number(BOLTZMANN) * number(AVOGADRO)
    if model == "arrhenius":
        return [number("1"), -1 / (gas * kelvin)], number("0")
    if model == "modified-arrhenius":
        return [number("1"), log(kelvin / number(REFERENCE_KELVIN)), -1 / (gas * kelvin)], number("0")
    kind, value = STANDARDS[standard]
    offset = log(number(BOLTZMANN) * kelvin / number(PLANCK))
    if kind == "concentration":
        offset += (1 - order) * log(number(value))
    else:
        offset += (order - 1) * log(gas * kelvin / number(value))
    return [1 / gas, -1 / (gas * kelvin)], offset


def fit(engine, table, model, error_model, standard):
    """Everything about one fit, as flat key -> number; None when the data leave no degree of freedom."""
    number, log, exp, sqrt = engine.number, engine.log, engine.exp, engine.sqrt
    factor, order = number(table["factor"]), table["order"]
    kelvins = [number(text) for text in table["kelvin"]]
    lnk = [log(number(text) * factor) for text in table["rate"]]
    stated = error_model == "stated"
    w = [1 / (number(text) / 100) ** 2 if stated else number("1") for text in table["percent"]]
    built = [row_and_offset(engine, model, kelvin, order, standard) for kelvin in kelvins]
    rows = [row for row, _ in built]
    y = [value - offset for value, (_, offset) in zip(lnk, built)]
    n, p = len(rows), len(rows[0])
    dof = n - p
    if dof < 1:
        return None
    solution, cofactor = engine.least_squares(rows, y, w)
    rss = sum(weight * (value - dot(row, solution)) ** 2 for row, value, weight in zip(rows, y, w))
    variance = number("1") if stated else rss / dof
    quantile = engine.normal_quantile() if stated else engine.t_quantile(dof)
    covariance = [[variance * cofactor[i][j] for j in range(p)] for i in range(p)]
    out = {}
    for i, symbol in enumerate(MODELS[model]):
        value, u = solution[i], sqrt(covariance[i][i])
        if symbol == "lnA":
            value = value - log(factor)
            out["parameter.A"], out["uncertainty.lnA"] = exp(value), u
            out["limit.A.lower"], out["limit.A.upper"] = exp(value - quantile * u), exp(value + quantile * u)
        else:
            out["limit." + symbol + ".lower"], out["limit." + symbol + ".upper"] = value - quantile * u, value + quantile * u
            out["uncertainty." + symbol] = u
        out["parameter." + symbol] = value
    for i, first in enumerate(MODELS[model]):
        for j, second in enumerate(MODELS[model]):
            if j >= i:
                out["covariance." + first + "." + second] = covariance[i][j]
    k_count = p if stated else p + 1
    deviance = rss if stated else n * (log(2 * pi(engine) * rss / n) + 1)
    out["statistic.bic"] = deviance + k_count * log(number(str(n)))
    if n > k_count + 1:
        out["statistic.aicc"] = deviance + 2 * k_count + number(str(2 * k_count * (k_count + 1))) / (n - k_count - 1)
    if stated:
        out["statistic.chiSquared"] = rss
        out["statistic.pValue"] = engine.chi_squared_tail(rss, dof)
    else:
        out["statistic.rss"], out["statistic.s"] = rss, sqrt(variance)
    centre = sum(w) / sum(weight / kelvin for weight, kelvin in zip(w, kelvins))
    out["centre.kelvin"] = centre
    if model == "eyring":
        out["centre.dG"] = solution[1] - centre * solution[0]
        out["centre.dG.uncertainty"] = sqrt(
            covariance[1][1] + centre ** 2 * covariance[0][0] - 2 * centre * covariance[0][1]
        )
    for text in table["targets"]:
        kelvin = number(text)
        row, offset = row_and_offset(engine, model, kelvin, order, standard)
        mean = offset + dot(row, solution) - log(factor)
        u = sqrt(sum(row[i] * covariance[i][j] * row[j] for i in range(p) for j in range(p)))
        key = "prediction." + text + "."
        out[key + "k"], out[key + "uncertaintyLn"] = exp(mean), u
        out[key + "lower"], out[key + "upper"] = exp(mean - quantile * u), exp(mean + quantile * u)
        # One more run scatters like the others: by s, or by the root mean square of the stated uncertainties.
        own = sum(1 / weight for weight in w) / n if stated else variance
        wide = sqrt(u * u + own)
        out[key + "newLower"], out[key + "newUpper"] = exp(mean - quantile * wide), exp(mean + quantile * wide)
    return out


def pi(engine):
    return mp.pi if engine is Exact else math.pi


def dot(row, solution):
    return sum(a * b for a, b in zip(row, solution))


def fieller_exact(case):
    """Roots of (a - theta b)^2 = q^2 (v11 - 2 theta v12 + theta^2 v22), the limits of the set, and its shape."""
    a, b, v11, v12, v22 = (Exact.number(case[name]) for name in ("a", "b", "v11", "v12", "v22"))
    dof = case["degrees_of_freedom"]
    q2 = (Exact.t_quantile(int(dof)) if dof else Exact.normal_quantile()) ** 2
    square, half, free = b * b - q2 * v22, q2 * v12 - a * b, a * a - q2 * v11
    discriminant = half * half - square * free
    out = {"ratio": a / b}
    if discriminant < 0:
        return "everything", out
    roots = sorted([(-half - mpmath.sqrt(discriminant)) / square, (-half + mpmath.sqrt(discriminant)) / square])
    out["limit.lower"], out["limit.upper"] = roots
    return ("between" if square > 0 else "outside"), out


def above_zero(kind, out):
    """The part of the set above 0 K: its kind and its limits."""
    if kind == "everything":
        return "everything", None, None
    low, high = out["limit.lower"], out["limit.upper"]
    if kind == "between":
        return ("none", None, None) if high <= 0 else ("between", max(low, mpf(0)), high)
    if high <= 0:
        return "everything", None, None
    return ("outside", low, high) if low > 0 else ("atLeast", high, None)


def fieller_scipy(case, roots):
    """The limits again, by root finding on the membership function (Brent), from brackets that hold one root each."""
    a, b, v11, v12, v22 = (float(case[name]) for name in ("a", "b", "v11", "v12", "v22"))
    dof = case["degrees_of_freedom"]
    q = Double.t_quantile(int(dof)) if dof else Double.normal_quantile()

    def excess(theta):
        return (a - theta * b) ** 2 / (v11 - 2 * theta * v12 + theta ** 2 * v22) - q * q

    out = {"ratio": a / b}
    for name, root in roots.items():
        if name != "ratio":
            near = float(root)
            step = 1e-3 * abs(near)
            out[name] = optimize.brentq(excess, near - step, near + step, xtol=1e-300, rtol=1e-15, maxiter=500)
    return out


def read_tables(folder):
    percents = {}
    with open(folder / "uncertainties.csv", encoding="utf-8") as lines:
        for row in csv.DictReader(lines):
            percents.setdefault(row["name"], []).append(row["relative_standard_uncertainty_percent"])
    with open(folder / "tables.csv", encoding="utf-8") as lines:
        definitions = list(csv.DictReader(lines))
    for row in definitions:
        with open(folder / (row["name"] + ".csv"), encoding="utf-8") as lines:
            cells = [line for line in csv.reader(lines)][1:]
        shift = Fraction("273.15") if row["temperature_unit"] == "degC" else Fraction(0)
        yield {
            "name": row["name"],
            "rateUnit": row["rate_unit"],
            "temperatureUnit": row["temperature_unit"],
            "factor": row["rate_factor_to_si"],
            "order": int(row["order"]),
            "standards": row["standard"].split(";"),
            "kelvin": [str(Fraction(cell[0]) + shift) for cell in cells],
            "rate": [cell[1] for cell in cells],
            "percent": percents[row["name"]],
            "targets": row["targets_K"].split(";"),
        }


def agreement(reference, other):
    """Digits to which another program agrees, the worst of each group; 17 stands for equal as printed."""
    worst = {}
    for key, value in reference.items():
        group = key.split(".")[0]
        if key not in other:
            raise SystemExit("missing from the second program: " + key)
        difference = abs(mpf(other[key]) - value)
        digits = 17.0 if difference == 0 else min(17.0, float(-mpmath.log10(difference / abs(value))))
        worst[group] = min(worst.get(group, 17.0), digits)
    return {group: round(digits, 1) for group, digits in sorted(worst.items())}


def parameters_agree(reference, other):
    return agreement({key: value for key, value in reference.items() if key.startswith("parameter.")}, other)


def run_r(folder, out):
    program = shutil.which("Rscript")
    if program is None:
        return None, {}
    result = out / "r.txt"
    script = Path(__file__).with_name("reference.R")
    subprocess.run([program, "--vanilla", str(script), str(folder), str(result)], check=True)
    values, version = {}, ""
    for line in result.read_text(encoding="utf-8").splitlines():
        case, key, value = line.split("|")
        if case == "version":
            version = value
        else:
            values.setdefault(case, {})[key] = value
    result.unlink()
    return version, values


def versions(r_version):
    known = {
        "python": platform.python_version(),
        "mpmath": mpmath.__version__,
        "numpy": np.__version__,
        "scipy": scipy.__version__,
    }
    if r_version:
        known["R"] = r_version
    return known


def write(path, content):
    """JSON with the arbiter's numbers in 20 digits."""

    def plain(value):
        if isinstance(value, mpf):
            return "#" + mpmath.nstr(value, 20, strip_zeros=False, min_fixed=-5, max_fixed=15) + "#"
        if isinstance(value, dict):
            return {key: plain(item) for key, item in value.items()}
        if isinstance(value, list):
            return [plain(item) for item in value]
        return value

    text = json.dumps(plain(content), indent=1, ensure_ascii=False)
    path.write_text(re.sub(r'"#([^"#]*)#"', r"\1", text) + "\n", encoding="utf-8", newline="\n")


def head(r_version):
    return {
        "source": "computed by general libraries from the text of the tables; arbiter: mpmath, 60 digits",
        "command": "python3 src/test/reference/reference.py src/test/resources/reference OUT_FOLDER",
        "version": versions(r_version),
    }


def grid(folder, out, r_version, r_values):
    """Least squares of the printed grid of each evaluated expression, with the expression's own coefficients.

    Uncertainties are left out: the scatter is the rounding of the tenth digit, too near that of double precision.
    """
    with open(folder / "evaluated_expressions.csv", encoding="utf-8") as lines:
        expressions = list(csv.DictReader(lines))
    with open(folder / "evaluated_grid.csv", encoding="utf-8") as lines:
        rows = list(csv.DictReader(lines))
    fits = []
    for number, expression in enumerate(expressions, 1):
        coefficient = expression["A_cm3_molecule-1_s-1 (T in K, no reference temperature)"]
        mine = [
            row for row in rows
            if (row["reaction"], row["form"], row["A"]) == (expression["reaction"], expression["form"], coefficient)
        ]
        model = "modified-arrhenius" if expression["form"] == "3-parameter" else "arrhenius"
        table = {
            "factor": "602214076000000000",
            "order": 2,
            "kelvin": [row["temperature_K"] for row in mine],
            "rate": [row["k_cm3_molecule-1_s-1"] for row in mine],
            "percent": ["1"] * len(mine),
            "targets": [],
        }
        exact = fit(Exact, table, model, "constant-relative", "1 mol/L")
        gas = Exact.number(BOLTZMANN) * Exact.number(AVOGADRO)
        energy = "E" if model == "modified-arrhenius" else "Ea"
        defined = {
            "A": Exact.number(coefficient) * Exact.number(REFERENCE_KELVIN) ** Exact.number(expression["n"]),
            energy: Exact.number(expression["E_over_R_K"]) * gas,
        }
        if model == "modified-arrhenius":
            defined["n"] = Exact.number(expression["n"])
        digits = {"scipy": parameters_agree(exact, fit(Double, table, model, "constant-relative", "1 mol/L"))}
        if r_version:
            digits["R"] = parameters_agree(exact, r_values["grid/" + str(number)])
        fitted = {key[10:]: value for key, value in exact.items() if key.startswith("parameter.") and key != "parameter.lnA"}
        fits.append({
            "reaction": expression["reaction"],
            "form": expression["form"],
            "coefficient": coefficient,
            "model": model,
            "n": len(mine),
            "defined": defined,
            "fitted": fitted,
            "digitsOfDefinition": agreement(
                {"recovered." + key: value for key, value in defined.items()},
                {"recovered." + key: value for key, value in fitted.items()},
            ),
            "agreementDigits": digits,
        })
    write(out / "grid.json", {**head(r_version), "expressions": fits})


def main():
    folder, out = Path(sys.argv[1]), Path(sys.argv[2])
    out.mkdir(parents=True, exist_ok=True)
    r_version, r_values = run_r(folder, out)
    for table in read_tables(folder):
        fits = []
        for model in MODELS:
            for standard in table["standards"] if model == "eyring" else ["1 mol/L"]:
                for error_model in ("constant-relative", "stated"):
                    exact = fit(Exact, table, model, error_model, standard)
                    case = "/".join((table["name"], model, standard, error_model))
                    entry = {"model": model, "standard": standard, "errorModel": error_model}
                    if exact is None:
                        entry["noDegreeOfFreedom"] = True
                    else:
                        digits = {"scipy": agreement(exact, fit(Double, table, model, error_model, standard))}
                        if r_version:
                            digits["R"] = agreement(exact, r_values[case])
                        entry.update({"values": exact, "agreementDigits": digits})
                    fits.append(entry)
        content = {
            **head(r_version),
            "table": table["name"] + ".csv",
            "temperatureUnit": table["temperatureUnit"],
            "rateUnit": table["rateUnit"],
            "order": table["order"],
            "level": 0.95,
            "fits": fits,
        }
        write(out / (table["name"] + ".json"), content)
    cases = []
    with open(folder / "fieller.csv", encoding="utf-8") as lines:
        for case in csv.DictReader(lines):
            kind, values = fieller_exact(case)
            positive, lower, upper = above_zero(kind, values)
            digits = {"scipy": agreement(values, fieller_scipy(case, values))}
            if r_version:
                digits["R"] = agreement(values, r_values["fieller/" + case["name"]])
            cut = {"kind": positive}
            cut.update({name: value for name, value in (("lower", lower), ("upper", upper)) if value is not None})
            cases.append({
                "name": case["name"],
                "kind": kind,
                "values": values,
                "aboveZero": cut,
                "agreementDigits": digits,
            })
    write(out / "fieller.json", {**head(r_version), "level": 0.95, "cases": cases})
    grid(folder, out, r_version, r_values)


if __name__ == "__main__":
    main()
