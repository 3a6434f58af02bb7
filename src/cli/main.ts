#!/usr/bin/env node
import { runCommandLine } from './command-line.ts';
import { processTerminal } from './terminal.ts';

// A reader of a pipe may have had enough, as `head` has: that is no fault.
process.stdout.on('error', (fault: NodeJS.ErrnoException) => {
  if (fault.code !== 'EPIPE') throw fault;
  process.exit(process.exitCode ?? 0);
});

process.exitCode = await runCommandLine(process.argv.slice(2), processTerminal());
