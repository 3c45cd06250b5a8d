package lostwork.quantity;

/**
 * The units that the library knows, each typed by the quantity that it measures.
 *
 * <p>Factors follow the SI Brochure, 9th edition, and its exact relations to the inch, the pound (0.45359237 kg), the
 * International Table British thermal unit (1055.05585262 J) and the pound-force per square inch; the horsepower is the
 * mechanical one, 550 ft lbf/s. The British thermal unit of the definition per pound is 2326 J/kg exactly. A year counts
 * 8760 hours.
 */
public final class Units {
    private Units() {}

    /** Degrees Celsius, for a temperature. */
    public static final Unit<Temperature> CELSIUS = Unit.withOffset("°C", 1, 273.15, "degC", "℃");

    /** Kelvin, for a temperature. */
    public static final Unit<Temperature> KELVIN = Unit.of("K", 1);

    /** Degrees Fahrenheit, for a temperature. */
    public static final Unit<Temperature> FAHRENHEIT = Unit.withOffset("°F", 5.0 / 9.0, 459.67, "degF");

    /** Degrees Rankine, for a temperature. */
    public static final Unit<Temperature> RANKINE = Unit.of("°R", 5.0 / 9.0, "degR");

    /** Kelvin, for a temperature span. */
    public static final Unit<TemperatureSpan> KELVIN_SPAN = Unit.of("K", 1);

    /** Degrees Rankine, each as large as a degree Fahrenheit, for a temperature span. */
    public static final Unit<TemperatureSpan> RANKINE_SPAN = Unit.of("°R", 5.0 / 9.0, "degR");

    /** Bar, for a pressure. */
    public static final Unit<Pressure> BAR = Unit.of("bar", 1e5);

    /** Pascal, for a pressure. */
    public static final Unit<Pressure> PASCAL = Unit.of("Pa", 1);

    /** Kilopascal, for a pressure. */
    public static final Unit<Pressure> KILOPASCAL = Unit.of("kPa", 1e3);

    /** Megapascal, for a pressure. */
    public static final Unit<Pressure> MEGAPASCAL = Unit.of("MPa", 1e6);

    /** Millibar, for a pressure. */
    public static final Unit<Pressure> MILLIBAR = Unit.of("mbar", 100, "hPa");

    /** Standard atmospheres, for a pressure. */
    public static final Unit<Pressure> ATMOSPHERE = Unit.of("atm", 101325);

    /** Pounds-force per square inch, for a pressure. */
    public static final Unit<Pressure> PSI = Unit.of("psi", 6894.757293168361, "psia");

    /** Bar, for a pressure difference. */
    public static final Unit<PressureDifference> BAR_DIFFERENCE = Unit.of("bar", 1e5);

    /** Pascal, for a pressure difference. */
    public static final Unit<PressureDifference> PASCAL_DIFFERENCE = Unit.of("Pa", 1);

    /** Kilopascal, for a pressure difference. */
    public static final Unit<PressureDifference> KILOPASCAL_DIFFERENCE = Unit.of("kPa", 1e3);

    /** Millibar, for a pressure difference. */
    public static final Unit<PressureDifference> MILLIBAR_DIFFERENCE = Unit.of("mbar", 100, "hPa");

    /** Pounds-force per square inch, for a pressure difference. */
    public static final Unit<PressureDifference> PSI_DIFFERENCE = Unit.of("psi", 6894.757293168361, "psid");

    /** Cubic metres per kilogram, for a specific volume. */
    public static final Unit<SpecificVolume> CUBIC_METRE_PER_KILOGRAM = Unit.of("m³/kg", 1, "m3/kg");

    /** Litres per kilogram, for a specific volume. */
    public static final Unit<SpecificVolume> LITRE_PER_KILOGRAM = Unit.of("L/kg", 1e-3, "l/kg", "dm³/kg", "dm3/kg");

    /** Cubic feet per pound, for a specific volume. */
    public static final Unit<SpecificVolume> CUBIC_FOOT_PER_POUND =
            Unit.of("ft³/lb", 0.028316846592 / 0.45359237, "ft3/lb");

    /** Kilograms per cubic metre, for a density. */
    public static final Unit<Density> KILOGRAM_PER_CUBIC_METRE = Unit.of("kg/m³", 1, "kg/m3");

    /** Grams per cubic centimetre, for a density. */
    public static final Unit<Density> GRAM_PER_CUBIC_CENTIMETRE = Unit.of("g/cm³", 1e3, "g/cm3", "kg/L", "kg/l");

    /** Pounds per cubic foot, for a density. */
    public static final Unit<Density> POUND_PER_CUBIC_FOOT = Unit.of("lb/ft³", 0.45359237 / 0.028316846592, "lb/ft3");

    /** Cubic metres per mole, for a molar volume. */
    public static final Unit<MolarVolume> CUBIC_METRE_PER_MOLE = Unit.of("m³/mol", 1, "m3/mol");

    /** Litres per mole, for a molar volume. */
    public static final Unit<MolarVolume> LITRE_PER_MOLE = Unit.of("L/mol", 1e-3, "l/mol", "m³/kmol", "m3/kmol");

    /** Kilojoules per kilogram, for a specific energy. */
    public static final Unit<SpecificEnergy> KILOJOULE_PER_KILOGRAM = Unit.of("kJ/kg", 1e3);

    /** Joules per kilogram, for a specific energy. */
    public static final Unit<SpecificEnergy> JOULE_PER_KILOGRAM = Unit.of("J/kg", 1);

    /** Megajoules per kilogram, for a specific energy. */
    public static final Unit<SpecificEnergy> MEGAJOULE_PER_KILOGRAM = Unit.of("MJ/kg", 1e6);

    /** Kilowatt hours per kilogram, for a specific energy. */
    public static final Unit<SpecificEnergy> KILOWATT_HOUR_PER_KILOGRAM = Unit.of("kWh/kg", 3.6e6);

    /** British thermal units (International Table) per pound, for a specific energy. */
    public static final Unit<SpecificEnergy> BTU_PER_POUND = Unit.of("Btu/lb", 2326);

    /** Kilojoules per kilogram and kelvin, for a specific entropy. */
    public static final Unit<SpecificEntropy> KILOJOULE_PER_KILOGRAM_KELVIN =
            Unit.of("kJ/(kg K)", 1e3, "kJ/(kg·K)", "kJ/(kg*K)");

    /** Joules per kilogram and kelvin, for a specific entropy. */
    public static final Unit<SpecificEntropy> JOULE_PER_KILOGRAM_KELVIN =
            Unit.of("J/(kg K)", 1, "J/(kg·K)", "J/(kg*K)");

    /** British thermal units per pound and degree Rankine, for a specific entropy. */
    public static final Unit<SpecificEntropy> BTU_PER_POUND_RANKINE = Unit.of("Btu/(lb °R)", 4186.8, "Btu/(lb·°R)");

    /** Kilojoules per kilogram and kelvin, for a specific heat capacity. */
    public static final Unit<SpecificHeatCapacity> KILOJOULE_PER_KILOGRAM_KELVIN_CAPACITY =
            Unit.of("kJ/(kg K)", 1e3, "kJ/(kg·K)", "kJ/(kg*K)");

    /** Joules per kilogram and kelvin, for a specific heat capacity. */
    public static final Unit<SpecificHeatCapacity> JOULE_PER_KILOGRAM_KELVIN_CAPACITY =
            Unit.of("J/(kg K)", 1, "J/(kg·K)", "J/(kg*K)");

    /** British thermal units per pound and degree Rankine, for a specific heat capacity. */
    public static final Unit<SpecificHeatCapacity> BTU_PER_POUND_RANKINE_CAPACITY =
            Unit.of("Btu/(lb °R)", 4186.8, "Btu/(lb·°R)");

    /** Grams per mole, for a molar mass. */
    public static final Unit<MolarMass> GRAM_PER_MOLE = Unit.of("g/mol", 1e-3, "kg/kmol");

    /** Kilograms per mole, for a molar mass. */
    public static final Unit<MolarMass> KILOGRAM_PER_MOLE = Unit.of("kg/mol", 1);

    /** Kilojoules per mole, for a molar energy. */
    public static final Unit<MolarEnergy> KILOJOULE_PER_MOLE = Unit.of("kJ/mol", 1e3, "MJ/kmol");

    /** Joules per mole, for a molar energy. */
    public static final Unit<MolarEnergy> JOULE_PER_MOLE = Unit.of("J/mol", 1, "kJ/kmol");

    /** Joules per mole and kelvin, for a molar entropy. */
    public static final Unit<MolarEntropy> JOULE_PER_MOLE_KELVIN = Unit.of("J/(mol K)", 1, "J/(mol·K)", "kJ/(kmol K)");

    /** Kilojoules per mole and kelvin, for a molar entropy. */
    public static final Unit<MolarEntropy> KILOJOULE_PER_MOLE_KELVIN = Unit.of("kJ/(mol K)", 1e3, "kJ/(mol·K)");

    /** Joules per mole and kelvin, for a molar heat capacity. */
    public static final Unit<MolarHeatCapacity> JOULE_PER_MOLE_KELVIN_CAPACITY =
            Unit.of("J/(mol K)", 1, "J/(mol·K)", "kJ/(kmol K)");

    /** Kilograms, for a mass. */
    public static final Unit<Mass> KILOGRAM = Unit.of("kg", 1);

    /** Grams, for a mass. */
    public static final Unit<Mass> GRAM = Unit.of("g", 1e-3);

    /** Tonnes, for a mass. */
    public static final Unit<Mass> TONNE = Unit.of("t", 1e3);

    /** Pounds (avoirdupois), for a mass. */
    public static final Unit<Mass> POUND = Unit.of("lb", 0.45359237);

    /** Moles, for an amount of substance. */
    public static final Unit<AmountOfSubstance> MOLE = Unit.of("mol", 1);

    /** Kilomoles, for an amount of substance. */
    public static final Unit<AmountOfSubstance> KILOMOLE = Unit.of("kmol", 1e3);

    /** Cubic metres, for a volume. */
    public static final Unit<Volume> CUBIC_METRE = Unit.of("m³", 1, "m3");

    /** Litres, for a volume. */
    public static final Unit<Volume> LITRE = Unit.of("L", 1e-3, "l");

    /** Kilograms per second, for a mass flow. */
    public static final Unit<MassFlow> KILOGRAM_PER_SECOND = Unit.of("kg/s", 1);

    /** Kilograms per hour, for a mass flow. */
    public static final Unit<MassFlow> KILOGRAM_PER_HOUR = Unit.of("kg/h", 1 / 3600.0);

    /** Tonnes per hour, for a mass flow. */
    public static final Unit<MassFlow> TONNE_PER_HOUR = Unit.of("t/h", 1 / 3.6);

    /** Tonnes per day, for a mass flow. */
    public static final Unit<MassFlow> TONNE_PER_DAY = Unit.of("t/d", 1 / 86.4);

    /** Pounds per hour, for a mass flow. */
    public static final Unit<MassFlow> POUND_PER_HOUR = Unit.of("lb/h", 0.45359237 / 3600);

    /** Moles per second, for a molar flow. */
    public static final Unit<MolarFlow> MOLE_PER_SECOND = Unit.of("mol/s", 1);

    /** Kilomoles per hour, for a molar flow. */
    public static final Unit<MolarFlow> KILOMOLE_PER_HOUR = Unit.of("kmol/h", 1 / 3.6);

    /** Cubic metres per second, for a volume flow. */
    public static final Unit<VolumeFlow> CUBIC_METRE_PER_SECOND = Unit.of("m³/s", 1, "m3/s");

    /** Cubic metres per hour, for a volume flow. */
    public static final Unit<VolumeFlow> CUBIC_METRE_PER_HOUR = Unit.of("m³/h", 1 / 3600.0, "m3/h");

    /** Litres per second, for a volume flow. */
    public static final Unit<VolumeFlow> LITRE_PER_SECOND = Unit.of("L/s", 1e-3, "l/s");

    /** Litres per minute, for a volume flow. */
    public static final Unit<VolumeFlow> LITRE_PER_MINUTE = Unit.of("L/min", 1e-3 / 60, "l/min");

    /** Cubic feet per minute, for a volume flow. */
    public static final Unit<VolumeFlow> CUBIC_FOOT_PER_MINUTE = Unit.of("ft³/min", 0.028316846592 / 60, "ft3/min");

    /** Kilojoules, for an energy. */
    public static final Unit<Energy> KILOJOULE = Unit.of("kJ", 1e3);

    /** Joules, for an energy. */
    public static final Unit<Energy> JOULE = Unit.of("J", 1);

    /** Megajoules, for an energy. */
    public static final Unit<Energy> MEGAJOULE = Unit.of("MJ", 1e6);

    /** Gigajoules, for an energy. */
    public static final Unit<Energy> GIGAJOULE = Unit.of("GJ", 1e9);

    /** Kilowatt hours, for an energy. */
    public static final Unit<Energy> KILOWATT_HOUR = Unit.of("kWh", 3.6e6);

    /** Megawatt hours, for an energy. */
    public static final Unit<Energy> MEGAWATT_HOUR = Unit.of("MWh", 3.6e9);

    /** Gigawatt hours, for an energy. */
    public static final Unit<Energy> GIGAWATT_HOUR = Unit.of("GWh", 3.6e12);

    /** British thermal units (International Table), for an energy. */
    public static final Unit<Energy> BTU = Unit.of("Btu", 1055.05585262);

    /** Kilowatts, for a power. */
    public static final Unit<Power> KILOWATT = Unit.of("kW", 1e3);

    /** Watts, for a power. */
    public static final Unit<Power> WATT = Unit.of("W", 1);

    /** Megawatts, for a power. */
    public static final Unit<Power> MEGAWATT = Unit.of("MW", 1e6);

    /** Gigawatts, for a power. */
    public static final Unit<Power> GIGAWATT = Unit.of("GW", 1e9);

    /** Mechanical horsepower (550 foot-pounds-force per second), for a power. */
    public static final Unit<Power> HORSEPOWER = Unit.of("hp", 745.6998715822702);

    /** British thermal units per hour, for a power. */
    public static final Unit<Power> BTU_PER_HOUR = Unit.of("Btu/h", 1055.05585262 / 3600);

    /** Kilojoules per kelvin, for an entropy. */
    public static final Unit<Entropy> KILOJOULE_PER_KELVIN = Unit.of("kJ/K", 1e3);

    /** Joules per kelvin, for an entropy. */
    public static final Unit<Entropy> JOULE_PER_KELVIN = Unit.of("J/K", 1);

    /** Kilowatts per kelvin, for an entropy rate. */
    public static final Unit<EntropyRate> KILOWATT_PER_KELVIN_ENTROPY = Unit.of("kW/K", 1e3);

    /** Watts per kelvin, for an entropy rate. */
    public static final Unit<EntropyRate> WATT_PER_KELVIN_ENTROPY = Unit.of("W/K", 1);

    /** Kilowatts per kelvin, for a heat capacity rate. */
    public static final Unit<HeatCapacityRate> KILOWATT_PER_KELVIN_CAPACITY = Unit.of("kW/K", 1e3);

    /** Watts per kelvin, for a heat capacity rate. */
    public static final Unit<HeatCapacityRate> WATT_PER_KELVIN_CAPACITY = Unit.of("W/K", 1);

    /** Kilowatts per kelvin, for a thermal conductance. */
    public static final Unit<Conductance> KILOWATT_PER_KELVIN = Unit.of("kW/K", 1e3);

    /** Watts per kelvin, for a thermal conductance. */
    public static final Unit<Conductance> WATT_PER_KELVIN = Unit.of("W/K", 1);

    /** Parts of one, for a ratio. */
    public static final Unit<Ratio> FRACTION = Unit.of("1", 1);

    /** Percent, for a ratio. */
    public static final Unit<Ratio> PERCENT = Unit.of("%", 0.01);

    /** Parts per million, for a ratio. */
    public static final Unit<Ratio> PER_MILLION = Unit.of("ppm", 1e-6);

    /** Kilowatts per square metre, for a heat flux. */
    public static final Unit<HeatFlux> KILOWATT_PER_SQUARE_METRE = Unit.of("kW/m²", 1e3, "kW/m2");

    /** Watts per square metre, for a heat flux. */
    public static final Unit<HeatFlux> WATT_PER_SQUARE_METRE = Unit.of("W/m²", 1, "W/m2");

    /** Watts per square metre and kelvin, for a heat transfer coefficient. */
    public static final Unit<HeatTransferCoefficient> WATT_PER_SQUARE_METRE_KELVIN =
            Unit.of("W/(m² K)", 1, "W/(m²·K)", "W/(m2 K)");

    /** Watts per metre and kelvin, for a thermal conductivity. */
    public static final Unit<ThermalConductivity> WATT_PER_METRE_KELVIN = Unit.of("W/(m K)", 1, "W/(m·K)");

    /** Milliwatts per metre and kelvin, for a thermal conductivity. */
    public static final Unit<ThermalConductivity> MILLIWATT_PER_METRE_KELVIN = Unit.of("mW/(m K)", 1e-3, "mW/(m·K)");

    /** Micropascal seconds, for a dynamic viscosity. */
    public static final Unit<DynamicViscosity> MICROPASCAL_SECOND = Unit.of("µPa s", 1e-6, "μPa s", "uPa s", "µPa·s");

    /** Pascal seconds, for a dynamic viscosity. */
    public static final Unit<DynamicViscosity> PASCAL_SECOND = Unit.of("Pa s", 1, "Pa·s");

    /** Millipascal seconds, for a dynamic viscosity. */
    public static final Unit<DynamicViscosity> MILLIPASCAL_SECOND = Unit.of("mPa s", 1e-3, "mPa·s", "cP");

    /** Millinewtons per metre, for a surface tension. */
    public static final Unit<SurfaceTension> MILLINEWTON_PER_METRE = Unit.of("mN/m", 1e-3);

    /** Newtons per metre, for a surface tension. */
    public static final Unit<SurfaceTension> NEWTON_PER_METRE = Unit.of("N/m", 1);

    /** Metres, for a length. */
    public static final Unit<Length> METRE = Unit.of("m", 1);

    /** Millimetres, for a length. */
    public static final Unit<Length> MILLIMETRE = Unit.of("mm", 1e-3);

    /** Feet, for a length. */
    public static final Unit<Length> FOOT = Unit.of("ft", 0.3048);

    /** Inches, for a length. */
    public static final Unit<Length> INCH = Unit.of("in", 0.0254);

    /** Square metres, for an area. */
    public static final Unit<Area> SQUARE_METRE = Unit.of("m²", 1, "m2");

    /** Square feet, for an area. */
    public static final Unit<Area> SQUARE_FOOT = Unit.of("ft²", 0.09290304, "ft2");

    /** Metres per second, for a speed. */
    public static final Unit<Speed> METRE_PER_SECOND = Unit.of("m/s", 1);

    /** Kilometres per hour, for a speed. */
    public static final Unit<Speed> KILOMETRE_PER_HOUR = Unit.of("km/h", 1 / 3.6);

    /** Feet per second, for a speed. */
    public static final Unit<Speed> FOOT_PER_SECOND = Unit.of("ft/s", 0.3048);

    /** Revolutions per minute, for a rotational frequency. */
    public static final Unit<RotationalFrequency> REVOLUTION_PER_MINUTE = Unit.of("1/min", 1 / 60.0, "rpm", "min⁻¹");

    /** Revolutions per second, for a rotational frequency. */
    public static final Unit<RotationalFrequency> REVOLUTION_PER_SECOND = Unit.of("1/s", 1, "s⁻¹");

    /** Hours, for a duration. */
    public static final Unit<Duration> HOUR = Unit.of("h", 3600);

    /** Seconds, for a duration. */
    public static final Unit<Duration> SECOND = Unit.of("s", 1);

    /** Minutes, for a duration. */
    public static final Unit<Duration> MINUTE = Unit.of("min", 60);

    /** Days, for a duration. */
    public static final Unit<Duration> DAY = Unit.of("d", 86400);

    /** Years of 8760 hours, for a duration. */
    public static final Unit<Duration> YEAR = Unit.of("a", 31536000, "yr");

    /** Units of the currency, for a money. */
    public static final Unit<Money> CURRENCY_UNIT = Unit.of("¤", 1);

    /** Units of the currency per year of 8760 hours, for a money rate. */
    public static final Unit<MoneyRate> CURRENCY_PER_YEAR = Unit.of("¤/a", 1 / 31536000.0);

    /** Units of the currency per hour, for a money rate. */
    public static final Unit<MoneyRate> CURRENCY_PER_HOUR = Unit.of("¤/h", 1 / 3600.0);

    /** Units of the currency per second, for a money rate. */
    public static final Unit<MoneyRate> CURRENCY_PER_SECOND = Unit.of("¤/s", 1);

    /** Units of the currency per megawatt hour, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_MEGAWATT_HOUR = Unit.of("¤/MWh", 1 / 3.6e9);

    /** Units of the currency per kilowatt hour, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_KILOWATT_HOUR = Unit.of("¤/kWh", 1 / 3.6e6);

    /** Units of the currency per gigajoule, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_GIGAJOULE = Unit.of("¤/GJ", 1e-9);

    /** Units of the currency per joule, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_JOULE = Unit.of("¤/J", 1);

    /** Units of the currency per tonne, for a mass price. */
    public static final Unit<MassPrice> CURRENCY_PER_TONNE = Unit.of("¤/t", 1e-3);

    /** Units of the currency per kilogram, for a mass price. */
    public static final Unit<MassPrice> CURRENCY_PER_KILOGRAM = Unit.of("¤/kg", 1);

    /** Kilograms per megawatt hour, for an emission factor. */
    public static final Unit<EmissionFactor> KILOGRAM_PER_MEGAWATT_HOUR = Unit.of("kg/MWh", 1 / 3.6e9, "g/kWh");

    /** Kilograms per gigajoule, for an emission factor. */
    public static final Unit<EmissionFactor> KILOGRAM_PER_GIGAJOULE = Unit.of("kg/GJ", 1e-9, "t/TJ");

    /** Kilograms per joule, for an emission factor. */
    public static final Unit<EmissionFactor> KILOGRAM_PER_JOULE = Unit.of("kg/J", 1);
}
