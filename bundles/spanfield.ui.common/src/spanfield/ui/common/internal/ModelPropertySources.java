/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.ui.common.internal;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import org.eclipse.emf.common.util.Enumerator;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.eclipse.emf.ecore.util.EcoreUtil;
import org.eclipse.emf.edit.command.SetCommand;
import org.eclipse.emf.edit.provider.IItemPropertyDescriptor;
import org.eclipse.emf.edit.provider.IItemPropertySource;
import org.eclipse.jface.viewers.CellEditor;
import org.eclipse.jface.viewers.ComboBoxCellEditor;
import org.eclipse.jface.viewers.LabelProvider;
import org.eclipse.jface.viewers.TextCellEditor;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.views.properties.IPropertyDescriptor;
import org.eclipse.ui.views.properties.IPropertySource;
import org.eclipse.ui.views.properties.IPropertySourceProvider;
import org.eclipse.ui.views.properties.PropertyDescriptor;
import spanfield.model.validation.Places;
import spanfield.model.validation.Ranges;
import spanfield.ui.common.StudyDocument;

/**
 * Properties of model objects for the Properties view. Names are those of the model in plain words with the unit; typed values are checked
 * against the admissible range before they become a command; an empty value clears what is optional.
 */
public final class ModelPropertySources implements IPropertySourceProvider {

    private final StudyDocument document;

    public ModelPropertySources(StudyDocument document) {
        this.document = document;
    }

    @Override
    public IPropertySource getPropertySource(Object object) {
        return object instanceof EObject model && document.adapters().adapt(model, IItemPropertySource.class) instanceof IItemPropertySource source
            ? new Source(model, source) : null;
    }

    /** Name of a feature with its unit, e.g. "station, m". */
    static String title(EStructuralFeature feature) {
        String words = Places.words(feature.getName());
        if (feature instanceof EAttribute attribute && Ranges.of(attribute) != null && !Ranges.of(attribute).unit().isEmpty()) {
            words = words.replaceFirst(" (metres|hertz|degrees|celsius|pascals|newtons|amperes|volts|watts|vars|ohm metres|ohms per metre|"
                + "kilograms per metre|square metres|per kelvin)$", "") + ", " + Ranges.of(attribute).unit();
        }
        return Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }

    private final class Source implements IPropertySource {

        private final EObject object;
        private final List<EStructuralFeature> features = new ArrayList<>();

        Source(EObject object, IItemPropertySource source) {
            this.object = object;
            for (IItemPropertyDescriptor descriptor : source.getPropertyDescriptors(object)) {
                if (descriptor.getFeature(object) instanceof EStructuralFeature feature && !feature.isMany()) {
                    features.add(feature);
                }
            }
        }

        @Override
        public Object getEditableValue() {
            return object;
        }

        @Override
        public IPropertyDescriptor[] getPropertyDescriptors() {
            return features.stream().map(feature -> new Property(object, feature)).toArray(IPropertyDescriptor[]::new);
        }

        @Override
        public Object getPropertyValue(Object id) {
            return Property.shown(object.eGet((EStructuralFeature) id), (EStructuralFeature) id, object);
        }

        @Override
        public boolean isPropertySet(Object id) {
            return object.eIsSet((EStructuralFeature) id);
        }

        @Override
        public void resetPropertyValue(Object id) {
            EStructuralFeature feature = (EStructuralFeature) id;
            set(feature, feature.getDefaultValue());
        }

        @Override
        public void setPropertyValue(Object id, Object value) {
            EStructuralFeature feature = (EStructuralFeature) id;
            if (feature instanceof EAttribute attribute && attribute.getEAttributeType() instanceof EEnum type) {
                set(feature, type.getELiterals().get((Integer) value).getInstance());
            } else if (feature instanceof EReference reference) {
                List<EObject> choices = Property.choices(object, reference);
                set(feature, (Integer) value >= 0 ? choices.get((Integer) value) : null);
            } else {
                set(feature, Property.parse((EAttribute) feature, String.valueOf(value)));
            }
        }

        private void set(EStructuralFeature feature, Object value) {
            Object before = object.eGet(feature);
            if (before == null ? value == null : before.equals(value)) {
                return;
            }
            SetCommand command = (SetCommand) SetCommand.create(document.domain(), object, feature, value == null ? SetCommand.UNSET_VALUE : value);
            command.setLabel("Change " + Places.words(feature.getName()) + " of " + Places.name(object));
            document.execute(command);
        }
    }

    /** One property and its cell editor. */
    private static final class Property extends PropertyDescriptor {

        private final EObject object;
        private final EStructuralFeature feature;

        Property(EObject object, EStructuralFeature feature) {
            super(feature, title(feature));
            this.object = object;
            this.feature = feature;
            String documentation = EcoreUtil.getDocumentation(feature);
            setDescription(documentation);
            setLabelProvider(new LabelProvider() {
                @Override
                public String getText(Object element) {
                    return display(object.eGet(feature));
                }
            });
        }

        static String display(Object value) {
            if (value == null) {
                return "";
            }
            if (value instanceof EObject target) {
                return new ModelLabels().getText(target);
            }
            if (value instanceof Enumerator literal) {
                return literal.getLiteral().toLowerCase(java.util.Locale.ROOT).replace('_', ' ');
            }
            if (value instanceof Double number && number == Math.rint(number) && Math.abs(number) < 1e9) {
                return Long.toString(number.longValue());
            }
            return String.valueOf(value);
        }

        static Object shown(Object value, EStructuralFeature feature, EObject object) {
            if (feature instanceof EAttribute attribute && attribute.getEAttributeType() instanceof EEnum type) {
                return type.getELiterals().indexOf(type.getEEnumLiteral(((Enumerator) value).getValue()));
            }
            if (feature instanceof EReference reference) {
                return choices(object, reference).indexOf(value);
            }
            return display(value);
        }

        static List<EObject> choices(EObject object, EReference reference) {
            Collection<EObject> all = org.eclipse.emf.edit.provider.ItemPropertyDescriptor.getReachableObjectsOfType(object, reference.getEReferenceType());
            List<EObject> choices = new ArrayList<>();
            all.stream().filter(target -> target != null && target != object).forEach(choices::add);
            return choices;
        }

        /** The typed value; an empty text is "none" for what is optional. */
        static Object parse(EAttribute attribute, String text) {
            if (text.isBlank() && attribute.getEAttributeType().getInstanceClass() != double.class
                && attribute.getEAttributeType().getInstanceClass() != int.class) {
                return null;
            }
            return EcoreUtil.createFromString(attribute.getEAttributeType(), attribute.getEAttributeType().getInstanceClass() == String.class ? text : text.strip());
        }

        @Override
        public CellEditor createPropertyEditor(Composite parent) {
            if (feature instanceof EAttribute attribute && attribute.getEAttributeType() instanceof EEnum type) {
                return new ComboBoxCellEditor(parent, type.getELiterals().stream().map(literal -> display(literal.getInstance())).toArray(String[]::new),
                    org.eclipse.swt.SWT.READ_ONLY);
            }
            if (feature instanceof EReference reference) {
                return new ComboBoxCellEditor(parent, choices(object, reference).stream().map(Property::display).toArray(String[]::new),
                    org.eclipse.swt.SWT.READ_ONLY);
            }
            TextCellEditor editor = new TextCellEditor(parent);
            editor.setValidator(value -> problem((EAttribute) feature, String.valueOf(value)));
            return editor;
        }

        /** What is wrong with a typed value, or null. */
        static String problem(EAttribute attribute, String text) {
            Object value;
            try {
                value = parse(attribute, text);
            } catch (IllegalArgumentException notANumber) {
                return "'" + text + "' is not a number";
            }
            Ranges.Range range = Ranges.of(attribute);
            if (range != null && value instanceof Number number && !range.contains(number.doubleValue())) {
                return title(attribute) + " must lie between " + display(range.least()) + " and " + display(range.greatest());
            }
            return null;
        }
    }
}
