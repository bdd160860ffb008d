/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

import java.util.List;

/**
 * Currents of a load case: what flows in every phase and shield wire, and what returns in the earth. Amperes RMS. Phases and shield wires
 * count positive in the structure order of their line.
 *
 * @param loadCase    the load case
 * @param circuits    currents of the phases of each circuit
 * @param shieldWires currents of the shield wires
 * @param splits      sums over each group of lines that are coupled with each other
 */
public record CurrentTable(CaseInfo loadCase, List<CircuitCurrents> circuits, List<ShieldCurrent> shieldWires, List<CurrentSplit> splits) {

    public CurrentTable {
        circuits = List.copyOf(circuits);
        shieldWires = List.copyOf(shieldWires);
        splits = List.copyOf(splits);
    }

    /**
     * Currents of a circuit.
     *
     * @param line      name of the line
     * @param circuitId identifier of the circuit in the study file
     * @param circuit   name of the circuit
     * @param phases    current of each phase, in the order of the study
     */
    public record CircuitCurrents(String line, String circuitId, String circuit, List<PhaseCurrent> phases) {

        public CircuitCurrents {
            phases = List.copyOf(phases);
        }

        /** Sum of the phase currents: what the circuit does not carry back itself. */
        public Phasor residual() {
            return phases.stream().map(PhaseCurrent::amperes).reduce(Phasor.ZERO, Phasor::plus);
        }
    }

    /**
     * Current of a phase, all its subconductors together.
     *
     * @param phase   label of the phase
     * @param amperes current in amperes RMS
     */
    public record PhaseCurrent(String phase, Phasor amperes) {
    }

    /**
     * Current of a shield wire.
     *
     * @param line         name of the line
     * @param shieldWireId identifier of the shield wire in the study file
     * @param shieldWire   name of the shield wire
     * @param origin       where the current comes from
     * @param amperes      current in amperes RMS
     */
    public record ShieldCurrent(String line, String shieldWireId, String shieldWire, Origin origin, Phasor amperes) {

        /** Where the current of a shield wire comes from. */
        public enum Origin {
            /** Induced by the phases in a wire bonded to earth at every structure. */
            INDUCED,
            /** None: the wire is insulated or segmented. */
            INSULATED,
            /** Stated by the study. */
            GIVEN,
            /** None: the wire is bonded, but direct current or a study without earth resistivity induces nothing that could be computed. */
            NOT_INDUCED
        }
    }

    /**
     * Split of the return current of lines that are coupled. Positive in the structure order of the first line.
     *
     * @param lines         names of the lines
     * @param phaseResidual sum of all phase currents in amperes RMS
     * @param shieldTotal   sum of all shield-wire currents in amperes RMS
     */
    public record CurrentSplit(List<String> lines, Phasor phaseResidual, Phasor shieldTotal) {

        public CurrentSplit {
            lines = List.copyOf(lines);
        }

        /** What returns in the earth in amperes RMS: minus the sum of phases and shield wires. */
        public Phasor earth() {
            return phaseResidual.plus(shieldTotal).negated();
        }
    }
}
