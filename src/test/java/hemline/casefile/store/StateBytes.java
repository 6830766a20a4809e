package hemline.casefile.store;

import com.fasterxml.jackson.core.JsonProcessingException;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Found;
import hemline.sweep.RadarSite;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;

/** All that a state holds, as text: two states are the same when and only when their texts are. */
public final class StateBytes {
    private static final RadarSite SITE = new RadarSite("any", Optional.empty(), Double.NaN);

    private StateBytes() {
    }

    public static String of(CaseState state) {
        Found found = new Found(SITE, state.sweeps().frames(), state.tracks(), List.of(), List.of());
        StringBuilder text = new StringBuilder();
        text.append(new String(FoundText.write(found).get(FoundText.TRACKS), StandardCharsets.UTF_8));
        try {
            for (Object list : List.of(state.asides(), state.centres(), state.rulings(), state.added(), state.notes(),
                    state.reviews())) {
                text.append(CaseJson.MAPPER.writeValueAsString(list)).append('\n');
            }
        } catch (JsonProcessingException e) {
            throw new IllegalStateException(e);
        }
        return text.toString();
    }
}
