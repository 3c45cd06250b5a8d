/** Plants solved from their equations, closed-system processes, and exergy ledgers. */
module lostwork.cycles {
    requires transitive lostwork.fluids;
    requires static transitive org.jspecify;

    exports lostwork.component;
    exports lostwork.ledger;
    exports lostwork.plant;
    exports lostwork.process;
    exports lostwork.report;
}
