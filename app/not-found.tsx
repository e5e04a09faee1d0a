import { OuterFrame } from "@/components/shell/outer-frame";
import { ButtonLink, MessagePage } from "@/components/ui";

export default function NotFound() {
  return (
    <OuterFrame>
      <MessagePage title="There is nothing here" actions={<ButtonLink href="/today" tone="main">Go to Today</ButtonLink>}>
        <p>The address is mistyped, or what it showed is not yours to see.</p>
      </MessagePage>
    </OuterFrame>
  );
}
