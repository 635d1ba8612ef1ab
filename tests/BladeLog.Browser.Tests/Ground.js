// Contrast of what stands on the page with its ground, from the computed styles. Ratio: WCAG 2.2, "contrast ratio".
({ body, text, parts }) => {
  const found = [], seen = new Set();
  const say = line => { if (!seen.has(line)) { seen.add(line); found.push(line); } };
  const pen = document.createElement('canvas').getContext('2d', { willReadFrequently: true });
  const cache = new Map();
  // Any notation, system colours included, as 0 to 255 and a share of cover.
  const rgba = words => {
    if (!cache.has(words)) {
      pen.clearRect(0, 0, 1, 1);
      pen.fillStyle = '#000';
      pen.fillStyle = words;
      pen.fillRect(0, 0, 1, 1);
      const d = pen.getImageData(0, 0, 1, 1).data;
      cache.set(words, [d[0], d[1], d[2], d[3] / 255]);
    }
    return cache.get(words);
  };
  const light = ([r, g, b]) => {
    const f = v => (v /= 255) <= 0.04045 ? v / 12.92 : ((v + 0.055) / 1.055) ** 2.4;
    return 0.2126 * f(r) + 0.7152 * f(g) + 0.0722 * f(b);
  };
  const ratio = (a, b) => { const [hi, lo] = [light(a), light(b)].sort((x, y) => y - x); return (hi + 0.05) / (lo + 0.05); };
  const over = (a, b) => [0, 1, 2].map(i => a[i] * a[3] + b[i] * (1 - a[3])).concat(1);
  const ground = e => {
    for (let at = e; at; at = at.parentElement) {
      const c = rgba(getComputedStyle(at).backgroundColor);
      if (c[3] === 1) return c;
      if (c[3] > 0) return over(c, at.parentElement ? ground(at.parentElement) : [255, 255, 255, 1]);
    }
    return [255, 255, 255, 1];
  };
  const shown = e => e.checkVisibility({ visibilityProperty: true, contentVisibilityAuto: true });
  const short = e => e.tagName.toLowerCase() + [...e.classList].map(c => '.' + c).join('');
  const words = e => (e.textContent ?? '').replace(/\s+/g, ' ').trim().slice(0, 24);

  const paper = ground(document.body), ink = rgba(getComputedStyle(document.documentElement).color);
  if (ratio(ink, paper) < body) say(`body: ${ratio(ink, paper).toFixed(2)} to 1, not ${body}`);

  const walk = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
  for (let n; (n = walk.nextNode());) {
    const e = n.parentElement;
    if (!n.textContent.trim() || e.closest('.vh,.defs,script,style,noscript,datalist,option,title,desc') || !shown(e)) continue;
    const s = getComputedStyle(e), drawn = e.closest('svg');
    // A label on a closed gate stands on the wall drawn under it.
    const wall = drawn && e.matches('.onwall') ? drawn.querySelector('.wall') : null;
    const under = wall ? rgba(getComputedStyle(wall).fill) : ground(drawn ? drawn.parentElement : e);
    const c = ratio(over(rgba(drawn ? s.fill : s.color), under), under);
    if (c < text) say(`text: ${short(e.parentElement)} > ${short(e)} "${words(e)}" ${c.toFixed(2)} to 1`);
  }

  // What shows where to touch and what a picture says: frames of fields and buttons, shapes of states, lines that carry meaning.
  const part = (e, colour, what) => {
    const under = ground(e.closest('svg')?.parentElement ?? e.parentElement ?? e), c = ratio(over(rgba(colour), under), under);
    if (c < parts) say(`part: ${what} of ${short(e)} ${c.toFixed(2)} to 1`);
  };
  for (const e of document.querySelectorAll('.btn,.pick,.opt span,.tick i,.block .undo button,.frow input:not([type=radio],[type=checkbox]),.frow select,.frow textarea,.field input')) {
    const s = getComputedStyle(e);
    if (shown(e) && parseFloat(s.borderTopWidth) > 0) part(e, s.borderTopColor, 'frame');
  }
  for (const e of document.querySelectorAll('.state .shape,.check .shape,.caution .shape')) if (shown(e)) part(e, getComputedStyle(e).color, 'shape');
  for (const e of document.querySelectorAll('svg :is(.axis,.lead,.jamb,.reach,.base,.dim,.mark,.loop,.frame,.steel,.rim,.spoke,.ground,.cline,.least,.ghost,.poss,.bandedge,.began,.hline)')) {
    const s = getComputedStyle(e);
    if (shown(e) && s.stroke !== 'none' && parseFloat(s.strokeWidth) > 0) part(e, s.stroke, 'line');
  }
  return found;
}
