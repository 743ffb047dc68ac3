"""Percentile and BCa intervals of a fixed set of 99,999 replicates by scipy.stats.bootstrap.

    python3 bca.py > bca.csv

Replicate k is q + 0.3 q^2 with q the normal quantile of k / 100000; the estimate is the mean of eight invented numbers, from
which SciPy takes the jackknife.
"""
import platform, numpy as np, scipy
from scipy.stats import norm, bootstrap
from scipy.stats._resampling import BootstrapResult
x = np.array([0.9, -0.6, 0.3, -0.2, 1.9, -1.1, 0.4, -1.2])
q = norm.ppf(np.arange(1, 100000) / 100000)
given = BootstrapResult(None, q + 0.3 * q**2, 0.0)
print("# SciPy", scipy.__version__, "NumPy", np.__version__, "Python", platform.python_version(), "; python3 bca.py > bca.csv")
print("kind,level,lower,upper")
for level in (0.5, 0.9, 0.95):
    for kind in ("percentile", "BCa"):
        r = bootstrap((x,), np.mean, n_resamples=0, bootstrap_result=given, confidence_level=level, method=kind)
        print(f"{kind.lower()},{level},{float(r.confidence_interval.low)!r},{float(r.confidence_interval.high)!r}")
