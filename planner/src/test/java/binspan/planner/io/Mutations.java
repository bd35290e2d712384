package binspan.planner.io;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Damages texts in the ways that hands and disks do, the same ways for the same seed. */
public final class Mutations {
    private static final Pattern TOKEN = Pattern.compile("\"[^\"\n]*\"|[-+0-9.eE]+|[a-zA-Z]+|[{}\\[\\],:]");
    private static final Pattern NUMBER = Pattern.compile("(?<![\\w\".])-?[0-9][0-9.eE+-]*");
    private static final String CHARACTERS = "{}[]\",:/*\\ \n\t\r0123456789eE+-.#'abnul\u0000\u00e9\u00ff";
    private static final List<String> VALUES = List.of(
            "-1",
            "0",
            "-0.0",
            "0.5",
            "1.0",
            "2",
            "1e9",
            "1e999",
            "-1e999",
            "1e-999",
            "NaN",
            "Infinity",
            "00",
            "1.",
            ".5",
            "99999999999999999999",
            "null",
            "true",
            "\"10\"",
            "\"\"",
            "[]",
            "{}",
            "[[]]",
            "{\"a\":1}",
            "4.9e-324",
            "1.7976931348623157e308");

    private final Random random;

    /** Damage of a seed. */
    public Mutations(long seed) {
        random = new Random(seed);
    }

    /** The text with one to three parts damaged, as bytes. */
    public byte[] damaged(String text) {
        String damaged = new String(text.getBytes(StandardCharsets.UTF_8), StandardCharsets.ISO_8859_1);
        for (int i = random.nextInt(3); i >= 0; i--) {
            damaged = damage(damaged);
        }
        return damaged.getBytes(StandardCharsets.ISO_8859_1);
    }

    private String damage(String text) {
        return switch (random.nextInt(12)) {
            case 0 -> replaced(text, at(text), 1, String.valueOf((char) random.nextInt(256)));
            case 1 -> replaced(text, at(text), 1, "");
            case 2 -> replaced(text, at(text), 0, character());
            case 3 -> replaced(text, at(text), random.nextInt(40), "");
            case 4 -> text.substring(0, at(text));
            case 5 -> tokens(text, TOKEN);
            case 6 -> lines(text);
            case 7 -> renamed(text);
            default -> number(text);
        };
    }

    private int at(String text) {
        return random.nextInt(text.length() + 1);
    }

    private String character() {
        return String.valueOf(CHARACTERS.charAt(random.nextInt(CHARACTERS.length())));
    }

    private static String replaced(String text, int start, int length, String by) {
        return text.substring(0, start) + by + text.substring(Math.min(text.length(), start + length));
    }

    /** Two tokens change places. */
    private String tokens(String text, Pattern pattern) {
        List<int[]> found = found(text, pattern);
        if (found.size() < 2) {
            return text;
        }
        int first = random.nextInt(found.size() - 1);
        int second = first + 1 + random.nextInt(Math.min(20, found.size() - first - 1));
        int[] a = found.get(first);
        int[] b = found.get(second);
        return text.substring(0, a[0])
                + text.substring(b[0], b[1])
                + text.substring(a[1], b[0])
                + text.substring(a[0], a[1])
                + text.substring(b[1]);
    }

    /** A line is lost, comes twice or moves. */
    private String lines(String text) {
        List<String> lines = new ArrayList<>(List.of(text.split("\n", -1)));
        int line = random.nextInt(lines.size());
        switch (random.nextInt(3)) {
            case 0 -> lines.remove(line);
            case 1 -> lines.add(line, lines.get(line));
            default -> lines.add(random.nextInt(lines.size()), lines.remove(line));
        }
        return String.join("\n", lines);
    }

    /** A word loses, gains or changes a letter. */
    private String renamed(String text) {
        List<int[]> found = found(text, Pattern.compile("[a-zA-Z]{3,}"));
        if (found.isEmpty()) {
            return text;
        }
        int[] word = found.get(random.nextInt(found.size()));
        int at = word[0] + random.nextInt(word[1] - word[0]);
        return replaced(text, at, random.nextInt(2), random.nextBoolean() ? "" : "x");
    }

    /** A number becomes another value. */
    private String number(String text) {
        List<int[]> found = found(text, NUMBER);
        if (found.isEmpty()) {
            return text;
        }
        int[] number = found.get(random.nextInt(found.size()));
        String value = random.nextBoolean()
                ? VALUES.get(random.nextInt(VALUES.size()))
                : String.valueOf(Math.scalb(random.nextDouble(), random.nextInt(20)));
        return replaced(text, number[0], number[1] - number[0], value);
    }

    private static List<int[]> found(String text, Pattern pattern) {
        List<int[]> found = new ArrayList<>();
        Matcher matcher = pattern.matcher(text);
        while (matcher.find()) {
            found.add(new int[] {matcher.start(), matcher.end()});
        }
        return found;
    }
}
