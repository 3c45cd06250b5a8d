/**
 * The main job: a waste-heat audit of a works, from its survey file to ranked figures and files.
 *
 * <p>The parts, in the order of the work:
 * <ul>
 *   <li>reading: {@code SourceText} (bytes to lines), {@code CsvRow} and {@code SurveyHeading} (lines to cells),
 *       {@code NumberStyle} and {@code MeasuredCell} (cells to quantities), {@code CompositionReader} (cells to media),
 *       {@code SurveyReader} and {@code SiteReader}; every refusal becomes a {@code Problem} with file, line and column;
 *   <li>computing: {@code StreamFluid} (medium to property model), {@code CoolingPath} (heat and work per kilogram),
 *       {@code StreamAnalysis} (figures of a stream with their ranges), {@code AuditResult} (ranking and sums);
 *   <li>recovery: {@code RecoveryStudy} looks for the best hot gas that takes a steam plant, which
 *       {@code lostwork.examples.recovery} designs;
 *   <li>printing: {@code AuditReport} with {@code RecoveryReport} and {@code RecoveryTables}, {@code StreamCsv},
 *       {@code StreamJson}, {@code RecoveryJson}, written by {@code OutputFolder}.
 * </ul>
 *
 * <p>{@code WasteHeatAudit --help} tells how the two files are written; {@code AuditRules} holds the rules of the figures
 * and their sources.
 */
@NullMarked
package lostwork.examples.audit;

import org.jspecify.annotations.NullMarked;
