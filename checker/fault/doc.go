// Package fault computes short-circuit currents at a low-voltage switchboard after
// IEC 60909-0: the impedance of everything that feeds the fault, the largest and the
// smallest initial current, the peak, and the heat.
//
// Every equation is one pure function beside one [working.Formula]. The operands in
// the Equation stand in the order of the function's arguments (of the fields, where an
// argument is a struct), so that a caller can hand both to [working.Compute]. Where the
// number of operands is not fixed (a sum, branches in parallel) a function makes the
// Formula from the symbols of the operands.
//
// Arguments outside the range of a formula give a [working.RangeError]; nothing that is
// not finite is returned. Clause numbers of the standard are from memory unless the
// source says that they were seen.
package fault
