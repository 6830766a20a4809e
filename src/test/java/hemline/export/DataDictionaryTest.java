package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class DataDictionaryTest {
    private static final String MARK = "<!-- columns: kept true by a test -->\n";

    private static List<Table<?>> all() {
        List<Table<?>> all = new ArrayList<>(DataPackage.TABLES);
        all.add(DataPackage.PASSAGES);
        return all;
    }

    private static String expected() {
        StringBuilder text = new StringBuilder();
        for (Table<?> table : all()) {
            text.append("\n## ").append(table.name()).append(".csv\n\n").append(table.meaning()).append("\n\n");
            text.append("| column | unit | meaning |\n| --- | --- | --- |\n");
            for (Column<?> column : table.columns()) {
                text.append("| `").append(column.name()).append("` | ").append(column.unit()).append(" | ")
                        .append(column.meaning().replace("|", "\\|")).append(" |\n");
            }
        }
        return text.toString();
    }

    @Test
    void theDataDictionaryListsEveryColumnAsItIs() throws IOException {
        String page = Files.readString(Path.of("docs/tables.md"));
        assertThat(page.substring(page.indexOf(MARK) + MARK.length())).isEqualTo(expected());
    }

    @Test
    void theSchemaNamesEveryColumnInOrder() {
        JsonNode resources = DataPackage.describe(all()).get("resources");
        assertThat(resources).hasSize(4);
        for (int i = 0; i < resources.size(); i++) {
            Table<?> table = all().get(i);
            assertThat(resources.get(i).get("path").asText()).isEqualTo(table.name() + ".csv");
            assertThat(resources.get(i).get("schema").get("fields").findValuesAsText("name"))
                    .isEqualTo(table.columns().stream().map(Column::name).toList());
        }
    }
}
