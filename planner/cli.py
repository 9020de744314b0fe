"""The command line: parse, call, print, exit code. Heavy imports stand inside the commands."""

from __future__ import annotations

import argparse
import sys
from collections.abc import Sequence
from pathlib import Path

from planner import __version__
from planner.problems import InputFault


def _parser() -> argparse.ArgumentParser:
    parser = argparse.ArgumentParser(prog="linefall", description="Plan redshifted features.")
    parser.add_argument("--version", action="version", version=__version__)
    commands = parser.add_subparsers(dest="command", required=True)
    proof = commands.add_parser("proof", help="the tool against published values, or yours")
    proof.add_argument("--cases", metavar="FILE", type=Path, help="a YAML list of your own cases")
    proof.add_argument("--format", choices=("text", "json"), default="text")
    return parser


def _read(path: Path | None) -> tuple[str, str]:
    if path is not None:
        return path.read_text(encoding="utf-8-sig"), path.name
    from importlib.resources import files

    name = "proof_cases.yaml"
    return files("planner.data").joinpath(name).read_text(encoding="utf-8"), name


def _proof(arguments: argparse.Namespace) -> int:
    import json

    from planner.proof import read_cases, run_case

    text, name = _read(arguments.cases)
    results = [run_case(case) for case in read_cases(text, name)]
    if arguments.format == "json":
        print(json.dumps(results, indent=1, default=str))
    else:
        for result in results:
            verdict = "pass" if result["pass"] else f"FAIL {result.get('reason', '')}".rstrip()
            unit = "" if result["unit"] == "1" else f" {result['unit']}"
            print(
                f"{verdict}: {result['case']}: got {result['got']}{unit}, "
                f"expected {result['expected']} within {result['tolerance']} ({result['source']})"
            )
    return 0 if all(result["pass"] for result in results) else 1


def main(argv: Sequence[str] | None = None) -> int:
    """Run one command; 0 done, 1 a case failed, 2 inputs wrong, 130 interrupted."""
    arguments = _parser().parse_args(argv)
    try:
        return _proof(arguments)
    except InputFault as fault:
        print(fault, file=sys.stderr)
        return 2
    except (OSError, UnicodeDecodeError):
        print(
            f"STOP {arguments.cases}: cannot be read; name an existing file of UTF-8 text",
            file=sys.stderr,
        )
        return 2
    except KeyboardInterrupt:
        return 130
