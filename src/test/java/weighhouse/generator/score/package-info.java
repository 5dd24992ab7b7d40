/**
 * Holds audits against what the generator seeded: recall, precision, misses and false alarms. Knows
 * the audit's JSON and the manifest, nothing of how either was made.
 */
package weighhouse.generator.score;
