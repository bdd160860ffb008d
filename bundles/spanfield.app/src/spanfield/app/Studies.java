/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.app;

import java.nio.file.Path;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.FileDialog;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.PartInitException;
import spanfield.model.Study;
import spanfield.model.io.StudyFiles;
import spanfield.ui.common.RecentStudies;
import spanfield.ui.common.StudyEditor;
import spanfield.ui.common.StudyInput;

/** Opening studies in a window. */
public final class Studies {

    private Studies() {
    }

    /** Opens a file; the user is told when that fails. */
    public static void open(IWorkbenchWindow window, Path file) {
        try {
            window.getActivePage().openEditor(StudyInput.of(file), StudyEditor.ID);
            RecentStudies.add(file);
        } catch (PartInitException failure) {
            MessageDialog.openError(window.getShell(), "The study was not opened", failure.getMessage());
        }
    }

    /** Opens a new study that has no file yet. */
    public static void openFresh(IWorkbenchWindow window, Study study, String name) {
        Path suggestion = Path.of(System.getProperty("user.home", ".")).resolve(name + "." + StudyFiles.EXTENSION);
        try {
            window.getActivePage().openEditor(StudyInput.fresh(study, suggestion), StudyEditor.ID);
        } catch (PartInitException failure) {
            MessageDialog.openError(window.getShell(), "The study was not opened", failure.getMessage());
        }
    }

    /** Asks for a file and opens it. */
    public static void choose(IWorkbenchWindow window) {
        FileDialog dialog = new FileDialog(window.getShell(), SWT.OPEN);
        dialog.setText("Open study");
        dialog.setFilterExtensions(new String[] {"*." + StudyFiles.EXTENSION, "*"});
        dialog.setFilterNames(new String[] {"Spanfield studies", "All files"});
        String chosen = dialog.open();
        if (chosen != null) {
            open(window, Path.of(chosen));
        }
    }
}
