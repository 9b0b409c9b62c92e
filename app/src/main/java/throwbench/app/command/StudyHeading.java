package throwbench.app.command;

import throwbench.solver.finding.Finding;
import throwbench.solver.map.Subject;

/** What a study is about, in one line. */
final class StudyHeading {

    private StudyHeading() {}

    /** Machine, duty point and what the finding is about. */
    static String of(Subject subject, Finding finding) {
        return ofMachine(subject) + ", " + FindingGroup.subject(finding.where());
    }

    /** Machine and duty point. */
    static String ofMachine(Subject subject) {
        String name = TextColumns.cut(subject.machine().name(), Integer.MAX_VALUE);
        return name + " at \"" + subject.dutyPoint().name() + "\"";
    }
}
