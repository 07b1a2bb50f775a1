"""Reference answers from astropy and scipy: rows of inputs as JSON on standard input, answers as JSON on standard output.

In:  {"flat": [{"inputs": {...}}, ...], ...}
Out: {"versions": {...}, "families": {"flat": [{"age": 13.8, ...}, ...], ...}}
A value that the reference can't give is null.
"""

import json
import math
import platform
import sys
import warnings

import astropy
import numpy
import scipy

import closed_forms
import expanding

FAMILIES = {**expanding.FAMILIES, **closed_forms.FAMILIES}


def plain(value):
    number = float(value)
    return number if math.isfinite(number) else None


def main():
    # Near the edge of what a quadrature can do scipy says so on standard error; the table shows the numbers.
    warnings.simplefilter("ignore")
    asked = json.load(sys.stdin)
    families = {
        name: [
            {key: plain(value) for key, value in FAMILIES[name](row).items()}
            for row in rows
        ]
        for name, rows in asked.items()
    }
    versions = {
        "astropy": astropy.__version__,
        "scipy": scipy.__version__,
        "numpy": numpy.__version__,
        "python": platform.python_version(),
    }
    json.dump({"versions": versions, "families": families}, sys.stdout)


if __name__ == "__main__":
    main()
