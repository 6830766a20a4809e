package hemline.casefile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import hemline.pipeline.Settings;
import org.junit.jupiter.api.Test;

class SettingsJsonTest {
    private static Settings read(String json) {
        try {
            return SettingsJson.fromJson(new ObjectMapper().readTree(json));
        } catch (JsonProcessingException e) {
            throw new AssertionError(e);
        }
    }

    @Test
    void allSettingsComeBackAsTheyWere() {
        Settings changed = Settings.defaults().withHeightCeilingM(1234.5);
        assertThat(read(SettingsJson.toJson(changed).toString())).isEqualTo(changed);
    }

    @Test
    void whatIsNotGivenKeepsItsDefault() {
        Settings read = read("{\"tracking\": {\"minSweeps\": 4}}");
        assertThat(read.tracking()).isEqualTo(Settings.defaults().tracking().withMinSweeps(4));
        assertThat(read.meeting()).isEqualTo(Settings.defaults().meeting());
        assertThat(read("{}")).isEqualTo(Settings.defaults());
    }

    @Test
    void aWholeNumberMayStandForADecimalOne() {
        assertThat(read("{\"screening\": {\"heightCeilingM\": 2000}}").heightCeilingM()).isEqualTo(2000);
    }

    @Test
    void anUnknownSettingIsNamedWithItsNeighbours() {
        assertThatThrownBy(() -> read("{\"tracking\": {\"minSweep\": 4}}"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("'tracking.minSweep'").hasMessageContaining("minSweeps");
    }

    @Test
    void aValueOfTheWrongKindIsNamed() {
        assertThatThrownBy(() -> read("{\"screening\": {\"heightCeilingM\": \"high\"}}"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("setting 'screening.heightCeilingM' must be a number, got \"high\"");
        assertThatThrownBy(() -> read("{\"tracking\": 3}")).isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("must be an object");
        assertThatThrownBy(() -> read("[]")).isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("must be a JSON object");
        assertThatThrownBy(() -> read("{\"screening\": {\"heightCeilingM\": null}}")).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> read("{\"tracking\": {\"minSweeps\": 3.5}}"))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void aValueOutOfBoundsGivesTheBoundAndTheValue() {
        assertThatThrownBy(() -> read("{\"screening\": {\"heightCeilingM\": -5}}")).isInstanceOf(IllegalArgumentException.class)
                .hasMessage("the height ceiling must be within 0..20000 m, got -5.0");
    }
}
