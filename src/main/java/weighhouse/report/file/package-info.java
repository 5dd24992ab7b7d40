/**
 * Files that appear whole or not at all: written aside in the same folder, then moved into place.
 * Knows no format and no audit.
 */
package weighhouse.report.file;
