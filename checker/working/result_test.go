package working_test

import (
	"errors"
	"fmt"
	"math"
	"strings"
	"testing"

	"boardproof/checker/place"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

var product = working.Formula{
	ID: "test.product", Symbol: "P", Name: "product", Equation: "{a}·{b}²",
	Range: []working.Interval{{Symbol: "a", Low: 1, High: 10, Dimension: units.Ratio(0).Dimension()}},
}

func ratio(v float64, symbol string) working.Result[units.Ratio] {
	return working.Stated(units.Ratio(v), symbol, symbol, &working.Leaf{Path: symbol, Place: place.Place{File: "b", Line: 1}})
}

func lacking(paths ...string) working.Result[units.Ratio] {
	var lacks []working.Lack
	for _, p := range paths {
		lacks = append(lacks, working.Lack{Path: p, What: p})
	}
	return working.Lacking[units.Ratio](lacks...)
}

// outside is a result beyond the range of its formula.
func outside() working.Result[units.Ratio] {
	return working.Apply1(&product, func(a units.Ratio) (units.Ratio, error) { return a, product.CheckRange(float64(a)) }, ratio(11, "a"))
}

func multiply(a, b units.Ratio) (units.Ratio, error) {
	return a * b * b, product.CheckRange(float64(a))
}

func keys(l working.Lacks) string {
	var list []string
	for _, one := range l {
		list = append(list, one.Key())
	}
	return strings.Join(list, ",")
}

func TestCompute(t *testing.T) {
	t.Parallel()
	for _, c := range []struct {
		name         string
		a, b         working.Result[units.Ratio]
		compute      func(a, b units.Ratio) (units.Ratio, error)
		value        float64
		known        bool
		lacks, beyon string
	}{
		{"known", ratio(2, "a"), ratio(3, "b"), multiply, 18, true, "", ""},
		{"at the end of the range", ratio(10, "a"), ratio(1, "b"), multiply, 10, true, "", ""},
		{"one lacks", ratio(2, "a"), lacking("y"), multiply, 0, false, "y", ""},
		{"both lack, sorted and once", lacking("y", "x"), lacking("z", "y"), multiply, 0, false, "x,y,z", ""},
		{"unnamed", working.Result[units.Ratio]{}, ratio(1, "b"), multiply, 0, false, "~a value that nobody named", ""},
		{"one outside", outside(), ratio(1, "b"), multiply, 0, false, "", "a is 11, the formula holds for 1 ≤ a ≤ 10"},
		{"outside and lacking: what is missing comes first", outside(), lacking("y"), multiply, 0, false, "y", ""},
		{"range", ratio(0.5, "a"), ratio(1, "b"), multiply, 0, false, "", "a is 0.5, the formula holds for 1 ≤ a ≤ 10"},
		{"another error", ratio(2, "a"), ratio(1, "b"), func(a, b units.Ratio) (units.Ratio, error) { return 7, errors.New("no way") }, 0, false, "", "no way"},
		{"not a number", ratio(2, "a"), ratio(1, "b"), func(a, b units.Ratio) (units.Ratio, error) { return units.Ratio(math.NaN()), nil }, 0, false, "", "P is not a finite number for these inputs"},
		{"infinite", ratio(2, "a"), ratio(1, "b"), func(a, b units.Ratio) (units.Ratio, error) { return units.Ratio(math.Inf(-1)), nil }, 0, false, "", "P is not a finite number for these inputs"},
		{"wrapped range", ratio(2, "a"), ratio(1, "b"), func(a, b units.Ratio) (units.Ratio, error) {
			return 7, fmt.Errorf("outer: %w", &working.RangeError{Symbol: "q", Found: "2", Limit: "0 ≤ q ≤ 1"})
		}, 0, false, "", "q is 2, the formula holds for 0 ≤ q ≤ 1"},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			calls := 0
			r := working.Apply2(&product, func(a, b units.Ratio) (units.Ratio, error) { calls++; return c.compute(a, b) }, c.a, c.b)
			v, known := r.Value()
			if known != c.known || float64(v) != c.value || r.Known() != c.known || r.V() != v {
				t.Errorf("value %v, known %v; want %v, %v", v, known, c.value, c.known)
			}
			if got := keys(r.Missing()); got != c.lacks {
				t.Errorf("lacks %q, want %q", got, c.lacks)
			}
			got := ""
			if r.Beyond() != nil {
				got = r.Beyond().Reason
			}
			if got != c.beyon {
				t.Errorf("outside %q, want %q", got, c.beyon)
			}
			if (r.How() != nil) != c.known {
				t.Errorf("working %v", r.How())
			}
			if allThere := c.a.Known() && c.b.Known(); calls > 1 || (calls == 1) != allThere {
				t.Errorf("the formula was applied %d times, all operands known: %v", calls, allThere)
			}
		})
	}
}

func TestAKnownResultKeepsItsWorking(t *testing.T) {
	t.Parallel()
	b := ratio(3, "b_0")
	r := working.Apply2(&product, multiply, ratio(2, "a"), b.As("b")).In("Q1 closed")
	how := r.How()
	if how.Symbol != "P" || how.Name != "product" || how.Number != 18 || how.Case != "Q1 closed" || how.Formula != &product || len(how.Inputs) != 2 {
		t.Errorf("working %+v", how)
	}
	if how.Inputs[1].Symbol != "b" || b.How().Symbol != "b_0" {
		t.Errorf("As changed the operand itself, or not its copy: %q, %q", how.Inputs[1].Symbol, b.How().Symbol)
	}
	if got := how.Formula.With(how.Inputs); got != "2·3²" {
		t.Errorf("with numbers %q", got)
	}
	if got := how.Formula.Plain(); got != "P = a·b²" {
		t.Errorf("plain %q", got)
	}
	if how.Text() != "18" || (&working.Working{Word: "none"}).Text() != "none" {
		t.Error("text of a number or of a word")
	}
}

func TestNumbersAreRoundedOnce(t *testing.T) {
	t.Parallel()
	r := ratio(1.0/3, "a")
	if float64(r.V()) != 0.333333333333 || r.How().Number != 0.333333333333 {
		t.Errorf("%v and %v, want 12 digits", r.V(), r.How().Number)
	}
	for _, v := range []float64{math.NaN(), math.Inf(1)} {
		for name, r := range map[string]working.Result[units.Ratio]{
			"stated": ratio(v, "a"), "assumed": working.Assumed(units.Ratio(v), "a", "a", "why", working.Source{}), "constant": working.Constant(units.Ratio(v), "a", "a", working.Source{}),
		} {
			if r.Known() || r.Beyond() == nil {
				t.Errorf("%s %v is known", name, v)
			}
		}
	}
}

func TestFormulaWithLeavesUnknownOperandsAsSymbols(t *testing.T) {
	t.Parallel()
	f := working.Formula{Equation: "{a}·{ab}/{c}"}
	in := []*working.Working{ratio(2, "a").How(), ratio(4, "ab").How()}
	if got := f.With(in); got != "2·4/c" {
		t.Errorf("got %q", got)
	}
}

func TestSourceString(t *testing.T) {
	t.Parallel()
	for want, s := range map[string]working.Source{
		"IEC 60909-0:2016 6.3.3 (from memory)": {Standard: "IEC 60909-0", Edition: "2016", Clause: "6.3.3", Status: "from memory"},
		"IEC 60909-0 6.3.3":                    {Standard: "IEC 60909-0", Clause: "6.3.3"},
		"definition":                           {Status: "definition"},
		"":                                     {},
	} {
		if got := s.String(); got != want {
			t.Errorf("%+v is %q, want %q", s, got, want)
		}
	}
}

func TestCheckRange(t *testing.T) {
	t.Parallel()
	for v, ok := range map[float64]bool{1: true, 10: true, 5: true, 0.999: false, 10.001: false, math.NaN(): false, math.Inf(1): false} {
		var limit *working.RangeError
		if err := product.CheckRange(v); (err == nil) != ok || !ok && !errors.As(err, &limit) {
			t.Errorf("%v: %v", v, err)
		}
	}
	if err := product.CheckRange(2, 99); err != nil {
		t.Errorf("a value without a range: %v", err)
	}
}

func TestBasisIsTheWeakestClaim(t *testing.T) {
	t.Parallel()
	claim := func(b working.Basis) *working.Working {
		return &working.Working{Leaf: &working.Leaf{Claim: true, Basis: b}}
	}
	given := &working.Working{Leaf: &working.Leaf{Basis: working.Declared}}
	model := &working.Formula{Model: true}
	for _, c := range []struct {
		name    string
		formula *working.Formula
		inputs  []*working.Working
		want    working.Basis
	}{
		{"no claim", nil, []*working.Working{given}, working.NoBasis},
		{"nothing at all", nil, nil, working.NoBasis},
		{"one claim", nil, []*working.Working{claim(working.Tested), given}, working.Tested},
		{"weakest of three", nil, []*working.Working{claim(working.Tested), claim(working.Declared), claim(working.Compared)}, working.Declared},
		{"below another line", nil, []*working.Working{{Inputs: []*working.Working{claim(working.Inspected)}}, claim(working.Tested)}, working.Inspected},
		{"a model of what is to be tested", model, []*working.Working{claim(working.Tested)}, working.Calculated},
		{"a model of what is declared", model, []*working.Working{claim(working.Declared)}, working.Declared},
		{"a model without a claim", model, []*working.Working{given}, working.NoBasis},
	} {
		w := &working.Working{Formula: c.formula, Inputs: c.inputs}
		if got := w.Basis(); got != c.want {
			t.Errorf("%s: %v, want %v", c.name, got, c.want)
		}
	}
	order := []working.Basis{working.NoBasis, working.Declared, working.Calculated, working.Inspected, working.Compared, working.Tested}
	for i, b := range order {
		if int(b) != i || b.String() == "" {
			t.Errorf("%v is number %d in the order of strength", b, int(b))
		}
	}
}

func TestWalkVisitsEachLineOnce(t *testing.T) {
	t.Parallel()
	shared := &working.Working{Symbol: "c"}
	top := &working.Working{Symbol: "a", Inputs: []*working.Working{shared, {Symbol: "b", Inputs: []*working.Working{shared, nil}}}}
	var seen []string
	top.Walk(func(w *working.Working) { seen = append(seen, w.Symbol) })
	if got := strings.Join(seen, ""); got != "acb" {
		t.Errorf("visited %q, want acb", got)
	}
}

func TestLacksUnion(t *testing.T) {
	t.Parallel()
	one := func(paths ...string) working.Lacks { return lacking(paths...).Missing() }
	for _, c := range []struct {
		name string
		a, b working.Lacks
		want string
	}{
		{"disjoint", one("b"), one("a", "c"), "a,b,c"},
		{"overlapping", one("a", "b"), one("b", "a"), "a,b"},
		{"nothing added", one("a"), nil, "a"},
		{"added to nothing", nil, one("b", "a", "b"), "a,b"},
		{"alternatives", working.Lacks{{OneOf: []working.Lack{{Path: "x"}, {Path: "y"}}}}, one("x"), "x,x | y"},
		{"without a path", working.Lacks{{What: "skill"}}, working.Lacks{{What: "skill"}, {What: "time"}}, "~skill,~time"},
	} {
		before := keys(c.a)
		if got := keys(c.a.Union(c.b)); got != c.want {
			t.Errorf("%s: %q, want %q", c.name, got, c.want)
		}
		if keys(c.a) != before {
			t.Errorf("%s: the union changed its operand", c.name)
		}
	}
}
