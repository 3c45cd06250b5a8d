package lostwork.fluid.water;

import lostwork.fluid.Provenance;

/** What the industrial formulation says of itself. */
final class If97Provenance {
    private static final String ORIGIN = "coefficients from memory, confirmed by the check values of the release";

    static final Provenance PROVENANCE = Provenance.of("IAPWS-IF97, the IAPWS Industrial Formulation 1997")
            .withSource(
                    "IAPWS R7-97(2012), Revised Release on the IAPWS Industrial Formulation 1997 for the Thermodynamic"
                            + " Properties of Water and Steam",
                    ORIGIN)
            .withSource(
                    "IAPWS SR2-01(2014), Revised Supplementary Release on Backward Equations for Pressure as a Function of"
                            + " Enthalpy and Entropy p(h,s) for Regions 1 and 2",
                    ORIGIN)
            .withSource(
                    "IAPWS SR3-03(2014), Revised Supplementary Release on Backward Equations for the Functions T(p,h),"
                            + " v(p,h) and T(p,s), v(p,s) for Region 3",
                    ORIGIN)
            .withSource(
                    "IAPWS SR4-04(2014), Revised Supplementary Release on Backward Equations p(h,s) for Region 3,"
                            + " Equations as a Function of h and s for the Region Boundaries, and an Equation Tsat(h,s) for"
                            + " Region 4",
                    ORIGIN)
            .withSource(
                    "J. D. Cox, D. D. Wagman, V. A. Medvedev, CODATA Key Values for Thermodynamics (1989): formation"
                            + " enthalpy and entropy of liquid water",
                    "from memory")
            .withRange("273.15 K to 1073.15 K, 1 Pa to 100 MPa; 1073.15 K to 2273.15 K, 1 Pa to 50 MPa")
            .withUncertainty("published by region in diagrams of R7-97(2012); from memory: density of the liquid within"
                    + " 0.003 % to 0.3 %, of steam within 0.1 % to 0.3 %, saturation pressure within 0.025 % to 0.1 %;"
                    + " larger about the critical point")
            .withDatum("u = 0 and s = 0 in the saturated liquid at the triple point, 273.16 K")
            .withReservation(
                    "the regions meet with small steps: up to 0.018 % in v, 0.13 kJ/kg in h and 0.18 J/(kg K) in s"
                            + " between regions 2 and 3, 0.03 kJ/kg at 623.15 K, 0.1 kJ/kg at 1073.15 K")
            .withReservation("between 647.0959 K and the critical temperature saturated densities are interpolated");

    private If97Provenance() {}
}
