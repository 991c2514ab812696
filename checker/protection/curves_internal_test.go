package protection

import (
	"strings"
	"testing"
)

func TestReadCurvesIsStrict(t *testing.T) {
	t.Parallel()
	const header = "name,k,alpha,c,standard\n"
	for name, row := range map[string]struct{ text, want string }{
		"no header":   {"a,1,1,0,s\n", "found the header"},
		"no rows":     {"# note\n" + header, "no rows"},
		"cells":       {header + "a,1,1,0\n", "expected five cells"},
		"no name":     {header + ",1,1,0,s\n", "expected five cells"},
		"word":        {header + "a,one,1,0,s\n", "expected a plain decimal"},
		"not finite":  {header + "a,NaN,1,0,s\n", "expected a plain decimal"},
		"negative":    {header + "a,1,-1,0,s\n", "expected a plain decimal"},
		"nought":      {header + "a,0,1,0,s\n", "must not be nought"},
		"second note": {header + "# note\n", "expected five cells"},
	} {
		t.Run(name, func(t *testing.T) {
			t.Parallel()
			if got, err := readCurves(row.text); err == nil || !strings.Contains(err.Error(), row.want) {
				t.Errorf("got %v and error %v, expected %q", got, err, row.want)
			}
		})
	}
}
