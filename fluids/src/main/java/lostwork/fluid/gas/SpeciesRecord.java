package lostwork.fluid.gas;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;

/** What the file of one species says, checked. */
record SpeciesRecord(
        String name,
        String description,
        Species.Aggregation aggregation,
        Map<Element, Double> atoms,
        double molarMass,
        double formationEnthalpy,
        String origin,
        String status,
        CaloricCurve curve) {
    /** The gas constant of the source, J/(mol K): only with it do the integration constants give its enthalpies. */
    static final double GAS_CONSTANT_OF_SOURCE = 8.31451;

    /** Largest jump between ranges that the rounding of printed digits explains; see the species index. */
    private static final double LARGEST_JUMP = 1e-6;
    /** The same for a liquid, whose coefficients of 1e9 with ten digits cancel. */
    private static final double LARGEST_JUMP_OF_LIQUID = 1e-4;
    /** How far the enthalpy at 298.15 K may be from the printed formation enthalpy, in J/mol. */
    private static final double ENTHALPY_TOLERANCE = 0.2;

    private static final double REFERENCE_TEMPERATURE_K = 298.15;

    static SpeciesRecord read(DataFile file) {
        String name = "";
        String description = "";
        Species.Aggregation aggregation = Species.Aggregation.GAS;
        Map<Element, Double> atoms = Map.of();
        double molarMass = Double.NaN;
        double formationEnthalpy = Double.NaN;
        String code = "";
        String digits = "";
        String status = "";
        final List<double[]> coefficients = new ArrayList<>();
        final List<Double> limits = new ArrayList<>();
        double[] a = null;
        for (DataFile.Line line : file.lines()) {
            switch (line.key()) {
                case "name" -> name = line.value();
                case "description" -> description = line.value();
                case "phase" -> aggregation = aggregation(line);
                case "elements" -> atoms = atoms(line);
                case "molar mass, g/mol" -> molarMass = line.number() * 1e-3;
                case "formation enthalpy at 298.15 K, J/mol" -> formationEnthalpy = line.number();
                case "H(298.15 K) - H(0 K), J/mol" -> line.number();
                case "origin of H(298.15 K) - H(0 K)" -> line.value();
                case "reference code of the source" -> code = ", code " + line.value();
                case "origin of the digits" -> digits = line.value();
                case "status" -> status = line.value();
                case "range, K" -> {
                    final double[] range = line.numbers(2);
                    if (!(range[0] < range[1])) {
                        throw line.failure("the range ends at or below its beginning");
                    }
                    if (limits.isEmpty()) {
                        limits.add(range[0]);
                    } else if (limits.get(limits.size() - 1) != range[0]) {
                        throw line.failure("the range does not begin where the one before ends");
                    }
                    limits.add(range[1]);
                }
                case "a1..a7" -> a = line.numbers(7);
                case "b1 b2" -> {
                    final double[] b = line.numbers(2);
                    if (a == null || coefficients.size() != limits.size() - 2) {
                        throw line.failure("a range is written as three lines: range, a1..a7, b1 b2");
                    }
                    coefficients.add(new double[] {a[0], a[1], a[2], a[3], a[4], a[5], a[6], b[0], b[1]});
                    a = null;
                }
                default -> throw line.failure("unknown key '" + line.key() + "'");
            }
        }
        if (name.isEmpty() || atoms.isEmpty() || !(molarMass > 0) || Double.isNaN(formationEnthalpy)) {
            throw file.failure("name, elements, molar mass or formation enthalpy is missing");
        }
        if (coefficients.isEmpty() || coefficients.size() != limits.size() - 1) {
            throw file.failure("the coefficients of a range are missing");
        }
        final double[] joints = limits.stream().mapToDouble(Double::doubleValue).toArray();
        final double[][] printed = coefficients.toArray(double[][]::new);
        final double jump = CaloricCurve.largestJump(joints, printed);
        final double allowed = aggregation == Species.Aggregation.LIQUID ? LARGEST_JUMP_OF_LIQUID : LARGEST_JUMP;
        if (!(jump <= allowed)) {
            throw file.failure("the ranges meet with a jump of " + jump + " in cp/R, H/RT or S/R; " + "more than "
                    + allowed + " is a wrong digit");
        }
        final CaloricCurve curve = CaloricCurve.ofRanges(joints, printed, GAS_CONSTANT_OF_SOURCE);
        final double atReference = curve.enthalpy(REFERENCE_TEMPERATURE_K);
        if (!(Math.abs(atReference - formationEnthalpy) <= ENTHALPY_TOLERANCE)) {
            throw file.failure("the enthalpy at 298.15 K is " + atReference + " J/mol, not the formation enthalpy "
                    + formationEnthalpy + " J/mol; one of them has a wrong digit");
        }
        return new SpeciesRecord(
                name,
                description,
                aggregation,
                atoms,
                molarMass,
                formationEnthalpy,
                "digits: " + digits + code,
                status,
                curve);
    }

    private static Species.Aggregation aggregation(DataFile.Line line) {
        return switch (line.value()) {
            case "gas" -> Species.Aggregation.GAS;
            case "liquid" -> Species.Aggregation.LIQUID;
            case "solid" -> Species.Aggregation.SOLID;
            default -> throw line.failure("the phase is gas, liquid or solid");
        };
    }

    private static Map<Element, Double> atoms(DataFile.Line line) {
        final String[] words = line.value().split("\\s+");
        if (words.length % 2 != 0) {
            throw line.failure("expected pairs of an element and its count");
        }
        final Map<Element, Double> atoms = new EnumMap<>(Element.class);
        for (int i = 0; i < words.length; i += 2) {
            atoms.put(Element.of(line, words[i]), line.finite(words[i + 1]));
        }
        return atoms;
    }
}
