package hemline.casefile;

import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Found;
import hemline.casefile.edit.Replay;
import hemline.casefile.edit.ReviewOutcome;
import hemline.casefile.edit.UndoLedger;
import hemline.casefile.store.CaseFiles;
import hemline.casefile.store.CaseFolders;
import hemline.casefile.store.CaseStore;
import hemline.casefile.store.OpenMode;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * The state of a case folder at a glance.
 *
 * @param path    of the case
 * @param facts   what it holds; empty when it cannot be read
 * @param problem why it cannot be read, with what to do; empty when it can
 */
public record CaseSummary(Path path, Optional<Facts> facts, String problem) {

    /**
     * What a case holds.
     *
     * @param radar       its name
     * @param firstMs     mean time of the first sweep, ms since 1970-01-01T00:00Z
     * @param lastMs      mean time of the last sweep
     * @param sweeps      how many there are
     * @param foundTracks tracks as the run found them
     * @param tracks      tracks that count now
     * @param handTracks  of these, tracks with anything by hand
     * @param setAside    things set aside
     * @param edits       changes that stand
     * @param undone      changes taken back
     * @param notApplied  entries that do not fit the result
     * @param authors     who made entries, by name
     * @param lastEditMs  time of the last entry; empty for an untouched case
     * @param reviewed    tracks accepted or corrected in review
     * @param notes       what is wrong with its files but can be mended
     */
    public record Facts(String radar, long firstMs, long lastMs, int sweeps, int foundTracks, int tracks,
                        int handTracks, int setAside, int edits, int undone, int notApplied, List<String> authors,
                        OptionalLong lastEditMs, int reviewed, List<String> notes) {
        public Facts {
            authors = List.copyOf(authors);
            notes = List.copyOf(notes);
        }
    }

    /** The summary of one case; nothing in the folder is touched, and it may be open elsewhere. */
    public static CaseSummary of(CaseFiles files, Path path) {
        try (CaseStore store = CaseStore.open(files, path, OpenMode.LOOK, "")) {
            return new CaseSummary(path, Optional.of(facts(store)), "");
        } catch (IOException e) {
            return new CaseSummary(path, Optional.empty(), e.getMessage());
        }
    }

    /** The cases in a folder, by name: the folder itself if it is one, else those of its folders that are. */
    public static List<CaseSummary> list(CaseFiles files, Path folder) throws IOException {
        List<CaseSummary> summaries = new ArrayList<>();
        for (Path path : CaseFolders.in(files, folder)) {
            summaries.add(of(files, path));
        }
        return summaries;
    }

    private static Facts facts(CaseStore store) {
        Found found = store.found();
        CaseState start = CaseState.of(found);
        UndoLedger ledger = UndoLedger.of(store.entries());
        Replay replay = Replay.of(start, ledger);
        List<Entry> log = store.entries();
        int changes = (int) log.stream().filter(entry -> entry.edit() instanceof Edit.Change).count();
        int standing = ledger.standing().size();
        int handTracks = (int) replay.state().tracks().stream().filter(CaseSummary::byHand).count();
        int reviewed = (int) replay.state().reviews().stream()
                .filter(mark -> mark.outcome() != ReviewOutcome.LATER)
                .filter(mark -> replay.state().track(mark.trackId()).isPresent()).count();
        List<String> authors = log.stream().filter(entry -> !(entry.edit() instanceof Edit.Mended))
                .map(Entry::author).distinct().sorted().toList();
        return new Facts(found.site().name(), start.sweeps().meanMs(0),
                start.sweeps().meanMs(found.frames().size() - 1), found.frames().size(), found.tracks().size(),
                replay.state().tracks().size(), handTracks, replay.state().asides().size(), standing,
                changes - standing, replay.notApplied().size(), authors,
                log.isEmpty() ? OptionalLong.empty() : OptionalLong.of(log.get(log.size() - 1).timeMs()), reviewed,
                store.notes());
    }

    private static boolean byHand(Track track) {
        return track.pieces().stream().anyMatch(piece -> piece.origin() == Origin.HAND);
    }
}
