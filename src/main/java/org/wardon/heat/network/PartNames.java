package org.wardon.heat.network;

/** Names what a node of a chamber's state belongs to, for messages. */
final class PartNames {
    private final NetworkInputs inputs;
    private final FacePart[] faces;
    private final LotPart[] lots;

    PartNames(NetworkInputs inputs, FacePart[] faces, LotPart[] lots) {
        this.inputs = inputs;
        this.faces = faces;
        this.lots = lots;
    }

    /** Such as {@code air} or {@code lot M1}, by index into the state. */
    String at(int node) {
        if (node <= AirState.HUMIDITY) {
            return node == AirState.ENTHALPY ? "air" : "humidity of the air";
        }
        for (int i = lots.length - 1; i >= 0; i--) {
            if (lots[i].holds(node)) {
                return "lot " + inputs.lots().get(i).id();
            }
        }
        for (int i = faces.length - 1; i >= 0; i--) {
            if (node >= faces[i].firstNode() && node <= faces[i].lastNode()) {
                return "face " + inputs.enclosure().faces().get(i).name();
            }
        }
        return "cooler or structure";
    }
}
