# METADATA
# title: Live parts behind opened doors keep their protection
# description: >-
#   Behind a door opened by key or tool the standard does not itself ask for a cover against a
#   finger; it does where authorised persons are meant to work under voltage, and an owner may ask
#   for it everywhere. The degree asked for is a limit that an owner may tighten.
# custom:
#   rule: PRV-05
#   line: prevention
#   grade: major
#   references:
#     - standard: IEC 61439-1
#       edition: "2020"
#       clause: "8.4.6.2"
#       status: from memory, unconfirmed
#   proof: "10.5"
#   cure:
#     - {lever: door_open.contact_protection, direction: raise, steps: contact_protection}
#   reasons:
#     no_live_work: no work under voltage is foreseen on this board
package boardproof.prevention.prv05

complies contains s.id if {
	some s in input.boards
	s.door_open.contact_protection.rank >= input.limits.door_open.contact_protection.rank
}

departs contains s.id if {
	some s in input.boards
	s.work.under_voltage == "yes"
	s.door_open.contact_protection.rank < input.limits.door_open.contact_protection.rank
}

exempt contains [s.id, "no_live_work"] if {
	some s in input.boards
	s.work.under_voltage == "no"
	s.door_open.contact_protection.rank < input.limits.door_open.contact_protection.rank
}
