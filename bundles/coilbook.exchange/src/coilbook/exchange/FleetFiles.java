package coilbook.exchange;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;

import coilbook.fleet.CoilbookException;
import coilbook.fleet.Progress;

/** Reads exchange workbooks and flat lists; a declarative service. */
public interface FleetFiles {

    /**
     * Reads files: exchange workbooks (XLSX) and flat lists (XLSX, CSV, TSV), told apart by their sheets and headings.
     *
     * @param columns heading to field ({@code Kind.id + "." + Field.id}, or a flat list's own field name) where recognition cannot; may be empty
     * @throws CoilbookException with reason BAD_INPUT if a file is missing, a folder, empty, damaged, over the limits, or without a known heading
     */
    Incoming read(List<Path> files, Map<String, String> columns, Progress progress) throws CoilbookException;
}
