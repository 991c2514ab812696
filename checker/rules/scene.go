package rules

import (
	"math"
	"slices"
	"strconv"
	"strings"
	"sync"

	"github.com/open-policy-agent/opa/v1/ast"

	"boardproof/checker/facts"
)

// scene is a few boards as one input of the engine. Rules cannot see that there are several: they read
// one subject and the limits.
type scene struct {
	boards []*facts.Board
	seats  map[facts.Kind][]seat // by board, then in the board's order
	limits []*facts.Fact         // by slot

	once  sync.Once
	value ast.Value
	err   error
	pack  *Pack
}

// seat is one subject; its number among those of its kind is its name for the engine.
type seat struct {
	board    int
	subject  *facts.Subject
	facts    []*facts.Fact // by slot
	practice string        // of the subject or its board; empty if not said
	fault    string        // why its facts cannot be given to the engine; empty if they can
}

func (p *Pack) scene(boards []*facts.Board) *scene {
	s := &scene{boards: boards, seats: map[facts.Kind][]seat{}, pack: p}
	limits := map[string]*facts.Fact{}
	for _, l := range p.limits {
		limits[l.Fact.Term.ID] = l.Fact
	}
	for _, t := range p.slots.terms[facts.Limits] {
		s.limits = append(s.limits, limits[t.ID])
	}
	pairs := map[facts.Kind][]bounds{}
	for kind, terms := range p.slots.terms {
		pairs[kind] = boundsOf(terms)
	}
	for i, b := range boards {
		practice := ""
		for _, subject := range b.Of(facts.Boards) {
			practice = wordOf(subject, practiceTerm)
		}
		for _, subject := range b.Subjects {
			terms := p.slots.terms[subject.Kind]
			one := seat{board: i, subject: subject, facts: make([]*facts.Fact, len(terms)), practice: practice}
			if own := wordOf(subject, practiceTerm); own != "" {
				one.practice = own
			}
			for slot, t := range terms {
				one.facts[slot] = subject.Fact(t.ID)
			}
			one.fault = faultOfFacts(one.facts, pairs[subject.Kind])
			s.seats[subject.Kind] = append(s.seats[subject.Kind], one)
		}
	}
	return s
}

func wordOf(subject *facts.Subject, term string) string {
	if f := subject.Fact(term); f != nil && f.Known {
		return f.Word
	}
	return ""
}

// bounds are the two slots of a worst-of.
type bounds struct{ least, most int }

// boundsOf finds the worst-ofs of which both bounds are read.
func boundsOf(terms []*facts.Term) []bounds {
	var list []bounds
	for least, t := range terms {
		stem, ok := strings.CutSuffix(t.ID, atLeast)
		if !ok {
			continue
		}
		if most := slices.IndexFunc(terms, func(o *facts.Term) bool { return o.ID == stem+atMost }); most >= 0 {
			list = append(list, bounds{least, most})
		}
	}
	return list
}

// faultOfFacts says what is wrong with facts that no formula and no reader should have made: a number that
// is not finite, on which the engine breaks down; a word that is not in its list; bounds that cross.
func faultOfFacts(list []*facts.Fact, pairs []bounds) string {
	for _, f := range list {
		if f == nil || !f.Known {
			continue
		}
		switch t := f.Term; {
		case t.Value == facts.Number && (math.IsNaN(f.Number) || math.IsInf(f.Number, 0)):
			return "the fact " + t.ID + " is not a finite number"
		case t.Value == facts.Word && !slices.Contains(t.Words, f.Word):
			return "the fact " + t.ID + " is a word that is not in its list"
		case t.Value == facts.Ordered && (f.Rank < 0 || f.Rank >= len(t.Words) || t.Words[f.Rank] != f.Word):
			return "the fact " + t.ID + " has another rank than its word"
		}
	}
	for _, p := range pairs {
		least, most := list[p.least], list[p.most]
		if least != nil && most != nil && least.Known && most.Known && (least.Number > most.Number || least.Rank > most.Rank) {
			return "the fact " + least.Term.ID + " is above " + most.Term.ID
		}
	}
	return ""
}

// object is the subject as a rule sees it: the facts that some rule reads.
func (s *seat) object(number int) map[string]any {
	read := make([]*facts.Fact, 0, len(s.facts))
	for _, f := range s.facts {
		if f != nil {
			read = append(read, f)
		}
	}
	object := facts.InputOf(read)
	object["id"] = strconv.Itoa(number)
	return object
}

// input is the value that the engine reads, made once.
func (s *scene) input() (ast.Value, error) {
	s.once.Do(func() {
		document := map[string]any{string(facts.Limits): facts.InputOf(s.pack.Limits())}
		for kind, seats := range s.seats {
			list := make([]any, 0, len(seats))
			for n := range seats {
				if seats[n].fault == "" {
					list = append(list, seats[n].object(n))
				}
			}
			document[string(kind)] = list
		}
		s.value, s.err = ast.InterfaceToValue(document)
	})
	return s.value, s.err
}
