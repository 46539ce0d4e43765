"""python -m pysolver"""

from pysolver.cli import main

raise SystemExit(main())
