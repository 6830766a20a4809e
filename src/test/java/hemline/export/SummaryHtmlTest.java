package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import hemline.pipeline.Analysis;
import hemline.sweep.RadarSite;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import javax.xml.parsers.DocumentBuilderFactory;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.NotBlank;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Document;

class SummaryHtmlTest {
    private static String page(String site, String path) throws Exception {
        Analysis analysis = InventedAnalysis.at(new RadarSite(site, Optional.empty(), Double.NaN));
        RunRecord run = new RunRecord("9.9.9", analysis, 1500, JsonNodeFactory.instance.objectNode().put("s", path),
                List.of(new RunInput(path, "00ff", RunInput.Fate.READ, 3, "")), List.of());
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        SummaryHtml.write(out, run);
        return out.toString(StandardCharsets.UTF_8);
    }

    private static Document parsed(String page) throws Exception {
        String xml = page.replace("<!DOCTYPE html>\n", "");
        return DocumentBuilderFactory.newInstance().newDocumentBuilder()
                .parse(new ByteArrayInputStream(xml.getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void thePageShowsTracksMeetingsTracesAndSources() throws Exception {
        String page = page("Lone Hill", "loop/a.h5");
        assertThat(page).contains("T01", "T02", "M1", "observed", "loop/a.h5", "00ff", "Two sweeps are missing.",
                "10.0 ± 0.5", "10.0 to 16.0", "hemline 9.9.9", "Guidance, not a warning");
        assertThat(parsed(page).getElementsByTagName("svg").getLength()).isEqualTo(1 + 3);
    }

    @Test
    void nothingComesFromOutsideAndNothingRuns() throws Exception {
        String page = page("Lone Hill", "a.h5");
        assertThat(page).doesNotContain("<script", "<img", "<link", "@import", "javascript:", "url(");
        assertThat(page.replace("http://www.w3.org/2000/svg", "")).doesNotContain("http:", "https:");
    }

    @Property(tries = 60)
    void noNameOpensMarkup(@ForAll @NotBlank String name) throws Exception {
        Document plain = parsed(page("x", "x"));
        Document named = parsed(page(name, "a" + name));
        assertThat(named.getElementsByTagName("*").getLength()).isEqualTo(plain.getElementsByTagName("*").getLength());
    }

    @Test
    void markupInNamesIsShownAsItStands() throws Exception {
        String name = "<script>alert('1')</script> & \"co\"";
        assertThat(parsed(page(name, name)).getElementsByTagName("h1").item(0).getTextContent())
                .isEqualTo("Outflow boundaries, " + name);
    }

    @Test
    void anEmptyResultStillGivesAPage() throws Exception {
        Analysis full = InventedAnalysis.at(InventedAnalysis.PLACED);
        RunRecord run = new RunRecord("1", full.withFound(List.of(), List.of()), 1500,
                JsonNodeFactory.instance.objectNode(), List.of(), List.of());
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        SummaryHtml.write(out, run);
        assertThat(out.toString(StandardCharsets.UTF_8)).contains("None found.");
    }

    @Test
    void theSameRunGivesTheSamePage() throws Exception {
        assertThat(page("Lone Hill", "a.h5")).isEqualTo(page("Lone Hill", "a.h5"));
    }
}
