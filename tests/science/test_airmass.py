"""Air mass against the published table and a reference library's test values."""

import numpy as np
import pytest

from planner.science.airmass import AIRMASS_FORMULAS, airmass


@pytest.mark.published("kasten1989", "Table II; the formula is stated good to 0.5 % at 90 deg")
@pytest.mark.parametrize(
    ("zenith_deg", "table", "relative"),
    [(80, 5.5841, 1e-3), (89, 26.2595, 2e-3), (90, 38.0868, 5e-3)],
)
def test_default_formula_against_its_table(
    zenith_deg: float, table: float, relative: float
) -> None:
    assert airmass(90.0 - zenith_deg) == pytest.approx(table, rel=relative)


@pytest.mark.published("pvlib_airmass", "zenith distance 80 and 89.9 deg")
@pytest.mark.parametrize(
    ("formula", "at_80", "at_89_9"),
    [
        ("secant", 5.759, 572.958),
        ("kasten_young_1989", 5.586, 36.467),
        ("pickering_2002", 5.581, 37.064),
    ],
)
def test_formulas_against_pvlib_values(formula: str, at_80: float, at_89_9: float) -> None:
    np.testing.assert_allclose(airmass([10.0, 0.1], formula), [at_80, at_89_9], atol=1e-3)


@pytest.mark.oracle
def test_formulas_agree_high_in_the_sky_and_increase_downward() -> None:
    altitude_deg = np.linspace(20, 90, 71)
    for formula in AIRMASS_FORMULAS:
        values = airmass(altitude_deg, formula)
        assert np.all(np.diff(values) < 0), formula
        np.testing.assert_allclose(values, airmass(altitude_deg), rtol=0.01)


@pytest.mark.identity
def test_edges_of_the_ranges() -> None:
    for formula, (_, lowest_deg, closed) in AIRMASS_FORMULAS.items():
        assert np.isfinite(airmass(lowest_deg, formula)) == closed
        assert np.isnan(airmass(np.nextafter(lowest_deg, -1), formula))
        assert np.isnan(airmass([np.nextafter(90.0, 91), np.nan], formula)).all()
