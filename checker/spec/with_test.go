package spec

import (
	"fmt"
	"os"
	"reflect"
	"strings"
	"testing"
)

// said flattens a board into one line for each value, with place and steps but without the vocabulary.
func said(v any) string {
	var out strings.Builder
	flatten(&out, reflect.ValueOf(v), false)
	return out.String()
}

// statedOnly leaves out places and what is not said, for boards that differ in their text.
func statedOnly(v any) string {
	var out strings.Builder
	flatten(&out, reflect.ValueOf(v), true)
	return out.String()
}

func flatten(out *strings.Builder, v reflect.Value, bare bool) {
	switch v.Kind() {
	case reflect.Struct:
		if at, ok := v.Interface().(At); ok {
			if !bare {
				fmt.Fprintf(out, "%s %s %v %s %d\n", at.Path, at.Place, at.Via, at.From, at.Says)
			}
			return
		}
		if state := v.FieldByName("State"); bare && state.IsValid() && State(state.Int()) == NotSaid {
			return
		}
		if at := v.FieldByName("Path"); bare && at.IsValid() {
			fmt.Fprintf(out, "%s ", at)
		}
		for i := range v.NumField() {
			if v.Type().Field(i).IsExported() {
				flatten(out, v.Field(i), bare)
			}
		}
	case reflect.Slice:
		for i := range v.Len() {
			flatten(out, v.Index(i), bare)
		}
	default:
		fmt.Fprintf(out, "%v\n", v)
	}
}

func TestWithEqualsReadingTheEditedText(t *testing.T) {
	t.Parallel()
	data, err := os.ReadFile("testdata/board.yaml")
	if err != nil {
		t.Fatal(err)
	}
	text := string(data)
	b := mustRead(t, "testdata/board.yaml")
	before := said(b.Content)
	for _, c := range []struct{ name, path, value, old, new string }{
		{"a quantity", "busbars.main A.supports.span", "300 mm", "span: 450 mm", "span: 300 mm"},
		{"a word", "busbars.main A.covering.kind", "fully insulated", "covering: {kind: sleeved", "covering: {kind: fully insulated"},
		{"one that others copy", "units.P1.device.rated_current", "400 A", "rated_current: 630 A, icu: {400 V: 70 kA, 690", "rated_current: 400 A, icu: {400 V: 70 kA, 690"},
		{"set where it is copied", "units.P2.device.rated_current", "400 A", "P2: {like: P1}", "P2: {like: P1, device: {rated_current: 400 A}}"},
		{"set where nothing is said", "site.ambient_min", "-5 °C", "flood_level: 0.4 m", "flood_level: 0.4 m\n  ambient_min: -5 °C"},
		{"object set from nothing", "auxiliary_supply.autonomy", "2 h", "taps: none", "taps: none\nauxiliary_supply: {autonomy: 2 h}"},
		{"object in place of none", "protection.Q1-release.instantaneous.pickup", "12 kA", "instantaneous: none", "instantaneous: {pickup: 12 kA}"},
		{"none in place of an object", "sources.G1.sustained_current", "none", "sustained_current: {current: 3 x, for: 10 s}", "sustained_current: none"},
		{"short form", "sources.TX1.impedance.value", "5 %", "impedance: 6 %", "impedance: 5 %"},
		{"long form of a short one", "sources.TX1.impedance.measured", "FAT-9", "impedance: 6 %", "impedance: {value: 6 %, measured: FAT-9}"},
		{"value at a voltage", "units.P1.device.icu[690 V]", "25 kA", "690 V: 20 kA", "690 V: 25 kA"},
		{"value at a new voltage", "units.Q1.device.icu[690 V]", "42 kA", "icu: {400 V: 66 kA}, ics", "icu: {400 V: 66 kA, 690 V: 42 kA}, ics"},
		{"value at a voltage of a copied table", "units.F2.device.icu[400 V]", "50 kA", "F2: {like: F1, load: {current: 60 A}}", "F2: {like: F1, load: {current: 60 A}, device: {icu: {400 V: 50 kA}}}"},
		{"item of a list of objects", "transfer.interlocks[1].closed_at_once", "1", "closed_at_once: 2", "closed_at_once: 1"},
		{"item of a list", "evidence[1].of[2]", "riser 3", "of: [main A, main B]", "of: [main A, riser 3]"},
		{"a whole list", "standby", "[P6]", "standby: [P5, P6]", "standby: [P6]"},
		{"a whole object", "busbars.main A.short_time_withstand", "{current: 80 kA, duration: 0.5 s}", "{current: 65 kA, duration: 1 s}\n    peak", "{current: 80 kA, duration: 0.5 s}\n    peak"},
		{"a value taken away", "site.altitude", "tbc", "altitude: 12 m", "altitude: tbc"},
	} {
		t.Run(c.name, func(t *testing.T) {
			if strings.Count(text, c.old) == 0 {
				t.Fatalf("%q is not in the text", c.old)
			}
			changed, problems := b.With(c.path, c.value)
			if problems.Len() > 0 {
				t.Fatal(problems)
			}
			edited, printed, n := readText(strings.Replace(text, c.old, c.new, 1), nil)
			if n > 0 {
				t.Fatal(printed)
			}
			if got, want := statedOnly(changed.Content), statedOnly(edited.Content); got != want {
				t.Errorf("differs from the edited text:\n%s", firstDifference(got, want))
			}
			if statedOnly(changed.Content) == statedOnly(b.Content) {
				t.Error("nothing has changed")
			}
			if said(b.Content) != before {
				t.Error("the board itself has changed")
			}
			if len(changed.Remarks) != len(edited.Remarks) || len(changed.Doubts) != len(edited.Doubts) {
				t.Errorf("remarks %v, doubts %v", changed.Remarks, changed.Doubts)
			}
		})
	}
}

func firstDifference(a, b string) string {
	one, two := strings.Split(a, "\n"), strings.Split(b, "\n")
	for i := range one {
		if i >= len(two) || one[i] != two[i] {
			return "got  " + one[i] + "\nwant " + strings.Join(two[min(i, len(two)):min(i+1, len(two))], "")
		}
	}
	return "the second is longer: " + two[len(one)]
}

func TestWithKeepsThePlace(t *testing.T) {
	t.Parallel()
	b := mustRead(t, "testdata/board.yaml")
	old := b.Busbars.Entries[0].Value.Supports.Span
	c, _ := b.With("busbars.main A.supports.span", "300 mm")
	if span := c.Busbars.Entries[0].Value.Supports.Span; span.Place != old.Place || span.Value != 0.3 || span.From != "D2" {
		t.Errorf("%v, was %v", span, old)
	}
	c, _ = b.With("busbars.main B.supports.span", "300 mm")
	if span := c.Busbars.Entries[1].Value.Supports.Span; span.Place != b.Busbars.Entries[1].Place || span.From != "" {
		t.Errorf("%v, main B stands at %s", span, b.Busbars.Entries[1].Place)
	}
	again, _ := c.With("busbars.main B.supports.span", "200 mm")
	if again.Busbars.Entries[1].Value.Supports.Span.Value != 0.2 || c.Busbars.Entries[1].Value.Supports.Span.Value != 0.3 {
		t.Error("a changed board cannot be changed again")
	}
	if fmt.Sprint(c.Files()) != fmt.Sprint(b.Files()) || c.File() != b.File() {
		t.Error("the files are lost")
	}
}

func TestWithRefuses(t *testing.T) {
	t.Parallel()
	b := mustRead(t, "testdata/board.yaml")
	for _, c := range []struct{ path, value, want string }{
		{"busbars.main A.spam", "1 m", `found the path "busbars.main A.spam", expected a key of busbar`},
		{"busbars.main Z.supports.span", "1 m", `expected the name of an entry that is there`},
		{"wibble", "1", "expected a key of switchboard"},
		{"", "1", "expected a key of switchboard"},
		{"site.altitude.x", "1 m", "expected a path to one value of altitude"},
		{"evidence[7].document", "X", "expected an item of the list, counted from 1"},
		{"evidence[0].document", "X", "expected an item of the list, counted from 1"},
		{"evidence.document", "X", "expected a path to one value of evidence"},
		{"site.altitude", "12", `found "12", expected a length with its unit`},
		{"site.altitude", "[1", "a value as it may stand behind a key"},
		{"title", "main \u202e board", "a value as it may stand behind a key"},
	} {
		_, problems := b.With(c.path, c.value)
		if problems.Len() != 1 || !strings.Contains(problems.Error(), c.want) {
			t.Errorf("%s = %s: %v, want %s", c.path, c.value, problems, c.want)
		}
	}
	empty, _, _ := Read("testdata/nowhere.yaml", Options{})
	if _, problems := empty.With("title", "x"); problems.Len() != 1 {
		t.Errorf("%v", problems)
	}
}

// Every leaf of the whole vocabulary can be replaced by its own example.
func TestWithEveryLeaf(t *testing.T) {
	t.Parallel()
	b := mustRead(t, "testdata/full.yaml")
	_, leaves := fullLeaves(t)
	want := statedOnly(b.Content)
	for i, l := range leaves {
		if i%7 != 0 { // each change reads the whole board
			continue
		}
		c, problems := b.With(l.path, l.node.text)
		if problems.Len() > 0 {
			if l.leaf.Kind == KindPairTable { // half a pair is no value of its own
				continue
			}
			t.Errorf("%s: %v", l.path, problems)
		} else if got := statedOnly(c.Content); got != want {
			t.Errorf("%s: %s", l.path, firstDifference(got, want))
		}
	}
}
