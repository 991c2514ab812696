package main

import (
	"os"
	"path/filepath"
	"testing"
)

// expectedOutputs are whole outputs for the demonstration, kept in testdata/expected
// of the repository and rewritten by -update.
var expectedOutputs = []struct {
	file   string
	status int
	args   []string
}{
	{"tenderer-a.md", 0, []string{"review", "--format", "markdown", "--on", onDate, "specs/brackwater/tenderer-a.yaml"}},
	{"tenderer-a.json", 0, []string{"review", "--format", "json", "--on", onDate, "specs/brackwater/tenderer-a.yaml"}},
	{"tenderer-a.txt", 0, []string{"review", "--format", "terminal", "--color", "never", "--on", onDate, "specs/brackwater/tenderer-a.yaml"}},
	{"tenderer-d.md", 1, []string{"review", "--format", "markdown", "--on", onDate, "specs/brackwater/tenderer-d.yaml"}},
	{"tenderer-d.json", 1, []string{"review", "--format", "json", "--on", onDate, "specs/brackwater/tenderer-d.yaml"}},
	{"tenderer-d.txt", 1, []string{"review", "--format", "terminal", "--color", "never", "--on", onDate, "specs/brackwater/tenderer-d.yaml"}},
	{"tenderer-a-fault-peak.txt", 0, []string{"worksheet", "specs/brackwater/tenderer-a.yaml", "main A", "fault.peak"}},
}

func TestExpectedOutputs(t *testing.T) {
	atRoot(t)
	for _, c := range expectedOutputs {
		t.Run(c.file, func(t *testing.T) {
			got := output(t, c.status, c.args...)
			name := filepath.Join("testdata", "expected", c.file)
			if *update {
				if err := os.MkdirAll(filepath.Dir(name), 0o755); err != nil {
					t.Fatal(err)
				}
				if err := os.WriteFile(name, []byte(got), 0o644); err != nil {
					t.Fatal(err)
				}
				return
			}
			want, err := os.ReadFile(name)
			if err != nil {
				t.Fatal(err)
			}
			if difference := firstDifference(got, string(want)); difference != "" {
				t.Errorf("%s differs from %s (after a wanted change: go test ./cmd/boardproof -update)", difference, name)
			}
		})
	}
}

// TestNothingPasses: no report uses the word that a reader would take for an
// acceptance. Only "complies", with its basis, says that something is met.
func TestNothingPasses(t *testing.T) {
	atRoot(t)
	for _, c := range expectedOutputs {
		t.Run(c.file, func(t *testing.T) {
			if found := bareWord.FindString(output(t, c.status, c.args...)); found != "" {
				t.Errorf("found the word %q", found)
			}
		})
	}
}
