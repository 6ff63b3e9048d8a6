package coilbook.help;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The pages a user reads, the same in the window and in the repository ({@code bundles/coilbook.help/docs}). */
public enum HelpPage {
    FIRST_STEPS("first-steps"), HOW_COILBOOK_COMPUTES("how-coilbook-computes"), MEASURING("measuring"), CAUTIONS("cautions");

    private final String file;

    HelpPage(String file) {
        this.file = file;
    }

    /** The page as Markdown text.
     *
     * @throws UncheckedIOException if the bundle is incomplete
     */
    public String text() {
        try (InputStream in = HelpPage.class.getResourceAsStream("/docs/" + file + ".md")) {
            if (in == null) {
                throw new IOException("page " + file + " is missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The page's heading. */
    public String title() {
        String text = text();
        return text.substring(text.indexOf(' ') + 1, text.indexOf('\n')).strip();
    }
}
