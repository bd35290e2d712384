package binspan.study;

/** Hears how far a study has come and can stop it. Both methods are called from several threads, often. */
public interface Progress {
    /** Nobody listens. */
    Progress NONE = new Progress() {
        @Override
        public void reached(double share) {
            // nobody listens
        }

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /**
     * Some more is done.
     *
     * @param share of the whole study, 0 to 1
     */
    void reached(double share);

    /** Whether the study shall stop. */
    boolean cancelled();
}
