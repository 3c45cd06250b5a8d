/** Thermodynamic properties of fluids behind one typed face and one small primitive interface. */
module lostwork.fluids {
    requires transitive lostwork.core;
    requires static transitive org.jspecify;

    exports lostwork.fluid;
    exports lostwork.fluid.gas;
    exports lostwork.fluid.water;
}
