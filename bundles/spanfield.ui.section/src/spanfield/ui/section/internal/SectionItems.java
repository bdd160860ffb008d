/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import java.util.ArrayList;
import java.util.List;
import spanfield.model.Circuit;
import spanfield.model.EdgePoint;
import spanfield.model.Line;
import spanfield.model.OutlineStroke;
import spanfield.model.Phase;
import spanfield.model.ShieldWire;
import spanfield.model.Structure;
import spanfield.model.Study;
import spanfield.study.CorridorPlan;
import spanfield.study.result.LateralProfile;
import spanfield.study.result.StationGeometry.WireAtStation;
import spanfield.ui.section.internal.SectionItem.Kind;

/**
 * What the cross-section at a station shows: ground, edges and reference height from the study, wires from the newest profile, and the
 * nearest structure of each line drawn where it stands.
 */
final class SectionItems {

    private final Study study;
    private final double station;
    private final CorridorPlan plan;
    private final List<SectionItem> items = new ArrayList<>();

    private SectionItems(Study study, double station) {
        this.study = study;
        this.station = station;
        this.plan = CorridorPlan.of(study.getCorridor());
    }

    /**
     * The items, from back to front.
     *
     * @param profile newest profile at the station, or null while there is none
     */
    static List<SectionItem> of(Study study, double station, double from, double to, LateralProfile profile) {
        SectionItems builder = new SectionItems(study, station);
        builder.addGround(from, to);
        builder.addStructures(from, to);
        builder.addEdges();
        if (profile != null && !profile.cases().isEmpty()) {
            builder.addWires(profile);
        }
        return builder.items;
    }

    private void addGround(double from, double to) {
        List<double[]> ground = new ArrayList<>();
        List<double[]> reference = new ArrayList<>();
        final int parts = 120;
        for (int i = 0; i <= parts; i++) {
            double offset = from + (to - from) * i / parts;
            double elevation = plan.groundElevation(station, offset);
            ground.add(new double[] {offset, elevation});
            reference.add(new double[] {offset, elevation + study.getReferenceHeightMetres()});
        }
        items.add(new SectionItem(Kind.GROUND, study.getCorridor(), "", ground, -1, false));
        items.add(new SectionItem(Kind.REFERENCE, study, "", reference, -1, false));
    }

    private void addEdges() {
        EdgePoint edge = study.getCorridor().getEdges().get(0);
        for (EdgePoint other : study.getCorridor().getEdges()) {
            if (Math.abs(other.getStationMetres() - station) < Math.abs(edge.getStationMetres() - station)) {
                edge = other;
            }
        }
        double left = plan.edges(station).leftOffsetMetres();
        double right = plan.edges(station).rightOffsetMetres();
        items.add(new SectionItem(Kind.LEFT_EDGE, edge, "Left edge", List.of(new double[] {left, plan.groundElevation(station, left)}), -1, true));
        items.add(new SectionItem(Kind.RIGHT_EDGE, edge, "Right edge", List.of(new double[] {right, plan.groundElevation(station, right)}), -1, true));
    }

    private void addStructures(double from, double to) {
        for (Line line : study.getLines()) {
            Structure nearest = null;
            for (Structure structure : line.getStructures()) {
                boolean inside = structure.getOffsetMetres() >= from && structure.getOffsetMetres() <= to;
                if (inside && structure.getType() != null && (nearest == null
                    || Math.abs(structure.getStationMetres() - station) < Math.abs(nearest.getStationMetres() - station))) {
                    nearest = structure;
                }
            }
            if (nearest != null) {
                addOutline(nearest);
            }
        }
    }

    private void addOutline(Structure structure) {
        double base = structure.getBaseElevationMetres() != null ? structure.getBaseElevationMetres()
            : plan.groundElevation(structure.getStationMetres(), structure.getOffsetMetres());
        // drawn on the ground of this station, so that wire and structure are seen at their heights above it
        double here = plan.groundElevation(station, structure.getOffsetMetres());
        double lift = here + base - plan.groundElevation(structure.getStationMetres(), structure.getOffsetMetres()) + structure.getHeightAdjustmentMetres();
        List<double[]> points = new ArrayList<>();
        for (OutlineStroke stroke : structure.getType().getOutline()) {
            for (int i = 0; i < stroke.getPoints().size(); i++) {
                points.add(new double[] {structure.getOffsetMetres() + stroke.getPoints().get(i).getOffsetMetres(),
                    lift + stroke.getPoints().get(i).getHeightMetres(), i == 0 ? 1 : 0});
            }
        }
        if (!points.isEmpty()) {
            items.add(new SectionItem(Kind.STRUCTURE, structure, String.valueOf(structure.getName()), points, -1, true));
        }
    }

    private void addWires(LateralProfile profile) {
        List<Circuit> circuits = new ArrayList<>();
        study.getLines().forEach(line -> circuits.addAll(line.getCircuits()));
        for (WireAtStation wire : profile.cases().get(0).geometry().wires()) {
            List<double[]> place = List.of(new double[] {wire.offsetMetres(), wire.elevationMetres()});
            if (wire.shieldWire()) {
                ShieldWire shield = find(wire.elementId(), ShieldWire.class);
                if (shield != null) {
                    items.add(new SectionItem(Kind.SHIELD, shield, "", place, -1, true));
                }
                continue;
            }
            Circuit circuit = find(wire.elementId(), Circuit.class);
            if (circuit == null) {
                continue;
            }
            for (Phase phase : circuit.getPhases()) {
                if (wire.phase().equals(phase.getLabel())) {
                    items.add(new SectionItem(Kind.PHASE, phase, phase.getLabel(), place, circuits.indexOf(circuit), true));
                }
            }
        }
    }

    private <T extends spanfield.model.NamedElement> T find(String id, Class<T> type) {
        for (Line line : study.getLines()) {
            for (spanfield.model.StrungElement element : line.getCircuits()) {
                if (type.isInstance(element) && id.equals(element.getId())) {
                    return type.cast(element);
                }
            }
            for (spanfield.model.StrungElement element : line.getShieldWires()) {
                if (type.isInstance(element) && id.equals(element.getId())) {
                    return type.cast(element);
                }
            }
        }
        return null;
    }
}
