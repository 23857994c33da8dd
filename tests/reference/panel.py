"""Makes panel.json: panel statistics by another road (Debian's python3-numpy and python3-scipy).

Run: python3 tests/reference/panel.py > tests/reference/panel.json
The mixed model is solved with the whole covariance matrix V and a general optimiser over both variances, merits as
G Z' V^-1 (y - X b), errors from the inverse of the mixed-model equations; alpha from every pair of scores.
"""
import json
import sys

import numpy as np
import scipy
from scipy import optimize, stats

rng = np.random.default_rng(20270512)


def made_scores(proposals, reviewers, each, harshness):
    merit = rng.normal(6.2, 1.1, proposals)
    leniency = rng.normal(0, harshness, reviewers)
    rows = []
    for p in range(proposals):
        for r in rng.choice(reviewers, each, replace=False):
            score = np.clip(merit[p] + leniency[r] + rng.normal(0, 0.8), 0, 10)
            rows.append({"proposal": int(p + 1), "reviewer": int(r + 1), "score": float(np.round(score * 20) / 20)})
    return rows


def design(rows, leniency):
    ps = sorted({r["proposal"] for r in rows})
    rs = sorted({r["reviewer"] for r in rows})
    y = np.array([r["score"] for r in rows])
    Z = np.array([[1.0 if r["proposal"] == p else 0.0 for p in ps] for r in rows])
    D = np.array([[1.0 if r["reviewer"] == q else 0.0 for q in rs] for r in rows])
    X = np.ones((len(rows), 1))
    if leniency:
        X = np.hstack([X, D[:, :-1] - D[:, -1:]])
    return ps, rs, y, X, Z, D


def restricted(params, y, X, Z):
    sm, se = np.exp(params)
    V = sm * Z @ Z.T + se * np.eye(len(y))
    Vi = np.linalg.inv(V)
    A = X.T @ Vi @ X
    b = np.linalg.solve(A, X.T @ Vi @ y)
    r = y - X @ b
    return np.linalg.slogdet(V)[1] + np.linalg.slogdet(A)[1] + r @ Vi @ r


def mixed(rows, leniency):
    ps, rs, y, X, Z, D = design(rows, leniency)
    best = min(
        (optimize.minimize(restricted, start, args=(y, X, Z), method="Nelder-Mead",
                           options={"xatol": 1e-11, "fatol": 1e-12, "maxiter": 20000})
         for start in ([0.0, 0.0], [-2.0, 0.5], [1.0, -1.0])), key=lambda o: o.fun)
    sm, se = np.exp(best.x)
    V = sm * Z @ Z.T + se * np.eye(len(y))
    Vi = np.linalg.inv(V)
    b = np.linalg.solve(X.T @ Vi @ X, X.T @ Vi @ y)
    m = sm * Z.T @ Vi @ (y - X @ b)
    C = np.linalg.inv(np.block([[X.T @ X, X.T @ Z], [Z.T @ X, Z.T @ Z + np.eye(len(ps)) * se / sm]]) / se)
    q = X.shape[1]
    pick = np.zeros((len(ps), C.shape[0]))
    pick[:, 0] = 1
    pick[:, q:] = np.eye(len(ps))
    cov = pick @ C @ pick.T
    out = {
        "meritVariance": sm, "leftVariance": se,
        "merits": [{"proposal": p, "merit": float(b[0] + m[i]), "error": float(np.sqrt(cov[i, i]))}
                   for i, p in enumerate(ps)],
    }
    if leniency:
        T = np.vstack([np.hstack([np.zeros((len(rs) - 1, 1)), np.eye(len(rs) - 1)]),
                       np.hstack([[0.0], -np.ones(len(rs) - 1)])])
        lc = T @ C[:q, :q] @ T.T
        out["leniencies"] = [{"reviewer": r, "points": float((T @ b)[j]), "error": float(np.sqrt(lc[j, j]))}
                             for j, r in enumerate(rs)]
    draws = np.random.default_rng(7).multivariate_normal(b[0] + m, cov, 200_000)
    ranks = np.argsort(np.argsort(-draws, axis=1), axis=1) + 1
    line = len(ps) // 2
    out["line"] = line
    out["chanceAbove"] = [float((ranks[:, i] <= line).mean()) for i in range(len(ps))]
    return out


def f_test(rows):
    ps, rs, y, X, Z, D = design(rows, True)
    rss = lambda M: float(np.sum((y - M @ np.linalg.lstsq(M, y, rcond=None)[0]) ** 2))
    small, large = rss(Z), rss(np.hstack([Z, D]))
    between, within = len(rs) - 1, len(y) - len(ps) - len(rs) + 1
    f = (small - large) / between / (large / within)
    return {"f": f, "between": between, "within": within, "p": float(stats.f.sf(f, between, within))}


def alpha(rows):
    units = {}
    for r in rows:
        units.setdefault(r["proposal"], []).append(r["score"])
    units = [u for u in units.values() if len(u) > 1]
    values = [v for u in units for v in u]
    n = len(values)
    do = sum(sum((a - b) ** 2 for a in u for b in u) / (len(u) - 1) for u in units) / n
    de = sum((a - b) ** 2 for a in values for b in values) / (n * (n - 1))
    return float(1 - do / de)


def with_single():
    """One reviewer more, with a single score."""
    rows = made_scores(12, 6, 3, 0.7)
    return rows + [{"proposal": 5, "reviewer": 7, "score": 9.5}]


def with_alike():
    """A reviewer who gives everything the same score."""
    rows = made_scores(12, 6, 4, 0.7)
    return [{**r, "score": 7.0} if r["reviewer"] == 3 else r for r in rows]


def unlinked():
    """Two halves of a panel that share no proposal: leniency cannot be told from merit, so it stays in."""
    rows = made_scores(8, 4, 3, 0.5)
    return rows + [{**r, "proposal": r["proposal"] + 8, "reviewer": r["reviewer"] + 4}
                   for r in made_scores(8, 4, 3, 0.5)]


cases = {}
for name, args in {"lenient": (24, 14, 5, 0.6), "even": (10, 6, 3, 0.0), "small": (6, 4, 3, 0.9)}.items():
    rows = made_scores(*args)
    cases[name] = {"scores": rows, "withLeniency": mixed(rows, True), "without": mixed(rows, False),
                   "test": f_test(rows), "alpha": alpha(rows)}

for name, rows in {"single": with_single(), "alike": with_alike()}.items():
    cases[name] = {"scores": rows, "withLeniency": mixed(rows, True), "without": mixed(rows, False),
                   "test": f_test(rows), "alpha": alpha(rows)}
rows = unlinked()
apart = {"scores": rows, "without": mixed(rows, False), "alpha": alpha(rows)}

tails = [[f, a, b, float(stats.f.sf(f, a, b))]
         for f, a, b in [(0.2, 1, 1), (1, 3, 7), (3.3, 13, 83), (4.75, 1, 12), (10, 2, 30), (40, 5, 200)]]
json.dump({"made by": f"numpy {np.__version__}, scipy {scipy.__version__}", "cases": cases, "unlinked": apart, "fTails": tails},
          sys.stdout, indent=1)
