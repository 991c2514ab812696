package review_test

import (
	"encoding/json"
	"errors"
	"io"
	"os/exec"
	"slices"
	"strings"
	"testing"
)

// module is the path that the project's own packages begin with.
const module = "boardproof/"

// goPackage is what go list says of a package.
type goPackage struct {
	ImportPath string
	Standard   bool
	Imports    []string
}

// engineering packages hold formulas and tables of one subject each.
var engineering = []string{"checker/fault", "checker/protection", "checker/busbar", "checker/contact", "checker/arc", "checker/insulation", "checker/ppe"}

// may lists for each package what of the project it may import; what of other modules it
// may import stands in guests. The arrows are those of the design:
// cmd → report, schedule → review → rules → facts → spec, network, engineering → working → place, units.
func mayImport(name string) []string {
	if slices.Contains(engineering, name) {
		return []string{"checker/units", "checker/working"}
	}
	facts := append([]string{"checker/network", "checker/spec", "checker/place", "checker/units", "checker/working"}, engineering...)
	return map[string][]string{
		"checker/units":         {},
		"checker/place":         {},
		"checker/network":       {},
		"checker/working":       {"checker/place", "checker/units"},
		"checker/spec":          {"checker/place", "checker/units", "policies"},
		"checker/spec/generate": {"checker/units"},
		"checker/facts":         facts,
		"checker/rules":         {"checker/facts", "checker/place", "checker/units", "checker/working", "policies"},
		"checker/review":        {"checker/facts", "checker/place", "checker/rules", "checker/spec", "checker/units", "checker/working"},
		"checker/report":        {"checker/facts", "checker/place", "checker/review", "checker/rules", "checker/units", "checker/working"},
		"checker/schedule":      {"checker/place", "checker/review", "checker/rules", "checker/spec", "checker/units"},
		"policies":              {},
	}[name]
}

// guests are the modules that only the named packages may import.
var guests = map[string][]string{
	"gopkg.in/yaml.v3":                  {"checker/spec", "checker/spec/generate", "checker/rules"},
	"github.com/open-policy-agent/opa":  {"checker/rules"},
	"github.com/charmbracelet/glamour":  {"checker/report"},
	"github.com/charmbracelet/lipgloss": {"checker/report"},
	"github.com/muesli/termenv":         {"checker/report"},
}

func TestImportsGoOneWay(t *testing.T) {
	t.Parallel()
	known := 0
	for _, p := range packages(t) {
		name, own := strings.CutPrefix(p.ImportPath, module)
		if !own {
			continue
		}
		known++
		for _, imported := range p.Imports {
			if inside, ok := strings.CutPrefix(imported, module); ok {
				if !strings.HasPrefix(name, "cmd/") && !slices.Contains(mayImport(name), inside) {
					t.Errorf("%s imports %s, it may import %v", name, inside, mayImport(name))
				}
				continue
			}
			for guest, hosts := range guests {
				if (imported == guest || strings.HasPrefix(imported, guest+"/")) && !slices.Contains(hosts, name) {
					t.Errorf("%s imports %s, which belongs to %v", name, imported, hosts)
				}
			}
			if foreign := strings.Contains(strings.SplitN(imported, "/", 2)[0], "."); foreign && needsNobody(name) {
				t.Errorf("%s imports %s, it needs the standard library only", name, imported)
			}
		}
	}
	if known < 12 {
		t.Errorf("only %d packages of the project found", known)
	}
}

// needsNobody tells whether a package may import nothing of other modules.
func needsNobody(name string) bool {
	return slices.Contains(engineering, name) ||
		slices.Contains([]string{"checker/units", "checker/working", "checker/network", "checker/facts", "checker/review"}, name)
}

// TestOnlyFactsKnowsBothWorlds holds the one bridge between formulas and file. The
// reader of the file is known beyond it only to review and to the commands.
func TestOnlyFactsKnowsBothWorlds(t *testing.T) {
	t.Parallel()
	for _, p := range packages(t) {
		name, own := strings.CutPrefix(p.ImportPath, module)
		if !own {
			continue
		}
		imports := func(of string) bool { return slices.Contains(p.Imports, module+of) }
		if imports("checker/spec") && slices.ContainsFunc(engineering, imports) && name != "checker/facts" {
			t.Errorf("%s knows formulas and file; only checker/facts may", name)
		}
		if imports("checker/spec") && imports("checker/rules") && name != "checker/review" && name != "checker/schedule" && !strings.HasPrefix(name, "cmd/") {
			t.Errorf("%s knows file and rules; only checker/review may", name)
		}
	}
}

func packages(t *testing.T) []goPackage {
	t.Helper()
	cmd := exec.CommandContext(t.Context(), "go", "list", "-deps", "-test=false", "-json=ImportPath,Standard,Imports", "./...")
	cmd.Dir = root
	out, err := cmd.Output()
	if err != nil {
		t.Fatalf("go list: %v", err)
	}
	var list []goPackage
	for d := json.NewDecoder(strings.NewReader(string(out))); ; {
		var p goPackage
		switch err := d.Decode(&p); {
		case errors.Is(err, io.EOF):
			return list
		case err != nil:
			t.Fatal(err)
		}
		if !p.Standard {
			list = append(list, p)
		}
	}
}
