package facts

// supplyTerms are the terms of earthing, back-feed and supply of tripping.
var supplyTerms = []*Term{}

func (w *walk) supplyOfBoard(_ *Subject) {}
