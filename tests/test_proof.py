"""Proof cases run through the command, pass where they should and fail where they should."""

import json
from pathlib import Path

import pytest
import yaml

from planner.cli import main

HERE = Path(__file__).parent


@pytest.mark.published("sdss_vac", "built-in cases; each names its own source")
def test_built_in_cases_pass(capsys: pytest.CaptureFixture[str]) -> None:
    assert main(["proof", "--format", "json"]) == 0
    results = json.loads(capsys.readouterr().out)
    cited = {
        key
        for path in (HERE / "references.d").glob("*.yaml")
        for key in yaml.safe_load(path.read_text(encoding="utf-8"))
    }
    assert len(results) >= 8
    assert all(result["source"] in cited for result in results)


@pytest.mark.identity
@pytest.mark.parametrize(
    ("text", "code"),
    [
        ("- {quantity: air_wavelength, inputs: {vacuum_ang: 5000}, expected: 1, tolerance: 1}", 1),
        ("- {quantity: air_wavelength, inputs: {vacuum_ang: 1500}, expected: null}", 0),
        ("- {quantity: no_such_thing, inputs: {}}", 1),
        ("- {quantity: redshift_from_velocity, inputs: {velocity_km_s: a, convention: b}}", 1),
        (
            "- {quantity: grating_tilt, expected: 13.946, tolerance: 0.01, inputs: {order: 1.5, "
            "lines_per_mm: 600, included_angle_deg: 42, centre_ang: 7500}}",
            1,
        ),
        ("- {quantity: air_wavelength, inputs: {vacuum_ang: 5000}, expected: 4998.6}", 1),
        ("not: a list", 2),
        ("- {unclosed", 2),
        ("", 2),
    ],
)
def test_exit_codes(tmp_path: Path, text: str, code: int) -> None:
    cases = tmp_path / "cases.yaml"
    cases.write_text(text, encoding="utf-8")
    assert main(["proof", "--cases", str(cases)]) == code


@pytest.mark.identity
def test_missing_and_binary_files_are_one_sentence(tmp_path: Path) -> None:
    (tmp_path / "b").write_bytes(b"\xff\xfe\x00")
    assert main(["proof", "--cases", str(tmp_path / "none")]) == 2
    assert main(["proof", "--cases", str(tmp_path / "b")]) == 2
