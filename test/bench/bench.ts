/** Timings, printed and held to nothing: npm run bench [factor] [run] */
const wanted = process.argv.slice(2);
const asked = (name: string) => wanted.length === 0 || wanted.includes(name);

if (asked('factor')) {
  const { benchFactor } = await import('./factor.ts');
  benchFactor();
}
if (asked('run')) {
  const { benchWholeRun } = await import('./whole-run.ts');
  benchWholeRun();
}
