"""Compare the table of elements with the weights that the `periodictable` package carries.

The package (2.1.0 when this was written) holds the IUPAC table of 2021 and the AME 2020 masses;
an older release holds older weights, and the rows that differ are printed.

    pip install periodictable
    python tests/reference/elements.py
"""

import re
import sys
from pathlib import Path

import periodictable
from periodictable import mass

TABLE = Path(__file__).parents[2] / "src" / "reaction" / "element_table.rs"
# rustfmt may break a row over several lines and end it with a comma.
ROW = re.compile(r'(single|spread|none)\(\s*(\d+),\s*"(\w+)",\s*"(\w+)"((?:,\s*[\d._()\s,]+?)?),?\s*\),')
BRITISH = {"aluminum": "aluminium", "cesium": "caesium"}


def ours():
    """Symbol to (number, name, weight, uncertainty, low, high); None where there is none."""
    rows = {}
    for kind, number, symbol, name, rest in ROW.findall(TABLE.read_text(encoding="utf-8")):
        numbers = [float(text) for text in re.findall(r"[\d.]+", rest.replace("_", ""))]
        numbers += [None] * (4 - len(numbers))
        rows[symbol] = (int(number), name, *numbers)
    return rows


def theirs():
    """The same from the package's copy of the standard's table."""
    rows = {e.symbol: (e.number, e.name, None, None, None, None) for e in periodictable.elements if e.number}
    for line in mass.element_mass.strip().splitlines():
        columns = line.split("\t")
        number, symbol, text = int(columns[0]), columns[1], columns[3]
        match = re.match(r"\s*([\d.]+)\(([\d.]+)\)\s*(?:\[([\d.]+),\s*([\d.]+)\])?", text)
        if number == 0 or match is None:
            continue
        value, digits, low, high = match.groups()
        places = len(value.partition(".")[2])
        within = float(digits) if "." in digits else int(digits) / 10**places
        interval = (float(low), float(high)) if low else (None, None)
        rows[symbol] = (number, rows[symbol][1], float(value), within, *interval)
    for isotope in (periodictable.D, periodictable.T):
        rows[isotope.symbol] = (1, isotope.name, isotope.mass, None, None, None)
    return rows


def same(left, right):
    if left is None or right is None:
        return left is right
    return left == right if isinstance(left, str) else abs(left - right) <= 1e-12 * abs(right)


def main():
    table, package = ours(), theirs()
    wrong = [f"only in one table: {symbol}" for symbol in table.keys() ^ package.keys()]
    for symbol in table.keys() & package.keys():
        mine, other = list(table[symbol]), list(package[symbol])
        other[1] = BRITISH.get(other[1], other[1])
        if symbol in ("D", "T"):
            mine[3] = None  # the package's table gives the mass without its uncertainty
        if not all(same(a, b) for a, b in zip(mine, other)):
            wrong.append(f"{symbol}: here {mine}, periodictable {periodictable.__version__} {other}")
    print(f"{len(table)} rows compared, {len(wrong)} differ")
    print("\n".join(sorted(wrong)))
    return 1 if wrong or len(table) != 120 else 0


if __name__ == "__main__":
    sys.exit(main())
