package lostwork.quantity;

/**
 * The units that the library knows, each typed by the quantity that it measures.
 *
 * <p>Factors follow the SI Brochure, 9th edition, and the exact definitions of NIST SP 811 (2008), appendix B: the inch
 * (25.4 mm), the pound (0.45359237 kg), the pound-force (4.4482216152605 N), the International Table British thermal unit
 * (1055.05585262 J; 2326 J/kg per pound), the standard (101325 Pa) and the technical atmosphere (98066.5 Pa), the
 * conventional millimetre of mercury (133.322387415 Pa) and of water (9.80665 Pa), the US gallon (231 cubic inches). The
 * horsepower is the mechanical one, 550 ft lbf/s; the metric one is 75 m kgf/s. A year counts 8760 hours. The sign ¤
 * stands for the currency, which the caller knows.
 */
public final class Units {
    private Units() {}

    /** Degrees Celsius, for a temperature. */
    public static final Unit<Temperature> CELSIUS = Unit.withOffset("°C", 1, 1, 273.15, "degC", "deg C");

    /** Kelvin, for a temperature. */
    public static final Unit<Temperature> KELVIN = Unit.of("K", 1);

    /** Degrees Fahrenheit, for a temperature. */
    public static final Unit<Temperature> FAHRENHEIT = Unit.withOffset("°F", 5, 9, 459.67, "degF", "deg F");

    /** Degrees Rankine, for a temperature. */
    public static final Unit<Temperature> RANKINE = Unit.ofQuotient("°R", 5, 9, "degR");

    /** Kelvin, for a temperature span. */
    public static final Unit<TemperatureSpan> KELVIN_SPAN = Unit.of("K", 1);

    /** Degrees Rankine, each as large as a degree Fahrenheit, for a temperature span. */
    public static final Unit<TemperatureSpan> RANKINE_SPAN = Unit.ofQuotient("°R", 5, 9, "degR");

    /** Bar, for a pressure. */
    public static final Unit<Pressure> BAR = Unit.of("bar", 1e5, "bar(a)", "bara", "bar abs");

    /** Pascal, for a pressure. */
    public static final Unit<Pressure> PASCAL = Unit.of("Pa", 1);

    /** Kilopascal, for a pressure. */
    public static final Unit<Pressure> KILOPASCAL = Unit.of("kPa", 1e3, "kPa(a)", "kPa abs");

    /** Megapascal, for a pressure. */
    public static final Unit<Pressure> MEGAPASCAL = Unit.of("MPa", 1e6, "MPa(a)", "MPa abs");

    /** Millibar, for a pressure. */
    public static final Unit<Pressure> MILLIBAR = Unit.of("mbar", 100, "hPa", "mbar(a)", "mbara", "mbar abs");

    /** Standard atmospheres, for a pressure. */
    public static final Unit<Pressure> ATMOSPHERE = Unit.of("atm", 101325);

    /** Technical atmospheres, kilogram-force per square centimetre, for a pressure. */
    public static final Unit<Pressure> TECHNICAL_ATMOSPHERE = Unit.of("at", 98066.5, "kgf/cm²", "kp/cm²");

    /** Torr, 1/760 of a standard atmosphere, for a pressure. */
    public static final Unit<Pressure> TORR = Unit.ofQuotient("Torr", 101325, 760);

    /** Conventional millimetres of mercury, for a pressure. */
    public static final Unit<Pressure> MILLIMETRE_OF_MERCURY = Unit.of("mmHg", 133.322387415);

    /** Pounds-force per square inch, for a pressure. */
    public static final Unit<Pressure> PSI =
            Unit.ofQuotient("psi", 4.4482216152605, 0.00064516, "psia", "psi(a)", "psi abs", "lbf/in²");

    /** Bar, for a pressure difference. */
    public static final Unit<PressureDifference> BAR_DIFFERENCE = Unit.of("bar", 1e5);

    /** Pascal, for a pressure difference. */
    public static final Unit<PressureDifference> PASCAL_DIFFERENCE = Unit.of("Pa", 1);

    /** Kilopascal, for a pressure difference. */
    public static final Unit<PressureDifference> KILOPASCAL_DIFFERENCE = Unit.of("kPa", 1e3);

    /** Megapascal, for a pressure difference. */
    public static final Unit<PressureDifference> MEGAPASCAL_DIFFERENCE = Unit.of("MPa", 1e6);

    /** Conventional millimetres of water, for a pressure difference such as a draught. */
    public static final Unit<PressureDifference> MILLIMETRE_OF_WATER_DIFFERENCE =
            Unit.of("mmH2O", 9.80665, "mmWC", "mmWS", "mmH₂O");

    /** Conventional inches of water, for a pressure difference such as a draught. */
    public static final Unit<PressureDifference> INCH_OF_WATER_DIFFERENCE =
            Unit.of("inH2O", 249.08891, "inWC", "inH₂O");

    /** Millibar, for a pressure difference. */
    public static final Unit<PressureDifference> MILLIBAR_DIFFERENCE = Unit.of("mbar", 100, "hPa");

    /** Pounds-force per square inch, for a pressure difference. */
    public static final Unit<PressureDifference> PSI_DIFFERENCE =
            Unit.ofQuotient("psi", 4.4482216152605, 0.00064516, "psid");

    /** Cubic metres per kilogram, for a specific volume. */
    public static final Unit<SpecificVolume> CUBIC_METRE_PER_KILOGRAM = Unit.of("m³/kg", 1);

    /** Litres per kilogram, for a specific volume. */
    public static final Unit<SpecificVolume> LITRE_PER_KILOGRAM = Unit.ofQuotient("L/kg", 1, 1e3, "l/kg", "dm³/kg");

    /** Cubic feet per pound, for a specific volume. */
    public static final Unit<SpecificVolume> CUBIC_FOOT_PER_POUND =
            Unit.ofQuotient("ft³/lb", 0.028316846592, 0.45359237);

    /** Kilograms per cubic metre, for a density. */
    public static final Unit<Density> KILOGRAM_PER_CUBIC_METRE = Unit.of("kg/m³", 1);

    /** Grams per cubic centimetre, for a density. */
    public static final Unit<Density> GRAM_PER_CUBIC_CENTIMETRE = Unit.of("g/cm³", 1e3, "kg/L", "kg/l");

    /** Pounds per cubic foot, for a density. */
    public static final Unit<Density> POUND_PER_CUBIC_FOOT = Unit.ofQuotient("lb/ft³", 0.45359237, 0.028316846592);

    /** Cubic metres per mole, for a molar volume. */
    public static final Unit<MolarVolume> CUBIC_METRE_PER_MOLE = Unit.of("m³/mol", 1);

    /** Litres per mole, for a molar volume. */
    public static final Unit<MolarVolume> LITRE_PER_MOLE = Unit.ofQuotient("L/mol", 1, 1e3, "l/mol", "m³/kmol");

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
    public static final Unit<SpecificEntropy> KILOJOULE_PER_KILOGRAM_KELVIN = Unit.of("kJ/(kg K)", 1e3, "kJ/kgK");

    /** Joules per kilogram and kelvin, for a specific entropy. */
    public static final Unit<SpecificEntropy> JOULE_PER_KILOGRAM_KELVIN = Unit.of("J/(kg K)", 1, "J/kgK");

    /** British thermal units per pound and degree Rankine, for a specific entropy. */
    public static final Unit<SpecificEntropy> BTU_PER_POUND_RANKINE =
            Unit.of("Btu/(lb °R)", 4186.8, "Btu/(lb °F)", "Btu/(lb R)", "Btu/(lb F)");

    /** Kilojoules per kilogram and kelvin, for a specific heat capacity. */
    public static final Unit<SpecificHeatCapacity> KILOJOULE_PER_KILOGRAM_KELVIN_CAPACITY =
            Unit.of("kJ/(kg K)", 1e3, "kJ/kgK");

    /** Joules per kilogram and kelvin, for a specific heat capacity. */
    public static final Unit<SpecificHeatCapacity> JOULE_PER_KILOGRAM_KELVIN_CAPACITY = Unit.of("J/(kg K)", 1, "J/kgK");

    /** British thermal units per pound and degree Rankine, for a specific heat capacity. */
    public static final Unit<SpecificHeatCapacity> BTU_PER_POUND_RANKINE_CAPACITY =
            Unit.of("Btu/(lb °R)", 4186.8, "Btu/(lb °F)", "Btu/(lb R)", "Btu/(lb F)");

    /** Grams per mole, for a molar mass. */
    public static final Unit<MolarMass> GRAM_PER_MOLE = Unit.ofQuotient("g/mol", 1, 1e3, "kg/kmol");

    /** Kilograms per mole, for a molar mass. */
    public static final Unit<MolarMass> KILOGRAM_PER_MOLE = Unit.of("kg/mol", 1);

    /** Kilojoules per mole, for a molar energy. */
    public static final Unit<MolarEnergy> KILOJOULE_PER_MOLE = Unit.of("kJ/mol", 1e3, "MJ/kmol");

    /** Joules per mole, for a molar energy. */
    public static final Unit<MolarEnergy> JOULE_PER_MOLE = Unit.of("J/mol", 1, "kJ/kmol");

    /** Joules per mole and kelvin, for a molar entropy. */
    public static final Unit<MolarEntropy> JOULE_PER_MOLE_KELVIN =
            Unit.of("J/(mol K)", 1, "kJ/(kmol K)", "J/molK", "kJ/kmolK");

    /** Kilojoules per mole and kelvin, for a molar entropy. */
    public static final Unit<MolarEntropy> KILOJOULE_PER_MOLE_KELVIN = Unit.of("kJ/(mol K)", 1e3);

    /** Joules per mole and kelvin, for a molar heat capacity. */
    public static final Unit<MolarHeatCapacity> JOULE_PER_MOLE_KELVIN_CAPACITY =
            Unit.of("J/(mol K)", 1, "kJ/(kmol K)", "J/molK", "kJ/kmolK");

    /** Kilograms, for a mass. */
    public static final Unit<Mass> KILOGRAM = Unit.of("kg", 1);

    /** Grams, for a mass. */
    public static final Unit<Mass> GRAM = Unit.ofQuotient("g", 1, 1e3);

    /** Tonnes, for a mass. */
    public static final Unit<Mass> TONNE = Unit.of("t", 1e3);

    /** Pounds (avoirdupois), for a mass. */
    public static final Unit<Mass> POUND = Unit.of("lb", 0.45359237);

    /** Moles, for an amount of substance. */
    public static final Unit<AmountOfSubstance> MOLE = Unit.of("mol", 1);

    /** Kilomoles, for an amount of substance. */
    public static final Unit<AmountOfSubstance> KILOMOLE = Unit.of("kmol", 1e3);

    /** Cubic metres, for a volume. */
    public static final Unit<Volume> CUBIC_METRE = Unit.of("m³", 1);

    /** Litres, for a volume. */
    public static final Unit<Volume> LITRE = Unit.ofQuotient("L", 1, 1e3, "l");

    /** Kilograms per second, for a mass flow. */
    public static final Unit<MassFlow> KILOGRAM_PER_SECOND = Unit.of("kg/s", 1);

    /** Kilograms per hour, for a mass flow. */
    public static final Unit<MassFlow> KILOGRAM_PER_HOUR = Unit.ofQuotient("kg/h", 1, 3600, "kg/hr");

    /** Tonnes per hour, for a mass flow. */
    public static final Unit<MassFlow> TONNE_PER_HOUR = Unit.ofQuotient("t/h", 1e3, 3600, "t/hr");

    /** Tonnes per day, for a mass flow. */
    public static final Unit<MassFlow> TONNE_PER_DAY = Unit.ofQuotient("t/d", 1e3, 86400, "t/day");

    /** Pounds per hour, for a mass flow. */
    public static final Unit<MassFlow> POUND_PER_HOUR = Unit.ofQuotient("lb/h", 0.45359237, 3600, "lb/hr", "lbm/h");

    /** Moles per second, for a molar flow. */
    public static final Unit<MolarFlow> MOLE_PER_SECOND = Unit.of("mol/s", 1);

    /** Kilomoles per hour, for a molar flow. */
    public static final Unit<MolarFlow> KILOMOLE_PER_HOUR = Unit.ofQuotient("kmol/h", 1e3, 3600);

    /** Cubic metres per second, for a volume flow. */
    public static final Unit<VolumeFlow> CUBIC_METRE_PER_SECOND = Unit.of("m³/s", 1);

    /** Cubic metres per hour, for a volume flow. */
    public static final Unit<VolumeFlow> CUBIC_METRE_PER_HOUR = Unit.ofQuotient("m³/h", 1, 3600, "m³/hr");

    /** Litres per second, for a volume flow. */
    public static final Unit<VolumeFlow> LITRE_PER_SECOND = Unit.ofQuotient("L/s", 1, 1e3, "l/s");

    /** Litres per minute, for a volume flow. */
    public static final Unit<VolumeFlow> LITRE_PER_MINUTE = Unit.ofQuotient("L/min", 1, 60e3, "l/min");

    /** US gallons (231 cubic inches) per minute, for a volume flow. */
    public static final Unit<VolumeFlow> US_GALLON_PER_MINUTE =
            Unit.ofQuotient("US gal/min", 3.785411784e-3, 60, "gpm (US)");

    /** Cubic feet per minute, for a volume flow. */
    public static final Unit<VolumeFlow> CUBIC_FOOT_PER_MINUTE = Unit.ofQuotient("ft³/min", 0.028316846592, 60, "cfm");

    /** Kilojoules, for an energy. */
    public static final Unit<Energy> KILOJOULE = Unit.of("kJ", 1e3);

    /** Joules, for an energy. */
    public static final Unit<Energy> JOULE = Unit.of("J", 1);

    /** Megajoules, for an energy. */
    public static final Unit<Energy> MEGAJOULE = Unit.of("MJ", 1e6);

    /** Gigajoules, for an energy. */
    public static final Unit<Energy> GIGAJOULE = Unit.of("GJ", 1e9);

    /** Kilowatt hours, for an energy. */
    public static final Unit<Energy> KILOWATT_HOUR = Unit.of("kWh", 3.6e6, "kW h");

    /** Megawatt hours, for an energy. */
    public static final Unit<Energy> MEGAWATT_HOUR = Unit.of("MWh", 3.6e9, "MW h");

    /** Gigawatt hours, for an energy. */
    public static final Unit<Energy> GIGAWATT_HOUR = Unit.of("GWh", 3.6e12, "GW h");

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

    /** Metric horsepower (75 metre-kilograms-force per second), for a power. */
    public static final Unit<Power> METRIC_HORSEPOWER = Unit.of("PS", 735.49875);

    /** British thermal units per hour, for a power. */
    public static final Unit<Power> BTU_PER_HOUR = Unit.ofQuotient("Btu/h", 1055.05585262, 3600, "Btu/hr");

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
    public static final Unit<Ratio> PERCENT = Unit.ofQuotient("%", 1, 100);

    /** Parts per million, for a ratio. */
    public static final Unit<Ratio> PER_MILLION = Unit.ofQuotient("ppm", 1, 1e6, "µmol/mol");

    /** Parts per thousand, for a ratio. */
    public static final Unit<Ratio> PER_MILLE = Unit.ofQuotient("‰", 1, 1000);

    /** Kilowatts per square metre, for a heat flux. */
    public static final Unit<HeatFlux> KILOWATT_PER_SQUARE_METRE = Unit.of("kW/m²", 1e3);

    /** Watts per square metre, for a heat flux. */
    public static final Unit<HeatFlux> WATT_PER_SQUARE_METRE = Unit.of("W/m²", 1);

    /** Watts per square metre and kelvin, for a heat transfer coefficient. */
    public static final Unit<HeatTransferCoefficient> WATT_PER_SQUARE_METRE_KELVIN = Unit.of("W/(m² K)", 1);

    /** Watts per metre and kelvin, for a thermal conductivity. */
    public static final Unit<ThermalConductivity> WATT_PER_METRE_KELVIN = Unit.of("W/(m K)", 1);

    /** Milliwatts per metre and kelvin, for a thermal conductivity. */
    public static final Unit<ThermalConductivity> MILLIWATT_PER_METRE_KELVIN = Unit.ofQuotient("mW/(m K)", 1, 1e3);

    /** Micropascal seconds, for a dynamic viscosity. */
    public static final Unit<DynamicViscosity> MICROPASCAL_SECOND = Unit.ofQuotient("µPa s", 1, 1e6, "uPa s");

    /** Pascal seconds, for a dynamic viscosity. */
    public static final Unit<DynamicViscosity> PASCAL_SECOND = Unit.of("Pa s", 1);

    /** Millipascal seconds, for a dynamic viscosity. */
    public static final Unit<DynamicViscosity> MILLIPASCAL_SECOND = Unit.ofQuotient("mPa s", 1, 1e3, "cP");

    /** Millinewtons per metre, for a surface tension. */
    public static final Unit<SurfaceTension> MILLINEWTON_PER_METRE = Unit.ofQuotient("mN/m", 1, 1e3);

    /** Newtons per metre, for a surface tension. */
    public static final Unit<SurfaceTension> NEWTON_PER_METRE = Unit.of("N/m", 1);

    /** Metres, for a length. */
    public static final Unit<Length> METRE = Unit.of("m", 1);

    /** Millimetres, for a length. */
    public static final Unit<Length> MILLIMETRE = Unit.ofQuotient("mm", 1, 1e3);

    /** Feet, for a length. */
    public static final Unit<Length> FOOT = Unit.ofQuotient("ft", 3048, 1e4);

    /** Inches, for a length. */
    public static final Unit<Length> INCH = Unit.ofQuotient("in", 254, 1e4);

    /** Square metres, for an area. */
    public static final Unit<Area> SQUARE_METRE = Unit.of("m²", 1);

    /** Square feet, for an area. */
    public static final Unit<Area> SQUARE_FOOT = Unit.ofQuotient("ft²", 9290304, 1e8);

    /** Metres per second, for a speed. */
    public static final Unit<Speed> METRE_PER_SECOND = Unit.of("m/s", 1);

    /** Kilometres per hour, for a speed. */
    public static final Unit<Speed> KILOMETRE_PER_HOUR = Unit.ofQuotient("km/h", 1e3, 3600);

    /** Feet per second, for a speed. */
    public static final Unit<Speed> FOOT_PER_SECOND = Unit.ofQuotient("ft/s", 3048, 1e4);

    /** Revolutions per minute, for a rotational frequency. */
    public static final Unit<RotationalFrequency> REVOLUTION_PER_MINUTE =
            Unit.ofQuotient("1/min", 1, 60, "rpm", "r/min");

    /** Revolutions per second, for a rotational frequency. */
    public static final Unit<RotationalFrequency> REVOLUTION_PER_SECOND = Unit.of("1/s", 1, "r/s");

    /** Hours, for a duration. */
    public static final Unit<Duration> HOUR = Unit.of("h", 3600, "hr");

    /** Seconds, for a duration. */
    public static final Unit<Duration> SECOND = Unit.of("s", 1);

    /** Minutes, for a duration. */
    public static final Unit<Duration> MINUTE = Unit.of("min", 60);

    /** Days, for a duration. */
    public static final Unit<Duration> DAY = Unit.of("d", 86400);

    /** Years of 8760 hours, for a duration. */
    public static final Unit<Duration> YEAR = Unit.of("a", 31536000, "yr");

    /** Units of the currency, for an amount of money. */
    public static final Unit<Money> CURRENCY_UNIT = Unit.of("¤", 1);

    /** Units of the currency per year of 8760 hours, for a money rate. */
    public static final Unit<MoneyRate> CURRENCY_PER_YEAR = Unit.ofQuotient("¤/a", 1, 31536000);

    /** Units of the currency per hour, for a money rate. */
    public static final Unit<MoneyRate> CURRENCY_PER_HOUR = Unit.ofQuotient("¤/h", 1, 3600);

    /** Units of the currency per second, for a money rate. */
    public static final Unit<MoneyRate> CURRENCY_PER_SECOND = Unit.of("¤/s", 1);

    /** Units of the currency per megawatt hour, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_MEGAWATT_HOUR = Unit.ofQuotient("¤/MWh", 1, 3.6e9);

    /** Units of the currency per kilowatt hour, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_KILOWATT_HOUR = Unit.ofQuotient("¤/kWh", 1, 3.6e6);

    /** Units of the currency per gigajoule, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_GIGAJOULE = Unit.ofQuotient("¤/GJ", 1, 1e9);

    /** Units of the currency per joule, for an energy price. */
    public static final Unit<EnergyPrice> CURRENCY_PER_JOULE = Unit.of("¤/J", 1);

    /** Units of the currency per tonne, for a mass price. */
    public static final Unit<MassPrice> CURRENCY_PER_TONNE = Unit.ofQuotient("¤/t", 1, 1e3);

    /** Units of the currency per kilogram, for a mass price. */
    public static final Unit<MassPrice> CURRENCY_PER_KILOGRAM = Unit.of("¤/kg", 1);

    /** Kilograms per megawatt hour, for an emission factor. */
    public static final Unit<EmissionFactor> KILOGRAM_PER_MEGAWATT_HOUR = Unit.ofQuotient("kg/MWh", 1, 3.6e9, "g/kWh");

    /** Kilograms per gigajoule, for an emission factor. */
    public static final Unit<EmissionFactor> KILOGRAM_PER_GIGAJOULE = Unit.ofQuotient("kg/GJ", 1, 1e9, "t/TJ");

    /** Kilograms per joule, for an emission factor. */
    public static final Unit<EmissionFactor> KILOGRAM_PER_JOULE = Unit.of("kg/J", 1);
}
