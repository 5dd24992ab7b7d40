/**
 * What a generated model is, before it is laid out on sheets: the scenario and its words, the
 * events with their basis and effect measure, the inputs. Nothing here knows where a cell stands.
 * Mistakes are variants of an event's form: see {@code fault}; sheets: see {@code layout}.
 */
package weighhouse.generator.model;
