package facts

import (
	"fmt"
	"slices"

	"boardproof/checker/network"
	"boardproof/checker/place"
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// walk is one pass over a board: everything that is computed once and used often.
type walk struct {
	board      *spec.Board
	evidence   evidence
	diagram    *network.Diagram
	interlocks map[string]*spec.Interlock // by the name that the diagram gives them
	states     []network.State
	open       working.Lacks      // what keeps the set of sources, motors and states from being complete
	closedBy   []*working.Working // the statements that make it complete
	branches   map[string]branch  // of sources and motors, by name and end
	out        *Board
}

// Of computes all facts of a board.
func Of(b *spec.Board) *Board {
	w := &walk{board: b, evidence: evidence{b}, branches: map[string]branch{}, interlocks: map[string]*spec.Interlock{}, out: &Board{ID: designation(b)}}
	w.drawDiagram()
	w.closeCollections()
	w.boardFacts()
	for i := range b.Busbars.Entries {
		w.busbarFacts(&b.Busbars.Entries[i])
	}
	if len(b.Busbars.Entries) == 0 {
		w.nobodyDescribed(Busbars, "main bars", w.board.Busbars.At, "main A: {…}")
	}
	return w.out
}

func designation(b *spec.Board) string {
	if b.Board.Said() {
		return b.Board.Value
	}
	return "board without designation"
}

// nobodyDescribed stands for a subject that every board has: main bars, an incomer.
// All that is known of it is that somebody has to describe it.
func (w *walk) nobodyDescribed(kind Kind, name string, at spec.At, how string) {
	s := NewSubject(kind, name, w.board.Board.Place)
	l := w.lack(at)
	l.Unit = how
	for _, t := range Terms().Terms() {
		if t.Kind == kind {
			s.Set(&Fact{Term: t, Lacks: working.Lacks{l}})
		}
	}
	w.out.Subjects = append(w.out.Subjects, s)
}

// setNumber records a result under a term.
func setNumber[U units.Unit](s *Subject, t *Term, r working.Result[U]) {
	f := &Fact{Term: t}
	switch {
	case r.Known():
		how := *r.How()
		f.Known, f.Number, f.How = true, how.Number, &how
	case r.Beyond() != nil:
		f.Outside = r.Beyond()
	default:
		f.Lacks = r.Missing()
	}
	s.Set(f)
}

// setPair records both bounds of a worst-of.
func setPair[U units.Unit](s *Subject, p pair, worst working.Worst[U]) {
	setNumber(s, p.atLeast, worst.AtLeast)
	setNumber(s, p.atMost, worst.AtMost)
}

// setWord records a stated word, ordered or not; text is the word in the term's list.
func setWord(s *Subject, t *Term, text string, leaf *working.Leaf, lack working.Lack) {
	f := &Fact{Term: t}
	for rank, allowed := range t.Words {
		if text == allowed {
			f.Known, f.Word, f.Rank = true, text, rank
			f.How = &working.Working{Symbol: t.ID, Name: t.Label, Word: text, Leaf: leaf}
		}
	}
	if !f.Known {
		f.Lacks = working.Lacks{lack}
	}
	s.Set(f)
}

// drawDiagram makes the one-line diagram from sections, bars and units.
func (w *walk) drawDiagram() {
	b, d := w.board, &network.Diagram{}
	for i := range b.Busbars.Entries {
		bars := &b.Busbars.Entries[i]
		d.Bars = append(d.Bars, network.Bar{Name: bars.Name, Section: w.sectionOf(bars), FedFrom: bars.Value.FedFrom.Value.Text})
	}
	for i := range b.Units.Entries {
		w.drawUnit(d, &b.Units.Entries[i])
	}
	for i := range b.Transfer.Interlocks.Items {
		if lock, ok := w.interlock(&b.Transfer.Interlocks.Items[i], i); ok {
			d.Interlocks = append(d.Interlocks, lock)
			w.interlocks[lock.Name] = &b.Transfer.Interlocks.Items[i]
		}
	}
	// Of two interlocks that exclude one state, the better shown is the one to rest on.
	slices.SortStableFunc(d.Interlocks, func(a, b network.Interlock) int {
		return int(w.evidence.basis(w.interlocks[b.Name].Kind.At)) - int(w.evidence.basis(w.interlocks[a.Name].Kind.At))
	})
	w.diagram = d
	for _, f := range d.Check() {
		w.open = w.open.Union(working.Lacks{{What: "a one-line diagram that can be followed", Because: f.Error(), Place: w.placeOfName(f.Subject)}})
	}
	w.states = d.States()
	for _, s := range w.states {
		state := State{Name: s.Name(), ExcludedBy: s.ExcludedBy}
		if s.ExcludedBy != "" {
			state.Place = w.interlocks[s.ExcludedBy].Place
		}
		w.out.States = append(w.out.States, state)
	}
}

// sectionOf is the section of main bars, stated with the bars or with the section.
func (w *walk) sectionOf(bars *spec.Entry[spec.Busbar]) string {
	if bars.Value.Section.Said() {
		return bars.Value.Section.Value.Text
	}
	for _, s := range w.board.Sections.Entries {
		if s.Value.Bars.Said() && s.Value.Bars.Value.Text == bars.Name {
			return s.Name
		}
	}
	return ""
}

func (w *walk) drawUnit(d *network.Diagram, u *spec.Entry[spec.Unit]) {
	v := &u.Value
	between := w.between(v)
	switch {
	case v.Connects.Said() && v.To.Said():
		d.Incomers = append(d.Incomers, network.Incomer{Name: u.Name, Source: v.Connects.Value.Text, Section: v.To.Value.Text})
	case len(between) == 2:
		d.Couplers = append(d.Couplers, network.Coupler{Name: u.Name, Between: [2]string(between)})
	case v.On.Said():
		d.Outgoing = append(d.Outgoing, network.Outgoing{Name: u.Name, Bar: v.On.Value.Text})
	case v.Duty.Said() && v.Duty.Value == spec.UnitDutyIncomer:
		w.open = w.open.Union(unsaid(w, v.Connects)).Union(unsaid(w, v.To))
	case v.Duty.Said() && v.Duty.Value == spec.UnitDutyCoupler:
		w.open = w.open.Union(working.Lacks{w.lack(v.Between.At)})
	default:
		w.open = w.open.Union(working.Lacks{w.lack(v.On.At)})
	}
}

func (w *walk) between(v *spec.Unit) []string {
	var names []string
	for _, n := range v.Between.Items {
		if n.Said() {
			names = append(names, n.Value.Text)
		}
	}
	return names
}

// interlock is one interlock of the transfer scheme. One of which kind, members or
// count is not said excludes nothing.
func (w *walk) interlock(lock *spec.Interlock, index int) (network.Interlock, bool) {
	if !lock.Kind.Said() || !lock.Of.Said() || !lock.ClosedAtOnce.Said() {
		return network.Interlock{}, false
	}
	n := network.Interlock{
		Name:     fmt.Sprintf("interlock %d, %s", index+1, lock.Kind.Value.Text()),
		AtMost:   lock.ClosedAtOnce.Value,
		Excludes: lock.Kind.Value.Rank() >= spec.InterlockKindMechanical.Rank(),
	}
	for _, of := range lock.Of.Items {
		if !slices.Contains(n.Of, of.Value.Text) { // named twice, it is still one switch
			n.Of = append(n.Of, of.Value.Text)
		}
	}
	return n, true
}

func (w *walk) placeOfName(name string) (at place.Place) {
	if u, ok := w.board.Units.Get(name); ok {
		return u.Place
	}
	if b, ok := w.board.Busbars.Get(name); ok {
		return b.Place
	}
	return w.board.Board.Place
}

// unsaid asks for a leaf if it was not said.
func unsaid[T any](w *walk, g spec.Given[T]) working.Lacks {
	if g.Said() {
		return nil
	}
	return working.Lacks{w.lack(g.At)}
}
