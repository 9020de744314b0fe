"""Test kinds, machine-checked citations, and the guard that nothing reaches the network."""

from __future__ import annotations

import socket
from pathlib import Path

import pytest
import yaml

KINDS = ("published", "identity", "oracle", "golden")
HERE = Path(__file__).parent


def read_references() -> dict[str, dict[str, str]]:
    """Merge the main list of sources with the lists of the rooms; a key stands once."""
    merged: dict[str, dict[str, str]] = {}
    for path in (HERE / "references.yaml", *sorted((HERE / "references.d").glob("*.yaml"))):
        entries = yaml.safe_load(path.read_text(encoding="utf-8")) or {}
        for key, entry in entries.items():
            if key in merged and merged[key]["cite"] != entry["cite"]:
                raise pytest.UsageError(f"{path.name}: {key} is cited twice, differently")
            merged[key] = entry
    return merged


def pytest_collection_modifyitems(items: list[pytest.Item]) -> None:
    """Each test is exactly one kind, and a published one names a source that exists."""
    references = read_references()
    faults = []
    for item in items:
        kinds = [mark for kind in KINDS for mark in item.iter_markers(kind)]
        if len({mark.name for mark in kinds}) != 1:
            faults.append(f"{item.nodeid}: needs exactly one of {', '.join(KINDS)}")
        for mark in item.iter_markers("published"):
            if len(mark.args) != 2 or mark.args[0] not in references:
                faults.append(f"{item.nodeid}: source {mark.args!r} is not in references.yaml")
    if faults:
        raise pytest.UsageError("\n".join(faults))


@pytest.fixture(autouse=True)
def _no_network(monkeypatch: pytest.MonkeyPatch) -> None:
    """A test that opens a connection to anywhere fails at once."""

    def refuse(*_args: object, **_kwargs: object) -> None:
        raise AssertionError("a test reached for the network")

    monkeypatch.setattr(socket.socket, "connect", refuse)
    monkeypatch.setattr(socket, "create_connection", refuse)
    monkeypatch.setattr(socket, "getaddrinfo", refuse)
