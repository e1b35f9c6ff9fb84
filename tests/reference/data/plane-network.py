"""Adjusts one closed room by SciPy and NumPy alone and writes plane-network.json: an independent answer to hold
adjustRoom against. Run: python3 plane-network.py > plane-network.json (SciPy 1.17.1, NumPy 2.4.6)."""
import json
import numpy as np
import scipy
from scipy.optimize import least_squares

# Corner to corner clockwise seen from above, x east, y south, as read (mm); angles are interior, of the corner at the
# wall's left end, in degrees.
lengths = [4203.0, 1803.2, 1895.8, 1204.3, 2303.8, 3002.2]
angles = [89.74, 90.29, 89.82, 270.17, 89.62, 90.45]
diagonals = [(0, 2, 4578.7), (1, 5, 5153.2), (1, 4, 3550.8), (0, 3, 2934.0)]
u_length, u_angle, u_diagonal = 0.8, 0.08, 1.1
n = len(lengths)


def points(v):
    # The first corner is at 0, 0 and the first wall lies along x.
    return np.array([[0, 0], [v[0], 0], *np.reshape(v[1:], (-1, 2))])


def predicted(v):
    p = points(v)
    walls = np.roll(p, -1, axis=0) - p
    headings = np.arctan2(walls[:, 1], walls[:, 0])
    inside = np.degrees(np.pi - (headings - np.roll(headings, 1))) % 360
    across = [np.hypot(*(p[j] - p[i])) for i, j, _ in diagonals]
    return np.concatenate([np.hypot(walls[:, 0], walls[:, 1]), inside, across])


read = np.array(lengths + angles + [d for _, _, d in diagonals])
sigma = np.array([u_length] * n + [u_angle] * n + [u_diagonal] * len(diagonals))
start, heading, at = [], 0.0, np.zeros(2)
for i in range(n - 1):
    if i > 0:
        heading += np.pi - np.radians(angles[i])
    at = at + lengths[i] * np.array([np.cos(heading), np.sin(heading)])
    start.extend([at[0]] if i == 0 else at)
fit = least_squares(
    lambda v: (predicted(v) - read) / sigma, start, jac='3-point', xtol=1e-15, ftol=1e-15, gtol=1e-15
)
covariance = np.linalg.inv(fit.jac.T @ fit.jac)
hat = fit.jac @ covariance @ fit.jac.T
redundancy = 1 - np.diag(hat)
where = [None, None, 0, None] + list(range(1, 2 * n - 3))


def ellipse(corner):
    c = np.array(
        [
            [
                0 if where[2 * corner + a] is None or where[2 * corner + b] is None
                else covariance[where[2 * corner + a], where[2 * corner + b]]
                for b in (0, 1)
            ]
            for a in (0, 1)
        ]
    )
    values, vectors = np.linalg.eigh(c)
    return {
        'a': float(np.sqrt(max(values[1], 0))),
        'b': float(np.sqrt(max(values[0], 0))),
        'angleDeg': float(np.degrees(np.arctan2(vectors[1, 1], vectors[0, 1]))),
    }


print(
    json.dumps(
        {
            'source': f'SciPy {scipy.__version__} optimize.least_squares and NumPy {np.__version__} linalg on the plane distance and angle equations; plane-network.py beside this file',
            'address': 'https://docs.scipy.org/doc/scipy/reference/generated/scipy.optimize.least_squares.html',
            'inputs': {
                'lengthsMm': lengths,
                'anglesDeg': angles,
                'diagonals': diagonals,
                'uLengthMm': u_length,
                'uAngleDeg': u_angle,
                'uDiagonalMm': u_diagonal,
            },
            'reckoned': {
                'corners': points(fit.x).tolist(),
                'ellipses': [ellipse(i) for i in range(n)],
                'adjusted': predicted(fit.x).tolist(),
                'redundancies': redundancy.tolist(),
                'w': ((predicted(fit.x) - read) / sigma / np.sqrt(redundancy)).tolist(),
                'chiSquare': float(2 * fit.cost),
            },
        },
        indent=2,
    )
)
