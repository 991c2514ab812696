package rules

import (
	"bytes"
	"context"
	"io/fs"
	"os"
	"reflect"
	"strings"
	"testing"
	"unicode/utf8"

	"github.com/open-policy-agent/opa/v1/format"

	"boardproof/checker/facts"
	"boardproof/policies"
)

const ownFolder = "../../policies"

func ownPack(t testing.TB, opt Options) *Pack {
	t.Helper()
	p, problems := LoadOwn(facts.Terms(), opt)
	if p == nil {
		t.Fatalf("own pack: %v", texts(problems))
	}
	return p
}

func TestOwnPackPassesEveryCheckOfAnOwnersPack(t *testing.T) {
	t.Parallel()
	p, problems := Load(policies.Files, facts.Terms(), Options{Dir: "policies"})
	if p == nil {
		t.Fatalf("problems: %v", texts(problems))
	}
	own := ownPack(t, Options{})
	if p.Digest() != own.Digest() || len(p.Rules()) != len(own.Rules()) {
		t.Fatalf("%d rules, digest %s; by the index %d, %s", len(p.Rules()), p.Digest(), len(own.Rules()), own.Digest())
	}
	vocabulary := own.vocabulary
	for i, r := range p.Rules() {
		o := own.Rules()[i]
		if got, want := plainRule(t, o), plainRule(t, r); !reflect.DeepEqual(got, want) {
			t.Errorf("%s differs between index and file:\n%v\n%v", r.ID, got, want)
		}
		for _, term := range o.Needs {
			if found, ok := vocabulary.Lookup(term.Kind, term.ID); !ok || found != term {
				t.Errorf("%s reads a term of another vocabulary: %s", o.ID, term.ID)
			}
		}
	}
}

// plainRule is a rule in plain values, so that two loadings can be compared.
func plainRule(t *testing.T, r *Rule) []any {
	t.Helper()
	out := []any{r.ID, r.Line, r.Grade, r.Practice, r.Title, r.Description, r.References, r.Kind, r.Reasons, r.Proof, r.Package, r.File, r.Row, r.SHA256}
	for _, c := range r.Comparisons {
		out = append(out, c.String(), c.Set, c.Body, c.Row)
	}
	for _, l := range r.Cure {
		out = append(out, l.Term.ID, l.Direction, l.Series.Name)
	}
	return out
}

func TestIndexIsNotStale(t *testing.T) {
	t.Parallel()
	text, problems := Index(os.DirFS(ownFolder))
	if problems.Len() > 0 {
		t.Fatalf("problems: %v", texts(problems))
	}
	if !bytes.Equal(text, policies.Index) {
		t.Error("policies/index.json is not that of the rule files; run go generate ./checker/rules")
	}
}

func TestStaleIndexIsRefused(t *testing.T) {
	t.Parallel()
	for name, text := range map[string]string{
		"empty":       `{"rules": []}`,
		"not json":    `rules`,
		"other bytes": strings.Replace(string(policies.Index), `"sha256": "`, `"sha256": "0`, 1),
	} {
		t.Run(name, func(t *testing.T) {
			p, problems := loadIndexed(policies.Files, []byte(text), facts.Terms(), Options{})
			want := "policies/index.json: found an index of other rule files, expected the index of these; run go generate ./checker/rules"
			if p != nil || len(texts(problems)) != 1 || texts(problems)[0] != want {
				t.Errorf("got %v, want %s", texts(problems), want)
			}
		})
	}
}

func TestOwnRulesAreFormatted(t *testing.T) {
	t.Parallel()
	rules := 0
	err := fs.WalkDir(policies.Files, ".", func(name string, entry fs.DirEntry, err error) error {
		if err != nil || entry.IsDir() || !strings.HasSuffix(name, ruleSuffix) {
			return err
		}
		rules++
		text, err := fs.ReadFile(policies.Files, name)
		if err != nil {
			return err
		}
		want, err := format.Source(name, text)
		if err != nil {
			return err
		}
		if !bytes.Equal(text, want) {
			t.Errorf("%s is not formatted; it should be\n%s", name, want)
		}
		for i, line := range strings.Split(string(text), "\n") {
			if n := utf8.RuneCountInString(strings.ReplaceAll(line, "\t", "    ")); n > 100 {
				t.Errorf("%s:%d has %d columns", name, i+1, n)
			}
		}
		return nil
	})
	if err != nil {
		t.Error(err)
	}
	if rules == 0 {
		t.Error("no rule found")
	}
}

func TestOwnCases(t *testing.T) {
	t.Parallel()
	compared, problems := CheckCases(context.Background(), os.DirFS(ownFolder), ownPack(t, Options{Dir: "policies"}))
	for _, text := range texts(problems) {
		t.Error(text)
	}
	if compared < 60 {
		t.Errorf("only %d verdicts compared", compared)
	}
}

func TestOwnRulesSayWhatTheyCompare(t *testing.T) {
	t.Parallel()
	p := ownPack(t, Options{})
	for _, want := range []struct{ rule, comparison, observed, required string }{
		{"WTH-01", "s.withstand.joule_integral >= s.fault.joule_integral.at_most", "s.withstand.joule_integral", "s.fault.joule_integral.at_most"},
		{"PRV-05", `s.work.under_voltage == "yes"`, "s.work.under_voltage", `"yes"`},
		{"PRV-05", "s.door_open.contact_protection.rank < input.limits.door_open.contact_protection.rank", "s.door_open.contact_protection.rank", "input.limits.door_open.contact_protection.rank"},
	} {
		r, ok := p.Rule(want.rule)
		if !ok {
			t.Fatalf("no rule %s", want.rule)
		}
		found := false
		for _, c := range r.Comparisons {
			observed, required := c.Sides()
			if c.String() == want.comparison {
				found = true
				if observed.Text() != want.observed || required.Text() != want.required {
					t.Errorf("%s: observed %s, required %s", c, observed.Text(), required.Text())
				}
			}
		}
		if !found {
			t.Errorf("%s does not compare %s", want.rule, want.comparison)
		}
	}
}
