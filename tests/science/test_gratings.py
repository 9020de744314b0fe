"""The grating equation against a printed example, closed forms and independent expressions."""

import numpy as np
import pytest

from planner.science.gratings import (
    GratingSetup,
    grating_tilt_deg,
    incidence_and_diffraction_deg,
    resolving_power,
    wavelength_vac_ang,
)

RED = GratingSetup(lines_per_mm=600, order=1, included_angle_deg=42, centre_vac_ang=7500)


@pytest.mark.published("roy_clarke", "p. 446: 500 lines/mm, 5000 A, normal incidence")
def test_normal_incidence_diffracts_to_sine_one_quarter() -> None:
    angle_deg = np.degrees(np.arcsin(0.25))
    setup = GratingSetup(
        lines_per_mm=500, order=1, included_angle_deg=-angle_deg, centre_vac_ang=5000
    )
    alpha_deg, beta_deg = incidence_and_diffraction_deg(setup)
    assert alpha_deg == pytest.approx(0.0, abs=1e-9)
    assert beta_deg == pytest.approx(14.48, abs=0.005)


@pytest.mark.oracle
def test_centre_obeys_the_grating_equation_and_ends_are_asymmetric() -> None:
    alpha_deg, beta_deg = incidence_and_diffraction_deg(RED)
    total = np.sin(np.radians(alpha_deg)) + np.sin(np.radians(beta_deg))
    assert total == pytest.approx(7500e-7 * 600)
    edge_mm = (2048 + 30) * 0.015
    low, centre, high = wavelength_vac_ang(RED, [-edge_mm, 0, edge_mm], camera_mm=330)
    assert centre == pytest.approx(7500)
    # hand values of a 330 mm camera with two 2048 px chips and a 60 px gap
    assert (low, high) == pytest.approx((5953.7, 9064.5), abs=0.06)


@pytest.mark.oracle
def test_resolving_power_equals_wavelength_over_slit_image() -> None:
    slit_mm = 0.27731
    alpha, beta = np.radians(incidence_and_diffraction_deg(RED))
    image_mm = slit_mm * np.cos(alpha) / np.cos(beta) * 330 / 1650
    step = np.diff(wavelength_vac_ang(RED, [-image_mm / 2, image_mm / 2], camera_mm=330))[0]
    power = resolving_power(RED, collimator_mm=1650, slit_mm=slit_mm)
    assert 7500 / step == pytest.approx(power, rel=1e-3)


@pytest.mark.identity
def test_unreachable_wavelength_has_no_tilt() -> None:
    far = GratingSetup(lines_per_mm=1200, order=3, included_angle_deg=42, centre_vac_ang=9000)
    assert np.isnan(grating_tilt_deg(far))
