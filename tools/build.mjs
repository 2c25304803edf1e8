import { build } from './lib/build.mjs';
import { checkNode, installPackages } from './lib/packages.mjs';
import { run } from './lib/say.mjs';

run(async () => {
  checkNode();
  await installPackages();
  await build();
});
