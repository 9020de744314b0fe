"""Problems found in inputs, their levels, and the small tree of exceptions.

Owns the one wording of a problem: ``level place: what was found; what it means; what to do``.
Does not own the checks themselves (``inputs/`` and ``decide/checks.py``).
"""

from __future__ import annotations

from collections.abc import Iterable
from dataclasses import dataclass
from enum import IntEnum


class Level(IntEnum):
    """How grave a problem is; ordered, so that the worst is the maximum."""

    NOTE = 1
    CAUTION = 2
    STOP = 3


class Scope(IntEnum):
    """What a STOP stops: the whole plan, or only a target, a setting or a block."""

    BLOCK = 1
    SETTING = 2
    TARGET = 3
    DOCUMENT = 4


@dataclass(frozen=True, slots=True, kw_only=True)
class Place:
    """Where in the user's own files a problem stands."""

    file: str = ""
    line: int | None = None
    path: str = ""

    def __str__(self) -> str:
        head = self.file if self.line is None else f"{self.file}:{self.line}"
        return ": ".join(part for part in (head, self.path) if part)


@dataclass(frozen=True, slots=True, kw_only=True)
class Problem:
    """One fault or remark: what was found, what it means, what to write instead."""

    check: str
    level: Level
    scope: Scope = Scope.DOCUMENT
    waivable: bool = False
    place: Place = Place()
    target: str = ""
    found: str
    means: str = ""
    cure: str = ""
    values: tuple[tuple[str, float | str], ...] = ()

    def __str__(self) -> str:
        said = "; ".join(part for part in (self.found, self.means, self.cure) if part)
        where = str(self.place)
        who = f"{self.target}: " if self.target else ""
        return f"{self.level.name} {where + ': ' if where else ''}{who}{said}"


class LinefallError(Exception):
    """Root of everything that Linefall raises on purpose."""


class InputFault(LinefallError):
    """The inputs cannot be used; carries every problem found, in file order."""

    def __init__(self, problems: Iterable[Problem]) -> None:
        self.problems: tuple[Problem, ...] = tuple(problems)
        super().__init__("\n".join(str(problem) for problem in self.problems))


class OutOfRange(LinefallError):
    """A published formula was asked for a value outside its stated range."""


def worst(problems: Iterable[Problem]) -> Level | None:
    """Return the gravest level among the problems, or None where there are none."""
    return max((problem.level for problem in problems), default=None)


def in_file_order(problems: Iterable[Problem]) -> tuple[Problem, ...]:
    """Sort by file and line, keeping the order of discovery within one line."""
    return tuple(sorted(problems, key=lambda p: (p.place.file, p.place.line or 0)))
