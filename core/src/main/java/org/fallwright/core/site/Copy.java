package org.fallwright.core.site;

import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.RecordComponent;

/**
 * Copies of a record with one component changed, whatever else the record holds; the record's own
 * constructor checks the outcome.
 */
public final class Copy {
  private Copy() {}

  /**
   * A copy with another value.
   *
   * @param component name of the record's component
   * @throws IllegalArgumentException where the record refuses the value, as it says it, or has no
   *     such component
   */
  public static <T extends Record> T with(T record, String component, Object value) {
    @SuppressWarnings("unchecked")
    Class<T> type = (Class<T>) record.getClass();
    RecordComponent[] all = type.getRecordComponents();
    Class<?>[] types = new Class<?>[all.length];
    Object[] values = new Object[all.length];
    boolean found = false;
    try {
      for (int i = 0; i < all.length; i++) {
        types[i] = all[i].getType();
        boolean own = all[i].getName().equals(component);
        values[i] = own ? value : all[i].getAccessor().invoke(record);
        found |= own;
      }
      if (!found) {
        throw new IllegalArgumentException(type.getSimpleName() + " has no component " + component);
      }
      Constructor<T> canonical = type.getDeclaredConstructor(types);
      return canonical.newInstance(values);
    } catch (InvocationTargetException e) {
      if (e.getCause() instanceof IllegalArgumentException refused) {
        throw refused;
      }
      throw new IllegalStateException(e.getCause());
    } catch (ReflectiveOperationException e) {
      throw new IllegalStateException(e);
    }
  }
}
