package lostwork.component;

import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;

/** One way through a component that has several. */
record Way(Inlet inlet, Outlet outlet) implements FlowPath {}
