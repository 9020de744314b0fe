"""Linefall: where redshifted spectral features land, and how to observe them."""

__version__ = "0.1.0"
