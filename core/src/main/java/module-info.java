/** Quantities with units, the laws of exergy, and the numerical roots under both. */
module lostwork.core {
    requires transitive java.measure;
    requires tech.units.indriya;
    requires static transitive org.jspecify;
    requires static org.apiguardian.api;

    exports lostwork.exergy;
    exports lostwork.quantity;
    exports lostwork.solve;
}
