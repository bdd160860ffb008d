/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.validation;

import java.util.LinkedHashMap;
import java.util.Map;
import org.eclipse.emf.ecore.EAttribute;
import spanfield.model.SpanfieldPackage;

/**
 * Admissible ranges of all numbers of a study, in the unit of the attribute. Limits are wide: they catch mistaken units and absurd values,
 * not unusual engineering.
 */
public final class Ranges {

    /**
     * A range.
     *
     * @param least    least admissible value
     * @param greatest greatest admissible value
     * @param openLow  whether the least value itself is refused
     * @param unit     unit for messages
     */
    public record Range(double least, double greatest, boolean openLow, String unit) {

        /** Whether a value lies within; NaN does not. */
        public boolean contains(double value) {
            return (openLow ? value > least : value >= least) && value <= greatest;
        }
    }

    private static final SpanfieldPackage P = SpanfieldPackage.eINSTANCE;
    private static final Map<EAttribute, Range> TABLE = new LinkedHashMap<>();

    static {
        // longest corridor that a flat model and a straight continuation make sense for
        both(1e5, "m", P.getEdgePoint_StationMetres(), P.getElevationPoint_StationMetres(), P.getAlignmentBend_StationMetres(),
            P.getStructure_StationMetres(), P.getProfileStation_StationMetres(), P.getSurveyReading_StationMetres());
        both(1e4, "m", P.getEdgePoint_LeftOffsetMetres(), P.getEdgePoint_RightOffsetMetres(), P.getGroundPoint_OffsetMetres(),
            P.getStructure_OffsetMetres(), P.getProfileStation_FromOffsetMetres(), P.getProfileStation_ToOffsetMetres(), P.getSurveyReading_OffsetMetres());
        // from the Dead Sea to above any line on Earth
        closed(-500, 9000, "m", P.getElevationPoint_ElevationMetres(), P.getStructure_BaseElevationMetres());
        both(3000, "m", P.getGroundPoint_ElevationMetres());
        closed(0, 1e3, "Hz", P.getStudy_FrequencyHertz());
        closed(1e-2, 1e6, "ohm m", P.getStudy_EarthResistivityOhmMetres());
        closed(0, 100, "m", P.getStudy_ReferenceHeightMetres(), P.getSurveyReading_HeightMetres());
        closed(0, 1, "", P.getSurvey_RelativeUncertainty());
        // more than at the surface of any conductor
        closed(0, 0.5, "T", P.getSurveyReading_ResultantTesla());
        closed(1e-12, 1e-2, "", P.getStudy_RelativeAccuracy());
        // 45 degrees of cross slope
        both(1, "", P.getCorridor_CrossSlope());
        both(90, "degrees", P.getAlignmentBend_DeflectionDegrees());
        open(0, 0.2, "m", P.getConductor_DiameterMetres());
        open(0, 0.1, "m", P.getConductor_GeometricMeanRadiusMetres());
        closed(-60, 300, "degrees Celsius", P.getConductor_LowTemperatureCelsius(), P.getConductor_HighTemperatureCelsius());
        // from a bundle of superconductors to a rusty steel strand
        open(0, 0.1, "ohm/m", P.getConductor_LowResistanceOhmsPerMetre(), P.getConductor_HighResistanceOhmsPerMetre());
        open(0, 50, "kg/m", P.getConductor_MassKilogramsPerMetre());
        open(0, 0.01, "m2", P.getConductor_AreaSquareMetres());
        closed(1e9, 5e11, "Pa", P.getConductor_ElasticModulusPascals());
        closed(1e-7, 1e-4, "1/K", P.getConductor_ThermalExpansionPerKelvin());
        open(0, 5e6, "N", P.getConductor_RatedStrengthNewtons());
        closed(0, 1, "", P.getConductor_Emissivity(), P.getConductor_Absorptivity());
        both(100, "m", P.getAttachment_OffsetMetres(), P.getOutlinePoint_OffsetMetres(), P.getStructure_HeightAdjustmentMetres());
        // the tallest crossing towers stand about 380 m high
        closed(0, 500, "m", P.getAttachment_HeightMetres());
        closed(-50, 500, "m", P.getOutlinePoint_HeightMetres());
        closed(0, 20, "m", P.getAttachment_InsulatorLengthMetres());
        both(360, "degrees", P.getStructure_TurnDegrees(), P.getPhase_AngleDegrees(), P.getShieldWire_GivenAngleDegrees(),
            P.getCurrentLoad_AngleDegrees(), P.getSequenceLoad_PositiveAngleDegrees(), P.getSequenceLoad_NegativeAngleDegrees(),
            P.getSequenceLoad_ZeroAngleDegrees(), P.getPhasePhasor_AngleDegrees());
        closed(1, 1e5, "m", P.getCatenaryStringing_CatenaryConstantMetres());
        open(0, 1000, "m", P.getSagStringing_SagMetres());
        open(0, 5e6, "N", P.getTensionStringing_HorizontalTensionNewtons());
        open(0, 500, "m", P.getClearanceStringing_ClearanceMetres());
        closed(0, 2e6, "V", P.getCircuit_NominalVoltageVolts());
        closed(1, 12, "", P.getCircuit_BundleCount());
        closed(0, 5, "m", P.getCircuit_BundleSpacingMetres());
        closed(0, 1e5, "A", P.getShieldWire_GivenCurrentAmperes(), P.getCurrentLoad_CurrentAmperes(), P.getSequenceLoad_PositiveAmperes(),
            P.getSequenceLoad_NegativeAmperes(), P.getSequenceLoad_ZeroAmperes(), P.getPhasePhasor_CurrentAmperes());
        both(80, "degrees", P.getLoadCase_WindSwingDegrees());
        both(2e10, "W", P.getPowerLoad_ActivePowerWatts());
        both(2e10, "var", P.getPowerLoad_ReactivePowerVars());
        closed(1, 2e6, "V", P.getPowerLoad_VoltageVolts());
        closed(0.01, 1000, "m", P.getProfileStation_SpacingMetres());
        open(0, 1e9, "T or V/m", P.getFieldLimit_Level());
    }

    private Ranges() {
    }

    private static void both(double magnitude, String unit, EAttribute... attributes) {
        closed(-magnitude, magnitude, unit, attributes);
    }

    private static void closed(double least, double greatest, String unit, EAttribute... attributes) {
        for (EAttribute attribute : attributes) {
            TABLE.put(attribute, new Range(least, greatest, false, unit));
        }
    }

    private static void open(double least, double greatest, String unit, EAttribute... attributes) {
        for (EAttribute attribute : attributes) {
            TABLE.put(attribute, new Range(least, greatest, true, unit));
        }
    }

    /** The range of an attribute, or null when it is not a number. */
    public static Range of(EAttribute attribute) {
        return TABLE.get(attribute);
    }
}
