/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.cli.ExitCode;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;
import spanfield.cli.tests.support.StudyOnDisk;

/** The help is complete and its examples work. */
class HelpTest {

    private static final List<String> COMPUTING =
        List.of("--accuracy", "--case", "--earth", "--format", "--help", "--length", "--measure", "--output", "--units");

    /** Options that each verb is documented to have, besides those of all computing verbs. */
    private static final Map<String, List<String>> OPTIONS = Map.of("check", List.of(), "edges", List.of("--station"),
        "profile", List.of("--station", "--svg", "--pdf", "--png", "--width"), "points", List.of("--at"));

    @TempDir
    private Path folder;

    @Test
    void help_listsEveryVerbAndExitCode() {
        for (String[] way : new String[][] {{"help"}, {"--help"}, {"-h"}}) {
            String help = Cli.run((Object[]) way).done().out();
            OPTIONS.keySet().forEach(verb -> assertTrue(help.contains("\n  " + verb + " "), help));
            for (ExitCode code : ExitCode.values()) {
                assertTrue(help.contains("  " + code.number() + "  " + code.meaning()), help);
            }
            assertTrue(help.contains("live lines can kill"), help);
        }
    }

    @Test
    void helpOfAVerb_listsItsOptions() {
        OPTIONS.forEach((verb, options) -> {
            String help = Cli.run("help", verb).done().out();
            assertEquals(help, Cli.run(verb, "--help").done().out());
            assertEquals(help, Cli.run(verb, "some.spanfield", "-h").done().out());
            TreeSet<String> expected = new TreeSet<>(options);
            expected.addAll(verb.equals("check") ? List.of("--format", "--help", "--output") : COMPUTING);
            TreeSet<String> listed = new TreeSet<>();
            Matcher matcher = Pattern.compile("(?m)^  (--[a-z]+)").matcher(help);
            while (matcher.find()) {
                listed.add(matcher.group(1));
            }
            assertEquals(expected, listed);
            help.lines().forEach(line -> assertTrue(line.length() <= 110, line));
        });
    }

    @Test
    void version_isStated() {
        assertTrue(Cli.run("--version").done().out().startsWith("Spanfield 0.1.0 (Java "));
    }

    @Test
    void examplesOfTheHelp_work() throws IOException {
        Path study = StudyOnDisk.sound(folder);
        Path points = Files.writeString(folder.resolve("points.csv"), "station_m,offset_m,height_m\n80,25,1\n");
        int count = 0;
        for (String verb : OPTIONS.keySet()) {
            String help = Cli.run("help", verb).done().out();
            for (String line : help.substring(help.indexOf("Examples:"), help.indexOf("Exit codes:")).lines().skip(1).filter(l -> !l.isBlank()).toList()) {
                run(line.strip(), study, points);
                count++;
            }
        }
        assertTrue(count >= 9, "examples that ran: " + count);
    }

    private void run(String example, Path study, Path points) throws IOException {
        String input = "";
        String command = example;
        if (example.startsWith("printf ")) {
            input = example.substring(8, example.indexOf("' | ")).replace("\\n", "\n");
            command = example.substring(example.indexOf("' | ") + 4);
        }
        List<String> words = new ArrayList<>();
        Matcher matcher = Pattern.compile("'([^']*)'|(\\S+)").matcher(command);
        while (matcher.find()) {
            words.add(matcher.group(1) != null ? matcher.group(1) : matcher.group(2));
        }
        assertEquals("spanfield", words.remove(0), example);
        words.replaceAll(word -> word.endsWith(".spanfield") ? study.toString() : word.equals("points.csv") ? points.toString()
            : word.matches("(profile|edges)\\.(csv|svg|png)") ? folder.resolve(word).toString() : word);
        Outcome outcome = Cli.runWithInput(input, words.toArray());
        assertEquals(ExitCode.DONE, outcome.code(), () -> example + "\n" + outcome.err());
    }
}
