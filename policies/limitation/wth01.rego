# METADATA
# title: Short-time withstand covers the prospective fault
# description: >-
#   The bars have to carry the largest fault for as long as the protection really takes, taken over
#   the whole fault range and by the slow edge of whatever clears it. The rated short-time current
#   may be converted to another duration only up to a limit and while the peak is covered too, so
#   a proof asks for all three; a missing peak is judged by WTH-02.
# custom:
#   rule: WTH-01
#   line: limitation
#   grade: major
#   references:
#     - {standard: IEC 61439-1, edition: "2020", clause: "5.3.5"}
#   proof: "10.11"
#   cure:
#     - {lever: supply.interlock, direction: raise, steps: interlock_kind}
#     - {lever: withstand.current, direction: raise, steps: rated_short_time}
#     - {lever: withstand.duration, direction: raise, steps: rated_duration}
package boardproof.limitation.wth01

complies contains s.id if {
	some s in input.busbars
	s.withstand.joule_integral >= s.fault.joule_integral.at_most
	s.fault.duration.at_most <= input.limits.withstand.conversion_time
	s.withstand.peak >= s.fault.peak.at_most
}

departs contains s.id if {
	some s in input.busbars
	s.withstand.joule_integral < s.fault.joule_integral.at_least
}
