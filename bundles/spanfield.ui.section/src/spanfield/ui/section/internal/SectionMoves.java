/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EObject;
import spanfield.model.Attachment;
import spanfield.model.Corridor;
import spanfield.model.EdgePoint;
import spanfield.model.Line;
import spanfield.model.Phase;
import spanfield.model.ShieldWire;
import spanfield.model.SpanfieldPackage;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.validation.Places;
import spanfield.ui.section.internal.SectionItem.Kind;

/** What moving an item of the cross-section means for the model: numbers of attributes that change. */
final class SectionMoves {

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;

    /** A wire stays this far above the base of its structure, in metres, however far it is dragged. */
    private static final double LEAST_WIRE_HEIGHT_METRES = 0.1;

    /** Sums of rounded numbers are rounded to this again, in metres, so that no binary tail is left. */
    private static final double TIDY_METRES = 1e-6;

    private SectionMoves() {
    }

    /** One number that changes. */
    record Change(EObject object, EAttribute attribute, double value) {
    }

    /**
     * The changes that a move makes.
     *
     * <p>A wire takes its attachment along, in every structure type of its line; a structure takes its whole line along; an edge moves
     * the edge points on either side of the station.
     *
     * @param station station of the section in metres
     * @param across  metres to the right
     * @param up      metres up; ignored for structures and edges
     * @param step    values are rounded to this, in metres; 0 leaves them as they are
     */
    static List<Change> changes(SectionItem item, double station, double across, double up, double step) {
        List<Change> changes = new ArrayList<>();
        switch (item.kind()) {
            case PHASE -> {
                Phase phase = (Phase) item.target();
                moveAttachment((Line) phase.eContainer().eContainer(), phase.getAttachment(), across, up, step, changes);
            }
            case SHIELD -> {
                ShieldWire wire = (ShieldWire) item.target();
                moveAttachment((Line) wire.eContainer(), wire.getAttachment(), across, up, step, changes);
            }
            case STRUCTURE -> {
                Line line = (Line) item.target().eContainer();
                double shift = round(across, step);
                for (Structure structure : line.getStructures()) {
                    add(changes, structure, P.getStructure_OffsetMetres(), shift, step > 0 ? TIDY_METRES : 0, Double.NEGATIVE_INFINITY);
                }
            }
            case LEFT_EDGE -> moveEdge((EdgePoint) item.target(), station, P.getEdgePoint_LeftOffsetMetres(), across, step, changes);
            case RIGHT_EDGE -> moveEdge((EdgePoint) item.target(), station, P.getEdgePoint_RightOffsetMetres(), across, step, changes);
            default -> { }
        }
        return changes;
    }

    /** The edge is straight between its points: both points about the station move, so that it ends where it is dropped. */
    private static void moveEdge(EdgePoint edge, double station, EAttribute attribute, double across, double step, List<Change> changes) {
        EdgePoint before = null;
        EdgePoint after = null;
        for (EdgePoint point : ((Corridor) edge.eContainer()).getEdges()) {
            double at = point.getStationMetres();
            before = at <= station && (before == null || at > before.getStationMetres()) ? point : before;
            after = at >= station && (after == null || at < after.getStationMetres()) ? point : after;
        }
        for (EdgePoint point : new LinkedHashSet<>(Arrays.asList(before, after))) {
            if (point != null) {
                add(changes, point, attribute, across, step, Double.NEGATIVE_INFINITY);
            }
        }
    }

    private static void moveAttachment(Line line, String name, double across, double up, double step, List<Change> changes) {
        Set<StructureType> types = new LinkedHashSet<>();
        line.getStructures().stream().map(Structure::getType).filter(Objects::nonNull).forEach(types::add);
        for (StructureType type : types) {
            for (Attachment attachment : type.getAttachments()) {
                if (name != null && name.equals(attachment.getName())) {
                    add(changes, attachment, P.getAttachment_OffsetMetres(), across, step, Double.NEGATIVE_INFINITY);
                    add(changes, attachment, P.getAttachment_HeightMetres(), up, step, attachment.getInsulatorLengthMetres() + LEAST_WIRE_HEIGHT_METRES);
                }
            }
        }
    }

    /** A move along one axis leaves the other number alone, rounded or not; what ends where it was is no change. */
    private static void add(List<Change> changes, EObject object, EAttribute attribute, double by, double step, double least) {
        double before = (Double) object.eGet(attribute);
        double after = Math.max(least, round(before + by, step));
        if (by != 0 && after != before) {
            changes.add(new Change(object, attribute, after));
        }
    }

    static double round(double value, double step) {
        // two steps of rounding: to the step, and away from the binary tail that the first leaves
        return step > 0 ? Math.rint(Math.rint(value / step) * step * 1e9) / 1e9 : value;
    }

    /** Name of a move for the Edit menu. */
    static String label(SectionItem item) {
        return item.kind() == Kind.STRUCTURE ? "Move " + Places.name(item.target().eContainer())
            : item.kind() == Kind.LEFT_EDGE ? "Move left edge" : item.kind() == Kind.RIGHT_EDGE ? "Move right edge" : "Move " + Places.name(item.target());
    }

    /** Name of an item. */
    static String name(SectionItem item) {
        return item.kind() == Kind.LEFT_EDGE || item.kind() == Kind.RIGHT_EDGE ? item.label()
            : item.target() instanceof Phase phase ? Places.name(phase) + " of " + Places.name(phase.eContainer()) : Places.name(item.target());
    }

    /** The line that an object belongs to, or null. */
    static Line line(EObject object) {
        EObject at = object;
        while (at != null && !(at instanceof Line)) {
            at = at.eContainer();
        }
        return (Line) at;
    }
}
