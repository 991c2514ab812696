package rules

import (
	"errors"
	"slices"
	"strings"

	"gopkg.in/yaml.v3"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// Limit is something an owner may tighten.
type Limit struct {
	Fact    *facts.Fact // in force
	Default *facts.Fact
	Note    string
	Place   place.Place // in limits.yaml
}

// Set tells whether the value in force was set by an owner.
func (l Limit) Set() bool { return l.Fact != l.Default }

// Loosened tells whether the value in force demands less than the default. Words without an order
// are never called loosened.
func (l Limit) Loosened() bool {
	var difference float64
	switch l.Fact.Term.Value {
	case facts.Number:
		difference = l.Fact.Number - l.Default.Number
	case facts.Ordered:
		difference = float64(l.Fact.Rank - l.Default.Rank)
	}
	switch l.Fact.Term.Stricter {
	case facts.Higher:
		return difference < 0
	case facts.Lower:
		return difference > 0
	}
	return false
}

// Setting is what an owner says of a limit: its name, the value as written, and where that stands.
type Setting struct {
	ID   string
	Text string
	Leaf *working.Leaf
}

// With is the same pack under an owner's limits. A name that is no limit, or a value that cannot be
// read, is a problem; the pack is then nil.
func (p *Pack) With(settings ...Setting) (*Pack, *place.Problems) {
	problems := &place.Problems{}
	out := *p
	out.limits = slices.Clone(p.limits)
	var names []string
	for _, l := range p.limits {
		names = append(names, l.Fact.Term.ID)
	}
	seen := map[string]place.Place{}
	for _, s := range settings {
		at := place.Place{}
		if s.Leaf != nil {
			at = s.Leaf.Place
		}
		i := slices.Index(names, s.ID)
		if i < 0 {
			problems.Add(place.Problem{Place: at, Path: s.ID, Kind: place.UnknownName, Got: place.Quote(s.ID) + ", which is no limit", Want: "one of " + strings.Join(names, ", "), Hint: nearestHint(s.ID, names)})
			continue
		}
		if before, twice := seen[s.ID]; twice {
			problems.Add(place.Problem{Place: at, Path: s.ID, Kind: place.DuplicateKey, Got: place.Quote(s.ID) + " a second time", Want: "each limit once", Related: []place.Place{before}})
			continue
		}
		seen[s.ID] = at
		f, said := parseFact(p.limits[i].Fact.Term, s.Text)
		if said != nil {
			said.Place, said.Path = at, s.ID
			problems.Add(*said)
			continue
		}
		f.How.Leaf = s.Leaf
		out.limits[i].Fact = f
	}
	if problems.Len() > 0 {
		return nil, problems
	}
	return &out, problems
}

// parseFact reads a value as people write it: "65 kA", or a word of the term's list.
func parseFact(t *facts.Term, text string) (*facts.Fact, *place.Problem) {
	how := &working.Working{Symbol: t.Symbol, Name: t.Label}
	f := &facts.Fact{Term: t, Known: true, How: how}
	if t.Value == facts.Number {
		v, err := t.Dimension.Parse(text)
		var fault *units.Fault
		switch {
		case errors.As(err, &fault):
			return nil, &place.Problem{Kind: place.Kind(fault.Kind), Got: fault.Got, Want: fault.Want, Hint: fault.Hint}
		case err != nil:
			return nil, &place.Problem{Kind: place.NotANumber, Got: place.Quote(text), Want: t.Dimension.Phrase()}
		}
		f.Number = units.Round12(v)
		how.Number, how.Dimension = f.Number, t.Dimension
		return f, nil
	}
	f.Rank = slices.Index(t.Words, text)
	if f.Rank < 0 {
		return nil, &place.Problem{Kind: place.UnknownWord, Got: place.Quote(text), Want: "one of " + strings.Join(t.Words, ", "), Hint: nearestHint(text, t.Words)}
	}
	if t.Value == facts.Word {
		f.Rank = 0
	}
	f.Word, how.Word = text, text
	return f, nil
}

// readLimits reads limits.yaml. The words of a ranked limit are those of a list of the vocabulary.
func readLimits(d *document, text []byte, vocabulary *facts.Vocabulary) []Limit {
	const want = "a list of limits, each with id, label, quantity or list, default, stricter and clause"
	root := d.root(text, want)
	if root == nil {
		return nil
	}
	var limits []Limit
	first := map[string]*yaml.Node{}
	for _, n := range d.list(root, "", want) {
		f := d.fields(n, "", want, "id", "label", "quantity", "list", "words", "default", "stricter", "clause", "note")
		if n.Kind != yaml.MappingNode {
			continue
		}
		d.need(n, "", f, "id", "label", "default", "clause")
		if f["id"] == nil || f["label"] == nil || f["default"] == nil || f["clause"] == nil {
			continue
		}
		id := d.text(f["id"], "id", "a dotted name")
		if before, twice := first[id]; twice {
			d.add(place.Problem{Place: d.at(f["id"]), Path: id, Kind: place.DuplicateKey, Got: "the limit " + place.Quote(id) + " a second time", Want: "each limit once", Related: []place.Place{d.at(before)}})
			continue
		}
		first[id] = f["id"]
		if l, ok := d.limit(n, id, f, vocabulary); ok {
			limits = append(limits, l)
		}
	}
	return limits
}

func (d *document) limit(n *yaml.Node, id string, f map[string]*yaml.Node, vocabulary *facts.Vocabulary) (Limit, bool) {
	before := d.problems.Len()
	if !dottedName.MatchString(id) {
		d.add(place.Problem{Place: d.at(f["id"]), Path: "id", Kind: place.Rule, Got: place.Quote(id), Want: "small letters, digits and _ in parts joined by dots", Hint: "write it like door_open.contact_protection"})
	}
	t := &facts.Term{Kind: facts.Limits, ID: id, Label: d.text(f["label"], id+".label", "what is limited"), Clause: d.text(f["clause"], id+".clause", "where the default comes from")}
	given := 0
	for _, k := range []string{"quantity", "list", "words"} {
		if f[k] != nil {
			given++
		}
	}
	switch {
	case given != 1:
		d.add(place.Problem{Place: place.Place{File: d.file, Line: d.rows + n.Line}, Path: id, Kind: place.MissingKey, Got: count(given, "key") + " of quantity, list and words", Want: "one of them"})
	case f["quantity"] != nil:
		var names []string
		for _, q := range units.Dimensions() {
			names = append(names, q.Name)
		}
		t.Dimension, _ = units.DimensionNamed(d.word(f["quantity"], id+".quantity", names...))
	case f["list"] != nil:
		t.Value = facts.Ordered
		t.ListID = d.word(f["list"], id+".list", orderedLists(vocabulary)...)
		t.Words = wordsOf(vocabulary, t.ListID)
	default:
		t.Value = facts.Word
		for _, w := range d.list(f["words"], id+".words", "the allowed words") {
			t.Words = append(t.Words, d.text(w, id+".words", "a word"))
		}
		t.ListID = "limits." + id
	}
	if f["stricter"] == nil && t.Value != facts.Word {
		d.need(n, id, f, "stricter")
	}
	if v := f["stricter"]; v != nil {
		switch d.word(v, id+".stricter", "higher", "lower") {
		case "higher":
			t.Stricter = facts.Higher
		case "lower":
			t.Stricter = facts.Lower
		}
		if t.Value == facts.Word {
			d.add(place.Problem{Place: d.at(v), Path: id + ".stricter", Kind: place.Contradiction, Got: "a direction for words without order", Want: "no direction, or a list with an order"})
		}
	}
	l := Limit{Place: place.Place{File: d.file, Line: d.rows + n.Line}}
	if v := f["note"]; v != nil {
		l.Note = d.text(v, id+".note", "a sentence")
	}
	text := d.text(f["default"], id+".default", "the value that holds if no owner sets another")
	if d.problems.Len() > before {
		return Limit{}, false
	}
	fact, said := parseFact(t, text)
	if said != nil {
		said.Place, said.Path = d.at(f["default"]), id+".default"
		d.add(*said)
		return Limit{}, false
	}
	fact.How.Assumption, fact.How.Source = "default of the rule library", working.Source{Standard: t.Clause}
	l.Fact, l.Default = fact, fact
	return l, true
}

// orderedLists names the lists of ordered words in the vocabulary, sorted.
func orderedLists(v *facts.Vocabulary) []string {
	var names []string
	for _, t := range v.Terms() {
		if t.Value == facts.Ordered && t.Kind != facts.Limits && t.ListID != "" {
			names = append(names, t.ListID)
		}
	}
	slices.Sort(names)
	return slices.Compact(names)
}

// wordsOf is the words of an ordered list, low to high.
func wordsOf(v *facts.Vocabulary, list string) []string {
	for _, t := range v.Terms() {
		if t.Value == facts.Ordered && t.ListID == list {
			return t.Words
		}
	}
	return nil
}

// withLimits is the vocabulary of subject terms together with the limits.
func withLimits(vocabulary *facts.Vocabulary, limits []Limit) (*facts.Vocabulary, error) {
	var terms []*facts.Term
	for _, t := range vocabulary.Terms() {
		if t.Kind != facts.Limits {
			terms = append(terms, t)
		}
	}
	for _, l := range limits {
		terms = append(terms, l.Fact.Term)
	}
	return facts.NewVocabulary(terms...)
}
