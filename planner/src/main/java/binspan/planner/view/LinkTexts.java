package binspan.planner.view;

import binspan.planner.report.Figure;
import binspan.planner.report.RequirementWords;
import binspan.planner.viewmodel.LinkRoom;
import binspan.planner.viewmodel.Site;
import binspan.planner.viewmodel.Words;
import java.util.OptionalDouble;
import java.util.stream.Collectors;

/** Room for more loss in words. */
final class LinkTexts {
    private LinkTexts() {}

    /** A few words: "room 2.3 dB". */
    static String room(LinkRoom known, Site site) {
        if (!known.stated()) {
            return "";
        }
        if (!known.unmet().isEmpty()) {
            OptionalDouble less = known.shortAt(site);
            return less.isPresent()
                    ? Words.of("link.room.short", Figure.decibels(less.getAsDouble()))
                    : Words.of("link.room.hopeless");
        }
        return known.at(site)
                .map(room -> Words.of("link.room", Figure.decibels(room.extraDb())))
                .orElse("");
    }

    /** A sentence: "room 2.3 dB: then CHSH S fails". */
    static String about(LinkRoom known, Site site) {
        if (!known.unmet().isEmpty()) {
            String names = known.unmet().stream().map(RequirementWords::name).collect(Collectors.joining(", "));
            return Words.of("link.room.fails", names, room(known, site));
        }
        return known.at(site)
                .map(room -> Words.of(
                        "link.room.limit", Figure.decibels(room.extraDb()), RequirementWords.name(room.requirement())))
                .orElseGet(() -> Words.of("link.room.none"));
    }
}
