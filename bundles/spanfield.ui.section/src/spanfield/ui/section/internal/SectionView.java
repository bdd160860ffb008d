/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import org.eclipse.draw2d.FigureCanvas;
import org.eclipse.draw2d.geometry.Point;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.gef.EditDomain;
import org.eclipse.gef.EditPart;
import org.eclipse.gef.EditPartFactory;
import org.eclipse.gef.editparts.FreeformGraphicalRootEditPart;
import org.eclipse.gef.ui.palette.PaletteViewer;
import org.eclipse.gef.ui.parts.ScrollingGraphicalViewer;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.RGB;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import spanfield.model.Attachment;
import spanfield.model.Circuit;
import spanfield.model.Line;
import spanfield.model.Phase;
import spanfield.model.ProfileStation;
import spanfield.model.ShieldWire;
import spanfield.model.StrungElement;
import spanfield.model.Structure;
import spanfield.model.Study;
import spanfield.study.CorridorPlan;
import spanfield.study.result.LateralProfile;
import spanfield.ui.common.DisplayUnits;
import spanfield.ui.common.StudyComputation;
import spanfield.ui.common.StudyEditor;

/** The graphical viewer of the cross-section and what its gestures do. */
public final class SectionView implements SectionContext {

    /** How to use the page. */
    public static final String HINT = "Drag wires, structures and edges (Alt: not rounded). Page Down chooses, arrow keys move, Enter shows exact numbers.";

    private static final double SNAP_METRES = 0.1;
    private static final double ZOOM_STEP = 1.25;
    private static final double LEAST_PIXELS_PER_METRE = 0.2;
    private static final double GREATEST_PIXELS_PER_METRE = 200;
    private static final int PALETTE_WIDTH = 110;
    private static final double MARGIN_METRES = 8;
    private static final float[] HUES = {215, 25, 150, 290, 45, 185};

    private final StudyEditor editor;
    private final Consumer<String> reading;
    private final ScrollingGraphicalViewer viewer = new ScrollingGraphicalViewer();
    private final Control control;
    private List<SectionItem> items = new ArrayList<>();
    private SectionScale scale = new SectionScale(6, -60, 60);
    private ProfileStation station;
    private LateralProfile profile;
    private boolean snap = true;
    private boolean dragging;
    private boolean revealing;
    private boolean fitted;

    /**
     * @param reading receives texts about the place under the pointer
     */
    public SectionView(Composite parent, StudyEditor editor, Consumer<String> reading) {
        this.editor = editor;
        this.reading = reading;
        Composite both = new Composite(parent, SWT.NONE);
        GridLayoutFactory.fillDefaults().numColumns(2).spacing(0, 0).applyTo(both);
        PaletteViewer palette = new PaletteViewer();
        Control tools = palette.createControl(both);
        GridDataFactory.fillDefaults().hint(PALETTE_WIDTH, SWT.DEFAULT).grab(false, true).applyTo(tools);
        control = viewer.createControl(both);
        GridDataFactory.fillDefaults().grab(true, true).applyTo(control);
        control.setBackground(parent.getDisplay().getSystemColor(SWT.COLOR_LIST_BACKGROUND));
        control.setForeground(parent.getDisplay().getSystemColor(SWT.COLOR_LIST_FOREGROUND));
        EditDomain domain = new EditDomain();
        domain.setCommandStack(new EmfCommandStack(editor.document()));
        domain.addViewer(viewer);
        domain.setPaletteViewer(palette);
        domain.setPaletteRoot(SectionPalette.create());
        viewer.setRootEditPart(new FreeformGraphicalRootEditPart());
        viewer.setEditPartFactory(new Factory());
        viewer.setContents(this);
        viewer.addSelectionChangedListener(event -> selectionChanged());
        control.addListener(SWT.MouseMove, this::pointerMoved);
        control.addListener(SWT.KeyDown, this::keyPressed);
        control.addListener(SWT.MouseWheel, this::wheelTurned);
        control.addListener(SWT.Resize, event -> {
            if (!fitted && station != null && control.getSize().x > 100) {
                fitted = true;
                fit();
            }
        });
    }

    public Control control() {
        return control;
    }

    /** Makes parts for the sheet and its items. */
    private final class Factory implements EditPartFactory {

        @Override
        public EditPart createEditPart(EditPart context, Object model) {
            return model instanceof SectionItem item ? new ItemPart(item, SectionView.this) : new ContentsPart(SectionView.this);
        }
    }

    // content

    /** Shows a station of the study, or nothing. */
    public void show(ProfileStation chosen) {
        boolean other = station != chosen;
        station = chosen;
        if (other) {
            profile = null;
        }
        LateralProfile newest = station == null ? null : editor.computation().outcome().profiles().get(station.getId());
        profile = newest == null ? profile : newest;
        refresh();
        if (other && control.getSize().x > 100) {
            fitted = true;
            fit();
        }
    }

    /** Takes the newest results. */
    public void computed(StudyComputation.Outcome outcome) {
        LateralProfile newest = station == null ? null : outcome.profiles().get(station.getId());
        if (newest != null && newest != profile) {
            profile = newest;
            if (!dragging) {
                boolean first = items.stream().noneMatch(item -> item.kind() == SectionItem.Kind.PHASE);
                refresh();
                if (first) {
                    fit();
                }
            }
        }
    }

    private void refresh() {
        if (control.isDisposed()) {
            return;
        }
        Study study = editor.document().study();
        boolean possible = station != null && study.getCorridor() != null && !study.getCorridor().getEdges().isEmpty()
            && station.getFromOffsetMetres() < station.getToOffsetMetres();
        List<SectionItem> fresh = possible ? SectionItems.of(study, station.getStationMetres(), station.getFromOffsetMetres(),
            station.getToOffsetMetres(), profile) : List.of();
        adopt(fresh);
        viewer.getContents().refresh();
        for (Object child : viewer.getContents().getChildren()) {
            ((ItemPart) child).update(((ItemPart) child).item());
        }
    }

    /** Gives the parts of items that are still there their new state, so that figures and selection stay. */
    private void adopt(List<SectionItem> fresh) {
        List<ItemPart> parts = new ArrayList<>();
        for (Object child : viewer.getContents().getChildren()) {
            parts.add((ItemPart) child);
        }
        for (SectionItem item : fresh) {
            ItemPart known = parts.stream().filter(part -> part.item().sameAs(item)).findFirst().orElse(null);
            if (known != null) {
                parts.remove(known);
                viewer.getEditPartRegistry().remove(known.getModel());
                known.setModel(item);
                viewer.getEditPartRegistry().put(item, known);
            }
        }
        items = fresh;
    }

    /** Chooses a scale at which everything between the edges, and the structures, can be seen. */
    public void fit() {
        double left = Double.POSITIVE_INFINITY;
        double right = Double.NEGATIVE_INFINITY;
        double bottom = Double.POSITIVE_INFINITY;
        double top = Double.NEGATIVE_INFINITY;
        for (SectionItem item : items) {
            boolean wide = item.kind() == SectionItem.Kind.GROUND || item.kind() == SectionItem.Kind.REFERENCE;
            for (double[] place : item.places()) {
                if (!wide) {
                    left = Math.min(left, place[0]);
                    right = Math.max(right, place[0]);
                    bottom = Math.min(bottom, place[1]);
                    top = Math.max(top, place[1]);
                }
            }
        }
        if (left < right) {
            double across = 2 * MARGIN_METRES;
            scale = SectionScale.fitting(left - across, right + across, bottom - MARGIN_METRES, top + MARGIN_METRES, control.getSize().x - 24, control.getSize().y - 24);
            refresh();
            ((FigureCanvas) control).scrollTo(0, 0);
        }
    }

    /** Changes the scale by a factor; what is in the middle stays there. */
    public void zoom(double factor) {
        zoom(factor, control.getSize().x / 2, control.getSize().y / 2);
    }

    /** Changes the scale by a factor; what lies at a pixel of the control stays there, as far as the sheet reaches. */
    private void zoom(double factor, int x, int y) {
        Point before = inSheet(x, y);
        double offset = scale.offset(before.x);
        double elevation = scale.elevation(before.y);
        double wanted = Math.max(LEAST_PIXELS_PER_METRE, Math.min(GREATEST_PIXELS_PER_METRE, scale.pixelsPerMetre() * factor));
        scale = scale.zoomed(wanted / scale.pixelsPerMetre());
        refresh();
        viewer.flush();
        Point after = scale.toPixel(offset, elevation);
        ((FigureCanvas) control).scrollTo(after.x - x, after.y - y);
    }

    private void wheelTurned(Event event) {
        if ((event.stateMask & SWT.MOD1) != 0 && event.count != 0) {
            zoom(event.count > 0 ? ZOOM_STEP : 1 / ZOOM_STEP, event.x, event.y);
            event.doit = false;
        }
    }

    /** Whether moves are rounded to 0.1 m. */
    public void setSnap(boolean on) {
        snap = on;
    }

    // pointer and keys

    private Point inSheet(int x, int y) {
        Point view = ((FigureCanvas) control).getViewport().getViewLocation();
        return new Point(x + view.x, y + view.y);
    }

    private void pointerMoved(Event event) {
        if (station == null || items.isEmpty()) {
            return;
        }
        Point place = inSheet(event.x, event.y);
        CorridorPlan plan = CorridorPlan.of(editor.document().study().getCorridor());
        reading.accept(SectionReading.at(plan, profile, station.getStationMetres(), scale.offset(place.x), scale.elevation(place.y), DisplayUnits.get()));
    }

    private void keyPressed(Event event) {
        double step = (event.stateMask & SWT.SHIFT) == 0 ? SNAP_METRES : 10 * SNAP_METRES;
        switch (event.keyCode) {
            case SWT.DEL -> removeSelected();
            case SWT.PAGE_DOWN -> chooseNext(1);
            case SWT.PAGE_UP -> chooseNext(-1);
            case SWT.CR, SWT.KEYPAD_CR -> open(chosen());
            case SWT.ARROW_LEFT -> nudge(-step, 0);
            case SWT.ARROW_RIGHT -> nudge(step, 0);
            case SWT.ARROW_DOWN -> nudge(0, -step);
            case SWT.ARROW_UP -> nudge(0, step);
            default -> zoomByKey(event.character);
        }
    }

    private void zoomByKey(char key) {
        if (key == '+' || key == '-') {
            zoom(key == '+' ? ZOOM_STEP : 1 / ZOOM_STEP);
        } else if (key == '0') {
            fit();
        }
    }

    private void nudge(double across, double up) {
        SectionItem chosen = chosen();
        if (chosen != null && chosen.draggable()) {
            execute(chosen, across, up, snap);
        }
    }

    /** Chooses the item after or before the chosen one, round about. */
    private void chooseNext(int by) {
        List<SectionItem> choosable = items.stream().filter(SectionItem::draggable).toList();
        if (!choosable.isEmpty()) {
            int at = choosable.indexOf(chosen());
            SectionItem next = choosable.get(at < 0 ? by > 0 ? 0 : choosable.size() - 1 : Math.floorMod(at + by, choosable.size()));
            viewer.select((EditPart) viewer.getEditPartRegistry().get(next));
            viewer.reveal((EditPart) viewer.getEditPartRegistry().get(next));
            reading.accept(SectionMoves.name(next) + " is chosen. Arrow keys move it, Enter shows its numbers in Properties.");
        }
    }

    @Override
    public void open(SectionItem item) {
        Attachment attachment = item == null ? null : attachment(item);
        if (attachment != null) {
            editor.select(attachment);
            reading.accept("Properties shows the attachment '" + attachment.getName() + "': type its offset and height there.");
        }
    }

    /** Where a wire is attached on the structure that is drawn; null for anything else. */
    private Attachment attachment(SectionItem item) {
        String name = item.target() instanceof Phase phase ? phase.getAttachment() : item.target() instanceof ShieldWire wire ? wire.getAttachment() : null;
        Line line = SectionMoves.line(item.target());
        return name == null || line == null ? null : nearest(line).map(Structure::getType).stream().flatMap(type -> type.getAttachments().stream())
            .filter(a -> name.equals(a.getName())).findFirst().orElse(null);
    }

    private SectionItem chosen() {
        List<?> selected = viewer.getSelectedEditParts();
        return selected.size() == 1 && selected.get(0) instanceof ItemPart part ? part.item() : null;
    }

    private void selectionChanged() {
        SectionItem chosen = chosen();
        if (chosen != null && chosen.target() != null && !revealing) {
            editor.select(chosen.target());
        }
    }

    /**
     * Chooses the item of a model object: a circuit is shown by its first phase, an attachment by a wire on it. The editor's selection stays
     * with the object.
     */
    public boolean select(EObject object) {
        for (Object child : viewer.getContents().getChildren()) {
            SectionItem item = ((ItemPart) child).item();
            if (item.target() == object || object instanceof Circuit && item.target() instanceof Phase && item.target().eContainer() == object
                || object instanceof Attachment && attachment(item) == object) {
                revealing = true;
                try {
                    viewer.select((EditPart) child);
                } finally {
                    revealing = false;
                }
                return true;
            }
        }
        return false;
    }

    // moves

    @Override
    public void move(SectionItem item, Point delta, boolean free) {
        execute(item, scale.metres(delta.x), -scale.metres(delta.y), snap && !free);
    }

    private List<SectionMoves.Change> changes(SectionItem item, double across, double up, boolean snapped) {
        return SectionMoves.changes(item, station.getStationMetres(), across, up, snapped ? SNAP_METRES : 0);
    }

    private void execute(SectionItem item, double across, double up, boolean snapped) {
        CompoundCommand command = new CompoundCommand(SectionMoves.label(item));
        for (SectionMoves.Change change : changes(item, across, up, snapped)) {
            command.append(SetCommand.create(editor.document().domain(), change.object(), change.attribute(), change.value()));
        }
        editor.document().execute(command);
    }

    @Override
    public void preview(SectionItem item, Point delta, boolean free) {
        dragging = true;
        EcoreUtil.Copier copier = new EcoreUtil.Copier();
        Study copy = (Study) copier.copy(editor.document().study());
        copier.copyReferences();
        for (SectionMoves.Change change : changes(item, scale.metres(delta.x), -scale.metres(delta.y), snap && !free)) {
            copier.get(change.object()).eSet(change.attribute(), change.value());
        }
        editor.computation().preview(copy);
    }

    @Override
    public void endPreview() {
        dragging = false;
        editor.computation().request();
    }

    // circuits

    /** The circuit of the chosen phase, or null. */
    public Circuit chosenCircuit() {
        SectionItem chosen = chosen();
        return chosen != null && chosen.target() instanceof Phase phase ? (Circuit) phase.eContainer() : null;
    }

    /** The line of the chosen item, or the first line; null without lines. */
    private Line line() {
        Study study = editor.document().study();
        SectionItem chosen = chosen();
        Line line = study.getLines().isEmpty() ? null : study.getLines().get(0);
        for (EObject at = chosen == null ? null : chosen.target(); at != null; at = at.eContainer()) {
            if (at instanceof Line own) {
                line = own;
            }
        }
        if (line == null) {
            reading.accept("The study has no line yet: add one in the Outline, or begin a new study from a template.");
        }
        return line;
    }

    /** Adds a circuit beside the others of the line of the chosen item, or of the first line. */
    public void addCircuit() {
        Line line = line();
        if (line != null) {
            double[] place = CircuitEdits.besideTheOthers(line);
            editor.document().execute(CircuitEdits.add(editor.document().domain(), editor.document().study(), line, place[0], place[1]));
        }
    }

    @Override
    public void place(SectionPalette.Kind kind, Point pixel) {
        Line line = line();
        if (line == null || station == null) {
            return;
        }
        Study study = editor.document().study();
        CorridorPlan plan = CorridorPlan.of(study.getCorridor());
        double offset = scale.offset(pixel.x);
        double height = scale.elevation(pixel.y) - plan.groundElevation(station.getStationMetres(), offset) + sagHere(line, plan);
        double fromAxis = offset - nearest(line).map(Structure::getOffsetMetres).orElse(0.0);
        editor.document().execute(kind == SectionPalette.Kind.CIRCUIT
            ? CircuitEdits.add(editor.document().domain(), study, line, fromAxis, height)
            : CircuitEdits.addShield(editor.document().domain(), study, line, fromAxis, height));
    }

    private Optional<Structure> nearest(Line line) {
        return line.getStructures().stream().min(java.util.Comparator.comparingDouble(
            s -> Math.abs(s.getStationMetres() - station.getStationMetres())));
    }

    /** How much lower a wire of the line hangs here than at its structures, so that what is placed appears at the pointer. */
    private double sagHere(Line line, CorridorPlan plan) {
        for (SectionItem item : items) {
            if (item.kind() == SectionItem.Kind.PHASE && item.target().eContainer().eContainer() == line) {
                Attachment hung = attachment(item);
                double here = item.places().get(0)[1] - plan.groundElevation(station.getStationMetres(), item.places().get(0)[0]);
                return hung == null ? 0 : hung.getHeightMetres() - hung.getInsulatorLengthMetres() - here;
            }
        }
        return 0;
    }

    /** Removes the circuit of the chosen phase, or the chosen shield wire. */
    public void removeSelected() {
        SectionItem chosen = chosen();
        StrungElement element = chosenCircuit() != null ? chosenCircuit() : chosen != null && chosen.target() instanceof ShieldWire wire ? wire : null;
        if (element == null) {
            reading.accept("Choose a phase or a shield wire first.");
            return;
        }
        editor.document().execute(CircuitEdits.remove(editor.document().domain(), editor.document().study(), element));
    }

    /** Order of a circuit's phases on its attachments. */
    public List<String> order(Circuit circuit) {
        return CircuitEdits.order(circuit);
    }

    /** Every order of a circuit's phases. */
    public List<List<String>> orders(Circuit circuit) {
        return CircuitEdits.orders(circuit);
    }

    /** An order of phases as people write it. */
    public static String text(List<String> order) {
        return CircuitEdits.text(order);
    }

    /** Changes the order of a circuit's phases. */
    public void reorder(Circuit circuit, List<String> order) {
        editor.document().execute(CircuitEdits.reorder(editor.document().domain(), circuit, order));
    }

    // for tests

    /** Places a shield wire at a pixel of the control, as the palette's tool does. */
    public void placeShieldWire(int x, int y) {
        place(SectionPalette.Kind.SHIELD_WIRE, inSheet(x, y));
    }

    /** Place of a model object's item in the control, in pixels, or null when it is not shown. */
    public org.eclipse.swt.graphics.Point placeOf(EObject object) {
        for (SectionItem item : items) {
            if (item.target() == object) {
                Point pixel = scale.toPixel(item.places().get(0)[0], item.places().get(0)[1]);
                Point view = ((FigureCanvas) control).getViewport().getViewLocation();
                return new org.eclipse.swt.graphics.Point(pixel.x - view.x, pixel.y - view.y);
            }
        }
        return null;
    }

    /** Pixels of a length at the present scale. */
    public int pixels(double metres) {
        return (int) Math.round(metres * scale.pixelsPerMetre());
    }

    // context

    @Override
    public List<SectionItem> items() {
        return items;
    }

    @Override
    public SectionScale scale() {
        return scale;
    }

    @Override
    public Color foreground() {
        return control.getForeground();
    }

    private boolean dark() {
        RGB rgb = control.getBackground().getRGB();
        return 0.3 * rgb.red + 0.6 * rgb.green + 0.1 * rgb.blue < 128;
    }

    @Override
    public Color faintColor() {
        return new Color(dark() ? new RGB(150, 150, 150) : new RGB(120, 120, 120));
    }

    @Override
    public Color groundColor() {
        return new Color(dark() ? new RGB(190, 160, 120) : new RGB(120, 95, 60));
    }

    @Override
    public Color structureColor() {
        return new Color(dark() ? new RGB(190, 190, 190) : new RGB(90, 90, 90));
    }

    @Override
    public Color circuitColor(int group) {
        float hue = HUES[Math.max(0, group) % HUES.length];
        return new Color(dark() ? new RGB(hue, 0.55f, 0.98f) : new RGB(hue, 0.85f, 0.68f));
    }

    /** Frees the parts. */
    public void dispose() {
        viewer.setContents((EditPart) null);
    }
}
