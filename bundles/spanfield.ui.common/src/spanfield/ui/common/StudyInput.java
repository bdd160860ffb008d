/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common;

import java.nio.file.Path;
import java.util.Objects;
import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IPersistableElement;
import spanfield.model.Study;

/** A plain file as the input of the study editor, or a new study that has no file yet. */
public final class StudyInput implements IEditorInput {

    private final Path path;
    private final Study fresh;

    private StudyInput(Path path, Study fresh) {
        this.path = path;
        this.fresh = fresh;
    }

    /** An existing file. */
    public static StudyInput of(Path path) {
        return new StudyInput(path.toAbsolutePath().normalize(), null);
    }

    /** A new study with a suggestion for its file. */
    public static StudyInput fresh(Study study, Path suggestion) {
        return new StudyInput(suggestion.toAbsolutePath().normalize(), Objects.requireNonNull(study));
    }

    /** The file, or the suggestion of a new study. */
    public Path path() {
        return path;
    }

    /** The new study, or null for a file. */
    public Study fresh() {
        return fresh;
    }

    @Override
    public boolean exists() {
        return fresh == null && java.nio.file.Files.exists(path);
    }

    @Override
    public ImageDescriptor getImageDescriptor() {
        return null;
    }

    @Override
    public String getName() {
        return path.getFileName().toString();
    }

    @Override
    public IPersistableElement getPersistable() {
        return null;
    }

    @Override
    public String getToolTipText() {
        return path.toString();
    }

    @Override
    public <T> T getAdapter(Class<T> adapter) {
        return null;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof StudyInput input && fresh == null && input.fresh == null && path.equals(input.path) || this == other;
    }

    @Override
    public int hashCode() {
        return path.hashCode();
    }
}
