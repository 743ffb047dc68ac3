"""Fits with errors in both variables, twice: ODRPACK through scipy.odr, and the same minimum to 30 digits by Newton's method
on the gradient of the full problem (parameters and adjusted abscissae) in mpmath, started from the first.

    python3 orthogonal.py > orthogonal.csv

ODRPACK has no correlation of the two errors of a point; cases with one have the second answer only (odr columns empty).
The data are invented, except "pearson" (Pearson 1901, weights York 1966) and "saturation" (Treloar 1974).
"""
import csv, platform, warnings
warnings.filterwarnings("ignore")
import mpmath as mp, numpy as np, scipy
from scipy import odr
mp.mp.dps = 40

def rows(name):
    with open(name) as f:
        return list(csv.DictReader(f))

line = (lambda b, x, m=np: b[0] + b[1] * x)
saturation = (lambda b, x, m=np: b[0] * x / (b[1] + x))
decay = (lambda b, x, m=np: b[0] * m.exp(-b[1] * x) + b[2])
power = (lambda b, x, m=np: b[0] * x ** b[1])

py = rows("pearson_york.csv")
pu = [r for r in rows("puromycin.csv") if r["state"] == "treated"]
f = lambda rs, k: np.array([float(r[k]) for r in rs])
xs = np.array([0.1, 0.5, 1.1, 1.8, 2.4, 3.3, 4.1, 5.2, 6.6, 8.0])
ys = np.array([9.71, 8.22, 6.31, 4.95, 4.01, 2.93, 2.30, 1.82, 1.42, 1.21])
T = np.array([298.15, 308.15, 318.15, 328.15, 338.15]); k = np.array([1.10e-4, 3.30e-4, 9.80e-4, 2.45e-3, 6.60e-3])
uT = 0.3; uk = 0.05
xe = 1000 / T; ye = np.log(k / T)
uxe = uT * 1000 / T**2; uye = np.sqrt(uk**2 + (uT / T)**2)
re = (1000 * uT**2 / T**3) / (uxe * uye)
cases = {
 "pearson": (line, "line", f(py, "x"), f(py, "y"), f(py, "weight_x")**-0.5, f(py, "weight_y")**-0.5, None, [5., -0.5]),
 "pearson-correlated": (line, "line", f(py, "x"), f(py, "y"), f(py, "weight_x")**-0.5, f(py, "weight_y")**-0.5,
                        np.array([.5, -.3, .8, .1, -.6, .4, .9, -.2, .3, -.7]), [5., -0.5]),
 "eyring": (line, "line", xe, ye, uxe, uye, re, [20., -10.]),
 "saturation": (saturation, "saturation", f(pu, "concentration_ppm"), f(pu, "rate_counts_min-2"),
                0.06 * f(pu, "concentration_ppm"), np.full(12, 8.0), None, [212., 0.064]),
 "decay": (decay, "decay", xs, ys, np.full(10, 0.08), np.full(10, 0.1), None, [9., .4, 1.]),
 "decay-correlated": (decay, "decay", xs, ys, np.full(10, 0.08), np.full(10, 0.1), np.full(10, -0.6), [9., .4, 1.]),
 "decay-exact-y": (decay, "decay", xs, ys, np.full(10, 0.08), np.zeros(10), None, [9., .4, 1.]),
}

def exact(fun, x, y, ux, uy, r, b0, d0):
    n, p = len(x), len(b0)
    X = [mp.mpf(float(v)) for v in x]; Y = [mp.mpf(float(v)) for v in y]
    U = [mp.mpf(float(v)) for v in ux]; V = [mp.mpf(float(v)) for v in uy]; R = [mp.mpf(float(v)) for v in r]
    def profile(b):
        return chi2(b)[0]
    def adjusted(b, i, xi):
        if V[i] == 0:
            return mp.findroot(lambda z: fun(b, z, mp) - Y[i], xi)
        def q(z):
            a = (X[i] - z) / U[i]; e = (Y[i] - fun(b, z, mp)) / V[i]
            return (a * a - 2 * R[i] * a * e + e * e) / (1 - R[i] ** 2)
        return mp.findroot(lambda z: mp.diff(q, z), xi)
    def parts(b):
        out = []
        for i in range(n):
            xi = adjusted(b, i, mp.mpf(float(x[i] + d0[i])))
            s = mp.diff(lambda z: fun(b, z, mp), xi)
            J = [mp.diff(lambda t, j=j: fun([*b[:j], t, *b[j+1:]], xi, mp), b[j]) for j in range(p)]
            w = 1 / (V[i]**2 - 2 * s * R[i] * U[i] * V[i] + s * s * U[i]**2)
            g = Y[i] - fun(b, xi, mp) - s * (X[i] - xi)
            out.append((w, g, J))
        return out
    def gradient(*b):
        q = parts(list(b))
        return [sum(w * g * J[j] for w, g, J in q) for j in range(p)]
    b = list(mp.findroot(gradient, [mp.mpf(float(v)) for v in b0], tol=1e-50, maxsteps=40))
    q = parts(b)
    A = mp.matrix(p, p)
    for w, g, J in q:
        for i in range(p):
            for j in range(p):
                A[i, j] += w * J[i] * J[j]
    C = A ** -1
    return b, [mp.sqrt(C[j, j]) for j in range(p)], sum(w * g * g for w, g, J in q)

print("# ODRPACK: scipy.odr of SciPy", scipy.__version__, "NumPy", np.__version__, "Python", platform.python_version(),
      "; exact: mpmath", mp.__version__, "; command: python3 orthogonal.py > orthogonal.csv")
print("case,curve,j,odr,odr_u,exact,exact_u,exact_chi2")
for name, (fun, label, x, y, ux, uy, r, b0) in cases.items():
    out = None; beta = b0; delta = np.zeros(len(x))
    if r is None and (uy > 0).all():
        o = odr.ODR(odr.RealData(x, y, sx=ux, sy=uy), odr.Model(lambda b, x: fun(b, x)), beta0=b0, maxit=2000,
                    sstol=1e-16, partol=1e-16)
        o.set_job(deriv=1)
        out = o.run(); beta, delta = out.beta, out.delta
    elif name == "decay-exact-y":
        o = odr.ODR(odr.RealData(x, y, sx=ux, sy=np.full(10, 1e-6)), odr.Model(lambda b, x: fun(b, x)), beta0=b0, maxit=2000)
        o.set_job(deriv=1); res = o.run(); beta, delta = res.beta, res.delta
    rr = np.zeros(len(x)) if r is None else r
    b, u, c = exact(fun, x, y, ux, uy, rr, beta, delta)
    for j in range(len(b)):
        a = (repr(float(out.beta[j])), repr(float(np.sqrt(out.cov_beta[j, j])))) if out is not None else ("", "")
        print(",".join([name, label, str(j), *a, mp.nstr(b[j], 17), mp.nstr(u[j], 17), mp.nstr(c, 17)]))
print("# points: case,x,y,ux,uy,r")
for name, (fun, label, x, y, ux, uy, r, b0) in cases.items():
    for i in range(len(x)):
        print(",".join(["*" + name] + [repr(float(v)) for v in (x[i], y[i], ux[i], uy[i], 0 if r is None else r[i])]))
