package binspan.planner.export;

import binspan.planner.table.TableJson;
import binspan.study.tolerance.BuildShare;
import binspan.study.tolerance.FailureDriver;
import binspan.study.tolerance.FigureStatistics;
import binspan.study.tolerance.ParameterSpread;
import binspan.study.tolerance.RequirementShare;
import binspan.study.tolerance.SpreadDistribution;
import binspan.study.tolerance.ToleranceResult;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A tolerance study as JSON: spreads, shares with their confidence intervals, quantiles, drivers. */
final class ToleranceDescription {
    private ToleranceDescription() {}

    static Map<String, Object> of(ToleranceResult result) {
        Map<String, Object> description =
                TableJson.head(result.study().scenario().name(), "tolerance");
        description.put("samples", result.study().samples());
        description.put("seed", result.study().seed());
        description.put("spreads", spreads(result));
        description.put("confidence", BuildShare.CONFIDENCE);
        description.put("all", share(result.all()));
        List<Object> requirements = new ArrayList<>();
        for (RequirementShare each : result.requirements()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("name", each.requirement().fieldName());
            entry.put("required", each.required());
            entry.putAll(share(each.share()));
            requirements.add(entry);
        }
        description.put("requirements", requirements);
        description.put("figures", figures(result));
        description.put("drivers", drivers(result));
        return description;
    }

    private static List<Object> spreads(ToleranceResult result) {
        List<Object> list = new ArrayList<>();
        for (int i = 0; i < result.study().spreads().size(); i++) {
            ParameterSpread spread = result.study().spreads().get(i);
            SpreadDistribution distribution = result.distributions().get(i);
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("path", spread.parameter().path());
            entry.put("unit", spread.parameter().unit());
            entry.put("planned", distribution.planned());
            entry.put("shape", spread.spread().shape().text());
            entry.put("width", distribution.width());
            entry.put("cutShare", distribution.cutShare());
            list.add(entry);
        }
        return list;
    }

    private static Map<String, Object> share(BuildShare share) {
        Map<String, Object> entry = new LinkedHashMap<>();
        entry.put("met", share.met());
        entry.put("share", share.share());
        entry.put("lowest", share.lowest());
        entry.put("highest", share.highest());
        return entry;
    }

    private static List<Object> figures(ToleranceResult result) {
        List<Object> list = new ArrayList<>();
        for (FigureStatistics figure : result.figures()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("name", figure.column().name());
            entry.put("unit", figure.column().unit());
            entry.put("mean", figure.mean());
            entry.put("standardDeviation", figure.standardDeviation());
            for (int i = 0; i < FigureStatistics.SHARES.size(); i++) {
                long percent = Math.round(100.0 * FigureStatistics.SHARES.get(i));
                entry.put("quantile" + percent, figure.quantiles().get(i));
            }
            entry.put("infinite", figure.infinite());
            entry.put("undefined", figure.undefined());
            list.add(StudyDescription.finite(entry));
        }
        return list;
    }

    private static List<Object> drivers(ToleranceResult result) {
        List<Object> list = new ArrayList<>();
        for (FailureDriver driver : result.drivers()) {
            Map<String, Object> entry = new LinkedHashMap<>();
            entry.put("path", driver.path());
            entry.put("rankCorrelation", driver.correlation());
            entry.put("marginIndex", driver.margin().share());
            entry.put("marginIndexError", driver.margin().standardError());
            entry.put("failureIndex", driver.failure().share());
            entry.put("failureIndexError", driver.failure().standardError());
            list.add(StudyDescription.finite(entry));
        }
        return list;
    }
}
