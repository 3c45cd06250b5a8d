package lostwork.process;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiFunction;
import lostwork.fluid.FluidState;
import lostwork.fluid.Phase;
import lostwork.fluid.Saturation;
import lostwork.fluid.SaturationModel;

/** Cuts the path of a step at the saturation line, so that each piece is smooth. */
final class PathPieces {
    /** How many points of a path are looked at for a change of phase. A narrower visit is left to the quadrature. */
    private static final int LOOKS = 32;

    private static final int HALVINGS = 60;

    private PathPieces() {}

    static List<PathPiece> of(ProcessKind kind, double exponent, FluidState from, FluidState to) {
        return switch (kind) {
            case ISOTHERMAL -> alongSaturation(from, to, isothermSaturation(from), PathPiece.Isotherm::new);
            case ISOBARIC -> alongSaturation(from, to, isobarSaturation(from), PathPiece.Isobar::new);
            case ISOCHORIC -> cut(new PathPiece.Isochore(from, to), PathPiece.Isochore::new);
            case ISENTROPIC -> cut(new PathPiece.Isentrope(from, to), PathPiece.Isentrope::new);
            case POLYTROPIC ->
                cut(
                        new PathPiece.Polytrope(from, to, exponent),
                        (first, last) -> new PathPiece.Polytrope(first, last, exponent));
        };
    }

    private static List<Saturation> isothermSaturation(FluidState from) {
        final SaturationModel model = from.fluid().model().saturation();
        final double kelvin = from.temperature().si();
        return model == null || !(kelvin >= model.lowestTemperature() && kelvin < model.criticalTemperature())
                ? List.of()
                : List.of(from.fluid().saturation(from.temperature()));
    }

    private static List<Saturation> isobarSaturation(FluidState from) {
        final SaturationModel model = from.fluid().model().saturation();
        final double pascal = from.pressure().si();
        return model == null || !(pascal >= model.lowestPressure() && pascal < model.criticalPressure())
                ? List.of()
                : List.of(from.fluid().saturation(from.pressure()));
    }

    /** Below the critical point a path at constant temperature or pressure runs liquid, boiling, vapour, or back. */
    private static List<PathPiece> alongSaturation(
            FluidState from,
            FluidState to,
            List<Saturation> saturation,
            BiFunction<FluidState, FluidState, PathPiece> onePhase) {
        final int start = rank(from);
        final int end = rank(to);
        if (saturation.isEmpty() || start == end && start != 1) {
            return List.of(onePhase.apply(from, to));
        }
        final FluidState liquid = saturation.get(0).liquid();
        final FluidState vapour = saturation.get(0).vapour();
        final List<PathPiece> pieces = new ArrayList<>(3);
        FluidState first = from;
        if (start != 1) {
            final FluidState side = start == 0 ? liquid : vapour;
            pieces.add(onePhase.apply(from, side));
            first = side;
        }
        final FluidState last = end == 1 ? to : end == 0 ? liquid : vapour;
        pieces.add(new PathPiece.Boiling(first, last));
        if (end != 1) {
            pieces.add(onePhase.apply(last, to));
        }
        return List.copyOf(pieces);
    }

    private static int rank(FluidState state) {
        return switch (state.phase()) {
            case LIQUID -> 0;
            case TWO_PHASE -> 1;
            default -> 2;
        };
    }

    private static List<PathPiece> cut(PathPiece whole, BiFunction<FluidState, FluidState, PathPiece> part) {
        if (!whole.fluid.hasSaturation()) {
            return List.of(whole);
        }
        final List<PathPiece> pieces = new ArrayList<>(3);
        FluidState first = whole.first;
        double firstAt = whole.begin();
        double before = firstAt;
        boolean boiling = isBoiling(first);
        for (int i = 1; i <= LOOKS; i++) {
            final double here = i == LOOKS ? whole.end() : whole.begin() + (whole.end() - whole.begin()) * i / LOOKS;
            final boolean boilingHere = isBoiling(i == LOOKS ? whole.last : whole.at(here));
            if (boilingHere != boiling) {
                double near = before;
                double far = here;
                for (int k = 0; k < HALVINGS; k++) {
                    final double middle = 0.5 * (near + far);
                    if (isBoiling(whole.at(middle)) == boiling) {
                        near = middle;
                    } else {
                        far = middle;
                    }
                }
                // Both ends of the last bracket differ by rounding only; each piece ends on its own side of the line.
                if (near != firstAt) {
                    pieces.add(part.apply(first, whole.at(near)));
                }
                first = far == whole.end() ? whole.last : whole.at(far);
                firstAt = far;
                boiling = boilingHere;
            }
            before = here;
        }
        if (pieces.isEmpty() || firstAt != whole.end()) {
            pieces.add(part.apply(first, whole.last));
        }
        return List.copyOf(pieces);
    }

    private static boolean isBoiling(FluidState state) {
        return state.phase() == Phase.TWO_PHASE;
    }
}
