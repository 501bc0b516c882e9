/** Rechecks plans and flows against the activities and links; trusts neither way. */
package dayworth.engine.proof;
