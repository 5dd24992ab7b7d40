/**
 * Checks that no pattern can say, each found by its name through the services of the class path. A
 * rule file names one under {@code check} with its parameters.
 */
package weighhouse.rules.check;
