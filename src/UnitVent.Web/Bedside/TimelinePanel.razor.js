// Draws the lanes of the timeline on one time axis with one cursor. The numbers come as plain data; nothing is evaluated.
// ECharts comes as a classic script: its bundle does not work as a module.
let loading = null;
const bundle = () => globalThis.echarts ? Promise.resolve() : loading ??= new Promise((done, failed) => {
  const script = document.createElement("script");
  script.onload = done;
  script.onerror = failed;
  script.src = new URL("../_content/Vizor.ECharts/js/vizor-echarts-bundle-min.js", import.meta.url);
  document.head.append(script);
});

const laneHeight = 130, laneGap = 36, top = 30;
const ink = name => getComputedStyle(document.documentElement).getPropertyValue(`--${name}`).trim();
const plain = text => text.replace(/[&<>"]/g, c => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" })[c]);
const two = number => String(number).padStart(2, "0");
const clock = ms => { const t = new Date(ms); return `${two(t.getUTCHours())}:${two(t.getUTCMinutes())}`; };
const dayName = ms => new Date(ms).toLocaleDateString("en-GB", { timeZone: "UTC", weekday: "short", day: "numeric", month: "short" });

function series(lane, line, index) {
  return {
    name: line.name, type: "line", xAxisIndex: index, yAxisIndex: index, data: line.points, animation: false, connectNulls: false,
    step: line.stepped ? "end" : false, symbol: line.marker, symbolSize: line.stepped ? 0 : 7, showSymbol: !line.stepped, showAllSymbol: true,
    lineStyle: { color: ink(lane.hue), width: line.alone ? 0 : 2, type: line.dash }, itemStyle: { color: ink(lane.hue) }, emphasis: { disabled: true },
  };
}

function marks(lane, data, index) {
  return {
    type: "line", xAxisIndex: index, yAxisIndex: index, data: [], silent: true, animation: false,
    markLine: {
      symbol: "none", animation: false, label: { show: false }, lineStyle: { color: ink("quiet"), type: "dotted", width: 1 },
      data: [...data.marks.map(m => ({ xAxis: m.at })), ...lane.levels.map(level => ({
        yAxis: level, lineStyle: { color: ink("edge"), type: "dashed" }, label: { show: false },
      }))],
    },
  };
}

function says(data) {
  return points => {
    const at = points[0].axisValue;
    const near = data.marks.filter(m => Math.abs(m.at - at) < (data.to - data.from) / 150).map(m => plain(m.text));
    const values = points.filter(p => p.data?.[1] != null).map(p => `${plain(p.seriesName)} <b>${p.data[1]}</b>`);
    return [`${dayName(at)} ${clock(at)}`, ...values, ...near].join("<br>");
  };
}

function option(data) {
  const each = make => data.lanes.map(make);
  return {
    useUTC: true, animation: false, textStyle: { fontFamily: "inherit", color: ink("ink") }, backgroundColor: "transparent",
    axisPointer: { link: [{ xAxisIndex: "all" }], lineStyle: { color: ink("ink") } },
    tooltip: { trigger: "axis", confine: true, formatter: says(data), backgroundColor: ink("surface"), borderColor: ink("edge"), textStyle: { color: ink("ink") } },
    title: each((lane, i) => ({ text: lane.title, left: 0, top: 8 + i * (laneHeight + laneGap), padding: 0, textStyle: { fontSize: 13, fontWeight: 600, color: ink("ink") } })),
    grid: each((_, i) => ({ left: 40, right: 12, top: top + i * (laneHeight + laneGap), height: laneHeight })),
    xAxis: each((_, i) => ({
      type: "time", gridIndex: i, min: data.from, max: data.to, axisLine: { lineStyle: { color: ink("edge") } }, splitLine: { show: false },
      axisLabel: { show: i === data.lanes.length - 1, color: ink("quiet"), hideOverlap: true, formatter: ms => clock(ms) === "00:00" ? dayName(ms) : clock(ms) },
    })),
    yAxis: each((lane, i) => ({
      type: "value", gridIndex: i, min: lane.low, max: lane.high, splitNumber: 3, interval: lane.high === 100 ? 25 : undefined,
      axisLabel: { color: ink("quiet") }, splitLine: { lineStyle: { color: ink("line") } },
    })),
    dataZoom: [{ type: "inside", xAxisIndex: data.lanes.map((_, i) => i), filterMode: "none", zoomOnMouseWheel: "ctrl", moveOnMouseMove: true }],
    series: data.lanes.flatMap((lane, i) => [...lane.lines.map(line => series(lane, line, i)), marks(lane, data, i)]),
  };
}

export async function create(element, first) {
  await bundle();
  let data = first;
  element.style.height = `${top + data.lanes.length * (laneHeight + laneGap)}px`;
  const chart = globalThis.echarts.init(element, null, { renderer: "svg" });
  const draw = () => chart.setOption(option(data), { notMerge: true });
  const resized = new ResizeObserver(() => chart.resize());
  const looked = new MutationObserver(draw);
  resized.observe(element);
  looked.observe(document.documentElement, { attributeFilter: ["data-look"] });
  draw();
  return {
    set(next) { data = next; draw(); },
    dispose() { resized.disconnect(); looked.disconnect(); chart.dispose(); },
  };
}
