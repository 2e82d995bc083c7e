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
// Our tokens set every step of both scales, so no colour of Radix's own is looked up.
const namedColour = /\[data-(accent|gray)-color='[a-z]+'\]/;

/**
 * Keeps, of the Radix stylesheets, only the rules of the parts named. Responsive and unused
 * variants go too: the whole sheet is larger than the site's budget for styles.
 */
export function keepRadixParts(parts: string[]): StyleFilter {
  const isPartInUse = (selector: string): boolean =>
    !unusedKinds.test(selector.replace(/:not\([^)]*\)/g, '')) &&
    [...selector.matchAll(componentClass)].every(([, part]) => part && parts.includes(part));
  const isKept = (selector: string): boolean =>
    !namedColour.test(selector) && isPartInUse(selector);
  return {
    postcssPlugin: 'keep-radix-parts',
    Rule(rule) {
      if (!rule.source?.input.file?.includes('@radix-ui/themes/')) return;
      const kept = rule.selectors.filter(isKept);
      if (kept.length === 0) rule.remove();
      else if (kept.length < rule.selectors.length) rule.selectors = kept;
    },
  };
}
