package nappe.results;

import java.time.LocalDate;
import java.util.List;

/**
 * What every page and sheet says around its content.
 *
 * @param status one of "preliminary", "for checking", "issued", "superseded"
 * @param date date of the revision, typed by the engineer
 * @param fingerprint hash of the typed values, the method texts and the version, in groups of four
 * @param version of Nappe
 * @param letterPaper true for US letter, false for A4
 * @param cautions short lines for the foot of every page
 * @param release statement on the purpose of release for anything not issued; empty where none is owed
 */
public record Furniture(
        String project,
        String firm,
        String client,
        String number,
        String subject,
        String revision,
        LocalDate date,
        String status,
        String fingerprint,
        String version,
        boolean letterPaper,
        List<String> cautions,
        String release) {}
