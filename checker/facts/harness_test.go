package facts_test

import (
	"os"
	"path"
	"testing"

	"boardproof/checker/facts"
	"boardproof/checker/spec"
)

// read is a board without problems; what is not given is read from the repository.
func read(t *testing.T, name string, given map[string]string) *spec.Board {
	t.Helper()
	b, _, problems := spec.Read(name, spec.Options{ReadFile: func(name string) ([]byte, error) {
		if text, ok := given[name]; ok {
			return []byte(text), nil
		}
		return os.ReadFile(path.Join("../..", name))
	}})
	if problems.Len() > 0 {
		t.Fatalf("the board has problems: %v\n%s", problems.All(), given[name])
	}
	return b
}

func readText(t *testing.T, text string) *spec.Board {
	t.Helper()
	return read(t, "board.yaml", map[string]string{"board.yaml": text})
}

// fact finds what is known of a subject; the board itself goes by "".
func fact(t *testing.T, b *facts.Board, subject, term string) *facts.Fact {
	t.Helper()
	for _, s := range b.Subjects {
		if s.ID == subject || subject == "" && s.Kind == facts.Boards {
			if f := s.Fact(term); f != nil {
				return f
			}
		}
	}
	t.Fatalf("no fact %s of %q", term, subject)
	return nil
}

// number is a known fact's number.
func number(t *testing.T, b *facts.Board, subject, term string) float64 {
	t.Helper()
	f := fact(t, b, subject, term)
	if !f.Known {
		t.Fatalf("%s of %s is not known: lacks %v, outside %+v", term, subject, f.Lacks, f.Outside)
	}
	return f.Number
}

// with writes values over those of a board: path, text, path, text …
func with(t *testing.T, b *spec.Board, pairs ...string) *spec.Board {
	t.Helper()
	for i := 0; i < len(pairs); i += 2 {
		changed, problems := b.With(pairs[i], pairs[i+1])
		if problems.Len() > 0 {
			t.Fatalf("%s: %s has problems: %v", pairs[i], pairs[i+1], problems.All())
		}
		b = changed
	}
	return b
}
