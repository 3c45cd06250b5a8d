package lostwork.process;

import java.util.ArrayList;
import java.util.List;
import lostwork.fluid.FluidState;

/** Finds where a polytropic path turns from taking heat in to giving heat off, or back. */
final class HeatTurns {
    private static final int LOOKS = 64;

    private static final int HALVINGS = 60;

    private HeatTurns() {}

    /** {@return the states at the turns, in order, and the end of the path} */
    static List<FluidState> along(FluidState from, FluidState to, double exponent) {
        final PathPiece.Polytrope path = new PathPiece.Polytrope(from, to, exponent);
        final List<FluidState> ends = new ArrayList<>(2);
        final double length = path.end() - path.begin();
        boolean taking = isTaking(path, path.begin());
        for (int i = 1; i <= LOOKS && length != 0; i++) {
            final double here = path.begin() + length * i / LOOKS;
            final boolean takingHere = isTaking(path, here);
            if (takingHere != taking) {
                double near = path.begin() + length * (i - 1) / LOOKS;
                double far = here;
                for (int k = 0; k < HALVINGS; k++) {
                    final double middle = 0.5 * (near + far);
                    if (isTaking(path, middle) == taking) {
                        near = middle;
                    } else {
                        far = middle;
                    }
                }
                ends.add(path.at(near));
                taking = takingHere;
            }
        }
        ends.add(to);
        return ends;
    }

    /** Whether heat is taken in on the way to larger volumes; for a compression the sign is the other one all along. */
    private static boolean isTaking(PathPiece.Polytrope path, double logVolume) {
        return path.heatByLogVolume(path.at(logVolume)) > 0;
    }
}
