import { OuterLink, TextLink } from '../../components/text-link';
import { company } from './company';
import { CompanyPage } from './company-page';

export function ReturnsPage() {
  return (
    <CompanyPage
      title="Returns and refunds"
      lead="Fourteen days to change your mind, and longer when something is wrong."
    >
      <h2>You changed your mind</h2>
      <p>
        Tell us within 14 days of the day the goods arrived, at the workshop or at your door. You need give no
        reason. Then send them back within 14 days.
      </p>
      <ul>
        <li>
          We refund the goods and what you paid for standard delivery to you. The way back is at your cost.
        </li>
        <li>
          The refund goes to the card that paid, within 14 days of the goods, or proof that they were sent,
          reaching the shop.
        </li>
        <li>
          Look at a shock as you would in a shop. Marks of fitting or riding beyond that lower its value, and
          the refund by as much.
        </li>
        <li>
          Once air has been let out of, or put into, a shock, say so: the shop checks it before it is sold
          again.
        </li>
      </ul>
      <h2>You booked a fitting</h2>
      <ul>
        <li>Before the workshop has accepted: cancel, and everything is refunded.</li>
        <li>After it has accepted, before the day: parts as above. The fitting is refunded.</li>
        <li>
          If the work was begun at your request within the 14 days, what was done by then is owed in
          proportion. Fitted is fitted: the work cannot be sent back, the parts can while they are as new.
        </li>
        <li>The workshop declined or did not answer: all of it is refunded, if you want no other.</li>
      </ul>
      <h2>It does not fit, or it is faulty</h2>
      <p>
        Do not ride it and do not force it. Write to us with your order’s reference and a photograph. If the
        figures on the fitting sheet were right and it does not fit, you pay nothing: goods, carriage both
        ways and fitting are refunded. A faulty part is repaired, replaced or refunded, as the law gives you
        the choice; this does not end after 14 days.
      </p>
      <h2>How to go about it</h2>
      <ol>
        <li>
          <TextLink to="/find-order">Find your order</TextLink> with its reference and your e-mail address.
        </li>
        <li>
          Write to <OuterLink href={`mailto:${company.email}`}>{company.email}</OuterLink> that you withdraw,
          or what is wrong. A sentence is enough.
        </li>
        <li>
          We answer with the shop’s address. Back the collar right off a coil, leave an air shock at low
          pressure, pack it well.
        </li>
      </ol>
      <p>
        The periods above are those of distance selling in the UK and the EU as we know them from practice;
        where the law gives you more, the law counts.
      </p>
    </CompanyPage>
  );
}
