// Only what is used of Radix: its base tokens, two grays' worth of colour, the components. Our names come last.
import '@radix-ui/themes/tokens/base.css';
import '@radix-ui/themes/tokens/colors/sand.css';
import '@radix-ui/themes/tokens/colors/bronze.css';
import '@radix-ui/themes/components.css';
import '@fontsource/work-sans/latin-400.css';
import '@fontsource/work-sans/latin-500.css';
import '@fontsource/work-sans/latin-600.css';
import '@fontsource/work-sans/latin-ext-400.css';
import '@fontsource/work-sans/latin-ext-500.css';
import '@fontsource/work-sans/latin-ext-600.css';
import './app.css';
