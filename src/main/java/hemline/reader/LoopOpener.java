package hemline.reader;

import hemline.numerics.Workers;
import hemline.sweep.Loop;
import hemline.sweep.Progress;
import hemline.sweep.RadarSite;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.IdentityHashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Opens files and folders as one loop: low sweeps of one radar in order of time. What cannot be used is named with
 * its reason and the rest goes on; nothing here throws for a bad file.
 */
public final class LoopOpener {
    private static final int MOST_THREADS = 4;

    private LoopOpener() {
    }

    /**
     * Opens a loop.
     *
     * @param paths    files, and folders whose files are taken at any depth
     * @param options  what to take
     * @param progress told of each file looked at
     * @return the loop, empty when nothing could be read, and the fate of every input
     * @throws CancellationException if cancelled
     */
    public static OpenedLoop open(List<Path> paths, ReadOptions options, Progress progress) {
        List<InputPaths.Candidate> candidates = InputPaths.expand(paths);
        SweepCache cache = SweepCache.ofHeap();
        List<FileSurvey> surveys = surveys(candidates, options, cache, progress);
        return new Joining(options, cache).join(surveys);
    }

    private static List<FileSurvey> surveys(List<InputPaths.Candidate> candidates, ReadOptions options,
                                            SweepCache cache, Progress progress) {
        AtomicInteger done = new AtomicInteger();
        int threads = Math.min(MOST_THREADS, Runtime.getRuntime().availableProcessors());
        try (Workers workers = new Workers(threads)) {
            return workers.map(candidates.size(), progress::cancelled, i -> {
                FileSurvey survey = FileSurvey.of(candidates.get(i), options, cache);
                progress.step("reading", done.incrementAndGet(), candidates.size());
                return survey;
            });
        }
    }

    /** From surveys to the loop and the inputs' fates. */
    private static final class Joining {
        private final ReadOptions options;
        private final SweepCache cache;
        private final List<String> notes = new ArrayList<>();
        private final Map<FileSurvey, InputFate> fates = new IdentityHashMap<>();

        Joining(ReadOptions options, SweepCache cache) {
            this.options = options;
            this.cache = cache;
        }

        OpenedLoop join(List<FileSurvey> surveys) {
            List<FileSurvey> usable = withoutCopies(surveys);
            List<FileSurvey> withSweeps = usable.stream().filter(s -> !s.tickets().isEmpty()).toList();
            Optional<Radars.Group> chosen = choose(Radars.group(withSweeps));
            RadarSite site = chosen.map(g -> g.site(options, notes))
                    .orElse(new RadarSite("unknown", Optional.empty(), Double.NaN));
            List<SweepTicket> ordered = chosen.isEmpty() ? List.of() : ordered(chosen.get(), usable);
            settleDonors(usable, ordered);
            Loop loop = new LazyLoop(ordered, site, options.fieldChoice(), cache);
            return new OpenedLoop(loop, site, surveys.stream().map(fates::get).toList(), notes);
        }

        /** Settles refusals and byte-for-byte copies. */
        private List<FileSurvey> withoutCopies(List<FileSurvey> surveys) {
            Map<String, Path> seen = new HashMap<>();
            List<FileSurvey> usable = new ArrayList<>();
            int skipped = 0;
            for (FileSurvey survey : surveys) {
                if (survey.refusal().isPresent()) {
                    settle(survey, survey.skipped() ? InputFate.Fate.SKIPPED : InputFate.Fate.REFUSED,
                            survey.refusal().get(), 0);
                    skipped += survey.skipped() ? 1 : 0;
                    continue;
                }
                Path first = seen.putIfAbsent(survey.sha256(), survey.path());
                if (first != null) {
                    settle(survey, InputFate.Fate.DUPLICATE, "the same bytes as " + first, 0);
                    notes.add(survey.path() + " is a copy of " + first + " and is dropped");
                    continue;
                }
                usable.add(survey);
            }
            if (skipped > 0) {
                notes.add("text and pictures in the folders are skipped (" + files(skipped) + ")");
            }
            return usable;
        }

        private Optional<Radars.Group> choose(List<Radars.Group> groups) {
            Comparator<Radars.Group> byFiles = Comparator.comparingInt((Radars.Group g) -> -g.files().size())
                    .thenComparingLong(Radars.Group::startMs);
            Optional<Radars.Group> chosen = options.site().isPresent()
                    ? groups.stream().filter(g -> g.isCalled(options.site().get())).min(byFiles)
                    : groups.stream().min(byFiles);
            for (Radars.Group group : groups) {
                if (chosen.isPresent() && group == chosen.get()) {
                    continue;
                }
                String why = "is of radar " + group.first().name() + ", " + (chosen.isEmpty()
                        ? "not of " + options.site().orElse("") : "the loop is of " + chosen.get().first().name())
                        + "; choose a radar with --site";
                group.files().forEach(file -> settle(file, InputFate.Fate.REFUSED, why, 0));
                notes.add("a loop is of one radar; refused: " + group.first().name() + " ("
                        + files(group.files().size()) + ")");
            }
            return chosen;
        }

        private List<SweepTicket> ordered(Radars.Group group, List<FileSurvey> usable) {
            List<SweepTicket.Donor> donors = usable.stream().flatMap(s -> s.donors().stream()).toList();
            List<SweepTicket> all = group.files().stream().flatMap(f -> f.tickets().stream()).toList();
            List<SweepOrder.Dropped> dropped = new ArrayList<>();
            List<SweepTicket> ordered = SweepOrder.withDonors(SweepOrder.ordered(all, dropped), donors);
            Map<SweepTicket, SweepTicket> standIn = new HashMap<>();
            dropped.forEach(d -> standIn.put(d.dropped(), d.sameAs()));
            for (FileSurvey file : group.files()) {
                List<SweepTicket> doubles = file.tickets().stream().filter(standIn::containsKey).toList();
                int taken = file.tickets().size() - doubles.size();
                doubles.forEach(d -> notes.add(d.file() + " sweep " + d.cut().reflectivity() + " is the same sweep as "
                        + standIn.get(d).file() + " sweep " + standIn.get(d).cut().reflectivity()
                        + " and is dropped"));
                if (taken > 0) {
                    settle(file, InputFate.Fate.READ, String.join("; ", file.notes()), taken);
                } else {
                    settle(file, InputFate.Fate.DUPLICATE, "the same sweep as in " + standIn.get(doubles.get(0)).file(),
                            0);
                }
            }
            noteOnce(group);
            return ordered;
        }

        private void settleDonors(List<FileSurvey> usable, List<SweepTicket> ordered) {
            Set<Path> used = new HashSet<>();
            ordered.forEach(t -> t.donor().ifPresent(d -> used.add(d.file())));
            for (FileSurvey survey : usable) {
                if (survey.tickets().isEmpty()) {
                    boolean gave = used.contains(survey.path());
                    settle(survey, gave ? InputFate.Fate.READ : InputFate.Fate.REFUSED, gave
                            ? "velocity for the sweep of a sister file"
                            : "has velocity, but no reflectivity, and no sweep of another file needs it; give the "
                            + "reflectivity too", 0);
                }
            }
        }

        /** What was said of the files, each thing once with the number of files it was said of. */
        private void noteOnce(Radars.Group group) {
            Map<String, Integer> said = new LinkedHashMap<>();
            group.files().forEach(f -> new HashSet<>(f.notes()).stream().sorted()
                    .forEach(note -> said.merge(note, 1, Integer::sum)));
            said.forEach((note, times) -> notes.add(note + " (" + files(times) + ")"));
        }

        private static String files(int count) {
            return count == 1 ? "1 file" : count + " files";
        }

        private void settle(FileSurvey survey, InputFate.Fate fate, String reason, int sweeps) {
            fates.put(survey, new InputFate(survey.path(), survey.sha256(), fate, reason, sweeps));
        }
    }
}
