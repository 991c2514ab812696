package facts

import (
	"boardproof/checker/spec"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// boardFacts fills what is known of the board as a whole.
func (w *walk) boardFacts() {
	b := w.board
	s := NewSubject(Boards, w.out.ID, b.Board.Place)
	setNumber(s, insulationVoltage, stated(w, b.Assembly.RatedInsulationVoltage, insulationVoltage.Symbol))
	setPair(s, voltageRequired, w.highestVoltage())
	w.doorOpen(s)
	setWord(s, underVoltage, yesOrNo(b.Work.WithDoorsOpenUnderVoltage), w.leaf(b.Work.WithDoorsOpenUnderVoltage.At), w.lack(b.Work.WithDoorsOpenUnderVoltage.At))
	text := ""
	if b.Practice.Said() {
		text = b.Practice.Value.Text()
	}
	setWord(s, practice, text, w.leaf(b.Practice.At), w.lack(b.Practice.At))
	w.out.Subjects = append(w.out.Subjects, s)
}

func yesOrNo(g spec.Given[bool]) string {
	switch {
	case !g.Said():
		return ""
	case g.Value:
		return yesNo[0]
	}
	return yesNo[1]
}

// highestVoltage is the higher of the system's voltage and that of the highest circuit
// above it. Whether there is such a circuit has to be said: nothing else would close
// the list.
func (w *walk) highestVoltage() working.Worst[units.Volt] {
	higher := w.board.System.HighestCircuitVoltage
	cases := []working.Case[units.Volt]{{Name: "the system", Result: w.nominal()}}
	var open working.Lacks
	var closedBy []*working.Working
	switch higher.State {
	case spec.StatedNone:
		closedBy = append(closedBy, &working.Working{Symbol: "Ue", Name: Name(higher.At), Word: "none", Leaf: w.leaf(higher.At)})
	case spec.NotSaid:
		l := w.lack(higher.At)
		l.Unit = "none"
		open = working.Lacks{l}
	default:
		cases = append(cases, working.Case[units.Volt]{Name: "the highest circuit", Result: stated(w, higher, "Ue")})
	}
	t := voltageRequired.atMost
	return working.Largest(t.Symbol, t.Label, cases, open, closedBy...)
}

// doorOpen is the protection against contact that remains with the door open, from the
// IP code there: a first numeral 2 keeps a finger out as IPXXB does.
// Source: IEC 60529, first numeral and additional letter.
func (w *walk) doorOpen(s *Subject) {
	code := w.board.Assembly.Enclosure.IPDoorOpen
	text := ""
	if code.Said() && (code.Value.First >= 0 || code.Value.Additional != 0) {
		rank := max(code.Value.First, 0)
		if code.Value.Additional != 0 {
			rank = max(rank, int(code.Value.Additional-'A')+1)
		}
		text = contactProtection[min(rank, len(contactProtection)-1)]
	}
	setWord(s, doorOpen, text, w.leaf(code.At), w.lack(code.At))
}
