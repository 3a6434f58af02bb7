/**
 * What the browser tests ask of a page, as text: with functions, the browser's types would have to be in force
 * for the whole project, and `window` or `name` would pass unseen in code that has neither.
 */

/** Levels of the headings, in order. */
export const HEADING_LEVELS =
  "[...document.querySelectorAll('h1,h2,h3,h4')].map((h) => Number(h.tagName[1]))";

/** Labels of tables that are wider than their box. */
export const CLIPPED_TABLES = `[...document.querySelectorAll('.scroll')]
  .filter((box) => box.scrollWidth > box.clientWidth + 1)
  .map((box) => box.getAttribute('aria-label'))`;

/** Texts of drawings that run out of their drawing. */
export const TEXT_OUTSIDE = `[...document.querySelectorAll('svg.chart text')].flatMap((text) => {
  const own = text.getBoundingClientRect();
  const frame = text.closest('svg').getBoundingClientRect();
  const out = own.left < frame.left - 1 || own.right > frame.right + 1 || own.top < frame.top - 1 || own.bottom > frame.bottom + 1;
  return out ? [text.textContent] : [];
})`;

/** Texts whose contrast with the ground behind them is below 4.5, by the definition of contrast in WCAG 2.2. */
export const LOW_CONTRAST = `(() => {
  const channels = (colour) => (colour.match(/[\\d.]+/g) ?? ['0', '0', '0']).map(Number);
  const luminance = (colour) => {
    const [r, g, b] = channels(colour).map((c) => (c / 255 <= 0.04045 ? c / 255 / 12.92 : ((c / 255 + 0.055) / 1.055) ** 2.4));
    return 0.2126 * r + 0.7152 * g + 0.0722 * b;
  };
  const ground = (start) => {
    for (let node = start; node !== null; node = node.parentElement) {
      const colour = getComputedStyle(node).backgroundColor;
      if ((channels(colour)[3] ?? 1) > 0) return colour;
    }
    return 'rgb(255,255,255)';
  };
  const poor = [];
  let seen = 0;
  for (const node of document.querySelectorAll('body *')) {
    const own = [...node.childNodes].some((child) => child.nodeType === Node.TEXT_NODE && child.textContent.trim() !== '');
    if (!own || node.closest('.quiet, .skip, title, desc, style')) continue;
    seen++;
    const style = getComputedStyle(node);
    const colour = node.namespaceURI === 'http://www.w3.org/2000/svg' ? style.fill : style.color;
    const [a, b] = [luminance(colour), luminance(ground(node))].sort((x, y) => y - x);
    const contrast = (a + 0.05) / (b + 0.05);
    if (contrast < 4.5) poor.push(contrast.toFixed(2) + ' ' + node.textContent.slice(0, 40));
  }
  return seen < 50 ? ['only ' + seen + ' texts found'] : poor;
})()`;
