package org.wardon.heat.network;

/** Names what a node of a chamber's state belongs to, for messages. */
final class PartNames {
    private final NetworkInputs inputs;
    private final Faces faces;
    private final int ends;
    private final LotPart[] lots;

    PartNames(NetworkInputs inputs, int ends, Faces faces, LotPart[] lots) {
        this.inputs = inputs;
        this.ends = ends;
        this.faces = faces;
        this.lots = lots;
    }

    /** Such as {@code air} or {@code lot M1}, by index into the state. */
    String at(int node) {
        if (node < 2 * ends) {
            String what = node % 2 == AirState.ENTHALPY ? "air" : "humidity of the air";
            return node > AirState.HUMIDITY ? what + " at the door end" : what;
        }
        for (int i = lots.length - 1; i >= 0; i--) {
            if (lots[i].holds(node)) {
                return "lot " + inputs.lots().get(i).id();
            }
        }
        int face = faces.holding(node);
        return face >= 0
                ? "face " + inputs.enclosure().faces().get(face).name()
                : "cooler or structure";
    }
}
