/**
 * The reviewer's brief as a YAML file: read with every fault at once, each with its line and
 * column, and drafted from what an audit inferred. The brief itself is {@link
 * weighhouse.audit.Brief}; this package only knows how people write it. {@code
 * docs/schema/brief.schema.json} tells editors the same.
 */
package weighhouse.audit.brief;
