package facts

// arcTerms are the terms of containment of an internal arc.
var arcTerms = []*Term{}

func (w *walk) arcOfBoard(_ *Subject) {}
