package binspan.scenario;

/** The photon of an arm that does not say which it carries: the one that the other arm does not. */
final class PartnerPhoton {
    private PartnerPhoton() {}

    /** The same statements with the missing photon added; those of the argument stay as they are. */
    static Values complete(Values stated) {
        Values complete = stated.copy();
        complete(complete, stated, "alice", "bob");
        complete(complete, stated, "bob", "alice");
        return complete;
    }

    private static void complete(Values complete, Values stated, String name, String other) {
        Values arm = stated.section(name);
        if (stated.has(name) && !arm.has("photon") && stated.section(other).get("photon") instanceof Photon taken) {
            complete.put(name, arm.copy().put("photon", taken == Photon.SIGNAL ? Photon.IDLER : Photon.SIGNAL));
        }
    }
}
