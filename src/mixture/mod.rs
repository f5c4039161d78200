//! Readings to amounts and activities.
