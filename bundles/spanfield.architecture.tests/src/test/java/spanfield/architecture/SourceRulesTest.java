/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.architecture;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** What every source file of the repository keeps to. */
class SourceRulesTest {

    private static final Path ROOT = Path.of("../..").toAbsolutePath().normalize();
    private static final Set<String> SKIPPED = Set.of("target", "bin", ".git", ".mvn-cache", "src-gen");
    private static final String LICENCE = "SPDX-License-Identifier: EPL-2.0";
    /** Absolute paths of a home or work folder. */
    private static final Pattern MACHINE_PATH = Pattern.compile("(?<![\\w.~$}])/(home|root|work|tmp|Users)/[\\w]");

    private static List<Path> files(String... endings) throws IOException {
        try (Stream<Path> all = Files.walk(ROOT)) {
            return all.filter(Files::isRegularFile).filter(path -> !path.getFileName().toString().startsWith("."))
                .filter(path -> { for (Path part : ROOT.relativize(path)) { if (SKIPPED.contains(part.toString())) { return false; } } return true; })
                .filter(path -> { for (String ending : endings) { if (path.toString().endsWith(ending)) { return true; } } return false; })
                .toList();
        }
    }

    @Test
    void everySource_statesTheLicence() throws IOException {
        List<Path> without = new ArrayList<>();
        List<Path> sources = files(".java", ".properties", "pom.xml", "plugin.xml");
        assertTrue(sources.size() > 50, "sources were found: " + sources.size());
        for (Path source : sources) {
            if (!Files.readString(source).contains(LICENCE) && !source.endsWith("plugin.properties")) {
                without.add(ROOT.relativize(source));
            }
        }
        assertTrue(without.isEmpty(), "without the licence line: " + without);
    }

    @Test
    void noFile_namesAPathOfAMachine() throws IOException {
        List<String> found = new ArrayList<>();
        for (Path file : files(".java", ".xml", ".properties", ".md", ".spanfield", ".target", ".product", ".MF", ".html")) {
            if (MACHINE_PATH.matcher(Files.readString(file)).find() && !file.endsWith("SourceRulesTest.java")) {
                found.add(ROOT.relativize(file).toString());
            }
        }
        assertTrue(found.isEmpty(), "paths of a machine in: " + found);
    }
}
