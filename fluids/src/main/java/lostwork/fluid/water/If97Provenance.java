package lostwork.fluid.water;

import lostwork.fluid.Provenance;

/** What the industrial formulation says of itself. */
final class If97Provenance {
    private static final String ORIGIN = "coefficients from memory, confirmed by the release's check values";

    static final Provenance PROVENANCE = Provenance.of("IAPWS-IF97")
            .withSource(
                    "IAPWS R7-97(2012), Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic"
                            + " Properties of Water and Steam",
                    ORIGIN)
            .withSource(
                    "IAPWS SR3-03(2014), Revised Supplementary Release on Backward Equations T(p,h), v(p,h), T(p,s),"
                            + " v(p,s) for Region 3",
                    ORIGIN)
            .withRange("273.15 K to 1073.15 K up to 100 MPa; 1073.15 K to 2273.15 K up to 50 MPa")
            .withUncertainty("as the release states by region; from memory: in the liquid 0.003 % to 0.3 % in density,"
                    + " in superheated steam 0.02 % to 0.3 %, 0.1 % in saturation pressure to 0.025 % near 100 degC")
            .withDatum("u = 0 and s = 0 in the saturated liquid at the triple point, 273.16 K");

    private If97Provenance() {}
}
