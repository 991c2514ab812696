package rules

import (
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/facts"
)

// TestRefusedNamesAndBounds has the comparisons whose form is allowed but that cannot be made, or that
// do not prove what they claim.
func TestRefusedNamesAndBounds(t *testing.T) {
	t.Parallel()
	checkRefused(t, []refused{
		{"exempt reason", inFile(goodBody + "exempt contains [s.id, \"why\"] if {\n\tsome s in input.busbars\n\ts.joints == \"bare\"\n}\n"), []string{
			`15: found the reason "why" without a sentence, expected a reason of the metadata; add it under custom, reasons`,
		}},
		{"text number", inBody("\ts.withstand.peak >= \"65 kA\""), []string{
			`13:2: found a text beside s.withstand.peak, which is a current; to the engine every text is larger than every number, expected a term or a limit of the same quantity; put the value into limits.yaml and write input.limits.<name>`,
		}},
		{"text equal to a number", inBody("\ts.withstand.peak == \"65 kA\""), []string{
			`13:2: found a text beside s.withstand.peak, which is a current; to the engine every text is larger than every number, expected a term or a limit of the same quantity; put the value into limits.yaml and write input.limits.<name>`,
		}},
		{"unknown kind", inFile("complies contains s.id if {\n\tsome s in input.busbar\n\ts.joints == \"bare\"\n}\n"), []string{
			`12: found "input.busbar", which is no kind of subject, expected one of boards, busbars; write busbars`,
		}},
		{"id", inBody("\ts.id == \"main A\""), []string{
			`13:2: found s.id, the name of a subject, for which no rule makes an exception, expected a term of busbars; say which subjects are meant by a term`,
		}},
		{"misspelt", inBody("\ts.withstand.paek >= s.fault.peak.at_most"), []string{
			`13:2: found "s.withstand.paek", which is not in the vocabulary, expected a term of busbars; write s.withstand.peak`,
		}},
		{"nothing near", inBody("\ts.colour >= s.fault.peak.at_most"), []string{
			`13:2: found "s.colour", which is not in the vocabulary, expected a term of busbars`,
		}},
		{"misspelt limit", inBody("\ts.withstand.peak >= input.limits.pek"), []string{
			`13:2: found "input.limits.pek", which is not in the vocabulary, expected a limit of limits.yaml; write input.limits.peak`,
		}},
		{"group", inBody("\ts.withstand.peak >= s.fault.peak"), []string{
			`13:2: found "s.fault.peak", a group of terms, expected a term of busbars; write s.fault.peak.at_least or s.fault.peak.at_most`,
		}},
		{"units", inBody("\ts.withstand.peak >= s.fault.joule_integral.at_most"), []string{
			`13:2: found s.withstand.peak and s.fault.joule_integral.at_most, a current beside a joule integral, expected two terms of one quantity`,
		}},
		{"ranks of lists", inFile("complies contains s.id if {\n\tsome s in input.boards\n\ts.door_open.contact_protection.rank >= input.limits.covering.rank\n}\n"), []string{
			`13:2: found s.door_open.contact_protection.rank and input.limits.covering.rank, words of two lists, expected two terms of one list of words`,
		}},
		{"rank vs number", inBody("\ts.covering.rank >= s.withstand.peak"), []string{
			`13:2: found s.covering.rank and s.withstand.peak, a rank beside a current, expected two terms of one quantity or one list`,
		}},
		{"rank vs text", inBody("\ts.covering.rank >= \"sleeved\""), []string{
			`13:2: found a text beside a rank, expected a rank of the same list; write s.covering.word == to name a word, or compare with the rank of a limit`,
		}},
		{"no rank", inBody("\ts.joints.rank >= s.covering.rank"), []string{
			`13:2: found s.joints.rank, but joints is a word, expected s.joints`,
		}},
		{"plain ordered", inBody("\ts.covering >= input.limits.covering"), []string{
			`13:2: found input.limits.covering, an ordered word, whose word and rank would be compared as one, expected its rank or its word; write input.limits.covering.rank or input.limits.covering.word`,
			`13:2: found s.covering, an ordered word, whose word and rank would be compared as one, expected its rank or its word; write s.covering.rank or s.covering.word`,
		}},
		{"ordered words", inBody("\ts.covering.word >= \"sleeved\""), []string{
			`13:2: found ">=" between words, which would go by the alphabet, expected ranks of one list; write s.covering.rank`,
		}},
		{"ordered words 2", inBody("\ts.covering.word >= input.limits.covering.word"), []string{
			`13:2: found ">=" between words, which would go by the alphabet, expected ranks of one list; write input.limits.covering.rank`,
		}},
		{"order of words", inBody("\ts.joints > \"bare\""), []string{
			`13:2: found ">" between words, which would go by the alphabet, expected ranks of one list; name the words that are meant, with == or in {"…"}`,
		}},
		{"word lists", inBody("\ts.joints == s.shape"), []string{
			`13:2: found s.joints and s.shape, words of two lists, expected two terms of one list of words`,
		}},
		{"wrong word", inBody("\ts.joints == \"coverd\""), []string{
			`13:2: found the word "coverd" for joints, expected one of bare, covered; write "covered"`,
		}},
		{"wrong word set", inBody("\ts.joints in {\"covered\", \"taped\"}"), []string{
			`13:2: found the word "taped" for joints, expected one of bare, covered`,
		}},
		{"equal numbers", inBody("\ts.withstand.peak == s.withstand.peak_of_ratio"), []string{
			`13:2: found "==" between numbers, which the last digit decides, expected >= or <=; write >= or <=`,
		}},
		{"two texts", inBody("\t\"a\" == \"a\""), []string{
			`13:2: found two texts, which says nothing of the subject, expected a term beside the word; write s.<term> on one side`,
		}},
		{"limits only", inBody("\tinput.limits.peak >= input.limits.energy"), []string{
			`13:2: found two limits, which says nothing of the subject, expected a term of the subject on one side; write s.<term> on one side`,
		}},
		{"limit word only", inBody("\tinput.limits.method == \"box\""), []string{
			`11: found a body of complies without a comparison, which proves it of every subject, expected at least one comparison; compare a term of s with another term, a limit or a word`,
		}},
		{"itself", inBody("\ts.withstand.peak >= s.withstand.peak"), []string{
			`13:2: found s.withstand.peak beside itself, which holds whatever it is, expected two different terms`,
		}},
		{"at least", inBody("\ts.withstand.peak >= s.fault.peak.at_least"), []string{
			`13:2: found s.fault.peak.at_least on the smaller side; the true value may be larger, so it proves nothing, expected fault.peak.at_most there; write s.fault.peak.at_most`,
		}},
		{"at least flipped", inBody("\ts.fault.peak.at_least <= s.withstand.peak"), []string{
			`13:2: found s.fault.peak.at_least on the smaller side; the true value may be larger, so it proves nothing, expected fault.peak.at_most there; write s.fault.peak.at_most`,
		}},
		{"departs at most", inFile(goodBody + "\ndeparts contains s.id if {\n\tsome s in input.busbars\n\ts.withstand.peak < s.fault.peak.at_most\n}\n"), []string{
			`18:2: found s.fault.peak.at_most on the larger side; the true value may be smaller, so it proves nothing, expected fault.peak.at_least there; write s.fault.peak.at_least`,
		}},
		{"exempt at most", header("#   reasons: {weak: a sentence}\n") + goodBody + "\nexempt contains [s.id, \"weak\"] if {\n\tsome s in input.busbars\n\ts.fault.peak.at_most > input.limits.peak\n}\n", []string{
			`19:2: found s.fault.peak.at_most on the larger side; the true value may be smaller, so it proves nothing, expected fault.peak.at_least there; write s.fault.peak.at_least`,
		}},
		{"bound of ranks", inBody("\ts.covering.rank >= s.weakest.at_least.rank"), []string{
			`13:2: found s.weakest.at_least.rank on the smaller side; the true value may be larger, so it proves nothing, expected weakest.at_most there; write s.weakest.at_most.rank`,
		}},
		{"equal to a bound", inBody("\ts.covering.rank == s.weakest.at_least.rank"), []string{
			`13:2: found s.weakest.at_least.rank with ==, which a bound cannot prove, expected >= or <=`,
		}},
		{"wrong way", inBody("\ts.withstand.peak >= input.limits.energy"), []string{
			`13:2: found input.limits.energy, which limits.yaml calls stricter when lower, on the side where that is met more easily, expected the other side, or the other direction in limits.yaml`,
		}},
		{"wrong way departs", inFile(goodBody + "\ndeparts contains s.id if {\n\tsome s in input.busbars\n\ts.withstand.peak > input.limits.peak\n}\n"), []string{
			`18:2: found input.limits.peak, which limits.yaml calls stricter when higher, on the side where that is met more easily, expected the other side, or the other direction in limits.yaml`,
		}},
	})
}

// TestBoundsProveOnlyWhatHolds takes true values anywhere between their bounds: what an allowed
// comparison of the bounds proves has to hold for them.
func TestBoundsProveOnlyWhatHolds(t *testing.T) {
	t.Parallel()
	allowed := 0
	rapid.Check(t, func(t *rapid.T) {
		side := func(name string) (Operand, float64, float64) {
			low := rapid.Float64Range(-10, 10).Draw(t, name+" at least")
			high := low + rapid.SampledFrom([]float64{0, 1, 5}).Draw(t, name+" width")
			bound := rapid.SampledFrom([]string{atLeast, atMost}).Draw(t, name+" bound")
			value := low
			if bound == atMost {
				value = high
			}
			truth := low + (high-low)*rapid.Float64Range(0, 1).Draw(t, name+" truth")
			return Operand{Term: &facts.Term{ID: name + bound, Value: facts.Number}}, value, truth
		}
		left, leftBound, leftTrue := side("left")
		right, rightBound, rightTrue := side("right")
		c := Comparison{Left: left, Right: right, Operator: rapid.SampledFrom([]string{">=", ">", "<=", "<"}).Draw(t, "operator")}
		if wrongBound(c) != nil {
			return
		}
		allowed++
		if weighNumbers(c, leftBound, rightBound) == holds && weighNumbers(c, leftTrue, rightTrue) != holds {
			t.Fatalf("%v with %v and %v proves what does not hold for %v and %v", c, leftBound, rightBound, leftTrue, rightTrue)
		}
	})
	if allowed == 0 {
		t.Error("no comparison was allowed")
	}
}

func weighNumbers(c Comparison, left, right float64) truth {
	c.Left.slot, c.Right.slot = 0, 1
	return c.weigh(known{subject: []*facts.Fact{{Term: c.Left.Term, Known: true, Number: left}, {Term: c.Right.Term, Known: true, Number: right}}})
}

func TestAllowedComparisons(t *testing.T) {
	t.Parallel()
	for _, lines := range []string{
		"\ts.withstand.peak >= s.fault.peak.at_most",
		"\ts.fault.peak.at_most <= s.withstand.peak",
		"\ts.withstand.peak > input.limits.peak",
		"\ts.fault.peak.at_most <= input.limits.energy",
		"\ts.covering.rank >= input.limits.covering.rank",
		"\ts.covering.word == \"insulated\"",
		"\ts.covering.rank == input.limits.covering.rank",
		"\t\"covered\" == s.joints",
		"\ts.joints in {\"covered\"}",
		"\ts.covering.word in {\"sleeved\", \"insulated\"}\n\tinput.limits.method == \"box\"",
	} {
		t.Run(lines, func(t *testing.T) {
			t.Parallel()
			mustLoad(t, packOf(inBody(lines)), Options{})
		})
	}
}
