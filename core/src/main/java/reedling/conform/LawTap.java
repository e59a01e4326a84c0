// SPDX-License-Identifier: Apache-2.0
package reedling.conform;

import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Method;
import java.lang.reflect.Proxy;
import java.util.EnumMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import reedling.contact.ContactBlock;
import reedling.contact.ContactKernel;
import reedling.contact.ContactKind;
import reedling.contact.ContactLaw;
import reedling.contact.Stage;

/**
 * Stands between the engine and one law, shows the blocks of grain-grain contacts that pass to a watcher, and changes
 * nothing. Every other call is passed on, those of later versions of the interfaces too.
 */
final class LawTap {

    /** Looks at blocks before and after the law worked on them. */
    interface Watch {
        void before(ContactKernel kernel, ContactBlock block);

        default void after(ContactBlock block) {}
    }

    private interface Calls {
        @Nullable
        Object call(Method method, Object @Nullable [] arguments) throws Throwable;
    }

    private LawTap() {}

    /** The laws with a tap at one stage. */
    static Map<Stage, ContactLaw> at(Stage stage, Map<Stage, ContactLaw> laws, Watch watch) {
        ContactLaw real = laws.get(stage);
        if (real == null) {
            throw new IllegalArgumentException("there is no law of the stage " + stage);
        }
        Map<Stage, ContactLaw> tapped = new EnumMap<>(laws);
        tapped.put(stage, proxy(ContactLaw.class, (method, arguments) -> {
            Object made = call(real, method, arguments);
            boolean grains = arguments != null && arguments.length > 1 && arguments[1] == ContactKind.GRAIN_GRAIN;
            return made instanceof ContactKernel kernel && grains ? tapped(kernel, watch) : made;
        }));
        return tapped;
    }

    private static ContactKernel tapped(ContactKernel kernel, Watch watch) {
        return proxy(ContactKernel.class, (method, arguments) -> {
            if (arguments == null || !(arguments[0] instanceof ContactBlock block)) {
                return call(kernel, method, arguments);
            }
            watch.before(kernel, block);
            Object nothing = call(kernel, method, arguments);
            watch.after(block);
            return nothing;
        });
    }

    private static <T> T proxy(Class<T> type, Calls calls) {
        return type.cast(Proxy.newProxyInstance(
                type.getClassLoader(),
                new Class<?>[] {type},
                (self, method, arguments) -> calls.call(method, arguments)));
    }

    private static @Nullable Object call(Object target, Method method, Object @Nullable [] arguments) throws Throwable {
        try {
            return method.invoke(target, arguments);
        } catch (InvocationTargetException failure) {
            throw failure.getCause() == null ? failure : failure.getCause();
        }
    }
}
