package coilbook.exchange.internal.in;

import org.xml.sax.SAXException;

/** Carries the words of a limit out of a parser. */
final class LimitReached extends SAXException {

    private static final long serialVersionUID = 1L;

    LimitReached(String words) {
        super(words);
    }
}
