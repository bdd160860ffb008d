/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.architecture;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.lang.ArchRule;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.Manifest;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** Who may see whom: solver stands alone, model sees no solver, only the user interface sees windows. */
class DependencyRulesTest {

    private static final Path BUNDLES = Path.of("..").toAbsolutePath().normalize();

    /** What each bundle's manifest may require or import, besides the JDK: prefixes of bundle and package names. */
    private static final Map<String, Set<String>> ALLOWED = Map.of(
        "spanfield.model", Set.of("org.eclipse.emf.common", "org.eclipse.emf.ecore"),
        "spanfield.model.edit", Set.of("spanfield.model", "org.eclipse.emf.edit", "org.eclipse.core.runtime"),
        "spanfield.solver", Set.of("org.apache.commons.math3"),
        "spanfield.study", Set.of("spanfield.model", "spanfield.solver", "org.apache.commons.math3"),
        "spanfield.report", Set.of("spanfield.model", "spanfield.study", "spanfield.solver", "org.jfree", "org.apache.batik", "org.apache.xmlgraphics", "org.apache.pdfbox", "de.rototor.pdfbox",
            "org.apache.commons.math3"),
        "spanfield.cli", Set.of("spanfield.model", "spanfield.study", "spanfield.solver", "spanfield.report", "org.eclipse.equinox.app", "org.eclipse.equinox.common",
            "org.eclipse.core.runtime", "org.apache.commons.cli", "picocli", "info.picocli"));

    private static final String[] WINDOWS = {"org.eclipse.swt..", "org.eclipse.jface..", "org.eclipse.ui..", "org.eclipse.draw2d..", "org.eclipse.gef.."};

    private static JavaClasses classes(String bundle) {
        Path output = BUNDLES.resolve(bundle).resolve("target/classes");
        assertTrue(Files.isDirectory(output), "no compiled classes of " + bundle + ": build the bundles before this module");
        return new ClassFileImporter().importPath(output);
    }

    @Test
    void solver_seesOnlyTheJdkAndCommonsMath() {
        ArchRule rule = noClasses().should().dependOnClassesThat().resideOutsideOfPackages("spanfield.solver..", "java..", "org.apache.commons.math3..");
        rule.check(classes("spanfield.solver"));
    }

    @Test
    void solver_hasNoStaticStateThatChanges() {
        // the compiler's own tables for switches over enums are left out
        fields().that().areStatic().and().doNotHaveModifier(JavaModifier.SYNTHETIC).should().beFinal().check(classes("spanfield.solver"));
    }

    @Test
    void model_seesNeitherSolverNorStudyNorWindows() {
        for (String bundle : List.of("spanfield.model", "spanfield.model.edit")) {
            noClasses().should().dependOnClassesThat().resideInAnyPackage("spanfield.solver..", "spanfield.study..", "spanfield.report..", "spanfield.cli..")
                .check(classes(bundle));
        }
    }

    @Test
    void nothingOutsideTheUserInterface_seesWindows() {
        for (String bundle : ALLOWED.keySet()) {
            noClasses().should().dependOnClassesThat().resideInAnyPackage(WINDOWS).check(classes(bundle));
        }
    }

    @Test
    void onlyTheCommand_writesToTheConsole() {
        for (String bundle : List.of("spanfield.model", "spanfield.solver", "spanfield.study", "spanfield.report")) {
            noClasses().should().accessField(System.class, "out").orShould().accessField(System.class, "err").check(classes(bundle));
        }
    }

    @Test
    void rules_fireOnABrokenFixture() {
        JavaClasses broken = new ClassFileImporter().importPackages("spanfield.solver.fixture");
        assertEquals(1, broken.size());
        assertThrows(AssertionError.class, () -> fields().that().areStatic().should().beFinal().check(broken));
        assertThrows(AssertionError.class, () -> noClasses().should().dependOnClassesThat()
            .resideOutsideOfPackages("spanfield.solver..", "java..", "org.apache.commons.math3..").check(broken));
    }

    @Test
    void manifests_requireOnlyWhatTheArchitectureAllows() throws IOException {
        for (Map.Entry<String, Set<String>> bundle : ALLOWED.entrySet()) {
            Set<String> excess = new TreeSet<>(required(bundle.getKey()));
            excess.removeIf(name -> bundle.getValue().stream().anyMatch(name::startsWith));
            assertTrue(excess.isEmpty(), bundle.getKey() + " requires " + excess + ", which the architecture does not allow");
        }
    }

    @Test
    void everyBundle_hasItsRule() throws IOException {
        try (Stream<Path> all = Files.list(BUNDLES)) {
            List<String> unruled = all.map(path -> path.getFileName().toString()).filter(name -> name.startsWith("spanfield."))
                .filter(name -> !name.endsWith(".tests") && !name.endsWith(".compat") && !name.startsWith("spanfield.ui.") && !name.equals("spanfield.app"))
                .filter(name -> !ALLOWED.containsKey(name)).toList();
            assertTrue(unruled.isEmpty(), "bundles without a dependency rule: " + unruled);
        }
    }

    private static List<String> required(String bundle) throws IOException {
        List<String> names = new ArrayList<>();
        try (InputStream in = Files.newInputStream(BUNDLES.resolve(bundle).resolve("META-INF/MANIFEST.MF"))) {
            var attributes = new Manifest(in).getMainAttributes();
            for (String header : List.of("Require-Bundle", "Import-Package")) {
                String value = attributes.getValue(header);
                if (value != null) {
                    // commas within quotes are parts of version ranges
                    for (String clause : value.split(",(?=(?:[^\"]*\"[^\"]*\")*[^\"]*$)")) {
                        names.add(clause.split(";")[0].strip());
                    }
                }
            }
        }
        names.removeIf(name -> name.startsWith("javax.") || name.startsWith("org.xml.") || name.startsWith("org.w3c."));
        return names;
    }
}
