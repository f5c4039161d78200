"""Checks the library's tables against the published figures, or writes them (--write).

python3 tests/reference/library.py            fails if a committed value differs
python3 tests/reference/library.py --write    makes src/library/tables/*.tsv anew
"""

import sys
from math import sqrt
from pathlib import Path

import library_solution as solution
import library_sources as published
from library_citations import SOURCES
from library_figures import SPECIES, built, species_of
from library_measured import MEASURED
from library_pieces import POWERS
from library_sources import R_EXACT, T0
from library_species import CODATA, SECOND_LIMITS

ROOT = Path(__file__).resolve().parents[2]
TABLES = ROOT / "src" / "library" / "tables"
LOG_KF = ROOT / "tests" / "published" / "janaf_log_kf.tsv"
TRANSITIONS = ROOT / "tests" / "published" / "transitions.tsv"
REACTIONS = ROOT / "tests" / "published" / "janaf_reactions.tsv"
# What the Gibbs function may leave JANAF's by without a reason, J/(mol K): 0.013 in log10 Kf.
GIBBS_FUNCTION_LIMIT = 0.25
# log10 K of a measured equilibrium may leave that of the species' own records by this without a reason.
MEASURED_LIMIT = 0.35
# Of a ΔfG° in kJ/mol that is remembered beside ΔfH° and S°.
RECALLED_LIMIT = 0.4
HEADS = {
    "species": "id formula phase form names cas hill enthalpy_kj_per_mol entropy_j_per_mol_k "
    "u_gibbs_kj_per_mol u_class sources",
    "heat": "id low_k high_k a_minus2 a_minus1 a0 a1 a2 a3 a4 b_enthalpy b_entropy source",
    "measured": "id terms low_k high_k a_minus2 a_minus1 a0 a1 a2 a3 a4 b_enthalpy b_entropy log10_k "
    "u_log10_k source",
    "sources": "id citation",
}


def second_figures(species):
    """(name, ΔfH°, S°) of every other source that knows the species."""
    if species.is_melt:
        return []
    found = []
    if species.janaf and (species.how[0] != "janaf" or species.crc):
        row = next(row for row in published.janaf(species.janaf) if row[0] == T0)
        found.append(("JANAF", row[4], row[2]))
    if species.phase == "aq":
        row = published.aqueous_ion(species.cas)
        return [("CRC", row[0], row[2])] if row and species.how[0] != "formed" else []
    h, s = published.crc(species.cas, species.phase)
    if species.form == "monoclinic":
        h = s = None
    if h is not None or s is not None:
        found.append(("CRC", h, s))
    if species.how[0] in ("trc", "poling"):
        # What was taken from a table is no second opinion of itself.
        own = built(species.id)["sources"]
        h2, s2 = published.yaws(species.cas)
        taken = "yaws" in own
        found.append(("Yaws", None if taken else h2, None if taken and species.how[0] == "poling" else s2))
    return found


def u_of(ident):
    return uncertainty(species_of(ident), built(ident))[0]


def uncertainty(species, made):
    """u of ΔfG°298 in kJ/mol and how it was got."""
    if species.phase == "aq" or species.how[0] == "measured":
        return solution.uncertainty(species, made, u_of)
    if species.element:
        return 0.0, "element"
    h, s = made["h"], made["s"]
    better = published.atct(species.cas, species.phase)
    if "ATcT" in species.outliers:
        better = None
    others = [row for row in second_figures(species) if row[0] not in species.outliers]
    half_s = max([abs(s - s2) / 2 for _, _, s2 in others if s2] + [0.0])
    of_entropy = T0 * half_s / 1000
    if "atct" in made["sources"]:
        return sqrt((better[1] / 2) ** 2 + of_entropy**2), "atct"
    if better:
        of_h = max(better[1] / 2, abs(h - better[0]) / 2)
        kind = "atct" if better[1] >= abs(h - better[0]) else "sources"
        return sqrt(of_h**2 + of_entropy**2), kind
    apart = [0.0]
    for _, h2, s2 in others:
        difference = (h - h2 if h2 is not None else 0) - T0 * (s - s2 if s2 else 0) / 1000
        apart.append(abs(difference) / 2)
    if species.id in CODATA and CODATA[species.id] / 2 >= max(apart):
        return CODATA[species.id] / 2, "codata"
    if max(apart) >= species.floor:
        return max(apart), "sources"
    return species.floor, "class"


def figure(value):
    return "0" if value == 0 else repr(float(value)).removesuffix(".0")


def make():
    """Every table as lists of rows, sorted by id, and the report of fits and second sources."""
    rows, report = {"species": [], "heat": [], "measured": [], "sources": []}, []
    used = set()
    for species in sorted(SPECIES, key=lambda one: one.id.encode()):
        made = built(species.id)
        u, kind = uncertainty(species, made)
        ids = list(made["sources"]) + [kind] * (kind in ("atct", "codata"))
        ids = list(dict.fromkeys(ids))
        used.update(ids, (piece.source for piece in made["pieces"]))
        rows["species"].append([
            species.id, species.formula, species.phase, species.form, species.names, species.cas,
            solution.hill(species.formula),
            f"{made['h']:.3f}".replace("-0.000", "0.000"), f"{made['s']:.3f}", f"{u:.2g}", kind,
            ";".join(ids)])
        for piece in made["pieces"]:
            rows["heat"].append([species.id, *(figure(v) for v in (
                piece.low, piece.high, *piece.a, piece.b_h, piece.b_s)), piece.source])
        report.append((species, made, u, kind))
    for row in sorted(MEASURED, key=lambda one: one.tied.encode()):
        figures = [figure(v) for v in (row.low, row.high, *row.powers, row.b_h, row.b_s)]
        rows["measured"].append([row.tied, row.terms, *figures, f"{row.log10_k(T0):.3f}", f"{row.u:g}",
                                 row.source])
        used.add(row.source)
    rows["sources"] = [[key, SOURCES[key]] for key in sorted(used)]
    missing = used - set(SOURCES)
    assert not missing, missing
    return rows, report


def piece_at(made, t):
    return next((p for p in made["pieces"] if p.low <= t <= p.high), None)


def gibbs_function_difference(species, made):
    """The largest difference of -[G - H(298)]/T from JANAF's table up to 2000 K, and where."""
    worst, at = 0.0, T0
    # A melt's own H at 298.15 K is carried down; the table counts from its own there.
    standard = next(row[4] for row in published.janaf(species.janaf) if row[0] == T0)
    start = standard if species.is_melt else made["h"]
    for t, _, s, h, _, log_kf in published.janaf(species.janaf):
        piece = piece_at(made, t)
        if log_kf is None or piece is None or t > 2000:
            continue
        here = piece.s(t) - 1000 * (piece.h(t) - start) / t
        difference = here - (s - 1000 * h / t)
        if abs(difference) > abs(worst):
            worst, at = difference, t
    return worst, at


def problems_of(report):
    """Where a record leaves a second source without a reason, or a fit its limits."""
    found = []
    for species, made, u, kind in report:
        if u == 0 and kind != "element":
            found.append(f"{species.id} has no uncertainty")
        line = f"{species.id:22} ΔfH {made['h']:10.3f}  S {made['s']:8.3f}  u {u:.2g} ({kind})"
        for name, h2, s2 in second_figures(species):
            dh = made["h"] - h2 if h2 is not None else 0.0
            ds = made["s"] - s2 if s2 is not None else 0.0
            line += f"  {name} {dh:+.2f} {ds:+.2f}"
            if not species.apart and (abs(dh) > SECOND_LIMITS[0] or abs(ds) > SECOND_LIMITS[1]):
                found.append(f"{species.id} differs from {name} by {dh:.3f} kJ/mol, {ds:.3f} J/mol/K")
        if species.recalled_gibbs is not None:
            gibbs = solution.formation_gibbs(species, made)
            if abs(gibbs - species.recalled_gibbs) > RECALLED_LIMIT:
                found.append(f"{species.id}: ΔfH° and S° give ΔfG° {gibbs:.2f}, not {species.recalled_gibbs}")
        for low, high, cp, h, s, swing in made["worst"]:
            line += f"\n    {low:g} to {high:g} K: Cp {cp:.2%}, H {h:.4f} kJ/mol, S {s:.4f} J/(mol K), between rows {swing:.2%}"
            if cp > 0.003 or h > 0.012 or s > 0.012 or swing > 0.02:
                found.append(f"the fit of {species.id} from {low} to {high} K is poor")
        g = gibbs_apart(species, made)
        if g is not None and abs(g) > SECOND_LIMITS[0] and not species.apart:
            found.append(f"{species.id}: ΔfG° leaves the CRC table's by {g:.2f} kJ/mol")
        if species.phase == "aq":
            more, wrong = solution.problems_of_dissolved(species, made, built)
            line += "\n" + more
            found += wrong
        published_cp = published.crc_heat_capacity(species.cas, species.phase)
        if published_cp and species.form != "monoclinic" and not species.is_melt:
            cp = piece_at(made, T0).cp(T0)
            line += f"\n    Cp(298) {cp:.2f}, CRC {published_cp}"
            if abs(cp / published_cp - 1) > 0.025 and not species.apart:
                found.append(f"{species.id}: Cp(298) is {cp:.2f}, in the CRC table {published_cp}")
        if species.janaf:
            worst, at = gibbs_function_difference(species, made)
            line += f"\n    Gibbs function from JANAF's by at most {worst:+.3f} J/(mol K), at {at:g} K"
            if abs(worst) > GIBBS_FUNCTION_LIMIT and not species.apart:
                found.append(f"{species.id}: the Gibbs function leaves JANAF's by {worst:.3f} at {at} K")
        print(line)
    return found


def problems_of_measured():
    """Where a measured equilibrium names no species, closes a circle, or leaves the species' records."""
    found, tied = [], {row.tied: row for row in MEASURED}
    known = {species.id for species in SPECIES}
    for row in MEASURED:
        parts = row.stoichiometry()
        missing = set(parts) - known
        if missing:
            found.append(f"{row.tied}: no record of {missing}")
            continue
        reached, open_ones = set(), [ident for ident in parts if ident != row.tied]
        while open_ones:
            ident = open_ones.pop()
            if ident in tied and ident not in reached:
                open_ones += [other for other in tied[ident].stoichiometry() if other != ident]
            reached.add(ident)
        if row.tied in reached:
            found.append(f"{row.tied} leads back to itself")
        gibbs = sum(nu * solution.formation_gibbs(species_of(ident), built(ident))
                    for ident, nu in parts.items())
        apart = row.log10_k(T0) + gibbs / solution.RT_LN_10
        print(f"measured {row.tied:22} log10 K {row.log10_k(T0):8.3f}, {apart:+.3f} from the records"
              f"{'  ' + row.apart if row.apart else ''}")
        if abs(apart) > MEASURED_LIMIT and not row.apart:
            found.append(f"{row.tied}: log10 K leaves the species' records by {apart:+.3f}")
    return found


def gibbs_apart(species, made):
    """ΔfG° from ΔfH° and S° here less that of the CRC table, kJ/mol, or None."""
    g = published.crc_gibbs(species.cas, species.phase)
    if g is None or species.form == "monoclinic" or species.is_melt:
        return None
    return solution.formation_gibbs(species, made) - g


def compared_with(report):
    """For each second source the worst differences, and the species that have none."""
    worst, alone = {}, []
    for species, made, _, _ in report:
        others = second_figures(species)
        better = published.atct(species.cas, species.phase)
        others += [("ATcT", better[0], None)] if better else []
        own = {key.upper() for key in made["sources"]}
        others = [row for row in others if row[0].upper() not in own]
        if not others and not species.element and species.phase != "aq":
            alone.append(species.id)
        g = gibbs_apart(species, made)
        if g is not None and not species.apart:
            worst.setdefault(("CRC", "ΔfG°"), []).append((abs(g), species.id))
        for name, h, s in others:
            for what, here, there in (("ΔfH°", made["h"], h), ("S°", made["s"], s)):
                if there is not None and not species.apart:
                    rows = worst.setdefault((name, what), [])
                    rows.append((abs(here - there), species.id))
    for (name, what), rows in sorted(worst.items()):
        text = ", ".join(f"{ident} {apart:.2f}" for apart, ident in sorted(rows)[-3:][::-1])
        print(f"{name} {what}: {len(rows)} compared and not set apart, the worst: {text}")
    print(f"no second source: {', '.join(alone)}")


def read(name):
    lines = (TABLES / f"{name}.tsv").read_text().splitlines()
    if lines[0].split("\t") != HEADS[name].split():
        return None
    return [line.split("\t") for line in lines[1:]]


def same(a, b):
    """Equal text, or figures of a refit that agree to the last digits the fit can give."""
    if a == b:
        return True
    x, y = published.number(a), published.number(b)
    return x is not None and y is not None and abs(x - y) <= 1e-7 * max(abs(x), abs(y))


def check_tables(rows):
    found = []
    for name, wanted in rows.items():
        have = read(name)
        if have is None or len(have) != len(wanted):
            found.append(f"{name}.tsv has another shape: write it anew")
            continue
        for old, new in zip(have, wanted):
            equal = same if old[-1] in ("janaf", "jacobs", "trc") else (lambda a, b: a == b)
            if len(old) != len(new) or not all(equal(a, b) for a, b in zip(old, new)):
                found.append(f"{name}.tsv differs:\n  committed {old}\n  published {new}")
    return found


def log_kf_lines():
    """Every published figure that the test reactions need: log Kf at each T, ΔfH° at 298.15 K."""
    tables = {species.id: species.janaf for species in SPECIES}
    wanted = {}
    for line in REACTIONS.read_text().splitlines():
        if line.startswith("#") or line.startswith("terms"):
            continue
        terms, temperatures, *_ = line.split("\t")
        for ident in terms.split()[1::2]:
            wanted.setdefault(ident, {298.15}).update(float(t) for t in temperatures.split())
    lines = [
        "# Figures of the NIST-JANAF Thermochemical Tables, 4th edition, J. Phys. Chem. Ref. Data "
        "Monograph 9, 1998: log10 Kf, and the enthalpy of formation in kJ/mol at the same T.",
        "id\ttemperature_k\tlog10_kf\tformation_enthalpy_kj_per_mol",
    ]
    for ident in sorted(wanted):
        for t in sorted(wanted[ident]):
            row = published.janaf_at(tables[ident], t)
            lines.append(f"{ident}\t{t:g}\t{row[5]:.3f}\t{row[4]:.3f}")
    return lines


def transition_lines():
    """Every transition that a record passes, with the enthalpy that its table gives."""
    lines = [
        "# Enthalpies of transition inside the range of a record, from the NIST-JANAF tables, J/mol.",
        "id\ttemperature_k\tenthalpy_j_per_mol",
    ]
    for species in sorted(SPECIES, key=lambda one: one.id.encode()):
        for t, jump in built(species.id)["transitions"]:
            lines.append(f"{species.id}\t{t:g}\t{1000 * jump:g}")
    return lines


def main():
    assert POWERS[0] == -2 and R_EXACT > 8
    rows, report = make()
    found = problems_of(report) + problems_of_measured()
    if "--write" in sys.argv:
        for name, lines in rows.items():
            text = "\n".join("\t".join(line) for line in [HEADS[name].split(), *lines])
            (TABLES / f"{name}.tsv").write_text(text + "\n")
        LOG_KF.write_text("\n".join(log_kf_lines()) + "\n")
        TRANSITIONS.write_text("\n".join(transition_lines()) + "\n")
    found += check_tables(rows)
    if TRANSITIONS.read_text().splitlines() != transition_lines():
        found.append("transitions.tsv differs from the published tables")
    if LOG_KF.read_text().splitlines() != log_kf_lines():
        found.append("janaf_log_kf.tsv differs from the published tables")
    compared_with(report)
    for line in found:
        print("WRONG:", line)
    print(f"{len(rows['species'])} species, {len(rows['heat'])} pieces, {len(found)} problems")
    return 1 if found else 0


if __name__ == "__main__":
    sys.exit(main())
