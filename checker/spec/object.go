package spec

import (
	"fmt"
	"strings"

	"boardproof/checker/place"
)

// A slot is a place for one value: a node, or nil where nothing is said.
type slot struct {
	r  *reader
	at At
	n  *node

	stands *Leaf // the object that the value stands for, in the short form
}

// An object is a mapping being read.
type object struct {
	r      *reader
	b      *branch
	at     At
	state  State
	values []*key // by field; nil where nothing is said
	short  *node  // the value of the short field, where the object is written so
}

// absent tells whether nothing is said for a field; if so, at becomes that of the line where the value
// belongs. Most fields of a board are absent, so that this is the quick way for them.
func (o *object) absent(i int, at *At) bool {
	if o.values != nil && o.values[i] != nil || o.short != nil && o.b.fields[i].Key == o.b.of.short {
		return false
	}
	o.belongs(i, at)
	return true
}

// belongs fills in where a field of the object belongs.
func (o *object) belongs(i int, at *At) {
	l := o.b.fields[i]
	at.Path = l.Key
	if o.at.Path != "" {
		at.Path = o.at.Path + "." + l.Key
	}
	at.Place, at.Via, at.From, at.Says, at.Leaf = o.at.Place, o.at.Via, o.at.From, l.Says, l
}

// slot returns the place for a field of the object.
func (o *object) slot(i int) slot {
	l := o.b.fields[i]
	s := slot{r: o.r}
	o.belongs(i, &s.at)
	switch {
	case o.values != nil && o.values[i] != nil:
		k := o.values[i]
		s.enter(k.value, k.at())
	case o.short != nil && l.Key == o.b.of.short:
		s.n, s.at.Place, s.stands = o.short, o.short.place, o.b.leaf
	}
	return s
}

// enter puts a node into the slot.
func (s *slot) enter(n *node, at place.Place) {
	s.n, s.at.Place = n, at
	s.at.Via = join(s.at.Via, n.via)
	if n.pin.set {
		s.at.From = n.pin.document
	}
}

// item returns the slot of an item of a list, counted from 0 here and from 1 in the path.
func (s *slot) item(i int) slot {
	inner := slot{r: s.r, at: s.at}
	inner.at.Path = fmt.Sprintf("%s[%d]", s.at.Path, i+1)
	n := s.n.items[i]
	at := n.place
	if n.shape == scalar && n.text == "" {
		at = s.at.Place
	}
	inner.enter(n, at)
	return inner
}

// given tells whether there is something to read. If not, state says which of the three it is; what
// says nothing is remarked.
func (s *slot) given() (state State, more bool) {
	switch {
	case s.n == nil || s.n.shape == faulty || s.r.overrun:
		return NotSaid, false
	case s.n.isNone() && s.at.Leaf != nil && s.at.Leaf.None:
		return StatedNone, false
	case s.n.isSilent():
		s.remark(s.n.text)
		return NotSaid, false
	case s.n.shape == mapping && len(s.n.keys) == 0:
		s.remark("{}")
		return NotSaid, false
	case s.n.shape == sequence && len(s.n.items) == 0:
		s.remark("[]")
		return NotSaid, false
	}
	return Stated, true
}

// isSaid tells whether there is something to read.
func (s *slot) isSaid() bool {
	_, more := s.given()
	return more
}

func (s *slot) remark(text string) {
	if s.r.once(s.at.Place, "remark", text) {
		s.r.remarks = append(s.r.remarks, Remark{s.at, text})
	}
}

func (s *slot) problem(kind place.Kind, got, want, hint string) {
	s.r.problem(place.Problem{Place: s.at.Place, Path: s.at.Path, Kind: kind, Got: got, Want: want, Hint: hint})
}

// wrongShape reports a list where a value belongs, and the like.
func (s *slot) wrongShape() {
	hint, ok := s.noneHint()
	if !ok {
		hint = s.at.Leaf.writing()
	}
	s.problem(place.WrongShape, s.n.describe(), s.at.Leaf.wanted(), hint)
}

// A holder is what an object stands in.
type holder uint8

const (
	fixedKey   holder = iota // may be none, where the vocabulary says so
	listItem                 // of a list of objects
	namedEntry               // of a collection; may have like:
)

// object opens the node in the slot as an object of the type of b.
func (s *slot) object(b *branch, in holder) object {
	o := object{r: s.r, b: b, at: s.at}
	if !s.r.spend(1, s.at) {
		return o
	}
	state, more := s.given()
	if state == StatedNone && in != fixedKey { // none is an answer for the whole collection only
		s.wrongShape()
		return o
	}
	o.state = state
	switch {
	case !more:
	case s.n.shape == mapping:
		o.open(s, in)
	case s.n.shape == scalar && b.of.short != "":
		o.short = s.n
	default:
		o.state = NotSaid
		s.wrongShape()
	}
	return o
}

// open assigns the keys of a mapping to the fields.
func (o *object) open(s *slot, in holder) {
	o.values = make([]*key, len(o.b.fields))
	for i := range s.n.keys {
		k := &s.n.keys[i]
		if f, known := o.b.of.index[k.name]; known {
			if o.b.leaf != nil || k.name != "basis" || k.value.shape == scalar && !k.value.isSilent() { // the loader has told
				o.values[f] = k
			}
			continue
		}
		switch {
		case k.name == "from":
			o.document(k)
		case k.name == "like" && in == namedEntry, k.name == "basis" && o.b.leaf == nil:
			// worked out before
		default:
			o.unknownKey(k, in)
		}
	}
}

// document reads `from:`, which holds for everything below.
func (o *object) document(k *key) {
	f := slot{r: o.r, at: o.at}
	f.at.Path = strings.TrimPrefix(o.at.Path+".from", ".")
	f.at.Leaf = nil
	f.enter(k.value, k.at())
	if name, ok := f.documentName(); ok {
		o.at.From = name
	}
}

// documentName reads the name of a document.
func (s *slot) documentName() (string, bool) {
	if _, more := s.given(); !more {
		return "", false
	}
	if s.n.shape != scalar {
		s.problem(place.WrongShape, s.n.describe(), "the name of a document", "write from: D1, with D1 declared under documents")
		return "", false
	}
	if _, ok := s.findName([]string{"documents"}); !ok {
		return "", false
	}
	return s.n.text, true
}

// unknownKey reports a key that the object does not have and says where it may belong.
func (o *object) unknownKey(k *key, in holder) {
	p := place.Problem{Place: k.place, Path: strings.TrimPrefix(o.at.Path+"."+k.name, "."), Kind: place.UnknownKey, Got: "the key " + place.Quote(k.name)}
	known := make([]string, 0, len(o.b.fields)+2)
	for _, l := range o.b.fields {
		known = append(known, l.Key)
	}
	p.Want = "a key of " + o.b.of.title
	if o.b.leaf != nil && o.b.leaf.Title != "" {
		p.Want = "a key of " + lowerFirst(o.b.leaf.Title)
	}
	elsewhere := outline().paths[k.name]
	switch near := nearestHint(k.name, append(known, "from")); {
	case k.name == "like":
		p.Hint = "like: copies an entry of a collection; write the values out here"
	case k.name == "basis":
		p.Hint = "write basis: at the top of the file"
	case len(elsewhere) > 0:
		p.Hint = placesOf(elsewhere, o.pattern())
	case near != "":
		p.Hint = near
	default:
		p.Hint = "known here: " + strings.Join(append(known, "from"), ", ")
		if in == namedEntry {
			p.Hint += ", like"
		}
	}
	o.r.problem(p)
}

func (o *object) pattern() string {
	if o.b.leaf == nil {
		return ""
	}
	return o.b.leaf.Path
}

// placesOf says where a key belongs: the places nearest to where it was written first.
func placesOf(leaves []*Leaf, from string) string {
	best, most := []string{}, -1
	for _, l := range leaves {
		n := shared(l.Path, from)
		if n > most {
			best, most = nil, n
		}
		if n == most {
			best = append(best, l.Path)
		}
	}
	text := strings.Join(best[:min(3, len(best))], " or ")
	if more := len(leaves) - min(3, len(best)); more > 0 {
		text += fmt.Sprintf(" (and %d more)", more)
	}
	return "the key belongs to " + text
}

// shared counts the steps two paths begin with.
func shared(a, b string) int {
	one, two := strings.Split(a, "."), strings.Split(b, ".")
	n := 0
	for n < len(one) && n < len(two) && one[n] == two[n] {
		n++
	}
	return n
}
