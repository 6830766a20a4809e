package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.geometry.Point;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.value.ObservableBooleanValue;

/** Everything a user can do in one window, in the order of the shortcut sheet. */
public final class ViewerActions {
    private final ViewerModel model;
    private final Desk desk;
    private final List<Action> actions = new ArrayList<>();
    private final ObservableBooleanValue always = new SimpleBooleanProperty(true);
    private final BooleanBinding open;
    private String group = "";

    public ViewerActions(ViewerModel model, Desk desk) {
        this.model = model;
        this.desk = desk;
        open = model.sessionProperty().isNotNull();
        loop();
        plane();
        overlays();
        selection();
        window();
    }

    public List<Action> all() {
        return List.copyOf(actions);
    }

    public Action get(String id) {
        return actions.stream().filter(a -> a.id().equals(id)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no action is called " + id));
    }

    /** Actions that fit what was typed, best first; all of them for nothing typed. */
    public List<Action> search(String typed) {
        return Stream.concat(actions.stream(), passing().stream()).filter(a -> a.fit(typed) > 0)
                .sorted(Comparator.comparingInt((Action a) -> a.fit(typed)).reversed()).toList();
    }

    /** What can be done with what happens to be open: go to a track or a meeting, open a recent path. */
    private List<Action> passing() {
        List<Action> now = new ArrayList<>();
        for (Track track : model.ledger().tracks()) {
            now.add(once("track-" + track.id(), "Selection", "Go to track " + track.id(), () ->
                    model.goToTrack(track.id())));
        }
        for (Meeting meeting : model.ledger().meetings()) {
            now.add(once("meeting-" + meeting.id(), "Selection", "Go to meeting " + meeting.id(),
                    () -> model.goToMeeting(meeting.id())));
        }
        for (Path path : model.settings().recent()) {
            now.add(once("recent-" + path, "Window", "Open again: " + path, () -> model.open(List.of(path))));
        }
        return now;
    }

    private Action once(String id, String heading, String words, Runnable run) {
        return new Action(id, heading, words, List.of(), always, Optional.empty(), run);
    }

    private void loop() {
        group = "Loop";
        LoopModel loop = model.loop();
        add("next", "Step to the next sweep", open, () -> loop.step(1), "Period", "Page_Down");
        add("previous", "Step to the previous sweep", open, () -> loop.step(-1), "Comma", "Page_Up");
        add("first", "Go to the first sweep", open, () -> loop.show(loop.firstProperty().get()), "Home");
        add("last", "Go to the newest sweep", open, () -> loop.show(loop.lastProperty().get()), "End");
        motion("play", "Play forward, or stop", Motion.FORWARD, "Space");
        motion("back", "Play backward, or stop", Motion.BACK, "Shift+Space");
        motion("rock", "Rock to and fro, or stop", Motion.ROCK, "R");
        add("faster", "Play faster", open, loop::faster, "Shift+Period");
        add("slower", "Play slower", open, loop::slower, "Shift+Comma");
        add("from-here", "Start the loop range at this sweep", open,
                () -> loop.limit(loop.index(), Math.max(loop.index(), loop.lastProperty().get())), "I");
        add("to-here", "End the loop range at this sweep", open,
                () -> loop.limit(Math.min(loop.index(), loop.firstProperty().get()), loop.index()), "O");
        add("whole-range", "Play the whole loop", open, loop::clearLimits, "Shift+I");
        toggle("hold", "Hold on the last sweep", holding(), "Shift+H");
    }

    private BooleanProperty holding() {
        BooleanProperty hold = new SimpleBooleanProperty(true);
        hold.addListener((o, was, now) -> model.loop().holdSecondsProperty().set(now ? 1 : 0));
        return hold;
    }

    private void motion(String id, String words, Motion motion, String key) {
        ObservableBooleanValue on = model.loop().motionProperty().isEqualTo(motion);
        actions.add(new Action(id, group, words, List.of(key), open, Optional.of(on),
                () -> model.loop().toggle(motion)));
    }

    private void plane() {
        group = "Plane";
        PlaneModel plane = model.plane();
        add("zoom-in", "Zoom in", open, plane::zoomIn, "Equals", "Shift+Equals", "Plus", "Add");
        add("zoom-out", "Zoom out", open, plane::zoomOut, "Minus", "Subtract");
        add("fit", "Fit the plane to the beam's useful reach", open, plane::fit, "0", "Numpad_0");
        add("west", "Look further west", open, () -> plane.panStep(-1, 0), "Left");
        add("east", "Look further east", open, () -> plane.panStep(1, 0), "Right");
        add("north", "Look further north", open, () -> plane.panStep(0, 1), "Up");
        add("south", "Look further south", open, () -> plane.panStep(0, -1), "Down");
        for (PlaneField field : PlaneField.values()) {
            ObservableBooleanValue on = plane.fieldProperty().isEqualTo(field);
            actions.add(new Action("field-" + field.name().toLowerCase(Locale.ROOT), group,
                    "Show field: " + field.words().toLowerCase(Locale.ROOT), List.of(String.valueOf(1
                            + field.ordinal())),
                    offered(field), Optional.of(on), () -> plane.fieldProperty().set(field)));
        }
        add("fainter", "Make the sweep fainter", open, () -> plane.opacityProperty().set(
                plane.opacityProperty().get() - 0.15), "Shift+Open_Bracket");
        add("stronger", "Make the sweep stronger", open, () -> plane.opacityProperty().set(
                plane.opacityProperty().get() + 0.15), "Shift+Close_Bracket");
        toggle("measure", "Measure distance, bearing and speed", model.measure().onProperty(), "X");
        add("mark", "Mark a place with the measure tool", model.measure().onProperty(), this::markMiddle, "Enter");
        add("copy-picture", "Copy the plane as a picture", open, desk::copyPicture, "Shortcut+Shift+C");
        add("save-picture", "Save the plane as a picture\u2026", open, desk::savePicture, "Shortcut+S");
    }

    /** Whether a field can be shown: velocity only where there is some, screening only once it is done. */
    public ObservableBooleanValue offered(PlaneField field) {
        return switch (field) {
            case MEASURED -> open;
            case VELOCITY -> Bindings.createBooleanBinding(() -> model.shownProperty().get() != null
                    && model.shownProperty().get().raw().velocity().isPresent(), model.shownProperty());
            default -> Bindings.createBooleanBinding(() -> model.shownProperty().get() != null
                    && model.shownProperty().get().mask().isPresent(), model.shownProperty());
        };
    }

    private void markMiddle() {
        Point cursor = model.plane().cursorProperty().get();
        model.markAt(cursor == null ? model.plane().view().centre() : cursor);
    }

    private void overlays() {
        group = "Overlays";
        for (Overlay overlay : Overlay.values()) {
            toggle("overlay-" + overlay.name().toLowerCase(Locale.ROOT),
                    "Show or hide: " + overlay.words().toLowerCase(Locale.ROOT), model.overlays().shown(overlay),
                    overlay.key());
        }
        add("map-layer", "Add a map layer from a GeoJSON file\u2026", open, desk::chooseMapLayer, "Shortcut+M");
        add("map-layers-clear", "Take your own map layers away", open, model.map()::clearLayers);
        add("overlays-reset", "Show the usual overlays", always, model.overlays()::reset);
    }

    private void selection() {
        group = "Selection";
        add("next-track", "Select the next track", open, () -> selectTrack(1), "Close_Bracket");
        add("previous-track", "Select the previous track", open, () -> selectTrack(-1), "Open_Bracket");
        add("to-track-start", "Go to the selected track's first sweep", open, () -> trackEnd(true), "Shift+Home");
        add("to-track-end", "Go to the selected track's last sweep", open, () -> trackEnd(false), "Shift+End");
        add("clear", "Clear the selection and leave the measure tool", always, () -> {
            model.measure().onProperty().set(false);
            model.selection().clear();
        }, "Esc");
        add("filter", "Filter the ledger", always, desk::focusFilter, "Shortcut+F");
    }

    private void selectTrack(int by) {
        List<Track> tracks = model.ledger().tracks();
        if (tracks.isEmpty()) {
            return;
        }
        int at = -1;
        for (int i = 0; i < tracks.size(); i++) {
            at = tracks.get(i).id().equals(model.selection().track()) ? i : at;
        }
        int next = at < 0 ? (by > 0 ? 0 : tracks.size() - 1) : Math.floorMod(at + by, tracks.size());
        model.goToTrack(tracks.get(next).id());
    }

    private void trackEnd(boolean start) {
        model.track(model.selection().track()).ifPresent(track -> model.loop().show(start
                ? track.pieces().get(0).sweep() : track.pieces().get(track.pieces().size() - 1).sweep()));
    }

    private void window() {
        group = "Window";
        add("open-files", "Open files\u2026", always, desk::chooseFiles, "Shortcut+O");
        add("open-folder", "Open a folder\u2026", always, desk::chooseFolder, "Shortcut+Shift+O");
        add("cancel", "Cancel what is running", model.job().runningProperty(), model.job()::cancel, "Shortcut+Period");
        add("commands", "Search all commands", always, desk::searchCommands, "Shortcut+K");
        add("shortcuts", "Show all keys", always, desk::showShortcuts, "F1");
        add("part", "Move the keyboard to the next part of the window", always, desk::nextPart, "F6");
        toggle("side", "Show or hide ledger and traces", model.settings().sidePanelProperty(), "F9");
        toggle("theme", "Dark or light window", model.settings().darkProperty(), "Shortcut+T");
        toggle("local-time", "Show local time beside UTC", model.settings().localTimeProperty(), "Shortcut+L");
        add("text-larger", "Larger text", always, () -> scaleText(0.1), "Shortcut+Equals", "Shortcut+Plus",
                "Shortcut+Add");
        add("text-smaller", "Smaller text", always, () -> scaleText(-0.1), "Shortcut+Minus", "Shortcut+Subtract");
        add("settings-reset", "Reset all settings", always, model.settings()::reset);
        add("close", "Close the window", always, desk::close, "Shortcut+W");
    }

    private void scaleText(double by) {
        model.settings().textScaleProperty().set(model.settings().textScaleProperty().get() + by);
    }

    private void add(String id, String words, ObservableBooleanValue enabled, Runnable run, String... keys) {
        actions.add(new Action(id, group, words, keyNames(keys), enabled, Optional.empty(), run));
    }

    private void toggle(String id, String words, BooleanProperty on, String key) {
        actions.add(new Action(id, group, words, keyNames(key), always, Optional.of(on), () -> on.set(!on.get())));
    }

    private static List<String> keyNames(String... keys) {
        return java.util.Arrays.stream(keys).map(key -> key.replace('_', ' ')).toList();
    }
}
