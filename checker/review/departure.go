package review

import (
	"cmp"
	"slices"

	"boardproof/checker/rules"
)

// Departure is one requirement that is not met, for all the subjects that miss it by
// the same line of the file and the same numbers.
type Departure struct {
	*Finding          // of the first subject
	Others   []string // further subjects
	Cures    []Cure
	NoCure   string // why no cure was found, if one was sought
}

// Subjects names all subjects.
func (d *Departure) Subjects() []string { return append([]string{d.Subject.ID}, d.Others...) }

func departures(findings []*Finding) []*Departure {
	var list []*Departure
	for _, f := range findings {
		if f.Outcome != rules.Departs {
			continue
		}
		same := slices.IndexFunc(list, func(d *Departure) bool {
			return d.Rule == f.Rule && d.Place == f.Place && slices.EqualFunc(d.Compared, f.Compared, func(a, b Compared) bool {
				return a.Found.Text == b.Found.Text && a.Required.Text == b.Required.Text
			})
		})
		if same >= 0 {
			list[same].Others = append(list[same].Others, f.Subject.ID)
			continue
		}
		list = append(list, &Departure{Finding: f})
	}
	slices.SortStableFunc(list, func(a, b *Departure) int {
		return cmp.Or(
			cmp.Compare(weight(b.Rule.Grade), weight(a.Rule.Grade)),
			cmp.Compare(a.relative(), b.relative()))
	})
	return list
}

// relative is the margin as a part of what is required: the more negative, the
// worse; a word against a word counts as missing everything.
func (d *Departure) relative() float64 {
	c, ok := d.Decisive()
	if !ok || c.Required.Fact == nil || c.Required.Fact.Number == 0 || c.Margin == 0 {
		return -1
	}
	return c.Margin / c.Required.Fact.Show(d.Subject).Number
}
