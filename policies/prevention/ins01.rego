# METADATA
# title: Rated insulation voltage covers system and circuits
# description: >-
#   Creepage distances and the power-frequency test are chosen by the rated insulation voltage. If
#   any circuit of the board works above it, both were chosen for another board.
# custom:
#   rule: INS-01
#   line: prevention
#   grade: major
#   references:
#     - {standard: IEC 61439-1, edition: "2020", clause: "5.2.3"}
#   proof: "10.9"
#   cure:
#     - {lever: insulation.rated_voltage, direction: raise, steps: rated_insulation_voltage}
package boardproof.prevention.ins01

complies contains s.id if {
	some s in input.boards
	s.insulation.rated_voltage >= s.insulation.voltage_required.at_most
}

departs contains s.id if {
	some s in input.boards
	s.insulation.rated_voltage < s.insulation.voltage_required.at_least
}
