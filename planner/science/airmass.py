"""Relative air mass by the published formulas, each within its stated range.

Owns the formulas and their ranges. Not refraction: altitudes go in as published (apparent).
"""

from __future__ import annotations

from collections.abc import Callable

import numpy as np
from numpy.typing import ArrayLike, NDArray

Array = NDArray[np.float64]


def _secant(altitude_deg: Array) -> Array:
    return np.asarray(1.0 / np.sin(np.radians(altitude_deg)))


def _kasten_young_1989(altitude_deg: Array) -> Array:
    sine = np.sin(np.radians(altitude_deg))
    return np.asarray(1.0 / (sine + 0.50572 * (altitude_deg + 6.07995) ** -1.6364))


def _hardie_1962(altitude_deg: Array) -> Array:
    x = _secant(altitude_deg) - 1.0
    return np.asarray(1.0 + x - 0.0018167 * x - 0.002875 * x**2 - 0.0008083 * x**3)


def _young_1994(altitude_deg: Array) -> Array:
    c = np.sin(np.radians(altitude_deg))
    over = 1.002432 * c**2 + 0.148386 * c + 0.0096467
    under = c**3 + 0.149864 * c**2 + 0.0102963 * c + 0.000303978
    return np.asarray(over / under)


def _pickering_2002(altitude_deg: Array) -> Array:
    return _secant(altitude_deg + 244.0 / (165.0 + 47.0 * altitude_deg**1.1))


# name: formula, lowest altitude [deg], whether that altitude itself is allowed
AIRMASS_FORMULAS: dict[str, tuple[Callable[[Array], Array], float, bool]] = {
    "kasten_young_1989": (_kasten_young_1989, 0.0, True),
    "secant": (_secant, 0.0, False),
    "young_1994": (_young_1994, 0.0, True),
    "pickering_2002": (_pickering_2002, 0.0, True),
    "hardie_1962": (_hardie_1962, 5.0, True),
}


def airmass(apparent_altitude_deg: ArrayLike, formula: str = "kasten_young_1989") -> Array:
    """Relative air mass at an apparent altitude, 1 near the zenith.

    Any shape [deg]; NaN outside the range of the formula and where the input is NaN.
    Source: kasten1989 (default), hardie1962, young1994, pickering2002.
    """
    altitude_deg = np.asarray(apparent_altitude_deg, dtype=float)
    compute, lowest_deg, closed = AIRMASS_FORMULAS[formula]
    above = altitude_deg >= lowest_deg if closed else altitude_deg > lowest_deg
    return compute(np.where(above & (altitude_deg <= 90.0), altitude_deg, np.nan))
