package throwbench.app.findings;

import throwbench.solver.finding.Finding;

/**
 * One line of the panel.
 *
 * @param head whether it is the worst of its criterion; the others stand under it when spread
 * @param others number of further findings of the same criterion, for a head
 * @param spread whether they are listed
 * @param open whether formula, inputs and source are shown
 */
record FindingLine(Finding finding, boolean head, int others, boolean spread, boolean open) {

    /** What makes two lines of different states the same one. */
    record Key(String criterion, Finding.Place where) {

        static Key of(Finding finding) {
            return new Key(finding.criterion().id(), finding.where());
        }
    }

    Key key() {
        return Key.of(finding);
    }
}
