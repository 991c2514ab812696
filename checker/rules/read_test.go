package rules

import (
	"slices"
	"testing"
)

// refused is a rule file that must not load, with what is said: row, column and sentence.
type refused struct {
	name string
	text string
	want []string
}

// inBody is a file with one body of complies, inFile one with whole rules.
func inBody(lines string) string {
	return header("") + "complies contains s.id if {\n\tsome s in input.busbars\n" + lines + "\n}\n"
}

func inFile(rules string) string { return header("") + rules }

func checkRefused(t *testing.T, list []refused) {
	t.Helper()
	for _, c := range list {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			p, problems := Load(packOf(c.text), testVocabulary(t), Options{})
			if p != nil {
				t.Fatal("loaded")
			}
			var want []string
			for _, w := range c.want {
				want = append(want, "xy01.rego:"+w)
			}
			if got := texts(problems); !slices.Equal(got, want) {
				t.Errorf("got\n%q\nwant\n%q", got, want)
			}
		})
	}
}

// TestRefusedForms has every form of the language that could prove something of a subject of which
// nothing is known, or that reads more than the subject, with the sentence an author is shown.
func TestRefusedForms(t *testing.T) {
	t.Parallel()
	checkRefused(t, []refused{
		{"not", inBody("\tnot s.withstand.peak < s.fault.peak.at_least"), []string{
			`13:2: found "not", which also holds when the fact is missing, expected comparisons of facts that are there; write the opposite comparison, such as < for >=`,
		}},
		{"not body", inBody("\tnot { s.withstand.peak < s.fault.peak.at_least }"), []string{
			`13:2: found "not", which also holds when the fact is missing, expected comparisons of facts that are there; write the opposite comparison, such as < for >=`,
		}},
		{"rego.v2 import", inFile("import rego.v2\n\n" + goodBody), []string{
			`11:1: found import rego.v2, under which not holds when the fact is missing, expected no import; remove the line`,
		}},
		{"not with braces under rego.v2", inFile("import rego.v2\n\ncomplies contains s.id if {\n\tsome s in input.busbars\n\tnot { s.withstand.peak < s.fault.peak.at_least }\n}\n"), []string{
			`11:1: found import rego.v2, under which not holds when the fact is missing, expected no import; remove the line`,
			`15:2: found "not", which also holds when the fact is missing, expected comparisons of facts that are there; write the opposite comparison, such as < for >=`,
		}},
		{"or under rego.v2", inFile("import rego.v2\n\ncomplies contains s.id if {\n\tsome s in input.busbars\n\ts.withstand.peak >= s.fault.peak.at_most or s.joints == \"covered\"\n}\n"), []string{
			`11:1: found import rego.v2, under which not holds when the fact is missing, expected no import; remove the line`,
			`15:2: found "and" or "or" inside a line, which hides what was compared, expected one comparison per line; write a line for each part of an and, a body for each part of an or`,
		}},
		{"other import", inFile("import data.lib\n\n" + goodBody), []string{
			`11:1: found the import "data.lib", which lets a rule read more than its subject, expected no import; remove the line`,
		}},
		{"every", inBody("\tevery x in s.supports { x.k > 1 }"), []string{
			`13:2: found "every", which also holds when the list is empty, expected comparisons of facts that are there; ask for a term that holds the worst member`,
		}},
		{"array comprehension", inBody("\t[x | some x in s.supports] == []"), []string{
			`13:2: found a comprehension, which drops the members that lack the value, expected comparisons of facts that are there; ask for a term that holds the total or the worst member`,
			`13:32: found a form that is not known to be safe, expected comparisons of facts that are there`,
		}},
		{"count", inBody("\tcount([x | some x in s.supports; x.k < 1]) == 0"), []string{
			`13:2: found count, which passes over the members that lack the value, expected comparisons of facts that are there; ask for a term that holds the result`,
			`13:48: found the number 0, a threshold without unit, clause or owner, expected a term or a limit; put it into limits.yaml and write input.limits.<name>`,
		}},
		{"set comprehension", inBody("\ts.joints in {x | some x in s.words}"), []string{
			`13:14: found a comprehension, which drops the members that lack the value, expected comparisons of facts that are there; ask for a term that holds the total or the worst member`,
		}},
		{"object comprehension", inBody("\t{x: 1 | some x in s.words} == {}"), []string{
			`13:2: found a comprehension, which drops the members that lack the value, expected comparisons of facts that are there; ask for a term that holds the total or the worst member`,
			`13:32: found a form that is not known to be safe, expected comparisons of facts that are there`,
		}},
		{"sum", inBody("\tsum([1]) < s.withstand.peak"), []string{
			`13:2: found sum, which passes over the members that lack the value, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"max", inBody("\tmax([1]) < s.withstand.peak"), []string{
			`13:2: found max, which passes over the members that lack the value, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"object.get", inBody("\tobject.get(s, \"x\", 99) > s.withstand.peak"), []string{
			`13:2: found object.get, which makes up a value where none is given, expected comparisons of facts that are there; read s.<term>; if it is missing the verdict is a query`,
		}},
		{"default", inFile("default complies := set()\n\n" + goodBody), []string{
			`11:1: found "default", which gives a verdict where nothing is known, expected only the sets complies, departs and exempt; remove it; what is not proven is a query`,
		}},
		{"else", inFile("departs if {\n\tfalse\n} else if {\n\ttrue\n}\n\n" + goodBody), []string{
			`11:1: found "departs" as something else than a set of subjects, expected departs contains s.id if { … }`,
			`13:3: found "else", which gives a verdict where nothing is known, expected one body per way of proof; write a second body with its own comparisons`,
		}},
		{"function", inFile("strong(s) if s.withstand.peak >= s.fault.peak.at_most\n\n" + goodBody), []string{
			`11:1: found the function "strong", whose operands no check can follow, expected only the sets complies, departs and exempt; write the comparison into the bodies, or ask for a term that holds the result`,
		}},
		{"helper", inFile("strong contains s.id if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n\n" + goodBody), []string{
			`11:1: found the rule "strong", which is no verdict, expected only the sets complies, departs and exempt; write the comparison into the bodies, or ask for a term that holds the result`,
		}},
		{"helper near", inFile("complis contains s.id if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n\n" + goodBody), []string{
			`11:1: found the rule "complis", which is no verdict, expected only the sets complies, departs and exempt; write complies`,
		}},
		{"no set", inFile("complies if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`11:1: found "complies" as something else than a set of subjects, expected complies contains s.id if { … }`,
		}},
		{"constant set", inFile("complies := {\"a\"}\n"), []string{
			`11:1: found "complies" as something else than a set of subjects, expected complies contains s.id if { … }`,
		}},
		{"object", inFile("complies[s.id] := 1 if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`11:1: found "complies" as something else than a set of subjects, expected complies contains s.id if { … }`,
		}},
		{"dotted head", inFile("complies.x contains s.id if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`11:1: found "complies" as something else than a set of subjects, expected complies contains s.id if { … }`,
		}},
		{"other key", inFile("complies contains s if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`11:19: found a set complies of something else, expected s.id; write complies contains s.id if { … }`,
		}},
		{"literal key", inFile("complies contains \"main A\"\n"), []string{
			`11:19: found a set complies of something else, expected s.id; write complies contains s.id if { … }`,
		}},
		{"exempt key", inFile(goodBody + "exempt contains s.id if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`15:17: found a set exempt of something else, expected [s.id, "reason"]; write exempt contains [s.id, "reason"] if { … }`,
		}},
		{"exempt key var", inFile(goodBody + "exempt contains [s.id, s.joints] if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`15:17: found a set exempt of something else, expected [s.id, "reason"]; write exempt contains [s.id, "reason"] if { … }`,
		}},
		{"clock", inBody("\ttime.now_ns() > s.withstand.peak"), []string{
			`13:2: found the call "time.now_ns", whose result nobody can check by hand, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"network", inBody("\thttp.send({}).x == s.joints"), []string{
			`13:2: found the call "http.send", whose result nobody can check by hand, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"startswith", inBody("\tstartswith(s.joints, \"c\")"), []string{
			`13:2: found the call "startswith", whose result nobody can check by hand, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"arithmetic", inBody("\ts.withstand.peak * 2 >= s.fault.peak.at_most"), []string{
			`13:2: found a calculation with *, which the worksheet would not show, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"sprintf", inBody("\tsprintf(\"%s\", [s.joints]) == \"bare\""), []string{
			`13:2: found sprintf, which makes a text that no list of words can check, expected a word of the term's list; write the word itself`,
		}},
		{"template", inBody("\t$\"{s.joints}\" == s.shape"), []string{
			`13:2: found a text made of parts, which no list of words can check, expected a word of the term's list; write the word itself`,
		}},
		{"number", inBody("\ts.withstand.peak >= 65000"), []string{
			`13:22: found the number 65000, a threshold without unit, clause or owner, expected a term or a limit; put it into limits.yaml and write input.limits.<name>`,
		}},
		{"negative number", inBody("\ts.withstand.peak >= -1"), []string{
			`13:22: found the number -1, a threshold without unit, clause or owner, expected a term or a limit; put it into limits.yaml and write input.limits.<name>`,
		}},
		{"boolean", inBody("\ts.joints == true"), []string{
			`13:14: found true, which no fact ever is, expected a word of the term's list; write == "yes" or == "no"`,
		}},
		{"null", inBody("\ts.joints == null"), []string{
			`13:14: found "null", which no fact ever is, expected comparisons of facts that are there; remove it; a missing fact is a query by itself`,
		}},
		{"with", inBody("\ts.withstand.peak >= s.fault.peak.at_most with input.limits as {}"), []string{
			`13:43: found "with", which puts other facts in the place of the board's, expected comparisons of facts that are there; remove it`,
		}},
		{"second some", inBody("\tsome o in input.busbars\n\ts.withstand.peak >= o.fault.peak.at_most"), []string{
			`13:2: found a second "some", which would pair one subject or board with another, expected one "some" in a body; ask for a term that holds what is needed of the other subject`,
			`14:22: found "o.fault.peak.at_most", which is more than the subject and the limits, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"two names", inFile("complies contains s.id if {\n\tsome i, s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`12:2: found a "some" with another name or form, which would hide what is read, expected some s in input.busbars, or another kind, as the first line of a body; call the subject s`,
		}},
		{"some without in", inFile("complies contains s.id if {\n\tsome s\n\tinput.busbars[s]\n}\n"), []string{
			`12:2: found a "some" with another name or form, which would hide what is read, expected some s in input.busbars, or another kind, as the first line of a body; call the subject s`,
			`13:2: found "input.busbars[s]" alone, which holds for any value, expected a comparison; write what it has to be, such as == "yes"`,
		}},
		{"other name", inFile("complies contains b.id if {\n\tsome b in input.busbars\n\tb.joints == \"bare\"\n}\n"), []string{
			`11:19: found a set complies of something else, expected s.id; write complies contains s.id if { … }`,
		}},
		{"some limits", inFile("complies contains s.id if {\n\tsome s in input.limits\n\ts.joints == \"bare\"\n}\n"), []string{
			`12:2: found a "some" over something else than a kind of subject, expected some s in input.busbars, or another kind, as the first line of a body; write some s in input.<kind>`,
		}},
		{"some data", inFile("complies contains s.id if {\n\tsome s in data.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`12:2: found a "some" over something else than a kind of subject, expected some s in input.busbars, or another kind, as the first line of a body; write some s in input.<kind>`,
		}},
		{"some list", inFile("complies contains s.id if {\n\tsome s in [1, 2]\n\ts.joints == \"bare\"\n}\n"), []string{
			`12:2: found a "some" over something else than a kind of subject, expected some s in input.busbars, or another kind, as the first line of a body; write some s in input.<kind>`,
		}},
		{"no some", inFile("complies contains s.id if {\n\ts := input.busbars[_]\n\ts.joints == \"bare\"\n}\n"), []string{
			`12:2: found a body that does not begin with its subject, expected some s in input.busbars, or another kind, as the first line of a body; write some s in input.<kind> before everything else`,
			`12:2: found a name for a value, behind which nobody sees what is compared, expected comparisons of facts that are there; write the term itself, and == to compare words`,
		}},
		{"second kind", inFile(goodBody + "\ndeparts contains s.id if {\n\tsome s in input.boards\n\ts.work.under_voltage == \"no\"\n}\n"), []string{
			`17:2: found input.boards in a rule about input.busbars, expected one kind of subject in a rule; write a rule of its own for boards`,
		}},
		{"assign", inBody("\tx := s.withstand.peak\n\tx >= s.fault.peak.at_most"), []string{
			`13:2: found a name for a value, behind which nobody sees what is compared, expected comparisons of facts that are there; write the term itself, and == to compare words`,
			`14:2: found the name "x", behind which nobody sees what is compared, expected s.<term> or input.limits.<term>; write the term itself`,
		}},
		{"unify", inBody("\ts.joints = \"bare\""), []string{
			`13:2: found a name for a value, behind which nobody sees what is compared, expected comparisons of facts that are there; write the term itself, and == to compare words`,
		}},
		{"bare", inBody("\ts.joints"), []string{
			`13:2: found "s.joints" alone, which holds for any value, expected a comparison; write what it has to be, such as == "yes"`,
		}},
		{"wildcard index", inBody("\tinput.busbars[_].withstand.peak >= s.fault.peak.at_most"), []string{
			`13:2: found "input.busbars[_].withstand.peak", which looks into other subjects or picks by position, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"number index", inBody("\tinput.busbars[0].withstand.peak >= s.fault.peak.at_most"), []string{
			`13:2: found "input.busbars[0].withstand.peak", which looks into other subjects or picks by position, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"members of the subject", inBody("\ts.supports[_].k >= s.fault.peak.at_most"), []string{
			`13:2: found "s.supports[_].k", which looks into other subjects or picks by position, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"other part of the input", inBody("\tinput.boards == s.joints"), []string{
			`13:2: found "input.boards", which is more than the subject and the limits, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"data", inBody("\ts.withstand.peak >= data.limits.peak"), []string{
			`13:22: found "data.limits.peak", which is more than the subject and the limits, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"other name read", inBody("\tx.withstand.peak >= s.fault.peak.at_most"), []string{
			`13:2: found "x.withstand.peak", which is more than the subject and the limits, expected s.<term> or input.limits.<term>; ask for a term that holds what is needed`,
		}},
		{"whole s", inBody("\ts == s"), []string{
			`13:2: found s alone, which is the whole subject, expected s.<term> or input.limits.<term>; write the term that is meant`,
			`13:7: found s alone, which is the whole subject, expected s.<term> or input.limits.<term>; write the term that is meant`,
		}},
		{"set of var", inBody("\ts.joints in {\"covered\", s.shape}"), []string{
			`13:14: found a set with something else than texts, or an empty one, expected a set of words such as {"yes", "partly"}; write each word between quotes`,
		}},
		{"empty set", inBody("\ts.joints in set()"), []string{
			`13:14: found a set with something else than texts, or an empty one, expected a set of words such as {"yes", "partly"}; write each word between quotes`,
		}},
		{"array in", inBody("\ts.joints in [\"covered\"]"), []string{
			`13:2: found "in" with something else than a set of words, expected a term in {"word", "word"}; write the words between braces`,
		}},
		{"in term", inBody("\ts.joints in s.words"), []string{
			`13:2: found "in" with something else than a set of words, expected a term in {"word", "word"}; write the words between braces`,
		}},
		{"key in", inBody("\t\"a\", s.joints in {\"covered\"}"), []string{
			`13:2: found "in" with something else than a set of words, expected a term in {"word", "word"}; write the words between braces`,
		}},
		{"set eq", inBody("\ts.joints == {\"covered\"}"), []string{
			`13:2: found "in" with something else than a set of words, expected a term in {"word", "word"}; write the words between braces`,
		}},
		{"not equal", inBody("\ts.joints != \"bare\""), []string{
			`13:2: found "!=", which holds for every other word and for a slip of the pen, expected comparisons of facts that are there; name the words that are meant, with == or in {"…"}`,
		}},
		{"nothing compared", inFile("complies contains s.id if {\n\tsome s in input.busbars\n}\n"), []string{
			`11:1: found a body of complies without a comparison, which proves it of every subject, expected at least one comparison; compare a term of s with another term, a limit or a word`,
		}},
		{"no body", inFile("complies contains s.id\n"), []string{
			`11:1: found a body of complies without a comparison, which proves it of every subject, expected at least one comparison; compare a term of s with another term, a limit or a word`,
		}},
		{"nothing proven", header("#   reasons: {weak: a sentence}\n") + "exempt contains [s.id, \"weak\"] if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n", []string{
			`10:1: found a rule without complies and departs, which could never judge anything, expected at least one of them`,
		}},
		{"syntax", inBody("\ts.joints == "), []string{
			`14:1: found text that is no rule (unexpected } token), expected a package with three sets of comparisons`,
		}},
		{"comparison of a comparison", inBody("\t(s.withstand.peak >= s.fault.peak.at_most) == true"), []string{
			`13:3: found a comparison with >= inside another one, expected one comparison per line; write it as a line of its own`,
			`13:48: found true, which no fact ever is, expected a word of the term's list; write == "yes" or == "no"`,
		}},
		{"print", inBody("\tprint(s.joints)"), []string{
			`13:2: found the call "print", whose result nobody can check by hand, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"walk", inBody("\twalk(input, [_, x])"), []string{
			`13:2: found the call "walk", whose result nobody can check by hand, expected comparisons of facts that are there; ask for a term that holds the result`,
		}},
		{"comprehension behind a name", inBody("\tx := {1 | true}"), []string{
			`13:2: found a name for a value, behind which nobody sees what is compared, expected comparisons of facts that are there; write the term itself, and == to compare words`,
		}},
	})
}
