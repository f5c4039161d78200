"""Hydrates, basic carbonates and oxides of the NBS tables, recalled from memory, near room temperature.

The script checks that ΔfG°, remembered too, agrees with ΔfH° and S° within 0.4 kJ/mol.
"""

from library_species import CLASSES, Species


def nbs(formula, names, cas, enthalpy, entropy, gibbs, heat_capacity, kind="salt", high=310, **more):
    pieces = ((288.15, high, (heat_capacity,)),)
    how = ("recalled", enthalpy, entropy, pieces, "nbs")
    return Species(formula, "s", names, cas, how, floor=CLASSES[kind], recalled_gibbs=gibbs, **more)


HYDRATES = [
    nbs("MgCl2·H2O", "magnesium chloride monohydrate", "", -966.63, 137.2, -861.74, 115.27),
    nbs("MgCl2·2H2O", "magnesium chloride dihydrate", "", -1279.72, 179.9, -1118.00, 159.20),
    nbs("MgCl2·4H2O", "magnesium chloride tetrahydrate", "", -1898.99, 264.0, -1623.29, 241.42),
    nbs("MgCl2·6H2O", "bischofite;magnesium chloride hexahydrate", "7791-18-6", -2499.02, 366.1, -2114.64, 315.06),
    nbs("ZnSO4·7H2O", "goslarite;white vitriol;zinc sulfate heptahydrate;zinc sulphate heptahydrate",
        "7446-20-0", -3077.75, 388.7, -2562.67, 383.42),
    nbs("CuSO4·H2O", "copper(II) sulfate monohydrate;copper(II) sulphate monohydrate", "10257-54-2",
        -1085.83, 146.0, -918.11, 134.0, high=373.15),
    nbs("NiSO4·6H2O", "nickel(II) sulfate hexahydrate;nickel(II) sulphate hexahydrate", "10101-97-0",
        -2682.8, 334.5, -2224.6, 327.9),
    nbs("NiSO4·7H2O", "nickel(II) sulfate heptahydrate;nickel(II) sulphate heptahydrate", "10101-98-1",
        -2976.33, 378.95, -2461.83, 364.6),
    nbs("CoSO4·7H2O", "cobalt(II) sulfate heptahydrate;cobalt(II) sulphate heptahydrate", "10026-24-1",
        -2979.93, 406.1, -2473.4, 390.5),
    nbs("NaOH·H2O", "sodium hydroxide monohydrate", "12200-64-5", -734.54, 99.50, -629.34, 90.2),
    nbs("Ca(H2PO4)2·H2O", "monocalcium phosphate monohydrate;calcium dihydrogen phosphate monohydrate",
        "10031-30-8", -3409.67, 259.8, -3058.18, 258.82, kind="mineral"),
    nbs("MgCO3·3H2O", "nesquehonite;magnesium carbonate trihydrate", "14457-83-1", -1977.26, 195.6,
        -1723.9, 237.8, kind="mineral"),
    nbs("Cu2(OH)2CO3", "malachite;basic copper carbonate", "12069-69-1", -1051.4, 186.2, -893.6, 154.0,
        kind="mineral", high=400),
    nbs("As2O3", "arsenolite;arsenic trioxide;white arsenic", "1327-53-3", -656.97, 107.1, -576.2, 95.65,
        kind="mineral", high=400, form="arsenolite"),
    # Cp of Perry's handbook in the place of the constant.
    Species("Sb2O3", "s", "valentinite;antimony trioxide", "1309-64-4",
            ("recalled", -708.77, 123.01, ((298.15, 929, (79.91, 0.07155)),), "nbs", "perry"),
            form="valentinite", floor=CLASSES["mineral"], recalled_gibbs=-626.5),
    # Matte: chalcocite with both its transitions, and its melt.
    Species("Cu2S", "s", "chalcocite;copper(I) sulfide;copper(I) sulphide", "22205-45-4",
            ("recalled_cp", ((298.15, 376, (52.84, 0.07874)), (376, 720, (112.05, -0.03075)),
                             (720, 1400, (85.02,))), "kelley", ((376, 3.85), (720, 0.84))),
            floor=CLASSES["mineral"]),
    Species("Cu2S", "l", "molten copper(I) sulfide;molten copper(I) sulphide;copper matte", "22205-45-4",
            ("melted", "Cu2S.s", 10.9, 89.1, 1800), floor=CLASSES["mineral"]),
]
