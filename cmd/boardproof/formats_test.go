package main

import (
	"bytes"
	"encoding/json"
	"os"
	"path/filepath"
	"strings"
	"testing"

	"github.com/santhosh-tekuri/jsonschema/v6"
)

// schemaOf compiles a documented format; the working folder is the top of the
// repository.
func schemaOf(t *testing.T, name string) *jsonschema.Schema {
	t.Helper()
	schema, err := jsonschema.NewCompiler().Compile(filepath.Join("testdata", "formats", name))
	if err != nil {
		t.Fatal(err)
	}
	return schema
}

// TestJSONIsAsDocumented validates every JSON output that the tests know of against
// the schema of its format, and reads it into Go and back.
func TestJSONIsAsDocumented(t *testing.T) {
	atRoot(t)
	dir := t.TempDir()
	smallest := filepath.Join(dir, "smallest.yaml")
	if err := os.WriteFile(smallest, []byte("board: X\n"), 0o644); err != nil {
		t.Fatal(err)
	}
	const a, d = "specs/brackwater/tenderer-a.yaml", departing
	for _, c := range []struct {
		name, schema string
		status       int
		args         []string
	}{
		{"review of a sound board", "review.schema.json", 0, []string{"review", "--on", onDate, a}},
		{"review of a board that departs", "review.schema.json", 1, []string{"review", "--on", onDate, d}},
		{"review of the smallest board", "review.schema.json", 1, []string{"review", "--on", onDate, smallest}},
		{"review of several boards", "review.schema.json", 1, []string{"review", "--on", onDate, a, d, smallest}},
		{"worksheet of a sound board", "worksheet.schema.json", 0, []string{"worksheet", a}},
		{"worksheet of a board that departs", "worksheet.schema.json", 0, []string{"worksheet", d}},
		{"worksheet of the smallest board", "worksheet.schema.json", 0, []string{"worksheet", smallest}},
		{"worksheet of one number", "worksheet.schema.json", 0, []string{"worksheet", a, "main A", "fault.peak"}},
	} {
		t.Run(c.name, func(t *testing.T) {
			text := output(t, c.status, append(c.args, "--format", "json")...)
			doc, err := jsonschema.UnmarshalJSON(strings.NewReader(text))
			if err != nil {
				t.Fatal(err)
			}
			if err := schemaOf(t, c.schema).Validate(doc); err != nil {
				t.Error(err)
			}
			var again bytes.Buffer
			enc := json.NewEncoder(&again)
			enc.SetEscapeHTML(false)
			if err := enc.Encode(doc); err != nil {
				t.Fatal(err)
			}
			var compact bytes.Buffer
			if err := json.Compact(&compact, []byte(text)); err != nil {
				t.Fatal(err)
			}
			if len(strings.TrimSpace(again.String())) != compact.Len() {
				t.Errorf("read and written again it has %d bytes instead of %d", len(strings.TrimSpace(again.String())), compact.Len())
			}
		})
	}
}

// reviewDocument and worksheetDocument are the parts of the formats whose sense a
// schema cannot express.
type reviewDocument struct {
	Boards []struct {
		Counts   map[string]int
		Verdicts []struct {
			Rule, Subject, Kind, Verdict string
			Observed, Limit              *struct{ Term, Unit, Text string }
			Place                        *struct {
				File string
				Line int
			}
		}
		Queries []struct {
			What    string
			Waiting []struct {
				Rule     string
				Subjects []string
			}
		}
	}
}

type worksheetDocument struct {
	Quantities []struct {
		Number  int
		Kind    string
		Subject string
		Term    string
		Value   *float64
		Unit    string
		Place   *struct{ File string }
		Inputs  []struct {
			Number int
			Value  *float64
			Unit   string
			Place  *struct{ File string }
		}
	}
}

// TestReviewJSONAgreesWithItself: counts are those of the verdicts, every verdict has
// its place, a departure both numbers in one unit, and every verdict that is open for
// want of a value is waited for in a query.
func TestReviewJSONAgreesWithItself(t *testing.T) {
	atRoot(t)
	var doc reviewDocument
	if err := json.Unmarshal([]byte(output(t, statusOpen, "review", "--format", "json", "--on", onDate, "specs/brackwater")), &doc); err != nil {
		t.Fatal(err)
	}
	if len(doc.Boards) < 2 {
		t.Fatalf("%d boards, expected those of the demonstration", len(doc.Boards))
	}
	for i, b := range doc.Boards {
		counted := map[string]int{}
		waited := map[string]bool{}
		for _, q := range b.Queries {
			for _, w := range q.Waiting {
				for _, s := range w.Subjects {
					waited[w.Rule+" "+s] = true
				}
			}
		}
		for _, v := range b.Verdicts {
			name := v.Rule + " " + v.Subject
			counted[v.Verdict]++
			if v.Place == nil || v.Place.File == "" || v.Place.Line == 0 {
				t.Errorf("board %d: %s has no place", i+1, name)
			}
			if v.Verdict == "departs" && (v.Observed == nil || v.Limit == nil || v.Observed.Text == "" || v.Limit.Text == "" || v.Observed.Unit != v.Limit.Unit) {
				t.Errorf("board %d: %s departs without both sides in one unit", i+1, name)
			}
			if v.Verdict == "clarify" && !waited[name] {
				t.Errorf("board %d: %s is to be clarified and no query says what it waits for", i+1, name)
			}
		}
		for outcome, n := range b.Counts {
			if counted[outcome] != n {
				t.Errorf("board %d: %d counted as %q, there are %d", i+1, n, outcome, counted[outcome])
			}
		}
	}
}

// TestNumbersAreTheSameEverywhere: the value of a term in the worksheet is the value
// the review compared.
func TestNumbersAreTheSameEverywhere(t *testing.T) {
	atRoot(t)
	type value struct {
		Term  string
		Value *float64
	}
	var reviewed struct {
		Boards []struct {
			Verdicts []struct {
				Kind, Subject string
				Compared      []struct{ Observed, Limit *value }
			}
		}
	}
	var sheet worksheetDocument
	if err := json.Unmarshal([]byte(output(t, statusOpen, "review", "--format", "json", "--on", onDate, departing)), &reviewed); err != nil {
		t.Fatal(err)
	}
	if err := json.Unmarshal([]byte(output(t, statusNothingOpen, "worksheet", "--format", "json", departing)), &sheet); err != nil {
		t.Fatal(err)
	}
	in := map[string]float64{}
	for _, q := range sheet.Quantities {
		if q.Term != "" && q.Value != nil {
			in[q.Kind+" "+q.Subject+" "+q.Term] = *q.Value
		}
	}
	compared := 0
	for _, v := range reviewed.Boards[0].Verdicts {
		for _, c := range v.Compared {
			for _, side := range []*value{c.Observed, c.Limit} {
				if side == nil || side.Value == nil {
					continue
				}
				name := v.Kind + " " + v.Subject + " " + side.Term
				if got, ok := in[name]; !ok || got != *side.Value {
					t.Errorf("%s is %v in the review and %v in the worksheet", name, *side.Value, got)
				}
				compared++
			}
		}
	}
	if compared < 10 {
		t.Errorf("only %d values were compared", compared)
	}
}

// TestWorksheetJSONIsAChain: every input is a line with a lower number and the same
// value, and an input that a file states has the place of its line.
func TestWorksheetJSONIsAChain(t *testing.T) {
	atRoot(t)
	var doc worksheetDocument
	if err := json.Unmarshal([]byte(output(t, statusNothingOpen, "worksheet", "--format", "json", "specs/brackwater/tenderer-a.yaml")), &doc); err != nil {
		t.Fatal(err)
	}
	lines := map[int]int{}
	for i, q := range doc.Quantities {
		if q.Term == "" {
			lines[q.Number] = i
		}
	}
	inputs := 0
	for _, q := range doc.Quantities {
		for _, in := range q.Inputs {
			inputs++
			at, ok := lines[in.Number]
			if !ok || in.Number >= q.Number {
				t.Errorf("line %d rests on line %d", q.Number, in.Number)
				continue
			}
			line := doc.Quantities[at]
			if in.Value != nil && (line.Value == nil || *in.Value != *line.Value || in.Unit != line.Unit) {
				t.Errorf("line %d takes another value from line %d than stands there", q.Number, in.Number)
			}
			if (in.Place == nil) != (line.Place == nil) {
				t.Errorf("line %d: the place of its input %d is not that of the line", q.Number, in.Number)
			}
		}
	}
	if inputs < 100 {
		t.Errorf("only %d inputs were followed", inputs)
	}
}
