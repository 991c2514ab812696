package spec

import (
	"errors"
	"fmt"
	"os"
	"path/filepath"
	"strings"
	"testing"
)

// folder writes files into a new folder and returns it; a text that begins with "-> " makes a link.
func folder(t *testing.T, files map[string]string) string {
	t.Helper()
	dir := t.TempDir()
	for name, text := range files {
		full := filepath.Join(dir, filepath.FromSlash(name))
		if err := os.MkdirAll(filepath.Dir(full), 0o755); err != nil {
			t.Fatal(err)
		}
		var err error
		if target, link := strings.CutPrefix(text, "-> "); link {
			err = os.Symlink(filepath.FromSlash(target), full)
		} else {
			err = os.WriteFile(full, []byte(text), 0o644)
		}
		if err != nil {
			t.Fatal(err)
		}
	}
	return dir
}

func TestBasisPaths(t *testing.T) {
	t.Parallel()
	long := map[string]string{"p/.git/HEAD": "", "p/b.yaml": "board: B\nbasis: c1.yaml\n"}
	for i := 1; i < 9; i++ {
		long[fmt.Sprintf("p/c%d.yaml", i)] = fmt.Sprintf("basis: c%d.yaml\n", i+1)
	}
	const git = "p/.git/HEAD"
	for _, c := range []struct {
		name  string
		files map[string]string
		want  string // empty: no problem
	}{
		{"beside the file", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: x.yaml\n", "p/x.yaml": "title: T\n"}, ""},
		{"above, inside the project", map[string]string{git: "", "p/s/b.yaml": "board: B\nbasis: ../x.yaml\n", "p/x.yaml": "title: T\n"}, ""},
		{"link inside the project", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: l.yaml\n", "p/l.yaml": "-> x.yaml", "p/x.yaml": "title: T\n"}, ""},
		{"no project, beside the file", map[string]string{"b.yaml": "board: B\nbasis: x.yaml\n", "x.yaml": "title: T\n"}, ""},
		{"no project, above the file", map[string]string{"s/b.yaml": "board: B\nbasis: ../x.yaml\n", "x.yaml": "title: T\n"}, `b.yaml:2:8: found "../x.yaml", which leads out of the project, expected a file inside the project; move the basis into the project`},
		{"out of the project", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: ../x.yaml\n", "x.yaml": "title: T\n"}, `which leads out of the project`},
		{"link out of the project", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: l.yaml\n", "p/l.yaml": "-> ../x.yaml", "x.yaml": "title: T\n"}, `found "l.yaml", which leads out of the project`},
		{"linked folder out of the project", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: d/x.yaml\n", "p/d": "-> ../out", "out/x.yaml": "title: T\n"}, `found "d/x.yaml", which leads out of the project`},
		{"absolute", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: /x.yaml\n"}, `found "/x.yaml", an absolute path, expected a path relative to this file; write basis: ../basis.yaml`},
		{"backslash", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: ..\\x.yaml\n"}, `expected a path relative to this file with / between its parts`},
		{"missing", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: x.yaml\n"}, `x.yaml", expected a board file; check the path`},
		{"a folder", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: d\n", "p/d/x": ""}, `it is a folder or a device, expected a file that can be read`},
		{"itself", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: ./b.yaml\n"}, `found "./b.yaml", which builds on this file itself, expected files that do not build on each other in a circle`},
		{"itself by a link", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: l.yaml\n", "p/l.yaml": "-> b.yaml"}, `which builds on this file itself`},
		{"circle", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: x.yaml\n", "p/x.yaml": "basis: b.yaml\n"}, `x.yaml:1:8: found "b.yaml", which builds on this file itself`},
		{"long chain", long, `c7.yaml:1:8: found a chain of more than 8 files, expected a file with few files below it; put what the files share into one basis`},
		{"a list", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: [x.yaml]\n"}, `b.yaml:2:1: found a list, expected a path relative to this file; write basis: ../basis.yaml, or leave the key out`},
		{"says nothing", map[string]string{git: "", "p/b.yaml": "board: B\nbasis:\n"}, `b.yaml:2:1: found nothing, expected a path relative to this file`},
		{"fault in the basis", map[string]string{git: "", "p/b.yaml": "board: B\nbasis: x.yaml\n", "p/x.yaml": "site: {altitude: 12}\n"}, `x.yaml:1:18: found "12", expected a length with its unit`},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			dir := folder(t, c.files)
			file := ""
			for _, name := range []string{"b.yaml", "p/b.yaml", "s/b.yaml", "p/s/b.yaml"} {
				if _, ok := c.files[name]; ok {
					file = filepath.Join(dir, filepath.FromSlash(name))
				}
			}
			b, src, problems := Read(file, Options{})
			var out strings.Builder
			problems.Print(&out, src)
			if c.want == "" {
				if problems.Len() > 0 || b.Title.Value != "T" {
					t.Errorf("title %q, problems\n%s", b.Title.Value, out.String())
				}
				return
			}
			if problems.Len() != 1 || !strings.Contains(strings.SplitN(out.String(), "\n", 2)[0], c.want) {
				t.Errorf("%d problems, want the one\n%s\ngot\n%s", problems.Len(), c.want, out.String())
			}
		})
	}
}

func TestRootOption(t *testing.T) {
	t.Parallel()
	dir := folder(t, map[string]string{"s/b.yaml": "board: B\nbasis: ../x.yaml\n", "x.yaml": "title: T\n"})
	if b, _, problems := Read(filepath.Join(dir, "s", "b.yaml"), Options{Root: dir}); problems.Len() > 0 || b.Title.Value != "T" {
		t.Errorf("%v", problems)
	}
}

func TestUnreadableFile(t *testing.T) {
	t.Parallel()
	b, _, problems := Read("testdata/nowhere.yaml", Options{})
	if b == nil || problems.Len() != 1 || problems.Error() != `testdata/nowhere.yaml: found no file "testdata/nowhere.yaml", expected a board file; check the path` {
		t.Errorf("%v", problems)
	}
	_, _, problems = Read("x.yaml", Options{ReadFile: func(string) ([]byte, error) { return nil, errors.New("the line is down") }})
	if problems.Len() != 1 || problems.Error() != `x.yaml: found "x.yaml": the line is down, expected a file that can be read` {
		t.Errorf("%v", problems)
	}
}

func TestIsBoardFile(t *testing.T) {
	t.Parallel()
	for text, want := range map[string]bool{
		"board: B\n": true, "# x\nboard: B\n": true, "\ufeffboard: B\n": true, "\"board\": B\n": true, "{board: B}\n": true,
		"board: [\n": true, "title: x\n": false, "a:\n  board: B\n": false, "boards: B\n": false, "- board: B\n": false, "": false,
		"a: [board\n": false, "board\n": false, "'board' : [1\n": false,
	} {
		if got := IsBoardFile([]byte(text)); got != want {
			t.Errorf("%q: %t", text, got)
		}
	}
}
