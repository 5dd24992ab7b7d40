/**
 * Checks that no pattern can say, each found by its name through the services of the class path. A
 * rule file names one under {@code check} with its parameters. Here live only the things that
 * checks of several families ask of a workbook, starting at {@link weighhouse.rules.check.Survey};
 * the checks themselves lie in a package for each family, one a file. Texts, severities, sources
 * and examples belong into the rule files.
 */
package weighhouse.rules.check;
