/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.Random;
import java.util.stream.Stream;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.model.Study;
import spanfield.model.io.StudyFileException;
import spanfield.model.io.StudyFiles;
import spanfield.model.io.StudyIds;
import spanfield.model.tests.support.SampleStudies;

/** Study files: what is written comes back, and nothing broken or hostile gets in. */
class StudyFilesTest {

    @TempDir
    Path folder;

    private Path write(String name, String text) throws IOException {
        return Files.write(folder.resolve(name), text.getBytes(StandardCharsets.UTF_8));
    }

    private static String text(Study study) {
        return new String(StudyFiles.serialize(study), StandardCharsets.UTF_8);
    }

    private String refusal(String text) throws IOException {
        Path file = write("study.spanfield", text);
        byte[] before = Files.readAllBytes(file);
        String message = assertThrows(StudyFileException.class, () -> StudyFiles.load(file)).getMessage();
        assertArrayEquals(before, Files.readAllBytes(file), "the file is untouched");
        assertTrue(message.contains("study.spanfield"), message);
        assertFalse(message.contains("org.eclipse"), message);
        assertFalse(message.contains("\n"), message);
        assertTrue(message.endsWith("."), message);
        return message;
    }

    @Test
    void savedStudies_comeBackEqualAndByteIdentical() throws Exception {
        for (long seed = 0; seed < 30; seed++) {
            Study study = seed == 0 ? SampleStudies.flat() : SampleStudies.random(seed);
            Path file = folder.resolve("s" + seed + ".spanfield");
            StudyFiles.save(study, file);
            Study back = StudyFiles.load(file);
            assertTrue(EcoreUtil.equals(study, back), "seed " + seed);
            byte[] first = Files.readAllBytes(file);
            StudyFiles.save(back, file);
            assertArrayEquals(first, Files.readAllBytes(file));
        }
    }

    @Test
    void savedFile_isUtf8WithLineFeedsAndNoPaths() throws Exception {
        Study study = SampleStudies.flat();
        study.setName("\u00dcberlandleitung \u03b1");
        Path file = folder.resolve("a b.spanfield");
        StudyFiles.save(study, file);
        String text = Files.readString(file, StandardCharsets.UTF_8);
        assertTrue(text.startsWith("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n"));
        assertFalse(text.contains("\r"));
        assertFalse(text.contains(folder.toString()));
        assertTrue(text.endsWith("\n"));
        assertEquals(study.getName(), StudyFiles.load(file).getName());
        try (Stream<Path> left = Files.list(folder)) {
            assertEquals(1, left.count(), "no part file is left");
        }
    }

    @Test
    void oneChange_isOneChangedLine() {
        Study study = SampleStudies.flat();
        String[] before = text(study).split("\n");
        study.getLines().get(0).getStructures().get(1).setStationMetres(17.25);
        String[] after = text(study).split("\n");
        assertEquals(before.length, after.length);
        int changed = 0;
        for (int i = 0; i < before.length; i++) {
            changed += before[i].equals(after[i]) ? 0 : 1;
        }
        assertEquals(1, changed);
    }

    @Test
    void missingIdentifiers_areMadeFromNamesAndKept() {
        Study study = SampleStudies.flat();
        assertEquals("circuit-circuit", study.getLines().get(0).getCircuits().get(0).getId());
        study.getLines().get(0).getCircuits().get(0).setName("Other name");
        StudyIds.assignMissing(study);
        assertEquals("circuit-circuit", study.getLines().get(0).getCircuits().get(0).getId());
    }

    @Test
    void missingFolderAndEmptyFiles_areExplained() throws Exception {
        assertTrue(assertThrows(StudyFileException.class, () -> StudyFiles.load(folder.resolve("no.spanfield"))).getMessage().contains("There is no file"));
        assertTrue(assertThrows(StudyFileException.class, () -> StudyFiles.load(folder)).getMessage().contains("is a folder"));
        assertTrue(refusal("").contains("is empty"));
    }

    @Test
    void truncatedAndGarbledFiles_areRefusedWithTheLine() throws Exception {
        String text = text(SampleStudies.flat());
        for (int part = 1; part < 10; part++) {
            assertTrue(refusal(text.substring(0, text.length() * part / 10)).matches(".*\\(line \\d+, column \\d+\\).*"));
        }
        refusal("PK\u0003\u0004 not xml at all");
        refusal("{\"study\": true}");
        Random random = new Random(5);
        for (int i = 0; i < 300; i++) {
            char[] broken = text.toCharArray();
            for (int k = 0; k < 3; k++) {
                broken[random.nextInt(broken.length)] = (char) (32 + random.nextInt(90));
            }
            Path file = write("garbled.spanfield", new String(broken));
            try {
                StudyFiles.load(file);
            } catch (StudyFileException expected) {
                assertFalse(expected.getMessage().contains("\n"), expected.getMessage());
            }
        }
    }

    @Test
    void otherFormatsAndVersions_areNamed() throws Exception {
        String text = text(SampleStudies.flat());
        assertTrue(refusal(text.replace("urn:spanfield:study:1", "urn:spanfield:study:7")).contains("newer version"));
        assertTrue(refusal(text.replace("urn:spanfield:study:1", "urn:other:1")).contains("not a Spanfield study"));
        assertTrue(refusal("<svg xmlns=\"http://www.w3.org/2000/svg\"/>").contains("root element is 'svg'"));
        assertTrue(refusal(text.replace("<corridor>", "<corridor speed=\"3\">")).contains("'speed'"));
        assertTrue(refusal(text.replace("referenceHeight", "x")
            .replaceFirst("earthResistivityOhmMetres=\"100.0\"", "earthResistivityOhmMetres=\"a lot\"")).contains("'a lot'"));
    }

    @Test
    void danglingDuplicateAndOutsideReferences_areRefused() throws Exception {
        String text = text(SampleStudies.flat());
        assertTrue(refusal(text.replace("conductor=\"conductor-phase-conductor\"", "conductor=\"gone\"")).contains("'gone' leads nowhere"));
        assertTrue(refusal(text.replace("id=\"structure-line-1\"", "id=\"structure-line-2\"")).contains("identifier 'structure-line-2'"));
        Path other = write("other.spanfield", text);
        String outside = text.replaceFirst("<circuits id=\"circuit-circuit\" name=\"Circuit\" conductor=\"conductor-phase-conductor\"([^>]*)>",
            "<circuits id=\"circuit-circuit\" name=\"Circuit\"$1><conductor href=\"" + other.toUri() + "#conductor-phase-conductor\"/>");
        assertFalse(outside.equals(text), "the text was changed");
        assertTrue(refusal(outside).contains("leads out of the file"));
    }

    /** External entities and entity expansion: the file that they would read must not appear, and memory must not fill. */
    @Test
    void externalEntitiesAndEntityExpansion_areRefused() throws Exception {
        Path secret = write("secret.txt", "secret-content");
        String text = text(SampleStudies.flat());
        String external = text.replaceFirst("\\?>\n", "?>\n<!DOCTYPE x [<!ENTITY e SYSTEM \"" + secret.toUri() + "\">]>\n").replace("name=\"Flat\"", "name=\"&e;\"");
        String message = refusal(external);
        assertTrue(message.contains("document type"), message);
        assertFalse(message.contains("secret-content"));
        StringBuilder laughs = new StringBuilder("<?xml version=\"1.0\"?>\n<!DOCTYPE x [<!ENTITY a0 \"ha\">");
        for (int i = 1; i < 30; i++) {
            laughs.append("<!ENTITY a").append(i).append(" \"&a").append(i - 1).append(";&a").append(i - 1).append(";\">");
        }
        assertTrue(refusal(laughs + "]>\n<x>&a29;</x>").contains("document type"));
        assertTrue(refusal("<a>".repeat(100000)).contains("root element is 'a'"));
    }

    @Test
    void failedSave_leavesTheOldFile() throws Exception {
        Path file = folder.resolve("study.spanfield");
        StudyFiles.save(SampleStudies.flat(), file);
        byte[] before = Files.readAllBytes(file);
        Path missing = folder.resolve("missing").resolve("study.spanfield");
        assertTrue(assertThrows(StudyFileException.class, () -> StudyFiles.save(SampleStudies.random(1), missing)).getMessage().contains("folder does not exist"));
        Path blocked = Files.createDirectory(folder.resolve("blocked.spanfield"));
        Files.createFile(blocked.resolve("inside"));
        assertThrows(StudyFileException.class, () -> StudyFiles.save(SampleStudies.random(1), blocked));
        assertArrayEquals(before, Files.readAllBytes(file));
        try (Stream<Path> left = Files.list(folder)) {
            assertEquals(2, left.count(), "no part file is left");
        }
    }

    @Test
    void save_keepsPermissions() throws Exception {
        Path file = folder.resolve("study.spanfield");
        StudyFiles.save(SampleStudies.flat(), file);
        if (Files.getFileStore(file).supportsFileAttributeView("posix")) {
            Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-rw----"));
            StudyFiles.save(SampleStudies.flat(), file);
            assertEquals("rw-rw----", PosixFilePermissions.toString(Files.getPosixFilePermissions(file)));
        }
    }

    /** The sample of format 1 that later versions must keep reading. */
    @Test
    void sampleOfFormat1_isRead() throws Exception {
        byte[] sample;
        try (var in = StudyFilesTest.class.getResourceAsStream("format-1.spanfield")) {
            sample = in.readAllBytes();
        }
        Study study = StudyFiles.parse(sample, "format-1.spanfield");
        assertTrue(EcoreUtil.equals(SampleStudies.flat(), study));
        assertArrayEquals(sample, StudyFiles.serialize(study));
    }
}
