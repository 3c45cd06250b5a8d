/**
 * Results as text: tables that print aligned, and the same tables as CSV and JSON.
 *
 * <p>Numbers are written with a decimal point whatever the locale of the machine. CSV follows RFC 4180 with line feeds;
 * JSON follows RFC 8259. In files numbers keep all their digits, in print they are rounded to the decimals of their column.
 */
@NullMarked
package lostwork.report;

import org.jspecify.annotations.NullMarked;
