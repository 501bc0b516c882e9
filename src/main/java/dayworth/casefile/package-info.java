/** Case folders in: CSV to a case, or every problem with its place. */
package dayworth.casefile;
