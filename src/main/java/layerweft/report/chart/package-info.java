/** Charts as pictures: drawn by Java2D, the same for the window, for files and for documents. */
package layerweft.report.chart;
