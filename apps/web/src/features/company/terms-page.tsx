import { TextLink } from '../../components/text-link';
import { company } from './company';
import { CompanyPage } from './company-page';

export function TermsPage() {
  return (
    <CompanyPage title="Terms" lead="Who sells you what, what we promise, and what we cannot promise.">
      <h2>Who you deal with</h2>
      <p>
        {company.name}, {company.street}, {company.town}, {company.district}, {company.postcode}, runs this
        place. Shocks, springs and hardware are sold by the shops named on each line of your plan; fitting is
        done by the workshop that you choose. You pay once, to us; we pay each of them its share when its part
        is done.
      </p>
      <h2>What a verdict means</h2>
      <p>
        We compare the figures of your frame, your present shock and a candidate, and show where each figure
        came from. “Bolts straight in” and “Fits with parts or work” rest on those figures. If one of them is
        wrong because it was measured wrongly, so may be the verdict: the fitting sheet lists them all, please
        read it before you pay.
      </p>
      <p>
        If a shock does not fit although the figures you gave were right, the mistake is ours or the shop’s:
        you get all of your money back, carriage and fitting included.
      </p>
      <h2>Price and payment</h2>
      <ul>
        <li>
          Prices are in pounds, VAT included. Carriage and fitting are shown before you pay, nothing is added
          later.
        </li>
        <li>
          While you pay, the parts and the workshop’s time are held for you. If time runs out they are
          released, your plan stays.
        </li>
        <li>
          The order is made when the payment has arrived. You get a confirmation with a reference by e-mail.
        </li>
      </ul>
      <h2>Fitting</h2>
      <ul>
        <li>Parts for a fitting go straight to the workshop, and only after it has accepted the booking.</li>
        <li>
          If the workshop declines, or has not answered within one of its working days, nothing is sent. You
          choose another workshop, fit it yourself where that is allowed, or take a full refund.
        </li>
        <li>Pressing bushes, fitting travel spacers and work on the damper are done by a workshop only.</li>
        <li>
          The mechanic records serial number, spring or pressure and torques as set. You get them by e-mail.
        </li>
      </ul>
      <h2>Safety</h2>
      <p>
        A shock holds pressurised air or gas, or a spring under load, and a part that fails while you ride can
        hurt you. Before anything on these pages come the makers’ manuals and your local rules.
      </p>
      <ul>
        <li>
          Tighten to the torque printed on the bolt, the frame or in the manual. Where we have no printed
          figure, we show none.
        </li>
        <li>
          Our pressures, springs and settings are starting points. Check that the suspension moves through its
          whole travel without contact.
        </li>
        <li>If you are unsure, have a qualified mechanic do it. Check your frame and shock for recalls.</li>
        <li>Stop riding if something knocks, leaks or comes loose.</li>
        <li>
          A shock that the frame’s maker has not listed may void the frame’s warranty. Offset bushes change
          the geometry; we refuse them unless the maker lists them.
        </li>
      </ul>
      <h2>Your rights</h2>
      <p>
        Nothing here takes away a right that the law gives you. How to change your mind, and what happens when
        something is faulty, is said under <TextLink to="/returns">Returns and refunds</TextLink>.
      </p>
      <p>
        These terms are of 1 December 2026. The law of the place where you live protects you as a consumer.
      </p>
    </CompanyPage>
  );
}
