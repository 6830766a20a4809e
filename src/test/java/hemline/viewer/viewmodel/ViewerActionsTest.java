package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.viewer.FakeLoop;
import hemline.viewer.FakeOpener;
import java.lang.reflect.Proxy;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class ViewerActionsTest {
    private final List<String> asked = new ArrayList<>();
    private final ViewerModel model = new ViewerModel(new FakeOpener(FakeLoop::small), Runnable::run, Runnable::run,
            Runnable::run, Clock.systemUTC());
    private final Desk desk = (Desk) Proxy.newProxyInstance(Desk.class.getClassLoader(), new Class<?>[] {Desk.class},
            (proxy, method, arguments) -> {
                asked.add(method.getName());
                return null;
            });
    private final ViewerActions actions = new ViewerActions(model, desk);

    private void open() {
        model.open(List.of(Path.of("invented")));
    }

    @Test
    void everyActionHasItsOwnIdWordsAndKeys() {
        assertThat(actions.all()).extracting(Action::id).doesNotHaveDuplicates();
        assertThat(actions.all()).extracting(Action::words).doesNotHaveDuplicates().allSatisfy(w ->
                assertThat(w).isNotBlank());
        assertThat(actions.all().stream().flatMap(a -> a.keys().stream()).toList()).doesNotHaveDuplicates();
    }

    @Test
    void nothingOfALoopCanBeDoneBeforeOneIsOpen() {
        assertThat(actions.get("next").perform()).isFalse();
        assertThat(actions.get("zoom-in").perform()).isFalse();
        assertThat(actions.get("open-files").perform()).isTrue();
        assertThat(asked).containsExactly("chooseFiles");
    }

    @Test
    void everyActionRunsOnAnOpenLoop() {
        open();
        for (Action action : actions.all()) {
            action.perform();
        }
        assertThat(asked).contains("chooseFiles", "chooseFolder", "copyPicture", "savePicture", "searchCommands",
                "showShortcuts", "focusFilter", "nextPart", "close");
    }

    @Test
    void screeningAndVelocityAreOfferedOnlyWhereThereAreSome() {
        assertThat(actions.get("field-screened").enabled().get()).isFalse();
        open();
        assertThat(actions.get("field-screened").enabled().get()).isTrue();
        assertThat(actions.get("field-velocity").perform()).isTrue();
        assertThat(model.plane().fieldProperty().get()).isEqualTo(PlaneField.VELOCITY);
        assertThat(actions.get("field-velocity").on().orElseThrow().get()).isTrue();
    }

    @Test
    void tracksAreSelectedInTheLedgersOrderAndRound() {
        open();
        actions.get("next-track").perform();
        assertThat(model.selection().track()).isEqualTo("T01");
        actions.get("previous-track").perform();
        assertThat(model.selection().track()).isEqualTo("T03");
        actions.get("to-track-start").perform();
        assertThat(model.loop().index()).isEqualTo(2);
        actions.get("clear").perform();
        assertThat(model.selection().track()).isEmpty();
    }

    @Test
    void theRangeIsSetAtTheShownSweep() {
        open();
        model.loop().show(3);
        actions.get("from-here").perform();
        model.loop().show(7);
        actions.get("to-here").perform();
        assertThat(model.loop().firstProperty().get()).isEqualTo(3);
        assertThat(model.loop().lastProperty().get()).isEqualTo(7);
        actions.get("whole-range").perform();
        assertThat(model.loop().lastProperty().get()).isEqualTo(11);
    }

    @Test
    void searchNeedsEveryWordAndPutsTheBestFirst() {
        assertThat(actions.search("zoom")).extracting(Action::id).containsExactlyInAnyOrder("zoom-in", "zoom-out");
        assertThat(actions.search("hide meetings").get(0).id()).isEqualTo("overlay-meetings");
        assertThat(actions.search("no such thing")).isEmpty();
        assertThat(actions.search("")).hasSameSizeAs(actions.all());
    }

    @Test
    void keysAreWrittenAsTheyAreReadOnAKeyboard() {
        assertThat(actions.get("next").keyWords()).isEqualTo(".");
        assertThat(actions.get("commands").keyWords()).isEqualTo("Ctrl+K");
        assertThat(actions.get("fainter").keyWords()).isEqualTo("Shift+[");
    }
}
