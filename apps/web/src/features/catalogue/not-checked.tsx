import { Notice } from '../../components/notice';
import { TextLink } from '../../components/text-link';

/** Said on every page of the storefront, before anything else on it can be taken for an answer. */
export function NotChecked() {
  return (
    <Notice tone="heather" title="Not checked for your bike">
      <p>
        A size that looks right is not yet a shock that fits: mounts, hardware, room and spring count too.{' '}
        <TextLink to="/measure-up">Measure up your bike</TextLink> and we check each of these, figure by
        figure.
      </p>
    </Notice>
  );
}
