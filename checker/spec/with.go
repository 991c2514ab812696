package spec

import (
	"errors"
	"slices"
	"strconv"
	"strings"

	"boardproof/checker/place"
)

// With returns the board as it would be read with one value replaced or set, for a cure or a
// what-if. Path is that of an [At], text what would stand behind the key: "80 kA", "sleeved",
// "none", or a list or mapping in brackets. The board itself stays as it is. Entries that copy the
// changed one with `like:` change with it; a value that an entry has only copied is set for that
// entry alone. The value keeps the place of the one it replaces, or gets that of the nearest thing
// stated above.
//
// The problems are those of the whole board; a path that leads nowhere is one of them.
func (b *Board) With(path, text string) (*Board, *place.Problems) {
	problems := &place.Problems{}
	c := &Board{file: b.file, digests: b.digests, incomplete: b.incomplete, tree: b.tree}
	value, err := valueFrom(text)
	e := edit{value: value, at: place.Place{File: b.file}}
	switch {
	case b.tree == nil:
		problems.Add(place.Problem{Place: e.at, Path: path, Kind: place.Unreadable, Got: "no board to change"})
		return c, problems
	case err != nil:
		problems.Add(place.Problem{Place: e.at, Path: path, Kind: place.Unreadable, Got: place.Quote(text), Want: "a value as it may stand behind a key"})
		return c, problems
	}
	tree, why := e.object(outline().root, b.tree, steps(path))
	if why != "" {
		problems.Add(place.Problem{Place: e.at, Path: path, Kind: place.UnknownKey, Got: "the path " + place.Quote(path), Want: why})
		return c, problems
	}
	c.tree = tree
	c.fill(problems)
	return c, problems
}

// valueFrom reads the text behind a key: brackets make a list or a mapping, all else is one value.
func valueFrom(text string) (*node, error) {
	trimmed := strings.TrimSpace(text)
	problems := &place.Problems{}
	if !strings.HasPrefix(trimmed, "[") && !strings.HasPrefix(trimmed, "{") {
		if _, ok := checkText("", []byte(trimmed), problems); !ok || strings.ContainsAny(trimmed, "\n\r") {
			return nil, errNoValue
		}
		return &node{text: trimmed, null: trimmed == ""}, nil
	}
	s, ok := checkText("", []byte("value: "+trimmed), problems)
	if ok {
		if root := decode(s, problems); root != nil && problems.Len() == 0 && len(root.keys) == 1 {
			return root.keys[0].value, nil
		}
	}
	return nil, errNoValue
}

var errNoValue = errors.New("no value as it may stand behind a key")

// steps cuts a path at its points; what stands in brackets belongs to the step before.
func steps(path string) []string {
	var all []string
	start, depth := 0, 0
	for i, r := range path {
		switch r {
		case '[':
			depth++
		case ']':
			depth--
		case '.':
			if depth == 0 {
				all = append(all, path[start:i])
				start = i + 1
			}
		}
	}
	return append(all, path[start:])
}

// An edit makes a changed copy of a tree; everything beside the path is shared.
type edit struct {
	value *node
	at    place.Place // of the nearest thing stated on the way
	from  string      // the document in force on the way
}

// placed returns the new value, and all in it, at the place of what it replaces.
func (e *edit) placed() *node { return placedAt(e.value, e.at) }

func placedAt(n *node, at place.Place) *node {
	out := *n
	out.place = at
	out.keys, out.items = slices.Clone(n.keys), slices.Clone(n.items)
	for i := range out.keys {
		out.keys[i].place = at
		out.keys[i].value = placedAt(out.keys[i].value, at)
	}
	for i := range out.items {
		out.items[i] = placedAt(out.items[i], at)
	}
	return &out
}

// object follows the path into an object; why is not empty where the path leads nowhere.
func (e *edit) object(b *branch, n *node, path []string) (out *node, why string) {
	name, index, _ := strings.Cut(path[0], "[")
	index = strings.TrimSuffix(index, "]")
	i, known := b.of.index[name]
	if !known {
		return nil, "a key of " + b.of.title
	}
	l, inner := b.fields[i], b.inner[i]
	n = long(b, n)
	e.from = pinned(n, pin{true, e.from}).document
	k, said := n.child(name)
	if said {
		e.at = k.at()
	}
	if !said || k.value.shape == scalar && inner != nil && (k.value.isNone() || k.value.isSilent()) {
		k = key{name, e.at, &node{shape: emptyShape(l), place: e.at}}
	}
	switch {
	case len(path) == 1 && index == "":
		k.value = e.placed()
	case index != "" && l.Kind == KindVoltageTable && len(path) == 1:
		k.value, why = e.set(k.value, index)
	case index != "" && l.Kind != KindVoltageTable:
		k.value, why = e.item(inner, k.value, index, path[1:])
	case len(path) > 1 && l.Kind == KindObject && !l.List:
		k.value, why = e.object(inner, long(inner, k.value), path[1:])
	case len(path) > 1 && l.Kind == KindCollection:
		k.value, why = e.entry(inner, k.value, path[1:])
	default:
		return nil, "a path to one value of " + name
	}
	if why != "" {
		return nil, why
	}
	return n.replaced(k), ""
}

func emptyShape(l *Leaf) shape {
	if l.List || l.Kind == KindPairTable {
		return sequence
	}
	return mapping
}

// replaced returns a mapping with the key set; other shapes become a mapping with that key alone.
func (n *node) replaced(k key) *node {
	out := *n
	if n.shape != mapping {
		out = node{shape: mapping, place: n.place, via: n.via, pin: n.pin}
	}
	out.keys = slices.Clone(out.keys)
	for i := range out.keys {
		if out.keys[i].name == k.name {
			out.keys[i] = k
			return &out
		}
	}
	out.keys = append(out.keys, k)
	return &out
}

// set puts the value into a table by voltage.
func (e *edit) set(n *node, voltage string) (*node, string) {
	k, said := n.child(voltage)
	if said {
		e.at = k.at()
	} else {
		k = key{voltage, e.at, nil}
	}
	k.value = e.placed()
	return n.replaced(k), ""
}

// item follows the path into an item of a list.
func (e *edit) item(inner *branch, n *node, index string, rest []string) (*node, string) {
	i, err := strconv.Atoi(index)
	if err != nil || n.shape != sequence || i < 1 || i > len(n.items) {
		return nil, "an item of the list, counted from 1"
	}
	out := *n
	out.items = slices.Clone(n.items)
	e.at = out.items[i-1].place
	switch {
	case len(rest) == 0:
		out.items[i-1] = e.placed()
	case inner == nil:
		return nil, "a path to one value"
	default:
		item, why := e.object(inner, out.items[i-1], rest)
		if why != "" {
			return nil, why
		}
		out.items[i-1] = item
	}
	return &out, ""
}

// entry follows the path into an entry of a collection. A list or table that the entry has copied is
// taken over whole before a part of it is changed.
func (e *edit) entry(inner *branch, n *node, path []string) (*node, string) {
	k, said := n.child(path[0])
	if !said {
		return nil, "the name of an entry that is there"
	}
	e.at = k.place
	e.from = pin{true, e.from}.or(n.pin).document
	if len(path) == 1 {
		k.value = e.placed()
		return n.replaced(k), ""
	}
	if strings.Contains(strings.Join(path[1:], "."), "[") {
		r := &reader{problems: &place.Problems{}, incomplete: true, reported: map[report]bool{}}
		for _, ready := range r.resolve(inner, n, "", e.from) {
			if ready.name == k.name {
				k.value = without(ready.value, "like")
			}
		}
	}
	value, why := e.object(inner, k.value, path[1:])
	if why != "" {
		return nil, why
	}
	k.value = value
	return n.replaced(k), ""
}
