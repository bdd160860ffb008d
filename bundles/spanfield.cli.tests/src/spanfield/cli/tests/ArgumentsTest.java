/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanfield.cli.ExitCode;
import spanfield.cli.tests.support.Cli;
import spanfield.cli.tests.support.Cli.Outcome;
import spanfield.cli.tests.support.StudyOnDisk;
import spanfield.model.Bonding;
import spanfield.model.EarthModel;

/** Wrong arguments: exit code 2, one clear line with a hint, nothing on standard output. */
class ArgumentsTest {

    @TempDir
    private Path folder;

    private static void assertRefused(Outcome outcome, String message) {
        assertEquals(ExitCode.BAD_ARGUMENTS, outcome.code(), outcome.err());
        assertEquals("", outcome.out());
        assertEquals(1, outcome.err().lines().count(), outcome.err());
        assertEquals("spanfield: " + message, outcome.err().strip());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
        "egdes STUDY | unknown verb 'egdes'; the verbs are check, edges, profile, points, help; did you mean 'edges'?",
        "report STUDY | unknown verb 'report'; the verbs are check, edges, profile, points, help",
        "help egdes | unknown verb 'egdes'; the verbs are check, edges, profile, points, help; did you mean 'edges'?",
        "edges | edges needs a study file, for example: spanfield edges line.spanfield",
        "check | check needs at least one study file, for example: spanfield check line.spanfield",
        "edges STUDY --unit uT | edges has no option '--unit'; did you mean '--units'?",
        "edges STUDY --png x | edges has no option '--png'; see: spanfield help edges",
        "edges STUDY -x | edges has no option '-x'; see: spanfield help edges",
        "edges STUDY --units tesla | --units 'tesla' is not known; choose uT or mG",
        "edges STUDY --length yard | --length 'yard' is not known; choose m or ft",
        "edges STUDY --measure minor | --measure 'minor' is not known; choose resultant or major",
        "edges STUDY --earth flat | --earth 'flat' is not known; choose none or images or exact",
        "edges STUDY --format xml | --format 'xml' is not known; choose text or csv",
        "edges STUDY --units uT --units mG | --units is given twice; give it once",
        "edges STUDY --accuracy fine | --accuracy 'fine' is not a number; give one from 1e-12 to 1e-2",
        "edges STUDY --accuracy 0x1p-3 | --accuracy '0x1p-3' is not a number; give one from 1e-12 to 1e-2",
        "edges STUDY --case peek | unknown load case 'peek'; the study has: loadcase-rating (Rating), loadcase-peak (Peak), loadcase-typical (Typical); did you mean 'Peak'?",
        "edges STUDY --case night | unknown load case 'night'; the study has: loadcase-rating (Rating), loadcase-peak (Peak), loadcase-typical (Typical)",
        "edges STUDY --station midspan | unknown station 'midspan'; the study has: profilestation-mid-span (Mid-span), profilestation-mid-span-2-3 (Mid-span 2-3); did you mean 'Mid-span'?",
        "profile STUDY --station tower | unknown station 'tower'; the study has: profilestation-mid-span (Mid-span), profilestation-mid-span-2-3 (Mid-span 2-3); a number is a position along the corridor in m",
        "profile STUDY --station 1e9 --length ft | The station in metres is 3.048e8; give a number between -100000 and 100000.",
        "profile STUDY --width 800 | --width is for --png, which is not given; an SVG has no width in pixels",
        "profile STUDY --png x.png --width 12 | --width '12' is not a whole number from 320 to 10000",
        "profile STUDY --png x.png --width wide | --width 'wide' is not a whole number from 320 to 10000",
        "profile STUDY --station a --station b | --station is given twice; give it once",
        "points STUDY | points needs --at FILE with the points, or --at - for standard input; see: spanfield help points"})
    void wrongArgument_getsOneClearLine(String line, String message) {
        String study = StudyOnDisk.sound(folder).toString();
        List<String> words = new ArrayList<>(List.of(line.strip().split(" ")));
        words.replaceAll(word -> word.equals("STUDY") ? study : word);
        assertRefused(Cli.run(words.toArray()), message.strip());
    }

    @Test
    void noArgument_namesTheVerbs() {
        assertRefused(Cli.run(), "a verb is missing: check, edges, profile, points or help; see: spanfield help");
    }

    @Test
    void optionWithoutItsValue_namesTheValues() {
        assertRefused(Cli.run("edges", "a", "--units"), "--units needs a value: uT|mG");
        assertRefused(Cli.run("edges", "a", "--case", "--units", "mG"), "--case needs a value: CASE");
    }

    @Test
    void twoStudies_areRefusedWhereOneIsMeant() {
        assertRefused(Cli.run("edges", "a", "b"), "edges takes one study file, not 2 ('a', 'b')");
    }

    @Test
    void accuracyOutOfRange_isRefused() {
        Outcome outcome = Cli.run("edges", StudyOnDisk.sound(folder), "--accuracy", "0.5");
        assertEquals(ExitCode.BAD_ARGUMENTS, outcome.code());
        assertTrue(outcome.err().startsWith("spanfield: The relative accuracy is 0.5; give a number from 1e-12 to 0.01"), outcome.err());
    }

    @Test
    void earthModelWithoutResistivity_isRefused() {
        var study = StudyOnDisk.study();
        study.setEarthResistivityOhmMetres(null);
        study.setEarthModel(EarthModel.NONE);
        study.getLines().get(0).getShieldWires().get(0).setBonding(Bonding.INSULATED);
        Outcome outcome = Cli.run("edges", StudyOnDisk.save(study, folder, "dry.spanfield"), "--earth", "exact");
        assertEquals(ExitCode.BAD_ARGUMENTS, outcome.code());
        assertTrue(outcome.err().contains("no earth resistivity"), outcome.err());
    }

    @Test
    void loadCaseOfAnAmbiguousName_needsItsIdentifier() {
        var study = StudyOnDisk.study();
        study.getLoadCases().get(1).setName("Rating");
        Path file = StudyOnDisk.save(study, folder, "twice.spanfield");
        assertRefused(Cli.run("edges", file, "--case", "Rating"),
            "load case 'Rating' is not the only one of that name; use an identifier: loadcase-rating, loadcase-peak");
        assertEquals(ExitCode.DONE, Cli.run("edges", file, "--case", "loadcase-peak").code());
    }

    @Test
    void optionsMayStandBeforeTheStudyAndUseAnEqualsSign() {
        Path study = StudyOnDisk.sound(folder);
        assertEquals(Cli.run("edges", study, "--units", "mG").done().out(), Cli.run("edges", "--units=mG", study).done().out());
    }
}
