package spec

import (
	"bytes"
	"errors"
	"fmt"
	"io"
	"strings"
	"unicode/utf8"

	"boardproof/checker/place"

	"gopkg.in/yaml.v3"
)

const (
	deepest   = 64      // levels a file may be nested
	mostNodes = 100_000 // values, lists and mappings of a file, aliases counted as often as they are used
)

// A decoder turns the nodes of the YAML library into ours.
type decoder struct {
	source   *sourceText
	problems *place.Problems
	nodes    int
	above    []*yaml.Node // the nodes around the present one, for aliases to themselves
	failed   bool         // the file is unusable as a whole
}

// decode parses a file; nil if it cannot be used at all.
func decode(s *sourceText, problems *place.Problems) *node {
	d := &decoder{source: s, problems: problems}
	document, err := parse(s.data)
	switch {
	case errors.Is(err, io.EOF):
		problems.Add(place.Problem{Place: place.Place{File: s.name, Line: 1}, Kind: place.Empty, Got: "an empty file",
			Want: "a board file", Hint: "begin with board: and the name of the board"})
		return nil
	case err != nil:
		problems.Add(syntaxProblem(s, err))
		return nil
	}
	root := d.node(document.Content[0], nil)
	if d.failed {
		return nil
	}
	if root.shape != mapping {
		problems.Add(place.Problem{Place: root.place, Kind: place.WrongShape, Got: root.describe(), Want: "a mapping of keys and values",
			Hint: "begin with board: and the name of the board"})
		return nil
	}
	return root
}

// A secondDocument reports a second document by its line.
type secondDocument struct{ line int }

func (e *secondDocument) Error() string { return "a second document" }

// parse reads the one YAML document of data. The library reports some faults by panic.
func parse(data []byte) (document *yaml.Node, err error) {
	defer func() {
		if r := recover(); r != nil {
			document, err = nil, fmt.Errorf("%v", r)
		}
	}()
	in := yaml.NewDecoder(bytes.NewReader(data))
	document = &yaml.Node{}
	if err := in.Decode(document); err != nil {
		return nil, err
	}
	second := &yaml.Node{}
	switch err := in.Decode(second); {
	case errors.Is(err, io.EOF):
	case err != nil:
		return nil, err
	default:
		return nil, &secondDocument{second.Line}
	}
	if len(document.Content) == 0 {
		return nil, io.EOF
	}
	return document, nil
}

func (d *decoder) place(n *yaml.Node) place.Place {
	column := n.Column
	if n.Anchor != "" { // the library gives the place of the anchor
		rest := d.source.from(n.Line, column)
		if after, ok := strings.CutPrefix(rest, "&"+n.Anchor); ok {
			column += utf8.RuneCountInString(rest) - utf8.RuneCountInString(strings.TrimLeft(after, " \t"))
		}
	}
	p := place.Place{File: d.source.name, Line: n.Line, Column: column}
	if n.Kind == yaml.ScalarNode || n.Kind == yaml.AliasNode {
		p.EndColumn = column + d.width(n, d.source.from(n.Line, column))
	} else {
		p.EndColumn = column + 1
	}
	return p
}

// width is the number of characters a scalar takes on its first line.
func (d *decoder) width(n *yaml.Node, rest string) int {
	switch {
	case n.Kind == yaml.AliasNode:
		return 1 + utf8.RuneCountInString(n.Value)
	case strings.HasPrefix(rest, n.Value) && n.Style&(yaml.DoubleQuotedStyle|yaml.SingleQuotedStyle) == 0:
		return utf8.RuneCountInString(n.Value)
	case n.Style&yaml.DoubleQuotedStyle != 0:
		return quotedWidth(rest, '"', '\\')
	case n.Style&yaml.SingleQuotedStyle != 0:
		return quotedWidth(rest, '\'', '\'')
	}
	return utf8.RuneCountInString(strings.TrimRight(rest, " \t"))
}

// quotedWidth counts the characters up to the closing quote, or to the end of the line.
func quotedWidth(rest string, quote, escape rune) int {
	width, escaped := 0, false
	for i, r := range rest {
		width++
		switch {
		case i == 0:
		case escaped:
			escaped = false
		case r == escape && (escape != quote || strings.HasPrefix(rest[i+1:], string(quote))):
			escaped = true
		case r == quote:
			return width
		}
	}
	return width
}

// node converts n; steps are the aliases that led to it.
func (d *decoder) node(n *yaml.Node, steps []place.Place) *node {
	out := &node{via: steps, place: d.place(n)}
	if d.failed {
		return out
	}
	d.nodes++
	switch {
	case d.nodes > mostNodes:
		d.fail(out.place, place.TooLarge, fmt.Sprintf("more than %d values, repeated ones included", mostNodes),
			"a board file of ordinary size", "take out the aliases that repeat large parts, or use like: and basis:")
		return out
	case len(d.above) > deepest:
		d.fail(out.place, place.TooDeep, fmt.Sprintf("values nested more than %d deep", deepest), "a few levels", "")
		return out
	case n.Kind != yaml.AliasNode && (n.Style&yaml.TaggedStyle != 0 || d.bareTag(n)):
		tag := tagAt(d.source.from(n.Line, n.Column), n.Tag)
		out.place.EndColumn = out.place.Column + utf8.RuneCountInString(tag)
		d.problems.Add(place.Problem{Place: out.place, Kind: place.CustomTag, Got: "a tag " + place.Quote(tag),
			Want: "a value without tag", Hint: "delete the tag and keep the value"})
		return d.unusable(out)
	}
	d.above = append(d.above, n)
	defer func() { d.above = d.above[:len(d.above)-1] }()
	switch n.Kind {
	case yaml.AliasNode:
		for _, a := range d.above {
			if a == n.Alias {
				d.fail(out.place, place.Alias, "an alias of the part it stands in", "a value", "write the value out")
				return out
			}
		}
		return d.node(n.Alias, join(steps, []place.Place{out.place}))
	case yaml.MappingNode:
		out.shape = mapping
		d.mapping(n, out)
	case yaml.SequenceNode:
		out.shape = sequence
		for _, item := range n.Content {
			out.items = append(out.items, d.node(item, nil))
		}
	default:
		out.text = n.Value
		out.null = n.Tag == "!!null"
		d.checkScalar(out)
	}
	return out
}

// bareTag tells whether the value has the tag "!", which the library does not show.
func (d *decoder) bareTag(n *yaml.Node) bool {
	return strings.HasPrefix(d.source.from(n.Line, n.Column), "!")
}

// unusable marks a value whose fault is reported, so that nothing more is said about it.
func (d *decoder) unusable(n *node) *node {
	n.shape = faulty
	return n
}

func (d *decoder) fail(at place.Place, kind place.Kind, got, want, hint string) {
	d.failed = true
	d.problems.Add(place.Problem{Place: at, Kind: kind, Got: got, Want: want, Hint: hint})
}

// checkScalar refuses characters that an escape such as "\x1b" has smuggled in.
func (d *decoder) checkScalar(n *node) {
	for _, r := range n.text {
		if forbidden(r) {
			d.problems.Add(controlCharacter(n.place, "", r))
			d.unusable(n)
			return
		}
	}
}

func (d *decoder) mapping(n *yaml.Node, out *node) {
	first := make(map[string]place.Place, len(n.Content)/2)
	for i := 0; i+1 < len(n.Content) && !d.failed; i += 2 {
		k, value := n.Content[i], n.Content[i+1]
		at := d.place(k)
		if i == 0 && n.Style&yaml.FlowStyle == 0 {
			out.place = at
		}
		switch {
		case k.Kind != yaml.ScalarNode:
			d.problems.Add(place.Problem{Place: at, Kind: place.WrongShape, Got: "a key that is a list, a mapping or an alias", Want: "a plain key"})
			continue
		case k.Value == "<<" && k.Style&(yaml.DoubleQuotedStyle|yaml.SingleQuotedStyle) == 0:
			d.problems.Add(place.Problem{Place: at, Kind: place.Alias, Got: `the merge key "<<"`, Want: "keys of the vocabulary",
				Hint: "write like: with the name of the entry to copy, or basis: with the file to build on"})
			continue
		case strings.TrimSpace(k.Value) == "" || k.Tag == "!!null":
			d.problems.Add(place.Problem{Place: at, Kind: place.Empty, Got: "an empty key", Want: "a key in front of the colon"})
			continue
		}
		if before, twice := first[k.Value]; twice {
			d.problems.Add(place.Problem{Place: at, Kind: place.DuplicateKey,
				Got:  fmt.Sprintf("%s a second time; it stands already in line %d", place.Quote(k.Value), before.Line),
				Want: "each key once", Hint: "keep one of the two", Related: []place.Place{before}})
			continue
		}
		first[k.Value] = at
		keyNode := &node{text: k.Value, place: at}
		if d.checkScalar(keyNode); keyNode.shape == faulty {
			continue
		}
		out.keys = append(out.keys, key{k.Value, at, d.node(value, nil)})
	}
}

// tagAt returns the tag as written.
func tagAt(rest, otherwise string) string {
	if strings.HasPrefix(rest, "!") {
		tag, _, _ := strings.Cut(rest, " ")
		return tag
	}
	return otherwise
}
