package hemline.viewer.viewmodel;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.value.ObservableBooleanValue;

/**
 * One thing a user can do, the same from a key, a button and the command search.
 *
 * @param id      stable, for tests and settings
 * @param group   heading in the shortcut sheet
 * @param words   what it does, in the imperative
 * @param keys    key combinations by key name, for example {@code Shortcut+K}; may be empty
 * @param enabled whether it can be done now
 * @param on      for a switch, whether it is on
 * @param run     does it; on the user's thread
 */
public record Action(String id, String group, String words, List<String> keys, ObservableBooleanValue enabled,
                     Optional<ObservableBooleanValue> on, Runnable run) {
    public Action {
        keys = List.copyOf(keys);
    }

    /** Does it if it can be done now. */
    public boolean perform() {
        if (!enabled.get()) {
            return false;
        }
        run.run();
        return true;
    }

    /** The first key combination as people read it, empty for none. */
    public String keyWords() {
        return keys.isEmpty() ? "" : keys.get(0).replace("Shortcut", "Ctrl").replace("Open Bracket", "[")
                .replace("Close Bracket", "]").replace("Comma", ",").replace("Period", ".").replace("Equals", "+")
                .replace("Minus", "\u2212");
    }

    /** How well what was typed fits, larger is better; 0 for not at all. Every word typed must occur. */
    public int fit(String typed) {
        String text = (words + " " + group + " " + keyWords()).toLowerCase(Locale.ROOT);
        int fit = 1;
        for (String word : typed.toLowerCase(Locale.ROOT).strip().split("\\s+")) {
            int at = text.indexOf(word);
            if (at < 0) {
                return 0;
            }
            fit += at == 0 ? 3 : text.charAt(at - 1) == ' ' ? 2 : 1;
        }
        return fit;
    }
}
