package binspan.study.tolerance;

import binspan.prediction.LinkPrediction;
import binspan.prediction.RequirementMargins;
import binspan.study.Execution;
import binspan.study.FigureColumn;
import binspan.study.FigureReader;
import binspan.study.PointEvaluator;
import binspan.study.StudyTable;
import binspan.study.Workers;
import java.util.ArrayList;
import java.util.List;

/** Predicts the builds of a tolerance study and keeps what its evaluation needs of them. */
final class ToleranceBuilds {
    private static final int PORTION = 256;
    private static final double PREDICTED = 0.9;

    private final Tolerance study;
    private final List<SpreadDistribution> distributions;
    private final RequirementMargins margins;
    private final StudyTable table;
    private final double[] least;
    private final double[][] marginsOf;
    private final double[][] predictedOf;

    ToleranceBuilds(Tolerance study) {
        this.study = study;
        this.distributions = study.distributions();
        this.margins = RequirementMargins.of(study.scenario().require());
        List<String> paths =
                study.spreads().stream().map(each -> each.parameter().path()).toList();
        int required = margins.requirements().size();
        this.table = new StudyTable(paths, study.columns(), study.samples());
        this.least = new double[study.samples()];
        this.marginsOf = new double[required][study.samples()];
        this.predictedOf = new double[required][study.samples()];
    }

    ToleranceResult run(Execution execution) {
        Workers.run(study.samples(), PORTION, execution.part(0.0, PREDICTED), Predicting::new);
        return new ToleranceEvaluation(this).run(execution.part(PREDICTED, 1.0));
    }

    Tolerance study() {
        return study;
    }

    List<SpreadDistribution> distributions() {
        return distributions;
    }

    RequirementMargins margins() {
        return margins;
    }

    StudyTable table() {
        return table;
    }

    /** The least margin of every build. */
    double[] least() {
        return least;
    }

    /** The margin of a requirement in every build. */
    double[] marginsOf(int requirement) {
        return marginsOf[requirement];
    }

    /** The predicted figure of a requirement in every build, in its unit. */
    double[] predictedOf(int requirement) {
        return predictedOf[requirement];
    }

    /** One thread's builds. */
    private final class Predicting implements Workers.Work {
        private final BuildSampler sampler = new BuildSampler(distributions, study.seed());
        private final PointEvaluator evaluator;
        private final FigureReader reader;
        private final double[] figures;

        Predicting() {
            List<FigureColumn> read = new ArrayList<>(study.columns());
            margins.requirements().forEach(each -> read.add(new FigureColumn(each.figure(), 0)));
            this.evaluator = new PointEvaluator(study.scenario(), sampler.parameters(), margins);
            this.reader = new FigureReader(read);
            this.figures = new double[read.size()];
        }

        @Override
        public void on(int first, int end) {
            for (int build = first; build < end; build++) {
                double[] values = build == first ? sampler.at(first) : sampler.next();
                LinkPrediction prediction = evaluator.at(values);
                reader.read(prediction, figures, 0);
                tabulate(build, values);
                judge(build, prediction);
            }
        }

        private void tabulate(int build, double[] values) {
            int start = table.start(build);
            int spreads = distributions.size();
            for (int i = 0; i < spreads; i++) {
                table.numbers()[start + i] = values[sampler.first(i)];
            }
            System.arraycopy(
                    figures,
                    0,
                    table.numbers(),
                    start + spreads,
                    study.columns().size());
        }

        private void judge(int build, LinkPrediction prediction) {
            double tightest = RequirementMargins.AMPLE;
            for (int i = 0; i < marginsOf.length; i++) {
                double margin = margins.margin(i, prediction);
                marginsOf[i][build] = margin;
                predictedOf[i][build] = figures[study.columns().size() + i];
                tightest = Math.min(tightest, margin);
            }
            least[build] = tightest;
            table.meets(build, tightest >= 0.0);
        }
    }
}
