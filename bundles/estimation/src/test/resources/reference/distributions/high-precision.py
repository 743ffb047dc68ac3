# Reference values of the distributions in 60-digit arithmetic.
# Run as: python3 high-precision.py > high-precision.csv   (Python 3.11.7, mpmath 1.3.0)
# Quantiles: a tail is rounded to a double, then the argument is refined until it gives exactly that double.
from mpmath import mp, mpf, betainc, gammainc, erfc, erfinv, sqrt, inf, nstr

mp.dps = 60
HALF = mpf(1) / 2


def student(t, v):
    return betainc(mpf(v) / 2, HALF, 0, mpf(v) / (v + mpf(t) ** 2), regularized=True) / 2


def chi_squared(x, v):
    return gammainc(mpf(v) / 2, mpf(x) / 2, inf, regularized=True)


def fisher(f, a, b):
    return betainc(mpf(b) / 2, mpf(a) / 2, 0, mpf(b) / (b + mpf(a) * f), regularized=True)


def refine(tail, wanted, start):
    x = mpf(start)
    for _ in range(60):
        h = x * mpf(10) ** -15
        slope = (tail(x + h) - tail(x - h)) / (2 * h) if h else mpf(0)
        step = (tail(x) - wanted) / slope if slope else mpf(0)
        x -= step
        if abs(step) <= abs(x) * mpf(10) ** -20:
            return x
    raise ArithmeticError("no quantile for " + nstr(wanted, 10))


def write(name, *values):
    print(name, *[nstr(v, 25) if isinstance(v, mpf) else repr(v) for v in values], sep=",")


print("# high-precision.py, mpmath 1.3.0; name, arguments, value")
for v in [0.5, 1.0, 1.7, 2.0, 3.0, 4.0, 5.0, 6.0, 7.5, 10.0, 30.0, 100.0, 1000.0, 1e5, 3e6]:
    for t in [1e-5, 0.1, 0.67, 0.7, 1.0, 1.9, 2.5, 4.0, 8.0, 25.0]:
        if v >= 1e5 and t > 8:
            continue
        tail = student(t, v)
        write("studentUpperTail", t, v, tail)
        p = float(1 - tail)
        if 0.5 < p < 1 - 1e-13:
            write("studentQuantile", p, v, refine(lambda x: student(x, v), 1 - mpf(p), t))
        p = float(tail)
        if p > 1e-19 and v < 1e5 and t > 0.05:
            write("studentQuantile", p, v, -refine(lambda x: student(x, v), mpf(p), t))
for z in [1e-6, 0.01, 0.3, 0.6744, 0.7, 1.0, 1.5, 1.96, 3.0, 5.0, 8.0, 15.0, 30.0]:
    tail = erfc(mpf(z) / sqrt(2)) / 2
    write("normalUpperTail", z, tail)
    p = float(1 - tail)
    if 0.5 < p < 1 - 1e-13:
        write("normalQuantile", p, sqrt(2) * erfinv(2 * mpf(p) - 1))
for v in [0.3, 1.0, 2.0, 3.0, 5.0, 10.0, 40.0, 300.0, 5000.0]:
    for k in [0.01, 0.2, 0.7, 0.95, 1.05, 1.5, 3.0]:
        tail = chi_squared(v * k, v)
        if tail < mpf(10) ** -290:
            continue
        write("chiSquaredUpperTail", v * k, v, tail)
        p = float(1 - tail)
        if 1e-250 < p < 1 - 1e-13:
            write("chiSquaredQuantile", p, v, refine(lambda x: chi_squared(x, v), 1 - mpf(p), v * k))
for a in [1.0, 2.0, 5.0, 20.0, 150.0]:
    for b in [1.0, 3.0, 8.0, 60.0, 700.0]:
        for f in [0.02, 0.5, 0.95, 1.3, 3.0, 10.0]:
            tail = fisher(f, a, b)
            if tail < mpf(10) ** -200:
                continue
            write("fisherUpperTail", f, a, b, tail)
            p = float(1 - tail)
            if 1e-100 < p < 1 - 1e-13:
                write("fisherQuantile", p, a, b, refine(lambda x: fisher(x, a, b), 1 - mpf(p), f))
