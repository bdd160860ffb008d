/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.BooleanSupplier;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.ImageLoader;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PlatformUI;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanfield.app.GuideView;
import spanfield.app.Studies;
import spanfield.app.StudyTemplate;
import spanfield.model.Attachment;
import spanfield.model.Circuit;
import spanfield.model.FieldMeasure;
import spanfield.model.Phase;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;
import spanfield.study.result.EdgeTable;
import spanfield.ui.common.StudyComputation.State;
import spanfield.ui.common.StudyEditor;
import spanfield.ui.common.StudyInput;
import spanfield.ui.results.EdgeTablePage;
import spanfield.ui.results.ProfilePage;
import spanfield.ui.section.SectionPage;
import spanfield.ui.section.SpanPage;

/** Drives the real workbench: open, drag, undo, save, reload, compute, export; and takes a picture of every page. */
class WorkbenchTest {

    private static final long PATIENCE_MILLIS = 30_000;

    /** A dozen frames of a slow display. */
    private static final long PAINT_MILLIS = 300;

    @TempDir
    Path folder;

    private final Display display = Display.getCurrent();
    private final IWorkbenchWindow window = PlatformUI.getWorkbench().getActiveWorkbenchWindow();
    private final IWorkbenchPage page = window.getActivePage();

    @BeforeEach
    void sizeWindow() {
        window.getShell().setBounds(0, 0, 1240, 900);
    }

    @AfterEach
    void closeEditors() {
        page.closeAllEditors(false);
        pump(() -> page.getEditorReferences().length == 0);
    }

    /** Lets events run until something holds. */
    private void pump(BooleanSupplier done) {
        long end = System.currentTimeMillis() + PATIENCE_MILLIS;
        while (!done.getAsBoolean()) {
            if (System.currentTimeMillis() > end) {
                throw new AssertionError("waited in vain");
            }
            if (!display.readAndDispatch()) {
                display.timerExec(20, () -> { });
                display.sleep();
            }
        }
    }

    private void settle(StudyEditor editor) {
        pump(() -> editor.computation().outcome().state() == State.DONE || editor.computation().outcome().state() == State.INVALID);
        while (display.readAndDispatch()) {
            // until nothing is left to do
        }
    }

    private StudyEditor openExample(String name) throws IOException {
        Path copy = folder.resolve(name + ".spanfield");
        Files.copy(Path.of(System.getProperty("spanfield.examples"), name, name + ".spanfield"), copy);
        Studies.open(window, copy);
        StudyEditor editor = (StudyEditor) page.getActiveEditor();
        settle(editor);
        return editor;
    }

    private <T> T showPage(StudyEditor editor, Class<T> type) {
        int position = editor.pagePositions().get(type.getSimpleName());
        editor.showPage(position);
        while (display.readAndDispatch()) {
            // layout and paint
        }
        return type.cast(editor.pages().get(position));
    }

    private void picture(String name) throws IOException {
        Shell shell = window.getShell();
        // Widgets paint with the frames of the toolkit's clock, some of them after the queue is empty.
        long end = System.currentTimeMillis() + PAINT_MILLIS;
        pump(() -> System.currentTimeMillis() > end);
        shell.update();
        Rectangle area = shell.getClientArea();
        Image image = new Image(display, area.width, area.height);
        GC gc = new GC(shell);
        gc.copyArea(image, 0, 0);
        gc.dispose();
        ImageLoader loader = new ImageLoader();
        loader.data = new ImageData[] {image.getImageData()};
        image.dispose();
        Path target = Path.of(System.getProperty("spanfield.pictures"));
        Files.createDirectories(target);
        loader.save(target.resolve(name + ".png").toString(), SWT.IMAGE_PNG);
    }

    private static void mouse(Control control, int type, int x, int y, boolean pressed) {
        mouse(control, type, x, y, pressed, 0);
    }

    private static void mouse(Control control, int type, int x, int y, boolean pressed, int keys) {
        Event event = new Event();
        event.x = x;
        event.y = y;
        event.button = type == SWT.MouseMove ? 0 : 1;
        event.count = 1;
        event.stateMask = keys | (pressed ? SWT.BUTTON1 : 0);
        control.notifyListeners(type, event);
    }

    private void drag(Control control, Point from, int dx, int dy) {
        drag(control, from, dx, dy, 0);
    }

    private static void key(Control control, int code, char character) {
        Event event = new Event();
        event.keyCode = code;
        event.character = character;
        control.notifyListeners(SWT.KeyDown, event);
    }

    private void drag(Control control, Point from, int dx, int dy, int keys) {
        mouse(control, SWT.MouseMove, from.x, from.y, false, keys);
        mouse(control, SWT.MouseDown, from.x, from.y, false, keys);
        for (int i = 1; i <= 4; i++) {
            mouse(control, SWT.MouseMove, from.x + dx * i / 4, from.y + dy * i / 4, true, keys);
            while (display.readAndDispatch()) {
                // feedback and preview
            }
        }
        mouse(control, SWT.MouseUp, from.x + dx, from.y + dy, true, keys);
    }

    /** Waits until results are complete and something holds of the value at the left edge. */
    private void pumpEdge(StudyEditor editor, java.util.function.DoublePredicate holds) {
        pump(() -> editor.computation().outcome().state() == State.DONE && holds.test(leftEdge(editor)));
    }

    private static double leftEdge(StudyEditor editor) {
        EdgeTable edges = editor.computation().outcome().edges();
        return edges.rows().get(0).leftEdge().field().tesla(FieldMeasure.RESULTANT);
    }

    @Test
    void everyPage_showsTheStudy() throws IOException {
        StudyEditor editor = openExample("two-lines");
        assertEquals(State.DONE, editor.computation().outcome().state());
        for (String name : editor.pagePositions().keySet()) {
            editor.showPage(editor.pagePositions().get(name));
            settle(editor);
            picture(name);
        }
        assertEquals(12, showPage(editor, EdgeTablePage.class).rowCount());
        assertFalse(editor.isDirty());
    }

    @Test
    void draggedPhase_movesItsAttachmentAndTheFieldAndCanBeUndone() throws IOException {
        StudyEditor editor = openExample("two-lines");
        SectionPage section = showPage(editor, SectionPage.class);
        Study study = editor.document().study();
        Circuit east = study.getLines().get(0).getCircuits().get(0);
        Phase phase = east.getPhases().get(0);
        Attachment attachment = study.getStructureTypes().get(0).getAttachments().get(0);
        assertEquals(phase.getAttachment(), attachment.getName());
        double offset = attachment.getOffsetMetres();
        double before = leftEdge(editor);
        Point place = section.view().placeOf(phase);
        assertNotNull(place, "the phase is shown");
        int pixels = -section.view().pixels(4);
        drag(section.view().control(), place, pixels, 0);
        pump(() -> attachment.getOffsetMetres() != offset);
        settle(editor);
        pumpEdge(editor, value -> value != before);
        assertEquals(offset - 4, attachment.getOffsetMetres(), 0.2);
        assertTrue(leftEdge(editor) > before, "nearer to the left edge, the field there rises");
        assertTrue(editor.isDirty());
        picture("SectionPage-dragged");
        assertEquals("Move phase 'A'", editor.document().commands().getUndoCommand().getLabel());
        editor.document().commands().undo();
        pumpEdge(editor, value -> value == before);
        assertEquals(offset, attachment.getOffsetMetres(), 0);
        assertFalse(editor.isDirty());
        editor.document().commands().redo();
        pumpEdge(editor, value -> value != before);
        assertEquals(offset - 4, attachment.getOffsetMetres(), 0.2);
    }

    @Test
    void draggedWire_isRoundedUnlessAltIsHeld() throws IOException {
        StudyEditor editor = openExample("heathland");
        SectionPage section = showPage(editor, SectionPage.class);
        Phase phase = editor.document().study().getLines().get(0).getCircuits().get(0).getPhases().get(0);
        Attachment attachment = editor.document().study().getStructureTypes().get(0).getAttachments().stream()
            .filter(a -> a.getName().equals(phase.getAttachment())).findFirst().orElseThrow();
        double offset = attachment.getOffsetMetres();
        double height = attachment.getHeightMetres();
        int pixels = 17;
        drag(section.view().control(), section.view().placeOf(phase), pixels, 0);
        assertEquals(0, Math.abs(attachment.getOffsetMetres() * 10 - Math.rint(attachment.getOffsetMetres() * 10)), 1e-9);
        assertNotEquals(offset, attachment.getOffsetMetres());
        settle(editor);
        editor.document().commands().undo();
        settle(editor);
        double metres = 1000.0 * pixels / section.view().pixels(1000);
        drag(section.view().control(), section.view().placeOf(phase), pixels, 0, SWT.ALT);
        // 1000 m are rounded to a pixel, which is 0.2 mm of 17 pixels at most
        assertEquals(offset + metres, attachment.getOffsetMetres(), 1e-3);
        assertTrue(Math.abs(metres * 10 - Math.rint(metres * 10)) > 0.02, "the move would show rounding");
        assertEquals(height, attachment.getHeightMetres(), 0);
    }

    @Test
    void draggedEdge_endsWhereItIsDroppedBetweenItsPoints() throws IOException {
        StudyEditor editor = openExample("two-lines");
        SectionPage section = showPage(editor, SectionPage.class);
        var edges = editor.document().study().getCorridor().getEdges();
        assertEquals(80, editor.document().study().getStations().get(0).getStationMetres(), 0);
        assertEquals(-45, edges.get(0).getLeftOffsetMetres(), 0);
        Point foot = section.view().placeOf(edges.get(1));
        drag(section.view().control(), new Point(foot.x, foot.y - 40), -section.view().pixels(5), 0);
        double moved = edges.get(1).getLeftOffsetMetres();
        assertEquals(-50, moved, 0.3);
        assertEquals(moved, edges.get(0).getLeftOffsetMetres(), 0);
        assertEquals(-45, edges.get(2).getLeftOffsetMetres(), 0);
        assertEquals(moved, spanfield.study.CorridorPlan.of(editor.document().study().getCorridor()).edges(80).leftOffsetMetres(), 1e-9);
    }

    @Test
    void keyboard_choosesMovesAndShowsExactNumbers() throws IOException {
        StudyEditor editor = openExample("heathland");
        SectionPage section = showPage(editor, SectionPage.class);
        Study study = editor.document().study();
        Phase phase = study.getLines().get(0).getCircuits().get(0).getPhases().get(0);
        Attachment attachment = study.getStructureTypes().get(0).getAttachments().stream().filter(a -> a.getName().equals(phase.getAttachment()))
            .findFirst().orElseThrow();
        editor.document().set("Odd", attachment, spanfield.model.SpanfieldPackage.eINSTANCE.getAttachment_HeightMetres(), attachment.getHeightMetres() + 0.05);
        settle(editor);
        Control control = section.view().control();
        for (int i = 0; i < 20 && section.view().chosenCircuit() == null; i++) {
            key(control, SWT.PAGE_DOWN, '\0');
        }
        assertEquals(study.getLines().get(0).getCircuits().get(0), section.view().chosenCircuit());
        assertTrue(section.view().select(phase));
        double offset = attachment.getOffsetMetres();
        double height = attachment.getHeightMetres();
        key(control, SWT.ARROW_RIGHT, '\0');
        assertEquals(offset + 0.1, attachment.getOffsetMetres(), 1e-9);
        assertEquals(height, attachment.getHeightMetres(), 0, "a level move leaves the height as it was typed");
        settle(editor);
        key(control, SWT.CR, '\r');
        assertEquals(attachment, ((org.eclipse.jface.viewers.IStructuredSelection) editor.selectionProvider().getSelection()).getFirstElement());
        while (display.readAndDispatch()) {
            // Properties follow
        }
        picture("SectionPage-exact");
    }

    @Test
    void zoom_keepsTheMiddleInPlace() throws IOException {
        StudyEditor editor = openExample("two-lines");
        SectionPage section = showPage(editor, SectionPage.class);
        Phase phase = editor.document().study().getLines().get(1).getCircuits().get(0).getPhases().get(0);
        int middle = section.view().control().getSize().x / 2;
        int before = section.view().placeOf(phase).x - middle;
        section.view().zoom(1.6);
        assertEquals(1.6 * before, section.view().placeOf(phase).x - middle, 3);
        picture("SectionPage-zoomed");
        section.view().fit();
        assertEquals(before, section.view().placeOf(phase).x - middle, 1);
    }

    @Test
    void phaseOrder_takesLabelsOfAnyLength() throws IOException {
        StudyEditor editor = openExample("heathland");
        SectionPage section = showPage(editor, SectionPage.class);
        Circuit circuit = editor.document().study().getLines().get(0).getCircuits().get(0);
        List<String> attachments = circuit.getPhases().stream().map(Phase::getAttachment).toList();
        for (int i = 0; i < 3; i++) {
            editor.document().set("Label", circuit.getPhases().get(i), spanfield.model.SpanfieldPackage.eINSTANCE.getPhase_Label(), "L" + (i + 1));
        }
        List<String> order = section.view().order(circuit);
        assertEquals("L1-L2-L3", spanfield.ui.section.internal.SectionView.text(order));
        assertEquals(6, section.view().orders(circuit).size());
        section.view().reorder(circuit, List.of("L3", "L2", "L1"));
        assertEquals(List.of("L3", "L2", "L1"), section.view().order(circuit));
        assertEquals(attachments.get(2), circuit.getPhases().get(0).getAttachment());
        editor.document().commands().undo();
        editor.document().set("Label", circuit.getPhases().get(1), spanfield.model.SpanfieldPackage.eINSTANCE.getPhase_Label(), "L1");
        assertEquals(List.of(), section.view().orders(circuit), "two phases of one label have no order");
    }

    @Test
    void reading_tellsTheNearestWireAndTheFieldBetweenPoints() throws IOException {
        StudyEditor editor = openExample("two-lines");
        var station = editor.document().study().getStations().get(0);
        var profile = editor.computation().outcome().profiles().get(station.getId());
        var series = profile.cases().get(0).series();
        double[] offsets = profile.offsetsMetres();
        double mean = (series.value(10).resultantTesla() + 3 * series.value(11).resultantTesla()) / 4;
        assertEquals(mean, spanfield.ui.section.internal.SectionReading.field(offsets, series, (offsets[10] + 3 * offsets[11]) / 4), 1e-12 * mean);
        assertEquals(series.value(0).resultantTesla(), spanfield.ui.section.internal.SectionReading.field(offsets, series, offsets[0]), 0);
        assertTrue(Double.isNaN(spanfield.ui.section.internal.SectionReading.field(offsets, series, offsets[0] - 0.01)));
        var wire = profile.cases().get(0).geometry().wires().stream().filter(w -> !w.shieldWire()).findFirst().orElseThrow();
        String text = spanfield.ui.section.internal.SectionReading.at(spanfield.study.CorridorPlan.of(editor.document().study().getCorridor()), profile,
            station.getStationMetres(), wire.offsetMetres(), wire.elevationMetres() - 5, spanfield.ui.common.DisplayUnits.get());
        assertTrue(text.contains("5.0 m from phase " + wire.phase() + " of '" + wire.element() + "'"), text);
        assertTrue(text.contains("(Rating)"), text);
    }

    @Test
    void span_showsTheLeastClearanceOfAllCasesOnItsOwnLine() throws IOException {
        StudyEditor editor = openExample("hillside");
        SpanPage span = showPage(editor, SpanPage.class);
        var all = editor.computation().outcome().snapshot().leastClearance(0).orElseThrow();
        assertEquals(all, span.least());
        for (var loadCase : editor.computation().outcome().snapshot().cases()) {
            var alone = editor.computation().outcome().snapshot().withCases(List.of(loadCase.id())).leastClearance(0).orElseThrow();
            assertTrue(span.least().clearanceMetres() <= alone.clearanceMetres(), loadCase.name());
        }
        picture("SpanPage-hillside");
    }

    @Test
    void preview_changesResultsButNotTheStudy() throws IOException {
        StudyEditor editor = openExample("heathland");
        double before = leftEdge(editor);
        byte[] saved = StudyFiles.serialize(editor.document().study());
        Study changed = StudyFiles.copy(editor.document().study());
        changed.getStructureTypes().get(0).getAttachments().forEach(a -> a.setHeightMetres(a.getHeightMetres() + 5));
        editor.computation().preview(changed);
        pumpEdge(editor, value -> value < before);
        assertEquals(new String(saved, StandardCharsets.UTF_8), new String(StudyFiles.serialize(editor.document().study()), StandardCharsets.UTF_8));
        editor.computation().request();
        pumpEdge(editor, value -> value == before);
    }

    @Test
    void newTwoCircuitStudy_isReorderedSavedAndReloaded() throws Exception {
        Study fresh = StudyTemplate.DOUBLE_VERTICAL.create("Fresh", 50, 220e3, 800);
        Studies.openFresh(window, fresh, "fresh");
        StudyEditor editor = (StudyEditor) page.getActiveEditor();
        settle(editor);
        assertEquals(State.DONE, editor.computation().outcome().state(), editor.computation().outcome().findings().toString());
        assertTrue(editor.isDirty());
        double before = leftEdge(editor);
        SectionPage section = showPage(editor, SectionPage.class);
        Circuit second = editor.document().study().getLines().get(0).getCircuits().get(1);
        assertEquals(List.of("A", "B", "C"), section.view().order(second));
        section.view().reorder(second, List.of("C", "B", "A"));
        pumpEdge(editor, value -> value != before);
        settle(editor);
        assertTrue(leftEdge(editor) < before, "opposite orders lower the field at the edge");
        Path file = folder.resolve("fresh.spanfield");
        assertTrue(editor.saveTo(file));
        assertFalse(editor.isDirty());
        Study back = StudyFiles.load(file);
        assertEquals("phase 6", back.getLines().get(0).getCircuits().get(1).getPhases().get(0).getAttachment());
        double saved = leftEdge(editor);
        page.closeAllEditors(false);
        Studies.open(window, file);
        StudyEditor again = (StudyEditor) page.getActiveEditor();
        settle(again);
        assertEquals(saved, leftEdge(again), 0);
    }

    @Test
    void addedCircuit_isRemovedWithItsLoads() throws IOException {
        StudyEditor editor = openExample("heathland");
        SectionPage section = showPage(editor, SectionPage.class);
        Study study = editor.document().study();
        section.view().addCircuit();
        settle(editor);
        assertEquals(2, study.getLines().get(0).getCircuits().size());
        assertEquals(2, study.getLoadCases().get(0).getLoads().size());
        pump(() -> section.view().placeOf(study.getLines().get(0).getCircuits().get(1).getPhases().get(0)) != null);
        assertTrue(section.view().select(study.getLines().get(0).getCircuits().get(1).getPhases().get(0)));
        section.view().removeSelected();
        settle(editor);
        assertEquals(1, study.getLines().get(0).getCircuits().size());
        assertEquals(1, study.getLoadCases().get(0).getLoads().size());
    }

    @Test
    void placedWires_appearAtThePointer() throws IOException {
        StudyEditor editor = openExample("hillside");
        SectionPage section = showPage(editor, SectionPage.class);
        var line = editor.document().study().getLines().get(0);
        Point peak = section.view().placeOf(line.getShieldWires().get(0));
        int beside = section.view().pixels(20);
        section.view().placeShieldWire(peak.x + beside, peak.y);
        settle(editor);
        assertEquals(2, line.getShieldWires().size());
        pump(() -> section.view().placeOf(line.getShieldWires().get(1)) != null);
        Point placed = section.view().placeOf(line.getShieldWires().get(1));
        assertEquals(peak.x + beside, placed.x, section.view().pixels(1) + 2);
        assertTrue(editor.computation().outcome().errors() == 0, editor.computation().outcome().findings().toString());
        picture("SectionPage-palette");
    }

    @Test
    void brokenStudy_showsFindingsAndNoResults() throws IOException {
        StudyEditor editor = openExample("heathland");
        Phase phase = editor.document().study().getLines().get(0).getCircuits().get(0).getPhases().get(1);
        editor.document().set("Break", phase, spanfield.model.SpanfieldPackage.eINSTANCE.getPhase_Attachment(), "left");
        pump(() -> editor.computation().outcome().state() == State.INVALID);
        assertEquals("Circuit_PhasesOnDifferentAttachments", editor.computation().outcome().findings().get(0).rule());
        assertTrue(editor.computation().outcome().profiles().isEmpty());
        editor.document().commands().undo();
        pump(() -> editor.computation().outcome().state() == State.DONE);
    }

    @Test
    void quickFix_mendsTheStudyAndCanBeUndone() throws IOException {
        StudyEditor editor = openExample("heathland");
        Study study = editor.document().study();
        editor.document().set("Break", study.getCorridor().getEdges().get(0), spanfield.model.SpanfieldPackage.eINSTANCE.getEdgePoint_LeftOffsetMetres(), 40.0);
        pump(() -> editor.computation().outcome().state() == State.INVALID);
        var finding = editor.computation().outcome().findings().get(0);
        assertEquals("Corridor_EdgesInOrder", finding.rule());
        var fixes = spanfield.ui.common.internal.QuickFixes.of(finding, editor.document());
        assertEquals(java.util.Set.of("Exchange the edges"), fixes.keySet());
        editor.document().execute(fixes.get("Exchange the edges"));
        pump(() -> editor.computation().outcome().state() == State.DONE);
        assertEquals(22, study.getCorridor().getEdges().get(0).getLeftOffsetMetres(), 0);
        assertEquals(40, study.getCorridor().getEdges().get(0).getRightOffsetMetres(), 0);
        editor.document().commands().undo();
        assertEquals(40, study.getCorridor().getEdges().get(0).getLeftOffsetMetres(), 0);
    }

    @Test
    void guide_hasATopicForEveryPageAndOpensThere() throws Exception {
        StudyEditor editor = openExample("heathland");
        GuideView guide = (GuideView) page.showView("spanfield.app.guide");
        for (int i = 0; i < editor.pages().size(); i++) {
            editor.showPage(i);
            assertTrue(guide.titles().contains(editor.activePageName()), "topic of " + editor.activePageName());
        }
        guide.show("Edge table");
        settle(editor);
        picture("Guide");
        page.hideView(guide);
    }

    @Test
    void exports_areWritten() throws IOException {
        StudyEditor editor = openExample("hillside");
        ProfilePage profile = showPage(editor, ProfilePage.class);
        Path svg = folder.resolve("p.svg");
        Path png = folder.resolve("p.png");
        Path csv = folder.resolve("p.csv");
        profile.exportTo(svg);
        profile.exportTo(png);
        profile.exportTo(csv);
        assertTrue(Files.readString(svg).contains("Hillside double circuit"));
        assertTrue(new ImageData(png.toString()).width > 1000);
        Path pdf = folder.resolve("p.pdf");
        profile.exportTo(pdf);
        assertTrue(Files.readString(pdf, StandardCharsets.ISO_8859_1).startsWith("%PDF-"));
        assertTrue(Files.readString(csv).lines().count() > 200);
        Path edges = folder.resolve("e.csv");
        showPage(editor, EdgeTablePage.class).exportTo(edges);
        assertTrue(Files.readString(edges).contains("Rating in wind"));
    }

    @Test
    void importedSurvey_isPartOfTheStudyAndDrawn() throws IOException {
        StudyEditor editor = openExample("heathland");
        ProfilePage profile = showPage(editor, ProfilePage.class);
        Path file = folder.resolve("walk.csv");
        Files.writeString(file, "station_m,offset_m,height_m,resultant_uT\n100,-20,1,2.1\n100,-10,1,5.6\n100,0,1,10.2\n100,10,1,5.9\n300,0,1,4\n");
        profile.importSurvey(file);
        settle(editor);
        assertEquals(5, editor.document().study().getSurveys().get(0).getReadings().size());
        assertEquals("walk", editor.document().study().getSurveys().get(0).getName());
        assertEquals(State.DONE, editor.computation().outcome().state());
        picture("ProfilePage-survey");
        editor.document().commands().undo();
        assertTrue(editor.document().study().getSurveys().isEmpty());
    }

    @Test
    void changeOnDisk_isNoticed() throws Exception {
        StudyEditor editor = openExample("heathland");
        assertFalse(editor.document().changedOnDisk());
        Path file = editor.document().path();
        Files.writeString(file, Files.readString(file).replace("Heathland single circuit", "Changed elsewhere"));
        assertTrue(editor.document().changedOnDisk());
        editor.document().reload();
        assertEquals("Changed elsewhere", editor.document().study().getName());
        assertFalse(editor.document().changedOnDisk());
    }

    @Test
    void recoveredChanges_areSavedToTheFile() throws Exception {
        StudyEditor editor = openExample("heathland");
        Study unsaved = StudyFiles.copy(editor.document().study());
        unsaved.setName("Changed before the crash");
        editor.document().recover(unsaved);
        assertTrue(editor.isDirty());
        assertTrue(editor.document().hasFile());
        editor.doSave(new org.eclipse.core.runtime.NullProgressMonitor());
        assertFalse(editor.isDirty());
        assertEquals("Changed before the crash", StudyFiles.load(editor.document().path()).getName());
    }

    @Test
    void sameFile_opensOnce() throws IOException {
        StudyEditor editor = openExample("heathland");
        Studies.open(window, editor.document().path());
        assertEquals(1, page.getEditorReferences().length);
        assertEquals(StudyInput.of(editor.document().path()), editor.getEditorInput());
        assertNotEquals(StudyInput.of(folder.resolve("other")), editor.getEditorInput());
    }

    @Test
    void everyTemplate_isSoundOrSaysWhatIsMissing() {
        for (StudyTemplate template : StudyTemplate.values()) {
            Study study = template.create("T", 60, 110e3, 300);
            long errors = spanfield.study.StudyCheck.check(study).stream().filter(f -> f.isError()).count();
            assertEquals(template == StudyTemplate.EMPTY ? 3 : 0, errors, template.name());
        }
    }
}
