// Measures one page as eyes and gloves meet it; answers with one line for each finding.
({ width, height, tablet }) => {
  const found = [], seen = new Set();
  const shown = e => e.checkVisibility({ visibilityProperty: true, contentVisibilityAuto: true });
  const words = e => (e.getAttribute('aria-label') ?? e.textContent ?? '').replace(/\s+/g, ' ').trim().slice(0, 32);
  const short = e => e.tagName.toLowerCase() + (e.id ? '#' + e.id : '') + [...e.classList].map(c => '.' + c).join('');
  const name = e => `${e.parentElement ? short(e.parentElement) + ' > ' : ''}${short(e)} "${words(e)}"`;
  const say = (rule, what) => { const line = `${rule}: ${what}`; if (!seen.has(line)) { seen.add(line); found.push(line); } };
  const size = b => `${b.width.toFixed(0)}x${b.height.toFixed(0)}`;

  // The page never scrolls sideways. A small screen may scroll a table inside its own frame, a tablet may not.
  const reach = document.documentElement.scrollWidth;
  if (reach > width) {
    say('sideways', `the page is ${reach} wide on ${width}`);
    for (const e of document.querySelectorAll('body *')) {
      const b = e.getBoundingClientRect();
      if (b.right > width + 1 && b.width > 0 && !e.closest('.scroll,.vh') && ![...e.children].some(c => c.getBoundingClientRect().right > width + 1)) {
        say('sideways', `${name(e)} reaches ${b.right.toFixed(0)}`);
      }
    }
  }
  for (const e of document.querySelectorAll('.scroll')) {
    if (tablet && shown(e) && e.scrollWidth > e.clientWidth + 1) say('sideways', `${name(e)} scrolls inside, ${e.scrollWidth} in ${e.clientWidth}`);
  }

  // Targets: 64 px for any, 112 px for what is done daily or with gloves, 8 px between two of them.
  const often = '.btn.big,.btn.main,.opt,.keypad .btn,.hands .btn:not(.low),main .btn[href$="/swap"],main .btn[href$="/clicking"]';
  const targets = [];
  for (const e of document.querySelectorAll('a[href],button,input:not([type=hidden]),select,textarea,summary,[role=button]')) {
    const t = e.closest('.opt') ?? e;
    if (!shown(t)) continue;
    const b = t.getBoundingClientRect();
    if (b.width <= 1 || b.height <= 1) continue;
    targets.push([t, b]);
    if (b.width < 63.5 || b.height < 63.5) say('small', `${name(t)} is ${size(b)}`);
    else if (t.matches(often) && t.getAttribute('href') !== location.pathname && (b.width < 111.5 || b.height < 111.5)) say('small for a frequent one', `${name(t)} is ${size(b)}`);
  }
  const boxes = targets.filter(([e]) => !e.closest('.block'));
  for (let i = 0; i < boxes.length; i++) for (let j = i + 1; j < boxes.length; j++) {
    const [e, a] = boxes[i], [f, b] = boxes[j];
    if (e === f || e.contains(f) || f.contains(e)) continue;
    const dx = Math.max(a.left - b.right, b.left - a.right), dy = Math.max(a.top - b.bottom, b.top - a.bottom);
    if (dx < -1 && dy < -1) say('targets overlap', `${name(e)} and ${name(f)}`);
    else if (e.matches('.btn,.opt,.pick') && f.matches('.btn,.opt,.pick') && dx < 7.5 && dy < 7.5) say('targets too close', `${name(e)} and ${name(f)}, ${Math.max(dx, dy).toFixed(1)} between`);
  }

  // Risky ones (retire, strike out, restore): last on their page, and 112 px from what is tapped often. Undo is no risk.
  const risky = e => !e.closest('.block') && (e.matches('a[href$="/retire"],a[href$="/restore"]') || (e.matches('button:not([name])') && /\/(retire|void|restore)$/.test(e.form?.getAttribute('action') ?? '')));
  for (const [e, a] of boxes.filter(([t]) => risky(t))) for (const [f, b] of boxes) {
    if (e === f || !f.matches(often) || risky(f) || (e.form && f.closest('form') === e.form)) continue;
    const dx = Math.max(a.left - b.right, b.left - a.right), dy = Math.max(a.top - b.bottom, b.top - a.bottom);
    if (Math.max(dx, dy) < 111.5) say('risky too near', `${name(e)} is ${Math.max(dx, dy).toFixed(0)} from ${name(f)}`);
  }
  // And never in a corner, where thumbs go: in the middle half of the screen on every page, so that none lies where a frequent one lies on another.
  for (const [e, a] of boxes.filter(([t]) => risky(t))) {
    if (a.left < width / 4 - 1 || a.right > width * 3 / 4 + 1) say('risky in a corner', `${name(e)} reaches from ${a.left.toFixed(0)} to ${a.right.toFixed(0)} of ${width}`);
  }
  for (const e of document.querySelectorAll('form:is([action$="/retire"],[action$="/void"],[action$="/restore"]) button[type=submit]')) {
    if (e.closest('.block') || !shown(e)) continue;
    const above = [...e.form.querySelectorAll('input:not([type=hidden]),select,textarea')].map(f => (f.closest('.opt') ?? f).getBoundingClientRect().bottom);
    if (above.length && e.getBoundingClientRect().top - Math.max(...above) < 111.5) say('risky too near', `${name(e)} stands right below its answers`);
  }

  // Text: 20 px at least, in pictures too, as it stands on the screen.
  const walk = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT);
  for (let n; (n = walk.nextNode());) {
    const e = n.parentElement;
    if (!n.textContent.trim() || e.closest('.vh,.defs,script,style,noscript,datalist,option,title,desc') || !shown(e)) continue;
    let px = parseFloat(getComputedStyle(e).fontSize);
    if (e.closest('svg') && e.getScreenCTM) px *= e.getScreenCTM().a;
    if (px < 19.9) say('text', `${name(e)} is ${px.toFixed(1)} px`);
  }
  for (const e of document.querySelectorAll('input:not([type=hidden],[type=radio],[type=checkbox]),select,textarea')) {
    const px = parseFloat(getComputedStyle(e).fontSize);
    if (shown(e) && px < 19.9) say('text', `${name(e)} is typed at ${px.toFixed(1)} px`);
  }

  // Key data 24 px, a tag in a list 29, a figure on the floor 96.
  for (const [which, least] of [['.key,.why,.btn,.frow>label,.frow>legend', 24], ['.hang .t,.choice .tag', 29], ['.fig p b', 96]]) {
    for (const e of document.querySelectorAll(which)) {
      const px = parseFloat(getComputedStyle(e).fontSize);
      if (shown(e) && !e.closest('.vh') && px < least - 0.1) say('key data', `${name(e)} is ${px.toFixed(1)} px, not ${least}`);
    }
  }

  // Pictures: no label over another, none cut off at the screen's edge, no leader through a label.
  for (const s of document.querySelectorAll('svg:not(svg svg)')) {
    if (!shown(s)) continue;
    const labels = [...s.querySelectorAll('text')].filter(shown).map(t => [t.textContent.trim(), t.getBoundingClientRect()]);
    const cropped = !tablet && s.matches('.life-size');
    for (let i = 0; i < labels.length; i++) {
      const [word, a] = labels[i];
      if (!cropped && (a.right > width + 1 || a.left < -1)) say('cut off', `"${word}" in ${name(s)} reaches ${a.left.toFixed(0)} to ${a.right.toFixed(0)}`);
      for (let j = i + 1; j < labels.length; j++) {
        const b = labels[j][1];
        if (a.left < b.right - 1 && b.left < a.right - 1 && a.top + 4 < b.bottom - 4 && b.top + 4 < a.bottom - 4) say('labels overlap', `"${word}" and "${labels[j][0]}" in ${name(s)}`);
      }
    }
    if (!s.matches('.life,.gate svg')) continue;
    for (const l of [...s.querySelectorAll('line.lead')].map(x => x.getBoundingClientRect())) for (const [word, b] of labels) {
      if (l.left > b.left + 1 && l.left < b.right - 1 && l.top < b.bottom - 6 && l.bottom > b.top + 6) say('leader through a label', `"${word}" in ${name(s)}`);
    }
  }

  // Words stay in their boxes.
  for (const e of document.querySelectorAll('.btn,.tile,.pick,.opt>span,.opt em,h1,h2,h3,.next,.fig p,.big,.state,.t,.note,.key,dt,dd,li,label,legend,.block a,.block button')) {
    if (!shown(e) || e.matches('.vh') || e.closest('.scroll,.vh') || getComputedStyle(e).display === 'inline' || getComputedStyle(e).textOverflow === 'ellipsis') continue;
    if (e.scrollWidth > e.clientWidth + 1 && e.clientWidth > 0) say('spills', `${name(e)} needs ${e.scrollWidth} of ${e.clientWidth}`);
  }

  // The Floor is read from across the room: all of it at once.
  if (tablet && document.querySelector('main.floor') && document.documentElement.scrollHeight > height) {
    say('floor scrolls', `${document.documentElement.scrollHeight} high on ${height}`);
  }
  return found;
}
