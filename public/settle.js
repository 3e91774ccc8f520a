// Marks the reader's choice of units and theme on <html> before anything is painted, and remembers a change of either.
(function () {
  var CHOICES = { units: ['si', 'us'], theme: ['system', 'light', 'dark'] };
  var root = document.documentElement;

  function remembered(name) {
    var kept = null;
    try {
      kept = localStorage.getItem('fumelore.' + name);
    } catch {
      // Storage may be forbidden; the choice then lasts for the page.
    }
    return CHOICES[name].indexOf(kept) < 0 ? root.dataset[name] || CHOICES[name][0] : kept;
  }

  function settle() {
    Object.keys(CHOICES).forEach(function (name) {
      var value = remembered(name);
      var radio = document.getElementById(name + '-' + value);
      root.dataset[name] = value;
      if (radio) radio.checked = true;
    });
  }

  function remember(event) {
    var parts = String(event.target.id).split('-');
    if (!CHOICES[parts[0]] || CHOICES[parts[0]].indexOf(parts[1]) < 0 || parts.length !== 2) return;
    root.dataset[parts[0]] = parts[1];
    try {
      localStorage.setItem('fumelore.' + parts[0], parts[1]);
    } catch {
      // As above.
    }
  }

  settle();
  document.addEventListener('change', remember);
  document.addEventListener('DOMContentLoaded', settle);
  window.addEventListener('pageshow', settle);
  window.addEventListener('storage', settle);
})();
