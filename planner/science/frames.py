"""Redshift, velocity conventions and media: each change of frame is one function of one step.

Owns rest to observed, velocity to redshift, vacuum to air. Not the observer's velocity on a date.
"""

from __future__ import annotations

from collections.abc import Callable

import numpy as np
from numpy.typing import ArrayLike, NDArray

C_KM_S = 299792.458  # exact, SI
AIR_FROM_ANG = 2000.0  # the air convention starts here
Array = NDArray[np.float64]


def observed_vac_ang(rest_vac_ang: ArrayLike, z: ArrayLike) -> Array:
    """Vacuum wavelength at which a rest wavelength is seen, same frame as z. [Angstrom]

    Arguments broadcast; NaN where an input is NaN or z <= -1. Source: greisen2006.
    """
    z = np.asarray(z, dtype=float)
    return np.asarray(rest_vac_ang, dtype=float) * np.where(z > -1.0, 1.0 + z, np.nan)


def ciddor_refractivity(vac_ang: ArrayLike) -> Array:
    """Refractivity n - 1 of dry air, 15 C, 101325 Pa, 450 ppm CO2; NaN below 2000 Angstrom.

    Source: ciddor1996 eq. 1.
    """
    vac_ang = np.asarray(vac_ang, dtype=float)
    s = np.where(vac_ang >= AIR_FROM_ANG, 1e4 / vac_ang, np.nan) ** 2
    return np.asarray(0.05792105 / (238.0185 - s) + 0.00167917 / (57.362 - s))


def air_from_vacuum_ang(vac_ang: ArrayLike) -> Array:
    """Air wavelength of a vacuum wavelength; give it the observed one, never the rest one.

    Any shape [Angstrom]; NaN below 2000 Angstrom vacuum. Source: ciddor1996 eq. 1.
    """
    return np.asarray(vac_ang, dtype=float) / (1.0 + ciddor_refractivity(vac_ang))


def vacuum_from_air_ang(air_ang: ArrayLike) -> Array:
    """Vacuum wavelength of an air wavelength, inverting `air_from_vacuum_ang`.

    Source: ciddor1996 eq. 1, by fixed point (each step gains a factor of about 1e5).
    """
    air_ang = np.asarray(air_ang, dtype=float)
    vac_ang = air_ang * 1.00028
    for _ in range(5):
        vac_ang = air_ang * (1.0 + ciddor_refractivity(vac_ang))
    return vac_ang


def _optical(velocity_km_s: Array) -> Array:
    return velocity_km_s / C_KM_S


def _radio(velocity_km_s: Array) -> Array:
    return 1.0 / (1.0 - velocity_km_s / C_KM_S) - 1.0


def _relativistic(velocity_km_s: Array) -> Array:
    beta = velocity_km_s / C_KM_S
    return np.asarray(np.sqrt((1.0 + beta) / (1.0 - beta)) - 1.0)


VELOCITY_CONVENTIONS: dict[str, Callable[[Array], Array]] = {
    "optical": _optical,
    "radio": _radio,
    "relativistic": _relativistic,
}


def redshift_from_velocity(velocity_km_s: ArrayLike, convention: str) -> Array:
    """Redshift of a receding (positive) velocity in a named convention; NaN beyond light speed.

    Source: greisen2006 (definitions).
    """
    velocity_km_s = np.asarray(velocity_km_s, dtype=float)
    inside = np.where(np.abs(velocity_km_s) < C_KM_S, velocity_km_s, np.nan)
    safe = velocity_km_s if convention == "optical" else inside
    return VELOCITY_CONVENTIONS[convention](safe)
