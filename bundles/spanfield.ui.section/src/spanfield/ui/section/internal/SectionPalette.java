/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.gef.palette.CombinedTemplateCreationEntry;
import org.eclipse.gef.palette.PaletteGroup;
import org.eclipse.gef.palette.PaletteRoot;
import org.eclipse.gef.palette.SelectionToolEntry;
import org.eclipse.gef.requests.CreationFactory;

/** Tools of the cross-section: choose and drag, or place a new circuit or shield wire. */
final class SectionPalette {

    /** What can be placed. */
    enum Kind {
        /** Three phases one above the other, the lowest at the pointer. */
        CIRCUIT("Circuit", "Place a three-phase circuit: its lowest phase hangs at the pointer"),
        /** A shield wire. */
        SHIELD_WIRE("Shield wire", "Place a shield wire at the pointer");

        private final String label;
        private final String description;

        Kind(String label, String description) {
            this.label = label;
            this.description = description;
        }
    }

    private SectionPalette() {
    }

    static PaletteRoot create() {
        PaletteRoot root = new PaletteRoot();
        PaletteGroup group = new PaletteGroup("Tools");
        SelectionToolEntry select = new SelectionToolEntry("Select");
        group.add(select);
        for (Kind kind : Kind.values()) {
            group.add(new CombinedTemplateCreationEntry(kind.label, kind.description, kind, new CreationFactory() {
                @Override
                public Object getNewObject() {
                    return kind;
                }

                @Override
                public Object getObjectType() {
                    return kind;
                }
            }, null, null));
        }
        root.add(group);
        root.setDefaultEntry(select);
        return root;
    }
}
