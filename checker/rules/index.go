package rules

import (
	"bytes"
	"encoding/json"
	"io/fs"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/policies"
)

// index is the first stage's result for the program's own pack, written by go generate.
type index struct {
	Rules []*form `json:"rules"`
}

// Index reads the rule files of a pack and returns what policies/index.json has to contain.
func Index(fsys fs.FS) ([]byte, *place.Problems) {
	problems := &place.Problems{}
	src := collect(fsys, "", problems)
	forms, _ := readAll(src, problems)
	var out bytes.Buffer
	encoder := json.NewEncoder(&out)
	encoder.SetEscapeHTML(false)
	encoder.SetIndent("", " ")
	if err := encoder.Encode(index{forms}); err != nil {
		problems.Add(place.Problem{Kind: place.Unreadable, Got: err.Error()})
	}
	return out.Bytes(), problems
}

// LoadOwn is the pack of this program. Its rules come from the index, so that neither metadata nor
// bodies are read again; names are looked up in the vocabulary as in [Load]; the engine compiles when
// the first board is judged or [Pack.Prepare] is called. A problem is a defect of the program: the
// index is not that of the files, or a rule reads a term that is not in the vocabulary.
func LoadOwn(vocabulary *facts.Vocabulary, opt Options) (*Pack, *place.Problems) {
	return loadIndexed(policies.Files, policies.Index, vocabulary, opt)
}

func loadIndexed(fsys fs.FS, indexText []byte, vocabulary *facts.Vocabulary, opt Options) (*Pack, *place.Problems) {
	problems := &place.Problems{}
	if opt.Dir == "" {
		opt.Dir = "policies"
	}
	src := collect(fsys, opt.Dir, problems)
	p, ok := newPack(src, vocabulary, opt, problems)
	if !ok {
		return nil, problems
	}
	var in index
	if err := json.Unmarshal(indexText, &in); err != nil {
		in.Rules = nil
	}
	if !in.matches(src) {
		problems.Add(place.Problem{Place: place.Place{File: src.shown("index.json")}, Kind: place.Contradiction, Got: "an index of other rule files", Want: "the index of these", Hint: "run go generate ./checker/rules"})
		return nil, problems
	}
	p.add(src, in.Rules, problems)
	if problems.Len() > 0 {
		return nil, problems
	}
	return p, problems
}

// matches tells whether the index speaks of exactly these files.
func (in index) matches(src *source) bool {
	if len(in.Rules) != len(src.rules) {
		return false
	}
	sums := map[string]string{}
	for _, f := range in.Rules {
		sums[f.File] = f.SHA256
	}
	for _, f := range src.rules {
		if sums[f.name] != f.sha256 {
			return false
		}
	}
	return true
}
