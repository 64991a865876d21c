namespace HeadToWatts.EnergyYield;

/// <summary>Where the year's water goes, m3 a year of 365 days. The parts add up to what arrives.</summary>
/// <param name="ArrivingM3">Water arriving.</param>
/// <param name="PriorM3">Delivered to those who come first.</param>
/// <param name="ReservedM3">Left in the stream.</param>
/// <param name="TurbinedM3">Through the turbines.</param>
/// <param name="BelowLeastM3">Usable, but too little to run on.</param>
/// <param name="OutOfServiceM3">Usable, passed by while the plant is out of service.</param>
/// <param name="SpilledM3">Usable, beyond what the plant takes.</param>
public sealed record WaterBalance(
    double ArrivingM3,
    double PriorM3,
    double ReservedM3,
    double TurbinedM3,
    double BelowLeastM3,
    double OutOfServiceM3,
    double SpilledM3)
{
    /// <summary>What is left over when the parts are taken from the whole, as a share of the whole; zero but for rounding.</summary>
    public double ClosureError =>
        ArrivingM3 == 0 ? 0 : (ArrivingM3 - PriorM3 - ReservedM3 - TurbinedM3 - BelowLeastM3 - OutOfServiceM3 - SpilledM3) / ArrivingM3;
}
