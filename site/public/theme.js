// Runs before the first paint, so that a dark page never flashes light. The switch in the footer keeps its choice under
// the same name and says so by a "themechoice" event.
;(function () {
  var device = window.matchMedia('(prefers-color-scheme: dark)')
  function chosen() {
    try {
      return localStorage.getItem('theme')
    } catch {
      return null
    }
  }
  function apply() {
    var choice = chosen()
    var dark = choice === 'dark' || (choice !== 'light' && device.matches)
    document.documentElement.classList.toggle('dark', dark)
    document.documentElement.classList.toggle('light', !dark)
  }
  apply()
  device.addEventListener('change', apply)
  window.addEventListener('themechoice', apply)
  window.addEventListener('storage', apply)
})()
