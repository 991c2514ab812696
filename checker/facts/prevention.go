package facts

import "boardproof/checker/spec"

// preventionTerms are the terms of the first line: covering, contact, enclosure, interlocks.
var preventionTerms = []*Term{}

func (w *walk) preventionOfBoard(_ *Subject) {}

func (w *walk) preventionOfBars(_ *Subject, _ *spec.Entry[spec.Busbar]) {}

func (w *walk) preventionOfUnit(_ *Subject, _ *spec.Entry[spec.Unit]) {}
