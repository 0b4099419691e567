package org.notchwork.bundle;

/**
 * What a reader believes at most before it has checked anything; a referee may raise it, a bundle never.
 *
 * @param files the most files
 * @param fileBytes the largest file
 * @param totalBytes the most bytes of all files together
 * @param lineBytes the longest line of trials
 */
public record Limits(int files, long fileBytes, long totalBytes, int lineBytes) {

    /** 100 files, 8 GiB a file, 16 GiB in all, lines of 1 MiB. */
    public static final Limits USUAL = new Limits(100, 8L << 30, 16L << 30, 1 << 20);
}
