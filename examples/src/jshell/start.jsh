// Start-up of JShell for Lostwork; README.md tells the commands.
// Quantities are made by the name of their unit: celsius(480), bar(60), kelvins(12), percent(85), tonnesPerHour(86).
// Where two kinds share the name of a unit, the commoner one is imported: kilojoulesPerKilogramKelvin(...) is an
// entropy, kilowattsPerKelvin(...) a conductance; write HeatCapacityRate.kilowattsPerKelvin(...) for the other.
import java.nio.file.Path;
import lostwork.component.*;
import lostwork.exergy.*;
import lostwork.fluid.*;
import lostwork.fluid.gas.*;
import lostwork.fluid.water.*;
import lostwork.ledger.*;
import lostwork.plant.*;
import lostwork.quantity.*;
import lostwork.quantity.Duration;
import lostwork.report.*;
import lostwork.solve.*;
import static lostwork.fluid.gas.CombustionAir.*;
import static lostwork.fluid.gas.MoleFraction.*;
import static lostwork.quantity.AmountOfSubstance.*;
import static lostwork.quantity.Area.*;
import static lostwork.quantity.Conductance.*;
import static lostwork.quantity.Density.*;
import static lostwork.quantity.Duration.*;
import static lostwork.quantity.DynamicViscosity.*;
import static lostwork.quantity.EmissionFactor.*;
import static lostwork.quantity.Energy.*;
import static lostwork.quantity.EnergyPrice.*;
import static lostwork.quantity.Entropy.*;
import static lostwork.quantity.HeatFlux.*;
import static lostwork.quantity.HeatTransferCoefficient.*;
import static lostwork.quantity.Length.*;
import static lostwork.quantity.Mass.*;
import static lostwork.quantity.MassFlow.*;
import static lostwork.quantity.MassPrice.*;
import static lostwork.quantity.MolarEnergy.*;
import static lostwork.quantity.MolarEntropy.*;
import static lostwork.quantity.MolarFlow.*;
import static lostwork.quantity.MolarMass.*;
import static lostwork.quantity.MolarVolume.*;
import static lostwork.quantity.Money.*;
import static lostwork.quantity.MoneyRate.*;
import static lostwork.quantity.Power.*;
import static lostwork.quantity.Pressure.*;
import static lostwork.quantity.PressureDifference.*;
import static lostwork.quantity.Ratio.*;
import static lostwork.quantity.RotationalFrequency.*;
import static lostwork.quantity.SpecificEnergy.*;
import static lostwork.quantity.SpecificEntropy.*;
import static lostwork.quantity.SpecificVolume.*;
import static lostwork.quantity.Speed.*;
import static lostwork.quantity.SurfaceTension.*;
import static lostwork.quantity.Temperature.*;
import static lostwork.quantity.TemperatureSpan.*;
import static lostwork.quantity.ThermalConductivity.*;
import static lostwork.quantity.Volume.*;
import static lostwork.quantity.VolumeFlow.*;
import static lostwork.quantity.Units.*;
/** Prints a value in full; JShell itself shortens long ones, such as the table of a solution. */
void show(Object value) {
    System.out.println(value);
}
