package facts

import "boardproof/checker/spec"

// insulationTerms are the terms of insulation coordination.
var insulationTerms = []*Term{}

func (w *walk) insulationOfBoard(_ *Subject) {}

func (w *walk) insulationOfBars(_ *Subject, _ *spec.Entry[spec.Busbar]) {}
