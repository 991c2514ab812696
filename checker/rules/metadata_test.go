package rules

import (
	"slices"
	"strings"
	"testing"
	"testing/fstest"
)

func TestRefusedMetadata(t *testing.T) {
	t.Parallel()
	good := header("") + goodBody
	swap := func(old, with string) string {
		if !strings.Contains(good, old) {
			t.Fatalf("nothing to swap: %q", old)
		}
		return strings.Replace(good, old, with, 1)
	}
	reference := "common practice]"
	for _, c := range []struct {
		name string
		text string
		want []string
	}{
		{"none", "package boardproof.limitation.xy01\n\n" + goodBody, []string{
			"xy01.rego:1: found no metadata, expected one block that begins with # METADATA, directly before package; begin the file with # METADATA, # title: …"}},
		{"two blocks", good + "\n# METADATA\n# title: More\n" + strings.Replace(goodBody, "complies", "departs", 1), []string{
			"xy01.rego:16: found a second metadata block, of which the engine would take both, expected one block that begins with # METADATA, directly before package; remove one"}},
		{"indented", " " + good, []string{
			"xy01.rego:1: found a metadata block that the engine would pass over, expected # METADATA at the left edge; remove what stands before or between"}},
		{"two spaces", swap("# METADATA", "#  METADATA"), []string{
			"xy01.rego:1: found a metadata block that the engine would pass over, expected # METADATA at the left edge; remove what stands before or between"}},
		{"not before package", swap("package boardproof", "\npackage boardproof"), []string{
			"xy01.rego:9: found something else after the metadata block, expected one block that begins with # METADATA, directly before package"}},
		{"unknown key", swap("title:", "titel:"), []string{
			`xy01.rego:2: expected the key title here`,
			`xy01.rego:2:3: found the key "titel", expected one of title, description, custom; write title`}},
		{"unknown custom key", swap("grade:", "severity:"), []string{
			`xy01.rego:5: expected the key grade here`,
			`xy01.rego:7:5: found the key "severity", expected one of rule, line, grade, practice, references, cure, reasons, proof`}},
		{"key twice", swap("#   grade: major", "#   grade: major\n#   grade: minor"), []string{
			`xy01.rego:8:5: found "grade" a second time, expected each key once`}},
		{"broken", swap("references: [", "references: [[[{"), []string{
			"xy01.rego:7: found YAML that cannot be followed (did not find expected ',' or '}'), expected title, description and custom; check indentation, quotes and colons"}},
		{"long title", swap("An invented rule", strings.Repeat("A", 61)), []string{
			"xy01.rego:2:10: found a title of 61 letters, expected a title of at most 60 letters that begins with a capital and ends without period"}},
		{"period", swap("An invented rule", "An invented rule."), []string{
			`xy01.rego:2:10: found "An invented rule.", expected a title of at most 60 letters that begins with a capital and ends without period`}},
		{"small letter", swap("An invented rule", "an invented rule"), []string{
			`xy01.rego:2:10: found "an invented rule", expected a title of at most 60 letters that begins with a capital and ends without period`}},
		{"no description", swap("description: for tests", "description:"), []string{
			"xy01.rego:3:15: found nothing, expected why the rule is there, for a tenderer"}},
		{"line", swap("line: limitation", "line: limiting"), []string{
			`xy01.rego:6:11: found "limiting", expected one of prevention, limitation, regulation, evidence`}},
		{"grade", swap("grade: major", "grade: severe"), []string{
			`xy01.rego:7:12: found "severe", expected one of major, minor, observation`}},
		{"name", swap("rule: XY-01", "rule: XY1"), []string{
			`xy01.rego:5:11: found "XY1", expected a name of 2 to 6 capitals, a dash and 2 or 3 digits; write it like WTH-01`}},
		{"name of another file", swap("rule: XY-01", "rule: XY-02"), []string{
			`xy01.rego: found the rule XY-02 in a file named "xy01.rego", expected the file xy02.rego`,
			`xy01.rego:9: found package "boardproof.limitation.xy01", expected package boardproof.limitation.xy02`}},
		{"package", swap("package boardproof.limitation.xy01", "package boardproof.prevention.xy01"), []string{
			`xy01.rego:9: found package "boardproof.prevention.xy01", expected package boardproof.limitation.xy01`}},
		{"no reference", swap("[common practice]", "[]"), []string{
			"xy01.rego:8:17: found an empty list, expected at least one clause, or common practice"}},
		{"reference without clause", swap(reference, "{standard: IEC 61439-1, edition: 2020}]"), []string{
			"xy01.rego:8: expected the key clause here"}},
		{"reference of hearsay", swap(reference, "everybody does]"), []string{
			`xy01.rego:8:18: found "everybody does", expected standard, edition and clause, or the words common practice`}},
		{"practice", header("#   practice: both of them\n") + goodBody, []string{
			`xy01.rego:9:15: found "both of them", expected one of both, IEC, North American`}},
		{"reason not given", header("#   reasons: {weak: a sentence}\n") + goodBody, []string{
			`xy01.rego:10: found the reason "weak", which no body gives, expected reasons of exempt bodies; remove it`}},
		{"reason of the engine", header("#   reasons: {other_practice: a sentence}\n") + goodBody, []string{
			`xy01.rego:9:15: found "other_practice", which is the engine's own reason, expected a name in small letters, digits and _; write it like no_live_work`}},
		{"lever", header("#   cure: [{lever: withstand.paek, direction: raise}]\n") + goodBody, []string{
			`xy01.rego:9: found the lever "withstand.paek", which is no term of busbars, expected a term of busbars; write withstand.peak`}},
		{"direction", header("#   cure: [{lever: withstand.peak, direction: up}]\n") + goodBody, []string{
			`xy01.rego:9:47: found "up", expected one of raise, lower`}},
		{"unknown steps", header("#   cure: [{lever: withstand.peak, direction: raise, steps: rated_paek}]\n") + goodBody, []string{
			`xy01.rego:9: found the steps "rated_paek", expected a series of series.yaml; write rated_peak`}},
		{"steps of another quantity", header("#   cure: [{lever: withstand.duration, direction: raise, steps: rated_peak}]\n") + goodBody, []string{
			`xy01.rego:9: found steps of current for withstand.duration, which is a time, expected steps of the same quantity or list`}},
		{"alias", swap("title: An invented rule", "title: &a An invented rule"), []string{
			"xy01.rego:2:10: found an anchor or alias, expected a title of at most 60 letters that begins with a capital and ends without period; write the value out"}},
		{"tag", swap("title: An invented rule", "title: !!binary QQ=="), []string{
			`xy01.rego:2:10: found the tag "!!binary", expected a title of at most 60 letters that begins with a capital and ends without period; remove the tag`}},
		{"control character", swap("title: An invented rule", `title: "An \e[31m rule"`), []string{
			`xy01.rego:2:10: found "An \x1b[31m rule", expected characters that can be seen`}},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			p, problems := Load(packOf(c.text), testVocabulary(t), Options{})
			if p != nil {
				t.Fatal("loaded")
			}
			got := texts(problems)
			if !slices.EqualFunc(got, c.want, strings.HasPrefix) {
				t.Errorf("got\n%q\nwant\n%q", got, c.want)
			}
		})
	}
}

func TestMetadataIsTakenOver(t *testing.T) {
	t.Parallel()
	text := strings.Replace(header(`#   practice: IEC
#   proof: "10.11"
#   cure: [{lever: withstand.peak, direction: raise, steps: rated_peak}, {lever: covering, direction: raise, steps: covering}]
#   reasons: {bare: the joints are bare}
`), "[common practice]", "[common practice, {standard: IEC 61439-1, edition: 2020, clause: 5.10, status: invented}]", 1) + goodBody + `
exempt contains [s.id, "bare"] if {
	some s in input.busbars
	s.joints == "bare"
}
`
	p := mustLoad(t, packOf(text), Options{Dir: "our/pack"})
	r, ok := p.Rule("XY-01")
	if !ok {
		t.Fatal("no rule")
	}
	if r.Title != "An invented rule" || r.Description != "for tests" || r.Practice != IEC || r.Proof != "10.11" || r.Grade != Major || r.Line != "limitation" {
		t.Errorf("got %+v", r)
	}
	if r.Place().String() != "our/pack/xy01.rego:13" || r.Package != "boardproof.limitation.xy01" || len(r.SHA256) != 64 {
		t.Errorf("place %s, package %s, digest %s", r.Place(), r.Package, r.SHA256)
	}
	if len(r.References) != 2 || r.References[0].String() != "common practice" || r.References[1].String() != "IEC 61439-1:2020 5.10 (invented)" {
		t.Errorf("references %v", r.References)
	}
	if len(r.Cure) != 2 || r.Cure[0].Term.ID != "withstand.peak" || r.Cure[0].Series.Name != "rated_peak" || r.Cure[1].Series.Words[2] != "insulated" {
		t.Errorf("cure %+v", r.Cure)
	}
	if r.Reason("bare") != "the joints are bare" || r.Reason("unknown") != "unknown" || r.Reason(OtherPractice) != "belongs to IEC practice, which this board does not follow" {
		t.Errorf("reasons %v", r.Reasons)
	}
	if got := r.Proves(); !slices.Equal(got, []Outcome{Complies, Exempt}) {
		t.Errorf("proves %v", got)
	}
	var needs []string
	for _, n := range r.Needs {
		needs = append(needs, n.ID)
	}
	if !slices.Equal(needs, []string{"withstand.peak", "fault.peak.at_most", "joints"}) {
		t.Errorf("needs %v", needs)
	}
}

func TestRefusedFiles(t *testing.T) {
	t.Parallel()
	good := header("") + goodBody
	for _, c := range []struct {
		name string
		pack fstest.MapFS
		want []string
	}{
		{"nothing", fstest.MapFS{"readme.md": {}}, []string{".: found no rule, expected a folder with one .rego file per rule"}},
		{"capitals", fstest.MapFS{"XY01.rego": {Data: []byte(good)}}, []string{
			`XY01.rego: found a file named "XY01.rego", which would be passed over, expected a file of a rule pack; name it xy01.rego`}},
		{"short ending", fstest.MapFS{"xy01.rego": {Data: []byte(good)}, "limits.yml": {}}, []string{
			`limits.yml: found a file named "limits.yml", which would be passed over, expected a file of a rule pack; name it limits.yaml`}},
		{"limits in a folder", fstest.MapFS{"xy01.rego": {Data: []byte(good)}, "a/limits.yaml": {}}, []string{
			"a/limits.yaml: found limits.yaml in a folder, expected limits.yaml at the top of the pack"}},
		{"twice", fstest.MapFS{"xy01.rego": {Data: []byte(good)}, "a/xy01.rego": {Data: []byte(good)}}, []string{
			"xy01.rego:9: found the rule XY-01 a second time, expected each rule once"}},
		{"not UTF-8", fstest.MapFS{"xy01.rego": {Data: []byte("\xff\xfe")}}, []string{
			"xy01.rego: found bytes that are not UTF-8, expected UTF-8 text"}},
		{"large", fstest.MapFS{"xy01.rego": {Data: make([]byte, largestFile+1)}}, []string{
			"xy01.rego: found more than 256 KiB, expected a small text file"}},
		{"empty", fstest.MapFS{"xy01.rego": {}}, []string{
			"xy01.rego"}},
	} {
		t.Run(c.name, func(t *testing.T) {
			t.Parallel()
			p, problems := Load(c.pack, testVocabulary(t), Options{})
			if got := texts(problems); p != nil || !slices.EqualFunc(got, c.want, strings.HasPrefix) {
				t.Errorf("loaded %v, got\n%q\nwant\n%q", p != nil, got, c.want)
			}
		})
	}
}
