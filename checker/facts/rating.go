package facts

import "boardproof/checker/spec"

// ratingTerms are the terms of ratings of board and units.
var ratingTerms = []*Term{}

func (w *walk) ratingOfBoard(_ *Subject) {}

func (w *walk) ratingOfUnit(_ *Subject, _ *spec.Entry[spec.Unit]) {}
