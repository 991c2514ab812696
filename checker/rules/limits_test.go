package rules

import (
	"slices"
	"strings"
	"testing"
	"testing/fstest"

	"boardproof/checker/place"
	"boardproof/checker/working"
)

func TestRefusedLimitsAndSeries(t *testing.T) {
	t.Parallel()
	one := func(text string) string { return "- {id: a, label: a, clause: c, " + text + "}\n" }
	for _, c := range []struct{ name, file, text, want string }{
		{"no list", limitsFile, "a: 1\n", `limits.yaml:1:1: found keys with values, expected a list of limits, each with id, label, quantity or list, default, stricter and clause`},
		{"empty", limitsFile, "", `limits.yaml:1: found nothing, expected a list of limits, each with id, label, quantity or list, default, stricter and clause`},
		{"unknown key", limitsFile, one("quantity: current, default: 1 A, stricter: higher, unit: A"), `limits.yaml:1:83: found the key "unit", expected one of id, label, quantity, list, words, default, stricter, clause, note`},
		{"no kind of value", limitsFile, one("default: 1 A, stricter: higher"), `limits.yaml:1: found 0 keys of quantity, list and words, expected one of them`},
		{"quantity", limitsFile, one("quantity: currant, default: 1 A, stricter: higher"), `limits.yaml:1:42: found "currant", expected one of current, `},
		{"no unit", limitsFile, one("quantity: current, default: 65, stricter: higher"), `limits.yaml:1:60: found "65", expected a current with its unit; write "65 kA" or "65 A"`},
		{"list", limitsFile, one("list: coverings, default: bare, stricter: higher"), `limits.yaml:1:38: found "coverings", expected one of contact_protection, covering; write covering`},
		{"word of the list", limitsFile, one("list: covering, default: slved, stricter: higher"), `limits.yaml:1:57: found "slved", expected one of bare, sleeved, insulated; write sleeved`},
		{"no direction", limitsFile, one("quantity: current, default: 1 A"), `limits.yaml:1: expected the key stricter here`},
		{"direction of words", limitsFile, one("words: [x, z], default: x, stricter: higher"), `limits.yaml:1:69: found a direction for words without order, expected no direction, or a list with an order`},
		{"twice", limitsFile, one("quantity: current, default: 1 A, stricter: higher") + one("quantity: current, default: 1 A, stricter: higher"), `limits.yaml:2:8: found the limit "a" a second time, expected each limit once`},
		{"group and limit", limitsFile, one("quantity: current, default: 1 A, stricter: higher") + "- {id: a.b, label: a, clause: c, quantity: current, default: 1 A, stricter: higher}\n", `limits.yaml: found the terms limits.a and limits.a.b stand in each other's way, expected each limit once, none a group of others`},
		{"second document", limitsFile, one("quantity: current, default: 1 A, stricter: higher") + "---\n- {}\n", `limits.yaml:2:1: found a second document, expected one document in a file; remove the line ---`},
		{"series without steps", seriesFile, "a: {of: current, source: s}\n", `series.yaml:1: expected the key steps here`},
		{"series of nothing", seriesFile, "a: {of: colour, steps: [1 A], source: s}\n", `series.yaml:1:9: found "colour", expected one of contact_protection, covering, current, `},
		{"series of words with steps", seriesFile, "a: {of: covering, steps: [bare], source: s}\n", `series.yaml:1:26: found steps of a list of words, expected no steps; the words of the list are the steps`},
		{"falling steps", seriesFile, "a: {of: current, steps: [2 kA, 1 kA], source: s}\n", `series.yaml:1:32: found "1 kA" after a step that is not smaller, expected rising values`},
		{"step without unit", seriesFile, "a: {of: current, steps: [2], source: s}\n", `series.yaml:1:26: found "2", expected a current with its unit`},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			pack := packOf(header("") + goodBody)
			pack[c.file].Data = []byte(c.text)
			p, problems := Load(pack, testVocabulary(t), Options{})
			if p != nil || problems.Len() != 1 || !strings.HasPrefix(texts(problems)[0], c.want) {
				t.Errorf("got\n%q\nwant\n%q", texts(problems), c.want)
			}
		})
	}
}

func TestLimitsAreFacts(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	var got []string
	for _, f := range p.Limits() {
		got = append(got, f.Term.ID+" "+f.Text())
	}
	if want := []string{"covering sleeved", "energy 10 kA", "method box", "peak 100 kA"}; !slices.Equal(got, want) {
		t.Errorf("got %q, want %q", got, want)
	}
	l, ok := p.Limit("covering")
	if !ok || l.Fact.Rank != 1 || l.Set() || l.Loosened() || l.Fact.How.Source.Standard != "invented" {
		t.Errorf("covering: %+v", l)
	}
	if _, ok := p.Limit("colour"); ok {
		t.Error("a limit that nobody wrote")
	}
}

func TestOwnersSettings(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	at := place.Place{File: "owner.yaml", Line: 7}
	for _, c := range []struct {
		id, text string
		loosened bool
	}{
		{"peak", "120 kA", false}, {"peak", "80 kA", true}, {"energy", "12 kA", true}, {"energy", "8000 A", false},
		{"covering", "bare", true}, {"covering", "insulated", false}, {"method", "open", false},
	} {
		q, problems := p.With(Setting{ID: c.id, Text: c.text, Leaf: &working.Leaf{Place: at}})
		if q == nil {
			t.Fatalf("%s: %v", c.id, texts(problems))
		}
		l, _ := q.Limit(c.id)
		if l.Fact.Text() != c.text || !l.Set() || l.Loosened() != c.loosened || l.Fact.How.Leaf.Place != at {
			t.Errorf("%s %s: %s, set %v, loosened %v", c.id, c.text, l.Fact.Text(), l.Set(), l.Loosened())
		}
		if before, _ := p.Limit(c.id); before.Set() {
			t.Errorf("%s was set in the first pack too", c.id)
		}
	}
	leaf := &working.Leaf{Place: at}
	q, problems := p.With(Setting{"paek", "1 kA", leaf}, Setting{"peak", "1", leaf}, Setting{"covering", "tape", leaf}, Setting{"covering", "bare", leaf})
	want := []string{
		`owner.yaml:7: found "covering" a second time, expected each limit once`,
		`owner.yaml:7: found "tape", expected one of bare, sleeved, insulated`,
		`owner.yaml:7: found "paek", which is no limit, expected one of covering, energy, method, peak; write peak`,
		`owner.yaml:7: found "1", expected a current with its unit; write "1 kA" or "1 A"`,
	}
	if got := texts(problems); q != nil || !slices.Equal(got, want) {
		t.Errorf("got\n%q\nwant\n%q", got, want)
	}
}

func TestSeriesSteps(t *testing.T) {
	t.Parallel()
	p := mustLoad(t, packOf(header("")+goodBody), Options{})
	s, ok := p.Series("rated_peak")
	if !ok {
		t.Fatal("no series")
	}
	for _, c := range []struct {
		from         float64
		above, below float64
	}{{60000, 105000, 52500}, {52500, 52500, 52500}, {1, 52500, 0}, {200000, 0, 105000}} {
		above, hasAbove := s.Above(c.from)
		below, hasBelow := s.Below(c.from)
		if above != c.above || below != c.below || hasAbove != (c.above != 0) || hasBelow != (c.below != 0) {
			t.Errorf("from %g: above %g %v, below %g %v", c.from, above, hasAbove, below, hasBelow)
		}
	}
	if _, ok := p.Series("colours"); ok {
		t.Error("a series that nobody wrote")
	}
}

// TestBase loads an owner's pack on top of another one: its rules may read the other's limits.
func TestBase(t *testing.T) {
	t.Parallel()
	base := mustLoad(t, packOf(header("")+goodBody), Options{})
	own := strings.NewReplacer("XY-01", "XY-02", "xy01", "xy02").Replace(inBody("\ts.withstand.peak >= input.limits.peak"))
	pack := packOf("")
	delete(pack, "xy01.rego")
	delete(pack, limitsFile)
	delete(pack, seriesFile)
	pack["xy02.rego"] = &fstest.MapFile{Data: []byte(own)}
	p := mustLoad(t, pack, Options{Base: base})
	if len(p.Rules()) != 2 || len(base.Rules()) != 1 || p.Digest() == base.Digest() {
		t.Errorf("%d rules, base %d", len(p.Rules()), len(base.Rules()))
	}
	pack["xy01.rego"] = &fstest.MapFile{Data: []byte(header("") + goodBody)}
	q, problems := Load(pack, testVocabulary(t), Options{Base: base, Dir: "ours"})
	want := []string{"ours/xy01.rego:9: found the rule XY-01 a second time, expected each rule once"}
	if got := texts(problems); q != nil || !slices.Equal(got, want) {
		t.Errorf("got %q, want %q", got, want)
	}
}
