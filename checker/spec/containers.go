package spec

import (
	"strings"
	"unicode/utf8"

	"boardproof/checker/place"
	"boardproof/checker/units"
)

// one reads a single value.
func one[T any](o *object, i int, into *Given[T], read func(*slot) (T, State)) {
	if o.absent(i, &into.At) {
		return
	}
	s := o.slot(i)
	into.Value, into.State = valueIn(&s, read)
	into.At = s.at
}

// valueIn reads a value if there is one.
func valueIn[T any](s *slot, read func(*slot) (T, State)) (value T, state State) {
	// Some lists have a word that elsewhere says nothing.
	if word := s.n != nil && s.n.shape == scalar && s.at.Leaf.Words != nil && s.at.Leaf.Words.Number(s.n.text) > 0; !word {
		if state, more := s.given(); !more {
			return value, state
		}
	}
	return read(s)
}

// list reads a list of single values. Where an item says nothing, the list is not said.
func list[T any](o *object, i int, into *List[Given[T]], read func(*slot) (T, State)) {
	if o.absent(i, &into.At) {
		return
	}
	s := o.slot(i)
	into.At = s.at
	state, more := s.given()
	into.State = state
	if !more || !s.isList() || !s.r.spend(len(s.n.items), s.at) {
		if more {
			into.State = NotSaid
		}
		return
	}
	items := make([]Given[T], 0, len(s.n.items))
	for k := range s.n.items {
		item := s.item(k)
		var g Given[T]
		if !item.refuseNone() {
			g.Value, g.State = valueIn(&item, read)
		}
		g.At = item.at
		into.State = worse(into.State, g.State)
		items = append(items, g)
	}
	if into.State == Stated {
		into.Items = items
	}
}

// worse is the state of a whole of which a part has the second state.
func worse(whole, part State) State {
	switch {
	case whole == NotSaid || part == Stated:
		return whole
	case part == Doubted:
		return Doubted
	}
	return NotSaid
}

// refuseNone reports "none" where only the whole list or table can be none.
func (s *slot) refuseNone() bool {
	if !s.n.isNone() || !s.at.Leaf.None {
		return false
	}
	s.problem(place.WrongShape, `"none" as a part`, "a value, or none instead of the whole", s.at.Leaf.writing())
	return true
}

func (s *slot) isList() bool {
	if s.n.shape == sequence {
		return true
	}
	s.wrongShape()
	return false
}

// innerObject reads an object behind a fixed key.
func innerObject[T any](o *object, i int, into *T, read func(*object, *T)) {
	s := o.slot(i)
	inner := s.object(o.b.inner[i], fixedKey)
	read(&inner, into)
}

// objectList reads a list of objects. Where an item says nothing, the list is not said.
func objectList[T any](o *object, i int, into *List[T], read func(*object, *T)) {
	if o.absent(i, &into.At) {
		return
	}
	s := o.slot(i)
	into.At = s.at
	state, more := s.given()
	into.State = state
	if !more || !s.isList() || !s.r.spend(len(s.n.items)*o.b.inner[i].size, s.at) {
		if more {
			into.State = NotSaid
		}
		return
	}
	items := make([]T, len(s.n.items))
	for k := range s.n.items {
		item := s.item(k)
		inner := item.object(o.b.inner[i], listItem)
		read(&inner, &items[k])
		if inner.state != Stated {
			into.State = NotSaid
		}
	}
	if into.State == Stated {
		into.Items = items
	}
}

// namedObjects reads a collection.
func namedObjects[T any](o *object, i int, into *Named[T], read func(*object, *T)) {
	if o.absent(i, &into.At) {
		return
	}
	s := o.slot(i)
	into.At = s.at
	state, more := s.given()
	into.State = state
	switch {
	case !more:
		return
	case s.n.shape != mapping:
		into.State = NotSaid
		s.wrongShape()
		return
	case !s.r.spend(len(s.n.keys)*o.b.inner[i].size, s.at):
		into.State = NotSaid
		return
	}
	inner := o.b.inner[i]
	into.Entries = make([]Entry[T], 0, len(s.n.keys))
	for _, k := range s.r.resolve(inner, s.n, s.at.Path, s.at.From) {
		if !s.isName(k) {
			continue
		}
		e := slot{r: s.r, at: s.at}
		e.at.Path = s.at.Path + "." + k.name
		e.enter(k.value, k.place)
		entry := e.object(inner, namedEntry)
		into.Entries = append(into.Entries, Entry[T]{Name: k.name, At: entry.at})
		read(&entry, &into.Entries[len(into.Entries)-1].Value)
	}
}

// longestName is the number of characters of a name.
const longestName = 80

// isName checks the name of an entry: paths are written with points and brackets, and some words
// have a meaning of their own.
func (s *slot) isName(k key) bool {
	p := place.Problem{Place: k.place, Path: s.at.Path, Kind: place.UnknownKey, Got: "the name " + place.Quote(k.name)}
	switch {
	case k.name == "from" || k.name == "like" || k.name == "basis" || k.name == "none":
		p.Want = "names of entries"
		p.Hint = k.name + ": stands inside an entry; indent it further, or choose another name"
		if k.name == "none" {
			p.Hint = "choose another name"
		}
		if k.name == "basis" {
			p.Hint = "write basis: at the top of the file"
		}
	case strings.ContainsAny(k.name, ".[]{}\"\\\n\r\t"):
		p.Want, p.Hint = `a name without . [ ] { } " \ and line ends`, "write "+place.Quote(strings.Map(nameRune, k.name))
	case strings.TrimSpace(k.name) != k.name:
		p.Want, p.Hint = "a name without blanks at its ends", "write "+place.Quote(strings.TrimSpace(k.name))
	case utf8.RuneCountInString(k.name) > longestName:
		p.Want, p.Hint = "a name of at most 80 characters", "choose a shorter name and use title: for the rest"
	default:
		return true
	}
	s.r.problem(p)
	return false
}

func nameRune(r rune) rune {
	if strings.ContainsRune(".[]{}\"\\\n\r\t", r) {
		return '-'
	}
	return r
}

// byVoltage reads a table of quantities by voltage.
func byVoltage[U units.Unit](o *object, i int, into *ByVoltage[U]) {
	if o.absent(i, &into.At) {
		return
	}
	s := o.slot(i)
	into.At = s.at
	state, more := s.given()
	into.State = state
	if !more {
		return
	}
	into.State = NotSaid
	if s.n.shape != mapping {
		s.wrongShape()
		return
	}
	if !s.r.spend(len(s.n.keys), s.at) {
		return
	}
	whole := true
	first := map[float64]key{}
	voltage, _ := units.DimensionNamed("voltage")
	for _, k := range s.n.keys {
		e := slot{r: s.r, at: s.at}
		e.at.Path = s.at.Path + "[" + k.name + "]"
		e.enter(k.value, k.at())
		v, err := voltage.Parse(k.name)
		if err != nil {
			head := slot{r: s.r, at: e.at, n: &node{text: k.name, place: k.place}}
			head.at.Place = k.place
			head.unitFault(err, voltage, "400 V")
			whole = false
			continue
		}
		if before, twice := first[v]; twice {
			s.r.problem(place.Problem{Place: k.place, Path: e.at.Path, Kind: place.DuplicateKey,
				Got:  place.Quote(k.name) + ", the same voltage as " + place.Quote(before.name),
				Want: "each voltage once", Hint: "keep one of the two", Related: []place.Place{before.place}})
			whole = false
			continue
		}
		first[v] = k
		g := Given[U]{}
		if !e.refuseNone() {
			g.Value, g.State = valueIn(&e, quantityOf[U])
		}
		g.At = e.at
		whole = whole && g.State != NotSaid
		into.Entries = append(into.Entries, VoltageEntry[U]{units.Volt(v), g})
	}
	if whole {
		into.State = Stated
	} else {
		into.Entries = nil
	}
}

// pairsOf reads a list of pairs of quantities.
func pairsOf[A, B units.Unit](o *object, i int, into *Pairs[A, B]) {
	if o.absent(i, &into.At) {
		return
	}
	s := o.slot(i)
	into.At = s.at
	state, more := s.given()
	into.State = state
	if !more || !s.isList() || !s.r.spend(len(s.n.items), s.at) {
		if more {
			into.State = NotSaid
		}
		return
	}
	l := s.at.Leaf
	items := make([]Pair[A, B], 0, len(s.n.items))
	for k := range s.n.items {
		item := s.item(k)
		if item.refuseNone() || !item.isSaid() {
			into.State = NotSaid
			continue
		}
		if item.n.shape != sequence || len(item.n.items) != 2 {
			item.problem(place.WrongShape, item.n.describe(), "a pair of "+l.dimension.Phrase()+" and "+l.second.Phrase(), l.writing())
			into.State = NotSaid
			continue
		}
		first, second := item.item(0), item.item(1)
		a, okA := first.half(l.dimension)
		b, okB := second.half(l.second)
		if !okA || !okB {
			into.State = NotSaid
			continue
		}
		items = append(items, Pair[A, B]{A(a), B(b), item.at})
	}
	if into.State == Stated {
		into.Items = items
	}
}

// half reads one of the two quantities of a pair.
func (s *slot) half(d *units.Dimension) (float64, bool) {
	if s.refuseNone() || !s.isSaid() {
		return 0, false
	}
	if s.n.shape != scalar {
		s.problem(place.WrongShape, s.n.describe(), d.Phrase(), s.at.Leaf.writing())
		return 0, false
	}
	v, err := d.Parse(s.n.text)
	if err != nil {
		s.unitFault(err, d, d.Example())
		return 0, false
	}
	return v, true
}
