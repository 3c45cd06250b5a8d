/**
 * Exergy accounting of a solved plant: where the work is lost.
 *
 * <h2>Theory</h2>
 * <p>At steady state a component takes up exergy with streams, heat and power and gives exergy off in the same ways; what
 * is missing has been destroyed. The specific physical exergy of a stream is e = h − h₀ − T₀ (s − s₀), split into a thermal
 * and a mechanical part; heat Q that passes at a temperature T carries (1 − T₀/T) Q; power is exergy. The same destruction
 * follows from the entropy that the component generates: Ė<sub>D</sub> = T₀ Ṡ<sub>gen</sub> (Gouy–Stodola). The ledger
 * computes both and shows the difference. Since both books use the same enthalpies and entropies, their agreement proves
 * the bookkeeping, not the properties.
 *
 * <p>Fuel and product of a component follow its {@link lostwork.plant.ExergyPurpose}; what crosses the boundary of the plant
 * is fuel, product or loss by {@link lostwork.ledger.BoundaryMarks}. Heat that passes a port whose temperature nothing
 * settles counts as passing at T₀: its exergy is destroyed inside the component.
 *
 * <p>Where the model of a fluid does not reach the ambient temperature, as for water in frost, its exergy counts from the
 * nearest state of the model, and the ledger says so. Destructions and differences of streams do not depend on that.
 *
 * <p>Sources: A. Bejan, G. Tsatsaronis, M. Moran, Thermal Design and Optimization, Wiley 1996, chapter 3; A. Lazzaretto,
 * G. Tsatsaronis, Energy 31 (2006) 1257–1289.
 *
 * <h2>Limits of this form</h2>
 * <p>Physical exergy only: kinetic, potential and chemical exergy are left out, so a plant that burns a fuel is not
 * accounted for from the fuel on.
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null. All types are immutable and thread-safe.
 */
@NullMarked
package lostwork.ledger;

import org.jspecify.annotations.NullMarked;
