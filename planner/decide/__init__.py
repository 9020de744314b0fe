"""Pure choices with their reasons: constraints, usability, settings, windows, schedule."""
