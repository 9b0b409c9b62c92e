package throwbench.app.command;

import java.util.List;

/** One word of the command line, with the job behind it. */
interface Command {

    /** The word. */
    String name();

    /** The words that may follow, in one line. */
    String synopsis();

    /** What it does and what its options mean; lines of at most 100 characters, each with its line end. */
    String help();

    /** The options that it takes. */
    List<Option> options();

    /** Does the job; whatever is wrong has been said on the terminal before it returns. */
    ExitCode run(Arguments arguments, Terminal terminal);
}
