// Package report sets a review in the formats in which it is read: markdown, which is
// the format of record, the same on a terminal, and JSON for other programs; and the
// worksheet on which every number can be checked by hand.
//
// No format decides anything: what is said, and in which order, comes from package
// review. Text that came from a file passes through one escaping function for each
// format before it is set.
package report
