package lostwork.plant;

/** What kind of statement an equation makes. */
public enum EquationTag {
    /** A conservation law or the definition of a quantity; nothing overrules it. */
    LAW,
    /** A relation that describes a machine, such as an efficiency. */
    MODEL,
    /** A simplification, such as "no pressure loss"; it gives way to a given value, and is printed with the results. */
    ASSUMPTION
}
