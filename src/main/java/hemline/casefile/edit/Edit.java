package hemline.casefile.edit;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.geometry.Point;
import java.util.List;
import java.util.Objects;
import java.util.Optional;

/**
 * One thing done by hand. Places are km east and north of the radar, times ms since 1970-01-01T00:00Z; all are
 * checked when made, so a log cannot smuggle in what a window would not allow.
 */
public sealed interface Edit {

    /** An edit that changes the state of the case and can be undone. */
    sealed interface Change extends Edit {
    }

    /**
     * Draws a boundary on one sweep. Found stretches that run along the drawn line give way to it.
     *
     * @param sweepMs   mean time of the sweep
     * @param line      through these points, in order
     * @param continues a stretch, on any sweep, of the track it belongs to; empty starts a new track
     */
    record Draw(long sweepMs, BoundaryKind kind, List<Point> line, Optional<Anchor> continues) implements Change {
        public Draw {
            Checks.time(sweepMs);
            Objects.requireNonNull(kind);
            line = Checks.line(line);
            Objects.requireNonNull(continues);
        }
    }

    /**
     * Pulls a stretch so that it passes through a place; its neighbourhood follows, less with distance.
     *
     * @param at      where it is taken hold of
     * @param to      where that place must lie
     * @param reachKm distance along the line beyond which nothing moves: small is a soft line, large a stiff one
     */
    record Nudge(Anchor at, Point to, double reachKm) implements Change {
        public Nudge {
            Objects.requireNonNull(at);
            Checks.place(to);
            Checks.reach(reachKm);
        }
    }

    /** Keeps of a stretch what lies between two places; the ends are dropped. */
    record Trim(Anchor at, Point from, Point to) implements Change {
        public Trim {
            Objects.requireNonNull(at);
            Checks.place(from);
            Checks.place(to);
        }
    }

    /** Takes out of a stretch what lies between two places; where they are the same, the stretch falls in two. */
    record Cut(Anchor at, Point from, Point to) implements Change {
        public Cut {
            Objects.requireNonNull(at);
            Checks.place(from);
            Checks.place(to);
        }
    }

    /** Makes one stretch of two on the same sweep, by a straight line between their nearest ends. */
    record Join(Anchor first, Anchor second) implements Change {
        public Join {
            Objects.requireNonNull(first);
            Objects.requireNonNull(second);
        }
    }

    /** Gives a stretch to another track; empty makes it a track of its own. */
    record Relink(Anchor at, Optional<Anchor> track) implements Change {
        public Relink {
            Objects.requireNonNull(at);
            Objects.requireNonNull(track);
        }
    }

    /** Ends a track before the anchor's sweep; from there on it is another. */
    record SplitTrack(Anchor at) implements Change {
        public SplitTrack {
            Objects.requireNonNull(at);
        }
    }

    /** Makes one track of two. */
    record MergeTracks(Anchor kept, Anchor absorbed) implements Change {
        public MergeTracks {
            Objects.requireNonNull(kept);
            Objects.requireNonNull(absorbed);
        }
    }

    /** Says how a boundary shows. */
    record ChangeKind(Anchor at, Extent extent, BoundaryKind kind) implements Change {
        public ChangeKind {
            Objects.requireNonNull(at);
            Objects.requireNonNull(extent);
            Objects.requireNonNull(kind);
        }
    }

    /** Takes something out of the record because it is no boundary; it is kept apart. */
    record SetAside(Anchor at, Extent extent, AsideReason why, String words) implements Change {
        public SetAside {
            Objects.requireNonNull(at);
            Objects.requireNonNull(extent);
            if (why == AsideReason.REPLACED) {
                throw new IllegalArgumentException("a stretch is replaced by drawing over it, not by setting it aside");
            }
            Checks.words("the words of a reason", words);
        }
    }

    /** Brings back what was set aside there. */
    record Restore(Anchor at) implements Change {
        public Restore {
            Objects.requireNonNull(at);
        }
    }

    /** Holds the centre of a track's arc at a place, at the anchor's time; empty lets it be fitted again. */
    record FixCentre(Anchor at, Optional<Point> centre) implements Change {
        public FixCentre {
            Objects.requireNonNull(at);
            centre.ifPresent(Checks::place);
        }
    }

    /** Rules on a found meeting, kept whole so that the ruling outlives the run that found it. */
    record RuleMeeting(Meeting meeting, MeetingVerdict verdict) implements Change {
        public RuleMeeting {
            Checks.place(meeting.place());
            Checks.time(meeting.timeMs());
            Objects.requireNonNull(meeting.ellipse());
            Objects.requireNonNull(meeting.closing());
            Objects.requireNonNull(meeting.status());
            Checks.shortText("a meeting's id", meeting.id());
            Checks.shortText("a track's id", meeting.trackA());
            Checks.shortText("a track's id", meeting.trackB());
            Objects.requireNonNull(verdict);
        }
    }

    /** Adds a meeting that the run did not find. */
    record AddMeeting(Anchor first, Anchor second, long timeMs, Point place) implements Change {
        public AddMeeting {
            Objects.requireNonNull(first);
            Objects.requireNonNull(second);
            Checks.time(timeMs);
            Checks.place(place);
        }
    }

    /**
     * Leaves a note.
     *
     * @param at what it is about, by place and time, with the id of a track or meeting; empty for the whole case
     */
    record Note(Optional<Anchor> at, String words) implements Change {
        public Note {
            Objects.requireNonNull(at);
            Checks.words("a note", words);
        }
    }

    /** Says that a person has looked at a track, and what came of it. */
    record Review(Anchor at, ReviewOutcome outcome) implements Change {
        public Review {
            Objects.requireNonNull(at);
            Objects.requireNonNull(outcome);
        }
    }

    /** Takes back the change with this number. */
    record Undo(int sequence) implements Edit {
        public Undo {
            Checks.sequence(sequence);
        }
    }

    /** Brings back the undone change with this number. */
    record Redo(int sequence) implements Edit {
        public Redo {
            Checks.sequence(sequence);
        }
    }

    /** Says what the program itself did to the log, such as setting a torn last line aside. */
    record Mended(String words) implements Edit {
        public Mended {
            Checks.words("what was mended", words);
        }
    }
}
