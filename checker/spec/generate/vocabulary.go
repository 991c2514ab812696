package generate

import (
	"errors"
	"fmt"
	"slices"
	"strings"

	"gopkg.in/yaml.v3"
)

// rootType is the type of the whole file.
const rootType = "board"

// documents is the root field whose names `from:` may give.
const documents = "documents"

// A vocabulary is the content of board.yaml in its own order.
type vocabulary struct {
	format string
	lists  []*wordList
	types  []*objectType
}

type wordList struct {
	name, title string
	ordered     bool
	words       []word
	line        int
}

type word struct {
	text, description string
	line              int
}

type objectType struct {
	name, title, short string
	fields             []*field
	line               int
}

// The kinds of fields, as the vocabulary spells them.
const (
	quantity  = "quantity"
	words     = "words"
	text      = "text"
	date      = "date"
	count     = "count"
	yesNo     = "yes_no"
	nameOf    = "name_of"
	is        = "is"
	named     = "named"
	byVoltage = "by_voltage"
	pairs     = "pairs"
	ipCode    = "ip_code"
)

var kinds = []string{quantity, words, text, date, count, yesNo, nameOf, is, named, byVoltage, pairs, ipCode}

type field struct {
	key, kind string
	of        []string // what the kind names: a dimension, list, type, collections, day or month
	least     int      // of a count
	most      int
	list      bool
	none      bool
	title     string
	symbol    string
	note      string
	clause    string
	says      string
	usual     *interval
	possible  *interval
	example   *yaml.Node
	line      int
}

// An interval is a range of a quantity as written and in the base unit.
type interval struct {
	text      string
	low, high float64
	ends      [2]string
}

// A complaints list gathers the faults of a vocabulary with their lines.
type complaints struct{ errs []error }

func (c *complaints) add(line int, format string, args ...any) {
	c.errs = append(c.errs, fmt.Errorf("board.yaml:%d: %s", line, fmt.Sprintf(format, args...)))
}

func (c *complaints) err() error { return errors.Join(c.errs...) }

// decode reads the vocabulary; shape and spelling only, soundness is checked later.
func decode(data []byte, c *complaints) *vocabulary {
	var document yaml.Node
	if err := yaml.Unmarshal(data, &document); err != nil {
		c.errs = append(c.errs, fmt.Errorf("board.yaml: %w", err))
		return nil
	}
	if len(document.Content) != 1 {
		c.add(1, "the file is empty")
		return nil
	}
	v := &vocabulary{}
	c.mapping(document.Content[0], "the vocabulary", map[string]func(*yaml.Node){
		"format": func(n *yaml.Node) { v.format = c.scalar(n, "format") },
		"word_lists": func(n *yaml.Node) {
			c.entries(n, "word_lists", func(key, value *yaml.Node) { v.lists = append(v.lists, c.wordList(key, value)) })
		},
		"types": func(n *yaml.Node) {
			c.entries(n, "types", func(key, value *yaml.Node) { v.types = append(v.types, c.objectType(key, value)) })
		},
	})
	return v
}

func (c *complaints) wordList(key, value *yaml.Node) *wordList {
	l := &wordList{name: key.Value, line: key.Line}
	what := "word list " + key.Value
	c.mapping(value, what, map[string]func(*yaml.Node){
		"ordered": func(n *yaml.Node) { l.ordered = c.flag(n, what+": ordered") },
		"title":   func(n *yaml.Node) { l.title = c.scalar(n, what+": title") },
		"words": func(n *yaml.Node) {
			c.entries(n, what+": words", func(k, d *yaml.Node) {
				l.words = append(l.words, word{k.Value, c.scalar(d, what+": "+k.Value), k.Line})
			})
		},
	})
	return l
}

func (c *complaints) objectType(key, value *yaml.Node) *objectType {
	t := &objectType{name: key.Value, line: key.Line}
	what := "type " + key.Value
	c.mapping(value, what, map[string]func(*yaml.Node){
		"title": func(n *yaml.Node) { t.title = c.scalar(n, what+": title") },
		"short": func(n *yaml.Node) { t.short = c.scalar(n, what+": short") },
		"fields": func(n *yaml.Node) {
			c.entries(n, what+": fields", func(k, d *yaml.Node) { t.fields = append(t.fields, c.field(what, k, d)) })
		},
	})
	return t
}

func (c *complaints) field(owner string, key, value *yaml.Node) *field {
	f := &field{key: key.Value, line: key.Line}
	what := owner + ", " + key.Value
	named := func(into *string) func(*yaml.Node) { return func(n *yaml.Node) { *into = c.scalar(n, what) } }
	known := map[string]func(*yaml.Node){
		"list":     func(n *yaml.Node) { f.list = c.flag(n, what+": list") },
		"none":     func(n *yaml.Node) { f.none = c.flag(n, what+": none") },
		"title":    named(&f.title),
		"symbol":   named(&f.symbol),
		"note":     named(&f.note),
		"clause":   named(&f.clause),
		"says":     named(&f.says),
		"usual":    func(n *yaml.Node) { f.usual = c.interval(n, what+": usual") },
		"possible": func(n *yaml.Node) { f.possible = c.interval(n, what+": possible") },
		"example":  func(n *yaml.Node) { f.example = n },
	}
	for _, kind := range kinds {
		known[kind] = func(n *yaml.Node) {
			if f.kind != "" {
				c.add(n.Line, "%s: has two kinds, %s and %s", what, f.kind, kind)
			}
			f.kind = kind
			c.kind(f, n, what)
		}
	}
	c.mapping(value, what, known)
	if f.kind == "" {
		c.add(key.Line, "%s: has no kind; write one of %s", what, strings.Join(kinds, ", "))
	}
	return f
}

// kind reads what stands behind the kind of a field.
func (c *complaints) kind(f *field, n *yaml.Node, what string) {
	switch f.kind {
	case yesNo, ipCode:
		if !c.flag(n, what) {
			c.add(n.Line, "%s: write %s: true", what, f.kind)
		}
	case count:
		both := c.scalars(n, what)
		if len(both) != 2 {
			c.add(n.Line, "%s: write count: [least, most]", what)
			return
		}
		if _, err := fmt.Sscanf(strings.Join(both, " "), "%d %d", &f.least, &f.most); err != nil || f.least > f.most || f.least < 0 {
			c.add(n.Line, "%s: found %s, write count: [least, most] with whole numbers", what, strings.Join(both, " to "))
		}
	default:
		f.of = c.scalars(n, what)
		if many := f.kind == nameOf || f.kind == pairs; len(f.of) == 0 || len(f.of) > 1 && !many || f.kind == pairs && len(f.of) != 2 {
			c.add(n.Line, "%s: found %q behind %s", what, f.of, f.kind)
			f.of = nil
		}
	}
}

// interval reads "10 A to 400 kA" or [10 A, 400 kA]; the numbers are worked out by the check.
func (c *complaints) interval(n *yaml.Node, what string) *interval {
	ends := []string{}
	if n.Kind == yaml.ScalarNode {
		ends = strings.Split(n.Value, " to ")
	} else {
		ends = append(ends, c.scalars(n, what)...)
	}
	if len(ends) != 2 {
		c.add(n.Line, "%s: write it as \"low to high\"", what)
		return nil
	}
	i := &interval{ends: [2]string{strings.TrimSpace(ends[0]), strings.TrimSpace(ends[1])}}
	i.text = i.ends[0] + " to " + i.ends[1]
	return i
}

// mapping calls the function of each key; unknown and repeated keys are complaints.
func (c *complaints) mapping(n *yaml.Node, what string, known map[string]func(*yaml.Node)) {
	c.entries(n, what, func(key, value *yaml.Node) {
		read, ok := known[key.Value]
		if !ok {
			names := make([]string, 0, len(known))
			for name := range known {
				names = append(names, name)
			}
			slices.Sort(names)
			c.add(key.Line, "%s: unknown key %q; known are %s", what, key.Value, strings.Join(names, ", "))
			return
		}
		read(value)
	})
}

func (c *complaints) entries(n *yaml.Node, what string, each func(key, value *yaml.Node)) {
	if n.Kind != yaml.MappingNode {
		c.add(n.Line, "%s: write a mapping", what)
		return
	}
	seen := map[string]int{}
	for i := 0; i+1 < len(n.Content); i += 2 {
		key := n.Content[i]
		if line, twice := seen[key.Value]; twice {
			c.add(key.Line, "%s: %q stands already in line %d", what, key.Value, line)
			continue
		}
		seen[key.Value] = key.Line
		each(key, n.Content[i+1])
	}
}

func (c *complaints) scalar(n *yaml.Node, what string) string {
	if n.Kind != yaml.ScalarNode {
		c.add(n.Line, "%s: write one text", what)
		return ""
	}
	return strings.TrimSpace(n.Value)
}

func (c *complaints) scalars(n *yaml.Node, what string) []string {
	if n.Kind == yaml.ScalarNode {
		return []string{strings.TrimSpace(n.Value)}
	}
	var all []string
	for _, item := range n.Content {
		all = append(all, c.scalar(item, what))
	}
	return all
}

func (c *complaints) flag(n *yaml.Node, what string) bool {
	switch c.scalar(n, what) {
	case "true", "yes":
		return true
	case "false", "no":
		return false
	}
	c.add(n.Line, "%s: write true or false", what)
	return false
}
