"""The problems whose states of rest are computed in extended precision; all numbers are invented."""

SHIFT = [-1.0, -1.0, 1.0, 1.0, 0.0]
SYNTHESIS = [-1.0, -3.0, 2.0, 0.0]
OXIDATION = [-1.0, -0.5, 1.0, 0.0]
REFORMING = [-1.0, -1.0, 1.0, 3.0, 0.0]
DISSOCIATION = [-1.0, 2.0, 0.0]
CHLORINE = [-4.0, -1.0, 2.0, 2.0, 0.0]
GASES = [SHIFT, SYNTHESIS, OXIDATION, REFORMING, DISSOCIATION, CHLORINE]
ODD = [[-0.37, -1.1, 0.9, 0.0], [-1.0, -1.0 / 3.0, 2.0 / 3.0, 0.0], [-2.7, 0.1, 0.1, 0.3]]
EIGHTHS = [[-1.0, -0.125, 0.875, 0.0], [-0.25, -1.5, 0.75, 0.5], [-0.5, 1.0, 0.5, 0.0]]


def problems(problem, rng, math):
    """Yields several hundred problems, class after class."""
    uniform = rng.uniform

    def log_uniform(low, high):
        return float(f"{10 ** uniform(low, high):.6e}")

    def hold(low=3.0, high=7.5):
        if rng.random() < 0.6:
            return {"pressure": log_uniform(low, high), "kelvin": round(uniform(280, 1500), 2)}
        return {"volume": log_uniform(-4, 2), "kelvin": round(uniform(280, 1500), 2)}

    def gas(title, nu, amounts, ln_k, held=None):
        return problem(title, "g" * len(nu), list(nu), amounts, ln_k, **(held or hold()))

    def amounts(nu, low=-2.0, high=1.0):
        return [log_uniform(low, high) for _ in nu]

    def ln_k(size):
        return uniform(-size, size)

    for nu in GASES * 8:
        yield gas("usual", nu, amounts(nu), ln_k(12))
    for nu in GASES * 6:
        yield gas("large K", nu, amounts(nu), ln_k(690.7755))
    for nu in GASES * 6:
        yield gas("traces", nu, amounts(nu, -300, 0), ln_k(40))
    for nu in GASES * 4:
        yield gas("traces and large K", nu, amounts(nu, -60, 0), ln_k(690))
    for nu in GASES * 4:
        yield gas("any size", nu, amounts(nu, -300, 299), ln_k(690))
    for nu in (ODD + EIGHTHS) * 6:
        yield gas("broken nu", nu, amounts(nu, -20, 1), ln_k(rng.choice([5, 100, 690])))
    for nu in GASES * 4:
        feed = [0.0 if v >= 0 else log_uniform(-1, 1) for v in nu]
        yield gas("products and inert absent", nu, feed, ln_k(rng.choice([5, 60, 690])))
    for nu in GASES * 4:
        feed = [0.0 if v <= 0 else log_uniform(-1, 1) for v in nu]
        yield gas("reactants and inert absent", nu, feed, ln_k(rng.choice([5, 60, 690])))
    for nu in GASES * 3:
        feed = amounts(nu)
        feed[rng.choice([i for i, v in enumerate(nu) if v != 0])] = 0.0
        yield gas("one species absent", nu, feed, ln_k(rng.choice([5, 60, 690])))
    for excess in [0.0, 1e-15, -1e-15, 1e-12, -1e-12, 1e-9, 1e-6, -1e-3]:
        for nu in GASES:
            inert = rng.choice([0.0, 1.0])
            size = log_uniform(-1, 1)
            feed = [size * -v if v < 0 else inert if v == 0 else 0.0 for v in nu]
            feed[0] *= 1 + excess
            yield gas("near stoichiometric", nu, feed, uniform(0, rng.choice([40, 160, 690])))
    for nu in GASES * 2:
        yield gas("ln K is zero", nu, amounts(nu, -3, 1), 0.0, {"pressure": 1e5})
    yield gas("ln K is zero", [-1.0, 1.0], [1.0, 0.0], 0.0, {"pressure": 1e5})
    for k in [-690.7755, 690.7755, -1380.0]:
        yield gas("below any double", OXIDATION, [1.0, 0.5, 0.0, 0.0], 2 * abs(k), {"pressure": 1e5})
        yield gas("below any double", [-1.0, 0.5, 0.5], [1.0, 0.0, 1.0], k, {"pressure": 1e5})
        yield gas("below any double", [-0.5, 0.25, 1.0], [1.0, 0.0, 1.0], k, {"volume": 1.0})
    yield from dissolved(problem, log_uniform, ln_k, rng)
    yield from condensed(problem, log_uniform, uniform, hold, rng, math)
    yield from without_change(problem, math)
    from mixture_problems import mixtures

    yield from mixtures(problem, log_uniform, uniform, rng, math)


def dissolved(problem, log_uniform, ln_k, rng):
    """Weak acids, complexes and dissolving solids."""
    for nu in [[-1.0, 1.0, 1.0], [-2.0, 1.0, 1.0, 0.0], [-1.0, -4.0, 1.0], [-1.0, -1.0, 0.5, 1.0]] * 7:
        feed = [log_uniform(-9, 1) if rng.random() < 0.8 else 0.0 for _ in nu]
        held = {"volume": log_uniform(-4, 1), "kelvin": 298.15}
        yield problem("solutes", "s" * len(nu), nu, feed, ln_k(rng.choice([10, 60, 300])), **held)
    for _ in range(20):
        feed = [log_uniform(-6, 0), log_uniform(-8, 0), log_uniform(-8, 0)]
        held = {"volume": log_uniform(-3, 0), "kelvin": 298.15}
        kinds = rng.choice(["pss", "ass"])
        yield problem("dissolving", kinds, [-1.0, 1.0, 2.0], feed, ln_k(40) - 20, **held)


def condensed(problem, log_uniform, uniform, hold, rng, math):
    """Solids and liquids with gases."""
    lime, carbon, steam = [-1.0, 1.0, 1.0, 0.0], [-2.0, 1.0, 1.0, 0.0], [-1.0, -1.0, 1.0, 1.0, 0.0]
    for _ in range(30):
        feed = [log_uniform(-2, 1) if rng.random() < 0.8 else 0.0 for _ in lime]
        feed[3] = log_uniform(-4, 1)
        kinds = rng.choice(["ppgg", "ppgg", "apgg", "pagg", "aagg"])
        yield problem("lime", kinds, lime, feed, uniform(-8, 4), **hold(4.0, 6.0))
    for _ in range(25):
        feed = [log_uniform(-2, 1) if rng.random() < 0.8 else 0.0 for _ in carbon]
        feed[0] = feed[0] or 1.0
        kinds = rng.choice(["gpgg", "gpgg", "gagg"])
        yield problem("carbon", kinds, carbon, feed, uniform(-12, 12), **hold())
    for _ in range(25):
        feed = [log_uniform(-3, 1) for _ in steam]
        kinds = rng.choice(["pgpgg", "pgggg", "ggppg", "gpppg", "agagg"])
        yield problem("solids and gases", kinds, steam, feed, uniform(-30, 30), **hold())
    for _ in range(15):
        # The activity of a phase that is used up is off by this much in the end.
        off = rng.choice([-1, 1]) * log_uniform(-13, -1)
        pressure = log_uniform(4, 6)
        feed = [1.0, 0.5, 0.0, log_uniform(-12, 0)]
        target = math.log(pressure / 1e5) + off
        held = {"pressure": pressure, "kelvin": 1100.0}
        yield problem("gas nearly pure", "ppgg", lime, feed, target, **held)
    for inert in [1e-30, 1e-200, 1e-15]:
        for target in [-0.1, 0.1, -1e-9]:
            held = {"pressure": 1e5, "kelvin": 1100.0}
            yield problem("gas nearly pure", "ppgg", lime, [1.0, 1.0, 1.0, inert], target, **held)
    for _ in range(15):
        # A pressure that is just above that of rest over a phase that is never used up.
        off = log_uniform(-14, 0)
        pressure = log_uniform(4, 6)
        target = math.log(pressure / 1e5) - off
        held = {"pressure": pressure, "kelvin": 1100.0}
        yield problem("ample", "aagg", lime, [0.0, 0.0, 0.0, log_uniform(-3, 1)], target, **held)
    for amount in [0.0, 0.01]:
        yield problem("into a volume", "apg", [-1.0, 1.0, 1.0], [0.0, 0.0, amount], -3.0, volume=1.0)
        yield problem("into a volume", "ppg", [-1.0, 1.0, 1.0], [1e-3, 0.0, amount], 2.0, volume=1.0)
        yield problem("into a volume", "ppg", [-1.0, 1.0, 1.0], [9.0, 0.5, amount], -9.0, volume=1.0)
    for target in [-60.0, -2.0, 3.0, 60.0]:
        for feed in [[0.7, 0.7, 0.0], [0.7, 0.700001, 0.1], [0.7, 0.3, 0.0]]:
            held = {"pressure": 2e5}
            yield problem("all gas reacts", "ggp", [-1.0, -1.0, 1.0], feed, target, **held)
            yield problem("all gas reacts", "ggp", [-1.0, -1.0, 1.0], feed, target, volume=0.1)


def without_change(problem, math):
    """Where Q does not depend on the extent, and where nothing can move."""
    lime, at_2_bar = [-1.0, 1.0, 1.0], {"pressure": 2e5, "kelvin": 1200.0}
    two = math.log(2.0)
    for target in [-1.0, 1.0, two, two + 1e-9, 0.5, two - 1e-9]:
        for feed in [[1.0, 0.2, 0.0], [1.0, 0.2, 3.0], [0.0, 0.5, 0.3], [1.0, 0.0, 0.3]]:
            yield problem("pure gas", "ppg", lime, feed, target, **at_2_bar)
        yield problem("pure gas", "aag", lime, [0.0, 0.0, 0.4], target, **at_2_bar)
        yield problem("pure gas", "pag", lime, [1.0, 0.0, 0.4], target, **at_2_bar)
    salt = [-1.0, 1.0, 1.0]
    for target in [-1.5, math.log(1.0), 2.0]:
        for feed in [[1.0, 0.0, 0.0], [1.0, 0.25, 0.25], [0.0, 0.25, 0.25], [0.0, 0.0, 0.0]]:
            yield problem("two gases in proportion", "pgg", salt, feed, target, **at_2_bar)
    for target in [-0.3, 0.0, 1e-17, 0.3]:
        yield problem("solids only", "pp", [-1.0, 1.0], [2.0, 0.5], target, pressure=1e5)
        yield problem("solids only", "pppp", [-2.0, -1.0, 1.0, 3.0], [2.0, 0.5, 0.0, 1.0], target, volume=1.0)
        yield problem("solids only", "ap", [-1.0, 1.0], [0.0, 0.5], target, pressure=1e5)
    for kinds in ["gggg", "pggg", "gpgp", "pppp"]:
        held = {"pressure": 1e5}
        yield problem("nothing moves", kinds, [-1.0, -1.0, 1.0, 1.0], [0.0, 1.0, 0.0, 1.0], 3.0, **held)
        yield problem("nothing moves", kinds, [-1.0, -1.0, 1.0, 1.0], [0.0, 0.0, 0.0, 0.0], 3.0, **held)
    yield problem("over an ample phase", "aagg", [-1.0, 1.0, 1.0, 0.0], [0.0, 0.0, 0.1, 1.0], 1.0, pressure=1e5)
    yield problem("into nothing", "g", [1.0], [1.0], -2.0, volume=1.0)
    yield problem("into nothing", "g", [1.0], [1.0], -2.0, pressure=1e5)
    yield problem("into nothing", "ss", [1.0, 1.0], [0.0, 1e-4], -32.2, volume=1e-3)
