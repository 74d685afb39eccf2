package org.rodside.study;

/** Where digging forces are taken. */
public enum Edge {
    /** Outermost cutting point, as SAE J1179 has it. */
    TIP,
    /** Cutting edge without teeth, as ISO 6015 has it. */
    LIP;

    /** The place on the tool of a front. */
    public Place of(Front front) {
        return this == TIP ? front.tip() : front.lip();
    }
}
