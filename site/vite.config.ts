import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';
import { preloadFaces } from './preload-faces.ts';
import { keepRadixParts } from './radix-parts.ts';

const radixPartsInUse = [
  'BaseButton',
  'Button',
  'TextFieldRoot',
  'TextFieldInput',
  'TextFieldSlot',
];

const facesOfFirstScreen = ['source-sans-3-latin-wght-normal', 'merriweather-latin-600-normal'];

export default defineConfig({
  plugins: [react(), preloadFaces(facesOfFirstScreen)],
  resolve: { conditions: ['@ferrule/source', ...defaultClientConditions] },
  css: { postcss: { plugins: [keepRadixParts(radixPartsInUse)] } },
  server: {
    host: '127.0.0.1',
    proxy: { '/api': process.env.FERRULE_API ?? 'http://127.0.0.1:4400' },
  },
  build: {
    outDir: 'dist',
    emptyOutDir: true,
    manifest: true,
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 300,
  },
});
