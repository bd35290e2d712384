package binspan.planner.viewmodel;

import binspan.planner.viewmodel.MapReading.Kind;
import binspan.study.region.MapPoint;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;

/** Reads points of the map: the one under the pointer, else the one that was clicked, else the present one. */
public final class MapReader {
    private final Supplier<MapQuestion> question;
    private final MapHandle handle;
    private final LatestTask task;
    private final ReadOnlyObjectWrapper<MapReading> reading = new ReadOnlyObjectWrapper<>(this, "reading");
    private final ReadOnlyObjectWrapper<MapPoint> picked = new ReadOnlyObjectWrapper<>(this, "picked");
    private MapPoint underPointer;

    /**
     * A reader.
     *
     * @param question what the map asks now; null where there is no map
     * @param handle the present point
     * @param background where points are computed
     */
    MapReader(Supplier<MapQuestion> question, MapHandle handle, Background background) {
        this.question = question;
        this.handle = handle;
        this.task = LatestTask.quick(background);
    }

    /** What the read-out says; null while nothing is read. */
    public ReadOnlyObjectProperty<MapReading> readingProperty() {
        return reading.getReadOnlyProperty();
    }

    /** The point that was clicked; null if none was. */
    public ReadOnlyObjectProperty<MapPoint> pickedProperty() {
        return picked.getReadOnlyProperty();
    }

    /** Picks a point to read. */
    public void pick(double x, double y) {
        picked.set(new MapPoint(x, y));
        read();
    }

    /** Picks the present point of the design. */
    public void pickPresent() {
        handle.shown().ifPresent(at -> pick(at.x(), at.y()));
    }

    /** Forgets the picked point. */
    public void unpick() {
        picked.set(null);
        read();
    }

    /** Reads the point under the pointer until it leaves. */
    public void hover(double x, double y) {
        underPointer = new MapPoint(x, y);
        read();
    }

    /** The pointer has left the map. */
    public void leave() {
        underPointer = null;
        read();
    }

    /** Moves the design to the picked point, if there is one. */
    public void moveToPicked() {
        MapPoint at = picked.get();
        if (at != null) {
            handle.moveTo(at.x(), at.y());
        }
    }

    /** The axes have changed: points of the old ones mean nothing. */
    void forget() {
        picked.set(null);
        underPointer = null;
        reading.set(null);
    }

    /** Reads the present choice of point anew. */
    void read() {
        MapQuestion asked = question.get();
        Kind kind = underPointer != null ? Kind.UNDER_POINTER : picked.get() != null ? Kind.PICKED : Kind.PRESENT;
        MapPoint at = place(kind);
        if (asked == null || at == null) {
            reading.set(null);
            return;
        }
        task.run(
                progress -> new MapReading(kind, asked.verdict(at.x(), at.y())),
                found -> show(asked, found),
                reason -> reading.set(null));
    }

    private MapPoint place(Kind kind) {
        return switch (kind) {
            case UNDER_POINTER -> underPointer;
            case PICKED -> picked.get();
            case PRESENT -> handle.place().orElse(null);
        };
    }

    private void show(MapQuestion asked, MapReading found) {
        MapQuestion now = question.get();
        if (now != null && now.sameAxes(asked)) {
            reading.set(found);
        }
    }
}
