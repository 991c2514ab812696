// Package protection says how long a protective device lets a current flow: a band with a
// fast edge, for selectivity, and a slow edge, for heat and arc energy.
//
// A [Release] is the release of a low-voltage circuit-breaker with long-time, short-time
// and instantaneous functions; a [Relay] is a measuring relay with an inverse and definite
// stages. Both are a [Device]. Settings carry their tolerances; what to assume where a file
// states none is exported with its source (see [DefaultShortTimePickup] and the others), so
// that a worksheet can list it. Nothing is assumed silently.
//
// Currents are those at the device's own voltage level.
package protection
