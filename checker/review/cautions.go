package review

import (
	"slices"

	"boardproof/checker/rules"
)

// cautions are the warnings every review carries, and those that what was found
// calls for.
func (r *Review) cautions() []string {
	list := []string{
		"An arc in a low-voltage switchboard can kill or maim at a distance of metres, and contact with a live part can kill. Nothing in this review is leave to open, work on or stand before a live board.",
		"Work dead first: isolate, secure against re-closing, prove dead at the place of work, earth and short-circuit where required, cover what stays live nearby. Live work needs a reason and a permit.",
		"Protective equipment is the last line. It never replaces insulation, separation, withstand or fast clearing, and it does not protect against pressure, fragments or molten metal as a whole.",
		"This review supports a competent engineer and does not replace one. Local codes, the full text of the standards and licensed practice decide.",
	}
	if r.departsIn("limitation") {
		list = append(list, "A short circuit above what a part withstands can throw it apart. Until the departures in line 2 are cured, do not energise this board where the fault level reviewed here is available.")
	}
	if r.departsIn("prevention") {
		list = append(list, "With departures in line 1 live parts may be touched or bridged. Doors and covers stay closed until the board is dead.")
	}
	if r.Counts.Clarify > 0 {
		list = append(list, "What is to be clarified is not accepted: an open query on a major requirement means that the board is not accepted yet.")
	}
	if r.Counts.Unjudged > 0 {
		list = append(list, "At least one rule could not be used. What it would have judged is unknown, not met.")
	}
	return list
}

func (r *Review) departsIn(line string) bool {
	return slices.ContainsFunc(r.Findings, func(f *Finding) bool { return f.Outcome == rules.Departs && f.Rule.Line == line })
}

// notLookedAt says what this review is silent about, so that nobody reads silence
// as approval.
func (r *Review) notLookedAt() []string {
	list := []string{}
	for _, line := range r.Lines {
		if line.Rules == 0 {
			list = append(list, "The whole line of "+line.Name+": the library in use has no rule for it.")
		}
	}
	return append(list,
		"Requirements for which the library in use has no rule; it is named below with its digest, and `boardproof rules` lists it.",
		"Arc energy, arc containment, protective clothing and boundaries.",
		"Bar forces, support strength, heating of bars, contact lift-off; withstand is compared as rated and calculated, not recalculated.",
		"Fuses, thermal-magnetic releases, earth-fault protection and zone interlocking: their clearing times are not computed, and what rests on them is asked.",
		"A network that feeds several transformers in common: each is taken with a network of its own, so that currents of transformers in parallel come out somewhat high.",
		"Declared and future fault levels, and separate settings for generator supply.",
		"Earth faults and the neutral and protective conductors.",
		"Impedance of couplers and of the bars themselves (taken as zero: the currents at the far end are somewhat smaller, the smallest fault too).",
		"Noise, toxic gas and pressure on people, arcs of one phase or of direct current, ferroresonance, errors in interlocking software.",
		"The board itself: this is a desk review of the values in the files named; nothing was inspected and no test was witnessed.",
	)
}
