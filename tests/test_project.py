"""The project keeps its own promises: import direction, and a README that the gate executes."""

import ast
from pathlib import Path

import pytest

ROOT = Path(__file__).parents[1]
MAY_IMPORT = {
    "problems": set(),
    "science": {"problems", "units", "model", "science"},
    "proof": {"problems", "units", "model", "science", "decide"},
}


@pytest.mark.identity
def test_imports_follow_the_flow() -> None:
    seen = 0
    for path in (ROOT / "planner").rglob("*.py"):
        room = path.relative_to(ROOT / "planner").parts[0].removesuffix(".py")
        if room not in MAY_IMPORT:
            continue
        for node in ast.walk(ast.parse(path.read_text(encoding="utf-8"))):
            if isinstance(node, ast.ImportFrom) and (node.module or "").startswith("planner."):
                seen += 1
                assert node.module.split(".")[1] in MAY_IMPORT[room], path.name
    assert seen >= 1


@pytest.mark.identity
def test_gate_executes_the_two_commands_of_the_readme() -> None:
    readme = (ROOT / "README.md").read_text(encoding="utf-8")
    commands = [block.split("```")[0].strip() for block in readme.split("```sh\n")[1:]]
    gate = (ROOT / ".ci" / "run").read_text(encoding="utf-8").splitlines()
    assert len(commands) == 2
    assert all(command in gate for command in commands)
