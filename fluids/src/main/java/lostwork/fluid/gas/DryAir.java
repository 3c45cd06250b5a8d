package lostwork.fluid.gas;

import lostwork.fluid.Provenance;

/**
 * Dry air as an ideal gas mixture: nitrogen 78.084, oxygen 20.9476, argon 0.9365, carbon dioxide 0.0319 mole percent.
 *
 * <p>Source of the composition: NASA/TP-2002-211556; the resource file {@code dry-air.txt} says more.
 *
 * <pre>{@code
 * DryAir.standard().state(celsius(15), bar(1));
 * }</pre>
 */
public final class DryAir extends IdealGas {
    private static final DryAir STANDARD = new DryAir(read(DataFile.resource("dry-air.txt")));

    private DryAir(GasComposition composition) {
        super(new IdealGasModel(
                "dry air",
                composition,
                new Provenance.Source("composition: species Air of NASA/TP-2002-211556", "from memory")));
    }

    /** {@return dry air of the standard composition} */
    public static DryAir standard() {
        return STANDARD;
    }

    private static GasComposition read(DataFile file) {
        final GasComposition.Builder builder = GasComposition.byMole();
        for (DataFile.Line line : file.lines()) {
            builder.add(Species.of(line.key()), line.number());
        }
        return builder.build();
    }
}
