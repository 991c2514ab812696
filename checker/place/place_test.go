package place

import (
	"slices"
	"testing"

	"pgregory.net/rapid"
)

func TestPlaceString(t *testing.T) {
	t.Parallel()
	for _, row := range []struct {
		name  string
		place Place
		want  string
	}{
		{"column", Place{File: "board.yaml", Line: 3, Column: 18, EndColumn: 20}, "board.yaml:3:18"},
		{"line", Place{File: "board.yaml", Line: 3}, "board.yaml:3"},
		{"file", Place{File: "board.yaml"}, "board.yaml"},
		{"column without line", Place{File: "board.yaml", Column: 4}, "board.yaml"},
		{"cell", Place{File: "offer.xlsx", Sheet: "Schedule", Cell: "C14"}, "offer.xlsx!Schedule!C14"},
		{"sheet", Place{File: "offer.xlsx", Sheet: "Schedule"}, "offer.xlsx!Schedule"},
		{"no file", Place{Line: 3, Column: 18}, "3:18"},
		{"line alone", Place{Line: 3}, "3"},
		{"nothing", Place{}, "-"},
		{"control character in a name", Place{File: "a\x1b[31m\nb.yaml", Line: 1}, `a\x1b[31m\nb.yaml:1`},
		{"hidden character in a sheet", Place{File: "a.xlsx", Sheet: "S\u202e", Cell: "C\u200b1"}, `a.xlsx!S\u202e!C\u200b1`},
	} {
		t.Run(row.name, func(t *testing.T) {
			t.Parallel()
			if got := row.place.String(); got != row.want {
				t.Errorf("got %q, want %q", got, row.want)
			}
		})
	}
}

func TestIsZero(t *testing.T) {
	t.Parallel()
	if !(Place{}).IsZero() {
		t.Error("the zero value is some place")
	}
	for _, p := range []Place{{File: "a"}, {Line: 1}, {Column: 1}, {EndColumn: 1}, {Sheet: "S"}, {Cell: "A1"}} {
		if p.IsZero() {
			t.Errorf("%+v is no place", p)
		}
	}
}

func TestCompareOrder(t *testing.T) {
	t.Parallel()
	ordered := []Place{
		{},
		{Line: 7},
		{File: "a.yaml"},
		{File: "a.yaml", Line: 2},
		{File: "a.yaml", Line: 2, Column: 9},
		{File: "a.yaml", Line: 2, Column: 10},
		{File: "a.yaml", Line: 2, Column: 10, EndColumn: 12},
		{File: "a.yaml", Line: 10, Column: 1},
		{File: "b.xlsx"},
		{File: "b.xlsx", Sheet: "S"},
		{File: "b.xlsx", Sheet: "S", Cell: "no cell"},
		{File: "b.xlsx", Sheet: "S", Cell: "C2"},
		{File: "b.xlsx", Sheet: "S", Cell: "Z2"},
		{File: "b.xlsx", Sheet: "S", Cell: "AA2"},
		{File: "b.xlsx", Sheet: "S", Cell: "C14"},
		{File: "b.xlsx", Sheet: "T", Cell: "A1"},
	}
	for i, a := range ordered {
		for j, b := range ordered {
			want := 0
			if i < j {
				want = -1
			} else if i > j {
				want = 1
			}
			if got := Compare(a, b); got != want {
				t.Errorf("Compare(%v, %v) = %d, want %d", a, b, got, want)
			}
		}
	}
}

func drawPlace(t *rapid.T) Place {
	return Place{
		File:      rapid.SampledFrom([]string{"", "a.yaml", "b.yaml", "c\x1b.yaml"}).Draw(t, "file"),
		Line:      rapid.IntRange(0, 4).Draw(t, "line"),
		Column:    rapid.IntRange(0, 12).Draw(t, "column"),
		EndColumn: rapid.IntRange(0, 14).Draw(t, "end"),
		Sheet:     rapid.SampledFrom([]string{"", "", "S"}).Draw(t, "sheet"),
		Cell:      rapid.SampledFrom([]string{"", "", "A2", "B10", "x"}).Draw(t, "cell"),
	}
}

func TestCompareIsAnOrder(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		a, b, c := drawPlace(t), drawPlace(t), drawPlace(t)
		if Compare(a, b) != -Compare(b, a) {
			t.Fatalf("%+v and %+v are each before the other", a, b)
		}
		if (Compare(a, b) == 0) != (a == b) {
			t.Fatalf("%+v and %+v count as equal", a, b)
		}
		three := []Place{a, b, c}
		slices.SortFunc(three, Compare)
		if Compare(three[0], three[2]) > 0 {
			t.Fatalf("order goes round: %+v", three)
		}
	})
}
