package spec

import (
	"os"
	"strings"
	"testing"
	"time"
	"unicode"

	"boardproof/checker/place"
)

// FuzzRead holds that the reader ends, never panics, gives sorted problems that can be printed, and
// that what has no problem reads the same twice and can be changed.
func FuzzRead(f *testing.F) {
	for _, name := range []string{"testdata/faulty.yaml", "testdata/board.yaml"} {
		data, err := os.ReadFile(name)
		if err != nil {
			f.Fatal(err)
		}
		f.Add(string(data))
	}
	for _, text := range []string{
		"", "board: B", "board: &a [*a]", "board: B\nunits: {Q1: {like: Q1}}", "board: B\nbasis: board.yaml", "board: B\nbasis: ../x",
		"board: \"\\x1b\"", "board: B\nsite: {altitude: {value: 1 m, confirmed: yes}}", "? [a]\n: b", "board: |\n  a\n  b", "board: 'it''s'",
		"board: B\nunits: {Q1: {device: {icu: {400 V: 1 kA, 0.4 kV: 2 kA}}}}", "board: B\nprotection: {F: {points: [[1 A, 1 s], []]}}",
		"%YAML 1.1\n---\nboard: B", "board: *x", "board: !!binary aGk=", "a: &x {b: *x}", "\ufeffboard: B\r\n", "board: B\n<<: *a", "- - - -",
		"board: B\ntitle: \"a\n\n  b\"", "board: >-\n\n\n  folded\n  text\n", "{board: B, units: {? Q1 : {duty: coupler, between: [A]}}}",
	} {
		f.Add(text)
	}
	f.Fuzz(func(t *testing.T, text string) {
		start := time.Now()
		b, src, problems := Read("board.yaml", Options{Root: ".", ReadFile: func(name string) ([]byte, error) {
			if name == "board.yaml" {
				return []byte(text), nil
			}
			return nil, os.ErrNotExist
		}})
		if spent := time.Since(start); spent > 10*time.Second {
			t.Errorf("reading took %s", spent)
		}
		IsBoardFile([]byte(text))
		if b == nil || src == nil {
			t.Fatal("no board or no sources")
		}
		var out strings.Builder
		problems.Print(&out, src)
		for _, r := range out.String() {
			if r != '\n' && !unicode.IsPrint(r) {
				t.Errorf("printed %U", r)
			}
		}
		all := problems.All()
		for i, p := range all {
			if i > 0 && place.Compare(all[i-1].Place, p.Place) > 0 {
				t.Errorf("%s stands behind %s", p.Place, all[i-1].Place)
			}
			if p.Sentence() == string(p.Kind) || p.Place.File == "" {
				t.Errorf("a problem without sentence or place: %+v", p)
			}
		}
		if len(all) > 0 {
			return
		}
		again, _, _ := readText(text, nil)
		if statedOnly(again.Content) != statedOnly(b.Content) {
			t.Error("reads differently the second time")
		}
		if _, problems := b.With("title", "changed"); problems.Len() > 0 {
			t.Errorf("cannot be changed: %v", problems)
		}
	})
}
