package lostwork.ledger;

/** What an exergy flow across the boundary of a plant is to its owner. */
public enum BoundaryRole {
    /** What the plant uses up; a flow that leaves reduces it. */
    FUEL("fuel"),
    /** What the plant is there for; a flow that enters, such as its own use of power, reduces it. */
    PRODUCT("product"),
    /** What leaves without use. */
    LOSS("loss");

    private final String words;

    BoundaryRole(String words) {
        this.words = words;
    }

    /** {@return the role in words} */
    @Override
    public String toString() {
        return words;
    }
}
