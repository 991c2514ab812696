package review_test

import (
	"fmt"
	"strings"

	"boardproof/checker/facts"
	"boardproof/checker/rules"
)

// slack allows for the twelfth digit.
const slack = 1e-9

// nearerToAcquittal names every number and word that moved, from one state of knowledge of
// a board to another, in the direction in which a requirement is met or does not apply:
// what the bodies of complies and exempt compare, and the proven bound of every worst-of. It is the same
// demand as that no verdict becomes complies, but does not wait for a rating to lie just
// between two numbers.
func nearerToAcquittal(pack *rules.Pack, before, after *facts.Board) []string {
	var moved []string
	for _, s := range after.Subjects {
		was := subjectOf(before, s)
		if was == nil {
			continue
		}
		complain := func(f *facts.Fact, direction int) {
			old := was.Fact(f.Term.ID)
			if old == nil || !f.Known {
				return
			}
			if text := movement(old, f, direction); text != "" {
				moved = append(moved, s.ID+" "+f.Term.ID+": "+text)
			}
		}
		for _, f := range s.Facts() {
			switch provenBound(f) {
			case "worst.largest.at_most":
				complain(f, -1)
			case "worst.smallest.at_least":
				complain(f, 1)
			}
		}
		for _, rule := range pack.Rules() {
			if rule.Kind != s.Kind {
				continue
			}
			for _, c := range rule.Comparisons {
				if c.Set != rules.Complies && c.Set != rules.Exempt {
					continue
				}
				for side, operand := range []rules.Operand{c.Left, c.Right} {
					if operand.Term == nil || operand.Term.Kind == facts.Limits {
						continue
					}
					if f := s.Fact(operand.Term.ID); f != nil {
						complain(f, proving(c.Operator, side))
					}
				}
			}
		}
	}
	return moved
}

// provenBound tells which bound of which worst-of a known fact is: only the upper one of
// the largest and the lower one of the smallest say something of cases nobody named.
func provenBound(f *facts.Fact) string {
	if !f.Known || f.How.Formula == nil {
		return ""
	}
	return f.How.Formula.ID + f.Term.ID[max(0, strings.LastIndex(f.Term.ID, ".")):]
}

// proving is the direction in which one side of a comparison helps it to hold: 1 up, -1
// down, 0 any change.
func proving(operator string, side int) int {
	direction := 0
	switch operator {
	case ">=", ">":
		direction = 1
	case "<=", "<":
		direction = -1
	}
	if side == 1 {
		direction = -direction
	}
	return direction
}

func movement(old, now *facts.Fact, direction int) string {
	if !old.Known {
		return "unknown before, now " + now.Text()
	}
	from, to := old.Number, now.Number
	if now.Term.Value != facts.Number {
		from, to = float64(old.Rank), float64(now.Rank)
		if old.Word != now.Word && direction == 0 {
			return old.Word + " became " + now.Word
		}
	}
	change, least := to-from, slack*max(from, -from)
	if direction == 0 && (change > least || change < -least) || float64(direction)*change > least {
		return fmt.Sprintf("%s became %s", old.Text(), now.Text())
	}
	return ""
}

func subjectOf(b *facts.Board, like *facts.Subject) *facts.Subject {
	for _, s := range b.Subjects {
		if s.Kind == like.Kind && subjectName(s) == subjectName(like) {
			return s
		}
	}
	return nil
}

// crossed names every worst-of whose lower bound lies above its upper one.
func crossed(b *facts.Board) []string {
	var list []string
	for _, s := range b.Subjects {
		for _, f := range s.Facts() {
			id, ok := strings.CutSuffix(f.Term.ID, ".at_least")
			most := s.Fact(id + ".at_most")
			if !ok || most == nil || !f.Known || !most.Known {
				continue
			}
			if f.Number > most.Number*(1+slack) {
				list = append(list, fmt.Sprintf("%s %s: at least %s and at most %s", s.ID, id, f.Text(), most.Text()))
			}
		}
	}
	return list
}
