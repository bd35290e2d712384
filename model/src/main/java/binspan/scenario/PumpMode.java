package binspan.scenario;

/** How the pump light of the pair source is emitted. */
public enum PumpMode implements Choice {
    /** A laser that never stops: pairs at random times, energy-time entanglement. */
    CONTINUOUS("continuous"),
    /** Two coherent pulses in each cycle, one bin separation apart. */
    PULSE_PAIR("pulse-pair"),
    /** An endless train of coherent pulses, one bin separation apart. */
    PULSE_TRAIN("pulse-train");

    private final String text;

    PumpMode(String text) {
        this.text = text;
    }

    @Override
    public String text() {
        return text;
    }
}
