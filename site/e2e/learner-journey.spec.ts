import { expect, test, type Locator, type Page } from '@playwright/test'
import { signIn, signOut } from './accounts.ts'
import { linkFromMail } from './mail.ts'

/**
 * A newcomer's whole way, with marks worked out here by plain arithmetic from the numbers on the page. Cold stream water and standard
 * gravity, as the lesson says them.
 */
const density = 999.7
const gravity = 9.80665
const wattsOfHorsepower = 745.7

const waterPower = (litresPerSecond: number, head: number) => (density * gravity * litresPerSecond * head) / 1000

const numberIn = (text: string, pattern: RegExp): number => {
  const found = pattern.exec(text)?.[1]
  if (found === undefined) throw new Error(`${pattern.source} is not in: ${text}`)
  return Number(found)
}

const flowIn = (text: string) => numberIn(text, /([\d.]+)\u00a0L\/s/)
const netHeadIn = (text: string) => numberIn(text, /net head(?: will be| of)? ([\d.]+)\u00a0m/)
const shareIn = (text: string) => numberIn(text, /([\d.]+)\u00a0%/) / 100

const question = (page: Page, number: number): Locator =>
  page.getByRole('group', { name: new RegExp(`^Question ${number}\\b`) })

const textOf = async (locator: Locator) => (await locator.innerText()).replace(/\s*\n\s*/g, ' ')

/** Puts the items of an ordering question into this order, by its own buttons. */
const putInOrder = async (group: Locator, order: readonly string[]) => {
  for (const [place, item] of order.entries()) {
    const up = group.getByRole('button', { name: `Move up: ${item}` })
    for (;;) {
      const items = await group.getByRole('listitem').allInnerTexts()
      const at = items.findIndex((text) => text.includes(item))
      if (at === place) break
      await up.click()
    }
  }
}

test('sign up, learn, be marked, and find it kept', async ({ page, request, baseURL }, { project }) => {
  const email = `newcomer-${Date.now()}@leatwright.test`
  const password = 'a leat along the hill'

  // Sign up; what is wrong is said beside its field, and nothing is lost.
  await page.goto('/courses/reading-the-stream')
  await page.getByRole('link', { name: 'Enrol, free' }).click()
  await page.getByLabel('Name', { exact: true }).fill(`Newcomer ${project.name}`)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill('short')
  await page.getByRole('button', { name: 'Sign up' }).click()
  await expect(page.getByText('Use at least ten characters')).toBeVisible()
  await expect(page.getByLabel('E-mail address')).toHaveValue(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign up' }).click()
  await expect(page.getByRole('heading', { name: 'Look in your mail' })).toBeVisible()

  // Confirm by the mail's link, and come back to the course.
  await page.goto(await linkFromMail(request, baseURL!, email))
  await page.getByRole('button', { name: 'Confirm this address' }).click()
  await expect(page).toHaveURL(/\/courses\/reading-the-stream$/)
  await page.getByRole('button', { name: 'Enrol, free' }).click()
  await page.getByRole('link', { name: /^Begin: What a fall of water is worth/ }).click()
  await expect(page.getByRole('heading', { level: 1, name: 'What a fall of water is worth' })).toBeVisible()
  await expect(page.getByRole('img', { name: /0 of 8 lessons done/ })).toBeVisible()

  // One's own numbers, as people write them, and the working with those numbers.
  const own = page.getByRole('group', { name: /^Power/ }).last()
  await own.getByLabel(/^Flow/).fill('6,4 l/s')
  await own.getByLabel(/^Net head/).fill('27.5')
  await own.getByLabel(/^Efficiency/).fill('48')
  const [ownWater, ownOutput] = [waterPower(6.4, 27.5), 0.48 * waterPower(6.4, 27.5)]
  const shows = (text: string) => expect(own.getByText(text).filter({ visible: true }).first()).toBeVisible()
  await shows(`${(ownWater / 1000).toFixed(2)} kW`)
  await shows(`${ownOutput.toFixed(0)} W`)
  await shows('0.0064')
  await shows('27.5')

  // A wrong unit is told beside the field; the text stays.
  await own.getByLabel(/^Net head/).fill('3 bar')
  await expect(own.getByText(/a head is wanted, for example/).first()).toBeVisible()
  await expect(own.getByLabel(/^Net head/)).toHaveValue('3 bar')
  await own.getByLabel(/^Net head/).fill('27.5')

  const marks: number[] = []

  // 1: gross head for net head, a usual mistake.
  const first = await textOf(question(page, 1))
  const grossHead = numberIn(first, /gross head is ([\d.]+)\u00a0m/)
  await question(page, 1)
    .getByRole('textbox', { name: 'Your answer' })
    .fill(`${waterPower(flowIn(first), grossHead).toFixed(1)} W`)
  marks.push(0)

  // 2: right, in horsepower, which is no unit of the list.
  const second = await textOf(question(page, 2))
  const toHouse = shareIn(second) * waterPower(flowIn(second), netHeadIn(second))
  await question(page, 2)
    .getByRole('textbox', { name: 'Your answer' })
    .fill(`${(toHouse / wattsOfHorsepower).toPrecision(4)} hp`)
  marks.push(1)

  // 3: right, with the unit chosen from the list.
  const third = await textOf(question(page, 3))
  const kilowattHours = (shareIn(third) * waterPower(flowIn(third), netHeadIn(third)) * 8760) / 1000
  await question(page, 3).getByRole('textbox', { name: 'Your answer' }).fill(kilowattHours.toPrecision(4))
  await question(page, 3).getByRole('combobox').selectOption('kWh')
  marks.push(1)

  // 4: a wrong flow, and the power that rightly follows from it: carried forward.
  const fourth = await textOf(question(page, 4))
  const drum = numberIn(fourth, /drum of ([\d.]+)\u00a0L/)
  const seconds = numberIn(fourth, /fills in ([\d.]+)\u00a0s/)
  const wrongFlow = Number(((1.3 * drum) / seconds).toPrecision(4))
  const carried = shareIn(fourth) * waterPower(wrongFlow, netHeadIn(fourth))
  await question(page, 4).getByRole('textbox', { name: 'What is the flow?' }).fill(`${wrongFlow} L/s`)
  await question(page, 4)
    .getByRole('textbox', { name: 'How much power reaches the house?' })
    .fill(`${carried.toPrecision(4)} W`)
  marks.push(0 + 1)

  // 5: right.
  await question(page, 5).getByLabel('At the middle of the jet').check()
  marks.push(1)

  // 6: two of three right ones.
  await question(page, 6).getByLabel('The pipe is long and thin').check()
  await question(page, 6).getByLabel('The flow falls by half in summer').check()
  marks.push(2 / 3)

  // 7: right.
  await putInOrder(question(page, 7), [
    'Rubbing along the pipe',
    'The nozzle',
    'The buckets of the runner',
    'The belt to the alternator',
    'The alternator’s windings'.replace('’', "'"),
    'The cable to the house',
  ])
  marks.push(1)

  // 8: two of five changed for each other.
  const match = question(page, 8)
  const choose = async (left: string, right: RegExp) => {
    const list = match.getByLabel(left, { exact: true })
    const option = (await list.locator('option').allInnerTexts()).find((text) => right.test(text))!
    await list.selectOption({ label: option })
  }
  await choose('Gross head', /drop that is left/)
  await choose('Net head', /whole drop/)
  await choose('Flow', /each second/)
  await choose('Residual flow', /stay in the stream/)
  await choose('Efficiency', /share/)
  marks.push(3 / 5)

  // What was written survives a reload.
  await expect(match.getByLabel('Efficiency', { exact: true })).toBeVisible()
  await page
    .waitForResponse((response) => response.url().includes('/answers/') && response.ok(), { timeout: 5000 })
    .catch(() => undefined)
  await page.reload()
  await expect(question(page, 4).getByRole('textbox', { name: 'What is the flow?' })).toHaveValue(
    new RegExp(`^${wrongFlow}`),
  )

  await page.getByRole('button', { name: 'Hand in', exact: true }).click()
  const result = page.getByRole('group', { name: 'Result' })
  const sum = marks.reduce((total, mark) => total + mark, 0)
  const outOf = 9
  await expect(result).toContainText(`${Number(sum.toFixed(2))} of ${outOf} marks`)
  await expect(result).toContainText(`${Math.round((100 * sum) / outOf)}%`)
  await expect(result).toContainText('count as done')
  await expect(result).toBeFocused()

  await expect(page.getByText(/That uses the gross head\. The pipe keeps some of it/)).toBeVisible()
  await expect(page.getByText('✓ Full marks, carried forward')).toHaveCount(1)
  await expect(page.getByText('✗ No marks')).toHaveCount(2)
  await expect(page.getByText('Partly right')).toHaveCount(2)

  // The staff gauge has risen; signed out and in again, it is still there.
  await expect(page.getByRole('img', { name: /1 of 8 lessons done/ })).toBeVisible()
  await signOut(page)
  await signIn(page, email, password)
  await expect(page.getByText('1 of 8 lessons done.')).toBeVisible()
  await page.goto('/courses/reading-the-stream/power')
  await expect(page.getByRole('group', { name: 'Result' })).toContainText(`${Number(sum.toFixed(2))} of ${outOf} marks`)

  // Another round draws other numbers.
  await page.getByRole('button', { name: 'Another round, other numbers' }).click()
  await expect(question(page, 1)).toBeVisible()
  expect(await textOf(question(page, 1))).not.toBe(first)
})
