package facts

// workTerms are the terms of rules, labels and room for work at the board.
var workTerms = []*Term{}

func (w *walk) workOfBoard(_ *Subject) {}
