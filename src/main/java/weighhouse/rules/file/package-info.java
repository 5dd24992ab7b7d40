/**
 * Rule files and the list of published sources, read from YAML with every fault told at once by
 * file, line and column. What a file says becomes typed patterns and examples here; what is done
 * with them is not known here. Continue at {@code weighhouse.rules.RuleBook}.
 */
package weighhouse.rules.file;
