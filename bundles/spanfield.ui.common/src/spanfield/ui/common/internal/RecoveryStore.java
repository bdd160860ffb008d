/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Optional;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Platform;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.osgi.framework.FrameworkUtil;
import spanfield.model.Study;
import spanfield.model.io.StudyFileException;
import spanfield.model.io.StudyFiles;

/**
 * Unsaved changes of one study, kept in the program's own state folder so that a kill loses at most some seconds. Written in the
 * background from a copy of the study; removed when the study is saved or closed in order.
 */
public final class RecoveryStore {

    private static final long DELAY_MILLIS = 2000;

    private final Path file;
    private final Job writer;
    private volatile Study newest;

    private RecoveryStore(Path file) {
        this.file = file;
        this.writer = Job.create("Keeping unsaved changes", this::write);
        writer.setSystem(true);
    }

    /** The store for a study file. */
    public static RecoveryStore forFile(Path study) {
        Path folder = Platform.getStateLocation(FrameworkUtil.getBundle(RecoveryStore.class)).toPath().resolve("unsaved");
        return new RecoveryStore(folder.resolve(name(study.toAbsolutePath().normalize().toString()) + "." + StudyFiles.EXTENSION));
    }

    private static String name(String path) {
        try {
            byte[] digest = MessageDigest.getInstance("SHA-256").digest(path.getBytes(java.nio.charset.StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(digest, 0, 12);
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException(impossible);
        }
    }

    /** Keeps a copy soon; a newer one replaces one that still waits. */
    public void schedule(Study copy) {
        newest = copy;
        writer.schedule(DELAY_MILLIS);
    }

    private IStatus write(IProgressMonitor monitor) {
        Study copy = newest;
        if (copy == null) {
            return Status.OK_STATUS;
        }
        try {
            Files.createDirectories(file.getParent());
            StudyFiles.save(copy, file);
        } catch (StudyFileException | java.io.IOException failure) {
            Platform.getLog(RecoveryStore.class).warn("Unsaved changes cannot be kept: " + failure.getMessage());
        }
        return Status.OK_STATUS;
    }

    /** The changes of a session that ended without saving, if there are any. */
    public Optional<Study> read() {
        if (!Files.isRegularFile(file)) {
            return Optional.empty();
        }
        try {
            return Optional.of(StudyFiles.load(file));
        } catch (StudyFileException broken) {
            discard();
            return Optional.empty();
        }
    }

    /** Forgets the kept changes. */
    public void discard() {
        newest = null;
        writer.cancel();
        try {
            Files.deleteIfExists(file);
        } catch (java.io.IOException failure) {
            Platform.getLog(RecoveryStore.class).warn("Kept changes cannot be removed: " + failure.getMessage());
        }
    }
}
