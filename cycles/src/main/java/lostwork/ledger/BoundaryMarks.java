package lostwork.ledger;

import java.util.HashMap;
import java.util.Map;
import lostwork.plant.HeatPort;
import lostwork.plant.MaterialPort;
import lostwork.plant.Port;

/**
 * Which flow across the boundary of a plant is fuel, product or loss.
 *
 * <p>Unless marked otherwise, everything that enters is fuel, power that leaves is product, and streams and heat that
 * leave are losses. Immutable.
 */
public final class BoundaryMarks {
    private static final BoundaryMarks BY_DIRECTION = new BoundaryMarks(Map.of());

    private final Map<Port, BoundaryRole> marks;

    private BoundaryMarks(Map<Port, BoundaryRole> marks) {
        this.marks = marks;
    }

    /** {@return the marks by direction alone} */
    public static BoundaryMarks byDirection() {
        return BY_DIRECTION;
    }

    /**
     * {@return these marks with another role of a flow}
     *
     * @param port a port at the boundary: of a supply or a discharge, or one of power or heat that is not connected
     * @param role what the flow there is
     */
    public BoundaryMarks with(Port port, BoundaryRole role) {
        final Map<Port, BoundaryRole> more = new HashMap<>(marks);
        more.put(port, role);
        return new BoundaryMarks(Map.copyOf(more));
    }

    /** {@return the role of the flow at a port} */
    BoundaryRole roleOf(Port port, boolean enters) {
        final BoundaryRole marked = marks.get(port);
        if (marked != null) {
            return marked;
        }
        if (enters) {
            return BoundaryRole.FUEL;
        }
        return port instanceof MaterialPort || port instanceof HeatPort ? BoundaryRole.LOSS : BoundaryRole.PRODUCT;
    }

    /** {@return the ports that are marked} */
    Iterable<Port> ports() {
        return marks.keySet();
    }
}
