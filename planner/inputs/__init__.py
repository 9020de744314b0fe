"""Text to model. The only readers of files; they collect problems instead of raising."""
