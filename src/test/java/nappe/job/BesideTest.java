package nappe.job;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.concurrent.CountDownLatch;
import org.junit.jupiter.api.Test;

class BesideTest {
    @Test
    void whatFollowsTheStartIsDoneMeanwhile() {
        CountDownLatch followed = new CountDownLatch(1);
        Beside<String> part = Beside.start("part", () -> {
            await(followed);
            return Thread.currentThread().getName();
        });

        followed.countDown();

        assertThat(part.outcome()).isEqualTo("part");
    }

    @Test
    void whatItThrowsIsThrownToWhoeverAsks() {
        IllegalArgumentException fault = new IllegalArgumentException("a fault");
        Beside<String> part = Beside.start("part", () -> {
            throw fault;
        });

        assertThatThrownBy(part::outcome).isSameAs(fault);
        assertThatThrownBy(part::outcome).isSameAs(fault);
    }

    @Test
    void anErrorIsThrownAsItIs() {
        StackOverflowError error = new StackOverflowError();
        Beside<String> part = Beside.start("part", () -> {
            throw error;
        });

        assertThatThrownBy(part::outcome).isSameAs(error);
    }

    private static void await(CountDownLatch latch) {
        try {
            latch.await();
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }
}
