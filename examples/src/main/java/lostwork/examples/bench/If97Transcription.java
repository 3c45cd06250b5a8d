package lostwork.examples.bench;

/**
 * Volume, enthalpy and entropy of regions 1 and 2 as the release prints them: IAPWS R7-97(2012), equations 7, 15 to 17,
 * Tables 3, 13 and 14, one term after the other with powers of the arguments.
 */
final class If97Transcription {
    private static final double GAS_CONSTANT = 461.526;

    private final double[][] region1 = CoefficientFile.terms("r7-97-table-02-region1");
    private final double[][] ideal2 = CoefficientFile.terms("r7-97-table-10-region2-ideal");
    private final double[][] residual2 = CoefficientFile.terms("r7-97-table-11-region2-residual");

    /** In m³/kg. */
    double volume;
    /** In J/kg. */
    double enthalpy;
    /** In J/(kg K). */
    double entropy;

    void region1(double temperature, double pressure) {
        final double pi = pressure / 16.53e6;
        final double tau = 1386 / temperature;
        double gamma = 0;
        double byPi = 0;
        double byTau = 0;
        for (double[] term : region1) {
            final double i = term[0];
            final double j = term[1];
            final double n = term[2];
            gamma += n * Math.pow(7.1 - pi, i) * Math.pow(tau - 1.222, j);
            byPi -= n * i * Math.pow(7.1 - pi, i - 1) * Math.pow(tau - 1.222, j);
            byTau += n * Math.pow(7.1 - pi, i) * j * Math.pow(tau - 1.222, j - 1);
        }
        properties(temperature, pressure, pi, tau, gamma, byPi, byTau);
    }

    void region2(double temperature, double pressure) {
        final double pi = pressure / 1e6;
        final double tau = 540 / temperature;
        double gamma = Math.log(pi);
        double byPi = 1 / pi;
        double byTau = 0;
        for (double[] term : ideal2) {
            gamma += term[2] * Math.pow(tau, term[1]);
            byTau += term[2] * term[1] * Math.pow(tau, term[1] - 1);
        }
        for (double[] term : residual2) {
            final double i = term[0];
            final double j = term[1];
            final double n = term[2];
            gamma += n * Math.pow(pi, i) * Math.pow(tau - 0.5, j);
            byPi += n * i * Math.pow(pi, i - 1) * Math.pow(tau - 0.5, j);
            byTau += n * Math.pow(pi, i) * j * Math.pow(tau - 0.5, j - 1);
        }
        properties(temperature, pressure, pi, tau, gamma, byPi, byTau);
    }

    private void properties(
            double temperature, double pressure, double pi, double tau, double gamma, double byPi, double byTau) {
        volume = GAS_CONSTANT * temperature / pressure * pi * byPi;
        enthalpy = GAS_CONSTANT * temperature * tau * byTau;
        entropy = GAS_CONSTANT * (tau * byTau - gamma);
    }
}
