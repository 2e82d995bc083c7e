import { type Plugin } from 'vite';

/** Faces of the first screen are asked for with the page: text that arrives is not set twice. */
export function preloadFaces(faces: string[]): Plugin {
  return {
    name: 'preload-faces',
    apply: 'build',
    transformIndexHtml: {
      order: 'post',
      handler(_, { bundle }) {
        const files = Object.keys(bundle ?? {});
        return faces.map((face) => {
          const file = files.find((name) => name.includes(face) && name.endsWith('.woff2'));
          if (!file) throw new Error(`The build holds no face ${face}.`);
          const attrs = { rel: 'preload', as: 'font', href: `/${file}`, crossorigin: true };
          return { tag: 'link', attrs, injectTo: 'head' as const };
        });
      },
    },
  };
}
