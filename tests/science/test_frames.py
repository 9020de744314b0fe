"""Frames and media against published pairs and definitions."""

import numpy as np
import pytest

from planner.science import frames

SDSS = [(4861.363, 4862.721), (4958.911, 4960.295), (5006.843, 5008.239), (6562.801, 6564.614)]


@pytest.mark.published("sdss_vac", "pairs air to vacuum")
@pytest.mark.parametrize(("air_ang", "vac_ang"), SDSS)
def test_air_and_vacuum_pairs(air_ang: float, vac_ang: float) -> None:
    assert frames.air_from_vacuum_ang(vac_ang) == pytest.approx(air_ang, abs=2e-3)
    assert frames.vacuum_from_air_ang(air_ang) == pytest.approx(vac_ang, abs=2e-3)


@pytest.mark.identity
def test_air_round_trip_and_edge_of_the_convention() -> None:
    vac_ang = np.array([2000.0, 3727.0, 9533.2, 25000.0])
    back = frames.vacuum_from_air_ang(frames.air_from_vacuum_ang(vac_ang))
    np.testing.assert_allclose(back[1:], vac_ang[1:], atol=1e-9, rtol=0)
    assert np.isfinite(frames.air_from_vacuum_ang(2000.0))
    assert np.isnan(frames.air_from_vacuum_ang(np.nextafter(2000.0, 0)))


@pytest.mark.oracle
def test_velocity_conventions() -> None:
    got = [frames.redshift_from_velocity(15000.0, k) for k in ("optical", "relativistic", "radio")]
    np.testing.assert_allclose(got, [0.05003, 0.05135, 0.05267], atol=5e-6)


@pytest.mark.identity
def test_redshift_is_one_ratio_for_every_line() -> None:
    rest = np.array([3727.092, 6564.614])
    seen = frames.observed_vac_ang(rest, 0.542)
    np.testing.assert_allclose(seen / rest, 1.542)
    assert np.isnan(frames.observed_vac_ang(5000.0, -1.0))
    assert np.isnan(frames.redshift_from_velocity(frames.C_KM_S, "radio"))
