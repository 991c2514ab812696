package spec

import (
	"flag"
	"os"
	"slices"
	"strings"
	"testing"

	"boardproof/checker/place"
)

var update = flag.Bool("update", false, "write the expected files anew")

// golden compares text with a file of testdata.
func golden(t *testing.T, name, got string) {
	t.Helper()
	if *update {
		if err := os.WriteFile(name, []byte(got), 0o644); err != nil {
			t.Fatal(err)
		}
	}
	want, err := os.ReadFile(name)
	if err != nil {
		t.Fatal(err)
	}
	if got != string(want) {
		t.Errorf("%s: got\n%s\nwant\n%s", name, got, want)
	}
}

func mustRead(t testing.TB, name string) *Board {
	t.Helper()
	b, src, problems := Read(name, Options{Root: "."})
	if problems.Len() > 0 {
		var out strings.Builder
		problems.Print(&out, src)
		t.Fatalf("%s:\n%s", name, out.String())
	}
	return b
}

// Each of the thirty faults is one problem, none causes another, and together they are of many kinds.
func TestThirtyFaults(t *testing.T) {
	t.Parallel()
	_, src, problems := Read("testdata/faulty.yaml", Options{Root: "."})
	kinds := map[place.Kind]bool{}
	for _, p := range problems.All() {
		kinds[p.Kind] = true
		if p.Place.Line == 0 || p.Place.Column == 0 || p.Place.EndColumn <= p.Place.Column {
			t.Errorf("%s %s has no exact place", p.Place, p.Path)
		}
		for _, word := range []string{"invalid", "spec.", "units.", "yaml:", "*"} {
			if strings.Contains(strings.ReplaceAll(p.Sentence(), "*.", ""), word) {
				t.Errorf("%q speaks of %s", p.Sentence(), word)
			}
		}
	}
	if problems.Len() != 30 || len(kinds) < 12 {
		t.Errorf("%d problems of %d kinds, want 30 of at least 12", problems.Len(), len(kinds))
	}
	var out strings.Builder
	problems.Print(&out, src)
	golden(t, "testdata/faulty.txt", out.String())
}

func TestStates(t *testing.T) {
	t.Parallel()
	b, printed, n := readText(`board: B
title: see drawing
taps: none
site:
  altitude: tbc
  flood_level: none
  ambient_max: 60 °C
  ambient_min: {value: 30 °C, confirmed: yes}
  dust: [ordinary, "?"]
  corrosive_air: []
  seismic:
system: {}
work: n/a
documents: {D1: Diagram}
`, nil)
	if n != 0 {
		t.Fatal(printed)
	}
	for _, c := range []struct {
		name      string
		got, want State
	}{
		{"text that says nothing", b.Title.State, NotSaid},
		{"absent collection", b.Busbars.State, NotSaid},
		{"collection stated none", b.Taps.State, StatedNone},
		{"quantity that says nothing", b.Site.Altitude.State, NotSaid},
		{"quantity stated none", b.Site.FloodLevel.State, StatedNone},
		{"unusual quantity", b.Site.AmbientMax.State, Doubted},
		{"unusual but confirmed", b.Site.AmbientMin.State, Stated},
		{"list with an open item", b.Site.Dust.State, NotSaid},
		{"empty list", b.Site.CorrosiveAir.State, NotSaid},
		{"empty key", b.Site.Seismic.State, NotSaid},
		{"empty mapping", b.System.State, NotSaid},
		{"object that says nothing", b.Work.State, NotSaid},
		{"object with content", b.Site.State, Stated},
		{"word not said", b.Site.Location.State, NotSaid},
		{"short form", b.Documents.Entries[0].Value.Title.State, Stated},
	} {
		if c.got != c.want {
			t.Errorf("%s: %s, want %s", c.name, c.got, c.want)
		}
	}
	if b.Site.AmbientMax.Said() || b.Site.AmbientMax.Value != 60 {
		t.Errorf("the doubted value is used or lost: %v", b.Site.AmbientMax)
	}
	var remarks []string
	for _, r := range b.Remarks {
		remarks = append(remarks, r.Path+"="+r.Text)
	}
	slices.Sort(remarks)
	want := "site.altitude=tbc, site.corrosive_air=[], site.dust[2]=?, site.seismic=, system={}, title=see drawing, work=n/a"
	if got := strings.Join(remarks, ", "); got != want {
		t.Errorf("remarks %s, want %s", got, want)
	}
	if len(b.Doubts) != 1 || b.Doubts[0].Path != "site.ambient_max" || b.Doubts[0].Usual != "25 °C to 55 °C" {
		t.Errorf("doubts %v", b.Doubts)
	}
}

// What is not said still knows where it belongs and what describes it.
func TestPlacesOfWhatIsNotSaid(t *testing.T) {
	t.Parallel()
	b := mustRead(t, "testdata/board.yaml")
	riser, _ := b.Busbars.Get("riser 3")
	icw := riser.Value.ShortTimeWithstand.Current
	if icw.State != NotSaid || icw.Path != "busbars.riser 3.short_time_withstand.current" {
		t.Errorf("%v", icw)
	}
	if icw.Place != riser.Place || icw.Leaf.Path != "busbars.*.short_time_withstand.current" || icw.Says != Claims {
		t.Errorf("place %s, leaf %s, says %d; the riser stands at %s", icw.Place, icw.Leaf.Path, icw.Says, riser.Place)
	}
	if b.Site.Altitude.Says != Conditions {
		t.Error("the site is no condition")
	}
	if p := b.AuxiliarySupply.Trip.Place; p.File != "testdata/board.yaml" || p.Line == 0 {
		t.Errorf("what belongs to the top of the file has the place %s", p)
	}
}

func TestValues(t *testing.T) {
	t.Parallel()
	b := mustRead(t, "testdata/board.yaml")
	q1, _ := b.Units.Get("Q1")
	if v := q1.Value.Device.Icu; len(v.Entries) != 1 || v.Entries[0].Voltage != 400 || v.Entries[0].Value.Value != 66e3 || v.Entries[0].Value.Path != "units.Q1.device.icu[400 V]" {
		t.Errorf("icu %v", v)
	}
	if q1.Value.Poles.Value.Text() != "4" || q1.Value.Duty.Value != UnitDutyIncomer || q1.Value.Connects.Value != (Name{"TX1", "sources"}) {
		t.Errorf("poles %v, duty %v, connects %v", q1.Value.Poles, q1.Value.Duty, q1.Value.Connects)
	}
	fuse, _ := b.Protection.Get("P1-fuse")
	if p := fuse.Value.Points; len(p.Items) != 4 || p.Items[1].First != 4000 || p.Items[1].Second != 0.4 || p.Items[1].Path != "protection.P1-fuse.points[2]" {
		t.Errorf("points %v", p)
	}
	if c := b.Assembly.Enclosure.IPDoorOpen.Value; c.First != 2 || c.Second != -1 {
		t.Errorf("behind the door %v", c)
	}
	if d, _ := b.Documents.Get("D1"); d.Value.Date.Value != (Date{2026, 3, 14}) || d.Value.Date.Value.String() != "2026-03-14" {
		t.Errorf("date %v", d.Value.Date.Value)
	}
	if m := b.Assembly.InternalSeparation.Value; m.Rank() != 7 || m.Text() != "4b" || m.List().Name != "separation_form" {
		t.Errorf("form %d %s", m.Rank(), m.Text())
	}
	bars, _ := b.Busbars.Get("main A")
	if from := bars.Value.Supports.Strength.Value.From; from != "D2" {
		t.Errorf("from %q, want the nearest upward, D2", from)
	}
	if from := b.Site.Altitude.From; from != "" {
		t.Errorf("from %q where no document is named", from)
	}
}
