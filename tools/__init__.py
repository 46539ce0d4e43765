"""Bootstrap of Asfound: set-up, assembly, local server and checks, from a clone with Python alone.

Nothing in this package imports anything outside the standard library: it is what installs the rest.
`python3 -m tools` lists the commands.
"""
