"""Makes the invented history of the sample shop."""
