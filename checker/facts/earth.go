package facts

import "boardproof/checker/spec"

// earthTerms are the terms of earth faults, neutral and protective bars.
var earthTerms = []*Term{}

func (w *walk) earthOfBars(_ *Subject, _ *spec.Entry[spec.Busbar]) {}
