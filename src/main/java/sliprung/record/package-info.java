/** The record of a review: JSON, CSV, HTML. */
package sliprung.record;
