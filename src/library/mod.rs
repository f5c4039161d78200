//! What is known of each species.
