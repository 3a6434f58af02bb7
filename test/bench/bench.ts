/** Timings, printed and held to nothing: npm run bench [factor] [search] [validation] [compare] [predict] [run] [repeats] */
const wanted = process.argv.slice(2);
const asked = (name: string) => wanted.length === 0 || wanted.includes(name);

if (asked('factor')) {
  const { benchFactor } = await import('./factor.ts');
  benchFactor();
}
if (asked('search')) {
  const { benchSearch } = await import('./search.ts');
  benchSearch();
}
if (asked('validation')) {
  const { benchBootstrap, benchValidation } = await import('./validation.ts');
  benchValidation();
  benchBootstrap();
}
if (asked('compare')) {
  const { benchCompare } = await import('./compare.ts');
  await benchCompare();
}
if (asked('predict')) {
  const { benchPredict } = await import('./predict.ts');
  await benchPredict();
}
if (asked('run')) {
  const { benchWholeRun } = await import('./whole-run.ts');
  benchWholeRun();
}
if (asked('repeats')) {
  const { benchRepeats } = await import('./repeats.ts');
  benchRepeats();
}
