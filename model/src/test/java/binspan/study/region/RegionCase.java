package binspan.study.region;

import binspan.scenario.Scenario;
import binspan.study.Axis;
import binspan.study.Execution;
import binspan.study.PointEvaluator;
import binspan.study.Progress;
import binspan.study.window.WindowLinks;
import java.util.List;
import java.util.stream.IntStream;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/**
 * A link over two parameters, for the tests of regions.
 *
 * @param name what to call it
 * @param scenario the link
 * @param horizontal first parameter
 * @param vertical second parameter
 */
record RegionCase(String name, Scenario scenario, Axis horizontal, Axis vertical) {
    RegionMap run() {
        return new OperatingRegion(scenario, horizontal, vertical).run(Execution.parallel(Progress.NONE));
    }

    Axis[] axes() {
        return new Axis[] {horizontal, vertical};
    }

    boolean onTheFrame(MapPoint point) {
        return point.x() == horizontal.from()
                || point.x() == horizontal.to()
                || point.y() == vertical.from()
                || point.y() == vertical.to();
    }

    /** Share and area of the Sobol points that meet all requirements: no border runs along their rows. */
    double[] counted(int points) {
        int portion = points / 16;
        return IntStream.range(0, 16)
                .parallel()
                .mapToObj(part -> {
                    SobolSequenceGenerator sequence = new SobolSequenceGenerator(2);
                    sequence.skipTo(part * portion);
                    PointEvaluator evaluator = new PointEvaluator(
                            scenario,
                            List.of(horizontal.parameter(), vertical.parameter()),
                            WindowLinks.margins(scenario));
                    double[] sum = new double[2];
                    for (int i = 0; i < portion; i++) {
                        double[] place = sequence.nextVector();
                        double x = horizontal.at(place[0]);
                        double y = vertical.at(place[1]);
                        if (evaluator.leastMargin(x, y) >= 0.0) {
                            sum[0] += 1.0 / points;
                            sum[1] += slope(horizontal, place[0]) * slope(vertical, place[1]) / points;
                        }
                    }
                    return sum;
                })
                .reduce(new double[2], (a, b) -> new double[] {a[0] + b[0], a[1] + b[1]});
    }

    private static double slope(Axis axis, double share) {
        return (axis.at(share + 1e-6) - axis.at(share - 1e-6)) / 2e-6;
    }

    @Override
    public String toString() {
        return name;
    }
}
