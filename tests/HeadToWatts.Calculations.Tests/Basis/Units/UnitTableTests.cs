using HeadToWatts.Basis.Units;
using UnitsNet.Units;

namespace HeadToWatts.Calculations.Tests.Basis.Units;

public class UnitTableTests
{
    // UnitsNet prints some factors with fewer digits than the definitions have; those are held to what it prints, and to the
    // definitions by the check-value files.
    private static readonly Dictionary<string, (double Held, double Tolerance)> ByUnitsNet = new(StringComparer.Ordinal)
    {
        ["m3/s"] = (Flow(VolumeFlowUnit.CubicMeterPerSecond), 1e-12),
        ["L/s"] = (Flow(VolumeFlowUnit.LiterPerSecond), 1e-12),
        ["m3/h"] = (Flow(VolumeFlowUnit.CubicMeterPerHour), 1e-12),
        ["m3/d"] = (Flow(VolumeFlowUnit.CubicMeterPerDay), 1e-12),
        ["ML/d"] = (Flow(VolumeFlowUnit.MegaliterPerDay), 1e-12),
        ["cfs"] = (Flow(VolumeFlowUnit.CubicFootPerSecond), 1e-10),
        ["gpm"] = (Flow(VolumeFlowUnit.UsGallonPerMinute), 1e-9),
        ["mgd"] = (Flow(VolumeFlowUnit.MillionUsGallonPerDay), 1e-5),
        ["acre-ft/day"] = (Flow(VolumeFlowUnit.AcreFootPerDay), 1e-5),
        ["m"] = (Length(LengthUnit.Meter), 1e-12),
        ["mm"] = (Length(LengthUnit.Millimeter), 1e-12),
        ["cm"] = (Length(LengthUnit.Centimeter), 1e-12),
        ["km"] = (Length(LengthUnit.Kilometer), 1e-12),
        ["ft"] = (Length(LengthUnit.Foot), 1e-12),
        ["in"] = (Length(LengthUnit.Inch), 1e-12),
        ["yd"] = (Length(LengthUnit.Yard), 1e-12),
        ["mi"] = (Length(LengthUnit.Mile), 1e-12),
        ["kPa"] = (Pressure(PressureUnit.Kilopascal), 1e-12),
        ["Pa"] = (Pressure(PressureUnit.Pascal), 1e-12),
        ["MPa"] = (Pressure(PressureUnit.Megapascal), 1e-12),
        ["bar"] = (Pressure(PressureUnit.Bar), 1e-12),
        ["psi"] = (Pressure(PressureUnit.PoundForcePerSquareInch), 1e-9),
        ["kW"] = (Power(PowerUnit.Kilowatt), 1e-12),
        ["W"] = (Power(PowerUnit.Watt), 1e-12),
        ["MW"] = (Power(PowerUnit.Megawatt), 1e-12),
        ["hp"] = (Power(PowerUnit.MechanicalHorsepower), 2e-5),
        ["kWh"] = (Energy(EnergyUnit.KilowattHour), 1e-12),
        ["MWh"] = (Energy(EnergyUnit.MegawattHour), 1e-12),
        ["GWh"] = (Energy(EnergyUnit.GigawattHour), 1e-12),
        ["MJ"] = (Energy(EnergyUnit.Megajoule), 1e-12),
        ["m3"] = (Volume(VolumeUnit.CubicMeter), 1e-12),
        ["L"] = (Volume(VolumeUnit.Liter), 1e-12),
        ["acre-ft"] = (Volume(VolumeUnit.AcreFoot), 1e-5),
        ["ft3"] = (Volume(VolumeUnit.CubicFoot), 1e-9),
        ["gal"] = (Volume(VolumeUnit.UsGallon), 1e-9),
        ["m/s"] = (UnitsNet.Speed.From(1, SpeedUnit.MeterPerSecond).MetersPerSecond, 1e-12),
        ["ft/s"] = (UnitsNet.Speed.From(1, SpeedUnit.FootPerSecond).MetersPerSecond, 1e-12),
        ["degC"] = (UnitsNet.Temperature.From(1, TemperatureUnit.DegreeCelsius).DegreesCelsius, 1e-12),
        ["degF"] = (UnitsNet.Temperature.From(1, TemperatureUnit.DegreeFahrenheit).DegreesCelsius, 1e-12),
        ["%"] = (UnitsNet.Ratio.From(1, RatioUnit.Percent).DecimalFractions, 1e-12),
        ["deg"] = (UnitsNet.Angle.From(1, AngleUnit.Degree).Radians, 1e-12),
        ["rad"] = (UnitsNet.Angle.From(1, AngleUnit.Radian).Radians, 1e-12),
        ["h"] = (UnitsNet.Duration.From(1, DurationUnit.Hour).Seconds, 1e-12),
        ["min"] = (UnitsNet.Duration.From(1, DurationUnit.Minute).Seconds, 1e-12),
        ["s"] = (UnitsNet.Duration.From(1, DurationUnit.Second).Seconds, 1e-12),
        ["days"] = (UnitsNet.Duration.From(1, DurationUnit.Day).Seconds, 1e-12),
        ["Hz"] = (UnitsNet.Frequency.From(1, FrequencyUnit.Hertz).Hertz, 1e-12),
        ["V"] = (UnitsNet.ElectricPotential.From(1, ElectricPotentialUnit.Volt).Volts, 1e-12),
        ["kV"] = (UnitsNet.ElectricPotential.From(1, ElectricPotentialUnit.Kilovolt).Volts, 1e-12),
        ["VA"] = (UnitsNet.ElectricApparentPower.From(1, ElectricApparentPowerUnit.Voltampere).Voltamperes, 1e-12),
        ["kVA"] = (UnitsNet.ElectricApparentPower.From(1, ElectricApparentPowerUnit.Kilovoltampere).Voltamperes, 1e-12),
        ["MVA"] = (UnitsNet.ElectricApparentPower.From(1, ElectricApparentPowerUnit.Megavoltampere).Voltamperes, 1e-12),
        ["m2"] = (UnitsNet.Area.From(1, AreaUnit.SquareMeter).SquareMeters, 1e-12),
        ["ft2"] = (UnitsNet.Area.From(1, AreaUnit.SquareFoot).SquareMeters, 1e-9),
        ["km2"] = (UnitsNet.Area.From(1, AreaUnit.SquareKilometer).SquareMeters, 1e-12),
        ["mi2"] = (UnitsNet.Area.From(1, AreaUnit.SquareMile).SquareMeters, 1e-8),
        ["ha"] = (UnitsNet.Area.From(1, AreaUnit.Hectare).SquareMeters, 1e-12),
        ["acre"] = (UnitsNet.Area.From(1, AreaUnit.Acre).SquareMeters, 1e-5),
        ["rpm"] = (UnitsNet.RotationalSpeed.From(1, RotationalSpeedUnit.RevolutionPerMinute).RevolutionsPerMinute, 1e-12),
    };

    public static TheoryData<string> Files => new(FileNames());

    [Fact]
    public void Every_unit_agrees_with_a_general_units_library()
    {
        foreach (var unit in UnitTable.All.Where(u => !u.Symbol.StartsWith("miner", StringComparison.Ordinal)))
        {
            Assert.True(ByUnitsNet.TryGetValue(unit.Symbol, out var other), $"'{unit.Symbol}' has no independent value: add one here and in tests/CheckValues/units");
            Assert.Equal(other.Held, unit.ToHeld(1), other.Tolerance * Math.Abs(other.Held));
        }
    }

    [Fact]
    public void The_held_unit_of_each_dimension_is_the_one_named()
    {
        // 212 degF is 100 degC and -40 is -40: the offset as well as the factor.
        var f = UnitTable.Fahrenheit;
        Assert.Equal(100, f.ToHeld(212), 1e-12);
        Assert.Equal(-40, f.ToHeld(-40), 1e-12);
        Assert.Equal(32, f.FromHeld(0), 1e-12);

        // Energy (J) and ratio (1) are held in units that nobody writes; every other dimension has its held unit in the table.
        Assert.All(Enum.GetValues<Dimension>().Except([Dimension.Energy, Dimension.Ratio]), d => Assert.Single(UnitTable.Of(d), u => u.Factor == 1 && u.Offset == 0));
    }

    [Theory]
    [MemberData(nameof(Files))]
    public void Units_agree_with_printed_and_defined_values(string file)
    {
        var rows = CheckValueFile.Read(Path.Combine(CheckValueFile.Folder(), "units", file)).Rows;
        Assert.NotEmpty(rows);
        foreach (var row in rows)
        {
            var dimension = Enum.Parse<Dimension>(row.Text("dimension"));
            var from = UnitTable.Find(dimension, row.Text("from"));
            var into = UnitTable.Find(dimension, row.Text("into"));
            Assert.True(from is not null && into is not null, row.Where);
            row.Check(into.FromHeld(from.ToHeld(row["value"])));
        }
    }

    [Fact]
    public void Every_state_whose_inch_is_in_the_table_has_an_outside_value()
    {
        var checkedUnits = FileNames().SelectMany(f => CheckValueFile.Read(Path.Combine(CheckValueFile.Folder(), "units", f)).Rows.Select(r => r.Text("from"))).ToHashSet();
        Assert.All(UnitTable.All.Where(u => u.Symbol.StartsWith("miner", StringComparison.Ordinal)), u => Assert.Contains(u.Symbol, checkedUnits));
    }

    [Fact]
    public void No_spelling_means_two_units_of_one_dimension()
    {
        foreach (var dimension in Enum.GetValues<Dimension>())
        {
            var spellings = UnitTable.Of(dimension).SelectMany(u => u.Aliases.Append(u.Symbol).Distinct()).ToList();
            Assert.Equal(spellings.Count, spellings.Distinct(StringComparer.Ordinal).Count());
            Assert.All(UnitTable.Of(dimension), u => Assert.All(u.Aliases.Append(u.Symbol), s => Assert.Same(u, UnitTable.Find(dimension, s))));
        }
    }

    [Fact]
    public void Case_is_forgiven_only_where_it_cannot_mislead()
    {
        Assert.Same(UnitTable.CubicFootPerSecond, UnitTable.Find(Dimension.Flow, "CFS"));
        Assert.Equal("MW", UnitTable.Find(Dimension.Power, "MW")!.Symbol);

        // "mw" could be milliwatts to the writer; the table has megawatts only, so the loose match is unique.
        Assert.Equal("MW", UnitTable.Find(Dimension.Power, "mw")!.Symbol);
        Assert.Null(UnitTable.Find(Dimension.Length, "furlong"));
        Assert.Equal(Dimension.Pressure, UnitTable.FindAny("psi")!.Dimension);
        Assert.Null(UnitTable.FindAny("furlong"));
    }

    private static string[] FileNames() =>
        [.. Directory.GetFiles(Path.Combine(CheckValueFile.Folder(), "units"), "*.csv").Select(f => Path.GetFileName(f)).Order(StringComparer.Ordinal)];

    private static double Flow(VolumeFlowUnit unit) => UnitsNet.VolumeFlow.From(1, unit).CubicMetersPerSecond;

    private static double Length(LengthUnit unit) => UnitsNet.Length.From(1, unit).Meters;

    private static double Pressure(PressureUnit unit) => UnitsNet.Pressure.From(1, unit).Pascals;

    private static double Power(PowerUnit unit) => (double)UnitsNet.Power.From(1, unit).Watts;

    private static double Energy(EnergyUnit unit) => UnitsNet.Energy.From(1, unit).Joules;

    private static double Volume(VolumeUnit unit) => UnitsNet.Volume.From(1, unit).CubicMeters;
}
