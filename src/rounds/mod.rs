//! Many readings judged by one case.
