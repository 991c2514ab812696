package spec

import (
	"fmt"
	"strings"
	"testing"

	"boardproof/checker/place"
)

// via prints the steps of a value.
func via(at At) string {
	var steps []string
	for _, p := range at.Via {
		steps = append(steps, p.String())
	}
	return strings.Join(steps, " ")
}

func TestBasis(t *testing.T) {
	t.Parallel()
	b, printed, n := readText(`board: B
basis: shared/basis.yaml
from: D1
documents: {D1: Offer}
site: {altitude: 800 m}
sources:
  TX1: {rating: 1000 kVA, impedance: {measured: FAT-1}, link: {length: 20 m}}
  TX3: {like: TX2}
busbars:
  main A: {short_time_withstand: {current: 50 kA}, covering: tbc}
sections: {A: main A}
`, map[string]string{"shared/basis.yaml": `basis: ../deep.yaml
documents: {N1: Network data}
site: {from: N1, altitude: 12 m, ambient_max: 40 °C}
sources:
  TX1: {from: N1, rating: 1600 kVA, impedance: 6 %, link: {kind: cable, length: 14 m}}
  TX2: {like: TX1, upstream_device: HV}
busbars:
  main A: {short_time_withstand: {current: 65 kA, duration: 1 s}, covering: sleeved}
protection: {HV: {kind: relay}}
`, "deep.yaml": `board: other
system: {voltage: 400 V}
site: {humidity: 50 %}
evidence: [{document: TR-1}]
`})
	if n != 0 {
		t.Fatal(printed)
	}
	tx := func(name string) Source {
		e, ok := b.Sources.Get(name)
		if !ok {
			t.Fatalf("no %s", name)
		}
		return e.Value
	}
	bars := b.Busbars.Entries[0].Value
	const step, deeper = "board.yaml:2:8", "shared/basis.yaml:1:8"
	for _, c := range []struct {
		name              string
		at                At
		value             any
		want              string
		where, steps, doc string
	}{
		{"own value", b.Site.Altitude.At, b.Site.Altitude.Value, "800", "board.yaml:5:18", "", "D1"},
		{"value of the basis", b.Site.AmbientMax.At, b.Site.AmbientMax.Value, "40", "shared/basis.yaml:3:47", step, "N1"},
		{"value of its basis", b.Site.Humidity.At, b.Site.Humidity.Value, "0.5", "deep.yaml:3:18", step + " " + deeper, ""},
		{"whole object of its basis", b.System.Voltage.At, b.System.Voltage.Value, "400", "deep.yaml:2:19", step + " " + deeper, ""},
		{"entry in both", tx("TX1").Rating.At, tx("TX1").Rating.Value, "1e+06", "board.yaml:7:17", "", "D1"},
		{"short form under an own mapping", tx("TX1").Impedance.Value.At, tx("TX1").Impedance.Value.Value, "0.06", "shared/basis.yaml:5:48", step, "N1"},
		{"deep own value", tx("TX1").Link.Length.At, tx("TX1").Link.Length.Value, "20", "board.yaml:7:72", "", "D1"},
		{"deep value of the basis", tx("TX1").Link.Kind.At, tx("TX1").Link.Kind.Value.Text(), "cable", "shared/basis.yaml:5:66", step, "N1"},
		{"entry of the basis like one of both", tx("TX2").Rating.At, tx("TX2").Rating.Value, "1e+06", "board.yaml:7:17", step + " shared/basis.yaml:6:15", "D1"},
		{"own entry like one of the basis", tx("TX3").UpstreamDevice.At, tx("TX3").UpstreamDevice.Value.Text, "HV", "shared/basis.yaml:6:37", "board.yaml:8:15 " + step, ""},
		{"part of a rating", bars.ShortTimeWithstand.Duration.At, bars.ShortTimeWithstand.Duration.Value, "1", "shared/basis.yaml:8:61", step, ""},
	} {
		if got := fmt.Sprint(c.value); got != c.want {
			t.Errorf("%s: %s, want %s", c.name, got, c.want)
		}
		if c.at.Place.String() != c.where || via(c.at) != c.steps || c.at.From != c.doc {
			t.Errorf("%s: at %s through [%s] from %q, want %s [%s] %q", c.name, c.at.Place, via(c.at), c.at.From, c.where, c.steps, c.doc)
		}
	}
	if bars.Covering.Kind.State != NotSaid || len(b.Remarks) != 1 {
		t.Error("an own value that says nothing must hide that of the basis, and be remarked")
	}
	if b.Board.Value != "B" || len(b.Evidence.Items) != 1 {
		t.Errorf("board %q, evidence %v", b.Board.Value, b.Evidence)
	}
	if got := fmt.Sprint(names(b.Sources)); got != "[TX1 TX3 TX2]" {
		t.Errorf("order %s", got)
	}
	files := b.Files()
	if len(files) != 3 || files[0].Name != "board.yaml" || files[2].Name != "deep.yaml" || len(files[1].SHA256) != 64 {
		t.Errorf("files %v", files)
	}
}

func names[T any](n Named[T]) []string {
	var all []string
	for _, e := range n.Entries {
		all = append(all, e.Name)
	}
	return all
}

func TestBoardOfTheBasisIsNotTheBoard(t *testing.T) {
	t.Parallel()
	_, printed, n := readText("basis: x.yaml\n", map[string]string{"x.yaml": "board: other\n"})
	if n != 1 || !strings.Contains(printed, `found no key "board"`) {
		t.Error(printed)
	}
}

func TestLike(t *testing.T) {
	t.Parallel()
	b, printed, n := readText(`board: B
documents: {D1: Offer, D2: Answer}
busbars:
  C: {like: B, rated_current: 1000 A}
  A: {from: D1, rated_current: 2500 A, short_time_withstand: {current: 65 kA, duration: 1 s}, neutral: none}
  B: {like: A, from: D2, short_time_withstand: {current: 50 kA}, neutral: {rated_current: 800 A}, protective: &pe {conductor: copper}}
units:
  Q1: {positions: [connected, test], device: {icu: {400 V: 66 kA, 690 V: 20 kA}, rated_current: {value: 12 A, confirmed: yes}}}
  Q2: {like: Q1, positions: [removed], device: {icu: {400 V: 50 kA}, rated_current: {value: 9 A}}}
`, nil)
	if n != 0 {
		t.Fatal(printed)
	}
	c := b.Busbars.Entries[0].Value
	if v := c.ShortTimeWithstand.Current; v.Value != 50e3 || v.Place.Line != 6 || via(v.At) != "board.yaml:4:13" || v.From != "D2" {
		t.Errorf("from the next: %v", v)
	}
	if v := c.ShortTimeWithstand.Duration; v.Value != 1 || v.Place.Line != 5 || via(v.At) != "board.yaml:4:13 board.yaml:6:13" || v.From != "D1" {
		t.Errorf("from the one behind: %v through %s", v, via(v.At))
	}
	if v := c.RatedCurrent; v.Value != 1000 || v.From != "" || via(v.At) != "" {
		t.Errorf("own value: %v", v)
	}
	if c.Neutral.State != Stated || b.Busbars.Entries[1].Value.Neutral.State != StatedNone {
		t.Error("an own object must win over none, and the entry copied must stay as it is")
	}
	q2 := b.Units.Entries[1].Value
	if len(q2.Positions.Items) != 1 || len(q2.Device.Icu.Entries) != 1 {
		t.Errorf("lists and tables are replaced as a whole: %v, %v", q2.Positions.Items, q2.Device.Icu.Entries)
	}
	if q2.Device.RatedCurrent.State != Doubted || b.Units.Entries[0].Value.Device.RatedCurrent.State != Stated && len(b.Doubts) > 1 {
		t.Errorf("a value is confirmed for itself only: %v", q2.Device.RatedCurrent)
	}
}

// A fault in a copied entry is told once, where it stands.
func TestFaultsOfCopiesAreToldOnce(t *testing.T) {
	t.Parallel()
	_, printed, n := readText("board: B\nunits:\n  Q1: {device: {icm: 7, kind: wibble}, wobble: 1}\n  Q2: {like: Q1}\n  Q3: {like: Q2}\n", nil)
	if n != 3 {
		t.Errorf("%d problems, want 3:\n%s", n, printed)
	}
	b, _, _ := readText("board: B\nunits:\n  Q1: {device: {icm: tbc, rated_current: 2 A}}\n  Q2: {like: Q1}\n", nil)
	if len(b.Remarks) != 1 || len(b.Doubts) != 1 || b.Units.Entries[1].Value.Device.RatedCurrent.State != Doubted {
		t.Errorf("remarks %v, doubts %v", b.Remarks, b.Doubts)
	}
}

func TestFaultyLike(t *testing.T) {
	t.Parallel()
	chain := "board: B\nunits:\n"
	for i := range 20 {
		chain += fmt.Sprintf("  U%d: {like: U%d}\n", i, i+1)
	}
	for _, c := range []struct{ name, text, want string }{
		{"itself", "board: B\nunits:\n  Q1: {like: Q1}\n", `board.yaml:3:14: found "Q1", which closes a circle, expected entries that do not copy each other in a circle; take like: out of "Q1"`},
		{"circle of three", "board: B\nunits:\n  Q1: {like: Q2}\n  Q2: {like: Q3}\n  Q3: {like: Q1}\n", `board.yaml:5:14: found "Q1", which closes a circle, expected entries that do not copy each other in a circle; take like: out of "Q1" or "Q2" or "Q3"`},
		{"nobody", "board: B\nunits:\n  Q1: {like: Q9}\n  Q10: {duty: spare}\n", `board.yaml:3:14: found "Q9", expected the name of another entry of units; write "Q1"`},
		{"a list", "board: B\nunits:\n  Q1: {like: [Q2]}\n  Q2: {duty: spare}\n", `board.yaml:3:8: found a list, expected the name of another entry of units; write the name, or leave the key out`},
		{"nothing", "board: B\nunits:\n  Q1: {like: }\n", `board.yaml:3:8: found nothing, expected the name of another entry of units; write the name, or leave the key out`},
		{"long chain", chain + "  U20: {duty: spare}\n", "the end of a chain of more than 16 entries that copy each other"},
		{"outside a collection", "board: B\nsite: {like: A}\n", `board.yaml:2:8: found the key "like", expected a key of site; like: copies an entry of a collection; write the values out here`},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			_, printed, n := readText(c.text, nil)
			if n != 1 || !strings.Contains(strings.SplitN(printed, "\n", 2)[0], c.want) {
				t.Errorf("%d problems, want the one\n%s\ngot\n%s", n, c.want, printed)
			}
		})
	}
}

// A broken basis leaves names open; nothing is said of what may be declared there.
func TestBrokenBasisCausesNoOtherProblem(t *testing.T) {
	t.Parallel()
	text := "board: B\nbasis: x.yaml\nunits:\n  Q1: {connects: TX1, to: A, like: Q0}\n"
	for name, basis := range map[string]string{"missing": "", "no YAML": "a: [\n", "not UTF-8": "a: \xff\n"} {
		files := map[string]string{"x.yaml": basis}
		if name == "missing" {
			files = nil
		}
		if _, printed, n := readText(text, files); n != 1 {
			t.Errorf("%s: %d problems\n%s", name, n, printed)
		}
	}
	if _, printed, n := readText("board: B\nunits: [Q1]\nsections: {A: tbc}\nstandby: [Q1]\n", nil); n != 1 {
		t.Errorf("a collection of the wrong shape: %d problems\n%s", n, printed)
	}
}

func TestProblemsAreSorted(t *testing.T) {
	t.Parallel()
	_, _, problems := Read("testdata/faulty.yaml", Options{Root: "."})
	all := problems.All()
	for i := 1; i < len(all); i++ {
		if place.Compare(all[i-1].Place, all[i].Place) > 0 {
			t.Errorf("%s stands behind %s", all[i].Place, all[i-1].Place)
		}
	}
}
