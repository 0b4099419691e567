package org.notchwork.cli;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import org.notchwork.json.Printable;

/** Puts an input or output fault into one line: where, what, the mend. */
final class IoText {

    private IoText() {}

    /** Returns the line for a fault while writing a target; a full disk, for one, does not say where it is. */
    static String of(IOException fault, Path target) {
        String line = of(fault);
        return line.startsWith(target.toString())
                ? line
                : Printable.escape(target + ": " + line + "; nothing was left under this name");
    }

    /** Returns the line. */
    static String of(IOException fault) {
        if (fault instanceof AccessDeniedException denied) {
            return Printable.escape(denied.getFile() + ": permission denied; name a folder that may be written");
        }
        if (fault instanceof NoSuchFileException missing) {
            return Printable.escape(missing.getFile() + ": not there, or its folder cannot be written");
        }
        if (fault instanceof FileSystemException system) {
            String reason = system.getReason() == null ? "cannot be used" : system.getReason();
            return Printable.escape(system.getFile() + ": " + reason + "; nothing was left under the final name");
        }
        return Printable.escape(String.valueOf(fault.getMessage()));
    }
}
