"""Entry point: `python3 -m tools COMMAND`."""

import sys

if sys.version_info < (3, 11):  # noqa: UP036 - before any import that needs it, so that the message is the whole answer
    sys.exit(f"asfound: Python 3.11 or newer is needed, this is {sys.version.split()[0]}. Install one and use it here.")

from tools.run import main

sys.exit(main())
