//! Q, affinities and rest.
