import { fileURLToPath } from 'node:url';
import { ensurePackages } from './start/ensure-packages.mjs';
import { nodeProblem } from './start/node-problem.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));

const stopWith = (sentence, code) => {
  console.error(sentence);
  process.exit(code);
};

// A relative DATA_DIR means the same folder wherever the command is typed.
process.chdir(root);

const unfit = nodeProblem();
if (unfit) stopWith(unfit, 1);

try {
  await ensurePackages(root, (line) => console.log(line));
} catch (error) {
  stopWith(error.message, 1);
}

// The server is TypeScript; tsx is a package, so it can be asked for only now.
const { register } = await import('tsx/esm/api');
register();
if (process.argv.includes('--dev')) await import('./dev.ts');
else await import('../main.ts');
