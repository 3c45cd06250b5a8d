package lostwork.plant.kernel;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Finds redundant mass balances by exact elimination of their rows of plus and minus ones.
 *
 * <p>In a closed network the balances of the nodes are not independent: one of them follows from the others. A maximum
 * matching cannot see that where the flow circulates, exact arithmetic can.
 */
public final class BalanceRows {
    private final List<TreeMap<Integer, BigInteger>> reduced = new ArrayList<>();

    /** Starts without any balance. */
    public BalanceRows() {}

    /**
     * Adds a balance when it is independent of those added before.
     *
     * @param row the coefficient of each flow: +1 into the node, −1 out of it; zeros are left out
     * @return whether the balance is independent
     */
    public boolean addIfIndependent(Map<Integer, Integer> row) {
        final TreeMap<Integer, BigInteger> rest = new TreeMap<>();
        row.forEach((flow, sign) -> {
            if (sign != 0) {
                rest.put(flow, BigInteger.valueOf(sign));
            }
        });
        for (TreeMap<Integer, BigInteger> pivot : reduced) {
            final BigInteger head = rest.get(pivot.firstKey());
            if (head != null) {
                final BigInteger lead = pivot.firstEntry().getValue();
                rest.replaceAll((flow, value) -> value.multiply(lead));
                pivot.forEach(
                        (flow, value) -> rest.merge(flow, value.multiply(head).negate(), BigInteger::add));
                rest.values().removeIf(value -> value.signum() == 0);
            }
        }
        if (rest.isEmpty()) {
            return false;
        }
        reduced.add(rest);
        return true;
    }
}
