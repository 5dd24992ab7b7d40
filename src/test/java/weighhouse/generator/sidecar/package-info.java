/**
 * Blocks beside the model from which an effect measure comes: its interval, its draws, the
 * comparison or the studies it was derived from. The block's last item takes the place of the
 * input. Blocks are tables of items; one family of faults a file.
 */
package weighhouse.generator.sidecar;
