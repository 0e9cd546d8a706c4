// The least contrast of any text of the page against white or its own ground (WCAG 2: relative luminance).
function channel(v) {
  const c = v / 255;
  return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
}
function luminance(colour) {
  const [r, g, b] = colour.match(/[\d.]+/g).map(Number);
  return 0.2126 * channel(r) + 0.7152 * channel(g) + 0.0722 * channel(b);
}
function ground(element) {
  for (let e = element; e; e = e.parentElement) {
    const parts = getComputedStyle(e).backgroundColor.match(/[\d.]+/g).map(Number);
    if (parts.length < 4 || parts[3] > 0) {
      return getComputedStyle(e).backgroundColor;
    }
  }
  return 'rgb(255, 255, 255)';
}
const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
const least = {ratio: 21, text: '', colour: '', texts: 0};
while (walker.nextNode()) {
  const element = walker.currentNode.parentElement;
  const hidden = ['title', 'desc', 'style'].includes(element.tagName.toLowerCase());
  if (hidden || !walker.currentNode.data.trim()) {
    continue;
  }
  const style = getComputedStyle(element);
  const colour = element.namespaceURI.endsWith('svg') ? style.fill : style.color;
  const a = luminance(colour);
  const b = luminance(ground(element));
  const ratio = (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
  least.texts++;
  if (ratio < least.ratio) {
    Object.assign(least, {ratio, colour, text: walker.currentNode.data.trim()});
  }
}
return least;
