package throwbench.app.buildsheet;

import java.util.List;

/**
 * Inputs that a designer thinks of together.
 *
 * @param title as shown
 */
record SheetGroup(String title, List<SheetEntry> entries) {

    SheetGroup {
        entries = List.copyOf(entries);
    }
}
