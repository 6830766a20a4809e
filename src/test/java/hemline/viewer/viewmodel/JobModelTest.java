package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

class JobModelTest {
    private final Deque<Runnable> background = new ArrayDeque<>();
    private final AtomicLong clockNs = new AtomicLong();
    private final JobModel job = new JobModel(background::add, Runnable::run, clockNs::get);

    private void runAll() {
        while (!background.isEmpty()) {
            background.poll().run();
        }
    }

    @Test
    void saysStageShareAndTimeLeft() {
        job.start("Opening", progress -> {
            progress.step("detecting", 0, 4);
            clockNs.addAndGet(30_000_000_000L);
            progress.step("detecting", 1, 4);
            assertThat(job.wordsProperty().get()).isEqualTo("detecting 1 of 4, about 1 min left");
            assertThat(job.fractionProperty().get()).isEqualTo(0.25);
        });
        assertThat(job.runningProperty().get()).isTrue();
        runAll();
        assertThat(job.runningProperty().get()).isFalse();
        assertThat(job.troubleProperty().get()).isEmpty();
    }

    @Test
    void cancelEndsTheWorkAtItsNextStep() {
        int[] steps = {0};
        job.start("Opening", progress -> {
            for (int i = 0; i < 10; i++) {
                progress.check();
                steps[0]++;
                if (i == 2) {
                    job.cancel();
                }
            }
        });
        runAll();
        assertThat(steps[0]).isEqualTo(3);
        assertThat(job.runningProperty().get()).isFalse();
        assertThat(job.troubleProperty().get()).startsWith("Opening was cancelled");
    }

    @Test
    void aFailureIsSaidInItsOwnWords() {
        job.start("Opening", progress -> {
            throw new IOException("a.nc: truncated after 512 bytes; fetch it again");
        });
        runAll();
        assertThat(job.troubleProperty().get()).isEqualTo(
                "Opening failed: a.nc: truncated after 512 bytes; fetch it again");
        job.dismissTrouble();
        assertThat(job.troubleProperty().get()).isEmpty();
    }

    @Test
    void newWorkSilencesTheOld() {
        job.start("First", progress -> {
            progress.step("first", 1, 2);
            throw new IOException("late");
        });
        Runnable first = background.poll();
        job.start("Second", progress -> progress.step("second", 1, 2));
        first.run();
        assertThat(job.troubleProperty().get()).isEmpty();
        assertThat(job.runningProperty().get()).isTrue();
        assertThat(job.wordsProperty().get()).isEqualTo("Second");
        runAll();
        assertThat(job.runningProperty().get()).isFalse();
    }

    @Test
    void onlyTheNewestReportWaitsForTheUsersThread() {
        Deque<Runnable> ui = new ArrayDeque<>();
        JobModel slow = new JobModel(Runnable::run, ui::add, clockNs::get);
        slow.start("Opening", progress -> {
            for (int i = 0; i < 1000; i++) {
                progress.step("detecting", i, 1000);
            }
            assertThat(ui).hasSize(1);
        });
    }

    @Test
    void anAttemptThatFailsIsSaid() {
        job.attempt("Saving the picture", () -> {
            throw new IOException("disk full");
        });
        assertThat(job.troubleProperty().get()).isEqualTo("Saving the picture failed: disk full");
    }
}
