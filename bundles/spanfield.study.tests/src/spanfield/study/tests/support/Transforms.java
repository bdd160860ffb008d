/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.tests.support;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.eclipse.emf.common.util.ECollections;
import spanfield.model.AlignmentBend;
import spanfield.model.CircuitLoad;
import spanfield.model.Corridor;
import spanfield.model.EdgePoint;
import spanfield.model.FlowDirection;
import spanfield.model.GroundPoint;
import spanfield.model.Line;
import spanfield.model.LineEnd;
import spanfield.model.LoadCase;
import spanfield.model.ProfileStation;
import spanfield.model.Structure;
import spanfield.model.StructureType;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;

/** Changes of a study that must leave its field as it is, or turn it in a known way. All return changed copies. */
public final class Transforms {

    private Transforms() {
    }

    /** The study seen in a mirror that stands along the centreline: left and right change places. */
    public static Study mirrored(Study original) {
        Study study = StudyFiles.copy(original);
        mirror(study.getCorridor());
        for (StructureType type : study.getStructureTypes()) {
            type.getAttachments().forEach(a -> a.setOffsetMetres(-a.getOffsetMetres()));
        }
        for (Line line : study.getLines()) {
            for (Structure structure : line.getStructures()) {
                structure.setOffsetMetres(-structure.getOffsetMetres());
                if (structure.getTurnDegrees() != null) {
                    structure.setTurnDegrees(-structure.getTurnDegrees());
                }
            }
        }
        study.getLoadCases().forEach(c -> c.setWindSwingDegrees(-c.getWindSwingDegrees()));
        for (ProfileStation station : study.getStations()) {
            double from = station.getFromOffsetMetres();
            station.setFromOffsetMetres(-station.getToOffsetMetres());
            station.setToOffsetMetres(-from);
        }
        return study;
    }

    private static void mirror(Corridor corridor) {
        corridor.setCrossSlope(-corridor.getCrossSlope());
        for (EdgePoint edge : corridor.getEdges()) {
            double left = edge.getLeftOffsetMetres();
            edge.setLeftOffsetMetres(-edge.getRightOffsetMetres());
            edge.setRightOffsetMetres(-left);
        }
        List<GroundPoint> points = new ArrayList<>(corridor.getGroundPoints());
        points.forEach(g -> g.setOffsetMetres(-g.getOffsetMetres()));
        Collections.reverse(points);
        corridor.getGroundPoints().clear();
        corridor.getGroundPoints().addAll(points);
        for (AlignmentBend bend : corridor.getBends()) {
            bend.setDeflectionDegrees(-bend.getDeflectionDegrees());
        }
    }

    /**
     * The same wires with every line described from its other end: structures in the other order, right attachments on the left, currents in
     * the other direction. Each line must have structure types of its own and one section.
     */
    public static Study describedBackwards(Study original) {
        Study study = StudyFiles.copy(original);
        for (StructureType type : study.getStructureTypes()) {
            type.getAttachments().forEach(a -> a.setOffsetMetres(-a.getOffsetMetres()));
        }
        for (Line line : study.getLines()) {
            ECollections.reverse(line.getStructures());
            LineEnd start = line.getStartEnd();
            line.setStartEnd(line.getFinishEnd());
            line.setFinishEnd(start);
            line.getShieldWires().forEach(w -> w.setGivenAngleDegrees(w.getGivenAngleDegrees() - 180));
        }
        reverseFlows(study);
        return study;
    }

    /** Every load in the other direction. */
    public static Study reversedFlows(Study original) {
        Study study = StudyFiles.copy(original);
        reverseFlows(study);
        return study;
    }

    private static void reverseFlows(Study study) {
        for (LoadCase loadCase : study.getLoadCases()) {
            for (CircuitLoad load : loadCase.getLoads()) {
                load.setDirection(load.getDirection() == FlowDirection.FORWARD ? FlowDirection.REVERSED : FlowDirection.FORWARD);
            }
        }
    }
}
