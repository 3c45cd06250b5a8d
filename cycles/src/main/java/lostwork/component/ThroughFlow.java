package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;

/** A component that one stream passes: what all of them have in common. */
abstract class ThroughFlow extends Component implements FlowPath {
    private final Inlet inlet = inlet("inlet");
    private final Outlet outlet = outlet("outlet");

    ThroughFlow(String name) {
        super(name);
    }

    /** {@return where the stream enters} */
    @Override
    public final Inlet inlet() {
        return inlet;
    }

    /** {@return where the stream leaves} */
    @Override
    public final Outlet outlet() {
        return outlet;
    }
}
