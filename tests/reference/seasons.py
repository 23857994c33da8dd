"""Makes seasons.json: plans run through seasons of weather by another road (Debian's python3-numpy).

Run: python3 tests/reference/seasons.py > tests/reference/seasons.json
Every season at once: for each piece of dark time, vectors over the seasons. Weather is drawn as a two-state Markov chain
from its transition matrix. `runs` holds seasons given night by night with the seconds of each award, to be met
to the second; `chances` how often each was observed in full in `seasons` seasons.
"""
import json
import sys

import numpy as np

rng = np.random.default_rng(20271104)
SEASONS = 40000


def made_plan(nights, bins, awards, chance, persistence):
    pieces = [
        {"night": int(n), "bin": int(b), "seconds": int(rng.integers(1800, 14400))}
        for n in range(nights)
        for b in sorted(rng.choice(bins, 2, replace=False))
    ]
    total = np.zeros(bins)
    for p in pieces:
        total[p["bin"]] += p["seconds"]
    free = total * (1 - chance)
    made = []
    for a in range(awards):
        parts = []
        for _ in range(int(rng.integers(1, 3))):
            usable = sorted(int(b) for b in rng.choice(bins, int(rng.integers(1, bins)), replace=False))
            share = {b: round(float(rng.uniform(0.3, 1)), 3) for b in usable}
            laid = {}
            for b in usable:
                own = int(min(free[b], total[b] * share[b] * rng.uniform(0, 0.4)))
                if own > 0:
                    laid[b] = own
                    free[b] -= own
            seconds = sum(laid.values())
            if seconds > 0:
                parts.append({"seconds": seconds, "laid": laid, "share": share})
        if parts:
            made.append({"proposal": a + 1, "instrument": 1, "parts": parts})
    return {"lost": [chance] * nights, "persistence": persistence, "pieces": pieces, "awards": made}


def run(plan, lost):
    """lost: seasons x nights of booleans -> seasons x awards of seconds."""
    parts = [(a, part) for a, award in enumerate(plan["awards"]) for part in award["parts"]]
    lacks = np.array([[part["seconds"] for _, part in parts]] * len(lost), dtype=float)
    laid = [{b: np.full(len(lost), float(s)) for b, s in part["laid"].items()} for _, part in parts]
    for piece in plan["pieces"]:
        b, seconds = piece["bin"], piece["seconds"]
        left = np.where(lost[:, piece["night"]], 0.0, float(seconds))
        took = np.zeros_like(lacks)
        for planned in (True, False):
            for i, (_, part) in enumerate(parts):
                if b not in part["share"]:
                    continue
                now = np.minimum(np.minimum(left, lacks[:, i]), part["share"][b] * seconds - took[:, i])
                if planned:
                    if b not in laid[i]:
                        continue
                    now = np.minimum(now, laid[i][b])
                now = np.maximum(now, 0.0)
                if planned:
                    laid[i][b] -= now
                took[:, i] += now
                lacks[:, i] -= now
                left -= now
    wanted = np.array([part["seconds"] for _, part in parts], dtype=float)
    observed = np.zeros((len(lost), len(plan["awards"])))
    for i, (a, _) in enumerate(parts):
        observed[:, a] += wanted[i] - lacks[:, i]
    return observed


def chain(seasons, nights, p, r):
    after_lost, after_clear = p + r * (1 - p), p * (1 - r)
    lost = np.zeros((seasons, nights), dtype=bool)
    lost[:, 0] = rng.random(seasons) < p
    for n in range(1, nights):
        lost[:, n] = rng.random(seasons) < np.where(lost[:, n - 1], after_lost, after_clear)
    return lost


cases = []
for nights, bins, awards, chance, persistence in ((20, 4, 5, 0.3, 0.0), (60, 8, 12, 0.35, 0.4), (120, 10, 25, 0.25, 0.7)):
    plan = made_plan(nights, bins, awards, chance, persistence)
    few = chain(12, nights, chance, persistence)
    observed = run(plan, chain(SEASONS, nights, chance, persistence))
    whole = np.array([sum(part["seconds"] for part in award["parts"]) for award in plan["awards"]])
    cases.append({
        "plan": plan,
        "runs": [
            {"lost": "".join("1" if night else "0" for night in season), "seconds": [round(s, 3) for s in row]}
            for season, row in zip(few, run(plan, few).tolist())
        ],
        "chances": [round(float(c), 5) for c in (observed > whole - 1).mean(axis=0)],
        "middle": [round(float(s), 1) for s in np.quantile(observed, 0.5, axis=0, method="inverted_cdf")],
    })

json.dump({"made": f"numpy {np.__version__}", "seasons": SEASONS, "cases": cases}, sys.stdout, separators=(",", ":"))
