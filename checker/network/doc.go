// Package network is the one-line diagram as a graph: which sources can feed which
// bars in which supply state, and which devices lie on the way.
//
// A supply state is a set of closed incomers and couplers. Every combination that no
// mechanical or key interlock excludes can come about and is a state to be reckoned
// with. Interlocks of other kinds (hard-wired, software, procedure) exclude nothing.
//
// The package knows names and connections only: no currents, no files.
package network
