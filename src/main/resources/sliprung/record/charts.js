// Charts answer pointer and keyboard. Written without a less-than sign and without an ampersand, so
// that the page that carries it stays well-formed XML. The page says everything without it.
document.addEventListener("DOMContentLoaded", () => {
  const HINT = "Left and right: read along the axis. Up and down: one line at a time. Escape: all.";
  const NEAR = 14;

  const figure = (value) => {
    const three = Number(value.toPrecision(3));
    const parts = String(Math.abs(three)).split(".");
    parts[0] = parts[0].replace(/\B(?=(\d{3})+$)/g, "\u00a0");
    return (Math.sign(three) === -1 ? "\u2212" : "") + parts.join(".");
  };

  const valueAt = (axis, place) => {
    const share = (place - axis[0]) / (axis[1] - axis[0]);
    return axis[4] === 1
      ? axis[2] * Math.pow(axis[3] / axis[2], share)
      : axis[2] + share * (axis[3] - axis[2]);
  };

  const inUnit = (value, unit) => figure(value) + (unit ? "\u00a0" + unit : "");

  const points = (element) => {
    const numbers = element.tagName === "line"
      ? ["x1", "y1", "x2", "y2"].map((a) => Number(element.getAttribute(a)))
      : ((element.getAttribute("d") || "").match(/-?\d+(\.\d+)?/g) || []).map(Number);
    return numbers.flatMap((x, i) => (i % 2 === 0 ? [[x, numbers[i + 1]]] : []));
  };

  const crossings = (line, x) => {
    const found = [];
    line.points.reduce((a, b) => {
      const inside = (x - a[0]) * (x - b[0]);
      if (0 >= inside) {
        found.push(b[0] === a[0] ? b[1] : a[1] + ((b[1] - a[1]) * (x - a[0])) / (b[0] - a[0]));
      }
      return b;
    });
    return found;
  };

  document.querySelectorAll("figure svg[data-frames]").forEach((svg) => {
    const box = svg.parentElement;
    const frames = JSON.parse(svg.dataset.frames);
    const marked = [...svg.querySelectorAll(".series")];
    const names = [...new Set(marked.map((e) => e.dataset.series))];
    const lines = marked.filter((e) => e.dataset.frame !== undefined).map((e) => ({
      series: e.dataset.series, name: e.dataset.line, frame: Number(e.dataset.frame), points: points(e)
    })).filter((line) => line.points.length > 1);
    const inSight = (frame, y) => (y - frame.y[0]) * (y - frame.y[1]) > 0 ? false : true;
    const reading = document.createElement("p");
    reading.className = "reading";
    reading.setAttribute("role", "status");
    box.after(reading);
    const cursor = document.createElementNS("http://www.w3.org/2000/svg", "path");
    cursor.setAttribute("class", "cursor");
    svg.append(cursor);
    let chosen = -1;
    let at = frames.length > 0 ? (frames[0].x[0] + frames[0].x[1]) / 2 : 0;

    const lift = (name) => {
      svg.classList.toggle("lifted", name !== null);
      marked.forEach((e) => e.classList.toggle("chosen", e.dataset.series === name));
    };

    const draw = () => cursor.setAttribute("d",
      frames.map((f) => "M" + at + " " + f.y[0] + "V" + f.y[1]).join(""));

    const tell = (name, only) => {
      const said = [];
      frames.forEach((frame, index) => {
        lines.filter((l) => l.frame === index).forEach((line) => {
          const wanted = name === null ? only === null || only === index : line.series === name;
          const y = crossings(line, at).filter((p) => inSight(frame, p));
          if (wanted) {
            if (y.length > 0) { said.push(line.name + ": " + inUnit(valueAt(frame.y, y[0]), frame.yu)); }
          }
        });
      });
      const head = frames.length === 0 ? ""
        : frames[0].xn + " " + inUnit(valueAt(frames[0].x, at), frames[0].xu) + " \u00b7 ";
      const body = said.length > 0 ? said.slice(0, 8).join(" \u00b7 ") : name === null ? "" : name;
      reading.textContent = frames.length === 0 ? name || "" : head + body;
    };

    const rowAt = (y) => names.find((name) => {
      const boxes = marked.filter((e) => e.dataset.series === name).map((e) => e.getBBox());
      const top = Math.min(...boxes.map((b) => b.y)) - 8;
      const foot = Math.max(...boxes.map((b) => b.y + b.height)) + 8;
      return y >= top ? foot >= y : false;
    }) || null;

    svg.addEventListener("pointermove", (event) => {
      const place = new DOMPoint(event.clientX, event.clientY).matrixTransform(svg.getScreenCTM().inverse());
      if (frames.length === 0) {
        const row = rowAt(place.y);
        lift(row);
        tell(row, null);
        return;
      }
      const index = frames.findIndex((f) => inSight(f, place.y));
      if (index === -1) { return; }
      const frame = frames[index];
      at = Math.max(frame.x[0], Math.min(frame.x[1], place.x));
      const near = lines.filter((l) => l.frame === index)
        .map((l) => [l, Math.min(...crossings(l, at).map((y) => Math.abs(y - place.y)))])
        .filter((pair) => NEAR >= pair[1]).sort((a, b) => a[1] - b[1])[0];
      draw();
      lift(near ? near[0].series : chosen === -1 ? null : names[chosen]);
      tell(near ? near[0].series : chosen === -1 ? null : names[chosen], index);
    });

    const rest = () => {
      chosen = -1;
      cursor.removeAttribute("d");
      lift(null);
      reading.textContent = "";
    };
    svg.addEventListener("pointerleave", rest);
    box.addEventListener("blur", rest);
    box.addEventListener("focus", () => { reading.textContent = HINT; });

    box.addEventListener("keydown", (event) => {
      const along = { ArrowLeft: -1, ArrowRight: 1 }[event.key] || 0;
      const down = { ArrowUp: -1, ArrowDown: 1 }[event.key] || 0;
      if (event.key === "Escape") { rest(); return; }
      if (along !== 0 ? frames.length === 0 : down === 0) { return; }
      event.preventDefault();
      if (along !== 0) {
        const x = frames[0].x;
        at = Math.max(x[0], Math.min(x[1], at + (along * (x[1] - x[0])) / 100));
      }
      chosen = down === 0 ? chosen : (chosen + 1 + down + names.length + 1) % (names.length + 1) - 1;
      const name = chosen === -1 ? null : names[chosen];
      if (frames.length > 0) { draw(); }
      lift(name);
      tell(name, null);
    });
  });
});
