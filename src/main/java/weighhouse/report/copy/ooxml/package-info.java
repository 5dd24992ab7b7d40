/**
 * Changes to the parts of an Office Open XML package, made in their text so that everything else
 * stays byte for byte. {@link weighhouse.report.copy.ooxml.PackageCopy} is the way in; a class here
 * knows one part.
 */
package weighhouse.report.copy.ooxml;
