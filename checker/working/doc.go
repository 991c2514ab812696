// Package working holds values that can be checked by hand.
//
// A [Result] is exactly one of three things: a value together with its [Working]
// (formula, equation, inputs, source), a list of what is missing to compute it
// ([Lacks]), or a note that an input lies outside the range in which the formula
// is valid ([Outside]). A formula applied to results gives again a result: nothing
// is computed from a value that was not there, and nothing is invented.
//
// A [Worst] is the largest or smallest of several cases. Its AtLeast and AtMost
// bound the true value: the bound that could acquit exists only when every case is
// known and no further case is possible.
package working
