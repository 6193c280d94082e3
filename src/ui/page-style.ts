const STYLE_ID = 'page-style';

/**
 * What a style attribute cannot say: pseudo-classes, the page's own scrolling, print. Rules go in one by one through
 * the style sheet's own interface, which a content security policy without inline styles allows.
 */
const RULES = [
  // The page itself scrolls, not a box in it: the phone's address bar, Page Down and printing depend on that.
  'html, body { height: auto; min-height: 100%; margin: 0; }',
  'body { overflow: visible; overflow-x: hidden; -webkit-text-size-adjust: 100%; }',
  '#root { height: auto; min-height: 100dvh; }',
  ':focus { outline: none; }',
  ':focus-visible { outline: 2px solid var(--ink); outline-offset: 2px; border-radius: 2px; }',
  'h1:focus-visible, main:focus-visible { outline: none; }',
  'input, select, textarea, button { font: inherit; color: inherit; border-radius: 2px; }',
  'input::placeholder, textarea::placeholder { color: var(--ink-third); opacity: 1; }',
  'option, optgroup { background: var(--sheet); color: var(--ink); }',
  '.skip-link { position: absolute; left: 8px; top: -64px; z-index: 20; padding: 12px 16px; background: var(--ink); color: var(--sheet); }',
  '.skip-link:focus { top: 8px; }',
  '.hover-underline:hover { text-decoration: underline; text-underline-offset: 3px; }',
  // Phones by Apple zoom in on fields whose letters are smaller than 16 px and stay there.
  '@supports (-webkit-touch-callout: none) { input, select, textarea { font-size: 16px !important; } }',
  '@media (prefers-reduced-motion: reduce) { *, *::before, *::after { animation: none !important; transition: none !important; scroll-behavior: auto !important; } }',
  '@media print { nav, .skip-link, .not-in-print { display: none !important; } body { background: #fff !important; } }',
];

export function installPageStyle(): void {
  if (document.getElementById(STYLE_ID) !== null) return;
  const element = document.createElement('style');
  element.id = STYLE_ID;
  document.head.appendChild(element);
  const sheet = element.sheet;
  if (sheet === null) return;
  for (const rule of RULES) insertRule(sheet, rule);
}

function insertRule(sheet: CSSStyleSheet, rule: string): void {
  try {
    sheet.insertRule(rule, sheet.cssRules.length);
  } catch {
    // A browser that does not know a selector or an at-rule refuses the whole rule; the others still hold.
    return;
  }
}
