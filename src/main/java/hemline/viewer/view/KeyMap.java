package hemline.viewer.view;

import hemline.viewer.viewmodel.Action;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javafx.scene.Scene;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;

/**
 * Keys to actions. A control that uses a key itself, such as a table its arrows, keeps it; while text is typed only
 * combinations with Ctrl or Alt and function keys count.
 */
final class KeyMap {
    private final Map<KeyCombination, Action> keys = new LinkedHashMap<>();

    KeyMap(List<Action> actions) {
        for (Action action : actions) {
            for (String key : action.keys()) {
                KeyCombination combination = KeyCombination.valueOf(key);
                if (!(combination instanceof KeyCodeCombination)) {
                    throw new IllegalArgumentException(action.id() + ": no key is called " + key);
                }
                Action before = keys.put(combination, action);
                if (before != null) {
                    throw new IllegalArgumentException("key " + key + " is given to " + before.id() + " and "
                            + action.id());
                }
            }
        }
    }

    void install(Scene scene) {
        scene.addEventHandler(KeyEvent.KEY_PRESSED, event -> {
            boolean typing = scene.getFocusOwner() instanceof TextInputControl && !event.isShortcutDown()
                    && !event.isAltDown() && !event.getCode().isFunctionKey() && event.getCode() != KeyCode.ESCAPE;
            if (!typing) {
                keys.entrySet().stream().filter(entry -> entry.getKey().match(event)).findFirst().ifPresent(entry -> {
                    if (entry.getValue().perform()) {
                        event.consume();
                    }
                });
            }
        });
    }
}
