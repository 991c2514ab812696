# METADATA
# title: Rated peak and short-time withstand agree
# description: >-
#   A rated peak below the tabulated multiple of the short-time current belongs to a weaker test
#   than the short-time current claims. Ratings are printed rounded, so the multiple is compared
#   less a rounding of 0.5 percent; the fault itself is never compared with such an allowance.
# custom:
#   rule: WTH-03
#   line: limitation
#   grade: major
#   references:
#     - {standard: IEC 61439-1, edition: "2020", clause: Table 7}
#     - common practice
#   proof: "10.11"
#   cure:
#     - {lever: withstand.peak, direction: raise, steps: rated_peak}
package boardproof.limitation.wth03

complies contains s.id if {
	some s in input.busbars
	s.withstand.peak >= s.withstand.peak_of_ratio
}

departs contains s.id if {
	some s in input.busbars
	s.withstand.peak < s.withstand.peak_of_ratio
}
