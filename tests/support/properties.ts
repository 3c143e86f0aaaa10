/** How properties are tried. A failure ends the run where nobody waits to see it made smaller, which can take hours. */
import fc from 'fast-check';

fc.configureGlobal({ endOnFailure: process.env.CI !== undefined });
