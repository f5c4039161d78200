"""Equilibria in water that were measured directly, with the temperature terms that were published.

One species of each is tied: where a reaction goes through it, the measured K and the other species
stand in for its own ΔfG°. The others never lead back to it. log10 K is for p° = 1 bar, m° = 1 mol/kg.
"""

from dataclasses import dataclass
from math import log, log10

from library_measured_water import WATER
from library_sources import R_EXACT, T0

LN_10 = log(10)
BAR_PER_ATM = log10(1.01325)  # what log10 K of a dissolving gas loses from 1/atm to 1/bar


@dataclass
class Measured:
    tied: str
    terms: str
    powers: tuple  # a_-2 to a_4 of ΔCp/R
    b_h: float
    b_s: float
    low: float
    high: float
    u: float  # of log10 K at 298.15 K
    source: str
    apart: str = ""  # why the species' own records may lead elsewhere

    def log10_k(self, t):
        a = self.powers
        gibbs = (self.b_h / t + a[2] * (1 - log(t)) - self.b_s - a[3] * t / 2 - a[4] * t**2 / 6
                 - a[0] / t**2 / 2)
        return -gibbs / LN_10

    def enthalpy(self, t):
        """ΔrH° in kJ/mol."""
        a = self.powers
        over_r = -a[0] / t + a[2] * t + a[3] * t**2 / 2 + a[4] * t**3 / 3 + self.b_h
        return R_EXACT * over_r / 1000

    def stoichiometry(self):
        cells = self.terms.split()
        return {ident: float(nu) for nu, ident in zip(cells[::2], cells[1::2])}


def fit(tied, terms, coefficients, low, high, u, source, apart=""):
    """log10 K = A + B T + C/T + D log10 T + E/T² + F T², as the papers give it."""
    a, b, c, d, e, f = (*coefficients, 0, 0, 0, 0, 0, 0)[:6]
    powers = (2 * LN_10 * e, 0, d, 2 * LN_10 * b, 6 * LN_10 * f, 0, 0)
    return Measured(tied, terms, powers, -LN_10 * c, LN_10 * a + d, low, high, u, source, apart)


def at_25(tied, terms, log_k, enthalpy_kj, u, source, low=273.15, high=323.15, heat=0.0, apart=""):
    """log10 K and ΔrH° at 25 °C, with ΔrCp in J/(mol K) where one is known."""
    a0 = heat / R_EXACT
    b_h = 1000 * enthalpy_kj / R_EXACT - a0 * T0
    b_s = 1000 * enthalpy_kj / (R_EXACT * T0) + LN_10 * log_k - a0 * log(T0)
    return Measured(tied, terms, (0, 0, a0, 0, 0, 0, 0), b_h, b_s, low, high, u, source, apart)


WARM = {"low": 273.15, "high": 363.15}
HOT = {"low": 273.15, "high": 373.15}

ACIDS = [
    fit("OH^-.aq", "-1 H2O.l 1 H^+.aq 1 OH^-.aq", WATER, **HOT, u=0.005, source="iapws_kw"),
    fit("CO2.aq", "-1 CO2.g 1 CO2.aq", (108.3865 - BAR_PER_ATM, 0.01985076, -6919.53, -40.45154, 669365),
        **WARM, u=0.005, source="plummer"),
    fit("HCO3^-.aq", "-1 CO2.aq -1 H2O.l 1 H^+.aq 1 HCO3^-.aq",
        (-356.3094, -0.06091964, 21834.37, 126.8339, -1684915), **WARM, u=0.005, source="plummer"),
    fit("CO3^2-.aq", "-1 HCO3^-.aq 1 H^+.aq 1 CO3^2-.aq",
        (-107.8871, -0.03252849, 5151.79, 38.92561, -563713.9), **WARM, u=0.01, source="plummer"),
    fit("NH4^+.aq", "-1 NH4^+.aq 1 NH3.aq 1 H^+.aq", (0.6322, -0.001225, -2835.76), 273.15, 323.15,
        u=0.005, source="bates"),
    fit("H2PO4^-.aq", "-1 H3PO4.aq 1 H2PO4^-.aq 1 H^+.aq", (4.5535, -0.013486, -799.31), 273.15, 333.15,
        u=0.01, source="bates_p1"),
    fit("HPO4^2-.aq", "-1 H2PO4^-.aq 1 HPO4^2-.aq 1 H^+.aq", (5.3541, -0.01984, -1979.5), 273.15, 333.15,
        u=0.01, source="bates_p2"),
    at_25("PO4^3-.aq", "-1 HPO4^2-.aq 1 PO4^3-.aq 1 H^+.aq", -12.35, 14.7, 0.03, "nordstrom"),
    fit("HSO4^-.aq", "-1 H^+.aq -1 SO4^2-.aq 1 HSO4^-.aq", (-56.889, 0.006473, 2307.9, 19.8858), **WARM,
        u=0.02, source="nordstrom"),
    at_25("HSO3^-.aq", "-1 SO2.aq -1 H2O.l 1 HSO3^-.aq 1 H^+.aq", -1.857, -17.80, 0.02, "goldberg",
          heat=-272.0),
    at_25("SO3^2-.aq", "-1 HSO3^-.aq 1 SO3^2-.aq 1 H^+.aq", -7.172, -3.65, 0.02, "goldberg", heat=-262.0),
    fit("HS^-.aq", "-1 H2S.aq 1 HS^-.aq 1 H^+.aq", (-32.55, -0.02722, -1519.44, 15.672), 273.15, 373.15,
        u=0.03, source="millero"),
    at_25("HF.aq", "-1 HF.aq 1 H^+.aq 1 F^-.aq", -3.17, -12.6, 0.02, "broene"),
    at_25("HF2^-.aq", "-1 HF.aq -1 F^-.aq 1 HF2^-.aq", 0.58, 4.5, 0.05, "nist46",
          apart="the CRC table's HF2^- belongs to its own fluoride, 2.7 kJ/mol above CODATA's"),
    at_25("CN^-.aq", "-1 HCN.aq 1 CN^-.aq 1 H^+.aq", -9.21, 43.6, 0.02, "izatt",
          apart="the CRC table's cyanide belongs to an older HCN, 5.8 kJ/mol above ATcT's"),
    fit("ClO^-.aq", "-1 HOCl.aq 1 ClO^-.aq 1 H^+.aq", (10.0686, -0.0253, -3000.0), 273.15, 308.15,
        u=0.02, source="morris"),
    at_25("NO2^-.aq", "-1 HNO2.aq 1 NO2^-.aq 1 H^+.aq", -3.15, 8.0, 0.05, "nist46",
          apart="dissolved HNO2 hangs on its gas, whose enthalpy is known to 1.5 kJ/mol"),
    at_25("B(OH)4^-.aq", "-1 H3BO3.aq -1 H2O.l 1 B(OH)4^-.aq 1 H^+.aq", -9.237, 13.8, 0.01, "owen"),
    fit("H3SiO4^-.aq", "-1 H4SiO4.aq 1 H3SiO4^-.aq 1 H^+.aq",
        (-302.3724, -0.050698, 15669.69, 108.18466, -1119669), 273.15, 373.15, u=0.05, source="nordstrom"),
    fit("CH3COO^-.aq", "-1 CH3COOH.aq 1 CH3COO^-.aq 1 H^+.aq", (3.1649, -0.013399, -1170.48), 273.15,
        333.15, u=0.005, source="harned_acetic"),
    fit("HCOO^-.aq", "-1 HCOOH.aq 1 HCOO^-.aq 1 H^+.aq", (5.2743, -0.015168, -1342.85), 273.15, 333.15,
        u=0.005, source="harned_formic"),
    at_25("HCrO4^-.aq", "-1 H^+.aq -1 CrO4^2-.aq 1 HCrO4^-.aq", 6.50, -2.9, 0.03, "nist46"),
    at_25("Cr2O7^2-.aq", "-2 HCrO4^-.aq 1 Cr2O7^2-.aq 1 H2O.l", 1.53, -20.0, 0.05, "nist46"),
    at_25("NH2COO^-.aq", "-1 NH3.aq -1 HCO3^-.aq 1 NH2COO^-.aq 1 H2O.l", 0.37, -18.0, 0.1, "edwards"),
    at_25("NH3.aq", "-1 NH3.g 1 NH3.aq", 1.778, -34.2, 0.01, "clegg"),
]
FINE = "the tables have a well-crystallised solid, the solubility is of what precipitates"

MINERALS = [
    fit("CaCO3.s.calcite", "-1 CaCO3.s.calcite 1 Ca^2+.aq 1 CO3^2-.aq",
        (-171.9065, -0.077993, 2839.319, 71.595), **WARM, u=0.01, source="plummer"),
    fit("CaCO3.s.aragonite", "-1 CaCO3.s.aragonite 1 Ca^2+.aq 1 CO3^2-.aq",
        (-171.9773, -0.077993, 2903.293, 71.595), **WARM, u=0.01, source="plummer"),
    at_25("CaMg(CO3)2.s", "-1 CaMg(CO3)2.s 1 Ca^2+.aq 1 Mg^2+.aq 2 CO3^2-.aq", -17.09, -39.5, 0.2,
          "nordstrom"),
    fit("SrCO3.s", "-1 SrCO3.s 1 Sr^2+.aq 1 CO3^2-.aq", (155.0305, 0, -7239.594, -56.58638), **WARM,
        u=0.01, source="busenberg"),
    fit("BaCO3.s", "-1 BaCO3.s 1 Ba^2+.aq 1 CO3^2-.aq", (607.642, 0.121098, -20011.25, -236.4948), **WARM,
        u=0.01, source="busenberg"),
    at_25("FeCO3.s", "-1 FeCO3.s 1 Fe^2+.aq 1 CO3^2-.aq", -10.89, -10.4, 0.1, "nordstrom",
          apart="the CRC table's siderite belongs to the older iron, 11.6 kJ/mol higher"),
    at_25("MnCO3.s", "-1 MnCO3.s 1 Mn^2+.aq 1 CO3^2-.aq", -11.13, -6.0, 0.2, "nordstrom",
          apart="measured values spread from -10.6 to -11.4"),
    at_25("PbCO3.s", "-1 PbCO3.s 1 Pb^2+.aq 1 CO3^2-.aq", -13.13, 20.3, 0.1, "nordstrom"),
    at_25("ZnCO3.s", "-1 ZnCO3.s 1 Zn^2+.aq 1 CO3^2-.aq", -10.0, -18.3, 0.3, "nordstrom"),
    fit("CaSO4·2H2O.s", "-1 CaSO4·2H2O.s 1 Ca^2+.aq 1 SO4^2-.aq 2 H2O.l", (68.2401, 0, -3221.51, -25.0627),
        **WARM, u=0.02, source="nordstrom"),
    fit("CaSO4.s.anhydrite", "-1 CaSO4.s.anhydrite 1 Ca^2+.aq 1 SO4^2-.aq",
        (197.52, 0, -8669.8, -69.835), **WARM, u=0.05, source="nordstrom"),
    fit("SrSO4.s", "-1 SrSO4.s 1 Sr^2+.aq 1 SO4^2-.aq",
        (-14805.9622, -2.4660924, 756968.533, 5436.3588, -40553604), **WARM, u=0.02, source="reardon"),
    fit("BaSO4.s", "-1 BaSO4.s 1 Ba^2+.aq 1 SO4^2-.aq", (136.035, 0, -7680.41, -48.595), **WARM, u=0.02,
        source="nordstrom"),
    at_25("PbSO4.s", "-1 PbSO4.s 1 Pb^2+.aq 1 SO4^2-.aq", -7.79, 9.0, 0.05, "nordstrom"),
    fit("CaF2.s", "-1 CaF2.s 1 Ca^2+.aq 2 F^-.aq", (66.348, 0, -4298.2, -25.271), **WARM, u=0.1,
        source="nordstrom"),
    fit("SiO2.s.quartz", "-1 SiO2.s.quartz -2 H2O.l 1 H4SiO4.aq", (0.41, 0, -1309), 273.15, 573.15, u=0.12,
        source="nordstrom"),
    at_25("Al(OH)3.s.gibbsite", "-1 Al(OH)3.s.gibbsite -3 H^+.aq 1 Al^3+.aq 3 H2O.l", 7.74, -105.0, 0.1,
          "palmer"),
    at_25("Ca(OH)2.s", "-1 Ca(OH)2.s -2 H^+.aq 1 Ca^2+.aq 2 H2O.l", 22.80, -128.4, 0.1, "nordstrom"),
    at_25("Mg(OH)2.s", "-1 Mg(OH)2.s -2 H^+.aq 1 Mg^2+.aq 2 H2O.l", 16.84, -113.4, 0.15, "nordstrom"),
    at_25("FeOOH.s.goethite", "-1 FeOOH.s.goethite -3 H^+.aq 1 Fe^3+.aq 2 H2O.l", -1.0, -60.6, 0.3,
          "nordstrom",
          apart="measured values spread from -1.0 to 0.5 with the size of the crystals"),
    at_25("Zn(OH)2.s", "-1 Zn(OH)2.s -2 H^+.aq 1 Zn^2+.aq 2 H2O.l", 11.5, -90.0, 0.2, "nist46",
          apart="measured values spread from 11.2 to 12.5 with the form of the solid"),
    at_25("Cu(OH)2.s", "-1 Cu(OH)2.s -2 H^+.aq 1 Cu^2+.aq 2 H2O.l", 8.67, -64.5, 0.2, "nist46", apart=FINE),
    at_25("Ni(OH)2.s", "-1 Ni(OH)2.s -2 H^+.aq 1 Ni^2+.aq 2 H2O.l", 10.8, -90.0, 0.3, "nist46", apart=FINE),
    at_25("Fe(OH)3.s", "-1 Fe(OH)3.s -3 H^+.aq 1 Fe^3+.aq 3 H2O.l", 4.891, -70.0, 0.5, "nordstrom",
          apart=FINE),
    at_25("CaHPO4·2H2O.s", "-1 CaHPO4·2H2O.s 1 Ca^2+.aq 1 HPO4^2-.aq 2 H2O.l", -6.59, 6.2, 0.05, "gregory"),
    at_25("AgCl.s", "-1 AgCl.s 1 Ag^+.aq 1 Cl^-.aq", -9.75, 65.5, 0.01, "nist46"),
    at_25("AgBr.s", "-1 AgBr.s 1 Ag^+.aq 1 Br^-.aq", -12.28, 84.4, 0.02, "nist46"),
    at_25("AgI.s", "-1 AgI.s 1 Ag^+.aq 1 I^-.aq", -16.08, 111.2, 0.02, "nist46"),
    at_25("PbCl2.s", "-1 PbCl2.s 1 Pb^2+.aq 2 Cl^-.aq", -4.78, 26.0, 0.05, "nist46"),
    at_25("PbI2.s", "-1 PbI2.s 1 Pb^2+.aq 2 I^-.aq", -8.10, 62.0, 0.1, "nist46"),
    at_25("Hg2Cl2.s", "-1 Hg2Cl2.s 1 Hg2^2+.aq 2 Cl^-.aq", -17.91, 98.0, 0.05, "nist46"),
    at_25("NaCl.s", "-1 NaCl.s 1 Na^+.aq 1 Cl^-.aq", 1.582, 3.84, 0.02, "nordstrom"),
    at_25("KCl.s", "-1 KCl.s 1 K^+.aq 1 Cl^-.aq", 0.90, 17.2, 0.02, "nist46"),
    at_25("Na2SO4·10H2O.s", "-1 Na2SO4·10H2O.s 2 Na^+.aq 1 SO4^2-.aq 10 H2O.l", -1.114, 79.4, 0.05,
          "nordstrom", high=305.5),
    at_25("ZnS.s.sphalerite", "-1 ZnS.s.sphalerite -1 H^+.aq 1 Zn^2+.aq 1 HS^-.aq", -11.618, 34.5, 0.3,
          "nordstrom"),
]

COMPLEXES = [
    fit("CaHCO3^+.aq", "-1 Ca^2+.aq -1 HCO3^-.aq 1 CaHCO3^+.aq", (1209.12, 0.31294, -34765.05, -478.782),
        **WARM, u=0.07, source="plummer"),
    fit("CaCO3.aq", "-1 Ca^2+.aq -1 CO3^2-.aq 1 CaCO3.aq", (-1228.732, -0.299444, 35512.75, 485.818),
        **WARM, u=0.07, source="plummer"),
    fit("MgHCO3^+.aq", "-1 Mg^2+.aq -1 HCO3^-.aq 1 MgHCO3^+.aq", (-59.215, 0, 2537.455, 20.92298), **WARM,
        u=0.05, source="nordstrom"),
    fit("MgCO3.aq", "-1 Mg^2+.aq -1 CO3^2-.aq 1 MgCO3.aq", (0.9910, 0.00667), **WARM, u=0.05,
        source="nordstrom"),
    at_25("CaSO4.aq", "-1 Ca^2+.aq -1 SO4^2-.aq 1 CaSO4.aq", 2.30, 6.9, 0.05, "nordstrom"),
    at_25("MgSO4.aq", "-1 Mg^2+.aq -1 SO4^2-.aq 1 MgSO4.aq", 2.37, 19.0, 0.05, "nordstrom"),
    at_25("NaSO4^-.aq", "-1 Na^+.aq -1 SO4^2-.aq 1 NaSO4^-.aq", 0.70, 4.7, 0.05, "nordstrom"),
    at_25("KSO4^-.aq", "-1 K^+.aq -1 SO4^2-.aq 1 KSO4^-.aq", 0.85, 9.4, 0.05, "nordstrom"),
    at_25("NaCO3^-.aq", "-1 Na^+.aq -1 CO3^2-.aq 1 NaCO3^-.aq", 1.27, 37.3, 0.1, "nordstrom"),
    at_25("NaHCO3.aq", "-1 Na^+.aq -1 HCO3^-.aq 1 NaHCO3.aq", -0.25, 0.0, 0.1, "nordstrom"),
    at_25("CaOH^+.aq", "-1 Ca^2+.aq -1 H2O.l 1 CaOH^+.aq 1 H^+.aq", -12.78, 64.1, 0.1, "nordstrom"),
    at_25("MgOH^+.aq", "-1 Mg^2+.aq -1 H2O.l 1 MgOH^+.aq 1 H^+.aq", -11.44, 66.8, 0.1, "nordstrom"),
    at_25("CaF^+.aq", "-1 Ca^2+.aq -1 F^-.aq 1 CaF^+.aq", 0.94, 17.2, 0.1, "nordstrom"),
    at_25("MgF^+.aq", "-1 Mg^2+.aq -1 F^-.aq 1 MgF^+.aq", 1.82, 13.4, 0.05, "nordstrom"),
    at_25("FeSO4.aq", "-1 Fe^2+.aq -1 SO4^2-.aq 1 FeSO4.aq", 2.25, 13.5, 0.1, "nordstrom"),
    at_25("FeSO4^+.aq", "-1 Fe^3+.aq -1 SO4^2-.aq 1 FeSO4^+.aq", 4.04, 16.4, 0.1, "nordstrom"),
    at_25("FeOH^+.aq", "-1 Fe^2+.aq -1 H2O.l 1 FeOH^+.aq 1 H^+.aq", -9.50, 55.2, 0.1, "nordstrom"),
    at_25("FeOH^2+.aq", "-1 Fe^3+.aq -1 H2O.l 1 FeOH^2+.aq 1 H^+.aq", -2.19, 43.5, 0.05, "nordstrom"),
    at_25("Fe(OH)2^+.aq", "-1 Fe^3+.aq -2 H2O.l 1 Fe(OH)2^+.aq 2 H^+.aq", -5.67, 71.5, 0.2, "nordstrom"),
    at_25("FeCl^2+.aq", "-1 Fe^3+.aq -1 Cl^-.aq 1 FeCl^2+.aq", 1.48, 23.4, 0.1, "nordstrom"),
    at_25("AlOH^2+.aq", "-1 Al^3+.aq -1 H2O.l 1 AlOH^2+.aq 1 H^+.aq", -5.00, 48.1, 0.05, "nordstrom"),
    at_25("AlF^2+.aq", "-1 Al^3+.aq -1 F^-.aq 1 AlF^2+.aq", 7.0, 4.4, 0.1, "nordstrom"),
    at_25("AlF2^+.aq", "-1 Al^3+.aq -2 F^-.aq 1 AlF2^+.aq", 12.7, 8.3, 0.1, "nordstrom"),
    at_25("AlF3.aq", "-1 Al^3+.aq -3 F^-.aq 1 AlF3.aq", 16.8, 9.0, 0.1, "nordstrom"),
    at_25("AlF4^-.aq", "-1 Al^3+.aq -4 F^-.aq 1 AlF4^-.aq", 19.4, 9.2, 0.1, "nordstrom"),
    at_25("SiF6^2-.aq", "-1 H4SiO4.aq -4 H^+.aq -6 F^-.aq 1 SiF6^2-.aq 4 H2O.l", 30.18, -68.0, 0.2,
          "nordstrom"),
    at_25("CuCl2^-.aq", "-1 Cu^+.aq -2 Cl^-.aq 1 CuCl2^-.aq", 5.50, -1.8, 0.1, "nordstrom"),
    at_25("CuCl3^2-.aq", "-1 Cu^+.aq -3 Cl^-.aq 1 CuCl3^2-.aq", 5.70, 1.1, 0.2, "nordstrom"),
    at_25("H3AsO4.aq", "-1 H3AsO4.aq 1 H^+.aq 1 H2AsO4^-.aq", -2.24, -7.1, 0.05, "nist46"),
    at_25("HAsO4^2-.aq", "-1 H2AsO4^-.aq 1 H^+.aq 1 HAsO4^2-.aq", -6.96, 3.2, 0.05, "nist46"),
    at_25("AsO4^3-.aq", "-1 HAsO4^2-.aq 1 H^+.aq 1 AsO4^3-.aq", -11.50, 18.2, 0.15, "nist46"),
    at_25("H3AsO3.aq", "-1 H3AsO3.aq 1 H^+.aq 1 H2AsO3^-.aq", -9.23, 27.5, 0.05, "nist46"),
    at_25("Cu(NH3)4^2+.aq", "-1 Cu^2+.aq -4 NH3.aq 1 Cu(NH3)4^2+.aq", 12.6, -92.0, 0.2, "nist46"),
    at_25("Zn(NH3)4^2+.aq", "-1 Zn^2+.aq -4 NH3.aq 1 Zn(NH3)4^2+.aq", 9.0, -62.0, 0.2, "nist46"),
    at_25("Ag(NH3)2^+.aq", "-1 Ag^+.aq -2 NH3.aq 1 Ag(NH3)2^+.aq", 7.22, -56.2, 0.05, "nist46"),
    at_25("Ag(CN)2^-.aq", "-1 Ag^+.aq -2 CN^-.aq 1 Ag(CN)2^-.aq", 20.48, -137.0, 0.1, "nist46"),
    at_25("HgCl2.aq", "-1 Hg^2+.aq -2 Cl^-.aq 1 HgCl2.aq", 13.2, -53.6, 0.1, "nist46"),
    at_25("HgCl4^2-.aq", "-1 Hg^2+.aq -4 Cl^-.aq 1 HgCl4^2-.aq", 15.1, -61.0, 0.1, "nist46"),
    at_25("PbCl^+.aq", "-1 Pb^2+.aq -1 Cl^-.aq 1 PbCl^+.aq", 1.60, 18.3, 0.1, "nordstrom"),
    at_25("CdCl^+.aq", "-1 Cd^2+.aq -1 Cl^-.aq 1 CdCl^+.aq", 1.98, 2.5, 0.05, "nist46"),
]

MEASURED = ACIDS + MINERALS + COMPLEXES
