package spec

import (
	"slices"
	"strings"
	"sync"

	"boardproof/checker/units"
)

// A Kind says what may stand behind a key.
type Kind int

// The kinds.
const (
	KindQuantity     Kind = iota + 1 // a number with its unit
	KindWords                        // a word of a list
	KindText                         // one line of text
	KindDay                          // a date
	KindMonth                        // a month, or a date
	KindCount                        // a whole number
	KindYesNo                        // yes or no
	KindNames                        // the name of an entry of a collection
	KindVoltageTable                 // quantities by voltage
	KindPairTable                    // pairs of quantities
	KindProtection                   // an IP code
	KindObject                       // a mapping with fixed keys
	KindCollection                   // a mapping with names as keys
)

// A Range is an interval of a quantity.
type Range struct {
	Text      string  // as the vocabulary writes it, e.g. "10 A to 400 kA"
	Low, High float64 // in the base unit of the dimension, both inside
}

func (r *Range) holds(v float64) bool { return r == nil || r.Low <= v && v <= r.High }

// A Field is one key of one type of the vocabulary.
type Field struct {
	Type, Key   string
	Kind        Kind
	Dimension   string    // of a quantity, of the values of a table, of the first of a pair
	Second      string    // dimension of the second of a pair
	Words       *WordList // of a word
	Collections []string  // paths of the collections a name may be taken from, first one first
	Of          string    // type of the objects
	Least, Most int       // of a count
	List        bool      // a list of such values
	None        bool      // "none" is an answer
	Title       string
	Symbol      string
	Note        string
	Clause      string
	Usual       *Range // outside: doubted until confirmed
	Possible    *Range // outside: refused
	Example     string // one-line YAML; empty for objects and collections

	says Says
}

// A Leaf is a field at its place in the whole file: the same field of the same type is another
// leaf under each key that holds the type.
type Leaf struct {
	*Field
	Path string // e.g. "busbars.*.short_time_withstand.current"; "*" for a name, "[*]" for an item
	Says Says

	dimension, second *units.Dimension
}

// IsValue tells whether the leaf is a value and not an object or a collection of objects.
func (l *Leaf) IsValue() bool { return l.Kind != KindObject && l.Kind != KindCollection }

// Leaves returns every value of the vocabulary in its order. The leaves must not be changed.
func Leaves() []*Leaf {
	return slices.DeleteFunc(Outline(), func(l *Leaf) bool { return !l.IsValue() })
}

// Outline returns every key of the vocabulary in its order, objects and collections before what
// they hold. The leaves must not be changed.
func Outline() []*Leaf { return slices.Clone(outline().all) }

// An objectType is a type of the vocabulary.
type objectType struct {
	name, title, short string
	fields             []*Field
	index              map[string]int // of the fields by key
}

// A branch is an object type at its place in the whole file.
type branch struct {
	of     *objectType
	leaf   *Leaf     // the key that holds it; nil for the root
	fields []*Leaf   // as of.fields
	inner  []*branch // as of.fields; nil for values
	size   int       // number of leaves in it, at all depths
}

type wholeOutline struct {
	root  *branch
	all   []*Leaf
	paths map[string][]*Leaf // by key
	types map[string]*objectType
}

// outline is worked out from the tables at its first use.
var outline = sync.OnceValue(func() *wholeOutline {
	w := &wholeOutline{paths: map[string][]*Leaf{}, types: map[string]*objectType{}}
	for _, t := range objectTypes {
		t.index = make(map[string]int, len(t.fields))
		for i, f := range t.fields {
			t.index[f.Key] = i
		}
		w.types[t.name] = t
	}
	w.root = w.grow(w.types["board"], nil, "", Claims)
	return w
})

func (w *wholeOutline) grow(t *objectType, holder *Leaf, path string, says Says) *branch {
	b := &branch{of: t, leaf: holder, fields: make([]*Leaf, len(t.fields)), inner: make([]*branch, len(t.fields)), size: 1}
	for i, f := range t.fields {
		if holder == nil {
			says = f.says
		}
		l := &Leaf{Field: f, Path: strings.TrimPrefix(path+"."+f.Key, "."), Says: says}
		l.dimension, _ = units.DimensionNamed(f.Dimension)
		l.second, _ = units.DimensionNamed(f.Second)
		b.fields[i] = l
		b.size++
		w.all = append(w.all, l)
		w.paths[f.Key] = append(w.paths[f.Key], l)
		if l.IsValue() {
			continue
		}
		below := l.Path
		switch {
		case f.Kind == KindCollection:
			below += ".*"
		case f.List:
			below += "[*]"
		}
		b.inner[i] = w.grow(w.types[f.Of], l, below, says)
		if f.Kind == KindObject && !f.List {
			b.size += b.inner[i].size
		}
	}
	return b
}
