"""Asfound's solver: is a beam as found still inside the limits that its designer gave? Start reading at check.py."""

__version__ = "0.1.0"
BUILD = "sources"  # the assembled site's build; set by the bridge, which is told by the page's worker
