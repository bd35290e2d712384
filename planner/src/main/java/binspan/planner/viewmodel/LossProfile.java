package binspan.planner.viewmodel;

import binspan.planner.viewmodel.LinkItem.Kind;
import binspan.planner.viewmodel.LinkLayout.Column;
import binspan.units.Digits;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;

/**
 * The running loss of an arm as a line from the source outwards: a step at each component, a slope along fibre, as a
 * reflectometer would draw it.
 *
 * @param site the arm
 * @param line corners, from the source outwards
 * @param numbers running losses at the larger steps, none over another
 * @param totalDb loss of the arm, dB
 * @param endX where the loss ends and the room for more may be drawn, px
 * @param rimX outer end of the drawing, px
 */
public record LossProfile(
        Site site, List<Corner> line, List<LossNumber> numbers, double totalDb, double endX, double rimX) {
    private static final double DIGIT_EM = 0.52;
    private static final double GAP_EM = 0.5;

    /** Copies the lists. */
    public LossProfile {
        line = List.copyOf(line);
        numbers = List.copyOf(numbers);
    }

    /**
     * A corner of the line.
     *
     * @param x place, px
     * @param db loss from the source, dB
     */
    public record Corner(double x, double db) {}

    /**
     * A number at the line; it stands outside its place, seen from the source.
     *
     * @param x place of its inner end, px
     * @param db height, dB
     * @param width room for it, px
     * @param text the number
     */
    public record LossNumber(double x, double db, double width, String text) {}

    /**
     * The profile of an arm.
     *
     * @param site the arm
     * @param items what is drawn
     * @param layout where
     * @param em size of the numbers' text, px
     */
    public static LossProfile of(Site site, List<LinkItem> items, LinkLayout layout, double em) {
        Drawing drawing = new Drawing(site, items, layout);
        List<Column> outwards = new ArrayList<>(layout.columns());
        if (site == Site.ALICE) {
            Collections.reverse(outwards);
        }
        outwards.forEach(drawing::column);
        double rim = site == Site.ALICE ? 0.0 : layout.width();
        List<Corner> line = drawing.line;
        return new LossProfile(
                site,
                line,
                placed(drawing.steps, em),
                drawing.running,
                line.get(line.size() - 1).x(),
                rim);
    }

    /** Whether it goes to the left. */
    public boolean leftwards() {
        return site == Site.ALICE;
    }

    /** The larger steps first, each where no number stands yet. The last step is left to the total. */
    private static List<LossNumber> placed(List<Step> steps, double em) {
        List<LossNumber> placed = new ArrayList<>();
        steps.stream()
                .limit(Math.max(0, steps.size() - 1))
                .sorted(Comparator.comparingDouble(Step::lossDb).reversed())
                .forEach(step -> {
                    String text = Digits.decimals(step.db(), 1);
                    LossNumber number =
                            new LossNumber(step.x(), step.db(), (text.length() * DIGIT_EM + GAP_EM) * em, text);
                    if (steps.get(steps.size() - 1).clears(number)
                            && placed.stream().noneMatch(other -> overlap(step.outward(), number, other))) {
                        placed.add(number);
                    }
                });
        return placed;
    }

    private static boolean overlap(double outward, LossNumber one, LossNumber other) {
        double first = one.x() * outward;
        double second = other.x() * outward;
        return first < second + other.width() && second < first + one.width();
    }

    /** A step of the line: where its level begins, how much it is, which way is out. */
    private record Step(double x, double db, double lossDb, double outward) {
        /** Whether a number ends before this step. */
        boolean clears(LossNumber number) {
            return number.x() * outward + number.width() <= x * outward;
        }
    }

    /** The line as far as it is drawn. */
    private static final class Drawing {
        private final Site site;
        private final List<LinkItem> items;
        private final double outward;
        private final List<Corner> line = new ArrayList<>();
        private final List<Step> steps = new ArrayList<>();
        private double running;

        Drawing(Site site, List<LinkItem> items, LinkLayout layout) {
            this.site = site;
            this.items = items;
            this.outward = site == Site.ALICE ? -1.0 : 1.0;
            line.add(new Corner(sourceX(layout), 0.0));
        }

        private double sourceX(LinkLayout layout) {
            return layout.columns().stream()
                    .filter(column -> column.kind() == Kind.SOURCE)
                    .mapToDouble(Column::centre)
                    .findFirst()
                    .orElseThrow();
        }

        void column(Column column) {
            LinkItem item = items.get(column.items().get(0));
            if (item.site().filter(site::equals).isEmpty() || item.kind() == Kind.BAND) {
                return;
            }
            if (item.kind() == Kind.PORT || item.kind() == Kind.CLOCK) {
                return;
            }
            boolean fibre = item.kind() == Kind.FIBRE;
            double outer = site == Site.ALICE ? column.x() : column.right();
            double inner = site == Site.ALICE ? column.right() : column.x();
            line.add(new Corner(fibre ? inner : column.centre(), running));
            running = item.runningDb();
            double x = fibre ? outer : column.centre();
            line.add(new Corner(x, running));
            if (item.lossDb() > 0.0) {
                steps.add(new Step(x, running, item.lossDb(), outward));
            }
        }
    }
}
