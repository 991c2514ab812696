package facts

import "boardproof/checker/spec"

// unitFacts fills what is known of one unit.
func (w *walk) unitFacts(u *spec.Entry[spec.Unit]) {
	s := NewSubject(Units, u.Name, u.Place)
	w.preventionOfUnit(s, u)
	w.ratingOfUnit(s, u)
	w.out.Subjects = append(w.out.Subjects, s)
}
