import { readdir, readFile, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, constants, gzip } from 'node:zlib';
import type { Plugin } from 'vite';

const kinds = /\.(?:js|css|html|svg|webmanifest|json)$/;

/** Writes `.br` and `.gz` beside every text asset, so that the server sends it compressed without working for it. */
export function compressAssets(): Plugin {
  let outDir = 'dist';
  return {
    name: 'rimeward-compress-assets',
    apply: 'build',
    enforce: 'post',
    configResolved(config) {
      outDir = join(config.root, config.build.outDir);
    },
    closeBundle: {
      order: 'post',
      sequential: true,
      async handler() {
        const files = await readdir(outDir, { recursive: true });
        await Promise.all(
          files.filter((file) => kinds.test(file)).map((file) => compress(join(outDir, file))),
        );
      },
    },
  };
}

async function compress(path: string): Promise<void> {
  const bytes = await readFile(path);
  const brotli = await promisify(brotliCompress)(bytes, {
    params: { [constants.BROTLI_PARAM_QUALITY]: 9, [constants.BROTLI_PARAM_SIZE_HINT]: bytes.length },
  });
  await writeFile(`${path}.br`, brotli);
  await writeFile(`${path}.gz`, await promisify(gzip)(bytes, { level: 9 }));
}
