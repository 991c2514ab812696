package review_test

import (
	"context"
	"fmt"
	"os"
	"path"
	"reflect"
	"slices"
	"strings"
	"sync"
	"testing"
	"time"

	"boardproof/checker/facts"
	"boardproof/checker/place"
	"boardproof/checker/review"
	"boardproof/checker/rules"
	"boardproof/checker/spec"
)

// root leads from this package to the top of the repository.
const root = "../.."

// demonstration are the boards of the demonstration project.
var demonstration = []string{"specs/brackwater/tenderer-a.yaml", "specs/brackwater/tenderer-d.yaml"}

var on = time.Date(2026, 12, 1, 0, 0, 0, 0, time.UTC)

// own is the program's pack, loaded once: loading is most of the time of a test.
var own = sync.OnceValues(func() (*rules.Pack, error) {
	pack, problems := rules.LoadOwn(facts.Terms(), rules.Options{})
	if problems.Len() > 0 {
		return nil, fmt.Errorf("the rule library: %v", problems.All())
	}
	return pack, nil
})

// tester is what *testing.T and *rapid.T share.
type tester interface {
	Helper()
	Fatalf(format string, args ...any)
}

func ownPack(t tester) *rules.Pack {
	t.Helper()
	pack, err := own()
	if err != nil {
		t.Fatalf("%v", err)
	}
	return pack
}

// files are texts by slash path from the top of the repository; what is not among them is
// read from there.
type files map[string]string

func (f files) read(name string) ([]byte, error) {
	if text, ok := f[name]; ok {
		return []byte(text), nil
	}
	return os.ReadFile(path.Join(root, name))
}

func (f files) board(name string) (*spec.Board, *place.Problems) {
	b, _, problems := spec.Read(name, spec.Options{ReadFile: f.read})
	return b, problems
}

// mustRead is a board that has no problems.
func mustRead(t tester, f files, name string) *spec.Board {
	t.Helper()
	b, problems := f.board(name)
	if problems.Len() > 0 {
		t.Fatalf("%s has problems: %v", name, problems.All())
	}
	return b
}

func mustReadText(t tester, text string) *spec.Board {
	t.Helper()
	b, problems := files{"board.yaml": text}.board("board.yaml")
	if problems.Len() > 0 {
		t.Fatalf("the board has problems: %v\n%s", problems.All(), text)
	}
	return b
}

func reviewsOf(t tester, boards ...*spec.Board) []*review.Review {
	t.Helper()
	reviews, err := review.Make(context.Background(), ownPack(t), boards, review.Options{On: on})
	if err != nil {
		t.Fatalf("%v", err)
	}
	return reviews
}

// outcomes are the verdicts of a review by rule and subject.
func outcomes(r *review.Review) map[string]rules.Outcome {
	m := map[string]rules.Outcome{}
	for _, f := range r.Findings {
		m[f.Rule.ID+" "+subjectName(f.Subject)] = f.Outcome
	}
	return m
}

// subjectName stays the same when a board loses its designation.
func subjectName(s *facts.Subject) string {
	if s.Kind == facts.Boards {
		return "the board"
	}
	return s.ID
}

// leaf is one thing that a board says.
type leaf struct {
	spec.At
	State spec.State
	Value string // printed, to compare
	value reflect.Value
}

// said lists what a board says, lists and objects included, sorted by path.
func said(b *spec.Board) []leaf {
	var list []leaf
	gather(reflect.ValueOf(b.Content), &list)
	slices.SortStableFunc(list, func(a, b leaf) int { return strings.Compare(a.Path, b.Path) })
	return list
}

var (
	atType    = reflect.TypeFor[spec.At]()
	stateType = reflect.TypeFor[spec.State]()
)

func gather(v reflect.Value, list *[]leaf) {
	switch v.Kind() {
	case reflect.Struct:
		at, state := v.FieldByName("At"), v.FieldByName("State")
		if at.IsValid() && at.Type() == atType && state.IsValid() && state.Type() == stateType {
			l := leaf{At: at.Interface().(spec.At), State: state.Interface().(spec.State), value: v.FieldByName("Value")}
			if l.State == spec.NotSaid {
				return
			}
			if l.value.IsValid() {
				l.Value = fmt.Sprintf("%+v", l.value.Interface())
			}
			if l.Path != "" {
				*list = append(*list, l)
			}
		}
		for i := range v.NumField() {
			if v.Type().Field(i).IsExported() && v.Field(i).Type() != atType {
				gather(v.Field(i), list)
			}
		}
	case reflect.Slice:
		for i := range v.Len() {
			gather(v.Index(i), list)
		}
	}
}

// saysMore names what a board says that another one does not say, or says otherwise.
func saysMore(after, before *spec.Board) []string {
	was := map[string]string{}
	for _, l := range said(before) {
		was[l.Path] = l.State.String() + " " + l.Value
	}
	var more []string
	for _, l := range said(after) {
		if was[l.Path] != l.State.String()+" "+l.Value {
			more = append(more, l.Path)
		}
	}
	return more
}

func TestSaidFindsEveryKindOfLeaf(t *testing.T) {
	t.Parallel()
	paths := map[string]spec.State{}
	for _, l := range said(mustRead(t, nil, demonstration[0])) {
		paths[l.Path] = l.State
	}
	for path, want := range map[string]spec.State{
		"board":                               spec.Stated,
		"other_supplies":                      spec.StatedNone,
		"sources.TX1.network.fault_level_max": spec.Stated,
		"sources.G1.link":                     spec.StatedNone,
		"transfer.interlocks":                 spec.Stated,
		"transfer.interlocks[2].kind":         spec.Stated,
		"standby[1]":                          spec.Stated,
		"units.Q1.device.icu":                 spec.Stated,
		"units.P6.load.motor":                 spec.Stated,
		"evidence[1].values.peak":             spec.Stated,
	} {
		if paths[path] != want {
			t.Errorf("%s: %v, want %v", path, paths[path], want)
		}
	}
	if len(paths) < 300 {
		t.Errorf("%d leaves found, the demonstration has more than 300", len(paths))
	}
}
