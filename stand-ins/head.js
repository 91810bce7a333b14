// The router wraps the app in this: screens write the title of the page themselves.
import { Fragment } from 'react';

export const Head = { Provider: Fragment };
