/**
 * The demo workbooks: one cohort model with faults, the same done right, and a partitioned-survival
 * model, all of an invented condition. They are committed; {@link
 * weighhouse.generator.demo.DemoMain} makes them anew.
 */
package weighhouse.generator.demo;
