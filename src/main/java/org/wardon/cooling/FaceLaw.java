package org.wardon.cooling;

/**
 * The law of a cooler that acts on faces: it does nothing to the air but through them, and draws
 * the power of its pump while it runs.
 *
 * @param pumpW electric power of its pump, W
 */
public record FaceLaw(double pumpW) implements CoolerLaw {
    @Override
    public int ownStates() {
        return 0;
    }

    @Override
    public void effect(CoolerInputs in, CoolerEffect out) {
        out.clear();
        out.ran = in.run;
        out.ranByRun = 1;
        out.electricW = pumpW * in.run;
        out.electricByRun = pumpW;
    }
}
