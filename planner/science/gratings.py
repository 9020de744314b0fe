"""The plane reflection grating at a fixed camera-collimator angle.

m wavelength = d (sin alpha + sin beta), same side of the normal positive, vacuum wavelengths.
Owns tilt, wavelength at a detector offset, dispersion, slit-limited resolution. Not efficiencies.
"""

from __future__ import annotations

from dataclasses import dataclass

import numpy as np
from numpy.typing import ArrayLike, NDArray

Array = NDArray[np.float64]
ANG_PER_MM = 1e7


@dataclass(frozen=True, slots=True, kw_only=True)
class GratingSetup:
    """One grating turned so that a wavelength falls on the camera axis."""

    lines_per_mm: float
    order: int
    included_angle_deg: float
    centre_vac_ang: float


def grating_tilt_deg(setup: GratingSetup) -> float:
    """Tilt of the grating normal from the bisector; NaN where no angle reaches the wavelength.

    Source: m lambda_c = 2 d sin(tilt) cos(Phi/2), from the grating equation (schroeder2000).
    """
    half = np.radians(setup.included_angle_deg) / 2
    spread = setup.order * setup.centre_vac_ang * setup.lines_per_mm / ANG_PER_MM
    sine = spread / (2 * np.cos(half))
    return float(np.degrees(np.arcsin(sine))) if abs(sine) <= 1 else float("nan")


def incidence_and_diffraction_deg(setup: GratingSetup) -> tuple[float, float]:
    """Angles alpha and beta on the camera axis: tilt plus and minus half the included angle."""
    tilt = grating_tilt_deg(setup)
    return tilt + setup.included_angle_deg / 2, tilt - setup.included_angle_deg / 2


def wavelength_vac_ang(setup: GratingSetup, offset_mm: ArrayLike, *, camera_mm: float) -> Array:
    """Vacuum wavelength at an offset on the detector, positive toward longer ones. [Angstrom]

    `offset_mm` of any shape; exact (no constant dispersion). Source: schroeder2000.
    """
    alpha, beta = np.radians(incidence_and_diffraction_deg(setup))
    ray = beta + np.arctan(np.asarray(offset_mm, dtype=float) / camera_mm)
    return np.asarray(ANG_PER_MM / setup.lines_per_mm / setup.order * (np.sin(alpha) + np.sin(ray)))


def resolving_power(setup: GratingSetup, *, collimator_mm: float, slit_mm: float) -> float:
    """Slit-limited resolving power on the camera axis, anamorphic factor included.

    Source: R = lambda f_coll m / (d cos(alpha) w) (schroeder2000; schweizer1979).
    """
    alpha = np.radians(incidence_and_diffraction_deg(setup)[0])
    spread = setup.centre_vac_ang * setup.order * setup.lines_per_mm / ANG_PER_MM
    return float(spread * collimator_mm / (np.cos(alpha) * slit_mm))
