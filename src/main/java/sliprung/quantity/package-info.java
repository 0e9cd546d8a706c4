/** Units of the trade: reading {@code 690 V}, printing with three significant figures. */
package sliprung.quantity;
