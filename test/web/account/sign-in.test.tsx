import { screen, waitFor, within } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { fakeServer, ines, members, ok, project, refuse, session, type Answers } from "../support/fake-server.ts";
import { openPage } from "../support/open-page.tsx";

vi.setConfig({ testTimeout: 20_000 });
afterEach(() => vi.unstubAllGlobals());

const nobody: Answers = { "GET /session": ok(session(null)) };
const rightPassword: Answers = {
  "POST /session": ({ body }) =>
    (body as { password: string }).password === "copper kettle north"
      ? ok(session(ines, "fresh"))
      : refuse(401, "wrong-password", "Address and password do not belong together."),
};
const aProject: Answers = {
  "GET /projects": ok([project]),
  [`GET /projects/${project.id}`]: ok(project),
  [`GET /projects/${project.id}/members`]: ok(members),
  [`GET /projects/${project.id}/scenarios`]: ok([]),
};

const field = (name: string) => screen.findByLabelText(name, { selector: "input" });
const button = (name: string) => screen.getByRole("button", { name });

describe("signing in", () => {
  it("leads from the page asked for to the sign-in and back to it", async () => {
    fakeServer({ ...nobody, ...rightPassword, ...aProject });
    const { user, address } = openPage(`/projects/${project.id}`);
    await user.type(await field("E-mail"), " ines.duarte@okarin.example ");
    await user.type(await field("Password"), "copper kettle north");
    await user.click(button("Sign in"));
    await screen.findByRole("heading", { name: "No scenario yet." });
    expect(address()).toBe(`/projects/${project.id}`);
  });

  it("says one neutral sentence for a wrong password and keeps what was typed", async () => {
    const requests = fakeServer({ ...nobody, ...rightPassword });
    const { user } = openPage("/sign-in");
    await user.type(await field("E-mail"), ines.email);
    await user.type(await field("Password"), "wrong one");
    await user.click(button("Sign in"));
    expect(await screen.findByRole("alert")).toHaveTextContent("Address and password do not belong together.");
    expect(await field("E-mail")).toHaveValue(ines.email);
    expect(await field("Password")).toHaveValue("wrong one");
    expect(requests.at(-1)?.body).toEqual({ email: ines.email, password: "wrong one" });
  });

  it("asks nothing of the server while a field is not filled, and says at the field what is missing", async () => {
    const requests = fakeServer(nobody);
    const { user } = openPage("/sign-in");
    await user.type(await field("E-mail"), "ines");
    await user.click(button("Sign in"));
    expect(await field("E-mail")).toHaveAccessibleDescription("Enter an e-mail address, as in name@firm.example.");
    expect(await field("E-mail")).toBeInvalid();
    expect(await field("Password")).toHaveAccessibleDescription("Enter the password.");
    expect(requests.filter(({ method }) => method !== "GET")).toEqual([]);
  });

  it("shows the password on request", async () => {
    fakeServer(nobody);
    const { user } = openPage("/sign-in");
    expect(await field("Password")).toHaveAttribute("type", "password");
    await user.click(button("show the password"));
    expect(await field("Password")).toHaveAttribute("type", "text");
  });

  it("says so where no server answers, with what was typed still there", async () => {
    fakeServer({ ...nobody, "POST /session": () => Promise.reject(new TypeError("Failed to fetch")) });
    const { user } = openPage("/sign-in");
    await user.type(await field("E-mail"), ines.email);
    await user.type(await field("Password"), "copper kettle north");
    await user.click(button("Sign in"));
    expect(await screen.findByRole("alert")).toHaveTextContent(
      "The server does not answer. What you typed stays here.",
    );
    expect(await screen.findByText(/^No answer from the server since/u)).toBeInTheDocument();
    expect(await field("Password")).toHaveValue("copper kettle north");
  });

  it("sends whoever is signed in straight on", async () => {
    fakeServer({ "GET /session": ok(session(ines)), ...aProject });
    const { address } = openPage(`/sign-in?return=${encodeURIComponent(`/projects/${project.id}`)}`);
    await screen.findByRole("heading", { name: "No scenario yet." });
    expect(address()).toBe(`/projects/${project.id}`);
  });
});

describe("making an account", () => {
  it("puts the server's word on the password at the password", async () => {
    const message = "This password is among the first that would be tried. A few unrelated words are better.";
    fakeServer({
      ...nobody,
      "POST /accounts": refuse(422, "weak-password", "1 field to put right.", [{ path: "password", message }]),
    });
    const { user } = openPage("/sign-up");
    await user.type(await field("Name"), "Ines Duarte");
    await user.type(await field("E-mail"), ines.email);
    await user.type(await field("Password"), "password1234");
    await user.click(button("Make the account"));
    await waitFor(async () =>
      expect(await field("Password")).toHaveAccessibleDescription(expect.stringContaining(message)),
    );
    expect(screen.queryByRole("alert")).not.toBeInTheDocument();
    expect(await field("Name")).toHaveValue("Ines Duarte");
  });

  it("signs in with the new account", async () => {
    fakeServer({ ...nobody, ...rightPassword, ...aProject, "POST /accounts": { status: 202 } });
    const { user } = openPage("/sign-up");
    await user.type(await field("Name"), "Ines Duarte");
    await user.type(await field("E-mail"), ines.email);
    await user.type(await field("Password"), "copper kettle north");
    await user.click(button("Make the account"));
    expect(await screen.findByRole("heading", { name: "One project." })).toBeInTheDocument();
  });

  it("does not tell whether the address had an account before", async () => {
    fakeServer({ ...nobody, ...rightPassword, "POST /accounts": { status: 202 } });
    const { user } = openPage("/sign-up");
    await user.type(await field("Name"), "Ines Duarte");
    await user.type(await field("E-mail"), ines.email);
    await user.type(await field("Password"), "another good one");
    await user.click(button("Make the account"));
    expect(await screen.findByRole("alert")).toHaveTextContent(/^This address and password do not open an account\./u);
  });
});

describe("a one-time link", () => {
  const token = "abcdefghijklmnopqrstuvwxyz";

  it("opens the account it belongs to", async () => {
    const requests = fakeServer({ ...nobody, ...aProject, "POST /accounts/claim": ok(session(ines)) });
    const { user } = openPage(`/welcome/${token}`);
    await user.type(await field("Name"), "Ines Duarte");
    await user.type(await field("Password"), "copper kettle north");
    await user.click(button("Open the account"));
    await screen.findByRole("heading", { name: "One project." });
    expect(requests.find(({ path }) => path === "/accounts/claim")?.body).toEqual({
      token,
      name: "Ines Duarte",
      password: "copper kettle north",
    });
  });

  it("says when the link is cut short", async () => {
    fakeServer(nobody);
    const { user } = openPage("/welcome/abc");
    await user.type(await field("Name"), "Ines Duarte");
    await user.type(await field("Password"), "copper kettle north");
    await user.click(button("Open the account"));
    expect(await screen.findByRole("alert")).toHaveTextContent("This link is not whole.");
  });
});

describe("a session that ends under an open page", () => {
  it("asks for the password over the page and keeps what was typed behind it", async () => {
    let isIn = true;
    fakeServer({
      ...aProject,
      ...rightPassword,
      "GET /session": () => ok(session(isIn ? ines : null)),
      "POST /projects": () =>
        isIn ? { status: 201, body: project } : refuse(401, "not-signed-in", "Sign in to go on."),
    });
    const { user } = openPage("/projects");
    await user.click(await screen.findByRole("button", { name: "New project" }));
    await user.type(await field("Name"), "Hall 4");
    isIn = false;
    await user.click(button("Begin the project"));
    const dialog = await screen.findByRole("dialog", { name: "Sign in again" });
    expect(within(dialog).getByLabelText("E-mail")).toHaveValue(ines.email);
    await user.type(within(dialog).getByLabelText("Password", { selector: "input" }), "copper kettle north");
    isIn = true;
    await user.click(within(dialog).getByRole("button", { name: "Sign in" }));
    await waitFor(() => expect(screen.queryByRole("dialog", { name: "Sign in again" })).not.toBeInTheDocument());
    expect(await field("Name")).toHaveValue("Hall 4");
  });
});
