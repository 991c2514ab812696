package generate

import (
	"bytes"
	"encoding/json"
	"go/parser"
	"go/token"
	"os"
	"strings"
	"testing"
)

func TestCommittedFilesAreFresh(t *testing.T) {
	t.Parallel()
	vocabulary := read(t, "../../../policies/board.yaml")
	source, schema, err := Generate(vocabulary)
	if err != nil {
		t.Fatal(err)
	}
	example, err := Example(vocabulary)
	if err != nil {
		t.Fatal(err)
	}
	for name, want := range map[string][]byte{
		"../board_gen.go": source, "../../../policies/board.schema.json": schema, "../testdata/full.yaml": example,
	} {
		if got := read(t, name); !bytes.Equal(got, want) {
			t.Errorf("%s does not fit policies/board.yaml; run go generate ./checker/spec", name)
		}
	}
}

func read(t *testing.T, name string) []byte {
	t.Helper()
	data, err := os.ReadFile(name)
	if err != nil {
		t.Fatal(err)
	}
	return data
}

// small is the smallest sound vocabulary; tests put a field into its first type.
const small = `format: 1
word_lists:
  colour: {ordered: true, title: colour, words: {red: like a rose, dark blue: like the sea}}
types:
  board:
    title: a board
    fields:
      board: {text: line, title: Name, example: B1}
      documents: {named: document, title: Documents}
      colour: {words: colour, title: Colour}
      FIELD
  document:
    title: a document
    short: title
    fields:
      title: {text: line, title: Title}
`

func with(field string) []byte { return []byte(strings.Replace(small, "FIELD", field, 1)) }

func TestUnsoundVocabulary(t *testing.T) {
	t.Parallel()
	for _, c := range []struct{ name, field, want string }{
		{"no kind", "x: {title: X}", "x: has no kind"},
		{"two kinds", "x: {title: X, text: line, quantity: current}", "has two kinds"},
		{"unknown modifier", "x: {title: X, text: line, unusual: 3}", `unknown key "unusual"`},
		{"repeated key", "colour: {title: X, text: line}", `"colour" stands already in line`},
		{"no title", "x: {text: line}", "x: has no title"},
		{"unknown dimension", "x: {quantity: currant, title: X}", "there is no dimension currant"},
		{"unknown list", "x: {words: colours, title: X}", "there is no word list"},
		{"unknown type", "x: {is: thing, title: X}", "there is no type"},
		{"unknown collection", "x: {name_of: things, title: X}", "there is no collection things"},
		{"contains itself", "x: {is: board, title: X}", "contains itself: board > board"},
		{"range of the wrong unit", "x: {quantity: current, title: X, usual: 1 V to 2 V}", "which is a voltage"},
		{"range upside down", "x: {quantity: current, title: X, usual: 2 A to 1 A}", "is no range"},
		{"usual beyond possible", "x: {quantity: current, title: X, usual: 1 A to 9 A, possible: 2 A to 9 A}", "reaches beyond possible"},
		{"example of the wrong unit", "x: {quantity: current, title: X, example: 5 V}", "which is a voltage"},
		{"example not usual", "x: {quantity: current, title: X, usual: 1 A to 2 A, example: 5 A}", "is not usual"},
		{"example no word", "x: {words: colour, title: X, example: green}", `"green" is not a word`},
		{"example beyond the count", "x: {count: [1, 3], title: X, example: 4}", "no count from 1 to 3"},
		{"count upside down", "x: {count: [3, 1], title: X}", "write count: [least, most]"},
		{"key with capitals", "fooBar: {text: line, title: X}", "write the key in small letters"},
		{"key of every object", "from: {text: line, title: X}", "every object has the key already"},
		{"same Go name", "c_olour: {text: line, title: X}\n      co_lour: {text: line, title: X}\n      c__olour: {text: line, title: Y}", "has the same Go name"},
		{"list of yes", "x: {yes_no: true, list: true, title: X}", "list does not go with yes_no"},
		{"says neither", "x: {text: line, title: X, says: nothing}", "as claims or conditions"},
		{"text of other form", "x: {text: page, title: X}", "write text: line"},
		{"date of other form", "x: {date: year, title: X}", "date: day or date: month"},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			_, _, err := Generate(with(c.field))
			if err == nil || !strings.Contains(err.Error(), c.want) {
				t.Errorf("got %v, want %q", err, c.want)
			}
			if err != nil && !strings.HasPrefix(err.Error(), "board.yaml:") {
				t.Errorf("%v does not begin with the line", err)
			}
		})
	}
	for _, c := range []struct{ name, old, new, want string }{
		{"unused type", "  document:\n", "  spare: {title: s, fields: {x: {text: line, title: X}}}\n  document:\n", "type spare: is used nowhere"},
		{"unused list", "word_lists:\n", "word_lists:\n  spare: {title: s, words: {a: b}}\n", "word list spare: is used nowhere"},
		{"word without description", "like a rose", "''", "has no description"},
		{"words alike in Go", "dark blue: like the sea", "Red: like blood", "has the same Go name ColourRed"},
		{"no documents", "documents: {named", "papers: {named", "no collection documents"},
		{"board not first", "      board: {text: line, title: Name, example: B1}\n", "", "its first field must be board"},
		{"short that is not there", "short: title", "short: name", "short field name does not exist"},
		{"name of the reader", "  document:\n", "  given: {title: s, fields: {x: {text: line, title: X}}}\n  document:\n", "is taken by the reader"},
		{"empty", small, "", "empty"},
		{"no YAML", small, "a: [", "board.yaml"},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			_, _, err := Generate([]byte(strings.Replace(string(with("")), strings.Replace(c.old, "FIELD", "", 1), c.new, 1)))
			if err == nil || !strings.Contains(err.Error(), c.want) {
				t.Errorf("got %v, want %q", err, c.want)
			}
		})
	}
}

func TestSoundVocabularyGivesGoAndJSON(t *testing.T) {
	t.Parallel()
	source, schema, err := Generate(with(`x: {quantity: current, title: "Current, rated", symbol: In, usual: 1 A to 2 kA, example: 65 A, none: true}`))
	if err != nil {
		t.Fatal(err)
	}
	if _, err := parser.ParseFile(token.NewFileSet(), "x.go", source, 0); err != nil {
		t.Error(err)
	}
	for _, want := range []string{"X Given[units.Ampere]", "ColourDarkBlue Colour = 2", "Low: 1, High: 2000"} {
		if !strings.Contains(string(source), want) {
			t.Errorf("the Go source lacks %s", want)
		}
	}
	if !json.Valid(schema) {
		t.Error("the schema is no JSON")
	}
}

func TestGoNames(t *testing.T) {
	t.Parallel()
	for in, want := range map[string]string{
		"rated_current": "RatedCurrent", "ip_rear": "IPRear", "type 1+2": "Type1And2", "TN-C-S": "TNCS", "4b": "4b", "< 25 %": "Below25Percent",
	} {
		if got := goName(in); got != want {
			t.Errorf("%q gives %s, want %s", in, got, want)
		}
	}
	if got := fieldName("at"); got != "AtField" {
		t.Errorf("at gives %s", got)
	}
}
