package fault

import (
	"strings"
	"testing"
)

func TestTablesAreReadStrictly(t *testing.T) {
	t.Parallel()
	for name, row := range map[string]struct{ text, want string }{
		"header":      {"a,c\n1,2\n", "found the header"},
		"no rows":     {"# note\na,b\n", "has no rows"},
		"few cells":   {"a,b\n1\n", "found 1 cells, expected 2"},
		"many cells":  {"a,b\n1,2,3\n", "found 3 cells, expected 2"},
		"blank":       {"a,b\n1,\n", "the cell b is blank or padded"},
		"padded":      {"a,b\n1, 2\n", "the cell b is blank or padded"},
		"late note":   {"a,b\n1,2\n# note\n", "found 1 cells"},
		"blank line":  {"a,b\n\n1,2\n", "found 1 cells"},
		"word":        {"a,b\n1,x\n", "expected a plain decimal"},
		"exponent":    {"a,b\n1,1e3\n", "expected a plain decimal"},
		"not finite":  {"a,b\n1,NaN\n", "expected a plain decimal"},
		"infinite":    {"a,b\n1,Inf\n", "expected a plain decimal"},
		"hexadecimal": {"a,b\n1,0x10\n", "expected a plain decimal"},
		"negative":    {"a,b\n1,-2\n", "expected a plain decimal"},
	} {
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			got, err := parse("t.csv", row.text, "a", "b")
			if err == nil {
				_, err = got[0].numbers(1, 1)
			}
			if err == nil || !strings.Contains(err.Error(), row.want) || !strings.Contains(err.Error(), "t.csv") {
				t.Errorf("got %v and error %v, expected %q", got, err, row.want)
			}
		})
	}
	if _, err := rows("none.csv", "a"); err == nil {
		t.Error("a table that is not there gave no error")
	}
	good, err := parse("t.csv", "# note\na,b\n1,2.5\n", "a", "b")
	if err != nil || len(good) != 1 || good[0].place != "t.csv:3" {
		t.Fatalf("%v, %v", good, err)
	}
	if v, err := good[0].numbers(1000, 0, 1); err != nil || v[0] != 1000 || v[1] != 2500 {
		t.Errorf("%v, %v", v, err)
	}
}
