package throwbench.solver.document.result;

import java.io.IOException;
import java.io.OutputStream;

/** A text that can be written. */
public interface Written {

    /** Writes the whole text in UTF-8, in pieces large enough to need no buffer; does not close the stream. */
    void writeTo(OutputStream out) throws IOException;
}
