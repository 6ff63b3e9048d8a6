package coilbook.exchange.internal.in;

/** Whole numbers in the attributes of a workbook's parts. */
final class Numbers {

    private Numbers() {
    }

    static int whole(String text, int otherwise) {
        try {
            return text == null ? otherwise : Integer.parseInt(text.strip());
        } catch (NumberFormatException e) {
            return otherwise;
        }
    }

    /** The column of a reference such as {@code AB12}, counted from 0, or -1. */
    static int column(String reference) {
        int column = 0;
        int i = 0;
        while (i < reference.length() && i < 4 && reference.charAt(i) >= 'A' && reference.charAt(i) <= 'Z') {
            column = column * 26 + reference.charAt(i) - 'A' + 1;
            i++;
        }
        return column - 1;
    }

    /** The row of a reference such as {@code AB12}, counted from 1, or -1. */
    static int row(String reference) {
        int i = 0;
        while (i < reference.length() && !Character.isDigit(reference.charAt(i))) {
            i++;
        }
        return whole(reference.substring(i), -1);
    }

    /** The letters of a column counted from 0. */
    static String letters(int column) {
        StringBuilder letters = new StringBuilder();
        for (int rest = column + 1; rest > 0; rest = (rest - 1) / 26) {
            letters.insert(0, (char) ('A' + (rest - 1) % 26));
        }
        return letters.toString();
    }
}
