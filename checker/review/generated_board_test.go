package review_test

import (
	"fmt"
	"slices"
	"strings"

	"pgregory.net/rapid"
)

// ratings are what a board claims of its bars.
type ratings struct {
	current, duration, peak string
}

// strong are ratings above any fault that a generated board can have.
var strong = ratings{"150 kA", "3 s", "330 kA"}

// generated is a board made up at random, with every choice that a bound of a fault can
// rest on: optional values said or not, either of two alternatives, and so on.
type generated struct {
	t        *rapid.T
	text     strings.Builder
	ratings  ratings
	sources  []string
	sections []string
	bars     []string
	switches []string
	outgoing []string
	releases []string
}

// generateBoard makes up a board without problems.
func generateBoard(t *rapid.T, r ratings) string {
	g := &generated{t: t, ratings: r}
	g.sections = []string{"A", "B"}[:g.number("sections", 1, 2)]
	for i := range g.number("releases", 1, 2) {
		g.releases = append(g.releases, fmt.Sprintf("R%d", i+1))
	}
	g.line("board: made up")
	g.optional("stage", "stage: %s", "tender submission", "tender submission", "as built")
	g.line("system: {voltage: 400 V, %s}", g.parts(
		"voltage_tolerance: "+g.word("tolerance", "6 %", "10 %"), g.mostly("highest", "highest_circuit_voltage: none")))
	g.allSources()
	g.line("sections: {%s}", strings.Join(g.sectionParts(), ", "))
	g.allBars()
	g.allUnits()
	g.transfer()
	g.allReleases()
	g.line("counted: {sources: %d, units: %d, busbars: %d}", len(g.sources), len(g.switches)+len(g.outgoing), len(g.bars))
	g.optional("others", "other_supplies: %s", "none", "none")
	g.optional("doors", "work: {with_doors_open_under_voltage: %s}", "yes", "no")
	g.line("assembly: {rated_insulation_voltage: %s, enclosure: {%s}}", g.word("insulation", "500 V", "690 V"),
		g.mostly("door", "ip_door_open: "+g.word("code", "IP00", "IP1X", "IP2X", "IPXXB", "IP3X")))
	g.evidence()
	return g.text.String()
}

func (g *generated) line(format string, args ...any) { fmt.Fprintf(&g.text, format+"\n", args...) }

func (g *generated) number(label string, low, high int) int {
	return rapid.IntRange(low, high).Draw(g.t, label)
}

func (g *generated) yes(label string) bool { return rapid.Bool().Draw(g.t, label) }

func (g *generated) word(label string, words ...string) string {
	return rapid.SampledFrom(words).Draw(g.t, label)
}

// may is the part, or nothing.
func (g *generated) may(label, part string) string {
	if g.yes("with " + label) {
		return part
	}
	return ""
}

// mostly is the part, seldom nothing: what most boards need for any bound to be known.
func (g *generated) mostly(label, part string) string {
	if g.number("without "+label, 0, 7) < 7 {
		return part
	}
	return ""
}

func (g *generated) optional(label, format string, words ...string) {
	if part := g.mostly(label, fmt.Sprintf(format, g.word(label, words...))); part != "" {
		g.line("%s", part)
	}
}

// parts joins what there is of a mapping.
func (g *generated) parts(parts ...string) string {
	return strings.Join(slices.DeleteFunc(parts, func(p string) bool { return p == "" }), ", ")
}

func (g *generated) allSources() {
	g.line("sources:")
	for i := range g.number("sources", 1, 3) {
		name := fmt.Sprintf("S%d", i+1)
		g.sources = append(g.sources, name)
		parts := ""
		switch g.word("kind of source", "transformer", "generator", "utility supply") {
		case "transformer":
			parts = g.parts("kind: transformer", "rating: "+g.word("rating", "630 kVA", "1000 kVA", "1600 kVA"), "primary: 11 kV", "secondary: 400 V",
				"impedance: {"+g.parts("value: "+g.word("impedance", "4 %", "6 %"), g.may("measurement", "measured: FAT-1"))+"}",
				g.may("losses", g.word("losses", "load_loss: 6 kW", "load_loss: 12 kW")),
				"network: {"+g.parts("voltage: 11 kV", g.network("100 MVA", "500 MVA", "3 kA", "25 kA"))+"}")
		case "generator":
			parts = g.parts("kind: generator", "rating: "+g.word("rating", "250 kVA", "800 kVA"), "voltage: 400 V",
				g.may("power factor", "power_factor: "+g.word("cos", "0.8", "1")), "subtransient_reactance: "+g.word("xd", "10 %", "18 %"),
				"sustained_current: "+g.word("sustained", "{current: 3 x}", "{current: 4 x}", "none"))
		default:
			parts = g.parts("kind: utility supply", "network: {"+g.network("8 MVA", "20 MVA", "9 kA", "30 kA")+"}")
		}
		g.line("  %s: {%s}", name, g.parts(parts, g.mostly("link", "link: "+g.link())))
	}
}

// network is fault level or fault current at each end.
func (g *generated) network(low, high, lowCurrent, highCurrent string) string {
	either := func(end, level, current string) string {
		return g.word("known by "+end, "fault_level_"+end+": "+level, "fault_current_"+end+": "+current)
	}
	return g.parts(either("max", high, highCurrent), either("min", low, lowCurrent), g.may("r_x", "r_x: "+g.word("r_x", "0.05", "0.1", "0.5", "3")))
}

func (g *generated) link() string {
	if g.yes("no link") {
		return "none"
	}
	return "{" + g.parts(
		g.mostly("link kind", "kind: "+g.word("link kind", "cable", "bars")),
		g.mostly("link metal", "conductor: "+g.word("metal", "copper", "aluminium")),
		"area: "+g.word("area", "120 mm2", "240 mm2"), "length: "+g.word("length", "3 m", "40 m"),
		g.mostly("in parallel", fmt.Sprintf("in_parallel: %d", g.number("in parallel", 1, 5))),
		g.may("reactance per length", "reactance_per_length: "+g.word("X'", "0.08 mΩ/m", "0.15 mΩ/m"))) + "}"
}

func (g *generated) sectionParts() []string {
	var parts []string
	for _, s := range g.sections {
		parts = append(parts, s+": {"+g.may("bars of section", "bars: main "+s)+"}")
	}
	return parts
}

func (g *generated) allBars() {
	g.line("busbars:")
	rated := fmt.Sprintf("short_time_withstand: {current: %s, duration: %s}, peak_withstand: %s", g.ratings.current, g.ratings.duration, g.ratings.peak)
	for _, s := range g.sections {
		g.bars = append(g.bars, "main "+s)
		g.line("  main %s: {%s}", s, g.parts("section: "+s, rated))
	}
	if g.yes("riser") {
		g.bars = append(g.bars, "riser")
		g.line("  riser: {%s}", g.parts("fed_from: main A", rated))
	}
}

func (g *generated) allUnits() {
	g.line("units:")
	for i, s := range g.sources {
		name := fmt.Sprintf("Q%d", i+1)
		g.switches = append(g.switches, name)
		g.line("  %s: {%s}", name, g.parts(g.may("duty", "duty: incomer"), "connects: "+s, "to: "+g.word("section fed", g.sections...), g.settings()))
	}
	if len(g.sections) == 2 {
		g.switches = append(g.switches, "QC")
		g.line("  QC: {%s}", g.parts(g.may("duty", "duty: coupler"), "between: [A, B]", g.settings()))
	}
	for i := range g.number("outgoing units", 0, 3) {
		name := fmt.Sprintf("F%d", i+1)
		g.outgoing = append(g.outgoing, name)
		g.line("  %s: {%s}", name, g.parts("on: "+g.word("on", g.bars...), g.may("duty", "duty: "+g.word("duty", "feeder", "motor feeder", "spare")), g.load()))
	}
	if len(g.outgoing) > 0 {
		g.optional("standby", "standby: %s", "none", "["+g.word("standby unit", g.outgoing...)+"]")
	}
}

func (g *generated) settings() string {
	return g.mostly("settings", "settings: "+g.word("release", g.releases...))
}

func (g *generated) load() string {
	if g.yes("no load") {
		return g.mostly("load", "load: none")
	}
	parts := g.parts(g.may("motor", "motor: 250 kW"), g.mostly("motor current", "current: 435 A"), g.mostly("starting current", "starting: 6.5 x"),
		g.mostly("feeding", "fed_through: "+g.word("fed through", "direct", "converter", "soft starter bypassed")))
	if parts == "" {
		return ""
	}
	return "load: {" + parts + "}"
}

func (g *generated) transfer() {
	var items []string
	for range g.number("interlocks", 0, 3) {
		var of []string
		for _, s := range g.switches {
			if g.yes("interlock of " + s) {
				of = append(of, s)
			}
		}
		if len(of) == 0 {
			continue
		}
		items = append(items, fmt.Sprintf("{kind: %s, of: [%s], closed_at_once: %d}", g.word("interlock", "software", "hard-wired", "mechanical", "mechanical key"),
			strings.Join(of, ", "), g.number("closed at once", 1, len(of))))
	}
	if len(items) > 0 {
		g.line("transfer: {interlocks: [%s]}", strings.Join(items, ", "))
	}
}

func (g *generated) allReleases() {
	g.line("protection:")
	for _, name := range g.releases {
		g.line("  %s: {%s}", name, g.parts("kind: electronic release", "rated_current: 1600 A", "break_time: 60 ms",
			g.may("break time in the curve", "curve_includes_break_time: "+g.word("in the curve", "yes", "no")),
			g.may("long time", "long_time: {"+g.parts("pickup: "+g.word("Ir", "400 A", "800 A"), "delay: 12 s, at: 6 x",
				g.may("at of", "at_of: "+g.word("at of", "setting", "rated current")),
				g.may("tolerance of Ir", "tolerance: "+g.word("ΔIr", "10 %", "30 %")), g.may("tolerance of tr", "time_tolerance: "+g.word("Δtr", "10 %", "40 %")))+"}"),
			g.mostly("short time", "short_time: {"+g.parts("pickup: "+g.word("Isd", "1.5 kA", "5 kA"), "delay: 200 ms", `i2t: "off"`,
				g.may("tolerance of Isd", "tolerance: "+g.word("ΔIsd", "5 %", "25 %")), g.may("tolerance of tsd", "delay_tolerance: "+g.word("Δtsd", "10 ms", "80 ms")))+"}"),
			g.may("instantaneous", "instantaneous: {"+g.parts("pickup: 12 kA", g.may("tolerance of Ii", "tolerance: "+g.word("ΔIi", "10 %", "40 %")))+"}"),
			g.may("override", "override: {"+g.parts("pickup: 30 kA", g.may("tolerance of the override", "tolerance: "+g.word("ΔIov", "10 %", "40 %")))+"}"),
			g.may("settings source", "settings_source: "+g.word("settings source", "study", "as left sheet"))))
	}
}

func (g *generated) evidence() {
	var items []string
	if g.yes("withstand shown") {
		items = append(items, fmt.Sprintf("{shows: short-circuit withstand, of: [%s], by: %s, values: {short_time_withstand: {current: %s, duration: %s}, peak: %s}}",
			strings.Join(g.bars, ", "), g.word("means", "test", "declaration"), g.ratings.current, g.ratings.duration, g.ratings.peak))
	}
	if g.yes("interlocks shown") {
		items = append(items, fmt.Sprintf("{shows: mechanical operation, of: [%s], by: inspection}", strings.Join(g.switches, ", ")))
	}
	if g.yes("dielectric shown") {
		items = append(items, "{"+g.parts("shows: dielectric properties", g.may("part of the board", "of: [main A]"), "by: test")+"}")
	}
	if len(items) > 0 {
		g.line("evidence: [%s]", strings.Join(items, ", "))
	} else if g.yes("evidence none") {
		g.line("evidence: none")
	}
}
