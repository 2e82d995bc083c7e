/** The little of PostCSS's tree that the filter below looks at. */
interface StyleRule {
  selectors: string[];
  source?: { input: { file?: string } };
  remove(): void;
}

interface StyleFilter {
  postcssPlugin: string;
  Rule(rule: StyleRule): void;
}

const componentClass = /\.rt-([A-Z]\w*)/g;
const unusedKinds = /\\:|rt-variant-(surface|soft|ghost|classic)|rt-r-size-[14]/;

/**
 * Keeps, of the Radix component stylesheet, only the rules of the parts named. Responsive
 * and unused variants go too: the whole sheet is larger than the site's budget for styles.
 */
export function keepRadixParts(parts: string[]): StyleFilter {
  const isKept = (selector: string): boolean =>
    !unusedKinds.test(selector.replace(/:not\([^)]*\)/g, '')) &&
    [...selector.matchAll(componentClass)].every(([, part]) => part && parts.includes(part));
  return {
    postcssPlugin: 'keep-radix-parts',
    Rule(rule) {
      if (!rule.source?.input.file?.includes('@radix-ui/themes/components.css')) return;
      const kept = rule.selectors.filter(isKept);
      if (kept.length === 0) rule.remove();
      else if (kept.length < rule.selectors.length) rule.selectors = kept;
    },
  };
}
