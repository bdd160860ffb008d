/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import org.eclipse.core.runtime.preferences.IEclipsePreferences;
import org.eclipse.core.runtime.preferences.InstanceScope;
import org.osgi.service.prefs.BackingStoreException;
import spanfield.report.FieldUnit;
import spanfield.report.LengthUnit;
import spanfield.report.Units;

/** Units in which the pages show results: a preference of the user, shared by all studies. The model stays in SI units. */
public final class DisplayUnits {

    private DisplayUnits() {
    }

    /** The chosen units. */
    public static Units get() {
        IEclipsePreferences node = node();
        return new Units(FieldUnit.ofCode(node.get("field", "")).orElse(FieldUnit.MICROTESLA),
            LengthUnit.ofCode(node.get("length", "")).orElse(LengthUnit.METRE));
    }

    /** Chooses units and keeps them for the next session. */
    public static void set(Units units) {
        IEclipsePreferences node = node();
        node.put("field", units.field().code());
        node.put("length", units.length().code());
        try {
            node.flush();
        } catch (BackingStoreException lost) {
            // shown now; the next session starts with the default
        }
    }

    private static IEclipsePreferences node() {
        return InstanceScope.INSTANCE.getNode("spanfield.ui.common");
    }
}
