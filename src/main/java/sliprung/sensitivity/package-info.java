/** Which uncertain input to measure first: how far each moves the thinnest margins. */
package sliprung.sensitivity;
