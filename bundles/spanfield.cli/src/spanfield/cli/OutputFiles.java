/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;

/**
 * Files that the command writes. Each is written whole beside its place first; only when all of them are there are they renamed. When
 * writing fails or the process is stopped, the places hold what they held before.
 */
final class OutputFiles {

    private final List<Path> inputs;
    private final List<Path> targets = new ArrayList<>();
    private final List<Path> parts = new ArrayList<>();

    /** No files yet; none may be one of the inputs. */
    OutputFiles(List<Path> inputs) {
        this.inputs = List.copyOf(inputs);
    }

    /**
     * Checks that a file may be written, before anything is computed.
     *
     * @throws CommandException when it is an input, a folder, named twice, or has no folder to be in
     */
    void announce(String option, Path file) {
        Path target = file.toAbsolutePath().normalize();
        if (Files.isDirectory(target)) {
            throw CommandException.argument("--" + option + " '" + file + "' is a folder; name a file in it");
        }
        if (target.getParent() == null || !Files.isDirectory(target.getParent())) {
            throw CommandException.file("there is no folder for --" + option + " '" + file + "'; create it first");
        }
        if (inputs.stream().anyMatch(input -> same(input, target))) {
            throw CommandException.argument("--" + option + " '" + file + "' would overwrite a file that is read; name another file");
        }
        if (targets.stream().anyMatch(other -> same(other, target))) {
            throw CommandException.argument("the file '" + file + "' is named for two outputs; name different files");
        }
        targets.add(target);
    }

    private static boolean same(Path one, Path other) {
        try {
            return one.toAbsolutePath().normalize().equals(other) || Files.exists(one) && Files.exists(other) && Files.isSameFile(one, other);
        } catch (IOException unknown) {
            return false;
        }
    }

    /** Writes the contents, in the order in which the files were announced. */
    void write(List<Content> contents) {
        int at = 0;
        try {
            for (at = 0; at < targets.size(); at++) {
                stage(targets.get(at), contents.get(at));
            }
            for (at = 0; at < targets.size(); at++) {
                move(parts.get(at), targets.get(at));
            }
        } catch (IOException failure) {
            throw CommandException.file("'" + targets.get(at) + "' cannot be written: " + reason(failure));
        } finally {
            discard();
        }
    }

    private void stage(Path target, Content content) throws IOException {
        // A link is followed, so that it stays a link.
        Path real = Files.exists(target) ? target.toRealPath() : target;
        targets.set(targets.indexOf(target), real);
        Path part;
        synchronized (parts) {
            part = Files.createTempFile(real.getParent(), "." + real.getFileName(), ".part");
            parts.add(part);
        }
        try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(part))) {
            content.to(out);
        }
        PosixFileAttributeView view = Files.getFileAttributeView(part, PosixFileAttributeView.class);
        if (view != null) {
            view.setPermissions(Files.exists(real) ? Files.getPosixFilePermissions(real) : PosixFilePermissions.fromString("rw-r--r--"));
        }
    }

    private static void move(Path from, Path to) throws IOException {
        try {
            Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException unsupported) {
            Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
        }
    }

    /** Removes what was staged and not renamed. Safe to call from another thread when the process is stopped. */
    void discard() {
        synchronized (parts) {
            for (Path part : parts) {
                try {
                    Files.deleteIfExists(part);
                } catch (IOException ignored) {
                    // a leftover part file harms nothing, and the first failure is the one to report
                }
            }
        }
    }

    private static String reason(IOException failure) {
        if (failure instanceof AccessDeniedException) {
            return "writing there is not permitted";
        }
        if (failure instanceof NoSuchFileException) {
            return "the folder is gone";
        }
        return failure instanceof FileSystemException system && system.getReason() != null ? system.getReason() : String.valueOf(failure.getMessage());
    }
}
