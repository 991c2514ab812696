package rules

import (
	"context"
	"errors"
	"slices"
	"sync"

	"boardproof/checker/facts"
)

// Judge asks every rule about every subject of its kind. For each board there is one list of verdicts,
// in the order of the rules, then of the subjects. What a rule does not prove is Clarify. A rule that
// errs, overruns its time, proves two things at once or contradicts the plain comparison of the same
// facts is Unjudged for the subjects concerned; the rest is judged. The result does not depend on the
// number of workers or on which boards are judged together.
//
// An error means that nothing was judged: the program's own pack does not compile, or ctx ended.
func (p *Pack) Judge(ctx context.Context, boards ...*facts.Board) ([][]Verdict, error) {
	if err := p.Prepare(ctx); err != nil {
		return nil, err
	}
	var scenes []*scene
	for batch := range slices.Chunk(boards, p.options.Batch) {
		scenes = append(scenes, p.scene(batch))
	}
	found := make([][][]Verdict, len(scenes)) // by scene, by rule
	for i := range found {
		found[i] = make([][]Verdict, len(p.rules))
	}
	p.work(ctx, len(scenes), func(i, rule int) { found[i][rule] = p.rules[rule].judge(ctx, scenes[i]) })
	if err := ctx.Err(); err != nil {
		return nil, err
	}
	out := make([][]Verdict, 0, len(boards))
	for i, s := range scenes {
		out = append(out, s.byBoard(p.rules, found[i])...)
	}
	return out, nil
}

// work calls do for every scene and rule. With fewer scenes than workers, several workers share the
// rules of a scene.
func (p *Pack) work(ctx context.Context, scenes int, do func(scene, rule int)) {
	if scenes == 0 || len(p.rules) == 0 {
		return
	}
	parts := min(max(1, p.options.Workers/scenes), len(p.rules))
	jobs := make(chan [2]int)
	var wait sync.WaitGroup
	for range min(p.options.Workers, scenes*parts) {
		wait.Go(func() {
			for job := range jobs {
				for rule := job[1]; rule < len(p.rules) && ctx.Err() == nil; rule += parts {
					do(job[0], rule)
				}
			}
		})
	}
	for i := range scenes {
		for part := range parts {
			jobs <- [2]int{i, part}
		}
	}
	close(jobs)
	wait.Wait()
}

// byBoard hands the verdicts of each rule to the boards of the scene.
func (s *scene) byBoard(rules []*Rule, found [][]Verdict) [][]Verdict {
	sizes := make([]int, len(s.boards))
	for _, r := range rules {
		for _, seat := range s.seats[r.Kind] {
			sizes[seat.board]++
		}
	}
	out := make([][]Verdict, len(s.boards))
	for i := range out {
		out[i] = make([]Verdict, 0, sizes[i])
	}
	for i, r := range rules {
		for n, seat := range s.seats[r.Kind] {
			out[seat.board] = append(out[seat.board], found[i][n])
		}
	}
	return out
}

// judge gives one verdict for each subject of the rule's kind.
func (r *Rule) judge(ctx context.Context, s *scene) []Verdict {
	seats := s.seats[r.Kind]
	if len(seats) == 0 {
		return nil
	}
	said := make([]statement, len(seats))
	if slices.ContainsFunc(seats, r.asks) {
		p, err, overran := r.ask(ctx, s)
		switch {
		case err != nil && len(s.boards) > 1:
			return r.judgeApart(ctx, s)
		case err != nil:
			text, row := faultOf(err, overran)
			for i := range said {
				said[i].fault, said[i].row = text, row
			}
		default:
			p.tell(said)
		}
	}
	verdicts := make([]Verdict, len(seats))
	truths := make([]truth, 0, len(r.bodies))
	for i := range seats {
		verdicts[i] = r.verdict(&seats[i], said[i], known{seats[i].facts, s.limits}, truths)
	}
	return verdicts
}

// asks tells whether the engine has to be asked about a subject.
func (r *Rule) asks(s seat) bool { return s.fault == "" && !r.elsewhere(s) }

// elsewhere tells whether the subject follows the practice that the rule does not belong to.
func (r *Rule) elsewhere(s seat) bool {
	return r.Practice != BothPractices && s.practice != "" && s.practice != r.Practice
}

// ask gives the rule its time.
func (r *Rule) ask(ctx context.Context, s *scene) (p proof, err error, overran bool) {
	input, err := s.input()
	if err != nil {
		return proof{}, err, false
	}
	limited, cancel := context.WithTimeout(ctx, s.pack.options.Budget)
	defer cancel()
	p, err = r.engine.prove(limited, r.Package, input, len(s.seats[r.Kind]))
	return p, err, errors.Is(limited.Err(), context.DeadlineExceeded)
}

// judgeApart repeats a scene that failed board by board, so that one board does not spoil the others.
func (r *Rule) judgeApart(ctx context.Context, s *scene) []Verdict {
	var verdicts []Verdict
	for _, b := range s.boards {
		if ctx.Err() != nil {
			return make([]Verdict, len(s.seats[r.Kind]))
		}
		verdicts = append(verdicts, r.judge(ctx, s.pack.scene([]*facts.Board{b}))...)
	}
	return verdicts
}
