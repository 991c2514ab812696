package spec

import (
	"os"
	"testing"
)

func benchmarkRead(b *testing.B, name string) {
	b.Helper()
	data, err := os.ReadFile(name)
	if err != nil {
		b.Fatal(err)
	}
	b.SetBytes(int64(len(data)))
	b.ReportAllocs()
	for b.Loop() {
		_, _, problems := Read(name, Options{Root: ".", ReadFile: func(string) ([]byte, error) { return data, nil }})
		if problems.Len() > 0 {
			b.Fatal(problems)
		}
	}
}

// BenchmarkReadFourteenUnits reads a board of fourteen units, 6 kB.
func BenchmarkReadFourteenUnits(b *testing.B) { benchmarkRead(b, "testdata/board.yaml") }

// BenchmarkReadEveryField reads the board that says every field once, 19 kB.
func BenchmarkReadEveryField(b *testing.B) { benchmarkRead(b, "testdata/full.yaml") }

// BenchmarkWith replaces one leaf of a board of fourteen units.
func BenchmarkWith(b *testing.B) {
	board := mustRead(b, "testdata/board.yaml")
	b.ReportAllocs()
	for b.Loop() {
		if _, problems := board.With("busbars.main A.supports.span", "300 mm"); problems.Len() > 0 {
			b.Fatal(problems)
		}
	}
}
