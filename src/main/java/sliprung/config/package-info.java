/** YAML text to records, with the place of every value and all mistakes collected. */
package sliprung.config;
