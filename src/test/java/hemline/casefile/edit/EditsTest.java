package hemline.casefile.edit;

import static hemline.casefile.CaseExamples.at;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.CaseExamples;
import hemline.geometry.Point;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class EditsTest {
    private final CaseState state = CaseState.of(CaseExamples.found());

    private static CaseState apply(CaseState to, Edit.Change change) throws CannotApplyException {
        return to.apply(7, change).state();
    }

    private static Track track(CaseState state, String id) {
        return state.track(id).orElseThrow();
    }

    private static TrackPiece only(CaseState state, String id, int sweep) {
        List<TrackPiece> pieces = track(state, id).bySweep().get(sweep);
        assertThat(pieces).hasSize(1);
        return pieces.get(0);
    }

    private long sweepMs(int sweep) {
        return state.sweeps().meanMs(sweep);
    }

    @Test
    void drawnLineBecomesATrackOfItsOwnWithVerticesAtMostOneKilometreApart() throws Exception {
        CaseState after = apply(state, new Edit.Draw(sweepMs(2), BoundaryKind.ARC,
                List.of(new Point(-20, 30), new Point(-10, 30.5), new Point(-9.7, 30.5)), Optional.empty()));
        TrackPiece drawn = only(after, "H7", 2);
        assertThat(drawn.origin()).isEqualTo(Origin.HAND);
        assertThat(drawn.kind()).isEqualTo(BoundaryKind.ARC);
        for (int i = 1; i < drawn.vertices().size(); i++) {
            assertThat(drawn.points().get(i).distanceKm(drawn.points().get(i - 1))).isLessThanOrEqualTo(1 + 1e-9);
        }
        assertThat(drawn.points()).contains(new Point(-20, 30), new Point(-10, 30.5), new Point(-9.7, 30.5));
        for (TrackVertex vertex : drawn.vertices()) {
            assertThat(vertex.timeMs()).isEqualTo(state.sweeps().frame(2).timeAtMs(vertex.position()));
            assertThat(vertex.beamHeightM()).isEqualTo(state.sweeps().frame(2).beamHeightM(vertex.position()));
            assertThat(vertex.reflectivityDbz()).isNaN();
            assertThat(vertex.seen()).isTrue();
        }
    }

    @Test
    void lineDrawnOverAFoundOneTakesItsPlaceAndKeepsItAside() throws Exception {
        CaseState after = apply(state, new Edit.Draw(sweepMs(2), BoundaryKind.THIN_LINE,
                List.of(new Point(16.4, -20), new Point(16.8, 20)), Optional.of(at(state, "T1", 1, 13, 0))));
        TrackPiece drawn = only(after, "T1", 2);
        assertThat(drawn.origin()).isEqualTo(Origin.HAND);
        assertThat(after.asides()).singleElement().satisfies(aside -> {
            assertThat(aside.why()).isEqualTo(AsideReason.REPLACED);
            assertThat(aside.track().pieces()).containsExactly(only(state, "T1", 2));
        });
        assertThat(after.track("H7")).isEmpty();
    }

    @Test
    void lineDrawnAlongPartOfAFoundOneTakesOnlyThatPart() throws Exception {
        CaseState after = apply(state, new Edit.Draw(sweepMs(0), BoundaryKind.THIN_LINE,
                List.of(new Point(10.5, -5), new Point(10.5, 5)), Optional.empty()));
        List<TrackPiece> left = track(after, "T1").bySweep().get(0);
        assertThat(left).hasSize(2).allSatisfy(piece -> assertThat(piece.origin()).isEqualTo(Origin.HAND));
        double leftKm = left.stream().mapToDouble(piece -> piece.line().lengthKm()).sum();
        double asideKm = after.asides().get(0).track().pieces().get(0).line().lengthKm();
        assertThat(leftKm + asideKm).isCloseTo(40, within(1e-9));
        assertThat(asideKm).isBetween(10.0, 13.0);
    }

    @Test
    void lineDrawnAcrossAFoundOneLeavesItWhole() throws Exception {
        CaseState after = apply(state, new Edit.Draw(sweepMs(0), BoundaryKind.THIN_LINE,
                List.of(new Point(0, 1), new Point(25, 2)), Optional.empty()));
        assertThat(track(after, "T1")).isEqualTo(track(state, "T1"));
        assertThat(after.asides()).isEmpty();
    }

    @Test
    void nudgedLinePassesThroughThePlaceAndStaysPutBeyondItsReach() throws Exception {
        Point to = new Point(12.5, 1.3);
        CaseState after = apply(state, new Edit.Nudge(at(state, "T1", 0, 10, 0.3), to, 6));
        TrackPiece moved = only(after, "T1", 0);
        assertThat(moved.points()).contains(to);
        assertThat(moved.origin()).isEqualTo(Origin.HAND);
        for (TrackVertex old : only(state, "T1", 0).vertices()) {
            if (Math.abs(old.position().yKm() - 0.3) >= 6) {
                assertThat(moved.points()).contains(old.position());
            }
        }
        for (int i = 1; i < moved.points().size(); i++) {
            assertThat(moved.points().get(i).distanceKm(moved.points().get(i - 1))).isLessThanOrEqualTo(1 + 1e-9);
        }
    }

    @Test
    void trimKeepsWhatLiesBetween() throws Exception {
        CaseState after = apply(state,
                new Edit.Trim(at(state, "T1", 1, 13, 0), new Point(13, 12.25), new Point(13, -3)));
        TrackPiece kept = only(after, "T1", 1);
        assertThat(kept.line().lengthKm()).isCloseTo(15.25, within(1e-9));
        assertThat(kept.points().get(0)).isEqualTo(new Point(13, -3));
    }

    @Test
    void cutTakesOutWhatLiesBetween() throws Exception {
        CaseState after = apply(state,
                new Edit.Cut(at(state, "T1", 1, 13, 0), new Point(13, -1.5), new Point(13, 2.5)));
        assertThat(track(after, "T1").bySweep().get(1)).extracting(piece -> piece.line().lengthKm())
                .satisfiesExactly(a -> assertThat(a).isCloseTo(18.5, within(1e-9)),
                        b -> assertThat(b).isCloseTo(17.5, within(1e-9)));
    }

    @Test
    void cutAtOnePlacePartsAStretchAndJoinMakesItWholeAgain() throws Exception {
        Point place = new Point(13, 4.5);
        CaseState parted = apply(state, new Edit.Cut(at(state, "T1", 1, 13, 0), place, place));
        assertThat(track(parted, "T1").bySweep().get(1)).hasSize(2);
        CaseState whole = apply(parted, new Edit.Join(at(parted, "T1", 1, 13, -15), at(parted, "T1", 1, 13, 15)));
        assertThat(only(whole, "T1", 1).line().lengthKm()).isCloseTo(40, within(1e-9));
        assertThat(only(whole, "T1", 1).points()).containsAll(only(state, "T1", 1).points());
    }

    @Test
    void joinOfStretchesOfTwoTracksBelongsToTheFirst() throws Exception {
        CaseState after = apply(state, new Edit.Join(at(state, "T1", 3, 19, 20), at(state, "T2", 3, 33, 25)));
        assertThat(only(after, "T1", 3).line().lengthKm()).isGreaterThan(70);
        assertThat(track(after, "T2").bySweep()).doesNotContainKey(3);
    }

    @Test
    void relinkGivesAStretchToAnotherTrackOrMakesItOne() throws Exception {
        Edit.Change toOther = new Edit.Relink(at(state, "T1", 3, 19, 0), Optional.of(at(state, "T2", 0, 42, 0)));
        CaseState after = apply(state, toOther);
        assertThat(track(after, "T1").bySweep()).doesNotContainKey(3);
        assertThat(track(after, "T2").bySweep().get(3)).hasSize(2)
                .filteredOn(piece -> piece.origin() == Origin.HAND).hasSize(1);
        CaseState alone = apply(state, new Edit.Relink(at(state, "T1", 3, 19, 0), Optional.empty()));
        assertThat(track(alone, "H7").bySweep().keySet()).containsExactly(3);
    }

    @Test
    void splitTracksMergeBackIntoOne() throws Exception {
        CaseState split = apply(state, new Edit.SplitTrack(at(state, "T3", 2, -40, -2)));
        assertThat(track(split, "T3").bySweep().keySet()).containsExactly(0, 1);
        assertThat(track(split, "H7").bySweep().keySet()).containsExactly(2, 3, 4, 5);
        CaseState merged = apply(split, new Edit.MergeTracks(Anchor.of(track(split, "T3"), state.sweeps().frames()),
                Anchor.of(track(split, "H7"), state.sweeps().frames())));
        assertThat(track(merged, "T3").bySweep().keySet()).containsExactly(0, 1, 2, 3, 4, 5);
        assertThat(merged.track("H7")).isEmpty();
    }

    @Test
    void changedTracksLoseTheirMeasuredValuesAndOthersKeepThem() throws Exception {
        CaseState after = apply(state, new Edit.SplitTrack(at(state, "T3", 2, -40, -2)));
        assertThat(track(after, "T3").speed().isKnown()).isFalse();
        assertThat(track(after, "T3").arc()).isEmpty();
        assertThat(track(after, "T3").pieces()).allSatisfy(piece -> assertThat(piece.vertices())
                .noneMatch(vertex -> vertex.speed().isKnown()));
        assertThat(track(after, "T1")).isSameAs(track(state, "T1"));
    }

    @Test
    void changeOfKindTakesTheStretchOrTheTrack() throws Exception {
        CaseState one = apply(state, new Edit.ChangeKind(at(state, "T1", 2, 16, 0), Extent.STRETCH, BoundaryKind.ARC));
        assertThat(track(one, "T1").pieces()).filteredOn(piece -> piece.kind() == BoundaryKind.ARC).hasSize(1);
        CaseState all = apply(state, new Edit.ChangeKind(at(state, "T1", 2, 16, 0), Extent.TRACK, BoundaryKind.ARC));
        assertThat(track(all, "T1").pieces()).allMatch(piece -> piece.kind() == BoundaryKind.ARC);
    }

    @Test
    void whatIsSetAsideComesBackAsItWas() throws Exception {
        Edit.Change aside = new Edit.SetAside(at(state, "T3", 2, -40, -2), Extent.TRACK, AsideReason.RAIN_BAND, "");
        CaseState without = apply(state, aside);
        assertThat(without.track("T3")).isEmpty();
        assertThat(without.asides()).singleElement()
                .satisfies(kept -> assertThat(kept.track()).isEqualTo(track(state, "T3")));
        CaseState back = apply(without, new Edit.Restore(at(state, "T3", 4, -45, -1)));
        assertThat(back.tracks()).isEqualTo(state.tracks());
        assertThat(back.asides()).isEmpty();
    }

    @Test
    void stretchSetAsideLeavesTheRestOfItsTrack() throws Exception {
        Edit.Change aside = new Edit.SetAside(at(state, "T3", 2, -40, -2), Extent.STRETCH, AsideReason.OTHER, "dust");
        CaseState without = apply(state, aside);
        assertThat(track(without, "T3").bySweep()).doesNotContainKey(2);
        CaseState back = apply(without, new Edit.Restore(at(state, "T3", 2, -40, -2)));
        assertThat(only(back, "T3", 2).points()).isEqualTo(only(state, "T3", 2).points());
        assertThat(only(back, "T3", 2).origin()).isEqualTo(Origin.AUTO);
    }

    @Test
    void heldCentreIsKeptUntilItIsFreed() throws Exception {
        Anchor arc = at(state, "T3", 2, -40, -2);
        CaseState held = apply(state, new Edit.FixCentre(arc, Optional.of(new Point(-51, -9))));
        assertThat(held.centres()).singleElement().satisfies(centre -> {
            assertThat(centre.trackId()).isEqualTo("T3");
            assertThat(centre.centre()).isEqualTo(new Point(-51, -9));
            assertThat(centre.timeMs()).isEqualTo(sweepMs(2));
        });
        assertThat(apply(held, new Edit.FixCentre(arc, Optional.empty())).centres()).isEmpty();
    }

    @Test
    void meetingAddedByHandNamesItsTracksInOrderAndHasNoInventedUncertainty() throws Exception {
        CaseState after = apply(state, new Edit.AddMeeting(at(state, "T2", 4, 30, 0), at(state, "T1", 4, 22, 0),
                sweepMs(4), new Point(26, 0)));
        assertThat(after.added()).singleElement().satisfies(added -> {
            assertThat(added.meeting().trackA()).isEqualTo("T1");
            assertThat(added.meeting().trackB()).isEqualTo("T2");
            assertThat(added.meeting().timeSdS()).isNaN();
            assertThat(added.meeting().crossingAngleDeg()).isCloseTo(0, within(1e-9));
        });
    }

    @Test
    void laterRulingOnAMeetingTakesThePlaceOfTheEarlier() throws Exception {
        var meeting = CaseExamples.found().meetings().get(0);
        CaseState denied = apply(state, new Edit.RuleMeeting(meeting, MeetingVerdict.DENIED));
        CaseState confirmed = apply(denied, new Edit.RuleMeeting(meeting, MeetingVerdict.CONFIRMED));
        assertThat(confirmed.rulings()).singleElement()
                .satisfies(ruling -> assertThat(ruling.verdict()).isEqualTo(MeetingVerdict.CONFIRMED));
        assertThat(apply(confirmed, new Edit.RuleMeeting(meeting, MeetingVerdict.OPEN)).rulings()).isEmpty();
    }

    @Test
    void editThatFitsNothingIsRefusedWithAReason() {
        Anchor nowhere = new Anchor("T1", sweepMs(2), new Point(90, 90));
        assertThatThrownBy(() -> apply(state, new Edit.Nudge(nowhere, new Point(90, 91), 5)))
                .isInstanceOf(CannotApplyException.class).hasMessageContaining("no boundary within");
        Anchor tooLate = new Anchor("T1", sweepMs(2) + 100_000, new Point(16, 0));
        assertThatThrownBy(() -> apply(state, new Edit.SplitTrack(tooLate)))
                .isInstanceOf(CannotApplyException.class).hasMessageContaining("no sweep at");
        assertThatThrownBy(() -> apply(state, new Edit.SplitTrack(at(state, "T1", 0, 10, 0))))
                .isInstanceOf(CannotApplyException.class).hasMessageContaining("nothing before");
    }

    @Test
    void everyKindOfEditHasAWord() {
        List<Class<?>> changes = List.of(Edit.Change.class.getPermittedSubclasses());
        assertThat(changes).allSatisfy(type -> assertThat(EditKind.values()).anyMatch(kind -> kind.type() == type));
        assertThat(EditKind.values()).hasSize(changes.size() + 3);
    }
}
