package rules

import "testing"

// TestSides: what is found at the assembly is observed, on whichever side it is written; limits and
// literals never are.
func TestSides(t *testing.T) {
	t.Parallel()
	for line, want := range map[string][2]string{
		"s.withstand.peak >= s.fault.peak.at_most":          {"s.withstand.peak", "s.fault.peak.at_most"},
		"s.fault.peak.at_most <= s.withstand.peak":          {"s.withstand.peak", "s.fault.peak.at_most"},
		"s.withstand.peak >= s.withstand.current":           {"s.withstand.peak", "s.withstand.current"},
		"s.fault.peak.at_most <= s.withstand.peak_of_ratio": {"s.fault.peak.at_most", "s.withstand.peak_of_ratio"},
		"input.limits.peak <= s.withstand.peak":             {"s.withstand.peak", "input.limits.peak"},
		"s.fault.peak.at_most <= input.limits.energy":       {"s.fault.peak.at_most", "input.limits.energy"},
		`"covered" == s.joints`:                             {"s.joints", `"covered"`},
		`s.joints in {"bare", "covered"}`:                   {"s.joints", `{"bare", "covered"}`},
	} {
		t.Run(line, func(t *testing.T) {
			t.Parallel()
			r := mustLoad(t, packOf(inBody("\t"+line)), Options{}).rules[0]
			observed, required := r.Comparisons[0].Sides()
			if observed.Text() != want[0] || required.Text() != want[1] {
				t.Errorf("observed %s, required %s; want %s and %s", observed.Text(), required.Text(), want[0], want[1])
			}
			if r.Comparisons[0].String() != line {
				t.Errorf("written as %s", r.Comparisons[0])
			}
		})
	}
}
