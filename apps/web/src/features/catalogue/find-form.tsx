import { findSizeKey } from '@linkfell/fit-engine';
import { chakra } from '@chakra-ui/react';
import { useState, type SyntheticEvent } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button';
import { Field } from '../../components/forms/field';
import { TextInput } from '../../components/forms/text-input';

/** Leads to the size that was typed, however it is written, or else to the names that hold every word. */
export function FindForm({ start = '' }: { start?: string }) {
  const [text, setText] = useState(start);
  const navigate = useNavigate();
  const find = (event: SyntheticEvent) => {
    event.preventDefault();
    const size = findSizeKey(text);
    if (size) void navigate(`/shocks/sizes/${size}`);
    else void navigate(text.trim() === '' ? '/shocks' : `/shocks?q=${encodeURIComponent(text.trim())}`);
  };
  return (
    <chakra.form role="search" onSubmit={find} maxWidth="form" marginTop="6">
      <chakra.div display="flex" gap="3" alignItems="end">
        <chakra.div flex="1" minWidth="0">
          <Field
            id="find"
            label="Size or name"
            hint="Such as 210x55, 7.875 x 2.25 in inches, or a maker’s name"
          >
            {(control) => (
              <TextInput
                {...control}
                name="q"
                autoComplete="off"
                enterKeyHint="search"
                value={text}
                onChange={(event) => setText(event.target.value)}
              />
            )}
          </Field>
        </chakra.div>
        <Button type="submit" marginBottom="6">
          Find
        </Button>
      </chakra.div>
    </chakra.form>
  );
}
