package org.evendraft.cli;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.evendraft.service.AnswerJson;
import org.evendraft.service.Problem;

/**
 * Where answers and problems go, always in UTF-8.
 *
 * @param out standard output
 * @param err standard error
 */
record Console(PrintStream out, PrintStream err) {
    static final int DONE = 0;
    static final int BUG = 1;
    static final int BAD_INPUT = 2;
    static final int CANNOT_BE_MET = 3;

    /** Prints an answer as JSON. */
    void answer(Object answer) {
        print(out, AnswerJson.pretty(answer));
    }

    /** Prints a problem as JSON. */
    void problem(Problem problem) {
        print(err, AnswerJson.pretty(problem));
    }

    /** Prints a line for people beside the answer. */
    void remark(String text) {
        print(err, text);
    }

    /** Prints a line of text. */
    void line(String text) {
        print(out, text);
    }

    /** Prints a text that has its line ends. */
    void text(String text) {
        write(out, text);
    }

    private static void print(PrintStream stream, String text) {
        write(stream, text + "\n");
    }

    private static void write(PrintStream stream, String text) {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        stream.write(bytes, 0, bytes.length);
        stream.flush();
    }
}
