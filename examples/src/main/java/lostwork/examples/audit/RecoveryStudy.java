package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntConsumer;
import lostwork.examples.recovery.HotGas;
import lostwork.examples.recovery.NoRecoveryException;
import lostwork.examples.recovery.Recovery;
import lostwork.examples.recovery.RecoveryDesign;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.FlashException;
import lostwork.plant.PlantSolveException;
import lostwork.plant.SpecificationException;
import lostwork.quantity.OutOfRangeException;
import lostwork.solve.SolveException;

/** Looks for the best hot gas of an audit on which a recovery plant can be built. */
final class RecoveryStudy {
    private final AuditResult result;
    private final ReferenceEnvironment ambient;
    private final RecoveryDesign design;

    RecoveryStudy(AuditResult result, RecoveryDesign design) {
        this.result = result;
        this.ambient = result.site().ambient();
        this.design = design;
    }

    /**
     * {@return the plant on the first gas of the ranking that takes one; a plant that cannot be solved passes its stream
     * over with a sentence that says why}
     *
     * @param progress takes how many pressures were tried
     */
    RecoveryOutcome run(IntConsumer progress) {
        final List<String> passedOver = new ArrayList<>();
        for (StreamFigures figures : result.ranked()) {
            if (figures.stream().medium() instanceof Medium.LiquidWater || !figures.hasHeat()) {
                continue;
            }
            try {
                final Recovery recovery = Recovery.of(gas(figures), ambient, design, progress);
                return new RecoveryOutcome(Optional.of(RecoveryProposal.of(figures, recovery)), passedOver);
            } catch (NoRecoveryException e) {
                passedOver.add(figures.stream().tag() + ": " + e.getMessage() + ".");
            } catch (PlantSolveException
                    | SpecificationException
                    | OutOfRangeException
                    | FlashException
                    | SolveException e) {
                passedOver.add(figures.stream().tag() + ": the plant cannot be solved: "
                        + e.getMessage().replaceAll("\\s+", " "));
            }
        }
        return new RecoveryOutcome(Optional.empty(), passedOver);
    }

    private HotGas gas(StreamFigures figures) {
        final SurveyLine stream = figures.stream();
        return new HotGas(
                stream.tag(),
                StreamFluid.of(stream, result.site()).fluid(),
                figures.massFlow(),
                stream.supply(),
                figures.lowestCounted(),
                stream.pressure(),
                figures.likelyWork().value());
    }
}
