/**
 * Ratios as estimates: standard errors read from intervals, indirect comparisons, pooling, and what
 * tables of counts give. Start at {@link weighhouse.effect.estimate.RatioEstimate}. All of it works
 * on the log scale, on which ratios are close to normal.
 *
 * <p>What a ratio does to a probability is in {@code weighhouse.effect}; estimates from individual
 * times are in {@code effect.survival}.
 */
package weighhouse.effect.estimate;
