package generate

import (
	"regexp"
	"slices"
	"strings"

	"boardproof/checker/units"
)

// A model is a sound vocabulary with its cross references.
type model struct {
	*vocabulary
	listNamed map[string]*wordList
	typeNamed map[string]*objectType
	// collections are the named things that can be reached from the root through fixed keys only,
	// by their dotted path.
	collections map[string]*field
	asEntry     map[string]bool // types used for the entries of a collection
}

var keyForm = regexp.MustCompile(`^[a-z][a-z0-9_]*$`)

// check finds everything that would make the reader or the schema wrong.
func check(v *vocabulary, c *complaints) *model {
	m := &model{vocabulary: v, listNamed: map[string]*wordList{}, typeNamed: map[string]*objectType{},
		collections: map[string]*field{}, asEntry: map[string]bool{}}
	goNames := map[string]string{}
	claim := func(line int, what, name string) {
		g := goName(name)
		switch {
		case !keyForm.MatchString(name):
			c.add(line, "%s: write the name in small letters, digits and _", what)
		case reserved[g]:
			c.add(line, "%s: the Go name %s is taken by the reader; choose another name", what, g)
		case goNames[g] != "":
			c.add(line, "%s: has the same Go name %s as %s; choose another name", what, g, goNames[g])
		}
		goNames[g] = what
	}
	for _, l := range v.lists {
		claim(l.line, "word list "+l.name, l.name)
		m.listNamed[l.name] = l
	}
	for _, t := range v.types {
		if t.name != rootType {
			claim(t.line, "type "+t.name, t.name)
		}
		m.typeNamed[t.name] = t
	}
	for _, l := range v.lists {
		checkWords(l, goNames, c)
	}
	root := m.typeNamed[rootType]
	if root == nil {
		c.add(1, "there is no type %s", rootType)
		return m
	}
	for _, t := range v.types {
		for _, f := range t.fields {
			if f.kind == named && len(f.of) == 1 {
				m.asEntry[f.of[0]] = true
			}
		}
	}
	for _, t := range v.types {
		m.checkType(t, c)
	}
	m.checkReach(root, c)
	if len(c.errs) > 0 {
		return m
	}
	m.checkNames(c)
	return m
}

func checkWords(l *wordList, goNames map[string]string, c *complaints) {
	if len(l.words) == 0 || len(l.words) > 255 {
		c.add(l.line, "word list %s: has %d words, 1 to 255 are possible", l.name, len(l.words))
	}
	if l.title == "" {
		c.add(l.line, "word list %s: has no title", l.name)
	}
	for _, w := range l.words {
		g := goName(l.name) + goName(w.text)
		switch other := goNames[g]; {
		case goName(w.text) == "":
			c.add(w.line, "word list %s: %q gives no Go name", l.name, w.text)
		case other != "":
			c.add(w.line, "word list %s: %q has the same Go name %s as %s", l.name, w.text, g, other)
		case w.description == "":
			c.add(w.line, "word list %s: %q has no description", l.name, w.text)
		case w.text != strings.TrimSpace(w.text):
			c.add(w.line, "word list %s: %q has blanks at its ends", l.name, w.text)
		}
		goNames[g] = "word " + w.text + " of " + l.name
	}
}

func (m *model) checkType(t *objectType, c *complaints) {
	if t.title == "" {
		c.add(t.line, "type %s: has no title", t.name)
	}
	goNames := map[string]string{}
	short := t.short == ""
	for _, f := range t.fields {
		what := "type " + t.name + ", " + f.key
		g := fieldName(f.key)
		switch {
		case !keyForm.MatchString(f.key):
			c.add(f.line, "%s: write the key in small letters, digits and _", what)
		case f.key == "from" || f.key == "like":
			c.add(f.line, "%s: every object has the key already; choose another", what)
		case goNames[g] != "":
			c.add(f.line, "%s: has the same Go name as %s", what, goNames[g])
		case f.title == "":
			c.add(f.line, "%s: has no title", what)
		}
		goNames[g] = f.key
		if f.key == t.short {
			short = true
			if f.list || isContainer(f.kind) || f.kind == pairs || f.kind == byVoltage {
				c.add(f.line, "%s: the short field must be a single value", what)
			}
		}
		if f.says != "" && (t.name != rootType || f.says != "claims" && f.says != "conditions") {
			c.add(f.line, "%s: says is written at the fields of the root only, as claims or conditions", what)
		}
		m.checkField(what, f, c)
	}
	if !short {
		c.add(t.line, "type %s: its short field %s does not exist", t.name, t.short)
	}
}

func isContainer(kind string) bool { return kind == is || kind == named }

func (m *model) checkField(what string, f *field, c *complaints) {
	if f.list && slices.Contains([]string{named, byVoltage, pairs, yesNo}, f.kind) {
		c.add(f.line, "%s: list does not go with %s", what, f.kind)
	}
	if (f.usual != nil || f.possible != nil) && f.kind != quantity && f.kind != byVoltage {
		c.add(f.line, "%s: usual and possible go with quantities only", what)
	}
	switch f.kind {
	case quantity, byVoltage, pairs:
		for _, name := range f.of {
			if _, ok := units.DimensionNamed(name); !ok {
				c.add(f.line, "%s: there is no dimension %s", what, name)
			}
		}
		if d, ok := units.DimensionNamed(strings.Join(f.of, "")); ok {
			checkInterval(what+": usual", f.line, f.usual, d, c)
			checkInterval(what+": possible", f.line, f.possible, d, c)
			if u, p := f.usual, f.possible; u != nil && p != nil && (u.low < p.low || u.high > p.high) {
				c.add(f.line, "%s: usual, %s, reaches beyond possible, %s", what, u.text, p.text)
			}
		}
	case words:
		l := m.listNamed[strings.Join(f.of, "")]
		if l == nil {
			c.add(f.line, "%s: there is no word list %v", what, f.of)
		} else if f.none && slices.ContainsFunc(l.words, func(w word) bool { return w.text == "none" }) {
			c.add(f.line, "%s: may be none, but none is also a word of %s", what, l.name)
		}
	case text:
		if !slices.Equal(f.of, []string{"line"}) {
			c.add(f.line, "%s: write text: line", what)
		}
	case date:
		if len(f.of) == 1 && f.of[0] != "day" && f.of[0] != "month" {
			c.add(f.line, "%s: write date: day or date: month", what)
		}
	case is, named:
		if m.typeNamed[strings.Join(f.of, "")] == nil {
			c.add(f.line, "%s: there is no type %v", what, f.of)
		}
	}
}

func checkInterval(what string, line int, i *interval, d *units.Dimension, c *complaints) {
	if i == nil {
		return
	}
	for n, end := range i.ends {
		v, err := d.Parse(end)
		if err != nil {
			c.add(line, "%s: %v", what, err)
			return
		}
		if n == 0 {
			i.low = v
		} else {
			i.high = v
		}
	}
	if i.low >= i.high {
		c.add(line, "%s: %s is no range", what, i.text)
	}
}

// checkReach refuses types that contain themselves and types or lists that nothing uses, and
// gathers the collections that names can be taken from.
func (m *model) checkReach(root *objectType, c *complaints) {
	used := map[string]bool{}
	var visit func(t *objectType, path string, fixed bool, above []string)
	visit = func(t *objectType, path string, fixed bool, above []string) {
		if slices.Contains(above, t.name) {
			c.add(t.line, "type %s: contains itself: %s", t.name, strings.Join(append(above, t.name), " > "))
			return
		}
		used["type "+t.name] = true
		for _, f := range t.fields {
			where := strings.TrimPrefix(path+"."+f.key, ".")
			if f.kind == words {
				used["list "+strings.Join(f.of, "")] = true
			}
			if f.kind == named && fixed {
				m.collections[where] = f
			}
			if isContainer(f.kind) {
				if inner := m.typeNamed[strings.Join(f.of, "")]; inner != nil {
					visit(inner, where, fixed && f.kind == is && !f.list, append(slices.Clone(above), t.name))
				}
			}
		}
	}
	visit(root, "", true, nil)
	for _, t := range m.types {
		if !used["type "+t.name] {
			c.add(t.line, "type %s: is used nowhere", t.name)
		}
	}
	for _, l := range m.lists {
		if !used["list "+l.name] {
			c.add(l.line, "word list %s: is used nowhere", l.name)
		}
	}
}

// checkNames resolves the collections of name_of fields to their paths and looks for the fields the
// reader itself relies on.
func (m *model) checkNames(c *complaints) {
	root := m.typeNamed[rootType]
	if m.collections[documents] == nil {
		c.add(root.line, "type board: has no collection %s for from:", documents)
	}
	if len(root.fields) == 0 || root.fields[0].key != "board" || root.fields[0].kind != text {
		c.add(root.line, "type board: its first field must be board, a text")
	}
	for _, t := range m.types {
		for _, f := range t.fields {
			if f.kind != nameOf {
				continue
			}
			for i, name := range f.of {
				path, ok := m.collection(name)
				if !ok {
					c.add(f.line, "type %s, %s: there is no collection %s that can be reached by fixed keys", t.name, f.key, name)
				}
				f.of[i] = path
			}
		}
	}
	if len(c.errs) == 0 {
		m.checkExamples(c)
	}
}

// collection finds a collection by its path or, where it is the only one, by its last key.
func (m *model) collection(name string) (path string, ok bool) {
	if m.collections[name] != nil {
		return name, true
	}
	for p := range m.collections {
		if strings.HasSuffix(p, "."+name) {
			if ok {
				return "", false
			}
			path, ok = p, true
		}
	}
	return path, ok
}
