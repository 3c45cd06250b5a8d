package lostwork.examples.audit;

import java.util.List;
import lostwork.quantity.Energy;
import lostwork.quantity.Power;

/**
 * Sums over the streams of an audit.
 *
 * @param heat heat rejected
 * @param exergyAtSupply flow exergy as the streams leave, of those that have one
 * @param mostWork reversible work
 * @param likelyWork likely work
 * @param heatPerYear heat in a year
 * @param likelyWorkPerYear likely work in a year
 */
record AuditTotals(
        Power heat,
        Power exergyAtSupply,
        Power mostWork,
        Power likelyWork,
        Energy heatPerYear,
        Energy likelyWorkPerYear) {
    static AuditTotals of(List<StreamFigures> streams) {
        Power heat = Power.watts(0);
        Power exergy = Power.watts(0);
        Power most = Power.watts(0);
        Power likely = Power.watts(0);
        Energy heatPerYear = Energy.joules(0);
        Energy workPerYear = Energy.joules(0);
        for (StreamFigures figures : streams) {
            heat = heat.plus(figures.heat().value());
            exergy = exergy.plus(figures.exergyAtSupply().orElse(Power.watts(0)));
            most = most.plus(figures.mostWork().value());
            likely = likely.plus(figures.likelyWork().value());
            heatPerYear = heatPerYear.plus(figures.heatPerYear());
            workPerYear = workPerYear.plus(figures.likelyWorkPerYear());
        }
        return new AuditTotals(heat, exergy, most, likely, heatPerYear, workPerYear);
    }
}
