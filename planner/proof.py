"""Published values against the same functions that the rest of the package uses.

Owns the table QUANTITIES and the running of cases. Owns no formula.
"""

from __future__ import annotations

import math
from collections.abc import Callable, Mapping
from dataclasses import dataclass

import yaml

from planner.problems import InputFault, Level, Place, Problem
from planner.science import airmass, frames, gratings

Inputs = Mapping[str, object]


@dataclass(frozen=True, slots=True, kw_only=True)
class Quantity:
    """A thing that a proof case may ask for: its input keys, unit and function."""

    inputs: tuple[str, ...]
    optional: tuple[str, ...] = ()
    unit: str
    compute: Callable[[Inputs], float]


def _number(inputs: Inputs, key: str) -> float:
    return float(str(inputs[key]))


def _order(inputs: Inputs) -> int:
    order = _number(inputs, "order")
    if order != int(order):
        raise ValueError("a diffraction order is a whole number")
    return int(order)


def _setup(inputs: Inputs) -> gratings.GratingSetup:
    return gratings.GratingSetup(
        lines_per_mm=_number(inputs, "lines_per_mm"),
        order=_order(inputs),
        included_angle_deg=_number(inputs, "included_angle_deg"),
        centre_vac_ang=_number(inputs, "centre_ang"),
    )


def _spectrum_end(inputs: Inputs) -> float:
    offset_mm = _number(inputs, "offset_px") * _number(inputs, "pixel_um") / 1000
    camera_mm = _number(inputs, "camera_mm")
    return float(gratings.wavelength_vac_ang(_setup(inputs), offset_mm, camera_mm=camera_mm))


def _resolving_power(inputs: Inputs) -> float:
    return gratings.resolving_power(
        _setup(inputs),
        collimator_mm=_number(inputs, "collimator_mm"),
        slit_mm=_number(inputs, "slit_mm"),
    )


def _airmass(inputs: Inputs) -> float:
    formula = str(inputs.get("formula", "kasten_young_1989"))
    return float(airmass.airmass(_number(inputs, "apparent_altitude_deg"), formula))


_GRATING = ("lines_per_mm", "order", "included_angle_deg", "centre_ang")

QUANTITIES: dict[str, Quantity] = {
    "air_wavelength": Quantity(
        inputs=("vacuum_ang",),
        unit="Angstrom, air",
        compute=lambda i: float(frames.air_from_vacuum_ang(_number(i, "vacuum_ang"))),
    ),
    "vacuum_wavelength": Quantity(
        inputs=("air_ang",),
        unit="Angstrom, vacuum",
        compute=lambda i: float(frames.vacuum_from_air_ang(_number(i, "air_ang"))),
    ),
    "redshift_from_velocity": Quantity(
        inputs=("velocity_km_s", "convention"),
        unit="1",
        compute=lambda i: float(
            frames.redshift_from_velocity(_number(i, "velocity_km_s"), str(i["convention"]))
        ),
    ),
    "airmass": Quantity(
        inputs=("apparent_altitude_deg",), optional=("formula",), unit="1", compute=_airmass
    ),
    "grating_tilt": Quantity(
        inputs=_GRATING, unit="deg", compute=lambda i: gratings.grating_tilt_deg(_setup(i))
    ),
    "spectrum_end": Quantity(
        inputs=(*_GRATING, "camera_mm", "pixel_um", "offset_px"),
        unit="Angstrom, vacuum",
        compute=_spectrum_end,
    ),
    "resolving_power": Quantity(
        inputs=(*_GRATING, "collimator_mm", "slit_mm"), unit="1", compute=_resolving_power
    ),
}


def run_case(case: Mapping[str, object]) -> dict[str, object]:
    """Run one case; anything it lacks or the tool refuses makes it fail with a reason."""
    result: dict[str, object] = {key: case.get(key) for key in ("case", "quantity", "source")}
    result |= {"expected": case.get("expected"), "tolerance": case.get("tolerance")}
    result |= {"got": None, "unit": "", "pass": False}
    quantity = QUANTITIES.get(str(case.get("quantity")))
    inputs = case.get("inputs")
    if quantity is None or not isinstance(inputs, Mapping):
        known = ", ".join(QUANTITIES)
        return result | {"reason": f"unknown quantity, or no inputs; quantities are: {known}"}
    if not set(quantity.inputs) <= set(inputs) <= {*quantity.inputs, *quantity.optional}:
        return result | {"reason": f"inputs must be: {', '.join(quantity.inputs)}"}
    try:
        got = quantity.compute(inputs)
    except (ValueError, KeyError, ZeroDivisionError, OverflowError):
        return result | {"reason": "an input is not a number, a whole order or a known word"}
    if not math.isfinite(got):
        outside = "outside the range of the formula"
        return result | {"reason": outside, "pass": case.get("expected", 0) is None}
    result |= {"got": got, "unit": quantity.unit, "pass": _agrees(case, got)}
    return result if result["pass"] else result | {"reason": "beyond the tolerance, or none given"}


def _agrees(case: Mapping[str, object], got: float) -> bool:
    try:
        expected, tolerance = float(str(case["expected"])), float(str(case["tolerance"]))
    except (KeyError, ValueError):
        return False
    return abs(got - expected) <= tolerance


def read_cases(text: str, file: str) -> list[Mapping[str, object]]:
    """Read a YAML list of cases from its text; one sentence where it is not one."""
    fault = "not a YAML list of proof cases; write one case per '-' item"
    try:
        cases = yaml.safe_load(text)
    except (yaml.YAMLError, ValueError, RecursionError):
        cases = None
    if not isinstance(cases, list) or not all(isinstance(case, Mapping) for case in cases):
        place = Place(file=file)
        problem = Problem(check="proof_file", level=Level.STOP, place=place, found=fault)
        raise InputFault([problem])
    return cases
