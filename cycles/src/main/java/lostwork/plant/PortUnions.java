package lostwork.plant;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lostwork.fluid.Fluid;

/** Which ports share a state, a mass flow, a fluid, a power or a heat rate while a plant is built (union–find). */
final class PortUnions {
    private final Map<Port, Integer> indices = new HashMap<>();
    private final List<Port> ports = new ArrayList<>();
    private final int[] state;
    private final int[] flow;
    private final int[] fluid;
    private final int[] transfer;
    private final Map<MaterialPort, Fluid> fluids = new LinkedHashMap<>();

    /**
     * Starts with every port on its own.
     *
     * @param sorted the ports of the plant, in a fixed order
     */
    PortUnions(List<Port> sorted) {
        for (Port port : sorted) {
            indices.put(port, ports.size());
            ports.add(port);
        }
        state = identity(sorted.size());
        flow = identity(sorted.size());
        fluid = identity(sorted.size());
        transfer = identity(sorted.size());
    }

    private static int[] identity(int n) {
        final int[] roots = new int[n];
        for (int i = 0; i < n; i++) {
            roots[i] = i;
        }
        return roots;
    }

    void connect(Port from, Port to) {
        if (from instanceof MaterialPort a && to instanceof MaterialPort b) {
            sameState(a, b);
            sameFlow(a, b);
        } else {
            union(transfer, from, to);
        }
    }

    void sameState(MaterialPort a, MaterialPort b) {
        union(state, a, b);
        union(fluid, a, b);
    }

    void sameFlow(MaterialPort a, MaterialPort b) {
        union(flow, a, b);
        union(fluid, a, b);
    }

    void sameFluid(MaterialPort a, MaterialPort b) {
        union(fluid, a, b);
    }

    void fluid(MaterialPort port, Fluid substance) {
        fluids.put(port, substance);
    }

    /** {@return the fluids that were stated, by the port they were stated for} */
    Map<MaterialPort, Fluid> statedFluids() {
        return fluids;
    }

    int stateRoot(Port port) {
        return find(state, index(port));
    }

    int flowRoot(Port port) {
        return find(flow, index(port));
    }

    int fluidRoot(Port port) {
        return find(fluid, index(port));
    }

    int transferRoot(Port port) {
        return find(transfer, index(port));
    }

    private int index(Port port) {
        final Integer index = indices.get(port);
        if (index == null) {
            throw new IllegalArgumentException(port + " belongs to no component of this plant");
        }
        return index;
    }

    /** The smaller index becomes the root, so that roots do not depend on the order of the unions. */
    private void union(int[] roots, Port a, Port b) {
        final int x = find(roots, index(a));
        final int y = find(roots, index(b));
        roots[Math.max(x, y)] = Math.min(x, y);
    }

    private static int find(int[] roots, int i) {
        int root = i;
        while (roots[root] != root) {
            root = roots[root];
        }
        int walk = i;
        while (roots[walk] != root) {
            final int next = roots[walk];
            roots[walk] = root;
            walk = next;
        }
        return root;
    }
}
