package rules

import (
	"bytes"
	"errors"
	"io"
	"regexp"
	"slices"
	"strconv"
	"strings"
	"unicode"

	"gopkg.in/yaml.v3"

	"boardproof/checker/place"
)

// document reads one YAML text strictly: known keys only, each once, nothing empty, no aliases, no
// tags. Faults go to problems with their place.
type document struct {
	file     string
	rows     int // added to each line: where the text begins in its file
	columns  int // added to each column
	problems *place.Problems
}

var yamlLine = regexp.MustCompile(`line (\d+): (.*)`)

// root parses text; nil if it cannot be followed, which is reported.
func (d *document) root(text []byte, want string) *yaml.Node {
	decoder := yaml.NewDecoder(bytes.NewReader(text))
	var first, second yaml.Node
	err := decoder.Decode(&first)
	if errors.Is(err, io.EOF) || (err == nil && len(first.Content) == 0) {
		d.add(place.Problem{Place: place.Place{File: d.file, Line: d.rows + 1}, Kind: place.Empty, Got: "nothing", Want: want})
		return nil
	}
	if err == nil {
		if err = decoder.Decode(&second); errors.Is(err, io.EOF) {
			return first.Content[0]
		}
		if err == nil {
			d.add(place.Problem{Place: d.at(&second), Kind: place.SecondDocument, Got: "a second document", Want: "one document in a file", Hint: "remove the line ---"})
			return nil
		}
	}
	row, said := 1, err.Error()
	if m := yamlLine.FindStringSubmatch(said); m != nil {
		row, _ = strconv.Atoi(m[1])
		said = m[2]
	}
	d.add(place.Problem{Place: place.Place{File: d.file, Line: d.rows + row}, Kind: place.Unreadable, Got: "YAML that cannot be followed (" + tame(said) + ")", Want: want, Hint: "check indentation, quotes and colons"})
	return nil
}

// tame makes the words of a library fit for a sentence of ours.
func tame(text string) string {
	text = strings.Join(strings.Fields(strings.ReplaceAll(text, "invalid", "unusable")), " ")
	return strings.TrimRight(strings.TrimPrefix(text, "yaml: "), ". ")
}

func (d *document) at(n *yaml.Node) place.Place {
	p := place.Place{File: d.file, Line: d.rows + n.Line, Column: d.columns + n.Column}
	if n.Kind == yaml.ScalarNode && n.Style == 0 {
		p.EndColumn = p.Column + len([]rune(n.Value))
	}
	return p
}

func (d *document) add(p place.Problem) { d.problems.Add(p) }

// key is a key of a mapping with its value.
type key struct{ name, value *yaml.Node }

// pairs checks that n is a mapping and lists its keys in order, each once.
func (d *document) pairs(n *yaml.Node, path, want string) []key {
	if !d.shape(n, yaml.MappingNode, path, want) {
		return nil
	}
	first := map[string]*yaml.Node{}
	var list []key
	for i := 0; i+1 < len(n.Content); i += 2 {
		k, v := n.Content[i], n.Content[i+1]
		if k.Kind != yaml.ScalarNode || k.Tag == "!!merge" {
			d.add(place.Problem{Place: d.at(k), Path: path, Kind: place.Alias, Got: "a key that is no plain word", Want: want})
			continue
		}
		if before, twice := first[k.Value]; twice {
			d.add(place.Problem{Place: d.at(k), Path: path, Kind: place.DuplicateKey, Got: place.Quote(k.Value) + " a second time", Want: "each key once", Related: []place.Place{d.at(before)}})
			continue
		}
		first[k.Value] = k
		list = append(list, key{k, v})
	}
	return list
}

// fields is pairs by name; keys outside allowed are reported with the nearest one.
func (d *document) fields(n *yaml.Node, path, want string, allowed ...string) map[string]*yaml.Node {
	found := map[string]*yaml.Node{}
	for _, k := range d.pairs(n, path, want) {
		if !slices.Contains(allowed, k.name.Value) {
			d.add(place.Problem{Place: d.at(k.name), Path: path, Kind: place.UnknownKey, Got: "the key " + place.Quote(k.name.Value), Want: "one of " + strings.Join(allowed, ", "), Hint: nearestHint(k.name.Value, allowed)})
			continue
		}
		found[k.name.Value] = k.value
	}
	return found
}

func nearestHint(word string, known []string) string {
	if near, ok := place.Nearest(word, known); ok {
		return "write " + near
	}
	return ""
}

// list checks that n is a list with at least one member.
func (d *document) list(n *yaml.Node, path, want string) []*yaml.Node {
	if !d.shape(n, yaml.SequenceNode, path, want) {
		return nil
	}
	if len(n.Content) == 0 {
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.Empty, Got: "an empty list", Want: want})
	}
	return n.Content
}

// text checks that n is a plain value that is not empty and has no characters that cannot be seen.
func (d *document) text(n *yaml.Node, path, want string) string {
	if !d.shape(n, yaml.ScalarNode, path, want) {
		return ""
	}
	if n.Tag == "!!null" || strings.TrimSpace(n.Value) == "" {
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.Empty, Got: "nothing", Want: want})
		return ""
	}
	if strings.ContainsFunc(n.Value, func(r rune) bool { return r != '\n' && !unicode.IsPrint(r) }) {
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.ControlCharacter, Got: place.Quote(n.Value), Want: "characters that can be seen"})
		return ""
	}
	return strings.TrimSpace(n.Value)
}

// word is text out of a list.
func (d *document) word(n *yaml.Node, path string, allowed ...string) string {
	want := "one of " + strings.Join(allowed, ", ")
	text := d.text(n, path, want)
	if text != "" && !slices.Contains(allowed, text) {
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.UnknownWord, Got: place.Quote(text), Want: want, Hint: nearestHint(text, allowed)})
		return ""
	}
	return text
}

func (d *document) shape(n *yaml.Node, kind yaml.Kind, path, want string) bool {
	switch {
	case n.Kind == yaml.AliasNode || n.Anchor != "":
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.Alias, Got: "an anchor or alias", Want: want, Hint: "write the value out"})
	case n.Style&yaml.TaggedStyle != 0:
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.CustomTag, Got: "the tag " + place.Quote(n.Tag), Want: want, Hint: "remove the tag"})
	case n.Kind != kind:
		d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.WrongShape, Got: shapeOf(n), Want: want})
	default:
		return true
	}
	return false
}

func shapeOf(n *yaml.Node) string {
	switch n.Kind {
	case yaml.MappingNode:
		return "keys with values"
	case yaml.SequenceNode:
		return "a list"
	}
	if n.Tag == "!!null" {
		return "nothing"
	}
	return place.Quote(n.Value)
}

// need reports the keys that are not there.
func (d *document) need(n *yaml.Node, path string, found map[string]*yaml.Node, keys ...string) {
	for _, k := range keys {
		if found[k] == nil {
			d.add(place.Problem{Place: place.Place{File: d.file, Line: d.rows + n.Line}, Path: path, Kind: place.MissingKey, Want: "the key " + k + " here"})
		}
	}
}
