import { rm, writeFile } from 'node:fs/promises';
import sharp from 'sharp';
import { lendTo, newPerson, newVisitor, startIntake } from './support/api';
import { doubtfulHouse } from './support/homes';
import { linkIn, waitForMail } from './support/mailbox';
import { addUp, readAmount } from './support/money';
import { fakePicture, hugePicture, phonePhoto } from './support/pictures';
import { expect, expectAccessible, listen, test } from './support/test';
import { wizardOn } from './support/wizard';

test.describe('a homeowner on a phone', () => {
  test('goes from the landing page through seven steps to a price, finishing later on another device', async ({ page, browser }) => {
    test.setTimeout(180_000);
    const wizard = wizardOn(page);

    await test.step('landing', async () => {
      await page.goto('/');
      await expect(page.getByText('before you answer')).toBeVisible();
      await expectAccessible(page);
      await page.getByRole('main').getByRole('link', { name: 'Start with your home' }).click();
    });

    await test.step('1 home', async () => {
      await wizard.see('Where is the home?');
      await expectAccessible(page);
      await page.getByRole('textbox', { name: 'ZIP code' }).fill('00017');
      await expect(page.getByText('Harrow Bend. We work there.')).toBeVisible();
      await wizard.next('Next: kind of home');
      await wizard.see('What kind of home is it?');
      await expectAccessible(page);
      await wizard.pick('Kind of home', 'House');
      await wizard.pick('Do you own it?', 'I own it');
      await wizard.pick('Where does the car stand?', 'Attached garage');
      await wizard.next('Next: age and size');
      await wizard.pick('Roughly when was it built?', '1990 to 2009');
      await wizard.type('How big is the living space?', '1900');
      await wizard.next('Next: car');
    });

    await test.step('2 car', async () => {
      await wizard.see('How fast can your car take power at home?');
      await wizard.pick('Highest charging rate', '48 A');
      await wizard.pick('What size of car?', 'Mid-size');
      await wizard.next('Next: usual day');
      await wizard.type('Miles on a usual day', '40');
      await wizard.type('Hours it stands at home overnight', '10');
      await wizard.pick('A second electric car within some years?', 'Not sure');
      await expect(page.getByText('Fine. We show what room there is.')).toBeVisible();
      await expectAccessible(page);
      await wizard.next('Next: charger');
      await wizard.pick('Do you have a charger?', 'No, bring one');
      await wizard.next('Next: panel');
    });

    await test.step('3 panel: the cautions come first, "Not sure" goes on, the range stands in the dock', async () => {
      await wizard.see('What number is on your main breaker?');
      await expect(page.getByText('Never remove the metal cover of the panel.')).toBeVisible();
      const dock = page.getByRole('region', { name: 'Price and next step' });
      await expect(dock.getByText(/^\$[\d,]+\s–\s\$[\d,]+$/)).toBeVisible();
      await wizard.pick('Main breaker', 'Not sure');
      await expect(page.getByText('Fine. A photo of the label will tell us.')).toBeVisible();
      await expectAccessible(page);
      await wizard.next('Next: blank spaces');
    });

    await test.step('finish later: a link by mail opens the same answers on another device', async () => {
      const { email } = newPerson('Maren', 'Oakes');
      await page.getByRole('button', { name: 'Finish later' }).click();
      const dialogue = page.getByRole('dialog', { name: 'Finish later?' });
      await expect(dialogue).toBeVisible();
      await expectAccessible(page);
      await dialogue.getByRole('textbox', { name: 'E-mail' }).fill(email);
      await dialogue.getByRole('button', { name: 'Send me the link' }).click();
      await expect(page.getByRole('dialog', { name: 'Your link is on its way' })).toContainText('@example.com');
      await page.getByRole('button', { name: 'Go on here' }).click();

      const link = linkIn(await waitForMail(email, /finish later/i), '/resume/');
      const device = await browser.newContext({ viewport: { width: 1440, height: 900 } });
      const other = await device.newPage();
      const complaints = listen(other);
      await other.goto(link);
      await expect(other).toHaveURL(/\/quote\/panel/);
      await expect(other.getByRole('heading', { level: 1, name: 'What number is on your main breaker?' })).toBeVisible();
      await expect(other.getByRole('radiogroup', { name: 'Main breaker' }).getByRole('radio', { name: 'Not sure' })).toBeChecked();
      await other.goto('/quote/car');
      await expect(other.getByRole('spinbutton', { name: 'Miles on a usual day' })).toHaveValue(/^40/);
      await expectAccessible(other);
      expect(complaints.errors).toEqual([]);
      await device.close();
    });

    await test.step('reload, Back and a second tab lose nothing', async () => {
      await wizard.see('How many blank spaces, one above another?');
      await wizard.pick('Blank spaces', 'Two or more');
      await page.reload();
      await expect(page.getByRole('radiogroup', { name: 'Blank spaces' }).getByRole('radio', { name: 'Two or more' })).toBeChecked();
      await page.goBack();
      await expect(page.getByRole('radiogroup', { name: 'Main breaker' }).getByRole('radio', { name: 'Not sure' })).toBeChecked();
      await page.goForward();
      const tab = await page.context().newPage();
      await tab.goto('/quote/panel?part=odd');
      const inTab = wizardOn(tab);
      await inTab.tick('What do you see or hear?', 'Nothing odd');
      await inTab.next('Next: where it is');
      await inTab.pick('The panel is', 'On a garage wall');
      await inTab.pick('Is it in the wall or on it?', 'A box on the wall');
      await inTab.next('Next: power lines');
      await expect(tab.getByRole('radiogroup', { name: 'The power lines come' })).toBeVisible();
      // The first tab reads what is kept by then; on a busy machine that is a moment later.
      await expect.poll(async () => ((await (await page.request.get('/api/intakes/current')).json()) as { answers: Record<string, unknown> }).answers.panelMount).toBe('surface');
      await tab.close();
      // Without a screen no tab is ever hidden; the browser's word on coming back has to be given for it.
      await page.evaluate(() => { document.dispatchEvent(new Event('visibilitychange', { bubbles: true })); });
      await wizard.next('Next: condition');
      await expect(page.getByRole('checkbox', { name: 'Nothing odd' })).toBeChecked();
      await wizard.next('Next: where it is');
      await expect(page.getByRole('radiogroup', { name: 'The panel is' }).getByRole('radio', { name: 'On a garage wall' })).toBeChecked();
      await wizard.next('Next: power lines');
      await wizard.pick('The power lines come', 'Through the air');
      await wizard.pick('Do solar panels feed this panel?', 'No');
      await wizard.next('Next: big loads');
    });

    await test.step('4 big loads', async () => {
      await wizard.see('Which of these run on electricity?');
      await wizard.turnOn('Range, oven');
      await wizard.turnOn('Clothes dryer');
      await wizard.turnOn('Central air');
      await wizard.type('Central air, size', '3');
      await expect(page.getByRole('checkbox', { name: 'Central air. 3 tons' })).toBeChecked();
      await expectAccessible(page);
      await wizard.next('Next: garage');
    });

    await test.step('5 garage: the plan is drawn from the measures', async () => {
      await wizard.see('How big is the garage?');
      await wizard.type('Width, left to right', '20');
      await wizard.type('Depth, door to back', '22');
      await wizard.type('Ceiling height', '9');
      await wizard.type('Garage door, width', '16');
      await wizard.next('Next: panel');
      await wizard.pick('The panel is on the', 'Left wall');
      await wizard.type('How far along that wall', '6');
      await wizard.next('Next: charger');
      await wizard.pick('On the', 'Left wall');
      await wizard.type('How far along that wall', '14');
      await wizard.next('Next: car');
      await wizard.pick('You park', 'Nose in');
      await wizard.pick('The charge port is at the car’s', 'Front left');
      await expect(page.getByRole('img', { name: /garage/i }).first()).toBeVisible();
      await expect(page.getByText(/^Cable: about \d+ of 18\sft/)).toBeVisible();
      await expectAccessible(page);
      await wizard.next('Next: walls');
      await wizard.pick('The garage walls are mostly', 'Drywall');
      await wizard.pick('Can someone get above the garage ceiling?', 'No');
      await wizard.pick('The door to the house is on the', 'There is none');
      await wizard.pick('Hidden in the wall, or a neat pipe on it?', 'A neat pipe');
      await wizard.pick('Paint the pipe to match the wall?', 'No');
      await wizard.next('Next: photos');
    });

    await test.step('6 photos: a fake and a huge file are refused in words, a real one is kept without its metadata', async () => {
      await wizard.see('Five photos, then your price');
      const place = page.getByRole('group', { name: 'Photo 2: Panel label, close' });
      const choose = async (name: string, bytes: Buffer) => {
        const file = test.info().outputPath(name);
        await writeFile(file, bytes);
        const [chooser] = await Promise.all([page.waitForEvent('filechooser'), place.getByRole('button', { name: /^Choose a file/ }).click()]);
        await chooser.setFiles(file);
      };
      await choose('letter.jpg', fakePicture());
      await expect(place.getByText(/This file is something else/)).toBeVisible();
      await choose('huge.jpg', hugePicture());
      await expect(place.getByText(/too large|25 MB/i).first()).toBeVisible();
      await rm(test.info().outputPath('huge.jpg'));
      await expectAccessible(page);

      const original = await phonePhoto();
      expect((await sharp(original).metadata()).exif, 'the sent picture has metadata').toBeDefined();
      await choose('panel.jpg', original);
      const thumb = place.getByRole('img', { name: 'Panel label, close' }).first();
      await expect(thumb).toBeVisible();
      const intake = await (await page.request.get('/api/intakes/current')).json();
      expect(intake.photos).toHaveLength(1);
      const stored = await page.request.get(intake.photos[0].url);
      const metadata = await sharp(await stored.body()).metadata();
      expect([metadata.format, metadata.width, metadata.height]).toEqual(['jpeg', 1600, 1200]);
      expect([metadata.exif, metadata.xmp, metadata.iptc]).toEqual([undefined, undefined, undefined]);
      await expectAccessible(page);
      await wizard.next('See my price');
    });

    await test.step('7 price: the lines add up to the range', async () => {
      const heading = page.getByRole('heading', { level: 1, name: /^(Your|Firm) price: \$/ });
      await expect(heading).toBeVisible();
      const lines = page.getByRole('list', { name: 'What the price covers' }).getByRole('listitem');
      await expect(lines.first()).toBeVisible();
      const amounts = (await lines.allInnerTexts()).map((words) => readAmount(words));
      expect(amounts.length).toBeGreaterThan(3);
      expect(addUp(amounts)).toEqual(readAmount(await heading.innerText()));
      await page.getByRole('button', { name: /^Why: / }).first().click();
      await expectAccessible(page);
      await page.getByRole('link', { name: 'Check or change your answers' }).click();
      await wizard.see('Check your answers');
      await expect(page.getByRole('link', { name: /Main breaker\s*Not sure/ })).toBeVisible();
      await expectAccessible(page);
    });
  });

  test('has a declined card, pays with another, gets one receipt, and opens the page in it', async ({ page, browser, playwright }) => {
    test.setTimeout(120_000);
    const person = newPerson('Ione', 'Vasari');
    const { email } = person;
    const visitor = await newVisitor(playwright);
    await startIntake(visitor, doubtfulHouse);
    await lendTo(page, visitor);
    await page.goto('/quote/price');
    const price = page.getByRole('heading', { level: 1, name: /price: \$/ });
    await expect(price).toBeVisible();
    const range = await price.innerText();
    await page.getByRole('link', { name: /^Book with \$\d+/ }).click();

    await test.step('an empty form says what is missing and moves the focus there', async () => {
      await expect(page.getByRole('heading', { level: 1, name: 'Where should we come, and who do we ask for?' })).toBeVisible();
      await page.getByRole('button', { name: /^Pay \$\d+ deposit$/ }).click();
      const summary = page.getByRole('alert').filter({ hasText: 'to fix' });
      await expect(summary).toBeFocused();
      await expect(summary).toContainText('Type the name we should ask for');
      await expectAccessible(page);
    });

    await test.step('a double click on pay opens one payment page', async () => {
      await page.getByRole('textbox', { name: 'Your name' }).fill(person.name);
      await page.getByRole('textbox', { name: 'E-mail' }).fill(email);
      await page.getByRole('textbox', { name: 'House number and street' }).fill(person.street);
      await page.getByRole('checkbox', { name: /You may use my details and photos/ }).check();
      let started = 0;
      page.on('request', (request) => { if (request.method() === 'POST' && request.url().endsWith('/current/deposit')) started += 1; });
      await page.getByRole('button', { name: /^Pay \$\d+ deposit$/ }).dblclick();
      await expect(page.getByRole('heading', { level: 1, name: /^Pay \$\d+$/ })).toBeVisible();
      expect(started).toBe(1);
    });

    await test.step('a declined card says so and takes nothing; another one pays, even with a double click', async () => {
      await expectAccessible(page);
      const pay = page.getByRole('button', { name: /^Pay \$\d+$/ });
      await page.getByRole('textbox', { name: 'Card number' }).fill('4000 0000 0000 0002');
      await pay.click();
      await expect(page.getByRole('alert')).toBeVisible();
      await expectAccessible(page);
      await page.getByRole('textbox', { name: 'Card number' }).fill('4242 4242 4242 4242');
      await pay.dblclick({ noWaitAfter: true });
      await expect(page).toHaveURL(/\/quote\/deposit/);
    });

    const jobNumber = await test.step('the confirmation has a job number', async () => {
      await expect(page.getByRole('heading', { level: 1, name: /^Deposit received/ })).toBeVisible({ timeout: 20_000 });
      const order = page.getByRole('list', { name: 'Your order' });
      await expect(order).toContainText(email);
      await expectAccessible(page);
      const number = /Job number\s*(\d{4,})/.exec(await order.innerText())?.[1];
      expect(number).toBeDefined();
      return number;
    });

    await test.step('one receipt came, and its link opens the homeowner’s page on another device', async () => {
      const receipt = await waitForMail(email, /deposit is paid/);
      expect(receipt.subject).toContain(`job ${jobNumber}`);
      expect(receipt.text.replaceAll('\u00a0', ' ')).toContain(range.replaceAll('\u00a0', ' '));
      const device = await browser.newContext();
      const own = await device.newPage();
      const complaints = listen(own);
      await own.goto(linkIn(receipt, '/my/'));
      await expect(own).toHaveURL(/\/my$/);
      await expect(own.getByText(`Job ${jobNumber} · ${person.street}, Harrow Bend`)).toBeVisible();
      await expect(own.getByRole('list', { name: 'Receipt' })).toContainText('Deposit paid');
      await expectAccessible(own);
      expect(complaints.errors).toEqual([]);
      await device.close();
    });
  });
});
