import { useQuery } from "@tanstack/react-query";
import type { ComponentProps } from "react";
import { Link } from "react-router-dom";
import { noticesQuery } from "../../api/notices.ts";
import { useAccount, useSignOut } from "../../api/session.ts";
import { announce } from "../../components/status.tsx";
import { menuItemClass } from "../../components/menu.tsx";
import { PageHeader } from "../../components/page-header.tsx";
import { chooseTheme, chosenTheme, useTheme } from "../../components/theme.ts";
import { sayMany } from "../../format/words.ts";
import { paths } from "../../paths.ts";
import { UnitsChoice } from "./units-choice.tsx";

/** The page header of everybody who is signed in, with their own menu at its end. */
export function WorkHeader(props: Omit<ComponentProps<typeof PageHeader>, "home" | "person">) {
  const { name } = useAccount();
  const { data: notices } = useQuery(noticesQuery);
  const waiting = notices?.length ?? 0;
  return (
    <PageHeader home={paths.projects} {...props} person={{ name, waiting, items: <PersonItems waiting={waiting} /> }} />
  );
}

function PersonItems({ waiting }: { waiting: number }) {
  const { name, email } = useAccount();
  const signOut = useSignOut();
  // Read again with each change of theme: whether there is a choice to take back.
  useTheme();
  const leave = async () => {
    try {
      await signOut.mutateAsync();
      // A whole new page: nothing of this person stays in memory.
      window.location.assign(paths.signIn());
    } catch {
      announce("You are still signed in: the server does not answer.");
    }
  };
  return (
    <>
      <p className="px-2.5 py-1.5 leading-snug">
        <span className="block font-bold">{name}</span>
        <span className="text-13 text-quiet">{email}</span>
      </p>
      <div className="px-2.5 py-1">
        <UnitsChoice />
      </div>
      <Link to={paths.projects} className={menuItemClass}>
        All projects{waiting > 0 && `, ${sayMany(waiting, "thing waits", "things wait")} for you`}
      </Link>
      {chosenTheme() && (
        <button type="button" className={menuItemClass} onClick={() => chooseTheme(null)}>
          Light or dark as the system has it
        </button>
      )}
      <Link to={paths.licences} className={menuItemClass}>
        Licences
      </Link>
      <button type="button" className={menuItemClass} onClick={leave}>
        Sign out
      </button>
    </>
  );
}
