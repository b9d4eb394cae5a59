// Everything works without this script; it saves waiting and draws charts.

const here = document.querySelector('script[data-uplot]');
const style = (name) => getComputedStyle(document.documentElement).getPropertyValue(name).trim();

async function json(path) {
  const answer = await fetch(path, { headers: { Accept: 'application/json' } });
  if (!answer.ok) throw new Error(String(answer.status));
  return answer.json();
}

// A forecast on its way: tell how far it is, then show the page.
async function follow(section) {
  const bar = section.querySelector('progress');
  const stage = section.querySelector('[data-stage]');
  for (;;) {
    await new Promise((resolve) => setTimeout(resolve, 250));
    let far;
    try {
      far = await json(section.dataset.progress);
    } catch {
      await new Promise((resolve) => setTimeout(resolve, 2000));
      continue;
    }
    if (far.state !== 'running') break;
    bar.value = far.percent;
    if (stage.textContent !== far.stage) stage.textContent = far.stage;
  }
  location.reload();
}

// Charts are fetched when somebody opens them.
let library;
function charts() {
  library ??= new Promise((resolve, reject) => {
    const sheet = document.createElement('link');
    sheet.rel = 'stylesheet';
    sheet.href = here.dataset.uplotStyle;
    const script = document.createElement('script');
    script.src = here.dataset.uplot;
    script.onload = () => resolve(window.uPlot);
    script.onerror = reject;
    document.head.append(sheet, script);
  });
  return library;
}

const TONES = { main: '--russet', second: '--faded', third: '--leafgreen', fourth: '--focus' };
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const pad = (number) => String(number).padStart(2, '0');

// Days and hours as the pages write them; local times stand in the data as if they were UTC.
function day(seconds) {
  const at = new Date(seconds * 1000);
  return at.getUTCDate() + ' ' + MONTHS[at.getUTCMonth()];
}
function hour(seconds) {
  const at = new Date(seconds * 1000);
  return pad(at.getUTCHours()) + ':' + pad(at.getUTCMinutes());
}
const comma = document.documentElement.dataset.comma !== undefined;
const figure = (value) => (comma ? String(value).replace('.', ',') : String(value));

// Nothing is told of no time: where nobody points, figures are left blank.
const told = (write) => (chart, value) => (value == null ? '' : write(value));
const reading = told((value) => figure(Math.round(value * 100) / 100));

// Data comes in °C and SI units; charts show what the person likes.
const SHOWN = {
  '°C': document.documentElement.dataset.fahrenheit === undefined ? ['°C', (v) => v] : ['°F', (v) => 1.8 * v + 32],
  W: ['kW', (v) => v / 1000],
};
const secondsOf = (time) => Date.parse(time + 'Z') / 1000;
const DASHES = { second: [10, 4], third: [3, 3], fourth: [8, 3, 2, 3] };
const marker = (dash) => (dash ? (dash[0] > 3 ? 'dashed' : 'dotted') : 'solid');

async function draw(box) {
  if (box.dataset.drawn) return;
  box.dataset.drawn = 'yes';
  const [UPlot, given] = await Promise.all([charts(), json(box.dataset.chart)]);
  const data = box.dataset.part ? given[box.dataset.part] : given;
  const wanted = box.dataset.lines ? box.dataset.lines.split(' ') : null;
  const drawn = (one) => !wanted || wanted.includes(one.id);
  const [unit, shown] = SHOWN[data.unit] ?? [data.unit, (v) => v];
  const value = (v) => (v === null ? null : shown(v));
  const lined = data.lines.filter(drawn);
  const levelled = data.levels.filter(drawn);
  const font = '13px ' + style('--serif');
  const axis = { stroke: style('--ink'), font, grid: { stroke: style('--rule'), width: 1 }, ticks: { stroke: style('--rule'), width: 1 } };
  const levels = levelled.map((level) => ({
    label: level.name, value: reading, stroke: style('--ink'), width: 1.5, dash: [7, 5], points: { show: false },
  }));
  const lines = lined.map((line) => ({
    label: line.name, value: reading, stroke: style(TONES[line.tone] ?? '--ink'), width: 2, dash: DASHES[line.tone], points: { show: false },
  }));
  const options = {
    width: box.clientWidth, height: 260, tzDate: (seconds) => UPlot.tzDate(new Date(seconds * 1000), 'Etc/UTC'),
    scales: { x: { time: true } },
    axes: [{ ...axis, values: (chart, splits) => splits.map((at) => (at % 86400 ? hour(at) : day(at))) }, { ...axis, values: (chart, splits) => splits.map(figure), label: unit, labelFont: font, size: 56 }],
    series: [{ label: box.dataset.title, value: told((at) => day(at) + ' ' + hour(at)) }, ...lines, ...levels],
    hooks: { ready: [(chart) => chart.setLegend({ idx: null }, false)] },
    legend: { markers: { dash: (chart, i) => marker(chart.series[i].dash) } },
  };
  const time = data.time.map(secondsOf);
  const values = [time, ...lined.map((line) => line.values.map(value)), ...levelled.map((level) => time.map(() => value(level.value)))];
  const chart = new UPlot(options, values, box);
  new ResizeObserver(() => chart.setSize({ width: box.clientWidth, height: 260 })).observe(box);
}

// Charts take the colours of the page, so they are drawn again when it turns dark or light.
matchMedia('(prefers-color-scheme: dark)').addEventListener('change', () => {
  document.querySelectorAll('[data-drawn]').forEach((box) => {
    delete box.dataset.drawn;
    box.replaceChildren();
    draw(box);
  });
});

document.querySelectorAll('[data-progress]').forEach(follow);
document.querySelectorAll('[data-chart]').forEach((box) => {
  const details = box.closest('details');
  if (details && !details.open) {
    details.addEventListener('toggle', () => details.open && draw(box), { once: true });
  } else {
    draw(box);
  }
});

// A face is told as it is typed.
document.querySelectorAll('form[data-face]').forEach((form) => {
  const sheet = form.querySelector('#face-sheet');
  let waiting;
  let asked = 0;
  form.addEventListener('input', () => {
    clearTimeout(waiting);
    waiting = setTimeout(async () => {
      const mine = ++asked;
      const answer = await fetch(form.dataset.face, { method: 'POST', body: new URLSearchParams(new FormData(form)) });
      if (answer.ok && mine === asked) sheet.innerHTML = await answer.text();
    }, 200);
  });
});

// Crops are suggested while their name is typed.
document.querySelectorAll('form[data-suggest]').forEach((form) => {
  const field = form.querySelector('[name="crop"]');
  const list = document.createElement('ul');
  list.className = 'suggested';
  const told = document.createElement('p');
  told.className = 'visually-hidden';
  told.setAttribute('role', 'status');
  field.closest('.field').append(list, told);
  let waiting;
  let asked = 0;
  const taken = (crop) => {
    field.value = crop.name;
    list.replaceChildren();
    told.textContent = '';
    form.querySelector('[name="mass"]').focus();
  };
  field.addEventListener('input', () => {
    clearTimeout(waiting);
    waiting = setTimeout(async () => {
      const mine = ++asked;
      const typed = field.value.trim();
      const { crops } = typed
        ? await json(form.dataset.suggest + '&like=' + encodeURIComponent(typed.slice(0, 80)))
        : { crops: [] };
      if (mine !== asked) return;
      list.replaceChildren(...crops.map((crop) => {
        const item = document.createElement('li');
        const button = document.createElement('button');
        button.type = 'button';
        button.textContent = crop.by ? `${crop.name} (${crop.by})` : crop.name;
        button.addEventListener('click', () => taken(crop));
        item.append(button);
        return item;
      }));
      told.textContent = form.dataset.found.replace('{0}', crops.length);
    }, 150);
  });
});

// What if: a slider beside each field, and the answer as it moves.
document.querySelectorAll('form[data-what]').forEach((form) => {
  const answer = document.querySelector('#what-answer');
  let waiting;
  let asked = 0;
  const ask = () => {
    clearTimeout(waiting);
    waiting = setTimeout(async () => {
      const mine = ++asked;
      const got = await fetch(form.dataset.what + '?' + new URLSearchParams(new FormData(form)));
      const text = await got.text();
      if (!got.ok || mine !== asked) return;
      answer.innerHTML = text;
      answer.querySelectorAll('[data-chart]').forEach(draw);
    }, 150);
  };
  form.querySelectorAll('.slide').forEach((slide) => {
    const field = slide.querySelector('input');
    const number = () => Number(field.value.replace(',', '.'));
    const slider = document.createElement('input');
    Object.assign(slider, { type: 'range', min: slide.dataset.low, max: slide.dataset.high, step: slide.dataset.step });
    slider.setAttribute('aria-label', slide.querySelector('label').textContent);
    slider.value = number();
    slider.addEventListener('input', () => {
      field.value = comma ? slider.value.replace('.', ',') : slider.value;
      ask();
    });
    field.addEventListener('input', () => {
      slider.value = number();
      ask();
    });
    slide.append(slider);
  });
  form.addEventListener('submit', (event) => {
    event.preventDefault();
    ask();
  });
});
