import react from '@vitejs/plugin-react';
import { defineConfig } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';
import { compressAssets } from './build/compress-assets';
import packageJson from './package.json' with { type: 'json' };

process.env.VITE_APP_VERSION ??= packageJson.version;
const api = process.env.API_ORIGIN ?? 'http://127.0.0.1:4180';

export default defineConfig({
  resolve: { conditions: ['source', 'module', 'browser', 'development|production'] },
  server: { host: '127.0.0.1', proxy: { '/api': api } },
  build: { target: 'es2022', sourcemap: false, modulePreload: { polyfill: false } },
  plugins: [
    react(),
    VitePWA({
      strategies: 'injectManifest',
      srcDir: 'src/service-worker',
      filename: 'sw.ts',
      injectRegister: false,
      registerType: 'prompt',
      includeAssets: ['icons/*.png', 'icons/*.svg'],
      injectManifest: {
        globPatterns: ['**/*.{js,css,html,woff2,png,svg,webmanifest}'],
        globIgnores: ['**/rescue.*'],
      },
      manifest: {
        id: '/',
        name: 'Rimeward',
        short_name: 'Rimeward',
        description: 'Winterization field log',
        start_url: '/',
        display: 'standalone',
        background_color: '#F7F5EF',
        theme_color: '#1C4A3A',
        icons: [
          { src: '/icons/icon-192.png', sizes: '192x192', type: 'image/png' },
          { src: '/icons/icon-512.png', sizes: '512x512', type: 'image/png' },
          { src: '/icons/icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
        ],
      },
    }),
    compressAssets(),
  ],
});
