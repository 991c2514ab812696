package spec

import (
	"bytes"
	"encoding/json"
	"errors"
	"os"
	"strings"
	"testing"

	"boardproof/policies"

	"github.com/santhosh-tekuri/jsonschema/v6"
	"gopkg.in/yaml.v3"
)

func compiled(t *testing.T) *jsonschema.Schema {
	t.Helper()
	document, err := jsonschema.UnmarshalJSON(bytes.NewReader(policies.BoardSchema))
	if err != nil {
		t.Fatal(err)
	}
	c := jsonschema.NewCompiler()
	if err := c.AddResource("board.json", document); err != nil {
		t.Fatal(err)
	}
	s, err := c.Compile("board.json")
	if err != nil {
		t.Fatal(err)
	}
	return s
}

// instance turns YAML into what an editor shows its schema: numbers, truth values and texts.
func instance(t *testing.T, text string) any {
	t.Helper()
	var document yaml.Node
	if err := yaml.Unmarshal([]byte(text), &document); err != nil {
		t.Fatal(err)
	}
	return plain(document.Content[0])
}

func plain(n *yaml.Node) any {
	switch n.Kind {
	case yaml.MappingNode:
		m := map[string]any{}
		for i := 0; i+1 < len(n.Content); i += 2 {
			m[n.Content[i].Value] = plain(n.Content[i+1])
		}
		return m
	case yaml.SequenceNode:
		list := []any{}
		for _, item := range n.Content {
			list = append(list, plain(item))
		}
		return list
	}
	switch n.ShortTag() {
	case "!!int", "!!float":
		return json.Number(n.Value)
	case "!!bool":
		return strings.EqualFold(n.Value, "true")
	case "!!null":
		return nil
	}
	return n.Value
}

// refused returns the pointers at which the schema refuses the text.
func refused(t *testing.T, s *jsonschema.Schema, text string) map[string]bool {
	t.Helper()
	at := map[string]bool{}
	err := s.Validate(instance(t, text))
	fault := &jsonschema.ValidationError{}
	if err == nil {
		return at
	}
	if !errors.As(err, &fault) {
		t.Fatal(err)
	}
	var visit func(e *jsonschema.ValidationError)
	visit = func(e *jsonschema.ValidationError) {
		at["/"+strings.Join(e.InstanceLocation, "/")] = true
		for _, cause := range e.Causes {
			visit(cause)
		}
	}
	visit(fault)
	return at
}

func TestSchemaAcceptsWhatTheReaderAccepts(t *testing.T) {
	t.Parallel()
	s := compiled(t)
	for _, name := range []string{"testdata/full.yaml", "testdata/board.yaml"} {
		text, err := os.ReadFile(name)
		if err != nil {
			t.Fatal(err)
		}
		if err := s.Validate(instance(t, string(text))); err != nil {
			t.Errorf("%s: %v", name, err)
		}
	}
	accepted := `board: B
taps: none
documents: {D1: Diagram}
site: {altitude: {value: 4800 m, from: D1, confirmed: yes}, pollution_degree: 3}
sources: {TX1: {impedance: 6 %}, TX2: {like: TX1, impedance: {value: 6.1 %, measured: FAT-1}, from: D1}}
`
	if err := s.Validate(instance(t, accepted)); err != nil {
		t.Error(err)
	}
	if _, printed, n := readText(accepted, nil); n > 0 {
		t.Error(printed)
	}
}

// What is of the wrong unit, word or shape for the reader is so for the schema, leaf by leaf.
func TestSchemaRefusesEveryDamagedLeaf(t *testing.T) {
	t.Parallel()
	s := compiled(t)
	text, leaves := fullLeaves(t)
	for _, d := range damages {
		if !d.structural {
			continue
		}
		// Names are free in the schema: it does not know which are declared.
		fitting := d
		fitting.text = func(l *Leaf) string {
			if with := d.text(l); l.Kind != KindNames || strings.ContainsAny(with, "[{") {
				return with
			}
			return ""
		}
		damaged, _ := plant(text, leaves, fitting)
		at := refused(t, s, damaged)
		n := 0
		for _, l := range leaves {
			with := fitting.text(l.leaf)
			if with == "" || with[0] == '{' && (l.leaf.Kind == KindQuantity || l.leaf.Kind == KindVoltageTable) {
				continue
			}
			n++
			if !at[l.pointer] {
				t.Errorf("%s: the schema accepts %s as %s", d.name, with, l.pointer)
			}
		}
		if n < 400 {
			t.Errorf("%s: only %d damaged", d.name, n)
		}
	}
}

func TestSchemaRefusesUnknownKeysAndWrongShapes(t *testing.T) {
	t.Parallel()
	s := compiled(t)
	data, err := os.ReadFile("testdata/full.yaml")
	if err != nil {
		t.Fatal(err)
	}
	whole := instance(t, string(data)).(map[string]any)
	n := 0
	var visit func(b *branch, m map[string]any, pointer string)
	visit = func(b *branch, m map[string]any, pointer string) {
		n++
		m["wibble"] = "a"
		if s.Validate(whole) == nil {
			t.Errorf("the schema accepts an unknown key in %s", pointer)
		}
		delete(m, "wibble")
		for i, l := range b.fields {
			if b.inner[i] == nil || m[l.Key] == nil {
				continue
			}
			kept := m[l.Key]
			for name, wrong := range map[string]any{"an empty mapping": map[string]any{}, "an empty list": []any{},
				"a text": "wibble wobble", "a list of texts": []any{"wibble"}, "a number": json.Number("12.5")} {
				if b.inner[i].of.short != "" && !strings.Contains(name, "empty") {
					continue // the short form may be a text
				}
				if m[l.Key] = wrong; s.Validate(whole) == nil {
					t.Errorf("the schema accepts %s as %s/%s", name, pointer, l.Key)
				}
			}
			m[l.Key] = kept
			inner := kept
			if l.Kind == KindCollection {
				for _, e := range kept.(map[string]any) {
					inner = e
				}
			} else if l.List {
				inner = kept.([]any)[0]
			}
			visit(b.inner[i], inner.(map[string]any), pointer+"/"+l.Key)
		}
	}
	visit(outline().root, whole, "")
	if n < 80 {
		t.Errorf("only %d objects looked at", n)
	}
}
