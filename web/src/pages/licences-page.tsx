import { Link } from "react-router-dom";
import monoText from "../../../fonts/atkinson-hyperlegible-mono/LICENSE.txt?raw";
import nextText from "../../../fonts/atkinson-hyperlegible-next/LICENSE.txt?raw";
import symbolsText from "../../../fonts/restband-symbols/LICENSE.txt?raw";
import stixText from "../../../fonts/stix-two-text/LICENSE.txt?raw";
import { Mark } from "../components/mark.tsx";
import { Section, WorkedPage } from "../components/section.tsx";
import { packages } from "../licences.ts";
import { paths } from "../paths.ts";

const fonts = [
  { name: "Atkinson Hyperlegible Next", text: nextText },
  { name: "Atkinson Hyperlegible Mono", text: monoText },
  { name: "STIX Two Text", text: stixText },
  { name: "Restband Symbols, of Noto Sans Math", text: symbolsText },
];

/** What others made that is in here, and on what terms. Open to everybody, signed in or not. */
export function LicencesPage() {
  return (
    <>
      <title>Licences · Restband</title>
      <header className="border-b border-line">
        <div className="page-width flex h-(--header) items-center">
          <Link to={paths.home} className="flex items-center gap-2.5 text-18 font-bold">
            <Mark />
            Restband
          </Link>
        </div>
      </header>
      <WorkedPage>
        <Section name="Licences" help="Each opens to its full text.">
          <h1 className="text-24 font-semibold desk:text-34">What others made that is in here.</h1>
          <p className="mt-3 max-w-(--measure) text-18 text-quiet">
            With thanks, and on the terms each of them sets. Demo data are invented.
          </p>
        </Section>
        <Section name="Fonts">
          {fonts.map(({ name, text }) => (
            <Licence key={name} name={name} terms="OFL-1.1" text={text} />
          ))}
        </Section>
        <Section name="Packages" help="With those they need in turn.">
          {packages.map(({ name, version, licence, text }) => (
            <Licence key={`${name} ${version}`} name={name} version={version} terms={licence} text={text} />
          ))}
        </Section>
      </WorkedPage>
    </>
  );
}

interface LicenceProps {
  name: string;
  version?: string;
  terms: string;
  text: string;
}

function Licence({ name, version, terms, text }: LicenceProps) {
  const line = (
    <>
      <span className="font-semibold">{name}</span>{" "}
      {version && <span className="figures text-13 text-quiet">{version}</span>}{" "}
      <span className="float-right text-13 text-quiet">{terms}</span>
    </>
  );
  if (text === "") return <p className="border-b border-line py-2 pl-[1.1em]">{line}</p>;
  return (
    <details className="border-b border-line">
      <summary className="py-2">{line}</summary>
      <pre className="overflow-x-auto py-3 font-mono text-13 whitespace-pre-wrap">{text}</pre>
    </details>
  );
}
