package throwbench.solver.map;

import java.util.Optional;

/**
 * What a text names, or what is wrong with it.
 *
 * @param fault in words that go on after the text; empty where something is named
 */
public record Choice<T>(Optional<T> chosen, String fault) {

    static <T> Choice<T> of(T chosen) {
        return new Choice<>(Optional.of(chosen), "");
    }

    static <T> Choice<T> none(String fault) {
        return new Choice<>(Optional.empty(), fault);
    }
}
