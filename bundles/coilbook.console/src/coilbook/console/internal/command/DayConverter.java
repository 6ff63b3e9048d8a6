package coilbook.console.internal.command;

import java.time.LocalDate;
import java.time.format.DateTimeParseException;

import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** A date as people type it at a prompt: ISO only, since nothing else means one day only. */
final class DayConverter implements ITypeConverter<LocalDate> {

    @Override
    public LocalDate convert(String text) {
        try {
            return LocalDate.parse(text);
        } catch (DateTimeParseException e) {
            throw new TypeConversionException("expected a date such as 2026-03-31, not \"" + text + "\"");
        }
    }
}
