//! K at a temperature, and its forms.
