package spec

import (
	"boardproof/checker/place"
	"boardproof/checker/units"
)

// A State says whether the file gives something.
type State int

// The states. Only what is Stated has a value to reckon with.
const (
	NotSaid    State = iota // the key is absent, or given but says nothing
	Stated                  // said, and usable
	StatedNone              // said to be none, which is an answer
	Doubted                 // said, but outside the usual range and not confirmed: not to be used
)

// String returns the state in words.
func (s State) String() string {
	switch s {
	case Stated:
		return "stated"
	case StatedNone:
		return "stated none"
	case Doubted:
		return "doubted"
	}
	return "not said"
}

// Says tells what kind of statement a part of the file makes.
type Says int

// The kinds of statements.
const (
	Claims     Says = iota // what the offer claims of the board
	Conditions             // what the site, the network and the owner demand or supply
)

// At says where a value stands or, if it is not said, where it belongs.
type At struct {
	// Path leads to the value, e.g. "busbars.main A.rated_current"; an item of a list is counted
	// from 1, "evidence[2].document", and a value at a voltage is written "icu[400 V]".
	Path string
	// Place is that of the value; of the key for objects, lists and tables; of the nearest thing
	// stated above for what is not said.
	Place place.Place
	// Via are the `basis:`, `like:` and alias lines through which the value came, outermost first.
	Via []place.Place
	// From is the document in force: the nearest `from:` upward; empty if there is none.
	From string
	Says Says
	Leaf *Leaf // the description in the vocabulary; nil for the board itself
}

// A Given is one value of the file.
type Given[T any] struct {
	Value T
	State State
	At
}

// Said tells whether there is a value to reckon with.
func (g Given[T]) Said() bool { return g.State == Stated }

// A Named is a collection of named things in the order of the file: entries of the file first,
// then what only its basis has.
type Named[T any] struct {
	Entries []Entry[T]
	State   State
	At
}

// Said tells whether the collection is given with entries.
func (n Named[T]) Said() bool { return n.State == Stated }

// Get returns the entry of that name.
func (n Named[T]) Get(name string) (*Entry[T], bool) {
	for i := range n.Entries {
		if n.Entries[i].Name == name {
			return &n.Entries[i], true
		}
	}
	return nil, false
}

// An Entry is one named thing of a collection. Its place is that of its name.
type Entry[T any] struct {
	Name string
	At
	Value T
}

// A List is a list of values or objects in the order of the file. A list one item of which says
// nothing ("tbc") is not said as a whole: nobody knows then what the list leaves out.
type List[T any] struct {
	Items []T
	State State
	At
}

// Said tells whether the list is given, whole and with items.
func (l List[T]) Said() bool { return l.State == Stated }

// A ByVoltage is a table of values that depend on the voltage, such as a breaking capacity. No two
// entries have the same voltage; their order is that of the file.
type ByVoltage[U units.Unit] struct {
	Entries []VoltageEntry[U]
	State   State
	At
}

// Said tells whether the table is given.
func (b ByVoltage[U]) Said() bool { return b.State == Stated }

// A VoltageEntry is the value at one voltage.
type VoltageEntry[U units.Unit] struct {
	Voltage units.Volt
	Value   Given[U]
}

// A Pairs is a list of pairs of quantities, such as the points of a curve, in the order of the file.
type Pairs[A, B units.Unit] struct {
	Items []Pair[A, B]
	State State
	At
}

// Said tells whether the pairs are given, all of them.
func (p Pairs[A, B]) Said() bool { return p.State == Stated }

// A Pair is two quantities that belong together.
type Pair[A, B units.Unit] struct {
	First  A
	Second B
	At
}
