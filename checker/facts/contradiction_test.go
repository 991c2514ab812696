package facts_test

import (
	"strings"
	"testing"

	"boardproof/checker/facts"
)

// TestContradictionsAreAsked: two statements that cannot both hold give no figure that
// could acquit, but a question that says why.
func TestContradictionsAreAsked(t *testing.T) {
	t.Parallel()
	const board = `board: two ways
counted: {sources: 1, units: 1, busbars: 1}
other_supplies: none
system: {voltage: 400 V, voltage_tolerance: 10 %, highest_circuit_voltage: none}
sources:
  T1: {kind: transformer, rating: 1000 kVA, impedance: 6 %, load_loss: 10 kW, primary: 11 kV, secondary: 400 V, network: {voltage: 11 kV, r_x: 0.1, NETWORK}, link: {kind: cable, conductor: copper, area: 240 mm2, in_parallel: 4, length: 20 m, LINK}}
sections: {A: {bars: main A}}
busbars: {main A: {section: A}}
units: {Q1: {duty: incomer, connects: T1, to: A}}
`
	for _, c := range []struct{ name, network, link, because string }{
		{"level and current agree", "fault_level_max: 500 MVA, fault_current_max: 26.24 kA, fault_level_min: 200 MVA", "reactance_per_length: 0.08 mΩ/m", ""},
		{"level and current differ", "fault_level_max: 500 MVA, fault_current_max: 20 kA, fault_level_min: 200 MVA", "reactance_per_length: 0.08 mΩ/m", "do not say the same"},
		{"range upside down", "fault_level_max: 100 MVA, fault_level_min: 200 MVA", "reactance_per_length: 0.08 mΩ/m", "above the largest"},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			text := strings.NewReplacer("NETWORK", c.network, "LINK", c.link).Replace(board)
			var fault *facts.Fact
			for _, s := range facts.Of(readText(t, text)).Of(facts.Busbars) {
				fault = s.Fact("fault.current.at_most")
			}
			because := ""
			for _, l := range fault.Lacks {
				because += l.Because
			}
			if fault.Known != (c.because == "") || !strings.Contains(because, c.because) {
				t.Errorf("known %v because %q, expected %q", fault.Known, because, c.because)
			}
		})
	}
}
