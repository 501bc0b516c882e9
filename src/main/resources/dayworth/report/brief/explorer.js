(function () {
  "use strict";
  var SVG = "http://www.w3.org/2000/svg";
  var TOP = 62, PITCH = 87, BOX = 60, BEFORE = 7, AFTER = 3, NOTCHES = 8;
  var data = JSON.parse(document.getElementById("states").textContent);
  var states = data.states, net = data.net, LEFT = net.left, chosen = data.chosen, now = chosen;
  var root = document.documentElement;
  var $ = function (id) { return document.getElementById(id); };
  var slider = $("finish"), marks = document.querySelectorAll(".mark");
  var moneyIds = Array.prototype.map.call(
      document.querySelectorAll(".addup dd"), function (cell) { return cell.id; });

  function show(k, keep) {
    var s = states[k];
    now = k;
    slider.value = place(s);
    slider.setAttribute("aria-valuetext", s.aria);
    $("now-d").textContent = s.now;
    $("now-f").textContent = s.on;
    $("try-h").textContent = s.head;
    $("say").textContent = s.say;
    moneyIds.forEach(function (id, i) { $(id).textContent = s.money[i]; });
    picks(s);
    marks.forEach(function (mark) {
      var x = +mark.getAttribute("data-x") + s.f * +mark.getAttribute("data-w");
      mark.setAttribute("transform", "translate(" + x.toFixed(1) + " 0)");
    });
    $("later").disabled = k === 0;
    $("sooner").disabled = k === states.length - 1;
    later(function () { draw(k); });
    if (keep) {
      try { history.replaceState(null, "", "#finish=" + s.t); } catch (e) { return; }
    }
  }

  // The network is redrawn once a frame, however fast the slider moves.
  var waiting = null;
  function later(work) {
    if (waiting === null) {
      requestAnimationFrame(function () { var w = waiting; waiting = null; w(); });
    }
    waiting = work;
  }

  function place(s) { return Math.round(s.f * slider.max); }

  function picks(s) {
    var list = $("picks");
    list.textContent = "";
    s.picks.forEach(function (pick) {
      var item = document.createElement("li");
      add(item, "b", "", data.acts[pick[0]][0]);
      add(item, "span", "", data.acts[pick[0]][1]);
      var tally = add(item, "span", "", "");
      if (pick[1] > 0) {
        var boxes = add(tally, "span", "tally", "");
        boxes.setAttribute("aria-hidden", "true");
        for (var i = 0; i < pick[1]; i++) { add(boxes, "i", pick[2] ? "g" : "", ""); }
        tally.appendChild(document.createTextNode(" "));
      }
      tally.appendChild(document.createTextNode(pick[3]));
      add(item, "span", "m", pick[4]);
      list.appendChild(item);
    });
    if (s.rest) { add(list, "li", "rest", s.rest); }
  }

  function add(to, tag, style, text) {
    var one = document.createElement(tag);
    if (style) { one.className = style; }
    if (text) { one.textContent = text; }
    to.appendChild(one);
    return one;
  }

  // The network: the same rules as those of the picture that is written into the page.

  var pen = document.createElement("canvas").getContext("2d");
  var widths = {};
  pen.fontKerning = "none";
  // Figures are all equally wide on the page, which a canvas cannot be told.
  function width(text, weight, size) {
    var key = weight + text;
    if (!(key in widths)) {
      var letters = text.replace(/[0-9]/g, "");
      pen.font = weight + ' 100px "Dayworth Label"';
      widths[key] = pen.measureText(letters).width / 100 +
          (text.length - letters.length) * net.digit;
    }
    return widths[key] * size;
  }

  function figure(ticks) {
    var parts = String(Math.abs(ticks) / data.perUnit).split(".");
    parts[0] = parts[0].replace(/\B(?=(\d{3})+$)/g, ",");
    return (ticks < 0 ? "\u2212" : "") + parts.join(".");
  }

  function ruler(s) {
    var times = { 0: 1 }, ends = {};
    times[s.end] = 1;
    net.boxes.forEach(function (box, b) {
      var end = s.s[b] + s.d[b];
      times[s.s[b]] = 1;
      times[end] = 1;
      if (s.d[b] > 0) { (ends[end] = ends[end] || []).push(b); }
    });
    var all = Object.keys(times).map(Number).sort(function (a, b) { return a - b; });
    var at = {}, x = 0;
    all.forEach(function (time, k) {
      if (k > 0) { x += Math.max(2, (time - all[k - 1]) * net.perTick); }
      (ends[time] || []).forEach(function (b) {
        x = Math.max(x, at[s.s[b]] + net.boxes[b][2]);
      });
      at[time] = x;
    });
    return function (time) {
      if (time in at) { return LEFT + at[time]; }
      var last = all[all.length - 1];
      if (time > last) { return LEFT + at[last] + (time - last) * net.perTick; }
      if (time < all[0]) { return LEFT + (time - all[0]) * net.perTick; }
      var k = 1;
      while (all[k] < time) { k++; }
      var from = all[k - 1], to = all[k];
      return LEFT + at[from] + (at[to] - at[from]) * (time - from) / (to - from);
    };
  }

  function el(to, tag, style, attributes, text) {
    var one = document.createElementNS(SVG, tag);
    Object.keys(attributes).forEach(function (name) { one.setAttribute(name, attributes[name]); });
    if (style) { one.setAttribute("class", style); }
    if (text !== undefined) { one.textContent = text; }
    to.appendChild(one);
    return one;
  }

  function n(x) { return Math.round(x * 10) / 10 || 0; }

  function draw(k) {
    var old = $("net-moving");
    if (!old) { return; }
    var g = document.createElementNS(SVG, "g");
    g.id = "net-moving";
    var s = states[k], at = ruler(s), boxes = net.boxes.map(function (box, b) {
      var left = at(s.s[b]) + BEFORE;
      var right = Math.max(left + 8, at(s.s[b] + s.d[b]) - AFTER);
      return { b: b, left: left, right: right, lane: box[1], top: TOP + box[1] * PITCH,
        middle: TOP + box[1] * PITCH + BOX / 2, critical: s.e[b] === s.l[b] };
    });
    axis(g, s, at);
    boxes.forEach(function (box) { spare(g, s, at, boxes, box); });
    rest(g, s, at);
    net.links.forEach(function (link) { route(g, s, boxes, link); });
    boxes.forEach(function (box) { paint(g, s, k, box); });
    old.parentNode.replaceChild(g, old);
  }

  function text(g, style, anchor, x, y, words) {
    var attributes = { x: n(x), y: n(y) };
    if (anchor !== "start") { attributes["text-anchor"] = anchor; }
    if (words) { el(g, "text", style, attributes, words); }
  }

  function rect(g, style, x, y, w, h) {
    if (w > 0 && h > 0) { el(g, "rect", style, { x: n(x), y: n(y), width: n(w), height: n(h) }); }
  }

  function line(g, style, x1, y1, x2, y2) {
    el(g, "line", style, { x1: n(x1), y1: n(y1), x2: n(x2), y2: n(y2) });
  }

  function hatch(g, x, y, w, h) {
    var path = "";
    for (var c = Math.ceil((x - y - h) / 7) * 7; c <= x - y + w; c += 7) {
      var from = Math.max(x, c + y), to = Math.min(x + w, c + y + h);
      if (to - from > 0.4) {
        path += "M" + n(from) + " " + n(from - c) + "L" + n(to) + " " + n(to - c);
      }
    }
    if (path) { el(g, "path", "k-fl", { d: path }); }
  }

  function axis(g, s, at) {
    var bottom = net.height - 34, free = -Infinity, end = at(s.end);
    net.ticks.forEach(function (tick) {
      var x = at(tick[0]);
      if (tick[0] > s.end || x < free) { return; }
      free = x + 46;
      line(g, "g", x, 34, x, bottom);
      if (end - x > 46 || tick[0] === 0) { text(g, "a q", "start", x + 4, 42, tick[1]); }
      if (end - x > 24 || tick[0] === s.end) {
        text(g, "a", "middle", x, bottom + 13, figure(tick[0]));
      }
    });
    if (net.due >= 0 && at(net.due) <= net.width - 2) {
      line(g, "con", at(net.due), 31, at(net.due), bottom);
      text(g, "", "end", at(net.due) + 4, 26, net.dueLabel);
    }
    line(g, "fin", end, 31, end, bottom);
    text(g, "b plum", "end", end + 6, bottom + 30, s.fin);
  }

  function spare(g, s, at, boxes, box) {
    if (s.l[box.b] <= s.e[box.b]) { return; }
    var to = Math.min(at(s.l[box.b] + s.d[box.b]), at(s.end)) - AFTER;
    boxes.forEach(function (other) {
      if (other.lane === box.lane && other.left > box.right - 1) {
        to = Math.min(to, other.left - 4);
      }
    });
    if (to - box.right > 3) { hatch(g, box.right, box.top + 6, to - box.right, 48); }
  }

  function rest(g, s, at) {
    var y = net.bottom + 6;
    net.rest.forEach(function (label, i) {
      var span = s.r[i], left = at(span[0]) + BEFORE;
      var right = Math.max(left + 8, at(span[1]) - AFTER);
      hatch(g, left, y, right - left, 24);
      rect(g, "cell", left, y, right - left, 24);
      rect(g, "plate", left + 6, y + 4, width(label + span[2], 500, 13) + 10, 16);
      text(g, "", "start", left + 11, y + 16.5, label + span[2]);
      y += 34;
    });
  }

  function arrow(x, y, way) {
    return "M" + n(x - way * 6) + " " + n(y - 3.4) + "L" + n(x) + " " + n(y) +
        "L" + n(x - way * 6) + " " + n(y + 3.4);
  }

  function route(g, s, boxes, link) {
    var a = boxes[link[0]], b = boxes[link[1]], kind = link[2], path;
    var between = b.middle + (a.lane < b.lane ? -1 : 1) * (BOX / 2 + 16), bx, end, run = null;
    function free(lane, from, to) {
      return !boxes.some(function (box) {
        return box.lane === lane && box.left < to - 0.5 && box.right > from + 0.5;
      });
    }
    if (kind === "FS") {
      bx = b.left;
      end = "H" + n(bx) + arrow(bx, b.middle, 1);
      var before = bx - BEFORE, after = a.right + AFTER;
      path = "M" + n(a.right) + " " + n(a.middle);
      if (a.lane === b.lane && free(a.lane, a.right, bx)) {
        path += end;
        run = [a.right, bx - 6, a.middle];
      } else if (a.lane !== b.lane && free(a.lane, a.right, before)) {
        run = [a.right, before, a.middle];
        path += "H" + n(before) + "V" + n(b.middle) + end;
      } else if (a.lane !== b.lane && free(b.lane, after, bx)) {
        run = [after, bx - 6, b.middle];
        path += "H" + n(after) + "V" + n(b.middle) + end;
      } else {
        path += "H" + n(after) + "V" + n(between) + "H" + n(before) + "V" + n(b.middle) + end;
      }
    } else if (kind === "SS") {
      bx = b.left;
      var down = Math.min(a.left + 9, bx - 5);
      end = "V" + n(b.middle) + "H" + n(bx) + arrow(bx, b.middle, 1);
      path = down < a.left
        ? "M" + n(a.left) + " " + n(a.middle) + "H" + n(down) + end
        : "M" + n(down) + " " + n(a.middle + (b.lane < a.lane ? -BOX : BOX) / 2) + end;
      if (down >= a.left && free(b.lane, down, bx)) { run = [down, bx - 6, b.middle]; }
    } else if (kind === "FF") {
      bx = b.right;
      path = "M" + n(a.right) + " " + n(a.middle) + "H" + n(Math.max(a.right, bx) + 6) +
          "V" + n(b.middle) + "H" + n(bx) + arrow(bx, b.middle, -1);
    } else {
      bx = b.right;
      path = "M" + n(a.left) + " " + n(a.middle) + "H" + n(a.left - 4) + "V" + n(between) +
          "H" + n(bx + 6) + "V" + n(b.middle) + "H" + n(bx) + arrow(bx, b.middle, -1);
    }
    var fromEnd = kind === "FS" || kind === "FF", toEnd = kind === "FF" || kind === "SF";
    var from = s.e[a.b] + (fromEnd ? s.d[a.b] : 0), to = s.e[b.b] + (toEnd ? s.d[b.b] : 0);
    var critical = a.critical && b.critical && to - from === link[3];
    var lag = kind !== "FS" || link[3] !== 0 ? " lag" : "";
    el(g, "path", "lk" + (critical ? " lkc" : "") + lag, { d: path });
    if (link[4] && run && run[1] - run[0] >= width(link[4], 500, 12) + 8) {
      text(g, "a", "middle", (run[0] + run[1]) / 2, run[2] - 4, link[4]);
    }
  }

  function paint(g, s, k, box) {
    var b = box.b, x = box.left, y = box.top, w = box.right - box.left, d = s.d[b];
    var id = net.boxes[b][4];
    if (d === 0) {
      el(g, "path", box.critical ? "ms msc" : "ms",
          { d: "M" + n(x + 4) + " " + n(y + BOX / 2 - 9) + "l7 9l-7 9l-7 -9z" });
      text(g, "a b", "middle", x + 4, y + 13.5, id);
      text(g, "a", "middle", x + 4, y + 53.5, figure(s.e[b]));
      return;
    }
    rect(g, box.critical ? "bx bxc" : "bx", x, y, w, BOX);
    if (box.critical) {
      rect(g, "cr", x, y, w, 3);
      rect(g, "cr", x, y + BOX - 3, w, 3);
    }
    text(g, "a", "start", x + 4, y + 13.5, figure(s.e[b]));
    text(g, "a", "end", x + w - 4, y + 13.5, figure(s.e[b] + d));
    text(g, "a", "start", x + 4, y + 53.5, figure(s.l[b]));
    text(g, "a", "end", x + w - 4, y + 53.5, figure(s.l[b] + d));
    text(g, "a b", "middle", x + w / 2, y + 13.5, id);
    var spare = figure(s.l[b] - s.e[b]);
    var room = w - 20 - width(figure(s.l[b]), 500, 12) - width(figure(s.l[b] + d), 500, 12);
    text(g, "a", "middle", x + w / 2, y + 53.5,
        width("float " + spare, 500, 12) <= room ? "float " + spare : spare);
    var lines = wrap(data.acts[net.boxes[b][0]][1], w - 8);
    lines.forEach(function (words, i) {
      text(g, "nm", "middle", x + w / 2, y + (lines.length === 1 ? 34 : 27.5) + i * 12.5, words);
    });
    notches(g, k, box, y + BOX);
  }

  function fit(words, room) {
    if (width(words, 500, 12) <= room) { return words; }
    var letters = Array.from(words);
    while (letters.length && width(letters.join("").trim() + "\u2026", 500, 12) > room) {
      letters.pop();
    }
    return letters.length ? letters.join("").trim() + "\u2026" : "";
  }

  function wrap(words, room) {
    var lines = [], current = "";
    words.split(" ").forEach(function (word) {
      var longer = current ? current + " " + word : word;
      if (!current || width(longer, 500, 12) <= room || lines.length === 1) {
        current = longer;
      } else {
        lines.push(fit(current, room));
        current = word;
      }
    });
    lines.push(fit(current, room));
    return lines;
  }

  function notches(g, k, box, y) {
    var b = box.b, normal = net.boxes[b][3], most = 0;
    var bought = normal - states[k].d[b];
    for (var i = 0; i < k; i++) { most = Math.max(most, normal - states[i].d[b]); }
    var back = Math.max(0, most - bought);
    if (!bought && !back) { return; }
    var full = Math.min(NOTCHES, Math.ceil(bought / data.perUnit));
    var hollow = Math.min(NOTCHES - full, Math.ceil(back / data.perUnit));
    var x = box.right - 1;
    for (i = 0; i < full + hollow && x - 6 > box.left; i++) {
      rect(g, i < full ? "notch" : "notcho", x - 3.6, y - 1, 3.6, 9);
      x -= 6;
    }
    var long = bought ? figure(bought) + " bought" : figure(back) + " given back";
    [long, figure(bought || back)].some(function (words) {
      if (x - 3 - width(words, 500, 12) < box.left - 2) { return false; }
      text(g, bought ? "a och" : "a teal", "end", x - 3, y + 9.5, words);
      return true;
    });
  }

  function nearest(value) {
    var best = 0;
    states.forEach(function (s, k) {
      if (Math.abs(place(s) - value) < Math.abs(place(states[best]) - value)) { best = k; }
    });
    return best;
  }

  function to(k) { show(Math.max(0, Math.min(states.length - 1, k)), true); }

  function address() {
    var found = /^#finish=([\d.]+)$/.exec(location.hash);
    states.forEach(function (s, k) { if (found && s.t === found[1]) { show(k, false); } });
  }

  root.classList.add("js");
  slider.addEventListener("input", function () { to(nearest(+slider.value)); });
  slider.addEventListener("keydown", function (event) {
    var steps = { ArrowRight: 1, ArrowUp: 1, ArrowLeft: -1, ArrowDown: -1, PageUp: 5, PageDown: -5 };
    if (event.key in steps) { event.preventDefault(); to(now + steps[event.key]); }
    if (event.key === "Home") { event.preventDefault(); to(0); }
    if (event.key === "End") { event.preventDefault(); to(states.length - 1); }
  });
  $("later").addEventListener("click", function () { to(now - 1); });
  $("sooner").addEventListener("click", function () { to(now + 1); });
  window.addEventListener("hashchange", address);
  $("later").disabled = chosen === 0;
  $("sooner").disabled = chosen === states.length - 1;
  address();
})();
