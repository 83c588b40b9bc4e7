/**
 * Documents: a quote with everything needed to defend and to reproduce it, as HTML, PDF or XLSX. The content is built once, as a
 * {@link layerweft.report.ReportModel}; the writers only set it, so that the three forms cannot differ.
 */
package layerweft.report;
