package rules

import (
	"errors"
	"regexp"
	"slices"

	"gopkg.in/yaml.v3"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/units"
)

var dottedName = regexp.MustCompile(`^[a-z][a-z0-9_]*(\.[a-z][a-z0-9_]*)*$`)

// Series is the steps in which the trade offers a value. Exactly one of Numbers and Words is filled.
type Series struct {
	Name      string
	Of        string           // name of the quantity or of the list of words
	Dimension *units.Dimension // of Numbers
	Numbers   []float64        // SI, rising
	Words     []string         // low to high
	Source    string           // where the steps come from
	Place     place.Place
}

// fits tells whether a term can take the steps.
func (s *Series) fits(t *facts.Term) bool {
	if t.Value == facts.Number {
		return s.Dimension != nil && s.Dimension == t.Dimension
	}
	return s.Words != nil && s.Of == t.ListID
}

// Above is the first step above a number, or at it.
func (s *Series) Above(number float64) (float64, bool) {
	i, _ := slices.BinarySearch(s.Numbers, number)
	if i == len(s.Numbers) {
		return 0, false
	}
	return s.Numbers[i], true
}

// Below is the last step below a number, or at it.
func (s *Series) Below(number float64) (float64, bool) {
	i, at := slices.BinarySearch(s.Numbers, number)
	if at {
		return s.Numbers[i], true
	}
	if i == 0 {
		return 0, false
	}
	return s.Numbers[i-1], true
}

func seriesNames(all map[string]*Series) []string {
	var names []string
	for name := range all {
		names = append(names, name)
	}
	slices.Sort(names)
	return names
}

// readSeries reads series.yaml into all.
func readSeries(d *document, text []byte, vocabulary *facts.Vocabulary, all map[string]*Series) {
	const want = "series by name, each with of, steps and source"
	root := d.root(text, want)
	if root == nil {
		return
	}
	for _, k := range d.pairs(root, "", want) {
		name := k.name.Value
		switch {
		case !dottedName.MatchString(name):
			d.add(place.Problem{Place: d.at(k.name), Kind: place.Rule, Got: place.Quote(name), Want: "a name in small letters, digits and _"})
		case all[name] != nil:
			d.add(place.Problem{Place: d.at(k.name), Kind: place.DuplicateKey, Got: "the series " + place.Quote(name) + " a second time", Want: "each series once", Related: []place.Place{all[name].Place}})
		default:
			if s := d.series(name, k.value, vocabulary); s != nil {
				all[name] = s
			}
		}
	}
}

func (d *document) series(name string, n *yaml.Node, vocabulary *facts.Vocabulary) *Series {
	f := d.fields(n, name, "of, steps and source", "of", "steps", "source")
	if n.Kind != yaml.MappingNode {
		return nil
	}
	d.need(n, name, f, "of", "source")
	if f["of"] == nil || f["source"] == nil {
		return nil
	}
	s := &Series{Name: name, Source: d.text(f["source"], name+".source", "where the steps come from"), Place: place.Place{File: d.file, Line: d.rows + n.Line - 1}}
	lists := orderedLists(vocabulary)
	allowed := slices.Clone(lists)
	for _, q := range units.Dimensions() {
		allowed = append(allowed, q.Name)
	}
	s.Of = d.word(f["of"], name+".of", allowed...)
	if s.Of == "" {
		return nil
	}
	if slices.Contains(lists, s.Of) {
		s.Words = wordsOf(vocabulary, s.Of)
		if f["steps"] != nil {
			d.add(place.Problem{Place: d.at(f["steps"]), Path: name, Kind: place.Contradiction, Got: "steps of a list of words", Want: "no steps; the words of the list are the steps"})
			return nil
		}
		return s
	}
	s.Dimension, _ = units.DimensionNamed(s.Of)
	if f["steps"] == nil {
		d.need(n, name, f, "steps")
		return nil
	}
	for _, step := range d.list(f["steps"], name+".steps", "rising values with their unit") {
		text := d.text(step, name+".steps", s.Dimension.Phrase())
		v, err := s.Dimension.Parse(text)
		var fault *units.Fault
		switch {
		case text == "":
		case errors.As(err, &fault):
			d.add(place.Problem{Place: d.at(step), Path: name + ".steps", Kind: place.Kind(fault.Kind), Got: fault.Got, Want: fault.Want, Hint: fault.Hint})
		case len(s.Numbers) > 0 && v <= s.Numbers[len(s.Numbers)-1]:
			d.add(place.Problem{Place: d.at(step), Path: name + ".steps", Kind: place.Contradiction, Got: place.Quote(text) + " after a step that is not smaller", Want: "rising values"})
		default:
			s.Numbers = append(s.Numbers, units.Round12(v))
		}
	}
	return s
}
