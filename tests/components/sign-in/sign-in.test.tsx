import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { signIn } from "next-auth/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { AskResetForm } from "@/components/sign-in/ask-reset-form";
import { Invitation } from "@/components/sign-in/invitation";
import { JoinNewForm } from "@/components/sign-in/join-new-form";
import { SignInForm } from "@/components/sign-in/sign-in-form";

// The server's side of signing in is tested against the database; here it answers what the test says.
vi.mock("next-auth/react", () => ({ signIn: vi.fn() }));
vi.mock("next/navigation", () => ({ useRouter: () => ({ push: vi.fn() }) }));
const fetching = vi.fn<typeof fetch>();
beforeEach(() => void vi.stubGlobal("fetch", fetching));
afterEach(() => {
  vi.unstubAllGlobals();
  vi.clearAllMocks();
});

const refuse = (error: string) =>
  vi.mocked(signIn).mockResolvedValue({ error, ok: false, status: 401, url: null, code: undefined } as never);
const fill = async (label: string, text: string) => userEvent.type(screen.getByLabelText(label), text);

describe("the sign-in form", () => {
  it("can be filled and sent by keyboard alone, and says in words what is missing", async () => {
    render(<SignInForm next="/studio" />);
    expect(screen.getByLabelText("E-mail")).toHaveFocus();
    await userEvent.keyboard("nobody{Enter}");
    expect(await screen.findByText("This is not an e-mail address.")).toBeInTheDocument();
    expect(screen.getByText("Write your password.")).toBeInTheDocument();
    expect(signIn).not.toHaveBeenCalled();
  });

  it("says the same for an unknown address as for a wrong password", async () => {
    refuse("CredentialsSignin");
    render(<SignInForm next="/studio" />);
    await fill("E-mail", "Odo@ringwright.example");
    await fill("Password", "wrong{Enter}");
    expect(await screen.findByRole("alert")).toHaveTextContent(
      "This e-mail address and password do not belong together.",
    );
    expect(signIn).toHaveBeenCalledWith(
      "credentials",
      expect.objectContaining({ email: "odo@ringwright.example", redirect: false }),
    );
  });

  it("shows how long to wait", async () => {
    refuse("Too many tries. Wait 15 minutes, then try again.");
    render(<SignInForm next="/studio" />);
    await fill("E-mail", "odo@ringwright.example");
    await fill("Password", "wrong{Enter}");
    expect(await screen.findByRole("alert")).toHaveTextContent("Wait 15 minutes");
  });
});

describe("asking for a new password", () => {
  it("shows the answer, which is the same for everyone", async () => {
    fetching.mockResolvedValue(
      Response.json({ words: "If odo@ringwright.example has an account, a letter is on its way." }),
    );
    render(<AskResetForm />);
    await fill("E-mail", "odo@ringwright.example{Enter}");
    expect(await screen.findByRole("status")).toHaveTextContent("If odo@ringwright.example has an account");
  });
});

describe("an invitation", () => {
  const invitation = {
    production: "Ember Harbour",
    role: "advisor",
    by: "Petra Lindqvar",
    email: "odo@ringwright.example",
    name: "Odo Ferrand",
    personId: null,
  };

  it("says who invites whom, as what, and asks a newcomer for name, password and time zone", () => {
    render(<Invitation token="t" invitation={invitation} />);
    expect(screen.getByText(/Petra Lindqvar invites you as its science advisor\./)).toBeInTheDocument();
    expect(screen.getByLabelText("Your name")).toHaveValue("Odo Ferrand");
    expect(screen.getByLabelText("Time zone")).toHaveValue(Intl.DateTimeFormat().resolvedOptions().timeZone);
  });

  it("asks someone who has an account for its password, unless they are signed in to it", () => {
    const known = { ...invitation, personId: "p" };
    const { unmount } = render(
      <Invitation token="t" invitation={known} signedIn={{ id: "q", name: "Eve" }} />,
    );
    expect(screen.getByLabelText("Password")).toBeInTheDocument();
    expect(screen.getByText(/You are signed in as Eve now/)).toBeInTheDocument();
    unmount();
    render(<Invitation token="t" invitation={known} signedIn={{ id: "p", name: "Odo" }} />);
    expect(screen.queryByLabelText("Password")).toBeNull();
  });

  it("puts the server's refusal beside its field", async () => {
    const error = {
      code: "invalid",
      message: "password: A password has at least 12 characters.",
      field: "password",
    };
    fetching.mockResolvedValue(Response.json({ error }, { status: 400 }));
    render(<JoinNewForm token="t" email={invitation.email} name="Odo" />);
    await fill("Password", "four unrelated words{Enter}");
    const message = await screen.findByText("A password has at least 12 characters.");
    await waitFor(() =>
      expect(screen.getByLabelText("Password")).toHaveAttribute("aria-describedby", message.id),
    );
    expect(signIn).not.toHaveBeenCalled();
  });
});
