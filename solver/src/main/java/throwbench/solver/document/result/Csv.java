package throwbench.solver.document.result;

/** How text stands in a CSV file, by RFC 4180. */
final class Csv {

    private Csv() {}

    /** A field with a comma, a quote or a line break stands in quotes, its own quotes doubled. */
    static void quote(String field, StringBuilder into) {
        boolean plain =
                field.indexOf(',') < 0 && field.indexOf('"') < 0 && field.indexOf('\n') < 0 && field.indexOf('\r') < 0;
        if (plain) {
            into.append(field);
        } else {
            into.append('"').append(field.replace("\"", "\"\"")).append('"');
        }
    }
}
