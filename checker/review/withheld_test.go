package review_test

import (
	"slices"
	"strings"
	"testing"

	"boardproof/checker/facts"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
	"boardproof/checker/working"
)

// complete says everything that the bounds at its bars rest on: two transformers of which
// a key lets one feed both sections, a generator, motors, and settings of every function.
const complete = `board: made up
stage: tender submission
counted: {sources: 3, units: 7, busbars: 3}
other_supplies: none
system: {voltage: 400 V, voltage_tolerance: 10 %, highest_circuit_voltage: none}
work: {with_doors_open_under_voltage: yes}
assembly: {rated_insulation_voltage: 690 V, enclosure: {ip_door_open: IP2X}}
sources:
  T1:
    kind: transformer
    rating: 1000 kVA
    primary: 11 kV
    secondary: 400 V
    impedance: {value: 6 %}
    load_loss: 10 kW
    network: {voltage: 11 kV, fault_level_max: 100 MVA, fault_level_min: 50 MVA, r_x: 0.1}
    link: {kind: cable, conductor: copper, area: 240 mm2, in_parallel: 4, length: 30 m, reactance_per_length: 0.08 mΩ/m}
  T2: {like: T1}
  G1:
    kind: generator
    rating: 800 kVA
    voltage: 400 V
    power_factor: 0.8
    subtransient_reactance: 13 %
    sustained_current: {current: 3 x}
    link: none
sections: {A: {}, B: {}}
busbars:
  main A: {section: A, short_time_withstand: {current: 65 kA, duration: 1 s}, peak_withstand: 143 kA}
  main B: {section: B, short_time_withstand: {current: 65 kA, duration: 1 s}, peak_withstand: 143 kA}
  riser: {fed_from: main B, short_time_withstand: {current: 65 kA, duration: 1 s}, peak_withstand: 143 kA}
units:
  Q1: {duty: incomer, connects: T1, to: A, settings: R1}
  Q2: {duty: incomer, connects: T2, to: B, settings: R1}
  QG: {duty: incomer, connects: G1, to: B, settings: RG}
  QC: {duty: coupler, between: [A, B], settings: R1}
  M1: {duty: motor feeder, on: main A, load: {motor: 250 kW, current: 435 A, starting: 6.5 x, fed_through: direct}}
  M2: {like: M1, on: riser}
  F1: {duty: feeder, on: main B, load: none}
standby: none
transfer:
  interlocks:
    - {kind: mechanical key, of: [Q1, Q2, QC], closed_at_once: 2}
    - {kind: mechanical key, of: [Q2, QG], closed_at_once: 1}
    - {kind: mechanical key, of: [Q1, QG], closed_at_once: 1}
protection:
  R1:
    kind: electronic release
    rated_current: 1600 A
    long_time: {pickup: 1600 A, delay: 12 s, at: 6 x, at_of: setting, tolerance: 10 %, time_tolerance: 20 %}
    short_time: {pickup: 8 kA, delay: 200 ms, i2t: "off", tolerance: 10 %, delay_tolerance: 30 ms}
    instantaneous: none
    break_time: 50 ms
    curve_includes_break_time: no
  RG:
    like: R1
    long_time: {pickup: 1200 A, delay: 12 s, at: 6 x, at_of: setting, tolerance: 10 %, time_tolerance: 20 %}
    short_time: {pickup: 2 kA, delay: 200 ms, i2t: "off", tolerance: 10 %, delay_tolerance: 30 ms}
evidence: none
`

// shown is evidence for all that the bounds rest on.
const shown = `[{shows: short-circuit withstand, of: [main A, main B, riser], by: test, values: {short_time_withstand: {current: 65 kA, duration: 1 s}, peak: 143 kA}},` +
	` {shows: mechanical operation, of: [Q1, Q2, QG, QC], by: inspection}]`

// set is a value written over one of the complete board.
type set struct{ path, text string }

func with(t *testing.T, b *spec.Board, all ...set) (*spec.Board, bool) {
	t.Helper()
	for _, s := range all {
		changed, problems := b.With(s.path, s.text)
		if problems.Len() > 0 {
			return nil, false
		}
		b = changed
	}
	return b, true
}

func TestTheCompleteBoardIsComplete(t *testing.T) {
	t.Parallel()
	b := mustReadText(t, complete)
	for _, s := range facts.Of(b).Of(facts.Busbars) {
		for _, term := range []string{"fault.current", "fault.peak", "fault.joule_integral", "fault.duration", "fault.smallest_current"} {
			for _, bound := range []string{".at_least", ".at_most"} {
				if f := s.Fact(term + bound); f == nil || !f.Known {
					t.Errorf("%s %s%s is not known", s.ID, term, bound)
				}
			}
		}
	}
	checkLess(t, b, withoutLeaves(b))
}

// TestWithheldOnPurpose takes away what a tenderer could hope to gain by keeping silent
// about: one row for each way to reckon, to be found out or to be excused.
func TestWithheldOnPurpose(t *testing.T) {
	t.Parallel()
	const network, link, r1 = "sources.T1.network", "sources.T1.link.", "protection.R1."
	asBuilt := set{"stage", "as built"}
	allShown := set{"evidence", shown}
	asLeft := []set{{"protection.R1.settings_source", "as left sheet"}, {"protection.RG.settings_source", "as left sheet"}}
	for _, c := range []struct {
		name string
		sets []set
		less string
	}{
		{"power factor", []set{{"sources.G1.rating", "3000 kVA"}}, "sources.G1.power_factor"},
		{"a low power factor", []set{{"sources.G1.rating", "3000 kVA"}, {"sources.G1.power_factor", "0.7"}}, "sources.G1.power_factor"},
		{"network of much resistance", []set{{network + ".r_x", "3"}}, network + ".r_x"},
		{"network of little resistance", []set{{network + ".r_x", "0.03"}}, network + ".r_x"},
		{"great load loss", []set{{"sources.T1.load_loss", "25 kW"}}, "sources.T1.load_loss"},
		{"small load loss", []set{{"sources.T1.load_loss", "3 kW"}}, "sources.T1.load_loss"},
		{"measured impedance", []set{{"sources.T1.impedance", "{value: 6 %, measured: FAT-1}"}}, "sources.T1.impedance.measured"},
		{"reactance of a link below the usual", []set{{link + "reactance_per_length", "0.03 mΩ/m"}}, link + "reactance_per_length"},
		{"reactance of a link above the usual", []set{{link + "reactance_per_length", "0.3 mΩ/m"}}, link + "reactance_per_length"},
		{"reactance of bars above the usual", []set{{link + "kind", "bars"}, {link + "reactance_per_length", "0.4 mΩ/m"}}, link + "reactance_per_length"},
		{"kind of link", []set{{link + "resistance_per_length", ""}}, link + "kind"},
		{"cables in parallel", nil, link + "in_parallel"},
		{"link to a weak network", []set{{"sources.G1.rating", "3000 kVA"}, {network + ".fault_level_min", "20 MVA"}}, "sources.T1.link"},
		{"no link", nil, "sources.G1.link"},
		{"tolerance of the short-time pickup", []set{{r1 + "short_time.pickup", "12 kA"}, {r1 + "short_time.tolerance", "30 %"}}, r1 + "short_time.tolerance"},
		{"tolerance of the short-time delay", []set{{r1 + "short_time.delay_tolerance", "80 ms"}}, r1 + "short_time.delay_tolerance"},
		{"tolerance of the long-time pickup", []set{{r1 + "short_time", "none"}, {r1 + "long_time.tolerance", "30 %"}}, r1 + "long_time.tolerance"},
		{"tolerance of the long-time delay", []set{{r1 + "short_time", "none"}, {r1 + "long_time.time_tolerance", "40 %"}}, r1 + "long_time.time_tolerance"},
		{"tolerance of the instantaneous pickup", []set{{r1 + "instantaneous", "{pickup: 11.5 kA, tolerance: 40 %}"}}, r1 + "instantaneous.tolerance"},
		{"tolerance of the override", []set{{r1 + "override", "{pickup: 11.5 kA, tolerance: 40 %}"}}, r1 + "override.tolerance"},
		{"multiple of the rated current", []set{{r1 + "short_time", "none"}, {r1 + "long_time.pickup", "800 A"}, {r1 + "long_time.at_of", "rated current"}}, r1 + "long_time.at_of"},
		{"long-time function", nil, r1 + "long_time"},
		{"short-time function", nil, r1 + "short_time"},
		{"sloping part not said", []set{{r1 + "short_time.i2t", ""}}, r1 + "short_time"},
		{"half a long-time function", []set{{r1 + "long_time", "{pickup: 1600 A}"}}, r1 + "long_time"},
		{"half an override", []set{{r1 + "override", "{tolerance: 10 %}"}}, r1 + "override"},
		{"break time in the curve of an override", []set{{r1 + "curve_includes_break_time", "yes"}, {r1 + "override", "{pickup: 12 kA}"}}, r1 + "curve_includes_break_time"},
		{"settings of the coupler", nil, "units.QC.settings"},
		{"settings of an incomer", nil, "units.Q1.settings"},
		{"motor without a starting current", []set{{"units.M1.duty", "feeder"}, {"units.M1.load.starting", ""}}, "units.M1.load.motor"},
		{"starting current without a motor", []set{{"units.M1.duty", "feeder"}, {"units.M1.load.motor", ""}}, "units.M1.load.starting"},
		{"motor feeder of which only the current is said", []set{{"units.M1.load", "{current: 435 A}"}}, "units.M1.duty"},
		{"motor of a feeder not named so", []set{{"units.M1.duty", ""}}, "units.M1.load.motor"},
		{"spare unit with a motor", []set{{"units.M1.duty", "spare"}}, "units.M1.load"},
		{"motor behind a converter", []set{{"units.M1.load.fed_through", "converter"}}, "units.M1.load.fed_through"},
		{"standby", []set{{"standby", "[M1]"}}, "standby"},
		{"one of two standbys", []set{{"standby", "[M1, M2]"}}, "standby[1]"},
		{"no standby", nil, "standby"},
		{"section of a riser fed from other bars", []set{{"busbars.riser.section", "A"}, {"sources.T1.rating", "1600 kVA"}, {"transfer.interlocks[1].closed_at_once", "1"}}, "busbars.riser.section"},
		{"section of bars named by another section too", []set{{"sections.A.bars", "main B"}, {"sections.B.bars", "main A"}, {"sources.T1.rating", "1600 kVA"}, {"transfer.interlocks[1].closed_at_once", "1"}}, "busbars.main A.section"},
		{"counted sources", nil, "counted.sources"},
		{"counted units that are not those described", []set{{"counted.units", "9"}}, "counted.units"},
		{"counted bars that are not those described", []set{{"counted.busbars", "4"}}, "counted.busbars"},
		{"other supplies", []set{{"other_supplies", "{UPS: {kind: ups}}"}}, "other_supplies"},
		{"no other supplies", nil, "other_supplies"},
		{"circuit above the system", []set{{"system.highest_circuit_voltage", "690 V"}, {"assembly.rated_insulation_voltage", "500 V"}}, "system.highest_circuit_voltage"},
		{"work under voltage", []set{{"assembly.enclosure.ip_door_open", "IP00"}}, "work.with_doors_open_under_voltage"},
		{"code behind the door", []set{{"assembly.enclosure.ip_door_open", "IP00"}}, "assembly.enclosure.ip_door_open"},
		{"kind of an interlock", nil, "transfer.interlocks[1].kind"},
		{"number of an interlock", nil, "transfer.interlocks[1].closed_at_once"},
		{"kind of a software interlock", []set{{"transfer.interlocks[1].kind", "software"}}, "transfer.interlocks[1].kind"},
		{"stage", []set{asBuilt}, "stage"},
		{"stage, tender submission", nil, "stage"},
		{"circuits of a test of the insulation", []set{asBuilt, {"evidence", "[{shows: dielectric properties, of: [main A], by: test}]"}}, "evidence[1].of"},
		{"one circuit of a test of the insulation", []set{asBuilt, {"evidence", "[{shows: dielectric properties, of: [main A], by: test}]"}}, "evidence[1].of[1]"},
		{"circuits of a test of the enclosure", []set{asBuilt, {"evidence", "[{shows: degree of protection, of: [QC], by: test}]"}}, "evidence[1].of"},
		{"means of evidence", []set{asBuilt, allShown}, "evidence[1].by"},
		{"declared interlock that nothing needs", append([]set{asBuilt, allShown, {"transfer.interlocks[3]", "{kind: mechanical, of: [M1, M2], closed_at_once: 1}"}, {"evidence", shown}}, asLeft...), "transfer.interlocks[3]"},
		{"settings of a coupler only declared", append([]set{asBuilt, {"protection.RG.settings_source", "study"}, {"units.QC.settings", "RG"}, allShown}, asLeft[0]), "units.QC.settings"},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			b, ok := with(t, mustReadText(t, complete), c.sets...)
			if !ok {
				return // refused: two statements that cannot both hold acquit nobody
			}
			less, ok := with(t, b, set{c.less, ""})
			if !ok {
				return // refused
			}
			if len(saysMore(b, less)) == 0 {
				t.Fatalf("%s was not said", c.less)
			}
			checkLess(t, b, []variant{{"without " + c.less, less}})
		})
	}
}

// TestAnEmptyCollectionIsNotNone writes collections and lists that say nothing.
func TestAnEmptyCollectionIsNotNone(t *testing.T) {
	t.Parallel()
	b := mustReadText(t, complete)
	for _, c := range []set{
		{"other_supplies", "{}"}, {"other_supplies", "[]"}, {"standby", "[]"}, {"standby", "[tbc]"},
		{"transfer.interlocks", "[]"}, {"units.M1.load", "{}"}, {"sources.T1.link", "{}"}, {"protection.R1.short_time", "{}"},
		{"counted", "{}"}, {"system.highest_circuit_voltage", "see drawing"}, {"other_supplies", "see drawing"}, {"evidence", "[]"},
	} {
		t.Run(c.path+" "+c.text, func(t *testing.T) {
			t.Parallel()
			if empty, ok := with(t, b, c); ok {
				less, _ := with(t, b, set{c.path, ""})
				checkLess(t, less, []variant{{c.path + ": " + c.text, empty}})
			}
		})
	}
}

// TestBarsThatVanishAreMissed takes the entry of bars that nothing else names out of the
// text: the count on the single-line diagram has to tell.
func TestBarsThatVanishAreMissed(t *testing.T) {
	t.Parallel()
	const riser = "  riser: {fed_from: main B, short_time_withstand: {current: 65 kA, duration: 1 s}, peak_withstand: 20 kA}\n"
	whole := mustReadText(t, fewer(complete, "  riser: ", riser))
	less := mustReadText(t, fewer(fewer(complete, "  riser: ", ""), "  M2: ", "  M2: {like: M1, on: main B}\n"))
	if got := outcomes(reviewsOf(t, whole)[0])["WTH-02 riser"]; got != rules.Departs {
		t.Fatalf("WTH-02 of the riser is %v, want departs", got)
	}
	checkLess(t, whole, []variant{{"without the riser", less}})
	for _, s := range facts.Of(less).Of(facts.Busbars) {
		if f := s.Fact("fault.peak.at_most"); f.Known || !slices.ContainsFunc(f.Lacks, func(l working.Lack) bool { return l.Path == "counted.busbars" }) {
			t.Errorf("%s: with one set of bars less than counted the largest peak is %s and lacks %v", s.ID, f.Text(), f.Lacks)
		}
	}
}

// fewer replaces the line that begins so.
func fewer(text, begins, by string) string {
	var out strings.Builder
	for line := range strings.Lines(text) {
		if strings.HasPrefix(line, begins) {
			line = by
		}
		out.WriteString(line)
	}
	return out.String()
}
