// Code generated from policies/board.yaml by go generate; DO NOT EDIT.

package spec

import "boardproof/checker/units"

// Content is what the file says of this: switchboard.
type Content struct {
	At
	State State

	// designation. The one name of the board in every output.
	Board Given[string]
	// title. What the board is and where it stands.
	Title Given[string]
	// stage of the document. Decides how much proof a claim needs. Source: common practice.
	Stage Given[Stage]
	// revision of this file. Letter or number of the issue.
	Revision Given[string]
	// tenderer. Who makes the claims of this file.
	OfferedBy Given[string]
	// code practice. Which set of codes is applied. Source: common practice.
	Practice Given[Practice]
	// editions of standards. Editions the parties agreed on.
	Editions Editions
	// basis file. Path of the file that holds what the boards of a project share.
	Basis Given[string]
	// documents. Where the values come from.
	Documents Named[Document]
	// persons responsible. Who answers for this file.
	Roles Roles
	// requirement number. Number the owner gave to the requirement.
	RequirementID Given[string]
	// counts. Counts taken from the single-line diagram; they show that nothing was left out.
	Counted Counted
	// electrical system. The system the board is connected to.
	System System
	// site. Surroundings at the place of installation.
	Site Site
	// sources. Every source that can feed the bars.
	Sources Named[Source]
	// other supplies and stored energy. What keeps parts live when the sources are off. Source: EN 50110-1 6.2
	// (from memory, unconfirmed).
	OtherSupplies Named[OtherSupply]
	// bar sections. Parts of the bars that couplers can separate.
	Sections Named[Section]
	// transfer between sources. What keeps sources apart or lets them run together.
	Transfer Transfer
	// standby motors. Motors that never run together with the others; all others count as running. Source:
	// common practice.
	Standby List[Given[Name]]
	// assembly. Ratings and construction of the whole board.
	Assembly Assembly
	// busbars. Main bars and distribution bars.
	Busbars Named[Busbar]
	// functional units. Incomers and couplers and feeders.
	Units Named[Unit]
	// taps. Every connection to bars or line side that is not a unit.
	Taps Named[Tap]
	// protective devices. Devices and settings that clear faults.
	Protection Named[ProtectiveDevice]
	// auxiliary supply. What the tripping lives on.
	AuxiliarySupply AuxiliarySupply
	// internal arc. Containment and detection and limitation of arcs.
	Arc Arc
	// work at the board. Tasks and rules for persons at the board.
	Work Work
	// evidence. Reports that show a value, circuit by circuit. Source: IEC 61439-1 Annex D.
	Evidence List[EvidenceItem]
	// routine verification. What was verified on the finished board. Source: IEC 61439-1 clause 11.
	RoutineVerification RoutineVerification
}

// Editions is what the file says of this: editions of standards.
type Editions struct {
	At
	State State

	// edition of IEC 61439-1. Year of the general rules for assemblies.
	Iec614391 Given[int]
	// edition of IEC 61439-2. Year of the part for power assemblies.
	Iec614392 Given[int]
	// edition of IEC 60664-1. Year of the insulation coordination standard.
	Iec606641 Given[int]
	// edition of IEC 60909-0. Year of the short-circuit calculation standard.
	Iec609090 Given[int]
	// edition of IEC 60865-1. Year of the standard for short-circuit effects.
	Iec608651 Given[int]
	// edition of IEC 60947-2. Year of the circuit-breaker standard.
	Iec609472 Given[int]
	// edition of IEC TR 61641. Year of the guide to internal arc tests.
	IecTr61641 Given[int]
	// edition of DGUV-I 203-077. Year of the guide to the box-test method.
	Dguv203077 Given[int]
	// edition of IEEE 1584. Year of the guide to incident energy.
	Ieee1584 Given[int]
	// edition of NFPA 70E. Year of the workplace safety standard.
	Nfpa70e Given[int]
	// edition of the NEC. Year of NFPA 70.
	Nec Given[int]
}

// Document is what the file says of this: document.
type Document struct {
	At
	State State

	// title. As printed on the document.
	Title Given[string]
	// number. Number under which it is filed.
	Number Given[string]
	// revision. Revision the values were read from.
	Revision Given[string]
	// date. Date of that revision.
	Date Given[Date]
}

// Roles is what the file says of this: persons responsible.
type Roles struct {
	At
	State State

	// prepared by. Name and competence.
	PreparedBy Given[string]
	// checked by. A person other than the author.
	CheckedBy Given[string]
	// approved by. Who signs for the owner.
	ApprovedBy Given[string]
}

// Counted is what the file says of this: counts from the single-line diagram.
type Counted struct {
	At
	State State

	// number of sources. Sources drawn on the diagram.
	Sources Given[int]
	// number of sections. Sections drawn on the diagram.
	Sections Given[int]
	// number of busbars. Main and distribution bars drawn on the diagram.
	Busbars Given[int]
	// number of units. Incomers, couplers and feeders drawn on the diagram.
	Units Given[int]
	// number of taps. Connections to bars or line side that are not units.
	Taps Given[int]
	// number of other supplies. Other supplies and stores drawn on the diagram.
	OtherSupplies Given[int]
}

// System is what the file says of this: electrical system.
type System struct {
	At
	State State

	// nominal voltage (Un). Line to line at the bars. Usual: 100 V to 1000 V. Source: IEC 61439-1 5.2 (from
	// memory, unconfirmed).
	Voltage Given[units.Volt]
	// highest circuit voltage. Voltage of the highest circuit on the board where it is above the system voltage.
	// Usual: 100 V to 1500 V. Source: IEC 61439-1 5.2 (from memory, unconfirmed).
	HighestCircuitVoltage Given[units.Volt]
	// voltage tolerance. Upper tolerance of the supply; it decides the voltage factors. Usual: 5 % to 10 %.
	// Source: IEC 60909-0 Table 1 (from memory, unconfirmed).
	VoltageTolerance Given[units.Percentage]
	// rated frequency (fn). Frequency of the supply. Usual: 50 Hz to 60 Hz. Source: IEC 61439-1 5.5 (from
	// memory, unconfirmed).
	Frequency Given[units.Hertz]
	// system earthing. How the star point and exposed parts are earthed. Source: IEC 60364-1 312.2 (from memory,
	// unconfirmed).
	Earthing Given[EarthingSystem]
	// earth electrode resistance (RA). Electrode of the exposed parts in a TT or IT system. Usual: 50 mΩ to 40
	// Ω. Source: IEC 60364-4-41 411.5 (from memory, unconfirmed).
	EarthElectrode Given[units.Ohm]
	// neutral-to-earth links. Every place where neutral and earth are joined, sources included. Source: IEC
	// 60364-4-44 444.4.6 (from memory, unconfirmed).
	NeutralLinks List[NeutralLink]
	// overvoltage category. Category at the incoming terminals. Source: IEC 60664-1 Table F.1.
	OvervoltageCategory Given[OvervoltageCategory]
	// third harmonic. Third harmonic share of the line current. Usual: 0 % to 60 %. Source: IEC 60364-5-52 Annex
	// E (from memory, unconfirmed).
	ThirdHarmonic Given[units.Percentage]
	// declared prospective current. What the network operator or owner states at the incoming terminals.
	DeclaredFault DeclaredFault
}

// NeutralLink is what the file says of this: neutral-to-earth link.
type NeutralLink struct {
	At
	State State

	// place. Where neutral and earth are joined.
	AtField Given[NeutralLinkPlace]
	// removal. How the link is opened for testing. Source: common practice.
	Removable Given[LinkRemoval]
	// labelled. A label marks the link. Source: common practice.
	Labelled Given[bool]
	// switched with. Unit whose position opens or closes the link.
	ClosesWith Given[Name]
}

// DeclaredFault is what the file says of this: declared prospective current.
type DeclaredFault struct {
	At
	State State

	// largest prospective current (Icp). Largest three-phase r.m.s. current. Usual: 1 kA to 150 kA. Source: IEC
	// 61439-1 Annex C (from memory, unconfirmed).
	Largest Given[units.Ampere]
	// smallest prospective current. Smallest three-phase r.m.s. current. Usual: 500 A to 100 kA. Source: common
	// practice.
	Smallest Given[units.Ampere]
	// largest future prospective current. What the network may grow to. Usual: 1 kA to 150 kA. Source: common
	// practice.
	FutureLargest Given[units.Ampere]
	// given by. Who stated the figures.
	GivenBy Given[string]
	// date. Date of the statement.
	Date Given[Date]
}

// Site is what the file says of this: site.
type Site struct {
	At
	State State

	// place of installation. Decides the service conditions. Source: IEC 61439-1 7.1.
	Location Given[InstallationPlace]
	// altitude. Height above sea level. Usual: -20 m to 4500 m. Source: IEC 61439-1 7.1; IEC 60664-1 Table A.2.
	Altitude Given[units.Metre]
	// highest ambient temperature. Air around the board. Usual: 25 °C to 55 °C. Source: IEC 61439-1 7.1.
	AmbientMax Given[units.Celsius]
	// highest daily mean temperature. Mean over 24 h of the air around the board. Usual: 15 °C to 50 °C.
	// Source: IEC 61439-1 7.1.
	AmbientDailyMean Given[units.Celsius]
	// lowest ambient temperature. Air around the board. Usual: -40 °C to 15 °C. Source: IEC 61439-1 7.1.
	AmbientMin Given[units.Celsius]
	// air temperature inside the board. Air at the devices in full service. Usual: 30 °C to 80 °C. Source: IEC
	// 61439-1 10.10.
	AirInsideBoard Given[units.Celsius]
	// relative humidity. Highest value at the highest temperature. Usual: 20 % to 100 %. Source: IEC 61439-1
	// 7.1.
	Humidity Given[units.Percentage]
	// pollution degree. Pollution the insulation has to live with. Source: IEC 60664-1.
	PollutionDegree Given[int]
	// flood level. Water above the switchroom floor; none where it cannot come. Usual: 0 m to 5 m. Source:
	// common practice.
	FloodLevel Given[units.Metre]
	// height of the base. Lowest live part above the switchroom floor. Usual: 20 mm to 6 m. Source: common
	// practice.
	BaseHeight Given[units.Metre]
	// condensation. How often it forms inside an unheated board. Source: IEC 61439-1 7.1.
	Condensation Given[CondensationFrequency]
	// corrosive air. Agents in the air of the room. Source: IEC 61439-1 7.2 (from memory, unconfirmed).
	CorrosiveAir List[Given[CorrosiveAgent]]
	// dust. Dust in the air of the room. Source: IEC 61439-1 7.2 (from memory, unconfirmed).
	Dust List[Given[DustKind]]
	// animals. Rodents or insects or reptiles are to be expected. Source: common practice.
	Animals Given[bool]
	// persons with access. Least competent persons who can reach the board. Source: IEC 61439-1 8.4.6 (from
	// memory, unconfirmed).
	Persons Given[Persons]
	// electromagnetic environment. Environment of the place. Source: IEC 61439-1 Annex J (from memory,
	// unconfirmed).
	EmcEnvironment Given[EmcEnvironment]
	// external lightning protection. The building has a lightning protection system. Source: IEC 60364-5-53 534
	// (from memory, unconfirmed).
	LightningProtection Given[bool]
	// overhead supply line. The supply comes over an overhead line. Source: IEC 60364-4-44 443 (from memory,
	// unconfirmed).
	OverheadLine Given[bool]
	// seismic requirement. Level asked for; none where there is none.
	Seismic Given[string]
}

// Source is what the file says of this: source.
type Source struct {
	At
	State State

	// kind. Decides which figures are needed.
	Kind Given[SourceKind]
	// rated power (Sr). Natural cooling. Usual: 25 kVA to 6 MVA. Source: IEC 60909-0.
	Rating Given[units.VoltAmpere]
	// rated power with forced cooling. Power with fans running; none where there are no fans. Usual: 25 kVA to 8
	// MVA. Source: common practice.
	RatingForced Given[units.VoltAmpere]
	// rated voltage (Ur). Of a generator or utility supply or converter. Usual: 100 V to 1000 V. Source: IEC
	// 60909-0.
	Voltage Given[units.Volt]
	// secondary voltage (UrTLV). No-load voltage of the transformer on the board side. Usual: 100 V to 1050 V.
	// Source: IEC 60909-0.
	Secondary Given[units.Volt]
	// primary voltage (UrTHV). Rated voltage of the transformer on the network side. Usual: 380 V to 36 kV.
	// Source: IEC 60909-0.
	Primary Given[units.Volt]
	// short-circuit impedance. Of the transformer at the principal tap. Source: IEC 60909-0.
	Impedance Impedance
	// load loss (PkrT). At rated current; the resistive part uRr times the rating. Usual: 250 W to 80 kW.
	// Source: IEC 60909-0.
	LoadLoss Given[units.Watt]
	// vector group. Winding connection of the transformer. Source: IEC 60076-1 (from memory, unconfirmed).
	VectorGroup Given[string]
	// zero sequence. Ratios that decide the earth fault current. Source: IEC 60909-0.
	ZeroSequence ZeroSequence
	// neutral of the source. Where it is earthed and whether it is switched.
	Neutral SourceNeutral
	// network ahead. Network that feeds the transformer or utility supply.
	Network Network
	// link to the board. Conductors from the source to the incomer; none for direct flanging.
	Link Link
	// subtransient reactance (x"d). Saturated value on the machine rating. Usual: 6 % to 30 %. Source: IEC
	// 60909-0.
	SubtransientReactance Given[units.Percentage]
	// transient reactance (x'd). Saturated value on the machine rating. Usual: 10 % to 50 %. Source: common
	// practice.
	TransientReactance Given[units.Percentage]
	// negative sequence reactance (x2). On the machine rating. Usual: 6 % to 40 %. Source: IEC 60909-0.
	NegativeSequenceReactance Given[units.Percentage]
	// zero sequence reactance (x0). On the machine rating. Usual: 1 % to 15 %. Source: IEC 60909-0.
	ZeroSequenceReactance Given[units.Percentage]
	// time constants. How the fault current of the machine decays.
	TimeConstants TimeConstants
	// sustained short-circuit current. What the machine keeps up; none where the excitation collapses.
	SustainedCurrent SustainedCurrent
	// excitation. Where the field of the machine takes its power from. Source: common practice.
	Excitation Given[ExcitationKind]
	// rated power factor (cos φ). Of the machine. Usual: 0.7 to 1. Source: IEC 60909-0.
	PowerFactor Given[units.Ratio]
	// largest current of the converter. Multiple of the rated current that an inverter or ups feeds into a
	// fault. Usual: 1 x to 3 x. Source: IEC 60909-0:2016 6.10 (from memory, unconfirmed).
	LargestCurrent Given[units.Multiple]
	// static bypass. A ups can connect another supply straight to the bars. Source: common practice.
	StaticBypass Given[bool]
	// upstream device. Protection that clears a fault between source and incomer. Source: common practice.
	UpstreamDevice Given[Name]
}

// Impedance is what the file says of this: short-circuit impedance.
type Impedance struct {
	At
	State State

	// impedance (ukr). Rated or measured short-circuit voltage; the lowest over the range of taps. Usual: 3 % to
	// 10 %. Source: IEC 60909-0.
	Value Given[units.Percentage]
	// test report. Report of the measurement; no tolerance is then added.
	Measured Given[string]
}

// ZeroSequence is what the file says of this: zero sequence ratios.
type ZeroSequence struct {
	At
	State State

	// reactance ratio (X0/X1). Zero to positive sequence reactance. Usual: 0.2 to 10. Source: IEC TR 60909-4.
	X0X1 Given[units.Ratio]
	// resistance ratio (R0/R1). Zero to positive sequence resistance. Usual: 0.2 to 20. Source: IEC TR 60909-4.
	R0R1 Given[units.Ratio]
}

// SourceNeutral is what the file says of this: neutral of a source.
type SourceNeutral struct {
	At
	State State

	// earthing. Where the star point is earthed.
	Earthed Given[NeutralEarthing]
	// switched. The neutral opens with the lines. Source: common practice.
	Switched Given[bool]
	// earthing resistance. Resistor between star point and earth. Usual: 0.5 Ω to 400 Ω. Source: common
	// practice.
	Resistance Given[units.Ohm]
}

// Network is what the file says of this: network ahead of a source.
type Network struct {
	At
	State State

	// network voltage (UnQ). Line to line. Usual: 380 V to 36 kV. Source: IEC 60909-0.
	Voltage Given[units.Volt]
	// largest fault level (S"kQ max). Largest short-circuit power at the connection. Usual: 10 MVA to 8000 MVA.
	// Source: IEC 60909-0.
	FaultLevelMax Given[units.VoltAmpere]
	// smallest fault level (S"kQ min). Smallest short-circuit power at the connection. Usual: 5 MVA to 4000 MVA.
	// Source: IEC 60909-0.
	FaultLevelMin Given[units.VoltAmpere]
	// largest fault current (I"kQ max). Instead of the largest fault level. Usual: 500 A to 100 kA. Source: IEC
	// 60909-0.
	FaultCurrentMax Given[units.Ampere]
	// smallest fault current (I"kQ min). Instead of the smallest fault level. Usual: 200 A to 80 kA. Source: IEC
	// 60909-0.
	FaultCurrentMin Given[units.Ampere]
	// largest future fault level. What the operator may grow to. Usual: 10 MVA to 8000 MVA. Source: common
	// practice.
	FutureFaultLevel Given[units.VoltAmpere]
	// resistance to reactance (RQ/XQ). Of the network; a tenth where unknown. Usual: 0.03 to 3. Source: IEC
	// 60909-0.
	RX Given[units.Ratio]
	// given by. Who stated the figures.
	GivenBy Given[string]
	// date. Date of the statement.
	Date Given[Date]
}

// Link is what the file says of this: link from source to board.
type Link struct {
	At
	State State

	// kind. Cables or bars or busduct.
	Kind Given[LinkKind]
	// conductor. Metal of the line conductors.
	Conductor Given[ConductorMetal]
	// insulation. Decides the temperature at the end of a fault.
	Insulation Given[CableInsulation]
	// line conductor area (S). One conductor. Usual: 1.5 mm2 to 1400 mm2. Source: common practice.
	Area Given[units.SquareMetre]
	// conductors in parallel. Per line.
	InParallel Given[int]
	// neutral area. All parallel conductors together. Usual: 16 mm2 to 9000 mm2. Source: common practice.
	NeutralArea Given[units.SquareMetre]
	// protective conductor area. All parallel conductors together. Usual: 16 mm2 to 9000 mm2. Source: IEC
	// 61439-1 Table 5.
	ProtectiveArea Given[units.SquareMetre]
	// length (l). Along the route. Usual: 0.5 m to 450 m. Source: common practice.
	Length Given[units.Metre]
	// resistance per length (R'). One conductor at 20 °C. Usual: 5 µΩ/m to 4 mΩ/m. Source: common practice.
	ResistancePerLength Given[units.OhmPerMetre]
	// reactance per length (X'). One conductor as laid. Usual: 10 µΩ/m to 0.5 mΩ/m. Source: common practice.
	ReactancePerLength Given[units.OhmPerMetre]
	// zero sequence of the link. Ratios with the return path as laid. Source: IEC 60909-0.
	ZeroSequence ZeroSequence
	// peak current of the cleats. Peak the fixing was tested to. Usual: 5 kA to 300 kA. Source: IEC 61914 (from
	// memory, unconfirmed).
	CleatsTestedTo Given[units.Ampere]
}

// TimeConstants is what the file says of this: time constants of a generator.
type TimeConstants struct {
	At
	State State

	// subtransient time constant (T"d). Short-circuit value. Usual: 3 ms to 200 ms. Source: common practice.
	Subtransient Given[units.Second]
	// transient time constant (T'd). Short-circuit value. Usual: 20 ms to 5 s. Source: common practice.
	Transient Given[units.Second]
	// direct current time constant (Ta). Armature winding. Usual: 3 ms to 500 ms. Source: common practice.
	DirectCurrent Given[units.Second]
}

// SustainedCurrent is what the file says of this: sustained short-circuit current.
type SustainedCurrent struct {
	At
	State State

	// sustained current (Ikd). Multiple of the rated current with a three-phase fault at the terminals. Usual:
	// 0.3 x to 6 x. Source: common practice.
	Current Given[units.Multiple]
	// how long. Time for which the machine keeps it up. Usual: 1 s to 60 s. Source: common practice.
	For Given[units.Second]
}

// OtherSupply is what the file says of this: other supply or stored energy.
type OtherSupply struct {
	At
	State State

	// kind. What keeps a part live. Source: EN 50110-1 6.2 (from memory, unconfirmed).
	Kind Given[OtherSupplyKind]
	// parts kept live. What it reaches with all sources off.
	Feeds Given[string]
	// connected at. Unit or bars where it enters.
	AtField Given[Name]
	// voltage. At its terminals. Usual: 12 V to 1000 V. Source: common practice.
	Voltage Given[units.Volt]
	// rated power. Reactive power of a capacitor bank. Usual: 5 kVA to 3 MVA. Source: common practice.
	Rating Given[units.VoltAmpere]
	// lockable isolation. It has an isolating device that can be locked open. Source: IEC 60364-5-53 (from
	// memory, unconfirmed).
	LockableIsolation Given[bool]
	// interlock against the sources. What keeps it from feeding back. Source: common practice.
	Interlock Given[InterlockKind]
	// labelled. Units it keeps live carry a label. Source: common practice.
	Labelled Given[bool]
	// discharge time. Until stored energy is harmless; none where nothing is stored. Usual: 1 s to 15 min.
	// Source: common practice.
	DischargeTime Given[units.Second]
}

// Section is what the file says of this: bar section.
type Section struct {
	At
	State State

	// main bars. Main bars of this section.
	Bars Given[Name]
}

// Transfer is what the file says of this: transfer between sources.
type Transfer struct {
	At
	State State

	// operation. How one source follows another. Source: common practice.
	Operation Given[TransferOperation]
	// interlocks. Only mechanical and key interlocks exclude a supply state. Source: common practice.
	Interlocks List[Interlock]
}

// Interlock is what the file says of this: interlock.
type Interlock struct {
	At
	State State

	// kind. What makes the closing impossible. Source: common practice.
	Kind Given[InterlockKind]
	// units concerned. Incomers and couplers it acts on.
	Of List[Given[Name]]
	// closed at once at most. How many of these units can be closed together.
	ClosedAtOnce Given[int]
	// remark. Key plan or drawing.
	Note Given[string]
}

// ShortTimeWithstand is what the file says of this: rated short-time withstand current.
type ShortTimeWithstand struct {
	At
	State State

	// short-time withstand current (Icw). RMS current carried for the rated duration. Usual: 1 kA to 150 kA.
	// Source: IEC 61439-1:2020 5.3.5.
	Current Given[units.Ampere]
	// duration. Time for which the current is carried. Usual: 50 ms to 3 s. Source: IEC 61439-1:2020 5.3.5.
	Duration Given[units.Second]
}

// Assembly is what the file says of this: assembly.
type Assembly struct {
	At
	State State

	// standard. Product standard the maker declares. Source: IEC 61439-1 6.1 (from memory, unconfirmed).
	Standard Given[AssemblyStandard]
	// manufacturer. Who answers for design and for building. Source: IEC 61439-1 3.10 (from memory,
	// unconfirmed).
	Manufacturer Manufacturer
	// serial number. Number on the nameplate.
	SerialNumber Given[string]
	// date of manufacture. As on the nameplate. Source: IEC 61439-1 6.1 (from memory, unconfirmed).
	Built Given[Date]
	// condition. New or existing or changed.
	Condition Given[AssemblyCondition]
	// modifications. Changes since delivery. Source: IEC 61439-1 clause 10.
	Modifications List[Modification]
	// rated operational voltage (Ue). Of the main circuits. Usual: 100 V to 1000 V. Source: IEC 61439-1 5.2.2
	// (from memory, unconfirmed).
	RatedOperationalVoltage Given[units.Volt]
	// rated insulation voltage (Ui). Creepage and voltage tests refer to it. Usual: 230 V to 1500 V. Source: IEC
	// 61439-1 5.2.3 (from memory, unconfirmed).
	RatedInsulationVoltage Given[units.Volt]
	// rated impulse withstand voltage (Uimp). Clearances refer to it. Usual: 1.5 kV to 20 kV. Source: IEC
	// 61439-1 Table 1.
	RatedImpulseWithstand Given[units.Volt]
	// rated current of the assembly (InA). Smaller of what incomers in parallel carry and what the bars
	// distribute. Usual: 50 A to 10 kA. Source: IEC 61439-1:2020 5.3.1 (from memory, unconfirmed).
	RatedCurrent Given[units.Ampere]
	// rated current without fans. InA left when forced cooling fails. Usual: 50 A to 10 kA. Source: common
	// practice.
	RatedCurrentNatural Given[units.Ampere]
	// rated diversity factor (RDF). Share of their rating that all circuits carry together, continuously. Usual:
	// 0.4 to 1. Source: IEC 61439-2 Table 101.
	RatedDiversityFactor Given[units.Ratio]
	// cooling. Whether the rating needs fans. Source: common practice.
	Cooling Given[Cooling]
	// short-circuit rating. Of the assembly at its incoming terminals; bars and units state their own.
	ShortCircuit AssemblyShortCircuit
	// protection against electric shock. Basic and fault protection. Source: IEC 61439-1 8.4 (from memory,
	// unconfirmed).
	ShockProtection ShockProtection
	// enclosure. Degrees of protection and size.
	Enclosure Enclosure
	// internal separation. Form of separation; it says nothing about arcs. Source: IEC 61439-2 Table 104.
	InternalSeparation Given[SeparationForm]
	// national type of separation. Description only and no proof. Source: common practice.
	SeparationType Given[string]
	// access. Who opens which side and how.
	Access Access
	// insulation. Distances and tests of the main circuits.
	Insulation Insulation
	// surge protection. Surge protective devices at the incoming side. Source: IEC 61643-11 (from memory,
	// unconfirmed).
	SurgeProtection SurgeProtection
	// auxiliary circuits. Control and measuring circuits.
	AuxiliaryCircuits AuxiliaryCircuits
	// socket outlets. Outlets on the board for tools and test sets. Source: IEC 60364-4-41 411.3.3 (from memory,
	// unconfirmed).
	SocketOutlets SocketOutlets
	// measures against the surroundings. What the board does against damp and dirt and animals.
	Environment Environment
	// electromagnetic environment. Environment the assembly is suited for. Source: IEC 61439-1 10.12.
	EmcEnvironment Given[EmcEnvironment]
	// seismic withstand. Level shown and how. Source: common practice.
	Seismic Given[string]
	// transport and erection. How the board comes to site.
	Transport Transport
}

// Manufacturer is what the file says of this: manufacturer.
type Manufacturer struct {
	At
	State State

	// assembly manufacturer. Who builds and takes responsibility. Source: IEC 61439-1 3.10 (from memory,
	// unconfirmed).
	Name Given[string]
	// original manufacturer. Who owns and verified the design. Source: IEC 61439-1 3.10 (from memory,
	// unconfirmed).
	Original Given[string]
	// type designation. As on the nameplate. Source: IEC 61439-1 6.1 (from memory, unconfirmed).
	TypeDesignation Given[string]
	// place of building. Works where it is assembled.
	Factory Given[string]
}

// Modification is what the file says of this: modification.
type Modification struct {
	At
	State State

	// what was changed. In one line.
	What Given[string]
	// date. When it was done.
	Date Given[Date]
	// carried out by. Who takes responsibility for the changed part.
	CarriedOutBy Given[string]
	// parts changed. Units and bars concerned.
	Of List[Given[Name]]
	// verified again. The clauses affected were verified anew. Source: IEC 61439-1 clause 10.
	ReVerified Given[bool]
	// record. Document that shows it.
	Document Given[Name]
}

// AssemblyShortCircuit is what the file says of this: short-circuit rating of the assembly.
type AssemblyShortCircuit struct {
	At
	State State

	// short-time withstand current (Icw). Of the assembly. Source: IEC 61439-1:2020 5.3.5.
	Icw ShortTimeWithstand
	// conditional short-circuit current (Icc). With the limiting device named beside it. Usual: 1 kA to 200 kA.
	// Source: IEC 61439-1:2020 5.3.6 (from memory, unconfirmed).
	Icc Given[units.Ampere]
	// limiting device. Device the conditional current holds with. Source: IEC 61439-1:2020 5.3.6 (from memory,
	// unconfirmed).
	IccWith Given[Name]
	// peak withstand current (Ipk). Peak of the first loop. Usual: 1.5 kA to 440 kA. Source: IEC 61439-1:2020
	// 5.3.4 (from memory, unconfirmed).
	Ipk Given[units.Ampere]
	// short-circuit current rating (SCCR). Marked rating in North American practice. Usual: 1 kA to 200 kA.
	// Source: NEC 110.10.
	Sccr Given[units.Ampere]
	// at voltage. Voltage of these ratings. Usual: 100 V to 1000 V. Source: common practice.
	AtVoltage Given[units.Volt]
}

// ShockProtection is what the file says of this: protection against electric shock.
type ShockProtection struct {
	At
	State State

	// class. Class I or class II. Source: IEC 61439-1 8.4.4 (from memory, unconfirmed).
	ProtectionClass Given[ShockProtectionClass]
	// doors bonded. Doors with devices have a bonding conductor. Source: IEC 61439-1 8.4.3.2 (from memory,
	// unconfirmed).
	DoorsBonded Given[bool]
	// resistance of the protective circuit. Largest value between an exposed part and the earth terminal. Usual:
	// 0.2 mΩ to 0.1 Ω. Source: IEC 61439-1 10.5.2 (from memory, unconfirmed).
	ProtectiveCircuitResistance Given[units.Ohm]
}

// Enclosure is what the file says of this: enclosure.
type Enclosure struct {
	At
	State State

	// degree of protection (IP). Of the closed board as a whole. Source: IEC 60529.
	IP Given[IPCode]
	// degree of protection at the front. Doors closed. Source: IEC 60529.
	IPFront Given[IPCode]
	// degree of protection at the sides. Both sides. Source: IEC 60529.
	IPSides Given[IPCode]
	// degree of protection at the rear. Covers fitted. Source: IEC 60529.
	IPRear Given[IPCode]
	// degree of protection at the top. Flaps and glands in place. Source: IEC 60529.
	IPTop Given[IPCode]
	// degree of protection behind the door. Door open and units in place. Source: IEC 61439-1 8.4.6.2 (from
	// memory, unconfirmed).
	IPDoorOpen Given[IPCode]
	// degree of protection after an arc flap opened. Until the flap is closed again. Source: common practice.
	IPAfterFlap Given[IPCode]
	// impact protection (IK). Of the closed board. Source: IEC 62262.
	Impact Given[IkCode]
	// enclosure type rating. North American type number. Source: UL 50E (from memory, unconfirmed).
	TypeRating Given[string]
	// height. Without base. Usual: 300 mm to 3 m. Source: common practice.
	Height Given[units.Metre]
	// width. Whole row. Usual: 300 mm to 40 m. Source: common practice.
	Width Given[units.Metre]
	// depth. Door to rear cover. Usual: 150 mm to 3 m. Source: common practice.
	Depth Given[units.Metre]
}

// Access is what the file says of this: access.
type Access struct {
	At
	State State

	// front. Doors and covers at the front.
	Front AccessSide
	// rear. None where it stands at a wall.
	Rear AccessSide
	// sides. None where nobody can reach them.
	Sides AccessSide
	// top. None where nobody can reach it.
	Top AccessSide
	// agreed access under voltage. What may be done with neighbouring parts live. Source: IEC 61439-1 8.4.6.2
	// (from memory, unconfirmed).
	UnderVoltage List[Given[AccessPurpose]]
}

// AccessSide is what the file says of this: access at one side.
type AccessSide struct {
	At
	State State

	// opens with. What it takes to open it. Source: IEC 61439-1 8.4.2.3 (from memory, unconfirmed).
	OpensWith Given[OpeningMeans]
	// opened by. Least competent persons allowed to open it. Source: IEC 61439-1 8.4.6 (from memory,
	// unconfirmed).
	By Given[Persons]
	// inner barrier. Degree of protection of the barrier behind it. Source: IEC 61439-1 8.4.2.3 (from memory,
	// unconfirmed).
	InnerBarrier Given[IPCode]
}

// Insulation is what the file says of this: insulation of the main circuits.
type Insulation struct {
	At
	State State

	// material group. Least good insulating material in the creepage paths. Source: IEC 60664-1.
	MaterialGroup Given[MaterialGroup]
	// comparative tracking index (CTI). Instead of the material group. Usual: 100 to 600. Source: IEC 60664-1.
	ComparativeTrackingIndex Given[units.Ratio]
	// clearance (d). Smallest anywhere in the main circuits. Source: IEC 61439-1 Table 1.
	Clearance Distances
	// creepage distance. Smallest anywhere in the main circuits. Source: IEC 61439-1 Table 2.
	Creepage Distances
	// isolating distance. Smallest gap of withdrawable parts in the isolated position. Usual: 3 mm to 300 mm.
	// Source: IEC 60947-1 (from memory, unconfirmed).
	IsolatingDistance Given[units.Metre]
	// kept in every position. Distances hold in each position of withdrawable parts and while they move. Source:
	// IEC 61439-2 8.5 (from memory, unconfirmed).
	InEveryPosition Given[bool]
	// counted over a covering. Some clearance relies on a covering of bars or joints. Source: IEC 60664-1.
	CountedOverCovering Given[bool]
	// power-frequency test voltage. RMS value of the design test. Usual: 1000 V to 5 kV. Source: IEC 61439-1
	// Table 8 (from memory, unconfirmed).
	PowerFrequencyTest Given[units.Volt]
	// impulse test voltage. Peak value applied; none where distances stand in for it. Usual: 1.5 kV to 30 kV.
	// Source: IEC 61439-1 Table 10 (from memory, unconfirmed).
	ImpulseTest Given[units.Volt]
	// altitude of the test place. Height above sea level of the laboratory. Usual: -20 m to 2000 m. Source: IEC
	// 61439-1 Table 10 (from memory, unconfirmed).
	ImpulseTestAltitude Given[units.Metre]
}

// Distances is what the file says of this: distances.
type Distances struct {
	At
	State State

	// phase to phase. Smallest between line conductors. Usual: 1.5 mm to 150 mm. Source: IEC 60664-1.
	PhaseToPhase Given[units.Metre]
	// phase to earth. Smallest to earthed and exposed parts. Usual: 1.5 mm to 150 mm. Source: IEC 60664-1.
	PhaseToEarth Given[units.Metre]
}

// SurgeProtection is what the file says of this: surge protection.
type SurgeProtection struct {
	At
	State State

	// type. Test class of the device. Source: IEC 61643-11 (from memory, unconfirmed).
	Kind Given[SurgeProtectionKind]
	// connected at. Bars it is connected to.
	AtField Given[Name]
	// voltage protection level (Up). With its leads where lead_length is not given. Usual: 0.5 kV to 6 kV.
	// Source: IEC 61643-11 (from memory, unconfirmed).
	VoltageProtection Given[units.Volt]
	// maximum continuous voltage (Uc). RMS between its terminals. Usual: 75 V to 1000 V. Source: IEC 60364-5-53
	// 534 (from memory, unconfirmed).
	ContinuousVoltage Given[units.Volt]
	// nominal discharge current (In). Per pole at 8/20 µs. Usual: 2 kA to 60 kA. Source: IEC 61643-11 (from
	// memory, unconfirmed).
	NominalDischargeCurrent Given[units.Ampere]
	// impulse discharge current (Iimp). Per pole at 10/350 µs. Usual: 1 kA to 50 kA. Source: IEC 61643-11 (from
	// memory, unconfirmed).
	ImpulseCurrent Given[units.Ampere]
	// short-circuit rating (ISCCR). With its back-up fuse. Source: IEC 61643-11 (from memory, unconfirmed).
	ShortCircuitRating FusedRating
	// length of leads. From the bars over the device to earth. Usual: 30 mm to 5 m. Source: IEC 60364-5-53 534
	// (from memory, unconfirmed).
	LeadLength Given[units.Metre]
	// failure shown. A failed device is indicated. Source: common practice.
	Monitored Given[bool]
}

// FusedRating is what the file says of this: short-circuit rating with a fuse.
type FusedRating struct {
	At
	State State

	// prospective current. Largest prospective current it stands with the fuse. Usual: 1 kA to 120 kA. Source:
	// IEC 61643-11 (from memory, unconfirmed).
	Current Given[units.Ampere]
	// back-up fuse. Largest fuse the rating holds with. Source: IEC 61643-11 (from memory, unconfirmed).
	WithFuse Given[string]
	// largest back-up fuse. Rated current of that fuse; none where no fuse is needed. Usual: 10 A to 630 A.
	// Source: IEC 61643-11 (from memory, unconfirmed).
	LargestFuse Given[units.Ampere]
	// fuse fitted. Rated current of the fuse ahead of it. Usual: 10 A to 1250 A. Source: common practice.
	FittedFuse Given[units.Ampere]
}

// AuxiliaryCircuits is what the file says of this: auxiliary circuits.
type AuxiliaryCircuits struct {
	At
	State State

	// voltage. Highest among them. Usual: 12 V to 400 V. Source: IEC 61439-1 5.2 (from memory, unconfirmed).
	Voltage Given[units.Volt]
	// rated insulation voltage (Ui). Lowest among them. Usual: 30 V to 1000 V. Source: IEC 61439-1 5.2.3 (from
	// memory, unconfirmed).
	RatedInsulationVoltage Given[units.Volt]
	// rated impulse withstand voltage (Uimp). Lowest among them. Usual: 0.5 kV to 12 kV. Source: IEC 61439-1
	// Annex G (from memory, unconfirmed).
	RatedImpulseWithstand Given[units.Volt]
	// fed from the main circuit. Connected to the main circuit without a transformer. Source: common practice.
	FedFromMain Given[bool]
}

// SocketOutlets is what the file says of this: socket outlets at the board.
type SocketOutlets struct {
	At
	State State

	// rated current. Of the largest outlet. Usual: 6 A to 125 A. Source: IEC 60364-4-41 411.3.3 (from memory,
	// unconfirmed).
	RatedCurrent Given[units.Ampere]
	// rated residual current (IΔn). Of the device that protects them. Usual: 5 mA to 500 mA. Source: IEC
	// 60364-4-41 411.3.3 (from memory, unconfirmed).
	ResidualCurrent Given[units.Ampere]
	// type of residual current device. Type B where converters are near. Source: common practice.
	ResidualCurrentType Given[ResidualCurrentType]
}

// Environment is what the file says of this: measures against the surroundings.
type Environment struct {
	At
	State State

	// anti-condensation heaters. Fitted in every section. Source: common practice.
	Heaters Given[bool]
	// thermostat or hygrostat. Controls the heaters. Source: common practice.
	Thermostat Given[bool]
	// drain. Water that gets in can get out. Source: common practice.
	Drain Given[bool]
	// sealed cable entry. Closed against basement and trench. Source: common practice.
	SealedCableEntry Given[bool]
	// closed to animals. Openings, vents and ducts included. Source: common practice.
	AnimalProof Given[bool]
	// dust filters. In every ventilation opening. Source: common practice.
	DustFilters Given[bool]
	// corrosion protection. Finish of metal parts and severity it was tested to. Source: IEC 61439-1 10.2.
	CorrosionProtection Given[string]
	// suited to combustible dust. Shown for the zone it stands in. Source: common practice.
	DustIgnitionSafe Given[bool]
}

// Transport is what the file says of this: transport and erection.
type Transport struct {
	At
	State State

	// transport parts. Number of parts the board is split into.
	Parts Given[int]
	// site joints verified. Bars and wiring joined on site were checked and recorded. Source: common practice.
	JointsVerified Given[bool]
	// lifting points. Marked and verified. Source: IEC 61439-1 10.2.
	LiftingPoints Given[bool]
}

// AuxiliarySupply is what the file says of this: auxiliary supply.
type AuxiliarySupply struct {
	At
	State State

	// supply of tripping. What opens the devices in a fault. Source: common practice.
	Trip Given[TripSupply]
	// supply of relays. What the protection and arc relays live on. Source: common practice.
	Relays Given[TripSupply]
	// voltage. Of the auxiliary supply. Usual: 12 V to 400 V. Source: common practice.
	Voltage Given[units.Volt]
	// autonomy. Time it lasts without the bars. Usual: 1 min to 15 h. Source: common practice.
	Autonomy Given[units.Second]
	// opening operations left. Openings possible without the bars. Source: common practice.
	OpenOperations Given[int]
	// trip coils. Per device. Source: common practice.
	TripCoils Given[int]
	// supervised. Its loss gives an alarm. Source: common practice.
	Supervised Given[bool]
	// trip circuit supervision. A broken trip circuit gives an alarm. Source: common practice.
	TripCircuitSupervision Given[bool]
}

// RoutineVerification is what the file says of this: routine verification.
type RoutineVerification struct {
	At
	State State

	// date. Of the record.
	Date Given[Date]
	// carried out by. Who signed the record.
	By Given[string]
	// record. Document that holds the results.
	Document Given[Name]
	// degree of protection. Done and passed. Source: IEC 61439-1 11.2.
	DegreeOfProtection Given[bool]
	// clearances and creepage distances. Done and passed. Source: IEC 61439-1 11.3.
	ClearancesCreepage Given[bool]
	// shock protection and protective circuits. Done and passed. Source: IEC 61439-1 11.4.
	ShockProtection Given[bool]
	// built-in components. Done and passed. Source: IEC 61439-1 11.5.
	Components Given[bool]
	// internal circuits and connections. Done and passed with torque record. Source: IEC 61439-1 11.6.
	InternalCircuits Given[bool]
	// terminals for external conductors. Done and passed. Source: IEC 61439-1 11.7.
	Terminals Given[bool]
	// mechanical operation. Done and passed with interlocks. Source: IEC 61439-1 11.8.
	MechanicalOperation Given[bool]
	// dielectric test. Done and passed. Source: IEC 61439-1 11.9.
	Dielectric Given[bool]
	// voltage of the dielectric test. RMS value applied. Usual: 500 V to 5 kV. Source: IEC 61439-1 11.9.
	DielectricVoltage Given[units.Volt]
	// insulation resistance. Smallest value measured. Usual: 0.5 MΩ to 450 MΩ. Source: IEC 61439-1 11.9.
	InsulationResistance Given[units.Ohm]
	// wiring and function. Done and passed. Source: IEC 61439-1 11.10 (from memory, unconfirmed).
	WiringFunction Given[bool]
}

// Bars is what the file says of this: bars of one conductor.
type Bars struct {
	At
	State State

	// width of a bar (d or b). Longer side of the cross-section of one bar. Usual: 10 mm to 300 mm. Source:
	// common practice.
	Width Given[units.Metre]
	// thickness of a bar. Shorter side of the cross-section of one bar. Usual: 2 mm to 25 mm. Source: common
	// practice.
	Thickness Given[units.Metre]
	// bars per phase (n). Number of parallel bars of one conductor. Source: IEC 60865-1.
	PerPhase Given[int]
	// gap between bars. Clear distance between neighbouring bars of one conductor. Usual: 2 mm to 100 mm.
	// Source: IEC 60865-1.
	Gap Given[units.Metre]
	// broad side. Orientation of the bars to the force between the phases. Source: IEC 60865-1.
	BroadSide Given[BarBroadSide]
	// arrangement of phases. Decides weight and air flow at the bars. Source: common practice.
	Phases Given[BarPhases]
	// area of one bar (q). Needed only where the bar is no plain rectangle. Usual: 20 mm2 to 6000 mm2. Source:
	// common practice.
	Area Given[units.SquareMetre]
}

// Covering is what the file says of this: covering of conductors.
type Covering struct {
	At
	State State

	// kind of covering. What lies between the conductor and a touching finger or tool. Source: IEC 61439-1
	// 8.4.2.2 (from memory, unconfirmed).
	Kind Given[CoveringKind]
	// insulation test of the covering. Standard and clause the covering was tested to as insulation. Source: IEC
	// 61439-1:2020 10.9.6 (from memory, unconfirmed).
	TestedTo Given[string]
	// covering of joints. Joints and connections between the bars. Source: common practice.
	Joints Given[CoveringJoints]
	// temperature class of the covering. Highest continuous temperature of the covering. Usual: 70 °C to 250
	// °C. Source: common practice.
	TemperatureClass Given[units.Celsius]
	// colour. Colour of the covering as it affects heat radiation and marking. Source: common practice.
	Colour Given[string]
}

// SupportStrength is what the file says of this: strength of a support.
type SupportStrength struct {
	At
	State State

	// strength (F). Load at the point where the bar rests. Usual: 0.5 kN to 100 kN. Source: IEC 60865-1.
	Value Given[units.Newton]
	// meaning of the strength. Whether the support fails at this load or may carry it. Source: common practice.
	Kind Given[StrengthKind]
	// direction of the load. Direction the strength was found for. Source: common practice.
	Direction Given[LoadDirection]
	// temperature of the strength. Temperature of the support at which the strength holds. Usual: 15 °C to 180
	// °C. Source: common practice.
	AtField Given[units.Celsius]
}

// Supports is what the file says of this: busbar supports.
type Supports struct {
	At
	State State

	// distance of the supports (l). Largest distance between neighbouring supports. Usual: 60 mm to 1.5 m.
	// Source: IEC 60865-1.
	Span Given[units.Metre]
	// number of spans. Spans of one continuous bar. Source: IEC 60865-1.
	Spans Given[int]
	// how the bar rests. Decides the factors of bending moment and support load. Source: IEC 60865-1.
	Ends Given[SupportEnds]
	// distance of the spacers (ls). Distance of the connecting pieces between parallel bars. Usual: 20 mm to 1.5
	// m. Source: IEC 60865-1.
	SpacersEvery Given[units.Metre]
	// strength of a support. As the maker of the support states it. Source: IEC 60865-1.
	Strength SupportStrength
	// highest support temperature. Highest temperature of the support in continuous service. Usual: 70 °C to
	// 250 °C. Source: common practice.
	TemperatureMax Given[units.Celsius]
}

// ConditionalRating is what the file says of this: rated conditional short-circuit current.
type ConditionalRating struct {
	At
	State State

	// conditional short-circuit current (Icc). Prospective r.m.s. current that holds only behind the limiting
	// device named. Usual: 1 kA to 150 kA. Source: IEC 61439-1:2020 5.3.6 (from memory, unconfirmed).
	Current Given[units.Ampere]
	// limiting device in this board. The device of this board that limits the current. Source: IEC 61439-1:2020
	// 5.3.6 (from memory, unconfirmed).
	Device Given[Name]
	// limiting device as tested. Make series rating and setting the rating was found with. Source: IEC
	// 61439-1:2020 5.3.6 (from memory, unconfirmed).
	DeviceTested Given[string]
}

// NeutralBars is what the file says of this: neutral bars.
type NeutralBars struct {
	At
	State State

	// bars of the neutral. Dimensions of the neutral conductor. Source: common practice.
	Bars Bars
	// rated current of the neutral. Continuous current of the neutral conductor. Usual: 16 A to 7 kA. Source:
	// IEC 60364-5-52 Annex E (from memory, unconfirmed).
	RatedCurrent Given[units.Ampere]
	// short-time withstand of the neutral. Phase to neutral; at least 60 % of the phase value unless agreed.
	// Source: IEC 61439-1 10.11.5 (from memory, unconfirmed).
	ShortTimeWithstand ShortTimeWithstand
	// peak withstand of the neutral (Ipk). Peak value phase to neutral. Usual: 1.5 kA to 330 kA. Source: IEC
	// 61439-1:2020 5.3.4 (from memory, unconfirmed).
	PeakWithstand Given[units.Ampere]
}

// ProtectiveBars is what the file says of this: protective bars.
type ProtectiveBars struct {
	At
	State State

	// bars of the protective conductor. Dimensions of the protective conductor. Source: common practice.
	Bars Bars
	// material. Material of the protective bars. Source: common practice.
	Conductor Given[ConductorMetal]
	// short-time withstand of the protective bar. Phase to protective conductor; at least 60 % of the phase
	// value unless agreed. Source: IEC 61439-1 8.4.3.2.3 (from memory, unconfirmed).
	ShortTimeWithstand ShortTimeWithstand
	// peak withstand of the protective bar (Ipk). Peak value phase to protective conductor. Usual: 1.5 kA to 330
	// kA. Source: IEC 61439-1:2020 5.3.4 (from memory, unconfirmed).
	PeakWithstand Given[units.Ampere]
}

// Relief is what the file says of this: relief of distribution bars.
type Relief struct {
	At
	State State

	// clause claimed. Clause by which the bars are rated for the let-through of the devices behind them. Source:
	// IEC 61439-1 8.6.1 (from memory, unconfirmed).
	Claimed Given[string]
	// measure against a short-circuit. Line of the conductor table that makes a fault between bars unlikely.
	// Source: IEC 61439-1 8.6.4 Table 4 (from memory, unconfirmed).
	ConductorMeasure Given[ConductorMeasure]
	// largest device behind. Rated current of the largest limiting device on these bars. Usual: 10 A to 1600 A.
	// Source: IEC 61439-1 8.6.1 (from memory, unconfirmed).
	LargestDevice Given[units.Ampere]
	// unit with the largest let-through. The unit whose device lets through most. Source: IEC 61439-1 8.6.1
	// (from memory, unconfirmed).
	LetThrough Given[Name]
}

// Busbar is what the file says of this: busbar.
type Busbar struct {
	At
	State State

	// section. Section whose main bars these are. Source: common practice.
	Section Given[Name]
	// fed from. Bars that feed these bars directly; for risers and distribution bars. Source: common practice.
	FedFrom Given[Name]
	// overload protection. Device that keeps the current of these bars within their rating. Source: IEC
	// 60364-4-43 433 (from memory, unconfirmed).
	ProtectedBy Given[Name]
	// covering. Covering of the bars and their joints. Source: IEC 61439-1 8.4.2.2 (from memory, unconfirmed).
	Covering Covering
	// material. Material of the bars. Source: common practice.
	Conductor Given[ConductorMetal]
	// temper. Designation of the bar's strength, as R250. Source: EN 13601.
	Temper Given[string]
	// surface finish. Surface of the bars at joints and plugs. Source: common practice.
	Finish Given[SurfaceFinish]
	// bars of a phase. Dimensions of one phase. Source: common practice.
	Bars Bars
	// distance of the phases (a). Distance of the centre lines of neighbouring phases. Usual: 25 mm to 500 mm.
	// Source: IEC 60865-1.
	PhaseCentres Given[units.Metre]
	// supports. How the bars are held. Source: IEC 60865-1.
	Supports Supports
	// rated current. Continuous current of the bars as built in. Usual: 63 A to 10 kA. Source: IEC 61439-1:2020
	// 5.3.2 (from memory, unconfirmed).
	RatedCurrent Given[units.Ampere]
	// rated short-time withstand current. Of these bars, not of the board as a whole. Source: IEC 61439-1:2020
	// 5.3.5.
	ShortTimeWithstand ShortTimeWithstand
	// rated peak withstand current (Ipk). Highest peak the bars withstand. Usual: 1.5 kA to 330 kA. Source: IEC
	// 61439-1:2020 5.3.4 (from memory, unconfirmed).
	PeakWithstand Given[units.Ampere]
	// conditional rating. Rating that holds only behind a limiting device. Source: IEC 61439-1:2020 5.3.6 (from
	// memory, unconfirmed).
	ConditionalRating ConditionalRating
	// neutral bars. Neutral conductor beside these bars. Source: common practice.
	Neutral NeutralBars
	// protective bars. Protective conductor beside these bars. Source: common practice.
	Protective ProtectiveBars
	// relief. Lower rating claimed behind the main bars. Source: IEC 61439-1 8.6.1 (from memory, unconfirmed).
	Relief Relief
	// highest service temperature. Highest temperature of the bars in continuous service as verified. Usual: 55
	// °C to 150 °C. Source: IEC 61439-1 10.10 (from memory, unconfirmed).
	TemperatureMax Given[units.Celsius]
}

// Shutters is what the file says of this: shutters.
type Shutters struct {
	At
	State State

	// automatic. Closed by the movement of the unit. Source: IEC 61439-2 8.3 (from memory, unconfirmed).
	Automatic Given[bool]
	// lockable. How the shutters can be padlocked. Source: EN 50110-1 6.2 (from memory, unconfirmed).
	Lockable Given[ShutterLock]
	// protection with the unit removed. Degree of protection of the closed shutters. Source: IEC 61439-2 8.3
	// (from memory, unconfirmed).
	Protection Given[IPCode]
	// sides marked. Busbar side and cable side can be told apart on the shutters. Source: common practice.
	Marked Given[bool]
}

// CutOff is what the file says of this: current limitation of a device.
type CutOff struct {
	At
	State State

	// prospective current. Prospective r.m.s. current for which the limitation is stated. Usual: 1 kA to 200 kA.
	// Source: IEC 60947-2.
	AtField Given[units.Ampere]
	// voltage of the limitation. Voltage for which the limitation is stated. Usual: 200 V to 1000 V. Source: IEC
	// 60947-2.
	AtVoltage Given[units.Volt]
	// cut-off current. Highest peak the device lets pass. Usual: 1 kA to 200 kA. Source: IEC 60947-2.
	Peak Given[units.Ampere]
	// let-through (I2t). Largest joule integral the device lets pass. Usual: 0.02 MA2s to 19 MA2s. Source: IEC
	// 60947-2.
	LetThrough Given[units.AmpereSquaredSecond]
}

// Device is what the file says of this: switching device.
type Device struct {
	At
	State State

	// kind of device. Main switching device of the unit. Source: common practice.
	Kind Given[DeviceKind]
	// type. Designation of the device by its maker. Source: common practice.
	Type Given[string]
	// rated current (In). Of the device alone; for fuses that of the link. Usual: 10 A to 6.3 kA. Source: IEC
	// 60947-1.
	RatedCurrent Given[units.Ampere]
	// rated operational voltage (Ue). Highest voltage the ratings hold for. Usual: 200 V to 1000 V. Source: IEC
	// 60947-1.
	RatedOperationalVoltage Given[units.Volt]
	// slash-rated. Rated for two voltages such as 480Y/277 and so for earthed star systems only. Source: UL 489
	// (from memory, unconfirmed).
	SlashRated Given[bool]
	// ultimate breaking capacity (Icu). R.m.s. breaking capacity for each voltage. Usual: 1 kA to 200 kA.
	// Source: IEC 60947-2.
	Icu ByVoltage[units.Ampere]
	// service breaking capacity (Ics). R.m.s. breaking capacity that leaves the device fit for service. Usual:
	// 0.5 kA to 200 kA. Source: IEC 60947-2.
	Ics ByVoltage[units.Ampere]
	// breaking capacity of one pole. Counts in unearthed and corner-earthed systems. Usual: 0.5 kA to 200 kA.
	// Source: IEC 60947-2 Annex H (from memory, unconfirmed).
	SinglePole ByVoltage[units.Ampere]
	// making capacity (Icm). Peak value the device can be closed on. Usual: 1.5 kA to 440 kA. Source: IEC
	// 60947-2 Table 2.
	Icm Given[units.Ampere]
	// short-time withstand of the device. Current a delayed device carries until it opens. Source: IEC 60947-2
	// Table 3.
	ShortTimeWithstand ShortTimeWithstand
	// conditional rating of the device. Of switches and contactors behind a limiting device. Source: IEC
	// 60947-3.
	ConditionalRating ConditionalRating
	// current limitation. Peak and joule integral the device lets pass. Source: IEC 60947-2.
	CutOff CutOff
	// utilisation category. Duty the device was tested for. Source: IEC 60947-1.
	UtilisationCategory Given[UtilisationCategory]
	// isolating function. Whether the open device counts as isolation. Source: IEC 60947-1.
	Isolating Given[IsolatingFunction]
	// built-in override. Current above which the device opens at once to save itself; a release may have its
	// own. Usual: 1 kA to 200 kA. Source: common practice.
	Override Given[units.Ampere]
	// highest air temperature at the device. Air around the device up to which its rating or electronics hold.
	// Usual: 30 °C to 90 °C. Source: IEC 60947-1.
	AmbientMax Given[units.Celsius]
}

// Plug is what the file says of this: plug contacts of a unit.
type Plug struct {
	At
	State State

	// covering. Covering of the plug between bars and device. Source: common practice.
	Covering Given[CoveringKind]
	// one insulated whole. Bars plug and outgoing side are enclosed phase by phase without a gap. Source: common
	// practice.
	OneInsulatedWhole Given[bool]
	// insulation test of the plug. Standard and clause the covering was tested to as insulation. Source: IEC
	// 61439-1:2020 10.9.6 (from memory, unconfirmed).
	TestedTo Given[string]
	// kind of contacts. How the moving contact grips. Source: common practice.
	Contacts Given[PlugContacts]
	// plating of the contacts. Surface of the contacts. Source: common practice.
	Finish Given[SurfaceFinish]
	// fingers per phase (n). Contact points in parallel of one phase. Source: common practice.
	Fingers Given[int]
	// spring force of a finger. Of a new contact. Usual: 5 N to 500 N. Source: common practice.
	ForcePerFinger Given[units.Newton]
	// force left when worn. Share of the spring force at the end of life and in heat. Usual: 40 % to 100 %.
	// Source: common practice.
	ForceLeft Given[units.Percentage]
	// length of a finger. Length over which opposed fingers attract each other. Usual: 5 mm to 300 mm. Source:
	// common practice.
	FingerLength Given[units.Metre]
	// distance of opposed fingers. Between the centre lines of two opposed fingers. Usual: 2 mm to 150 mm.
	// Source: common practice.
	FingerSpacing Given[units.Metre]
	// hardness of the contact (H). Contact hardness of the softer metal. Usual: 200 MPa to 1500 MPa. Source:
	// common practice.
	Hardness Given[units.Pascal]
	// locked against ejection. The unit is held in place against the force of a fault. Source: common practice.
	LockedAgainstEjection Given[bool]
}

// Load is what the file says of this: load of a unit.
type Load struct {
	At
	State State

	// motor power. Rated shaft power. Usual: 1 kW to 900 kW. Source: common practice.
	Motor Given[units.Watt]
	// load current. Largest continuous current of the load. Usual: 5 A to 4 kA. Source: common practice.
	Current Given[units.Ampere]
	// starting current. Locked-rotor current by rated current of the motor. Usual: 1.5 x to 10 x. Source: IEC
	// 60909-0.
	Starting Given[units.Multiple]
	// starting time. Time until the motor runs. Usual: 0.2 s to 60 s. Source: common practice.
	StartingTime Given[units.Second]
	// efficiency. At rated power. Usual: 70 % to 98 %. Source: common practice.
	Efficiency Given[units.Percentage]
	// power factor (cos phi). At rated power. Usual: 0.5 to 1. Source: common practice.
	PowerFactor Given[units.Ratio]
	// fed through. Decides whether the motor feeds a fault and what the source of the load is. Source: IEC
	// 60909-0.
	FedThrough Given[FedThrough]
	// continuous load. Runs for hours and together with the others. Source: IEC 61439-2 Table 101.
	Continuous Given[bool]
	// third harmonic of the load. Share of the third harmonic in the phase current. Usual: 0.5 % to 80 %.
	// Source: IEC 60364-5-52 Annex E (from memory, unconfirmed).
	ThirdHarmonic Given[units.Percentage]
	// discharge time. Until stored energy of the load or converter is gone. Usual: 5 s to 20 min. Source: common
	// practice.
	DischargeTime Given[units.Second]
}

// UnitCables is what the file says of this: cables of a unit.
type UnitCables struct {
	At
	State State

	// cable entry. Sides cables can enter from. Source: common practice.
	Entry List[Given[CableEntry]]
	// conductor. Material of the cable conductors. Source: common practice.
	Conductor Given[ConductorMetal]
	// insulation. Insulation of the cables. Source: common practice.
	Insulation Given[CableInsulation]
	// area of a conductor (S). Cross-section of one phase conductor. Usual: 1.5 mm2 to 1000 mm2. Source: common
	// practice.
	Area Given[units.SquareMetre]
	// conductors in parallel. Cables per phase. Source: common practice.
	InParallel Given[int]
	// single-core cables. Single cores heat a closed steel plate. Source: common practice.
	SingleCore Given[bool]
	// largest conductor the terminal takes. Cross-section the terminals are verified for. Usual: 2.5 mm2 to 1000
	// mm2. Source: IEC 61439-1 8.8 (from memory, unconfirmed).
	LargestArea Given[units.SquareMetre]
	// highest conductor temperature. Continuous temperature the cable may have at the terminal. Usual: 60 °C to
	// 110 °C. Source: IEC 61439-1 Table 6.
	ConductorTemperature Given[units.Celsius]
	// gland plate. Whether a plate can be taken out for one circuit. Source: common practice.
	GlandPlate Given[GlandPlate]
	// material of the gland plate. Round single cores it must not be closed steel. Source: common practice.
	GlandPlateMaterial Given[GlandPlateMaterial]
	// protection at the entry. Degree of protection with the cables in. Source: IEC 60529.
	EntryProtection Given[IPCode]
	// distance from plate to terminal. Room to bend and fasten the cables. Usual: 50 mm to 2 m. Source: common
	// practice.
	PlateToTerminal Given[units.Metre]
	// bending radius possible. Largest bending radius the space allows. Usual: 30 mm to 1.2 m. Source: common
	// practice.
	BendRadius Given[units.Metre]
	// cleats tested to. Peak current the cable cleats withstood. Usual: 1.5 kA to 330 kA. Source: IEC 61914.
	CleatsTestedTo Given[units.Ampere]
	// spare space. Room left for later cables. Usual: 5 % to 100 %. Source: common practice.
	SpareSpace Given[units.Percentage]
}

// Unit is what the file says of this: unit.
type Unit struct {
	At
	State State

	// duty. What the unit is there for. Source: common practice.
	Duty Given[UnitDuty]
	// source. Source that an incomer brings in. Source: common practice.
	Connects Given[Name]
	// section fed. Section that an incomer feeds. Source: common practice.
	To Given[Name]
	// sections coupled. The two sections a coupler joins; the first one is its line side. Source: common
	// practice.
	Between List[Given[Name]]
	// bars. Bars the unit is connected to. Source: common practice.
	On Given[Name]
	// place in the board. Cubicle and height as on the front view. Source: common practice.
	PlaceField Given[string]
	// poles. Phases and neutral in the unit. Source: common practice.
	Poles Given[UnitPoles]
	// mounting. How the unit can be taken out. Source: IEC 61439-2.
	Mounting Given[UnitMounting]
	// positions. Positions a withdrawable unit has. Source: IEC 61439-2 Table 103 (from memory, unconfirmed).
	Positions List[Given[UnitPosition]]
	// position shown. Each position can be seen from outside. Source: IEC 61439-2 8.5 (from memory,
	// unconfirmed).
	PositionShown Given[bool]
	// interlocks. Interlocks that are there and tested. Source: IEC 61439-2 8.5 (from memory, unconfirmed).
	Interlocks List[Given[UnitInterlock]]
	// shutters. Cover the fixed contacts when the unit is out. Source: IEC 61439-2 8.3 (from memory,
	// unconfirmed).
	Shutters Shutters
	// device. Main switching device. Source: common practice.
	Device Device
	// contactor or second device. Switching device in series with the main device. Source: IEC 60947-4-1.
	Contactor Device
	// settings. Protection that trips the device. Source: common practice.
	Settings Given[Name]
	// settings in generator supply. Protection in force while only generators feed. Source: common practice.
	SettingsOnGenerator Given[Name]
	// backed up by. Upstream device that helps to break in a tested combination. Source: IEC 60947-2 Annex A
	// (from memory, unconfirmed).
	BackedUpBy Given[Name]
	// breaking capacity backed up. R.m.s. current the tested combination breaks. Usual: 1 kA to 200 kA. Source:
	// IEC 60947-2 Annex A (from memory, unconfirmed).
	BackedUpTo ByVoltage[units.Ampere]
	// plug contacts. Contacts between bars and a withdrawable unit. Source: common practice.
	Plug Plug
	// barrier round the line terminals. Decides whether an arc in the unit reaches its line side. Source: IEEE
	// 1584-2018 (from memory, unconfirmed).
	LineTerminals Given[TerminalBarrier]
	// load. What the unit feeds. Source: common practice.
	Load Load
	// rated current of the circuit (Inc). Of the unit alone in the board and not of its device. Usual: 8 A to
	// 6.3 kA. Source: IEC 61439-1:2020 5.3.2 (from memory, unconfirmed).
	RatedCurrentInBoard Given[units.Ampere]
	// group rated current (Ing). With the neighbouring circuits loaded as well. Usual: 8 A to 6.3 kA. Source:
	// IEC 61439-1:2020 5.3.3 (from memory, unconfirmed).
	GroupRatedCurrent Given[units.Ampere]
	// air at the device. Air inside the unit in full load as measured or declared. Usual: 20 °C to 90 °C.
	// Source: IEC 61439-1 10.10 (from memory, unconfirmed).
	AirAtDevice Given[units.Celsius]
	// short-time withstand of the circuit. Of the conductors of the unit. Source: IEC 61439-1:2020 5.3.5.
	ShortTimeWithstand ShortTimeWithstand
	// peak withstand of the circuit (Ipk). Highest peak the conductors of the unit withstand. Usual: 1.5 kA to
	// 330 kA. Source: IEC 61439-1:2020 5.3.4 (from memory, unconfirmed).
	PeakWithstand Given[units.Ampere]
	// conditional rating. Rating of the unit behind its limiting device. Source: IEC 61439-1:2020 5.3.6 (from
	// memory, unconfirmed).
	ConditionalRating ConditionalRating
	// rated insulation voltage of the circuit (Ui). Where it differs from the board. Usual: 250 V to 1500 V.
	// Source: IEC 61439-1 5.2.3 (from memory, unconfirmed).
	RatedInsulationVoltage Given[units.Volt]
	// impulse withstand of the circuit (Uimp). Where it differs from the board. Usual: 2.5 kV to 12 kV. Source:
	// IEC 61439-1 5.2.4 (from memory, unconfirmed).
	RatedImpulseWithstand Given[units.Volt]
	// impulse across the isolating gap. Test voltage the open isolating gap withstood. Usual: 3 kV to 20 kV.
	// Source: IEC 60947-1 Table 14 (from memory, unconfirmed).
	IsolatingGapImpulse Given[units.Volt]
	// coordination. State of the starter after a short-circuit. Source: IEC 60947-4-1 (from memory,
	// unconfirmed).
	Coordination Given[StarterCoordination]
	// current of the coordination (Iq). Prospective current the coordination was tested at. Usual: 1 kA to 200
	// kA. Source: IEC 60947-4-1 (from memory, unconfirmed).
	CoordinationCurrent ByVoltage[units.Ampere]
	// residual current protection (IΔn). Rated residual current for sockets and tools. Usual: 10 mA to 5 A.
	// Source: IEC 60364-4-41 411.3.3 (from memory, unconfirmed).
	ResidualCurrent Given[units.Ampere]
	// type of residual current device. Type B where converters are near. Source: common practice.
	ResidualCurrentType Given[ResidualCurrentType]
	// terminals. Cover of the outgoing terminals. Source: IEC 61439-1 8.4.2 (from memory, unconfirmed).
	Terminals Given[TerminalShrouding]
	// cables. Entry and fastening of the cables. Source: common practice.
	Cables UnitCables
	// parts live with the incomers open. What in the unit stays live and from where. Source: common practice.
	LiveWhenIncomerOpen Given[string]
}

// TapProtection is what the file says of this: protection of a tap-off.
type TapProtection struct {
	At
	State State

	// kind. Device at the end of the unprotected length. Source: common practice.
	Kind Given[TapProtectionKind]
	// rated current. Rated current of the fuse or breaker. Usual: 0.5 A to 250 A. Source: common practice.
	RatedCurrent Given[units.Ampere]
	// class. Class of the fuse-link. Source: IEC 60269-1.
	Class Given[FuseClass]
	// breaking capacity. R.m.s. breaking capacity for each voltage. Usual: 1 kA to 300 kA. Source: IEC 60269-1.
	Breaking ByVoltage[units.Ampere]
}

// Tap is what the file says of this: tap-off.
type Tap struct {
	At
	State State

	// use. What the tap-off feeds. Source: common practice.
	Use Given[TapUse]
	// connected to. Bars or unit that the conductors start from. Source: common practice.
	On Given[Name]
	// side. Side of the unit they start from. Source: common practice.
	Side Given[DeviceSide]
	// unprotected length. From the bars to the protection. Usual: 50 mm to 5 m. Source: IEC 61439-1 8.6.4 (from
	// memory, unconfirmed).
	Length Given[units.Metre]
	// conductor. Material of the conductors. Source: common practice.
	Conductor Given[ConductorMetal]
	// area of a conductor (S). Cross-section of the unprotected conductors. Usual: 0.75 mm2 to 300 mm2. Source:
	// common practice.
	Area Given[units.SquareMetre]
	// measure against a short-circuit. Line of the conductor table that makes a fault unlikely. Source: IEC
	// 61439-1 8.6.4 Table 4 (from memory, unconfirmed).
	ConductorMeasure Given[ConductorMeasure]
	// protection. Fuse or breaker of the tap-off. Source: IEC 61439-1 8.6.4 (from memory, unconfirmed).
	ProtectedBy TapProtection
	// own isolation. Can be isolated without opening the bars. Source: common practice.
	Isolating Given[bool]
	// live with the incomers open. Stays live when all incomers are open. Source: common practice.
	LiveWhenIncomerOpen Given[bool]
	// remark. What the other words do not say. Source: common practice.
	Remark Given[string]
}

// LongTime is what the file says of this: long-time function.
type LongTime struct {
	At
	State State

	// long-time pickup (Ir). Current above which it starts. Usual: 8 A to 6.3 kA. Source: IEC 60947-2.
	Pickup Given[units.Ampere]
	// long-time delay (tr). Delay at the multiple beside it. Usual: 0.5 s to 400 s. Source: common practice.
	Delay Given[units.Second]
	// multiple of the delay. Multiple at which the delay is stated. Usual: 1.5 x to 10 x. Source: common
	// practice.
	AtField Given[units.Multiple]
	// the multiple is one of. Pickup or rated current. Source: common practice.
	AtOf Given[MultipleOf]
	// tolerance of the pickup. Plus and minus. Usual: 1 % to 30 %. Source: common practice.
	Tolerance Given[units.Percentage]
	// tolerance of the delay. Plus and minus. Usual: 1 % to 40 %. Source: common practice.
	TimeTolerance Given[units.Percentage]
}

// ShortTime is what the file says of this: short-time function.
type ShortTime struct {
	At
	State State

	// short-time pickup (Isd). Current above which it starts. Usual: 40 A to 35 kA. Source: IEC 60947-2.
	Pickup Given[units.Ampere]
	// short-time delay (tsd). Set delay without break time. Usual: 10 ms to 1 s. Source: common practice.
	Delay Given[units.Second]
	// sloping part. On while the delay falls with the current. Source: common practice.
	I2t Given[I2tRamp]
	// tolerance of the pickup. Plus and minus. Usual: 1 % to 30 %. Source: IEC 60947-2 (from memory,
	// unconfirmed).
	Tolerance Given[units.Percentage]
	// tolerance of the delay. Added to the delay at the slow edge. Usual: 1 ms to 200 ms. Source: common
	// practice.
	DelayTolerance Given[units.Second]
}

// Instantaneous is what the file says of this: instantaneous function.
type Instantaneous struct {
	At
	State State

	// instantaneous pickup (Ii). Current above which it trips without delay. Usual: 40 A to 35 kA. Source: IEC
	// 60947-2.
	Pickup Given[units.Ampere]
	// tolerance of the pickup. Plus and minus. Usual: 1 % to 40 %. Source: IEC 60947-2 8.3.3.1.2 (from memory,
	// unconfirmed).
	Tolerance Given[units.Percentage]
}

// Override is what the file says of this: override of a release.
type Override struct {
	At
	State State

	// override pickup. Fixed current above which the release trips whatever is set. Usual: 0.5 kA to 200 kA.
	// Source: common practice.
	Pickup Given[units.Ampere]
	// tolerance of the override. Plus and minus. Usual: 1 % to 40 %. Source: common practice.
	Tolerance Given[units.Percentage]
}

// EarthFault is what the file says of this: earth-fault function.
type EarthFault struct {
	At
	State State

	// method. How the earth-fault current is measured. Source: common practice.
	Method Given[EarthFaultMethod]
	// earth-fault pickup (Ig). Current above which it starts. Usual: 5 A to 3 kA. Source: NEC 230.95.
	Pickup Given[units.Ampere]
	// earth-fault delay (tg). Set delay without break time. Usual: 10 ms to 5 s. Source: NEC 230.95.
	Delay Given[units.Second]
	// tolerance of the pickup. Plus and minus. Usual: 1 % to 30 %. Source: common practice.
	Tolerance Given[units.Percentage]
	// acts on. Devices it trips besides its own. Source: common practice.
	ActsOn List[Given[Name]]
}

// MaintenanceSetting is what the file says of this: maintenance setting.
type MaintenanceSetting struct {
	At
	State State

	// pickup while switched on. Instantaneous pickup while persons work. Usual: 40 A to 35 kA. Source: NEC
	// 240.87.
	Instantaneous Given[units.Ampere]
	// break time while switched on. Largest total time at and above the pickup. Usual: 2 ms to 300 ms. Source:
	// common practice.
	BreakTime Given[units.Second]
	// tolerance of the pickup. Plus and minus. Usual: 1 % to 40 %. Source: common practice.
	Tolerance Given[units.Percentage]
	// indication. Where it is shown that the setting is on. Source: NEC 240.87.
	Indication Given[SettingIndication]
	// switched remotely. Can be switched on without standing at the board. Source: common practice.
	Remote Given[bool]
	// returns by itself. Goes back to the normal setting by itself. Source: common practice.
	AutoReturn Given[bool]
}

// CurrentTransformer is what the file says of this: current transformer.
type CurrentTransformer struct {
	At
	State State

	// rated primary current. First figure of the ratio. Usual: 10 A to 6.3 kA. Source: IEC 61869-2.
	Primary Given[units.Ampere]
	// rated secondary current. Second figure of the ratio. Usual: 0.5 A to 5 A. Source: IEC 61869-2.
	Secondary Given[units.Ampere]
	// accuracy class. Class with accuracy limit factor. Source: IEC 61869-2.
	Class Given[string]
	// rated burden. Burden the class holds for. Usual: 0.2 VA to 60 VA. Source: IEC 61869-2.
	Burden Given[units.VoltAmpere]
	// burden connected. Relay and leads at rated secondary current. Usual: 0.05 VA to 40 VA. Source: common
	// practice.
	BurdenConnected Given[units.VoltAmpere]
	// current error. Largest error up to the accuracy limit. Usual: 0.2 % to 10 %. Source: common practice.
	Error Given[units.Percentage]
}

// ZoneInterlock is what the file says of this: zone interlock.
type ZoneInterlock struct {
	At
	State State

	// blocked by. Downstream protection that sends the blocking signal. Source: NEC 240.87.
	With List[Given[Name]]
	// time without blocking. Largest delay while no blocking signal comes. Usual: 5 ms to 200 ms. Source: common
	// practice.
	Undelayed Given[units.Second]
	// also for earth faults. Works for the earth-fault function as well. Source: common practice.
	EarthFaultToo Given[bool]
	// at a broken wire. What the upstream device does without the wire. Source: common practice.
	WireBreak Given[InterlockFailure]
	// tested. Month of the last test in place. Source: NEC 240.87(C) (from memory, unconfirmed).
	Tested Given[Date]
}

// ProtectiveDevice is what the file says of this: protective device.
type ProtectiveDevice struct {
	At
	State State

	// kind. What measures and trips. Source: common practice.
	Kind Given[ProtectiveDeviceKind]
	// type. Designation by its maker. Source: common practice.
	Type Given[string]
	// rated current (In). Of the sensor or of the fuse-link. Usual: 8 A to 6.3 kA. Source: common practice.
	RatedCurrent Given[units.Ampere]
	// class of the fuse-link. With the rated current it gives the gates of the curve. Source: IEC 60269-1.
	Class Given[FuseClass]
	// points of the curve. Current and longest total time in falling order of time. Source: common practice.
	Points Pairs[units.Ampere, units.Second]
	// shape of the curve. Of a relay. Source: IEC 60255-151.
	Curve Given[InverseCurve]
	// relay pickup (Is). Primary current above which the relay starts. Usual: 5 A to 4 kA. Source: IEC
	// 60255-151.
	Pickup Given[units.Ampere]
	// time multiplier (TMS). Setting that multiplies the time of the curve. Usual: 0.05 to 10. Source: IEC
	// 60255-151.
	TimeMultiplier Given[units.Ratio]
	// definite delay. Delay of the definite-time curve. Usual: 10 ms to 5 s. Source: common practice.
	Delay Given[units.Second]
	// tolerance of the pickup. Plus and minus and without the transformer error. Usual: 1 % to 30 %. Source:
	// common practice.
	Tolerance Given[units.Percentage]
	// tolerance of the time. Plus and minus. Usual: 1 % to 30 %. Source: IEC 60255-151 (from memory,
	// unconfirmed).
	TimeTolerance Given[units.Percentage]
	// smallest tolerance of the time. Counts where it is more than the percentage. Usual: 1 ms to 200 ms.
	// Source: common practice.
	TimeToleranceAtLeast Given[units.Second]
	// voltage of the currents. Voltage level the currents are stated for. Usual: 200 V to 36 kV. Source: common
	// practice.
	AtVoltage Given[units.Volt]
	// break time. Largest opening and arcing time of the breaker it trips. Usual: 2 ms to 200 ms. Source: IEC
	// 62271-100; IEC 60947-2 (from memory, unconfirmed).
	BreakTime Given[units.Second]
	// curve includes the break time. Published times are total clearing times. Source: common practice.
	CurveIncludesBreakTime Given[bool]
	// long-time function. Overload part of a release. Source: IEC 60947-2.
	LongTime LongTime
	// short-time function. Delayed short-circuit part of a release. Source: IEC 60947-2.
	ShortTime ShortTime
	// instantaneous function. Undelayed short-circuit part. Source: IEC 60947-2.
	Instantaneous Instantaneous
	// override. Fixed level of the release beside the settings. Source: common practice.
	Override Override
	// earth-fault function. Part for faults to earth. Source: IEC 60364-4-41; NEC 230.95.
	EarthFault EarthFault
	// neutral pole setting. Share of the phase setting for the neutral pole. Usual: 40 % to 200 %. Source:
	// common practice.
	NeutralSetting Given[units.Percentage]
	// voltage-restrained. Pickup falls with the voltage of a generator. Source: common practice.
	VoltageRestrained Given[bool]
	// differential protection. Trips on the difference round the bars. Source: NEC 240.87.
	Differential Given[bool]
	// undervoltage delay. Delay of the undervoltage trip. Usual: 50 ms to 20 s. Source: common practice.
	UndervoltageDelay Given[units.Second]
	// maintenance setting. Quicker setting while persons work. Source: NEC 240.87.
	MaintenanceSetting MaintenanceSetting
	// zone interlock. Blocking by downstream protection. Source: NEC 240.87.
	ZoneInterlock ZoneInterlock
	// supply of the trip. Where the energy for tripping comes from. Source: common practice.
	Supply Given[TripSupply]
	// supply and trip circuit supervised. Loss of supply or a broken trip circuit gives an alarm. Source: common
	// practice.
	Supervised Given[bool]
	// current transformer. Transformer that feeds the relay. Source: IEC 61869-2.
	CurrentTransformer CurrentTransformer
	// source of the settings. Study or sheet as left. Source: NFPA 70E 130.5 (from memory, unconfirmed).
	SettingsSource Given[SettingsSource]
	// date of the settings. Day they were left or proposed. Source: common practice.
	SettingsDate Given[Date]
	// protection tested. Month of the last injection test. Source: common practice.
	Tested Given[Date]
}

// Containment is what the file says of this: arc containment.
type Containment struct {
	At
	State State

	// class. A B or C protect persons; I alone protects nobody outside its zones. Source: IEC TR 61641:2014.
	Class Given[ArcClass]
	// ignition-protected zones. Parts with all live conductors insulated one by one. Source: IEC TR 61641:2014.
	IgnitionProtected List[Given[Name]]
	// criteria met. Criteria the test report confirms. Source: IEC TR 61641:2014.
	Criteria List[Given[ArcCriterion]]
	// permissible current under arcing (Ip arc). Prospective r.m.s. current of the test and never the arc's own
	// current. Usual: 1 kA to 150 kA. Source: IEC TR 61641:2014.
	PermissibleCurrent Given[units.Ampere]
	// permissible arc duration (t arc). Time the arc may burn. Usual: 20 ms to 1 s. Source: IEC TR 61641:2014.
	PermissibleDuration Given[units.Second]
	// conditional current under arcing (Ipc arc). Holds only with the limiting device and settings named.
	// Source: IEC TR 61641:2014.
	Conditional ConditionalRating
	// depends on. Means without which the containment does not hold. Source: IEC TR 61641:2014.
	DependsOn List[Given[ArcMeans]]
	// test voltage. Voltage of the arc test. Usual: 200 V to 1000 V. Source: IEC TR 61641:2014.
	AtVoltage Given[units.Volt]
	// test frequency. Frequency of the arc test. Usual: 50 Hz to 60 Hz. Source: IEC TR 61641:2014.
	AtFrequency Given[units.Hertz]
	// sides protected. Sides persons may stand at. Source: IEC TR 61641:2014.
	Sides List[Given[ArcSide]]
	// persons protected. Level of access the test was made for. Source: IEC TR 61641:2014.
	Persons Given[Persons]
	// compartments tested. Compartments the arc was lit in. Source: IEC TR 61641:2014.
	Compartments Given[string]
	// covers racking behind closed doors. The report covers moving a unit behind the secured door. Source: IEC
	// TR 61641:2014 (from memory, unconfirmed).
	ClosedDoorRacking Given[bool]
	// clearance to the ceiling in the test. Distance from the top of the board. Usual: 50 mm to 5 m. Source: IEC
	// TR 61641:2014.
	CeilingClearance Given[units.Metre]
	// clearance to the rear wall in the test. Distance from the rear of the board. Usual: 10 mm to 3 m. Source:
	// IEC TR 61641:2014.
	RearClearance Given[units.Metre]
	// accessibility type. North American practice. Source: IEEE C37.20.7.
	AccessibilityType Given[ArcResistantType]
	// suffixes. North American practice. Source: IEEE C37.20.7.
	Suffixes List[Given[ArcResistantSuffix]]
}

// Exhaust is what the file says of this: exhaust of arc gases.
type Exhaust struct {
	At
	State State

	// kind. Way of the gases out of the board. Source: IEC TR 61641:2014.
	Kind Given[ExhaustKind]
	// leaves the board at. Sides the gases leave the board at. Source: IEC TR 61641:2014.
	LeavesAt List[Given[ArcSide]]
	// ends. Where the gases come out at last. Source: IEC TR 61641:2014.
	Ends Given[ExhaustEnd]
	// as tested. Exhaust on site is like the one of the test. Source: IEC TR 61641:2014.
	AsTested Given[bool]
	// clearance to the ceiling on site. Distance from the top of the board as built. Usual: 50 mm to 5 m.
	// Source: IEC TR 61641:2014.
	CeilingClearance Given[units.Metre]
	// clearance to the rear wall on site. Distance from the rear of the board as built. Usual: 10 mm to 3 m.
	// Source: IEC TR 61641:2014.
	RearClearance Given[units.Metre]
	// aisle to the opposite row. Distance to a row of boards that faces this one. Usual: 600 mm to 6 m. Source:
	// common practice.
	Aisle Given[units.Metre]
	// pressure relief of the room. The room can bear or relieve the overpressure. Source: common practice.
	RoomRelief Given[bool]
	// protection with the flaps closed. Degree of protection after the flaps closed again. Source: IEC 60529.
	ProtectionAfterClosing Given[IPCode]
}

// Detection is what the file says of this: arc detection.
type Detection struct {
	At
	State State

	// kind. What it measures. Source: IEC 60947-9-2.
	Kind Given[DetectionKind]
	// detection time. From light to the output of the relay. Usual: 0.5 ms to 20 ms. Source: common practice.
	Time Given[units.Second]
	// current that confirms. Primary current that must flow as well. Usual: 50 A to 20 kA. Source: IEC
	// 60947-9-2.
	CurrentPickup Given[units.Ampere]
	// self-supervised. Sensors and relay watch themselves and alarm. Source: common practice.
	SelfSupervised Given[bool]
	// trip circuits supervised. Each trip circuit is watched and alarms. Source: common practice.
	TripCircuitSupervised Given[bool]
	// supply. Where the energy comes from. Source: common practice.
	Supply Given[TripSupply]
	// breaker failure time. Extra time until the upstream devices are tripped. Usual: 50 ms to 500 ms. Source:
	// common practice.
	BreakerFailureTime Given[units.Second]
	// breaker failure acts on. Upstream devices tripped when a breaker fails. Source: common practice.
	BreakerFailureActsOn List[Given[Name]]
	// light test. Month of the last test by light in place. Source: common practice.
	Tested Given[Date]
	// months between light tests. Interval of the plan in months. Source: common practice.
	TestInterval Given[int]
	// integration tested. Detection and breakers were tested together in this design. Source: IEC TS 63107.
	TestedInBoard Given[bool]
	// out-of-service procedure. Instruction for the time detection is off. Source: common practice.
	OutOfServiceProcedure Given[string]
	// lock-out after a trip. Nothing closes again before a reset by hand. Source: common practice.
	LockOut Given[bool]
}

// ArcZone is what the file says of this: detection zone.
type ArcZone struct {
	At
	State State

	// covers. Parts whose arcs the sensors of the zone see. Source: common practice.
	Covers List[Given[Name]]
	// side. Side of the units covered; left out if both. Source: common practice.
	Side Given[DeviceSide]
	// acts on. Every device that the zone trips. Source: common practice.
	ActsOn List[Given[Name]]
	// total time. From the start of the arc until the slowest breaker has cleared. Usual: 2 ms to 500 ms.
	// Source: common practice.
	TotalTime Given[units.Second]
	// total time contains. Parts of the time that are in it. Source: common practice.
	TotalTimeContains List[Given[TimePart]]
	// sensors. Light sensors of the zone. Source: common practice.
	Sensors Given[int]
	// quenched. The quenching device acts for this zone. Source: IEC 60947-9-1.
	Quenched Given[bool]
}

// Quenching is what the file says of this: quenching device.
type Quenching struct {
	At
	State State

	// kind. Whether it can be used again. Source: IEC 60947-9-1:2019.
	Kind Given[QuenchingKind]
	// quenching time. From light until the arc is out. Usual: 0.5 ms to 20 ms. Source: IEC 60947-9-1:2019.
	Time Given[units.Second]
	// short-time withstand. Current it carries until upstream devices have cleared. Source: IEC 60947-9-1:2019.
	ShortTimeWithstand ShortTimeWithstand
	// peak current. Highest peak it makes and carries. Usual: 1.5 kA to 330 kA. Source: IEC 60947-9-1:2019.
	PeakWithstand Given[units.Ampere]
	// rated operational voltage (Ue). Voltage its ratings hold for. Usual: 200 V to 1000 V. Source: IEC
	// 60947-9-1:2019.
	AtVoltage Given[units.Volt]
	// sections with a device. Sections that have a quenching device of their own. Source: common practice.
	Sections List[Given[Name]]
	// trips. Devices that clear the fault it makes. Source: IEC 60947-9-1:2019.
	ActsOn List[Given[Name]]
	// lock-out. Upstream devices cannot be closed on the device that has acted. Source: IEC 60947-9-1:2019.
	LockOut Given[bool]
	// disabled state shown. Shown when it is disabled or used. Source: IEC 60947-9-1:2019.
	DisabledShown Given[bool]
	// stored energy safe. Its charge can be made safe before work. Source: IEC 60947-9-1:2019.
	StoredEnergySafe Given[bool]
}

// Arc is what the file says of this: internal arc.
type Arc struct {
	At
	State State

	// containment. What the board keeps in when closed. Source: IEC TR 61641:2014.
	Containment Containment
	// exhaust. Way of the gases. Source: IEC TR 61641:2014.
	Exhaust Exhaust
	// detection. Sensors and relay that trip breakers. Source: IEC 60947-9-2.
	Detection Detection
	// detection zones. Zones with the devices each of them trips. Source: common practice.
	Zones Named[ArcZone]
	// quenching device. Device that takes over the arc current. Source: IEC 60947-9-1.
	Quenching Quenching
}

// Location is what the file says of this: place of work.
type Location struct {
	At
	State State

	// at. Unit bars or tap-off that the arc is assumed at. Source: common practice.
	AtField Given[Name]
	// side. Side of the unit. Source: IEEE 1584-2018 (from memory, unconfirmed).
	Side Given[DeviceSide]
	// electrode arrangements. Only to say more than the construction does; the worst counts. Source: IEEE
	// 1584-2018.
	Electrodes List[Given[ElectrodeArrangement]]
	// reason for the electrodes. Needed where fewer are named than the construction admits. Source: common
	// practice.
	ElectrodesReason Given[string]
	// gap (G). Distance of the conductors the arc bridges. Usual: 6.35 mm to 254 mm. Source: IEEE 1584-2018 4.2.
	Gap Given[units.Metre]
	// working distance (D). From the arc to face and chest. Usual: 300 mm to 2 m. Source: IEEE 1584-2018 4.2.
	Distance Given[units.Metre]
	// reason for the distance. Needed where it is more than 610 mm or the typical one. Source: common practice.
	DistanceReason Given[string]
	// height of the compartment. Inside height around the arc. Usual: 100 mm to 2.5 m. Source: IEEE 1584-2018
	// Tables 8 to 10.
	EnclosureHeight Given[units.Metre]
	// width of the compartment. Inside width around the arc. Usual: 100 mm to 2.5 m. Source: IEEE 1584-2018
	// Tables 8 to 10.
	EnclosureWidth Given[units.Metre]
	// depth of the compartment. Inside depth around the arc. Usual: 50 mm to 2.5 m. Source: IEEE 1584-2018
	// Tables 8 to 10.
	EnclosureDepth Given[units.Metre]
	// surroundings (kT). Gives the transmission factor of the box-test method. Source: DGUV Information 203-077.
	Surroundings Given[ArcRoom]
	// arc current factor (kB). Arc current by smallest fault current in the box-test method. Usual: 0.3 to 1.
	// Source: DGUV Information 203-077.
	ArcCurrentFactor Given[units.Ratio]
	// arc power factor (kP). Arc power by short-circuit power in the box-test method. Usual: 0.1 to 0.5. Source:
	// DGUV Information 203-077.
	ArcPowerFactor Given[units.Ratio]
	// way out. The limit of 2 s holds only where it is free. Source: IEEE 1584-2018 6.9.1 (from memory,
	// unconfirmed).
	Escape Given[Escape]
	// cleared only by. Restricts the devices found on the way to the sources. Source: common practice.
	ClearedBy List[Given[Name]]
	// other persons. How others are kept outside the boundary. Source: NFPA 70E 130.4.
	Others Given[OthersKeptOut]
}

// ArcRating is what the file says of this: arc rating.
type ArcRating struct {
	At
	State State

	// arc rating. Lowest rating in the whole ensemble. Usual: 1.2 cal/cm2 to 150 cal/cm2. Source: IEC 61482-1-1.
	Value Given[units.JoulePerSquareMetre]
	// kind of rating. How the rating was found. Source: IEC 61482-1-1.
	Kind Given[ArcRatingKind]
}

// PPE is what the file says of this: protective equipment.
type PPE struct {
	At
	State State

	// method. One method for one board. Source: NFPA 70E 130.5(F).
	Method Given[PPEMethod]
	// arc rating. Of the clothing as worn. Source: IEC 61482-1-1.
	ArcRating ArcRating
	// arc protection class (APC). Class of the box test. Source: IEC 61482-1-2:2014.
	Apc Given[int]
	// PPE category. North American category method. Source: NFPA 70E 130.7(C)(15).
	Category Given[int]
	// insulating gloves. Class of the gloves under leather protectors. Source: IEC 60903; ASTM D120.
	Gloves Given[GloveClass]
	// head and face. Protection of head and face. Source: NFPA 70E 130.7(C) (from memory, unconfirmed).
	Head Given[HeadProtection]
	// whole body. Face neck hands and feet are covered to the same rating. Source: common practice.
	WholeBody Given[bool]
	// hearing protection. Worn in the ear canal. Source: NFPA 70E 130.7(C) (from memory, unconfirmed).
	Hearing Given[bool]
}

// Task is what the file says of this: task.
type Task struct {
	At
	State State

	// at. Unit bars tap-off or place of work. Source: common practice.
	AtField Given[Name]
	// side. Side of the unit; left out if both. Source: common practice.
	Side Given[DeviceSide]
	// kind of task. What is done. Source: common practice.
	Kind Given[TaskKind]
	// doors. State of the doors during the task. Source: IEC TR 61641:2014.
	Doors Given[TaskDoors]
	// state of the parts. Whether voltage is there. Source: EN 50110-1.
	Parts Given[TaskParts]
	// shortest working distance (a). From the arc to the torso in this task. Usual: 200 mm to 3 m. Source: DGUV
	// Information 203-077.
	Distance Given[units.Metre]
	// done remotely. Nobody stands at the board. Source: common practice.
	Remote Given[bool]
	// with the maintenance setting. The quicker setting is on during the task. Source: NEC 240.87.
	WithMaintenanceSetting Given[bool]
	// with detection in service. The task is forbidden while detection is off. Source: common practice.
	WithDetection Given[bool]
	// protective equipment. What is worn. Source: NFPA 70E 130.5(G) (from memory, unconfirmed).
	PPE PPE
	// by. Least competence of the person. Source: EN 50110-1.
	By Given[Persons]
	// second person. A second person is present who can help. Source: EN 50110-1.
	SecondPerson Given[bool]
	// reason for live work. Why it cannot be done dead. Source: NFPA 70E 130.2 (from memory, unconfirmed).
	Reason Given[string]
	// instruction. Procedure that is followed. Source: common practice.
	Instruction Given[string]
}

// Isolation is what the file says of this: isolation.
type Isolation struct {
	At
	State State

	// lockable. Every source can be isolated and locked. Source: EN 50110-1 6.2 (from memory, unconfirmed).
	Lockable Given[bool]
	// every source named. The procedure names auxiliary and back-feeding sources as well. Source: EN 50110-1 6.2
	// (from memory, unconfirmed).
	SourcesNamed Given[bool]
	// key exchange upstream. Line side of the incomers is locked at high voltage by key. Source: common
	// practice.
	KeyExchangeUpstream Given[bool]
	// test points. Absence of voltage can be proved without opening live covers. Source: EN 50110-1 6.2 (from
	// memory, unconfirmed).
	TestPoints Given[bool]
	// tester proved before and after. The tester is proved on a known source. Source: EN 50110-1 6.2 (from
	// memory, unconfirmed).
	TesterProved Given[bool]
	// earthing points. Rating of the points or switch for earthing and short-circuiting. Source: EN 50110-1 6.2
	// (from memory, unconfirmed).
	EarthingPoints ShortTimeWithstand
	// neutral isolated. The neutral is opened together with the phases. Source: common practice.
	NeutralIsolated Given[bool]
	// discharge time. Until stored energy in the board is gone. Usual: 5 s to 20 min. Source: common practice.
	DischargeTime Given[units.Second]
	// procedure. Written procedure of isolation. Source: EN 50110-1 6.2 (from memory, unconfirmed).
	Procedure Given[string]
}

// Labels is what the file says of this: labels.
type Labels struct {
	At
	State State

	// voltage. Nominal voltage is on the label. Source: NFPA 70E 130.5(H).
	Voltage Given[bool]
	// boundary. Arc-flash boundary is on the label. Source: NFPA 70E 130.5(H).
	Boundary Given[bool]
	// energy. Incident energy is on the label. Source: NFPA 70E 130.5(H).
	Energy Given[bool]
	// working distance. Distance the energy holds for. Source: NFPA 70E 130.5(H).
	WorkingDistance Given[bool]
	// PPE category. Never together with the energy. Source: NFPA 70E 130.5(H).
	Category Given[bool]
	// least arc rating or site level. Least rating of clothing or level of the site. Source: NFPA 70E 130.5(H).
	Clothing Given[bool]
	// supply state. State of supply the label holds for. Source: common practice.
	SupplyState Given[bool]
	// both sides of devices. Line and load side have their own figures. Source: common practice.
	BothSides Given[bool]
	// parts that stay live. Units live with the incomers open are marked. Source: common practice.
	LiveParts Given[bool]
	// date. Day of the study on the label. Source: NEC 110.16(B) (from memory, unconfirmed).
	Date Given[Date]
}

// Gangway is what the file says of this: gangway.
type Gangway struct {
	At
	State State

	// width. Between board and wall or opposite board. Usual: 500 mm to 10 m. Source: IEC 60364-7-729.
	Width Given[units.Metre]
	// free passage with a door open. Also with a unit drawn out. Usual: 100 mm to 10 m. Source: IEC 60364-7-729.
	FreeWithDoorOpen Given[units.Metre]
	// height. Clear height. Usual: 1.5 m to 10 m. Source: IEC 60364-7-729.
	Height Given[units.Metre]
	// length. Along the board to the exit. Usual: 500 mm to 100 m. Source: IEC 60364-7-729.
	Length Given[units.Metre]
	// exits. Exits at different ends. Source: IEC 60364-7-729; NEC 110.26.
	Exits Given[int]
	// width of the exit door. Clear width. Usual: 500 mm to 6 m. Source: IEC 60364-7-729.
	ExitWidth Given[units.Metre]
	// height of the exit door. Clear height. Usual: 1.5 m to 6 m. Source: IEC 60364-7-729.
	ExitHeight Given[units.Metre]
	// exit opens outwards. Opens in the direction of escape without a key. Source: IEC 60364-7-729.
	ExitOpensOutwards Given[bool]
	// swing of the board doors. How open doors of the board stand to the way out. Source: IEC 60364-7-729.
	Doors Given[DoorSwing]
	// opening angle of the doors. In degrees. Source: IEC 60364-7-729.
	DoorAngle Given[int]
	// opposite the board. Condition 1 2 or 3 of the working space. Source: NEC 110.26(A)(1).
	Opposite Given[GangwayOpposite]
	// also at the rear. The rear is used for work and has these measures as well. Source: common practice.
	AtRear Given[bool]
}

// Study is what the file says of this: arc and protection study.
type Study struct {
	At
	State State

	// document. Document that holds the study. Source: NFPA 70E 130.5.
	Document Given[Name]
	// date. Day of the study. Source: NFPA 70E 130.5.
	Date Given[Date]
	// last review. Day it was found still valid. Source: NFPA 70E 130.5.
	Reviewed Given[Date]
	// date of the network data. Day of the operator's fault levels. Source: common practice.
	NetworkData Given[Date]
	// made for the settings as left. Settings at the devices agree with the study. Source: common practice.
	SettingsAsLeft Given[bool]
	// changes since. Changes of network or board after the study. Source: common practice.
	ChangedSince Given[string]
}

// Training is what the file says of this: competence and training.
type Training struct {
	At
	State State

	// competence of those who work. Least competence of those who open doors. Source: EN 50110-1.
	Persons Given[Persons]
	// person in charge named. One person is in charge of the work. Source: EN 50110-1.
	PersonInCharge Given[bool]
	// permit given by another person. Nobody signs the permit for own work. Source: EN 50110-1.
	PermitByOther Given[bool]
	// last training. Month of the last training at this board. Source: common practice.
	Refreshed Given[Date]
	// months between trainings. Interval of the plan in months. Source: common practice.
	Interval Given[int]
	// rescue plan. Plan for rescue and first aid. Source: common practice.
	Rescue Given[string]
	// first aid trained. The second person is trained in first aid. Source: common practice.
	FirstAid Given[bool]
}

// Maintenance is what the file says of this: maintenance.
type Maintenance struct {
	At
	State State

	// maintenance plan. Document with the intervals. Source: NFPA 70E 205 (from memory, unconfirmed).
	Plan Given[string]
	// last maintenance. Month of the last maintenance with the board dead. Source: common practice.
	Last Given[Date]
	// torque marks recorded. Joints are marked and recorded. Source: common practice.
	TorqueMarks Given[bool]
	// thermography. How hot joints are found. Source: common practice.
	Thermography Given[Thermography]
	// contact resistance recorded. Trend of the plug contacts and joints is kept. Source: common practice.
	ContactResistanceRecorded Given[bool]
	// insulation resistance recorded. Trend is kept. Source: common practice.
	InsulationRecorded Given[bool]
	// months between operations of breakers. Breakers are opened and closed. Source: common practice.
	BreakersExercisedEvery Given[int]
	// months between injection tests. Primary injection of releases and relays. Source: common practice.
	InjectionEvery Given[int]
	// spare unit proved in its place. Spare withdrawable units were tried in the board. Source: common practice.
	SpareProved Given[bool]
	// releases still supported. The maker still supplies and repairs them. Source: common practice.
	ReleasesSupported Given[bool]
}

// Work is what the file says of this: work at the board.
type Work struct {
	At
	State State

	// authorised work under voltage agreed. Work or inspection with doors open and parts live has been agreed
	// between owner and manufacturer. Source: IEC 61439-1 8.4.6.2 (from memory, unconfirmed).
	WithDoorsOpenUnderVoltage Given[bool]
	// places of work. Bars and both sides of every device count anyway; say more here. Source: IEEE 1584-2018.
	Locations Named[Location]
	// tasks. What persons do at the board. Source: EN 50110-1.
	Tasks Named[Task]
	// isolation. How the board is made dead. Source: EN 50110-1 6.2 (from memory, unconfirmed).
	Isolation Isolation
	// permit for live work. Live work is done under a written permit only. Source: NFPA 70E 130.2 (from memory,
	// unconfirmed).
	PermitForLiveWork Given[bool]
	// emergency trip. Where all sources can be tripped from outside the boundary. Source: common practice.
	EmergencyTrip Given[string]
	// operating and emergency instructions. Document with the instructions. Source: IEC 61439-1 6.2 (from
	// memory, unconfirmed).
	Instructions Given[string]
	// labels. Warning labels at the board. Source: NFPA 70E 130.5(H).
	Labels Labels
	// gangway. Room in front of the board. Source: IEC 60364-7-729.
	Gangway Gangway
	// study. Study of arc energy and protection. Source: NFPA 70E 130.5.
	Study Study
	// maintenance. Upkeep of joints contacts and protection. Source: NFPA 70E 205 (from memory, unconfirmed).
	Maintenance Maintenance
	// training. Competence of those who work. Source: EN 50110-1.
	Training Training
}

// EvidenceValues is what the file says of this: values shown by evidence.
type EvidenceValues struct {
	At
	State State

	// short-time withstand current. As tested. Source: IEC 61439-1 10.11.
	ShortTimeWithstand ShortTimeWithstand
	// peak current (Ipk). Highest peak reached in the test. Usual: 1.5 kA to 330 kA. Source: IEC 61439-1 10.11.
	Peak Given[units.Ampere]
	// conditional current. As tested with the limiting device. Source: IEC 61439-1 10.11.
	ConditionalRating ConditionalRating
	// current of the heating test. Current the limits of temperature rise were met at. Usual: 8 A to 7 kA.
	// Source: IEC 61439-1 10.10.
	RatedCurrent Given[units.Ampere]
	// air in the heating test. Air outside the board in the test. Usual: 10 °C to 60 °C. Source: IEC 61439-1
	// 10.10.
	Ambient Given[units.Celsius]
	// voltage. Voltage of the test. Usual: 200 V to 5 kV. Source: IEC 61439-1 10.9.
	Voltage Given[units.Volt]
	// frequency. Frequency of the test. Usual: 50 Hz to 60 Hz. Source: common practice.
	Frequency Given[units.Hertz]
	// impulse voltage (Uimp). Rated impulse withstand voltage that was shown. Usual: 2.5 kV to 12 kV. Source:
	// IEC 61439-1 10.9.3.
	Impulse Given[units.Volt]
	// degree of protection. IP code that was shown. Source: IEC 61439-1 10.3.
	Protection Given[IPCode]
	// distance of supports. As in the tested sample. Usual: 60 mm to 1.5 m. Source: IEC 61439-1 10.11.
	SupportSpan Given[units.Metre]
	// limiting device. Make series and setting in the test. Source: IEC 61439-1 10.11.
	LimitingDevice Given[string]
	// permissible current under arcing (Ip arc). Prospective r.m.s. current of the arc test. Usual: 1 kA to 150
	// kA. Source: IEC TR 61641:2014.
	PermissibleCurrent Given[units.Ampere]
	// permissible arc duration (t arc). Duration of the arc test. Usual: 20 ms to 1 s. Source: IEC TR
	// 61641:2014.
	PermissibleDuration Given[units.Second]
}

// EvidenceItem is what the file says of this: piece of evidence.
type EvidenceItem struct {
	At
	State State

	// shows. Characteristic that it shows. Source: IEC 61439-1 clause 10.
	Shows Given[Verification]
	// of. Circuits it holds for; for the whole board name all bars. Source: common practice.
	Of List[Given[Name]]
	// conductors. Conductors of the circuit it holds for. Source: common practice.
	Conductors List[Given[CircuitConductors]]
	// by. Means by which it shows. Source: IEC 61439-1 Annex D (from memory, unconfirmed).
	By Given[EvidenceMeans]
	// number of the report. Number of report or certificate. Source: common practice.
	Document Given[string]
	// issued. Day of issue. Source: common practice.
	Issued Given[Date]
	// valid until. Day the certificate ends. Source: common practice.
	ValidUntil Given[Date]
	// edition. Standard and edition it was made to. Source: common practice.
	Edition Given[string]
	// laboratory. Standing of the laboratory. Source: ISO/IEC 17025.
	Laboratory Given[LaboratoryKind]
	// accreditation. Body and number of the accreditation. Source: ISO/IEC 17025.
	Accreditation Given[string]
	// tested reference. Report of the tested design that is compared with. Source: IEC 61439-1 10.11.
	ReferenceDesign Given[string]
	// covers this variant. It names the assembly as built and not a series or a device alone. Source: common
	// practice.
	ThisVariant Given[bool]
	// values. Values that it shows. Source: common practice.
	Values EvidenceValues
}

// Stage is a word of this list: stage of the document. The words are in order, the lowest first. Zero is no
// word.
type Stage uint8

// The words: stage of the document.
const (
	// StageRequirement is "requirement": what the owner asks for.
	StageRequirement Stage = 1
	// StageTenderSubmission is "tender submission": what a tenderer offers.
	StageTenderSubmission Stage = 2
	// StageForConstruction is "for construction": what will be built.
	StageForConstruction Stage = 3
	// StageAsBuilt is "as built": what stands on site.
	StageAsBuilt Stage = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w Stage) Text() string { return theStageList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Stage) Rank() int { return theStageList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Stage) List() *WordList { return theStageList }

var theStageList = &WordList{Name: "stage", Title: "stage of the document", Ordered: true, Words: []string{"requirement", "tender submission", "for construction", "as built"}, Descriptions: []string{
	"what the owner asks for",
	"what a tenderer offers",
	"what will be built",
	"what stands on site",
}}

// Practice is a word of this list: code practice. Zero is no word.
type Practice uint8

// The words: code practice.
const (
	// PracticeIEC is "IEC": IEC standards and the rules built on them.
	PracticeIEC Practice = 1
	// PracticeNorthAmerican is "North American": NEC with NFPA 70E and UL standards.
	PracticeNorthAmerican Practice = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w Practice) Text() string { return thePracticeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Practice) Rank() int { return thePracticeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Practice) List() *WordList { return thePracticeList }

var thePracticeList = &WordList{Name: "practice", Title: "code practice", Ordered: false, Words: []string{"IEC", "North American"}, Descriptions: []string{
	"IEC standards and the rules built on them",
	"NEC with NFPA 70E and UL standards",
}}

// EarthingSystem is a word of this list: system earthing. Zero is no word.
type EarthingSystem uint8

// The words: system earthing.
const (
	// EarthingSystemTNS is "TN-S": neutral and protective conductor apart throughout.
	EarthingSystemTNS EarthingSystem = 1
	// EarthingSystemTNC is "TN-C": one conductor for neutral and protection throughout.
	EarthingSystemTNC EarthingSystem = 2
	// EarthingSystemTNCS is "TN-C-S": combined in a part of the system.
	EarthingSystemTNCS EarthingSystem = 3
	// EarthingSystemTT is "TT": exposed parts on an electrode of their own.
	EarthingSystemTT EarthingSystem = 4
	// EarthingSystemIT is "IT": not earthed or through an impedance.
	EarthingSystemIT EarthingSystem = 5
	// EarthingSystemCornerEarthed is "corner earthed": one line conductor earthed.
	EarthingSystemCornerEarthed EarthingSystem = 6
	// EarthingSystemHighResistanceEarthed is "high resistance earthed": star point through a high resistance.
	EarthingSystemHighResistanceEarthed EarthingSystem = 7
	// EarthingSystemSolidlyEarthedWye is "solidly earthed wye": star point earthed directly in North American
	// practice.
	EarthingSystemSolidlyEarthedWye EarthingSystem = 8
)

// Text returns the word as the file spells it, empty for zero.
func (w EarthingSystem) Text() string { return theEarthingSystemList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w EarthingSystem) Rank() int { return theEarthingSystemList.Rank(int(w)) }

// List returns the list the word belongs to.
func (EarthingSystem) List() *WordList { return theEarthingSystemList }

var theEarthingSystemList = &WordList{Name: "earthing_system", Title: "system earthing", Ordered: false, Words: []string{"TN-S", "TN-C", "TN-C-S", "TT", "IT", "corner earthed", "high resistance earthed", "solidly earthed wye"}, Descriptions: []string{
	"neutral and protective conductor apart throughout",
	"one conductor for neutral and protection throughout",
	"combined in a part of the system",
	"exposed parts on an electrode of their own",
	"not earthed or through an impedance",
	"one line conductor earthed",
	"star point through a high resistance",
	"star point earthed directly in North American practice",
}}

// NeutralLinkPlace is a word of this list: place of the neutral-to-earth link. Zero is no word.
type NeutralLinkPlace uint8

// The words: place of the neutral-to-earth link.
const (
	// NeutralLinkPlaceBoard is "board": in the switchboard.
	NeutralLinkPlaceBoard NeutralLinkPlace = 1
	// NeutralLinkPlaceTransformer is "transformer": at the transformer.
	NeutralLinkPlaceTransformer NeutralLinkPlace = 2
	// NeutralLinkPlaceGenerator is "generator": at the generator.
	NeutralLinkPlaceGenerator NeutralLinkPlace = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w NeutralLinkPlace) Text() string { return theNeutralLinkPlaceList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w NeutralLinkPlace) Rank() int { return theNeutralLinkPlaceList.Rank(int(w)) }

// List returns the list the word belongs to.
func (NeutralLinkPlace) List() *WordList { return theNeutralLinkPlaceList }

var theNeutralLinkPlaceList = &WordList{Name: "neutral_link_place", Title: "place of the neutral-to-earth link", Ordered: false, Words: []string{"board", "transformer", "generator"}, Descriptions: []string{
	"in the switchboard",
	"at the transformer",
	"at the generator",
}}

// LinkRemoval is a word of this list: how a link comes off. Zero is no word.
type LinkRemoval uint8

// The words: how a link comes off.
const (
	// LinkRemovalByHand is "by hand": without a tool.
	LinkRemovalByHand LinkRemoval = 1
	// LinkRemovalWithATool is "with a tool": with a tool only.
	LinkRemovalWithATool LinkRemoval = 2
	// LinkRemovalNotRemovable is "not removable": no part made to be taken off.
	LinkRemovalNotRemovable LinkRemoval = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w LinkRemoval) Text() string { return theLinkRemovalList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w LinkRemoval) Rank() int { return theLinkRemovalList.Rank(int(w)) }

// List returns the list the word belongs to.
func (LinkRemoval) List() *WordList { return theLinkRemovalList }

var theLinkRemovalList = &WordList{Name: "link_removal", Title: "how a link comes off", Ordered: false, Words: []string{"by hand", "with a tool", "not removable"}, Descriptions: []string{
	"without a tool",
	"with a tool only",
	"no part made to be taken off",
}}

// OvervoltageCategory is a word of this list: overvoltage category. The words are in order, the lowest first.
// Zero is no word.
type OvervoltageCategory uint8

// The words: overvoltage category.
const (
	// OvervoltageCategoryI is "I": specially protected level.
	OvervoltageCategoryI OvervoltageCategory = 1
	// OvervoltageCategoryII is "II": load level.
	OvervoltageCategoryII OvervoltageCategory = 2
	// OvervoltageCategoryIII is "III": distribution circuit level.
	OvervoltageCategoryIII OvervoltageCategory = 3
	// OvervoltageCategoryIV is "IV": origin of the installation.
	OvervoltageCategoryIV OvervoltageCategory = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w OvervoltageCategory) Text() string { return theOvervoltageCategoryList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w OvervoltageCategory) Rank() int { return theOvervoltageCategoryList.Rank(int(w)) }

// List returns the list the word belongs to.
func (OvervoltageCategory) List() *WordList { return theOvervoltageCategoryList }

var theOvervoltageCategoryList = &WordList{Name: "overvoltage_category", Title: "overvoltage category", Ordered: true, Words: []string{"I", "II", "III", "IV"}, Descriptions: []string{
	"specially protected level",
	"load level",
	"distribution circuit level",
	"origin of the installation",
}}

// InstallationPlace is a word of this list: place of installation. Zero is no word.
type InstallationPlace uint8

// The words: place of installation.
const (
	// InstallationPlaceIndoor is "indoor": inside a building.
	InstallationPlaceIndoor InstallationPlace = 1
	// InstallationPlaceOutdoor is "outdoor": in the open or under a roof only.
	InstallationPlaceOutdoor InstallationPlace = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w InstallationPlace) Text() string { return theInstallationPlaceList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w InstallationPlace) Rank() int { return theInstallationPlaceList.Rank(int(w)) }

// List returns the list the word belongs to.
func (InstallationPlace) List() *WordList { return theInstallationPlaceList }

var theInstallationPlaceList = &WordList{Name: "installation_place", Title: "place of installation", Ordered: false, Words: []string{"indoor", "outdoor"}, Descriptions: []string{
	"inside a building",
	"in the open or under a roof only",
}}

// Persons is a word of this list: kind of persons. The words are in order, the lowest first. Zero is no word.
type Persons uint8

// The words: kind of persons.
const (
	// PersonsOrdinaryPersons is "ordinary persons": neither skilled nor instructed.
	PersonsOrdinaryPersons Persons = 1
	// PersonsInstructedPersons is "instructed persons": advised or supervised by skilled persons.
	PersonsInstructedPersons Persons = 2
	// PersonsSkilledPersons is "skilled persons": trained to see and avoid the dangers.
	PersonsSkilledPersons Persons = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w Persons) Text() string { return thePersonsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Persons) Rank() int { return thePersonsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Persons) List() *WordList { return thePersonsList }

var thePersonsList = &WordList{Name: "persons", Title: "kind of persons", Ordered: true, Words: []string{"ordinary persons", "instructed persons", "skilled persons"}, Descriptions: []string{
	"neither skilled nor instructed",
	"advised or supervised by skilled persons",
	"trained to see and avoid the dangers",
}}

// CorrosiveAgent is a word of this list: corrosive agent in the air. Zero is no word.
type CorrosiveAgent uint8

// The words: corrosive agent in the air.
const (
	// CorrosiveAgentSalt is "salt": sea air or spray.
	CorrosiveAgentSalt CorrosiveAgent = 1
	// CorrosiveAgentHydrogenSulphide is "hydrogen sulphide": sewage and digester gas.
	CorrosiveAgentHydrogenSulphide CorrosiveAgent = 2
	// CorrosiveAgentSulphurDioxide is "sulphur dioxide": flue gas.
	CorrosiveAgentSulphurDioxide CorrosiveAgent = 3
	// CorrosiveAgentAmmonia is "ammonia": agriculture and refrigeration.
	CorrosiveAgentAmmonia CorrosiveAgent = 4
	// CorrosiveAgentChlorine is "chlorine": water treatment.
	CorrosiveAgentChlorine CorrosiveAgent = 5
	// CorrosiveAgentLime is "lime": alkaline dust or vapour.
	CorrosiveAgentLime CorrosiveAgent = 6
	// CorrosiveAgentOther is "other": stated in the document named.
	CorrosiveAgentOther CorrosiveAgent = 7
)

// Text returns the word as the file spells it, empty for zero.
func (w CorrosiveAgent) Text() string { return theCorrosiveAgentList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CorrosiveAgent) Rank() int { return theCorrosiveAgentList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CorrosiveAgent) List() *WordList { return theCorrosiveAgentList }

var theCorrosiveAgentList = &WordList{Name: "corrosive_agent", Title: "corrosive agent in the air", Ordered: false, Words: []string{"salt", "hydrogen sulphide", "sulphur dioxide", "ammonia", "chlorine", "lime", "other"}, Descriptions: []string{
	"sea air or spray",
	"sewage and digester gas",
	"flue gas",
	"agriculture and refrigeration",
	"water treatment",
	"alkaline dust or vapour",
	"stated in the document named",
}}

// DustKind is a word of this list: kind of dust. Zero is no word.
type DustKind uint8

// The words: kind of dust.
const (
	// DustKindOrdinary is "ordinary": more than in a clean switchroom.
	DustKindOrdinary DustKind = 1
	// DustKindConductive is "conductive": carbon or metal.
	DustKindConductive DustKind = 2
	// DustKindHygroscopic is "hygroscopic": takes up water and then conducts.
	DustKindHygroscopic DustKind = 3
	// DustKindCombustible is "combustible": can burn or explode.
	DustKindCombustible DustKind = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w DustKind) Text() string { return theDustKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w DustKind) Rank() int { return theDustKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (DustKind) List() *WordList { return theDustKindList }

var theDustKindList = &WordList{Name: "dust_kind", Title: "kind of dust", Ordered: false, Words: []string{"ordinary", "conductive", "hygroscopic", "combustible"}, Descriptions: []string{
	"more than in a clean switchroom",
	"carbon or metal",
	"takes up water and then conducts",
	"can burn or explode",
}}

// CondensationFrequency is a word of this list: how often condensation forms. The words are in order, the
// lowest first. Zero is no word.
type CondensationFrequency uint8

// The words: how often condensation forms.
const (
	// CondensationFrequencyNotExpected is "not expected": heated and dry room.
	CondensationFrequencyNotExpected CondensationFrequency = 1
	// CondensationFrequencyOccasional is "occasional": seasonal or after standstill.
	CondensationFrequencyOccasional CondensationFrequency = 2
	// CondensationFrequencyFrequent is "frequent": daily or permanent.
	CondensationFrequencyFrequent CondensationFrequency = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w CondensationFrequency) Text() string { return theCondensationFrequencyList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CondensationFrequency) Rank() int { return theCondensationFrequencyList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CondensationFrequency) List() *WordList { return theCondensationFrequencyList }

var theCondensationFrequencyList = &WordList{Name: "condensation_frequency", Title: "how often condensation forms", Ordered: true, Words: []string{"not expected", "occasional", "frequent"}, Descriptions: []string{
	"heated and dry room",
	"seasonal or after standstill",
	"daily or permanent",
}}

// EmcEnvironment is a word of this list: electromagnetic environment. Zero is no word.
type EmcEnvironment uint8

// The words: electromagnetic environment.
const (
	// EmcEnvironmentA is "A": industrial networks.
	EmcEnvironmentA EmcEnvironment = 1
	// EmcEnvironmentB is "B": public low-voltage networks and homes.
	EmcEnvironmentB EmcEnvironment = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w EmcEnvironment) Text() string { return theEmcEnvironmentList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w EmcEnvironment) Rank() int { return theEmcEnvironmentList.Rank(int(w)) }

// List returns the list the word belongs to.
func (EmcEnvironment) List() *WordList { return theEmcEnvironmentList }

var theEmcEnvironmentList = &WordList{Name: "emc_environment", Title: "electromagnetic environment", Ordered: false, Words: []string{"A", "B"}, Descriptions: []string{
	"industrial networks",
	"public low-voltage networks and homes",
}}

// SourceKind is a word of this list: kind of source. Zero is no word.
type SourceKind uint8

// The words: kind of source.
const (
	// SourceKindTransformer is "transformer": fed from a higher voltage.
	SourceKindTransformer SourceKind = 1
	// SourceKindGenerator is "generator": synchronous machine.
	SourceKindGenerator SourceKind = 2
	// SourceKindUtilitySupply is "utility supply": low-voltage supply of the network operator.
	SourceKindUtilitySupply SourceKind = 3
	// SourceKindInverter is "inverter": converter that feeds in.
	SourceKindInverter SourceKind = 4
	// SourceKindUps is "ups": uninterruptible supply that feeds the bars.
	SourceKindUps SourceKind = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w SourceKind) Text() string { return theSourceKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SourceKind) Rank() int { return theSourceKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SourceKind) List() *WordList { return theSourceKindList }

var theSourceKindList = &WordList{Name: "source_kind", Title: "kind of source", Ordered: false, Words: []string{"transformer", "generator", "utility supply", "inverter", "ups"}, Descriptions: []string{
	"fed from a higher voltage",
	"synchronous machine",
	"low-voltage supply of the network operator",
	"converter that feeds in",
	"uninterruptible supply that feeds the bars",
}}

// NeutralEarthing is a word of this list: earthing of a source neutral. Zero is no word.
type NeutralEarthing uint8

// The words: earthing of a source neutral.
const (
	// NeutralEarthingAtBoard is "at board": link in the switchboard.
	NeutralEarthingAtBoard NeutralEarthing = 1
	// NeutralEarthingAtSource is "at source": link at the source itself.
	NeutralEarthingAtSource NeutralEarthing = 2
	// NeutralEarthingThroughAResistor is "through a resistor": earthed over a resistance.
	NeutralEarthingThroughAResistor NeutralEarthing = 3
	// NeutralEarthingNotEarthed is "not earthed": no connection to earth.
	NeutralEarthingNotEarthed NeutralEarthing = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w NeutralEarthing) Text() string { return theNeutralEarthingList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w NeutralEarthing) Rank() int { return theNeutralEarthingList.Rank(int(w)) }

// List returns the list the word belongs to.
func (NeutralEarthing) List() *WordList { return theNeutralEarthingList }

var theNeutralEarthingList = &WordList{Name: "neutral_earthing", Title: "earthing of a source neutral", Ordered: false, Words: []string{"at board", "at source", "through a resistor", "not earthed"}, Descriptions: []string{
	"link in the switchboard",
	"link at the source itself",
	"earthed over a resistance",
	"no connection to earth",
}}

// LinkKind is a word of this list: kind of link to the source. Zero is no word.
type LinkKind uint8

// The words: kind of link to the source.
const (
	// LinkKindCable is "cable": cables.
	LinkKindCable LinkKind = 1
	// LinkKindBars is "bars": open or enclosed bars.
	LinkKindBars LinkKind = 2
	// LinkKindBusduct is "busduct": busbar trunking.
	LinkKindBusduct LinkKind = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w LinkKind) Text() string { return theLinkKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w LinkKind) Rank() int { return theLinkKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (LinkKind) List() *WordList { return theLinkKindList }

var theLinkKindList = &WordList{Name: "link_kind", Title: "kind of link to the source", Ordered: false, Words: []string{"cable", "bars", "busduct"}, Descriptions: []string{
	"cables",
	"open or enclosed bars",
	"busbar trunking",
}}

// ConductorMetal is a word of this list: conductor metal. Zero is no word.
type ConductorMetal uint8

// The words: conductor metal.
const (
	// ConductorMetalCopper is "copper": copper.
	ConductorMetalCopper ConductorMetal = 1
	// ConductorMetalAluminium is "aluminium": aluminium.
	ConductorMetalAluminium ConductorMetal = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w ConductorMetal) Text() string { return theConductorMetalList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ConductorMetal) Rank() int { return theConductorMetalList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ConductorMetal) List() *WordList { return theConductorMetalList }

var theConductorMetalList = &WordList{Name: "conductor_metal", Title: "conductor metal", Ordered: false, Words: []string{"copper", "aluminium"}, Descriptions: []string{
	"copper",
	"aluminium",
}}

// CableInsulation is a word of this list: insulation of a link conductor. Zero is no word.
type CableInsulation uint8

// The words: insulation of a link conductor.
const (
	// CableInsulationPvc is "pvc": polyvinyl chloride.
	CableInsulationPvc CableInsulation = 1
	// CableInsulationXlpe is "xlpe": cross-linked polyethylene.
	CableInsulationXlpe CableInsulation = 2
	// CableInsulationEpr is "epr": ethylene propylene rubber.
	CableInsulationEpr CableInsulation = 3
	// CableInsulationBare is "bare": no insulation.
	CableInsulationBare CableInsulation = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w CableInsulation) Text() string { return theCableInsulationList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CableInsulation) Rank() int { return theCableInsulationList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CableInsulation) List() *WordList { return theCableInsulationList }

var theCableInsulationList = &WordList{Name: "cable_insulation", Title: "insulation of a link conductor", Ordered: false, Words: []string{"pvc", "xlpe", "epr", "bare"}, Descriptions: []string{
	"polyvinyl chloride",
	"cross-linked polyethylene",
	"ethylene propylene rubber",
	"no insulation",
}}

// ExcitationKind is a word of this list: excitation of a generator. Zero is no word.
type ExcitationKind uint8

// The words: excitation of a generator.
const (
	// ExcitationKindSelfExcited is "self-excited": from its own terminals without support.
	ExcitationKindSelfExcited ExcitationKind = 1
	// ExcitationKindSelfExcitedWithCurrentSupport is "self-excited with current support": keeps a fault current
	// up from its own current.
	ExcitationKindSelfExcitedWithCurrentSupport ExcitationKind = 2
	// ExcitationKindSeparatelyExcited is "separately excited": pilot exciter or auxiliary winding.
	ExcitationKindSeparatelyExcited ExcitationKind = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w ExcitationKind) Text() string { return theExcitationKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ExcitationKind) Rank() int { return theExcitationKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ExcitationKind) List() *WordList { return theExcitationKindList }

var theExcitationKindList = &WordList{Name: "excitation_kind", Title: "excitation of a generator", Ordered: false, Words: []string{"self-excited", "self-excited with current support", "separately excited"}, Descriptions: []string{
	"from its own terminals without support",
	"keeps a fault current up from its own current",
	"pilot exciter or auxiliary winding",
}}

// OtherSupplyKind is a word of this list: kind of other supply or stored energy. Zero is no word.
type OtherSupplyKind uint8

// The words: kind of other supply or stored energy.
const (
	// OtherSupplyKindUps is "ups": output or static bypass of an uninterruptible supply.
	OtherSupplyKindUps OtherSupplyKind = 1
	// OtherSupplyKindCapacitorBank is "capacitor bank": stored charge.
	OtherSupplyKindCapacitorBank OtherSupplyKind = 2
	// OtherSupplyKindBatteryStorage is "battery storage": storage with converter.
	OtherSupplyKindBatteryStorage OtherSupplyKind = 3
	// OtherSupplyKindPhotovoltaic is "photovoltaic": feeds in by daylight.
	OtherSupplyKindPhotovoltaic OtherSupplyKind = 4
	// OtherSupplyKindControlSupply is "control supply": control voltage from elsewhere.
	OtherSupplyKindControlSupply OtherSupplyKind = 5
	// OtherSupplyKindHeaterSupply is "heater supply": heaters and lighting fed from elsewhere.
	OtherSupplyKindHeaterSupply OtherSupplyKind = 6
	// OtherSupplyKindDrive is "drive": charged link or regenerating converter.
	OtherSupplyKindDrive OtherSupplyKind = 7
	// OtherSupplyKindOtherBoard is "other board": tie or back-feed from another board.
	OtherSupplyKindOtherBoard OtherSupplyKind = 8
)

// Text returns the word as the file spells it, empty for zero.
func (w OtherSupplyKind) Text() string { return theOtherSupplyKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w OtherSupplyKind) Rank() int { return theOtherSupplyKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (OtherSupplyKind) List() *WordList { return theOtherSupplyKindList }

var theOtherSupplyKindList = &WordList{Name: "other_supply_kind", Title: "kind of other supply or stored energy", Ordered: false, Words: []string{"ups", "capacitor bank", "battery storage", "photovoltaic", "control supply", "heater supply", "drive", "other board"}, Descriptions: []string{
	"output or static bypass of an uninterruptible supply",
	"stored charge",
	"storage with converter",
	"feeds in by daylight",
	"control voltage from elsewhere",
	"heaters and lighting fed from elsewhere",
	"charged link or regenerating converter",
	"tie or back-feed from another board",
}}

// TransferOperation is a word of this list: how sources change over. Zero is no word.
type TransferOperation uint8

// The words: how sources change over.
const (
	// TransferOperationBreakBeforeMake is "break before make": the old source opens first.
	TransferOperationBreakBeforeMake TransferOperation = 1
	// TransferOperationClosedUpTo100Ms is "closed up to 100 ms": short overlap.
	TransferOperationClosedUpTo100Ms TransferOperation = 2
	// TransferOperationMayStayParallel is "may stay parallel": sources may run together for longer.
	TransferOperationMayStayParallel TransferOperation = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w TransferOperation) Text() string { return theTransferOperationList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TransferOperation) Rank() int { return theTransferOperationList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TransferOperation) List() *WordList { return theTransferOperationList }

var theTransferOperationList = &WordList{Name: "transfer_operation", Title: "how sources change over", Ordered: false, Words: []string{"break before make", "closed up to 100 ms", "may stay parallel"}, Descriptions: []string{
	"the old source opens first",
	"short overlap",
	"sources may run together for longer",
}}

// InterlockKind is a word of this list: kind of interlock. The words are in order, the lowest first. Zero is
// no word.
type InterlockKind uint8

// The words: kind of interlock.
const (
	// InterlockKindSoftware is "software": controller logic only.
	InterlockKindSoftware InterlockKind = 1
	// InterlockKindHardWired is "hard-wired": electrical contacts.
	InterlockKindHardWired InterlockKind = 2
	// InterlockKindMechanical is "mechanical": rods or cables between the devices.
	InterlockKindMechanical InterlockKind = 3
	// InterlockKindMechanicalKey is "mechanical key": trapped keys.
	InterlockKindMechanicalKey InterlockKind = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w InterlockKind) Text() string { return theInterlockKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w InterlockKind) Rank() int { return theInterlockKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (InterlockKind) List() *WordList { return theInterlockKindList }

var theInterlockKindList = &WordList{Name: "interlock_kind", Title: "kind of interlock", Ordered: true, Words: []string{"software", "hard-wired", "mechanical", "mechanical key"}, Descriptions: []string{
	"controller logic only",
	"electrical contacts",
	"rods or cables between the devices",
	"trapped keys",
}}

// AssemblyStandard is a word of this list: standard of the assembly. Zero is no word.
type AssemblyStandard uint8

// The words: standard of the assembly.
const (
	// AssemblyStandardIEC614392 is "IEC 61439-2": power switchgear assembly.
	AssemblyStandardIEC614392 AssemblyStandard = 1
	// AssemblyStandardIEC614393 is "IEC 61439-3": distribution board for ordinary persons.
	AssemblyStandardIEC614393 AssemblyStandard = 2
	// AssemblyStandardIEC614396 is "IEC 61439-6": busbar trunking.
	AssemblyStandardIEC614396 AssemblyStandard = 3
	// AssemblyStandardUL891 is "UL 891": dead-front switchboard.
	AssemblyStandardUL891 AssemblyStandard = 4
	// AssemblyStandardUL1558 is "UL 1558": metal-enclosed low-voltage switchgear.
	AssemblyStandardUL1558 AssemblyStandard = 5
	// AssemblyStandardUL845 is "UL 845": motor control centre.
	AssemblyStandardUL845 AssemblyStandard = 6
)

// Text returns the word as the file spells it, empty for zero.
func (w AssemblyStandard) Text() string { return theAssemblyStandardList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w AssemblyStandard) Rank() int { return theAssemblyStandardList.Rank(int(w)) }

// List returns the list the word belongs to.
func (AssemblyStandard) List() *WordList { return theAssemblyStandardList }

var theAssemblyStandardList = &WordList{Name: "assembly_standard", Title: "standard of the assembly", Ordered: false, Words: []string{"IEC 61439-2", "IEC 61439-3", "IEC 61439-6", "UL 891", "UL 1558", "UL 845"}, Descriptions: []string{
	"power switchgear assembly",
	"distribution board for ordinary persons",
	"busbar trunking",
	"dead-front switchboard",
	"metal-enclosed low-voltage switchgear",
	"motor control centre",
}}

// AssemblyCondition is a word of this list: condition of the assembly. Zero is no word.
type AssemblyCondition uint8

// The words: condition of the assembly.
const (
	// AssemblyConditionNew is "new": not yet in service.
	AssemblyConditionNew AssemblyCondition = 1
	// AssemblyConditionExisting is "existing": in service and unchanged.
	AssemblyConditionExisting AssemblyCondition = 2
	// AssemblyConditionExistingAndChanged is "existing and changed": in service and altered since delivery.
	AssemblyConditionExistingAndChanged AssemblyCondition = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w AssemblyCondition) Text() string { return theAssemblyConditionList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w AssemblyCondition) Rank() int { return theAssemblyConditionList.Rank(int(w)) }

// List returns the list the word belongs to.
func (AssemblyCondition) List() *WordList { return theAssemblyConditionList }

var theAssemblyConditionList = &WordList{Name: "assembly_condition", Title: "condition of the assembly", Ordered: false, Words: []string{"new", "existing", "existing and changed"}, Descriptions: []string{
	"not yet in service",
	"in service and unchanged",
	"in service and altered since delivery",
}}

// Cooling is a word of this list: cooling of the assembly. Zero is no word.
type Cooling uint8

// The words: cooling of the assembly.
const (
	// CoolingNatural is "natural": no fans.
	CoolingNatural Cooling = 1
	// CoolingForced is "forced": fans needed for the rating.
	CoolingForced Cooling = 2
	// CoolingForcedAndSupervised is "forced and supervised": fans needed and their failure alarmed.
	CoolingForcedAndSupervised Cooling = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w Cooling) Text() string { return theCoolingList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Cooling) Rank() int { return theCoolingList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Cooling) List() *WordList { return theCoolingList }

var theCoolingList = &WordList{Name: "cooling", Title: "cooling of the assembly", Ordered: false, Words: []string{"natural", "forced", "forced and supervised"}, Descriptions: []string{
	"no fans",
	"fans needed for the rating",
	"fans needed and their failure alarmed",
}}

// IkCode is a word of this list: impact protection. The words are in order, the lowest first. Zero is no
// word.
type IkCode uint8

// The words: impact protection.
const (
	// IkCodeIK00 is "IK00": no protection stated.
	IkCodeIK00 IkCode = 1
	// IkCodeIK01 is "IK01": 0.14 J.
	IkCodeIK01 IkCode = 2
	// IkCodeIK02 is "IK02": 0.2 J.
	IkCodeIK02 IkCode = 3
	// IkCodeIK03 is "IK03": 0.35 J.
	IkCodeIK03 IkCode = 4
	// IkCodeIK04 is "IK04": 0.5 J.
	IkCodeIK04 IkCode = 5
	// IkCodeIK05 is "IK05": 0.7 J.
	IkCodeIK05 IkCode = 6
	// IkCodeIK06 is "IK06": 1 J.
	IkCodeIK06 IkCode = 7
	// IkCodeIK07 is "IK07": 2 J.
	IkCodeIK07 IkCode = 8
	// IkCodeIK08 is "IK08": 5 J.
	IkCodeIK08 IkCode = 9
	// IkCodeIK09 is "IK09": 10 J.
	IkCodeIK09 IkCode = 10
	// IkCodeIK10 is "IK10": 20 J.
	IkCodeIK10 IkCode = 11
	// IkCodeIK11 is "IK11": 50 J.
	IkCodeIK11 IkCode = 12
)

// Text returns the word as the file spells it, empty for zero.
func (w IkCode) Text() string { return theIkCodeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w IkCode) Rank() int { return theIkCodeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (IkCode) List() *WordList { return theIkCodeList }

var theIkCodeList = &WordList{Name: "ik_code", Title: "impact protection", Ordered: true, Words: []string{"IK00", "IK01", "IK02", "IK03", "IK04", "IK05", "IK06", "IK07", "IK08", "IK09", "IK10", "IK11"}, Descriptions: []string{
	"no protection stated",
	"0.14 J",
	"0.2 J",
	"0.35 J",
	"0.5 J",
	"0.7 J",
	"1 J",
	"2 J",
	"5 J",
	"10 J",
	"20 J",
	"50 J",
}}

// SeparationForm is a word of this list: form of internal separation. The words are in order, the lowest
// first. Zero is no word.
type SeparationForm uint8

// The words: form of internal separation.
const (
	// SeparationForm1 is "1": no separation.
	SeparationForm1 SeparationForm = 1
	// SeparationForm2a is "2a": busbars from units.
	SeparationForm2a SeparationForm = 2
	// SeparationForm2b is "2b": as 2a and terminals from busbars.
	SeparationForm2b SeparationForm = 3
	// SeparationForm3a is "3a": as 2a and units from each other.
	SeparationForm3a SeparationForm = 4
	// SeparationForm3b is "3b": as 3a and terminals from units and busbars.
	SeparationForm3b SeparationForm = 5
	// SeparationForm4a is "4a": terminals of each unit apart but in its compartment.
	SeparationForm4a SeparationForm = 6
	// SeparationForm4b is "4b": terminals of each unit in a compartment of their own.
	SeparationForm4b SeparationForm = 7
)

// Text returns the word as the file spells it, empty for zero.
func (w SeparationForm) Text() string { return theSeparationFormList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SeparationForm) Rank() int { return theSeparationFormList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SeparationForm) List() *WordList { return theSeparationFormList }

var theSeparationFormList = &WordList{Name: "separation_form", Title: "form of internal separation", Ordered: true, Words: []string{"1", "2a", "2b", "3a", "3b", "4a", "4b"}, Descriptions: []string{
	"no separation",
	"busbars from units",
	"as 2a and terminals from busbars",
	"as 2a and units from each other",
	"as 3a and terminals from units and busbars",
	"terminals of each unit apart but in its compartment",
	"terminals of each unit in a compartment of their own",
}}

// OpeningMeans is a word of this list: how an access opens. Zero is no word.
type OpeningMeans uint8

// The words: how an access opens.
const (
	// OpeningMeansByHand is "by hand": without key or tool.
	OpeningMeansByHand OpeningMeans = 1
	// OpeningMeansKeyOrTool is "key or tool": key or tool needed.
	OpeningMeansKeyOrTool OpeningMeans = 2
	// OpeningMeansBoltedCover is "bolted cover": screws to be taken out.
	OpeningMeansBoltedCover OpeningMeans = 3
	// OpeningMeansSupplyInterlock is "supply interlock": opens only with the supply disconnected.
	OpeningMeansSupplyInterlock OpeningMeans = 4
	// OpeningMeansFixedPanel is "fixed panel": not meant to be opened.
	OpeningMeansFixedPanel OpeningMeans = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w OpeningMeans) Text() string { return theOpeningMeansList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w OpeningMeans) Rank() int { return theOpeningMeansList.Rank(int(w)) }

// List returns the list the word belongs to.
func (OpeningMeans) List() *WordList { return theOpeningMeansList }

var theOpeningMeansList = &WordList{Name: "opening_means", Title: "how an access opens", Ordered: false, Words: []string{"by hand", "key or tool", "bolted cover", "supply interlock", "fixed panel"}, Descriptions: []string{
	"without key or tool",
	"key or tool needed",
	"screws to be taken out",
	"opens only with the supply disconnected",
	"not meant to be opened",
}}

// AccessPurpose is a word of this list: purpose of access under voltage. Zero is no word.
type AccessPurpose uint8

// The words: purpose of access under voltage.
const (
	// AccessPurposeInspection is "inspection": looking and reading and setting.
	AccessPurposeInspection AccessPurpose = 1
	// AccessPurposeMaintenance is "maintenance": work on isolated units beside live ones.
	AccessPurposeMaintenance AccessPurpose = 2
	// AccessPurposeExtension is "extension": adding units with the bars live.
	AccessPurposeExtension AccessPurpose = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w AccessPurpose) Text() string { return theAccessPurposeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w AccessPurpose) Rank() int { return theAccessPurposeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (AccessPurpose) List() *WordList { return theAccessPurposeList }

var theAccessPurposeList = &WordList{Name: "access_purpose", Title: "purpose of access under voltage", Ordered: false, Words: []string{"inspection", "maintenance", "extension"}, Descriptions: []string{
	"looking and reading and setting",
	"work on isolated units beside live ones",
	"adding units with the bars live",
}}

// MaterialGroup is a word of this list: insulating material group. The words are in order, the lowest first.
// Zero is no word.
type MaterialGroup uint8

// The words: insulating material group.
const (
	// MaterialGroupIIIb is "IIIb": tracking index 100 to below 175.
	MaterialGroupIIIb MaterialGroup = 1
	// MaterialGroupIIIa is "IIIa": tracking index 175 to below 400.
	MaterialGroupIIIa MaterialGroup = 2
	// MaterialGroupII is "II": tracking index 400 to below 600.
	MaterialGroupII MaterialGroup = 3
	// MaterialGroupI is "I": tracking index 600 or more.
	MaterialGroupI MaterialGroup = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w MaterialGroup) Text() string { return theMaterialGroupList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w MaterialGroup) Rank() int { return theMaterialGroupList.Rank(int(w)) }

// List returns the list the word belongs to.
func (MaterialGroup) List() *WordList { return theMaterialGroupList }

var theMaterialGroupList = &WordList{Name: "material_group", Title: "insulating material group", Ordered: true, Words: []string{"IIIb", "IIIa", "II", "I"}, Descriptions: []string{
	"tracking index 100 to below 175",
	"tracking index 175 to below 400",
	"tracking index 400 to below 600",
	"tracking index 600 or more",
}}

// SurgeProtectionKind is a word of this list: type of surge protection. Zero is no word.
type SurgeProtectionKind uint8

// The words: type of surge protection.
const (
	// SurgeProtectionKindType1 is "type 1": for lightning currents.
	SurgeProtectionKindType1 SurgeProtectionKind = 1
	// SurgeProtectionKindType1And2 is "type 1+2": combined.
	SurgeProtectionKindType1And2 SurgeProtectionKind = 2
	// SurgeProtectionKindType2 is "type 2": for switching and induced surges.
	SurgeProtectionKindType2 SurgeProtectionKind = 3
	// SurgeProtectionKindType3 is "type 3": near the load.
	SurgeProtectionKindType3 SurgeProtectionKind = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w SurgeProtectionKind) Text() string { return theSurgeProtectionKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SurgeProtectionKind) Rank() int { return theSurgeProtectionKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SurgeProtectionKind) List() *WordList { return theSurgeProtectionKindList }

var theSurgeProtectionKindList = &WordList{Name: "surge_protection_kind", Title: "type of surge protection", Ordered: false, Words: []string{"type 1", "type 1+2", "type 2", "type 3"}, Descriptions: []string{
	"for lightning currents",
	"combined",
	"for switching and induced surges",
	"near the load",
}}

// TripSupply is a word of this list: supply of tripping. Zero is no word.
type TripSupply uint8

// The words: supply of tripping.
const (
	// TripSupplySelfPowered is "self-powered": from the current measured.
	TripSupplySelfPowered TripSupply = 1
	// TripSupplyDCBattery is "DC battery": battery apart from the bars.
	TripSupplyDCBattery TripSupply = 2
	// TripSupplyCapacitorTrip is "capacitor trip": stored charge.
	TripSupplyCapacitorTrip TripSupply = 3
	// TripSupplyUps is "ups": uninterruptible supply.
	TripSupplyUps TripSupply = 4
	// TripSupplyOtherBoard is "other board": supply from elsewhere.
	TripSupplyOtherBoard TripSupply = 5
	// TripSupplyFromOwnBars is "from own bars": from the bars that collapse in a fault.
	TripSupplyFromOwnBars TripSupply = 6
)

// Text returns the word as the file spells it, empty for zero.
func (w TripSupply) Text() string { return theTripSupplyList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TripSupply) Rank() int { return theTripSupplyList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TripSupply) List() *WordList { return theTripSupplyList }

var theTripSupplyList = &WordList{Name: "trip_supply", Title: "supply of tripping", Ordered: false, Words: []string{"self-powered", "DC battery", "capacitor trip", "ups", "other board", "from own bars"}, Descriptions: []string{
	"from the current measured",
	"battery apart from the bars",
	"stored charge",
	"uninterruptible supply",
	"supply from elsewhere",
	"from the bars that collapse in a fault",
}}

// ResidualCurrentType is a word of this list: residual current type. Zero is no word.
type ResidualCurrentType uint8

// The words: residual current type.
const (
	// ResidualCurrentTypeAC is "AC": alternating current.
	ResidualCurrentTypeAC ResidualCurrentType = 1
	// ResidualCurrentTypeA is "A": also pulsating direct current.
	ResidualCurrentTypeA ResidualCurrentType = 2
	// ResidualCurrentTypeF is "F": also mixed frequencies.
	ResidualCurrentTypeF ResidualCurrentType = 3
	// ResidualCurrentTypeB is "B": also smooth direct current.
	ResidualCurrentTypeB ResidualCurrentType = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w ResidualCurrentType) Text() string { return theResidualCurrentTypeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ResidualCurrentType) Rank() int { return theResidualCurrentTypeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ResidualCurrentType) List() *WordList { return theResidualCurrentTypeList }

var theResidualCurrentTypeList = &WordList{Name: "residual_current_type", Title: "residual current type", Ordered: false, Words: []string{"AC", "A", "F", "B"}, Descriptions: []string{
	"alternating current",
	"also pulsating direct current",
	"also mixed frequencies",
	"also smooth direct current",
}}

// ShockProtectionClass is a word of this list: class of protection against shock. Zero is no word.
type ShockProtectionClass uint8

// The words: class of protection against shock.
const (
	// ShockProtectionClassClassI is "class I": exposed parts on the protective conductor.
	ShockProtectionClassClassI ShockProtectionClass = 1
	// ShockProtectionClassClassII is "class II": total insulation.
	ShockProtectionClassClassII ShockProtectionClass = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w ShockProtectionClass) Text() string { return theShockProtectionClassList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ShockProtectionClass) Rank() int { return theShockProtectionClassList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ShockProtectionClass) List() *WordList { return theShockProtectionClassList }

var theShockProtectionClassList = &WordList{Name: "shock_protection_class", Title: "class of protection against shock", Ordered: false, Words: []string{"class I", "class II"}, Descriptions: []string{
	"exposed parts on the protective conductor",
	"total insulation",
}}

// CoveringKind is a word of this list: kind of covering. The words are in order, the lowest first. Zero is no
// word.
type CoveringKind uint8

// The words: kind of covering.
const (
	// CoveringKindBare is "bare": no covering.
	CoveringKindBare CoveringKind = 1
	// CoveringKindSleeved is "sleeved": sleeve or shrink tube over the bar.
	CoveringKindSleeved CoveringKind = 2
	// CoveringKindFullyInsulated is "fully insulated": bars and joints enclosed in insulation all round.
	CoveringKindFullyInsulated CoveringKind = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w CoveringKind) Text() string { return theCoveringKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CoveringKind) Rank() int { return theCoveringKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CoveringKind) List() *WordList { return theCoveringKindList }

var theCoveringKindList = &WordList{Name: "covering_kind", Title: "kind of covering", Ordered: true, Words: []string{"bare", "sleeved", "fully insulated"}, Descriptions: []string{
	"no covering",
	"sleeve or shrink tube over the bar",
	"bars and joints enclosed in insulation all round",
}}

// CoveringJoints is a word of this list: covering of the joints. The words are in order, the lowest first.
// Zero is no word.
type CoveringJoints uint8

// The words: covering of the joints.
const (
	// CoveringJointsBare is "bare": joints left open.
	CoveringJointsBare CoveringJoints = 1
	// CoveringJointsBoots is "boots": removable boots over the joints.
	CoveringJointsBoots CoveringJoints = 2
	// CoveringJointsCovered is "covered": joints covered like the bars.
	CoveringJointsCovered CoveringJoints = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w CoveringJoints) Text() string { return theCoveringJointsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CoveringJoints) Rank() int { return theCoveringJointsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CoveringJoints) List() *WordList { return theCoveringJointsList }

var theCoveringJointsList = &WordList{Name: "covering_joints", Title: "covering of the joints", Ordered: true, Words: []string{"bare", "boots", "covered"}, Descriptions: []string{
	"joints left open",
	"removable boots over the joints",
	"joints covered like the bars",
}}

// BarBroadSide is a word of this list: where the broad side points. Zero is no word.
type BarBroadSide uint8

// The words: where the broad side points.
const (
	// BarBroadSideTowardsNextPhase is "towards next phase": broad sides of two phases face each other.
	BarBroadSideTowardsNextPhase BarBroadSide = 1
	// BarBroadSideAtRightAnglesToNextPhase is "at right angles to next phase": narrow sides of two phases face
	// each other.
	BarBroadSideAtRightAnglesToNextPhase BarBroadSide = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w BarBroadSide) Text() string { return theBarBroadSideList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w BarBroadSide) Rank() int { return theBarBroadSideList.Rank(int(w)) }

// List returns the list the word belongs to.
func (BarBroadSide) List() *WordList { return theBarBroadSideList }

var theBarBroadSideList = &WordList{Name: "bar_broad_side", Title: "where the broad side points", Ordered: false, Words: []string{"towards next phase", "at right angles to next phase"}, Descriptions: []string{
	"broad sides of two phases face each other",
	"narrow sides of two phases face each other",
}}

// BarPhases is a word of this list: arrangement of the phases. Zero is no word.
type BarPhases uint8

// The words: arrangement of the phases.
const (
	// BarPhasesSideBySide is "side by side": phases in one horizontal row.
	BarPhasesSideBySide BarPhases = 1
	// BarPhasesOneAboveTheOther is "one above the other": phases in one vertical row.
	BarPhasesOneAboveTheOther BarPhases = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w BarPhases) Text() string { return theBarPhasesList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w BarPhases) Rank() int { return theBarPhasesList.Rank(int(w)) }

// List returns the list the word belongs to.
func (BarPhases) List() *WordList { return theBarPhasesList }

var theBarPhasesList = &WordList{Name: "bar_phases", Title: "arrangement of the phases", Ordered: false, Words: []string{"side by side", "one above the other"}, Descriptions: []string{
	"phases in one horizontal row",
	"phases in one vertical row",
}}

// SurfaceFinish is a word of this list: surface finish. Zero is no word.
type SurfaceFinish uint8

// The words: surface finish.
const (
	// SurfaceFinishBare is "bare": bare metal.
	SurfaceFinishBare SurfaceFinish = 1
	// SurfaceFinishTinned is "tinned": tin-plated.
	SurfaceFinishTinned SurfaceFinish = 2
	// SurfaceFinishSilverPlated is "silver-plated": silver-plated.
	SurfaceFinishSilverPlated SurfaceFinish = 3
	// SurfaceFinishNickelPlated is "nickel-plated": nickel-plated.
	SurfaceFinishNickelPlated SurfaceFinish = 4
	// SurfaceFinishPainted is "painted": painted outside the joints.
	SurfaceFinishPainted SurfaceFinish = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w SurfaceFinish) Text() string { return theSurfaceFinishList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SurfaceFinish) Rank() int { return theSurfaceFinishList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SurfaceFinish) List() *WordList { return theSurfaceFinishList }

var theSurfaceFinishList = &WordList{Name: "surface_finish", Title: "surface finish", Ordered: false, Words: []string{"bare", "tinned", "silver-plated", "nickel-plated", "painted"}, Descriptions: []string{
	"bare metal",
	"tin-plated",
	"silver-plated",
	"nickel-plated",
	"painted outside the joints",
}}

// SupportEnds is a word of this list: how the bar rests on its supports. Zero is no word.
type SupportEnds uint8

// The words: how the bar rests on its supports.
const (
	// SupportEndsContinuous is "continuous": one bar over several spans.
	SupportEndsContinuous SupportEnds = 1
	// SupportEndsSupportedBothEnds is "supported both ends": one span resting on two supports.
	SupportEndsSupportedBothEnds SupportEnds = 2
	// SupportEndsFixedAndSupported is "fixed and supported": one span with one end clamped.
	SupportEndsFixedAndSupported SupportEnds = 3
	// SupportEndsFixedBothEnds is "fixed both ends": one span clamped at both ends.
	SupportEndsFixedBothEnds SupportEnds = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w SupportEnds) Text() string { return theSupportEndsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SupportEnds) Rank() int { return theSupportEndsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SupportEnds) List() *WordList { return theSupportEndsList }

var theSupportEndsList = &WordList{Name: "support_ends", Title: "how the bar rests on its supports", Ordered: false, Words: []string{"continuous", "supported both ends", "fixed and supported", "fixed both ends"}, Descriptions: []string{
	"one bar over several spans",
	"one span resting on two supports",
	"one span with one end clamped",
	"one span clamped at both ends",
}}

// StrengthKind is a word of this list: meaning of a strength. Zero is no word.
type StrengthKind uint8

// The words: meaning of a strength.
const (
	// StrengthKindMinimumFailing is "minimum failing": load that the part breaks at.
	StrengthKindMinimumFailing StrengthKind = 1
	// StrengthKindPermissible is "permissible": load that the maker permits.
	StrengthKindPermissible StrengthKind = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w StrengthKind) Text() string { return theStrengthKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w StrengthKind) Rank() int { return theStrengthKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (StrengthKind) List() *WordList { return theStrengthKindList }

var theStrengthKindList = &WordList{Name: "strength_kind", Title: "meaning of a strength", Ordered: false, Words: []string{"minimum failing", "permissible"}, Descriptions: []string{
	"load that the part breaks at",
	"load that the maker permits",
}}

// LoadDirection is a word of this list: direction of a load. Zero is no word.
type LoadDirection uint8

// The words: direction of a load.
const (
	// LoadDirectionBending is "bending": across the axis of the support.
	LoadDirectionBending LoadDirection = 1
	// LoadDirectionCompression is "compression": along its axis.
	LoadDirectionCompression LoadDirection = 2
	// LoadDirectionTension is "tension": along its axis and pulling.
	LoadDirectionTension LoadDirection = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w LoadDirection) Text() string { return theLoadDirectionList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w LoadDirection) Rank() int { return theLoadDirectionList.Rank(int(w)) }

// List returns the list the word belongs to.
func (LoadDirection) List() *WordList { return theLoadDirectionList }

var theLoadDirectionList = &WordList{Name: "load_direction", Title: "direction of a load", Ordered: false, Words: []string{"bending", "compression", "tension"}, Descriptions: []string{
	"across the axis of the support",
	"along its axis",
	"along its axis and pulling",
}}

// ConductorMeasure is a word of this list: measure that makes a short-circuit unlikely. Zero is no word.
type ConductorMeasure uint8

// The words: measure that makes a short-circuit unlikely.
const (
	// ConductorMeasureNoMeasure is "no measure": none of the measures below.
	ConductorMeasureNoMeasure ConductorMeasure = 1
	// ConductorMeasureKeptApart is "kept apart": bare or basic insulated conductors held apart by spacers.
	ConductorMeasureKeptApart ConductorMeasure = 2
	// ConductorMeasureHeatResistantInsulation is "heat-resistant insulation": single cores with basic insulation
	// for at least 90 °C.
	ConductorMeasureHeatResistantInsulation ConductorMeasure = 3
	// ConductorMeasureExtraCovering is "extra covering": basic insulation with shrink sleeve or own conduit.
	ConductorMeasureExtraCovering ConductorMeasure = 4
	// ConductorMeasureDoubleInsulated is "double insulated": double or reinforced insulation or of very high
	// mechanical strength.
	ConductorMeasureDoubleInsulated ConductorMeasure = 5
	// ConductorMeasureSheathed is "sheathed": sheathed cables.
	ConductorMeasureSheathed ConductorMeasure = 6
	// ConductorMeasureFullyInsulated is "fully insulated": bars and joints enclosed in insulation all round.
	ConductorMeasureFullyInsulated ConductorMeasure = 7
)

// Text returns the word as the file spells it, empty for zero.
func (w ConductorMeasure) Text() string { return theConductorMeasureList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ConductorMeasure) Rank() int { return theConductorMeasureList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ConductorMeasure) List() *WordList { return theConductorMeasureList }

var theConductorMeasureList = &WordList{Name: "conductor_measure", Title: "measure that makes a short-circuit unlikely", Ordered: false, Words: []string{"no measure", "kept apart", "heat-resistant insulation", "extra covering", "double insulated", "sheathed", "fully insulated"}, Descriptions: []string{
	"none of the measures below",
	"bare or basic insulated conductors held apart by spacers",
	"single cores with basic insulation for at least 90 °C",
	"basic insulation with shrink sleeve or own conduit",
	"double or reinforced insulation or of very high mechanical strength",
	"sheathed cables",
	"bars and joints enclosed in insulation all round",
}}

// UnitDuty is a word of this list: duty of a unit. Zero is no word.
type UnitDuty uint8

// The words: duty of a unit.
const (
	// UnitDutyIncomer is "incomer": brings a source to a section.
	UnitDutyIncomer UnitDuty = 1
	// UnitDutyCoupler is "coupler": joins two sections.
	UnitDutyCoupler UnitDuty = 2
	// UnitDutyFeeder is "feeder": feeds a circuit.
	UnitDutyFeeder UnitDuty = 3
	// UnitDutyMotorFeeder is "motor feeder": feeds a motor.
	UnitDutyMotorFeeder UnitDuty = 4
	// UnitDutyCapacitor is "capacitor": feeds a capacitor bank.
	UnitDutyCapacitor UnitDuty = 5
	// UnitDutyMetering is "metering": measures or supplies control circuits.
	UnitDutyMetering UnitDuty = 6
	// UnitDutySocketOutlets is "socket outlets": feeds socket outlets.
	UnitDutySocketOutlets UnitDuty = 7
	// UnitDutySpare is "spare": equipped and feeds nothing yet.
	UnitDutySpare UnitDuty = 8
	// UnitDutyEmpty is "empty": place without equipment.
	UnitDutyEmpty UnitDuty = 9
)

// Text returns the word as the file spells it, empty for zero.
func (w UnitDuty) Text() string { return theUnitDutyList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w UnitDuty) Rank() int { return theUnitDutyList.Rank(int(w)) }

// List returns the list the word belongs to.
func (UnitDuty) List() *WordList { return theUnitDutyList }

var theUnitDutyList = &WordList{Name: "unit_duty", Title: "duty of a unit", Ordered: false, Words: []string{"incomer", "coupler", "feeder", "motor feeder", "capacitor", "metering", "socket outlets", "spare", "empty"}, Descriptions: []string{
	"brings a source to a section",
	"joins two sections",
	"feeds a circuit",
	"feeds a motor",
	"feeds a capacitor bank",
	"measures or supplies control circuits",
	"feeds socket outlets",
	"equipped and feeds nothing yet",
	"place without equipment",
}}

// UnitPoles is a word of this list: poles of a unit. Zero is no word.
type UnitPoles uint8

// The words: poles of a unit.
const (
	// UnitPoles1 is "1": one pole.
	UnitPoles1 UnitPoles = 1
	// UnitPoles1AndN is "1+N": one pole and neutral.
	UnitPoles1AndN UnitPoles = 2
	// UnitPoles2 is "2": two poles.
	UnitPoles2 UnitPoles = 3
	// UnitPoles3 is "3": three poles and no neutral in the unit.
	UnitPoles3 UnitPoles = 4
	// UnitPoles3AndN is "3+N": three poles and a neutral that is not switched.
	UnitPoles3AndN UnitPoles = 5
	// UnitPoles4 is "4": four poles and the neutral is switched.
	UnitPoles4 UnitPoles = 6
)

// Text returns the word as the file spells it, empty for zero.
func (w UnitPoles) Text() string { return theUnitPolesList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w UnitPoles) Rank() int { return theUnitPolesList.Rank(int(w)) }

// List returns the list the word belongs to.
func (UnitPoles) List() *WordList { return theUnitPolesList }

var theUnitPolesList = &WordList{Name: "unit_poles", Title: "poles of a unit", Ordered: false, Words: []string{"1", "1+N", "2", "3", "3+N", "4"}, Descriptions: []string{
	"one pole",
	"one pole and neutral",
	"two poles",
	"three poles and no neutral in the unit",
	"three poles and a neutral that is not switched",
	"four poles and the neutral is switched",
}}

// UnitMounting is a word of this list: mounting of a unit. The words are in order, the lowest first. Zero is
// no word.
type UnitMounting uint8

// The words: mounting of a unit.
const (
	// UnitMountingFixed is "fixed": bolted in place.
	UnitMountingFixed UnitMounting = 1
	// UnitMountingRemovable is "removable": can be taken out with the board live.
	UnitMountingRemovable UnitMounting = 2
	// UnitMountingWithdrawable is "withdrawable": moves on guides into defined positions.
	UnitMountingWithdrawable UnitMounting = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w UnitMounting) Text() string { return theUnitMountingList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w UnitMounting) Rank() int { return theUnitMountingList.Rank(int(w)) }

// List returns the list the word belongs to.
func (UnitMounting) List() *WordList { return theUnitMountingList }

var theUnitMountingList = &WordList{Name: "unit_mounting", Title: "mounting of a unit", Ordered: true, Words: []string{"fixed", "removable", "withdrawable"}, Descriptions: []string{
	"bolted in place",
	"can be taken out with the board live",
	"moves on guides into defined positions",
}}

// UnitPosition is a word of this list: position of a withdrawable unit. Zero is no word.
type UnitPosition uint8

// The words: position of a withdrawable unit.
const (
	// UnitPositionConnected is "connected": all circuits connected.
	UnitPositionConnected UnitPosition = 1
	// UnitPositionTest is "test": main circuit open and auxiliary circuits connected.
	UnitPositionTest UnitPosition = 2
	// UnitPositionIsolated is "isolated": isolating distance in all circuits.
	UnitPositionIsolated UnitPosition = 3
	// UnitPositionRemoved is "removed": out of the board.
	UnitPositionRemoved UnitPosition = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w UnitPosition) Text() string { return theUnitPositionList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w UnitPosition) Rank() int { return theUnitPositionList.Rank(int(w)) }

// List returns the list the word belongs to.
func (UnitPosition) List() *WordList { return theUnitPositionList }

var theUnitPositionList = &WordList{Name: "unit_position", Title: "position of a withdrawable unit", Ordered: false, Words: []string{"connected", "test", "isolated", "removed"}, Descriptions: []string{
	"all circuits connected",
	"main circuit open and auxiliary circuits connected",
	"isolating distance in all circuits",
	"out of the board",
}}

// UnitInterlock is a word of this list: interlock of a unit. Zero is no word.
type UnitInterlock uint8

// The words: interlock of a unit.
const (
	// UnitInterlockNoMovementWhenClosed is "no movement when closed": unit cannot be moved with the device
	// closed.
	UnitInterlockNoMovementWhenClosed UnitInterlock = 1
	// UnitInterlockNotClosableBetweenPositions is "not closable between positions": device cannot be closed
	// between two positions.
	UnitInterlockNotClosableBetweenPositions UnitInterlock = 2
	// UnitInterlockDoor is "door": door opens and closes only with the unit out of the connected position.
	UnitInterlockDoor UnitInterlock = 3
	// UnitInterlockCoding is "coding": place refuses a unit of another rating or polarity.
	UnitInterlockCoding UnitInterlock = 4
	// UnitInterlockAuxiliaryPlugOrder is "auxiliary plug order": auxiliary plug makes and breaks in a safe
	// order.
	UnitInterlockAuxiliaryPlugOrder UnitInterlock = 5
	// UnitInterlockProtectiveContactOrder is "protective contact order": protective contact makes first and
	// breaks last.
	UnitInterlockProtectiveContactOrder UnitInterlock = 6
	// UnitInterlockNoShutterBeforeIsolation is "no shutter before isolation": shutters cannot be opened before
	// the unit is isolated.
	UnitInterlockNoShutterBeforeIsolation UnitInterlock = 7
	// UnitInterlockPadlockInIsolatedPosition is "padlock in isolated position": unit can be padlocked in the
	// isolated position.
	UnitInterlockPadlockInIsolatedPosition UnitInterlock = 8
)

// Text returns the word as the file spells it, empty for zero.
func (w UnitInterlock) Text() string { return theUnitInterlockList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w UnitInterlock) Rank() int { return theUnitInterlockList.Rank(int(w)) }

// List returns the list the word belongs to.
func (UnitInterlock) List() *WordList { return theUnitInterlockList }

var theUnitInterlockList = &WordList{Name: "unit_interlock", Title: "interlock of a unit", Ordered: false, Words: []string{"no movement when closed", "not closable between positions", "door", "coding", "auxiliary plug order", "protective contact order", "no shutter before isolation", "padlock in isolated position"}, Descriptions: []string{
	"unit cannot be moved with the device closed",
	"device cannot be closed between two positions",
	"door opens and closes only with the unit out of the connected position",
	"place refuses a unit of another rating or polarity",
	"auxiliary plug makes and breaks in a safe order",
	"protective contact makes first and breaks last",
	"shutters cannot be opened before the unit is isolated",
	"unit can be padlocked in the isolated position",
}}

// ShutterLock is a word of this list: locking of the shutters. The words are in order, the lowest first. Zero
// is no word.
type ShutterLock uint8

// The words: locking of the shutters.
const (
	// ShutterLockNotLockable is "not lockable": no padlock can be fitted.
	ShutterLockNotLockable ShutterLock = 1
	// ShutterLockBothTogether is "both together": one padlock holds both sides.
	ShutterLockBothTogether ShutterLock = 2
	// ShutterLockEachSide is "each side": busbar side and cable side separately.
	ShutterLockEachSide ShutterLock = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w ShutterLock) Text() string { return theShutterLockList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ShutterLock) Rank() int { return theShutterLockList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ShutterLock) List() *WordList { return theShutterLockList }

var theShutterLockList = &WordList{Name: "shutter_lock", Title: "locking of the shutters", Ordered: true, Words: []string{"not lockable", "both together", "each side"}, Descriptions: []string{
	"no padlock can be fitted",
	"one padlock holds both sides",
	"busbar side and cable side separately",
}}

// DeviceKind is a word of this list: kind of switching device. Zero is no word.
type DeviceKind uint8

// The words: kind of switching device.
const (
	// DeviceKindAirCircuitBreaker is "air circuit-breaker": open frame breaker.
	DeviceKindAirCircuitBreaker DeviceKind = 1
	// DeviceKindMouldedCaseCircuitBreaker is "moulded-case circuit-breaker": breaker in a moulded case.
	DeviceKindMouldedCaseCircuitBreaker DeviceKind = 2
	// DeviceKindMiniatureCircuitBreaker is "miniature circuit-breaker": modular breaker.
	DeviceKindMiniatureCircuitBreaker DeviceKind = 3
	// DeviceKindMotorProtectiveCircuitBreaker is "motor-protective circuit-breaker": breaker for one motor.
	DeviceKindMotorProtectiveCircuitBreaker DeviceKind = 4
	// DeviceKindSwitchDisconnector is "switch-disconnector": switch with isolating function.
	DeviceKindSwitchDisconnector DeviceKind = 5
	// DeviceKindFuseSwitchDisconnector is "fuse-switch-disconnector": fuses move with the contacts.
	DeviceKindFuseSwitchDisconnector DeviceKind = 6
	// DeviceKindSwitchDisconnectorFuse is "switch-disconnector-fuse": fuses in series with a switch.
	DeviceKindSwitchDisconnectorFuse DeviceKind = 7
	// DeviceKindFuses is "fuses": fuses alone.
	DeviceKindFuses DeviceKind = 8
	// DeviceKindContactor is "contactor": contactor without own protection.
	DeviceKindContactor DeviceKind = 9
	// DeviceKindDisconnector is "disconnector": not for switching load.
	DeviceKindDisconnector DeviceKind = 10
)

// Text returns the word as the file spells it, empty for zero.
func (w DeviceKind) Text() string { return theDeviceKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w DeviceKind) Rank() int { return theDeviceKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (DeviceKind) List() *WordList { return theDeviceKindList }

var theDeviceKindList = &WordList{Name: "device_kind", Title: "kind of switching device", Ordered: false, Words: []string{"air circuit-breaker", "moulded-case circuit-breaker", "miniature circuit-breaker", "motor-protective circuit-breaker", "switch-disconnector", "fuse-switch-disconnector", "switch-disconnector-fuse", "fuses", "contactor", "disconnector"}, Descriptions: []string{
	"open frame breaker",
	"breaker in a moulded case",
	"modular breaker",
	"breaker for one motor",
	"switch with isolating function",
	"fuses move with the contacts",
	"fuses in series with a switch",
	"fuses alone",
	"contactor without own protection",
	"not for switching load",
}}

// UtilisationCategory is a word of this list: utilisation category. Zero is no word.
type UtilisationCategory uint8

// The words: utilisation category.
const (
	// UtilisationCategoryA is "A": breaker without intended delay.
	UtilisationCategoryA UtilisationCategory = 1
	// UtilisationCategoryB is "B": breaker with intended delay.
	UtilisationCategoryB UtilisationCategory = 2
	// UtilisationCategoryAC1 is "AC-1": resistive load.
	UtilisationCategoryAC1 UtilisationCategory = 3
	// UtilisationCategoryAC2 is "AC-2": slip-ring motor.
	UtilisationCategoryAC2 UtilisationCategory = 4
	// UtilisationCategoryAC3 is "AC-3": squirrel-cage motor running.
	UtilisationCategoryAC3 UtilisationCategory = 5
	// UtilisationCategoryAC4 is "AC-4": squirrel-cage motor inching.
	UtilisationCategoryAC4 UtilisationCategory = 6
	// UtilisationCategoryAC20A is "AC-20A": no-load switching.
	UtilisationCategoryAC20A UtilisationCategory = 7
	// UtilisationCategoryAC21A is "AC-21A": resistive load and often.
	UtilisationCategoryAC21A UtilisationCategory = 8
	// UtilisationCategoryAC21B is "AC-21B": resistive load and seldom.
	UtilisationCategoryAC21B UtilisationCategory = 9
	// UtilisationCategoryAC22A is "AC-22A": mixed load and often.
	UtilisationCategoryAC22A UtilisationCategory = 10
	// UtilisationCategoryAC22B is "AC-22B": mixed load and seldom.
	UtilisationCategoryAC22B UtilisationCategory = 11
	// UtilisationCategoryAC23A is "AC-23A": motor load and often.
	UtilisationCategoryAC23A UtilisationCategory = 12
	// UtilisationCategoryAC23B is "AC-23B": motor load and seldom.
	UtilisationCategoryAC23B UtilisationCategory = 13
	// UtilisationCategoryAC6b is "AC-6b": capacitor bank.
	UtilisationCategoryAC6b UtilisationCategory = 14
)

// Text returns the word as the file spells it, empty for zero.
func (w UtilisationCategory) Text() string { return theUtilisationCategoryList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w UtilisationCategory) Rank() int { return theUtilisationCategoryList.Rank(int(w)) }

// List returns the list the word belongs to.
func (UtilisationCategory) List() *WordList { return theUtilisationCategoryList }

var theUtilisationCategoryList = &WordList{Name: "utilisation_category", Title: "utilisation category", Ordered: false, Words: []string{"A", "B", "AC-1", "AC-2", "AC-3", "AC-4", "AC-20A", "AC-21A", "AC-21B", "AC-22A", "AC-22B", "AC-23A", "AC-23B", "AC-6b"}, Descriptions: []string{
	"breaker without intended delay",
	"breaker with intended delay",
	"resistive load",
	"slip-ring motor",
	"squirrel-cage motor running",
	"squirrel-cage motor inching",
	"no-load switching",
	"resistive load and often",
	"resistive load and seldom",
	"mixed load and often",
	"mixed load and seldom",
	"motor load and often",
	"motor load and seldom",
	"capacitor bank",
}}

// IsolatingFunction is a word of this list: isolating function. The words are in order, the lowest first.
// Zero is no word.
type IsolatingFunction uint8

// The words: isolating function.
const (
	// IsolatingFunctionNotSuitable is "not suitable": not for isolation.
	IsolatingFunctionNotSuitable IsolatingFunction = 1
	// IsolatingFunctionSuitable is "suitable": suitable for isolation with reliable indication.
	IsolatingFunctionSuitable IsolatingFunction = 2
	// IsolatingFunctionVisibleGap is "visible gap": isolating gap can be seen.
	IsolatingFunctionVisibleGap IsolatingFunction = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w IsolatingFunction) Text() string { return theIsolatingFunctionList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w IsolatingFunction) Rank() int { return theIsolatingFunctionList.Rank(int(w)) }

// List returns the list the word belongs to.
func (IsolatingFunction) List() *WordList { return theIsolatingFunctionList }

var theIsolatingFunctionList = &WordList{Name: "isolating_function", Title: "isolating function", Ordered: true, Words: []string{"not suitable", "suitable", "visible gap"}, Descriptions: []string{
	"not for isolation",
	"suitable for isolation with reliable indication",
	"isolating gap can be seen",
}}

// FedThrough is a word of this list: what feeds the load. Zero is no word.
type FedThrough uint8

// The words: what feeds the load.
const (
	// FedThroughDirect is "direct": contactor or breaker.
	FedThroughDirect FedThrough = 1
	// FedThroughStarDelta is "star-delta": star-delta starter.
	FedThroughStarDelta FedThrough = 2
	// FedThroughSoftStarter is "soft starter": soft starter in circuit all the time.
	FedThroughSoftStarter FedThrough = 3
	// FedThroughSoftStarterBypassed is "soft starter bypassed": soft starter bypassed after the start.
	FedThroughSoftStarterBypassed FedThrough = 4
	// FedThroughConverter is "converter": converter that cannot feed back.
	FedThroughConverter FedThrough = 5
	// FedThroughRegenerativeConverter is "regenerative converter": converter that can feed back.
	FedThroughRegenerativeConverter FedThrough = 6
)

// Text returns the word as the file spells it, empty for zero.
func (w FedThrough) Text() string { return theFedThroughList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w FedThrough) Rank() int { return theFedThroughList.Rank(int(w)) }

// List returns the list the word belongs to.
func (FedThrough) List() *WordList { return theFedThroughList }

var theFedThroughList = &WordList{Name: "fed_through", Title: "what feeds the load", Ordered: false, Words: []string{"direct", "star-delta", "soft starter", "soft starter bypassed", "converter", "regenerative converter"}, Descriptions: []string{
	"contactor or breaker",
	"star-delta starter",
	"soft starter in circuit all the time",
	"soft starter bypassed after the start",
	"converter that cannot feed back",
	"converter that can feed back",
}}

// StarterCoordination is a word of this list: coordination of starter and protection. The words are in order,
// the lowest first. Zero is no word.
type StarterCoordination uint8

// The words: coordination of starter and protection.
const (
	// StarterCoordinationType1 is "type 1": no danger and repair may be needed.
	StarterCoordinationType1 StarterCoordination = 1
	// StarterCoordinationType2 is "type 2": fit for further use.
	StarterCoordinationType2 StarterCoordination = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w StarterCoordination) Text() string { return theStarterCoordinationList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w StarterCoordination) Rank() int { return theStarterCoordinationList.Rank(int(w)) }

// List returns the list the word belongs to.
func (StarterCoordination) List() *WordList { return theStarterCoordinationList }

var theStarterCoordinationList = &WordList{Name: "starter_coordination", Title: "coordination of starter and protection", Ordered: true, Words: []string{"type 1", "type 2"}, Descriptions: []string{
	"no danger and repair may be needed",
	"fit for further use",
}}

// TerminalShrouding is a word of this list: protection of the terminals. The words are in order, the lowest
// first. Zero is no word.
type TerminalShrouding uint8

// The words: protection of the terminals.
const (
	// TerminalShroudingOpen is "open": terminals open.
	TerminalShroudingOpen TerminalShrouding = 1
	// TerminalShroudingShrouded is "shrouded": terminals shrouded.
	TerminalShroudingShrouded TerminalShrouding = 2
	// TerminalShroudingEnclosed is "enclosed": terminals in an enclosure of their own.
	TerminalShroudingEnclosed TerminalShrouding = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w TerminalShrouding) Text() string { return theTerminalShroudingList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TerminalShrouding) Rank() int { return theTerminalShroudingList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TerminalShrouding) List() *WordList { return theTerminalShroudingList }

var theTerminalShroudingList = &WordList{Name: "terminal_shrouding", Title: "protection of the terminals", Ordered: true, Words: []string{"open", "shrouded", "enclosed"}, Descriptions: []string{
	"terminals open",
	"terminals shrouded",
	"terminals in an enclosure of their own",
}}

// TerminalBarrier is a word of this list: barrier round line terminals. The words are in order, the lowest
// first. Zero is no word.
type TerminalBarrier uint8

// The words: barrier round line terminals.
const (
	// TerminalBarrierNoBarrier is "no barrier": line terminals open to the compartment.
	TerminalBarrierNoBarrier TerminalBarrier = 1
	// TerminalBarrierInsulating is "insulating": insulating barrier.
	TerminalBarrierInsulating TerminalBarrier = 2
	// TerminalBarrierEarthedMetal is "earthed metal": earthed metal barrier.
	TerminalBarrierEarthedMetal TerminalBarrier = 3
	// TerminalBarrierArcTested is "arc-tested": earthed metal barrier tested against an arc.
	TerminalBarrierArcTested TerminalBarrier = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w TerminalBarrier) Text() string { return theTerminalBarrierList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TerminalBarrier) Rank() int { return theTerminalBarrierList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TerminalBarrier) List() *WordList { return theTerminalBarrierList }

var theTerminalBarrierList = &WordList{Name: "terminal_barrier", Title: "barrier round line terminals", Ordered: true, Words: []string{"no barrier", "insulating", "earthed metal", "arc-tested"}, Descriptions: []string{
	"line terminals open to the compartment",
	"insulating barrier",
	"earthed metal barrier",
	"earthed metal barrier tested against an arc",
}}

// PlugContacts is a word of this list: kind of plug contacts. Zero is no word.
type PlugContacts uint8

// The words: kind of plug contacts.
const (
	// PlugContactsFingers is "fingers": spring-loaded fingers.
	PlugContactsFingers PlugContacts = 1
	// PlugContactsOpposedFingers is "opposed fingers": pairs of fingers gripping one blade.
	PlugContactsOpposedFingers PlugContacts = 2
	// PlugContactsJaws is "jaws": blade in jaws.
	PlugContactsJaws PlugContacts = 3
	// PlugContactsContactBands is "contact bands": contact bands on a pin.
	PlugContactsContactBands PlugContacts = 4
	// PlugContactsBolted is "bolted": bolted and no plug.
	PlugContactsBolted PlugContacts = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w PlugContacts) Text() string { return thePlugContactsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w PlugContacts) Rank() int { return thePlugContactsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (PlugContacts) List() *WordList { return thePlugContactsList }

var thePlugContactsList = &WordList{Name: "plug_contacts", Title: "kind of plug contacts", Ordered: false, Words: []string{"fingers", "opposed fingers", "jaws", "contact bands", "bolted"}, Descriptions: []string{
	"spring-loaded fingers",
	"pairs of fingers gripping one blade",
	"blade in jaws",
	"contact bands on a pin",
	"bolted and no plug",
}}

// GlandPlate is a word of this list: kind of gland plate. Zero is no word.
type GlandPlate uint8

// The words: kind of gland plate.
const (
	// GlandPlateOpenEntry is "open entry": no plate.
	GlandPlateOpenEntry GlandPlate = 1
	// GlandPlateFixed is "fixed": part of the enclosure.
	GlandPlateFixed GlandPlate = 2
	// GlandPlateRemovable is "removable": removable and shared.
	GlandPlateRemovable GlandPlate = 3
	// GlandPlateOnePerCircuit is "one per circuit": removable and one for each circuit.
	GlandPlateOnePerCircuit GlandPlate = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w GlandPlate) Text() string { return theGlandPlateList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w GlandPlate) Rank() int { return theGlandPlateList.Rank(int(w)) }

// List returns the list the word belongs to.
func (GlandPlate) List() *WordList { return theGlandPlateList }

var theGlandPlateList = &WordList{Name: "gland_plate", Title: "kind of gland plate", Ordered: false, Words: []string{"open entry", "fixed", "removable", "one per circuit"}, Descriptions: []string{
	"no plate",
	"part of the enclosure",
	"removable and shared",
	"removable and one for each circuit",
}}

// GlandPlateMaterial is a word of this list: material of the gland plate. Zero is no word.
type GlandPlateMaterial uint8

// The words: material of the gland plate.
const (
	// GlandPlateMaterialSteel is "steel": closed steel.
	GlandPlateMaterialSteel GlandPlateMaterial = 1
	// GlandPlateMaterialSlottedSteel is "slotted steel": steel slotted between the cores.
	GlandPlateMaterialSlottedSteel GlandPlateMaterial = 2
	// GlandPlateMaterialNonMagnetic is "non-magnetic": aluminium stainless steel or insulating.
	GlandPlateMaterialNonMagnetic GlandPlateMaterial = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w GlandPlateMaterial) Text() string { return theGlandPlateMaterialList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w GlandPlateMaterial) Rank() int { return theGlandPlateMaterialList.Rank(int(w)) }

// List returns the list the word belongs to.
func (GlandPlateMaterial) List() *WordList { return theGlandPlateMaterialList }

var theGlandPlateMaterialList = &WordList{Name: "gland_plate_material", Title: "material of the gland plate", Ordered: false, Words: []string{"steel", "slotted steel", "non-magnetic"}, Descriptions: []string{
	"closed steel",
	"steel slotted between the cores",
	"aluminium stainless steel or insulating",
}}

// CableEntry is a word of this list: side of the cable entry. Zero is no word.
type CableEntry uint8

// The words: side of the cable entry.
const (
	// CableEntryTop is "top": from above.
	CableEntryTop CableEntry = 1
	// CableEntryBottom is "bottom": from below.
	CableEntryBottom CableEntry = 2
	// CableEntrySide is "side": from the side.
	CableEntrySide CableEntry = 3
	// CableEntryRear is "rear": from the rear.
	CableEntryRear CableEntry = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w CableEntry) Text() string { return theCableEntryList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CableEntry) Rank() int { return theCableEntryList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CableEntry) List() *WordList { return theCableEntryList }

var theCableEntryList = &WordList{Name: "cable_entry", Title: "side of the cable entry", Ordered: false, Words: []string{"top", "bottom", "side", "rear"}, Descriptions: []string{
	"from above",
	"from below",
	"from the side",
	"from the rear",
}}

// DeviceSide is a word of this list: side of a device. Zero is no word.
type DeviceSide uint8

// The words: side of a device.
const (
	// DeviceSideLineSide is "line side": towards the source or the section named first.
	DeviceSideLineSide DeviceSide = 1
	// DeviceSideLoadSide is "load side": towards the load or the section named second.
	DeviceSideLoadSide DeviceSide = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w DeviceSide) Text() string { return theDeviceSideList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w DeviceSide) Rank() int { return theDeviceSideList.Rank(int(w)) }

// List returns the list the word belongs to.
func (DeviceSide) List() *WordList { return theDeviceSideList }

var theDeviceSideList = &WordList{Name: "device_side", Title: "side of a device", Ordered: false, Words: []string{"line side", "load side"}, Descriptions: []string{
	"towards the source or the section named first",
	"towards the load or the section named second",
}}

// TapUse is a word of this list: use of a tap-off. Zero is no word.
type TapUse uint8

// The words: use of a tap-off.
const (
	// TapUseVoltageMeasurement is "voltage measurement": voltmeter or voltage transformer.
	TapUseVoltageMeasurement TapUse = 1
	// TapUseControlSupply is "control supply": control transformer or auxiliary supply.
	TapUseControlSupply TapUse = 2
	// TapUseSurgeProtection is "surge protection": surge protective devices.
	TapUseSurgeProtection TapUse = 3
	// TapUseArcRelaySupply is "arc relay supply": supply of the arc detection.
	TapUseArcRelaySupply TapUse = 4
	// TapUseMetering is "metering": tariff or energy meter.
	TapUseMetering TapUse = 5
	// TapUseHeating is "heating": heaters and lights.
	TapUseHeating TapUse = 6
	// TapUseEarthFaultMeasurement is "earth-fault measurement": voltage for earth-fault protection.
	TapUseEarthFaultMeasurement TapUse = 7
	// TapUseOther is "other": said in remark.
	TapUseOther TapUse = 8
)

// Text returns the word as the file spells it, empty for zero.
func (w TapUse) Text() string { return theTapUseList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TapUse) Rank() int { return theTapUseList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TapUse) List() *WordList { return theTapUseList }

var theTapUseList = &WordList{Name: "tap_use", Title: "use of a tap-off", Ordered: false, Words: []string{"voltage measurement", "control supply", "surge protection", "arc relay supply", "metering", "heating", "earth-fault measurement", "other"}, Descriptions: []string{
	"voltmeter or voltage transformer",
	"control transformer or auxiliary supply",
	"surge protective devices",
	"supply of the arc detection",
	"tariff or energy meter",
	"heaters and lights",
	"voltage for earth-fault protection",
	"said in remark",
}}

// TapProtectionKind is a word of this list: protection of a tap-off. Zero is no word.
type TapProtectionKind uint8

// The words: protection of a tap-off.
const (
	// TapProtectionKindFuse is "fuse": fuse.
	TapProtectionKindFuse TapProtectionKind = 1
	// TapProtectionKindMiniatureCircuitBreaker is "miniature circuit-breaker": modular breaker.
	TapProtectionKindMiniatureCircuitBreaker TapProtectionKind = 2
	// TapProtectionKindMouldedCaseCircuitBreaker is "moulded-case circuit-breaker": breaker in a moulded case.
	TapProtectionKindMouldedCaseCircuitBreaker TapProtectionKind = 3
	// TapProtectionKindMotorProtectiveCircuitBreaker is "motor-protective circuit-breaker": breaker for one
	// motor.
	TapProtectionKindMotorProtectiveCircuitBreaker TapProtectionKind = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w TapProtectionKind) Text() string { return theTapProtectionKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TapProtectionKind) Rank() int { return theTapProtectionKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TapProtectionKind) List() *WordList { return theTapProtectionKindList }

var theTapProtectionKindList = &WordList{Name: "tap_protection_kind", Title: "protection of a tap-off", Ordered: false, Words: []string{"fuse", "miniature circuit-breaker", "moulded-case circuit-breaker", "motor-protective circuit-breaker"}, Descriptions: []string{
	"fuse",
	"modular breaker",
	"breaker in a moulded case",
	"breaker for one motor",
}}

// ProtectiveDeviceKind is a word of this list: kind of protective device. Zero is no word.
type ProtectiveDeviceKind uint8

// The words: kind of protective device.
const (
	// ProtectiveDeviceKindElectronicRelease is "electronic release": release with electronics.
	ProtectiveDeviceKindElectronicRelease ProtectiveDeviceKind = 1
	// ProtectiveDeviceKindThermalMagneticRelease is "thermal-magnetic release": bimetal and magnet.
	ProtectiveDeviceKindThermalMagneticRelease ProtectiveDeviceKind = 2
	// ProtectiveDeviceKindMagneticRelease is "magnetic release": magnet alone.
	ProtectiveDeviceKindMagneticRelease ProtectiveDeviceKind = 3
	// ProtectiveDeviceKindRelay is "relay": relay with own current transformers.
	ProtectiveDeviceKindRelay ProtectiveDeviceKind = 4
	// ProtectiveDeviceKindFuse is "fuse": fuse-link.
	ProtectiveDeviceKindFuse ProtectiveDeviceKind = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w ProtectiveDeviceKind) Text() string { return theProtectiveDeviceKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ProtectiveDeviceKind) Rank() int { return theProtectiveDeviceKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ProtectiveDeviceKind) List() *WordList { return theProtectiveDeviceKindList }

var theProtectiveDeviceKindList = &WordList{Name: "protective_device_kind", Title: "kind of protective device", Ordered: false, Words: []string{"electronic release", "thermal-magnetic release", "magnetic release", "relay", "fuse"}, Descriptions: []string{
	"release with electronics",
	"bimetal and magnet",
	"magnet alone",
	"relay with own current transformers",
	"fuse-link",
}}

// InverseCurve is a word of this list: shape of the time curve. Zero is no word.
type InverseCurve uint8

// The words: shape of the time curve.
const (
	// InverseCurveIECStandardInverse is "IEC standard inverse": k 0.14 and exponent 0.02.
	InverseCurveIECStandardInverse InverseCurve = 1
	// InverseCurveIECVeryInverse is "IEC very inverse": k 13.5 and exponent 1.
	InverseCurveIECVeryInverse InverseCurve = 2
	// InverseCurveIECExtremelyInverse is "IEC extremely inverse": k 80 and exponent 2.
	InverseCurveIECExtremelyInverse InverseCurve = 3
	// InverseCurveIECLongTimeInverse is "IEC long-time inverse": k 120 and exponent 1.
	InverseCurveIECLongTimeInverse InverseCurve = 4
	// InverseCurveIEEEModeratelyInverse is "IEEE moderately inverse": k 0.0515 exponent 0.02 and addend 0.114.
	InverseCurveIEEEModeratelyInverse InverseCurve = 5
	// InverseCurveIEEEVeryInverse is "IEEE very inverse": k 19.61 exponent 2 and addend 0.491.
	InverseCurveIEEEVeryInverse InverseCurve = 6
	// InverseCurveIEEEExtremelyInverse is "IEEE extremely inverse": k 28.2 exponent 2 and addend 0.1217.
	InverseCurveIEEEExtremelyInverse InverseCurve = 7
	// InverseCurveDefiniteTime is "definite time": one delay above the pickup.
	InverseCurveDefiniteTime InverseCurve = 8
)

// Text returns the word as the file spells it, empty for zero.
func (w InverseCurve) Text() string { return theInverseCurveList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w InverseCurve) Rank() int { return theInverseCurveList.Rank(int(w)) }

// List returns the list the word belongs to.
func (InverseCurve) List() *WordList { return theInverseCurveList }

var theInverseCurveList = &WordList{Name: "inverse_curve", Title: "shape of the time curve", Ordered: false, Words: []string{"IEC standard inverse", "IEC very inverse", "IEC extremely inverse", "IEC long-time inverse", "IEEE moderately inverse", "IEEE very inverse", "IEEE extremely inverse", "definite time"}, Descriptions: []string{
	"k 0.14 and exponent 0.02",
	"k 13.5 and exponent 1",
	"k 80 and exponent 2",
	"k 120 and exponent 1",
	"k 0.0515 exponent 0.02 and addend 0.114",
	"k 19.61 exponent 2 and addend 0.491",
	"k 28.2 exponent 2 and addend 0.1217",
	"one delay above the pickup",
}}

// MultipleOf is a word of this list: what a multiple refers to. Zero is no word.
type MultipleOf uint8

// The words: what a multiple refers to.
const (
	// MultipleOfSetting is "setting": the set pickup.
	MultipleOfSetting MultipleOf = 1
	// MultipleOfRatedCurrent is "rated current": the rated current of the device.
	MultipleOfRatedCurrent MultipleOf = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w MultipleOf) Text() string { return theMultipleOfList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w MultipleOf) Rank() int { return theMultipleOfList.Rank(int(w)) }

// List returns the list the word belongs to.
func (MultipleOf) List() *WordList { return theMultipleOfList }

var theMultipleOfList = &WordList{Name: "multiple_of", Title: "what a multiple refers to", Ordered: false, Words: []string{"setting", "rated current"}, Descriptions: []string{
	"the set pickup",
	"the rated current of the device",
}}

// I2tRamp is a word of this list: sloping part of the curve. Zero is no word.
type I2tRamp uint8

// The words: sloping part of the curve.
const (
	// I2tRampOn is "on": delay falls with the square of the current.
	I2tRampOn I2tRamp = 1
	// I2tRampOff is "off": delay constant.
	I2tRampOff I2tRamp = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w I2tRamp) Text() string { return theI2tRampList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w I2tRamp) Rank() int { return theI2tRampList.Rank(int(w)) }

// List returns the list the word belongs to.
func (I2tRamp) List() *WordList { return theI2tRampList }

var theI2tRampList = &WordList{Name: "i2t_ramp", Title: "sloping part of the curve", Ordered: false, Words: []string{"on", "off"}, Descriptions: []string{
	"delay falls with the square of the current",
	"delay constant",
}}

// FuseClass is a word of this list: class of a fuse-link. Zero is no word.
type FuseClass uint8

// The words: class of a fuse-link.
const (
	// FuseClassGG is "gG": full-range general purpose.
	FuseClassGG FuseClass = 1
	// FuseClassGM is "gM": full-range motor circuits.
	FuseClassGM FuseClass = 2
	// FuseClassAM is "aM": back-up for motors.
	FuseClassAM FuseClass = 3
	// FuseClassGR is "gR": full-range semiconductor.
	FuseClassGR FuseClass = 4
	// FuseClassAR is "aR": back-up semiconductor.
	FuseClassAR FuseClass = 5
	// FuseClassGS is "gS": full-range semiconductor and line.
	FuseClassGS FuseClass = 6
	// FuseClassClassJ is "class J": North American class J.
	FuseClassClassJ FuseClass = 7
	// FuseClassClassL is "class L": North American class L.
	FuseClassClassL FuseClass = 8
	// FuseClassClassT is "class T": North American class T.
	FuseClassClassT FuseClass = 9
	// FuseClassClassCC is "class CC": North American class CC.
	FuseClassClassCC FuseClass = 10
	// FuseClassClassRK1 is "class RK1": North American class RK1.
	FuseClassClassRK1 FuseClass = 11
	// FuseClassClassRK5 is "class RK5": North American class RK5.
	FuseClassClassRK5 FuseClass = 12
)

// Text returns the word as the file spells it, empty for zero.
func (w FuseClass) Text() string { return theFuseClassList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w FuseClass) Rank() int { return theFuseClassList.Rank(int(w)) }

// List returns the list the word belongs to.
func (FuseClass) List() *WordList { return theFuseClassList }

var theFuseClassList = &WordList{Name: "fuse_class", Title: "class of a fuse-link", Ordered: false, Words: []string{"gG", "gM", "aM", "gR", "aR", "gS", "class J", "class L", "class T", "class CC", "class RK1", "class RK5"}, Descriptions: []string{
	"full-range general purpose",
	"full-range motor circuits",
	"back-up for motors",
	"full-range semiconductor",
	"back-up semiconductor",
	"full-range semiconductor and line",
	"North American class J",
	"North American class L",
	"North American class T",
	"North American class CC",
	"North American class RK1",
	"North American class RK5",
}}

// SettingsSource is a word of this list: where settings come from. Zero is no word.
type SettingsSource uint8

// The words: where settings come from.
const (
	// SettingsSourceStudy is "study": proposed by the study.
	SettingsSourceStudy SettingsSource = 1
	// SettingsSourceAsLeftSheet is "as left sheet": read at the device when it was left.
	SettingsSourceAsLeftSheet SettingsSource = 2
	// SettingsSourceMakerDefault is "maker default": as delivered.
	SettingsSourceMakerDefault SettingsSource = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w SettingsSource) Text() string { return theSettingsSourceList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SettingsSource) Rank() int { return theSettingsSourceList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SettingsSource) List() *WordList { return theSettingsSourceList }

var theSettingsSourceList = &WordList{Name: "settings_source", Title: "where settings come from", Ordered: false, Words: []string{"study", "as left sheet", "maker default"}, Descriptions: []string{
	"proposed by the study",
	"read at the device when it was left",
	"as delivered",
}}

// EarthFaultMethod is a word of this list: method of measuring earth faults. Zero is no word.
type EarthFaultMethod uint8

// The words: method of measuring earth faults.
const (
	// EarthFaultMethodResidual is "residual": sum of the phase and neutral currents.
	EarthFaultMethodResidual EarthFaultMethod = 1
	// EarthFaultMethodNeutralReturn is "neutral return": current in the neutral-earth link.
	EarthFaultMethodNeutralReturn EarthFaultMethod = 2
	// EarthFaultMethodCoreBalance is "core balance": one transformer round all conductors.
	EarthFaultMethodCoreBalance EarthFaultMethod = 3
	// EarthFaultMethodRestricted is "restricted": difference over a zone from transformer to incomer.
	EarthFaultMethodRestricted EarthFaultMethod = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w EarthFaultMethod) Text() string { return theEarthFaultMethodList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w EarthFaultMethod) Rank() int { return theEarthFaultMethodList.Rank(int(w)) }

// List returns the list the word belongs to.
func (EarthFaultMethod) List() *WordList { return theEarthFaultMethodList }

var theEarthFaultMethodList = &WordList{Name: "earth_fault_method", Title: "method of measuring earth faults", Ordered: false, Words: []string{"residual", "neutral return", "core balance", "restricted"}, Descriptions: []string{
	"sum of the phase and neutral currents",
	"current in the neutral-earth link",
	"one transformer round all conductors",
	"difference over a zone from transformer to incomer",
}}

// SettingIndication is a word of this list: indication of a setting. Zero is no word.
type SettingIndication uint8

// The words: indication of a setting.
const (
	// SettingIndicationNoIndication is "no indication": not indicated.
	SettingIndicationNoIndication SettingIndication = 1
	// SettingIndicationLocal is "local": at the board.
	SettingIndicationLocal SettingIndication = 2
	// SettingIndicationRemote is "remote": away from the board.
	SettingIndicationRemote SettingIndication = 3
	// SettingIndicationLocalAndRemote is "local and remote": both.
	SettingIndicationLocalAndRemote SettingIndication = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w SettingIndication) Text() string { return theSettingIndicationList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w SettingIndication) Rank() int { return theSettingIndicationList.Rank(int(w)) }

// List returns the list the word belongs to.
func (SettingIndication) List() *WordList { return theSettingIndicationList }

var theSettingIndicationList = &WordList{Name: "setting_indication", Title: "indication of a setting", Ordered: false, Words: []string{"no indication", "local", "remote", "local and remote"}, Descriptions: []string{
	"not indicated",
	"at the board",
	"away from the board",
	"both",
}}

// InterlockFailure is a word of this list: behaviour at a broken wire. Zero is no word.
type InterlockFailure uint8

// The words: behaviour at a broken wire.
const (
	// InterlockFailureDelayed is "delayed": keeps the set delay.
	InterlockFailureDelayed InterlockFailure = 1
	// InterlockFailureInstantaneous is "instantaneous": trips without delay.
	InterlockFailureInstantaneous InterlockFailure = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w InterlockFailure) Text() string { return theInterlockFailureList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w InterlockFailure) Rank() int { return theInterlockFailureList.Rank(int(w)) }

// List returns the list the word belongs to.
func (InterlockFailure) List() *WordList { return theInterlockFailureList }

var theInterlockFailureList = &WordList{Name: "interlock_failure", Title: "behaviour at a broken wire", Ordered: false, Words: []string{"delayed", "instantaneous"}, Descriptions: []string{
	"keeps the set delay",
	"trips without delay",
}}

// ArcClass is a word of this list: class of arc containment. The words are in order, the lowest first. Zero
// is no word.
type ArcClass uint8

// The words: class of arc containment.
const (
	// ArcClassI is "I": arc-ignition-protected zones only.
	ArcClassI ArcClass = 1
	// ArcClassA is "A": protection of persons.
	ArcClassA ArcClass = 2
	// ArcClassB is "B": as A and arc kept in the zone.
	ArcClassB ArcClass = 3
	// ArcClassC is "C": as B and limited further operation.
	ArcClassC ArcClass = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcClass) Text() string { return theArcClassList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcClass) Rank() int { return theArcClassList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcClass) List() *WordList { return theArcClassList }

var theArcClassList = &WordList{Name: "arc_class", Title: "class of arc containment", Ordered: true, Words: []string{"I", "A", "B", "C"}, Descriptions: []string{
	"arc-ignition-protected zones only",
	"protection of persons",
	"as A and arc kept in the zone",
	"as B and limited further operation",
}}

// ArcCriterion is a word of this list: criterion of the arc test. Zero is no word.
type ArcCriterion uint8

// The words: criterion of the arc test.
const (
	// ArcCriterion1 is "1": doors and covers stay closed.
	ArcCriterion1 ArcCriterion = 1
	// ArcCriterion2 is "2": no dangerous parts fly off.
	ArcCriterion2 ArcCriterion = 2
	// ArcCriterion3 is "3": no holes in accessible sides up to 2 m.
	ArcCriterion3 ArcCriterion = 3
	// ArcCriterion4 is "4": indicators do not ignite.
	ArcCriterion4 ArcCriterion = 4
	// ArcCriterion5 is "5": protective circuit effective.
	ArcCriterion5 ArcCriterion = 5
	// ArcCriterion6 is "6": arc kept in the defined zone.
	ArcCriterion6 ArcCriterion = 6
	// ArcCriterion7 is "7": emergency operation possible.
	ArcCriterion7 ArcCriterion = 7
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcCriterion) Text() string { return theArcCriterionList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcCriterion) Rank() int { return theArcCriterionList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcCriterion) List() *WordList { return theArcCriterionList }

var theArcCriterionList = &WordList{Name: "arc_criterion", Title: "criterion of the arc test", Ordered: false, Words: []string{"1", "2", "3", "4", "5", "6", "7"}, Descriptions: []string{
	"doors and covers stay closed",
	"no dangerous parts fly off",
	"no holes in accessible sides up to 2 m",
	"indicators do not ignite",
	"protective circuit effective",
	"arc kept in the defined zone",
	"emergency operation possible",
}}

// ArcSide is a word of this list: side of the board. Zero is no word.
type ArcSide uint8

// The words: side of the board.
const (
	// ArcSideFront is "front": front.
	ArcSideFront ArcSide = 1
	// ArcSideRear is "rear": rear.
	ArcSideRear ArcSide = 2
	// ArcSideLeft is "left": left as seen from the front.
	ArcSideLeft ArcSide = 3
	// ArcSideRight is "right": right as seen from the front.
	ArcSideRight ArcSide = 4
	// ArcSideTop is "top": top.
	ArcSideTop ArcSide = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcSide) Text() string { return theArcSideList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcSide) Rank() int { return theArcSideList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcSide) List() *WordList { return theArcSideList }

var theArcSideList = &WordList{Name: "arc_side", Title: "side of the board", Ordered: false, Words: []string{"front", "rear", "left", "right", "top"}, Descriptions: []string{
	"front",
	"rear",
	"left as seen from the front",
	"right as seen from the front",
	"top",
}}

// ArcResistantType is a word of this list: accessibility type. The words are in order, the lowest first. Zero
// is no word.
type ArcResistantType uint8

// The words: accessibility type.
const (
	// ArcResistantTypeType1 is "type 1": arc-resistant at the front.
	ArcResistantTypeType1 ArcResistantType = 1
	// ArcResistantTypeType2 is "type 2": arc-resistant at front back and sides.
	ArcResistantTypeType2 ArcResistantType = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcResistantType) Text() string { return theArcResistantTypeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcResistantType) Rank() int { return theArcResistantTypeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcResistantType) List() *WordList { return theArcResistantTypeList }

var theArcResistantTypeList = &WordList{Name: "arc_resistant_type", Title: "accessibility type", Ordered: true, Words: []string{"type 1", "type 2"}, Descriptions: []string{
	"arc-resistant at the front",
	"arc-resistant at front back and sides",
}}

// ArcResistantSuffix is a word of this list: suffix of the accessibility type. Zero is no word.
type ArcResistantSuffix uint8

// The words: suffix of the accessibility type.
const (
	// ArcResistantSuffixA is "A": no other suffix applies.
	ArcResistantSuffixA ArcResistantSuffix = 1
	// ArcResistantSuffixB is "B": also with the instrument compartment open.
	ArcResistantSuffixB ArcResistantSuffix = 2
	// ArcResistantSuffixC is "C": no spread to neighbouring compartments.
	ArcResistantSuffixC ArcResistantSuffix = 3
	// ArcResistantSuffixD is "D": some outer faces excluded.
	ArcResistantSuffixD ArcResistantSuffix = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcResistantSuffix) Text() string { return theArcResistantSuffixList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcResistantSuffix) Rank() int { return theArcResistantSuffixList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcResistantSuffix) List() *WordList { return theArcResistantSuffixList }

var theArcResistantSuffixList = &WordList{Name: "arc_resistant_suffix", Title: "suffix of the accessibility type", Ordered: false, Words: []string{"A", "B", "C", "D"}, Descriptions: []string{
	"no other suffix applies",
	"also with the instrument compartment open",
	"no spread to neighbouring compartments",
	"some outer faces excluded",
}}

// ArcMeans is a word of this list: active or limiting means. Zero is no word.
type ArcMeans uint8

// The words: active or limiting means.
const (
	// ArcMeansDetection is "detection": detection that trips breakers.
	ArcMeansDetection ArcMeans = 1
	// ArcMeansQuenching is "quenching": quenching device.
	ArcMeansQuenching ArcMeans = 2
	// ArcMeansCurrentLimitingDevice is "current-limiting device": limiting breaker or fuses.
	ArcMeansCurrentLimitingDevice ArcMeans = 3
	// ArcMeansZoneInterlock is "zone interlock": zone-selective interlocking.
	ArcMeansZoneInterlock ArcMeans = 4
	// ArcMeansMaintenanceSetting is "maintenance setting": switched to a quicker setting.
	ArcMeansMaintenanceSetting ArcMeans = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcMeans) Text() string { return theArcMeansList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcMeans) Rank() int { return theArcMeansList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcMeans) List() *WordList { return theArcMeansList }

var theArcMeansList = &WordList{Name: "arc_means", Title: "active or limiting means", Ordered: false, Words: []string{"detection", "quenching", "current-limiting device", "zone interlock", "maintenance setting"}, Descriptions: []string{
	"detection that trips breakers",
	"quenching device",
	"limiting breaker or fuses",
	"zone-selective interlocking",
	"switched to a quicker setting",
}}

// ExhaustKind is a word of this list: kind of exhaust. Zero is no word.
type ExhaustKind uint8

// The words: kind of exhaust.
const (
	// ExhaustKindNoExhaust is "no exhaust": gases stay in the board.
	ExhaustKindNoExhaust ExhaustKind = 1
	// ExhaustKindFlaps is "flaps": flaps into the room.
	ExhaustKindFlaps ExhaustKind = 2
	// ExhaustKindDuct is "duct": duct.
	ExhaustKindDuct ExhaustKind = 3
	// ExhaustKindPlenum is "plenum": chamber over the board and duct.
	ExhaustKindPlenum ExhaustKind = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w ExhaustKind) Text() string { return theExhaustKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ExhaustKind) Rank() int { return theExhaustKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ExhaustKind) List() *WordList { return theExhaustKindList }

var theExhaustKindList = &WordList{Name: "exhaust_kind", Title: "kind of exhaust", Ordered: false, Words: []string{"no exhaust", "flaps", "duct", "plenum"}, Descriptions: []string{
	"gases stay in the board",
	"flaps into the room",
	"duct",
	"chamber over the board and duct",
}}

// ExhaustEnd is a word of this list: where the exhaust ends. Zero is no word.
type ExhaustEnd uint8

// The words: where the exhaust ends.
const (
	// ExhaustEndOutdoors is "outdoors": in the open air away from persons.
	ExhaustEndOutdoors ExhaustEnd = 1
	// ExhaustEndNeutralRoom is "neutral room": room that nobody enters in service.
	ExhaustEndNeutralRoom ExhaustEnd = 2
	// ExhaustEndSameRoom is "same room": room of the board.
	ExhaustEndSameRoom ExhaustEnd = 3
	// ExhaustEndCableBasement is "cable basement": cable space below.
	ExhaustEndCableBasement ExhaustEnd = 4
	// ExhaustEndEscapeRoute is "escape route": on a way out.
	ExhaustEndEscapeRoute ExhaustEnd = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w ExhaustEnd) Text() string { return theExhaustEndList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ExhaustEnd) Rank() int { return theExhaustEndList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ExhaustEnd) List() *WordList { return theExhaustEndList }

var theExhaustEndList = &WordList{Name: "exhaust_end", Title: "where the exhaust ends", Ordered: false, Words: []string{"outdoors", "neutral room", "same room", "cable basement", "escape route"}, Descriptions: []string{
	"in the open air away from persons",
	"room that nobody enters in service",
	"room of the board",
	"cable space below",
	"on a way out",
}}

// DetectionKind is a word of this list: what the detection measures. Zero is no word.
type DetectionKind uint8

// The words: what the detection measures.
const (
	// DetectionKindLight is "light": light alone.
	DetectionKindLight DetectionKind = 1
	// DetectionKindLightAndCurrent is "light and current": light confirmed by current.
	DetectionKindLightAndCurrent DetectionKind = 2
	// DetectionKindPressure is "pressure": pressure alone.
	DetectionKindPressure DetectionKind = 3
	// DetectionKindLightAndPressure is "light and pressure": light confirmed by pressure.
	DetectionKindLightAndPressure DetectionKind = 4
	// DetectionKindCurrent is "current": current alone.
	DetectionKindCurrent DetectionKind = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w DetectionKind) Text() string { return theDetectionKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w DetectionKind) Rank() int { return theDetectionKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (DetectionKind) List() *WordList { return theDetectionKindList }

var theDetectionKindList = &WordList{Name: "detection_kind", Title: "what the detection measures", Ordered: false, Words: []string{"light", "light and current", "pressure", "light and pressure", "current"}, Descriptions: []string{
	"light alone",
	"light confirmed by current",
	"pressure alone",
	"light confirmed by pressure",
	"current alone",
}}

// TimePart is a word of this list: part of a tripping time. Zero is no word.
type TimePart uint8

// The words: part of a tripping time.
const (
	// TimePartDetection is "detection": time of the sensor.
	TimePartDetection TimePart = 1
	// TimePartRelay is "relay": time of the relay and its output.
	TimePartRelay TimePart = 2
	// TimePartChannel is "channel": time of wiring or inter-trip link.
	TimePartChannel TimePart = 3
	// TimePartBreakTime is "break time": opening and arcing time of the slowest breaker.
	TimePartBreakTime TimePart = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w TimePart) Text() string { return theTimePartList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TimePart) Rank() int { return theTimePartList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TimePart) List() *WordList { return theTimePartList }

var theTimePartList = &WordList{Name: "time_part", Title: "part of a tripping time", Ordered: false, Words: []string{"detection", "relay", "channel", "break time"}, Descriptions: []string{
	"time of the sensor",
	"time of the relay and its output",
	"time of wiring or inter-trip link",
	"opening and arcing time of the slowest breaker",
}}

// QuenchingKind is a word of this list: kind of quenching device. Zero is no word.
type QuenchingKind uint8

// The words: kind of quenching device.
const (
	// QuenchingKindSingleShot is "single-shot": replaced after use.
	QuenchingKindSingleShot QuenchingKind = 1
	// QuenchingKindResettable is "resettable": ready again after reset.
	QuenchingKindResettable QuenchingKind = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w QuenchingKind) Text() string { return theQuenchingKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w QuenchingKind) Rank() int { return theQuenchingKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (QuenchingKind) List() *WordList { return theQuenchingKindList }

var theQuenchingKindList = &WordList{Name: "quenching_kind", Title: "kind of quenching device", Ordered: false, Words: []string{"single-shot", "resettable"}, Descriptions: []string{
	"replaced after use",
	"ready again after reset",
}}

// ElectrodeArrangement is a word of this list: electrode arrangement. Zero is no word.
type ElectrodeArrangement uint8

// The words: electrode arrangement.
const (
	// ElectrodeArrangementVCB is "VCB": vertical conductors in a box.
	ElectrodeArrangementVCB ElectrodeArrangement = 1
	// ElectrodeArrangementVCBB is "VCBB": vertical conductors ending in a barrier in a box.
	ElectrodeArrangementVCBB ElectrodeArrangement = 2
	// ElectrodeArrangementHCB is "HCB": horizontal conductors in a box.
	ElectrodeArrangementHCB ElectrodeArrangement = 3
	// ElectrodeArrangementVOA is "VOA": vertical conductors in open air.
	ElectrodeArrangementVOA ElectrodeArrangement = 4
	// ElectrodeArrangementHOA is "HOA": horizontal conductors in open air.
	ElectrodeArrangementHOA ElectrodeArrangement = 5
)

// Text returns the word as the file spells it, empty for zero.
func (w ElectrodeArrangement) Text() string { return theElectrodeArrangementList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ElectrodeArrangement) Rank() int { return theElectrodeArrangementList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ElectrodeArrangement) List() *WordList { return theElectrodeArrangementList }

var theElectrodeArrangementList = &WordList{Name: "electrode_arrangement", Title: "electrode arrangement", Ordered: false, Words: []string{"VCB", "VCBB", "HCB", "VOA", "HOA"}, Descriptions: []string{
	"vertical conductors in a box",
	"vertical conductors ending in a barrier in a box",
	"horizontal conductors in a box",
	"vertical conductors in open air",
	"horizontal conductors in open air",
}}

// Escape is a word of this list: way out of a work place. Zero is no word.
type Escape uint8

// The words: way out of a work place.
const (
	// EscapeFree is "free": person can step back at once.
	EscapeFree Escape = 1
	// EscapeHampered is "hampered": platform basement kneeling or confined.
	EscapeHampered Escape = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w Escape) Text() string { return theEscapeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Escape) Rank() int { return theEscapeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Escape) List() *WordList { return theEscapeList }

var theEscapeList = &WordList{Name: "escape", Title: "way out of a work place", Ordered: false, Words: []string{"free", "hampered"}, Descriptions: []string{
	"person can step back at once",
	"platform basement kneeling or confined",
}}

// ArcRoom is a word of this list: surroundings of the arc. Zero is no word.
type ArcRoom uint8

// The words: surroundings of the arc.
const (
	// ArcRoomSmallCompartment is "small compartment": small compartment with near walls.
	ArcRoomSmallCompartment ArcRoom = 1
	// ArcRoomLargerCompartment is "larger compartment": larger compartment limited mainly by its back.
	ArcRoomLargerCompartment ArcRoom = 2
	// ArcRoomOpen is "open": open arc.
	ArcRoomOpen ArcRoom = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcRoom) Text() string { return theArcRoomList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcRoom) Rank() int { return theArcRoomList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcRoom) List() *WordList { return theArcRoomList }

var theArcRoomList = &WordList{Name: "arc_room", Title: "surroundings of the arc", Ordered: false, Words: []string{"small compartment", "larger compartment", "open"}, Descriptions: []string{
	"small compartment with near walls",
	"larger compartment limited mainly by its back",
	"open arc",
}}

// OthersKeptOut is a word of this list: how others are kept away. Zero is no word.
type OthersKeptOut uint8

// The words: how others are kept away.
const (
	// OthersKeptOutBarrieredOff is "barriered off": barrier at the boundary.
	OthersKeptOutBarrieredOff OthersKeptOut = 1
	// OthersKeptOutWatched is "watched": a second person keeps others away.
	OthersKeptOutWatched OthersKeptOut = 2
	// OthersKeptOutNotKeptOut is "not kept out": nothing keeps others away.
	OthersKeptOutNotKeptOut OthersKeptOut = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w OthersKeptOut) Text() string { return theOthersKeptOutList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w OthersKeptOut) Rank() int { return theOthersKeptOutList.Rank(int(w)) }

// List returns the list the word belongs to.
func (OthersKeptOut) List() *WordList { return theOthersKeptOutList }

var theOthersKeptOutList = &WordList{Name: "others_kept_out", Title: "how others are kept away", Ordered: false, Words: []string{"barriered off", "watched", "not kept out"}, Descriptions: []string{
	"barrier at the boundary",
	"a second person keeps others away",
	"nothing keeps others away",
}}

// TaskKind is a word of this list: kind of task. Zero is no word.
type TaskKind uint8

// The words: kind of task.
const (
	// TaskKindOperating is "operating": operating with the handle or button.
	TaskKindOperating TaskKind = 1
	// TaskKindRacking is "racking": moving a unit.
	TaskKindRacking TaskKind = 2
	// TaskKindInspection is "inspection": looking without touching.
	TaskKindInspection TaskKind = 3
	// TaskKindInfraredInspection is "infrared inspection": looking with an infrared camera.
	TaskKindInfraredInspection TaskKind = 4
	// TaskKindTesting is "testing": measuring or testing.
	TaskKindTesting TaskKind = 5
	// TaskKindProvingDead is "proving dead": measuring absence of voltage.
	TaskKindProvingDead TaskKind = 6
	// TaskKindEarthing is "earthing": applying earths.
	TaskKindEarthing TaskKind = 7
	// TaskKindCableWork is "cable work": connecting or disconnecting cables.
	TaskKindCableWork TaskKind = 8
	// TaskKindRepair is "repair": exchange or repair.
	TaskKindRepair TaskKind = 9
	// TaskKindCleaning is "cleaning": cleaning.
	TaskKindCleaning TaskKind = 10
)

// Text returns the word as the file spells it, empty for zero.
func (w TaskKind) Text() string { return theTaskKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TaskKind) Rank() int { return theTaskKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TaskKind) List() *WordList { return theTaskKindList }

var theTaskKindList = &WordList{Name: "task_kind", Title: "kind of task", Ordered: false, Words: []string{"operating", "racking", "inspection", "infrared inspection", "testing", "proving dead", "earthing", "cable work", "repair", "cleaning"}, Descriptions: []string{
	"operating with the handle or button",
	"moving a unit",
	"looking without touching",
	"looking with an infrared camera",
	"measuring or testing",
	"measuring absence of voltage",
	"applying earths",
	"connecting or disconnecting cables",
	"exchange or repair",
	"cleaning",
}}

// TaskDoors is a word of this list: doors during the task. The words are in order, the lowest first. Zero is
// no word.
type TaskDoors uint8

// The words: doors during the task.
const (
	// TaskDoorsOpen is "open": door open or cover off.
	TaskDoorsOpen TaskDoors = 1
	// TaskDoorsClosed is "closed": closed and not secured.
	TaskDoorsClosed TaskDoors = 2
	// TaskDoorsClosedAndSecured is "closed and secured": closed with all fastenings.
	TaskDoorsClosedAndSecured TaskDoors = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w TaskDoors) Text() string { return theTaskDoorsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TaskDoors) Rank() int { return theTaskDoorsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TaskDoors) List() *WordList { return theTaskDoorsList }

var theTaskDoorsList = &WordList{Name: "task_doors", Title: "doors during the task", Ordered: true, Words: []string{"open", "closed", "closed and secured"}, Descriptions: []string{
	"door open or cover off",
	"closed and not secured",
	"closed with all fastenings",
}}

// TaskParts is a word of this list: state of the parts worked on. Zero is no word.
type TaskParts uint8

// The words: state of the parts worked on.
const (
	// TaskPartsLive is "live": under voltage.
	TaskPartsLive TaskParts = 1
	// TaskPartsTreatedAsLive is "treated as live": not yet proved dead.
	TaskPartsTreatedAsLive TaskParts = 2
	// TaskPartsDead is "dead": isolated and proved dead.
	TaskPartsDead TaskParts = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w TaskParts) Text() string { return theTaskPartsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w TaskParts) Rank() int { return theTaskPartsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (TaskParts) List() *WordList { return theTaskPartsList }

var theTaskPartsList = &WordList{Name: "task_parts", Title: "state of the parts worked on", Ordered: false, Words: []string{"live", "treated as live", "dead"}, Descriptions: []string{
	"under voltage",
	"not yet proved dead",
	"isolated and proved dead",
}}

// GloveClass is a word of this list: class of insulating gloves. The words are in order, the lowest first.
// Zero is no word.
type GloveClass uint8

// The words: class of insulating gloves.
const (
	// GloveClassClass00 is "class 00": up to 500 V a.c.
	GloveClassClass00 GloveClass = 1
	// GloveClassClass0 is "class 0": up to 1000 V a.c.
	GloveClassClass0 GloveClass = 2
	// GloveClassClass1 is "class 1": up to 7500 V a.c.
	GloveClassClass1 GloveClass = 3
	// GloveClassClass2 is "class 2": up to 17000 V a.c.
	GloveClassClass2 GloveClass = 4
	// GloveClassClass3 is "class 3": up to 26500 V a.c.
	GloveClassClass3 GloveClass = 5
	// GloveClassClass4 is "class 4": up to 36000 V a.c.
	GloveClassClass4 GloveClass = 6
)

// Text returns the word as the file spells it, empty for zero.
func (w GloveClass) Text() string { return theGloveClassList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w GloveClass) Rank() int { return theGloveClassList.Rank(int(w)) }

// List returns the list the word belongs to.
func (GloveClass) List() *WordList { return theGloveClassList }

var theGloveClassList = &WordList{Name: "glove_class", Title: "class of insulating gloves", Ordered: true, Words: []string{"class 00", "class 0", "class 1", "class 2", "class 3", "class 4"}, Descriptions: []string{
	"up to 500 V a.c.",
	"up to 1000 V a.c.",
	"up to 7500 V a.c.",
	"up to 17000 V a.c.",
	"up to 26500 V a.c.",
	"up to 36000 V a.c.",
}}

// HeadProtection is a word of this list: protection of head and face. The words are in order, the lowest
// first. Zero is no word.
type HeadProtection uint8

// The words: protection of head and face.
const (
	// HeadProtectionFaceShield is "face shield": arc-rated shield.
	HeadProtectionFaceShield HeadProtection = 1
	// HeadProtectionShieldAndBalaclava is "shield and balaclava": arc-rated shield and balaclava.
	HeadProtectionShieldAndBalaclava HeadProtection = 2
	// HeadProtectionHood is "hood": arc-rated hood.
	HeadProtectionHood HeadProtection = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w HeadProtection) Text() string { return theHeadProtectionList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w HeadProtection) Rank() int { return theHeadProtectionList.Rank(int(w)) }

// List returns the list the word belongs to.
func (HeadProtection) List() *WordList { return theHeadProtectionList }

var theHeadProtectionList = &WordList{Name: "head_protection", Title: "protection of head and face", Ordered: true, Words: []string{"face shield", "shield and balaclava", "hood"}, Descriptions: []string{
	"arc-rated shield",
	"arc-rated shield and balaclava",
	"arc-rated hood",
}}

// ArcRatingKind is a word of this list: kind of arc rating. Zero is no word.
type ArcRatingKind uint8

// The words: kind of arc rating.
const (
	// ArcRatingKindATPV is "ATPV": 50 % probability of a burn.
	ArcRatingKindATPV ArcRatingKind = 1
	// ArcRatingKindEBT is "EBT": breaks open.
	ArcRatingKindEBT ArcRatingKind = 2
	// ArcRatingKindELIM is "ELIM": no burn observed.
	ArcRatingKindELIM ArcRatingKind = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w ArcRatingKind) Text() string { return theArcRatingKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w ArcRatingKind) Rank() int { return theArcRatingKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (ArcRatingKind) List() *WordList { return theArcRatingKindList }

var theArcRatingKindList = &WordList{Name: "arc_rating_kind", Title: "kind of arc rating", Ordered: false, Words: []string{"ATPV", "EBT", "ELIM"}, Descriptions: []string{
	"50 % probability of a burn",
	"breaks open",
	"no burn observed",
}}

// PPEMethod is a word of this list: method of choosing clothing. Zero is no word.
type PPEMethod uint8

// The words: method of choosing clothing.
const (
	// PPEMethodIncidentEnergy is "incident energy": computed energy.
	PPEMethodIncidentEnergy PPEMethod = 1
	// PPEMethodBoxTest is "box test": arc protection class.
	PPEMethodBoxTest PPEMethod = 2
	// PPEMethodCategory is "category": category by table.
	PPEMethodCategory PPEMethod = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w PPEMethod) Text() string { return thePPEMethodList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w PPEMethod) Rank() int { return thePPEMethodList.Rank(int(w)) }

// List returns the list the word belongs to.
func (PPEMethod) List() *WordList { return thePPEMethodList }

var thePPEMethodList = &WordList{Name: "ppe_method", Title: "method of choosing clothing", Ordered: false, Words: []string{"incident energy", "box test", "category"}, Descriptions: []string{
	"computed energy",
	"arc protection class",
	"category by table",
}}

// DoorSwing is a word of this list: swing of open doors. Zero is no word.
type DoorSwing uint8

// The words: swing of open doors.
const (
	// DoorSwingClosesWithEscape is "closes with escape": doors close in the direction of escape.
	DoorSwingClosesWithEscape DoorSwing = 1
	// DoorSwingOpensAcrossEscape is "opens across escape": open doors stand in the way out.
	DoorSwingOpensAcrossEscape DoorSwing = 2
)

// Text returns the word as the file spells it, empty for zero.
func (w DoorSwing) Text() string { return theDoorSwingList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w DoorSwing) Rank() int { return theDoorSwingList.Rank(int(w)) }

// List returns the list the word belongs to.
func (DoorSwing) List() *WordList { return theDoorSwingList }

var theDoorSwingList = &WordList{Name: "door_swing", Title: "swing of open doors", Ordered: false, Words: []string{"closes with escape", "opens across escape"}, Descriptions: []string{
	"doors close in the direction of escape",
	"open doors stand in the way out",
}}

// GangwayOpposite is a word of this list: what faces the board. Zero is no word.
type GangwayOpposite uint8

// The words: what faces the board.
const (
	// GangwayOppositeNothingLiveOrEarthed is "nothing live or earthed": insulated or guarded.
	GangwayOppositeNothingLiveOrEarthed GangwayOpposite = 1
	// GangwayOppositeEarthedParts is "earthed parts": earthed parts or masonry.
	GangwayOppositeEarthedParts GangwayOpposite = 2
	// GangwayOppositeLiveParts is "live parts": live parts or another board.
	GangwayOppositeLiveParts GangwayOpposite = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w GangwayOpposite) Text() string { return theGangwayOppositeList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w GangwayOpposite) Rank() int { return theGangwayOppositeList.Rank(int(w)) }

// List returns the list the word belongs to.
func (GangwayOpposite) List() *WordList { return theGangwayOppositeList }

var theGangwayOppositeList = &WordList{Name: "gangway_opposite", Title: "what faces the board", Ordered: false, Words: []string{"nothing live or earthed", "earthed parts", "live parts"}, Descriptions: []string{
	"insulated or guarded",
	"earthed parts or masonry",
	"live parts or another board",
}}

// Thermography is a word of this list: way of thermography. Zero is no word.
type Thermography uint8

// The words: way of thermography.
const (
	// ThermographyNoThermography is "no thermography": not possible or not done.
	ThermographyNoThermography Thermography = 1
	// ThermographyCoversOff is "covers off": with covers taken off.
	ThermographyCoversOff Thermography = 2
	// ThermographyWindows is "windows": through windows in the covers.
	ThermographyWindows Thermography = 3
	// ThermographyFixedSensors is "fixed sensors": sensors on the joints.
	ThermographyFixedSensors Thermography = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w Thermography) Text() string { return theThermographyList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Thermography) Rank() int { return theThermographyList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Thermography) List() *WordList { return theThermographyList }

var theThermographyList = &WordList{Name: "thermography", Title: "way of thermography", Ordered: false, Words: []string{"no thermography", "covers off", "windows", "fixed sensors"}, Descriptions: []string{
	"not possible or not done",
	"with covers taken off",
	"through windows in the covers",
	"sensors on the joints",
}}

// Verification is a word of this list: characteristic that is verified. Zero is no word.
type Verification uint8

// The words: characteristic that is verified.
const (
	// VerificationStrengthOfMaterials is "strength of materials": strength of materials and parts.
	VerificationStrengthOfMaterials Verification = 1
	// VerificationDegreeOfProtection is "degree of protection": degree of protection of enclosures.
	VerificationDegreeOfProtection Verification = 2
	// VerificationClearancesAndCreepage is "clearances and creepage": clearances and creepage distances.
	VerificationClearancesAndCreepage Verification = 3
	// VerificationProtectionAgainstElectricShock is "protection against electric shock": protection against
	// shock and protective circuits.
	VerificationProtectionAgainstElectricShock Verification = 4
	// VerificationIncorporationOfDevices is "incorporation of devices": incorporation of devices.
	VerificationIncorporationOfDevices Verification = 5
	// VerificationInternalCircuitsAndConnections is "internal circuits and connections": internal circuits and
	// connections.
	VerificationInternalCircuitsAndConnections Verification = 6
	// VerificationTerminals is "terminals": terminals for external conductors.
	VerificationTerminals Verification = 7
	// VerificationDielectricProperties is "dielectric properties": power-frequency and impulse withstand.
	VerificationDielectricProperties Verification = 8
	// VerificationTemperatureRise is "temperature rise": temperature-rise limits.
	VerificationTemperatureRise Verification = 9
	// VerificationShortCircuitWithstand is "short-circuit withstand": short-circuit withstand strength.
	VerificationShortCircuitWithstand Verification = 10
	// VerificationElectromagneticCompatibility is "electromagnetic compatibility": electromagnetic
	// compatibility.
	VerificationElectromagneticCompatibility Verification = 11
	// VerificationMechanicalOperation is "mechanical operation": mechanical operation.
	VerificationMechanicalOperation Verification = 12
	// VerificationInternalArc is "internal arc": behaviour under an internal arc.
	VerificationInternalArc Verification = 13
	// VerificationCoveringInsulation is "covering insulation": covering of conductors tested as insulation.
	VerificationCoveringInsulation Verification = 14
	// VerificationBackUpCombination is "back-up combination": two devices tested in series.
	VerificationBackUpCombination Verification = 15
	// VerificationArcMitigation is "arc mitigation": detection or quenching tested in the board.
	VerificationArcMitigation Verification = 16
	// VerificationSeismic is "seismic": seismic test.
	VerificationSeismic Verification = 17
)

// Text returns the word as the file spells it, empty for zero.
func (w Verification) Text() string { return theVerificationList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w Verification) Rank() int { return theVerificationList.Rank(int(w)) }

// List returns the list the word belongs to.
func (Verification) List() *WordList { return theVerificationList }

var theVerificationList = &WordList{Name: "verification", Title: "characteristic that is verified", Ordered: false, Words: []string{"strength of materials", "degree of protection", "clearances and creepage", "protection against electric shock", "incorporation of devices", "internal circuits and connections", "terminals", "dielectric properties", "temperature rise", "short-circuit withstand", "electromagnetic compatibility", "mechanical operation", "internal arc", "covering insulation", "back-up combination", "arc mitigation", "seismic"}, Descriptions: []string{
	"strength of materials and parts",
	"degree of protection of enclosures",
	"clearances and creepage distances",
	"protection against shock and protective circuits",
	"incorporation of devices",
	"internal circuits and connections",
	"terminals for external conductors",
	"power-frequency and impulse withstand",
	"temperature-rise limits",
	"short-circuit withstand strength",
	"electromagnetic compatibility",
	"mechanical operation",
	"behaviour under an internal arc",
	"covering of conductors tested as insulation",
	"two devices tested in series",
	"detection or quenching tested in the board",
	"seismic test",
}}

// EvidenceMeans is a word of this list: means of showing. The words are in order, the lowest first. Zero is
// no word.
type EvidenceMeans uint8

// The words: means of showing.
const (
	// EvidenceMeansDeclaration is "declaration": somebody says so.
	EvidenceMeansDeclaration EvidenceMeans = 1
	// EvidenceMeansCalculation is "calculation": worked out.
	EvidenceMeansCalculation EvidenceMeans = 2
	// EvidenceMeansAssessment is "assessment": assessed by the rules of the standard.
	EvidenceMeansAssessment EvidenceMeans = 3
	// EvidenceMeansInspection is "inspection": seen or measured on the part.
	EvidenceMeansInspection EvidenceMeans = 4
	// EvidenceMeansComparisonWithATestedDesign is "comparison with a tested design": compared with a tested
	// reference.
	EvidenceMeansComparisonWithATestedDesign EvidenceMeans = 5
	// EvidenceMeansTest is "test": tested.
	EvidenceMeansTest EvidenceMeans = 6
)

// Text returns the word as the file spells it, empty for zero.
func (w EvidenceMeans) Text() string { return theEvidenceMeansList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w EvidenceMeans) Rank() int { return theEvidenceMeansList.Rank(int(w)) }

// List returns the list the word belongs to.
func (EvidenceMeans) List() *WordList { return theEvidenceMeansList }

var theEvidenceMeansList = &WordList{Name: "evidence_means", Title: "means of showing", Ordered: true, Words: []string{"declaration", "calculation", "assessment", "inspection", "comparison with a tested design", "test"}, Descriptions: []string{
	"somebody says so",
	"worked out",
	"assessed by the rules of the standard",
	"seen or measured on the part",
	"compared with a tested reference",
	"tested",
}}

// LaboratoryKind is a word of this list: standing of the laboratory. The words are in order, the lowest
// first. Zero is no word.
type LaboratoryKind uint8

// The words: standing of the laboratory.
const (
	// LaboratoryKindNotSaidInTheReport is "not said in the report": report is silent.
	LaboratoryKindNotSaidInTheReport LaboratoryKind = 1
	// LaboratoryKindMaker is "maker": own laboratory of the maker.
	LaboratoryKindMaker LaboratoryKind = 2
	// LaboratoryKindIndependent is "independent": independent without accreditation.
	LaboratoryKindIndependent LaboratoryKind = 3
	// LaboratoryKindAccredited is "accredited": accredited for this test.
	LaboratoryKindAccredited LaboratoryKind = 4
)

// Text returns the word as the file spells it, empty for zero.
func (w LaboratoryKind) Text() string { return theLaboratoryKindList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w LaboratoryKind) Rank() int { return theLaboratoryKindList.Rank(int(w)) }

// List returns the list the word belongs to.
func (LaboratoryKind) List() *WordList { return theLaboratoryKindList }

var theLaboratoryKindList = &WordList{Name: "laboratory_kind", Title: "standing of the laboratory", Ordered: true, Words: []string{"not said in the report", "maker", "independent", "accredited"}, Descriptions: []string{
	"report is silent",
	"own laboratory of the maker",
	"independent without accreditation",
	"accredited for this test",
}}

// CircuitConductors is a word of this list: conductors of a circuit. Zero is no word.
type CircuitConductors uint8

// The words: conductors of a circuit.
const (
	// CircuitConductorsPhases is "phases": phase conductors.
	CircuitConductorsPhases CircuitConductors = 1
	// CircuitConductorsNeutral is "neutral": neutral conductor.
	CircuitConductorsNeutral CircuitConductors = 2
	// CircuitConductorsProtective is "protective": protective conductor.
	CircuitConductorsProtective CircuitConductors = 3
)

// Text returns the word as the file spells it, empty for zero.
func (w CircuitConductors) Text() string { return theCircuitConductorsList.Text(int(w)) }

// Rank returns the place in the order of the list, 1 for the lowest; 0 where the list has no order.
func (w CircuitConductors) Rank() int { return theCircuitConductorsList.Rank(int(w)) }

// List returns the list the word belongs to.
func (CircuitConductors) List() *WordList { return theCircuitConductorsList }

var theCircuitConductorsList = &WordList{Name: "circuit_conductors", Title: "conductors of a circuit", Ordered: false, Words: []string{"phases", "neutral", "protective"}, Descriptions: []string{
	"phase conductors",
	"neutral conductor",
	"protective conductor",
}}

func readContent(o *object, v *Content) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Board, textOf)
	one(o, 1, &v.Title, textOf)
	one(o, 2, &v.Stage, wordOf)
	one(o, 3, &v.Revision, textOf)
	one(o, 4, &v.OfferedBy, textOf)
	one(o, 5, &v.Practice, wordOf)
	innerObject(o, 6, &v.Editions, readEditions)
	one(o, 7, &v.Basis, textOf)
	namedObjects(o, 8, &v.Documents, readDocument)
	innerObject(o, 9, &v.Roles, readRoles)
	one(o, 10, &v.RequirementID, textOf)
	innerObject(o, 11, &v.Counted, readCounted)
	innerObject(o, 12, &v.System, readSystem)
	innerObject(o, 13, &v.Site, readSite)
	namedObjects(o, 14, &v.Sources, readSource)
	namedObjects(o, 15, &v.OtherSupplies, readOtherSupply)
	namedObjects(o, 16, &v.Sections, readSection)
	innerObject(o, 17, &v.Transfer, readTransfer)
	list(o, 18, &v.Standby, nameOf)
	innerObject(o, 19, &v.Assembly, readAssembly)
	namedObjects(o, 20, &v.Busbars, readBusbar)
	namedObjects(o, 21, &v.Units, readUnit)
	namedObjects(o, 22, &v.Taps, readTap)
	namedObjects(o, 23, &v.Protection, readProtectiveDevice)
	innerObject(o, 24, &v.AuxiliarySupply, readAuxiliarySupply)
	innerObject(o, 25, &v.Arc, readArc)
	innerObject(o, 26, &v.Work, readWork)
	objectList(o, 27, &v.Evidence, readEvidenceItem)
	innerObject(o, 28, &v.RoutineVerification, readRoutineVerification)
}

func readEditions(o *object, v *Editions) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Iec614391, countOf)
	one(o, 1, &v.Iec614392, countOf)
	one(o, 2, &v.Iec606641, countOf)
	one(o, 3, &v.Iec609090, countOf)
	one(o, 4, &v.Iec608651, countOf)
	one(o, 5, &v.Iec609472, countOf)
	one(o, 6, &v.IecTr61641, countOf)
	one(o, 7, &v.Dguv203077, countOf)
	one(o, 8, &v.Ieee1584, countOf)
	one(o, 9, &v.Nfpa70e, countOf)
	one(o, 10, &v.Nec, countOf)
}

func readDocument(o *object, v *Document) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Title, textOf)
	one(o, 1, &v.Number, textOf)
	one(o, 2, &v.Revision, textOf)
	one(o, 3, &v.Date, dateOf)
}

func readRoles(o *object, v *Roles) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.PreparedBy, textOf)
	one(o, 1, &v.CheckedBy, textOf)
	one(o, 2, &v.ApprovedBy, textOf)
}

func readCounted(o *object, v *Counted) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Sources, countOf)
	one(o, 1, &v.Sections, countOf)
	one(o, 2, &v.Busbars, countOf)
	one(o, 3, &v.Units, countOf)
	one(o, 4, &v.Taps, countOf)
	one(o, 5, &v.OtherSupplies, countOf)
}

func readSystem(o *object, v *System) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Voltage, quantityOf)
	one(o, 1, &v.HighestCircuitVoltage, quantityOf)
	one(o, 2, &v.VoltageTolerance, quantityOf)
	one(o, 3, &v.Frequency, quantityOf)
	one(o, 4, &v.Earthing, wordOf)
	one(o, 5, &v.EarthElectrode, quantityOf)
	objectList(o, 6, &v.NeutralLinks, readNeutralLink)
	one(o, 7, &v.OvervoltageCategory, wordOf)
	one(o, 8, &v.ThirdHarmonic, quantityOf)
	innerObject(o, 9, &v.DeclaredFault, readDeclaredFault)
}

func readNeutralLink(o *object, v *NeutralLink) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.AtField, wordOf)
	one(o, 1, &v.Removable, wordOf)
	one(o, 2, &v.Labelled, yesNoOf)
	one(o, 3, &v.ClosesWith, nameOf)
}

func readDeclaredFault(o *object, v *DeclaredFault) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Largest, quantityOf)
	one(o, 1, &v.Smallest, quantityOf)
	one(o, 2, &v.FutureLargest, quantityOf)
	one(o, 3, &v.GivenBy, textOf)
	one(o, 4, &v.Date, dateOf)
}

func readSite(o *object, v *Site) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Location, wordOf)
	one(o, 1, &v.Altitude, quantityOf)
	one(o, 2, &v.AmbientMax, quantityOf)
	one(o, 3, &v.AmbientDailyMean, quantityOf)
	one(o, 4, &v.AmbientMin, quantityOf)
	one(o, 5, &v.AirInsideBoard, quantityOf)
	one(o, 6, &v.Humidity, quantityOf)
	one(o, 7, &v.PollutionDegree, countOf)
	one(o, 8, &v.FloodLevel, quantityOf)
	one(o, 9, &v.BaseHeight, quantityOf)
	one(o, 10, &v.Condensation, wordOf)
	list(o, 11, &v.CorrosiveAir, wordOf)
	list(o, 12, &v.Dust, wordOf)
	one(o, 13, &v.Animals, yesNoOf)
	one(o, 14, &v.Persons, wordOf)
	one(o, 15, &v.EmcEnvironment, wordOf)
	one(o, 16, &v.LightningProtection, yesNoOf)
	one(o, 17, &v.OverheadLine, yesNoOf)
	one(o, 18, &v.Seismic, textOf)
}

func readSource(o *object, v *Source) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Rating, quantityOf)
	one(o, 2, &v.RatingForced, quantityOf)
	one(o, 3, &v.Voltage, quantityOf)
	one(o, 4, &v.Secondary, quantityOf)
	one(o, 5, &v.Primary, quantityOf)
	innerObject(o, 6, &v.Impedance, readImpedance)
	one(o, 7, &v.LoadLoss, quantityOf)
	one(o, 8, &v.VectorGroup, textOf)
	innerObject(o, 9, &v.ZeroSequence, readZeroSequence)
	innerObject(o, 10, &v.Neutral, readSourceNeutral)
	innerObject(o, 11, &v.Network, readNetwork)
	innerObject(o, 12, &v.Link, readLink)
	one(o, 13, &v.SubtransientReactance, quantityOf)
	one(o, 14, &v.TransientReactance, quantityOf)
	one(o, 15, &v.NegativeSequenceReactance, quantityOf)
	one(o, 16, &v.ZeroSequenceReactance, quantityOf)
	innerObject(o, 17, &v.TimeConstants, readTimeConstants)
	innerObject(o, 18, &v.SustainedCurrent, readSustainedCurrent)
	one(o, 19, &v.Excitation, wordOf)
	one(o, 20, &v.PowerFactor, quantityOf)
	one(o, 21, &v.LargestCurrent, quantityOf)
	one(o, 22, &v.StaticBypass, yesNoOf)
	one(o, 23, &v.UpstreamDevice, nameOf)
}

func readImpedance(o *object, v *Impedance) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Value, quantityOf)
	one(o, 1, &v.Measured, textOf)
}

func readZeroSequence(o *object, v *ZeroSequence) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.X0X1, quantityOf)
	one(o, 1, &v.R0R1, quantityOf)
}

func readSourceNeutral(o *object, v *SourceNeutral) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Earthed, wordOf)
	one(o, 1, &v.Switched, yesNoOf)
	one(o, 2, &v.Resistance, quantityOf)
}

func readNetwork(o *object, v *Network) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Voltage, quantityOf)
	one(o, 1, &v.FaultLevelMax, quantityOf)
	one(o, 2, &v.FaultLevelMin, quantityOf)
	one(o, 3, &v.FaultCurrentMax, quantityOf)
	one(o, 4, &v.FaultCurrentMin, quantityOf)
	one(o, 5, &v.FutureFaultLevel, quantityOf)
	one(o, 6, &v.RX, quantityOf)
	one(o, 7, &v.GivenBy, textOf)
	one(o, 8, &v.Date, dateOf)
}

func readLink(o *object, v *Link) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Conductor, wordOf)
	one(o, 2, &v.Insulation, wordOf)
	one(o, 3, &v.Area, quantityOf)
	one(o, 4, &v.InParallel, countOf)
	one(o, 5, &v.NeutralArea, quantityOf)
	one(o, 6, &v.ProtectiveArea, quantityOf)
	one(o, 7, &v.Length, quantityOf)
	one(o, 8, &v.ResistancePerLength, quantityOf)
	one(o, 9, &v.ReactancePerLength, quantityOf)
	innerObject(o, 10, &v.ZeroSequence, readZeroSequence)
	one(o, 11, &v.CleatsTestedTo, quantityOf)
}

func readTimeConstants(o *object, v *TimeConstants) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Subtransient, quantityOf)
	one(o, 1, &v.Transient, quantityOf)
	one(o, 2, &v.DirectCurrent, quantityOf)
}

func readSustainedCurrent(o *object, v *SustainedCurrent) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Current, quantityOf)
	one(o, 1, &v.For, quantityOf)
}

func readOtherSupply(o *object, v *OtherSupply) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Feeds, textOf)
	one(o, 2, &v.AtField, nameOf)
	one(o, 3, &v.Voltage, quantityOf)
	one(o, 4, &v.Rating, quantityOf)
	one(o, 5, &v.LockableIsolation, yesNoOf)
	one(o, 6, &v.Interlock, wordOf)
	one(o, 7, &v.Labelled, yesNoOf)
	one(o, 8, &v.DischargeTime, quantityOf)
}

func readSection(o *object, v *Section) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Bars, nameOf)
}

func readTransfer(o *object, v *Transfer) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Operation, wordOf)
	objectList(o, 1, &v.Interlocks, readInterlock)
}

func readInterlock(o *object, v *Interlock) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	list(o, 1, &v.Of, nameOf)
	one(o, 2, &v.ClosedAtOnce, countOf)
	one(o, 3, &v.Note, textOf)
}

func readShortTimeWithstand(o *object, v *ShortTimeWithstand) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Current, quantityOf)
	one(o, 1, &v.Duration, quantityOf)
}

func readAssembly(o *object, v *Assembly) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Standard, wordOf)
	innerObject(o, 1, &v.Manufacturer, readManufacturer)
	one(o, 2, &v.SerialNumber, textOf)
	one(o, 3, &v.Built, dateOf)
	one(o, 4, &v.Condition, wordOf)
	objectList(o, 5, &v.Modifications, readModification)
	one(o, 6, &v.RatedOperationalVoltage, quantityOf)
	one(o, 7, &v.RatedInsulationVoltage, quantityOf)
	one(o, 8, &v.RatedImpulseWithstand, quantityOf)
	one(o, 9, &v.RatedCurrent, quantityOf)
	one(o, 10, &v.RatedCurrentNatural, quantityOf)
	one(o, 11, &v.RatedDiversityFactor, quantityOf)
	one(o, 12, &v.Cooling, wordOf)
	innerObject(o, 13, &v.ShortCircuit, readAssemblyShortCircuit)
	innerObject(o, 14, &v.ShockProtection, readShockProtection)
	innerObject(o, 15, &v.Enclosure, readEnclosure)
	one(o, 16, &v.InternalSeparation, wordOf)
	one(o, 17, &v.SeparationType, textOf)
	innerObject(o, 18, &v.Access, readAccess)
	innerObject(o, 19, &v.Insulation, readInsulation)
	innerObject(o, 20, &v.SurgeProtection, readSurgeProtection)
	innerObject(o, 21, &v.AuxiliaryCircuits, readAuxiliaryCircuits)
	innerObject(o, 22, &v.SocketOutlets, readSocketOutlets)
	innerObject(o, 23, &v.Environment, readEnvironment)
	one(o, 24, &v.EmcEnvironment, wordOf)
	one(o, 25, &v.Seismic, textOf)
	innerObject(o, 26, &v.Transport, readTransport)
}

func readManufacturer(o *object, v *Manufacturer) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Name, textOf)
	one(o, 1, &v.Original, textOf)
	one(o, 2, &v.TypeDesignation, textOf)
	one(o, 3, &v.Factory, textOf)
}

func readModification(o *object, v *Modification) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.What, textOf)
	one(o, 1, &v.Date, dateOf)
	one(o, 2, &v.CarriedOutBy, textOf)
	list(o, 3, &v.Of, nameOf)
	one(o, 4, &v.ReVerified, yesNoOf)
	one(o, 5, &v.Document, nameOf)
}

func readAssemblyShortCircuit(o *object, v *AssemblyShortCircuit) {
	v.At, v.State = o.at, o.state
	innerObject(o, 0, &v.Icw, readShortTimeWithstand)
	one(o, 1, &v.Icc, quantityOf)
	one(o, 2, &v.IccWith, nameOf)
	one(o, 3, &v.Ipk, quantityOf)
	one(o, 4, &v.Sccr, quantityOf)
	one(o, 5, &v.AtVoltage, quantityOf)
}

func readShockProtection(o *object, v *ShockProtection) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.ProtectionClass, wordOf)
	one(o, 1, &v.DoorsBonded, yesNoOf)
	one(o, 2, &v.ProtectiveCircuitResistance, quantityOf)
}

func readEnclosure(o *object, v *Enclosure) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.IP, ipCodeOf)
	one(o, 1, &v.IPFront, ipCodeOf)
	one(o, 2, &v.IPSides, ipCodeOf)
	one(o, 3, &v.IPRear, ipCodeOf)
	one(o, 4, &v.IPTop, ipCodeOf)
	one(o, 5, &v.IPDoorOpen, ipCodeOf)
	one(o, 6, &v.IPAfterFlap, ipCodeOf)
	one(o, 7, &v.Impact, wordOf)
	one(o, 8, &v.TypeRating, textOf)
	one(o, 9, &v.Height, quantityOf)
	one(o, 10, &v.Width, quantityOf)
	one(o, 11, &v.Depth, quantityOf)
}

func readAccess(o *object, v *Access) {
	v.At, v.State = o.at, o.state
	innerObject(o, 0, &v.Front, readAccessSide)
	innerObject(o, 1, &v.Rear, readAccessSide)
	innerObject(o, 2, &v.Sides, readAccessSide)
	innerObject(o, 3, &v.Top, readAccessSide)
	list(o, 4, &v.UnderVoltage, wordOf)
}

func readAccessSide(o *object, v *AccessSide) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.OpensWith, wordOf)
	one(o, 1, &v.By, wordOf)
	one(o, 2, &v.InnerBarrier, ipCodeOf)
}

func readInsulation(o *object, v *Insulation) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.MaterialGroup, wordOf)
	one(o, 1, &v.ComparativeTrackingIndex, quantityOf)
	innerObject(o, 2, &v.Clearance, readDistances)
	innerObject(o, 3, &v.Creepage, readDistances)
	one(o, 4, &v.IsolatingDistance, quantityOf)
	one(o, 5, &v.InEveryPosition, yesNoOf)
	one(o, 6, &v.CountedOverCovering, yesNoOf)
	one(o, 7, &v.PowerFrequencyTest, quantityOf)
	one(o, 8, &v.ImpulseTest, quantityOf)
	one(o, 9, &v.ImpulseTestAltitude, quantityOf)
}

func readDistances(o *object, v *Distances) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.PhaseToPhase, quantityOf)
	one(o, 1, &v.PhaseToEarth, quantityOf)
}

func readSurgeProtection(o *object, v *SurgeProtection) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.AtField, nameOf)
	one(o, 2, &v.VoltageProtection, quantityOf)
	one(o, 3, &v.ContinuousVoltage, quantityOf)
	one(o, 4, &v.NominalDischargeCurrent, quantityOf)
	one(o, 5, &v.ImpulseCurrent, quantityOf)
	innerObject(o, 6, &v.ShortCircuitRating, readFusedRating)
	one(o, 7, &v.LeadLength, quantityOf)
	one(o, 8, &v.Monitored, yesNoOf)
}

func readFusedRating(o *object, v *FusedRating) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Current, quantityOf)
	one(o, 1, &v.WithFuse, textOf)
	one(o, 2, &v.LargestFuse, quantityOf)
	one(o, 3, &v.FittedFuse, quantityOf)
}

func readAuxiliaryCircuits(o *object, v *AuxiliaryCircuits) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Voltage, quantityOf)
	one(o, 1, &v.RatedInsulationVoltage, quantityOf)
	one(o, 2, &v.RatedImpulseWithstand, quantityOf)
	one(o, 3, &v.FedFromMain, yesNoOf)
}

func readSocketOutlets(o *object, v *SocketOutlets) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.RatedCurrent, quantityOf)
	one(o, 1, &v.ResidualCurrent, quantityOf)
	one(o, 2, &v.ResidualCurrentType, wordOf)
}

func readEnvironment(o *object, v *Environment) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Heaters, yesNoOf)
	one(o, 1, &v.Thermostat, yesNoOf)
	one(o, 2, &v.Drain, yesNoOf)
	one(o, 3, &v.SealedCableEntry, yesNoOf)
	one(o, 4, &v.AnimalProof, yesNoOf)
	one(o, 5, &v.DustFilters, yesNoOf)
	one(o, 6, &v.CorrosionProtection, textOf)
	one(o, 7, &v.DustIgnitionSafe, yesNoOf)
}

func readTransport(o *object, v *Transport) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Parts, countOf)
	one(o, 1, &v.JointsVerified, yesNoOf)
	one(o, 2, &v.LiftingPoints, yesNoOf)
}

func readAuxiliarySupply(o *object, v *AuxiliarySupply) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Trip, wordOf)
	one(o, 1, &v.Relays, wordOf)
	one(o, 2, &v.Voltage, quantityOf)
	one(o, 3, &v.Autonomy, quantityOf)
	one(o, 4, &v.OpenOperations, countOf)
	one(o, 5, &v.TripCoils, countOf)
	one(o, 6, &v.Supervised, yesNoOf)
	one(o, 7, &v.TripCircuitSupervision, yesNoOf)
}

func readRoutineVerification(o *object, v *RoutineVerification) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Date, dateOf)
	one(o, 1, &v.By, textOf)
	one(o, 2, &v.Document, nameOf)
	one(o, 3, &v.DegreeOfProtection, yesNoOf)
	one(o, 4, &v.ClearancesCreepage, yesNoOf)
	one(o, 5, &v.ShockProtection, yesNoOf)
	one(o, 6, &v.Components, yesNoOf)
	one(o, 7, &v.InternalCircuits, yesNoOf)
	one(o, 8, &v.Terminals, yesNoOf)
	one(o, 9, &v.MechanicalOperation, yesNoOf)
	one(o, 10, &v.Dielectric, yesNoOf)
	one(o, 11, &v.DielectricVoltage, quantityOf)
	one(o, 12, &v.InsulationResistance, quantityOf)
	one(o, 13, &v.WiringFunction, yesNoOf)
}

func readBars(o *object, v *Bars) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Width, quantityOf)
	one(o, 1, &v.Thickness, quantityOf)
	one(o, 2, &v.PerPhase, countOf)
	one(o, 3, &v.Gap, quantityOf)
	one(o, 4, &v.BroadSide, wordOf)
	one(o, 5, &v.Phases, wordOf)
	one(o, 6, &v.Area, quantityOf)
}

func readCovering(o *object, v *Covering) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.TestedTo, textOf)
	one(o, 2, &v.Joints, wordOf)
	one(o, 3, &v.TemperatureClass, quantityOf)
	one(o, 4, &v.Colour, textOf)
}

func readSupportStrength(o *object, v *SupportStrength) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Value, quantityOf)
	one(o, 1, &v.Kind, wordOf)
	one(o, 2, &v.Direction, wordOf)
	one(o, 3, &v.AtField, quantityOf)
}

func readSupports(o *object, v *Supports) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Span, quantityOf)
	one(o, 1, &v.Spans, countOf)
	one(o, 2, &v.Ends, wordOf)
	one(o, 3, &v.SpacersEvery, quantityOf)
	innerObject(o, 4, &v.Strength, readSupportStrength)
	one(o, 5, &v.TemperatureMax, quantityOf)
}

func readConditionalRating(o *object, v *ConditionalRating) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Current, quantityOf)
	one(o, 1, &v.Device, nameOf)
	one(o, 2, &v.DeviceTested, textOf)
}

func readNeutralBars(o *object, v *NeutralBars) {
	v.At, v.State = o.at, o.state
	innerObject(o, 0, &v.Bars, readBars)
	one(o, 1, &v.RatedCurrent, quantityOf)
	innerObject(o, 2, &v.ShortTimeWithstand, readShortTimeWithstand)
	one(o, 3, &v.PeakWithstand, quantityOf)
}

func readProtectiveBars(o *object, v *ProtectiveBars) {
	v.At, v.State = o.at, o.state
	innerObject(o, 0, &v.Bars, readBars)
	one(o, 1, &v.Conductor, wordOf)
	innerObject(o, 2, &v.ShortTimeWithstand, readShortTimeWithstand)
	one(o, 3, &v.PeakWithstand, quantityOf)
}

func readRelief(o *object, v *Relief) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Claimed, textOf)
	one(o, 1, &v.ConductorMeasure, wordOf)
	one(o, 2, &v.LargestDevice, quantityOf)
	one(o, 3, &v.LetThrough, nameOf)
}

func readBusbar(o *object, v *Busbar) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Section, nameOf)
	one(o, 1, &v.FedFrom, nameOf)
	one(o, 2, &v.ProtectedBy, nameOf)
	innerObject(o, 3, &v.Covering, readCovering)
	one(o, 4, &v.Conductor, wordOf)
	one(o, 5, &v.Temper, textOf)
	one(o, 6, &v.Finish, wordOf)
	innerObject(o, 7, &v.Bars, readBars)
	one(o, 8, &v.PhaseCentres, quantityOf)
	innerObject(o, 9, &v.Supports, readSupports)
	one(o, 10, &v.RatedCurrent, quantityOf)
	innerObject(o, 11, &v.ShortTimeWithstand, readShortTimeWithstand)
	one(o, 12, &v.PeakWithstand, quantityOf)
	innerObject(o, 13, &v.ConditionalRating, readConditionalRating)
	innerObject(o, 14, &v.Neutral, readNeutralBars)
	innerObject(o, 15, &v.Protective, readProtectiveBars)
	innerObject(o, 16, &v.Relief, readRelief)
	one(o, 17, &v.TemperatureMax, quantityOf)
}

func readShutters(o *object, v *Shutters) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Automatic, yesNoOf)
	one(o, 1, &v.Lockable, wordOf)
	one(o, 2, &v.Protection, ipCodeOf)
	one(o, 3, &v.Marked, yesNoOf)
}

func readCutOff(o *object, v *CutOff) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.AtField, quantityOf)
	one(o, 1, &v.AtVoltage, quantityOf)
	one(o, 2, &v.Peak, quantityOf)
	one(o, 3, &v.LetThrough, quantityOf)
}

func readDevice(o *object, v *Device) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Type, textOf)
	one(o, 2, &v.RatedCurrent, quantityOf)
	one(o, 3, &v.RatedOperationalVoltage, quantityOf)
	one(o, 4, &v.SlashRated, yesNoOf)
	byVoltage(o, 5, &v.Icu)
	byVoltage(o, 6, &v.Ics)
	byVoltage(o, 7, &v.SinglePole)
	one(o, 8, &v.Icm, quantityOf)
	innerObject(o, 9, &v.ShortTimeWithstand, readShortTimeWithstand)
	innerObject(o, 10, &v.ConditionalRating, readConditionalRating)
	innerObject(o, 11, &v.CutOff, readCutOff)
	one(o, 12, &v.UtilisationCategory, wordOf)
	one(o, 13, &v.Isolating, wordOf)
	one(o, 14, &v.Override, quantityOf)
	one(o, 15, &v.AmbientMax, quantityOf)
}

func readPlug(o *object, v *Plug) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Covering, wordOf)
	one(o, 1, &v.OneInsulatedWhole, yesNoOf)
	one(o, 2, &v.TestedTo, textOf)
	one(o, 3, &v.Contacts, wordOf)
	one(o, 4, &v.Finish, wordOf)
	one(o, 5, &v.Fingers, countOf)
	one(o, 6, &v.ForcePerFinger, quantityOf)
	one(o, 7, &v.ForceLeft, quantityOf)
	one(o, 8, &v.FingerLength, quantityOf)
	one(o, 9, &v.FingerSpacing, quantityOf)
	one(o, 10, &v.Hardness, quantityOf)
	one(o, 11, &v.LockedAgainstEjection, yesNoOf)
}

func readLoad(o *object, v *Load) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Motor, quantityOf)
	one(o, 1, &v.Current, quantityOf)
	one(o, 2, &v.Starting, quantityOf)
	one(o, 3, &v.StartingTime, quantityOf)
	one(o, 4, &v.Efficiency, quantityOf)
	one(o, 5, &v.PowerFactor, quantityOf)
	one(o, 6, &v.FedThrough, wordOf)
	one(o, 7, &v.Continuous, yesNoOf)
	one(o, 8, &v.ThirdHarmonic, quantityOf)
	one(o, 9, &v.DischargeTime, quantityOf)
}

func readUnitCables(o *object, v *UnitCables) {
	v.At, v.State = o.at, o.state
	list(o, 0, &v.Entry, wordOf)
	one(o, 1, &v.Conductor, wordOf)
	one(o, 2, &v.Insulation, wordOf)
	one(o, 3, &v.Area, quantityOf)
	one(o, 4, &v.InParallel, countOf)
	one(o, 5, &v.SingleCore, yesNoOf)
	one(o, 6, &v.LargestArea, quantityOf)
	one(o, 7, &v.ConductorTemperature, quantityOf)
	one(o, 8, &v.GlandPlate, wordOf)
	one(o, 9, &v.GlandPlateMaterial, wordOf)
	one(o, 10, &v.EntryProtection, ipCodeOf)
	one(o, 11, &v.PlateToTerminal, quantityOf)
	one(o, 12, &v.BendRadius, quantityOf)
	one(o, 13, &v.CleatsTestedTo, quantityOf)
	one(o, 14, &v.SpareSpace, quantityOf)
}

func readUnit(o *object, v *Unit) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Duty, wordOf)
	one(o, 1, &v.Connects, nameOf)
	one(o, 2, &v.To, nameOf)
	list(o, 3, &v.Between, nameOf)
	one(o, 4, &v.On, nameOf)
	one(o, 5, &v.PlaceField, textOf)
	one(o, 6, &v.Poles, wordOf)
	one(o, 7, &v.Mounting, wordOf)
	list(o, 8, &v.Positions, wordOf)
	one(o, 9, &v.PositionShown, yesNoOf)
	list(o, 10, &v.Interlocks, wordOf)
	innerObject(o, 11, &v.Shutters, readShutters)
	innerObject(o, 12, &v.Device, readDevice)
	innerObject(o, 13, &v.Contactor, readDevice)
	one(o, 14, &v.Settings, nameOf)
	one(o, 15, &v.SettingsOnGenerator, nameOf)
	one(o, 16, &v.BackedUpBy, nameOf)
	byVoltage(o, 17, &v.BackedUpTo)
	innerObject(o, 18, &v.Plug, readPlug)
	one(o, 19, &v.LineTerminals, wordOf)
	innerObject(o, 20, &v.Load, readLoad)
	one(o, 21, &v.RatedCurrentInBoard, quantityOf)
	one(o, 22, &v.GroupRatedCurrent, quantityOf)
	one(o, 23, &v.AirAtDevice, quantityOf)
	innerObject(o, 24, &v.ShortTimeWithstand, readShortTimeWithstand)
	one(o, 25, &v.PeakWithstand, quantityOf)
	innerObject(o, 26, &v.ConditionalRating, readConditionalRating)
	one(o, 27, &v.RatedInsulationVoltage, quantityOf)
	one(o, 28, &v.RatedImpulseWithstand, quantityOf)
	one(o, 29, &v.IsolatingGapImpulse, quantityOf)
	one(o, 30, &v.Coordination, wordOf)
	byVoltage(o, 31, &v.CoordinationCurrent)
	one(o, 32, &v.ResidualCurrent, quantityOf)
	one(o, 33, &v.ResidualCurrentType, wordOf)
	one(o, 34, &v.Terminals, wordOf)
	innerObject(o, 35, &v.Cables, readUnitCables)
	one(o, 36, &v.LiveWhenIncomerOpen, textOf)
}

func readTapProtection(o *object, v *TapProtection) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.RatedCurrent, quantityOf)
	one(o, 2, &v.Class, wordOf)
	byVoltage(o, 3, &v.Breaking)
}

func readTap(o *object, v *Tap) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Use, wordOf)
	one(o, 1, &v.On, nameOf)
	one(o, 2, &v.Side, wordOf)
	one(o, 3, &v.Length, quantityOf)
	one(o, 4, &v.Conductor, wordOf)
	one(o, 5, &v.Area, quantityOf)
	one(o, 6, &v.ConductorMeasure, wordOf)
	innerObject(o, 7, &v.ProtectedBy, readTapProtection)
	one(o, 8, &v.Isolating, yesNoOf)
	one(o, 9, &v.LiveWhenIncomerOpen, yesNoOf)
	one(o, 10, &v.Remark, textOf)
}

func readLongTime(o *object, v *LongTime) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Pickup, quantityOf)
	one(o, 1, &v.Delay, quantityOf)
	one(o, 2, &v.AtField, quantityOf)
	one(o, 3, &v.AtOf, wordOf)
	one(o, 4, &v.Tolerance, quantityOf)
	one(o, 5, &v.TimeTolerance, quantityOf)
}

func readShortTime(o *object, v *ShortTime) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Pickup, quantityOf)
	one(o, 1, &v.Delay, quantityOf)
	one(o, 2, &v.I2t, wordOf)
	one(o, 3, &v.Tolerance, quantityOf)
	one(o, 4, &v.DelayTolerance, quantityOf)
}

func readInstantaneous(o *object, v *Instantaneous) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Pickup, quantityOf)
	one(o, 1, &v.Tolerance, quantityOf)
}

func readOverride(o *object, v *Override) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Pickup, quantityOf)
	one(o, 1, &v.Tolerance, quantityOf)
}

func readEarthFault(o *object, v *EarthFault) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Method, wordOf)
	one(o, 1, &v.Pickup, quantityOf)
	one(o, 2, &v.Delay, quantityOf)
	one(o, 3, &v.Tolerance, quantityOf)
	list(o, 4, &v.ActsOn, nameOf)
}

func readMaintenanceSetting(o *object, v *MaintenanceSetting) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Instantaneous, quantityOf)
	one(o, 1, &v.BreakTime, quantityOf)
	one(o, 2, &v.Tolerance, quantityOf)
	one(o, 3, &v.Indication, wordOf)
	one(o, 4, &v.Remote, yesNoOf)
	one(o, 5, &v.AutoReturn, yesNoOf)
}

func readCurrentTransformer(o *object, v *CurrentTransformer) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Primary, quantityOf)
	one(o, 1, &v.Secondary, quantityOf)
	one(o, 2, &v.Class, textOf)
	one(o, 3, &v.Burden, quantityOf)
	one(o, 4, &v.BurdenConnected, quantityOf)
	one(o, 5, &v.Error, quantityOf)
}

func readZoneInterlock(o *object, v *ZoneInterlock) {
	v.At, v.State = o.at, o.state
	list(o, 0, &v.With, nameOf)
	one(o, 1, &v.Undelayed, quantityOf)
	one(o, 2, &v.EarthFaultToo, yesNoOf)
	one(o, 3, &v.WireBreak, wordOf)
	one(o, 4, &v.Tested, dateOf)
}

func readProtectiveDevice(o *object, v *ProtectiveDevice) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Type, textOf)
	one(o, 2, &v.RatedCurrent, quantityOf)
	one(o, 3, &v.Class, wordOf)
	pairsOf(o, 4, &v.Points)
	one(o, 5, &v.Curve, wordOf)
	one(o, 6, &v.Pickup, quantityOf)
	one(o, 7, &v.TimeMultiplier, quantityOf)
	one(o, 8, &v.Delay, quantityOf)
	one(o, 9, &v.Tolerance, quantityOf)
	one(o, 10, &v.TimeTolerance, quantityOf)
	one(o, 11, &v.TimeToleranceAtLeast, quantityOf)
	one(o, 12, &v.AtVoltage, quantityOf)
	one(o, 13, &v.BreakTime, quantityOf)
	one(o, 14, &v.CurveIncludesBreakTime, yesNoOf)
	innerObject(o, 15, &v.LongTime, readLongTime)
	innerObject(o, 16, &v.ShortTime, readShortTime)
	innerObject(o, 17, &v.Instantaneous, readInstantaneous)
	innerObject(o, 18, &v.Override, readOverride)
	innerObject(o, 19, &v.EarthFault, readEarthFault)
	one(o, 20, &v.NeutralSetting, quantityOf)
	one(o, 21, &v.VoltageRestrained, yesNoOf)
	one(o, 22, &v.Differential, yesNoOf)
	one(o, 23, &v.UndervoltageDelay, quantityOf)
	innerObject(o, 24, &v.MaintenanceSetting, readMaintenanceSetting)
	innerObject(o, 25, &v.ZoneInterlock, readZoneInterlock)
	one(o, 26, &v.Supply, wordOf)
	one(o, 27, &v.Supervised, yesNoOf)
	innerObject(o, 28, &v.CurrentTransformer, readCurrentTransformer)
	one(o, 29, &v.SettingsSource, wordOf)
	one(o, 30, &v.SettingsDate, dateOf)
	one(o, 31, &v.Tested, dateOf)
}

func readContainment(o *object, v *Containment) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Class, wordOf)
	list(o, 1, &v.IgnitionProtected, nameOf)
	list(o, 2, &v.Criteria, wordOf)
	one(o, 3, &v.PermissibleCurrent, quantityOf)
	one(o, 4, &v.PermissibleDuration, quantityOf)
	innerObject(o, 5, &v.Conditional, readConditionalRating)
	list(o, 6, &v.DependsOn, wordOf)
	one(o, 7, &v.AtVoltage, quantityOf)
	one(o, 8, &v.AtFrequency, quantityOf)
	list(o, 9, &v.Sides, wordOf)
	one(o, 10, &v.Persons, wordOf)
	one(o, 11, &v.Compartments, textOf)
	one(o, 12, &v.ClosedDoorRacking, yesNoOf)
	one(o, 13, &v.CeilingClearance, quantityOf)
	one(o, 14, &v.RearClearance, quantityOf)
	one(o, 15, &v.AccessibilityType, wordOf)
	list(o, 16, &v.Suffixes, wordOf)
}

func readExhaust(o *object, v *Exhaust) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	list(o, 1, &v.LeavesAt, wordOf)
	one(o, 2, &v.Ends, wordOf)
	one(o, 3, &v.AsTested, yesNoOf)
	one(o, 4, &v.CeilingClearance, quantityOf)
	one(o, 5, &v.RearClearance, quantityOf)
	one(o, 6, &v.Aisle, quantityOf)
	one(o, 7, &v.RoomRelief, yesNoOf)
	one(o, 8, &v.ProtectionAfterClosing, ipCodeOf)
}

func readDetection(o *object, v *Detection) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Time, quantityOf)
	one(o, 2, &v.CurrentPickup, quantityOf)
	one(o, 3, &v.SelfSupervised, yesNoOf)
	one(o, 4, &v.TripCircuitSupervised, yesNoOf)
	one(o, 5, &v.Supply, wordOf)
	one(o, 6, &v.BreakerFailureTime, quantityOf)
	list(o, 7, &v.BreakerFailureActsOn, nameOf)
	one(o, 8, &v.Tested, dateOf)
	one(o, 9, &v.TestInterval, countOf)
	one(o, 10, &v.TestedInBoard, yesNoOf)
	one(o, 11, &v.OutOfServiceProcedure, textOf)
	one(o, 12, &v.LockOut, yesNoOf)
}

func readArcZone(o *object, v *ArcZone) {
	v.At, v.State = o.at, o.state
	list(o, 0, &v.Covers, nameOf)
	one(o, 1, &v.Side, wordOf)
	list(o, 2, &v.ActsOn, nameOf)
	one(o, 3, &v.TotalTime, quantityOf)
	list(o, 4, &v.TotalTimeContains, wordOf)
	one(o, 5, &v.Sensors, countOf)
	one(o, 6, &v.Quenched, yesNoOf)
}

func readQuenching(o *object, v *Quenching) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Kind, wordOf)
	one(o, 1, &v.Time, quantityOf)
	innerObject(o, 2, &v.ShortTimeWithstand, readShortTimeWithstand)
	one(o, 3, &v.PeakWithstand, quantityOf)
	one(o, 4, &v.AtVoltage, quantityOf)
	list(o, 5, &v.Sections, nameOf)
	list(o, 6, &v.ActsOn, nameOf)
	one(o, 7, &v.LockOut, yesNoOf)
	one(o, 8, &v.DisabledShown, yesNoOf)
	one(o, 9, &v.StoredEnergySafe, yesNoOf)
}

func readArc(o *object, v *Arc) {
	v.At, v.State = o.at, o.state
	innerObject(o, 0, &v.Containment, readContainment)
	innerObject(o, 1, &v.Exhaust, readExhaust)
	innerObject(o, 2, &v.Detection, readDetection)
	namedObjects(o, 3, &v.Zones, readArcZone)
	innerObject(o, 4, &v.Quenching, readQuenching)
}

func readLocation(o *object, v *Location) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.AtField, nameOf)
	one(o, 1, &v.Side, wordOf)
	list(o, 2, &v.Electrodes, wordOf)
	one(o, 3, &v.ElectrodesReason, textOf)
	one(o, 4, &v.Gap, quantityOf)
	one(o, 5, &v.Distance, quantityOf)
	one(o, 6, &v.DistanceReason, textOf)
	one(o, 7, &v.EnclosureHeight, quantityOf)
	one(o, 8, &v.EnclosureWidth, quantityOf)
	one(o, 9, &v.EnclosureDepth, quantityOf)
	one(o, 10, &v.Surroundings, wordOf)
	one(o, 11, &v.ArcCurrentFactor, quantityOf)
	one(o, 12, &v.ArcPowerFactor, quantityOf)
	one(o, 13, &v.Escape, wordOf)
	list(o, 14, &v.ClearedBy, nameOf)
	one(o, 15, &v.Others, wordOf)
}

func readArcRating(o *object, v *ArcRating) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Value, quantityOf)
	one(o, 1, &v.Kind, wordOf)
}

func readPPE(o *object, v *PPE) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Method, wordOf)
	innerObject(o, 1, &v.ArcRating, readArcRating)
	one(o, 2, &v.Apc, countOf)
	one(o, 3, &v.Category, countOf)
	one(o, 4, &v.Gloves, wordOf)
	one(o, 5, &v.Head, wordOf)
	one(o, 6, &v.WholeBody, yesNoOf)
	one(o, 7, &v.Hearing, yesNoOf)
}

func readTask(o *object, v *Task) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.AtField, nameOf)
	one(o, 1, &v.Side, wordOf)
	one(o, 2, &v.Kind, wordOf)
	one(o, 3, &v.Doors, wordOf)
	one(o, 4, &v.Parts, wordOf)
	one(o, 5, &v.Distance, quantityOf)
	one(o, 6, &v.Remote, yesNoOf)
	one(o, 7, &v.WithMaintenanceSetting, yesNoOf)
	one(o, 8, &v.WithDetection, yesNoOf)
	innerObject(o, 9, &v.PPE, readPPE)
	one(o, 10, &v.By, wordOf)
	one(o, 11, &v.SecondPerson, yesNoOf)
	one(o, 12, &v.Reason, textOf)
	one(o, 13, &v.Instruction, textOf)
}

func readIsolation(o *object, v *Isolation) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Lockable, yesNoOf)
	one(o, 1, &v.SourcesNamed, yesNoOf)
	one(o, 2, &v.KeyExchangeUpstream, yesNoOf)
	one(o, 3, &v.TestPoints, yesNoOf)
	one(o, 4, &v.TesterProved, yesNoOf)
	innerObject(o, 5, &v.EarthingPoints, readShortTimeWithstand)
	one(o, 6, &v.NeutralIsolated, yesNoOf)
	one(o, 7, &v.DischargeTime, quantityOf)
	one(o, 8, &v.Procedure, textOf)
}

func readLabels(o *object, v *Labels) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Voltage, yesNoOf)
	one(o, 1, &v.Boundary, yesNoOf)
	one(o, 2, &v.Energy, yesNoOf)
	one(o, 3, &v.WorkingDistance, yesNoOf)
	one(o, 4, &v.Category, yesNoOf)
	one(o, 5, &v.Clothing, yesNoOf)
	one(o, 6, &v.SupplyState, yesNoOf)
	one(o, 7, &v.BothSides, yesNoOf)
	one(o, 8, &v.LiveParts, yesNoOf)
	one(o, 9, &v.Date, dateOf)
}

func readGangway(o *object, v *Gangway) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Width, quantityOf)
	one(o, 1, &v.FreeWithDoorOpen, quantityOf)
	one(o, 2, &v.Height, quantityOf)
	one(o, 3, &v.Length, quantityOf)
	one(o, 4, &v.Exits, countOf)
	one(o, 5, &v.ExitWidth, quantityOf)
	one(o, 6, &v.ExitHeight, quantityOf)
	one(o, 7, &v.ExitOpensOutwards, yesNoOf)
	one(o, 8, &v.Doors, wordOf)
	one(o, 9, &v.DoorAngle, countOf)
	one(o, 10, &v.Opposite, wordOf)
	one(o, 11, &v.AtRear, yesNoOf)
}

func readStudy(o *object, v *Study) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Document, nameOf)
	one(o, 1, &v.Date, dateOf)
	one(o, 2, &v.Reviewed, dateOf)
	one(o, 3, &v.NetworkData, dateOf)
	one(o, 4, &v.SettingsAsLeft, yesNoOf)
	one(o, 5, &v.ChangedSince, textOf)
}

func readTraining(o *object, v *Training) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Persons, wordOf)
	one(o, 1, &v.PersonInCharge, yesNoOf)
	one(o, 2, &v.PermitByOther, yesNoOf)
	one(o, 3, &v.Refreshed, dateOf)
	one(o, 4, &v.Interval, countOf)
	one(o, 5, &v.Rescue, textOf)
	one(o, 6, &v.FirstAid, yesNoOf)
}

func readMaintenance(o *object, v *Maintenance) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Plan, textOf)
	one(o, 1, &v.Last, dateOf)
	one(o, 2, &v.TorqueMarks, yesNoOf)
	one(o, 3, &v.Thermography, wordOf)
	one(o, 4, &v.ContactResistanceRecorded, yesNoOf)
	one(o, 5, &v.InsulationRecorded, yesNoOf)
	one(o, 6, &v.BreakersExercisedEvery, countOf)
	one(o, 7, &v.InjectionEvery, countOf)
	one(o, 8, &v.SpareProved, yesNoOf)
	one(o, 9, &v.ReleasesSupported, yesNoOf)
}

func readWork(o *object, v *Work) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.WithDoorsOpenUnderVoltage, yesNoOf)
	namedObjects(o, 1, &v.Locations, readLocation)
	namedObjects(o, 2, &v.Tasks, readTask)
	innerObject(o, 3, &v.Isolation, readIsolation)
	one(o, 4, &v.PermitForLiveWork, yesNoOf)
	one(o, 5, &v.EmergencyTrip, textOf)
	one(o, 6, &v.Instructions, textOf)
	innerObject(o, 7, &v.Labels, readLabels)
	innerObject(o, 8, &v.Gangway, readGangway)
	innerObject(o, 9, &v.Study, readStudy)
	innerObject(o, 10, &v.Maintenance, readMaintenance)
	innerObject(o, 11, &v.Training, readTraining)
}

func readEvidenceValues(o *object, v *EvidenceValues) {
	v.At, v.State = o.at, o.state
	innerObject(o, 0, &v.ShortTimeWithstand, readShortTimeWithstand)
	one(o, 1, &v.Peak, quantityOf)
	innerObject(o, 2, &v.ConditionalRating, readConditionalRating)
	one(o, 3, &v.RatedCurrent, quantityOf)
	one(o, 4, &v.Ambient, quantityOf)
	one(o, 5, &v.Voltage, quantityOf)
	one(o, 6, &v.Frequency, quantityOf)
	one(o, 7, &v.Impulse, quantityOf)
	one(o, 8, &v.Protection, ipCodeOf)
	one(o, 9, &v.SupportSpan, quantityOf)
	one(o, 10, &v.LimitingDevice, textOf)
	one(o, 11, &v.PermissibleCurrent, quantityOf)
	one(o, 12, &v.PermissibleDuration, quantityOf)
}

func readEvidenceItem(o *object, v *EvidenceItem) {
	v.At, v.State = o.at, o.state
	one(o, 0, &v.Shows, wordOf)
	list(o, 1, &v.Of, nameOf)
	list(o, 2, &v.Conductors, wordOf)
	one(o, 3, &v.By, wordOf)
	one(o, 4, &v.Document, textOf)
	one(o, 5, &v.Issued, dateOf)
	one(o, 6, &v.ValidUntil, dateOf)
	one(o, 7, &v.Edition, textOf)
	one(o, 8, &v.Laboratory, wordOf)
	one(o, 9, &v.Accreditation, textOf)
	one(o, 10, &v.ReferenceDesign, textOf)
	one(o, 11, &v.ThisVariant, yesNoOf)
	innerObject(o, 12, &v.Values, readEvidenceValues)
}

// vocabularyFormat is the version of the vocabulary that this file was made from.
const vocabularyFormat = "1"

// objectTypes are the types of the vocabulary in its order.
var objectTypes = []*objectType{
	{name: "board", title: "switchboard", short: "", fields: []*Field{
		{Type: "board", Key: "board", Kind: KindText, Title: "designation", Note: "The one name of the board in every output.", Example: "BL-MSB-1", says: Conditions},
		{Type: "board", Key: "title", Kind: KindText, Title: "title", Note: "What the board is and where it stands.", Example: "\"Main switchboard, Brackwater Lock pumping station\"", says: Conditions},
		{Type: "board", Key: "stage", Kind: KindWords, Words: theStageList, Title: "stage of the document", Note: "Decides how much proof a claim needs.", Clause: "common practice", Example: "requirement", says: Conditions},
		{Type: "board", Key: "revision", Kind: KindText, Title: "revision of this file", Note: "Letter or number of the issue.", Example: "C", says: Claims},
		{Type: "board", Key: "offered_by", Kind: KindText, Title: "tenderer", Note: "Who makes the claims of this file.", Example: "Tenderer A", says: Claims},
		{Type: "board", Key: "practice", Kind: KindWords, Words: thePracticeList, Title: "code practice", Note: "Which set of codes is applied.", Clause: "common practice", Example: "IEC", says: Conditions},
		{Type: "board", Key: "editions", Kind: KindObject, Of: "editions", Title: "editions of standards", Note: "Editions the parties agreed on.", says: Conditions},
		{Type: "board", Key: "basis", Kind: KindText, Title: "basis file", Note: "Path of the file that holds what the boards of a project share.", Example: "../basis.yaml", says: Conditions},
		{Type: "board", Key: "documents", Kind: KindCollection, Of: "document", Title: "documents", Note: "Where the values come from.", says: Conditions},
		{Type: "board", Key: "roles", Kind: KindObject, Of: "roles", Title: "persons responsible", Note: "Who answers for this file.", says: Conditions},
		{Type: "board", Key: "requirement_id", Kind: KindText, Title: "requirement number", Note: "Number the owner gave to the requirement.", Example: "BL-REQ-207", says: Conditions},
		{Type: "board", Key: "counted", Kind: KindObject, Of: "counted", Title: "counts", Note: "Counts taken from the single-line diagram; they show that nothing was left out.", says: Conditions},
		{Type: "board", Key: "system", Kind: KindObject, Of: "system", Title: "electrical system", Note: "The system the board is connected to.", says: Conditions},
		{Type: "board", Key: "site", Kind: KindObject, Of: "site", Title: "site", Note: "Surroundings at the place of installation.", says: Conditions},
		{Type: "board", Key: "sources", Kind: KindCollection, Of: "source", Title: "sources", Note: "Every source that can feed the bars.", says: Conditions},
		{Type: "board", Key: "other_supplies", Kind: KindCollection, Of: "other_supply", None: true, Title: "other supplies and stored energy", Note: "What keeps parts live when the sources are off.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", says: Conditions},
		{Type: "board", Key: "sections", Kind: KindCollection, Of: "section", Title: "bar sections", Note: "Parts of the bars that couplers can separate.", says: Claims},
		{Type: "board", Key: "transfer", Kind: KindObject, Of: "transfer", None: true, Title: "transfer between sources", Note: "What keeps sources apart or lets them run together.", says: Claims},
		{Type: "board", Key: "standby", Kind: KindNames, Collections: []string{"units"}, List: true, None: true, Title: "standby motors", Note: "Motors that never run together with the others; all others count as running.", Clause: "common practice", Example: "[P6]", says: Conditions},
		{Type: "board", Key: "assembly", Kind: KindObject, Of: "assembly", Title: "assembly", Note: "Ratings and construction of the whole board.", says: Claims},
		{Type: "board", Key: "busbars", Kind: KindCollection, Of: "busbar", Title: "busbars", Note: "Main bars and distribution bars.", says: Claims},
		{Type: "board", Key: "units", Kind: KindCollection, Of: "unit", Title: "functional units", Note: "Incomers and couplers and feeders.", says: Claims},
		{Type: "board", Key: "taps", Kind: KindCollection, Of: "tap", None: true, Title: "taps", Note: "Every connection to bars or line side that is not a unit.", says: Claims},
		{Type: "board", Key: "protection", Kind: KindCollection, Of: "protective_device", Title: "protective devices", Note: "Devices and settings that clear faults.", says: Claims},
		{Type: "board", Key: "auxiliary_supply", Kind: KindObject, Of: "auxiliary_supply", Title: "auxiliary supply", Note: "What the tripping lives on.", says: Claims},
		{Type: "board", Key: "arc", Kind: KindObject, Of: "arc", Title: "internal arc", Note: "Containment and detection and limitation of arcs.", says: Claims},
		{Type: "board", Key: "work", Kind: KindObject, Of: "work", Title: "work at the board", Note: "Tasks and rules for persons at the board.", says: Conditions},
		{Type: "board", Key: "evidence", Kind: KindObject, Of: "evidence_item", List: true, None: true, Title: "evidence", Note: "Reports that show a value, circuit by circuit.", Clause: "IEC 61439-1 Annex D", says: Claims},
		{Type: "board", Key: "routine_verification", Kind: KindObject, Of: "routine_verification", Title: "routine verification", Note: "What was verified on the finished board.", Clause: "IEC 61439-1 clause 11", says: Claims},
	}},
	{name: "editions", title: "editions of standards", short: "", fields: []*Field{
		{Type: "editions", Key: "iec_61439_1", Kind: KindCount, Least: 1999, Most: 2099, Title: "edition of IEC 61439-1", Note: "Year of the general rules for assemblies.", Example: "2020"},
		{Type: "editions", Key: "iec_61439_2", Kind: KindCount, Least: 1999, Most: 2099, Title: "edition of IEC 61439-2", Note: "Year of the part for power assemblies.", Example: "2020"},
		{Type: "editions", Key: "iec_60664_1", Kind: KindCount, Least: 1992, Most: 2099, Title: "edition of IEC 60664-1", Note: "Year of the insulation coordination standard.", Example: "2020"},
		{Type: "editions", Key: "iec_60909_0", Kind: KindCount, Least: 1988, Most: 2099, Title: "edition of IEC 60909-0", Note: "Year of the short-circuit calculation standard.", Example: "2016"},
		{Type: "editions", Key: "iec_60865_1", Kind: KindCount, Least: 1986, Most: 2099, Title: "edition of IEC 60865-1", Note: "Year of the standard for short-circuit effects.", Example: "2011"},
		{Type: "editions", Key: "iec_60947_2", Kind: KindCount, Least: 1995, Most: 2099, Title: "edition of IEC 60947-2", Note: "Year of the circuit-breaker standard.", Example: "2016"},
		{Type: "editions", Key: "iec_tr_61641", Kind: KindCount, Least: 1996, Most: 2099, Title: "edition of IEC TR 61641", Note: "Year of the guide to internal arc tests.", Example: "2014"},
		{Type: "editions", Key: "dguv_203_077", Kind: KindCount, Least: 2010, Most: 2099, Title: "edition of DGUV-I 203-077", Note: "Year of the guide to the box-test method.", Example: "2020"},
		{Type: "editions", Key: "ieee_1584", Kind: KindCount, Least: 2002, Most: 2099, Title: "edition of IEEE 1584", Note: "Year of the guide to incident energy.", Example: "2018"},
		{Type: "editions", Key: "nfpa_70e", Kind: KindCount, Least: 1995, Most: 2099, Title: "edition of NFPA 70E", Note: "Year of the workplace safety standard.", Example: "2024"},
		{Type: "editions", Key: "nec", Kind: KindCount, Least: 1999, Most: 2099, Title: "edition of the NEC", Note: "Year of NFPA 70.", Example: "2023"},
	}},
	{name: "document", title: "document", short: "title", fields: []*Field{
		{Type: "document", Key: "title", Kind: KindText, Title: "title", Note: "As printed on the document.", Example: "Single-line diagram"},
		{Type: "document", Key: "number", Kind: KindText, Title: "number", Note: "Number under which it is filed.", Example: "BL-E-0101"},
		{Type: "document", Key: "revision", Kind: KindText, Title: "revision", Note: "Revision the values were read from.", Example: "F"},
		{Type: "document", Key: "date", Kind: KindDay, Title: "date", Note: "Date of that revision.", Example: "2026-03-14"},
	}},
	{name: "roles", title: "persons responsible", short: "", fields: []*Field{
		{Type: "roles", Key: "prepared_by", Kind: KindText, Title: "prepared by", Note: "Name and competence.", Example: "\"R. Fenn, electrical engineer\""},
		{Type: "roles", Key: "checked_by", Kind: KindText, Title: "checked by", Note: "A person other than the author.", Example: "\"O. Marsh, senior engineer\""},
		{Type: "roles", Key: "approved_by", Kind: KindText, Title: "approved by", Note: "Who signs for the owner.", Example: "\"T. Dyke, chief engineer\""},
	}},
	{name: "counted", title: "counts from the single-line diagram", short: "", fields: []*Field{
		{Type: "counted", Key: "sources", Kind: KindCount, Least: 1, Most: 50, Title: "number of sources", Note: "Sources drawn on the diagram.", Example: "3"},
		{Type: "counted", Key: "sections", Kind: KindCount, Least: 1, Most: 50, Title: "number of sections", Note: "Sections drawn on the diagram.", Example: "2"},
		{Type: "counted", Key: "busbars", Kind: KindCount, Least: 1, Most: 200, Title: "number of busbars", Note: "Main and distribution bars drawn on the diagram.", Example: "3"},
		{Type: "counted", Key: "units", Kind: KindCount, Least: 1, Most: 1000, Title: "number of units", Note: "Incomers, couplers and feeders drawn on the diagram.", Example: "10"},
		{Type: "counted", Key: "taps", Kind: KindCount, Least: 0, Most: 500, Title: "number of taps", Note: "Connections to bars or line side that are not units.", Example: "4"},
		{Type: "counted", Key: "other_supplies", Kind: KindCount, Least: 0, Most: 100, Title: "number of other supplies", Note: "Other supplies and stores drawn on the diagram.", Example: "1"},
	}},
	{name: "system", title: "electrical system", short: "", fields: []*Field{
		{Type: "system", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "nominal voltage", Symbol: "Un", Note: "Line to line at the bars.", Clause: "IEC 61439-1 5.2 (from memory, unconfirmed)", Usual: &Range{Text: "100 V to 1000 V", Low: 100, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "400 V"},
		{Type: "system", Key: "highest_circuit_voltage", Kind: KindQuantity, Dimension: "voltage", None: true, Title: "highest circuit voltage", Note: "Voltage of the highest circuit on the board where it is above the system voltage.", Clause: "IEC 61439-1 5.2 (from memory, unconfirmed)", Usual: &Range{Text: "100 V to 1500 V", Low: 100, High: 1500}, Possible: &Range{Text: "24 V to 3 kV", Low: 24, High: 3000}, Example: "690 V"},
		{Type: "system", Key: "voltage_tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "voltage tolerance", Note: "Upper tolerance of the supply; it decides the voltage factors.", Clause: "IEC 60909-0 Table 1 (from memory, unconfirmed)", Usual: &Range{Text: "5 % to 10 %", Low: 0.05, High: 0.1}, Possible: &Range{Text: "1 % to 20 %", Low: 0.01, High: 0.2}, Example: "10 %"},
		{Type: "system", Key: "frequency", Kind: KindQuantity, Dimension: "frequency", Title: "rated frequency", Symbol: "fn", Note: "Frequency of the supply.", Clause: "IEC 61439-1 5.5 (from memory, unconfirmed)", Usual: &Range{Text: "50 Hz to 60 Hz", Low: 50, High: 60}, Possible: &Range{Text: "16 Hz to 400 Hz", Low: 16, High: 400}, Example: "50 Hz"},
		{Type: "system", Key: "earthing", Kind: KindWords, Words: theEarthingSystemList, Title: "system earthing", Note: "How the star point and exposed parts are earthed.", Clause: "IEC 60364-1 312.2 (from memory, unconfirmed)", Example: "TN-S"},
		{Type: "system", Key: "earth_electrode", Kind: KindQuantity, Dimension: "resistance", Title: "earth electrode resistance", Symbol: "RA", Note: "Electrode of the exposed parts in a TT or IT system.", Clause: "IEC 60364-4-41 411.5 (from memory, unconfirmed)", Usual: &Range{Text: "50 mΩ to 40 Ω", Low: 0.05, High: 40}, Possible: &Range{Text: "1 mΩ to 10 kΩ", Low: 0.001, High: 10000}, Example: "2 Ω"},
		{Type: "system", Key: "neutral_links", Kind: KindObject, Of: "neutral_link", List: true, None: true, Title: "neutral-to-earth links", Note: "Every place where neutral and earth are joined, sources included.", Clause: "IEC 60364-4-44 444.4.6 (from memory, unconfirmed)"},
		{Type: "system", Key: "overvoltage_category", Kind: KindWords, Words: theOvervoltageCategoryList, Title: "overvoltage category", Note: "Category at the incoming terminals.", Clause: "IEC 60664-1 Table F.1", Example: "I"},
		{Type: "system", Key: "third_harmonic", Kind: KindQuantity, Dimension: "percentage", Title: "third harmonic", Note: "Third harmonic share of the line current.", Clause: "IEC 60364-5-52 Annex E (from memory, unconfirmed)", Usual: &Range{Text: "0 % to 60 %", Low: 0, High: 0.6}, Possible: &Range{Text: "0 % to 150 %", Low: 0, High: 1.5}, Example: "8 %"},
		{Type: "system", Key: "declared_fault", Kind: KindObject, Of: "declared_fault", Title: "declared prospective current", Note: "What the network operator or owner states at the incoming terminals."},
	}},
	{name: "neutral_link", title: "neutral-to-earth link", short: "at", fields: []*Field{
		{Type: "neutral_link", Key: "at", Kind: KindWords, Words: theNeutralLinkPlaceList, Title: "place", Note: "Where neutral and earth are joined.", Example: "board"},
		{Type: "neutral_link", Key: "removable", Kind: KindWords, Words: theLinkRemovalList, Title: "removal", Note: "How the link is opened for testing.", Clause: "common practice", Example: "by hand"},
		{Type: "neutral_link", Key: "labelled", Kind: KindYesNo, Title: "labelled", Note: "A label marks the link.", Clause: "common practice", Example: "yes"},
		{Type: "neutral_link", Key: "closes_with", Kind: KindNames, Collections: []string{"units"}, Title: "switched with", Note: "Unit whose position opens or closes the link.", Example: "QG"},
	}},
	{name: "declared_fault", title: "declared prospective current", short: "largest", fields: []*Field{
		{Type: "declared_fault", Key: "largest", Kind: KindQuantity, Dimension: "current", Title: "largest prospective current", Symbol: "Icp", Note: "Largest three-phase r.m.s. current.", Clause: "IEC 61439-1 Annex C (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 150 kA", Low: 1000, High: 150000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "42 kA"},
		{Type: "declared_fault", Key: "smallest", Kind: KindQuantity, Dimension: "current", Title: "smallest prospective current", Note: "Smallest three-phase r.m.s. current.", Clause: "common practice", Usual: &Range{Text: "500 A to 100 kA", Low: 500, High: 100000}, Possible: &Range{Text: "10 A to 400 kA", Low: 10, High: 400000}, Example: "27 kA"},
		{Type: "declared_fault", Key: "future_largest", Kind: KindQuantity, Dimension: "current", Title: "largest future prospective current", Note: "What the network may grow to.", Clause: "common practice", Usual: &Range{Text: "1 kA to 150 kA", Low: 1000, High: 150000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "45 kA"},
		{Type: "declared_fault", Key: "given_by", Kind: KindText, Title: "given by", Note: "Who stated the figures.", Example: "network operator"},
		{Type: "declared_fault", Key: "date", Kind: KindDay, Title: "date", Note: "Date of the statement.", Example: "2026-02-10"},
	}},
	{name: "site", title: "site", short: "", fields: []*Field{
		{Type: "site", Key: "location", Kind: KindWords, Words: theInstallationPlaceList, Title: "place of installation", Note: "Decides the service conditions.", Clause: "IEC 61439-1 7.1", Example: "indoor"},
		{Type: "site", Key: "altitude", Kind: KindQuantity, Dimension: "length", Title: "altitude", Note: "Height above sea level.", Clause: "IEC 61439-1 7.1; IEC 60664-1 Table A.2", Usual: &Range{Text: "-20 m to 4500 m", Low: -20, High: 4500}, Possible: &Range{Text: "-430 m to 6000 m", Low: -430, High: 6000}, Example: "12 m"},
		{Type: "site", Key: "ambient_max", Kind: KindQuantity, Dimension: "temperature", Title: "highest ambient temperature", Note: "Air around the board.", Clause: "IEC 61439-1 7.1", Usual: &Range{Text: "25 °C to 55 °C", Low: 25, High: 55}, Possible: &Range{Text: "-20 °C to 70 °C", Low: -20, High: 70}, Example: "40 °C"},
		{Type: "site", Key: "ambient_daily_mean", Kind: KindQuantity, Dimension: "temperature", Title: "highest daily mean temperature", Note: "Mean over 24 h of the air around the board.", Clause: "IEC 61439-1 7.1", Usual: &Range{Text: "15 °C to 50 °C", Low: 15, High: 50}, Possible: &Range{Text: "-30 °C to 65 °C", Low: -30, High: 65}, Example: "35 °C"},
		{Type: "site", Key: "ambient_min", Kind: KindQuantity, Dimension: "temperature", Title: "lowest ambient temperature", Note: "Air around the board.", Clause: "IEC 61439-1 7.1", Usual: &Range{Text: "-40 °C to 15 °C", Low: -40, High: 15}, Possible: &Range{Text: "-70 °C to 40 °C", Low: -70, High: 40}, Example: "-5 °C"},
		{Type: "site", Key: "air_inside_board", Kind: KindQuantity, Dimension: "temperature", Title: "air temperature inside the board", Note: "Air at the devices in full service.", Clause: "IEC 61439-1 10.10", Usual: &Range{Text: "30 °C to 80 °C", Low: 30, High: 80}, Possible: &Range{Text: "-20 °C to 120 °C", Low: -20, High: 120}, Example: "55 °C"},
		{Type: "site", Key: "humidity", Kind: KindQuantity, Dimension: "percentage", Title: "relative humidity", Note: "Highest value at the highest temperature.", Clause: "IEC 61439-1 7.1", Usual: &Range{Text: "20 % to 100 %", Low: 0.2, High: 1}, Possible: &Range{Text: "1 % to 100 %", Low: 0.01, High: 1}, Example: "50 %"},
		{Type: "site", Key: "pollution_degree", Kind: KindCount, Least: 1, Most: 4, Title: "pollution degree", Note: "Pollution the insulation has to live with.", Clause: "IEC 60664-1", Example: "3"},
		{Type: "site", Key: "flood_level", Kind: KindQuantity, Dimension: "length", None: true, Title: "flood level", Note: "Water above the switchroom floor; none where it cannot come.", Clause: "common practice", Usual: &Range{Text: "0 m to 5 m", Low: 0, High: 5}, Possible: &Range{Text: "0 m to 30 m", Low: 0, High: 30}, Example: "0.4 m"},
		{Type: "site", Key: "base_height", Kind: KindQuantity, Dimension: "length", Title: "height of the base", Note: "Lowest live part above the switchroom floor.", Clause: "common practice", Usual: &Range{Text: "20 mm to 6 m", Low: 0.02, High: 6}, Possible: &Range{Text: "0 m to 30 m", Low: 0, High: 30}, Example: "0.6 m"},
		{Type: "site", Key: "condensation", Kind: KindWords, Words: theCondensationFrequencyList, Title: "condensation", Note: "How often it forms inside an unheated board.", Clause: "IEC 61439-1 7.1", Example: "not expected"},
		{Type: "site", Key: "corrosive_air", Kind: KindWords, Words: theCorrosiveAgentList, List: true, None: true, Title: "corrosive air", Note: "Agents in the air of the room.", Clause: "IEC 61439-1 7.2 (from memory, unconfirmed)", Example: "[salt]"},
		{Type: "site", Key: "dust", Kind: KindWords, Words: theDustKindList, List: true, None: true, Title: "dust", Note: "Dust in the air of the room.", Clause: "IEC 61439-1 7.2 (from memory, unconfirmed)", Example: "[ordinary]"},
		{Type: "site", Key: "animals", Kind: KindYesNo, Title: "animals", Note: "Rodents or insects or reptiles are to be expected.", Clause: "common practice", Example: "yes"},
		{Type: "site", Key: "persons", Kind: KindWords, Words: thePersonsList, Title: "persons with access", Note: "Least competent persons who can reach the board.", Clause: "IEC 61439-1 8.4.6 (from memory, unconfirmed)", Example: "ordinary persons"},
		{Type: "site", Key: "emc_environment", Kind: KindWords, Words: theEmcEnvironmentList, Title: "electromagnetic environment", Note: "Environment of the place.", Clause: "IEC 61439-1 Annex J (from memory, unconfirmed)", Example: "A"},
		{Type: "site", Key: "lightning_protection", Kind: KindYesNo, Title: "external lightning protection", Note: "The building has a lightning protection system.", Clause: "IEC 60364-5-53 534 (from memory, unconfirmed)", Example: "yes"},
		{Type: "site", Key: "overhead_line", Kind: KindYesNo, Title: "overhead supply line", Note: "The supply comes over an overhead line.", Clause: "IEC 60364-4-44 443 (from memory, unconfirmed)", Example: "yes"},
		{Type: "site", Key: "seismic", Kind: KindText, None: true, Title: "seismic requirement", Note: "Level asked for; none where there is none.", Example: "0.2 g at floor level"},
	}},
	{name: "source", title: "source", short: "", fields: []*Field{
		{Type: "source", Key: "kind", Kind: KindWords, Words: theSourceKindList, Title: "kind", Note: "Decides which figures are needed.", Example: "transformer"},
		{Type: "source", Key: "rating", Kind: KindQuantity, Dimension: "apparent_power", Title: "rated power", Symbol: "Sr", Note: "Natural cooling.", Clause: "IEC 60909-0", Usual: &Range{Text: "25 kVA to 6 MVA", Low: 25000, High: 6e+06}, Possible: &Range{Text: "1 kVA to 60 MVA", Low: 1000, High: 6e+07}, Example: "1600 kVA"},
		{Type: "source", Key: "rating_forced", Kind: KindQuantity, Dimension: "apparent_power", None: true, Title: "rated power with forced cooling", Note: "Power with fans running; none where there are no fans.", Clause: "common practice", Usual: &Range{Text: "25 kVA to 8 MVA", Low: 25000, High: 8e+06}, Possible: &Range{Text: "1 kVA to 80 MVA", Low: 1000, High: 8e+07}, Example: "2240 kVA"},
		{Type: "source", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated voltage", Symbol: "Ur", Note: "Of a generator or utility supply or converter.", Clause: "IEC 60909-0", Usual: &Range{Text: "100 V to 1000 V", Low: 100, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "400 V"},
		{Type: "source", Key: "secondary", Kind: KindQuantity, Dimension: "voltage", Title: "secondary voltage", Symbol: "UrTLV", Note: "No-load voltage of the transformer on the board side.", Clause: "IEC 60909-0", Usual: &Range{Text: "100 V to 1050 V", Low: 100, High: 1050}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "400 V"},
		{Type: "source", Key: "primary", Kind: KindQuantity, Dimension: "voltage", Title: "primary voltage", Symbol: "UrTHV", Note: "Rated voltage of the transformer on the network side.", Clause: "IEC 60909-0", Usual: &Range{Text: "380 V to 36 kV", Low: 380, High: 36000}, Possible: &Range{Text: "100 V to 150 kV", Low: 100, High: 150000}, Example: "11 kV"},
		{Type: "source", Key: "impedance", Kind: KindObject, Of: "impedance", Title: "short-circuit impedance", Note: "Of the transformer at the principal tap.", Clause: "IEC 60909-0"},
		{Type: "source", Key: "load_loss", Kind: KindQuantity, Dimension: "power", Title: "load loss", Symbol: "PkrT", Note: "At rated current; the resistive part uRr times the rating.", Clause: "IEC 60909-0", Usual: &Range{Text: "250 W to 80 kW", Low: 250, High: 80000}, Possible: &Range{Text: "5 W to 800 kW", Low: 5, High: 800000}, Example: "13 kW"},
		{Type: "source", Key: "vector_group", Kind: KindText, Title: "vector group", Note: "Winding connection of the transformer.", Clause: "IEC 60076-1 (from memory, unconfirmed)", Example: "Dyn11"},
		{Type: "source", Key: "zero_sequence", Kind: KindObject, Of: "zero_sequence", Title: "zero sequence", Note: "Ratios that decide the earth fault current.", Clause: "IEC 60909-0"},
		{Type: "source", Key: "neutral", Kind: KindObject, Of: "source_neutral", Title: "neutral of the source", Note: "Where it is earthed and whether it is switched."},
		{Type: "source", Key: "network", Kind: KindObject, Of: "network", Title: "network ahead", Note: "Network that feeds the transformer or utility supply."},
		{Type: "source", Key: "link", Kind: KindObject, Of: "link", None: true, Title: "link to the board", Note: "Conductors from the source to the incomer; none for direct flanging."},
		{Type: "source", Key: "subtransient_reactance", Kind: KindQuantity, Dimension: "percentage", Title: "subtransient reactance", Symbol: "x\"d", Note: "Saturated value on the machine rating.", Clause: "IEC 60909-0", Usual: &Range{Text: "6 % to 30 %", Low: 0.06, High: 0.3}, Possible: &Range{Text: "2 % to 100 %", Low: 0.02, High: 1}, Example: "13 %"},
		{Type: "source", Key: "transient_reactance", Kind: KindQuantity, Dimension: "percentage", Title: "transient reactance", Symbol: "x'd", Note: "Saturated value on the machine rating.", Clause: "common practice", Usual: &Range{Text: "10 % to 50 %", Low: 0.1, High: 0.5}, Possible: &Range{Text: "3 % to 200 %", Low: 0.03, High: 2}, Example: "20 %"},
		{Type: "source", Key: "negative_sequence_reactance", Kind: KindQuantity, Dimension: "percentage", Title: "negative sequence reactance", Symbol: "x2", Note: "On the machine rating.", Clause: "IEC 60909-0", Usual: &Range{Text: "6 % to 40 %", Low: 0.06, High: 0.4}, Possible: &Range{Text: "2 % to 150 %", Low: 0.02, High: 1.5}, Example: "15 %"},
		{Type: "source", Key: "zero_sequence_reactance", Kind: KindQuantity, Dimension: "percentage", Title: "zero sequence reactance", Symbol: "x0", Note: "On the machine rating.", Clause: "IEC 60909-0", Usual: &Range{Text: "1 % to 15 %", Low: 0.01, High: 0.15}, Possible: &Range{Text: "0.2 % to 60 %", Low: 0.002, High: 0.6}, Example: "4 %"},
		{Type: "source", Key: "time_constants", Kind: KindObject, Of: "time_constants", Title: "time constants", Note: "How the fault current of the machine decays."},
		{Type: "source", Key: "sustained_current", Kind: KindObject, Of: "sustained_current", None: true, Title: "sustained short-circuit current", Note: "What the machine keeps up; none where the excitation collapses."},
		{Type: "source", Key: "excitation", Kind: KindWords, Words: theExcitationKindList, Title: "excitation", Note: "Where the field of the machine takes its power from.", Clause: "common practice", Example: "self-excited"},
		{Type: "source", Key: "power_factor", Kind: KindQuantity, Dimension: "number", Title: "rated power factor", Symbol: "cos φ", Note: "Of the machine.", Clause: "IEC 60909-0", Usual: &Range{Text: "0.7 to 1", Low: 0.7, High: 1}, Possible: &Range{Text: "0.1 to 1", Low: 0.1, High: 1}, Example: "0.8"},
		{Type: "source", Key: "largest_current", Kind: KindQuantity, Dimension: "multiple", Title: "largest current of the converter", Note: "Multiple of the rated current that an inverter or ups feeds into a fault.", Clause: "IEC 60909-0:2016 6.10 (from memory, unconfirmed)", Usual: &Range{Text: "1 x to 3 x", Low: 1, High: 3}, Possible: &Range{Text: "0.1 x to 10 x", Low: 0.1, High: 10}, Example: "1.2 x"},
		{Type: "source", Key: "static_bypass", Kind: KindYesNo, Title: "static bypass", Note: "A ups can connect another supply straight to the bars.", Clause: "common practice", Example: "yes"},
		{Type: "source", Key: "upstream_device", Kind: KindNames, Collections: []string{"protection"}, Title: "upstream device", Note: "Protection that clears a fault between source and incomer.", Clause: "common practice", Example: "TX1-HV"},
	}},
	{name: "impedance", title: "short-circuit impedance", short: "value", fields: []*Field{
		{Type: "impedance", Key: "value", Kind: KindQuantity, Dimension: "percentage", Title: "impedance", Symbol: "ukr", Note: "Rated or measured short-circuit voltage; the lowest over the range of taps.", Clause: "IEC 60909-0", Usual: &Range{Text: "3 % to 10 %", Low: 0.03, High: 0.1}, Possible: &Range{Text: "0.5 % to 30 %", Low: 0.005, High: 0.3}, Example: "6 %"},
		{Type: "impedance", Key: "measured", Kind: KindText, Title: "test report", Note: "Report of the measurement; no tolerance is then added.", Example: "FAT-123"},
	}},
	{name: "zero_sequence", title: "zero sequence ratios", short: "", fields: []*Field{
		{Type: "zero_sequence", Key: "x0_x1", Kind: KindQuantity, Dimension: "number", Title: "reactance ratio", Symbol: "X0/X1", Note: "Zero to positive sequence reactance.", Clause: "IEC TR 60909-4", Usual: &Range{Text: "0.2 to 10", Low: 0.2, High: 10}, Possible: &Range{Text: "0.01 to 100", Low: 0.01, High: 100}, Example: "0.95"},
		{Type: "zero_sequence", Key: "r0_r1", Kind: KindQuantity, Dimension: "number", Title: "resistance ratio", Symbol: "R0/R1", Note: "Zero to positive sequence resistance.", Clause: "IEC TR 60909-4", Usual: &Range{Text: "0.2 to 20", Low: 0.2, High: 20}, Possible: &Range{Text: "0.01 to 200", Low: 0.01, High: 200}, Example: "1.0"},
	}},
	{name: "source_neutral", title: "neutral of a source", short: "earthed", fields: []*Field{
		{Type: "source_neutral", Key: "earthed", Kind: KindWords, Words: theNeutralEarthingList, Title: "earthing", Note: "Where the star point is earthed.", Example: "at board"},
		{Type: "source_neutral", Key: "switched", Kind: KindYesNo, Title: "switched", Note: "The neutral opens with the lines.", Clause: "common practice", Example: "yes"},
		{Type: "source_neutral", Key: "resistance", Kind: KindQuantity, Dimension: "resistance", Title: "earthing resistance", Note: "Resistor between star point and earth.", Clause: "common practice", Usual: &Range{Text: "0.5 Ω to 400 Ω", Low: 0.5, High: 400}, Possible: &Range{Text: "1 mΩ to 10 kΩ", Low: 0.001, High: 10000}, Example: "55 Ω"},
	}},
	{name: "network", title: "network ahead of a source", short: "", fields: []*Field{
		{Type: "network", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "network voltage", Symbol: "UnQ", Note: "Line to line.", Clause: "IEC 60909-0", Usual: &Range{Text: "380 V to 36 kV", Low: 380, High: 36000}, Possible: &Range{Text: "100 V to 150 kV", Low: 100, High: 150000}, Example: "11 kV"},
		{Type: "network", Key: "fault_level_max", Kind: KindQuantity, Dimension: "apparent_power", Title: "largest fault level", Symbol: "S\"kQ max", Note: "Largest short-circuit power at the connection.", Clause: "IEC 60909-0", Usual: &Range{Text: "10 MVA to 8000 MVA", Low: 1e+07, High: 8e+09}, Possible: &Range{Text: "1 MVA to 60 GVA", Low: 1e+06, High: 6e+10}, Example: "500 MVA"},
		{Type: "network", Key: "fault_level_min", Kind: KindQuantity, Dimension: "apparent_power", Title: "smallest fault level", Symbol: "S\"kQ min", Note: "Smallest short-circuit power at the connection.", Clause: "IEC 60909-0", Usual: &Range{Text: "5 MVA to 4000 MVA", Low: 5e+06, High: 4e+09}, Possible: &Range{Text: "100 kVA to 60 GVA", Low: 100000, High: 6e+10}, Example: "200 MVA"},
		{Type: "network", Key: "fault_current_max", Kind: KindQuantity, Dimension: "current", Title: "largest fault current", Symbol: "I\"kQ max", Note: "Instead of the largest fault level.", Clause: "IEC 60909-0", Usual: &Range{Text: "500 A to 100 kA", Low: 500, High: 100000}, Possible: &Range{Text: "10 A to 400 kA", Low: 10, High: 400000}, Example: "26.2 kA"},
		{Type: "network", Key: "fault_current_min", Kind: KindQuantity, Dimension: "current", Title: "smallest fault current", Symbol: "I\"kQ min", Note: "Instead of the smallest fault level.", Clause: "IEC 60909-0", Usual: &Range{Text: "200 A to 80 kA", Low: 200, High: 80000}, Possible: &Range{Text: "5 A to 400 kA", Low: 5, High: 400000}, Example: "10.5 kA"},
		{Type: "network", Key: "future_fault_level", Kind: KindQuantity, Dimension: "apparent_power", Title: "largest future fault level", Note: "What the operator may grow to.", Clause: "common practice", Usual: &Range{Text: "10 MVA to 8000 MVA", Low: 1e+07, High: 8e+09}, Possible: &Range{Text: "1 MVA to 60 GVA", Low: 1e+06, High: 6e+10}, Example: "550 MVA"},
		{Type: "network", Key: "r_x", Kind: KindQuantity, Dimension: "number", Title: "resistance to reactance", Symbol: "RQ/XQ", Note: "Of the network; a tenth where unknown.", Clause: "IEC 60909-0", Usual: &Range{Text: "0.03 to 3", Low: 0.03, High: 3}, Possible: &Range{Text: "0.001 to 20", Low: 0.001, High: 20}, Example: "0.1"},
		{Type: "network", Key: "given_by", Kind: KindText, Title: "given by", Note: "Who stated the figures.", Example: "network operator"},
		{Type: "network", Key: "date", Kind: KindDay, Title: "date", Note: "Date of the statement.", Example: "2026-02-10"},
	}},
	{name: "link", title: "link from source to board", short: "", fields: []*Field{
		{Type: "link", Key: "kind", Kind: KindWords, Words: theLinkKindList, Title: "kind", Note: "Cables or bars or busduct.", Example: "cable"},
		{Type: "link", Key: "conductor", Kind: KindWords, Words: theConductorMetalList, Title: "conductor", Note: "Metal of the line conductors.", Example: "copper"},
		{Type: "link", Key: "insulation", Kind: KindWords, Words: theCableInsulationList, Title: "insulation", Note: "Decides the temperature at the end of a fault.", Example: "pvc"},
		{Type: "link", Key: "area", Kind: KindQuantity, Dimension: "area", Title: "line conductor area", Symbol: "S", Note: "One conductor.", Clause: "common practice", Usual: &Range{Text: "1.5 mm2 to 1400 mm2", Low: 1.5e-06, High: 0.0014}, Possible: &Range{Text: "0.5 mm2 to 20000 mm2", Low: 5e-07, High: 0.02}, Example: "240 mm2"},
		{Type: "link", Key: "in_parallel", Kind: KindCount, Least: 1, Most: 30, Title: "conductors in parallel", Note: "Per line.", Example: "5"},
		{Type: "link", Key: "neutral_area", Kind: KindQuantity, Dimension: "area", None: true, Title: "neutral area", Note: "All parallel conductors together.", Clause: "common practice", Usual: &Range{Text: "16 mm2 to 9000 mm2", Low: 1.6e-05, High: 0.009}, Possible: &Range{Text: "0.5 mm2 to 60000 mm2", Low: 5e-07, High: 0.06}, Example: "1200 mm2"},
		{Type: "link", Key: "protective_area", Kind: KindQuantity, Dimension: "area", None: true, Title: "protective conductor area", Note: "All parallel conductors together.", Clause: "IEC 61439-1 Table 5", Usual: &Range{Text: "16 mm2 to 9000 mm2", Low: 1.6e-05, High: 0.009}, Possible: &Range{Text: "0.5 mm2 to 60000 mm2", Low: 5e-07, High: 0.06}, Example: "600 mm2"},
		{Type: "link", Key: "length", Kind: KindQuantity, Dimension: "length", Title: "length", Symbol: "l", Note: "Along the route.", Clause: "common practice", Usual: &Range{Text: "0.5 m to 450 m", Low: 0.5, High: 450}, Possible: &Range{Text: "50 mm to 5 km", Low: 0.05, High: 5000}, Example: "14 m"},
		{Type: "link", Key: "resistance_per_length", Kind: KindQuantity, Dimension: "resistance_per_length", Title: "resistance per length", Symbol: "R'", Note: "One conductor at 20 °C.", Clause: "common practice", Usual: &Range{Text: "5 µΩ/m to 4 mΩ/m", Low: 5e-06, High: 0.004}, Possible: &Range{Text: "0.5 µΩ/m to 100 mΩ/m", Low: 5e-07, High: 0.1}, Example: "0.0754 mΩ/m"},
		{Type: "link", Key: "reactance_per_length", Kind: KindQuantity, Dimension: "resistance_per_length", Title: "reactance per length", Symbol: "X'", Note: "One conductor as laid.", Clause: "common practice", Usual: &Range{Text: "10 µΩ/m to 0.5 mΩ/m", Low: 1e-05, High: 0.0005}, Possible: &Range{Text: "1 µΩ/m to 10 mΩ/m", Low: 1e-06, High: 0.01}, Example: "0.08 mΩ/m"},
		{Type: "link", Key: "zero_sequence", Kind: KindObject, Of: "zero_sequence", Title: "zero sequence of the link", Note: "Ratios with the return path as laid.", Clause: "IEC 60909-0"},
		{Type: "link", Key: "cleats_tested_to", Kind: KindQuantity, Dimension: "current", None: true, Title: "peak current of the cleats", Note: "Peak the fixing was tested to.", Clause: "IEC 61914 (from memory, unconfirmed)", Usual: &Range{Text: "5 kA to 300 kA", Low: 5000, High: 300000}, Possible: &Range{Text: "1 kA to 600 kA", Low: 1000, High: 600000}, Example: "110 kA"},
	}},
	{name: "time_constants", title: "time constants of a generator", short: "", fields: []*Field{
		{Type: "time_constants", Key: "subtransient", Kind: KindQuantity, Dimension: "time", Title: "subtransient time constant", Symbol: "T\"d", Note: "Short-circuit value.", Clause: "common practice", Usual: &Range{Text: "3 ms to 200 ms", Low: 0.003, High: 0.2}, Possible: &Range{Text: "0.5 ms to 2 s", Low: 0.0005, High: 2}, Example: "15 ms"},
		{Type: "time_constants", Key: "transient", Kind: KindQuantity, Dimension: "time", Title: "transient time constant", Symbol: "T'd", Note: "Short-circuit value.", Clause: "common practice", Usual: &Range{Text: "20 ms to 5 s", Low: 0.02, High: 5}, Possible: &Range{Text: "5 ms to 30 s", Low: 0.005, High: 30}, Example: "100 ms"},
		{Type: "time_constants", Key: "direct_current", Kind: KindQuantity, Dimension: "time", Title: "direct current time constant", Symbol: "Ta", Note: "Armature winding.", Clause: "common practice", Usual: &Range{Text: "3 ms to 500 ms", Low: 0.003, High: 0.5}, Possible: &Range{Text: "0.5 ms to 5 s", Low: 0.0005, High: 5}, Example: "25 ms"},
	}},
	{name: "sustained_current", title: "sustained short-circuit current", short: "current", fields: []*Field{
		{Type: "sustained_current", Key: "current", Kind: KindQuantity, Dimension: "multiple", Title: "sustained current", Symbol: "Ikd", Note: "Multiple of the rated current with a three-phase fault at the terminals.", Clause: "common practice", Usual: &Range{Text: "0.3 x to 6 x", Low: 0.3, High: 6}, Possible: &Range{Text: "0.05 x to 20 x", Low: 0.05, High: 20}, Example: "3 x"},
		{Type: "sustained_current", Key: "for", Kind: KindQuantity, Dimension: "time", Title: "how long", Note: "Time for which the machine keeps it up.", Clause: "common practice", Usual: &Range{Text: "1 s to 60 s", Low: 1, High: 60}, Possible: &Range{Text: "50 ms to 10 min", Low: 0.05, High: 600}, Example: "10 s"},
	}},
	{name: "other_supply", title: "other supply or stored energy", short: "kind", fields: []*Field{
		{Type: "other_supply", Key: "kind", Kind: KindWords, Words: theOtherSupplyKindList, Title: "kind", Note: "What keeps a part live.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "ups"},
		{Type: "other_supply", Key: "feeds", Kind: KindText, Title: "parts kept live", Note: "What it reaches with all sources off.", Example: "control circuits of all units"},
		{Type: "other_supply", Key: "at", Kind: KindNames, Collections: []string{"units", "busbars"}, Title: "connected at", Note: "Unit or bars where it enters.", Example: "P1"},
		{Type: "other_supply", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage", Note: "At its terminals.", Clause: "common practice", Usual: &Range{Text: "12 V to 1000 V", Low: 12, High: 1000}, Possible: &Range{Text: "1 V to 3 kV", Low: 1, High: 3000}, Example: "230 V"},
		{Type: "other_supply", Key: "rating", Kind: KindQuantity, Dimension: "apparent_power", Title: "rated power", Note: "Reactive power of a capacitor bank.", Clause: "common practice", Usual: &Range{Text: "5 kVA to 3 MVA", Low: 5000, High: 3e+06}, Possible: &Range{Text: "1 VA to 20 MVA", Low: 1, High: 2e+07}, Example: "150 kVA"},
		{Type: "other_supply", Key: "lockable_isolation", Kind: KindYesNo, Title: "lockable isolation", Note: "It has an isolating device that can be locked open.", Clause: "IEC 60364-5-53 (from memory, unconfirmed)", Example: "yes"},
		{Type: "other_supply", Key: "interlock", Kind: KindWords, Words: theInterlockKindList, None: true, Title: "interlock against the sources", Note: "What keeps it from feeding back.", Clause: "common practice", Example: "software"},
		{Type: "other_supply", Key: "labelled", Kind: KindYesNo, Title: "labelled", Note: "Units it keeps live carry a label.", Clause: "common practice", Example: "yes"},
		{Type: "other_supply", Key: "discharge_time", Kind: KindQuantity, Dimension: "time", None: true, Title: "discharge time", Note: "Until stored energy is harmless; none where nothing is stored.", Clause: "common practice", Usual: &Range{Text: "1 s to 15 min", Low: 1, High: 900}, Possible: &Range{Text: "1 ms to 2 h", Low: 0.001, High: 7200}, Example: "5 min"},
	}},
	{name: "section", title: "bar section", short: "bars", fields: []*Field{
		{Type: "section", Key: "bars", Kind: KindNames, Collections: []string{"busbars"}, Title: "main bars", Note: "Main bars of this section.", Example: "main A"},
	}},
	{name: "transfer", title: "transfer between sources", short: "operation", fields: []*Field{
		{Type: "transfer", Key: "operation", Kind: KindWords, Words: theTransferOperationList, Title: "operation", Note: "How one source follows another.", Clause: "common practice", Example: "break before make"},
		{Type: "transfer", Key: "interlocks", Kind: KindObject, Of: "interlock", List: true, None: true, Title: "interlocks", Note: "Only mechanical and key interlocks exclude a supply state.", Clause: "common practice"},
	}},
	{name: "interlock", title: "interlock", short: "", fields: []*Field{
		{Type: "interlock", Key: "kind", Kind: KindWords, Words: theInterlockKindList, Title: "kind", Note: "What makes the closing impossible.", Clause: "common practice", Example: "software"},
		{Type: "interlock", Key: "of", Kind: KindNames, Collections: []string{"units"}, List: true, Title: "units concerned", Note: "Incomers and couplers it acts on.", Example: "[Q1, Q2, QC]"},
		{Type: "interlock", Key: "closed_at_once", Kind: KindCount, Least: 1, Most: 12, Title: "closed at once at most", Note: "How many of these units can be closed together.", Example: "2"},
		{Type: "interlock", Key: "note", Kind: KindText, Title: "remark", Note: "Key plan or drawing.", Example: "two keys for three locks"},
	}},
	{name: "short_time_withstand", title: "rated short-time withstand current", short: "current", fields: []*Field{
		{Type: "short_time_withstand", Key: "current", Kind: KindQuantity, Dimension: "current", Title: "short-time withstand current", Symbol: "Icw", Note: "RMS current carried for the rated duration.", Clause: "IEC 61439-1:2020 5.3.5", Usual: &Range{Text: "1 kA to 150 kA", Low: 1000, High: 150000}, Possible: &Range{Text: "10 A to 400 kA", Low: 10, High: 400000}, Example: "65 kA"},
		{Type: "short_time_withstand", Key: "duration", Kind: KindQuantity, Dimension: "time", Title: "duration", Note: "Time for which the current is carried.", Clause: "IEC 61439-1:2020 5.3.5", Usual: &Range{Text: "50 ms to 3 s", Low: 0.05, High: 3}, Possible: &Range{Text: "1 ms to 10 s", Low: 0.001, High: 10}, Example: "1 s"},
	}},
	{name: "assembly", title: "assembly", short: "", fields: []*Field{
		{Type: "assembly", Key: "standard", Kind: KindWords, Words: theAssemblyStandardList, Title: "standard", Note: "Product standard the maker declares.", Clause: "IEC 61439-1 6.1 (from memory, unconfirmed)", Example: "IEC 61439-2"},
		{Type: "assembly", Key: "manufacturer", Kind: KindObject, Of: "manufacturer", Title: "manufacturer", Note: "Who answers for design and for building.", Clause: "IEC 61439-1 3.10 (from memory, unconfirmed)"},
		{Type: "assembly", Key: "serial_number", Kind: KindText, Title: "serial number", Note: "Number on the nameplate.", Example: "BL-2291"},
		{Type: "assembly", Key: "built", Kind: KindMonth, Title: "date of manufacture", Note: "As on the nameplate.", Clause: "IEC 61439-1 6.1 (from memory, unconfirmed)", Example: "2026-09"},
		{Type: "assembly", Key: "condition", Kind: KindWords, Words: theAssemblyConditionList, Title: "condition", Note: "New or existing or changed.", Example: "new"},
		{Type: "assembly", Key: "modifications", Kind: KindObject, Of: "modification", List: true, None: true, Title: "modifications", Note: "Changes since delivery.", Clause: "IEC 61439-1 clause 10"},
		{Type: "assembly", Key: "rated_operational_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated operational voltage", Symbol: "Ue", Note: "Of the main circuits.", Clause: "IEC 61439-1 5.2.2 (from memory, unconfirmed)", Usual: &Range{Text: "100 V to 1000 V", Low: 100, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "400 V"},
		{Type: "assembly", Key: "rated_insulation_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated insulation voltage", Symbol: "Ui", Note: "Creepage and voltage tests refer to it.", Clause: "IEC 61439-1 5.2.3 (from memory, unconfirmed)", Usual: &Range{Text: "230 V to 1500 V", Low: 230, High: 1500}, Possible: &Range{Text: "50 V to 4 kV", Low: 50, High: 4000}, Example: "1000 V"},
		{Type: "assembly", Key: "rated_impulse_withstand", Kind: KindQuantity, Dimension: "voltage", Title: "rated impulse withstand voltage", Symbol: "Uimp", Note: "Clearances refer to it.", Clause: "IEC 61439-1 Table 1", Usual: &Range{Text: "1.5 kV to 20 kV", Low: 1500, High: 20000}, Possible: &Range{Text: "300 V to 100 kV", Low: 300, High: 100000}, Example: "12 kV"},
		{Type: "assembly", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current of the assembly", Symbol: "InA", Note: "Smaller of what incomers in parallel carry and what the bars distribute.", Clause: "IEC 61439-1:2020 5.3.1 (from memory, unconfirmed)", Usual: &Range{Text: "50 A to 10 kA", Low: 50, High: 10000}, Possible: &Range{Text: "5 A to 20 kA", Low: 5, High: 20000}, Example: "2500 A"},
		{Type: "assembly", Key: "rated_current_natural", Kind: KindQuantity, Dimension: "current", Title: "rated current without fans", Note: "InA left when forced cooling fails.", Clause: "common practice", Usual: &Range{Text: "50 A to 10 kA", Low: 50, High: 10000}, Possible: &Range{Text: "5 A to 20 kA", Low: 5, High: 20000}, Example: "2000 A"},
		{Type: "assembly", Key: "rated_diversity_factor", Kind: KindQuantity, Dimension: "number", Title: "rated diversity factor", Symbol: "RDF", Note: "Share of their rating that all circuits carry together, continuously.", Clause: "IEC 61439-2 Table 101", Usual: &Range{Text: "0.4 to 1", Low: 0.4, High: 1}, Possible: &Range{Text: "0.1 to 1", Low: 0.1, High: 1}, Example: "0.8"},
		{Type: "assembly", Key: "cooling", Kind: KindWords, Words: theCoolingList, Title: "cooling", Note: "Whether the rating needs fans.", Clause: "common practice", Example: "natural"},
		{Type: "assembly", Key: "short_circuit", Kind: KindObject, Of: "assembly_short_circuit", Title: "short-circuit rating", Note: "Of the assembly at its incoming terminals; bars and units state their own."},
		{Type: "assembly", Key: "shock_protection", Kind: KindObject, Of: "shock_protection", Title: "protection against electric shock", Note: "Basic and fault protection.", Clause: "IEC 61439-1 8.4 (from memory, unconfirmed)"},
		{Type: "assembly", Key: "enclosure", Kind: KindObject, Of: "enclosure", Title: "enclosure", Note: "Degrees of protection and size."},
		{Type: "assembly", Key: "internal_separation", Kind: KindWords, Words: theSeparationFormList, Title: "internal separation", Note: "Form of separation; it says nothing about arcs.", Clause: "IEC 61439-2 Table 104", Example: "1"},
		{Type: "assembly", Key: "separation_type", Kind: KindText, Title: "national type of separation", Note: "Description only and no proof.", Clause: "common practice", Example: "form 4 type 6"},
		{Type: "assembly", Key: "access", Kind: KindObject, Of: "access", Title: "access", Note: "Who opens which side and how."},
		{Type: "assembly", Key: "insulation", Kind: KindObject, Of: "insulation", Title: "insulation", Note: "Distances and tests of the main circuits."},
		{Type: "assembly", Key: "surge_protection", Kind: KindObject, Of: "surge_protection", None: true, Title: "surge protection", Note: "Surge protective devices at the incoming side.", Clause: "IEC 61643-11 (from memory, unconfirmed)"},
		{Type: "assembly", Key: "auxiliary_circuits", Kind: KindObject, Of: "auxiliary_circuits", Title: "auxiliary circuits", Note: "Control and measuring circuits."},
		{Type: "assembly", Key: "socket_outlets", Kind: KindObject, Of: "socket_outlets", None: true, Title: "socket outlets", Note: "Outlets on the board for tools and test sets.", Clause: "IEC 60364-4-41 411.3.3 (from memory, unconfirmed)"},
		{Type: "assembly", Key: "environment", Kind: KindObject, Of: "environment", Title: "measures against the surroundings", Note: "What the board does against damp and dirt and animals."},
		{Type: "assembly", Key: "emc_environment", Kind: KindWords, Words: theEmcEnvironmentList, Title: "electromagnetic environment", Note: "Environment the assembly is suited for.", Clause: "IEC 61439-1 10.12", Example: "A"},
		{Type: "assembly", Key: "seismic", Kind: KindText, None: true, Title: "seismic withstand", Note: "Level shown and how.", Clause: "common practice", Example: "0.3 g by test"},
		{Type: "assembly", Key: "transport", Kind: KindObject, Of: "transport", Title: "transport and erection", Note: "How the board comes to site."},
	}},
	{name: "manufacturer", title: "manufacturer", short: "name", fields: []*Field{
		{Type: "manufacturer", Key: "name", Kind: KindText, Title: "assembly manufacturer", Note: "Who builds and takes responsibility.", Clause: "IEC 61439-1 3.10 (from memory, unconfirmed)", Example: "Tenderer A"},
		{Type: "manufacturer", Key: "original", Kind: KindText, Title: "original manufacturer", Note: "Who owns and verified the design.", Clause: "IEC 61439-1 3.10 (from memory, unconfirmed)", Example: "Maker of the system"},
		{Type: "manufacturer", Key: "type_designation", Kind: KindText, Title: "type designation", Note: "As on the nameplate.", Clause: "IEC 61439-1 6.1 (from memory, unconfirmed)", Example: "system 25"},
		{Type: "manufacturer", Key: "factory", Kind: KindText, Title: "place of building", Note: "Works where it is assembled.", Example: "Fenport works"},
	}},
	{name: "modification", title: "modification", short: "what", fields: []*Field{
		{Type: "modification", Key: "what", Kind: KindText, Title: "what was changed", Note: "In one line.", Example: "feeder P4 replaced by a larger unit"},
		{Type: "modification", Key: "date", Kind: KindMonth, Title: "date", Note: "When it was done.", Example: "2025-11"},
		{Type: "modification", Key: "carried_out_by", Kind: KindText, Title: "carried out by", Note: "Who takes responsibility for the changed part.", Example: "site contractor"},
		{Type: "modification", Key: "of", Kind: KindNames, Collections: []string{"units", "busbars"}, List: true, Title: "parts changed", Note: "Units and bars concerned.", Example: "[P4]"},
		{Type: "modification", Key: "re_verified", Kind: KindYesNo, Title: "verified again", Note: "The clauses affected were verified anew.", Clause: "IEC 61439-1 clause 10", Example: "yes"},
		{Type: "modification", Key: "document", Kind: KindNames, Collections: []string{"documents"}, Title: "record", Note: "Document that shows it.", Example: "D1"},
	}},
	{name: "assembly_short_circuit", title: "short-circuit rating of the assembly", short: "", fields: []*Field{
		{Type: "assembly_short_circuit", Key: "icw", Kind: KindObject, Of: "short_time_withstand", Title: "short-time withstand current", Symbol: "Icw", Note: "Of the assembly.", Clause: "IEC 61439-1:2020 5.3.5"},
		{Type: "assembly_short_circuit", Key: "icc", Kind: KindQuantity, Dimension: "current", Title: "conditional short-circuit current", Symbol: "Icc", Note: "With the limiting device named beside it.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "10 A to 400 kA", Low: 10, High: 400000}, Example: "80 kA"},
		{Type: "assembly_short_circuit", Key: "icc_with", Kind: KindNames, Collections: []string{"protection"}, Title: "limiting device", Note: "Device the conditional current holds with.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)", Example: "TX1-HV"},
		{Type: "assembly_short_circuit", Key: "ipk", Kind: KindQuantity, Dimension: "current", Title: "peak withstand current", Symbol: "Ipk", Note: "Peak of the first loop.", Clause: "IEC 61439-1:2020 5.3.4 (from memory, unconfirmed)", Usual: &Range{Text: "1.5 kA to 440 kA", Low: 1500, High: 440000}, Possible: &Range{Text: "15 A to 1000 kA", Low: 15, High: 1e+06}, Example: "143 kA"},
		{Type: "assembly_short_circuit", Key: "sccr", Kind: KindQuantity, Dimension: "current", Title: "short-circuit current rating", Symbol: "SCCR", Note: "Marked rating in North American practice.", Clause: "NEC 110.10", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "10 A to 400 kA", Low: 10, High: 400000}, Example: "65 kA"},
		{Type: "assembly_short_circuit", Key: "at_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "at voltage", Note: "Voltage of these ratings.", Clause: "common practice", Usual: &Range{Text: "100 V to 1000 V", Low: 100, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "400 V"},
	}},
	{name: "shock_protection", title: "protection against electric shock", short: "protection_class", fields: []*Field{
		{Type: "shock_protection", Key: "protection_class", Kind: KindWords, Words: theShockProtectionClassList, Title: "class", Note: "Class I or class II.", Clause: "IEC 61439-1 8.4.4 (from memory, unconfirmed)", Example: "class I"},
		{Type: "shock_protection", Key: "doors_bonded", Kind: KindYesNo, Title: "doors bonded", Note: "Doors with devices have a bonding conductor.", Clause: "IEC 61439-1 8.4.3.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "shock_protection", Key: "protective_circuit_resistance", Kind: KindQuantity, Dimension: "resistance", Title: "resistance of the protective circuit", Note: "Largest value between an exposed part and the earth terminal.", Clause: "IEC 61439-1 10.5.2 (from memory, unconfirmed)", Usual: &Range{Text: "0.2 mΩ to 0.1 Ω", Low: 0.0002, High: 0.1}, Possible: &Range{Text: "1 µΩ to 10 Ω", Low: 1e-06, High: 10}, Example: "20 mΩ"},
	}},
	{name: "enclosure", title: "enclosure", short: "ip", fields: []*Field{
		{Type: "enclosure", Key: "ip", Kind: KindProtection, Title: "degree of protection", Symbol: "IP", Note: "Of the closed board as a whole.", Clause: "IEC 60529", Example: "IP42"},
		{Type: "enclosure", Key: "ip_front", Kind: KindProtection, Title: "degree of protection at the front", Note: "Doors closed.", Clause: "IEC 60529", Example: "IP42"},
		{Type: "enclosure", Key: "ip_sides", Kind: KindProtection, Title: "degree of protection at the sides", Note: "Both sides.", Clause: "IEC 60529", Example: "IP42"},
		{Type: "enclosure", Key: "ip_rear", Kind: KindProtection, Title: "degree of protection at the rear", Note: "Covers fitted.", Clause: "IEC 60529", Example: "IP42"},
		{Type: "enclosure", Key: "ip_top", Kind: KindProtection, Title: "degree of protection at the top", Note: "Flaps and glands in place.", Clause: "IEC 60529", Example: "IP42"},
		{Type: "enclosure", Key: "ip_door_open", Kind: KindProtection, Title: "degree of protection behind the door", Note: "Door open and units in place.", Clause: "IEC 61439-1 8.4.6.2 (from memory, unconfirmed)", Example: "IP2X"},
		{Type: "enclosure", Key: "ip_after_flap", Kind: KindProtection, Title: "degree of protection after an arc flap opened", Note: "Until the flap is closed again.", Clause: "common practice", Example: "IP3X"},
		{Type: "enclosure", Key: "impact", Kind: KindWords, Words: theIkCodeList, Title: "impact protection", Symbol: "IK", Note: "Of the closed board.", Clause: "IEC 62262", Example: "IK00"},
		{Type: "enclosure", Key: "type_rating", Kind: KindText, Title: "enclosure type rating", Note: "North American type number.", Clause: "UL 50E (from memory, unconfirmed)", Example: "Type 12"},
		{Type: "enclosure", Key: "height", Kind: KindQuantity, Dimension: "length", Title: "height", Note: "Without base.", Clause: "common practice", Usual: &Range{Text: "300 mm to 3 m", Low: 0.3, High: 3}, Possible: &Range{Text: "100 mm to 6 m", Low: 0.1, High: 6}, Example: "2200 mm"},
		{Type: "enclosure", Key: "width", Kind: KindQuantity, Dimension: "length", Title: "width", Note: "Whole row.", Clause: "common practice", Usual: &Range{Text: "300 mm to 40 m", Low: 0.3, High: 40}, Possible: &Range{Text: "100 mm to 200 m", Low: 0.1, High: 200}, Example: "6.4 m"},
		{Type: "enclosure", Key: "depth", Kind: KindQuantity, Dimension: "length", Title: "depth", Note: "Door to rear cover.", Clause: "common practice", Usual: &Range{Text: "150 mm to 3 m", Low: 0.15, High: 3}, Possible: &Range{Text: "50 mm to 6 m", Low: 0.05, High: 6}, Example: "1000 mm"},
	}},
	{name: "access", title: "access", short: "", fields: []*Field{
		{Type: "access", Key: "front", Kind: KindObject, Of: "access_side", None: true, Title: "front", Note: "Doors and covers at the front."},
		{Type: "access", Key: "rear", Kind: KindObject, Of: "access_side", None: true, Title: "rear", Note: "None where it stands at a wall."},
		{Type: "access", Key: "sides", Kind: KindObject, Of: "access_side", None: true, Title: "sides", Note: "None where nobody can reach them."},
		{Type: "access", Key: "top", Kind: KindObject, Of: "access_side", None: true, Title: "top", Note: "None where nobody can reach it."},
		{Type: "access", Key: "under_voltage", Kind: KindWords, Words: theAccessPurposeList, List: true, None: true, Title: "agreed access under voltage", Note: "What may be done with neighbouring parts live.", Clause: "IEC 61439-1 8.4.6.2 (from memory, unconfirmed)", Example: "[inspection]"},
	}},
	{name: "access_side", title: "access at one side", short: "opens_with", fields: []*Field{
		{Type: "access_side", Key: "opens_with", Kind: KindWords, Words: theOpeningMeansList, Title: "opens with", Note: "What it takes to open it.", Clause: "IEC 61439-1 8.4.2.3 (from memory, unconfirmed)", Example: "by hand"},
		{Type: "access_side", Key: "by", Kind: KindWords, Words: thePersonsList, Title: "opened by", Note: "Least competent persons allowed to open it.", Clause: "IEC 61439-1 8.4.6 (from memory, unconfirmed)", Example: "ordinary persons"},
		{Type: "access_side", Key: "inner_barrier", Kind: KindProtection, None: true, Title: "inner barrier", Note: "Degree of protection of the barrier behind it.", Clause: "IEC 61439-1 8.4.2.3 (from memory, unconfirmed)", Example: "IP2X"},
	}},
	{name: "insulation", title: "insulation of the main circuits", short: "", fields: []*Field{
		{Type: "insulation", Key: "material_group", Kind: KindWords, Words: theMaterialGroupList, Title: "material group", Note: "Least good insulating material in the creepage paths.", Clause: "IEC 60664-1", Example: "IIIb"},
		{Type: "insulation", Key: "comparative_tracking_index", Kind: KindQuantity, Dimension: "number", Title: "comparative tracking index", Symbol: "CTI", Note: "Instead of the material group.", Clause: "IEC 60664-1", Usual: &Range{Text: "100 to 600", Low: 100, High: 600}, Possible: &Range{Text: "50 to 1000", Low: 50, High: 1000}, Example: "275"},
		{Type: "insulation", Key: "clearance", Kind: KindObject, Of: "distances", Title: "clearance", Symbol: "d", Note: "Smallest anywhere in the main circuits.", Clause: "IEC 61439-1 Table 1"},
		{Type: "insulation", Key: "creepage", Kind: KindObject, Of: "distances", Title: "creepage distance", Note: "Smallest anywhere in the main circuits.", Clause: "IEC 61439-1 Table 2"},
		{Type: "insulation", Key: "isolating_distance", Kind: KindQuantity, Dimension: "length", Title: "isolating distance", Note: "Smallest gap of withdrawable parts in the isolated position.", Clause: "IEC 60947-1 (from memory, unconfirmed)", Usual: &Range{Text: "3 mm to 300 mm", Low: 0.003, High: 0.3}, Possible: &Range{Text: "1 mm to 1 m", Low: 0.001, High: 1}, Example: "25 mm"},
		{Type: "insulation", Key: "in_every_position", Kind: KindYesNo, Title: "kept in every position", Note: "Distances hold in each position of withdrawable parts and while they move.", Clause: "IEC 61439-2 8.5 (from memory, unconfirmed)", Example: "yes"},
		{Type: "insulation", Key: "counted_over_covering", Kind: KindYesNo, Title: "counted over a covering", Note: "Some clearance relies on a covering of bars or joints.", Clause: "IEC 60664-1", Example: "yes"},
		{Type: "insulation", Key: "power_frequency_test", Kind: KindQuantity, Dimension: "voltage", Title: "power-frequency test voltage", Note: "RMS value of the design test.", Clause: "IEC 61439-1 Table 8 (from memory, unconfirmed)", Usual: &Range{Text: "1000 V to 5 kV", Low: 1000, High: 5000}, Possible: &Range{Text: "250 V to 20 kV", Low: 250, High: 20000}, Example: "2200 V"},
		{Type: "insulation", Key: "impulse_test", Kind: KindQuantity, Dimension: "voltage", None: true, Title: "impulse test voltage", Note: "Peak value applied; none where distances stand in for it.", Clause: "IEC 61439-1 Table 10 (from memory, unconfirmed)", Usual: &Range{Text: "1.5 kV to 30 kV", Low: 1500, High: 30000}, Possible: &Range{Text: "300 V to 120 kV", Low: 300, High: 120000}, Example: "14.8 kV"},
		{Type: "insulation", Key: "impulse_test_altitude", Kind: KindQuantity, Dimension: "length", Title: "altitude of the test place", Note: "Height above sea level of the laboratory.", Clause: "IEC 61439-1 Table 10 (from memory, unconfirmed)", Usual: &Range{Text: "-20 m to 2000 m", Low: -20, High: 2000}, Possible: &Range{Text: "-430 m to 4000 m", Low: -430, High: 4000}, Example: "200 m"},
	}},
	{name: "distances", title: "distances", short: "", fields: []*Field{
		{Type: "distances", Key: "phase_to_phase", Kind: KindQuantity, Dimension: "length", Title: "phase to phase", Note: "Smallest between line conductors.", Clause: "IEC 60664-1", Usual: &Range{Text: "1.5 mm to 150 mm", Low: 0.0015, High: 0.15}, Possible: &Range{Text: "0.1 mm to 1 m", Low: 0.0001, High: 1}, Example: "20 mm"},
		{Type: "distances", Key: "phase_to_earth", Kind: KindQuantity, Dimension: "length", Title: "phase to earth", Note: "Smallest to earthed and exposed parts.", Clause: "IEC 60664-1", Usual: &Range{Text: "1.5 mm to 150 mm", Low: 0.0015, High: 0.15}, Possible: &Range{Text: "0.1 mm to 1 m", Low: 0.0001, High: 1}, Example: "20 mm"},
	}},
	{name: "surge_protection", title: "surge protection", short: "kind", fields: []*Field{
		{Type: "surge_protection", Key: "kind", Kind: KindWords, Words: theSurgeProtectionKindList, Title: "type", Note: "Test class of the device.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Example: "type 1"},
		{Type: "surge_protection", Key: "at", Kind: KindNames, Collections: []string{"busbars"}, Title: "connected at", Note: "Bars it is connected to.", Example: "main A"},
		{Type: "surge_protection", Key: "voltage_protection", Kind: KindQuantity, Dimension: "voltage", Title: "voltage protection level", Symbol: "Up", Note: "With its leads where lead_length is not given.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Usual: &Range{Text: "0.5 kV to 6 kV", Low: 500, High: 6000}, Possible: &Range{Text: "100 V to 20 kV", Low: 100, High: 20000}, Example: "1.5 kV"},
		{Type: "surge_protection", Key: "continuous_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "maximum continuous voltage", Symbol: "Uc", Note: "RMS between its terminals.", Clause: "IEC 60364-5-53 534 (from memory, unconfirmed)", Usual: &Range{Text: "75 V to 1000 V", Low: 75, High: 1000}, Possible: &Range{Text: "12 V to 2 kV", Low: 12, High: 2000}, Example: "275 V"},
		{Type: "surge_protection", Key: "nominal_discharge_current", Kind: KindQuantity, Dimension: "current", Title: "nominal discharge current", Symbol: "In", Note: "Per pole at 8/20 µs.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Usual: &Range{Text: "2 kA to 60 kA", Low: 2000, High: 60000}, Possible: &Range{Text: "100 A to 200 kA", Low: 100, High: 200000}, Example: "20 kA"},
		{Type: "surge_protection", Key: "impulse_current", Kind: KindQuantity, Dimension: "current", Title: "impulse discharge current", Symbol: "Iimp", Note: "Per pole at 10/350 µs.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 50 kA", Low: 1000, High: 50000}, Possible: &Range{Text: "50 A to 200 kA", Low: 50, High: 200000}, Example: "12.5 kA"},
		{Type: "surge_protection", Key: "short_circuit_rating", Kind: KindObject, Of: "fused_rating", Title: "short-circuit rating", Symbol: "ISCCR", Note: "With its back-up fuse.", Clause: "IEC 61643-11 (from memory, unconfirmed)"},
		{Type: "surge_protection", Key: "lead_length", Kind: KindQuantity, Dimension: "length", Title: "length of leads", Note: "From the bars over the device to earth.", Clause: "IEC 60364-5-53 534 (from memory, unconfirmed)", Usual: &Range{Text: "30 mm to 5 m", Low: 0.03, High: 5}, Possible: &Range{Text: "0 m to 30 m", Low: 0, High: 30}, Example: "0.4 m"},
		{Type: "surge_protection", Key: "monitored", Kind: KindYesNo, Title: "failure shown", Note: "A failed device is indicated.", Clause: "common practice", Example: "yes"},
	}},
	{name: "fused_rating", title: "short-circuit rating with a fuse", short: "current", fields: []*Field{
		{Type: "fused_rating", Key: "current", Kind: KindQuantity, Dimension: "current", Title: "prospective current", Note: "Largest prospective current it stands with the fuse.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 120 kA", Low: 1000, High: 120000}, Possible: &Range{Text: "50 A to 400 kA", Low: 50, High: 400000}, Example: "65 kA"},
		{Type: "fused_rating", Key: "with_fuse", Kind: KindText, Title: "back-up fuse", Note: "Largest fuse the rating holds with.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Example: "125 A gG"},
		{Type: "fused_rating", Key: "largest_fuse", Kind: KindQuantity, Dimension: "current", None: true, Title: "largest back-up fuse", Note: "Rated current of that fuse; none where no fuse is needed.", Clause: "IEC 61643-11 (from memory, unconfirmed)", Usual: &Range{Text: "10 A to 630 A", Low: 10, High: 630}, Possible: &Range{Text: "0.5 A to 6300 A", Low: 0.5, High: 6300}, Example: "125 A"},
		{Type: "fused_rating", Key: "fitted_fuse", Kind: KindQuantity, Dimension: "current", None: true, Title: "fuse fitted", Note: "Rated current of the fuse ahead of it.", Clause: "common practice", Usual: &Range{Text: "10 A to 1250 A", Low: 10, High: 1250}, Possible: &Range{Text: "0.5 A to 6300 A", Low: 0.5, High: 6300}, Example: "125 A"},
	}},
	{name: "auxiliary_circuits", title: "auxiliary circuits", short: "", fields: []*Field{
		{Type: "auxiliary_circuits", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage", Note: "Highest among them.", Clause: "IEC 61439-1 5.2 (from memory, unconfirmed)", Usual: &Range{Text: "12 V to 400 V", Low: 12, High: 400}, Possible: &Range{Text: "5 V to 1000 V", Low: 5, High: 1000}, Example: "230 V"},
		{Type: "auxiliary_circuits", Key: "rated_insulation_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated insulation voltage", Symbol: "Ui", Note: "Lowest among them.", Clause: "IEC 61439-1 5.2.3 (from memory, unconfirmed)", Usual: &Range{Text: "30 V to 1000 V", Low: 30, High: 1000}, Possible: &Range{Text: "12 V to 4 kV", Low: 12, High: 4000}, Example: "300 V"},
		{Type: "auxiliary_circuits", Key: "rated_impulse_withstand", Kind: KindQuantity, Dimension: "voltage", Title: "rated impulse withstand voltage", Symbol: "Uimp", Note: "Lowest among them.", Clause: "IEC 61439-1 Annex G (from memory, unconfirmed)", Usual: &Range{Text: "0.5 kV to 12 kV", Low: 500, High: 12000}, Possible: &Range{Text: "300 V to 100 kV", Low: 300, High: 100000}, Example: "4 kV"},
		{Type: "auxiliary_circuits", Key: "fed_from_main", Kind: KindYesNo, Title: "fed from the main circuit", Note: "Connected to the main circuit without a transformer.", Clause: "common practice", Example: "yes"},
	}},
	{name: "socket_outlets", title: "socket outlets at the board", short: "", fields: []*Field{
		{Type: "socket_outlets", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current", Note: "Of the largest outlet.", Clause: "IEC 60364-4-41 411.3.3 (from memory, unconfirmed)", Usual: &Range{Text: "6 A to 125 A", Low: 6, High: 125}, Possible: &Range{Text: "1 A to 400 A", Low: 1, High: 400}, Example: "16 A"},
		{Type: "socket_outlets", Key: "residual_current", Kind: KindQuantity, Dimension: "current", None: true, Title: "rated residual current", Symbol: "IΔn", Note: "Of the device that protects them.", Clause: "IEC 60364-4-41 411.3.3 (from memory, unconfirmed)", Usual: &Range{Text: "5 mA to 500 mA", Low: 0.005, High: 0.5}, Possible: &Range{Text: "1 mA to 30 A", Low: 0.001, High: 30}, Example: "30 mA"},
		{Type: "socket_outlets", Key: "residual_current_type", Kind: KindWords, Words: theResidualCurrentTypeList, Title: "type of residual current device", Note: "Type B where converters are near.", Clause: "common practice", Example: "AC"},
	}},
	{name: "environment", title: "measures against the surroundings", short: "", fields: []*Field{
		{Type: "environment", Key: "heaters", Kind: KindYesNo, Title: "anti-condensation heaters", Note: "Fitted in every section.", Clause: "common practice", Example: "yes"},
		{Type: "environment", Key: "thermostat", Kind: KindYesNo, Title: "thermostat or hygrostat", Note: "Controls the heaters.", Clause: "common practice", Example: "yes"},
		{Type: "environment", Key: "drain", Kind: KindYesNo, Title: "drain", Note: "Water that gets in can get out.", Clause: "common practice", Example: "yes"},
		{Type: "environment", Key: "sealed_cable_entry", Kind: KindYesNo, Title: "sealed cable entry", Note: "Closed against basement and trench.", Clause: "common practice", Example: "yes"},
		{Type: "environment", Key: "animal_proof", Kind: KindYesNo, Title: "closed to animals", Note: "Openings, vents and ducts included.", Clause: "common practice", Example: "yes"},
		{Type: "environment", Key: "dust_filters", Kind: KindYesNo, Title: "dust filters", Note: "In every ventilation opening.", Clause: "common practice", Example: "yes"},
		{Type: "environment", Key: "corrosion_protection", Kind: KindText, None: true, Title: "corrosion protection", Note: "Finish of metal parts and severity it was tested to.", Clause: "IEC 61439-1 10.2", Example: "tinned bars and severity B"},
		{Type: "environment", Key: "dust_ignition_safe", Kind: KindYesNo, Title: "suited to combustible dust", Note: "Shown for the zone it stands in.", Clause: "common practice", Example: "yes"},
	}},
	{name: "transport", title: "transport and erection", short: "", fields: []*Field{
		{Type: "transport", Key: "parts", Kind: KindCount, Least: 1, Most: 100, Title: "transport parts", Note: "Number of parts the board is split into.", Example: "3"},
		{Type: "transport", Key: "joints_verified", Kind: KindYesNo, Title: "site joints verified", Note: "Bars and wiring joined on site were checked and recorded.", Clause: "common practice", Example: "yes"},
		{Type: "transport", Key: "lifting_points", Kind: KindYesNo, Title: "lifting points", Note: "Marked and verified.", Clause: "IEC 61439-1 10.2", Example: "yes"},
	}},
	{name: "auxiliary_supply", title: "auxiliary supply", short: "trip", fields: []*Field{
		{Type: "auxiliary_supply", Key: "trip", Kind: KindWords, Words: theTripSupplyList, Title: "supply of tripping", Note: "What opens the devices in a fault.", Clause: "common practice", Example: "self-powered"},
		{Type: "auxiliary_supply", Key: "relays", Kind: KindWords, Words: theTripSupplyList, Title: "supply of relays", Note: "What the protection and arc relays live on.", Clause: "common practice", Example: "self-powered"},
		{Type: "auxiliary_supply", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage", Note: "Of the auxiliary supply.", Clause: "common practice", Usual: &Range{Text: "12 V to 400 V", Low: 12, High: 400}, Possible: &Range{Text: "5 V to 1000 V", Low: 5, High: 1000}, Example: "110 V"},
		{Type: "auxiliary_supply", Key: "autonomy", Kind: KindQuantity, Dimension: "time", Title: "autonomy", Note: "Time it lasts without the bars.", Clause: "common practice", Usual: &Range{Text: "1 min to 15 h", Low: 60, High: 54000}, Possible: &Range{Text: "1 s to 240 h", Low: 1, High: 864000}, Example: "2 h"},
		{Type: "auxiliary_supply", Key: "open_operations", Kind: KindCount, Least: 0, Most: 100, Title: "opening operations left", Note: "Openings possible without the bars.", Clause: "common practice", Example: "2"},
		{Type: "auxiliary_supply", Key: "trip_coils", Kind: KindCount, Least: 1, Most: 2, Title: "trip coils", Note: "Per device.", Clause: "common practice", Example: "1"},
		{Type: "auxiliary_supply", Key: "supervised", Kind: KindYesNo, Title: "supervised", Note: "Its loss gives an alarm.", Clause: "common practice", Example: "yes"},
		{Type: "auxiliary_supply", Key: "trip_circuit_supervision", Kind: KindYesNo, Title: "trip circuit supervision", Note: "A broken trip circuit gives an alarm.", Clause: "common practice", Example: "yes"},
	}},
	{name: "routine_verification", title: "routine verification", short: "", fields: []*Field{
		{Type: "routine_verification", Key: "date", Kind: KindDay, Title: "date", Note: "Of the record.", Example: "2026-09-18"},
		{Type: "routine_verification", Key: "by", Kind: KindText, Title: "carried out by", Note: "Who signed the record.", Example: "works test department"},
		{Type: "routine_verification", Key: "document", Kind: KindNames, Collections: []string{"documents"}, Title: "record", Note: "Document that holds the results.", Example: "D1"},
		{Type: "routine_verification", Key: "degree_of_protection", Kind: KindYesNo, Title: "degree of protection", Note: "Done and passed.", Clause: "IEC 61439-1 11.2", Example: "yes"},
		{Type: "routine_verification", Key: "clearances_creepage", Kind: KindYesNo, Title: "clearances and creepage distances", Note: "Done and passed.", Clause: "IEC 61439-1 11.3", Example: "yes"},
		{Type: "routine_verification", Key: "shock_protection", Kind: KindYesNo, Title: "shock protection and protective circuits", Note: "Done and passed.", Clause: "IEC 61439-1 11.4", Example: "yes"},
		{Type: "routine_verification", Key: "components", Kind: KindYesNo, Title: "built-in components", Note: "Done and passed.", Clause: "IEC 61439-1 11.5", Example: "yes"},
		{Type: "routine_verification", Key: "internal_circuits", Kind: KindYesNo, Title: "internal circuits and connections", Note: "Done and passed with torque record.", Clause: "IEC 61439-1 11.6", Example: "yes"},
		{Type: "routine_verification", Key: "terminals", Kind: KindYesNo, Title: "terminals for external conductors", Note: "Done and passed.", Clause: "IEC 61439-1 11.7", Example: "yes"},
		{Type: "routine_verification", Key: "mechanical_operation", Kind: KindYesNo, Title: "mechanical operation", Note: "Done and passed with interlocks.", Clause: "IEC 61439-1 11.8", Example: "yes"},
		{Type: "routine_verification", Key: "dielectric", Kind: KindYesNo, Title: "dielectric test", Note: "Done and passed.", Clause: "IEC 61439-1 11.9", Example: "yes"},
		{Type: "routine_verification", Key: "dielectric_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage of the dielectric test", Note: "RMS value applied.", Clause: "IEC 61439-1 11.9", Usual: &Range{Text: "500 V to 5 kV", Low: 500, High: 5000}, Possible: &Range{Text: "250 V to 20 kV", Low: 250, High: 20000}, Example: "1890 V"},
		{Type: "routine_verification", Key: "insulation_resistance", Kind: KindQuantity, Dimension: "resistance", Title: "insulation resistance", Note: "Smallest value measured.", Clause: "IEC 61439-1 11.9", Usual: &Range{Text: "0.5 MΩ to 450 MΩ", Low: 500000, High: 4.5e+08}, Possible: &Range{Text: "1 kΩ to 100000 MΩ", Low: 1000, High: 1e+11}, Example: "120 MΩ"},
		{Type: "routine_verification", Key: "wiring_function", Kind: KindYesNo, Title: "wiring and function", Note: "Done and passed.", Clause: "IEC 61439-1 11.10 (from memory, unconfirmed)", Example: "yes"},
	}},
	{name: "bars", title: "bars of one conductor", short: "", fields: []*Field{
		{Type: "bars", Key: "width", Kind: KindQuantity, Dimension: "length", Title: "width of a bar", Symbol: "d or b", Note: "Longer side of the cross-section of one bar.", Clause: "common practice", Usual: &Range{Text: "10 mm to 300 mm", Low: 0.01, High: 0.3}, Possible: &Range{Text: "3 mm to 600 mm", Low: 0.003, High: 0.6}, Example: "100 mm"},
		{Type: "bars", Key: "thickness", Kind: KindQuantity, Dimension: "length", Title: "thickness of a bar", Note: "Shorter side of the cross-section of one bar.", Clause: "common practice", Usual: &Range{Text: "2 mm to 25 mm", Low: 0.002, High: 0.025}, Possible: &Range{Text: "0.5 mm to 200 mm", Low: 0.0005, High: 0.2}, Example: "10 mm"},
		{Type: "bars", Key: "per_phase", Kind: KindCount, Least: 1, Most: 12, Title: "bars per phase", Symbol: "n", Note: "Number of parallel bars of one conductor.", Clause: "IEC 60865-1", Example: "2"},
		{Type: "bars", Key: "gap", Kind: KindQuantity, Dimension: "length", Title: "gap between bars", Note: "Clear distance between neighbouring bars of one conductor.", Clause: "IEC 60865-1", Usual: &Range{Text: "2 mm to 100 mm", Low: 0.002, High: 0.1}, Possible: &Range{Text: "0.5 mm to 500 mm", Low: 0.0005, High: 0.5}, Example: "10 mm"},
		{Type: "bars", Key: "broad_side", Kind: KindWords, Words: theBarBroadSideList, Title: "broad side", Note: "Orientation of the bars to the force between the phases.", Clause: "IEC 60865-1", Example: "towards next phase"},
		{Type: "bars", Key: "phases", Kind: KindWords, Words: theBarPhasesList, Title: "arrangement of phases", Note: "Decides weight and air flow at the bars.", Clause: "common practice", Example: "side by side"},
		{Type: "bars", Key: "area", Kind: KindQuantity, Dimension: "area", Title: "area of one bar", Symbol: "q", Note: "Needed only where the bar is no plain rectangle.", Clause: "common practice", Usual: &Range{Text: "20 mm2 to 6000 mm2", Low: 2e-05, High: 0.006}, Possible: &Range{Text: "5 mm2 to 30000 mm2", Low: 5e-06, High: 0.03}, Example: "1000 mm2"},
	}},
	{name: "covering", title: "covering of conductors", short: "kind", fields: []*Field{
		{Type: "covering", Key: "kind", Kind: KindWords, Words: theCoveringKindList, Title: "kind of covering", Note: "What lies between the conductor and a touching finger or tool.", Clause: "IEC 61439-1 8.4.2.2 (from memory, unconfirmed)", Example: "bare"},
		{Type: "covering", Key: "tested_to", Kind: KindText, None: true, Title: "insulation test of the covering", Note: "Standard and clause the covering was tested to as insulation.", Clause: "IEC 61439-1:2020 10.9.6 (from memory, unconfirmed)", Example: "IEC 61439-1 10.9.6"},
		{Type: "covering", Key: "joints", Kind: KindWords, Words: theCoveringJointsList, Title: "covering of joints", Note: "Joints and connections between the bars.", Clause: "common practice", Example: "bare"},
		{Type: "covering", Key: "temperature_class", Kind: KindQuantity, Dimension: "temperature", Title: "temperature class of the covering", Note: "Highest continuous temperature of the covering.", Clause: "common practice", Usual: &Range{Text: "70 °C to 250 °C", Low: 70, High: 250}, Possible: &Range{Text: "40 °C to 500 °C", Low: 40, High: 500}, Example: "105 °C"},
		{Type: "covering", Key: "colour", Kind: KindText, Title: "colour", Note: "Colour of the covering as it affects heat radiation and marking.", Clause: "common practice", Example: "black"},
	}},
	{name: "support_strength", title: "strength of a support", short: "value", fields: []*Field{
		{Type: "support_strength", Key: "value", Kind: KindQuantity, Dimension: "force", Title: "strength", Symbol: "F", Note: "Load at the point where the bar rests.", Clause: "IEC 60865-1", Usual: &Range{Text: "0.5 kN to 100 kN", Low: 500, High: 100000}, Possible: &Range{Text: "50 N to 1000 kN", Low: 50, High: 1e+06}, Example: "15 kN"},
		{Type: "support_strength", Key: "kind", Kind: KindWords, Words: theStrengthKindList, Title: "meaning of the strength", Note: "Whether the support fails at this load or may carry it.", Clause: "common practice", Example: "minimum failing"},
		{Type: "support_strength", Key: "direction", Kind: KindWords, Words: theLoadDirectionList, Title: "direction of the load", Note: "Direction the strength was found for.", Clause: "common practice", Example: "bending"},
		{Type: "support_strength", Key: "at", Kind: KindQuantity, Dimension: "temperature", Title: "temperature of the strength", Note: "Temperature of the support at which the strength holds.", Clause: "common practice", Usual: &Range{Text: "15 °C to 180 °C", Low: 15, High: 180}, Possible: &Range{Text: "-50 °C to 400 °C", Low: -50, High: 400}, Example: "105 °C"},
	}},
	{name: "supports", title: "busbar supports", short: "", fields: []*Field{
		{Type: "supports", Key: "span", Kind: KindQuantity, Dimension: "length", Title: "distance of the supports", Symbol: "l", Note: "Largest distance between neighbouring supports.", Clause: "IEC 60865-1", Usual: &Range{Text: "60 mm to 1.5 m", Low: 0.06, High: 1.5}, Possible: &Range{Text: "20 mm to 5 m", Low: 0.02, High: 5}, Example: "450 mm"},
		{Type: "supports", Key: "spans", Kind: KindCount, Least: 1, Most: 200, Title: "number of spans", Note: "Spans of one continuous bar.", Clause: "IEC 60865-1", Example: "3"},
		{Type: "supports", Key: "ends", Kind: KindWords, Words: theSupportEndsList, Title: "how the bar rests", Note: "Decides the factors of bending moment and support load.", Clause: "IEC 60865-1", Example: "continuous"},
		{Type: "supports", Key: "spacers_every", Kind: KindQuantity, Dimension: "length", None: true, Title: "distance of the spacers", Symbol: "ls", Note: "Distance of the connecting pieces between parallel bars.", Clause: "IEC 60865-1", Usual: &Range{Text: "20 mm to 1.5 m", Low: 0.02, High: 1.5}, Possible: &Range{Text: "10 mm to 5 m", Low: 0.01, High: 5}, Example: "225 mm"},
		{Type: "supports", Key: "strength", Kind: KindObject, Of: "support_strength", Title: "strength of a support", Note: "As the maker of the support states it.", Clause: "IEC 60865-1"},
		{Type: "supports", Key: "temperature_max", Kind: KindQuantity, Dimension: "temperature", Title: "highest support temperature", Note: "Highest temperature of the support in continuous service.", Clause: "common practice", Usual: &Range{Text: "70 °C to 250 °C", Low: 70, High: 250}, Possible: &Range{Text: "40 °C to 500 °C", Low: 40, High: 500}, Example: "130 °C"},
	}},
	{name: "conditional_rating", title: "rated conditional short-circuit current", short: "current", fields: []*Field{
		{Type: "conditional_rating", Key: "current", Kind: KindQuantity, Dimension: "current", Title: "conditional short-circuit current", Symbol: "Icc", Note: "Prospective r.m.s. current that holds only behind the limiting device named.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 150 kA", Low: 1000, High: 150000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "80 kA"},
		{Type: "conditional_rating", Key: "device", Kind: KindNames, Collections: []string{"protection", "units"}, Title: "limiting device in this board", Note: "The device of this board that limits the current.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)", Example: "P1-fuse"},
		{Type: "conditional_rating", Key: "device_tested", Kind: KindText, Title: "limiting device as tested", Note: "Make series rating and setting the rating was found with.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)", Example: "630 A breaker series X at 10 x"},
	}},
	{name: "neutral_bars", title: "neutral bars", short: "", fields: []*Field{
		{Type: "neutral_bars", Key: "bars", Kind: KindObject, Of: "bars", Title: "bars of the neutral", Note: "Dimensions of the neutral conductor.", Clause: "common practice"},
		{Type: "neutral_bars", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current of the neutral", Note: "Continuous current of the neutral conductor.", Clause: "IEC 60364-5-52 Annex E (from memory, unconfirmed)", Usual: &Range{Text: "16 A to 7 kA", Low: 16, High: 7000}, Possible: &Range{Text: "1 A to 20 kA", Low: 1, High: 20000}, Example: "2500 A"},
		{Type: "neutral_bars", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", Title: "short-time withstand of the neutral", Note: "Phase to neutral; at least 60 % of the phase value unless agreed.", Clause: "IEC 61439-1 10.11.5 (from memory, unconfirmed)"},
		{Type: "neutral_bars", Key: "peak_withstand", Kind: KindQuantity, Dimension: "current", Title: "peak withstand of the neutral", Symbol: "Ipk", Note: "Peak value phase to neutral.", Clause: "IEC 61439-1:2020 5.3.4 (from memory, unconfirmed)", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "105 kA"},
	}},
	{name: "protective_bars", title: "protective bars", short: "", fields: []*Field{
		{Type: "protective_bars", Key: "bars", Kind: KindObject, Of: "bars", Title: "bars of the protective conductor", Note: "Dimensions of the protective conductor.", Clause: "common practice"},
		{Type: "protective_bars", Key: "conductor", Kind: KindWords, Words: theConductorMetalList, Title: "material", Note: "Material of the protective bars.", Clause: "common practice", Example: "copper"},
		{Type: "protective_bars", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", Title: "short-time withstand of the protective bar", Note: "Phase to protective conductor; at least 60 % of the phase value unless agreed.", Clause: "IEC 61439-1 8.4.3.2.3 (from memory, unconfirmed)"},
		{Type: "protective_bars", Key: "peak_withstand", Kind: KindQuantity, Dimension: "current", Title: "peak withstand of the protective bar", Symbol: "Ipk", Note: "Peak value phase to protective conductor.", Clause: "IEC 61439-1:2020 5.3.4 (from memory, unconfirmed)", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "95 kA"},
	}},
	{name: "relief", title: "relief of distribution bars", short: "", fields: []*Field{
		{Type: "relief", Key: "claimed", Kind: KindText, Title: "clause claimed", Note: "Clause by which the bars are rated for the let-through of the devices behind them.", Clause: "IEC 61439-1 8.6.1 (from memory, unconfirmed)", Example: "IEC 61439-1 8.6.1"},
		{Type: "relief", Key: "conductor_measure", Kind: KindWords, Words: theConductorMeasureList, Title: "measure against a short-circuit", Note: "Line of the conductor table that makes a fault between bars unlikely.", Clause: "IEC 61439-1 8.6.4 Table 4 (from memory, unconfirmed)", Example: "no measure"},
		{Type: "relief", Key: "largest_device", Kind: KindQuantity, Dimension: "current", Title: "largest device behind", Note: "Rated current of the largest limiting device on these bars.", Clause: "IEC 61439-1 8.6.1 (from memory, unconfirmed)", Usual: &Range{Text: "10 A to 1600 A", Low: 10, High: 1600}, Possible: &Range{Text: "1 A to 6300 A", Low: 1, High: 6300}, Example: "630 A"},
		{Type: "relief", Key: "let_through", Kind: KindNames, Collections: []string{"units"}, Title: "unit with the largest let-through", Note: "The unit whose device lets through most.", Clause: "IEC 61439-1 8.6.1 (from memory, unconfirmed)", Example: "P1"},
	}},
	{name: "busbar", title: "busbar", short: "", fields: []*Field{
		{Type: "busbar", Key: "section", Kind: KindNames, Collections: []string{"sections"}, Title: "section", Note: "Section whose main bars these are.", Clause: "common practice", Example: "A"},
		{Type: "busbar", Key: "fed_from", Kind: KindNames, Collections: []string{"busbars"}, Title: "fed from", Note: "Bars that feed these bars directly; for risers and distribution bars.", Clause: "common practice", Example: "main A"},
		{Type: "busbar", Key: "protected_by", Kind: KindNames, Collections: []string{"units", "protection"}, None: true, Title: "overload protection", Note: "Device that keeps the current of these bars within their rating.", Clause: "IEC 60364-4-43 433 (from memory, unconfirmed)", Example: "Q1"},
		{Type: "busbar", Key: "covering", Kind: KindObject, Of: "covering", Title: "covering", Note: "Covering of the bars and their joints.", Clause: "IEC 61439-1 8.4.2.2 (from memory, unconfirmed)"},
		{Type: "busbar", Key: "conductor", Kind: KindWords, Words: theConductorMetalList, Title: "material", Note: "Material of the bars.", Clause: "common practice", Example: "copper"},
		{Type: "busbar", Key: "temper", Kind: KindText, Title: "temper", Note: "Designation of the bar's strength, as R250.", Clause: "EN 13601", Example: "R250"},
		{Type: "busbar", Key: "finish", Kind: KindWords, Words: theSurfaceFinishList, Title: "surface finish", Note: "Surface of the bars at joints and plugs.", Clause: "common practice", Example: "bare"},
		{Type: "busbar", Key: "bars", Kind: KindObject, Of: "bars", Title: "bars of a phase", Note: "Dimensions of one phase.", Clause: "common practice"},
		{Type: "busbar", Key: "phase_centres", Kind: KindQuantity, Dimension: "length", Title: "distance of the phases", Symbol: "a", Note: "Distance of the centre lines of neighbouring phases.", Clause: "IEC 60865-1", Usual: &Range{Text: "25 mm to 500 mm", Low: 0.025, High: 0.5}, Possible: &Range{Text: "10 mm to 2 m", Low: 0.01, High: 2}, Example: "120 mm"},
		{Type: "busbar", Key: "supports", Kind: KindObject, Of: "supports", Title: "supports", Note: "How the bars are held.", Clause: "IEC 60865-1"},
		{Type: "busbar", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current", Note: "Continuous current of the bars as built in.", Clause: "IEC 61439-1:2020 5.3.2 (from memory, unconfirmed)", Usual: &Range{Text: "63 A to 10 kA", Low: 63, High: 10000}, Possible: &Range{Text: "10 A to 30 kA", Low: 10, High: 30000}, Example: "2500 A"},
		{Type: "busbar", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", Title: "rated short-time withstand current", Note: "Of these bars, not of the board as a whole.", Clause: "IEC 61439-1:2020 5.3.5"},
		{Type: "busbar", Key: "peak_withstand", Kind: KindQuantity, Dimension: "current", Title: "rated peak withstand current", Symbol: "Ipk", Note: "Highest peak the bars withstand.", Clause: "IEC 61439-1:2020 5.3.4 (from memory, unconfirmed)", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "143 kA"},
		{Type: "busbar", Key: "conditional_rating", Kind: KindObject, Of: "conditional_rating", None: true, Title: "conditional rating", Note: "Rating that holds only behind a limiting device.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)"},
		{Type: "busbar", Key: "neutral", Kind: KindObject, Of: "neutral_bars", None: true, Title: "neutral bars", Note: "Neutral conductor beside these bars.", Clause: "common practice"},
		{Type: "busbar", Key: "protective", Kind: KindObject, Of: "protective_bars", None: true, Title: "protective bars", Note: "Protective conductor beside these bars.", Clause: "common practice"},
		{Type: "busbar", Key: "relief", Kind: KindObject, Of: "relief", None: true, Title: "relief", Note: "Lower rating claimed behind the main bars.", Clause: "IEC 61439-1 8.6.1 (from memory, unconfirmed)"},
		{Type: "busbar", Key: "temperature_max", Kind: KindQuantity, Dimension: "temperature", Title: "highest service temperature", Note: "Highest temperature of the bars in continuous service as verified.", Clause: "IEC 61439-1 10.10 (from memory, unconfirmed)", Usual: &Range{Text: "55 °C to 150 °C", Low: 55, High: 150}, Possible: &Range{Text: "30 °C to 300 °C", Low: 30, High: 300}, Example: "105 °C"},
	}},
	{name: "shutters", title: "shutters", short: "", fields: []*Field{
		{Type: "shutters", Key: "automatic", Kind: KindYesNo, Title: "automatic", Note: "Closed by the movement of the unit.", Clause: "IEC 61439-2 8.3 (from memory, unconfirmed)", Example: "yes"},
		{Type: "shutters", Key: "lockable", Kind: KindWords, Words: theShutterLockList, Title: "lockable", Note: "How the shutters can be padlocked.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "not lockable"},
		{Type: "shutters", Key: "protection", Kind: KindProtection, Title: "protection with the unit removed", Note: "Degree of protection of the closed shutters.", Clause: "IEC 61439-2 8.3 (from memory, unconfirmed)", Example: "IPXXB"},
		{Type: "shutters", Key: "marked", Kind: KindYesNo, Title: "sides marked", Note: "Busbar side and cable side can be told apart on the shutters.", Clause: "common practice", Example: "yes"},
	}},
	{name: "cut_off", title: "current limitation of a device", short: "", fields: []*Field{
		{Type: "cut_off", Key: "at", Kind: KindQuantity, Dimension: "current", Title: "prospective current", Note: "Prospective r.m.s. current for which the limitation is stated.", Clause: "IEC 60947-2", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "65 kA"},
		{Type: "cut_off", Key: "at_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage of the limitation", Note: "Voltage for which the limitation is stated.", Clause: "IEC 60947-2", Usual: &Range{Text: "200 V to 1000 V", Low: 200, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "400 V"},
		{Type: "cut_off", Key: "peak", Kind: KindQuantity, Dimension: "current", Title: "cut-off current", Note: "Highest peak the device lets pass.", Clause: "IEC 60947-2", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "42 kA"},
		{Type: "cut_off", Key: "let_through", Kind: KindQuantity, Dimension: "joule_integral", Title: "let-through", Symbol: "I2t", Note: "Largest joule integral the device lets pass.", Clause: "IEC 60947-2", Usual: &Range{Text: "0.02 MA2s to 19 MA2s", Low: 20000, High: 1.9e+07}, Possible: &Range{Text: "1 A2s to 10 GA2s", Low: 1, High: 1e+10}, Example: "2.1 MA2s"},
	}},
	{name: "device", title: "switching device", short: "", fields: []*Field{
		{Type: "device", Key: "kind", Kind: KindWords, Words: theDeviceKindList, Title: "kind of device", Note: "Main switching device of the unit.", Clause: "common practice", Example: "air circuit-breaker"},
		{Type: "device", Key: "type", Kind: KindText, Title: "type", Note: "Designation of the device by its maker.", Clause: "common practice", Example: "frame 2 and 2500 A"},
		{Type: "device", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current", Symbol: "In", Note: "Of the device alone; for fuses that of the link.", Clause: "IEC 60947-1", Usual: &Range{Text: "10 A to 6.3 kA", Low: 10, High: 6300}, Possible: &Range{Text: "0.1 A to 10 kA", Low: 0.1, High: 10000}, Example: "2500 A"},
		{Type: "device", Key: "rated_operational_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated operational voltage", Symbol: "Ue", Note: "Highest voltage the ratings hold for.", Clause: "IEC 60947-1", Usual: &Range{Text: "200 V to 1000 V", Low: 200, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "690 V"},
		{Type: "device", Key: "slash_rated", Kind: KindYesNo, Title: "slash-rated", Note: "Rated for two voltages such as 480Y/277 and so for earthed star systems only.", Clause: "UL 489 (from memory, unconfirmed)", Example: "yes"},
		{Type: "device", Key: "icu", Kind: KindVoltageTable, Dimension: "current", Title: "ultimate breaking capacity", Symbol: "Icu", Note: "R.m.s. breaking capacity for each voltage.", Clause: "IEC 60947-2", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "{400 V: 66 kA}"},
		{Type: "device", Key: "ics", Kind: KindVoltageTable, Dimension: "current", Title: "service breaking capacity", Symbol: "Ics", Note: "R.m.s. breaking capacity that leaves the device fit for service.", Clause: "IEC 60947-2", Usual: &Range{Text: "0.5 kA to 200 kA", Low: 500, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "{400 V: 66 kA}"},
		{Type: "device", Key: "single_pole", Kind: KindVoltageTable, Dimension: "current", Title: "breaking capacity of one pole", Note: "Counts in unearthed and corner-earthed systems.", Clause: "IEC 60947-2 Annex H (from memory, unconfirmed)", Usual: &Range{Text: "0.5 kA to 200 kA", Low: 500, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "{690 V: 25 kA}"},
		{Type: "device", Key: "icm", Kind: KindQuantity, Dimension: "current", Title: "making capacity", Symbol: "Icm", Note: "Peak value the device can be closed on.", Clause: "IEC 60947-2 Table 2", Usual: &Range{Text: "1.5 kA to 440 kA", Low: 1500, High: 440000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "145 kA"},
		{Type: "device", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", None: true, Title: "short-time withstand of the device", Note: "Current a delayed device carries until it opens.", Clause: "IEC 60947-2 Table 3"},
		{Type: "device", Key: "conditional_rating", Kind: KindObject, Of: "conditional_rating", None: true, Title: "conditional rating of the device", Note: "Of switches and contactors behind a limiting device.", Clause: "IEC 60947-3"},
		{Type: "device", Key: "cut_off", Kind: KindObject, Of: "cut_off", None: true, Title: "current limitation", Note: "Peak and joule integral the device lets pass.", Clause: "IEC 60947-2"},
		{Type: "device", Key: "utilisation_category", Kind: KindWords, Words: theUtilisationCategoryList, Title: "utilisation category", Note: "Duty the device was tested for.", Clause: "IEC 60947-1", Example: "A"},
		{Type: "device", Key: "isolating", Kind: KindWords, Words: theIsolatingFunctionList, Title: "isolating function", Note: "Whether the open device counts as isolation.", Clause: "IEC 60947-1", Example: "not suitable"},
		{Type: "device", Key: "override", Kind: KindQuantity, Dimension: "current", None: true, Title: "built-in override", Note: "Current above which the device opens at once to save itself; a release may have its own.", Clause: "common practice", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "55 kA"},
		{Type: "device", Key: "ambient_max", Kind: KindQuantity, Dimension: "temperature", Title: "highest air temperature at the device", Note: "Air around the device up to which its rating or electronics hold.", Clause: "IEC 60947-1", Usual: &Range{Text: "30 °C to 90 °C", Low: 30, High: 90}, Possible: &Range{Text: "10 °C to 150 °C", Low: 10, High: 150}, Example: "70 °C"},
	}},
	{name: "plug", title: "plug contacts of a unit", short: "", fields: []*Field{
		{Type: "plug", Key: "covering", Kind: KindWords, Words: theCoveringKindList, Title: "covering", Note: "Covering of the plug between bars and device.", Clause: "common practice", Example: "bare"},
		{Type: "plug", Key: "one_insulated_whole", Kind: KindYesNo, Title: "one insulated whole", Note: "Bars plug and outgoing side are enclosed phase by phase without a gap.", Clause: "common practice", Example: "yes"},
		{Type: "plug", Key: "tested_to", Kind: KindText, None: true, Title: "insulation test of the plug", Note: "Standard and clause the covering was tested to as insulation.", Clause: "IEC 61439-1:2020 10.9.6 (from memory, unconfirmed)", Example: "IEC 61439-1 10.9.6"},
		{Type: "plug", Key: "contacts", Kind: KindWords, Words: thePlugContactsList, Title: "kind of contacts", Note: "How the moving contact grips.", Clause: "common practice", Example: "fingers"},
		{Type: "plug", Key: "finish", Kind: KindWords, Words: theSurfaceFinishList, Title: "plating of the contacts", Note: "Surface of the contacts.", Clause: "common practice", Example: "bare"},
		{Type: "plug", Key: "fingers", Kind: KindCount, Least: 1, Most: 200, Title: "fingers per phase", Symbol: "n", Note: "Contact points in parallel of one phase.", Clause: "common practice", Example: "12"},
		{Type: "plug", Key: "force_per_finger", Kind: KindQuantity, Dimension: "force", Title: "spring force of a finger", Note: "Of a new contact.", Clause: "common practice", Usual: &Range{Text: "5 N to 500 N", Low: 5, High: 500}, Possible: &Range{Text: "0.5 N to 5 kN", Low: 0.5, High: 5000}, Example: "90 N"},
		{Type: "plug", Key: "force_left", Kind: KindQuantity, Dimension: "percentage", Title: "force left when worn", Note: "Share of the spring force at the end of life and in heat.", Clause: "common practice", Usual: &Range{Text: "40 % to 100 %", Low: 0.4, High: 1}, Possible: &Range{Text: "5 % to 100 %", Low: 0.05, High: 1}, Example: "80 %"},
		{Type: "plug", Key: "finger_length", Kind: KindQuantity, Dimension: "length", Title: "length of a finger", Note: "Length over which opposed fingers attract each other.", Clause: "common practice", Usual: &Range{Text: "5 mm to 300 mm", Low: 0.005, High: 0.3}, Possible: &Range{Text: "1 mm to 1 m", Low: 0.001, High: 1}, Example: "60 mm"},
		{Type: "plug", Key: "finger_spacing", Kind: KindQuantity, Dimension: "length", Title: "distance of opposed fingers", Note: "Between the centre lines of two opposed fingers.", Clause: "common practice", Usual: &Range{Text: "2 mm to 150 mm", Low: 0.002, High: 0.15}, Possible: &Range{Text: "0.5 mm to 500 mm", Low: 0.0005, High: 0.5}, Example: "14 mm"},
		{Type: "plug", Key: "hardness", Kind: KindQuantity, Dimension: "pressure", Title: "hardness of the contact", Symbol: "H", Note: "Contact hardness of the softer metal.", Clause: "common practice", Usual: &Range{Text: "200 MPa to 1500 MPa", Low: 2e+08, High: 1.5e+09}, Possible: &Range{Text: "50 MPa to 10 GPa", Low: 5e+07, High: 1e+10}, Example: "500 MPa"},
		{Type: "plug", Key: "locked_against_ejection", Kind: KindYesNo, Title: "locked against ejection", Note: "The unit is held in place against the force of a fault.", Clause: "common practice", Example: "yes"},
	}},
	{name: "load", title: "load of a unit", short: "", fields: []*Field{
		{Type: "load", Key: "motor", Kind: KindQuantity, Dimension: "power", None: true, Title: "motor power", Note: "Rated shaft power.", Clause: "common practice", Usual: &Range{Text: "1 kW to 900 kW", Low: 1000, High: 900000}, Possible: &Range{Text: "10 W to 10 MW", Low: 10, High: 1e+07}, Example: "250 kW"},
		{Type: "load", Key: "current", Kind: KindQuantity, Dimension: "current", Title: "load current", Note: "Largest continuous current of the load.", Clause: "common practice", Usual: &Range{Text: "5 A to 4 kA", Low: 5, High: 4000}, Possible: &Range{Text: "0.05 A to 10 kA", Low: 0.05, High: 10000}, Example: "435 A"},
		{Type: "load", Key: "starting", Kind: KindQuantity, Dimension: "multiple", Title: "starting current", Note: "Locked-rotor current by rated current of the motor.", Clause: "IEC 60909-0", Usual: &Range{Text: "1.5 x to 10 x", Low: 1.5, High: 10}, Possible: &Range{Text: "1 x to 20 x", Low: 1, High: 20}, Example: "6.5 x"},
		{Type: "load", Key: "starting_time", Kind: KindQuantity, Dimension: "time", Title: "starting time", Note: "Time until the motor runs.", Clause: "common practice", Usual: &Range{Text: "0.2 s to 60 s", Low: 0.2, High: 60}, Possible: &Range{Text: "10 ms to 600 s", Low: 0.01, High: 600}, Example: "8 s"},
		{Type: "load", Key: "efficiency", Kind: KindQuantity, Dimension: "percentage", Title: "efficiency", Note: "At rated power.", Clause: "common practice", Usual: &Range{Text: "70 % to 98 %", Low: 0.7, High: 0.98}, Possible: &Range{Text: "10 % to 100 %", Low: 0.1, High: 1}, Example: "95 %"},
		{Type: "load", Key: "power_factor", Kind: KindQuantity, Dimension: "number", Title: "power factor", Symbol: "cos phi", Note: "At rated power.", Clause: "common practice", Usual: &Range{Text: "0.5 to 1", Low: 0.5, High: 1}, Possible: &Range{Text: "0.05 to 1", Low: 0.05, High: 1}, Example: "0.87"},
		{Type: "load", Key: "fed_through", Kind: KindWords, Words: theFedThroughList, Title: "fed through", Note: "Decides whether the motor feeds a fault and what the source of the load is.", Clause: "IEC 60909-0", Example: "direct"},
		{Type: "load", Key: "continuous", Kind: KindYesNo, Title: "continuous load", Note: "Runs for hours and together with the others.", Clause: "IEC 61439-2 Table 101", Example: "yes"},
		{Type: "load", Key: "third_harmonic", Kind: KindQuantity, Dimension: "percentage", Title: "third harmonic of the load", Note: "Share of the third harmonic in the phase current.", Clause: "IEC 60364-5-52 Annex E (from memory, unconfirmed)", Usual: &Range{Text: "0.5 % to 80 %", Low: 0.005, High: 0.8}, Possible: &Range{Text: "0 % to 150 %", Low: 0, High: 1.5}, Example: "8 %"},
		{Type: "load", Key: "discharge_time", Kind: KindQuantity, Dimension: "time", None: true, Title: "discharge time", Note: "Until stored energy of the load or converter is gone.", Clause: "common practice", Usual: &Range{Text: "5 s to 20 min", Low: 5, High: 1200}, Possible: &Range{Text: "100 ms to 2 h", Low: 0.1, High: 7200}, Example: "5 min"},
	}},
	{name: "unit_cables", title: "cables of a unit", short: "", fields: []*Field{
		{Type: "unit_cables", Key: "entry", Kind: KindWords, Words: theCableEntryList, List: true, Title: "cable entry", Note: "Sides cables can enter from.", Clause: "common practice", Example: "[top]"},
		{Type: "unit_cables", Key: "conductor", Kind: KindWords, Words: theConductorMetalList, Title: "conductor", Note: "Material of the cable conductors.", Clause: "common practice", Example: "copper"},
		{Type: "unit_cables", Key: "insulation", Kind: KindWords, Words: theCableInsulationList, Title: "insulation", Note: "Insulation of the cables.", Clause: "common practice", Example: "pvc"},
		{Type: "unit_cables", Key: "area", Kind: KindQuantity, Dimension: "area", Title: "area of a conductor", Symbol: "S", Note: "Cross-section of one phase conductor.", Clause: "common practice", Usual: &Range{Text: "1.5 mm2 to 1000 mm2", Low: 1.5e-06, High: 0.001}, Possible: &Range{Text: "0.2 mm2 to 3000 mm2", Low: 2e-07, High: 0.003}, Example: "240 mm2"},
		{Type: "unit_cables", Key: "in_parallel", Kind: KindCount, Least: 1, Most: 30, Title: "conductors in parallel", Note: "Cables per phase.", Clause: "common practice", Example: "2"},
		{Type: "unit_cables", Key: "single_core", Kind: KindYesNo, Title: "single-core cables", Note: "Single cores heat a closed steel plate.", Clause: "common practice", Example: "yes"},
		{Type: "unit_cables", Key: "largest_area", Kind: KindQuantity, Dimension: "area", Title: "largest conductor the terminal takes", Note: "Cross-section the terminals are verified for.", Clause: "IEC 61439-1 8.8 (from memory, unconfirmed)", Usual: &Range{Text: "2.5 mm2 to 1000 mm2", Low: 2.5e-06, High: 0.001}, Possible: &Range{Text: "0.5 mm2 to 3000 mm2", Low: 5e-07, High: 0.003}, Example: "300 mm2"},
		{Type: "unit_cables", Key: "conductor_temperature", Kind: KindQuantity, Dimension: "temperature", Title: "highest conductor temperature", Note: "Continuous temperature the cable may have at the terminal.", Clause: "IEC 61439-1 Table 6", Usual: &Range{Text: "60 °C to 110 °C", Low: 60, High: 110}, Possible: &Range{Text: "40 °C to 250 °C", Low: 40, High: 250}, Example: "90 °C"},
		{Type: "unit_cables", Key: "gland_plate", Kind: KindWords, Words: theGlandPlateList, Title: "gland plate", Note: "Whether a plate can be taken out for one circuit.", Clause: "common practice", Example: "open entry"},
		{Type: "unit_cables", Key: "gland_plate_material", Kind: KindWords, Words: theGlandPlateMaterialList, Title: "material of the gland plate", Note: "Round single cores it must not be closed steel.", Clause: "common practice", Example: "steel"},
		{Type: "unit_cables", Key: "entry_protection", Kind: KindProtection, Title: "protection at the entry", Note: "Degree of protection with the cables in.", Clause: "IEC 60529", Example: "IP42"},
		{Type: "unit_cables", Key: "plate_to_terminal", Kind: KindQuantity, Dimension: "length", Title: "distance from plate to terminal", Note: "Room to bend and fasten the cables.", Clause: "common practice", Usual: &Range{Text: "50 mm to 2 m", Low: 0.05, High: 2}, Possible: &Range{Text: "10 mm to 5 m", Low: 0.01, High: 5}, Example: "450 mm"},
		{Type: "unit_cables", Key: "bend_radius", Kind: KindQuantity, Dimension: "length", Title: "bending radius possible", Note: "Largest bending radius the space allows.", Clause: "common practice", Usual: &Range{Text: "30 mm to 1.2 m", Low: 0.03, High: 1.2}, Possible: &Range{Text: "5 mm to 5 m", Low: 0.005, High: 5}, Example: "350 mm"},
		{Type: "unit_cables", Key: "cleats_tested_to", Kind: KindQuantity, Dimension: "current", None: true, Title: "cleats tested to", Note: "Peak current the cable cleats withstood.", Clause: "IEC 61914", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "110 kA"},
		{Type: "unit_cables", Key: "spare_space", Kind: KindQuantity, Dimension: "percentage", None: true, Title: "spare space", Note: "Room left for later cables.", Clause: "common practice", Usual: &Range{Text: "5 % to 100 %", Low: 0.05, High: 1}, Possible: &Range{Text: "0 % to 500 %", Low: 0, High: 5}, Example: "20 %"},
	}},
	{name: "unit", title: "unit", short: "", fields: []*Field{
		{Type: "unit", Key: "duty", Kind: KindWords, Words: theUnitDutyList, Title: "duty", Note: "What the unit is there for.", Clause: "common practice", Example: "motor feeder"},
		{Type: "unit", Key: "connects", Kind: KindNames, Collections: []string{"sources"}, Title: "source", Note: "Source that an incomer brings in.", Clause: "common practice", Example: "TX1"},
		{Type: "unit", Key: "to", Kind: KindNames, Collections: []string{"sections"}, Title: "section fed", Note: "Section that an incomer feeds.", Clause: "common practice", Example: "A"},
		{Type: "unit", Key: "between", Kind: KindNames, Collections: []string{"sections"}, List: true, Title: "sections coupled", Note: "The two sections a coupler joins; the first one is its line side.", Clause: "common practice", Example: "[A]"},
		{Type: "unit", Key: "on", Kind: KindNames, Collections: []string{"busbars"}, Title: "bars", Note: "Bars the unit is connected to.", Clause: "common practice", Example: "riser 3"},
		{Type: "unit", Key: "place", Kind: KindText, Title: "place in the board", Note: "Cubicle and height as on the front view.", Clause: "common practice", Example: "cubicle 3 position 2"},
		{Type: "unit", Key: "poles", Kind: KindWords, Words: theUnitPolesList, Title: "poles", Note: "Phases and neutral in the unit.", Clause: "common practice", Example: "1"},
		{Type: "unit", Key: "mounting", Kind: KindWords, Words: theUnitMountingList, Title: "mounting", Note: "How the unit can be taken out.", Clause: "IEC 61439-2", Example: "fixed"},
		{Type: "unit", Key: "positions", Kind: KindWords, Words: theUnitPositionList, List: true, Title: "positions", Note: "Positions a withdrawable unit has.", Clause: "IEC 61439-2 Table 103 (from memory, unconfirmed)", Example: "[connected]"},
		{Type: "unit", Key: "position_shown", Kind: KindYesNo, Title: "position shown", Note: "Each position can be seen from outside.", Clause: "IEC 61439-2 8.5 (from memory, unconfirmed)", Example: "yes"},
		{Type: "unit", Key: "interlocks", Kind: KindWords, Words: theUnitInterlockList, List: true, None: true, Title: "interlocks", Note: "Interlocks that are there and tested.", Clause: "IEC 61439-2 8.5 (from memory, unconfirmed)", Example: "[no movement when closed]"},
		{Type: "unit", Key: "shutters", Kind: KindObject, Of: "shutters", None: true, Title: "shutters", Note: "Cover the fixed contacts when the unit is out.", Clause: "IEC 61439-2 8.3 (from memory, unconfirmed)"},
		{Type: "unit", Key: "device", Kind: KindObject, Of: "device", Title: "device", Note: "Main switching device.", Clause: "common practice"},
		{Type: "unit", Key: "contactor", Kind: KindObject, Of: "device", None: true, Title: "contactor or second device", Note: "Switching device in series with the main device.", Clause: "IEC 60947-4-1"},
		{Type: "unit", Key: "settings", Kind: KindNames, Collections: []string{"protection"}, Title: "settings", Note: "Protection that trips the device.", Clause: "common practice", Example: "Q1-release"},
		{Type: "unit", Key: "settings_on_generator", Kind: KindNames, Collections: []string{"protection"}, None: true, Title: "settings in generator supply", Note: "Protection in force while only generators feed.", Clause: "common practice", Example: "QG-release"},
		{Type: "unit", Key: "backed_up_by", Kind: KindNames, Collections: []string{"units", "protection"}, None: true, Title: "backed up by", Note: "Upstream device that helps to break in a tested combination.", Clause: "IEC 60947-2 Annex A (from memory, unconfirmed)", Example: "Q1"},
		{Type: "unit", Key: "backed_up_to", Kind: KindVoltageTable, Dimension: "current", Title: "breaking capacity backed up", Note: "R.m.s. current the tested combination breaks.", Clause: "IEC 60947-2 Annex A (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "{400 V: 66 kA}"},
		{Type: "unit", Key: "plug", Kind: KindObject, Of: "plug", None: true, Title: "plug contacts", Note: "Contacts between bars and a withdrawable unit.", Clause: "common practice"},
		{Type: "unit", Key: "line_terminals", Kind: KindWords, Words: theTerminalBarrierList, Title: "barrier round the line terminals", Note: "Decides whether an arc in the unit reaches its line side.", Clause: "IEEE 1584-2018 (from memory, unconfirmed)", Example: "no barrier"},
		{Type: "unit", Key: "load", Kind: KindObject, Of: "load", None: true, Title: "load", Note: "What the unit feeds.", Clause: "common practice"},
		{Type: "unit", Key: "rated_current_in_board", Kind: KindQuantity, Dimension: "current", Title: "rated current of the circuit", Symbol: "Inc", Note: "Of the unit alone in the board and not of its device.", Clause: "IEC 61439-1:2020 5.3.2 (from memory, unconfirmed)", Usual: &Range{Text: "8 A to 6.3 kA", Low: 8, High: 6300}, Possible: &Range{Text: "0.1 A to 10 kA", Low: 0.1, High: 10000}, Example: "504 A"},
		{Type: "unit", Key: "group_rated_current", Kind: KindQuantity, Dimension: "current", Title: "group rated current", Symbol: "Ing", Note: "With the neighbouring circuits loaded as well.", Clause: "IEC 61439-1:2020 5.3.3 (from memory, unconfirmed)", Usual: &Range{Text: "8 A to 6.3 kA", Low: 8, High: 6300}, Possible: &Range{Text: "0.1 A to 10 kA", Low: 0.1, High: 10000}, Example: "480 A"},
		{Type: "unit", Key: "air_at_device", Kind: KindQuantity, Dimension: "temperature", Title: "air at the device", Note: "Air inside the unit in full load as measured or declared.", Clause: "IEC 61439-1 10.10 (from memory, unconfirmed)", Usual: &Range{Text: "20 °C to 90 °C", Low: 20, High: 90}, Possible: &Range{Text: "-30 °C to 150 °C", Low: -30, High: 150}, Example: "60 °C"},
		{Type: "unit", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", None: true, Title: "short-time withstand of the circuit", Note: "Of the conductors of the unit.", Clause: "IEC 61439-1:2020 5.3.5"},
		{Type: "unit", Key: "peak_withstand", Kind: KindQuantity, Dimension: "current", Title: "peak withstand of the circuit", Symbol: "Ipk", Note: "Highest peak the conductors of the unit withstand.", Clause: "IEC 61439-1:2020 5.3.4 (from memory, unconfirmed)", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "143 kA"},
		{Type: "unit", Key: "conditional_rating", Kind: KindObject, Of: "conditional_rating", None: true, Title: "conditional rating", Note: "Rating of the unit behind its limiting device.", Clause: "IEC 61439-1:2020 5.3.6 (from memory, unconfirmed)"},
		{Type: "unit", Key: "rated_insulation_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated insulation voltage of the circuit", Symbol: "Ui", Note: "Where it differs from the board.", Clause: "IEC 61439-1 5.2.3 (from memory, unconfirmed)", Usual: &Range{Text: "250 V to 1500 V", Low: 250, High: 1500}, Possible: &Range{Text: "50 V to 2000 V", Low: 50, High: 2000}, Example: "1000 V"},
		{Type: "unit", Key: "rated_impulse_withstand", Kind: KindQuantity, Dimension: "voltage", Title: "impulse withstand of the circuit", Symbol: "Uimp", Note: "Where it differs from the board.", Clause: "IEC 61439-1 5.2.4 (from memory, unconfirmed)", Usual: &Range{Text: "2.5 kV to 12 kV", Low: 2500, High: 12000}, Possible: &Range{Text: "330 V to 40 kV", Low: 330, High: 40000}, Example: "8 kV"},
		{Type: "unit", Key: "isolating_gap_impulse", Kind: KindQuantity, Dimension: "voltage", Title: "impulse across the isolating gap", Note: "Test voltage the open isolating gap withstood.", Clause: "IEC 60947-1 Table 14 (from memory, unconfirmed)", Usual: &Range{Text: "3 kV to 20 kV", Low: 3000, High: 20000}, Possible: &Range{Text: "500 V to 60 kV", Low: 500, High: 60000}, Example: "9.8 kV"},
		{Type: "unit", Key: "coordination", Kind: KindWords, Words: theStarterCoordinationList, Title: "coordination", Note: "State of the starter after a short-circuit.", Clause: "IEC 60947-4-1 (from memory, unconfirmed)", Example: "type 1"},
		{Type: "unit", Key: "coordination_current", Kind: KindVoltageTable, Dimension: "current", Title: "current of the coordination", Symbol: "Iq", Note: "Prospective current the coordination was tested at.", Clause: "IEC 60947-4-1 (from memory, unconfirmed)", Usual: &Range{Text: "1 kA to 200 kA", Low: 1000, High: 200000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "{400 V: 65 kA}"},
		{Type: "unit", Key: "residual_current", Kind: KindQuantity, Dimension: "current", None: true, Title: "residual current protection", Symbol: "IΔn", Note: "Rated residual current for sockets and tools.", Clause: "IEC 60364-4-41 411.3.3 (from memory, unconfirmed)", Usual: &Range{Text: "10 mA to 5 A", Low: 0.01, High: 5}, Possible: &Range{Text: "1 mA to 30 A", Low: 0.001, High: 30}, Example: "30 mA"},
		{Type: "unit", Key: "residual_current_type", Kind: KindWords, Words: theResidualCurrentTypeList, Title: "type of residual current device", Note: "Type B where converters are near.", Clause: "common practice", Example: "AC"},
		{Type: "unit", Key: "terminals", Kind: KindWords, Words: theTerminalShroudingList, Title: "terminals", Note: "Cover of the outgoing terminals.", Clause: "IEC 61439-1 8.4.2 (from memory, unconfirmed)", Example: "open"},
		{Type: "unit", Key: "cables", Kind: KindObject, Of: "unit_cables", Title: "cables", Note: "Entry and fastening of the cables.", Clause: "common practice"},
		{Type: "unit", Key: "live_when_incomer_open", Kind: KindText, None: true, Title: "parts live with the incomers open", Note: "What in the unit stays live and from where.", Clause: "common practice", Example: "heater supply from distribution board DB-2"},
	}},
	{name: "tap_protection", title: "protection of a tap-off", short: "", fields: []*Field{
		{Type: "tap_protection", Key: "kind", Kind: KindWords, Words: theTapProtectionKindList, Title: "kind", Note: "Device at the end of the unprotected length.", Clause: "common practice", Example: "fuse"},
		{Type: "tap_protection", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current", Note: "Rated current of the fuse or breaker.", Clause: "common practice", Usual: &Range{Text: "0.5 A to 250 A", Low: 0.5, High: 250}, Possible: &Range{Text: "0.05 A to 1600 A", Low: 0.05, High: 1600}, Example: "6 A"},
		{Type: "tap_protection", Key: "class", Kind: KindWords, Words: theFuseClassList, Title: "class", Note: "Class of the fuse-link.", Clause: "IEC 60269-1", Example: "gG"},
		{Type: "tap_protection", Key: "breaking", Kind: KindVoltageTable, Dimension: "current", Title: "breaking capacity", Note: "R.m.s. breaking capacity for each voltage.", Clause: "IEC 60269-1", Usual: &Range{Text: "1 kA to 300 kA", Low: 1000, High: 300000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "{400 V: 100 kA}"},
	}},
	{name: "tap", title: "tap-off", short: "", fields: []*Field{
		{Type: "tap", Key: "use", Kind: KindWords, Words: theTapUseList, Title: "use", Note: "What the tap-off feeds.", Clause: "common practice", Example: "voltage measurement"},
		{Type: "tap", Key: "on", Kind: KindNames, Collections: []string{"busbars", "units"}, Title: "connected to", Note: "Bars or unit that the conductors start from.", Clause: "common practice", Example: "main A"},
		{Type: "tap", Key: "side", Kind: KindWords, Words: theDeviceSideList, Title: "side", Note: "Side of the unit they start from.", Clause: "common practice", Example: "line side"},
		{Type: "tap", Key: "length", Kind: KindQuantity, Dimension: "length", Title: "unprotected length", Note: "From the bars to the protection.", Clause: "IEC 61439-1 8.6.4 (from memory, unconfirmed)", Usual: &Range{Text: "50 mm to 5 m", Low: 0.05, High: 5}, Possible: &Range{Text: "1 mm to 50 m", Low: 0.001, High: 50}, Example: "1.2 m"},
		{Type: "tap", Key: "conductor", Kind: KindWords, Words: theConductorMetalList, Title: "conductor", Note: "Material of the conductors.", Clause: "common practice", Example: "copper"},
		{Type: "tap", Key: "area", Kind: KindQuantity, Dimension: "area", Title: "area of a conductor", Symbol: "S", Note: "Cross-section of the unprotected conductors.", Clause: "common practice", Usual: &Range{Text: "0.75 mm2 to 300 mm2", Low: 7.5e-07, High: 0.0003}, Possible: &Range{Text: "0.1 mm2 to 2000 mm2", Low: 1e-07, High: 0.002}, Example: "2.5 mm2"},
		{Type: "tap", Key: "conductor_measure", Kind: KindWords, Words: theConductorMeasureList, Title: "measure against a short-circuit", Note: "Line of the conductor table that makes a fault unlikely.", Clause: "IEC 61439-1 8.6.4 Table 4 (from memory, unconfirmed)", Example: "no measure"},
		{Type: "tap", Key: "protected_by", Kind: KindObject, Of: "tap_protection", None: true, Title: "protection", Note: "Fuse or breaker of the tap-off.", Clause: "IEC 61439-1 8.6.4 (from memory, unconfirmed)"},
		{Type: "tap", Key: "isolating", Kind: KindYesNo, Title: "own isolation", Note: "Can be isolated without opening the bars.", Clause: "common practice", Example: "yes"},
		{Type: "tap", Key: "live_when_incomer_open", Kind: KindYesNo, Title: "live with the incomers open", Note: "Stays live when all incomers are open.", Clause: "common practice", Example: "yes"},
		{Type: "tap", Key: "remark", Kind: KindText, Title: "remark", Note: "What the other words do not say.", Clause: "common practice", Example: "supply of the door fan"},
	}},
	{name: "long_time", title: "long-time function", short: "", fields: []*Field{
		{Type: "long_time", Key: "pickup", Kind: KindQuantity, Dimension: "current", Title: "long-time pickup", Symbol: "Ir", Note: "Current above which it starts.", Clause: "IEC 60947-2", Usual: &Range{Text: "8 A to 6.3 kA", Low: 8, High: 6300}, Possible: &Range{Text: "0.1 A to 20 kA", Low: 0.1, High: 20000}, Example: "2500 A"},
		{Type: "long_time", Key: "delay", Kind: KindQuantity, Dimension: "time", Title: "long-time delay", Symbol: "tr", Note: "Delay at the multiple beside it.", Clause: "common practice", Usual: &Range{Text: "0.5 s to 400 s", Low: 0.5, High: 400}, Possible: &Range{Text: "10 ms to 2 h", Low: 0.01, High: 7200}, Example: "12 s"},
		{Type: "long_time", Key: "at", Kind: KindQuantity, Dimension: "multiple", Title: "multiple of the delay", Note: "Multiple at which the delay is stated.", Clause: "common practice", Usual: &Range{Text: "1.5 x to 10 x", Low: 1.5, High: 10}, Possible: &Range{Text: "1.05 x to 30 x", Low: 1.05, High: 30}, Example: "6 x"},
		{Type: "long_time", Key: "at_of", Kind: KindWords, Words: theMultipleOfList, Title: "the multiple is one of", Note: "Pickup or rated current.", Clause: "common practice", Example: "setting"},
		{Type: "long_time", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the pickup", Note: "Plus and minus.", Clause: "common practice", Usual: &Range{Text: "1 % to 30 %", Low: 0.01, High: 0.3}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "10 %"},
		{Type: "long_time", Key: "time_tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the delay", Note: "Plus and minus.", Clause: "common practice", Usual: &Range{Text: "1 % to 40 %", Low: 0.01, High: 0.4}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "20 %"},
	}},
	{name: "short_time", title: "short-time function", short: "pickup", fields: []*Field{
		{Type: "short_time", Key: "pickup", Kind: KindQuantity, Dimension: "current", Title: "short-time pickup", Symbol: "Isd", Note: "Current above which it starts.", Clause: "IEC 60947-2", Usual: &Range{Text: "40 A to 35 kA", Low: 40, High: 35000}, Possible: &Range{Text: "0.5 A to 200 kA", Low: 0.5, High: 200000}, Example: "10 kA"},
		{Type: "short_time", Key: "delay", Kind: KindQuantity, Dimension: "time", Title: "short-time delay", Symbol: "tsd", Note: "Set delay without break time.", Clause: "common practice", Usual: &Range{Text: "10 ms to 1 s", Low: 0.01, High: 1}, Possible: &Range{Text: "0 s to 10 s", Low: 0, High: 10}, Example: "200 ms"},
		{Type: "short_time", Key: "i2t", Kind: KindWords, Words: theI2tRampList, Title: "sloping part", Note: "On while the delay falls with the current.", Clause: "common practice", Example: "on"},
		{Type: "short_time", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the pickup", Note: "Plus and minus.", Clause: "IEC 60947-2 (from memory, unconfirmed)", Usual: &Range{Text: "1 % to 30 %", Low: 0.01, High: 0.3}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "10 %"},
		{Type: "short_time", Key: "delay_tolerance", Kind: KindQuantity, Dimension: "time", Title: "tolerance of the delay", Note: "Added to the delay at the slow edge.", Clause: "common practice", Usual: &Range{Text: "1 ms to 200 ms", Low: 0.001, High: 0.2}, Possible: &Range{Text: "0 s to 2 s", Low: 0, High: 2}, Example: "30 ms"},
	}},
	{name: "instantaneous", title: "instantaneous function", short: "pickup", fields: []*Field{
		{Type: "instantaneous", Key: "pickup", Kind: KindQuantity, Dimension: "current", Title: "instantaneous pickup", Symbol: "Ii", Note: "Current above which it trips without delay.", Clause: "IEC 60947-2", Usual: &Range{Text: "40 A to 35 kA", Low: 40, High: 35000}, Possible: &Range{Text: "0.5 A to 400 kA", Low: 0.5, High: 400000}, Example: "20 kA"},
		{Type: "instantaneous", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the pickup", Note: "Plus and minus.", Clause: "IEC 60947-2 8.3.3.1.2 (from memory, unconfirmed)", Usual: &Range{Text: "1 % to 40 %", Low: 0.01, High: 0.4}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "20 %"},
	}},
	{name: "override", title: "override of a release", short: "pickup", fields: []*Field{
		{Type: "override", Key: "pickup", Kind: KindQuantity, Dimension: "current", Title: "override pickup", Note: "Fixed current above which the release trips whatever is set.", Clause: "common practice", Usual: &Range{Text: "0.5 kA to 200 kA", Low: 500, High: 200000}, Possible: &Range{Text: "50 A to 400 kA", Low: 50, High: 400000}, Example: "55 kA"},
		{Type: "override", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the override", Note: "Plus and minus.", Clause: "common practice", Usual: &Range{Text: "1 % to 40 %", Low: 0.01, High: 0.4}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "20 %"},
	}},
	{name: "earth_fault", title: "earth-fault function", short: "", fields: []*Field{
		{Type: "earth_fault", Key: "method", Kind: KindWords, Words: theEarthFaultMethodList, Title: "method", Note: "How the earth-fault current is measured.", Clause: "common practice", Example: "residual"},
		{Type: "earth_fault", Key: "pickup", Kind: KindQuantity, Dimension: "current", Title: "earth-fault pickup", Symbol: "Ig", Note: "Current above which it starts.", Clause: "NEC 230.95", Usual: &Range{Text: "5 A to 3 kA", Low: 5, High: 3000}, Possible: &Range{Text: "5 mA to 20 kA", Low: 0.005, High: 20000}, Example: "1000 A"},
		{Type: "earth_fault", Key: "delay", Kind: KindQuantity, Dimension: "time", Title: "earth-fault delay", Symbol: "tg", Note: "Set delay without break time.", Clause: "NEC 230.95", Usual: &Range{Text: "10 ms to 5 s", Low: 0.01, High: 5}, Possible: &Range{Text: "0 s to 60 s", Low: 0, High: 60}, Example: "200 ms"},
		{Type: "earth_fault", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the pickup", Note: "Plus and minus.", Clause: "common practice", Usual: &Range{Text: "1 % to 30 %", Low: 0.01, High: 0.3}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "10 %"},
		{Type: "earth_fault", Key: "acts_on", Kind: KindNames, Collections: []string{"units", "protection"}, List: true, Title: "acts on", Note: "Devices it trips besides its own.", Clause: "common practice", Example: "[TX1-HV]"},
	}},
	{name: "maintenance_setting", title: "maintenance setting", short: "", fields: []*Field{
		{Type: "maintenance_setting", Key: "instantaneous", Kind: KindQuantity, Dimension: "current", Title: "pickup while switched on", Note: "Instantaneous pickup while persons work.", Clause: "NEC 240.87", Usual: &Range{Text: "40 A to 35 kA", Low: 40, High: 35000}, Possible: &Range{Text: "0.5 A to 200 kA", Low: 0.5, High: 200000}, Example: "7.5 kA"},
		{Type: "maintenance_setting", Key: "break_time", Kind: KindQuantity, Dimension: "time", Title: "break time while switched on", Note: "Largest total time at and above the pickup.", Clause: "common practice", Usual: &Range{Text: "2 ms to 300 ms", Low: 0.002, High: 0.3}, Possible: &Range{Text: "0.1 ms to 2 s", Low: 0.0001, High: 2}, Example: "40 ms"},
		{Type: "maintenance_setting", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the pickup", Note: "Plus and minus.", Clause: "common practice", Usual: &Range{Text: "1 % to 40 %", Low: 0.01, High: 0.4}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "20 %"},
		{Type: "maintenance_setting", Key: "indication", Kind: KindWords, Words: theSettingIndicationList, Title: "indication", Note: "Where it is shown that the setting is on.", Clause: "NEC 240.87", Example: "no indication"},
		{Type: "maintenance_setting", Key: "remote", Kind: KindYesNo, Title: "switched remotely", Note: "Can be switched on without standing at the board.", Clause: "common practice", Example: "yes"},
		{Type: "maintenance_setting", Key: "auto_return", Kind: KindYesNo, Title: "returns by itself", Note: "Goes back to the normal setting by itself.", Clause: "common practice", Example: "yes"},
	}},
	{name: "current_transformer", title: "current transformer", short: "", fields: []*Field{
		{Type: "current_transformer", Key: "primary", Kind: KindQuantity, Dimension: "current", Title: "rated primary current", Note: "First figure of the ratio.", Clause: "IEC 61869-2", Usual: &Range{Text: "10 A to 6.3 kA", Low: 10, High: 6300}, Possible: &Range{Text: "0.5 A to 30 kA", Low: 0.5, High: 30000}, Example: "150 A"},
		{Type: "current_transformer", Key: "secondary", Kind: KindQuantity, Dimension: "current", Title: "rated secondary current", Note: "Second figure of the ratio.", Clause: "IEC 61869-2", Usual: &Range{Text: "0.5 A to 5 A", Low: 0.5, High: 5}, Possible: &Range{Text: "1 mA to 20 A", Low: 0.001, High: 20}, Example: "1 A"},
		{Type: "current_transformer", Key: "class", Kind: KindText, Title: "accuracy class", Note: "Class with accuracy limit factor.", Clause: "IEC 61869-2", Example: "5P20"},
		{Type: "current_transformer", Key: "burden", Kind: KindQuantity, Dimension: "apparent_power", Title: "rated burden", Note: "Burden the class holds for.", Clause: "IEC 61869-2", Usual: &Range{Text: "0.2 VA to 60 VA", Low: 0.2, High: 60}, Possible: &Range{Text: "0.01 VA to 500 VA", Low: 0.01, High: 500}, Example: "5 VA"},
		{Type: "current_transformer", Key: "burden_connected", Kind: KindQuantity, Dimension: "apparent_power", Title: "burden connected", Note: "Relay and leads at rated secondary current.", Clause: "common practice", Usual: &Range{Text: "0.05 VA to 40 VA", Low: 0.05, High: 40}, Possible: &Range{Text: "0.001 VA to 500 VA", Low: 0.001, High: 500}, Example: "2 VA"},
		{Type: "current_transformer", Key: "error", Kind: KindQuantity, Dimension: "percentage", Title: "current error", Note: "Largest error up to the accuracy limit.", Clause: "common practice", Usual: &Range{Text: "0.2 % to 10 %", Low: 0.002, High: 0.1}, Possible: &Range{Text: "0 % to 50 %", Low: 0, High: 0.5}, Example: "5 %"},
	}},
	{name: "zone_interlock", title: "zone interlock", short: "", fields: []*Field{
		{Type: "zone_interlock", Key: "with", Kind: KindNames, Collections: []string{"protection"}, List: true, Title: "blocked by", Note: "Downstream protection that sends the blocking signal.", Clause: "NEC 240.87", Example: "[P1-release]"},
		{Type: "zone_interlock", Key: "undelayed", Kind: KindQuantity, Dimension: "time", Title: "time without blocking", Note: "Largest delay while no blocking signal comes.", Clause: "common practice", Usual: &Range{Text: "5 ms to 200 ms", Low: 0.005, High: 0.2}, Possible: &Range{Text: "0 s to 2 s", Low: 0, High: 2}, Example: "50 ms"},
		{Type: "zone_interlock", Key: "earth_fault_too", Kind: KindYesNo, Title: "also for earth faults", Note: "Works for the earth-fault function as well.", Clause: "common practice", Example: "yes"},
		{Type: "zone_interlock", Key: "wire_break", Kind: KindWords, Words: theInterlockFailureList, Title: "at a broken wire", Note: "What the upstream device does without the wire.", Clause: "common practice", Example: "delayed"},
		{Type: "zone_interlock", Key: "tested", Kind: KindMonth, Title: "tested", Note: "Month of the last test in place.", Clause: "NEC 240.87(C) (from memory, unconfirmed)", Example: "2026-03"},
	}},
	{name: "protective_device", title: "protective device", short: "", fields: []*Field{
		{Type: "protective_device", Key: "kind", Kind: KindWords, Words: theProtectiveDeviceKindList, Title: "kind", Note: "What measures and trips.", Clause: "common practice", Example: "electronic release"},
		{Type: "protective_device", Key: "type", Kind: KindText, Title: "type", Note: "Designation by its maker.", Clause: "common practice", Example: "release with L S I G"},
		{Type: "protective_device", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "rated current", Symbol: "In", Note: "Of the sensor or of the fuse-link.", Clause: "common practice", Usual: &Range{Text: "8 A to 6.3 kA", Low: 8, High: 6300}, Possible: &Range{Text: "0.05 A to 10 kA", Low: 0.05, High: 10000}, Example: "2500 A"},
		{Type: "protective_device", Key: "class", Kind: KindWords, Words: theFuseClassList, Title: "class of the fuse-link", Note: "With the rated current it gives the gates of the curve.", Clause: "IEC 60269-1", Example: "gG"},
		{Type: "protective_device", Key: "points", Kind: KindPairTable, Dimension: "current", Second: "time", Title: "points of the curve", Note: "Current and longest total time in falling order of time.", Clause: "common practice", Example: "[[2 kA, 10 s], [4 kA, 0.4 s], [8 kA, 20 ms], [20 kA, 4 ms]]"},
		{Type: "protective_device", Key: "curve", Kind: KindWords, Words: theInverseCurveList, Title: "shape of the curve", Note: "Of a relay.", Clause: "IEC 60255-151", Example: "IEC standard inverse"},
		{Type: "protective_device", Key: "pickup", Kind: KindQuantity, Dimension: "current", Title: "relay pickup", Symbol: "Is", Note: "Primary current above which the relay starts.", Clause: "IEC 60255-151", Usual: &Range{Text: "5 A to 4 kA", Low: 5, High: 4000}, Possible: &Range{Text: "0.01 A to 20 kA", Low: 0.01, High: 20000}, Example: "120 A"},
		{Type: "protective_device", Key: "time_multiplier", Kind: KindQuantity, Dimension: "number", Title: "time multiplier", Symbol: "TMS", Note: "Setting that multiplies the time of the curve.", Clause: "IEC 60255-151", Usual: &Range{Text: "0.05 to 10", Low: 0.05, High: 10}, Possible: &Range{Text: "0.005 to 100", Low: 0.005, High: 100}, Example: "0.1"},
		{Type: "protective_device", Key: "delay", Kind: KindQuantity, Dimension: "time", Title: "definite delay", Note: "Delay of the definite-time curve.", Clause: "common practice", Usual: &Range{Text: "10 ms to 5 s", Low: 0.01, High: 5}, Possible: &Range{Text: "0 s to 600 s", Low: 0, High: 600}, Example: "400 ms"},
		{Type: "protective_device", Key: "tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the pickup", Note: "Plus and minus and without the transformer error.", Clause: "common practice", Usual: &Range{Text: "1 % to 30 %", Low: 0.01, High: 0.3}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "5 %"},
		{Type: "protective_device", Key: "time_tolerance", Kind: KindQuantity, Dimension: "percentage", Title: "tolerance of the time", Note: "Plus and minus.", Clause: "IEC 60255-151 (from memory, unconfirmed)", Usual: &Range{Text: "1 % to 30 %", Low: 0.01, High: 0.3}, Possible: &Range{Text: "0 % to 100 %", Low: 0, High: 1}, Example: "7.5 %"},
		{Type: "protective_device", Key: "time_tolerance_at_least", Kind: KindQuantity, Dimension: "time", Title: "smallest tolerance of the time", Note: "Counts where it is more than the percentage.", Clause: "common practice", Usual: &Range{Text: "1 ms to 200 ms", Low: 0.001, High: 0.2}, Possible: &Range{Text: "0 s to 2 s", Low: 0, High: 2}, Example: "30 ms"},
		{Type: "protective_device", Key: "at_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage of the currents", Note: "Voltage level the currents are stated for.", Clause: "common practice", Usual: &Range{Text: "200 V to 36 kV", Low: 200, High: 36000}, Possible: &Range{Text: "24 V to 150 kV", Low: 24, High: 150000}, Example: "11 kV"},
		{Type: "protective_device", Key: "break_time", Kind: KindQuantity, Dimension: "time", Title: "break time", Note: "Largest opening and arcing time of the breaker it trips.", Clause: "IEC 62271-100; IEC 60947-2 (from memory, unconfirmed)", Usual: &Range{Text: "2 ms to 200 ms", Low: 0.002, High: 0.2}, Possible: &Range{Text: "0.1 ms to 2 s", Low: 0.0001, High: 2}, Example: "50 ms"},
		{Type: "protective_device", Key: "curve_includes_break_time", Kind: KindYesNo, Title: "curve includes the break time", Note: "Published times are total clearing times.", Clause: "common practice", Example: "yes"},
		{Type: "protective_device", Key: "long_time", Kind: KindObject, Of: "long_time", None: true, Title: "long-time function", Note: "Overload part of a release.", Clause: "IEC 60947-2"},
		{Type: "protective_device", Key: "short_time", Kind: KindObject, Of: "short_time", None: true, Title: "short-time function", Note: "Delayed short-circuit part of a release.", Clause: "IEC 60947-2"},
		{Type: "protective_device", Key: "instantaneous", Kind: KindObject, Of: "instantaneous", None: true, Title: "instantaneous function", Note: "Undelayed short-circuit part.", Clause: "IEC 60947-2"},
		{Type: "protective_device", Key: "override", Kind: KindObject, Of: "override", None: true, Title: "override", Note: "Fixed level of the release beside the settings.", Clause: "common practice"},
		{Type: "protective_device", Key: "earth_fault", Kind: KindObject, Of: "earth_fault", None: true, Title: "earth-fault function", Note: "Part for faults to earth.", Clause: "IEC 60364-4-41; NEC 230.95"},
		{Type: "protective_device", Key: "neutral_setting", Kind: KindQuantity, Dimension: "percentage", None: true, Title: "neutral pole setting", Note: "Share of the phase setting for the neutral pole.", Clause: "common practice", Usual: &Range{Text: "40 % to 200 %", Low: 0.4, High: 2}, Possible: &Range{Text: "10 % to 300 %", Low: 0.1, High: 3}, Example: "100 %"},
		{Type: "protective_device", Key: "voltage_restrained", Kind: KindYesNo, Title: "voltage-restrained", Note: "Pickup falls with the voltage of a generator.", Clause: "common practice", Example: "yes"},
		{Type: "protective_device", Key: "differential", Kind: KindYesNo, Title: "differential protection", Note: "Trips on the difference round the bars.", Clause: "NEC 240.87", Example: "yes"},
		{Type: "protective_device", Key: "undervoltage_delay", Kind: KindQuantity, Dimension: "time", None: true, Title: "undervoltage delay", Note: "Delay of the undervoltage trip.", Clause: "common practice", Usual: &Range{Text: "50 ms to 20 s", Low: 0.05, High: 20}, Possible: &Range{Text: "0 s to 600 s", Low: 0, High: 600}, Example: "1 s"},
		{Type: "protective_device", Key: "maintenance_setting", Kind: KindObject, Of: "maintenance_setting", None: true, Title: "maintenance setting", Note: "Quicker setting while persons work.", Clause: "NEC 240.87"},
		{Type: "protective_device", Key: "zone_interlock", Kind: KindObject, Of: "zone_interlock", None: true, Title: "zone interlock", Note: "Blocking by downstream protection.", Clause: "NEC 240.87"},
		{Type: "protective_device", Key: "supply", Kind: KindWords, Words: theTripSupplyList, Title: "supply of the trip", Note: "Where the energy for tripping comes from.", Clause: "common practice", Example: "self-powered"},
		{Type: "protective_device", Key: "supervised", Kind: KindYesNo, Title: "supply and trip circuit supervised", Note: "Loss of supply or a broken trip circuit gives an alarm.", Clause: "common practice", Example: "yes"},
		{Type: "protective_device", Key: "current_transformer", Kind: KindObject, Of: "current_transformer", None: true, Title: "current transformer", Note: "Transformer that feeds the relay.", Clause: "IEC 61869-2"},
		{Type: "protective_device", Key: "settings_source", Kind: KindWords, Words: theSettingsSourceList, Title: "source of the settings", Note: "Study or sheet as left.", Clause: "NFPA 70E 130.5 (from memory, unconfirmed)", Example: "study"},
		{Type: "protective_device", Key: "settings_date", Kind: KindDay, Title: "date of the settings", Note: "Day they were left or proposed.", Clause: "common practice", Example: "2026-03-14"},
		{Type: "protective_device", Key: "tested", Kind: KindMonth, None: true, Title: "protection tested", Note: "Month of the last injection test.", Clause: "common practice", Example: "2026-03"},
	}},
	{name: "containment", title: "arc containment", short: "", fields: []*Field{
		{Type: "containment", Key: "class", Kind: KindWords, Words: theArcClassList, Title: "class", Note: "A B or C protect persons; I alone protects nobody outside its zones.", Clause: "IEC TR 61641:2014", Example: "I"},
		{Type: "containment", Key: "ignition_protected", Kind: KindNames, Collections: []string{"busbars", "units"}, List: true, None: true, Title: "ignition-protected zones", Note: "Parts with all live conductors insulated one by one.", Clause: "IEC TR 61641:2014", Example: "[main A]"},
		{Type: "containment", Key: "criteria", Kind: KindWords, Words: theArcCriterionList, List: true, Title: "criteria met", Note: "Criteria the test report confirms.", Clause: "IEC TR 61641:2014", Example: "[1]"},
		{Type: "containment", Key: "permissible_current", Kind: KindQuantity, Dimension: "current", Title: "permissible current under arcing", Symbol: "Ip arc", Note: "Prospective r.m.s. current of the test and never the arc's own current.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "1 kA to 150 kA", Low: 1000, High: 150000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "65 kA"},
		{Type: "containment", Key: "permissible_duration", Kind: KindQuantity, Dimension: "time", Title: "permissible arc duration", Symbol: "t arc", Note: "Time the arc may burn.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "20 ms to 1 s", Low: 0.02, High: 1}, Possible: &Range{Text: "1 ms to 10 s", Low: 0.001, High: 10}, Example: "300 ms"},
		{Type: "containment", Key: "conditional", Kind: KindObject, Of: "conditional_rating", None: true, Title: "conditional current under arcing", Symbol: "Ipc arc", Note: "Holds only with the limiting device and settings named.", Clause: "IEC TR 61641:2014"},
		{Type: "containment", Key: "depends_on", Kind: KindWords, Words: theArcMeansList, List: true, None: true, Title: "depends on", Note: "Means without which the containment does not hold.", Clause: "IEC TR 61641:2014", Example: "[detection]"},
		{Type: "containment", Key: "at_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "test voltage", Note: "Voltage of the arc test.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "200 V to 1000 V", Low: 200, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "440 V"},
		{Type: "containment", Key: "at_frequency", Kind: KindQuantity, Dimension: "frequency", Title: "test frequency", Note: "Frequency of the arc test.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "50 Hz to 60 Hz", Low: 50, High: 60}, Possible: &Range{Text: "10 Hz to 500 Hz", Low: 10, High: 500}, Example: "50 Hz"},
		{Type: "containment", Key: "sides", Kind: KindWords, Words: theArcSideList, List: true, Title: "sides protected", Note: "Sides persons may stand at.", Clause: "IEC TR 61641:2014", Example: "[front]"},
		{Type: "containment", Key: "persons", Kind: KindWords, Words: thePersonsList, Title: "persons protected", Note: "Level of access the test was made for.", Clause: "IEC TR 61641:2014", Example: "ordinary persons"},
		{Type: "containment", Key: "compartments", Kind: KindText, Title: "compartments tested", Note: "Compartments the arc was lit in.", Clause: "IEC TR 61641:2014", Example: "incomer main bars feeder and cable compartment"},
		{Type: "containment", Key: "closed_door_racking", Kind: KindYesNo, Title: "covers racking behind closed doors", Note: "The report covers moving a unit behind the secured door.", Clause: "IEC TR 61641:2014 (from memory, unconfirmed)", Example: "yes"},
		{Type: "containment", Key: "ceiling_clearance", Kind: KindQuantity, Dimension: "length", Title: "clearance to the ceiling in the test", Note: "Distance from the top of the board.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "50 mm to 5 m", Low: 0.05, High: 5}, Possible: &Range{Text: "0 mm to 30 m", Low: 0, High: 30}, Example: "500 mm"},
		{Type: "containment", Key: "rear_clearance", Kind: KindQuantity, Dimension: "length", Title: "clearance to the rear wall in the test", Note: "Distance from the rear of the board.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "10 mm to 3 m", Low: 0.01, High: 3}, Possible: &Range{Text: "0 mm to 30 m", Low: 0, High: 30}, Example: "100 mm"},
		{Type: "containment", Key: "accessibility_type", Kind: KindWords, Words: theArcResistantTypeList, None: true, Title: "accessibility type", Note: "North American practice.", Clause: "IEEE C37.20.7", Example: "type 1"},
		{Type: "containment", Key: "suffixes", Kind: KindWords, Words: theArcResistantSuffixList, List: true, Title: "suffixes", Note: "North American practice.", Clause: "IEEE C37.20.7", Example: "[A]"},
	}},
	{name: "exhaust", title: "exhaust of arc gases", short: "", fields: []*Field{
		{Type: "exhaust", Key: "kind", Kind: KindWords, Words: theExhaustKindList, Title: "kind", Note: "Way of the gases out of the board.", Clause: "IEC TR 61641:2014", Example: "no exhaust"},
		{Type: "exhaust", Key: "leaves_at", Kind: KindWords, Words: theArcSideList, List: true, Title: "leaves the board at", Note: "Sides the gases leave the board at.", Clause: "IEC TR 61641:2014", Example: "[front]"},
		{Type: "exhaust", Key: "ends", Kind: KindWords, Words: theExhaustEndList, Title: "ends", Note: "Where the gases come out at last.", Clause: "IEC TR 61641:2014", Example: "outdoors"},
		{Type: "exhaust", Key: "as_tested", Kind: KindYesNo, Title: "as tested", Note: "Exhaust on site is like the one of the test.", Clause: "IEC TR 61641:2014", Example: "yes"},
		{Type: "exhaust", Key: "ceiling_clearance", Kind: KindQuantity, Dimension: "length", Title: "clearance to the ceiling on site", Note: "Distance from the top of the board as built.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "50 mm to 5 m", Low: 0.05, High: 5}, Possible: &Range{Text: "0 mm to 30 m", Low: 0, High: 30}, Example: "900 mm"},
		{Type: "exhaust", Key: "rear_clearance", Kind: KindQuantity, Dimension: "length", Title: "clearance to the rear wall on site", Note: "Distance from the rear of the board as built.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "10 mm to 3 m", Low: 0.01, High: 3}, Possible: &Range{Text: "0 mm to 30 m", Low: 0, High: 30}, Example: "800 mm"},
		{Type: "exhaust", Key: "aisle", Kind: KindQuantity, Dimension: "length", None: true, Title: "aisle to the opposite row", Note: "Distance to a row of boards that faces this one.", Clause: "common practice", Usual: &Range{Text: "600 mm to 6 m", Low: 0.6, High: 6}, Possible: &Range{Text: "100 mm to 50 m", Low: 0.1, High: 50}, Example: "2.5 m"},
		{Type: "exhaust", Key: "room_relief", Kind: KindYesNo, Title: "pressure relief of the room", Note: "The room can bear or relieve the overpressure.", Clause: "common practice", Example: "yes"},
		{Type: "exhaust", Key: "protection_after_closing", Kind: KindProtection, Title: "protection with the flaps closed", Note: "Degree of protection after the flaps closed again.", Clause: "IEC 60529", Example: "IP42"},
	}},
	{name: "detection", title: "arc detection", short: "", fields: []*Field{
		{Type: "detection", Key: "kind", Kind: KindWords, Words: theDetectionKindList, Title: "kind", Note: "What it measures.", Clause: "IEC 60947-9-2", Example: "light"},
		{Type: "detection", Key: "time", Kind: KindQuantity, Dimension: "time", Title: "detection time", Note: "From light to the output of the relay.", Clause: "common practice", Usual: &Range{Text: "0.5 ms to 20 ms", Low: 0.0005, High: 0.02}, Possible: &Range{Text: "0.05 ms to 500 ms", Low: 5e-05, High: 0.5}, Example: "2 ms"},
		{Type: "detection", Key: "current_pickup", Kind: KindQuantity, Dimension: "current", None: true, Title: "current that confirms", Note: "Primary current that must flow as well.", Clause: "IEC 60947-9-2", Usual: &Range{Text: "50 A to 20 kA", Low: 50, High: 20000}, Possible: &Range{Text: "1 A to 100 kA", Low: 1, High: 100000}, Example: "4 kA"},
		{Type: "detection", Key: "self_supervised", Kind: KindYesNo, Title: "self-supervised", Note: "Sensors and relay watch themselves and alarm.", Clause: "common practice", Example: "yes"},
		{Type: "detection", Key: "trip_circuit_supervised", Kind: KindYesNo, Title: "trip circuits supervised", Note: "Each trip circuit is watched and alarms.", Clause: "common practice", Example: "yes"},
		{Type: "detection", Key: "supply", Kind: KindWords, Words: theTripSupplyList, Title: "supply", Note: "Where the energy comes from.", Clause: "common practice", Example: "self-powered"},
		{Type: "detection", Key: "breaker_failure_time", Kind: KindQuantity, Dimension: "time", None: true, Title: "breaker failure time", Note: "Extra time until the upstream devices are tripped.", Clause: "common practice", Usual: &Range{Text: "50 ms to 500 ms", Low: 0.05, High: 0.5}, Possible: &Range{Text: "5 ms to 5 s", Low: 0.005, High: 5}, Example: "150 ms"},
		{Type: "detection", Key: "breaker_failure_acts_on", Kind: KindNames, Collections: []string{"units", "protection"}, List: true, Title: "breaker failure acts on", Note: "Upstream devices tripped when a breaker fails.", Clause: "common practice", Example: "[TX1-HV]"},
		{Type: "detection", Key: "tested", Kind: KindMonth, None: true, Title: "light test", Note: "Month of the last test by light in place.", Clause: "common practice", Example: "2026-03"},
		{Type: "detection", Key: "test_interval", Kind: KindCount, Least: 1, Most: 240, Title: "months between light tests", Note: "Interval of the plan in months.", Clause: "common practice", Example: "24"},
		{Type: "detection", Key: "tested_in_board", Kind: KindYesNo, Title: "integration tested", Note: "Detection and breakers were tested together in this design.", Clause: "IEC TS 63107", Example: "yes"},
		{Type: "detection", Key: "out_of_service_procedure", Kind: KindText, None: true, Title: "out-of-service procedure", Note: "Instruction for the time detection is off.", Clause: "common practice", Example: "BL-SOP-21"},
		{Type: "detection", Key: "lock_out", Kind: KindYesNo, Title: "lock-out after a trip", Note: "Nothing closes again before a reset by hand.", Clause: "common practice", Example: "yes"},
	}},
	{name: "arc_zone", title: "detection zone", short: "", fields: []*Field{
		{Type: "arc_zone", Key: "covers", Kind: KindNames, Collections: []string{"sections", "units", "busbars"}, List: true, Title: "covers", Note: "Parts whose arcs the sensors of the zone see.", Clause: "common practice", Example: "[A]"},
		{Type: "arc_zone", Key: "side", Kind: KindWords, Words: theDeviceSideList, Title: "side", Note: "Side of the units covered; left out if both.", Clause: "common practice", Example: "line side"},
		{Type: "arc_zone", Key: "acts_on", Kind: KindNames, Collections: []string{"units", "protection"}, List: true, Title: "acts on", Note: "Every device that the zone trips.", Clause: "common practice", Example: "[Q1]"},
		{Type: "arc_zone", Key: "total_time", Kind: KindQuantity, Dimension: "time", Title: "total time", Note: "From the start of the arc until the slowest breaker has cleared.", Clause: "common practice", Usual: &Range{Text: "2 ms to 500 ms", Low: 0.002, High: 0.5}, Possible: &Range{Text: "0.1 ms to 5 s", Low: 0.0001, High: 5}, Example: "52 ms"},
		{Type: "arc_zone", Key: "total_time_contains", Kind: KindWords, Words: theTimePartList, List: true, Title: "total time contains", Note: "Parts of the time that are in it.", Clause: "common practice", Example: "[detection]"},
		{Type: "arc_zone", Key: "sensors", Kind: KindCount, Least: 1, Most: 500, Title: "sensors", Note: "Light sensors of the zone.", Clause: "common practice", Example: "6"},
		{Type: "arc_zone", Key: "quenched", Kind: KindYesNo, Title: "quenched", Note: "The quenching device acts for this zone.", Clause: "IEC 60947-9-1", Example: "yes"},
	}},
	{name: "quenching", title: "quenching device", short: "", fields: []*Field{
		{Type: "quenching", Key: "kind", Kind: KindWords, Words: theQuenchingKindList, Title: "kind", Note: "Whether it can be used again.", Clause: "IEC 60947-9-1:2019", Example: "single-shot"},
		{Type: "quenching", Key: "time", Kind: KindQuantity, Dimension: "time", Title: "quenching time", Note: "From light until the arc is out.", Clause: "IEC 60947-9-1:2019", Usual: &Range{Text: "0.5 ms to 20 ms", Low: 0.0005, High: 0.02}, Possible: &Range{Text: "0.05 ms to 500 ms", Low: 5e-05, High: 0.5}, Example: "1.5 ms"},
		{Type: "quenching", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", Title: "short-time withstand", Note: "Current it carries until upstream devices have cleared.", Clause: "IEC 60947-9-1:2019"},
		{Type: "quenching", Key: "peak_withstand", Kind: KindQuantity, Dimension: "current", Title: "peak current", Note: "Highest peak it makes and carries.", Clause: "IEC 60947-9-1:2019", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "143 kA"},
		{Type: "quenching", Key: "at_voltage", Kind: KindQuantity, Dimension: "voltage", Title: "rated operational voltage", Symbol: "Ue", Note: "Voltage its ratings hold for.", Clause: "IEC 60947-9-1:2019", Usual: &Range{Text: "200 V to 1000 V", Low: 200, High: 1000}, Possible: &Range{Text: "24 V to 1500 V", Low: 24, High: 1500}, Example: "690 V"},
		{Type: "quenching", Key: "sections", Kind: KindNames, Collections: []string{"sections"}, List: true, Title: "sections with a device", Note: "Sections that have a quenching device of their own.", Clause: "common practice", Example: "[A]"},
		{Type: "quenching", Key: "acts_on", Kind: KindNames, Collections: []string{"units", "protection"}, List: true, Title: "trips", Note: "Devices that clear the fault it makes.", Clause: "IEC 60947-9-1:2019", Example: "[Q1]"},
		{Type: "quenching", Key: "lock_out", Kind: KindYesNo, Title: "lock-out", Note: "Upstream devices cannot be closed on the device that has acted.", Clause: "IEC 60947-9-1:2019", Example: "yes"},
		{Type: "quenching", Key: "disabled_shown", Kind: KindYesNo, Title: "disabled state shown", Note: "Shown when it is disabled or used.", Clause: "IEC 60947-9-1:2019", Example: "yes"},
		{Type: "quenching", Key: "stored_energy_safe", Kind: KindYesNo, Title: "stored energy safe", Note: "Its charge can be made safe before work.", Clause: "IEC 60947-9-1:2019", Example: "yes"},
	}},
	{name: "arc", title: "internal arc", short: "", fields: []*Field{
		{Type: "arc", Key: "containment", Kind: KindObject, Of: "containment", None: true, Title: "containment", Note: "What the board keeps in when closed.", Clause: "IEC TR 61641:2014"},
		{Type: "arc", Key: "exhaust", Kind: KindObject, Of: "exhaust", Title: "exhaust", Note: "Way of the gases.", Clause: "IEC TR 61641:2014"},
		{Type: "arc", Key: "detection", Kind: KindObject, Of: "detection", None: true, Title: "detection", Note: "Sensors and relay that trip breakers.", Clause: "IEC 60947-9-2"},
		{Type: "arc", Key: "zones", Kind: KindCollection, Of: "arc_zone", None: true, Title: "detection zones", Note: "Zones with the devices each of them trips.", Clause: "common practice"},
		{Type: "arc", Key: "quenching", Kind: KindObject, Of: "quenching", None: true, Title: "quenching device", Note: "Device that takes over the arc current.", Clause: "IEC 60947-9-1"},
	}},
	{name: "location", title: "place of work", short: "", fields: []*Field{
		{Type: "location", Key: "at", Kind: KindNames, Collections: []string{"units", "busbars", "taps"}, Title: "at", Note: "Unit bars or tap-off that the arc is assumed at.", Clause: "common practice", Example: "Q1"},
		{Type: "location", Key: "side", Kind: KindWords, Words: theDeviceSideList, Title: "side", Note: "Side of the unit.", Clause: "IEEE 1584-2018 (from memory, unconfirmed)", Example: "line side"},
		{Type: "location", Key: "electrodes", Kind: KindWords, Words: theElectrodeArrangementList, List: true, Title: "electrode arrangements", Note: "Only to say more than the construction does; the worst counts.", Clause: "IEEE 1584-2018", Example: "[VCB]"},
		{Type: "location", Key: "electrodes_reason", Kind: KindText, Title: "reason for the electrodes", Note: "Needed where fewer are named than the construction admits.", Clause: "common practice", Example: "stabs behind an insulating barrier"},
		{Type: "location", Key: "gap", Kind: KindQuantity, Dimension: "length", Title: "gap", Symbol: "G", Note: "Distance of the conductors the arc bridges.", Clause: "IEEE 1584-2018 4.2", Usual: &Range{Text: "6.35 mm to 254 mm", Low: 0.00635, High: 0.254}, Possible: &Range{Text: "2 mm to 500 mm", Low: 0.002, High: 0.5}, Example: "32 mm"},
		{Type: "location", Key: "distance", Kind: KindQuantity, Dimension: "length", Title: "working distance", Symbol: "D", Note: "From the arc to face and chest.", Clause: "IEEE 1584-2018 4.2", Usual: &Range{Text: "300 mm to 2 m", Low: 0.3, High: 2}, Possible: &Range{Text: "100 mm to 20 m", Low: 0.1, High: 20}, Example: "610 mm"},
		{Type: "location", Key: "distance_reason", Kind: KindText, Title: "reason for the distance", Note: "Needed where it is more than 610 mm or the typical one.", Clause: "common practice", Example: "operated with a rod of 1 m"},
		{Type: "location", Key: "enclosure_height", Kind: KindQuantity, Dimension: "length", Title: "height of the compartment", Note: "Inside height around the arc.", Clause: "IEEE 1584-2018 Tables 8 to 10", Usual: &Range{Text: "100 mm to 2.5 m", Low: 0.1, High: 2.5}, Possible: &Range{Text: "20 mm to 20 m", Low: 0.02, High: 20}, Example: "600 mm"},
		{Type: "location", Key: "enclosure_width", Kind: KindQuantity, Dimension: "length", Title: "width of the compartment", Note: "Inside width around the arc.", Clause: "IEEE 1584-2018 Tables 8 to 10", Usual: &Range{Text: "100 mm to 2.5 m", Low: 0.1, High: 2.5}, Possible: &Range{Text: "20 mm to 20 m", Low: 0.02, High: 20}, Example: "600 mm"},
		{Type: "location", Key: "enclosure_depth", Kind: KindQuantity, Dimension: "length", Title: "depth of the compartment", Note: "Inside depth around the arc.", Clause: "IEEE 1584-2018 Tables 8 to 10", Usual: &Range{Text: "50 mm to 2.5 m", Low: 0.05, High: 2.5}, Possible: &Range{Text: "10 mm to 20 m", Low: 0.01, High: 20}, Example: "500 mm"},
		{Type: "location", Key: "surroundings", Kind: KindWords, Words: theArcRoomList, Title: "surroundings", Symbol: "kT", Note: "Gives the transmission factor of the box-test method.", Clause: "DGUV Information 203-077", Example: "small compartment"},
		{Type: "location", Key: "arc_current_factor", Kind: KindQuantity, Dimension: "number", Title: "arc current factor", Symbol: "kB", Note: "Arc current by smallest fault current in the box-test method.", Clause: "DGUV Information 203-077", Usual: &Range{Text: "0.3 to 1", Low: 0.3, High: 1}, Possible: &Range{Text: "0.05 to 1", Low: 0.05, High: 1}, Example: "0.5"},
		{Type: "location", Key: "arc_power_factor", Kind: KindQuantity, Dimension: "number", Title: "arc power factor", Symbol: "kP", Note: "Arc power by short-circuit power in the box-test method.", Clause: "DGUV Information 203-077", Usual: &Range{Text: "0.1 to 0.5", Low: 0.1, High: 0.5}, Possible: &Range{Text: "0.01 to 1", Low: 0.01, High: 1}, Example: "0.25"},
		{Type: "location", Key: "escape", Kind: KindWords, Words: theEscapeList, Title: "way out", Note: "The limit of 2 s holds only where it is free.", Clause: "IEEE 1584-2018 6.9.1 (from memory, unconfirmed)", Example: "free"},
		{Type: "location", Key: "cleared_by", Kind: KindNames, Collections: []string{"units", "protection"}, List: true, Title: "cleared only by", Note: "Restricts the devices found on the way to the sources.", Clause: "common practice", Example: "[TX1-HV]"},
		{Type: "location", Key: "others", Kind: KindWords, Words: theOthersKeptOutList, Title: "other persons", Note: "How others are kept outside the boundary.", Clause: "NFPA 70E 130.4", Example: "barriered off"},
	}},
	{name: "arc_rating", title: "arc rating", short: "value", fields: []*Field{
		{Type: "arc_rating", Key: "value", Kind: KindQuantity, Dimension: "incident_energy", Title: "arc rating", Note: "Lowest rating in the whole ensemble.", Clause: "IEC 61482-1-1", Usual: &Range{Text: "1.2 cal/cm2 to 150 cal/cm2", Low: 50208, High: 6.276e+06}, Possible: &Range{Text: "0.1 cal/cm2 to 500 cal/cm2", Low: 4184, High: 2.092e+07}, Example: "40 cal/cm2"},
		{Type: "arc_rating", Key: "kind", Kind: KindWords, Words: theArcRatingKindList, Title: "kind of rating", Note: "How the rating was found.", Clause: "IEC 61482-1-1", Example: "ATPV"},
	}},
	{name: "ppe", title: "protective equipment", short: "", fields: []*Field{
		{Type: "ppe", Key: "method", Kind: KindWords, Words: thePPEMethodList, Title: "method", Note: "One method for one board.", Clause: "NFPA 70E 130.5(F)", Example: "incident energy"},
		{Type: "ppe", Key: "arc_rating", Kind: KindObject, Of: "arc_rating", Title: "arc rating", Note: "Of the clothing as worn.", Clause: "IEC 61482-1-1"},
		{Type: "ppe", Key: "apc", Kind: KindCount, Least: 1, Most: 2, Title: "arc protection class", Symbol: "APC", Note: "Class of the box test.", Clause: "IEC 61482-1-2:2014", Example: "2"},
		{Type: "ppe", Key: "category", Kind: KindCount, Least: 1, Most: 4, Title: "PPE category", Note: "North American category method.", Clause: "NFPA 70E 130.7(C)(15)", Example: "2"},
		{Type: "ppe", Key: "gloves", Kind: KindWords, Words: theGloveClassList, None: true, Title: "insulating gloves", Note: "Class of the gloves under leather protectors.", Clause: "IEC 60903; ASTM D120", Example: "class 00"},
		{Type: "ppe", Key: "head", Kind: KindWords, Words: theHeadProtectionList, None: true, Title: "head and face", Note: "Protection of head and face.", Clause: "NFPA 70E 130.7(C) (from memory, unconfirmed)", Example: "face shield"},
		{Type: "ppe", Key: "whole_body", Kind: KindYesNo, Title: "whole body", Note: "Face neck hands and feet are covered to the same rating.", Clause: "common practice", Example: "yes"},
		{Type: "ppe", Key: "hearing", Kind: KindYesNo, Title: "hearing protection", Note: "Worn in the ear canal.", Clause: "NFPA 70E 130.7(C) (from memory, unconfirmed)", Example: "yes"},
	}},
	{name: "task", title: "task", short: "", fields: []*Field{
		{Type: "task", Key: "at", Kind: KindNames, Collections: []string{"units", "busbars", "taps", "work.locations"}, Title: "at", Note: "Unit bars tap-off or place of work.", Clause: "common practice", Example: "Q1"},
		{Type: "task", Key: "side", Kind: KindWords, Words: theDeviceSideList, Title: "side", Note: "Side of the unit; left out if both.", Clause: "common practice", Example: "line side"},
		{Type: "task", Key: "kind", Kind: KindWords, Words: theTaskKindList, Title: "kind of task", Note: "What is done.", Clause: "common practice", Example: "operating"},
		{Type: "task", Key: "doors", Kind: KindWords, Words: theTaskDoorsList, Title: "doors", Note: "State of the doors during the task.", Clause: "IEC TR 61641:2014", Example: "open"},
		{Type: "task", Key: "parts", Kind: KindWords, Words: theTaskPartsList, Title: "state of the parts", Note: "Whether voltage is there.", Clause: "EN 50110-1", Example: "live"},
		{Type: "task", Key: "distance", Kind: KindQuantity, Dimension: "length", Title: "shortest working distance", Symbol: "a", Note: "From the arc to the torso in this task.", Clause: "DGUV Information 203-077", Usual: &Range{Text: "200 mm to 3 m", Low: 0.2, High: 3}, Possible: &Range{Text: "50 mm to 50 m", Low: 0.05, High: 50}, Example: "455 mm"},
		{Type: "task", Key: "remote", Kind: KindYesNo, Title: "done remotely", Note: "Nobody stands at the board.", Clause: "common practice", Example: "yes"},
		{Type: "task", Key: "with_maintenance_setting", Kind: KindYesNo, Title: "with the maintenance setting", Note: "The quicker setting is on during the task.", Clause: "NEC 240.87", Example: "yes"},
		{Type: "task", Key: "with_detection", Kind: KindYesNo, Title: "with detection in service", Note: "The task is forbidden while detection is off.", Clause: "common practice", Example: "yes"},
		{Type: "task", Key: "ppe", Kind: KindObject, Of: "ppe", None: true, Title: "protective equipment", Note: "What is worn.", Clause: "NFPA 70E 130.5(G) (from memory, unconfirmed)"},
		{Type: "task", Key: "by", Kind: KindWords, Words: thePersonsList, Title: "by", Note: "Least competence of the person.", Clause: "EN 50110-1", Example: "ordinary persons"},
		{Type: "task", Key: "second_person", Kind: KindYesNo, Title: "second person", Note: "A second person is present who can help.", Clause: "EN 50110-1", Example: "yes"},
		{Type: "task", Key: "reason", Kind: KindText, None: true, Title: "reason for live work", Note: "Why it cannot be done dead.", Clause: "NFPA 70E 130.2 (from memory, unconfirmed)", Example: "proving dead cannot be done otherwise"},
		{Type: "task", Key: "instruction", Kind: KindText, Title: "instruction", Note: "Procedure that is followed.", Clause: "common practice", Example: "BL-SOP-09"},
	}},
	{name: "isolation", title: "isolation", short: "", fields: []*Field{
		{Type: "isolation", Key: "lockable", Kind: KindYesNo, Title: "lockable", Note: "Every source can be isolated and locked.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "isolation", Key: "sources_named", Kind: KindYesNo, Title: "every source named", Note: "The procedure names auxiliary and back-feeding sources as well.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "isolation", Key: "key_exchange_upstream", Kind: KindYesNo, Title: "key exchange upstream", Note: "Line side of the incomers is locked at high voltage by key.", Clause: "common practice", Example: "yes"},
		{Type: "isolation", Key: "test_points", Kind: KindYesNo, Title: "test points", Note: "Absence of voltage can be proved without opening live covers.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "isolation", Key: "tester_proved", Kind: KindYesNo, Title: "tester proved before and after", Note: "The tester is proved on a known source.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "isolation", Key: "earthing_points", Kind: KindObject, Of: "short_time_withstand", None: true, Title: "earthing points", Note: "Rating of the points or switch for earthing and short-circuiting.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)"},
		{Type: "isolation", Key: "neutral_isolated", Kind: KindYesNo, Title: "neutral isolated", Note: "The neutral is opened together with the phases.", Clause: "common practice", Example: "yes"},
		{Type: "isolation", Key: "discharge_time", Kind: KindQuantity, Dimension: "time", None: true, Title: "discharge time", Note: "Until stored energy in the board is gone.", Clause: "common practice", Usual: &Range{Text: "5 s to 20 min", Low: 5, High: 1200}, Possible: &Range{Text: "100 ms to 2 h", Low: 0.1, High: 7200}, Example: "5 min"},
		{Type: "isolation", Key: "procedure", Kind: KindText, None: true, Title: "procedure", Note: "Written procedure of isolation.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)", Example: "BL-SOP-14"},
	}},
	{name: "labels", title: "labels", short: "", fields: []*Field{
		{Type: "labels", Key: "voltage", Kind: KindYesNo, Title: "voltage", Note: "Nominal voltage is on the label.", Clause: "NFPA 70E 130.5(H)", Example: "yes"},
		{Type: "labels", Key: "boundary", Kind: KindYesNo, Title: "boundary", Note: "Arc-flash boundary is on the label.", Clause: "NFPA 70E 130.5(H)", Example: "yes"},
		{Type: "labels", Key: "energy", Kind: KindYesNo, Title: "energy", Note: "Incident energy is on the label.", Clause: "NFPA 70E 130.5(H)", Example: "yes"},
		{Type: "labels", Key: "working_distance", Kind: KindYesNo, Title: "working distance", Note: "Distance the energy holds for.", Clause: "NFPA 70E 130.5(H)", Example: "yes"},
		{Type: "labels", Key: "category", Kind: KindYesNo, Title: "PPE category", Note: "Never together with the energy.", Clause: "NFPA 70E 130.5(H)", Example: "yes"},
		{Type: "labels", Key: "clothing", Kind: KindYesNo, Title: "least arc rating or site level", Note: "Least rating of clothing or level of the site.", Clause: "NFPA 70E 130.5(H)", Example: "yes"},
		{Type: "labels", Key: "supply_state", Kind: KindYesNo, Title: "supply state", Note: "State of supply the label holds for.", Clause: "common practice", Example: "yes"},
		{Type: "labels", Key: "both_sides", Kind: KindYesNo, Title: "both sides of devices", Note: "Line and load side have their own figures.", Clause: "common practice", Example: "yes"},
		{Type: "labels", Key: "live_parts", Kind: KindYesNo, Title: "parts that stay live", Note: "Units live with the incomers open are marked.", Clause: "common practice", Example: "yes"},
		{Type: "labels", Key: "date", Kind: KindDay, Title: "date", Note: "Day of the study on the label.", Clause: "NEC 110.16(B) (from memory, unconfirmed)", Example: "2026-03-14"},
	}},
	{name: "gangway", title: "gangway", short: "", fields: []*Field{
		{Type: "gangway", Key: "width", Kind: KindQuantity, Dimension: "length", Title: "width", Note: "Between board and wall or opposite board.", Clause: "IEC 60364-7-729", Usual: &Range{Text: "500 mm to 10 m", Low: 0.5, High: 10}, Possible: &Range{Text: "100 mm to 100 m", Low: 0.1, High: 100}, Example: "1000 mm"},
		{Type: "gangway", Key: "free_with_door_open", Kind: KindQuantity, Dimension: "length", Title: "free passage with a door open", Note: "Also with a unit drawn out.", Clause: "IEC 60364-7-729", Usual: &Range{Text: "100 mm to 10 m", Low: 0.1, High: 10}, Possible: &Range{Text: "0 mm to 100 m", Low: 0, High: 100}, Example: "600 mm"},
		{Type: "gangway", Key: "height", Kind: KindQuantity, Dimension: "length", Title: "height", Note: "Clear height.", Clause: "IEC 60364-7-729", Usual: &Range{Text: "1.5 m to 10 m", Low: 1.5, High: 10}, Possible: &Range{Text: "500 mm to 100 m", Low: 0.5, High: 100}, Example: "2200 mm"},
		{Type: "gangway", Key: "length", Kind: KindQuantity, Dimension: "length", Title: "length", Note: "Along the board to the exit.", Clause: "IEC 60364-7-729", Usual: &Range{Text: "500 mm to 100 m", Low: 0.5, High: 100}, Possible: &Range{Text: "100 mm to 1000 m", Low: 0.1, High: 1000}, Example: "14 m"},
		{Type: "gangway", Key: "exits", Kind: KindCount, Least: 0, Most: 20, Title: "exits", Note: "Exits at different ends.", Clause: "IEC 60364-7-729; NEC 110.26", Example: "2"},
		{Type: "gangway", Key: "exit_width", Kind: KindQuantity, Dimension: "length", Title: "width of the exit door", Note: "Clear width.", Clause: "IEC 60364-7-729", Usual: &Range{Text: "500 mm to 6 m", Low: 0.5, High: 6}, Possible: &Range{Text: "100 mm to 30 m", Low: 0.1, High: 30}, Example: "900 mm"},
		{Type: "gangway", Key: "exit_height", Kind: KindQuantity, Dimension: "length", Title: "height of the exit door", Note: "Clear height.", Clause: "IEC 60364-7-729", Usual: &Range{Text: "1.5 m to 6 m", Low: 1.5, High: 6}, Possible: &Range{Text: "500 mm to 30 m", Low: 0.5, High: 30}, Example: "2100 mm"},
		{Type: "gangway", Key: "exit_opens_outwards", Kind: KindYesNo, Title: "exit opens outwards", Note: "Opens in the direction of escape without a key.", Clause: "IEC 60364-7-729", Example: "yes"},
		{Type: "gangway", Key: "doors", Kind: KindWords, Words: theDoorSwingList, Title: "swing of the board doors", Note: "How open doors of the board stand to the way out.", Clause: "IEC 60364-7-729", Example: "closes with escape"},
		{Type: "gangway", Key: "door_angle", Kind: KindCount, Least: 0, Most: 270, Title: "opening angle of the doors", Note: "In degrees.", Clause: "IEC 60364-7-729", Example: "120"},
		{Type: "gangway", Key: "opposite", Kind: KindWords, Words: theGangwayOppositeList, Title: "opposite the board", Note: "Condition 1 2 or 3 of the working space.", Clause: "NEC 110.26(A)(1)", Example: "nothing live or earthed"},
		{Type: "gangway", Key: "at_rear", Kind: KindYesNo, Title: "also at the rear", Note: "The rear is used for work and has these measures as well.", Clause: "common practice", Example: "yes"},
	}},
	{name: "study", title: "arc and protection study", short: "", fields: []*Field{
		{Type: "study", Key: "document", Kind: KindNames, Collections: []string{"documents"}, Title: "document", Note: "Document that holds the study.", Clause: "NFPA 70E 130.5", Example: "D1"},
		{Type: "study", Key: "date", Kind: KindDay, Title: "date", Note: "Day of the study.", Clause: "NFPA 70E 130.5", Example: "2026-03-14"},
		{Type: "study", Key: "reviewed", Kind: KindDay, None: true, Title: "last review", Note: "Day it was found still valid.", Clause: "NFPA 70E 130.5", Example: "2026-03-14"},
		{Type: "study", Key: "network_data", Kind: KindDay, Title: "date of the network data", Note: "Day of the operator's fault levels.", Clause: "common practice", Example: "2026-03-14"},
		{Type: "study", Key: "settings_as_left", Kind: KindYesNo, Title: "made for the settings as left", Note: "Settings at the devices agree with the study.", Clause: "common practice", Example: "yes"},
		{Type: "study", Key: "changed_since", Kind: KindText, None: true, Title: "changes since", Note: "Changes of network or board after the study.", Clause: "common practice", Example: "seventh pump added"},
	}},
	{name: "training", title: "competence and training", short: "", fields: []*Field{
		{Type: "training", Key: "persons", Kind: KindWords, Words: thePersonsList, Title: "competence of those who work", Note: "Least competence of those who open doors.", Clause: "EN 50110-1", Example: "ordinary persons"},
		{Type: "training", Key: "person_in_charge", Kind: KindYesNo, Title: "person in charge named", Note: "One person is in charge of the work.", Clause: "EN 50110-1", Example: "yes"},
		{Type: "training", Key: "permit_by_other", Kind: KindYesNo, Title: "permit given by another person", Note: "Nobody signs the permit for own work.", Clause: "EN 50110-1", Example: "yes"},
		{Type: "training", Key: "refreshed", Kind: KindMonth, None: true, Title: "last training", Note: "Month of the last training at this board.", Clause: "common practice", Example: "2026-03"},
		{Type: "training", Key: "interval", Kind: KindCount, Least: 1, Most: 120, Title: "months between trainings", Note: "Interval of the plan in months.", Clause: "common practice", Example: "36"},
		{Type: "training", Key: "rescue", Kind: KindText, None: true, Title: "rescue plan", Note: "Plan for rescue and first aid.", Clause: "common practice", Example: "BL-SOP-30"},
		{Type: "training", Key: "first_aid", Kind: KindYesNo, Title: "first aid trained", Note: "The second person is trained in first aid.", Clause: "common practice", Example: "yes"},
	}},
	{name: "maintenance", title: "maintenance", short: "", fields: []*Field{
		{Type: "maintenance", Key: "plan", Kind: KindText, None: true, Title: "maintenance plan", Note: "Document with the intervals.", Clause: "NFPA 70E 205 (from memory, unconfirmed)", Example: "BL-MP-03"},
		{Type: "maintenance", Key: "last", Kind: KindMonth, None: true, Title: "last maintenance", Note: "Month of the last maintenance with the board dead.", Clause: "common practice", Example: "2026-03"},
		{Type: "maintenance", Key: "torque_marks", Kind: KindYesNo, Title: "torque marks recorded", Note: "Joints are marked and recorded.", Clause: "common practice", Example: "yes"},
		{Type: "maintenance", Key: "thermography", Kind: KindWords, Words: theThermographyList, Title: "thermography", Note: "How hot joints are found.", Clause: "common practice", Example: "no thermography"},
		{Type: "maintenance", Key: "contact_resistance_recorded", Kind: KindYesNo, Title: "contact resistance recorded", Note: "Trend of the plug contacts and joints is kept.", Clause: "common practice", Example: "yes"},
		{Type: "maintenance", Key: "insulation_recorded", Kind: KindYesNo, Title: "insulation resistance recorded", Note: "Trend is kept.", Clause: "common practice", Example: "yes"},
		{Type: "maintenance", Key: "breakers_exercised_every", Kind: KindCount, Least: 1, Most: 240, Title: "months between operations of breakers", Note: "Breakers are opened and closed.", Clause: "common practice", Example: "12"},
		{Type: "maintenance", Key: "injection_every", Kind: KindCount, Least: 1, Most: 240, Title: "months between injection tests", Note: "Primary injection of releases and relays.", Clause: "common practice", Example: "60"},
		{Type: "maintenance", Key: "spare_proved", Kind: KindYesNo, Title: "spare unit proved in its place", Note: "Spare withdrawable units were tried in the board.", Clause: "common practice", Example: "yes"},
		{Type: "maintenance", Key: "releases_supported", Kind: KindYesNo, Title: "releases still supported", Note: "The maker still supplies and repairs them.", Clause: "common practice", Example: "yes"},
	}},
	{name: "work", title: "work at the board", short: "", fields: []*Field{
		{Type: "work", Key: "with_doors_open_under_voltage", Kind: KindYesNo, Title: "authorised work under voltage agreed", Note: "Work or inspection with doors open and parts live has been agreed between owner and manufacturer.", Clause: "IEC 61439-1 8.4.6.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "work", Key: "locations", Kind: KindCollection, Of: "location", None: true, Title: "places of work", Note: "Bars and both sides of every device count anyway; say more here.", Clause: "IEEE 1584-2018"},
		{Type: "work", Key: "tasks", Kind: KindCollection, Of: "task", None: true, Title: "tasks", Note: "What persons do at the board.", Clause: "EN 50110-1"},
		{Type: "work", Key: "isolation", Kind: KindObject, Of: "isolation", Title: "isolation", Note: "How the board is made dead.", Clause: "EN 50110-1 6.2 (from memory, unconfirmed)"},
		{Type: "work", Key: "permit_for_live_work", Kind: KindYesNo, Title: "permit for live work", Note: "Live work is done under a written permit only.", Clause: "NFPA 70E 130.2 (from memory, unconfirmed)", Example: "yes"},
		{Type: "work", Key: "emergency_trip", Kind: KindText, None: true, Title: "emergency trip", Note: "Where all sources can be tripped from outside the boundary.", Clause: "common practice", Example: "push-button outside the door"},
		{Type: "work", Key: "instructions", Kind: KindText, None: true, Title: "operating and emergency instructions", Note: "Document with the instructions.", Clause: "IEC 61439-1 6.2 (from memory, unconfirmed)", Example: "BL-SOP-01"},
		{Type: "work", Key: "labels", Kind: KindObject, Of: "labels", None: true, Title: "labels", Note: "Warning labels at the board.", Clause: "NFPA 70E 130.5(H)"},
		{Type: "work", Key: "gangway", Kind: KindObject, Of: "gangway", Title: "gangway", Note: "Room in front of the board.", Clause: "IEC 60364-7-729"},
		{Type: "work", Key: "study", Kind: KindObject, Of: "study", None: true, Title: "study", Note: "Study of arc energy and protection.", Clause: "NFPA 70E 130.5"},
		{Type: "work", Key: "maintenance", Kind: KindObject, Of: "maintenance", None: true, Title: "maintenance", Note: "Upkeep of joints contacts and protection.", Clause: "NFPA 70E 205 (from memory, unconfirmed)"},
		{Type: "work", Key: "training", Kind: KindObject, Of: "training", None: true, Title: "training", Note: "Competence of those who work.", Clause: "EN 50110-1"},
	}},
	{name: "evidence_values", title: "values shown by evidence", short: "", fields: []*Field{
		{Type: "evidence_values", Key: "short_time_withstand", Kind: KindObject, Of: "short_time_withstand", Title: "short-time withstand current", Note: "As tested.", Clause: "IEC 61439-1 10.11"},
		{Type: "evidence_values", Key: "peak", Kind: KindQuantity, Dimension: "current", Title: "peak current", Symbol: "Ipk", Note: "Highest peak reached in the test.", Clause: "IEC 61439-1 10.11", Usual: &Range{Text: "1.5 kA to 330 kA", Low: 1500, High: 330000}, Possible: &Range{Text: "100 A to 1000 kA", Low: 100, High: 1e+06}, Example: "143 kA"},
		{Type: "evidence_values", Key: "conditional_rating", Kind: KindObject, Of: "conditional_rating", Title: "conditional current", Note: "As tested with the limiting device.", Clause: "IEC 61439-1 10.11"},
		{Type: "evidence_values", Key: "rated_current", Kind: KindQuantity, Dimension: "current", Title: "current of the heating test", Note: "Current the limits of temperature rise were met at.", Clause: "IEC 61439-1 10.10", Usual: &Range{Text: "8 A to 7 kA", Low: 8, High: 7000}, Possible: &Range{Text: "0.1 A to 30 kA", Low: 0.1, High: 30000}, Example: "2500 A"},
		{Type: "evidence_values", Key: "ambient", Kind: KindQuantity, Dimension: "temperature", Title: "air in the heating test", Note: "Air outside the board in the test.", Clause: "IEC 61439-1 10.10", Usual: &Range{Text: "10 °C to 60 °C", Low: 10, High: 60}, Possible: &Range{Text: "-30 °C to 100 °C", Low: -30, High: 100}, Example: "35 °C"},
		{Type: "evidence_values", Key: "voltage", Kind: KindQuantity, Dimension: "voltage", Title: "voltage", Note: "Voltage of the test.", Clause: "IEC 61439-1 10.9", Usual: &Range{Text: "200 V to 5 kV", Low: 200, High: 5000}, Possible: &Range{Text: "24 V to 20 kV", Low: 24, High: 20000}, Example: "420 V"},
		{Type: "evidence_values", Key: "frequency", Kind: KindQuantity, Dimension: "frequency", Title: "frequency", Note: "Frequency of the test.", Clause: "common practice", Usual: &Range{Text: "50 Hz to 60 Hz", Low: 50, High: 60}, Possible: &Range{Text: "10 Hz to 500 Hz", Low: 10, High: 500}, Example: "50 Hz"},
		{Type: "evidence_values", Key: "impulse", Kind: KindQuantity, Dimension: "voltage", Title: "impulse voltage", Symbol: "Uimp", Note: "Rated impulse withstand voltage that was shown.", Clause: "IEC 61439-1 10.9.3", Usual: &Range{Text: "2.5 kV to 12 kV", Low: 2500, High: 12000}, Possible: &Range{Text: "330 V to 40 kV", Low: 330, High: 40000}, Example: "12 kV"},
		{Type: "evidence_values", Key: "protection", Kind: KindProtection, Title: "degree of protection", Note: "IP code that was shown.", Clause: "IEC 61439-1 10.3", Example: "IP42"},
		{Type: "evidence_values", Key: "support_span", Kind: KindQuantity, Dimension: "length", Title: "distance of supports", Note: "As in the tested sample.", Clause: "IEC 61439-1 10.11", Usual: &Range{Text: "60 mm to 1.5 m", Low: 0.06, High: 1.5}, Possible: &Range{Text: "20 mm to 5 m", Low: 0.02, High: 5}, Example: "450 mm"},
		{Type: "evidence_values", Key: "limiting_device", Kind: KindText, Title: "limiting device", Note: "Make series and setting in the test.", Clause: "IEC 61439-1 10.11", Example: "630 A breaker series X at 10 x"},
		{Type: "evidence_values", Key: "permissible_current", Kind: KindQuantity, Dimension: "current", Title: "permissible current under arcing", Symbol: "Ip arc", Note: "Prospective r.m.s. current of the arc test.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "1 kA to 150 kA", Low: 1000, High: 150000}, Possible: &Range{Text: "100 A to 400 kA", Low: 100, High: 400000}, Example: "65 kA"},
		{Type: "evidence_values", Key: "permissible_duration", Kind: KindQuantity, Dimension: "time", Title: "permissible arc duration", Symbol: "t arc", Note: "Duration of the arc test.", Clause: "IEC TR 61641:2014", Usual: &Range{Text: "20 ms to 1 s", Low: 0.02, High: 1}, Possible: &Range{Text: "1 ms to 10 s", Low: 0.001, High: 10}, Example: "300 ms"},
	}},
	{name: "evidence_item", title: "piece of evidence", short: "", fields: []*Field{
		{Type: "evidence_item", Key: "shows", Kind: KindWords, Words: theVerificationList, Title: "shows", Note: "Characteristic that it shows.", Clause: "IEC 61439-1 clause 10", Example: "strength of materials"},
		{Type: "evidence_item", Key: "of", Kind: KindNames, Collections: []string{"busbars", "units", "taps"}, List: true, Title: "of", Note: "Circuits it holds for; for the whole board name all bars.", Clause: "common practice", Example: "[main A]"},
		{Type: "evidence_item", Key: "conductors", Kind: KindWords, Words: theCircuitConductorsList, List: true, Title: "conductors", Note: "Conductors of the circuit it holds for.", Clause: "common practice", Example: "[phases]"},
		{Type: "evidence_item", Key: "by", Kind: KindWords, Words: theEvidenceMeansList, Title: "by", Note: "Means by which it shows.", Clause: "IEC 61439-1 Annex D (from memory, unconfirmed)", Example: "declaration"},
		{Type: "evidence_item", Key: "document", Kind: KindText, Title: "number of the report", Note: "Number of report or certificate.", Clause: "common practice", Example: "TR-0419"},
		{Type: "evidence_item", Key: "issued", Kind: KindDay, Title: "issued", Note: "Day of issue.", Clause: "common practice", Example: "2026-03-14"},
		{Type: "evidence_item", Key: "valid_until", Kind: KindDay, None: true, Title: "valid until", Note: "Day the certificate ends.", Clause: "common practice", Example: "2026-03-14"},
		{Type: "evidence_item", Key: "edition", Kind: KindText, Title: "edition", Note: "Standard and edition it was made to.", Clause: "common practice", Example: "IEC 61439-2:2020"},
		{Type: "evidence_item", Key: "laboratory", Kind: KindWords, Words: theLaboratoryKindList, Title: "laboratory", Note: "Standing of the laboratory.", Clause: "ISO/IEC 17025", Example: "not said in the report"},
		{Type: "evidence_item", Key: "accreditation", Kind: KindText, None: true, Title: "accreditation", Note: "Body and number of the accreditation.", Clause: "ISO/IEC 17025", Example: "body X no 123"},
		{Type: "evidence_item", Key: "reference_design", Kind: KindText, Title: "tested reference", Note: "Report of the tested design that is compared with.", Clause: "IEC 61439-1 10.11", Example: "TR-0488"},
		{Type: "evidence_item", Key: "this_variant", Kind: KindYesNo, Title: "covers this variant", Note: "It names the assembly as built and not a series or a device alone.", Clause: "common practice", Example: "yes"},
		{Type: "evidence_item", Key: "values", Kind: KindObject, Of: "evidence_values", Title: "values", Note: "Values that it shows.", Clause: "common practice"},
	}},
}
