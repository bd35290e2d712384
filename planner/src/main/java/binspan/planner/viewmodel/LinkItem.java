package binspan.planner.viewmodel;

import java.util.Optional;

/**
 * One thing in the drawing of the link.
 *
 * @param part what is edited when it is selected; the bands of both photons are one part
 * @param site the arm it belongs to, absent for the source
 * @param kind what it is
 * @param name its label, or what it is in a word
 * @param detail its main number, empty where the loss says everything
 * @param lossDb its loss, dB
 * @param runningDb loss from the source to behind it, dB
 * @param lengthKm its length, km; 0 for everything but fibre
 * @param description everything about it in a sentence
 */
public record LinkItem(
        LinkPart part,
        Optional<Site> site,
        Kind kind,
        String name,
        String detail,
        double lossDb,
        double runningDb,
        double lengthKm,
        String description) {

    /** What is drawn. */
    public enum Kind {
        CLOCK,
        PORT,
        ANALYZER,
        REPAIR,
        FIBRE,
        LOSS,
        FILTER,
        COMPENSATOR,
        COUPLING,
        BAND,
        SOURCE
    }

    /** Whether it stands left of the source. */
    public boolean left() {
        return site.filter(Site.ALICE::equals).isPresent();
    }
}
