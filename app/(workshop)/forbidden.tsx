import { ButtonLink, MessagePage } from "@/components/ui";

export default function Forbidden() {
  return (
    <MessagePage title="Your roles do not allow this" actions={<ButtonLink href="/today" tone="main">Go to Today</ButtonLink>}>
      <p>An administrator of the workshop gives roles. Nothing was changed.</p>
    </MessagePage>
  );
}
