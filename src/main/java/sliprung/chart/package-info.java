/** What a chart shows, as plain records, then the drawing of it. */
package sliprung.chart;
