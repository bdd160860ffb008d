/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.results;

import java.util.regex.Matcher;
import java.util.regex.Pattern;
import spanfield.model.Circuit;
import spanfield.model.CircuitLoad;
import spanfield.model.CurrentLoad;
import spanfield.model.FlowDirection;
import spanfield.model.PowerLoad;
import spanfield.model.SpanfieldFactory;
import spanfield.report.Numbers;

/**
 * Loads as short texts that can be typed into a cell: "480 A", "480 A -12" with an angle in degrees, "42 MW 9 Mvar", each with
 * "reversed" behind it when the flow is turned round. Unbalanced loads are shown, not typed.
 */
public final class LoadText {

    private static final String NUMBER = "([-+]?[0-9]+(?:[.][0-9]+)?(?:[eE][-+]?[0-9]+)?)";
    private static final Pattern CURRENT = Pattern.compile(NUMBER + "\\s*A?(?:\\s+(?:@\\s*)?" + NUMBER + "\\s*\u00b0?)?", Pattern.CASE_INSENSITIVE);
    private static final Pattern POWER = Pattern.compile(NUMBER + "\\s*MW(?:[\\s,]+" + NUMBER + "\\s*Mvar)?", Pattern.CASE_INSENSITIVE);
    private static final String REVERSED = "reversed";
    private static final double MEGA = 1e6;

    private LoadText() {
    }

    /** The text of a load; empty for none. */
    public static String of(CircuitLoad load) {
        if (load == null) {
            return "";
        }
        String text;
        if (load instanceof CurrentLoad current) {
            text = Numbers.stated(current.getCurrentAmperes()) + " A" + (current.getAngleDegrees() == 0 ? "" : " " + Numbers.stated(current.getAngleDegrees()) + "\u00b0");
        } else if (load instanceof PowerLoad power) {
            text = Numbers.stated(power.getActivePowerWatts() / MEGA) + " MW"
                + (power.getReactivePowerVars() == 0 ? "" : " " + Numbers.stated(power.getReactivePowerVars() / MEGA) + " Mvar");
        } else {
            text = "unbalanced: see Properties";
        }
        return load.getDirection() == FlowDirection.REVERSED ? text + " " + REVERSED : text;
    }

    /** Whether a load can be typed: balanced ones and none. */
    public static boolean typable(CircuitLoad load) {
        return load == null || load instanceof CurrentLoad || load instanceof PowerLoad;
    }

    /**
     * The load that a text means, or null for an empty text.
     *
     * @throws IllegalArgumentException with a message for the user when the text means nothing
     */
    public static CircuitLoad parse(String text, Circuit circuit) {
        String rest = text.strip().replace('\u2212', '-');
        boolean reversed = rest.toLowerCase(java.util.Locale.ROOT).endsWith(REVERSED);
        if (reversed) {
            rest = rest.substring(0, rest.length() - REVERSED.length()).strip();
        }
        if (rest.isEmpty()) {
            return null;
        }
        CircuitLoad load = balanced(rest);
        load.setCircuit(circuit);
        load.setDirection(reversed ? FlowDirection.REVERSED : FlowDirection.FORWARD);
        return load;
    }

    private static CircuitLoad balanced(String text) {
        Matcher power = POWER.matcher(text);
        if (power.matches()) {
            PowerLoad load = SpanfieldFactory.eINSTANCE.createPowerLoad();
            load.setActivePowerWatts(Double.parseDouble(power.group(1)) * MEGA);
            load.setReactivePowerVars(power.group(2) == null ? 0 : Double.parseDouble(power.group(2)) * MEGA);
            return load;
        }
        Matcher current = CURRENT.matcher(text);
        if (current.matches()) {
            CurrentLoad load = SpanfieldFactory.eINSTANCE.createCurrentLoad();
            load.setCurrentAmperes(Double.parseDouble(current.group(1)));
            load.setAngleDegrees(current.group(2) == null ? 0 : Double.parseDouble(current.group(2)));
            return load;
        }
        throw new IllegalArgumentException("'" + text + "' is no load: type 480 A, or 480 A -12 with an angle, or 42 MW 9 Mvar; add reversed to turn the flow round");
    }
}
