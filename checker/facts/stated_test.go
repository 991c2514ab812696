package facts_test

import (
	"strings"
	"testing"

	"boardproof/checker/facts"
	"boardproof/checker/working"
)

func TestNamesAsPeopleSayThem(t *testing.T) {
	t.Parallel()
	b := readText(t, strings.NewReplacer("  R:", "  R-1, left:", "settings: R}", "settings: \"R-1, left\"}").Replace(twoSupplies)+
		"transfer: {interlocks: [{kind: mechanical, of: [Q1, Q2], closed_at_once: 1}, {kind: software, of: [Q1, Q2], closed_at_once: 1}]}\n")
	bars, _ := b.Busbars.Get("main A")
	release, _ := b.Protection.Get("R-1, left")
	source, _ := b.Sources.Get("S1")
	for want, got := range map[string]string{
		"duration of the rated short-time withstand current, main A":   facts.Name(bars.Value.ShortTimeWithstand.Duration.At),
		"rated short-time withstand current, main A":                   facts.Name(bars.Value.ShortTimeWithstand.At),
		"rated peak withstand current, main A":                         facts.Name(bars.Value.PeakWithstand.At),
		"tolerance of the delay of the short-time function, R-1, left": facts.Name(release.Value.ShortTime.DelayTolerance.At),
		"largest fault current of the network ahead, S1":               facts.Name(source.Value.Network.FaultCurrentMax.At),
		"kind of interlock 1":                                          facts.Name(b.Transfer.Interlocks.Items[0].Kind.At),
		"kind of interlock 2":                                          facts.Name(b.Transfer.Interlocks.Items[1].Kind.At),
		"rated insulation voltage":                                     facts.Name(b.Assembly.RatedInsulationVoltage.At),
		"degree of protection behind the door of the enclosure":        facts.Name(b.Assembly.Enclosure.IPDoorOpen.At),
		"nominal voltage":                                              facts.Name(b.System.Voltage.At),
		"number of sources":                                            facts.Name(b.Counted.Sources.At),
		"other supplies and stored energy":                             facts.Name(b.OtherSupplies.At),
	} {
		if got != want {
			t.Errorf("got %q, want %q", got, want)
		}
	}
}

func TestExamplesOfWhatIsAsked(t *testing.T) {
	t.Parallel()
	b := readText(t, "board: bare\nbusbars: {main A: {}}\n")
	bars, _ := b.Busbars.Get("main A")
	for want, got := range map[string]string{
		"143 kA":                          facts.Example(bars.Value.PeakWithstand.At),
		"{current: 65 kA, duration: 1 s}": facts.Example(bars.Value.ShortTimeWithstand.At),
	} {
		if got != want {
			t.Errorf("got %q, want %q", got, want)
		}
	}
}

// evidenceBoard has a claim of each kind that evidence can cover.
const evidenceBoard = "transfer: {interlocks: [{kind: mechanical, of: [Q1, Q2], closed_at_once: 1}]}\n"

func TestBasisOfClaims(t *testing.T) {
	t.Parallel()
	const values = "values: {short_time_withstand: {current: 25 kA, duration: 1 s}, peak: 52.5 kA}"
	for _, c := range []struct {
		name, more    string
		subject, term string
		want          working.Basis
	}{
		{"nothing shown", "evidence: none\n", "main A", "withstand.peak", working.Declared},
		{"tested", "evidence: [{shows: short-circuit withstand, of: [main A], by: test, " + values + "}]\n", "main A", "withstand.peak", working.Tested},
		{"tested, joule integral", "evidence: [{shows: short-circuit withstand, of: [main A], by: test, " + values + "}]\n", "main A", "withstand.joule_integral", working.Tested},
		{"compared", "evidence: [{shows: short-circuit withstand, of: [main A], by: comparison with a tested design, " + values + "}]\n", "main A", "withstand.peak", working.Compared},
		{"the stronger of two", "evidence: [{shows: short-circuit withstand, of: [main A], by: calculation, " + values + "}, {shows: short-circuit withstand, of: [main A], by: test, " + values + "}]\n", "main A", "withstand.peak", working.Tested},
		{"by calculation", "evidence: [{shows: short-circuit withstand, of: [main A], by: calculation, " + values + "}]\n", "main A", "withstand.peak", working.Calculated},
		{"by declaration", "evidence: [{shows: short-circuit withstand, of: [main A], by: declaration, " + values + "}]\n", "main A", "withstand.peak", working.Declared},
		{"means not said", "evidence: [{shows: short-circuit withstand, of: [main A], " + values + "}]\n", "main A", "withstand.peak", working.Declared},
		{"circuits not said", "evidence: [{shows: short-circuit withstand, by: test, " + values + "}]\n", "main A", "withstand.peak", working.Declared},
		{"another characteristic", "evidence: [{shows: dielectric properties, of: [main A], by: test, " + values + "}]\n", "main A", "withstand.peak", working.Declared},
		{"values not said", "evidence: [{shows: short-circuit withstand, of: [main A], by: test}]\n", "main A", "withstand.peak", working.Declared},
		{"peak below the claim", "evidence: [{shows: short-circuit withstand, of: [main A], by: test, values: {peak: 52 kA}}]\n", "main A", "withstand.peak", working.Declared},
		{"current below the claim", "evidence: [{shows: short-circuit withstand, of: [main A], by: test, values: {short_time_withstand: {current: 24 kA, duration: 1 s}, peak: 60 kA}}]\n", "main A", "withstand.joule_integral", working.Declared},
		{"duration below the claim", "evidence: [{shows: short-circuit withstand, of: [main A], by: test, values: {short_time_withstand: {current: 30 kA, duration: 0.5 s}, peak: 60 kA}}]\n", "main A", "withstand.joule_integral", working.Declared},
		{"values above the claim", "evidence: [{shows: short-circuit withstand, of: [main A], by: test, values: {short_time_withstand: {current: 30 kA, duration: 3 s}, peak: 60 kA}}]\n", "main A", "withstand.joule_integral", working.Tested},
		{"only the neutral was tested", "evidence: [{shows: short-circuit withstand, of: [main A], conductors: [neutral], by: test, " + values + "}]\n", "main A", "withstand.peak", working.Declared},
		{"an interlock declared", evidenceBoard, "main A", "fault.current.at_most", working.Declared},
		{"an interlock inspected", evidenceBoard + "evidence: [{shows: mechanical operation, of: [Q1, Q2], by: inspection}]\n", "main A", "fault.current.at_most", working.Inspected},
		{"half an interlock inspected", evidenceBoard + "evidence: [{shows: mechanical operation, of: [Q1], by: inspection}]\n", "main A", "fault.current.at_most", working.Declared},
		{"network's figures are nobody's claim", "", "main A", "fault.current.at_most", working.NoBasis},
		{"settings declared", "", "main A", "fault.duration.at_most", working.Declared},
		{"insulation tested", "evidence: [{shows: dielectric properties, of: [main A], by: test}]\n", "", "insulation.rated_voltage", working.Tested},
		{"insulation of nothing named", "evidence: [{shows: dielectric properties, by: test}]\n", "", "insulation.rated_voltage", working.Declared},
		{"enclosure tested", "evidence: [{shows: degree of protection, of: [main A], by: test}]\n", "", "door_open.contact_protection", working.Tested},
		{"enclosure of one unit tested", "evidence: [{shows: degree of protection, of: [Q1], by: test}]\n", "", "door_open.contact_protection", working.Declared},
		{"circuits to be told later", "evidence: [{shows: degree of protection, of: [tbc], by: test}]\n", "", "door_open.contact_protection", working.Declared},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			b := with(t, readText(t, twoSupplies+c.more), "assembly.rated_insulation_voltage", "690 V")
			f := fact(t, facts.Of(b), c.subject, c.term)
			if !f.Known {
				t.Fatalf("%s is not known: %v", c.term, f.Lacks)
			}
			if got := f.How.Basis(); got != c.want {
				t.Errorf("%s rests on: %v, want %v", c.term, got, c.want)
			}
		})
	}
	left := with(t, readText(t, twoSupplies), "protection.R.settings_source", "as left sheet")
	if got := fact(t, facts.Of(left), "main A", "fault.duration.at_most").How.Basis(); got != working.Inspected {
		t.Errorf("settings as left rest on: %v, want %v", got, working.Inspected)
	}
}

// TestDoorOpen reads the degree of protection of persons off an IP code. Source: IEC 60529,
// first numeral and additional letter; a numeral X says nothing.
func TestDoorOpen(t *testing.T) {
	t.Parallel()
	for code, want := range map[string]string{
		"IP00": "not protected", "IP0X": "not protected", "IP1X": "IPXXA", "IP10": "IPXXA", "IP2X": "IPXXB", "IP20": "IPXXB", "IP31": "IPXXC", "IP4X": "IPXXD", "IP54": "IPXXD", "IP66": "IPXXD",
		"IPXXA": "IPXXA", "IPXXB": "IPXXB", "IPXXC": "IPXXC", "IPXXD": "IPXXD", "IP4XD": "IPXXD", "IP2XD": "IPXXD", "IP2XC": "IPXXC", "IP3XB": "IPXXC",
		"IPXX": "", "IPX1": "", "IPX4": "", "see drawing": "", "\"\"": "",
	} {
		b := with(t, readText(t, twoSupplies), "assembly.enclosure.ip_door_open", strings.Trim(code, `"`))
		f := fact(t, facts.Of(b), "", "door_open.contact_protection")
		if f.Word != want || f.Known != (want != "") {
			t.Errorf("%s protects as %q, want %q", code, f.Word, want)
		}
	}
}

func TestWhatIsMissingIsAskedOnce(t *testing.T) {
	t.Parallel()
	for _, c := range []struct {
		name   string
		pairs  []string
		term   string
		path   string
		reason string // part of it
	}{
		{"nobody said", []string{"sources.S1.network.fault_current_max", ""}, "fault.current.at_most", "", ""},
		{"no value", []string{"counted.sources", "see drawing"}, "fault.current.at_most", "counted.sources", `"see drawing" is no value`},
		{"doubted", []string{"sources.S1.network.r_x", "15"}, "fault.current.at_most", "sources.S1.network.r_x", "outside the usual range"},
		{"miscounted", []string{"counted.units", "3"}, "fault.current.at_most", "counted.units", "3 counted on the single-line diagram, 2 described"},
		{"whole object", []string{"busbars.main A.short_time_withstand", "see drawing"}, "withstand.joule_integral", "busbars.main A.short_time_withstand", `"see drawing" is no value`},
		{"what the program cannot", []string{"sources.S1.kind", "ups"}, "fault.current.at_most", "", "this version does not compute it"},
	} {
		f := fact(t, facts.Of(with(t, readText(t, twoSupplies), c.pairs...)), "main A", c.term)
		if f.Known || len(f.Lacks) != 1 {
			t.Errorf("%s: known %v, lacks %+v", c.name, f.Known, f.Lacks)
			continue
		}
		l := f.Lacks[0]
		if l.Path != c.path || !strings.Contains(l.Because, c.reason) || l.What == "" || l.Place.IsZero() {
			t.Errorf("%s: asks for %+v", c.name, l)
		}
	}
}

func TestABoardThatSaysNothing(t *testing.T) {
	t.Parallel()
	b := facts.Of(readText(t, "board: bare\n"))
	if len(b.Of(facts.Boards)) != 1 || len(b.Of(facts.Busbars)) != 1 {
		t.Fatalf("subjects: %d boards and %d sets of bars, every board has one of each", len(b.Of(facts.Boards)), len(b.Of(facts.Busbars)))
	}
	for _, s := range b.Subjects {
		for _, f := range s.Facts() {
			if f.Known {
				t.Errorf("%s of a board that says nothing is %s", f.Term.ID, f.Text())
			} else if len(f.Lacks) == 0 && f.Outside == nil && f.Term.ID != "supply.interlock" {
				t.Errorf("%s is not known and asks for nothing", f.Term.ID)
			}
		}
	}
}
