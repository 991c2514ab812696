package main

import (
	"context"
	"io"
	"os"
	"os/exec"
	"path/filepath"
	"testing"
	"time"

	"boardproof/checker/facts"
	"boardproof/checker/report"
	"boardproof/checker/review"
	"boardproof/checker/spec"
)

// program builds the command and returns its path; the working folder is the top of
// the repository.
func program(t testing.TB) string {
	t.Helper()
	path := filepath.Join(t.TempDir(), "boardproof")
	if text, err := exec.Command("go", "build", "-o", path, "./cmd/boardproof").CombinedOutput(); err != nil {
		t.Fatalf("%v\n%s", err, text)
	}
	return path
}

func readBoard(b *testing.B) *spec.Board {
	b.Helper()
	board, _, problems := spec.Read(departing, spec.Options{})
	if problems.Len() > 0 {
		b.Fatal(problems.All()[0])
	}
	return board
}

func BenchmarkReadOneBoard(b *testing.B) {
	atRoot(b)
	for b.Loop() {
		readBoard(b)
	}
}

func BenchmarkFactsOfOneBoard(b *testing.B) {
	atRoot(b)
	board := readBoard(b)
	for b.Loop() {
		facts.Of(board)
	}
}

func BenchmarkLoadLibrary(b *testing.B) {
	for b.Loop() {
		if _, err := loadLibrary(); err != nil {
			b.Fatal(err)
		}
	}
}

// BenchmarkReviewOneBoard is from the board as read to the report, with the library
// loaded; cures are the greater part of it.
func BenchmarkReviewOneBoard(b *testing.B) {
	atRoot(b)
	pack, err := loadLibrary()
	if err != nil {
		b.Fatal(err)
	}
	board := readBoard(b)
	on := time.Date(2026, 12, 1, 0, 0, 0, 0, time.UTC)
	for _, c := range []struct {
		name  string
		cures bool
	}{{"without cures", false}, {"with cures", true}} {
		b.Run(c.name, func(b *testing.B) {
			for b.Loop() {
				reviews, err := review.Make(context.Background(), pack, []*spec.Board{board}, review.Options{On: on, Cures: c.cures})
				if err != nil {
					b.Fatal(err)
				}
				if err := report.Markdown(io.Discard, reviews[0]); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}

// BenchmarkFormats is the setting of a review that is made.
func BenchmarkFormats(b *testing.B) {
	atRoot(b)
	r := reviewOf(b, departing)
	for _, c := range []struct {
		name string
		set  func() error
	}{
		{"markdown", func() error { return report.Markdown(io.Discard, r) }},
		{"terminal", func() error { return report.Terminal(io.Discard, r, screenColumns, false) }},
		{"json", func() error { return report.JSON(io.Discard, []*review.Review{r}) }},
	} {
		b.Run(c.name, func(b *testing.B) {
			for b.Loop() {
				if err := c.set(); err != nil {
					b.Fatal(err)
				}
			}
		})
	}
}

// BenchmarkProcess is the whole program from start to end.
func BenchmarkProcess(b *testing.B) {
	atRoot(b)
	path := program(b)
	for _, c := range []struct {
		name   string
		status int
		args   []string
	}{
		{"version", statusNothingOpen, []string{"--version"}},
		{"review of the smallest board", statusOpen, []string{"review", smallestBoard(b)}},
		{"review of a sound board", statusNothingOpen, []string{"review", "specs/brackwater/tenderer-a.yaml"}},
		{"review with cures", statusOpen, []string{"review", departing}},
		{"review on a terminal", statusOpen, []string{"review", "--format", "terminal", departing}},
		{"worksheet", statusNothingOpen, []string{"worksheet", departing}},
	} {
		b.Run(c.name, func(b *testing.B) {
			for b.Loop() {
				cmd := exec.Command(path, c.args...)
				if err := cmd.Run(); cmd.ProcessState.ExitCode() != c.status {
					b.Fatalf("exit status %d, expected %d: %v", cmd.ProcessState.ExitCode(), c.status, err)
				}
			}
		})
	}
}

func smallestBoard(b *testing.B) string {
	b.Helper()
	name := filepath.Join(b.TempDir(), "smallest.yaml")
	if err := os.WriteFile(name, []byte("board: X\n"), 0o644); err != nil {
		b.Fatal(err)
	}
	return name
}
