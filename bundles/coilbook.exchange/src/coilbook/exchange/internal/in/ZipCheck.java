package coilbook.exchange.internal.in;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Enumeration;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;

import coilbook.fleet.CoilbookException;

/** Looks into the directory of a zip file before anything is unpacked: is it a workbook, is it whole, is it within the limits. */
final class ZipCheck {

    private ZipCheck() {
    }

    static void check(Path path, String file) throws CoilbookException {
        try (ZipFile zip = new ZipFile(path.toFile())) {
            if (zip.size() > InputLimits.PARTS) {
                throw Refusal.of(file, "has " + zip.size() + " parts; the limit is " + InputLimits.PARTS);
            }
            for (Enumeration<? extends ZipEntry> entries = zip.entries(); entries.hasMoreElements();) {
                check(entries.nextElement(), file);
            }
            if (zip.getEntry("xl/workbook.bin") != null) {
                throw Refusal.of(file, "is a binary workbook; open it in a spreadsheet program and save it as .xlsx");
            }
            ZipEntry kind = zip.getEntry("mimetype");
            if (kind != null && new String(zip.getInputStream(kind).readNBytes(100), StandardCharsets.US_ASCII).contains("opendocument")) {
                throw Refusal.of(file, "is an OpenDocument file; save it as .xlsx or .csv");
            }
            if (zip.getEntry("[Content_Types].xml") == null) {
                throw Refusal.of(file, "is a zip file, not an XLSX workbook");
            }
        } catch (ZipException e) {
            throw damaged(file, e);
        } catch (IOException e) {
            throw Refusal.of(file, "", "cannot be read", e);
        }
    }

    static CoilbookException damaged(String file, Throwable cause) {
        return Refusal.of(file, "", "is damaged or cut off; expected a complete XLSX workbook (copy it again from where it came)", cause);
    }

    private static void check(ZipEntry entry, String file) throws CoilbookException {
        long size = entry.getSize();
        if (size > InputLimits.PART_MEGABYTES << 20) {
            throw Refusal.of(file, "unpacks to more than " + InputLimits.PART_MEGABYTES + " MB in one part, which is the limit");
        }
        if (size > InputLimits.RATIO_FREE_BYTES && size / Math.max(1, entry.getCompressedSize()) > InputLimits.PACKING_RATIO) {
            throw bomb(file, null);
        }
    }

    static CoilbookException bomb(String file, Throwable cause) {
        return Refusal.of(file, "", "unpacks to more than " + InputLimits.PACKING_RATIO
                + " times its size, which is the limit: no sheet of real data does", cause);
    }
}
