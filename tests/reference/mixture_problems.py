"""Problems with a liquid mixture, a solution in a mass of water, and several mixtures at once; all
numbers are invented."""

ESTER = [-1.0, -1.0, 1.0, 1.0]
LIQUIDS = [ESTER, ESTER + [0.0], [-1.0, 2.0, 0.0], [-3.0, 1.0, 0.0], [-0.37, -1.1, 0.9, 0.0]]


def mixtures(problem, log_uniform, uniform, rng, math):
    """Yields the problems class after class."""

    def amounts(nu, low=-2.0, high=1.0, absent=0.15):
        return [0.0 if rng.random() < absent else log_uniform(low, high) for _ in nu]

    def some_hold():
        return rng.choice([{"pressure": log_uniform(4, 6)}, {"volume": log_uniform(-3, 1)}])

    for nu in LIQUIDS * 5:
        feed = amounts(nu)
        size = rng.choice([3, 30, 300])
        yield problem("liquid", "l" * len(nu), nu, feed, uniform(-size, size), **some_hold())
    for nu in LIQUIDS * 2:
        feed = amounts(nu, -250, 0, 0.0)
        yield problem("liquid traces", "l" * len(nu), nu, feed, uniform(-90, 90), **some_hold())
    for _ in range(10):
        kinds = rng.choice(["llpl", "lalll", "pll", "allp", "lpl"])
        nu = [-1.0, -1.0, 1.0, 1.0, 0.0][: len(kinds)]
        feed = amounts(nu)
        yield problem("liquid beside solids", kinds, nu, feed, uniform(-9, 9), **some_hold())
    for nu in [[-1.0, 1.0, 1.0], [-2.0, 1.0, 1.0, 0.0], [-1.0, -4.0, 1.0], [-1.0, -1.0, 0.3, 0.7]] * 4:
        held = {"water": log_uniform(-2, 3), "kelvin": 298.15}
        feed = amounts(nu, -9, 1)
        size = rng.choice([10, 60, 300])
        yield problem("solutes in water", "s" * len(nu), nu, feed, uniform(-size, size), **held)
    for _ in range(8):
        held = {"water": log_uniform(-2, 3), "kelvin": 298.15}
        feed = [log_uniform(-6, 0), log_uniform(-8, 0), log_uniform(-8, 0)]
        kinds = rng.choice(["pss", "ass"])
        yield problem("dissolving in water", kinds, [-1.0, 1.0, 2.0], feed, uniform(-60, 20), **held)
    yield from gas_and_solution(problem, log_uniform, uniform, rng, amounts)
    yield from gas_and_liquid(problem, log_uniform, uniform, rng, amounts)
    yield from pure_phases(problem, math)


def both_held(log_uniform, rng):
    """The gas by pressure or volume, and water."""
    gas = {"pressure": log_uniform(3, 7)} if rng.random() < 0.6 else {"volume": log_uniform(-3, 2)}
    return {**gas, "water": log_uniform(-2, 3), "kelvin": 298.15}


def gas_and_solution(problem, log_uniform, uniform, rng, amounts):
    """Absorption, with and without reaction; the gas may be used up as a whole."""
    absorbing = [
        ("gsg", [-1.0, 1.0, 0.0]),
        ("gs", [-1.0, 1.0]),
        ("gassg", [-1.0, -1.0, 1.0, 1.0, 0.0]),
        ("gass", [-1.0, -1.0, 1.0, 1.0]),
        ("ggassss", [-2.0, -1.0, -2.0, 4.0, 2.0, 0.0, 0.0]),
        ("sgsa", [-1.0, -1.0, 2.0, -1.0]),
        ("pssga", [-1.0, -2.0, 1.0, 1.0, 1.0]),
        ("gsgs", [-0.7, -0.31, 0.2, 1.3]),
    ]
    for kinds, nu in absorbing * 6:
        held = both_held(log_uniform, rng)
        feed = amounts(nu, -7, 1)
        size = rng.choice([4, 20, 200])
        yield problem("gas and solution", kinds, nu, feed, uniform(-size, size), **held)
    for kinds, nu in absorbing * 2:
        held = both_held(log_uniform, rng)
        feed = amounts(nu, -250, 0, 0.0)
        yield problem("gas and solution, traces", kinds, nu, feed, uniform(-90, 90), **held)
    for inert in [1e-3, 1e-12, 1e-30, 1e-200]:
        for target in [-4.0, 0.5, 3.0]:
            held = {"pressure": 2e5, "water": 1.0, "kelvin": 298.15}
            feed = [1.0, 0.1, inert]
            yield problem("gas nearly pure over water", "gsg", [-1.0, 1.0, 0.0], feed, target, **held)
    for target in [-30.0, -3.4, 0.0, 4.0]:
        for feed in [[1.0, 0.0], [0.0, 0.04], [2.0, 0.02], [0.0, 0.0]]:
            held = {"pressure": 1e5, "water": 1.0, "kelvin": 298.15}
            yield problem("pure gas over water", "gs", [-1.0, 1.0], feed, target, **held)
            yield problem("pure gas over water", "ags", [-1.0, -1.0, 1.0], [0.0] + feed, target, **held)


def gas_and_liquid(problem, log_uniform, uniform, rng, amounts):
    """Evaporation and reactions between a gas and a liquid mixture."""
    pairs = [
        ("lglg", [-1.0, 1.0, 0.0, 0.0]),
        ("lgg", [-1.0, 1.0, 0.0]),
        ("lgl", [-1.0, 1.0, 0.0]),
        ("llgl", [-1.0, -1.0, 1.0, 1.0]),
        ("lggl", [-1.0, -1.0, 0.0, 1.0]),
        ("lgpgl", [-0.9, -1.3, 1.0, 0.6, 0.35]),
    ]
    for kinds, nu in pairs * 5:
        held = {"pressure": log_uniform(3, 7)} if rng.random() < 0.6 else {"volume": log_uniform(-3, 2)}
        size = rng.choice([4, 20, 200])
        yield problem("gas and liquid", kinds, nu, amounts(nu, -3, 1), uniform(-size, size), **held)


def pure_phases(problem, math):
    """Mixtures of one species that keep their composition: Q does not depend on the extent."""
    at_2_bar = {"pressure": 2e5, "kelvin": 400.0}
    two = math.log(2.0)
    for target in [-1.0, two, two + 1e-9, 2.0]:
        for feed in [[1.0, 0.5], [0.0, 0.5], [1.0, 0.0], [0.0, 0.0]]:
            yield problem("boiling", "lg", [-1.0, 1.0], feed, target, **at_2_bar)
        yield problem("boiling", "ag", [-1.0, 1.0], [0.0, 0.3], target, **at_2_bar)
        yield problem("boiling", "llg", [-1.0, -1.0, 2.0], [1.0, 1.0, 0.3], target, **at_2_bar)
        yield problem("boiling", "al", [-1.0, 1.0], [0.0, 0.3], target, **at_2_bar)
        yield problem("boiling", "all", [-1.0, 1.0, 0.0], [0.0, 0.3, 0.2], -target, **at_2_bar)
