import { SegmentedControl } from '@radix-ui/themes'
import { chooseTheme, themeChoices, useThemeChoice } from '../theme/theme-choice.ts'
import './foot.css'

const words = { device: 'As the device', light: 'Light', dark: 'Dark' }

export function Foot() {
  const choice = useThemeChoice()
  return (
    <footer className="foot">
      <div className="foot-inside">
        <p>
          What is computed here is a check on your own work, not a permit. Local codes, the makers’ data and your site’s
          rules come first; mains wiring, grid connection and taking water need licensed people and the licence itself.
        </p>
        <div>
          <p id="theme-choice-label">Light and dark</p>
          <SegmentedControl.Root
            size="3"
            value={choice}
            onValueChange={chooseTheme}
            aria-labelledby="theme-choice-label"
          >
            {themeChoices.map((value) => (
              <SegmentedControl.Item key={value} value={value}>
                {words[value]}
              </SegmentedControl.Item>
            ))}
          </SegmentedControl.Root>
        </div>
      </div>
    </footer>
  )
}
