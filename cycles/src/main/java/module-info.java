/** Plants solved from their equations, closed-system processes, and exergy ledgers. */
module lostwork.cycles {
    requires transitive lostwork.fluids;
    requires static transitive org.jspecify;
    requires commons.math3;

    exports lostwork.plant;
}
