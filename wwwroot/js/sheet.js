// Small comforts; every page works without this file.
(() => {
  'use strict';
  const DOUBLE_TAP_MS = 700, DRAFT_DAYS = 3, PREFIX = 'draft:';

  // A second tap within 700 ms is a bounce of the finger, not a wish.
  document.addEventListener('submit', event => {
    const form = event.target, now = performance.now();
    if (form.sheetSentAt && now - form.sheetSentAt < DOUBLE_TAP_MS) {
      event.preventDefault();
      event.stopImmediatePropagation();
      return;
    }
    form.sheetSentAt = now;
    const button = event.submitter;
    if (button?.classList.contains('btn')) {
      button.classList.add('sent');
      setTimeout(() => button.classList.remove('sent'), 8000);
    }
  }, true);

  // Drafts: what was typed survives a locked screen and a reload. Never secrets, never hidden fields.
  const keeps = field => field.name && !field.closest('[data-nodraft]')
    && !['password', 'hidden', 'file', 'submit', 'button'].includes(field.type);
  // By where it is sent: the page itself may answer under another address.
  const keyOf = form => PREFIX + (form.getAttribute('action') ?? location.pathname);
  const store = {
    get(key) { try { return JSON.parse(localStorage.getItem(key)); } catch { return null; } },
    set(key, value) { try { localStorage.setItem(key, JSON.stringify(value)); } catch { /* full or forbidden: no draft */ } },
    drop(key) { try { localStorage.removeItem(key); } catch { /* forbidden: there is none */ } },
  };

  function save(form) {
    if (form.method !== 'post' || form.closest('[data-nodraft]') || form.closest('.block')) return;
    const values = [...form.elements].filter(keeps)
      .map(f => ['radio', 'checkbox'].includes(f.type) ? [f.name, f.value, f.checked] : [f.name, f.value]);
    if (values.length) store.set(keyOf(form), { at: Date.now(), values });
  }

  function restore(form) {
    const key = keyOf(form), draft = store.get(key);
    if (!draft) return;
    if (Date.now() - draft.at > DRAFT_DAYS * 864e5) { store.drop(key); return; }
    // A form that came back with errors already holds what was typed.
    if (document.querySelector('.problems')) return;
    for (const [name, value, checked] of draft.values) {
      for (const field of form.elements) {
        if (field.name !== name || !keeps(field)) continue;
        if (checked === undefined) field.value = value;
        else if (field.value === value) field.checked = checked;
      }
    }
  }

  document.addEventListener('input', event => { if (event.target.form) save(event.target.form); });

  // A submitted form's draft goes once another page has come; it stays when the answer is the form with errors.
  let sent = null;
  document.addEventListener('submit', event => { if (event.target.method === 'post') sent = keyOf(event.target); });
  function arrived() {
    const asked = sent ?? sessionStorage.getItem('sent');
    if (asked && !document.querySelector('.problems')) store.drop(asked);
    sent = null;
    sessionStorage.removeItem('sent');
    for (const form of document.querySelectorAll('main form[method=post]')) restore(form);
  }
  addEventListener('pagehide', () => { if (sent) sessionStorage.setItem('sent', sent); });

  // Keys beside a number: the figure of last time, and steps up and down from it. What is typed otherwise stays as it is.
  // A fraction or a leading mark is inches: in a field of mm it is no number to step. A comma before three digits may be thousands.
  function plain(text, unit) {
    const part = /^(?:(\d+)[\s-]+)?(\d+)\/(\d+)$/.exec(text);
    if (unit === 'mm' && (part || /^[.,]/.test(text))) return NaN;
    if (part) return +(Number(part[1] ?? 0) + part[2] / part[3]).toFixed(4);
    return /^[1-9]\d{0,2},\d{3}$/.test(text) ? NaN : Number(text.replace(',', '.'));
  }
  document.documentElement.classList.add('scripted');
  document.addEventListener('click', event => {
    const key = event.target.closest('.steps button');
    if (!key) return;
    const keys = key.closest('.steps'), field = document.getElementById(keys.dataset.steps), places = t => (t.split(/[.,]/)[1] ?? '').length;
    if (key.dataset.set !== undefined) field.value = key.dataset.set;
    else {
      const from = field.value.trim() || keys.querySelector('[data-set]')?.dataset.set || keys.dataset.from || '0';
      const now = plain(from, field.parentElement.querySelector('.unit')?.textContent);
      if (!Number.isFinite(now)) return;
      const most = Math.max(places(key.dataset.add), places(from.includes('/') ? String(now) : from));
      field.value = Math.max(0, now + Number(key.dataset.add)).toFixed(most);
    }
    field.dispatchEvent(new Event('input', { bubbles: true }));
  });

  // What was saved is read aloud once, from the one place that no answer replaces.
  const told = document.getElementById('told');
  const lastSaved = () => {
    const saved = document.querySelector('#saved dl'), undo = document.querySelector('.block .undo');
    return saved ? [...saved.children, ...undo?.querySelectorAll('span') ?? []].map(e => e.textContent).join(' ') + (undo ? '|' + undo.action : '') : '';
  };
  let known = lastSaved();
  const tell = words => { if (told) told.textContent = words; };
  function tellSaved() {
    const now = lastSaved();
    if (now !== known) tell(now.split('|')[0]);
    known = now;
  }

  // While an entry is on its way the title block says so, in words; when it does not arrive, too.
  function waiting(word, remark) {
    const place = document.getElementById('saved');
    if (!place) return;
    const list = document.createElement('dl');
    for (const [tag, text] of [['dt', word], ['dd', remark]]) list.appendChild(document.createElement(tag)).textContent = text;
    place.replaceChildren(list);
    place.classList.add('waiting');
  }
  document.addEventListener('submit', event => { if (event.target.method === 'post') waiting('Sending', 'wait'); });
  document.addEventListener('htmx:error', () => {
    if (!document.querySelector('#saved.waiting')) return;
    waiting('Not sent', 'tap again');
    tell('Not sent. Tap again.');
    for (const button of document.querySelectorAll('.btn.sent')) button.classList.remove('sent');
  });

  // An answer that is no page of ours, such as a bare sentence, is shown as it is.
  document.addEventListener('htmx:after:request', event => {
    const ctx = event.detail?.ctx;
    if (ctx && !/ id="page"/.test(ctx.text ?? '')) ctx.select = null;
  });

  // After a swap the focus goes to the first thing to read: the errors, else the title.
  document.addEventListener('htmx:after:swap', () => {
    arrived();
    tellSaved();
    const goal = document.querySelector('[role=alert]') ?? document.querySelector('h1');
    if (!goal) return;
    goal.tabIndex = -1;
    goal.focus({ preventScroll: goal.matches('h1') });
  });
  arrived();
})();
