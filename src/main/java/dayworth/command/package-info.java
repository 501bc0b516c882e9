/** The command line: parse, call one thing, print. */
package dayworth.command;
