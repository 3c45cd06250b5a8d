package lostwork.plant;

/** A way for one stream through a component, from an inlet to an outlet: what a line or a circuit is made of. */
public interface FlowPath {
    /** {@return where the stream enters} */
    Inlet inlet();

    /** {@return where the stream leaves} */
    Outlet outlet();
}
