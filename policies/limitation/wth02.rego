# METADATA
# title: Peak withstand covers the peak of the fault
# description: >-
#   The first peak bends the bars before any protection can act. It is summed over the branches,
#   motors included, in the worst supply state that is not excluded, and compared with the rated
#   peak withstand current itself, not with a multiple of the short-time current.
# custom:
#   rule: WTH-02
#   line: limitation
#   grade: major
#   references:
#     - {standard: IEC 61439-1, edition: "2020", clause: "5.3.4"}
#     - standard: IEC 60909-0
#       edition: "2016"
#       clause: "8.1"
#       status: clause number from memory, unconfirmed
#   proof: "10.11"
#   cure:
#     - {lever: supply.interlock, direction: raise, steps: interlock_kind}
#     - {lever: withstand.peak, direction: raise, steps: rated_peak}
package boardproof.limitation.wth02

complies contains s.id if {
	some s in input.busbars
	s.withstand.peak >= s.fault.peak.at_most
}

departs contains s.id if {
	some s in input.busbars
	s.withstand.peak < s.fault.peak.at_least
}
