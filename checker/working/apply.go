package working

import "boardproof/checker/units"

// Apply1 applies a formula of one argument to a result; see [Compute]. The operand
// must go by the symbol that the formula's equation uses ([Result.As]).
func Apply1[A, R units.Unit](f *Formula, fn func(A) (R, error), a Result[A]) Result[R] {
	return Compute(f, func() (R, error) { return fn(a.V()) }, a)
}

// Apply2 applies a formula of two arguments.
func Apply2[A, B, R units.Unit](f *Formula, fn func(A, B) (R, error), a Result[A], b Result[B]) Result[R] {
	return Compute(f, func() (R, error) { return fn(a.V(), b.V()) }, a, b)
}

// Apply3 applies a formula of three arguments.
func Apply3[A, B, C, R units.Unit](f *Formula, fn func(A, B, C) (R, error), a Result[A], b Result[B], c Result[C]) Result[R] {
	return Compute(f, func() (R, error) { return fn(a.V(), b.V(), c.V()) }, a, b, c)
}
