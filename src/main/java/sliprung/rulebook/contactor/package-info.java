/**
 * Rules about what contactors make, break and are proven for, in the utilization categories of IEC
 * 60947-4-1 up to 1000 V.
 */
package sliprung.rulebook.contactor;
