/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;

/**
 * Wires where they cross the plane of a station's profile: for drawing, and the clearances there.
 *
 * @param station          the station
 * @param windSwingRadians swing of the wires in radians
 * @param wires            crossings of wires with the plane near the profile; a wire may cross more than once or never
 * @param clearances       least clearance of each circuit and shield wire that crosses the plane
 */
public record StationGeometry(StationInfo station, double windSwingRadians, List<WireAtStation> wires, List<Clearance> clearances) {

    public StationGeometry {
        wires = List.copyOf(wires);
        clearances = List.copyOf(clearances);
    }

    /**
     * A crossing of a phase (the centre of its bundle) or of a shield wire with the plane.
     *
     * @param line                 name of the line
     * @param elementId            identifier of the circuit or shield wire in the study file
     * @param element              name of the circuit or shield wire
     * @param phase                label of the phase; empty for a shield wire
     * @param shieldWire           whether it is a shield wire
     * @param offsetMetres         offset in metres
     * @param elevationMetres      elevation in metres
     * @param heightMetres         height above the ground beneath in metres
     * @param bundleCount          number of subconductors
     * @param bundleRadiusMetres   radius of the circle through the subconductors in metres; 0 for a single conductor
     */
    public record WireAtStation(String line, String elementId, String element, String phase, boolean shieldWire, double offsetMetres,
        double elevationMetres, double heightMetres, int bundleCount, double bundleRadiusMetres) {
    }

    /**
     * Least clearance to the ground at the station.
     *
     * @param line            name of the line
     * @param elementId       identifier of the circuit or shield wire in the study file
     * @param element         name of the circuit or shield wire
     * @param clearanceMetres height of the axis of the lowest subconductor above the ground beneath it, in metres
     * @param offsetMetres    where it is lowest, in metres
     */
    public record Clearance(String line, String elementId, String element, double clearanceMetres, double offsetMetres) {
    }
}
