import react from '@vitejs/plugin-react';
import { defaultClientConditions, defineConfig } from 'vite';

const api = process.env.API_URL ?? 'http://127.0.0.1:3000';

/** The base every page needs, in chunks of their own so that a release does not make browsers fetch them again. */
const groups = [
  { name: 'react', test: /node_modules[\\/](react|react-dom|scheduler)[\\/]/, priority: 3 },
  {
    name: 'chakra',
    test: /node_modules[\\/](@emotion|stylis|@chakra-ui[\\/]react[\\/]dist[\\/]esm[\\/](styled-system|preset-base|theme|utils))/,
    priority: 2,
  },
  {
    name: 'charts',
    test: /node_modules[\\/](chart\.js|react-chartjs-2|chartjs-adapter-luxon|luxon)[\\/]/,
    priority: 1,
  },
];

export default defineConfig({
  plugins: [react()],
  resolve: { conditions: ['@lidwatch/source', ...defaultClientConditions] },
  server: { port: 4710, strictPort: true, proxy: { '/api': api, '/feeds': api, '/health': api } },
  build: { outDir: 'dist', rolldownOptions: { output: { codeSplitting: { groups } } } },
});
