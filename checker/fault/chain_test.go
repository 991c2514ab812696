package fault_test

import (
	"boardproof/checker/fault"
	"boardproof/checker/units"
)

// The data of the test files, and the chains of functions that turn them into impedances.

type networkData struct {
	KV     float64 `yaml:"kv"`
	MaxMVA float64 `yaml:"max_mva"`
	MinMVA float64 `yaml:"min_mva"`
	RXMax  float64 `yaml:"rx_max"`
	RXMin  float64 `yaml:"rx_min"`
	C      float64 `yaml:"c"`
	IkKA   float64 `yaml:"ik_ka"`
}

type transformerData struct {
	Count     int     `yaml:"count"`
	KVA       float64 `yaml:"kva"`
	HighKV    float64 `yaml:"high_kv"`
	LowKV     float64 `yaml:"low_kv"`
	UkPercent float64 `yaml:"uk_percent"`
	UrPercent float64 `yaml:"ur_percent"`
	LossW     float64 `yaml:"load_loss_w"`
	Uk0       float64 `yaml:"uk0_percent"`
	Ur0       float64 `yaml:"ur0_percent"`
	R0        float64 `yaml:"r0_r1"`
	X0        float64 `yaml:"x0_x1"`
}

func (d transformerData) rated() units.Volt        { return units.Volt(d.LowKV * 1e3) }
func (d transformerData) rating() units.VoltAmpere { return units.VoltAmpere(d.KVA * 1e3) }
func (d transformerData) ratio() units.Ratio {
	return must(fault.TransformationRatio(fault.RatedVoltages{High: units.Volt(d.HighKV * 1e3), Low: d.rated()}))
}

type cableData struct {
	LengthM  float64 `yaml:"length_m"`
	R20      float64 `yaml:"r20"`
	X        float64 `yaml:"x"`
	Parallel float64 `yaml:"parallel"`
	End      float64 `yaml:"end_temperature"`
	R0       float64 `yaml:"r0_r1"`
	X0       float64 `yaml:"x0_x1"`
}

type motorData struct {
	KW         float64 `yaml:"kw"`
	KV         float64 `yaml:"kv"`
	Efficiency float64 `yaml:"efficiency"`
	CosPhi     float64 `yaml:"cos_phi"`
	Starting   float64 `yaml:"starting"`
	RX         float64 `yaml:"rx"`
	Count      float64 `yaml:"count"`
}

// feeder is the network as seen through a transformation ratio.
func feeder(z units.Ohm, rx units.Ratio, ratio units.Ratio) fault.Impedance {
	x := must(fault.FeederReactance(z, rx))
	return fault.Impedance{
		Resistance: must(fault.ReferredResistance(must(fault.FeederResistance(x, rx)), ratio)),
		Reactance:  must(fault.ReferredReactance(x, ratio)),
	}
}

func feederUnstated(z units.Ohm, ratio units.Ratio) fault.Impedance {
	x := must(fault.FeederReactanceUnstated(z))
	return fault.Impedance{
		Resistance: must(fault.ReferredResistance(must(fault.FeederResistance(x, fault.FeederROverXUnstated)), ratio)),
		Reactance:  must(fault.ReferredReactance(x, ratio)),
	}
}

func (d networkData) largest(ratio units.Ratio) fault.Impedance {
	volt := units.Volt(d.KV * 1e3)
	c := must(fault.FeederVoltageFactorMax(volt))
	return feeder(must(fault.FeederImpedanceFromPower(c, volt, units.VoltAmpere(d.MaxMVA*1e6))), units.Ratio(d.RXMax), ratio)
}

func (d networkData) smallest(ratio units.Ratio) fault.Impedance {
	volt := units.Volt(d.KV * 1e3)
	c := must(fault.FeederVoltageFactorMin(volt))
	return feeder(must(fault.FeederImpedanceFromPower(c, volt, units.VoltAmpere(d.MinMVA*1e6))), units.Ratio(d.RXMin), ratio)
}

// plain is a transformer without correction.
func (d transformerData) plain() fault.Impedance {
	z := must(fault.TransformerImpedance(units.Percentage(d.UkPercent/100), d.rated(), d.rating()))
	r := must(fault.TransformerResistanceFromLoss(units.Watt(d.LossW), d.rated(), d.rating()))
	if d.UrPercent > 0 {
		r = must(fault.TransformerResistanceFromShare(units.Percentage(d.UrPercent/100), d.rated(), d.rating()))
	}
	return fault.Impedance{Resistance: r, Reactance: must(fault.TransformerReactance(fault.TransformerParts{Impedance: z, Resistance: r}))}
}

func (d transformerData) correction(c units.Ratio) units.Ratio {
	return must(fault.TransformerCorrection(c, must(fault.RelativeReactance(d.plain().Reactance, d.rating(), d.rated()))))
}

// corrected is a transformer times K_T.
func (d transformerData) corrected(c units.Ratio) fault.Impedance {
	z, k := d.plain(), d.correction(c)
	return fault.Impedance{Resistance: must(fault.CorrectedResistance(k, z.Resistance)), Reactance: must(fault.CorrectedReactance(k, z.Reactance))}
}

func (d cableData) at(temperature units.Celsius) fault.Impedance {
	if d.LengthM == 0 {
		return fault.Impedance{}
	}
	r := must(fault.LineResistance(units.OhmPerMetre(d.R20*1e-3), units.Metre(d.LengthM), units.Ratio(d.Parallel)))
	return fault.Impedance{
		Resistance: must(fault.ResistanceAtTemperature(r, temperature)),
		Reactance:  must(fault.LineReactance(units.OhmPerMetre(d.X*1e-3), units.Metre(d.LengthM), units.Ratio(d.Parallel))),
	}
}

func (d motorData) impedance() fault.Impedance {
	volt := units.Volt(d.KV * 1e3)
	power := must(fault.MotorApparentPower(units.Watt(d.KW*1e3), fault.MotorRating{Efficiency: units.Ratio(d.Efficiency), PowerFactor: units.Ratio(d.CosPhi)}))
	current := must(fault.RatedCurrent(power, volt)) * units.Ampere(max(1, d.Count))
	z := must(fault.MotorImpedance(volt, units.Multiple(d.Starting), current))
	x := must(fault.MotorReactance(z, units.Ratio(d.RX)))
	return fault.Impedance{Resistance: must(fault.MotorResistance(x, units.Ratio(d.RX))), Reactance: x}
}

func series(parts ...fault.Impedance) fault.Impedance {
	var r, x []units.Ohm
	for _, p := range parts {
		r, x = append(r, p.Resistance), append(x, p.Reactance)
	}
	return fault.Impedance{Resistance: must(fault.SeriesOhms(r...)), Reactance: must(fault.SeriesOhms(x...))}
}

func parallel(branches ...fault.Impedance) fault.Impedance {
	return fault.Impedance{Resistance: must(fault.ParallelResistance(branches...)), Reactance: must(fault.ParallelReactance(branches...))}
}

func zeroSequence(z fault.Impedance, r, x float64) fault.Impedance {
	return fault.Impedance{
		Resistance: must(fault.ZeroSequenceResistance(z.Resistance, units.Ratio(r))),
		Reactance:  must(fault.ZeroSequenceReactance(z.Reactance, units.Ratio(x))),
	}
}

func peak(z fault.Impedance, initial units.Ampere) units.Ampere {
	return must(fault.PeakCurrent(must(fault.PeakFactor(must(fault.ROverX(z)))), initial))
}
