/**
 * Published models built as workbooks, for holding the engine and the audit against printed
 * results.
 */
package weighhouse.published;
