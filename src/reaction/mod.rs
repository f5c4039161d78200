//! Elements, formulas, species, equations, balancing.
