"""Plan to text, tables and files. Formats only: a number printed here exists in the Plan."""
