package fault_test

import (
	"errors"
	"go/ast"
	"go/parser"
	"go/token"
	"math"
	"os"
	"reflect"
	"regexp"
	"slices"
	"strings"
	"testing"

	"pgregory.net/rapid"

	"boardproof/checker/fault"
	"boardproof/checker/units"
	"boardproof/checker/working"
)

// entries pairs every formula with its function.
var entries = []struct {
	formula  *working.Formula
	function any
}{
	{&fault.VoltageFactorMaxFormula, fault.VoltageFactorMax},
	{&fault.VoltageFactorMinFormula, fault.VoltageFactorMin},
	{&fault.VoltageFactorMin2001Formula, fault.VoltageFactorMin2001},
	{&fault.FeederVoltageFactorMaxFormula, fault.FeederVoltageFactorMax},
	{&fault.FeederVoltageFactorMinFormula, fault.FeederVoltageFactorMin},
	{&fault.MagnitudeFormula, fault.Magnitude},
	{&fault.ROverXFormula, fault.ROverX},
	{&fault.FeederImpedanceFromPowerFormula, fault.FeederImpedanceFromPower},
	{&fault.FeederImpedanceFromCurrentFormula, fault.FeederImpedanceFromCurrent},
	{&fault.FeederReactanceFormula, fault.FeederReactance},
	{&fault.FeederResistanceFormula, fault.FeederResistance},
	{&fault.FeederReactanceUnstatedFormula, fault.FeederReactanceUnstated},
	{&fault.TransformationRatioFormula, fault.TransformationRatio},
	{&fault.ReferredResistanceFormula, fault.ReferredResistance},
	{&fault.ReferredReactanceFormula, fault.ReferredReactance},
	{&fault.ReferredCurrentFormula, fault.ReferredCurrent},
	{&fault.TransformerImpedanceFormula, fault.TransformerImpedance},
	{&fault.TransformerResistanceFromShareFormula, fault.TransformerResistanceFromShare},
	{&fault.TransformerResistanceFromLossFormula, fault.TransformerResistanceFromLoss},
	{&fault.TransformerReactanceFormula, fault.TransformerReactance},
	{&fault.RelativeReactanceFormula, fault.RelativeReactance},
	{&fault.TransformerCorrectionFormula, fault.TransformerCorrection},
	{&fault.CorrectedResistanceFormula, fault.CorrectedResistance},
	{&fault.CorrectedReactanceFormula, fault.CorrectedReactance},
	{&fault.ImpedanceToleranceFormula, fault.ImpedanceTolerance},
	{&fault.SmallestImpedanceFormula, fault.SmallestImpedance},
	{&fault.LargestImpedanceFormula, fault.LargestImpedance},
	{&fault.LineResistanceFormula, fault.LineResistance},
	{&fault.LineReactanceFormula, fault.LineReactance},
	{&fault.ResistanceAtTemperatureFormula, fault.ResistanceAtTemperature},
	{&fault.InitialCurrentFormula, fault.InitialCurrent},
	{&fault.LineToLineCurrentFormula, fault.LineToLineCurrent},
	{&fault.ZeroSequenceResistanceFormula, fault.ZeroSequenceResistance},
	{&fault.ZeroSequenceReactanceFormula, fault.ZeroSequenceReactance},
	{&fault.EarthFaultCurrentFormula, fault.EarthFaultCurrent},
	{&fault.EarthFaultROverXFormula, fault.EarthFaultROverX},
	{&fault.BranchShareFormula, fault.BranchShare},
	{&fault.PeakFactorFormula, fault.PeakFactor},
	{&fault.PeakCurrentFormula, fault.PeakCurrent},
	{&fault.PeakRatioFormula, fault.PeakRatio},
	{&fault.DirectCurrentHeatFormula, fault.DirectCurrentHeat},
	{&fault.AlternatingCurrentHeatFormula, fault.AlternatingCurrentHeat},
	{&fault.ThermalEquivalentFormula, fault.ThermalEquivalentCurrent},
	{&fault.JouleIntegralFormula, fault.JouleIntegral},
	{&fault.MotorApparentPowerFormula, fault.MotorApparentPower},
	{&fault.RatedCurrentFormula, fault.RatedCurrent},
	{&fault.MotorImpedanceFormula, fault.MotorImpedance},
	{&fault.MotorReactanceFormula, fault.MotorReactance},
	{&fault.MotorResistanceFormula, fault.MotorResistance},
	{&fault.NegligibleMotorCurrentFormula, fault.NegligibleMotorCurrent},
	{&fault.SubtransientReactanceFormula, fault.SubtransientReactance},
	{&fault.GeneratorCorrectionFormula, fault.GeneratorCorrection},
	{&fault.GeneratorResistanceFormula, fault.GeneratorResistance},
	{&fault.CorrectedGeneratorResistanceFormula, fault.CorrectedGeneratorResistance},
	{&fault.CorrectedGeneratorReactanceFormula, fault.CorrectedGeneratorReactance},
	{&fault.SustainedCurrentFormula, fault.SustainedCurrent},
	{&fault.ConverterCurrentFormula, fault.ConverterCurrent},
}

var operand = regexp.MustCompile(`\{([^{}]+)\}`)

func operands(equation string) []string {
	var out []string
	for _, m := range operand.FindAllStringSubmatch(equation, -1) {
		if !slices.Contains(out, m[1]) {
			out = append(out, m[1])
		}
	}
	return out
}

// leaves counts the numbers in the arguments of a function.
func leaves(t reflect.Type) int {
	if t.Kind() == reflect.Float64 {
		return 1
	}
	n := 0
	for i := range t.NumField() {
		n += leaves(t.Field(i).Type)
	}
	return n
}

func TestFormulasAreComplete(t *testing.T) {
	t.Parallel()
	ids := map[string]bool{}
	for _, e := range entries {
		f := e.formula
		if ids[f.ID] {
			t.Errorf("%s is used twice", f.ID)
		}
		ids[f.ID] = true
		if !strings.HasPrefix(f.ID, "fault.") || f.Symbol == "" || f.Name == "" || f.Source.String() == "" || f.Source.Status == "" {
			t.Errorf("%s lacks symbol, name or source", f.ID)
		}
		arguments := 0
		function := reflect.TypeOf(e.function)
		for i := range function.NumIn() {
			arguments += leaves(function.In(i))
		}
		symbols := operands(f.Equation)
		if len(symbols) != arguments || len(f.Range) != arguments {
			t.Errorf("%s: %d arguments, %d operands %v, %d ranges", f.ID, arguments, len(symbols), symbols, len(f.Range))
		}
		for _, r := range f.Range {
			if !slices.Contains(symbols, r.Symbol) {
				t.Errorf("%s has a range for %s, which is no operand of %s", f.ID, r.Symbol, f.Equation)
			}
			if r.Dimension == nil || !(r.Low < r.High) {
				t.Errorf("%s has a range without unit or width: %s", f.ID, r.Symbol)
			}
		}
	}
	if declared := declaredFormulas(t); len(declared) != len(entries) {
		t.Errorf("the package declares %d formulas, the test knows %d", len(declared), len(entries))
	}
}

// declaredFormulas finds the exported variables of type working.Formula in the source.
func declaredFormulas(t *testing.T) []string {
	t.Helper()
	files, err := os.ReadDir(".")
	if err != nil {
		t.Fatal(err)
	}
	var out []string
	for _, entry := range files {
		if !strings.HasSuffix(entry.Name(), ".go") || strings.HasSuffix(entry.Name(), "_test.go") {
			continue
		}
		file, err := parser.ParseFile(token.NewFileSet(), entry.Name(), nil, 0)
		if err != nil {
			t.Fatal(err)
		}
		for _, d := range file.Decls {
			gen, ok := d.(*ast.GenDecl)
			if !ok || gen.Tok != token.VAR {
				continue
			}
			for _, s := range gen.Specs {
				for _, name := range s.(*ast.ValueSpec).Names {
					if name.IsExported() && strings.HasSuffix(name.Name, "Formula") {
						out = append(out, name.Name)
					}
				}
			}
		}
	}
	return out
}

// fill draws every number of an argument, most of them plausible, some not at all.
func fill(t *rapid.T, v reflect.Value) {
	if v.Kind() != reflect.Float64 {
		for i := range v.NumField() {
			fill(t, v.Field(i))
		}
		return
	}
	odd := []float64{0, -1, math.NaN(), math.Inf(1), math.Inf(-1), math.MaxFloat64, math.SmallestNonzeroFloat64, 1e-9, 1e6, 1.25, 2}
	v.SetFloat(rapid.OneOf(rapid.Float64Range(0, 1.3), rapid.Float64Range(0, 1e3), rapid.Float64Range(1, 1e7), rapid.SampledFrom(odd), rapid.Float64()).Draw(t, "argument"))
}

// TestNothingInfiniteLeaves calls every function with any numbers.
func TestNothingInfiniteLeaves(t *testing.T) {
	t.Parallel()
	rapid.Check(t, func(t *rapid.T) {
		for _, e := range entries {
			function := reflect.ValueOf(e.function)
			var arguments []reflect.Value
			for i := range function.Type().NumIn() {
				a := reflect.New(function.Type().In(i)).Elem()
				fill(t, a)
				arguments = append(arguments, a)
			}
			result := function.Call(arguments)
			value := result[0].Float()
			switch {
			case math.IsNaN(value) || math.IsInf(value, 0) || value < 0:
				t.Fatalf("%s returned %v for %v", e.formula.ID, value, arguments)
			case !result[1].IsNil() && value != 0:
				t.Fatalf("%s returned %v beside an error", e.formula.ID, value)
			}
		}
		for _, bad := range []float64{math.NaN(), math.Inf(1), -1} {
			if v, err := fault.SeriesOhms(1, units.Ohm(bad)); err == nil || v != 0 {
				t.Fatalf("series gave %v", v)
			}
			if v, err := fault.ParallelResistance(fault.Impedance{Resistance: 1, Reactance: 1}, fault.Impedance{Resistance: units.Ohm(bad), Reactance: 1}); err == nil || v != 0 {
				t.Fatalf("parallel gave %v", v)
			}
			if v, err := fault.TotalCurrent(fault.BranchCurrent{Current: units.Ampere(bad), ROverX: 1}); err == nil || v != 0 {
				t.Fatalf("total gave %v", v)
			}
			if v, err := fault.SumOfCurrents(units.Ampere(bad)); err == nil || v != 0 {
				t.Fatalf("sum gave %v", v)
			}
		}
	})
	for _, err := range []error{
		second(fault.SeriesOhms()), second(fault.ParallelReactance()), second(fault.TotalCurrent()), second(fault.SumOfCurrents()),
		second(fault.ParallelResistance(fault.Impedance{})), second(fault.InitialCurrent(1.1, 400, fault.Impedance{})),
		second(fault.EarthFaultCurrent(1.1, 400, fault.Sequences{})), second(fault.BranchShare(fault.Share{Branch: 2, Total: 1})),
	} {
		if err == nil {
			t.Error("nothing to compute gave no error")
		}
	}
}

func second[U any](_ U, err error) error { return err }

// TestWorksheet shows the formulas in use: the operands fill every brace.
func TestWorksheet(t *testing.T) {
	t.Parallel()
	none := working.Source{}
	c := working.Assumed[units.Ratio](1.1, "c_max", "voltage factor", "test", none)
	x := working.Assumed[units.Percentage](0.0594, "x_T", "relative reactance", "test", none)
	k := working.Compute(&fault.TransformerCorrectionFormula, func() (units.Ratio, error) { return fault.TransformerCorrection(c.V(), x.V()) }, c, x)
	if got, want := k.How().Formula.With(k.How().Inputs), "0.95·1.1/(1 + 0.6·5.94 %)"; got != want {
		t.Errorf("the worksheet says %q, expected %q", got, want)
	}
	r1 := working.Assumed[units.Ohm](0.001, "R_Qt", "", "test", none)
	r2 := working.Assumed[units.Ohm](0.002, "R_TK", "", "test", none)
	sum := working.Compute(fault.SeriesFormula("R_k", "resistance up to the fault", "R_Qt", "R_TK"), func() (units.Ohm, error) { return fault.SeriesOhms(r1.V(), r2.V()) }, r1, r2)
	if got, want := sum.How().Formula.With(sum.How().Inputs), "1 mΩ + 2 mΩ"; got != want {
		t.Errorf("the worksheet says %q, expected %q", got, want)
	}
	f := fault.ParallelReactanceFormula("X_k", "", fault.Symbols{Resistance: "R_1", Reactance: "X_1"}, fault.Symbols{Resistance: "R_2", Reactance: "X_2"})
	if got, want := f.Plain(), "X_k = Im 1/(1/(R_1 + j·X_1) + 1/(R_2 + j·X_2))"; got != want {
		t.Errorf("the formula is %q, expected %q", got, want)
	}
	total := fault.TotalCurrentFormula("I\"_k", "", fault.BranchSymbols{Current: "I_1", ROverX: "R_1/X_1"})
	if got, want := total.Plain(), "I\"_k = |I_1/(R_1/X_1 + j)·√(1 + R_1/X_1²)|"; got != want {
		t.Errorf("the formula is %q, expected %q", got, want)
	}
	hot := working.Assumed[units.Celsius](400, "θ_e", "", "test", none)
	beyond := working.Compute(&fault.ResistanceAtTemperatureFormula, func() (units.Ohm, error) { return fault.ResistanceAtTemperature(r1.V(), hot.V()) }, r1, hot)
	if beyond.Known() || beyond.Beyond() == nil || !strings.Contains(beyond.Beyond().Reason, "θ_e is 400 °C") {
		t.Errorf("400 °C gave %v", beyond)
	}
	var limit *working.RangeError
	if _, err := fault.PeakFactor(-1); !errors.As(err, &limit) || limit.Symbol != "R/X" {
		t.Errorf("R/X = -1 gave %v", err)
	}
	for _, m := range []fault.Material{fault.Copper, fault.Aluminium} {
		for _, f := range []*working.Formula{fault.StrandedResistanceFormula(m), fault.SmallestBarResistanceFormula(m), fault.LargestBarResistanceFormula(m)} {
			if !slices.Equal(operands(f.Equation), []string{"A"}) || f.Source.String() == "" {
				t.Errorf("%s: %s", f.ID, f.Equation)
			}
		}
	}
}
