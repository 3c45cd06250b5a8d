package lostwork.fluid.water;

/**
 * The backward equations of IAPWS-IF97: first guesses that the basic equations then make exact.
 *
 * <p>R7-97(2012) for T(p,h) and T(p,s) of regions 1 and 2, SR3-03(2014) for T and v of region 3. All quantities in SI.
 */
final class If97Starts {
    /** Subregion 2a ends at 4 MPa. */
    private static final double SUBREGION_2A_TO_PA = 4e6;
    /** Lowest pressure of subregion 2c. */
    private static final double SUBREGION_2C_FROM_PA = 6.5467e6;
    /** The isentrope between subregions 2b and 2c, in J/(kg K). */
    private static final double SUBREGION_2B_FROM_ENTROPY = 5850;
    /** Below the lowest saturation pressure vapour is nearly ideal; the backward equations are used at this pressure. */
    private static final double LOWEST_PA = 611.2;
    /** Entropy at the critical point, SR3-03(2014), in J/(kg K). */
    static final double CRITICAL_ENTROPY = 4412.02148223476;

    static final double GAS_CONSTANT = 461.526;

    private final BackwardEquation t1ph = read("r7-97-table-06-t1-ph");
    private final BackwardEquation t1ps = read("r7-97-table-08-t1-ps");
    private final BackwardEquation t2aph = read("r7-97-table-20-t2a-ph");
    private final BackwardEquation t2bph = read("r7-97-table-21-t2b-ph");
    private final BackwardEquation t2cph = read("r7-97-table-22-t2c-ph");
    private final BackwardEquation t2aps = read("r7-97-table-25-t2a-ps");
    private final BackwardEquation t2bps = read("r7-97-table-26-t2b-ps");
    private final BackwardEquation t2cps = read("r7-97-table-27-t2c-ps");
    private final BackwardEquation t3aph = read("sr3-03-table-03-t3a-ph");
    private final BackwardEquation t3bph = read("sr3-03-table-04-t3b-ph");
    private final BackwardEquation v3aph = read("sr3-03-table-06-v3a-ph");
    private final BackwardEquation v3bph = read("sr3-03-table-07-v3b-ph");
    private final BackwardEquation t3aps = read("sr3-03-table-10-t3a-ps");
    private final BackwardEquation t3bps = read("sr3-03-table-11-t3b-ps");
    private final BackwardEquation v3aps = read("sr3-03-table-13-v3a-ps");
    private final BackwardEquation v3bps = read("sr3-03-table-14-v3b-ps");
    private final CoefficientTable b2bc = CoefficientTable.read("if97/r7-97-table-19-b2bc.txt");
    private final double b2bc1 = b2bc.coefficient(0);
    private final double b2bc2 = b2bc.coefficient(1);
    private final double b2bc3 = b2bc.coefficient(2);

    private final CoefficientTable h2ab = CoefficientTable.read("if97/sr2-01-equation-02-h2ab-s.txt");
    private final CoefficientTable h3ab = CoefficientTable.read("if97/sr3-03-table-02-h3ab-p.txt");
    private final double h3ab1 = h3ab.coefficient(0);
    private final double h3ab2 = h3ab.coefficient(1);
    private final double h3ab3 = h3ab.coefficient(2);
    private final double h3ab4 = h3ab.coefficient(3);

    /** {@return the enthalpy between subregions 3a and 3b above the critical pressure} */
    double enthalpy3ab(double pressure) {
        final double p = pressure / 1e6;
        return 1e3 * (h3ab1 + p * (h3ab2 + p * (h3ab3 + p * h3ab4)));
    }

    private static BackwardEquation read(String name) {
        return BackwardEquation.read(name);
    }

    double region1Enthalpy(double pressure, double enthalpy, Workspace w) {
        return t1ph.value(pressure, enthalpy, w);
    }

    double region1Entropy(double pressure, double entropy, Workspace w) {
        return t1ps.value(pressure, entropy, w);
    }

    double region2Enthalpy(double pressure, double enthalpy, Workspace w) {
        if (pressure <= SUBREGION_2A_TO_PA) {
            return t2aph.value(Math.max(pressure, LOWEST_PA), enthalpy, w);
        }
        if (pressure >= SUBREGION_2C_FROM_PA && pressure > pressure2bc(enthalpy)) {
            return t2cph.value(pressure, enthalpy, w);
        }
        return t2bph.value(pressure, enthalpy, w);
    }

    double region2Entropy(double pressure, double entropy, Workspace w) {
        if (pressure < LOWEST_PA) {
            return t2aps.value(LOWEST_PA, entropy + GAS_CONSTANT * Math.log(pressure / LOWEST_PA), w);
        }
        if (pressure <= SUBREGION_2A_TO_PA) {
            return t2aps.value(pressure, entropy, w);
        }
        return (entropy >= SUBREGION_2B_FROM_ENTROPY ? t2bps : t2cps).value(pressure, entropy, w);
    }

    /** {@return the enthalpy between subregions 2b and 2c, the inverse of {@link #pressure2bc}} */
    double enthalpy2bc(double pressure) {
        return 1e3 * (b2bc.coefficient(3) + Math.sqrt((pressure / 1e6 - b2bc.coefficient(4)) / b2bc3));
    }

    /** {@return the enthalpy between subregions 2a and 2b for a pair of enthalpy and entropy} */
    double enthalpy2ab(double entropy) {
        final double s = entropy / 1e3;
        return 1e3
                * (h2ab.coefficient(0)
                        + s * (h2ab.coefficient(1) + s * (h2ab.coefficient(2) + s * h2ab.coefficient(3))));
    }

    double pressure2bc(double enthalpy) {
        final double h = enthalpy / 1e3;
        return 1e6 * (b2bc1 + h * (b2bc2 + h * b2bc3));
    }

    double region3TemperatureEnthalpy(double pressure, double enthalpy, boolean dense, Workspace w) {
        return (dense ? t3aph : t3bph).value(pressure, enthalpy, w);
    }

    double region3VolumeEnthalpy(double pressure, double enthalpy, boolean dense, Workspace w) {
        return (dense ? v3aph : v3bph).value(pressure, enthalpy, w);
    }

    double region3TemperatureEntropy(double pressure, double entropy, boolean dense, Workspace w) {
        return (dense ? t3aps : t3bps).value(pressure, entropy, w);
    }

    double region3VolumeEntropy(double pressure, double entropy, boolean dense, Workspace w) {
        return (dense ? v3aps : v3bps).value(pressure, entropy, w);
    }
}
