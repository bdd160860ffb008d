/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.cli.ExitCode;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;

/** The README and the texts of the examples: their commands work, and what the README says about the command is true. */
class ReadmeTest {

    @TempDir
    private Path folder;

    /** The root of the checkout: the first folder above the working folder that has examples and a README. */
    private static Path root() {
        Path at = Path.of("").toAbsolutePath();
        while (!(Files.isDirectory(at.resolve("examples")) && Files.isRegularFile(at.resolve("README.md")))) {
            at = at.getParent();
            if (at == null) {
                throw new AssertionError("the tests run within the checkout");
            }
        }
        return at;
    }

    private static String readme() throws IOException {
        return Files.readString(root().resolve("README.md"));
    }

    @Test
    void everyExitCode_isDocumentedAsInTheHelp() throws IOException {
        for (ExitCode code : ExitCode.values()) {
            assertTrue(readme().contains("| " + code.number() + " | " + code.meaning() + " |"), code.toString());
        }
    }

    @Test
    void everyVerb_isDocumentedAsInTheHelp() throws IOException {
        String help = Cli.run("help").done().out().replaceAll("\\s+", " ");
        Matcher rows = Pattern.compile("\\| `(check|edges|profile|points) ([^`]*)` \\| ([^|(]*)").matcher(readme());
        int count = 0;
        while (rows.find()) {
            assertTrue(help.contains(rows.group(1) + " " + rows.group(2) + " " + rows.group(3).strip()), rows.group());
            count++;
        }
        assertEquals(4, count);
    }

    @Test
    void everyOptionOfTheReadme_exists() throws IOException {
        String help = Stream.of("check", "edges", "profile", "points").map(verb -> Cli.run("help", verb).out()).reduce("", String::concat);
        Matcher options = Pattern.compile("`(--[a-z]+)").matcher(readme());
        while (options.find()) {
            assertTrue(help.contains(options.group(1)), options.group(1));
        }
    }

    @Test
    void everyCommand_works() throws IOException {
        List<String> commands = new ArrayList<>(commands(root().resolve("README.md")));
        try (Stream<Path> examples = Files.list(root().resolve("examples"))) {
            for (Path example : examples.sorted().toList()) {
                commands.addAll(commands(example.resolve("README.md")));
            }
        }
        assertTrue(commands.size() >= 10, "commands found: " + commands);
        for (String command : commands) {
            Outcome outcome = Cli.run(words(command).toArray());
            assertEquals(ExitCode.DONE, outcome.code(), () -> command + "\n" + outcome.err());
        }
    }

    /** Lines of a text that are commands: indented, beginning with the launcher. */
    private static List<String> commands(Path text) throws IOException {
        // a study alone opens the workbench, which the tests of the application drive
        return Files.readString(text).lines().filter(line -> line.startsWith("    ./spanfield ")).map(String::strip)
            .filter(line -> !line.matches("\\S+ \\S+[.]spanfield")).toList();
    }

    /** Arguments of a command; studies and points are those of the checkout, outputs go to the folder of the test. */
    private List<String> words(String command) {
        List<String> words = new ArrayList<>();
        Matcher matcher = Pattern.compile("\"([^\"]*)\"|'([^']*)'|(\\S+)").matcher(command);
        while (matcher.find()) {
            words.add(matcher.group(1) != null ? matcher.group(1) : matcher.group(2) != null ? matcher.group(2) : matcher.group(3));
        }
        words.remove(0);
        words.replaceAll(word -> word.startsWith("examples/") ? root().resolve(word).toString()
            : word.matches("[\\w-]+\\.(png|svg|pdf|csv|txt)") ? folder.resolve(word).toString() : word);
        return words;
    }
}
