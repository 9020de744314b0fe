"""The frozen things that all stages speak: documents (pydantic) and arrays (dataclasses)."""
