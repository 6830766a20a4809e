package hemline.scoring;

import static hemline.scoring.Cases.boundary;
import static hemline.scoring.Cases.line;
import static hemline.scoring.Cases.piece;
import static hemline.scoring.Cases.track;
import static hemline.scoring.Cases.truth;
import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import hemline.boundary.Speed;
import java.util.List;
import org.junit.jupiter.api.Test;

class ScoreOutputTest {
    private static Score pooled() {
        Score first = Cases.score(truth(1, boundary("A", line(0, 0, 20, 0))),
                track("T1", piece(0, 0, 8, 0.5, 0, new Speed(9, 2))));
        Score second = Cases.score(truth(1, boundary("A", line(0, 0, 20, 0))),
                track("T1", piece(0, 0, 20, 0.5, 0, new Speed(9, 2))));
        return Scores.pool(List.of(first, second));
    }

    @Test
    void theTextTableIsAligned() {
        List<String> lines = ScoreText.table(pooled()).lines().toList();
        assertThat(lines.get(0)).matches("measure +value +95 % interval +unit");
        assertThat(lines).anyMatch(l -> l.matches("recall of detectable length +0\\.7\\d\\d +0\\.\\d+ to 1\\.000"));
        assertThat(lines).anyMatch(l -> l.matches("normal speed, bias +-1\\.00 +-1\\.00 to -1\\.00 +m/s"));
        assertThat(lines).anyMatch(l -> l.matches("expansion, bias +- +- +m/s"));
        assertThat(lines).anyMatch(l -> l.matches("case +2 +0\\.7\\d\\d +1\\.000 .*"));
        int value = lines.get(0).indexOf("value") + "value".length();
        assertThat(lines.subList(1, Measure.values().length + 1))
                .allMatch(l -> l.charAt(value - 1) != ' ' && (l.length() == value || l.charAt(value) == ' '));
    }

    @Test
    void jsonHoldsEveryMeasureAndEveryScene() throws Exception {
        JsonNode root = new JsonMapper().readTree(ScoreJson.text(pooled()));
        assertThat(root.at("/pooled/scenes").asInt()).isEqualTo(2);
        assertThat(root.at("/pooled/measures").size()).isEqualTo(Measure.values().length);
        assertThat(root.at("/pooled/measures/speed_bias_ms/value").asDouble()).isEqualTo(-1);
        assertThat(root.at("/pooled/measures/expansion_bias_ms/value").isNull()).isTrue();
        assertThat(root.at("/scenes/1/measures/recall").asDouble()).isEqualTo(1);
        assertThat(root.at("/scenes/0/boundaries/0/main_track").asText()).isEqualTo("T1");
        assertThat(root.at("/settings/tolerance_km").asDouble()).isEqualTo(2);
        assertThat(ScoreJson.text(pooled())).isEqualTo(ScoreJson.text(pooled())).endsWith("}\n");
    }

    @Test
    void measuresHaveDistinctKeys() {
        assertThat(Measure.values()).extracting(Measure::key).doesNotHaveDuplicates();
    }
}
