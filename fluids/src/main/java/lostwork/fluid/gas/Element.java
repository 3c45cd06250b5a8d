package lostwork.fluid.gas;

import java.util.EnumMap;
import java.util.Map;
import lostwork.quantity.MolarMass;

/** A chemical element that occurs in the species of this package. */
public enum Element {
    /** Hydrogen. */
    HYDROGEN("H"),
    /** Carbon. */
    CARBON("C"),
    /** Nitrogen. */
    NITROGEN("N"),
    /** Oxygen. */
    OXYGEN("O"),
    /** Fluorine. */
    FLUORINE("F"),
    /** Sulfur. */
    SULFUR("S"),
    /** Chlorine. */
    CHLORINE("Cl"),
    /** Helium. */
    HELIUM("He"),
    /** Neon. */
    NEON("Ne"),
    /** Argon. */
    ARGON("Ar"),
    /** Krypton. */
    KRYPTON("Kr"),
    /** Xenon. */
    XENON("Xe");

    private final String symbol;

    Element(String symbol) {
        this.symbol = symbol;
    }

    /** {@return the chemical symbol} */
    public String symbol() {
        return symbol;
    }

    /** {@return the mass of one mole of atoms; the source stands in the resource file {@code elements.txt}} */
    public MolarMass atomicMass() {
        return MolarMass.kilogramsPerMole(atomicMassKilogramPerMole());
    }

    double atomicMassKilogramPerMole() {
        return Masses.KILOGRAM_PER_MOLE.get(this);
    }

    /** Finds the element of a symbol in a data file. */
    static Element of(DataFile.Line line, String symbol) {
        for (Element element : values()) {
            if (element.symbol.equals(symbol)) {
                return element;
            }
        }
        throw line.failure("'" + symbol + "' is no element of this package");
    }

    /** Read when the first mass is asked for. */
    private static final class Masses {
        static final Map<Element, Double> KILOGRAM_PER_MOLE = read();

        private static Map<Element, Double> read() {
            final DataFile file = DataFile.resource("elements.txt");
            final Map<Element, Double> masses = new EnumMap<>(Element.class);
            for (DataFile.Line line : file.lines()) {
                if (masses.put(of(line, line.key()), line.number() * 1e-3) != null) {
                    throw line.failure(line.key() + " is given twice");
                }
            }
            for (Element element : values()) {
                if (!masses.containsKey(element)) {
                    throw file.failure("the mass of " + element.symbol + " is missing");
                }
            }
            return masses;
        }
    }
}
