//! The case file, the report and the run.
