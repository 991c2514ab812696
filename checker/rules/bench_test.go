package rules

import (
	"context"
	"fmt"
	"strings"
	"testing"
	"testing/fstest"

	"boardproof/checker/facts"
)

// largePack has a hundred rules made of the library's forms, half of them about bars.
func largePack(b *testing.B) fstest.MapFS {
	b.Helper()
	pack := fstest.MapFS{"limits.yaml": {Data: []byte(testLimits)}}
	for i := range 100 {
		text := inFile(goodBody + "\ndeparts contains s.id if {\n\tsome s in input.busbars\n\ts.withstand.peak < s.fault.peak.at_least\n}\n")
		if i%2 == 1 {
			text = inFile(`complies contains s.id if {
	some s in input.boards
	s.insulation.rated_voltage >= s.insulation.voltage_required.at_most
}

departs contains s.id if {
	some s in input.boards
	s.work.under_voltage == "yes"
	s.insulation.rated_voltage < s.insulation.voltage_required.at_least
}
`)
		}
		short := fmt.Sprintf("xy%02d", i)
		pack[short+".rego"] = clone(text, strings.ToUpper(short[:2])+"-"+short[2:], short)
	}
	return pack
}

// benchBoards are boards of 1 and 24 subjects, all facts known.
func benchBoards(b *testing.B, n int) []*facts.Board {
	b.Helper()
	v := testVocabulary(b)
	var list []*facts.Board
	for i := range n {
		one := board(fmt.Sprint(i), subjectOf(b, v, facts.Boards, "board", map[string]string{
			"insulation.rated_voltage": "690 V", "insulation.voltage_required.at_least": "400 V", "insulation.voltage_required.at_most": "400 V",
			"door_open.contact_protection": "IPXXB", "work.under_voltage": "yes",
		}))
		for n := range 24 {
			one.Subjects = append(one.Subjects, subjectOf(b, v, facts.Busbars, fmt.Sprint("bars ", n), map[string]string{
				"withstand.joule_integral": "4.225 GA2s", "fault.joule_integral.at_least": "1.2 GA2s", "fault.joule_integral.at_most": "1.3 GA2s",
				"withstand.peak": "143 kA", "fault.peak.at_least": "100.123456789 kA", "fault.peak.at_most": fmt.Sprintf("%d kA", 100+2*n), "withstand.peak_of_ratio": "142.285 kA",
			}))
		}
		list = append(list, one)
	}
	return list
}

// BenchmarkLoadOwn is what a command pays that lists rules; BenchmarkPrepare what one pays that judges.
func BenchmarkLoadOwn(b *testing.B) {
	v := facts.Terms()
	for b.Loop() {
		if p, problems := LoadOwn(v, Options{}); p == nil {
			b.Fatal(problems.Err())
		}
	}
}

func BenchmarkLoadAndPrepareOwn(b *testing.B) {
	v := facts.Terms()
	for b.Loop() {
		p, problems := LoadOwn(v, Options{})
		if p == nil {
			b.Fatal(problems.Err())
		}
		if err := p.Prepare(context.Background()); err != nil {
			b.Fatal(err)
		}
	}
}

func BenchmarkLoad100Rules(b *testing.B) {
	pack, v := largePack(b), testVocabulary(b)
	b.Run("checked", func(b *testing.B) {
		for b.Loop() {
			if p, problems := Load(pack, v, Options{}); p == nil {
				b.Fatal(problems.Err())
			}
		}
	})
	text, problems := Index(pack)
	if problems.Len() > 0 {
		b.Fatal(problems.Err())
	}
	load := func(b *testing.B) *Pack {
		p, problems := loadIndexed(pack, text, v, Options{})
		if p == nil {
			b.Fatal(problems.Err())
		}
		return p
	}
	b.Run("indexed", func(b *testing.B) {
		for b.Loop() {
			load(b)
		}
	})
	b.Run("indexed and prepared", func(b *testing.B) {
		for b.Loop() {
			if err := load(b).Prepare(context.Background()); err != nil {
				b.Fatal(err)
			}
		}
	})
}

func BenchmarkJudge(b *testing.B) {
	own, problems := LoadOwn(facts.Terms(), Options{})
	if own == nil {
		b.Fatal(problems.Err())
	}
	large := mustLoad(b, largePack(b), Options{})
	for _, c := range []struct {
		name    string
		pack    *Pack
		boards  int
		workers int
	}{
		{"own/1 board", own, 1, 1}, {"own/8 boards", own, 8, 1},
		{"100 rules/1 board", large, 1, 1}, {"100 rules/8 boards", large, 8, 1}, {"100 rules/64 boards 2 workers", large, 64, 2},
	} {
		b.Run(c.name, func(b *testing.B) {
			boards := benchBoards(b, c.boards)
			p := *c.pack
			p.options.Workers = c.workers
			for b.Loop() {
				if _, err := p.Judge(context.Background(), boards...); err != nil {
					b.Fatal(err)
				}
			}
			b.ReportMetric(float64(b.Elapsed().Microseconds())/float64(b.N*c.boards), "µs/board")
		})
	}
}
