package rules

import (
	"regexp"
	"strings"
	"unicode"

	"gopkg.in/yaml.v3"

	"boardproof/checker/place"
)

// metadata is what the block before `package` says; it goes into the index as it is.
type metadata struct {
	Title       string            `json:"title"`
	Description string            `json:"description"`
	Rule        string            `json:"rule"`
	Line        string            `json:"line"`
	Grade       string            `json:"grade"`
	Practice    string            `json:"practice"`
	References  []Reference       `json:"references"`
	Cure        []leverText       `json:"cure,omitempty"`
	Reasons     map[string]string `json:"reasons,omitempty"`
	Proof       string            `json:"proof,omitempty"`
}

// leverText is a lever before its term and series are looked up.
type leverText struct {
	Lever     string `json:"lever"`
	Direction string `json:"direction"`
	Steps     string `json:"steps,omitempty"`
	Row       int    `json:"row"`
}

const longestTitle = 60

var (
	ruleID    = regexp.MustCompile(`^[A-Z]{2,6}-[0-9]{2,3}$`)
	reasonKey = regexp.MustCompile(`^[a-z][a-z0-9_]*$`)
)

// readMetadata finds the one block of a rule file and reads it. The first result tells whether all of
// it could be used.
func readMetadata(file, source string, problems *place.Problems) (metadata, bool) {
	before := problems.Len()
	lines := strings.Split(strings.ReplaceAll(source, "\r\n", "\n"), "\n")
	var blocks []int
	packageRow := len(lines)
	for i, line := range lines {
		if strings.TrimSpace(strings.TrimLeft(strings.TrimSpace(line), "#")) == "METADATA" && strings.HasPrefix(strings.TrimSpace(line), "#") {
			blocks = append(blocks, i)
		}
		if strings.HasPrefix(line, "package ") && packageRow == len(lines) {
			packageRow = i
		}
	}
	at := func(i int) place.Place { return place.Place{File: file, Line: i + 1} }
	refuse := func(i int, got, want, hint string, related ...place.Place) {
		problems.Add(place.Problem{Place: at(i), Kind: place.Rule, Got: got, Want: want, Hint: hint, Related: related})
	}
	const want = "one block that begins with # METADATA, directly before package"
	switch {
	case len(blocks) == 0:
		refuse(0, "no metadata", want, "begin the file with # METADATA, # title: …")
		return metadata{}, false
	case len(blocks) > 1:
		refuse(blocks[1], "a second metadata block, of which the engine would take both", want, "remove one", at(blocks[0]))
		return metadata{}, false
	}
	start := blocks[0] + 1
	if lines[blocks[0]] != "# METADATA" {
		refuse(blocks[0], "a metadata block that the engine would pass over", "# METADATA at the left edge", "remove what stands before or between")
		return metadata{}, false
	}
	end := start
	var text strings.Builder
	for end < len(lines) && strings.HasPrefix(lines[end], "#") {
		text.WriteString(strings.TrimPrefix(strings.TrimPrefix(lines[end], "#"), " ") + "\n")
		end++
	}
	if end != packageRow {
		refuse(end, "something else after the metadata block", want, "")
		return metadata{}, false
	}
	d := &document{file: file, rows: start, columns: 2, problems: problems}
	root := d.root([]byte(text.String()), "title, description and custom")
	if root == nil {
		return metadata{}, false
	}
	m := d.metadata(root)
	return m, problems.Len() == before
}

func (d *document) metadata(root *yaml.Node) metadata {
	m := metadata{Practice: BothPractices}
	top := d.fields(root, "", "title, description and custom", "title", "description", "custom")
	d.need(root, "", top, "title", "description", "custom")
	if n := top["title"]; n != nil {
		m.Title = d.title(n)
	}
	if n := top["description"]; n != nil {
		m.Description = d.text(n, "description", "why the rule is there, for a tenderer")
	}
	if n := top["custom"]; n != nil {
		d.custom(n, &m)
	}
	return m
}

func (d *document) title(n *yaml.Node) string {
	const want = "a title of at most 60 letters that begins with a capital and ends without period"
	text := d.text(n, "title", want)
	letters := []rune(text)
	switch {
	case text == "":
	case len(letters) > longestTitle:
		d.add(place.Problem{Place: d.at(n), Path: "title", Kind: place.Rule, Got: "a title of " + count(len(letters), "letter"), Want: want})
	case !unicode.IsUpper(letters[0]) || strings.HasSuffix(text, ".") || strings.Contains(text, "\n"):
		d.add(place.Problem{Place: d.at(n), Path: "title", Kind: place.Rule, Got: place.Quote(text), Want: want})
	}
	return text
}

func (d *document) custom(n *yaml.Node, m *metadata) {
	c := d.fields(n, "custom", "rule, line, grade, references and more", "rule", "line", "grade", "practice", "references", "cure", "reasons", "proof")
	d.need(n, "custom", c, "rule", "line", "grade", "references")
	if v := c["rule"]; v != nil {
		const want = `a name of 2 to 6 capitals, a dash and 2 or 3 digits`
		m.Rule = d.text(v, "custom.rule", want)
		if m.Rule != "" && !ruleID.MatchString(m.Rule) {
			d.add(place.Problem{Place: d.at(v), Path: "custom.rule", Kind: place.Rule, Got: place.Quote(m.Rule), Want: want, Hint: "write it like WTH-01"})
			m.Rule = ""
		}
	}
	if v := c["line"]; v != nil {
		m.Line = d.word(v, "custom.line", Lines...)
	}
	if v := c["grade"]; v != nil {
		m.Grade = d.word(v, "custom.grade", Major, Minor, Observation)
	}
	if v := c["practice"]; v != nil {
		m.Practice = d.word(v, "custom.practice", BothPractices, IEC, NorthAmerican)
	}
	if v := c["proof"]; v != nil {
		m.Proof = d.text(v, "custom.proof", `the clause of the design verification, such as "10.11"`)
	}
	if v := c["references"]; v != nil {
		for _, r := range d.list(v, "custom.references", "at least one clause, or common practice") {
			m.References = append(m.References, d.reference(r))
		}
	}
	if v := c["cure"]; v != nil {
		for _, l := range d.list(v, "custom.cure", "at least one lever") {
			m.Cure = append(m.Cure, d.lever(l))
		}
	}
	if v := c["reasons"]; v != nil {
		m.Reasons = d.reasons(v)
	}
}

func (d *document) reference(n *yaml.Node) Reference {
	const path, want = "custom.references", "standard, edition and clause, or the words common practice"
	if n.Kind == yaml.ScalarNode {
		if text := d.text(n, path, want); text != "" && text != "common practice" {
			d.add(place.Problem{Place: d.at(n), Path: path, Kind: place.Rule, Got: place.Quote(text), Want: want})
		}
		return Reference{Practice: true}
	}
	f := d.fields(n, path, want, "standard", "edition", "clause", "status")
	if n.Kind == yaml.MappingNode {
		d.need(n, path, f, "standard", "edition", "clause")
	}
	var r Reference
	for name, into := range map[string]*string{"standard": &r.Standard, "edition": &r.Edition, "clause": &r.Clause, "status": &r.Status} {
		if v := f[name]; v != nil {
			*into = d.text(v, path+"."+name, "the "+name)
		}
	}
	return r
}

func (d *document) lever(n *yaml.Node) leverText {
	const path, want = "custom.cure", "lever, direction and steps"
	f := d.fields(n, path, want, "lever", "direction", "steps")
	if n.Kind == yaml.MappingNode {
		d.need(n, path, f, "lever", "direction")
	}
	l := leverText{Row: d.rows + n.Line}
	if v := f["lever"]; v != nil {
		l.Lever = d.text(v, path+".lever", "a term")
	}
	if v := f["direction"]; v != nil {
		l.Direction = d.word(v, path+".direction", Raise, Lower)
	}
	if v := f["steps"]; v != nil {
		l.Steps = d.text(v, path+".steps", "a series of series.yaml")
	}
	return l
}

func (d *document) reasons(n *yaml.Node) map[string]string {
	reasons := map[string]string{}
	for _, k := range d.pairs(n, "custom.reasons", "reasons with their sentences") {
		name := k.name.Value
		if !reasonKey.MatchString(name) || name == OtherPractice {
			got := place.Quote(name)
			if name == OtherPractice {
				got += ", which is the engine's own reason"
			}
			d.add(place.Problem{Place: d.at(k.name), Path: "custom.reasons", Kind: place.Rule, Got: got, Want: "a name in small letters, digits and _", Hint: "write it like no_live_work"})
			continue
		}
		reasons[name] = d.text(k.value, "custom.reasons."+name, "a sentence")
	}
	return reasons
}
