package throwbench.app.buildsheet;

/**
 * One input on the sheet.
 *
 * @param path key path in the machine file
 * @param label a few words
 */
record SheetEntry(String path, String label) {}
