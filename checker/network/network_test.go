package network

import (
	"fmt"
	"slices"
	"testing"

	"github.com/google/go-cmp/cmp"
	"pgregory.net/rapid"
)

// twoSections is a board with two transformers, a generator on section B and a
// coupler, without interlocks.
func twoSections() *Diagram {
	return &Diagram{
		Incomers: []Incomer{{"Q1", "TX1", "A"}, {"Q2", "TX2", "B"}, {"QG", "G1", "B"}},
		Couplers: []Coupler{{"QC", [2]string{"A", "B"}}},
		Bars:     []Bar{{Name: "main A", Section: "A"}, {Name: "main B", Section: "B"}, {Name: "riser 3", FedFrom: "main A"}},
		Outgoing: []Outgoing{{"P1", "riser 3"}, {"P2", "main B"}},
	}
}

func admitted(d *Diagram) []string {
	var names []string
	for _, s := range d.States() {
		if s.ExcludedBy == "" {
			names = append(names, s.Name())
		}
	}
	return names
}

func TestStates(t *testing.T) {
	t.Parallel()
	t.Run("every combination with an incomer closed counts when nothing excludes it", func(t *testing.T) {
		if got := len(admitted(twoSections())); got != 14 {
			t.Errorf("found %d states, expected 14: 7 sets of incomers with and without the coupler", got)
		}
	})
	t.Run("key interlocks leave what they leave", func(t *testing.T) {
		d := twoSections()
		d.Interlocks = []Interlock{
			{Name: "keys 1", Of: []string{"Q1", "Q2", "QC"}, AtMost: 2, Excludes: true},
			{Name: "keys 2", Of: []string{"Q2", "QG"}, AtMost: 1, Excludes: true},
			{Name: "keys 3", Of: []string{"Q1", "QG", "QC"}, AtMost: 2, Excludes: true},
		}
		want := []string{
			"Q1 closed", "Q2 closed", "QG closed", "Q1 + Q2 closed", "Q1 + QG closed",
			"Q1 + QC closed", "Q2 + QC closed", "QG + QC closed",
		}
		if diff := cmp.Diff(want, admitted(d)); diff != "" {
			t.Error(diff)
		}
	})
	t.Run("an interlock in software excludes nothing", func(t *testing.T) {
		d := twoSections()
		d.Interlocks = []Interlock{{Name: "software", Of: []string{"Q1", "Q2", "QC"}, AtMost: 2}}
		if got := len(admitted(d)); got != 14 {
			t.Errorf("found %d states, expected all 14", got)
		}
		if got := d.Disregarded(State{Closed: []string{"Q1", "Q2", "QC"}}); got != "software" {
			t.Errorf("the interlock that was disregarded: found %q, expected %q", got, "software")
		}
		if got := d.Disregarded(State{Closed: []string{"Q1", "QC"}}); got != "" {
			t.Errorf("nothing speaks against two closed: found %q", got)
		}
	})
}

func TestBranches(t *testing.T) {
	t.Parallel()
	d := twoSections()
	rows := []struct {
		name   string
		closed []string
		bar    string
		want   []Branch
	}{
		{"own incomer", []string{"Q1"}, "main A", []Branch{{Source: "TX1", Incomer: "Q1"}}},
		{"dead", []string{"Q1"}, "main B", nil},
		{"over the coupler", []string{"Q1", "QC"}, "main B", []Branch{{"TX1", "Q1", []string{"QC"}}}},
		{"distribution bars see what their main bars see", []string{"Q2", "QG", "QC"}, "riser 3",
			[]Branch{{"TX2", "Q2", []string{"QC"}}, {"G1", "QG", []string{"QC"}}}},
		{"bars nobody describes", []string{"Q1"}, "riser 9", nil},
	}
	for _, row := range rows {
		t.Run(row.name, func(t *testing.T) {
			if diff := cmp.Diff(row.want, d.Branches(State{Closed: row.closed}, row.bar)); diff != "" {
				t.Error(diff)
			}
		})
	}
	if got := d.Together(State{Closed: []string{"Q1", "QC"}}, "main B"); !slices.Equal(got, []string{"P1", "P2"}) {
		t.Errorf("units together over the closed coupler: found %v", got)
	}
	if got := d.Together(State{Closed: []string{"Q1"}}, "main B"); !slices.Equal(got, []string{"P2"}) {
		t.Errorf("units on section B alone: found %v", got)
	}
}

func TestDevicesNearestFirst(t *testing.T) {
	t.Parallel()
	d := &Diagram{
		Incomers: []Incomer{{"Q1", "TX1", "A"}},
		Couplers: []Coupler{{"QAB", [2]string{"A", "B"}}, {"QBC", [2]string{"B", "C"}}},
		Bars:     []Bar{{Name: "main C", Section: "C"}},
	}
	branches := d.Branches(State{Closed: []string{"Q1", "QAB", "QBC"}}, "main C")
	if len(branches) != 1 {
		t.Fatalf("found %d branches, expected 1", len(branches))
	}
	if diff := cmp.Diff([]string{"QBC", "QAB", "Q1"}, branches[0].Devices()); diff != "" {
		t.Error(diff)
	}
}

func TestCheck(t *testing.T) {
	t.Parallel()
	rows := []struct {
		name string
		d    Diagram
		want string
	}{
		{"fed from itself", Diagram{Bars: []Bar{{Name: "r1", FedFrom: "r2"}, {Name: "r2", FedFrom: "r1"}}}, "r1: is fed from itself: r1 from r2 from r1"},
		{"hangs on nothing", Diagram{Bars: []Bar{{Name: "r1", FedFrom: "main"}}}, `r1: hangs on the bars "main", which nobody describes`},
		{"no section", Diagram{Bars: []Bar{{Name: "main"}}}, "main: belongs to no section and is fed from no other bars"},
		{"couples itself", Diagram{Couplers: []Coupler{{"QC", [2]string{"A", "A"}}}}, `QC: couples section "A" with itself`},
		{"too many", Diagram{Couplers: make([]Coupler, 0), Incomers: make([]Incomer, 13)}, "units: 13 incomers and couplers make more supply states than can be judged one by one; the limit is 12"},
	}
	for _, row := range rows {
		t.Run(row.name, func(t *testing.T) {
			faults := row.d.Check()
			if len(faults) == 0 || faults[0].Error() != row.want {
				t.Errorf("found %v, expected %q", faults, row.want)
			}
		})
	}
}

// TestPathProperties holds the walk against what must be true of any diagram: a
// branch starts at a closed incomer, every coupler on it is closed, the couplers
// lead from the incomer's section to the bars', and a ring of couplers ends.
func TestPathProperties(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		sections := rapid.IntRange(1, 5).Draw(t, "sections")
		name := func(i int) string { return fmt.Sprintf("S%d", i) }
		d := &Diagram{}
		for i := range sections {
			d.Bars = append(d.Bars, Bar{Name: "main " + name(i), Section: name(i)})
		}
		for i := range rapid.IntRange(1, 4).Draw(t, "incomers") {
			d.Incomers = append(d.Incomers, Incomer{fmt.Sprintf("Q%d", i), fmt.Sprintf("T%d", i), name(rapid.IntRange(0, sections-1).Draw(t, "to"))})
		}
		for i := range rapid.IntRange(0, 5).Draw(t, "couplers") {
			d.Couplers = append(d.Couplers, Coupler{fmt.Sprintf("C%d", i), [2]string{name(rapid.IntRange(0, sections-1).Draw(t, "a")), name(rapid.IntRange(0, sections-1).Draw(t, "b"))}})
		}
		for _, state := range d.States() {
			for _, bar := range d.Bars {
				for _, branch := range d.Branches(state, bar.Name) {
					checkBranch(t, d, state, branch, bar.Section)
				}
			}
		}
	})
}

func checkBranch(t *rapid.T, d *Diagram, state State, branch Branch, target string) {
	i := slices.IndexFunc(d.Incomers, func(in Incomer) bool { return in.Name == branch.Incomer })
	if i < 0 || !state.Is(branch.Incomer) || d.Incomers[i].Source != branch.Source {
		t.Fatalf("branch %+v does not start at a closed incomer of its source", branch)
	}
	here := d.Incomers[i].Section
	for _, name := range branch.Couplers {
		j := slices.IndexFunc(d.Couplers, func(c Coupler) bool { return c.Name == name })
		if j < 0 || !state.Is(name) {
			t.Fatalf("branch %+v goes through %q, which is not closed", branch, name)
		}
		switch between := d.Couplers[j].Between; here {
		case between[0]:
			here = between[1]
		case between[1]:
			here = between[0]
		default:
			t.Fatalf("branch %+v: coupler %q does not touch section %q", branch, name, here)
		}
	}
	if here != target {
		t.Fatalf("branch %+v ends in %q, not in %q", branch, here, target)
	}
}
