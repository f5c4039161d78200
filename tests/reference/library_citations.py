"""The sources of the library in full."""

SOURCES = {
    "tm4513": "McBride, Gordon and Reno, Coefficients for Calculating Thermodynamic and Transport "
    "Properties of Individual Species, NASA Technical Memorandum 4513, 1993. Cp/R and S/R as "
    "published; H set so that ΔfH°298 in J/mol is as published, whatever R it was made with; "
    "the upper piece joined to the lower so that H and S are continuous.",
    "janaf": "Chase, NIST-JANAF Thermochemical Tables, 4th edition, Journal of Physical and Chemical "
    "Reference Data Monograph 9, 1998. Cp fitted piece by piece; H and S exact at 298.15 K "
    "and at the ends of the pieces.",
    "atct": "Ruscic and Bross, Active Thermochemical Tables, version 1.112. Its ΔfH°298 replaces the "
    "older one where they differ by more than 0.15 kJ/mol, and its uncertainty is used (95 % "
    "half-width, halved).",
    "crc": "CRC Handbook of Chemistry and Physics, Standard Thermodynamic Properties of Chemical "
    "Substances.",
    "poling": "Poling, Prausnitz and O'Connell, The Properties of Gases and Liquids, 5th edition, "
    "McGraw-Hill, 2001: Cp of ideal gases; Antoine constants.",
    "zabransky": "Zábranský, Růžička, Majer and Domalski, Heat Capacity of Liquids, Journal of Physical "
    "and Chemical Reference Data Monograph 6, 1996.",
    "perry": "Perry's Chemical Engineers' Handbook, table 2-151, Heat Capacities of Inorganic "
    "Compounds.",
    "jacobs": "Jacobs, Kerrick and Krupka, The high-temperature heat capacity of natural calcite, "
    "Physics and Chemistry of Minerals 7 (1981) 55: Cp = -184.79 + 0.32322 T - 3688200/T^2 - "
    "1.2974e-4 T^2 + 3883.5/T^0.5 J/(mol K), to 1200 K. Recalled from memory; it gives 83.47 "
    "at 298.15 K (CRC table 83.5) and agrees with Perry's table 2-151 within its 3 %. Written "
    "here in powers of T.",
    "codata": "Cox, Wagman and Medvedev, CODATA Key Values for Thermodynamics, Hemisphere, 1989: 95 % "
    "half-widths, and the figures of ions, recalled from memory; u is half of them.",
    "trc": "Frenkel, Kabo, Marsh, Roganov and Wilhoit, Thermodynamics of Organic Compounds in the Gas "
    "State, Thermodynamics Research Center, 1994: Cp and S of ideal gases, Cp written here in powers "
    "of T within 0.2 %.",
    "yaws": "Yaws, Thermophysical Properties of Chemicals and Hydrocarbons, 2nd edition, Gulf Professional "
    "Publishing, 2014: ΔfH° and S° of ideal gases.",
    "crc_ions": "CRC Handbook of Chemistry and Physics, Thermodynamic Properties of Aqueous Ions: "
    "ΔfG and S as published, ΔfH from them; rounded to 0.1 kJ/mol.",
    "nbs": "Wagman et al., The NBS Tables of Chemical Thermodynamic Properties, Journal of Physical and "
    "Chemical Reference Data 11, supplement 2, 1982. Recalled from memory.",
    "robie": "Robie and Hemingway, Thermodynamic Properties of Minerals, U.S. Geological Survey Bulletin "
    "2131, 1995. Recalled from memory.",
    "kelley": "Kelley, High-Temperature Heat-Content, Heat-Capacity and Entropy Data, U.S. Bureau of Mines "
    "Bulletin 584, 1960, and its successors: Cp above room temperature, enthalpies of fusion and transition. "
    "Recalled from memory; at 298.15 K within 1.2 % of Cp of the other source.",
    "carbonates": "Cp as the sum of those of calcite and magnesite by Kelley, 1960. Recalled from memory; at "
    "298.15 K within 0.1 % of the measured one.",
    "vibrations": "Cp of the rigid molecule with harmonic vibrations, in powers of T within 0.2 %; fundamental "
    "frequencies of Nakamoto, Infrared and Raman Spectra of Inorganic and Coordination Compounds, Wiley, 1986, and "
    "of Shimanouchi, NSRDS-NBS 39, 1972, recalled from memory; within 2 % of the CRC table's Cp at 298.15 K.",
    "harvie": "Harvie, Møller and Weare, Geochimica et Cosmochimica Acta 48 (1984) 723: solubility of salts at "
    "25 °C; enthalpies of the NBS tables. Recalled from memory.",
    "ellerton": "Ellerton and Dunlop, Journal of Physical Chemistry 70 (1966) 1831: activity of urea in water, "
    "with 20 mol/kg at saturation at 25 °C. Recalled from memory.",
    "hamborg": "Hamborg and Versteeg, Journal of Chemical and Engineering Data 54 (2009) 1318, and Kamps and "
    "Maurer, 41 (1996) 1505: pKa of methyldiethanolamine. Recalled from memory.",
    "mccann": "McCann, Archives of Oral Biology 13 (1968) 987: fluorapatite. Recalled from memory.",
    "buffers": "Goldberg, Kishore and Lennen, Thermodynamic quantities for the ionization reactions of buffers, "
    "Journal of Physical and Chemical Reference Data 31 (2002) 231. Recalled from memory.",
    "palmer_iodine": "Palmer, Ramette and Mesmer, Journal of Solution Chemistry 13 (1984) 673: the triiodide ion, log "
    "K = 555/T + 7.355 - 2.575 log T. Recalled from memory.",
    "powell_mercury": "Powell, Brown, Byrne, Gajda, Hefter, Sjöberg and Wanner, Australian Journal of Chemistry 57 "
    "(2004) 993 and Pure and Applied Chemistry 77 (2005) 739: mercury(II) with chloride and "
    "hydroxide. Recalled from memory.",
    "gunnarsson": "Gunnarsson and Arnórsson, Geochimica et Cosmochimica Acta 64 (2000) 2295: solubility of "
    "amorphous silica, 8 to 310 °C, and of quartz after Rimstidt, 0 to 350 °C. Recalled from memory.",
    "ball": "Ball and Nordstrom, Open-File Report 91-183, U.S. Geological Survey, 1991: assessed constants of "
    "ions and minerals of trace metals in natural waters. Recalled from memory.",
    "ohlinger": "Ohlinger, Young and Schroeder, Water Research 32 (1998) 3607: struvite, log K -13.26; enthalpy "
    "of Bhuiyan, Mavinic and Beckie, Environmental Technology 28 (2007) 1015. Recalled from memory.",
    "baes": "Baes and Mesmer, The Hydrolysis of Cations, Wiley, 1976. Recalled from memory.",
    "mcdowell": "McDowell, Brown and Sutter, Inorganic Chemistry 10 (1971) 1638, and McDowell, Gregory and Brown, "
    "Journal of Research of the National Bureau of Standards 81A (1977) 273: anhydrous dicalcium "
    "phosphate and hydroxyapatite, 5 to 37 °C. Recalled from memory.",
    "amines": "Estimate: ΔfH and S of the gas in Yaws' handbook, carried into water by the vapour pressure and "
    "heat of solution. From memory; only the pKa of the amine is sound.",
    "iapws_kw": "IAPWS R11-07, Release on the Ionization Constant of H2O, 2007 (Bandura and Lvov, Journal of "
    "Physical and Chemical Reference Data 35 (2006) 15): written here as A + B T + C/T + D log10 T + E/T² "
    "within 0.001 over 0 to 100 °C. Recalled from memory, and borne out by its pKw at 0, 25 and 100 °C.",
    "plummer": "Plummer and Busenberg, Geochimica et Cosmochimica Acta 46 (1982) 1011: CO2, its acid "
    "constants, calcite, aragonite and calcium's ion pairs, 0 to 90 °C. Recalled from memory.",
    "nordstrom": "Nordstrom, Plummer, Langmuir, Busenberg, May, Jones and Parkhurst, Revised Chemical "
    "Equilibrium Data for Major Water-Mineral Reactions, ACS Symposium Series 416 (1990) 398. Recalled "
    "from memory.",
    "nist46": "Smith and Martell, Critical Stability Constants, volumes 4 to 6, Plenum, 1976 to 1989. "
    "Recalled from memory.",
    "bates_p1": "Bates, Journal of Research of the National Bureau of Standards 47 (1951) 127: pK1 of "
    "phosphoric acid. Recalled from memory.",
    "bates_p2": "Bates and Acree, Journal of Research of the National Bureau of Standards 30 (1943) 129: pK2 "
    "of phosphoric acid. Recalled from memory.",
    "millero": "Millero, Plese and Fernandez, Limnology and Oceanography 33 (1988) 269: pK1 of hydrogen "
    "sulfide. Recalled from memory.",
    "izatt": "Izatt, Christensen, Pack and Bench, Inorganic Chemistry 1 (1962) 828: pK of hydrogen cyanide. "
    "Recalled from memory.",
    "morris": "Morris, Journal of Physical Chemistry 70 (1966) 3798: pK of hypochlorous acid. Recalled from "
    "memory.",
    "owen": "Owen and King, Journal of the American Chemical Society 65 (1943) 1612: pK of boric acid. "
    "Recalled from memory.",
    "harned_acetic": "Harned and Ehlers, Journal of the American Chemical Society 55 (1933) 652: pK of acetic "
    "acid, 1170.48/T - 3.1649 + 0.013399 T. Recalled from memory.",
    "harned_formic": "Harned and Embree, Journal of the American Chemical Society 56 (1934) 1042: pK of formic "
    "acid, 1342.85/T - 5.2743 + 0.015168 T. Recalled from memory.",
    "edwards": "Edwards, Maurer, Newman and Prausnitz, AIChE Journal 24 (1978) 966: carbamate, rounded. "
    "Recalled from memory.",
    "reardon": "Reardon and Armstrong, Geochimica et Cosmochimica Acta 51 (1987) 63: celestite. Recalled from "
    "memory.",
    "gregory": "Gregory, Moreno and Brown, Journal of Research of the National Bureau of Standards 74A (1970) "
    "461: brushite. Recalled from memory.",
    "parker": "Parker and Khodakovskii, Journal of Physical and Chemical Reference Data 24 (1995) 1699: iron "
    "ions. Recalled from memory.",
    "kopp": "Kopp's rule: Cp of a solid as the sum of its elements' contributions, as in Perry's Chemical "
    "Engineers' Handbook; within 20 %, used over a few kelvin only. From memory.",
    "majzlan": "Majzlan, Navrotsky and Schwertmann, Geochimica et Cosmochimica Acta 68 (2004) 1049, and "
    "Majzlan et al., American Mineralogist 88 (2003) 846: goethite. Recalled from memory.",
    "sander": "Sander, Compilation of Henry's law constants for water as solvent, Atmospheric Chemistry "
    "and Physics 15 (2015) 4399: averages over the entries, with the gas of this library.",
    "shock": "Shock, Helgeson and Sverjensky, Geochimica et Cosmochimica Acta 52 (1988) 2009, 53 (1989) "
    "2157 and 54 (1990) 915: Cp of dissolved species at 25 °C. Recalled from memory.",
    "bates": "Bates and Pinching, Journal of Research of the National Bureau of Standards 42 (1949) 419: "
    "pKa of the ammonium ion, 9.245 at 25 °C, and 52.21 kJ/mol. Recalled from memory.",
    "clegg": "Clegg and Brimblecombe, Journal of Physical Chemistry 93 (1989) 7237: Henry's constant of "
    "ammonia, 60 mol/(kg bar) at 25 °C, and -34.2 kJ/mol. Recalled from memory.",
    "broene": "Broene and De Vries, Journal of the American Chemical Society 69 (1947) 1644: pKa of "
    "hydrogen fluoride, 3.17 at 25 °C; enthalpy of the NBS tables. Recalled from memory.",
    "wilhelm": "Wilhelm, Battino and Wilcock, Chemical Reviews 77 (1977) 219: solubility of methane, "
    "0.0014 mol/(kg bar) at 25 °C, and -13.8 kJ/mol. Recalled from memory.",
    "goldberg": "Goldberg and Parker, Journal of Research of the National Bureau of Standards 90 (1985) 341: "
    "pK1 1.857 and pK2 7.172 of sulfur dioxide, -17.80 and -3.65 kJ/mol. Recalled from memory.",
    "palmer": "Palmer and Wesolowski, Geochimica et Cosmochimica Acta 56 (1992) 1093: gibbsite in acid, "
    "log K 7.74 at 25 °C and -105 kJ/mol. Recalled from memory.",
    "busenberg": "Busenberg, Plummer and Parker, Geochimica et Cosmochimica Acta 48 (1984) 2021, and "
    "Busenberg and Plummer, 50 (1986) 2225: log Ksp of strontianite -9.271 and witherite -8.562, -1.67 "
    "and 2.94 kJ/mol. Recalled from memory.",
    "handbook": "Common practice: Cp of liquid sulfur trioxide is near 258, of ammonia 77, of sulfur dioxide 87, of "
    "chlorine 67 J/(mol K). From memory.",
}
