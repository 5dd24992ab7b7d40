/**
 * The commands, their options and exit statuses, and what they say on a terminal. Each command
 * collects its inputs, calls the packages that do the work, and turns the result into a status;
 * none computes anything itself. {@link weighhouse.cli.Main} loads only the command that was
 * called. A new command is a class here and a line in {@link weighhouse.cli.Commands}.
 */
package weighhouse.cli;
