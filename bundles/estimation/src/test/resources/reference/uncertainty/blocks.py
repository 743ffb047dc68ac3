"""Restricted maximum likelihood with one random effect on dense matrices, by mpmath to 40 digits; invented data.

    python3 blocks.py > blocks.csv

Criterion: ln|V| + ln|X'V^-1 X| + y'Py; Satterthwaite from tr(P V_j P V_k) / 2.
"""
import platform, mpmath as mp
mp.mp.dps = 40
block = [0, 0, 0, 1, 1, 2, 2, 2, 2, 3, 4, 4]
x = [0.0, 1.0, 2.0, 0.5, 2.5, 0.0, 1.0, 3.0, 4.0, 2.0, 1.5, 3.5]
y = [1.21, 2.32, 3.05, 1.12, 3.35, 1.55, 2.71, 4.52, 5.71, 2.95, 2.51, 4.42]
w = [1.0, 2.0, 1.0, 0.5, 1.0, 1.0, 3.0, 1.0, 1.0, 1.0, 2.0, 0.7]
print("# Python", platform.python_version(), "mpmath", mp.__version__, "; python3 blocks.py > blocks.csv")
print("# data: *,block,x,y,w")
for r in zip(block, x, y, w): print(",".join(["*"] + [str(v) for v in r]))
print("# case,between,within,b0,b1,u0,u1,dof0,dof1")
n = len(y)
for name, ww in (("plain", [1] * n), ("weighted", w)):
    X = mp.matrix([[1, mp.mpf(v)] for v in x]); Y = mp.matrix([mp.mpf(str(v)) for v in y])
    V1 = mp.matrix(n, n); V2 = mp.matrix(n, n)
    for i in range(n):
        V2[i, i] = 1 / mp.mpf(str(ww[i]))
        for j in range(n):
            V1[i, j] = 1 if block[i] == block[j] else 0
    def parts(a, b):
        V = a * V1 + b * V2; Vi = V ** -1; C = (X.T * Vi * X) ** -1
        return V, Vi, C, Vi - Vi * X * C * X.T * Vi
    tr = lambda M: sum(M[i, i] for i in range(M.rows))
    def score(a, b):
        P = parts(a, b)[3]; py = P * Y
        return [tr(P * V1) - (py.T * V1 * py)[0], tr(P * V2) - (py.T * V2 * py)[0]]
    a, b = mp.findroot(score, (mp.mpf("0.04"), mp.mpf("0.01")), tol=1e-60, maxsteps=60)
    V, Vi, C, P = parts(a, b); beta = C * X.T * Vi * Y
    I = mp.matrix(2, 2); Vs = [V1, V2]
    for j in range(2):
        for k in range(2):
            I[j, k] = tr(P * Vs[j] * P * Vs[k]) / 2
    A = I ** -1; dofs = []
    for k in range(2):
        g = mp.matrix(2, 1); g[k] = 1
        v = Vi * X * C * g
        d = mp.matrix([(v.T * M * v)[0] for M in Vs])
        dofs.append(2 * C[k, k] ** 2 / (d.T * A * d)[0])
    print(",".join([name] + [mp.nstr(q, 17) for q in (a, b, beta[0], beta[1], mp.sqrt(C[0, 0]), mp.sqrt(C[1, 1]), *dofs)]))
