package hemline.workflow;

/**
 * A score in two forms.
 *
 * @param text for people
 * @param json for programs
 */
public record ScoreOutcome(String text, String json) {
}
