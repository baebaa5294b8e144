#!/usr/bin/env node
// Starts the command: TypeScript is run through tsx, so that one source form serves every Node from 20 on.
import { register } from "tsx/esm/api";

register();
const { main } = await import("./main.ts");
process.exitCode = await main(process.argv.slice(2), {
  input: process.stdin,
  output: process.stdout,
  errors: process.stderr,
});
