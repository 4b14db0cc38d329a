import { chooseTheme, themeChoices, useThemeChoice } from '../theme/theme-choice.ts'
import './foot.css'

const words = { device: 'As the device', light: 'Light', dark: 'Dark' }

export function Foot() {
  return (
    <footer className="foot">
      <div className="foot-inside">
        <p>
          What is computed here is a check on your own work, not a permit. Local codes, the makers’ data and your site’s
          rules come first; mains wiring, grid connection and taking water need licensed people and the licence itself.
        </p>
        <ThemeSwitch />
      </div>
    </footer>
  )
}

/** Plain radio buttons: they stand on every page, and need no script of a library. */
function ThemeSwitch() {
  const chosen = useThemeChoice()
  return (
    <fieldset className="theme-switch">
      <legend>Light and dark</legend>
      {themeChoices.map((choice) => (
        <label key={choice}>
          <input type="radio" name="theme" checked={choice === chosen} onChange={() => chooseTheme(choice)} />
          {words[choice]}
        </label>
      ))}
    </fieldset>
  )
}
