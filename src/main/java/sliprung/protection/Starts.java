package sliprung.protection;

/**
 * Some equal starts in a row.
 *
 * @param currents of each
 * @param count 1 or more
 * @param preload of the devices before the first
 */
record Starts(Currents currents, int count, DevicePreload preload) {}
