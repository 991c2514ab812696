// Package review turns verdicts into what an engineer signs: findings with numbers,
// places and cures, queries grouped by the value that is missing, what complies and
// on what basis, the assumptions used, what was not looked at, and the cautions that
// belong to what was found.
//
// Every decision of a report is taken here; the formats of package report only set
// it.
package review
