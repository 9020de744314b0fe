"""Pure array functions: no file, clock, network, environment or change to an argument."""
