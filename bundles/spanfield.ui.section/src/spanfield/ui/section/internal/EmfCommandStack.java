/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.section.internal;

import org.eclipse.gef.commands.Command;
import org.eclipse.gef.commands.CommandStack;
import spanfield.ui.common.StudyDocument;

/**
 * The command stack that the graphical viewer sees: it has no memory of its own. Commands change the model through the document's stack,
 * and undo, redo and the dirty mark are those of the document.
 */
final class EmfCommandStack extends CommandStack {

    private final StudyDocument document;

    EmfCommandStack(StudyDocument document) {
        this.document = document;
    }

    @Override
    public void execute(Command command) {
        if (command != null && command.canExecute()) {
            command.execute();
        }
    }

    @Override
    public boolean canUndo() {
        return document.commands().canUndo();
    }

    @Override
    public boolean canRedo() {
        return document.commands().canRedo();
    }

    @Override
    public void undo() {
        document.commands().undo();
    }

    @Override
    public void redo() {
        document.commands().redo();
    }

    @Override
    public boolean isDirty() {
        return document.dirty();
    }
}
