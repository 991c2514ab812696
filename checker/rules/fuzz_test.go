package rules

import (
	"context"
	"io/fs"
	"slices"
	"strings"
	"testing"
	"testing/fstest"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/policies"
)

// FuzzLoad loads any text as rule, limits and series. Whatever loads judges a subject of which nothing
// is known as clarify, and every problem has a place and words of ours.
func FuzzLoad(f *testing.F) {
	_ = fs.WalkDir(policies.Files, ".", func(name string, entry fs.DirEntry, err error) error {
		if err == nil && strings.HasSuffix(name, ruleSuffix) {
			text, _ := fs.ReadFile(policies.Files, name)
			f.Add(string(text), testLimits, testSeries)
		}
		return nil
	})
	f.Add(header("")+goodBody, testLimits, testSeries)
	f.Add(header("")+"import rego.v2\n\ncomplies contains s.id if {\n\tsome s in input.busbars\n\tnot { s.withstand.peak < 1 }\n}\n", "- {}", "a: &a [*a]")
	f.Add(inBody("\ts.joints in {\"covered\"}\n\tinput.limits.method == \"box\""), testLimits, testSeries)
	f.Add(inBody("\t$\"{s.joints}\" == [x | some x in s.y]"), "", "{}")
	vocabulary := testVocabulary(f)
	f.Fuzz(func(t *testing.T, rule, limits, series string) {
		pack := fstest.MapFS{"xy01.rego": {Data: []byte(rule)}, "limits.yaml": {Data: []byte(limits)}, "series.yaml": {Data: []byte(series)}}
		p, problems := Load(pack, vocabulary, Options{Workers: 1})
		if (p == nil) != (problems.Len() > 0) {
			t.Fatalf("pack %v with %d problems", p, problems.Len())
		}
		for _, problem := range problems.All() {
			if problem.Place.File == "" || !slices.Contains(place.Kinds(), problem.Kind) {
				t.Errorf("a problem without place or kind: %+v", problem)
			}
		}
		if p == nil {
			return
		}
		unknown := board("b", facts.NewSubject(facts.Busbars, "A", place.Place{}), facts.NewSubject(facts.Boards, "b", place.Place{}))
		got, err := p.Judge(context.Background(), unknown)
		if err != nil {
			t.Fatal(err)
		}
		for _, v := range got[0] {
			if v.Outcome != Clarify {
				t.Errorf("%s of a subject of which nothing is known: %s", v.Outcome, v.Fault)
			}
		}
	})
}
