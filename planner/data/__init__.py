"""Shipped tables, each with its provenance in its header; builders stand beside them."""
