package lostwork.component;

import java.util.List;

/** Numbered ports, counted from 1, and the refusals that go with them. */
final class PortCount {
    /** No real manifold needs more; a larger number is a slip. */
    private static final int MOST = 100;

    private PortCount() {}

    /** {@return the count, when it is a possible one} */
    static int require(String component, String ports, int count, int least) {
        if (!(count >= least && count <= MOST)) {
            throw new IllegalArgumentException(
                    component + ": number of " + ports + " = " + count + " is outside " + least + " .. " + MOST);
        }
        return count;
    }

    /** {@return the port of a number counted from 1} */
    static <P> P get(List<P> ports, String component, String words, int number) {
        if (!(number >= 1 && number <= ports.size())) {
            throw new IllegalArgumentException(
                    component + " has no " + words + " " + number + "; it has " + ports.size() + ", counted from 1");
        }
        return ports.get(number - 1);
    }
}
